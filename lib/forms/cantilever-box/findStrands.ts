import { boxData } from '../concrete-box/boxData.ts';
import type { Arm } from './arms.ts';
import { cantileverData } from './cantileverData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { HaunchedSections } from './sectionsAlong.ts';
import type { StagedWeight } from './stages.ts';
import { strandStress } from './strandStress.ts';
import {
  strandsNeeded,
  useMoments,
  withParasitic,
  type Strands,
  type StrandStresses,
  type UseMoments,
} from './tendonNeeds.ts';

/** Tendons of a haunched deck. */
export interface FoundStrands extends Strands {
  readonly stresses: StrandStresses;
  readonly use: UseMoments;
  /** What the stations ask for with these strands. */
  readonly needTop: Float64Array;
  readonly needBottom: Float64Array;
}

/** Passes in which strands follow the need freely, and those after in which they only grow. */
const freePasses = 5;
const growingPasses = 6;

/**
 * Top and bottom strands at the stations. Tendons over a pier lie the same on both sides of it and end one after the
 * other towards the tips; tendons of a span end one after the other towards its supports.
 */
export function findStrands(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
  before: Strands | null,
): FoundStrands {
  const n = sections.areaM2.length;
  const stresses = stressesOf(model, sections, before);
  const use = useMoments(model, sections, weight);
  let strands = withParasitic(
    model,
    sections,
    stresses,
    before?.top ?? new Float64Array(n),
    before?.bottom ?? new Float64Array(n),
  );
  const most = [mostTopStrands(model), mostBottomStrands(sections)] as const;
  const free = before ? 2 : freePasses;
  for (let pass = 0; pass < free + growingPasses; pass++) {
    const [needTop, needBottom] = strandsNeeded(model, sections, weight, use, stresses, strands);
    const units = unitsFor(model, weight, needTop, needBottom);
    const top = whole(model, staggeredTop(model, weight, needTop, units.top), units.top, most[0]);
    const bottom = whole(model, staggeredBottom(model, needBottom), units.bottom, most[1]);
    if (pass >= free) {
      let same = true;
      for (let i = 0; i < n; i++) {
        same &&= top[i]! <= strands.top[i]! && bottom[i]! <= strands.bottom[i]!;
        top[i] = Math.max(top[i]!, strands.top[i]!);
        bottom[i] = Math.max(bottom[i]!, strands.bottom[i]!);
      }
      if (same) return { ...strands, stresses, use, needTop, needBottom };
    }
    strands = withParasitic(model, sections, stresses, top, bottom);
  }
  const [needTop, needBottom] = strandsNeeded(model, sections, weight, use, stresses, strands);
  return { ...strands, stresses, use, needTop, needBottom };
}

function stressesOf(
  model: CantileverModel,
  sections: HaunchedSections,
  before: Strands | null,
): StrandStresses {
  const { topTendons, bottomTendons } = cantileverData;
  const roughMPa = 1200;
  const cap = 0.3 * model.concrete.fckMPa;
  const middle = sections.midspan.areaM2;
  const axial = (strands: Float64Array | undefined, areaM2: number): number =>
    Math.min(cap, ((strands ? Math.max(...strands) : 0) * model.strandM2 * roughMPa) / areaM2);
  // Tendons over a pier are from one segment to two arms long; those of a span about half of it.
  const armM = model.governingM / 2;
  return {
    top: strandStress(model, armM / 2, topTendons.turnRad, axial(before?.top, sections.pier.areaM2)),
    bottom: strandStress(model, armM / 2, bottomTendons.turnRad, axial(before?.bottom, middle)),
  };
}

/**
 * Never more farther out; at least a tendon a web holds every segment. The same at both sides of a pier whose arms are
 * built together from end to end; where one goes on alone its tendons are anchored in the other span as far as they are
 * of use there.
 */
function staggeredTop(
  model: CantileverModel,
  weight: StagedWeight,
  need: Float64Array,
  unit: number,
): Float64Array {
  const { arms } = model;
  const out = new Float64Array(need.length);
  const least = unit * model.layout.webs;
  const table = cantileverData.pierTableM.value / 2;
  for (let k = 0; k < arms.length; k += 2) {
    const alike = Math.abs(arms[k]!.armM - arms[k + 1]!.armM) < 1e-9;
    const both = (): Side[] => [towardsPier(model, arms[k]!), towardsPier(model, arms[k + 1]!)];
    const together = (): Side =>
      // With unlike arms in the deck the middle of a span is asked from both of its piers, else from the one it is counted to.
      model.anchors.length > 0
        ? both()
            .flat()
            .sort((a, b) => b.away - a.away)
        : model.towardsPiers.get(arms[k]!.support)!;
    const sides = alike ? [together()] : both();
    sides.forEach((side, s) => {
      const { armM } = arms[k + s]!;
      let most = 0;
      let reached = 0;
      for (const { i, away } of side) {
        // A tendon runs on to the end of its segment: half a segment past where it is asked for.
        while (reached < side.length && side[reached]!.away >= away - weight.segmentM / 2) {
          most = Math.max(most, need[side[reached]!.i]!);
          reached++;
        }
        const segments = Math.ceil(Math.max(0, armM - Math.max(away, table)) / weight.segmentM - 1e-6);
        out[i] = Math.max(out[i]!, most, least * segments);
      }
    });
  }
  return out;
}

