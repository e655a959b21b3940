import type { PierShaft, Site, Support } from '../model/index.ts';
import { alongSupportsM } from '../site/index.ts';
import { substructureData } from './data.ts';
import type { FoundationTask } from './foot.ts';
import { foundationFor } from './foundationFor.ts';
import { groundUnder } from './groundUnder.ts';
import { pierCombos } from './pierCombos.ts';
import { scourDepth, settingAt } from './setting.ts';
import { framedReport } from './framedReport.ts';
import type { FramedShaft } from './framedShaft.ts';
import { crackedEI } from './pierStiffness.ts';
import {
  alongUse,
  sectionArea,
  shaftBarsBy,
  shaftInertia,
  shaftWidth,
  sizeShaft,
  type ShaftTask,
} from './sizeShaft.ts';
import type { SupportAsk } from './supportAsk.ts';
import {
  articulationLines,
  articulationOf,
  designLoadMN,
  shaftLines,
  softZoneLines,
  waterAccessLines,
} from './supportLines.ts';

/**
 * A pier, anchor pier or pylon foot with one foundation for each ground class of its stretch. On a skew its shaft or head
 * stands along the line of supports, and is longer for it; a pylon stands as its form makes it.
 */
export function standPier(site: Site, ask: SupportAsk): Support {
  const { pier, bearings, concrete, piles, wind } = substructureData;
  const setting = settingAt(site, ask.chainageM);
  const { frame } = ask;
  const topLevelM = ask.soffitLevelM - (frame ? 0 : bearings.heightM);
  const shaftFootM = setting.groundLevelM - piles.capCoverM;
  const heightM = Math.max(0, topLevelM - setting.groundLevelM);
  const shaftHeightM = Math.max(0, topLevelM - shaftFootM);
  const slim = Math.max(pier.leastLeafM, shaftHeightM / 12);
  const windKN = wind.pressureKNm2 * slim * heightM;
  const wet = setting.floodDepthM > 0 || setting.impact !== null;
  const designMN = designLoadMN(ask);
  const pylon = ask.pylon;
  const isFramedHollow = shaftHeightM > pier.framedHollowAboveM;
  const framedBy = (lengthM: number): FramedShaft | null =>
    frame
      ? {
          heightM: shaftHeightM,
          eiKNm2: crackedEI(shaftInertia(lengthM, shaftWidth(alongSupportsM(site)), isFramedHollow)),
          deckTurnKNm: frame.deckTurnKNm,
        }
      : null;
  const bare = { weightKN: 0, windKN, windLevelM: setting.groundLevelM + heightM / 2 };
  const shaftTask: ShaftTask = {
    heightM: shaftHeightM,
    footLevelM: shaftFootM,
    alongSupportsM: alongSupportsM(site),
    leaf: wet,
    ...(frame
      ? {
          framed: true,
          combos: (lengthM) => pierCombos(ask, setting, topLevelM, bare, framedBy(lengthM)),
        }
      : { combos: pierCombos(ask, setting, topLevelM, bare) }),
    designVerticalKN: designMN * 1000,
    permanentKN: ask.permanentKN,
  };
  const shaft: PierShaft = pylon
    ? { lengthM: pylon.lengthM, widthM: pylon.widthM, columns: 2, concreteM3: 0, reinforcementKg: 0 }
    : sizeShaft(shaftTask);
  const hollow = shaft.hollow === true;
  const weightKN = pylon ? pylon.weightKN : shaft.concreteM3 * concrete.weightKNm3;
  const framed = framedBy(shaft.lengthM);
  const combos = pierCombos(
    ask,
    setting,
    topLevelM,
    {
      weightKN,
      windKN: pylon ? wind.pressureKNm2 * pylon.lengthM * 2 * pylon.heightM : windKN,
      windLevelM: setting.groundLevelM + (pylon ? pylon.heightM : heightM) / 2,
    },
    framed,
  );
  const item = hollow ? 'hollow-pier-concrete' : 'pier-concrete';
  const columnWidth = shaft.columns === 2 ? shaft.lengthM : shaft.widthM;
  const task: FoundationTask = {
    name: ask.name,
    ...(ask.index === undefined ? {} : { support: ask.index }),
    shaftLengthM: shaft.lengthM,
    shaftWidthM: shaft.widthM,
    combos,
    groundLevelM: setting.groundLevelM,
    waterLevelM: setting.waterLevelM,
    scourM: scourDepth(setting, shaft.lengthM),
    backfill: null,
    shaftFootM,
    shaftAreaM2: pylon
      ? 2 * shaft.lengthM * shaft.lengthM
      : sectionArea(shaft.lengthM, columnWidth, hollow) * shaft.columns,
    shaftBarsKgM3: pier[shaftBarsBy(shaft, frame !== undefined)],
    shaftItem: pylon ? 'pylon-concrete' : item,
  };
  const ground = groundUnder(site, ask.chainageM);
  const how =
    shaft.columns === 2
      ? `two columns ${shaft.lengthM} m square, ${shaftHeightM.toFixed(1)} m high, with head`
      : `${hollow ? 'hollow ' : ''}leaf ${shaft.lengthM} x ${shaft.widthM.toFixed(2)} m, ${shaftHeightM.toFixed(1)} m high`;
  return {
    chainageM: ask.chainageM,
    stretch: ground.stretch,
    kind: ask.kind,
    groundLevelM: setting.groundLevelM,
    topLevelM,
    heightM,
    waterDepthM: setting.waterDepthM,
    permanentKN: ask.permanentKN,
    trafficKN: ask.trafficKN,
    shaft,
    articulation: {
      ...articulationOf(ask, ask.acrossKN, setting.vesselKN),
      ...(frame && framed
        ? { frame: framedReport(frame, framed, alongUse(shaftTask, { ...shaft, hollow })) }
        : {}),
    },
    lines: [
      ...articulationLines(ask, alongSupportsM(site)),
      ...shaftLines(ask, shaft, 'piers', item, how),
      ...waterAccessLines(ask, setting.waterDepthM),
      ...softZoneLines(ask, setting.soft),
    ],
    foundations: ground.classes.map((odds) => foundationFor(task, odds)),
  };
}
