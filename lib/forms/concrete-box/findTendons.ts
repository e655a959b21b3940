import { imposedCurvature } from '../../mechanics/index.ts';
import { boxData } from './boxData.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { BoxModel } from './boxModel.ts';
import type { LaunchedDeck } from './launchedDeck.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import { serviceNeed } from './serviceNeed.ts';
import { straightStress, tendonStress, type TendonStress } from './tendonForce.ts';
import { tendonGroup, type TendonGroup } from './tendonGroup.ts';
import { ultimateBending, type BendingUse } from './ultimateBending.ts';

/** Tendons of the whole deck. */
export interface Tendons {
  readonly group: TendonGroup;
  readonly strandsPerWeb: number;
  readonly stress: TendonStress;
  /** Draped force after all losses, and before the lasting ones, kN. */
  readonly forceKN: number;
  readonly initialKN: number;
  /** Centred strands of a launched deck, and their force after all losses and before, kN. */
  readonly straightStrands: number;
  readonly straightKN: number;
  readonly straightInitialKN: number;
  /** Shares of the greatest eccentricity used in end spans, inner spans and over piers. */
  readonly drape: readonly [endSpan: number, innerSpan: number, pier: number];
  /** Depth of the draped tendons below the top of the slab, m, and eccentricity below the centroid, m. */
  readonly depthM: Float64Array;
  readonly eccentricityM: Float64Array;
  /** Parasitic moment of unit draped force, m, sagging positive. */
  readonly parasiticM: Float64Array;
  /** Ultimate bending: worst use in the spans and over the piers, with demand and capacity there, kNm. */
  readonly sag: BendingUse;
  readonly hog: BendingUse;
}

/** What the search starts from: the tendons of the pass before. */
export type TendonStart = Pick<Tendons, 'drape' | 'strandsPerWeb' | 'forceKN'>;

const coarse = [0.4, 0.7, 1] as const;

/**
 * Finds the drape that needs the least force to keep the concrete compressed (or within its tension) in service, adds
 * strands where ultimate bending asks for more, and rounds up to whole strands in every web.
 */
export function findTendons(
  model: BoxModel,
  sections: SectionsAlong,
  own: OwnWeight,
  launch: LaunchedDeck | null,
  before: TendonStart | null,
): Tendons {
  const { webs } = model.layout;
  const group = tendonGroup(before?.strandsPerWeb ?? 4 * boxData.tendons[1]!.strands);
  const straight = straightStress(model);
  const straightStrands = launch
    ? evenly(launch.forceKN / (straight.initialMPa * 1e3 * model.strandM2), 2 * webs)
    : 0;
  const straightKN = straightStrands * model.strandM2 * straight.lastingMPa * 1e3;
  const line = tendonLine(model, sections, group);
  const service = serviceNeed(model, sections, own, group, straightKN);
  const need = (drape: Drape): number => {
    const { eccentricityM: e, parasiticM: m } = line(drape);
    return service(e, m);
  };
  const found = leastForce(need, before?.drape ?? null, model.task.spansM.length);
  const { depthM, eccentricityM, parasiticM } = line(found.drape);

  const longest = Math.max(...model.task.spansM);
  const sagM =
    model.task.depthM -
    group.fromFaceM -
    (model.task.spansM.length > 1 ? group.fromFaceM : sections.span.topM);
  const axialMPa = ((before?.forceKN ?? found.forceKN) + straightKN) / sections.span.areaM2 / 1e3;
  const stress = tendonStress(
    model,
    Math.min(Math.max(0.01, sagM), longest),
    Math.min(axialMPa, 0.6 * model.concrete.fckMPa),
  );
  const perStrandKN = Math.max(1, stress.lastingMPa) * model.strandM2 * 1e3;

  const most = mostStrandsPerWeb(model);
  let strandsPerWeb = Math.min(most, Math.max(1, Math.ceil(found.forceKN / perStrandKN / webs - 1e-6)));
  const bend = (strands: number): [BendingUse, BendingUse] =>
    ultimateBending(model, sections, own, {
      draped: strands * webs * model.strandM2,
      forceKN: strands * webs * perStrandKN,
      straight: straightStrands * model.strandM2,
      depthM,
      parasiticM,
    });
  let [sag, hog] = bend(strandsPerWeb);
  for (let pass = 0; pass < 6; pass++) {
    const use = Math.max(sag.use, hog.use);
    if (!(use > 1) || strandsPerWeb >= most) break;
    const more = Math.min(
      most,
      Math.max(strandsPerWeb + 1, Math.ceil(strandsPerWeb * (1 + 0.8 * Math.min(use - 1, 0.5)))),
    );
    const [sagMore, hogMore] = bend(more);
    // Past the balance of the section more steel is of no use.
    if (Math.max(sagMore.use, hogMore.use) > use * 0.999) break;
    strandsPerWeb = more;
    [sag, hog] = [sagMore, hogMore];
  }
  const strands = strandsPerWeb * webs;
  return {
    group: tendonGroup(strandsPerWeb),
    strandsPerWeb,
    stress,
    forceKN: strands * perStrandKN,
    initialKN: strands * model.strandM2 * stress.initialMPa * 1e3,
    straightStrands,
    straightKN,
    straightInitialKN: straightStrands * model.strandM2 * straight.initialMPa * 1e3,
    drape: found.drape,
    depthM,
    eccentricityM,
    parasiticM,
    sag,
    hog,
  };
}

