import { beforeAll, describe, expect, it } from 'vitest';
import { figure, rebuilt, type Context } from '../../lib/explain/index.ts';
import { CROSSFALL, formFacts, formIds, guide } from '../../lib/index.ts';
import { checkBars, checkTable } from '../../notebooks/charts/checkBars.ts';
import { costByPart, partTable } from '../../notebooks/charts/costByPart.ts';
import { costIntervals, costTable } from '../../notebooks/charts/costIntervals.ts';
import { oddsMatrix, oddsTable } from '../../notebooks/charts/oddsMatrix.ts';
import { quantityMarks, quantityTable } from '../../notebooks/charts/quantityMarks.ts';
import { rangePanels, rangeTable } from '../../notebooks/charts/rangePanels.ts';
import { ranking } from '../../notebooks/charts/ranking.ts';
import { spanChart, spanTable, type SpanChartInput } from '../../notebooks/charts/spanChart.ts';
import { spanRows } from '../../notebooks/charts/spanRows.ts';
import { tablePiece } from '../../notebooks/charts/table.ts';
import { tradeOffs, tradeOffTable, type Measure } from '../../notebooks/charts/tradeOffs.ts';
import { ofOption, pathsOf } from '../../notebooks/drawing/asked.ts';
import { crossing } from '../../notebooks/drawing/crossing.ts';
import { deckStrips } from '../../notebooks/drawing/deckStrips.ts';
import { ladder } from '../../notebooks/drawing/ladder.ts';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { section } from '../../notebooks/drawing/section.ts';
import { mainDesign, mainDesignPath, sectionRow } from '../../notebooks/drawing/sectionRow.ts';
import { stack } from '../../notebooks/drawing/stack.ts';
import { stripChain } from '../../notebooks/drawing/stripChain.ts';
import { elements } from '../drawings/golden.ts';
import { example, otherwise } from './contexts.ts';

/** Everything the option study draws from an appraisal, by name. */
function drawn({ study, appraisal }: Context): Readonly<Record<string, Piece>> {
  const { site, options, standing, currency } = appraisal;
  const budget = study.brief.budget === 'unknown' ? null : study.brief.budget.amount;
  const first = options[0]!;
  const { obstacles } = study.brief;
  const shared = { options, standing, currency, budget, reference: first.number, site } as const;
  const wide = { ...shared, widthPx: 1224 };
  const design = mainDesign(first)!;
  const checks = {
    form: first.form,
    checks: design.checks,
    design: mainDesignPath(first),
    widthPx: 350,
  };
  const months: Measure = {
    name: 'Programme, months',
    places: 0,
    values: Object.fromEntries(options.map((option) => [option.number, option.months])),
    figures: (option) => ofOption(option, 'months/p50'),
  };
  const measures = [months];
  const askedM = Number(formFacts(site)['mainSpanM']);
  const spans: SpanChartInput = {
    rows: spanRows(guide({ spanM: askedM, widthM: site.deck.widthM, lengthM: site.lengthM }), formIds, true),
    askedM,
    askedWords: `${askedM} m asked`,
    askedFigure: 'site/mainSpanM',
    widthPx: 1224,
  };
  const { deck, surfacingM } = study.brief;
  const overall = (ultimate: boolean): Piece =>
    stripChain({
      edges: [0, 400],
      leaders: [],
      wordsPx: 40,
      overallM: deck.reduce((sum, strip) => sum + (ultimate ? strip.ultimateWidthM : strip.widthM), 0),
      marginPx: 20,
      figure: ultimate ? 'site/deck/ultimateWidthM' : 'site/deck/widthM',
    });
  const odds = { ...wide, unseparated: study.books.unseparated };
  return {
    'crossing with the first option': crossing({ site, option: first, obstacles, widthPx: 980 }),
    'crossing without an option': crossing({ site, option: null, obstacles, widthPx: 980 }),
    'crossing on a hand-held screen': crossing({ site, option: first, obstacles, widthPx: 358 }),
    ...Object.fromEntries(
      options.flatMap((option) =>
        option.headroom === null
          ? []
          : obstacles
              .filter(({ clearance }) => clearance !== null)
              .map((obstacle) => [
                `ladder of option ${option.number} over ${obstacle.name}`,
                ladder({ site, option, obstacle }),
              ]),
      ),
    ),
    'span chart': spanChart(spans),
    'table of spans': tablePiece(spanTable(spans)),
    'strips of the deck': deckStrips({
      strips: deck,
      surfacingM,
      crossfall: CROSSFALL,
      scale: 100,
      marginPx: 20,
    }),
    'overall width of the deck': overall(false),
    'overall width in the ultimate layout': overall(true),
    stack: stack(wide),
    'stack on a hand-held screen': stack({ ...shared, widthPx: 358 }),
    ranking: ranking(shared),
    section: section({ design, path: mainDesignPath(first), widthPx: 580 }),
    sections: sectionRow(wide),
    checks: checkBars(checks),
    'table of checks': tablePiece(checkTable(checks)),
    quantities: quantityMarks(wide),
    'table of quantities': tablePiece(quantityTable(wide)),
    parts: costByPart(wide),
    'table of parts': tablePiece(partTable(wide)),
    intervals: costIntervals(wide),
    'table of costs': tablePiece(costTable(wide)),
    odds: oddsMatrix(odds),
    'table of odds': tablePiece(oddsTable(odds)),
    months: rangePanels({ ...wide, measures }),
    'table of months': tablePiece(rangeTable({ ...wide, measures })),
    'trade-offs': tradeOffs({ ...wide, measures }),
    'table of trade-offs': tablePiece(tradeOffTable({ ...wide, measures })),
  };
}

