import type { MeasuredLine, PierShaft, Site, Support } from '../model/index.ts';
import type { Combo } from './combos.ts';
import { substructureData } from './data.ts';
import type { FoundationTask } from './foot.ts';
import { foundationFor } from './foundationFor.ts';
import { groundUnder } from './groundUnder.ts';
import { scourDepth, settingAt } from './setting.ts';
import type { SupportAsk } from './supportAsk.ts';
import { articulationLines, bearingLoadMN, line, upliftKN, waterAccessLines } from './supportLines.ts';
import { wingFootingLines, wingsOf, wingWallsLine, type Wings } from './wings.ts';

/** Walls of an abutment, m and m3. */
interface Walls {
  readonly kind: 'bank seat' | 'full height';
  readonly stemLengthM: number;
  readonly stemM3: number;
  readonly backWallM3: number;
  readonly wings: Wings;
}

/**
 * An abutment: a bank seat where the road is little above the ground, a full-height wall elsewhere, with back wall and two
 * wing walls that reach as far as the side slope of the fill. Active pressure and surcharge go into the foundation;
 * stem thickness is by height (common practice, see the data file).
 */
export function standAbutment(site: Site, ask: SupportAsk): Support {
  const { bearings, abutment, concrete, piles, factors } = substructureData;
  const setting = settingAt(site, ask.chainageM);
  const seatM = ask.soffitLevelM - bearings.heightM;
  const retainedM = ask.roadLevelM - setting.groundLevelM;
  const bankSeat = retainedM <= abutment.bankSeatUpToM;
  // A bank seat is a beam in the fill; its foundation starts at its underside, not at the original ground.
  const footM = Math.min(
    seatM - abutment.seatBeamM,
    bankSeat ? Infinity : setting.groundLevelM - piles.capCoverM,
  );
  const walls = wallsOf(site, ask, seatM, footM, bankSeat ? 'bank seat' : 'full height');
  const shaft: PierShaft = {
    lengthM: walls.stemLengthM,
    widthM: site.deck.widthM,
    columns: 1,
    concreteM3: walls.stemM3 + walls.backWallM3 + walls.wings.wallsM3,
    reinforcementKg: (walls.stemM3 + walls.backWallM3 + walls.wings.wallsM3) * abutment.barsKgM3,
  };
  const weightKN = (walls.stemM3 + walls.backWallM3) * concrete.weightKNm3;
  const task: FoundationTask = {
    name: ask.name,
    ...(ask.index === undefined ? {} : { support: ask.index }),
    shaftLengthM: walls.stemLengthM,
    shaftWidthM: site.deck.widthM,
    combos: abutmentCombos(ask, seatM, weightKN),
    groundLevelM: Math.min(setting.groundLevelM, footM + piles.capCoverM),
    waterLevelM: setting.waterLevelM,
    scourM: scourDepth(setting, 0),
    backfill: { topLevelM: ask.roadLevelM, widthM: site.deck.widthM, heelShare: abutment.heelShare },
    shaftFootM: footM,
    shaftAreaM2: walls.stemLengthM * site.deck.widthM,
    shaftBarsKgM3: abutment.barsKgM3,
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
    articulation: {
      fixed: ask.fixed,
      bearings: ask.bearings,
      bearingMN: bearingLoadMN(ask),
      alongKN: ask.alongKN,
      acrossKN: ask.acrossKN * factors.windWithTraffic,
      jointMovementMm: ask.jointMovementMm,
      tieDownKN: upliftKN(ask),
    },
    lines: [
      ...articulationLines(ask, site.deck),
      ...wallLines(ask, walls),
      ...waterAccessLines(ask, setting.waterDepthM),
    ],
    foundations: ground.classes.map((odds) => foundationFor(task, odds)),
  };
}

function wallsOf(site: Site, ask: SupportAsk, seatM: number, footM: number, kind: Walls['kind']): Walls {
  const { abutment } = substructureData;
  const width = site.deck.widthM;
  const stemHeight = Math.max(0, seatM - footM);
  const height = Math.max(0, ask.roadLevelM - footM);
  const footThickness = Math.max(abutment.leastStemM, abutment.stemPerHeight * height);
  const stemLengthM = kind === 'bank seat' ? abutment.leastStemM : (abutment.leastStemM + footThickness) / 2;
  return {
    kind,
    stemLengthM,
    stemM3: stemLengthM * stemHeight * width,
    backWallM3: Math.max(0, ask.roadLevelM - seatM) * abutment.backWallM * width,
    wings: wingsOf(site, height),
  };
}

function wallLines(ask: SupportAsk, walls: Walls): MeasuredLine[] {
  const { barsKgM3 } = substructureData.abutment;
  const wall = walls.stemM3 + walls.backWallM3;
  const bars = (wall + walls.wings.wallsM3) * barsKgM3;
  const name = ask.name;
  return [
    line(
      ask,
      'abutments',
      'abutment-concrete',
      wall,
      `${name} ${walls.kind}`,
      `stem ${walls.stemLengthM.toFixed(2)} m thick, back wall`,
    ),
    wingWallsLine(ask, walls.wings),
    line(ask, 'abutments', 'reinforcement', bars, `${name} walls`, `${barsKgM3} kg/m3`),
    ...wingFootingLines(ask, walls.wings),
  ];
}

function abutmentCombos(ask: SupportAsk, seatM: number, weightKN: number): Combo[] {
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
  return combos;
}
