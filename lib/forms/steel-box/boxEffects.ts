import { trafficEnvelope, trafficOnInfluence, type TrafficEnvelope } from '../../actions/index.ts';
import {
  bredt,
  deflectionInfluence,
  lineBeam,
  loadTrack,
  momentInfluence,
  stepped,
  uniform,
  type Effects,
  type LineBeam,
  type Track,
} from '../../mechanics/index.ts';
import { atSupports, skewTorques, type TwistedDeck } from '../common/skewTorque.ts';
import { curveTorque } from '../composite-box/tubTorsion.ts';
import { fatigueRange } from '../floor/fatigue.ts';
import { cantileveredSpans, erection, type ErectionMoments } from './erection.ts';
import { bottomWidth } from './boxLayout.ts';
import { boxSection, noSection, type BoxPlates } from './boxSection.ts';
import { steelBoxData } from './steelBoxData.ts';
import { elementsPerSpan, type SteelBoxModel } from './steelBoxModel.ts';

/** Forces on the whole box with one set of plates. */
export interface BoxEffects extends ErectionMoments {
  readonly beam: LineBeam;
  /** Weight of the steel as it stays after erection, superimposed load, traffic; characteristic. */
  readonly own: Effects;
  readonly superimposed: Effects;
  readonly traffic: TrafficEnvelope;
  /** Deflection under traffic over its limit, by span. */
  readonly deflections: readonly number[];
  /** Design moments of the finished bridge at the stations, kNm: greatest sagging (0 or more) and hogging (0 or less). */
  readonly sagKNm: Float64Array;
  readonly hogKNm: Float64Array;
  /** Design shear of the whole box and design torque, by element. */
  readonly shearKN: Float64Array;
  readonly torqueKNm: Float64Array;
  /** Torque of curvature in plan: greatest, and what it brings to every support, kNm. */
  readonly curveKNm: number;
  readonly curveAtKNm: readonly number[];
  /** Design torque of skew ends, greatest, and what it brings to every support, kNm; 0 on square supports. */
  readonly skewKNm: number;
  readonly skewAtKNm: readonly number[];
  /** Moment range of one lorry equivalent to the whole traffic, kNm at the stations. */
  readonly rangeKNm: Float64Array;
}

const section = noSection();
/** Poisson's ratio of steel (EN 1993-1-1 3.2.6, from memory). */
const steelPoisson = 0.3;

/** Bending stiffness along the box, straight between stations. */
function stiffness(model: SteelBoxModel, plates: BoxPlates): (xM: number) => number {
  const { xM, modulusKNm2 } = model;
  const last = xM.length - 1;
  const at = (i: number, e: number): number =>
    boxSection(
      section,
      model,
      i,
      plates.deckM[e]!,
      plates.webM[e]!,
      plates.bottomM[e]!,
      plates.pressed[e] === 1,
      0,
    ).inertiaM4;
  const ei = Float64Array.from(
    xM,
    (_, i) => (modulusKNm2 * (at(i, Math.max(0, i - 1)) + at(i, Math.min(last - 1, i)))) / 2,
  );
  return (x) => {
    let low = 0;
    let high = last;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (xM[middle]! <= x) low = middle;
      else high = middle;
    }
    const share = Math.min(1, Math.max(0, (x - xM[low]!) / (xM[high]! - xM[low]!)));
    return ei[low]! + share * (ei[high]! - ei[low]!);
  };
}

const tracks = new WeakMap<Float64Array, Track>();

function trackOf(beam: LineBeam): Track {
  const known = tracks.get(beam.xM);
  if (known) return known;
  const made = loadTrack(beam.xM);
  tracks.set(beam.xM, made);
  return made;
}

/**
 * Weight, superimposed load and traffic on the stiffness of the plates. Cantilevered spans are closed free of force in
 * their middle: their own weight stays as on a beam with hinges there, as steel does not creep; a launched or propped
 * box carries it as one beam.
 * @param ownKNm weight of the steel by element, kN/m
 * @param before effects whose forces of traffic are kept, where the plates have hardly changed since; its deflections are not
 */
