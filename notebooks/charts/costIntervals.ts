import { levelWith } from '../../lib/index.ts';
import { currencySign, listed, money2, moneyUnit, odds, plain, significant } from '../format.ts';
import { ofOption, perM2Of, withinOf } from '../drawing/asked.ts';
import { costAxis, spreadValues } from '../drawing/axis.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { interval } from '../drawing/interval.ts';
import { label } from '../drawing/label.ts';
import { textWidth, wrapText } from '../drawing/lettering.ts';
import { shortTitle } from '../drawing/optionWords.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import type { AppraisedOption, Standing } from '../model.ts';
import { gridUprights, limitLine } from './marks.ts';
import type { OptionsInput } from './rowHead.ts';
import { rowHead } from './rowHead.ts';
import type { Table } from './table.ts';

export interface CostIntervalsInput extends OptionsInput {
  readonly standing: Standing;
  readonly budget: number | null;
  readonly currency: string;
  /** E.g. '2026 Q1'. */
  readonly priceDate?: string;
  /** Room on a page, px: rows stand closer where they would need more. */
  readonly heightPx?: number;
}

/** Odds inside a group in words: of two options which is cheaper, of more the range either way. */
export function groupOdds(group: readonly number[], standing: Standing): string {
  const pairs = group.flatMap((a, index) => group.slice(index + 1).map((b) => standing.odds[a]?.[b] ?? NaN));
  const [a = 0] = group;
  if (pairs.length === 1) return `${odds(pairs[0] ?? NaN)} % that ${String(a)} is cheaper`;
  const known = pairs.filter(Number.isFinite).map((share) => Math.max(share, 1 - share));
  if (known.length === 0) return '';
  const low = odds(Math.min(...known));
  const high = odds(Math.max(...known));
  return low === high ? `${low} % either way` : `${low} to ${high} %, either way round`;
}

/** The widest word beside a bracket, px. */
const WORDS_PX = 58;

/** Brackets at the right of runs that cannot be separated; runs that overlap stand side by side, their words below one another. */
function brackets(
  rows: readonly AppraisedOption[],
  standing: Standing,
  x: number,
  yOf: (index: number) => number,
  pitch: number,
  room: number,
): Piece[] {
  const at = new Map(rows.map((option, index) => [option.number, index]));
  const runs = standing.groups
    .map((group) => group.filter((number) => at.has(number)))
    .filter((group) => group.length > 1)
    .map((group) => {
      const places = group.map((number) => at.get(number) ?? 0);
      return { group, places, from: Math.min(...places), to: Math.max(...places) };
    })
    .sort((a, b) => a.from - b.from || a.to - b.to);
  const ends: number[] = [];
  const lanes = runs.map(({ from, to }) => {
    const free = ends.findIndex((end) => end < from);
    const own = free < 0 ? ends.length : free;
    ends[own] = to;
    return own;
  });
  // Many brackets side by side stand closer, so that their words keep room.
  const besides = Math.max(1, ends.length) - 1;
  const lane = besides === 0 ? 0 : Math.min(9, (room - 8 - WORDS_PX) / besides);
  const wordsX = x + besides * lane + 8;
  let lastFoot = -Infinity;
  return runs.map(({ group, places, from, to }, index) => {
    const left = x + (lanes[index] ?? 0) * lane;
    const top = yOf(from) - pitch * 0.32;
    const bottom = yOf(to) + pitch * 0.32;
    // Where an option that a rule puts out stands between them, those that are meant are ticked.
    const isWhole = places.length === to - from + 1;
    const ticks = isWhole ? '' : places.map((row) => `M${num(left - 5)},${num(yOf(row))}h5`).join('');
    const heads = wrapText('cannot be separated', room - (wordsX - x), letters.drawing, 600);
    const lines = wrapText(groupOdds(group, standing), room - (wordsX - x), letters.drawing);
    const high = (heads.length + lines.length) * 14;
    const firstY = Math.max((top + bottom) / 2 - high / 2 + 11, lastFoot + 18);
    lastFoot = firstY + high - 14;
    return g(
      {},
      el('path', {
        d: `M${num(left - 5)},${num(top)}h5V${num(bottom)}h-5${ticks}`,
        fill: 'none',
        stroke: colours.ink,
        'stroke-width': pens.medium,
      }),
      heads.map((text, line) => label(wordsX, firstY + line * 14, text, { weight: 600, halo: true })),
      lines.map((text, line) =>
        label(wordsX, firstY + (heads.length + line) * 14, text, { fill: colours.second, halo: true }),
      ),
    );
  });
}

/** Room under the last row, and the least from one row to the next, px. */
const FOOT_PX = 28;
const LEAST_PITCH_PX = 26;

/** Lettering keeps this far off the line of the budget, px. */
const LIMIT_PX = 4;

