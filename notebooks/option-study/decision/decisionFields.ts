import type { Appraisal, Decision, Study } from '../../../lib/index.ts';
import { ofOption } from '../../drawing/asked.ts';
import { optionTitle } from '../../drawing/optionWords.ts';
import { h, type HtmlChild } from '../../html.ts';
import { workedFigure, type Fields, type StudyStore } from '../../page/index.ts';
import { focusField, listAction } from '../brief/fieldTable.ts';
import { moneyWords } from '../words.ts';
import {
  notIssuable,
  unsaid,
  withDraft,
  withEntryText,
  withIssue,
  withoutDecision,
  withTaken,
  withUnsaid,
  type DecisionList,
} from './decisionEdits.ts';

/** Most characters of a reason, and of a name. */
const MOST = { text: 2000, name: 200 };

/** What the fields of a decision are built with. */
export interface DecisionDesk {
  readonly store: StudyStore;
  readonly fields: Fields;
  /** Null until the first one has come. */
  readonly appraisal: Appraisal | null;
  /** The appraisal of the study as it is now; null while it is being worked out. */
  readonly now: () => Appraisal | null;
  readonly fingerprint: () => string;
  readonly today: () => string;
}

/** Name of an option as the appraisal has it, to be put after its number; '' where it has none of that number. */
export function nameIn(appraisal: Appraisal | null, number: number): string {
  const option = appraisal?.options.find((one) => one.number === number);
  return option === undefined ? '' : optionTitle(option);
}

/** What the option that is taken forward is, and comes to now. */
function takenNow(appraisal: Appraisal | null, number: number): HtmlChild {
  const option = appraisal?.options.find((one) => one.number === number);
  if (option === undefined || appraisal === null) return ', which is not worked out now';
  const cost = (point: 'p10' | 'p50' | 'p90'): HTMLElement =>
    workedFigure(ofOption(option, `cost/${point}`), moneyWords(option.cost[point], appraisal.currency));
  return [`, ${optionTitle(option)}, at `, cost('p50'), ' (', cost('p10'), ' to ', cost('p90'), ')'];
}

const listNames: Readonly<Record<DecisionList, { readonly one: string; readonly add: string }>> = {
  reasons: { one: 'reason', add: 'Add a reason' },
  questions: { one: 'open question', add: 'Add a question' },
};

/** The sentences of a list, each changed in place and taken out when emptied; one more may be begun behind the last. */
function sentences({ fields, store }: DecisionDesk, list: DecisionList, count: number): HTMLElement {
  const key = (index: number): string => `decision.${list}.${index}`;
  const entry = (index: number): HTMLElement =>
    h(
      'li',
      {},
      fields.words(
        {
          key: key(index),
          get: ({ decision }) => decision?.[list][index] ?? '',
          put: (study, text) => withEntryText(study, list, index, text),
          owns: [['decision', list, index]],
        },
        { label: `${listNames[list].one} ${index + 1}`, most: MOST.text },
      ),
    );
  const entries = h(
    'ol',
    { class: 'said-list' },
    Array.from({ length: count }, (_, index) => entry(index)),
  );
  const begin = (): void => {
    const index = store.valid().decision?.[list].length ?? 0;
    if (entries.querySelector(`[data-key="${key(index)}"]`) === null) {
      const fresh = entry(index);
      // Begun and left without words it is nothing.
      fresh.addEventListener('focusout', () => {
        if ((store.valid().decision?.[list].length ?? 0) <= index) fresh.remove();
      });
      entries.append(fresh);
    }
    focusField(entries, key(index));
  };
  return h(
    'div',
    {},
    count === 0 && h('p', { class: 'on-paper' }, 'None recorded.'),
    entries,
    h(
      'p',
      { class: 'list-actions' },
      h('button', { type: 'button', class: 'action list', onclick: begin }, listNames[list].add),
    ),
  );
}

function droppedRows({ fields, appraisal }: DecisionDesk, { dropped }: Decision): HTMLElement {
  return h(
    'table',
    { class: 'dropped-options' },
    h(
      'thead',
      {},
      h(
        'tr',
        {},
        ['option', 'why it is not taken forward'].map((word) => h('th', { scope: 'col' }, word)),
      ),
    ),
    h(
      'tbody',
      {},
      dropped.map(({ option }, index) =>
        h(
          'tr',
          {},
          h('th', { scope: 'row' }, `${option} ${nameIn(appraisal, option)}`),
          h(
            'td',
            { class: 'text' },
            fields.words(['decision', 'dropped', index, 'reason'], {
              label: `why option ${option} is not taken forward`,
              most: MOST.text,
            }),
          ),
        ),
      ),
    ),
  );
}

