import { continuityOf, type GuideTask } from './guide.ts';
import type { Facts, FormId, MethodId } from './model/index.ts';
import { methodIds } from './model/index.ts';
import { evaluate, fact, rulesFor, windowOf, type Interval, type Rule } from './rules/index.ts';

/** One published band of depth: what it measures, as a ratio and in metres for the span and width asked for. */
export interface DepthGuidance {
  /** E.g. 'depth at the support', 'floor depth', 'rise'. */
  readonly what: string;
  /** What the ratio is taken of. */
  readonly of: 'span' | 'deck width';
  /** Ratio, least and most. */
  readonly ratio: Interval;
  /** The same in metres. */
  readonly depthM: Interval;
  /** Depth in metres under which the rules ask for confirmation, where the band reaches below it. */
  readonly leastM?: number;
  /** Only for this method of construction; left out = whatever the method. */
  readonly method?: MethodId;
  /** Ids of the bibliography. */
  readonly sources: readonly string[];
  /** Where sources disagree, or what was left aside. */
  readonly note?: string;
}

/** The ratio a rule favours, where it favours a band of one ratio to span or width. */
function bandIn({ condition }: Rule): { readonly id: string; readonly ratio: Interval } | null {
  if (!('between' in condition)) return null;
  const { fact: id, between } = condition;
  return fact(id).ratioOf === undefined ? null : { id, ratio: between };
}

/** Rules of depth in favour of a form that hold for a continuity and a method. */
const favouring = (form: FormId, given: Facts): readonly Rule[] =>
  rulesFor(form, ['option']).filter(
    ({ subject, effect, when }) =>
      subject === 'depth' &&
      effect === 'in favour' &&
      (when === undefined || evaluate(when, given).truth === true),
  );

/**
 * Published bands of depth for a form at a span, those whatever the method first. Whether the unit is continuous hangs
 * on the room for side spans, as in `guide`.
 *
 * @throws RangeError where a figure of the task is not a positive number
 */
export function depthGuidance(form: FormId, task: GuideTask): readonly DepthGuidance[] {
  const { spanM, widthM = 12, lengthM = spanM } = task;
  for (const [name, value] of Object.entries({ spanM, widthM, lengthM }))
    if (!(value > 0)) throw new RangeError(`${name}: expected more than 0 m, received ${value} m`);
  const continuity = continuityOf(form, (lengthM - spanM) / 2 / spanM);
  const given = { continuity, method: 'crane', haunched: false };
  const usual = favouring(form, given);
  const besides = (other: Facts): Rule[] =>
    favouring(form, { ...given, ...other }).filter((rule) => !usual.includes(rule));
  const all: readonly { readonly rule: Rule; readonly method?: MethodId; readonly haunched?: true }[] = [
    ...usual.map((rule) => ({ rule })),
    ...besides({ haunched: true }).map((rule) => ({ rule, haunched: true as const })),
    ...methodIds.flatMap((method) => besides({ method }).map((rule) => ({ rule, method }))),
  ];
  const varies = usual.some((rule) => bandIn(rule)?.id === 'midspanDepthRatio');
  return all.flatMap(({ rule, method, haunched }) => {
    const band = bandIn(rule);
    if (band === null) return [];
    const { label, ratioOf } = fact(band.id);
    const least =
      band.id === 'midspanDepthRatio' ? windowOf(form, 'midspanDepthM', ['to confirm'])?.[0] : undefined;
    const base = ratioOf?.[1] === 'deckWidthM' ? widthM : spanM;
    return [
      {
        what: `${
          band.id !== 'depthRatio'
            ? label.replace(/ over .*$/u, '')
            : varies || haunched
              ? 'depth at the support'
              : 'depth'
        }${haunched ? ' of a haunched deck' : ''}`,
        of: ratioOf?.[1] === 'deckWidthM' ? ('deck width' as const) : ('span' as const),
        ratio: band.ratio,
        depthM: [band.ratio[0] * base, band.ratio[1] * base] as const,
        ...(least !== undefined && least > band.ratio[0] * base ? { leastM: least } : {}),
        ...(method === undefined ? {} : { method }),
        sources: rule.sources,
        ...(rule.note === undefined ? {} : { note: rule.note }),
      },
    ];
  });
}
