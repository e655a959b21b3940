import {
  concrete,
  loadStandard,
  materials,
  serviceTraffic,
  trafficEnvelope,
  type Concrete,
  type LoadStandard,
  type TrafficEnvelope,
  type TrafficLoad,
} from '../../../actions/index.ts';
import {
  imposedCurvature,
  lineBeam,
  uniform,
  type Effects,
  type LineBeam,
} from '../../../mechanics/index.ts';
import type { StandardId, UnitTask } from '../../../model/index.ts';
import { supportPositions } from '../supports.ts';
import type { BeamChoice, BeamLayout } from './beamChoice.ts';
import type { BeamTraffic, PrecastKind } from './precastKind.ts';
import { compositeBeam, type CompositeBeam } from './compositeBeam.ts';
import { pretensioned } from './pretensioned.ts';

/** Everything about the beam that carries most, by which all beams are made. */
export interface PrecastModel extends BeamChoice {
  readonly kind: PrecastKind;
  readonly task: UnitTask;
  readonly standardId: StandardId;
  readonly standard: LoadStandard;
  readonly supportsM: readonly number[];
  readonly lengthM: number;
  readonly beamConcrete: Concrete;
  readonly releaseConcrete: Concrete;
  readonly slabConcrete: Concrete;
  /** Area of one strand, m2, and stress at the jack, MPa. */
  readonly strandM2: number;
  readonly jackMPa: number;
  readonly composite: CompositeBeam;
  /** One beam, its wet slab and fill, superimposed load, kN/m; one diaphragm within a span, kN a beam. */
  readonly ownKNm: number;
  readonly wetKNm: number;
  readonly superimposedKNm: number;
  readonly diaphragmKN: number;
  /** Longest piece that is hauled where it is not the longest span, m. */
  readonly pieceLengthM?: number;
  /** What curvature in plan adds to slab, superimposed load and traffic of the outer beam; 1 on a straight. */
  readonly curve: number;
  readonly traffic: TrafficLoad;
  readonly torsion: BeamTraffic['torsion'];
  /** Beam after continuity and what acts on it, characteristic. */
  readonly beam: LineBeam;
  readonly superimposed: Effects;
  readonly most: TrafficEnvelope;
  /** Parasitic moments of a top warmer by one kelvin. */
  readonly warmth: Effects;
  /**
   * Each span by itself: what sagging is designed for. Creep of the prestress sags a beam made continuous and takes up the
   * relief that continuity gives (Tadros and others, PCI Journal, on beams made continuous for traffic: many owners design
   * them so).
   */
  readonly simple: readonly SimpleSpan[];
}

/** Superimposed load and traffic of one span by itself, characteristic and the service share. */
interface SimpleSpan {
  readonly superimposed: Effects;
  readonly most: TrafficEnvelope;
  readonly service: TrafficEnvelope;
}

/** Elements each span is divided into. */
export const elementsPerSpan = 10;

