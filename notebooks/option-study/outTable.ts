import { outBecause } from '../charts/ranking.ts';
import { ofOption } from '../drawing/asked.ts';
import { spanPaths, spansOf } from '../drawing/alongOption.ts';
import { optionTitle } from '../drawing/optionWords.ts';
import { countWords, money2, moneyUnit, spansText } from '../format.ts';
import { h } from '../html.ts';
import type { AppraisedOption } from '../model.ts';
import { workedFigure } from '../page/index.ts';

/**
 * Options that a rule puts out, folded under the stack: what they are, what they would cost and why they are out. One is made
 * the reference, and then drawn, by its button.
 * @param options those that are out, in the order of the stack
 * @param currency ISO code of the money they are priced in
 */
export function outTable(options: readonly AppraisedOption[], currency: string): HTMLElement {
  const unit = moneyUnit(currency, Math.max(0, ...options.map((option) => option.cost.p90)));
  const count = countWords(options.length);
  return h(
    'details',
    { class: 'behind out' },
    h(
      'summary',
      {},
      `Out, with the reason: ${count} more ${options.length === 1 ? 'arrangement' : 'arrangements'} worked out`,
    ),
    h(
      'table',
      {},
      h(
        'thead',
        {},
        h(
          'tr',
          {},
          ['option', 'spans, m', unit.label, 'out, because', ''].map((word) =>
            h('th', { scope: 'col' }, word),
          ),
        ),
      ),
      h(
        'tbody',
        {},
        options.map((option) =>
          h(
            'tr',
            {},
            h('th', { scope: 'row' }, `${String(option.number)} ${optionTitle(option)}`),
            h(
              'td',
              { class: 'text' },
              workedFigure(
                spanPaths(option).filter((path) => path !== undefined),
                spansText(spansOf(option)),
              ),
            ),
            h('td', { 'data-figure': ofOption(option, 'cost/p50') }, money2(option.cost.p50 / unit.per)),
            h('td', { class: 'text' }, outBecause(option)),
            h(
              'td',
              {},
              h(
                'button',
                {
                  type: 'button',
                  class: 'action',
                  'data-option': option.number,
                  'aria-label': `Draw option ${String(option.number)} as the reference`,
                },
                'draw it',
              ),
            ),
          ),
        ),
      ),
    ),
  );
}
