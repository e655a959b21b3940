import type { DeckSpec, StandardId } from '../../../model/index.ts';
import type { LoadStandard } from '../../../actions/index.ts';
import { slabData } from './slabData.ts';
import { stripInfluence } from './stripInfluence.ts';

/** What the wheels need to know of a slab; see `SlabCase`. */
export interface WheeledSlab {
  readonly standard: StandardId;
  readonly deck: DeckSpec;
  readonly direction: 'across' | 'along';
  readonly spacingM: number;
  readonly overhangM: number;
}

/** Heaviest axles of a standard: wheel load with dynamic allowance, and where equal axles stand from the first, m. */
interface HeavyAxles {
  readonly wheelKN: number;
  readonly atM: readonly number[];
}

const steps = 28;

/**
 * Characteristic traffic moment at the middle of a simply supported slab strip, kNm/m: wheels of as many lanes as
 * stand on the span, slid across (or along) it, plus the uniform lane load.
 */
export function spanTraffic(slab: WheeledSlab, standard: LoadStandard): number {
  const span = slab.spacingM;
  const axles = heaviestAxles(standard);
  const uniform = uniformMoment(slab, standard);
  return (
    uniform +
    (slab.direction === 'across' ? acrossSpan(slab, standard, axles) : alongSpan(slab, standard, axles, span))
  );
}

/** Wheels of lanes side by side on a slab that spans across the road; axles stand in a row along its supports. */
function acrossSpan(slab: WheeledSlab, standard: LoadStandard, axles: HeavyAxles): number {
  const span = slab.spacingM;
  const spread = spreadM(slab);
  const patch = slabData.wheelPatchM[slab.standard];
  const row = { alongM: axles.atM, sideAlongM: patch.alongM + spread, sideSpanM: patch.acrossM + spread };
  const line = stripInfluence(span, span / 2, row, slabData.poisson.value, steps);
  const { wheelGaugeM } = standard.lanes;
  const pitch = wheelGaugeM + slabData.wheelGapM[slab.standard];
  const lanes = Math.max(1, Math.floor(slab.deck.carriagewayM / standard.lanes.widthM));
  let most = 0;
  for (let loaded = 1; loaded <= lanes; loaded++) {
    const presence = presenceOf(standard, loaded);
    for (let i = -steps; i <= steps; i++) {
      const first = (i * span) / steps;
      let moment = 0;
      for (let lane = 0; lane < loaded; lane++) {
        const share = (standard.lanes.vehicleShare[lane] ?? lastShare(standard, lane)) * axles.wheelKN;
        const wheel = first + lane * pitch;
        moment += share * (at(line, wheel / span) + at(line, (wheel + wheelGaugeM) / span));
      }
      most = Math.max(most, presence * moment);
    }
    if (loaded * pitch > span + pitch) break;
  }
  return most;
}

/** Axles one behind the other on a slab that spans along the road; the wheels of the lanes stand in rows. */
function alongSpan(slab: WheeledSlab, standard: LoadStandard, axles: HeavyAxles, span: number): number {
  const spread = spreadM(slab);
  const patch = slabData.wheelPatchM[slab.standard];
  const { wheelGaugeM } = standard.lanes;
  const gap = slabData.wheelGapM[slab.standard];
  const sides = { sideAlongM: patch.acrossM + spread, sideSpanM: patch.alongM + spread };
  const own = stripInfluence(
    span,
    span / 2,
    { alongM: [0, wheelGaugeM], ...sides },
    slabData.poisson.value,
    steps,
  );
  const next = stripInfluence(
    span,
    span / 2,
    { alongM: [gap, gap + wheelGaugeM], ...sides },
    slabData.poisson.value,
    steps,
  );
  const secondShare =
    slab.deck.carriagewayM >= 2 * standard.lanes.widthM ? (standard.lanes.vehicleShare[1] ?? 1) : 0;
  let most = 0;
  for (let i = 0; i <= steps; i++) {
    let one = 0;
    let two = 0;
    for (const behind of axles.atM) {
      const position = i / steps + behind / span;
      one += at(own, position);
      two += at(next, position);
    }
    most = Math.max(
      most,
      presenceOf(standard, 1) * axles.wheelKN * one,
      presenceOf(standard, 2) * axles.wheelKN * (one + secondShare * two),
    );
  }
  return most;
}

