import type { OwnWeight } from './boxLoads.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';
import { freshTension, youngTensionMPa } from './freshTension.ts';
import { fewestStrands, leastForce, type Drape, type DrapeAsked } from './leastForce.ts';
import type { LaunchedDeck } from './launchedDeck.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { serviceNeed } from './serviceNeed.ts';
import { drapeNeed } from './stationNeed.ts';
import { straightStress, tendonStress, type TendonStress } from './tendonForce.ts';
import { tendonGroup, type TendonGroup } from './tendonGroup.ts';
import { tendonLines } from './tendonLine.ts';
import { ultimateBending, type BendingUse } from './ultimateBending.ts';
import { ultimateNeed } from './ultimateNeed.ts';

/** Tendons of the whole deck. */
export interface Tendons {
  readonly group: TendonGroup;
  /** In the heaviest span. */
  readonly strandsPerWeb: number;
  readonly stress: TendonStress;
  /** Draped force of the heaviest span after all losses, and before the lasting ones, kN. */
  readonly forceKN: number;
  readonly initialKN: number;
  /** Centred strands of a launched deck, and their force after all losses and before, kN. */
  readonly straightStrands: number;
  readonly straightKN: number;
  readonly straightInitialKN: number;
  /** Shares of the greatest eccentricity used. */
  readonly drape: Drape;
  /** Force by which the compression zone was judged: steadied between passes, kN. */
  readonly steadiedKN: number;
  /** Depth of the draped tendons below the top of the slab, m, and eccentricity below the centroid, m. */
  readonly depthM: Float64Array;
  readonly eccentricityM: Float64Array;
  /** Parasitic moment of unit draped force, m, sagging positive. */
  readonly parasiticM: Float64Array;
  /** How the strands are shared out among the spans: which of the ways of the model, shares at the stations, and their mean. */
  readonly way: number;
  readonly share: Float64Array;
  readonly meanShare: number;
  /** Ultimate bending: worst use in sagging and in hogging. */
  readonly sag: BendingUse;
  readonly hog: BendingUse;
}

/** What the search starts from: the tendons of the pass before. */
export type TendonStart = Pick<Tendons, 'drape' | 'strandsPerWeb' | 'forceKN' | 'steadiedKN' | 'way'>;

/** Strands of a web by which the first pass judges the room of the tendons. */
const firstGuess = 48;

/**
 * Finds the drape that needs the least force for service and ultimate bending, rounds up to whole strands in every web,
 * and adds strands where the exact ultimate check still asks for more.
 */
export function findTendons(
  model: BoxModel,
  sections: SectionsAlong,
  own: OwnWeight,
  launch: LaunchedDeck | null,
  before: TendonStart | null,
): Tendons {
  const { webs } = model.layout;
  const most = mostStrandsPerWeb(model);
  const group = tendonGroup(before?.strandsPerWeb ?? firstGuess);
  const straight = straightStress(model);
  const straightStrands = launch
    ? evenly(launch.forceKN / (straight.initialMPa * 1e3 * model.strandM2), 2 * webs)
    : 0;
  const straightKN = straightStrands * model.strandM2 * straight.lastingMPa * 1e3;

  const { spansM, depthM: deckM } = model.task;
  const highM = spansM.length > 1 ? group.fromFaceM : sections.span.topM;
  const sagM = Math.max(0.01, deckM - group.fromFaceM - highM);
  const axialMPa = ((before?.forceKN ?? 0) + straightKN) / sections.span.areaM2 / 1e3;
  const stress = tendonStress(model, sagM, Math.min(axialMPa, model.concrete.fckMPa / 2));
  const perStrandKN = stress.lastingMPa * model.strandM2 * 1e3;

  const initialKN = stress.initialMPa * model.strandM2 * 1e3;
  const straightInitialKN = straightStrands * model.strandM2 * straight.initialMPa * 1e3;
  const strandsFor = (forceKN: number): number => {
    const wanted = Math.ceil(forceKN / perStrandKN / webs - 1e-6);
    return Math.min(most, Math.max(boxData.tendons.sizes[0]!.strands, wanted));
  };
  const service = serviceNeed(model, sections, own, group, straightKN);
  const fresh = freshTension(sections, own, straightInitialKN);
  const youngMPa = youngTensionMPa(model);
  // A deeper compression zone asks for more force and that deepens it again: half the way is steady.
  const steadiedKN = before ? (before.forceKN + (before.steadiedKN || before.forceKN)) / 2 : 0;
  const straightM2 = straightStrands * model.strandM2;
  const tried = model.tendonShapes.flatMap((shapes, way) => {
    if (before && way !== before.way) return [];
    const lines = tendonLines(model, sections, group, shapes);
    const ultimate = ultimateNeed(model, sections, own, stress.lastingMPa, straightM2, steadiedKN, shapes);
    const asked: DrapeAsked = {
      need: drapeNeed(lines, [service, ultimate]),
      bears: (drape, forceKN) =>
        fresh(lines.along(drape), strandsFor(forceKN) * webs * initialKN) <= youngMPa,
    };
    const found = leastForce(asked, spansM.length, before?.drape ?? null);
    return [{ ...found, way, meanShare: shapes.meanShare, lines }];
  });
  const found = fewestStrands(tried);
  const { depthM, eccentricityM, parasiticM, share } = found.lines.along(found.drape);

  const bend = (strands: number): [BendingUse, BendingUse] =>
    ultimateBending(model, sections, own, {
      draped: strands * webs * model.strandM2,
      forceKN: strands * webs * perStrandKN,
      straight: straightM2,
      depthM,
      parasiticM,
      share,
    });
  let strandsPerWeb = strandsFor(found.forceKN);
  let [sag, hog] = bend(strandsPerWeb);
  // The slab over the piers may still have to grow: the first pass does not answer for it with strands.
  while (before && Math.max(sag.use, hog.use) > 1 && strandsPerWeb < most) {
    const more = strandsPerWeb + Math.max(1, Math.round(0.02 * strandsPerWeb));
    const [sagMore, hogMore] = bend(more);
    // Past the balance of the section more steel is of no use.
    if (!(Math.max(sagMore.use, hogMore.use) < Math.max(sag.use, hog.use))) break;
    strandsPerWeb = Math.min(most, more);
    [sag, hog] = [sagMore, hogMore];
  }
  const strands = strandsPerWeb * webs;
  return {
    group: tendonGroup(strandsPerWeb),
    strandsPerWeb,
    stress,
    forceKN: strands * perStrandKN,
    initialKN: strands * initialKN,
    straightStrands,
    straightKN,
    straightInitialKN,
    drape: found.drape,
    steadiedKN,
    depthM,
    eccentricityM,
    parasiticM,
    way: found.way,
    share,
    meanShare: found.meanShare,
    sag,
    hog,
  };
}

/** Strands a web can hold in its rows at the high and low points. */
export function mostStrandsPerWeb(model: BoxModel): number {
  const { tendonRows, tendons } = boxData;
  const { strands, ductM } = tendons.sizes[tendons.sizes.length - 1]!;
  const room = tendonRows.mostOverDepth * model.task.depthM;
  const rows = Math.max(1, Math.floor((room + tendonRows.gapM) / (ductM + tendonRows.gapM)));
  return rows * tendonRows.abreast * strands;
}

function evenly(strands: number, step: number): number {
  return Math.ceil(strands / step - 1e-6) * step;
}
