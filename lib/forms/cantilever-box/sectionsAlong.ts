import { boxData } from '../concrete-box/boxData.ts';
import { formworkPerM } from '../concrete-box/boxLines.ts';
import { boxSection, type BoxSection } from '../concrete-box/boxSection.ts';
import type { Thicknesses } from '../concrete-box/sectionsAlong.ts';
import { cantileverData } from './cantileverData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { haunchShare } from './haunch.ts';

/** The haunched box at the stations of its beam. */
export interface HaunchedSections {
  readonly midspan: BoxSection;
  /** Over the pier of the longest arms. */
  readonly pier: BoxSection;
  readonly pierAt: ReadonlyMap<number, BoxSection>;
  readonly end: BoxSection;
  readonly webM: Float64Array;
  readonly bottomM: Float64Array;
  readonly areaM2: Float64Array;
  readonly inertiaM4: Float64Array;
  /** Top of slab to centroid, and centroid to soffit, m. */
  readonly topM: Float64Array;
  readonly lowM: Float64Array;
  readonly bottomWidthM: Float64Array;
  /** Sections at the knots of the arms of each inner pier. */
  readonly atKnots: ReadonlyMap<number, readonly BoxSection[]>;
  /** Area along the arms of each inner pier, by way from the pier, m2. */
  readonly armAreaM2: ReadonlyMap<number, (way: number) => number>;
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
];

function numbersOf(s: BoxSection): Numbers {
  return [s.webM, s.bottomM, s.areaM2, s.inertiaM4, s.topM, s.lowM, s.bottomWidthM];
}

/** Sections at knots of each arm, properties straight between them; webs thicken again beside the abutments. */
export function haunchedSections(model: CantileverModel, t: Thicknesses): HaunchedSections {
  const { layout, task, beam, depthsM } = model;
  const midspan = boxSection(layout, task.depthM, t.webM, t.bottomM);
  const end = boxSection(layout, task.depthM, t.supportWebM, t.bottomM);
  const pierAt = new Map<number, BoxSection>();
  const onArms = new Map<number, readonly Numbers[]>();
  const armAreaM2 = new Map<number, (way: number) => number>();
  const atKnots = new Map<number, readonly BoxSection[]>();
  const made = new Map<
    string,
    { readonly at: readonly BoxSection[]; readonly numbers: readonly Numbers[] }
  >();
  for (const [support, depthM] of depthsM) {
    const key = depthM.toFixed(4);
    let known = made.get(key);
    if (!known) {
      const sections = knots.map((way) =>
        boxSection(
          layout,
          task.depthM + (depthM - task.depthM) * haunchShare(way),
          t.webM + (t.supportWebM - t.webM) * webShareOnArm(way),
          t.bottomM + (t.pierBottomM - t.bottomM) * slabShare(way),
        ),
      );
      known = { at: sections, numbers: sections.map(numbersOf) };
      made.set(key, known);
    }
    const { numbers } = known;
    atKnots.set(support, known.at);
    pierAt.set(support, known.at[0]!);
    onArms.set(support, numbers);
    armAreaM2.set(support, (way) => {
      const [k, share] = between(way);
      return numbers[k]![2] + share * (numbers[k + 1]![2] - numbers[k]![2]);
    });
  }
  const n = beam.xM.length;
  const arrays = Array.from({ length: 7 }, () => new Float64Array(n));
  const [mid, abutment] = [numbersOf(midspan), numbersOf(end)];
  for (let i = 0; i < n; i++) {
    const arm = model.arms[model.armAt[i]!];
    const numbers = arm ? onArms.get(arm.support)! : [mid];
    const [k, share] = arm ? between(model.way[i]!) : [0, 0];
    const atEnd = webShareAtEnd(model, i);
    for (let j = 0; j < 7; j++) {
      const near = numbers[k]![j]!;
      const far = numbers[k + 1]?.[j] ?? near;
      arrays[j]![i] = near + share * (far - near) + atEnd * (abutment[j]! - mid[j]!);
    }
  }
  const deepest = [...pierAt.values()].reduce((a, b) => (b.depthM > a.depthM ? b : a), end);
  return {
    midspan,
    pier: deepest,
    pierAt,
    end,
    webM: arrays[0]!,
    bottomM: arrays[1]!,
    areaM2: arrays[2]!,
    inertiaM4: arrays[3]!,
    topM: arrays[4]!,
    lowM: arrays[5]!,
    bottomWidthM: arrays[6]!,
    atKnots,
    armAreaM2,
  };
}

/** Formed faces per m of deck at the stations, m. */
export function formsAlong(model: CantileverModel, sections: HaunchedSections): Float64Array {
  const atKnots = new Map(
    [...sections.atKnots].map(([support, at]) => [support, at.map(({ outline }) => formworkPerM(outline))]),
  );
  const midspan = formworkPerM(sections.midspan.outline);
  return model.way.map((way, i) => {
    const arm = model.arms[model.armAt[i]!];
    if (!arm) return midspan;
    const at = atKnots.get(arm.support)!;
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
