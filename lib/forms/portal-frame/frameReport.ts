import type { IntegralWall, SupportReaction } from '../../model/index.ts';
import { worstMoment, combinations } from './combine.ts';
import { footLoads, footQuake, wallMovementMm } from './frameFeet.ts';
import { strandKg } from './frameLines.ts';
import type { FrameModel } from './frameModel.ts';
import type { SizedFrame } from './sizeFrame.ts';

/** Characteristic vertical loads of both walls on their foundations; the frame hands them down whatever its feet. */
export function frameReactions(model: FrameModel, { traffic }: SizedFrame): SupportReaction[] {
  const [one] = model.cases;
  const { inSpan, overWall } = traffic.feet[0]!;
  return model.shape.walls.map((_, wall) => ({
    permanentKN: one!.own.feet[wall]!.verticalKN + one!.superimposed.feet[wall]!.verticalKN,
    trafficMaxKN: Math.max(...[...inSpan, ...overWall].map((feet) => feet[wall]!.verticalKN)),
    trafficMinKN: Math.min(0, ...inSpan.map((feet) => feet[wall]!.verticalKN)),
  }));
}

/** The walls as their foundations and the take-off see them. */
export function frameWalls(model: FrameModel, sized: SizedFrame): IntegralWall[] {
  const { quakeShare = 0 } = model.task;
  return model.shape.walls.map(({ footM, heightM }, wall) => ({
    support: wall,
    footM,
    heightM,
    concreteM3: model.wallM3[wall]!,
    reinforcementKg: sized.wallBarsKg[wall]!.upright + sized.wallBarsKg[wall]!.level,
    movementMm: wallMovementMm(model, wall),
    loads: footLoads(model, sized, wall),
    ...(quakeShare > 0 ? { quake: footQuake(model, sized, wall, quakeShare) } : {}),
  }));
}

/** Own weight of the characteristic moment at the faces of the walls, 0 to 1: the greatest, on both kinds of feet. */
export function ownWeightShare(model: FrameModel, sized: SizedFrame): number {
  const all = combinations(model, sized.traffic, 'characteristic', sized.tendons?.parasitic ?? null);
  // To the right of every wall but the last.
  const faces = model.shape.walls.slice(0, -1).map(({ knee }) => knee + 1);
  const shares = model.cases.flatMap(({ own }, k) =>
    faces.map((node) => -own.momentKNm[node]! / worstMoment(all[k]!, node, -1).momentKNm),
  );
  return Math.min(1, Math.max(0, ...shares));
}

/** Greatest force along that strikes a wall, and its moment alone in the wall; nothing where none does. */
function struckFigures(
  { task, shape, cases }: FrameModel,
  wall: FrameModel['shape']['walls'][number],
): Record<string, number> {
  const at = shape.walls.indexOf(wall);
  const forces = (task.strikes?.[at] ?? []).map(({ alongKN }) => alongKN);
  if (forces.length === 0) return {};
  const moments = cases.flatMap(({ strikes }) =>
    strikes[at]!.flatMap(({ momentKNm }) => wall.nodes.map((node) => Math.abs(momentKNm[node]!))),
  );
  return { middleStruckKN: Math.max(...forces), middleStruckKNm: Math.max(...moments) };
}

/** Force of an earthquake along the road, and its greatest moment alone in any wall; nothing without one. */
function quakeFigures({ task, shape, cases }: FrameModel): Record<string, number> {
  const { quakeShare = 0 } = task;
  if (!(quakeShare > 0)) return {};
  const moments = cases.flatMap(({ weightAlong: { momentKNm } }) =>
    shape.walls.flatMap(({ nodes }) => nodes.map((node) => quakeShare * Math.abs(momentKNm[node]!))),
  );
  const { own, superimposed } = cases[0]!;
  const weightKN = [own, superimposed].reduce(
    (sum, { feet }) => feet.reduce((all, { verticalKN }) => all + verticalKN, sum),
    0,
  );
  return { quakeKN: quakeShare * weightKN, quakeWallKNm: Math.max(...moments) };
}

/** Named figures of shape, statics and steel. */
export function frameFigures(model: FrameModel, sized: SizedFrame): Record<string, number> {
  const { shape, task, cases, deckM3, wallM3 } = model;
  const { tendons, faces, traffic } = sized;
  const [stiff, soft] = cases;
  const middle = shape.middles[0]!;
  const [firstWall, lastWall] = [shape.walls[0]!, shape.walls[shape.walls.length - 1]!];
  const middleWall = shape.walls.find(({ name }) => name === 'middle');
  const knee = shape.knees[0] + 1;
  const sum = (values: Readonly<Record<string, number>>): number =>
    Object.values(values).reduce((total, value) => total + value, 0);
  const wallKg = sized.wallBarsKg.reduce((total, bars) => total + sum(bars), 0);
  const wallsM3 = wallM3.reduce((total, m3) => total + m3, 0);
  const concreteM3 = wallM3.reduce((total, m3) => total + m3, deckM3);
  const feet = [0, shape.walls.length - 1].flatMap((end) => footLoads(model, sized, end));
  const deckM2 = shape.lengthM * task.deck.widthM;
  const figures: Record<string, number> = {
    kneeDepthM: shape.kneeM,
    wallTopM: shape.legTopM,
    wallFootM: shape.legFootM,
    firstHeightM: firstWall.heightM,
    lastHeightM: lastWall.heightM,
    ...(middleWall
      ? {
          middleHeightM: middleWall.heightM,
          middleOwnKNm: -stiff!.own.momentKNm[middleWall.knee + 1]!,
          middleOwnSoftKNm: -soft!.own.momentKNm[middleWall.knee + 1]!,
          ...struckFigures(model, middleWall),
        }
      : {}),
    ...quakeFigures(model),
    wingM: shape.wingM,
    kneeOwnKNm: -stiff!.own.momentKNm[knee]!,
    kneeOwnSoftKNm: -soft!.own.momentKNm[knee]!,
    midspanOwnKNm: stiff!.own.momentKNm[middle]!,
    midspanOwnSoftKNm: soft!.own.momentKNm[middle]!,
    thrustOwnKN: -stiff!.own.feet[0]!.alongKN,
    thrustOwnSoftKN: -soft!.own.feet[0]!.alongKN,
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
    concreteM3M2: concreteM3 / deckM2,
    deckConcreteM3M2: deckM3 / deckM2,
    barsKgM3: sum(sized.deckBarsKg) / deckM3,
    wallBarsKgM3: wallKg / wallsM3,
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