/** Shares the loads out to the beam that carries most (or to `girder`) and places them. */
export function precastModel(
  kind: PrecastKind,
  task: UnitTask,
  choice: BeamChoice,
  beamIndex?: number,
): PrecastModel {
  const { layout, shape, slab, haunchM } = choice;
  const id = task.standard;
  const standard = loadStandard(id);
  const strengths = materials.concreteDefaultMPa[id];
  const beamConcrete = concrete(id, strengths.girder);
  const slabConcrete = concrete(id, strengths.slab);
  const supportsM = supportPositions(task.spansM);
  const composite = compositeBeam(task, choice, slabConcrete.ecmMPa / beamConcrete.ecmMPa);
  const gamma = standard.unitWeights.concreteKNm3;
  const inner = layout.spacingM * slab.midM;
  const outer = (layout.spacingM / 2) * slab.midM + (layout.overhangM * (slab.rootM + slab.edgeM)) / 2;
  const wetM2 = Math.max(inner, outer) + haunchM * shape.topWidthM;
  const diaphragmKN = gamma * kind.diaphragm.withinM * kind.crossWalls(choice).ofBeamM2;
  const curve = chordFactor(task, layout);
  const carried = kind.traffic(task, choice, composite, 1 / composite.slabRatio, beamIndex);
  const traffic = amplified(carried.load, curve);
  const eiKNm2 = beamConcrete.ecmMPa * 1e3 * composite.inertiaM4;
  const beam = lineBeam({
    spansM: task.spansM,
    stationsPerSpan: elementsPerSpan,
    eiKNm2: () => eiKNm2,
    hingesM: kind.spans === 'linked' ? supportsM.slice(1, -1) : [],
  });
  const superimposedKNm = (curve * task.deck.superimposedKNm) / layout.count;
  const most = trafficEnvelope(beam, traffic, { deflection: false });
  const heightM = shape.depthM + haunchM + slab.rootM;
  // A warm top is longer and lifts the middle: negative where sagging is positive.
  const perKelvin = -pretensioned.temperature.expansion1PerK / heightM;
  return {
    ...choice,
    kind,
    task,
    standardId: id,
    standard,
    supportsM,
    lengthM: supportsM[supportsM.length - 1]!,
    beamConcrete,
    releaseConcrete: concrete(id, pretensioned.release.strength[id] * strengths.girder),
    slabConcrete,
    strandM2: pretensioned.strand.areaMm2[id] / 1e6,
    jackMPa: pretensioned.strand.jacking[id] * materials.strand[id].ultimateMPa,
    composite,
    ownKNm: gamma * shape.areaM2,
    wetKNm: curve * gamma * wetM2,
    superimposedKNm,
    diaphragmKN,
    curve,
    traffic,
    torsion: carried.torsion,
    beam,
    superimposed: uniform(beam, superimposedKNm),
    most,
    warmth: imposedCurvature(beam, new Float64Array(beam.xM.length).fill(perKelvin)),
    simple: simpleSpans(task.spansM, superimposedKNm, traffic, standard),
  };
}

/**
 * Straight beams under a curved deck: set a third of the sagitta L2 / 8R off, the deck runs that much further out at
 * midspan, and the outer beam takes 1 + n a e / sum a2 of its even share (rigid crossbeam).
 */
function chordFactor(task: UnitTask, layout: BeamLayout): number {
  if (!(task.planRadiusM < Infinity)) return 1;
  const eM = Math.max(...task.spansM) ** 2 / (8 * task.planRadiusM) / 3;
  const second = layout.offsetsM.reduce((sum, y) => sum + y * y, 0);
  return 1 + (layout.count * Math.max(...layout.offsetsM) * eM) / second;
}

function amplified(load: TrafficLoad, factor: number): TrafficLoad {
  return {
    ...load,
    vehicleFactor: load.vehicleFactor * factor,
    udlKNm: load.udlKNm * factor,
    footwayKNm: load.footwayKNm * factor,
  };
}

/** Every span by itself; equal spans share one. */
function simpleSpans(
  spansM: readonly number[],
  superimposedKNm: number,
  traffic: TrafficLoad,
  standard: LoadStandard,
): SimpleSpan[] {
  const known = new Map<number, SimpleSpan>();
  return spansM.map((spanM) => {
    const made = known.get(spanM);
    if (made) return made;
    const beam = lineBeam({ spansM: [spanM], stationsPerSpan: elementsPerSpan });
    const most = trafficEnvelope(beam, traffic, { deflection: false });
    const span = {
      superimposed: uniform(beam, superimposedKNm),
      most,
      service: serviceEnvelope(beam, traffic, most, standard),
    };
    known.set(spanM, span);
    return span;
  });
}

/** Envelope of the service share; where vehicle and lane load share alike it is the known one scaled. */
function serviceEnvelope(
  beam: LineBeam,
  traffic: TrafficLoad,
  most: TrafficEnvelope,
  standard: LoadStandard,
): TrafficEnvelope {
  const { vehicle, uniform: lane, footway } = standard.factors.sls;
  if (vehicle !== lane || (traffic.footwayKNm > 0 && footway !== lane))
    return trafficEnvelope(beam, serviceTraffic(traffic), { deflection: false });
  const scaled = (values: Float64Array): Float64Array => values.map((value) => lane * value);
  return {
    ...most,
    momentMaxKNm: scaled(most.momentMaxKNm),
    momentMinKNm: scaled(most.momentMinKNm),
    shearMaxKN: scaled(most.shearMaxKN),
    shearMinKN: scaled(most.shearMinKN),
  };
}
