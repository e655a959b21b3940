import type { DeckSpec, StandardId } from '../model/index.ts';
import { aashtoFactors, outerCorrection, type GirderDeck } from './aashtoFactors.ts';
import type { CrossLine } from './crossLine.ts';
import { leverRule } from './leverRule.ts';
import { loadStandard } from './loadStandard.ts';
import { leftKerbM } from './trafficOnDeck.ts';
import { atObtuseCorner, girderCorner } from './obtuseCorner.ts';
import type { TrafficLoad } from './trafficLoad.ts';
import { trafficOnCrossLine } from './trafficOnCrossLine.ts';

/** What the AASHTO factors need besides the girder lines; without it a rigid crossbeam is taken. */
export type GirderOptions = Pick<GirderDeck, 'spanM' | 'slabM' | 'kgM4' | 'skewDeg'>;

/**
 * Traffic on one girder of a deck. Two girders: lever rule. More: rigid crossbeam; under AASHTO, with `options` and
 * inside their validity, the distribution factors for an inner girder, and for an outer one the worst of its corrected
 * factor, the lever rule with one lane and the rigid crossbeam (4.6.2.2.2d). With `options` shears of a skew deck are those
 * at its obtuse corner, by the AASHTO factor under either standard; only the AASHTO factors take less moment for a skew.
 * @param girderOffsetsM girder lines, m from the middle of the deck, rising
 * @param girder which of them
 * @throws RangeError for fewer than two girders or one that is not there
 */
export function trafficOnGirder(
  id: StandardId,
  deck: DeckSpec,
  girderOffsetsM: readonly number[],
  girder: number,
  options?: GirderOptions,
): TrafficLoad {
  const n = girderOffsetsM.length;
  if (!(n >= 2)) throw new RangeError(`girderOffsetsM: expected two girders or more, received ${n}`);
  if (!(girder >= 0 && girder < n)) {
    throw new RangeError(`girder: expected 0 to ${n - 1}, received ${girder}`);
  }
  const standard = loadStandard(id);
  const corner = options ? girderCorner(options, options.skewDeg ?? 0) : 1;
  const rigid = atObtuseCorner(placedOn(id, deck, rigidCrossbeam(girderOffsetsM, girder)), corner);
  if (n === 2) return { ...rigid, distribution: 'lever rule' };
  if (!standard.distributionFactors || !options) return rigid;

  const outer = girder === 0 || girder === n - 1;
  const spacingM = (girderOffsetsM[n - 1]! - girderOffsetsM[0]!) / (n - 1);
  const inner = aashtoFactors({ ...options, spacingM, girders: n });
  const edge = outer ? outerCorrection(kerbBeyond(deck, girderOffsetsM, girder)) : null;
  if (inner.outside.length > 0 || (edge && edge.outside.length > 0)) return rigid;
  let { moment } = inner;
  let shear = inner.shear / corner;
  if (edge) {
    const lever = placedOn(id, deck, leverRule(girderOffsetsM, girder), 1);
    const least = Math.max(lever.vehicleFactor, rigid.vehicleFactor);
    moment = Math.max(moment * edge.moment, least);
    shear = Math.max(shear * edge.shear, least);
  }
  return {
    ...rigid,
    vehicleFactor: moment,
    udlKNm: moment * standard.lanes.uniformKNm2[0]! * standard.lanes.loadedWidthM,
    shearRatio: shear / moment,
    distribution: 'AASHTO factors',
  };
}

function placedOn(id: StandardId, deck: DeckSpec, line: CrossLine, mostLanes?: number): TrafficLoad {
  return { ...trafficOnCrossLine(id, deck, line, undefined, mostLanes), distribution: 'rigid crossbeam' };
}

/** From the outer girder to the kerb beyond it, m; negative when the kerb stands inside. */
function kerbBeyond(deck: DeckSpec, girderOffsetsM: readonly number[], girder: number): number {
  const left = leftKerbM(deck);
  const y = girderOffsetsM[girder]!;
  return girder === 0 ? y - left : left + deck.carriagewayM - y;
}

/**
 * Share of girder i of a unit load at y when the crossbeam stays straight and girders are equal:
 * 1/n + e_i (y - mean) / sum e2. For two girders it is the lever rule.
 */
export function rigidCrossbeam(girderOffsetsM: readonly number[], girder: number): CrossLine {
  const n = girderOffsetsM.length;
  const mean = girderOffsetsM.reduce((sum, y) => sum + y, 0) / n;
  const second = girderOffsetsM.reduce((sum, y) => sum + (y - mean) ** 2, 0);
  const arm = girderOffsetsM[girder]! - mean;
  const at = (y: number): number => 1 / n + (arm * (y - mean)) / second;
  const yM = [mean - 1, mean + 1];
  return { yM, value: yM.map(at) };
}
