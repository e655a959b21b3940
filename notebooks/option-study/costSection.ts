import { ratesFor } from '../../lib/index.ts';
import type { Appraisal, RateOverride, Study } from '../../lib/index.ts';
import { costByPart, partTable } from '../charts/costByPart.ts';
import { costIntervals, costTable } from '../charts/costIntervals.ts';
import { oddsMatrix, oddsTable } from '../charts/oddsMatrix.ts';
import { tableBehind } from '../charts/table.ts';
import { fixed } from '../format.ts';
import { h } from '../html.ts';
import { pushed, type LineSection, type Sheet, type StudyStore } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import { asItStandsNote } from './asItStandsNote.ts';
import { madeFigure } from './madeFigure.ts';
import type { StudyCells } from './studyCells.ts';
import { budgetOf, findingOf, priceDateWords } from './words.ts';

const STEEL = 'plate-girder-steel';

const rateOf = (study: Study): { p10: number; p50: number; p90: number } =>
  ratesFor(study.books).rates.find((rate) => rate.item === STEEL)!;

/** The rate typed over the pack's; low and high keep their distance in proportion. */
function withSteelRate(study: Study, p50: number): Study {
  const pack = ratesFor({ ...study.books, rates: [] }).rates.find((rate) => rate.item === STEEL)!;
  const typed: RateOverride = {
    item: STEEL,
    p10: (pack.p10 / pack.p50) * p50,
    p50,
    p90: (pack.p90 / pack.p50) * p50,
    reason: 'typed in the notebook',
  };
  const others = study.books.rates.filter((rate) => rate.item !== STEEL);
  const rates = p50 === pack.p50 ? others : [...others, typed];
  return { ...study, books: { ...study.books, rates } };
}

/** Section 7: cost by part, intervals against the budget with what cannot be separated, odds of every pair. */
export function costSection(page: Sheet, graph: Graph, store: StudyStore, cells: StudyCells): LineSection {
  const { appraisal, asItStands, reference, brief, books } = cells;
  const finding = page.live({ appraisal }, (v) => {
    const { groups } = v.appraisal.standing;
    const level = groups.filter((group) => group.length > 1).length;
    return findingOf(
      v.appraisal,
      level === 0
        ? 'Every option is separated from the next.'
        : `${groups.length === 1 ? 'One group' : `${String(groups.length)} groups`}; inside a group cost does not decide.`,
    );
  });
  const shows = { appraisal, reference, brief, books };
  const common = (
    v: { appraisal: Appraisal; reference: { number: number } | null },
    widthPx: number,
    prefix: string,
  ) => ({
    options: v.appraisal.options,
    reference: v.reference?.number ?? null,
    currency: v.appraisal.currency,
    standing: v.appraisal.standing,
    widthPx,
    prefix,
  });
  return page.section(7, 'Cost', finding, [
    page.cell({
      station: '7+005',
      title: 'Rates',
      shows: { books, asItStands },
      typed: [books],
      body: h(
        'p',
        { class: 'prose' },
        'Plate girder steel, fabricated and erected, is taken at ',
        madeFigure(graph, store, {
          label: 'steel rate',
          places: 2,
          unit: 'per kg',
          step: 0.1,
          min: { value: 0.5 },
          max: { value: 30 },
          get: (study) => rateOf(study).p50,
          put: withSteelRate,
        }),
        ` ${store.valid().books.currency}/kg; low and high move with it.`,
      ),
      notes: (v) => [
        asItStandsNote(v.asItStands, v.books.currency),
        h(
          'p',
          { class: 'caution' },
          h('b', {}, 'Demo rates.'),
          ' Every rate of this pack is invented. Replace it with your own before a price leaves this page.',
        ),
      ],
    }),
    page.cell({
      station: '7+010',
      title: 'Cost by part',
      shows,
      wide: true,
      body: (v, room) => {
        const input = common(v, room.widthPx, 'parts');
        return [pushed('Cost by part', costByPart(input)), tableBehind(partTable(input))];
      },
      notes: [h('p', {}, 'Medians of the parts; medians do not add up to the median of the whole.')],
    }),
    page.cell({
      station: '7+020',
      title: 'Cost against the budget',
      shows,
      body: (v, room) => {
        const { budget } = v.brief;
        const input = {
          ...common(v, room.widthPx, 'intervals'),
          budget: budgetOf(v.brief),
          ...(room.paperPx !== null && { heightPx: room.paperPx }),
          ...(budget === 'unknown' ? {} : { priceDate: priceDateWords(budget.priceDate) }),
        };
        return [costIntervals(input), tableBehind(costTable(input))];
      },
      notes: (v) => [
        h('p', {}, 'Thin: 10 to 90 %. Thick: the middle half. Tick: the median.'),
        h(
          'p',
          {},
          `Allowance: risk simulation, ${fixed(v.books.draws, 0)} draws with seed ${v.books.seed}, the same for all options. No contingency on top.`,
        ),
        h('p', {}, 'Substructure is a class 5 estimate while there is no borehole, the deck class 4.'),
      ],
    }),
    page.cell({
      station: '7+030',
      title: 'Odds',
      shows,
      body: (v, room) => {
        const input = { ...common(v, room.widthPx, 'odds'), unseparated: v.books.unseparated };
        return [pushed('Odds', oddsMatrix(input)), tableBehind(oddsTable(input))];
      },
      notes: [
        h('p', {}, 'Read a row: odds in per cent that the option at the left is the cheaper, in steps of 5.'),
        h('p', {}, 'Heavy squares hold options that cannot be separated.'),
      ],
    }),
  ]);
}
