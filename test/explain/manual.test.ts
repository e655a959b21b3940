import { describe, expect, it } from 'vitest';
import { figure as figureAt, figurePaths, rebuilt, type Context } from '../../lib/explain/index.ts';
import type { Figure } from '../../lib/model/index.ts';
import { bibliography } from '../../lib/rules/index.ts';
import { example, frame, frameOfTwo, inFlood, inWindows, otherwise, variants } from './contexts.ts';

/** Name, study, and how many figures it has at the least. */
const contexts: readonly (readonly [name: string, context: () => Context, least: number])[] = [
  ['the worked example', example, 1000],
  ['the crossing seen otherwise', otherwise, 1000],
  ['the crossing in a known flood', inFlood, 1000],
  ['abutments that stand in their windows', inWindows, 1000],
  ['a portal frame', frame, 300],
  ['a portal frame of two spans', frameOfTwo, 300],
  ['options made in every way', variants, 500],
];

const told = new WeakMap<Context, Map<string, Figure>>();

/** A figure with where it comes from, asked for once for all tests. */
function figure(context: Context, path: string): Figure {
  const known = told.get(context) ?? new Map<string, Figure>();
  told.set(context, known);
  const found = known.get(path) ?? figureAt(context, path);
  known.set(path, found);
  return found;
}

/** What holds a number that is not a figure: names of options, units, supports, stretches and waters, and what is drawn. */
const notFigures =
  /\/(number|unit|support|stretch|water|pylons\/\d+|groups\/\d+\/\d+)$|\/(elevation|sections|depthAlong)\//u;

/** Paths of all numbers of a result, lists of options, parts, rulings and checks by the names of their entries. */
function numbersIn(value: unknown, path: string, by?: string): string[] {
  if (typeof value === 'number') return [path];
  if (typeof value !== 'object' || value === null) return [];
  const names: Readonly<Record<string, string>> = { parts: 'part', rulings: 'rule', checks: 'id' };
  return Object.entries(value).flatMap(([key, one]: [string, unknown]) => {
    const name = by === undefined ? key : String((one as Record<string, unknown>)[by]);
    return numbersIn(
      one,
      `${path}/${name}`,
      names[key] !== undefined && Array.isArray(one) ? names[key] : undefined,
    );
  });
}

/** What rounding leaves of two equal levels, 1e-12 m either way, is nought. */
const NOUGHT = 1e-11;

function relative(a: number, b: number): number {
  const most = Math.max(Math.abs(a), Math.abs(b));
  return most < NOUGHT ? 0 : Math.abs(a - b) / most;
}

describe.each(contexts)('explanations of %s', (_name, asked, least) => {
  it('figure(path) stands behind every number of the appraisal', { timeout: 60_000 }, () => {
    const { study, appraisal } = asked();
    const known = new Set(figurePaths(asked()));
    const numbers = [
      ...numbersIn(appraisal.site, 'site'),
      ...appraisal.options.flatMap((option) => numbersIn(option, `options/${option.number}`)),
      ...numbersIn(appraisal.standing.odds, 'standing/odds'),
      ...numbersIn(appraisal.standing.within, 'standing/within'),
      ...numbersIn(appraisal.droppedCounts, 'droppedCounts'),
      ...numbersIn(study.brief, 'brief'),
      ...numbersIn({ draws: study.books.draws, seed: study.books.seed }, 'books'),
    ];
    expect(numbers.length).toBeGreaterThan(least);
    expect(numbers.filter((path) => !known.has(path) && !notFigures.test(path))).toEqual([]);
  });

  it('rebuilt(path) is the figure wherever its formula is closed, from its stated inputs alone', () => {
    const context = asked();
    let closed = 0;
    const wrong = figurePaths(context).flatMap((path) => {
      const { value } = figure(context, path);
      if (typeof value !== 'number') return [];
      const again = rebuilt(context, path);
      if (again === undefined) return [];
      closed += 1;
      return relative(again, value) <= 1e-9 ? [] : [`${path}: ${value}, from its inputs ${again}`];
    });
    expect(wrong).toEqual([]);
    expect(closed).toBeGreaterThan(least);
  });

  it('figure(path).because.inputs can each be asked in turn and say the same value there', () => {
    const context = asked();
    const other = figurePaths(context).flatMap((path) =>
      figure(context, path)
        .because.inputs.filter((input) => {
          const own = figure(context, input.path);
          return (['value', 'unit', 'kind', 'label'] as const).some(
            (key) => !Object.is(own[key], input[key]),
          );
        })
        .map((input) => `${path}: ${input.path}`),
    );
    expect(other).toEqual([]);
  });

  it('figure(path) never comes round to itself', () => {
    const context = asked();
    const done = new Set<string>();
    const open = new Set<string>();
    const circles: string[] = [];
    const visit = (path: string): void => {
      if (done.has(path)) return;
      if (open.has(path)) {
        circles.push([...open, path].join(' <- '));
        return;
      }
      open.add(path);
      for (const input of figure(context, path).because.inputs) visit(input.path);
      open.delete(path);
      done.add(path);
    };
    figurePaths(context).forEach(visit);
    expect(circles).toEqual([]);
  });

  it('figure(path) ends at what is typed, preset or unknown, or says why nothing stands behind it', () => {
    const context = asked();
    const ends = figurePaths(context)
      .map((path) => figure(context, path))
      .filter(({ because }) => because.inputs.length === 0);
    const silent = ends.filter(
      ({ kind, because }) =>
        kind === 'computed' &&
        !/once|no limit|no joint|measured with|by definition|none is measured/u.test(
          `${because.method} ${because.formula}`,
        ),
    );
    expect(ends.length).toBeGreaterThan(100);
    expect(silent.map(({ path }) => path)).toEqual([]);
  });

  it('figure(path).because.sources are entries of the bibliography or say what they are', () => {
    const context = asked();
    const ids = new Set(bibliography.map(({ id }) => id));
    const provenance =
      /from memory|no source|invented|\bread\b|\bseen\b|worked out|statics|by definition|preset|assumed|Rankine|judgement|common practice|^[\d\s.*/+()-]+$/iu;
    const cited = figurePaths(context).flatMap((path) => figure(context, path).because.sources);
    expect(cited.length).toBeGreaterThan(100);
    expect(cited.filter(({ id, text }) => (id === null ? !provenance.test(text) : !ids.has(id)))).toEqual([]);
  });

  it('figure(path) of a sized form speaks in its own words', () => {
    const context = asked();
    const unsaid = figurePaths(context).filter((path) => {
      const { formula } = figure(context, path).because;
      return /its unit stands at the end of its name|^(demand|capacity) of the check '/u.test(formula);
    });
    expect(unsaid).toEqual([]);
  });

  it('figure(path).usedBy is the other end of because.inputs', () => {
    const context = asked();
    const oneSided = figurePaths(context)
      .filter((_, i) => i % 7 === 0)
      .flatMap((path) => {
        const { because, usedBy } = figure(context, path);
        const unnamed = because.inputs.filter((input) => !figure(context, input.path).usedBy.includes(path));
        const unused = usedBy.filter((user) =>
          figure(context, user).because.inputs.every((input) => input.path !== path),
        );
        return [...unnamed.map((input) => input.path), ...unused].map((end) => `${path} - ${end}`);
      });
    expect(oneSided).toEqual([]);
  });
});
