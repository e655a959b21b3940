import { scaleLog } from 'd3-scale';
import { fixed, money2, moneyUnit, plain } from '../format.ts';
import { ofOption } from '../drawing/asked.ts';
import { colours, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { logTicks } from './logTicks.ts';
import type { Table, TableCell } from './table.ts';
import type { TradeOffsInput } from './tradeOffPanel.ts';
import { PANEL_PX, panel } from './tradeOffPanel.ts';

export type { Measure, TradeOffsInput } from './tradeOffPanel.ts';

/** Panels of one measure each against cost on one log axis; what nothing beats is filled, the edge is the heavy step. */
export function tradeOffs(input: TradeOffsInput): Piece {
  const { options, measures, widthPx, budget, panelPx = PANEL_PX } = input;
  const ink = formInk(
    input.paper ?? 'colour',
    options.map((option) => option.form),
    input.prefix ?? 'trade',
  );
  const perLine = widthPx < 480 ? 1 : widthPx < 900 ? 2 : Math.min(4, measures.length);
  const unit = moneyUnit(input.currency, Math.max(0, ...options.map((option) => option.cost.p90)));
  const moneyRoom = 44;
  const gap = 40;
  const panelWidth = (widthPx - moneyRoom - gap * (perLine - 1)) / perLine;
  const values = options.flatMap((option) => [option.cost.p10, option.cost.p90]).concat(budget ?? []);
  const low = Math.min(...values) * 0.97;
  const high = Math.max(...values) * 1.03;
  const blockHeight = panelPx + (measures.some((measure) => measure.onEdge !== undefined) ? 132 : 78);
  const lines = Math.ceil(measures.length / perLine);
  return sheet(
    widthPx,
    lines * blockHeight,
    `Cost against ${measures.map((measure) => measure.name.toLowerCase()).join('; ')}`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      Array.from({ length: lines }, (_, lineIndex) => {
        const top = lineIndex * blockHeight + 38;
        const scale = scaleLog([low, high], [top + panelPx, top]);
        const y = (money: number): number => scale(money);
        const ticks = logTicks(low, high, y);
        const inLine = measures.slice(lineIndex * perLine, (lineIndex + 1) * perLine);
        return g(
          {},
          label(moneyRoom - 12, top - 10, unit.label, { anchor: 'end', fill: colours.second }),
          ticks.map((tick) =>
            g(
              {},
              el('path', {
                d: inLine
                  .map(
                    (_, index) =>
                      `M${num(moneyRoom + index * (panelWidth + gap))},${num(y(tick))}h${num(panelWidth)}`,
                  )
                  .join(''),
                stroke: colours.grid,
                'stroke-width': pens.fine,
              }),
              label(moneyRoom - 8, y(tick) + 4, String(Number((tick / unit.per).toPrecision(3))), {
                anchor: 'end',
                fill: colours.second,
              }),
            ),
          ),
          inLine.map((measure, index) =>
            panel(
              input,
              measure,
              ink,
              moneyRoom + index * (panelWidth + gap),
              moneyRoom + index * (panelWidth + gap) + panelWidth,
              top,
              y,
              // Said once in a line: it goes on through all panels.
              budget === null || index > 0 ? null : `budget ${plain(budget / unit.per)}`,
            ),
          ),
        );
      }),
    ],
  );
}

/** The table behind the trade-offs. */
export function tradeOffTable(input: TradeOffsInput): Table {
  const unit = moneyUnit(input.currency, Math.max(0, ...input.options.map((option) => option.cost.p90)));
  return {
    caption: `Medians; cost in ${unit.label}`,
    head: ['option', 'cost', ...input.measures.map((measure) => measure.name)],
    rows: input.options.map((option) => [
      String(option.number),
      { text: money2(option.cost.p50 / unit.per), figure: ofOption(option, 'cost/p50') },
      ...input.measures.map((measure): TableCell => {
        const spread = measure.values[option.number];
        const text = fixed(spread?.p50 ?? NaN, measure.places);
        return spread === undefined ? text : { text, figure: measure.figures?.(option) };
      }),
    ]),
  };
}
