import { builtSpans, fact, printed, spanWindow } from '../../lib/index.ts';
import type { FormId, Guide, GuideForm } from '../../lib/index.ts';
import { fixed, plain } from '../format.ts';
import type { SpanFigures, SpanRow } from './spanChart.ts';

/** Left end of the span axis, m: forms without a least span begin here. */
const LEAST_M = 4;

type Turn = NonNullable<GuideForm['flip']>;

/** A span or width at which something turns: limits stand on whole metres, the change one step of 0.1 m past them. */
function turnAt({ from, to }: Turn): { readonly words: string; readonly byM: number } {
  const whole = Math.round(to);
  const past = to !== whole && Math.abs(to - whole) < 0.15;
  const at = past ? whole : to;
  return {
    words: `${past ? (to > from ? 'over' : 'under') : 'at'} ${plain(at)} m`,
    byM: Math.abs(at - from),
  };
}

/** '28 m longer', or 'if any longer' where the limit is reached. */
const byWords = (byM: number, which: string): string =>
  byM < 0.05 ? `if any ${which}` : `${plain(byM)} m ${which}`;

/** What has to change for a form to stand otherwise, by the fact that changes. */
const turns: Readonly<Record<string, (turn: Turn) => string>> = {
  mainSpanM(turn) {
    const { words, byM } = turnAt(turn);
    return `${words}, ${byWords(byM, turn.to > turn.from ? 'longer' : 'shorter')}`;
  },
  deckWidthM(turn) {
    const { words, byM } = turnAt(turn);
    return `${words} of deck, ${byWords(byM, turn.to > turn.from ? 'wider' : 'narrower')}`;
  },
  planRadiusM: ({ from, to }) =>
    `at a plan radius of ${fixed(to, 0)} m, ${fixed(Math.abs(to - from), 0)} m ${to > from ? 'flatter' : 'tighter'}`,
  unitLengthM: ({ from, to }) =>
    `at ${plain(to)} m between abutments, ${plain(Math.abs(to - from))} m ${to > from ? 'longer' : 'shorter'}`,
  sideSpanRatio: ({ from, to }) =>
    `with side spans of ${fixed(to, 2)} of the main span instead of ${fixed(from, 2)}`,
  spanToWidth: ({ from, to }) => `at ${plain(to)} times the deck width instead of ${plain(from)}`,
  pylons: ({ to }) => (to === 1 ? 'with one pylon' : `with ${fixed(to, 0)} pylons`),
  skewDeg: ({ to }) => `at a skew of ${fixed(to, 0)}°`,
};

/** How far a form is from standing otherwise: 'possible over 97 m, 34 m longer'. Undefined where nothing turns it. */
export function flipWords({ flip }: Pick<GuideForm, 'flip'>): string | undefined {
  if (flip === undefined) return undefined;
  const turn = turns[flip.fact] ?? (({ fact: id, to }) => `at ${fact(id).label} ${printed(fact(id), to)}`);
  return `${flip.becomes} ${turn(flip)}`;
}

/** Keeps figure and unit on one line. */
const unbroken = (words: string): string => words.replace(/(\d) (m)\b/gu, '$1\u00a0$2');

/** Figures of a row by the rules and the record behind them; the end of the axis is none. */
function figuresOf(form: FormId, possible: readonly [number, number], isBuilt: boolean): SpanFigures {
  const ends = (window: string) =>
    [`windows/${form}/${window}/least`, `windows/${form}/${window}/most`] as const;
  const [least, most] = ends('span');
  return {
    usual: ends('usual'),
    possible: [possible[0] < LEAST_M ? undefined : least, most],
    statistics: isBuilt ? [`built/${form}/p5`, `built/${form}/p50`, `built/${form}/p95`] : [],
    bridges: `built/${form}/count`,
  };
}

/**
 * Rows of the span chart for an answer, forms in the order given.
 * @param isAsked whether the figures can be asked where they come from on the page that shows them
 */
export const spanRows = (guide: Guide, order: readonly FormId[], isAsked = false): readonly SpanRow[] =>
  order.map((form) => {
    const { possible, usual } = spanWindow(form);
    const answer = guide.forms.find((entry) => entry.form === form)!;
    const built = builtSpans(form);
    const flip = flipWords(answer);
    return {
      form,
      usual,
      possible: [Math.max(LEAST_M, possible[0]), possible[1]] as const,
      ...(built === null
        ? {}
        : { statistics: [built.p5, built.p50, built.p95] as const, bridges: built.count }),
      status: answer.status,
      words: unbroken(answer.because.join('; ')),
      ...(isAsked && { figures: figuresOf(form, possible, built !== null) }),
      ...(flip === undefined ? {} : { flip: unbroken(flip) }),
    };
  });
