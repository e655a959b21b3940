import { ratePacks, survey, type Study } from '../../lib/index.ts';
import { largestScale } from '../drawing/scale.ts';
import { toDom } from '../drawing/toDom.ts';
import { listed } from '../format.ts';
import { h } from '../html.ts';
import { loadingChoices } from '../option-study/brief/briefChoices.ts';
import {
  choiceInput,
  figureInput,
  wordsInput,
  type Figure,
  type FigureSpec,
  type Origin,
} from '../page/index.ts';
import type { KeptGaps } from './keptGaps.ts';
import { begun, standingIn, type Crossed, type Gaps } from './newStudy.ts';
import { smallCrossing } from './smallCrossing.ts';

/** Gaps that hold a figure, 'unknown' among the answers. */
type FigureGap = 'widthM' | 'lengthM' | 'barredM' | 'headroomM' | 'roadLevelM' | 'heightM' | 'budget';

/** What the headroom and the height of the road are measured from. */
const datums: Readonly<Record<Crossed, string>> = {
  river: 'the ordinary water level',
  railway: 'the rails',
  road: 'the road below',
  open: 'the ground',
};

const metres = (
  label: string,
  least: number,
  from: number,
): Pick<FigureSpec, 'label' | 'places' | 'unit'> & Partial<FigureSpec> => ({
  label,
  places: 1,
  unit: 'm',
  step: 1,
  unknown: 'unknown',
  from,
  min: { value: least },
  max: { value: 10_000 },
});

export interface NewSentenceSpec {
  /** Titles of the studies that are there, so that one without a name is told from them. */
  readonly titles: () => readonly string[];
  /** Keeps the study and opens it; null where the browser keeps nothing. */
  readonly begin: ((study: Study) => void) | null;
  /** Where the sentence waits when the page is left. */
  readonly kept: KeptGaps;
}