/** Stations beside a pier and their distance from it, m, the farthest first. */
type Side = readonly { readonly i: number; readonly away: number }[];

/** Stations of one side of a pier, from the middle of its span (or its end) inwards. */
function towardsPier({ beam, task }: CantileverModel, { span, side, pierM }: Arm): Side {
  const isEnd = span === 0 || span === task.spansM.length - 1;
  const mostM = (isEnd ? 1 : 0.5) * task.spansM[span]! + 1e-6;
  const stations: { readonly i: number; readonly away: number }[] = [];
  for (let i = beam.supportAt[span]!; i <= beam.supportAt[span + 1]!; i++) {
    const away = side * (beam.xM[i]! - pierM);
    if (away <= mostM) stations.push({ i, away });
  }
  return stations.sort((a, b) => b.away - a.away);
}

/** Never more towards the supports of a span than farther in; anchored past the section that needs them. */
function staggeredBottom(model: CantileverModel, need: Float64Array): Float64Array {
  const { beam } = model;
  const { anchorM } = cantileverData.bottomTendons;
  const out = new Float64Array(need.length);
  model.task.spansM.forEach((_, span) => {
    const from = beam.supportAt[span]!;
    const to = beam.supportAt[span + 1]!;
    let peak = from;
    for (let i = from; i <= to; i++) if (need[i]! > need[peak]!) peak = i;
    const walk = (start: number, step: 1 | -1): void => {
      let most = 0;
      let reached = start;
      for (let i = start; step * (peak - i) >= 0; i += step) {
        while (step * (peak - reached) >= 0 && step * (beam.xM[reached]! - beam.xM[i]!) <= anchorM) {
          most = Math.max(most, need[reached]!);
          reached += step;
        }
        out[i] = Math.max(out[i]!, most);
      }
    };
    walk(from, 1);
    walk(to, -1);
  });
  return out;
}

/** Strands of one tendon of each family: the fewest with which a web has no more tendons than are usual. */
function unitsFor(
  model: CantileverModel,
  weight: StagedWeight,
  needTop: Float64Array,
  needBottom: Float64Array,
): { readonly top: number; readonly bottom: number } {
  const { sizes } = boxData.tendons;
  const [least, most] = [sizes[0]!.strands, sizes[sizes.length - 1]!.strands];
  const unit = (need: Float64Array, mostPerWeb: number): number => {
    const perWeb = need.reduce((a, b) => Math.max(a, b), 0) / model.layout.webs;
    return Math.min(most, Math.max(least, Math.ceil(perWeb / mostPerWeb - 1e-6)));
  };
  return {
    top: unit(needTop, weight.segmentsPerArm + cantileverData.topTendons.overSegments),
    bottom: unit(needBottom, cantileverData.bottomTendons.mostPerWeb),
  };
}

/** Whole tendons in every web, as many as there is room for. */
function whole(model: CantileverModel, strands: Float64Array, unit: number, most: number): Float64Array {
  const step = unit * model.layout.webs;
  const room = Math.floor(most / step) * step;
  return strands.map((count) => Math.max(0, Math.min(room, step * Math.ceil(count / step - 1e-6))));
}

/** Strands the top slab has room for over a pier. */
export function mostTopStrands(model: CantileverModel): number {
  return ducts(cantileverData.topTendons, model.task.deck.widthM);
}

/** Strands the bottom slab has room for at midspan. */
export function mostBottomStrands(sections: HaunchedSections): number {
  return ducts(cantileverData.bottomTendons, sections.midspan.bottomWidthM);
}

function ducts(
  { widthShare, spacingM, layers }: { widthShare: number; spacingM: number; layers: number },
  widthM: number,
): number {
  const { sizes } = boxData.tendons;
  return Math.floor((widthShare * widthM) / spacingM) * layers * sizes[sizes.length - 1]!.strands;
}