/**
 * Characteristic traffic moment at the root of an overhang, kNm/m: each wheel on its strip
 * (`cantileverStripM`), wheels of a second axle that stands within the strip on a strip widened by its distance.
 */
export function overhangTraffic(slab: WheeledSlab, standard: LoadStandard): number {
  const { deck } = slab;
  const axles = heaviestAxles(standard);
  const kerb = (deck.widthM - deck.carriagewayM) / 2 - Math.abs(deck.carriagewayOffsetM);
  const onCarriageway = slab.overhangM - Math.max(0, kerb);
  let moment = ((standard.lanes.uniformKNm2[0] ?? 0) * Math.max(0, onCarriageway) ** 2) / 2;
  const first = onCarriageway - slabData.wheelFromKerbM[slab.standard];
  for (let arm = first; arm > 0; arm -= standard.lanes.wheelGaugeM) {
    const strip = slabData.cantileverStripM.fixed + slabData.cantileverStripM.perM * arm;
    const near = axles.atM.filter((x) => x <= strip);
    const width = strip + (near[near.length - 1] ?? 0);
    moment += (presenceOf(standard, 1) * axles.wheelKN * near.length * arm) / width;
  }
  return moment;
}

function uniformMoment(slab: WheeledSlab, standard: LoadStandard): number {
  const span = slab.spacingM;
  const [first = 0] = standard.lanes.uniformKNm2;
  if (slab.direction === 'along') return (first * span * span) / 8;
  const other = standard.lanes.uniformKNm2[1] ?? standard.lanes.furtherUniformKNm2;
  const lane = Math.min(standard.lanes.loadedWidthM, span);
  return (other * span * span) / 8 + (first - other) * lane * (span / 4 - lane / 8);
}

function heaviestAxles(standard: LoadStandard): HeavyAxles {
  let load = 0;
  let atM: number[] = [];
  for (const vehicle of standard.vehicles) {
    const heaviest = Math.max(...vehicle.axles.map((axle) => axle.loadKN));
    if (heaviest <= load) continue;
    load = heaviest;
    const equal = vehicle.axles.filter((axle) => axle.loadKN === heaviest).map((axle) => axle.atM);
    atM = equal.map((x) => x - equal[0]!);
  }
  const [adjustment = 1] = standard.lanes.adjustment.vehicle;
  return { wheelKN: (load / 2) * adjustment * (1 + standard.dynamicAllowance), atM };
}

/** Contact patch widened at 45 degrees through the surfacing and to the middle of a slab of span/28. */
function spreadM(slab: WheeledSlab): number {
  return 2 * slab.deck.surfacingM + slab.spacingM / slabData.spanOverThickness.value;
}

function presenceOf(standard: LoadStandard, lanes: number): number {
  const { multiplePresence } = standard.lanes;
  return multiplePresence[Math.min(lanes, multiplePresence.length) - 1] ?? 1;
}

/** Lanes past the list carry no vehicle where the shares fall off, and the same vehicle where every lane has one. */
function lastShare(standard: LoadStandard, lane: number): number {
  const { vehicleShare } = standard.lanes;
  return vehicleShare.length === 1 ? vehicleShare[0]! : (vehicleShare[lane] ?? 0);
}

function at(line: Float64Array, share: number): number {
  if (!(share > 0 && share < 1)) return 0;
  const position = share * steps;
  const i = Math.floor(position);
  return line[i]! + (position - i) * (line[i + 1]! - line[i]!);
}
