import {
  concrete,
  loadStandard,
  materials,
  steelYield,
  trafficOnCrossLine,
  trafficOnGirder,
  trafficOnInfluence,
  usualSteel,
  worstLaneShare,
  type CrossLine,
  type LoadStandard,
} from '../../actions/index.ts';
import { loadTrack } from '../../mechanics/index.ts';
import type { Check, DeckSpec, StandardId } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { designSlab, type SlabDesign } from '../common/slab/designSlab.ts';
import { alongSkewM } from '../common/skewPlanes.ts';
import { superimposedOn } from '../common/superimposed.ts';
import { fatigueRange } from './fatigue.ts';
import { floorBeam, type FloorBeam } from './floorBeam.ts';
import { floorData } from './floorData.ts';

/** A deck carried by cross-girders between two main planes. */
export interface FloorCase {
  readonly standard: StandardId;
  readonly deck: DeckSpec;
  /** Between the two main planes, m. */
  readonly planesM: number;
  /** Between cross-girders, m. */
  readonly crossSpacingM: number;
  /** Soffit of cross-girders to top of slab, m. */
  readonly depthM: number;
  /** True: stringers carry a slab that spans across the road. False: the slab spans from cross-girder to cross-girder. */
  readonly stringers: boolean;
  /** Skew that cross-girders run at, degrees from square, 0 or more; square when absent. */
  readonly skewDeg?: number;
  /** Design moment that frames of cross-girders and posts put into the cross-girders, kNm; 0 when absent. */
  readonly frameKNm?: number;
}

export interface Floor {
  readonly slab: SlabDesign;
  readonly crossGirder: FloorBeam;
  /** Length of a cross-girder from plane to plane, m. */
  readonly crossM: number;
  readonly stringer: FloorBeam | null;
  /** Positions across the deck, m; empty without stringers. */
  readonly stringerOffsetsM: readonly number[];
  /** Structural steel, kg per m of deck. */
  readonly steelKgPerM: number;
  readonly paintM2PerM: number;
  /** Own weight, slab and floor steel, kN per m of deck. */
  readonly slabKNm: number;
  readonly steelKNm: number;
  readonly barsKgM2: number;
  readonly checks: readonly Check[];
}

/** Room below the slab that a cross-girder is sized in when the floor leaves less; the depth check then shows it. */
export const leastSteelM = 0.3;

/**
 * Sizes slab, stringers and cross-girders of a floor as simple composite beams. Cross-girders take the standard's
 * vehicles over their influence triangle (one panel each way) and across the deck by their own bending line.
 * On a skew they carry the same loads over a length that is longer by 1 / cos: all moments grow by that. planesM 6 to 40,
 * crossSpacingM 2 to 12, skewDeg below 90.
 */
