import {
  loadStandard,
  rigidCrossbeam,
  trafficOnGirder,
  trafficOnInfluence,
  worstLaneShare,
  type LoadStandard,
  type TrafficLoad,
} from '../../actions/index.ts';
import { loadTrack, type Track } from '../../mechanics/index.ts';
import type { UnitTask } from '../../model/index.ts';
import { sizeFloor, type Floor, type FloorCase } from '../floor/sizeFloor.ts';
import { cableData } from './cableData.ts';
import { cableModel, type CableModel } from './cableModel.ts';
import { deckSections, deckZones, type DeckZone } from './deckZones.ts';
import { sizeEdgeGirder, type EdgeCase, type EdgeGirder } from './sizeEdgeGirder.ts';
import { sizePylon, type SizedPylon } from './sizePylon.ts';
import {
  sizeStays,
  stayMassKg,
  stayRangeLimitMPa,
  stayStiffness,
  stayTraffic,
  type SizedStay,
  type StayTraffic,
} from './sizeStays.ts';
import { skewEndFloor } from './skewEnds.ts';
import { lastingForces, type LastingForces } from './stayForces.ts';
import { stayLayout, usualPylons, type StayLayout } from './stayLayout.ts';

/** Everything sized of a cable-stayed unit. */
export interface SizedBridge {
  readonly standard: LoadStandard;
  readonly layout: StayLayout;
  readonly planesM: number;
  readonly floor: Floor;
  /** Floor at the skew ends; null on square supports. */
  readonly endFloor: Floor | null;
  readonly traffic: TrafficLoad;
  readonly lasting: LastingForces;
  readonly stays: readonly SizedStay[];
  readonly zones: readonly DeckZone[];
  readonly girders: readonly EdgeGirder[];
  readonly pylons: readonly SizedPylon[];
  readonly belowM: readonly number[];
  readonly model: CableModel;
  readonly track: Track;
  /** Lasting load of one plane, kN/m, and the part of it that is self-weight. */
  readonly loadKNm: number;
  readonly selfKNm: number;
}

const mostPasses = 4;

/**
 * Sizes stays, edge girders and pylons of a cable-stayed unit, plane by plane. Passes until the lasting load moves by
 * less than 0.5 %: lasting forces from the weights of the pass before, traffic by influence lines of the deck on its stays
 * with the stiffnesses of the pass before.
 */