export function boxEffects(
  model: SteelBoxModel,
  plates: BoxPlates,
  ownKNm: Float64Array,
  before: BoxEffects | null,
): BoxEffects {
  const { task, supportsM, standard, xM } = model;
  const { spansM } = task;
  const { uls } = standard.factors;
  const geometry = { spansM, stationsPerSpan: elementsPerSpan, eiKNm2: stiffness(model, plates) };
  const beam = lineBeam(geometry);
  const closed = cantileveredSpans(model);
  const hingesM = closed.map((span) => supportsM[span]! + spansM[span]! / 2);
  const staged = closed.length > 0 ? lineBeam({ ...geometry, hingesM }) : beam;
  const own = stepped(staged, ownKNm);
  const superimposed = uniform(beam, task.deck.superimposedKNm);
  const traffic = before?.traffic ?? trafficEnvelope(beam, model.traffic, { deflection: false });
  const n = xM.length;
  const sagKNm = new Float64Array(n);
  const hogKNm = new Float64Array(n);
  const designKNm = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    const steel = own.momentKNm[i]!;
    const laid = superimposed.momentKNm[i]!;
    const factored = (kNm: number, helps: boolean): number =>
      kNm * (helps ? uls.permanentFavourable : uls.permanent);
    const laidFactored = (kNm: number, helps: boolean): number =>
      kNm * (helps ? uls.superimposedFavourable : uls.superimposed);
    const sag =
      factored(steel, steel < 0) + laidFactored(laid, laid < 0) + uls.traffic * traffic.momentMaxKNm[i]!;
    const hog =
      factored(steel, steel > 0) + laidFactored(laid, laid > 0) + uls.traffic * traffic.momentMinKNm[i]!;
    sagKNm[i] = Math.max(0, sag);
    hogKNm[i] = Math.min(0, hog);
    designKNm[i] = sag > -hog ? sag : hog;
  }
  const stage = erection(model, staged, own, ownKNm, hingesM);
  return {
    beam,
    own,
    superimposed,
    traffic,
    deflections: deflections(model, beam),
    sagKNm,
    hogKNm,
    ...stage,
    shearKN: designShear(model, own, superimposed, traffic),
    ...torques(
      model,
      designKNm,
      (task.skewDeg ?? 0) === 0
        ? task.spansM.map(() => 0)
        : skewTorques(
            twistedDeck(model, plates),
            skewMoments(model, own, superimposed, traffic),
            task.skewDeg!,
          ),
    ),
    rangeKNm: before?.rangeKNm ?? lorryRange(model, beam),
  };
}

/** Deflection of every span under traffic over its limit, at its middle and in end spans a little towards the end. */
function deflections({ task, standard, traffic }: SteelBoxModel, beam: LineBeam): number[] {
  const { spansM } = task;
  const last = spansM.length - 1;
  const track = trackOf(beam);
  const loads = standard.deflection.combinations.map((share) => ({
    ...traffic,
    vehicleFactor: traffic.vehicleFactor * share.vehicle,
    udlKNm: traffic.udlKNm * share.uniform,
    footwayKNm: traffic.footwayKNm * share.uniform,
  }));
  return spansM.map((spanM, span) => {
    const towards = last === 0 ? 0 : span === 0 ? -1 : span === last ? 1 : 0;
    const station = span * elementsPerSpan + elementsPerSpan / 2 + towards;
    const line = deflectionInfluence(beam, station);
    const most = Math.max(...loads.map((load) => trafficOnInfluence(load, track, line).max));
    return (most * standard.deflection.limitRatio) / spanM;
  });
}

/** Greatest design shear over the ends of every element and the signs of traffic, kN. */
function designShear(
  { standard, elementM }: SteelBoxModel,
  own: Effects,
  superimposed: Effects,
  traffic: TrafficEnvelope,
): Float64Array {
  const { uls } = standard.factors;
  return elementM.map((_, e) => {
    const right = uls.permanent * own.shearRightKN[e]! + uls.superimposed * superimposed.shearRightKN[e]!;
    const left =
      uls.permanent * own.shearLeftKN[e + 1]! + uls.superimposed * superimposed.shearLeftKN[e + 1]!;
    return Math.max(
      Math.abs(right + uls.traffic * traffic.shearMaxKN[e]!),
      Math.abs(right + uls.traffic * traffic.shearMinKN[e]!),
      Math.abs(left + uls.traffic * traffic.shearMaxKN[e + 1]!),
      Math.abs(left + uls.traffic * traffic.shearMinKN[e + 1]!),
    );
  });
}

