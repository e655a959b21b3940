import type { IntegralWall, Site, Support, WallQuake } from '../model/index.ts';
import { alongSupportsM, constructionDepth } from '../site/index.ts';
import type { Combo } from './combos.ts';
import { substructureData } from './data.ts';
import type { FoundationTask } from './foot.ts';
import { foundationFor } from './foundationFor.ts';
import { groundUnder } from './groundUnder.ts';
import { accidentalCapacity } from './pierCombos.ts';
import { quakeDirections } from './seismicLoad.ts';
import { scourDepth, settingAt } from './setting.ts';
import type { SupportAsk } from './supportAsk.ts';
import { line, waterAccessLines } from './supportLines.ts';
import { wingFootingLines, wingsOf, wingWallsLine } from './wings.ts';

/**
 * A wall in one with the deck: no bearings, no joint. The wall itself stands in the lines of the design; here are, of one at
 * an end, its wings, and on every ground the foundation under it, sized for vertical load, thrust and moment as the frame
 * puts them down, the pressure of the fill in them, with the fill on the heel at an end and wind across, and for an
 * earthquake either way along with a share of it across, and the other way round. A wall between two spans may be struck;
 * one at an end has the fill behind it, like any abutment.
 */
export function standIntegralWall(site: Site, ask: SupportAsk, wall: IntegralWall): Support {
  const { abutment, piles, factors } = substructureData;
  const setting = settingAt(site, ask.chainageM);
  const slabM = ask.roadLevelM - constructionDepth(site.deck, 0);
  const footM = slabM - wall.heightM;
  const widthM = alongSupportsM(site);
  const isEnd = ask.kind === 'abutment';
  const wings = isEnd ? wingsOf(site, Math.max(0, ask.roadLevelM - footM)) : null;
  const wingsM3 = wings?.wallsM3 ?? 0;
  const wingBarsKg = wingsM3 * abutment.barsKgM3;
  const acrossKN = ask.acrossKN * (isEnd ? factors.windWithTraffic : 1);
  const task: FoundationTask = {
    name: ask.name,
    ...(ask.index === undefined ? {} : { support: ask.index }),
    shaftLengthM: wall.footM,
    shaftWidthM: widthM,
    combos: [
      ...wall.loads.map(({ verticalKN, alongKN, momentKNm, struck }): Combo => ({
        verticalKN,
        alongKN,
        alongLevelM: footM,
        momentAlongKNm: momentKNm,
        acrossKN: struck ? struck.acrossKN : acrossKN,
        acrossLevelM: struck ? setting.groundLevelM + struck.aboveGroundM : slabM,
        capacity: struck ? accidentalCapacity : 1,
        ultimate: 1,
      })),
      ...(wall.quake ?? []).flatMap((quake) => quakeCombos(quake, footM)),
    ],
    groundLevelM: Math.min(setting.groundLevelM, footM + piles.capCoverM),
    waterLevelM: setting.waterLevelM,
    scourM: scourDepth(setting, isEnd ? 0 : wall.footM),
    backfill: isEnd
      ? { topLevelM: ask.roadLevelM, widthM, heelShare: abutment.heelShare, inLoads: true }
      : null,
    shaftFootM: footM,
    shaftAreaM2: wall.footM * widthM,
    shaftBarsKgM3: wall.reinforcementKg / wall.concreteM3,
    shaftItem: isEnd ? 'abutment-concrete' : 'pier-concrete',
  };
  const ground = groundUnder(site, ask.chainageM);
  return {
    chainageM: ask.chainageM,
    stretch: ground.stretch,
    kind: isEnd ? 'abutment' : 'pier',
    groundLevelM: setting.groundLevelM,
    topLevelM: ask.soffitLevelM,
    heightM: Math.max(0, ask.soffitLevelM - setting.groundLevelM),
    waterDepthM: setting.waterDepthM,
    permanentKN: ask.permanentKN,
    trafficKN: ask.trafficKN,
    shaft: {
      lengthM: wall.footM,
      widthM,
      columns: 1,
      concreteM3: wall.concreteM3 + wingsM3,
      reinforcementKg: wall.reinforcementKg + wingBarsKg,
    },
    articulation: {
      fixed: true,
      bearings: 0,
      bearingMN: 0,
      alongKN: ask.alongKN,
      acrossKN,
      jointMovementMm: 0,
      tieDownKN: 0,
      ...(isEnd || setting.vesselKN === null ? {} : { vesselKN: setting.vesselKN }),
    },
    lines: [
      ...(wings
        ? [
            wingWallsLine(ask, wings),
            line(
              ask,
              'abutments',
              'reinforcement',
              wingBarsKg,
              `${ask.name} wings`,
              `${abutment.barsKgM3} kg/m3`,
            ),
            ...wingFootingLines(ask, wings),
          ]
        : []),
      ...waterAccessLines(ask, setting.waterDepthM),
    ],
    foundations: ground.classes.map((odds) => foundationFor(task, odds)),
  };
}

/** An earthquake either way along the road with a share of it across, and the other way round. */
const quakeCombos = ({ rest, along, acrossKN, acrossAboveM }: WallQuake, footM: number): Combo[] =>
  quakeDirections().flatMap(([a, b]) =>
    [a, -a].map((share) => ({
      verticalKN: rest.verticalKN + share * along.verticalKN,
      alongKN: rest.alongKN + share * along.alongKN,
      alongLevelM: footM,
      momentAlongKNm: rest.momentKNm + share * along.momentKNm,
      acrossKN: b * acrossKN,
      acrossLevelM: footM + acrossAboveM,
      capacity: accidentalCapacity,
      ultimate: 1,
    })),
  );
