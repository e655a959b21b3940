import type { Figure, FigureKind } from '../../lib/index.ts';
import { powers } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';
import type { ChainRow } from './figureChain.ts';
import { printedValue, valueWords } from './figureValue.ts';

/** Further in than this the lines stand below one another. */
const DEEPEST = 8;

const looks: Readonly<Record<FigureKind, string>> = {
  typed: 'fig typed',
  preset: 'fig preset',
  unknown: 'fig unknown',
  computed: 'fig',
};

const kinds: Readonly<Record<FigureKind, string>> = {
  typed: 'typed',
  preset: 'preset',
  unknown: 'not known',
  computed: '',
};

/** What kind of figure it is, where its method does not say so itself. */
const kindOf = ({ kind, because }: Figure): string => (because.method.startsWith(kind) ? '' : kinds[kind]);

const sentence = (words: readonly string[]): string =>
  words.filter((one, i) => one !== '' && words.indexOf(one) === i).join('; ');

/** Range of a figure that is a likely value: 'between 5.0 and 8.3 M€'. */
function rangeWords({ path, unit, range }: Figure): string {
  if (range === undefined || !path.endsWith('/p50')) return '';
  const [low, high] = [range.p10, range.p90].map((value) => valueWords({ path, value, unit }));
  return low === high ? '' : `10 to 90 %: ${low ?? ''} to ${high ?? ''}`;
}

type Source = Figure['because']['sources'][number];

const isRuleOfThumb = ({ text }: Source): boolean => /common practice, no source/iu.test(text);

/** Whether all of some sources were read; what has no source is no more than that. */
const reading = (sources: readonly Source[]): HTMLElement =>
  sources.every(({ read }) => read)
    ? h('b', {}, 'read')
    : h('i', {}, sources.every(isRuleOfThumb) ? 'common practice' : 'from memory');

/** A source without its stop, and without what is said of its reading beside it. */
const named = ({ text }: Source): string =>
  powers(text).replace(/(?: \(from memory\)|, from memory)?\.?$/u, '');

/** Trade notation with its own signs: 'a x b - c^2, 0.35 m2' -> 'a × b − c², 0.35 m²'. */
const notation = (formula: string): string =>
  powers(formula.replaceAll(' x ', ' × ').replaceAll(' - ', ' − '));

/** How a figure was found, in a word or two, and whether its source was read. */
function shortly(figure: Figure): HtmlChild {
  const { because } = figure;
  const words = sentence([kindOf(figure), because.method]);
  const [first] = because.sources;
  return [words, first && '; ', first && reading(because.sources)];
}

/** How a figure was found and after what: method and formula, then each source with whether it was read. */
function fully(figure: Figure): HtmlChild {
  const { method, formula, sources } = figure.because;
  return [
    sentence([kindOf(figure), method, notation(formula), rangeWords(figure)]),
    sources.map((source) =>
      h('span', { class: 'source' }, named(source), !isRuleOfThumb(source) && ['; ', reading([source])]),
    ),
  ];
}

function cellsOf(row: ChainRow): readonly [first: HtmlChild, second: HtmlChild] {
  if (row.kind === 'used by') return [h('span', { class: 'name' }, 'Used by'), ''];
  if (row.kind === 'more') {
    const { count = 0 } = row;
    return [h('span', { class: 'name' }, count === 0 ? 'no other figure' : `${String(count)} more`), ''];
  }
  const { figure } = row;
  if (figure === null) return [h('span', { class: 'name' }, row.path), 'not in the latest appraisal'];
  const { text, unit } = printedValue(figure);
  return [
    [
      h('span', { class: looks[figure.kind] }, text),
      unit === '' ? ' ' : ` ${unit} `,
      h('span', { class: 'name' }, powers(figure.label)),
    ],
    row.isOpen ? fully(figure) : shortly(figure),
  ];
}

/** Whether a line can be opened. */
export const canOpen = (row: ChainRow): boolean =>
  row.kind === 'used by' || (row.kind === 'more' ? (row.count ?? 0) > 0 : row.figure !== null);

/**
 * The lines of a chain as a table: value and name further in with each step, how it was found, and where it is shown.
 * @param stationOf the station where a figure is shown, e.g. '7+020'
 * @param current key of the line that keys act on
 */
export function chainLines(
  rows: readonly ChainRow[],
  stationOf: (path: string) => string | undefined,
  current: string | undefined,
): HTMLElement[] {
  return rows.map((row) => {
    const [first, second] = cellsOf(row);
    const station = row.kind === 'figure' ? stationOf(row.path) : undefined;
    const isCurrent = row.key === current;
    return h(
      'tr',
      {
        class: `step-${String(Math.min(row.step, DEEPEST))}${canOpen(row) ? ' opens' : ''}`,
        'data-row': row.key,
        'data-path': row.kind === 'figure' ? row.path : null,
        tabindex: isCurrent ? 0 : -1,
        'aria-level': row.step + 1,
        'aria-expanded': canOpen(row) ? String(row.isOpen) : null,
      },
      h('td', { role: 'gridcell' }, first),
      h('td', { role: 'gridcell', class: 'how' }, second),
      h(
        'td',
        { role: 'gridcell', class: 'at' },
        station !== undefined && h('a', { href: `#${station}`, tabindex: isCurrent ? 0 : -1 }, station),
      ),
    );
  });
}