/** Bending and twisting stiffness of the elements, the box closed by its outer webs (Bredt). */
function twistedDeck(model: SteelBoxModel, plates: BoxPlates): TwistedDeck {
  const { layout, elementM, elementDepthM, modulusKNm2, task } = model;
  const gModulusKNm2 = modulusKNm2 / (2 * (1 + steelPoisson));
  const eiKNm2 = new Float64Array(elementM.length);
  const gjKNm2 = elementM.map((_, e) => {
    const [deckM, webM, bottomM] = [plates.deckM[e]!, plates.webM[e]!, plates.bottomM[e]!];
    for (const i of [e, e + 1])
      eiKNm2[e]! +=
        (modulusKNm2 *
          boxSection(section, model, i, deckM, webM, bottomM, plates.pressed[e] === 1, 0).inertiaM4) /
        2;
    const heightM = elementDepthM[e]!;
    const soffitM = bottomWidth(layout, heightM);
    return (
      gModulusKNm2 *
      bredt(((layout.topM + soffitM) / 2) * heightM, [
        { lengthM: layout.topM, thicknessM: deckM },
        { lengthM: 2 * layout.slant * heightM, thicknessM: webM },
        { lengthM: soffitM, thicknessM: bottomM },
      ])
    );
  });
  return {
    elementM,
    eiKNm2,
    gjKNm2,
    supportAt: Array.from({ length: task.spansM.length + 1 }, (_, j) => j * elementsPerSpan),
  };
}

/** Design moments that slope the ends: own weight as if its bearings were there from the start, which is on the safe side. */
function skewMoments(
  { standard, xM }: SteelBoxModel,
  own: Effects,
  superimposed: Effects,
  traffic: TrafficEnvelope,
): Float64Array {
  const { uls } = standard.factors;
  return xM.map(
    (_, i) =>
      uls.permanent * own.momentKNm[i]! +
      uls.superimposed * superimposed.momentKNm[i]! +
      uls.traffic * traffic.momentMaxKNm[i]!,
  );
}

/**
 * Design torques of a box held against turning at every support: eccentric traffic, M / R of a curve in plan, and the
 * twist of skew ends (by span).
 */
function torques(
  { task, standard, torsion }: SteelBoxModel,
  designKNm: Float64Array,
  skewBySpanKNm: readonly number[],
): Pick<BoxEffects, 'torqueKNm' | 'curveKNm' | 'curveAtKNm' | 'skewKNm' | 'skewAtKNm'> {
  const uniformKNm = torsion.udlTorqueKNmPerM + torsion.footwayTorqueKNmPerM;
  const torqueKNm = new Float64Array(designKNm.length - 1);
  const curveAtKNm = new Array<number>(task.spansM.length + 1).fill(0);
  let curveKNm = 0;
  task.spansM.forEach((spanM, span) => {
    const from = span * elementsPerSpan;
    const lengthM = spanM / elementsPerSpan;
    const curve = curveTorque(
      designKNm.subarray(from, from + elementsPerSpan + 1),
      lengthM,
      task.planRadiusM,
    );
    curveAtKNm[span]! += Math.abs(curve[0]!);
    curveAtKNm[span + 1]! += Math.abs(curve[elementsPerSpan]!);
    for (let e = 0; e < elementsPerSpan; e++) {
      const rest = (spanM - Math.min(e, elementsPerSpan - 1 - e) * lengthM) / spanM;
      const traffic = torsion.vehicleTorqueKNm * rest + (uniformKNm * spanM * rest ** 2) / 2;
      const bent = Math.max(Math.abs(curve[e]!), Math.abs(curve[e + 1]!));
      curveKNm = Math.max(curveKNm, bent);
      torqueKNm[from + e] = standard.factors.uls.traffic * traffic + bent + Math.abs(skewBySpanKNm[span]!);
    }
  });
  return {
    torqueKNm,
    curveKNm,
    curveAtKNm,
    skewKNm: Math.max(...skewBySpanKNm.map(Math.abs)),
    skewAtKNm: atSupports(skewBySpanKNm),
  };
}

/** Every fourth station is run, the rest lie straight between. */
function lorryRange({ id, task }: SteelBoxModel, beam: LineBeam): Float64Array {
  const stride = elementsPerSpan / 4;
  const { spansM } = task;
  const n = beam.xM.length;
  const range = new Float64Array(n);
  const track = trackOf(beam);
  for (let s = stride; s < n - 1; s += stride) {
    const span = Math.floor(s / elementsPerSpan);
    const lengthM = s % elementsPerSpan === 0 ? (spansM[span - 1]! + spansM[span]!) / 2 : spansM[span]!;
    range[s] = steelBoxData.lorryLanes.value * fatigueRange(id, track, momentInfluence(beam, s), lengthM);
  }
  for (let s = 0; s < n; s++) {
    const before = s - (s % stride);
    if (before === s) continue;
    range[s] = range[before]! + ((range[before + stride]! - range[before]!) * (s - before)) / stride;
  }
  return range;
}
