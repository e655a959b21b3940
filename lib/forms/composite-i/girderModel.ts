import type { StandardId, UnitTask } from '../../model/index.ts';
import {
  concrete,
  girderStiffnessM4,
  loadStandard,
  materials,
  steelYield,
  trafficOnGirder,
  usualSteel,
  type LoadStandard,
  type TrafficLoad,
} from '../../actions/index.ts';
import { lineBeam, uniform } from '../../mechanics/index.ts';
import { designSlab, type SlabDesign } from '../common/slab/designSlab.ts';
import { thickestPlateM } from '../common/plates.ts';
import { supportPositions } from '../common/supports.ts';
import { bays, braces } from './bracing.ts';
import { compositeData } from './compositeData.ts';
import { elementsPerSpan } from './elementsPerSpan.ts';
import { girderHeights, type GirderHeights } from './girderHeights.ts';
import { girderLayout, type GirderLayout } from './girderLayout.ts';
import type { GirderTop } from './girderSection.ts';
import { girderTops } from './girderTops.ts';
import { substringers, type Substringers } from './substringers.ts';

/** Everything about one girder that does not change while its plates are sought. */
export interface GirderModel {
  readonly task: UnitTask;
  readonly standardId: StandardId;
  readonly standard: LoadStandard;
  readonly layout: GirderLayout;
  readonly slab: SlabDesign;
  readonly supportsM: readonly number[];
  readonly lengthM: number;
  /** Length of each element, m. */
  readonly elementM: Float64Array;
  /** Girder height over both flanges where there is no haunch, m; along the girder see `heights`. */
  readonly girderM: number;
  readonly heights: GirderHeights;
  /** Ratio of moduli for short loads. */
  readonly modularRatio: number;
  /** What acts above the steel girder, by element: short loads, lasting loads, slab cracked (bars only). */
  readonly short: readonly GirderTop[];
  readonly lasting: readonly GirderTop[];
  readonly cracked: readonly GirderTop[];
  /** 1 where the stiffness counts the slab as cracked. */
  readonly isCracked: Uint8Array;
  /** Where the girders are braced to one another, m from the first support, supports among them. */
  readonly braceAtM: readonly number[];
  /** Length of the bay that each element lies in, m. */
  readonly bracingM: Float64Array;
  /** First guess of the design moment, kNm at the stations, on a girder of constant stiffness. */
  readonly guessKNm: Float64Array;
  /** What curvature in plan adds to every load of the outer girder; 1 on a straight. */
  readonly curve: number;
  /** Wet slab, working load while casting and superimposed load on one girder, kN/m. */
  readonly slabKNm: number;
  readonly castingKNm: number;
  readonly superimposedKNm: number;
  readonly traffic: TrafficLoad;
  /** Force in the slab when its shrinkage is prevented over the area that acts with a girder, kN, by element. */
  readonly shrinkageKN: Float64Array;
  /** Modulus of the steel, kN/m2. */
  readonly modulusKNm2: number;
  readonly yieldMPa: (thicknessM: number) => number;
  readonly substringers?: Substringers;
  /** Where the girder is half of a box: its half of the bottom plate. */
  readonly plate?: BottomPlate;
}

/** Bottom plate of half a box and what belongs to it. */
interface BottomPlate {
  readonly widthM: number;
  readonly leastM: number;
  /** Length of the leaning web over its height. */
  readonly slant: number;
  /** Design shear of the web from torsion, kN, by element. */
  readonly torsionKN: Float64Array;
  /** Share of a lorry of the outer lane that this half carries. */
  readonly lorryShare: number;
  /** Share of the yield stress that the plate may have in compression: buckling between stiffeners and frames, shear lag. */
  pressedShare(thicknessM: number): number;
}

/**
 * Lays out the girders, designs the slab across the deck and shares the loads out.
 * @throws RangeError for an impossible girder count
 */
export function girderModel(task: UnitTask): GirderModel {
  const layout = girderLayout(task);
  const curve = curvatureFactor(task, layout);
  return modelOn(task, layout, curve, {
    stiff: !layout.twin,
    even: !layout.twin,
    trafficOn: (slab, girderM, ratio) => amplified(worstTraffic(task, layout, slab, girderM, ratio), curve),
  });
}