export function sizePlane(task: UnitTask): SizedBridge {
  const standard = loadStandard(task.standard);
  const { deck } = task;
  const pylonSupports = task.pylons ?? usualPylons(task.spansM);
  const layout = stayLayout(task.spansM, pylonSupports);
  const spacingM = layout.pylons[0]!.spacingM;
  const planesM = deck.widthM + 2 * cableData.planeOffsetM.value;
  const planes = [-planesM / 2, planesM / 2];
  const both = [0, 1].map((k) => trafficOnGirder(task.standard, deck, planes, k));
  const weight = (load: TrafficLoad): number => load.vehicleFactor * 20 + load.udlKNm + load.footwayKNm;
  const heavier = weight(both[0]!) >= weight(both[1]!) ? 0 : 1;
  const traffic = both[heavier]!;
  const fatigueShare = worstLaneShare(task.standard, deck, rigidCrossbeam(planes, heavier));
  const bays = Math.max(1, Math.round(spacingM / cableData.crossSpacingM.value));
  const floorCase: FloorCase = {
    standard: task.standard,
    deck,
    planesM,
    crossSpacingM: spacingM / bays,
    depthM: Math.min(task.depthM, cableData.crossDepthOverPlanes.value * planesM + 0.25),
    stringers: false,
  };
  const floor = sizeFloor(floorCase);
  const symmetrical = isSymmetrical(task.spansM, layout);
  const zones = deckZones(layout, symmetrical);
  // Legs reach from the ground to the deck's face.
  const belowM = layout.pylons.map(({ support }) => {
    const soffitM = task.clearUnderM?.[support];
    return soffitM === undefined ? cableData.assumedHeightM.value : soffitM + task.depthM;
  });
  const fixedKNm = (floor.slabKNm + floor.steelKNm + deck.superimposedKNm) / 2;
  const range = stayRangeLimitMPa(task.standard);

  let edgeKNm = 0.2 * fixedKNm;
  let stayKNm = 0.01 * fixedKNm;
  let loads = tributaryTraffic(layout, traffic, fixedKNm);
  let lasting = lastingForces(layout, fixedKNm + edgeKNm + stayKNm);
  let stays = sizeStays(layout, lasting.stayKN, loads, range);
  let eiKNm2 = 2.1e8 * 0.02 * task.depthM ** 2 * 1.5;
  let pylonKNPerM = layout.pylons.map((pylon, p) => guessPylonStiffness(pylon.heightM + belowM[p]!));
  let model: CableModel | null = null;
  let girders: EdgeGirder[] = [];
  let pylons: SizedPylon[] = [];
  let loadKNm = fixedKNm + edgeKNm + stayKNm;
  for (let pass = 0; pass < mostPasses; pass++) {
    model = cableModel(task.spansM, layout, {
      stayKNPerM: stayStiffness(layout, stays),
      deckEiKNm2: eiKNm2,
      pylonKNPerM,
    });
    const track = loadTrack(model.beam.xM);
    loads = stayTraffic(model, traffic, fatigueShare, symmetrical);
    loadKNm = fixedKNm + edgeKNm + stayKNm;
    lasting = lastingForces(
      layout,
      loadKNm,
      loads.map(({ minKN }) => tautFactor(standard) * -minKN),
    );
    stays = sizeStays(layout, lasting.stayKN, loads, range);
    const edge: EdgeCase = {
      standard,
      depthM: task.depthM,
      slabM: floor.slab.midM,
      deckWidthM: deck.widthM,
      slabWidthM: Math.min(deck.widthM / 2, layout.mainSpanM / 10),
      shearKN: bayShear(standard, traffic, loadKNm, Math.max(spacingM, layout.endBayM)),
    };
    girders = zones.map((zone) =>
      sizeEdgeGirder(edge, deckSections(zone, model!, track, lasting, traffic, loadKNm)),
    );
    const lengths = zones.reduce((sum, zone) => sum + zone.totalM, 0);
    edgeKNm = zones.reduce((sum, zone, z) => sum + zone.totalM * girderKNm(girders[z]!, edge), 0) / lengths;
    stayKNm = ((stayMassKg(layout, stays, 'all') / 2) * 0.00981) / 2 / layout.lengthM;
    eiKNm2 = zones.reduce((sum, zone, z) => sum + zone.totalM * girders[z]!.eiKNm2, 0) / lengths;
    pylons = sizePylons(model, track, {
      standard,
      layout,
      belowM,
      planesM,
      traffic,
      lasting,
      stays,
      loadKNm,
      symmetrical,
    });
    pylonKNPerM = pylons.map((pylon) => pylon.stiffnessKNPerM);
    // The first pass has only guessed stiffnesses.
    if (pass > 0 && Math.abs(fixedKNm + edgeKNm + stayKNm - loadKNm) <= 0.005 * loadKNm) break;
  }
  return {
    standard,
    layout,
    planesM,
    floor,
    endFloor: skewEndFloor(task, floorCase),
    traffic,
    lasting,
    stays,
    zones,
    girders,
    pylons,
    belowM,
    model: model!,
    track: loadTrack(model!.beam.xM),
    loadKNm,
    selfKNm: loadKNm - deck.superimposedKNm / 2,
  };
}

/** Weight of an edge girder with what its slab is thicker than the floor's, kN/m. */
function girderKNm(girder: EdgeGirder, edge: EdgeCase): number {
  const thicker =
    (girder.slabM - edge.slabM) * (edge.deckWidthM / 2) * edge.standard.unitWeights.concreteKNm3;
  return girder.massKgPerM * 0.00981 + thicker;
}