export function sizeFloor(floor: FloorCase): Floor {
  const standard = loadStandard(floor.standard);
  const grade = usualSteel(floor.standard);
  const yieldMPa = (thicknessMm: number): number => steelYield(grade, thicknessMm);
  const concreteMPa = concrete(floor.standard, materials.concreteDefaultMPa[floor.standard].slab).ecmMPa;
  const { widthM } = floor.deck;
  const count = floor.stringers ? Math.max(2, Math.ceil(widthM / floorData.stringerSpacingM.most - 1e-9)) : 0;
  const pitchM = count > 0 ? widthM / count : widthM;
  const slab = designSlab({
    standard: floor.standard,
    deck: floor.deck,
    direction: floor.stringers ? 'across' : 'along',
    spacingM: floor.stringers ? pitchM : floor.crossSpacingM,
    overhangM: floor.stringers ? pitchM / 2 : 0,
    continuous: true,
    uniform: true,
  });
  const slabKNm = slab.meanM * widthM * standard.unitWeights.concreteKNm3;
  const stringerOffsetsM = Array.from({ length: count }, (_, i) => (i + 0.5) * pitchM - widthM / 2);
  const stringer =
    count > 0 ? sizeStringer(floor, standard, slab, pitchM, stringerOffsetsM, yieldMPa, concreteMPa) : null;
  const stringersKgPerM = stringer === null ? 0 : stringer.massKgPerM * count;
  const cross = sizeCross(floor, standard, slab, slabKNm, stringersKgPerM, yieldMPa, concreteMPa);
  const crossM = alongSkewM(floor.planesM, floor.skewDeg);
  const crossKgPerM = (cross.massKgPerM * crossM) / floor.crossSpacingM;
  const steelKgPerM = crossKgPerM + stringersKgPerM;
  const checks = [
    ...slab.checks,
    check('cross-girder', `cross-girders, ${cross.governs}`, cross.utilisation, 1, '1'),
    ...(stringer === null
      ? []
      : [check('stringer', `stringers, ${stringer.governs}`, stringer.utilisation, 1, '1')]),
    check('floor-room', 'room for cross-girders below the slab', leastSteelM, floor.depthM - slab.midM, 'm'),
  ];
  return {
    slab,
    crossGirder: cross,
    crossM,
    stringer,
    stringerOffsetsM,
    steelKgPerM,
    paintM2PerM:
      (cross.paintM2PerM * crossM) / floor.crossSpacingM +
      (stringer === null ? 0 : stringer.paintM2PerM * count),
    slabKNm,
    steelKNm: (steelKgPerM * 9.81) / 1000,
    barsKgM2: slab.mainBarsKgM2 + slab.crossBarsKgM2,
    checks,
  };
}

/** What a line of stringers hangs on: the deck, the beams that carry it and the depth there is. */
export type StringerCase = Pick<FloorCase, 'standard' | 'deck' | 'crossSpacingM' | 'depthM'>;

/** Stringers `pitchM` apart at `offsetsM` across the deck, simple spans from cross-girder to cross-girder, all alike. */
export function sizeStringer(
  floor: StringerCase,
  standard: LoadStandard,
  slab: SlabDesign,
  pitchM: number,
  offsetsM: readonly number[],
  yieldMPa: (mm: number) => number,
  concreteMPa: number,
): FloorBeam {
  const spanM = floor.crossSpacingM;
  const { uls } = standard.factors;
  // Every stringer is tried under the lanes at their worst; all are then made alike.
  let moment = 0;
  let shear = 0;
  let share = 0;
  const middle = spanM / 2;
  const stations = [0, middle, spanM];
  for (const y of offsetsM.slice(0, Math.ceil(offsetsM.length / 2))) {
    const line: CrossLine = { yM: [-1e3, y - pitchM, y, y + pitchM, 1e3], value: [0, 0, 1, 0, 0] };
    const load = trafficOnCrossLine(floor.standard, floor.deck, line, shortSpanWeigh(spanM));
    moment = Math.max(moment, trafficOnInfluence(load, stations, [0, spanM / 4, 0]).max);
    shear = Math.max(shear, trafficOnInfluence(load, [0, spanM], [1, 0]).max);
    share = Math.max(share, worstLaneShare(floor.standard, floor.deck, line));
  }
  const fatigue = share * fatigueRange(floor.standard, loadTrack(stations), [0, spanM / 4, 0], spanM);
  const gamma = standard.unitWeights.concreteKNm3;
  const superimposed = (floor.deck.superimposedKNm / floor.deck.widthM) * pitchM;
  const { value, leastM } = floorData.stringerDepthOverSpan;
  const depthM = Math.max(0.25, Math.min(Math.max(leastM, value * spanM), floor.depthM - slab.midM));
  let steelKNm = 1;
  let beam: FloorBeam | null = null;
  for (let pass = 0; pass < 2; pass++) {
    const dead = slab.meanM * gamma * pitchM + steelKNm;
    const casting = dead + floorData.construction.kNm2 * pitchM;
    const eighth = spanM ** 2 / 8;
    beam = floorBeam(
      {
        spanM,
        depthM,
        slabM: slab.midM,
        slabWidthM: Math.min(pitchM, spanM / 4),
        castingKNm: uls.permanent * casting * eighth,
        slabKNm: uls.permanent * dead * eighth,
        superimposedKNm: uls.superimposed * superimposed * eighth,
        trafficKNm: uls.traffic * moment,
        shearKN: (uls.permanent * dead + uls.superimposed * superimposed) * middle + uls.traffic * shear,
        fatigueKNm: fatigue,
        trafficCharacteristicKNm: moment,
        detail: 'plain',
      },
      floor.standard,
      yieldMPa,
      concreteMPa,
    );
    steelKNm = (beam.massKgPerM * 9.81) / 1000;
  }
  return beam!;
}