/** One sentence with gaps from which a study is begun, what is taken where a gap stays empty, and the crossing as it stands. */
export function newSentence({ titles, begin, kept }: NewSentenceSpec): HTMLElement {
  let gaps: Gaps = kept.get();
  const drawn = h('div', { class: 'drawn' });
  const next = h('p', { class: 'next-gap', role: 'status' });
  const datumWords = [h('span', {}), h('span', {})];
  const start = h('button', { type: 'button', class: 'action' }, 'Work it out');
  start.addEventListener('click', () => {
    const made = begun(gaps, titles());
    if (made.ok) begin?.(made.study);
  });

  const show = (): void => {
    const made = begun(gaps, titles());
    for (const words of datumWords) words.textContent = datums[standingIn(gaps).crossed];
    start.toggleAttribute('disabled', !made.ok || begin === null);
    next.replaceChildren(
      h('b', {}, 'Next:'),
      made.ok
        ? ` work it out as it is. Taken until it is known: ${listed(made.taken)}.`
        : gaps.lengthM === 'unknown'
          ? ' gap 4, the length between the abutments; every other gap may stay as it is.'
          : ` not begun, ${made.why}.`,
    );
    if (!made.ok) return drawn.replaceChildren();
    const site = survey(made.study.brief);
    const scale = largestScale(site.lengthM, Math.max(drawn.clientWidth, 320) - 40, 1000);
    drawn.replaceChildren(toDom(smallCrossing(site, scale, 'new'), document));
  };
  const put = (change: Partial<Gaps>): void => {
    gaps = { ...gaps, ...change };
    kept.put(gaps);
    show();
  };

  /** A gap with its number, which stays on its line. */
  const numbered = (count: number, gap: HTMLElement): HTMLElement =>
    h('span', { class: 'glue' }, gap, h('sup', {}, count));
  const figure = (
    gap: FigureGap,
    spec: Pick<FigureSpec, 'label' | 'places' | 'unit'> & Partial<FigureSpec>,
  ): HTMLElement =>
    figureInput({
      ...spec,
      value: gaps[gap],
      input: (value: Figure) => put({ [gap]: value }),
    }).element;
  // A study that names no rate pack has the first; its budget is at those prices.
  const [pack] = ratePacks.values();
  const { currency, priceDate } = pack!;

  const originOf = (gap: Gaps[keyof Gaps]): Origin => (gap === 'unknown' ? 'assumed' : 'typed');
  /** What was said of the lanes when the present go at them began. */
  let { lanes: lanesBefore } = gaps;
  const lanesGap = figureInput({
    label: 'lanes',
    places: 0,
    origin: originOf(gaps.lanes),
    value: standingIn(gaps).lanes,
    min: { value: 1 },
    max: { value: 20 },
    input: (lanes) => lanes !== 'unknown' && put({ lanes }),
    change: () => (lanesBefore = gaps.lanes),
    drop() {
      put({ lanes: lanesBefore });
      lanesGap.set(standingIn(gaps).lanes, originOf(lanesBefore));
    },
    confirm() {
      const { lanes } = standingIn(gaps);
      put({ lanes });
      lanesGap.set(lanes, 'typed');
    },
  });
  const crossedGap = choiceInput<Crossed>({
    label: 'what is crossed',
    value: standingIn(gaps).crossed,
    origin: originOf(gaps.crossed),
    choices: [
      { value: 'river', words: 'a river' },
      { value: 'railway', words: 'a railway' },
      { value: 'road', words: 'a road' },
      { value: 'open', words: 'open ground' },
    ],
    change: (crossed) => put({ crossed }),
    confirm() {
      const { crossed } = standingIn(gaps);
      put({ crossed });
      crossedGap.set(crossed, 'typed');
    },
  });
  const loadingGap = choiceInput({
    label: 'load standard',
    value: standingIn(gaps).loading,
    origin: originOf(gaps.loading),
    choices: loadingChoices,
    change: (loading) => put({ loading }),
    confirm() {
      const { loading } = standingIn(gaps);
      put({ loading });
      loadingGap.set(loading, 'typed');
    },
  });

  const element = h(
    'div',
    { class: 'new-study' },
    h(
      'p',
      { class: 'prose' },
      wordsInput({
        label: 'name of the crossing',
        value: gaps.title,
        most: 500,
        change: (title) => put({ title }),
      }).element,
      ' (its name): a road of ',
      numbered(1, lanesGap.element),
      ' lanes on a deck ',
      numbered(
        2,
        figure('widthM', { ...metres('width of the deck', 3.5, 10), places: 2, max: { value: 80 } }),
      ),
      ' m wide has to cross ',
      numbered(3, crossedGap.element),
      ' in ',
      numbered(4, figure('lengthM', { ...metres('length between the abutments', 5, 60) })),
      ' m between its abutments. No support may stand in ',
      numbered(5, figure('barredM', { ...metres('stretch without supports', 0, 20) })),
      ' m in the middle of it, and ',
      numbered(
        6,
        figure('headroomM', { ...metres('headroom', 0.1, 5), places: 2, step: 0.1, max: { value: 200 } }),
      ),
      ' m must stay clear above ',
      datumWords[0],
      '. The road lies at level ',
      numbered(7, figure('roadLevelM', { ...metres('level of the road', -1000, 100), places: 2, step: 0.1 })),
      ' m, ',
      numbered(
        8,
        figure('heightM', {
          ...metres('height of the road', 2, 8),
          places: 2,
          step: 0.1,
          max: { value: 500 },
        }),
      ),
      ' m above ',
      datumWords[1],
      '. It is loaded by ',
      numbered(9, loadingGap.element),
      '; the budget is ',
      numbered(
        10,
        figure('budget', {
          label: 'budget',
          places: 2,
          unit: `M${currency}`,
          per: 1e-6,
          step: 0.1,
          unknown: 'not given',
          from: 1,
          min: { value: 0, open: true },
          max: { value: 1e7 },
        }),
      ),
      ` million ${currency} at ${priceDate} prices.`,
    ),
    next,
    h('p', {}, start),
    drawn,
  );
  show();
  return element;
}