/** What prints a figure, with its words and the paths it says. */
const printed = (piece: Piece): { readonly words: string; readonly paths: readonly string[] }[] =>
  [...elements(piece)].flatMap((one) => {
    const held = one.attrs['data-figure'];
    const words = one.children.filter((child) => typeof child === 'string').join('');
    return held === undefined ? [] : [{ words, paths: pathsOf(held) }];
  });

/** Numbers of a text with half of their last place: '2 200' is 2200 to 50. */
function numbersOf(words: string): { readonly value: number; readonly half: number }[] {
  return [...words.matchAll(/[\u2212+]?\d[\d\u2009]*(?:\.\d+)?/gu)].map(([found]) => {
    const text = found.replaceAll('\u2009', '').replace('\u2212', '-');
    const places = text.split('.')[1]?.length;
    const zeros = /(?<=[1-9])0*$/u.exec(text)?.[0].length ?? 0;
    return { value: Number(text), half: 0.5 * 10 ** (places === undefined ? zeros : -places) };
  });
}

/** Whether a printed number is a value in some unit that is printed: itself, thousands, millions, per cent. */
const agrees = (
  value: number,
  { value: shown, half }: { value: number; half: number },
  path: string,
  isPerCent: boolean,
): boolean =>
  (path.startsWith('standing/') || isPerCent ? [0.01] : [1, 1e3, 1e6]).some((unit) => {
    const room = path.startsWith('standing/') ? 2.5 : half;
    return Math.abs(Math.abs(value / unit) - Math.abs(shown)) <= room * 1.0001 + 1e-9;
  });

describe.each([
  ['the worked example', example],
  ['the crossing seen otherwise', otherwise],
])('what the option study prints of %s', (_name, asked) => {
  let context: Context;
  let pieces: Readonly<Record<string, Piece>>;
  beforeAll(() => {
    context = asked();
    pieces = drawn(context);
  }, 60_000);

  it('figure(path) answers for every figure', () => {
    let count = 0;
    for (const [name, piece] of Object.entries(pieces)) {
      for (const { paths, words } of printed(piece)) {
        for (const path of paths) {
          count += 1;
          expect(() => figure(context, path), `${name}: '${words}' is ${path}`).not.toThrow();
          expect(figure(context, path).because.formula.length).toBeGreaterThan(0);
        }
      }
    }
    expect(count).toBeGreaterThan(200);
  });

  it('rebuilt(path) is what is printed wherever its formula is closed', () => {
    const paths = new Set(
      Object.values(pieces).flatMap((piece) => printed(piece).flatMap((one) => one.paths)),
    );
    let closed = 0;
    for (const path of paths) {
      const { value } = figure(context, path);
      const again = rebuilt(context, path);
      if (typeof value !== 'number' || again === undefined) continue;
      closed += 1;
      expect(Math.abs(again - value), path).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(value)));
    }
    expect(closed).toBeGreaterThan(50);
    for (const path of ['site/mainSpanM', 'site/deck/widthM', 'site/deck/ultimateWidthM'])
      expect(paths).toContain(path);
  });

  it('figure(path) holds the number that is printed', () => {
    const wrong: string[] = [];
    let compared = 0;
    for (const [name, piece] of Object.entries(pieces)) {
      for (const { paths, words } of printed(piece)) {
        const numbers = numbersOf(words);
        // What is made of several figures is compared where it lists them; '<5' and '± 3' say no figure of their own.
        const lists = paths.length === 1 || (paths.length === numbers.length && !words.includes('±'));
        if (!lists || /[<>]/u.test(words)) continue;
        paths.forEach((path, i) => {
          const { value } = figure(context, path);
          const number = numbers[i];
          if (typeof value !== 'number' || number === undefined) return;
          compared += 1;
          if (!agrees(value, number, path, path === 'practice/site/crossfall'))
            wrong.push(`${name}: '${words}' is ${path}, ${value}`);
        });
      }
    }
    expect(wrong).toEqual([]);
    expect(compared).toBeGreaterThan(200);
  });
});