/** Lasting tension over the traffic it must outlast, with the factors of the standard and a tenth to spare. */
function tautFactor(standard: LoadStandard): number {
  const { uls } = standard.factors;
  return (1.1 * uls.traffic) / uls.permanentFavourable;
}

function isSymmetrical(spansM: readonly number[], layout: StayLayout): boolean {
  const mirrored = spansM.every((span, i) => Math.abs(span - spansM[spansM.length - 1 - i]!) < 1e-6);
  const [first, second] = layout.pylons;
  return mirrored && second !== undefined && Math.abs(first!.xM - (layout.lengthM - second.xM)) < 1e-6;
}

/** First guess of traffic on the stays: the uniform load of its own length of deck and a third of the vehicles. */
function tributaryTraffic(layout: StayLayout, traffic: TrafficLoad, fixedKNm: number): StayTraffic[] {
  const w = traffic.udlKNm + traffic.footwayKNm;
  const anchors = lastingForces(layout, w).stayKN;
  return layout.stays.map((stay, i) => ({
    maxKN: stay.anchor
      ? 1.5 * anchors[i]! + fixedKNm
      : (w * stay.tributaryM + 200 * traffic.vehicleFactor) / stay.sine,
    minKN: 0,
    rangeKN: 0,
  }));
}

/** Stiffness of a leg about height/25 long, two thirds as wide, kN/m. */
function guessPylonStiffness(heightM: number): number {
  const length = heightM / 25;
  return (3 * 1.8e7 * 0.6 * ((0.67 * length ** 4) / 12)) / heightM ** 3;
}

function bayShear(standard: LoadStandard, traffic: TrafficLoad, loadKNm: number, bayM: number): number {
  const { uls } = standard.factors;
  const onBay = trafficOnInfluence(traffic, [0, bayM], [1, 0]).max;
  return (uls.permanent * loadKNm * bayM) / 2 + uls.traffic * onBay;
}

interface PylonInput {
  readonly standard: LoadStandard;
  readonly layout: StayLayout;
  readonly belowM: readonly number[];
  readonly planesM: number;
  readonly traffic: TrafficLoad;
  readonly lasting: LastingForces;
  readonly stays: readonly SizedStay[];
  readonly loadKNm: number;
  readonly symmetrical: boolean;
}

function sizePylons(model: CableModel, track: Track, input: PylonInput): SizedPylon[] {
  const { layout, lasting, stays, traffic } = input;
  const made: SizedPylon[] = [];
  layout.pylons.forEach((pylon, p) => {
    if (p === 1 && input.symmetrical && Math.abs(input.belowM[0]! - input.belowM[1]!) < 1e-6) {
      made.push(made[0]!);
      return;
    }
    const vertical = new Float64Array(model.beam.xM.length);
    let permanentKN = 0;
    let windM2 = 0;
    layout.stays.forEach((stay, i) => {
      if (stay.pylon !== p) return;
      permanentKN += lasting.stayKN[i]! * stay.sine;
      // Sheath of a strand stay: about 25 mm times the root of its strands.
      windM2 += stay.count * stay.lengthM * 0.025 * Math.sqrt(stays[i]!.strands / stay.count);
      const line = model.stayLine(i);
      for (let j = 0; j < line.length; j++) vertical[j]! += line[j]! * stay.sine;
    });
    const top = trafficOnInfluence(traffic, track, model.topM[p]!);
    made.push(
      sizePylon({
        standard: input.standard,
        aboveM: pylon.heightM,
        belowM: input.belowM[p]!,
        planesM: input.planesM,
        permanentKN,
        trafficKN: trafficOnInfluence(traffic, track, vertical).max,
        topMovementM: Math.max(top.max, -top.min),
        stayWindKN: (cableData.pylon.windPressureKNm2 * 0.8 * windM2) / 2,
      }),
    );
  });
  return made;
}
