import type { IntegralWall, SupportReaction } from '../../model/index.ts';
import { worstMoment, combinations } from './combine.ts';
import { endMovementMm, footLoads } from './frameFeet.ts';
import { strandKg } from './frameLines.ts';
import type { FrameModel } from './frameModel.ts';
import type { SizedFrame } from './sizeFrame.ts';

/** Characteristic vertical loads of both walls on their foundations; the frame hands them down whatever its feet. */
export function frameReactions(model: FrameModel, { traffic }: SizedFrame): SupportReaction[] {
  const [one] = model.cases;
  return ([0, 1] as const).map((end) => ({
    permanentKN: one!.own.feet[end].verticalKN + one!.superimposed.feet[end].verticalKN,
    trafficMaxKN: Math.max(...traffic.feet[0]!.map((feet) => feet[end].verticalKN)),
    trafficMinKN: 0,
  }));
}

/** The walls as their foundations and the take-off see them. */
export function frameWalls(model: FrameModel, sized: SizedFrame): IntegralWall[] {
  const movementMm = endMovementMm(model);
  return ([0, 1] as const).map((end) => ({
    support: end,
    footM: model.shape.legFootM,
    heightM: model.shape.heightM[end],
    concreteM3: model.wallM3[end],
    reinforcementKg: sized.wallBarsKg[end].upright + sized.wallBarsKg[end].level,
    movementMm,
    loads: footLoads(model, sized, end),
  }));
}

/** Own weight of the characteristic moment at the knee, 0 to 1: the greater of both feet. */
export function ownWeightShare(model: FrameModel, sized: SizedFrame): number {
  const all = combinations(model, sized.traffic, 'characteristic', sized.tendons?.parasitic ?? null);
  const node = model.shape.knees[0] + 1;
  const shares = model.cases.map(
    ({ own }, k) => -own.momentKNm[node]! / worstMoment(all[k]!, node, -1).momentKNm,
  );
  return Math.min(1, Math.max(0, ...shares));
}

/** Named figures of shape, statics and steel. */
export function frameFigures(model: FrameModel, sized: SizedFrame): Record<string, number> {
  const { shape, task, cases, deckM3, wallM3 } = model;
  const { tendons, faces, traffic } = sized;
  const [stiff, soft] = cases;
  const middle = (shape.knees[0] + shape.knees[1]) >> 1;
  const knee = shape.knees[0] + 1;
  const sum = (values: Readonly<Record<string, number>>): number =>
    Object.values(values).reduce((total, value) => total + value, 0);
  const wallKg = sum(sized.wallBarsKg[0]) + sum(sized.wallBarsKg[1]);
  const feet = [0, 1].flatMap((end) => footLoads(model, sized, end as 0 | 1));
  const deckM2 = shape.spanM * task.deck.widthM;
  const figures: Record<string, number> = {
    kneeDepthM: shape.kneeM,
    wallTopM: shape.legTopM,
    wallFootM: shape.legFootM,
    firstHeightM: shape.heightM[0],
    lastHeightM: shape.heightM[1],
    wingM: shape.wingM,
    kneeOwnKNm: -stiff!.own.momentKNm[knee]!,
    kneeOwnSoftKNm: -soft!.own.momentKNm[knee]!,
    midspanOwnKNm: stiff!.own.momentKNm[middle]!,
    midspanOwnSoftKNm: soft!.own.momentKNm[middle]!,
    thrustOwnKN: -stiff!.own.feet[0].alongKN,
    thrustOwnSoftKN: -soft!.own.feet[0].alongKN,
    kneeDesignKNm: faces[1]!.designKNm,
    midspanDesignKNm: faces[0]!.designKNm,
    pressedEarth: stiff!.pressure,
    pressedEarthSoft: soft!.pressure,
    thrustOutMostKN: Math.max(0, ...feet.map(({ alongKN }) => -alongKN)),
    thrustInMostKN: Math.max(0, ...feet.map(({ alongKN }) => alongKN)),
    movementMm: frameWalls(model, sized)[0]!.movementMm,
    vehicleWidthM: traffic.strips.vehicleWidthM,
    barsLowM2PerM: Math.max(...faces[0]!.needM2) / (task.deck.widthM - 2 * shape.wingM),
    barsKneeM2PerM: Math.max(...faces[1]!.needM2) / task.deck.widthM,
    concreteM3M2: (deckM3 + wallM3[0] + wallM3[1]) / deckM2,
    deckConcreteM3M2: deckM3 / deckM2,
    barsKgM3: sum(sized.deckBarsKg) / deckM3,
    wallBarsKgM3: wallKg / (wallM3[0] + wallM3[1]),
  };
  if (tendons) {
    figures.tendonCount = tendons.count;
    figures.strandCount = tendons.strands;
    figures.tendonForceKN = tendons.forceKN;
    figures.lastingStressMPa = tendons.stress.lastingMPa;
    figures.strandKgM2 = strandKg(model, sized) / deckM2;
    figures.kneeParasiticKNm = tendons.parasitic[0]!.momentKNm[knee]!;
    figures.thrustLostShare = -tendons.parasitic[0]!.thrustKN[middle]! / tendons.forceKN;
  }
  return figures;
}
