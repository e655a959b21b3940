import type { Decision, Issued } from '../../../lib/index.ts';
import { formLooks } from '../../forms/formLook.ts';
import { money2, moneyUnit } from '../../format.ts';
import { h, type HtmlChild } from '../../html.ts';
import { dayWords } from '../../page/index.ts';
import { moneyWords } from '../words.ts';

const list = (sentences: readonly string[]): HtmlChild =>
  sentences.length === 0
    ? h('p', {}, 'None recorded.')
    : h(
        'ol',
        { class: 'said-list' },
        sentences.map((words) => h('li', {}, words)),
      );

/** Every option as it stood when the decision was issued, in the order of cost then, with why it was not taken. */
function resultsTable({ option: taken, dropped }: Decision, issued: Issued): HTMLElement {
  const unit = moneyUnit(issued.currency, Math.max(0, ...issued.options.map(({ p90 }) => p90)));
  const money = (value: number): string => money2(value / unit.per);
  const why = (number: number): string =>
    number === taken
      ? 'taken forward'
      : (dropped.find(({ option }) => option === number)?.reason ?? 'nothing was said');
  return h(
    'table',
    { class: 'dropped-options' },
    h(
      'thead',
      {},
      h(
        'tr',
        {},
        h('th', { scope: 'col' }, 'option'),
        h('th', { scope: 'col', class: 'figure' }, unit.label),
        h('th', { scope: 'col', class: 'figure' }, '10 to 90 %'),
        h('th', { scope: 'col' }, 'why it was not taken forward'),
      ),
    ),
    h(
      'tbody',
      {},
      issued.options.map(({ number, form, p10, p50, p90 }) =>
        h(
          'tr',
          {},
          h('th', { scope: 'row' }, `${number} ${formLooks[form].short}`),
          h('td', { class: 'figure' }, money(p50)),
          h('td', { class: 'figure' }, `${money(p10)} to ${money(p90)}`),
          h('td', { class: number === taken ? 'text decides' : 'text' }, why(number)),
        ),
      ),
    ),
  );
}

/** An issued decision: its words and the results it was issued with, as they were, none of them changed any more. */
export function issuedRecord(decision: Decision, issued: Issued, withdraw: HTMLElement): HtmlChild {
  const then = issued.options.find(({ number }) => number === decision.option)!;
  const money = (value: number): string => moneyWords(value, issued.currency);
  return [
    h(
      'p',
      {},
      'Taken forward: ',
      h('b', {}, `option ${then.number}, ${formLooks[then.form].short}`),
      `, at ${money(then.p50)} (${money(then.p10)} to ${money(then.p90)}). Decided by ${decision.author} on ${dayWords(decision.date)}; issued on ${dayWords(issued.date)}, fingerprint `,
      h('span', { class: 'fingerprint' }, issued.fingerprint.slice(0, 12)),
      '.',
    ),
    h('h3', {}, 'Reasons for it'),
    list(decision.reasons),
    h('h3', {}, 'The options as they stood, and why the others were dropped'),
    resultsTable(decision, issued),
    h('h3', {}, 'Open questions'),
    list(decision.questions),
    h(
      'p',
      { class: 'dissent' },
      h('b', {}, 'Dissent:'),
      ' ',
      decision.dissent === '' ? 'none recorded.' : decision.dissent,
    ),
    h('p', { class: 'list-actions' }, withdraw),
  ];
}
