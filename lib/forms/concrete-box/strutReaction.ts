import { crossValue, loadStandard, trafficOnCrossLine, type CrossLine } from '../../actions/index.ts';
import type { DeckSpec, StandardId } from '../../model/index.ts';
import { superimposedOn } from '../common/superimposed.ts';
import type { StrutPlan } from './strutPlan.ts';

/** Middle of a barrier from the edge of the deck, m. */
const edgeArmM = 0.25;
/** Pieces of the influence line between web and strut. */
const pieces = 8;

/**
 * Influence of a load across the deck on one line of strut heads: slab of one thickness over strut, outer web and next
 * web (three moments). Negative ordinates beyond the web are left out.
 */
export function strutLine(widthM: number, { cells, spacingM, outM }: StrutPlan): CrossLine {
  const webM = (cells * spacingM) / 2;
  const yM = [-widthM / 2];
  const value = [0];
  for (let k = 0; k <= pieces; k++) {
    const fromHead = outM * (1 - k / pieces);
    const overWeb = (fromHead * (outM ** 2 - fromHead ** 2)) / (2 * outM * (outM + spacingM));
    yM.push(webM + outM - fromHead);
    value.push(Math.max(0, 1 - fromHead / outM - overWeb / outM));
  }
  const edgeM = widthM / 2;
  yM.push(edgeM);
  value.push(1 + ((edgeM - webM - outM) / outM) * (1 + outM / (2 * (outM + spacingM))));
  return { yM, value };
}

/** What one line of strut heads carries, vertical and characteristic. */
export interface StrutReaction {
  /** Per m of deck, kN/m. */
  readonly slabKNm: number;
  readonly superimposedKNm: number;
  readonly trafficKNm: number;
  /** Axles of the worst vehicles as they stand on the line, kN at m, dynamic allowance included. */
  readonly axleSets: readonly (readonly { readonly atM: number; readonly loadKN: number }[])[];
}

/** Loads on a strut line under a slab of `thicknessM`, lanes at their worst for struts at `strutSpacingM` along the deck. */
export function strutReaction(
  id: StandardId,
  deck: DeckSpec,
  plan: StrutPlan,
  thicknessM: number,
  strutSpacingM: number,
): StrutReaction {
  return lineReaction(id, deck, strutLine(deck.widthM, plan), thicknessM, strutSpacingM);
}

/**
 * What a member takes of loads across the deck by its influence line, under a slab of `thicknessM`; members stand `apartM`
 * along the deck. Of a line of moments the loads come out in kNm.
 */
export function lineReaction(
  id: StandardId,
  deck: DeckSpec,
  line: CrossLine,
  thicknessM: number,
  apartM: number,
): StrutReaction {
  const standard = loadStandard(id);
  const { surfacingKNm2, edgesKNm } = superimposedOn(deck);
  const areaM = integral(line);
  const mirrored: CrossLine = {
    yM: line.yM.map((y) => -y).reverse(),
    value: [...line.value].reverse(),
  };
  const weightOf = (axles: readonly { readonly loadKN: number }[]): number =>
    axles.reduce((sum, { loadKN }) => sum + loadKN, 0);
  const perM = Math.max(...standard.vehicles.map(({ axles }) => weightOf(axles))) / apartM;
  const sides = deck.carriagewayOffsetM === 0 ? [line] : [line, mirrored];
  const traffic = sides
    .map((side) => trafficOnCrossLine(id, deck, side, perM))
    .reduce((a, b) =>
      b.vehicleFactor * perM + b.udlKNm + b.footwayKNm > a.vehicleFactor * perM + a.udlKNm + a.footwayKNm
        ? b
        : a,
    );
  const dynamic = traffic.vehicleFactor * (1 + standard.dynamicAllowance);
  return {
    slabKNm: standard.unitWeights.concreteKNm3 * thicknessM * areaM,
    superimposedKNm: surfacingKNm2 * areaM + (edgesKNm / 2) * crossValue(line, deck.widthM / 2 - edgeArmM),
    trafficKNm: traffic.udlKNm + traffic.footwayKNm,
    axleSets: standard.vehicles.map(({ axles }) =>
      axles.map(({ atM, loadKN }) => ({ atM, loadKN: dynamic * loadKN })),
    ),
  };
}

function integral({ yM, value }: CrossLine): number {
  let sum = 0;
  for (let i = 1; i < yM.length; i++) sum += ((value[i - 1]! + value[i]!) / 2) * (yM[i]! - yM[i - 1]!);
  return sum;
}

/** Steps in which a vehicle is moved along a strut line, per strut spacing. */
const steps = 20;

/** Most that the axles of one vehicle make of an influence along the line, given from -`reachM` to `reachM`. */
export function worstAxles(
  { axleSets }: Pick<StrutReaction, 'axleSets'>,
  reachM: number,
  influence: (xM: number) => number,
): number {
  let most = 0;
  for (const axles of axleSets)
    for (const { atM: firstM } of axles)
      for (let i = -steps; i <= steps; i++) {
        const offsetM = (i * reachM) / steps - firstM;
        let sum = 0;
        for (const { atM, loadKN } of axles) sum += loadKN * influence(atM + offsetM);
        most = Math.max(most, sum);
      }
  return most;
}
