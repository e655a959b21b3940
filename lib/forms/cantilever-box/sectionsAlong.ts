import { boxData } from '../concrete-box/boxData.ts';
import { formworkPerM } from '../concrete-box/boxLines.ts';
import { polygonProperties } from '../../mechanics/index.ts';
import type { Outline } from '../concrete-box/boxOutline.ts';
import { boxSection, type BoxSection } from '../concrete-box/boxSection.ts';
import type { Thicknesses } from '../concrete-box/sectionsAlong.ts';
import type { BoxLayout } from '../concrete-box/boxLayout.ts';
import { betweenZeros, lagOf } from '../concrete-box/shearLag.ts';
import { cantileverData } from './cantileverData.ts';
import { holdsDown, type CantileverModel } from './cantileverModel.ts';
import { haunchShare } from './haunch.ts';

/** Thicknesses away from the supports, m. */
export type MiddleThicknesses = Pick<Thicknesses, 'webM' | 'bottomM'>;

/**
 * Thicknesses that are sought. A span that holds a longer arm down hogs far from its pier where the arm does not: it has a
 * web and a bottom slab of its own, so that they do not weigh on the arm.
 */
export interface HaunchedThicknesses extends Thicknesses {
  /** By span; null in spans that have those of all others. */
  readonly holding: readonly (MiddleThicknesses | null)[];
}

/** Thicknesses of a span away from its supports. */
export function middleOf(t: HaunchedThicknesses, span: number): MiddleThicknesses {
  return t.holding[span] ?? t;
}

/** The same thicknesses for a start, those of holding spans apart. */
export function startThicknesses(model: CantileverModel): HaunchedThicknesses {
  const middle = { webM: model.leastWebM, bottomM: model.leastBottomM };
  const goingOn = model.anchors.filter(({ longer }) => {
    const { armM, balancedM } = model.arms[longer]!;
    return armM > balancedM;
  });
  return {
    ...middle,
    supportWebM: model.leastWebM,
    pierBottomM: model.leastBottomM,
    holding: model.task.spansM.map((_, span) => (holdsDown(goingOn, span) ? middle : null)),
  };
}

/** The haunched box at the stations of its beam. */
export interface HaunchedSections {
  /** Of the spans that hold no arm down. */
  readonly midspan: BoxSection;
  /** Least height of the cells, m. */
  readonly innerM: number;
  /** Over the pier of the longest arms. */
  readonly pier: BoxSection;
  readonly pierAt: ReadonlyMap<number, BoxSection>;
  /** Over the first and the last support. */
  readonly ends: readonly [BoxSection, BoxSection];
  readonly webM: Float64Array;
  readonly bottomM: Float64Array;
  readonly areaM2: Float64Array;
  readonly inertiaM4: Float64Array;
  /** Top of slab to centroid, and centroid to soffit, m. */
  readonly topM: Float64Array;
  readonly lowM: Float64Array;
  readonly bottomWidthM: Float64Array;
  /** What shear lag makes of the bending stress at the top and at the soffit. */
  readonly topLag: Float64Array;
  readonly lowLag: Float64Array;
  /** Sections at the knots of every arm. */
  readonly atKnots: readonly (readonly BoxSection[])[];
  /** Area along every arm, by way from its pier, m2. */
  readonly armAreaM2: readonly ((way: number) => number)[];
}

/** Ways from the pier at which sections are worked out; straight between them. */
const knots = [0, 0.1, 0.22, 0.35, 0.48, cantileverData.webZone.overArm, 0.8, 1] as const;

/** Share of the thickening of the bottom slab at a way from the pier. */
export function slabShare(way: number): number {
  return (1 - way) ** cantileverData.slabPower.value;
}

/** Share of the thickening of the webs at a way from the pier. */
export function webShareOnArm(way: number): number {
  return Math.max(0, 1 - way / cantileverData.webZone.overArm);
}

/** Share of the thickening of the webs beside an abutment, at a station. */
export function webShareAtEnd(model: CantileverModel, station: number): number {
  const { spansM } = model.task;
  const x = model.beam.xM[station]!;
  const { overSpan } = boxData.pierZone;
  return Math.max(
    0,
    1 - x / (overSpan * spansM[0]!),
    1 - (model.lengthM - x) / (overSpan * spansM[spansM.length - 1]!),
  );
}

type Numbers = readonly [
  web: number,
  bottom: number,
  area: number,
  i: number,
  top: number,
  low: number,
  width: number,
  topLag: number,
  lowLag: number,
];
const numberCount = 9;

/** @param zerosM length between points of no moment there, m */
function numbersOf(layout: BoxLayout, s: BoxSection, zerosM: number): Numbers {
  const { top, low } = lagOf(layout, s, zerosM);
  return [s.webM, s.bottomM, s.areaM2, s.inertiaM4, s.topM, s.lowM, s.bottomWidthM, top, low];
}

