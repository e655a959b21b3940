import { level, use } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';
import type { AsItStands } from './studyCells.ts';
import { moneyWords } from './words.ts';

/** What the reference comes to for the study as it is now, and what forbids it; nothing before the first appraisal. */
export function asItStandsNote({ option, faults, isFrozen }: AsItStands, currency: string): HtmlChild {
  const ruledOut = option?.rulings.filter(({ effect }) => effect === 'out') ?? [];
  const why = faults.length > 0 ? faults : ruledOut.flatMap(({ because }) => because);
  const forbidden =
    why.length > 0 &&
    h('p', { class: 'caution' }, h('b', {}, 'Not as it stands.'), ` The reference: ${why.join('; ')}.`);
  if (!option) return forbidden;
  const { headroom, limitingCheck, number, cost } = option;
  const range = `${moneyWords(cost.p50, currency)} (${moneyWords(cost.p10, currency)} to ${moneyWords(cost.p90, currency)})`;
  const spare = headroom ? `; ${level(headroom.spareM)} m spare over ${headroom.reason}` : '';
  const check = `governed by ${limitingCheck.label}, ${use(limitingCheck.utilisation)}`;
  return [
    h('p', {}, `Option ${number}, the reference: ${range}${spare}; ${check}.`),
    forbidden,
    isFrozen &&
      h('p', {}, 'Its supports and depths are held; arrangements, odds and order are being worked out.'),
  ];
}
