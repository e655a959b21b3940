import type { Articulation, BillPart, MeasuredLine, PierShaft, Support, Zone } from '../model/index.ts';
import { bearingKind } from './bearingKind.ts';
import { substructureData } from './data.ts';
import type { SupportAsk } from './supportAsk.ts';

/** Design vertical load of a support, MN: permanent and traffic with their factors. */
export function designLoadMN(ask: Pick<SupportAsk, 'permanentKN' | 'trafficKN'>): number {
  const { permanent, traffic } = substructureData.factors;
  return Math.max(0, permanent * ask.permanentKN + traffic * ask.trafficKN) / 1000;
}

/**
 * Design load of the bearings of a support, MN: on a skew all are made like the one at the obtuse corner, by the published
 * factor on traffic or by the twist of the skew ends, whichever asks for more: they tell of the same shift.
 */
function bearingLoadMN(ask: SupportAsk): number {
  const cornerMN = designLoadMN({ ...ask, trafficKN: (ask.obtuseCorner ?? 1) * ask.trafficKN });
  const pressKN = ask.bearings > 0 ? (ask.skewPressKN ?? 0) : 0;
  return Math.max(cornerMN, designLoadMN(ask) + pressKN / 1000);
}

/** Design uplift, kN, 0 where the support stays pressed: 0.95 of the permanent load against the factored least traffic. */
export function upliftKN(ask: Pick<SupportAsk, 'permanentKN' | 'trafficLeastKN'>): number {
  const { permanent, favourable, traffic } = substructureData.factors;
  const held = ask.permanentKN >= 0 ? favourable * ask.permanentKN : permanent * ask.permanentKN;
  return Math.max(0, -(held + traffic * Math.min(0, ask.trafficLeastKN)));
}

/** Elements of an expansion joint of 80 mm each for a movement, mm; 0 where there is none. */
function jointElements(movementMm: number): number {
  return Math.ceil(movementMm / substructureData.movement.jointGroupMm - 1e-9);
}

/** How the deck is held at a support, wind across given. */
export function articulationOf(
  ask: SupportAsk,
  acrossKN: number,
  vesselKN: number | null = null,
): Articulation {
  const bearingMN = bearingLoadMN(ask);
  return {
    fixed: ask.fixed,
    bearings: ask.bearings,
    bearingMN,
    alongKN: ask.alongKN,
    acrossKN,
    jointMovementMm: ask.jointMovementMm,
    tieDownKN: upliftKN(ask),
    ...(ask.bearings > 0 ? { bearingKind: bearingKind(ask.bearingMovementMm, bearingMN, ask.bearings) } : {}),
    ...(vesselKN === null ? {} : { vesselKN }),
    ...(ask.building ? { buildingKNm: ask.building.momentKNm } : {}),
  };
}

/** Bearings, joint and tie-down of a support whose line is `alongM` long under the deck, m. */
export function articulationLines(ask: SupportAsk, alongM: number): MeasuredLine[] {
  const lines: MeasuredLine[] = [];
  const load = bearingLoadMN(ask);
  if (load > 0 && ask.bearings > 0) {
    const kind = bearingKind(ask.bearingMovementMm, load, ask.bearings);
    const how = `${ask.bearings} ${kind} bearings, ${load.toFixed(1)} MN together, moving ${Math.round(ask.bearingMovementMm)} mm`;
    lines.push(line(ask, 'bearings-joints', 'bearing', load, `${ask.name} bearings`, how));
  }
  const elements = jointElements(ask.jointMovementMm);
  if (elements > 0) {
    const how = `${Math.round(ask.jointMovementMm)} mm: ${elements} elements over ${Number(alongM.toFixed(2))} m`;
    lines.push(line(ask, 'bearings-joints', 'expansion-joint', elements * alongM, `${ask.name} joint`, how));
  }
  const uplift = upliftKN(ask) * substructureData.bearings.tieDownShare;
  if (uplift > 0) {
    const how = `design uplift ${Math.round(uplift)} kN`;
    lines.push(line(ask, 'bearings-joints', 'tie-down', uplift / 1000, `${ask.name} tie-down`, how));
  }
  return lines;
}

/** Concrete and bars of a shaft or of the walls of an abutment. */
export function shaftLines(
  ask: SupportAsk,
  shaft: PierShaft,
  part: BillPart,
  item: string,
  how: string,
): MeasuredLine[] {
  if (!(shaft.concreteM3 > 0)) return [];
  return [
    line(ask, part, item, shaft.concreteM3, `${ask.name} shaft`, how),
    line(ask, part, 'reinforcement', shaft.reinforcementKg, `${ask.name} shaft`, 'by published ratio'),
  ];
}

/** Platform or barge to reach a support in water. */
export function waterAccessLines(ask: SupportAsk, waterDepthM: number): MeasuredLine[] {
  if (!(waterDepthM > 0)) return [];
  const how = `${waterDepthM.toFixed(1)} m of water`;
  return [line(ask, 'river-works', 'water-access', 1, `${ask.name} access over water`, how)];
}

/** What a support costs besides itself for each stretch it stands in where the brief would rather have none. */
export function softZoneLines(ask: SupportAsk, soft: readonly Zone[]): MeasuredLine[] {
  return soft.map(({ name, pierPremium }) => {
    const what = `${ask.name} in ${name}`;
    const how = 'consents, protection and access where supports had better not stand';
    return pierPremium === undefined
      ? line(ask, 'piers', 'soft-stretch-support', 1, what, `${how}; the brief names no sum`)
      : line(ask, 'piers', 'soft-stretch-sum', pierPremium, what, `${how}; sum of the brief`);
  });
}

/**
 * All lines of a support, its foundations weighed by the odds of the ground.
 * For orders of magnitude and the cost table; the simulation draws one class per stretch instead.
 */
export function expectedLines(support: Support): MeasuredLine[] {
  return [
    ...support.lines,
    ...support.foundations.flatMap((foundation) =>
      foundation.lines.map((l) => ({ ...l, quantity: l.quantity * foundation.odds })),
    ),
  ];
}

/**
 * Money of the foundations of a support, weighed by the odds of the ground: that of their lines in `expectedLines`, without
 * writing them out. `costOf` is in proportion to quantities.
 */
export function foundationsCost(
  { foundations }: Pick<Support, 'foundations'>,
  costOf: (lines: readonly MeasuredLine[]) => number,
): number {
  return foundations.reduce((sum, { odds, lines }) => sum + odds * costOf(lines), 0);
}

/** One measured line of a support, with the support's index where it has one. */
export function line(
  ask: Pick<SupportAsk, 'index'>,
  part: BillPart,
  item: string,
  quantity: number,
  what: string,
  how: string,
): MeasuredLine {
  return { part, item, quantity, what, how, ...(ask.index === undefined ? {} : { support: ask.index }) };
}
