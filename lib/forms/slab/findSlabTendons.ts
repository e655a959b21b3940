import { materials } from '../../actions/index.ts';
import { freshTension, youngTensionMPa } from '../concrete-box/freshTension.ts';
import { fewestStrands, leastForce, type Drape } from '../concrete-box/leastForce.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { serviceNeed, type ServiceSections } from '../concrete-box/serviceNeed.ts';
import { drapeNeed } from '../concrete-box/stationNeed.ts';
import { tendonStress, type TendonStress } from '../concrete-box/tendonForce.ts';
import { tendonLines, type TendonLine } from '../concrete-box/tendonLine.ts';
import { tendonShapes } from '../concrete-box/tendonShape.ts';
import { sharePowers } from '../concrete-box/tendonShare.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';

/** Draped bonded tendons of the whole deck, side by side in one layer. */
export interface SlabTendons extends TendonLine {
  readonly count: number;
  readonly strands: number;
  readonly mostStrands: number;
  readonly ductM: number;
  /** In the heaviest span: area of the strands, m2. */
  readonly areaM2: number;
  readonly stress: TendonStress;
  /** After all losses and before the lasting ones; force that service asks for, kN. */
  readonly forceKN: number;
  readonly initialKN: number;
  readonly needKN: number;
  readonly meanShare: number;
  readonly straightKN: 0;
  readonly straightInitialKN: 0;
}

/** Section along the deck as stresses see it: solid over the supports. */
export function sectionsOf(model: SlabModel): ServiceSections & { readonly span: SlabModel['span'] } {
  const along = (pick: (section: SlabModel['span']) => number): Float64Array =>
    Float64Array.from(model.solidAt, (solid) => pick(solid ? model.solid : model.span));
  return {
    span: model.span,
    areaM2: along(({ areaM2 }) => areaM2),
    inertiaM4: along(({ inertiaM4 }) => inertiaM4),
    topM: along(({ topM }) => topM),
    lowM: along(({ lowM }) => lowM),
    // A slab of one thickness works in bending over all its width.
    topLag: along(() => 1),
    lowLag: along(() => 1),
  };
}

const passes = 3;

/**
 * Fewest strands with which the concrete stays within its limits in service, with the drape that needs the least force.
 * @param atLeast strands that something else asks for
 */
export function findSlabTendons(model: SlabModel, atLeast = 0): SlabTendons {
  const { task, beam } = model;
  const { spansM } = task;
  const sections = sectionsOf(model);
  const shapes = sharePowers(spansM).map((power) => tendonShapes(spansM, beam, power));
  const youngMPa = youngTensionMPa(model);
  const strandM2 = boxData.strandAreaMm2[model.standardId] * 1e-6;
  const { largest, mostCount } = room(model);
  const mostStrands = mostCount * largest.strands;
  let strands = Math.max(atLeast, Math.round(mostStrands / 3));
  for (let pass = 1; ; pass++) {
    const { count, ductM } = layer(model, strands);
    const fromFaceM = boxData.ductCoverM.value + ductM / 2;
    const highM = spansM.length > 1 ? fromFaceM : model.span.topM;
    const sagM = Math.max(0.01, task.depthM - fromFaceM - highM);
    // The elastic loss goes by the compression the tendons themselves cause.
    const jackMPa = boxData.jacking[model.standardId] * materials.strand[model.standardId].ultimateMPa;
    const axialMPa = (strands * strandM2 * jackMPa * (1 - boxData.losses.longTerm)) / model.span.areaM2;
    const stress = tendonStress(model, sagM, Math.min(axialMPa, model.concrete.fckMPa / 2));
    const need = serviceNeed(model, sections, model.own, { heightM: ductM }, 0, slabDeckData.gradient);
    const fresh = freshTension(sections, model.own, 0);
    const perStrandKN = stress.lastingMPa * strandM2 * 1e3;
    const strandsFor = (forceKN: number): number => {
      const wanted = Math.ceil(forceKN / perStrandKN - 1e-6);
      return Math.min(mostStrands, Math.max(count * boxData.tendons.sizes[0]!.strands, atLeast, wanted));
    };
    const tried = shapes.map((shape) => {
      const lines = tendonLines(model, sections, { fromFaceM }, shape);
      const asked = {
        need: drapeNeed(lines, [need]),
        bears: (drape: Drape, forceKN: number) =>
          fresh(lines.along(drape), strandsFor(forceKN) * strandM2 * stress.initialMPa * 1e3) <= youngMPa,
      };
      const found = leastForce(asked, spansM.length, null);
      return { ...found, lines, meanShare: shape.meanShare };
    });
    const found = fewestStrands(tried);
    const next = strandsFor(found.forceKN);
    const settled = layer(model, next).ductM === ductM;
    if (pass < passes && !(settled && Math.abs(next - strands) <= 0.01 * next)) {
      strands = next;
      continue;
    }
    return {
      ...found.lines.along(found.drape),
      count: layer(model, next).count,
      strands: next,
      mostStrands,
      ductM,
      areaM2: next * strandM2,
      stress,
      forceKN: next * perStrandKN,
      initialKN: next * strandM2 * stress.initialMPa * 1e3,
      needKN: found.forceKN,
      meanShare: found.meanShare,
      straightKN: 0,
      straightInitialKN: 0,
    };
  }
}

/** Largest tendon and how many stand side by side at the most. */
function room({ outline }: SlabModel): {
  readonly largest: { readonly strands: number; readonly ductM: number };
  readonly usualCount: number;
  readonly mostCount: number;
} {
  const { sizes } = boxData.tendons;
  const { usualM, closestM } = slabDeckData.tendons;
  const ribs = outline.voids.length + 1;
  const voided = outline.voids.length > 0;
  return {
    largest: sizes[sizes.length - 1]!,
    usualCount: voided ? ribs : Math.max(2, Math.floor(outline.soffitM / usualM)),
    mostCount: voided ? 2 * ribs : Math.max(2, Math.floor(outline.soffitM / closestM)),
  };
}

/** Smallest tendons that hold the strands at their usual spacing; the largest ones closer together where none does. */
function layer(model: SlabModel, strands: number): { readonly count: number; readonly ductM: number } {
  const { usualCount, mostCount, largest } = room(model);
  const fit = boxData.tendons.sizes.find((size) => size.strands * usualCount >= strands);
  if (fit) return { count: usualCount, ductM: fit.ductM };
  return { count: Math.min(mostCount, Math.ceil(strands / largest.strands)), ductM: largest.ductM };
}