/** Sections at knots of each arm, properties straight between them; webs thicken again beside the abutments. */
export function haunchedSections(model: CantileverModel, t: HaunchedThicknesses): HaunchedSections {
  const { layout, task, beam, depthsM, arms } = model;
  const last = task.spansM.length - 1;
  const common = boxSection(layout, task.depthM, t.webM, t.bottomM);
  const middles = t.holding.map((own) =>
    own ? boxSection(layout, task.depthM, own.webM, own.bottomM) : common,
  );
  const endOf = (span: number): BoxSection =>
    boxSection(layout, task.depthM, t.supportWebM, middleOf(t, span).bottomM);
  const first = endOf(0);
  // The same at both ends where neither span holds an arm down.
  const ends = [first, t.holding[0] || t.holding[last] ? endOf(last) : first] as const;
  const pierAt = new Map<number, BoxSection>();
  const made = new Map<
    string,
    { readonly at: readonly BoxSection[]; readonly numbers: readonly Numbers[] }
  >();
  const zeros = betweenZeros(task.spansM);
  // Half of an inner span is an arm: its first two fifths are the fifth of the span beside the pier.
  const zerosAt = (way: number): number =>
    zeros.inSpanM +
    Math.max(0, 1 - way / (2 * boxData.pierZone.overSpan)) * (zeros.overPierM - zeros.inSpanM);
  const onArms = arms.map(({ support, span }) => {
    const depthM = depthsM.get(support)!;
    const { webM, bottomM } = middleOf(t, span);
    const key = [depthM.toFixed(4), webM, bottomM].join();
    let known = made.get(key);
    if (!known) {
      const sections = knots.map((way) =>
        boxSection(
          layout,
          task.depthM + (depthM - task.depthM) * haunchShare(way),
          webM + (t.supportWebM - webM) * webShareOnArm(way),
          bottomM + (t.pierBottomM - bottomM) * slabShare(way),
        ),
      );
      known = {
        at: sections,
        numbers: sections.map((section, k) => numbersOf(layout, section, zerosAt(knots[k]!))),
      };
      made.set(key, known);
    }
    pierAt.set(support, known.at[0]!);
    return known;
  });
  const n = beam.xM.length;
  const arrays = Array.from({ length: numberCount }, () => new Float64Array(n));
  const inSpan = (section: BoxSection): Numbers => numbersOf(layout, section, zeros.inSpanM);
  const mids = middles.map(inSpan);
  const abutments = ends.map(inSpan);
  for (let i = 0; i < n; i++) {
    const arm = model.armAt[i]!;
    const numbers = arm >= 0 ? onArms[arm]!.numbers : mids;
    const [k, share] = arm >= 0 ? between(model.way[i]!) : [0, 0];
    const atEnd = webShareAtEnd(model, i);
    const isFirst = 2 * beam.xM[i]! < model.lengthM;
    const abutment = abutments[isFirst ? 0 : 1]!;
    const mid = mids[isFirst ? 0 : last]!;
    for (let j = 0; j < numberCount; j++) {
      const near = numbers[k]![j]!;
      const far = numbers[k + 1]?.[j] ?? near;
      arrays[j]![i] = near + share * (far - near) + atEnd * (abutment[j]! - mid[j]!);
    }
  }
  const deepest = [...pierAt.values()].reduce((a, b) => (b.depthM > a.depthM ? b : a), ends[0]);
  return {
    midspan: common,
    innerM: Math.max(0, Math.min(...middles.map(({ outline }) => outline.innerM))),
    pier: deepest,
    pierAt,
    ends,
    webM: arrays[0]!,
    bottomM: arrays[1]!,
    areaM2: arrays[2]!,
    inertiaM4: arrays[3]!,
    topM: arrays[4]!,
    lowM: arrays[5]!,
    bottomWidthM: arrays[6]!,
    topLag: arrays[7]!,
    lowLag: arrays[8]!,
    atKnots: onArms.map(({ at }) => at),
    armAreaM2: onArms.map(({ numbers }) => (way: number): number => {
      const [k, share] = between(way);
      return numbers[k]![2] + share * (numbers[k + 1]![2] - numbers[k]![2]);
    }),
  };
}

/** Formed faces per m of deck at the stations, m. */
export function formsAlong(model: CantileverModel, sections: HaunchedSections): Float64Array {
  return outlinesAlong(model, sections, formworkPerM);
}

/** Area of the cells at the stations, m2. */
export function cellsAlong(model: CantileverModel, sections: HaunchedSections): Float64Array {
  return outlinesAlong(model, sections, ({ cells }) =>
    cells.reduce((sum, cell) => sum + polygonProperties(cell).areaM2, 0),
  );
}

/** What is measured on the outlines at the knots of the arms, straight between them. */
function outlinesAlong(
  model: CantileverModel,
  sections: HaunchedSections,
  measure: (outline: Outline) => number,
): Float64Array {
  const atKnots = sections.atKnots.map((at) => at.map(({ outline }) => measure(outline)));
  const midspan = measure(sections.midspan.outline);
  return model.way.map((way, i) => {
    const at = atKnots[model.armAt[i]!];
    if (!at) return midspan;
    const [k, share] = between(way);
    return at[k]! + share * (at[k + 1]! - at[k]!);
  });
}

/** Knot before a way, and how far it lies on to the next. */
function between(way: number): [knot: number, share: number] {
  let k = 0;
  while (k < knots.length - 2 && way > knots[k + 1]!) k++;
  return [k, (way - knots[k]!) / (knots[k + 1]! - knots[k]!)];
}