/** P10, P50 and P90 of each option against the budget; what cannot be separated is bracketed together. */
export function costIntervals(input: CostIntervalsInput): Piece {
  const { options, standing, budget, widthPx } = input;
  const ink = formInk(
    input.paper ?? 'colour',
    options.map((option) => option.form),
    input.prefix ?? 'intervals',
  );
  const narrow = widthPx < 680;
  const unit = moneyUnit(input.currency, Math.max(0, ...options.map((option) => option.cost.p90)));
  const head = 44;
  const roomy = ((input.heightPx ?? Infinity) - head - FOOT_PX) / options.length;
  const pitch = Math.max(LEAST_PITCH_PX, Math.min(narrow ? 40 : 42, roomy));
  const left = narrow ? 92 : 320;
  const bracketRoom = narrow ? 84 : 148;
  const columns = narrow ? 0 : 138;
  const right = widthPx - bracketRoom - columns - (narrow ? 16 : 30);
  const axis = costAxis(
    spreadValues(
      options.map((option) => option.cost),
      budget === null ? [] : [budget],
    ),
    left,
    right,
    narrow ? 4 : 7,
  );
  const yOf = (index: number): number => head + 20 + index * pitch;
  const bottom = yOf(options.length - 1) + 20;
  const priceX = right + 72;
  const withinX = priceX + 78;
  const figure = { size: letters.table } as const;
  const limit = budget === null ? NaN : axis.x(budget);
  /** How far lettering between two places moves, to the left or to the right, where the line of the budget would run through it. */
  const aside = (from: number, to: number, side: 'left' | 'right'): number =>
    limit > from - LIMIT_PX && limit < to + LIMIT_PX
      ? limit + (side === 'left' ? -LIMIT_PX - to : LIMIT_PX - from)
      : 0;
  return sheet(widthPx, bottom + 8, 'Cost of each option, 10, 50 and 90 per cent, against the budget', [
    ink.defs.length > 0 && el('defs', {}, ink.defs),
    gridUprights(axis.ticks.map(axis.x), head - 6, bottom),
    axis.ticks.map(
      (tick) =>
        // A figure under the line of the budget could not be read.
        !(Math.abs(axis.x(tick) - limit) < 9) &&
        label(axis.x(tick), head - 12, String(tick / unit.per), { anchor: 'middle', fill: colours.second }),
    ),
    label(
      narrow ? 0 : left - 24,
      head - 12,
      `${unit.label}${input.priceDate === undefined || narrow ? '' : `, ${input.priceDate}`}`,
      { anchor: narrow ? 'start' : 'end', fill: colours.second },
    ),
    !narrow &&
      label(priceX, head - 12, `${currencySign(input.currency)}/m²`, { anchor: 'end', fill: colours.second }),
    !narrow &&
      budget !== null &&
      label(withinX, head - 12, 'within budget', { anchor: 'end', fill: colours.second }),
    budget !== null &&
      limitLine(
        axis.x(budget),
        4,
        bottom,
        `budget ${plain(budget / unit.per)}`,
        ink.accent,
        right + (narrow ? 80 : 140),
      ),
    options.map((option, index) => {
      const y = yOf(index);
      const { p10, p50, p90 } = option.cost;
      const within = standing.within[option.number];
      const leads = standing.leader === option.number;
      const [low, likely, high] = [p10, p50, p90].map((money) => money2(money / unit.per)) as [
        string,
        string,
        string,
      ];
      const [lowAt, likelyAt, highAt] = [axis.x(p10) - 5, axis.x(p50), axis.x(p90) + 5];
      const half = textWidth(likely, letters.table, 600) / 2;
      return g(
        { class: 'option' },
        rowHead(option, y, ink, input.reference, narrow ? undefined : shortTitle(option)),
        label(lowAt + aside(lowAt - textWidth(low, letters.drawing), lowAt, 'left'), y + 4, low, {
          anchor: 'end',
          fill: colours.second,
          halo: true,
          figure: ofOption(option, 'cost/p10'),
        }),
        label(highAt + aside(highAt, highAt + textWidth(high, letters.drawing), 'right'), y + 4, high, {
          fill: colours.second,
          halo: true,
          figure: ofOption(option, 'cost/p90'),
        }),
        interval(option, axis.x, y, ink, 9),
        label(
          likelyAt + aside(likelyAt - half, likelyAt + half, likelyAt < limit ? 'left' : 'right'),
          y - 10,
          likely,
          {
            ...figure,
            anchor: 'middle',
            weight: 600,
            halo: true,
            figure: ofOption(option, 'cost/p50'),
          },
        ),
        !narrow &&
          label(priceX, y + 4.5, significant(option.pricePerM2.withApproaches, 2), {
            ...figure,
            anchor: 'end',
            figure: perM2Of(option),
          }),
        !narrow &&
          within !== undefined &&
          label(withinX, y + 4.5, `${odds(within)} %`, {
            ...figure,
            anchor: 'end',
            weight: leads ? 600 : 400,
            figure: withinOf(option),
          }),
      );
    }),
    brackets(options, standing, narrow ? right + 18 : withinX + 18, yOf, pitch, bracketRoom - 4),
  ]);
}

/** The table behind the cost intervals. */
export function costTable(input: CostIntervalsInput): Table {
  const unit = moneyUnit(input.currency, Math.max(0, ...input.options.map((option) => option.cost.p90)));
  return {
    caption: `Cost, ${unit.label}`,
    head: [
      'option',
      'form',
      'P10',
      'P50',
      'P90',
      `${currencySign(input.currency)}/m²`,
      'within budget, %',
      'cannot be separated from',
    ],
    rows: input.options.map((option) => {
      const within = input.standing.within[option.number];
      return [
        String(option.number),
        formLooks[option.form].name,
        ...(['p10', 'p50', 'p90'] as const).map((point) => ({
          text: money2(option.cost[point] / unit.per),
          figure: ofOption(option, `cost/${point}`),
        })),
        { text: significant(option.pricePerM2.withApproaches, 2), figure: perM2Of(option) },
        within === undefined ? '' : { text: odds(within), figure: withinOf(option) },
        listed(levelWith(input.standing, option.number).map(String)),
      ];
    }),
  };
}