/** How girders carry their deck: slab on stiff lines or more than two, of even thickness or not; traffic of the worst of them. */
export interface Carrying {
  readonly stiff: boolean;
  readonly even: boolean;
  readonly trafficOn: (slab: SlabDesign, girderM: number, modularRatio: number) => TrafficLoad;
}

/** The slab across girders of any layout. */
function slabOn(
  { standard, deck, substringers }: Pick<UnitTask, 'standard' | 'deck' | 'substringers'>,
  { spacingM, overhangM }: GirderLayout,
  stiff: boolean,
  even: boolean,
): SlabDesign {
  return designSlab({
    standard,
    deck,
    direction: 'across',
    spacingM: substringers ? spacingM / 2 : spacingM,
    overhangM,
    continuous: stiff,
    uniform: even,
  });
}

/**
 * Least structural depth, m, of plain girders under a deck: the slab over them and the least height of a plate girder.
 * Below spans of about 15 m that is more than published ratios of depth to span allow.
 */
export function leastDepthM(task: Pick<UnitTask, 'standard' | 'deck'>): number {
  const layout = girderLayout(task);
  const { rootM } = slabOn(task, layout, !layout.twin, !layout.twin);
  return compositeData.leastGirderM.value + rootM;
}

/** A girder of any layout: its slab designed across the deck and the loads shared out. `curve` multiplies every load. */
export function modelOn(
  task: UnitTask,
  layout: GirderLayout,
  curve: number,
  { stiff, even, trafficOn }: Carrying,
): GirderModel {
  const standard = loadStandard(task.standard);
  const slab = slabOn(task, layout, stiff, even);
  const supportsM = supportPositions(task.spansM);
  const elementM = Float64Array.from(
    { length: task.spansM.length * elementsPerSpan },
    (_, e) => task.spansM[Math.floor(e / elementsPerSpan)]! / elementsPerSpan,
  );
  const girderM = Math.max(compositeData.leastGirderM.value, task.depthM - slab.rootM);
  const grade = usualSteel(task.standard);
  const modulusMPa = materials.steel[grade].eMPa;
  const modularRatio =
    modulusMPa / concrete(task.standard, materials.concreteDefaultMPa[task.standard].slab).ecmMPa;
  const tops = girderTops(task, layout, slab, modularRatio, modulusMPa);
  const share = task.deck.widthM / layout.count;
  const traffic = trafficOn(slab, girderM, modularRatio);
  const formsKNm2 = compositeData.stayInPlaceForms[task.standard];
  const slabKNm = curve * (standard.unitWeights.concreteKNm3 * slab.meanM + formsKNm2) * share;
  const superimposedKNm = (curve * task.deck.superimposedKNm) / layout.count;
  const thickestM = thickestPlateM(task.standard);
  const yieldMPa = (thicknessM: number): number => steelYield(grade, Math.min(thicknessM, thickestM) * 1000);
  const guessKNm = guessMoments(task, standard, slabKNm, superimposedKNm, traffic);
  const peakKNm = Math.abs(Math.min(0, ...guessKNm));
  const flangeM = Math.sqrt(
    (compositeData.flange.widthOverThickness * peakKNm) / (girderM * yieldMPa(0.05) * 1e3),
  );
  const braceAtM = braces(task, supportsM, Math.max(compositeData.flange.leastWidthM, flangeM));
  const bracingM = bays(elementM, braceAtM);
  return {
    task,
    standardId: task.standard,
    standard,
    layout,
    slab,
    supportsM,
    lengthM: supportsM[supportsM.length - 1]!,
    elementM,
    girderM,
    heights: girderHeights(task, supportsM, girderM, slab.rootM),
    modularRatio,
    ...tops,
    braceAtM,
    bracingM,
    guessKNm,
    slabKNm,
    curve,
    castingKNm: curve * compositeData.casting.constructionKNm2 * share,
    superimposedKNm,
    traffic,
    modulusKNm2: modulusMPa * 1e3,
    yieldMPa,
    ...(task.substringers
      ? { substringers: substringers(task, standard, layout, slab, Math.max(...bracingM), yieldMPa) }
      : {}),
  };
}

