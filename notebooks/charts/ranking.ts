import { levelWith } from '../../lib/index.ts';
import {
  currencySign,
  listed,
  money2,
  moneyUnit,
  odds,
  signed,
  fixed,
  significant,
  spansText,
  use,
} from '../format.ts';
import { spanPaths, spansOf } from '../drawing/alongOption.ts';
import type { Asked } from '../drawing/asked.ts';
import { dataFigure, ofOption, perM2Of, rangeOf, withinOf } from '../drawing/asked.ts';
import type { Paper } from '../drawing/ink.ts';
import { shortTitle } from '../drawing/optionWords.ts';
import type { Piece } from '../drawing/piece.ts';
import { el } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { glyph } from '../forms/glyph.ts';
import { optionNumber } from '../forms/optionNumber.ts';
import type { AppraisedOption, Standing } from '../model.ts';

export interface RankingInput {
  /** In the order in which they are to stand. */
  readonly options: readonly AppraisedOption[];
  readonly standing: Standing;
  readonly budget: number | null;
  readonly currency: string;
  readonly reference: number | null;
  readonly paper?: Paper;
}

/** Number and glyph of an option as a small drawing of its own, for tables and running text. */
function optionMark(
  option: Pick<AppraisedOption, 'number' | 'form'>,
  reference: number | null,
  paper: Paper = 'colour',
  withGlyph = true,
): Piece {
  const ink = formInk(paper, [], `mark-${String(option.number)}`);
  const filled = option.number === reference;
  return sheet(
    withGlyph ? 60 : 22,
    22,
    `option ${String(option.number)}`,
    [
      optionNumber(option.number, 11, 11, { colour: filled ? ink.accent : ink.line(option.form), filled }),
      withGlyph && glyph(option.form, 27, 3, ink.line(option.form)),
    ],
    'img',
    'drawing mark',
  );
}

/** Why a rule puts an option out, in one line; '' where none does. */
export const outBecause = ({ rulings }: AppraisedOption): string =>
  [...new Set(rulings.filter(({ effect }) => effect === 'out').flatMap(({ because }) => because))].join('; ');

/** What keeps an option from leading, or what speaks for it, in one line. */
function why(
  option: AppraisedOption,
  input: RankingInput,
): { readonly words: string; readonly fails: boolean } {
  const out = option.rulings.filter((ruling) => ruling.effect === 'out');
  if (option.status === 'out' || out.length > 0) return { words: out[0]?.because[0] ?? 'out', fails: true };
  if (input.standing.leader === option.number) return { words: 'leads', fails: false };
  const others = levelWith(input.standing, option.number);
  if (others.length > 0)
    return { words: `cannot be separated from ${listed(others.map(String))}`, fails: false };
  const caution = option.rulings.find((ruling) => ruling.effect === 'caution');
  return { words: caution?.because[0] ?? '', fails: false };
}

/** Ranking under the budget: one row per option with what it costs, what it differs by, its odds and what decides. */
export function ranking(input: RankingInput): Piece {
  const { options, standing, currency, budget, reference } = input;
  const unit = moneyUnit(currency, Math.max(0, ...options.map((option) => option.cost.p90)));
  const base = options.find((option) => option.number === reference);
  const money = (value: number): string => money2(value / unit.per);
  const figure = (text: string, asked: Asked, className = ''): Piece =>
    el('td', { class: `figure ${className}`.trim(), 'data-figure': dataFigure(asked) }, text);
  const head = [
    ['number', 'mark'],
    ['option', ''],
    ['spans, m', ''],
    [unit.label, 'figure'],
    ['10 to 90 %', 'figure'],
    ...(base === undefined ? [] : [[`against ${String(base.number)}`, 'figure']]),
    [`${currencySign(currency)}/m²`, 'figure'],
    ...(budget === null ? [] : [['within budget', 'figure']]),
    ['months', 'figure'],
    ['highest use', 'figure'],
    ['standing', ''],
  ] as const;
  return el(
    'table',
    { class: 'ranking' },
    el(
      'thead',
      {},
      el(
        'tr',
        {},
        head.map(([text = '', className = '']) =>
          className === 'mark'
            ? el('th', { scope: 'col' }, el('span', { class: 'unseen' }, text))
            : el('th', { scope: 'col', class: className === '' ? undefined : className }, text),
        ),
      ),
    ),
    el(
      'tbody',
      {},
      options.map((option) => {
        const isBase = option === base;
        const within = standing.within[option.number];
        const reason = why(option, input);
        const classes = ['choose', option.status, ...(isBase ? ['reference'] : [])].join(' ');
        return el(
          'tr',
          { class: classes, 'data-option': option.number },
          el('td', { class: 'mark' }, optionMark(option, reference, input.paper)),
          el('th', { scope: 'row', class: 'name' }, shortTitle(option)),
          el(
            'td',
            {
              class: 'fig spans',
              'data-figure': dataFigure(spanPaths(option).filter((path) => path !== undefined)),
            },
            spansText(spansOf(option)),
          ),
          figure(
            money(option.cost.p50),
            ofOption(option, 'cost/p50'),
            standing.leader === option.number ? 'decides' : '',
          ),
          figure(`${money(option.cost.p10)} to ${money(option.cost.p90)}`, rangeOf(option, 'cost')),
          base !== undefined &&
            (isBase
              ? el('td', { class: 'figure reference-word' }, 'reference')
              : figure(signed((option.cost.p50 - base.cost.p50) / unit.per, 1), [
                  ofOption(option, 'cost/p50'),
                  ofOption(base, 'cost/p50'),
                ])),
          figure(significant(option.pricePerM2.withApproaches, 2), perM2Of(option)),
          budget !== null &&
            figure(
              within === undefined ? '' : `${odds(within)} %`,
              within === undefined ? undefined : withinOf(option),
              within !== undefined && within < 0.2 ? 'fails' : '',
            ),
          figure(fixed(option.months.p50, 0), ofOption(option, 'months/p50')),
          figure(
            use(option.limitingCheck.utilisation),
            ofOption(option, 'limitingCheck/utilisation'),
            option.limitingCheck.utilisation > 1.0005 ? 'fails' : '',
          ),
          el('td', { class: reason.fails ? 'why fails' : 'why' }, reason.words),
        );
      }),
    ),
  );
}