/** Options of which the decision says nothing, with the way to have their reasons drafted. */
function unsaidWords({ appraisal, store }: DecisionDesk, decision: Decision): HtmlChild {
  const left = appraisal === null ? [] : unsaid(decision, appraisal);
  if (appraisal === null || left.length === 0) return null;
  return h(
    'p',
    { class: 'small' },
    `Nothing is said yet of option ${left.join(', ')}. `,
    listAction('draft why', 'draft why these options are not taken forward', 'decision.unsaid', () =>
      store.edit((study) => withUnsaid(study, appraisal), { what: 'drafting reasons' }),
    ),
  );
}

/** The option that is taken forward, chosen among those that are worked out. */
function takenChoice({ fields, appraisal, now }: DecisionDesk, { option: taken }: Decision): HTMLElement {
  const known = appraisal?.options.map(({ number }) => number) ?? [];
  const numbers = known.includes(taken) ? known : [taken, ...known];
  return fields.choice<string>(
    {
      key: 'decision.option',
      get: ({ decision }) => String(decision?.option ?? taken),
      put(study: Study, chosen) {
        const answer = now() ?? appraisal;
        const isKnown = answer?.options.some(({ number }) => number === Number(chosen)) === true;
        return isKnown ? withTaken(study, answer, Number(chosen)) : study;
      },
      owns: [['decision', 'option']],
    },
    {
      label: 'option taken forward',
      choices: numbers
        .toSorted((one, other) => one - other)
        .map((number) => ({ value: String(number), words: `option ${number}` })),
    },
  );
}

/** The decision as a draft: everything in it changed in place, and what may be done with it. */
export function decisionFields(desk: DecisionDesk, decision: Decision): HtmlChild {
  const { fields, store, appraisal, now, today } = desk;
  const told = h('p', { class: 'refusal', role: 'status' });
  const issue = (): void => {
    const answer = now();
    const current = store.valid().decision;
    if (current === null) return;
    const why = notIssuable(current, answer, desk.fingerprint());
    told.textContent = why.length === 0 ? '' : `Not issued: ${why.join('; ')}.`;
    if (why.length > 0 || answer === null) return;
    store.edit((study) => withIssue(study, answer, today()), { what: 'issuing the decision' });
  };
  const draftAnew = (): void => {
    const answer = now() ?? appraisal;
    if (answer?.options.some(({ number }) => number === decision.option) !== true) return;
    store.edit((study) => withDraft(study, answer, decision.option, today()), {
      what: 'drafting the decision anew',
    });
  };
  const words = (key: 'author' | 'date' | 'dissent', label: string, most = MOST.name): HTMLElement =>
    fields.words(['decision', key], { label, most });
  return [
    h(
      'p',
      {},
      'Taken forward: ',
      takenChoice(desk, decision),
      takenNow(desk.appraisal, decision.option),
      '. A draft, not issued.',
    ),
    h('h3', {}, 'Reasons for it'),
    sentences(desk, 'reasons', decision.reasons.length),
    h('h3', {}, 'Why the others were dropped'),
    droppedRows(desk, decision),
    unsaidWords(desk, decision),
    h('h3', {}, 'Open questions'),
    sentences(desk, 'questions', decision.questions.length),
    h(
      'p',
      { class: 'dissent' },
      h('b', {}, 'Dissent:'),
      ' ',
      h(
        'span',
        { class: decision.dissent === '' ? 'on-screen' : null },
        words('dissent', 'dissent', MOST.text),
      ),
      decision.dissent === '' && h('span', { class: 'on-paper' }, 'none recorded.'),
    ),
    h(
      'p',
      {},
      'Decided by ',
      words('author', 'who decided'),
      ' on ',
      words('date', 'date of the decision'),
      '.',
    ),
    told,
    h(
      'p',
      { class: 'list-actions' },
      h(
        'button',
        { type: 'button', class: 'action list', 'data-key': 'decision.issue', onclick: issue },
        'Issue it',
      ),
      listAction('Draft it anew', 'Draft it anew', 'decision.anew', draftAnew),
      listAction('Take the decision out', 'Take the decision out', 'decision.out', () =>
        store.edit(withoutDecision, { what: 'taking the decision out' }),
      ),
    ),
  ];
}
