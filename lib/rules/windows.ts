import type { Effect, Facts, FormId, MethodId } from '../model/index.ts';
import { rulesFor } from './book.ts';
import { truthOf } from './evaluate.ts';
import { factsIn, limitsOn } from './limitsOn.ts';
import type { Rule } from './rule.ts';
import { wholeCondition } from './verdictOf.ts';

/** Two ends of an interval, both allowed; infinite where no rule sets one. */
export type Interval = readonly [least: number, most: number];

/** Whether a rule leaves a value of a fact open: a barring rule must not hold there, a favouring one must. */
function leavesOpen(rule: Rule, facts: Facts): boolean {
  const truth = truthOf(wholeCondition(rule), facts);
  return rule.effect === 'in favour' ? truth === true : truth !== true;
}

/**
 * The interval of a numeric fact that rules leave open, read from the rules' own conditions.
 *
 * Rules whose effect is among `effects` and whose condition names the fact are asked, whatever the point of the
 * pipeline. One that bars (`out`, `caution`, `to confirm`) closes the values at which it holds for certain; one
 * `in favour` closes those at which it does not. Other facts are unknown unless given. Where more than one
 * interval stays open the longest is returned; open ends are returned as the limit itself.
 *
 * @param fact id of a numeric fact
 * @param given other facts that are known, e.g. `{continuity: 'continuous'}`
 * @returns null where nothing stays open, or where only rules in favour were asked for and none holds anywhere
 */
export function windowOf(
  form: FormId,
  fact: string,
  effects: readonly Effect[],
  given: Facts = {},
): Interval | null {
  const key = JSON.stringify([form, fact, effects, given]);
  const known = windows.get(key);
  if (known !== undefined) return known;
  const found = leftOpen(form, fact, effects, given);
  windows.set(key, found);
  return found;
}

/** Windows read so far: the book never changes, and a search asks for the same few again and again. */
const windows = new Map<string, Interval | null>();

function leftOpen(form: FormId, fact: string, effects: readonly Effect[], given: Facts): Interval | null {
  const asked = rulesFor(form).filter(
    (rule) => effects.includes(rule.effect) && limitsOn(wholeCondition(rule), fact, given).length > 0,
  );
  // A favouring rule that cannot hold at any value (it speaks of simple spans, say, and the unit is continuous) is not a limit.
  const limits = [...new Set(asked.flatMap((rule) => limitsOn(wholeCondition(rule), fact, given)))].sort(
    (a, b) => a - b,
  );
  const marks = [-Infinity, ...limits, Infinity];
  const probes = marks.slice(1).flatMap((mark, i) => {
    const before = marks[i]!;
    const between = Number.isFinite(before)
      ? Number.isFinite(mark)
        ? (before + mark) / 2
        : before + 1
      : Number.isFinite(mark)
        ? mark - 1
        : 0;
    const inside = { value: between, from: before, to: mark };
    return Number.isFinite(mark) ? [inside, { value: mark, from: mark, to: mark }] : [inside];
  });
  const holdsSomewhere = (rule: Rule): boolean =>
    probes.some(({ value }) => leavesOpen(rule, { ...given, [fact]: value }));
  const favouring = asked.filter((rule) => rule.effect === 'in favour');
  const live = favouring.filter(holdsSomewhere);
  if (live.length === 0 && effects.every((effect) => effect === 'in favour')) return null;
  const deciding = [...asked.filter((rule) => rule.effect !== 'in favour'), ...live];

  const runs: Interval[] = [];
  let wasOpen = false;
  for (const { value, from, to } of probes) {
    const open = deciding.every((rule) => leavesOpen(rule, { ...given, [fact]: value }));
    if (open) runs.push(wasOpen ? [runs.pop()![0], to] : [from, to]);
    wasOpen = open;
  }
  return runs.reduce<Interval | null>(
    (best, run) => (best === null || run[1] - run[0] > best[1] - best[0] ? run : best),
    null,
  );
}

/** The one window that must exist for every form; a missing one is a fault of the book. */
function required(window: Interval | null, form: FormId, what: string): Interval {
  if (window === null) throw new RangeError(`no ${what} in the rules of ${form}`);
  return window;
}