/** The girder that carries most; all girders are made like it. */
function worstTraffic(
  task: UnitTask,
  layout: GirderLayout,
  slab: SlabDesign,
  girderM: number,
  modularRatio: number,
): TrafficLoad {
  // On a symmetrical deck the left half tells all.
  const lines =
    task.deck.carriagewayOffsetM === 0
      ? layout.offsetsM.slice(0, Math.ceil(layout.count / 2))
      : layout.offsetsM;
  // The stiffness enters the distribution factors to the power 0.1: plates of ordinary proportions will do.
  const flangeM2 = 0.2 * girderM * 0.03;
  const webM2 = (girderM * girderM) / compositeData.web.mostHeightOverThickness.value;
  const inertiaM4 = (2 * flangeM2 * girderM ** 2) / 4 + (webM2 * girderM ** 2) / 12;
  const armM = girderM / 2 + slab.rootM - slab.meanM / 2;
  const options = {
    spanM: Math.max(...task.spansM),
    slabM: slab.meanM,
    skewDeg: task.skewDeg ?? 0,
    kgM4: girderStiffnessM4(modularRatio, inertiaM4, 2 * flangeM2 + webM2, armM),
  };
  const loads = lines.map((_, i) => trafficOnGirder(task.standard, task.deck, layout.offsetsM, i, options));
  const heaviestKN = heaviestVehicleKN(loadStandard(task.standard));
  const span = Math.max(...task.spansM);
  const weigh = (load: TrafficLoad): number =>
    (load.vehicleFactor * heaviestKN * 2) / span + load.udlKNm + load.footwayKNm;
  return loads.reduce((worst, next) => (weigh(next) > weigh(worst) ? next : worst));
}

/**
 * Curvature in plan turns bending into torque M/R, which parallel girders carry as a couple: loads of the outer girder
 * grow by n Le2 / (pi2 C R D), with D between the outer girders and C for the girders between (V-load method, from
 * memory). Le: whole simple span, 0.7 of a continuous one.
 */
function curvatureFactor(task: UnitTask, layout: GirderLayout): number {
  if (!(task.planRadiusM < Infinity)) return 1;
  const n = layout.count;
  const effective = (task.spansM.length > 1 ? 0.7 : 1) * Math.max(...task.spansM);
  const between = (n * (n + 1)) / (6 * (n - 1));
  const outer = (n - 1) * layout.spacingM;
  return 1 + (n * effective ** 2) / (Math.PI ** 2 * between * task.planRadiusM * outer);
}

function amplified(load: TrafficLoad, factor: number): TrafficLoad {
  if (factor === 1) return load;
  return {
    ...load,
    vehicleFactor: load.vehicleFactor * factor,
    udlKNm: load.udlKNm * factor,
    footwayKNm: load.footwayKNm * factor,
  };
}

/** Design moments of the loads known so far, spread evenly, on a girder of constant stiffness. */
function guessMoments(
  task: UnitTask,
  standard: LoadStandard,
  slabKNm: number,
  superimposedKNm: number,
  traffic: TrafficLoad,
): Float64Array {
  const { uls } = standard.factors;
  const span = Math.max(...task.spansM);
  // A girder of ordinary slenderness weighs about a fifth of its slab; vehicles count as 2P/L.
  const permanent = uls.permanent * 1.2 * slabKNm + uls.superimposed * superimposedKNm;
  const vehicles = (2 * traffic.vehicleFactor * heaviestVehicleKN(standard)) / span;
  const moving = uls.traffic * (traffic.udlKNm + traffic.footwayKNm + vehicles);
  return uniform(lineBeam({ spansM: task.spansM, stationsPerSpan: elementsPerSpan }), permanent + moving)
    .momentKNm;
}

function heaviestVehicleKN(standard: LoadStandard): number {
  const weights = standard.vehicles.map((vehicle) =>
    vehicle.axles.reduce((sum, axle) => sum + axle.loadKN, 0),
  );
  return Math.max(...weights) * (1 + standard.dynamicAllowance);
}