function sizeCross(
  floor: FloorCase,
  standard: LoadStandard,
  slab: SlabDesign,
  slabKNm: number,
  stringersKgPerM: number,
  yieldMPa: (mm: number) => number,
  concreteMPa: number,
): FloorBeam {
  const { standard: id, deck, planesM: b, crossSpacingM: p } = floor;
  const { uls } = standard.factors;
  const alongM = alongSkewM(b, floor.skewDeg);
  const longer = alongM / b;
  const stations = [-p, 0, p];
  const triangle = [0, 1, 0];
  // A load in kN at y bends the middle by this many kNm, so the load that comes back is in kNm.
  const bending: CrossLine = { yM: [-b / 2, 0, b / 2], value: [0, b / 4, 0] };
  const load = trafficOnCrossLine(id, deck, bending, shortSpanWeigh(2 * p));
  const traffic = longer * trafficOnInfluence(load, stations, triangle).max;
  const fatigue =
    longer * worstLaneShare(id, deck, bending) * fatigueRange(id, loadTrack(stations), triangle, 2 * p);
  const shear = Math.max(
    ...[0, 1].map(
      (k) => trafficOnInfluence(trafficOnGirder(id, deck, [-b / 2, b / 2], k), stations, triangle).max,
    ),
  );
  const on = superimposedOn(deck);
  const carriageway = deck.carriagewayM;
  const edge = Math.max(0, (b - deck.widthM) / 2 + floorData.edgeArmM.value);
  const superimposedMoment =
    longer * ((on.surfacingKNm * p * (2 * b - carriageway)) / 8 + ((on.edgesKNm * p) / 2) * edge);
  const stringersKNm = (stringersKgPerM * 9.81) / 1000;
  const depthM = Math.max(leastSteelM, floor.depthM - slab.midM);
  let ownKNm = 2;
  let beam: FloorBeam | null = null;
  for (let pass = 0; pass < 2; pass++) {
    const overDeck = (slabKNm + stringersKNm) * p;
    const dead = (longer * (overDeck * (2 * b - deck.widthM))) / 8 + (ownKNm * alongM * alongM) / 8;
    const casting =
      dead + (longer * (floorData.construction.kNm2 * deck.widthM * p * (2 * b - deck.widthM))) / 8;
    beam = floorBeam(
      {
        spanM: alongM,
        depthM,
        slabM: slab.midM,
        slabWidthM: Math.min(p, b / 4),
        castingKNm: uls.permanent * casting,
        slabKNm: uls.permanent * dead,
        superimposedKNm: uls.superimposed * superimposedMoment,
        trafficKNm: uls.traffic * traffic + (floor.frameKNm ?? 0),
        shearKN:
          (uls.permanent * (overDeck + ownKNm * alongM) + uls.superimposed * on.totalKNm * p) / 2 +
          uls.traffic * shear,
        fatigueKNm: fatigue,
        trafficCharacteristicKNm: traffic,
        // Stringers or posts come in at stiffeners.
        detail: 'stiffener',
      },
      id,
      yieldMPa,
      concreteMPa,
    );
    ownKNm = (beam.massKgPerM * 9.81) / 1000;
  }
  return beam!;
}

/** On a short loaded length nearly the whole vehicle counts: one kN/m over half the length against the axles. */
function shortSpanWeigh(loadedM: number): number {
  return 1000 / loadedM;
}