/**
 * Span band of a form, m: `possible` is what no rule puts out, `usual` what the span rule favours.
 * The least possible span is 0 where no rule sets one.
 */
export function spanWindow(form: FormId): { readonly possible: Interval; readonly usual: Interval } {
  const [least, most] = required(windowOf(form, 'mainSpanM', ['out']), form, 'possible span');
  return {
    possible: [Math.max(0, least), most],
    usual: required(windowOf(form, 'mainSpanM', ['in favour']), form, 'usual span'),
  };
}

/** The facts whose published band sets how deep a form is drawn, in the order in which they are looked for. */
const depthMeasures = ['depthRatio', 'trussHeightRatio', 'edgeGirderRatio', 'riseRatio'] as const;
export type DepthMeasure = (typeof depthMeasures)[number];

/**
 * What `depthBand` of a form measures: structural depth over governing span, or, where the road runs between or over
 * the main members, the height of the truss, the depth of the edge girders or the rise of the arch over the span
 * (their depth under the road is a floor, see `floorBand`).
 */
export function depthMeasure(form: FormId): DepthMeasure {
  const named = rulesFor(form).flatMap((rule) => factsIn(rule.condition));
  const measure = depthMeasures.find((fact) => named.includes(fact));
  if (measure === undefined) throw new RangeError(`no depth band in the rules of ${form}`);
  return measure;
}

/**
 * Published band of `depthMeasure` over span, [least, most], of a form. For forms of varying depth it is the depth at
 * the support, and `midspanDepthBand` gives the other; a form that may have either is taken at constant depth.
 *
 * @param method some methods need more depth (launching)
 */
export function depthBand(
  form: FormId,
  continuity: 'simple' | 'continuous',
  method: MethodId = 'crane',
): Interval {
  return required(
    windowOf(form, depthMeasure(form), ['in favour'], { continuity, method, haunched: false }),
    form,
    `depth band of ${continuity} spans`,
  );
}

/** Published band of midspan depth over span for forms of varying depth; null for the others. */
export function midspanDepthBand(form: FormId): Interval | null {
  return windowOf(form, 'midspanDepthRatio', ['in favour']);
}

/** Published bands of depth over span at midspan and over the piers where a form is haunched by choice; null for the others. */
export function haunchedDepthBands(
  form: FormId,
): { readonly midspan: Interval; readonly pier: Interval } | null {
  const haunched = { continuity: 'continuous', haunched: true };
  const midspan = windowOf(form, 'midspanDepthRatio', ['in favour'], haunched);
  const pier = windowOf(form, 'depthRatio', ['in favour'], haunched);
  return midspan && pier && { midspan, pier };
}

/** Band of floor depth over deck width for forms that carry the road between two main members; null for the others. */
export function floorBand(form: FormId): Interval | null {
  return windowOf(form, 'floorDepthRatio', ['in favour']);
}

/** End span over the span beside it in a continuous unit: what rules leave without a caution; null where no rule speaks of it. */
export function endRatioWindow(form: FormId): Interval | null {
  const window = windowOf(form, 'endSpanRatio', ['out', 'caution'], { continuity: 'continuous' });
  return window !== null && Number.isFinite(window[1]) ? window : null;
}

/** Shorter over longer span of a unit of two, the least that rules leave without a caution. @throws RangeError where no rule speaks of it */
export function leastOfTwoSpans(form: FormId): number {
  const window = windowOf(form, 'endSpanRatio', ['out', 'caution'], { continuity: 'continuous' });
  return required(window, form, 'rule for unequal spans')[0];
}

/** Side span over main span of a cable-supported form with one or two pylons; null where no rule speaks of it. */
export function sideRatioWindow(form: FormId, pylons: 1 | 2): Interval | null {
  const window = windowOf(form, 'sideSpanRatio', ['out', 'caution'], { pylons });
  return window !== null && Number.isFinite(window[1]) ? window : null;
}

/** Least spare headroom, m, that rules leave open. */
export function leastHeadroomSpareM(form: FormId): number {
  return required(windowOf(form, 'headroomSpareM', ['out']), form, 'headroom rule')[0];
}
