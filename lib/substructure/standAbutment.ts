import type { AbutmentWall, MeasuredLine, PierShaft, Site, Support } from '../model/index.ts';
import { alongSupportsM } from '../site/index.ts';
import { wallLines, wallsOf } from './abutmentWalls.ts';
import type { Combo } from './combos.ts';
import { substructureData } from './data.ts';
import type { FoundationTask } from './foot.ts';
import { foundationFor } from './foundationFor.ts';
import { slopeReach, slopeRoom } from './frontSlope.ts';
import { groundUnder } from './groundUnder.ts';
import { accidentalCapacity } from './pierCombos.ts';
import { scourDepth, settingAt, type Setting } from './setting.ts';
import type { SupportAsk } from './supportAsk.ts';
import {
  articulationLines,
  articulationOf,
  foundationsCost,
  upliftKN,
  waterAccessLines,
} from './supportLines.ts';

/**
 * An abutment, the cheapest of those that fit here: a bank seat where the road is little above the ground; a full-height
 * wall; columns through fill that spills out to the front where nothing is in its way. With back wall and two wing walls
 * that reach as far as the side slope of the fill. On a skew all walls stand along the line of supports, longer than the
 * deck is wide. Active pressure and surcharge go into the foundation, as if nothing
 * propped it, also where the deck is cast in.
 */
export function standAbutment(
  site: Site,
  ask: SupportAsk,
  costOf: (lines: readonly MeasuredLine[]) => number,
): Support {
  const setting = settingAt(site, ask.chainageM);
  const stood = wallsThatFit(site, ask, setting).map((wall) => standOn(site, ask, setting, wall));
  // Of equals the plainer one, which comes first.
  const costs = stood.map((support) => costOf(support.lines) + foundationsCost(support, costOf));
  return stood[costs.indexOf(Math.min(...costs))]!;
}

/** Kinds of abutment that may be built here, the plainest first. */
function wallsThatFit(site: Site, ask: SupportAsk, setting: Setting): AbutmentWall[] {
  const { bearings, abutment } = substructureData;
  const beamFootM = ask.soffitLevelM - bearings.heightM - abutment.seatBeamM;
  const low = ask.roadLevelM - setting.groundLevelM <= abutment.bankSeatUpToM;
  const reachM = slopeReach(site, beamFootM, setting.groundLevelM);
  const spills =
    !low &&
    beamFootM > setting.groundLevelM &&
    !(setting.floodDepthM > 0) &&
    reachM <= slopeRoom(site, ask.chainageM);
  return [low ? 'bank seat' : 'full height', ...(spills ? (['spill-through'] as const) : [])];
}

function standOn(site: Site, ask: SupportAsk, setting: Setting, wall: AbutmentWall): Support {
  const { bearings, abutment, concrete, piles, factors } = substructureData;
  const seatM = ask.soffitLevelM - bearings.heightM;
  // A bank seat is a beam in the fill; its foundation starts at its underside, not at the original ground.
  const footM = Math.min(
    seatM - abutment.seatBeamM,
    wall === 'bank seat' ? Infinity : setting.groundLevelM - piles.capCoverM,
  );
  const widthM = alongSupportsM(site);
  const walls = wallsOf(site, ask, { seatM, footM, groundM: setting.groundLevelM }, wall);
  const concreteM3 = walls.stemM3 + walls.backWallM3 + walls.wings.wallsM3;
  const shaft: PierShaft = {
    lengthM: walls.stemLengthM,
    widthM,
    columns: walls.columns,
    concreteM3,
    reinforcementKg: concreteM3 * walls.barsKgM3,
  };
  const weightKN = (walls.stemM3 + walls.backWallM3) * concrete.weightKNm3;
  const task: FoundationTask = {
    name: ask.name,
    ...(ask.index === undefined ? {} : { support: ask.index }),
    shaftLengthM: walls.stemLengthM,
    shaftWidthM: widthM,
    combos: abutmentCombos(ask, setting, seatM, weightKN),
    groundLevelM: Math.min(setting.groundLevelM, footM + piles.capCoverM),
    waterLevelM: setting.waterLevelM,
    scourM: scourDepth(setting, 0),
    backfill: { topLevelM: ask.roadLevelM, widthM: walls.pressedM, heelShare: abutment.heelShare },
    shaftFootM: footM,
    shaftAreaM2:
      walls.columns === 1
        ? walls.stemLengthM * widthM
        : walls.columns * walls.stemLengthM * walls.stemLengthM,
    shaftBarsKgM3: walls.barsKgM3,
    shaftItem: 'abutment-concrete',
  };
  const ground = groundUnder(site, ask.chainageM);
  return {
    chainageM: ask.chainageM,
    stretch: ground.stretch,
    kind: 'abutment',
    groundLevelM: setting.groundLevelM,
    topLevelM: seatM,
    heightM: Math.max(0, seatM - setting.groundLevelM),
    waterDepthM: setting.waterDepthM,
    permanentKN: ask.permanentKN,
    trafficKN: ask.trafficKN,
    shaft,
    abutment: { wall, integral: ask.castIn === true },
    articulation: articulationOf(ask, ask.acrossKN * factors.windWithTraffic),
    lines: [
      ...articulationLines(ask, widthM),
      ...wallLines(ask, walls),
      ...waterAccessLines(ask, setting.waterDepthM),
    ],
    foundations: ground.classes.map((odds) => foundationFor(task, odds)),
  };
}

function abutmentCombos(ask: SupportAsk, { seismic }: Setting, seatM: number, weightKN: number): Combo[] {
  const { factors } = substructureData;
  const across = { acrossKN: ask.acrossKN * factors.windWithTraffic, acrossLevelM: seatM };
  const along = { alongKN: ask.alongKN, alongLevelM: seatM, capacity: 1, ultimate: 1 };
  const held = ask.permanentKN + weightKN;
  const combos: Combo[] = [
    { ...along, ...across, verticalKN: held + ask.trafficKN },
    { ...along, ...across, verticalKN: held },
  ];
  const uplift = upliftKN(ask);
  if (uplift > 0) combos.push({ ...along, ...across, verticalKN: factors.favourable * weightKN - uplift });
  if (seismic !== null) {
    // What the abutment holds moves with the ground; sliding bearings pass their friction on.
    const shaken = seismic.groundShare * (Math.max(0, ask.heldAlongKN) + weightKN);
    combos.push({
      verticalKN: held,
      alongKN: Math.max(shaken, ask.heldAlongKN > 0 ? 0 : ask.alongKN),
      alongLevelM: seatM,
      acrossKN: seismic.groundShare * (Math.max(0, ask.permanentKN) + weightKN),
      acrossLevelM: seatM,
      capacity: accidentalCapacity,
      ultimate: 1,
    });
  }
  return combos;
}