/** Strands a web can hold in its rows at the high and low points. */
export function mostStrandsPerWeb(model: BoxModel): number {
  const { tendonRows, tendons } = boxData;
  const { strands, ductM } = tendons[tendons.length - 1]!;
  const room = tendonRows.mostOverDepth * model.task.depthM;
  const rows = Math.max(1, Math.floor((room + tendonRows.gapM) / (ductM + tendonRows.gapM)));
  return rows * tendonRows.abreast * strands;
}

function evenly(strands: number, step: number): number {
  return Math.ceil(strands / step - 1e-6) * step;
}

type Drape = readonly [endSpan: number, innerSpan: number, pier: number];

interface TendonLine {
  readonly depthM: Float64Array;
  readonly eccentricityM: Float64Array;
  readonly parasiticM: Float64Array;
}

/** Tendon level and parasitic moment for any drape: both are sums of the same shapes. */
function tendonLine(
  model: BoxModel,
  sections: SectionsAlong,
  group: TendonGroup,
): (drape: Drape) => TendonLine {
  const { shapes, parasitic } = model.tendonShapes;
  const { topM, lowM } = sections.span;
  const low = Math.max(0, lowM - group.fromFaceM);
  const high = -Math.max(0, topM - group.fromFaceM);
  // Where the bottom slab is thicker the centroid lies lower and the tendon higher above it.
  const shift = sections.topM.map((top) => topM - top);
  const shiftParasitic = imposedCurvature(
    model.beam,
    shift.map((value) => -value),
  ).momentKNm;
  const n = shift.length;
  return ([end, inner, pier]) => {
    const depthM = new Float64Array(n);
    const eccentricityM = new Float64Array(n);
    const parasiticM = new Float64Array(n);
    const k = [end * low, inner * low, pier * high] as const;
    for (let i = 0; i < n; i++) {
      const e = k[0] * shapes[0][i]! + k[1] * shapes[1][i]! + k[2] * shapes[2][i]!;
      depthM[i] = topM + e;
      eccentricityM[i] = e + shift[i]!;
      parasiticM[i] =
        k[0] * parasitic[0][i]! + k[1] * parasitic[1][i]! + k[2] * parasitic[2][i]! + shiftParasitic[i]!;
    }
    return { depthM, eccentricityM, parasiticM };
  };
}

/** Coarse grid, then halved steps round the best: the force is the largest of ratios and has one lowest region. */
function leastForce(
  need: (drape: Drape) => number,
  start: Drape | null,
  spans: number,
): { readonly drape: Drape; readonly forceKN: number } {
  const ends = coarse;
  const inners = spans > 2 ? coarse : ([1] as const);
  const piers = spans > 1 ? coarse : ([1] as const);
  let best: Drape = start ?? [1, 1, 1];
  let least = need(best);
  const visit = (drape: Drape): void => {
    const force = need(drape);
    if (force < least * (1 - 1e-9)) {
      least = force;
      best = drape;
    }
  };
  if (start === null) for (const a of ends) for (const b of inners) for (const c of piers) visit([a, b, c]);
  for (let step = 0.15; step > 0.02; step /= 2) {
    const [a0, b0, c0] = best;
    for (const da of [-step, 0, step])
      for (const db of spans > 2 ? [-step, 0, step] : [0])
        for (const dc of spans > 1 ? [-step, 0, step] : [0])
          if (da !== 0 || db !== 0 || dc !== 0) visit([within(a0 + da), within(b0 + db), within(c0 + dc)]);
  }
  return { drape: best, forceKN: least };
}

function within(share: number): number {
  return Math.min(1, Math.max(0, share));
}
