import { fingerprint, sinceIssued, type Appraisal, type Study } from '../../../lib/index.ts';
import { h, type HtmlChild } from '../../html.ts';
import { standing, type LineSection, type Sheet, type StudyStore } from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { listAction } from '../brief/fieldTable.ts';
import { problemBeside } from '../brief/problemBeside.ts';
import { leaveEmptied } from '../notes/leaveEmptied.ts';
import type { StudyCells } from '../studyCells.ts';
import { firstTaken, unsaid, withDraft, withoutIssue } from './decisionEdits.ts';
import { decisionFields, nameIn } from './decisionFields.ts';
import { issuedRecord } from './issuedRecord.ts';

/** Section 11: which option is taken forward, why, and what it was decided on. */
export function decisionSection(
  page: Sheet,
  graph: Graph,
  store: StudyStore,
  cells: StudyCells,
  today: () => string,
): LineSection {
  const { appraisal } = cells;
  const { decision } = store.slices;
  /** The last whole appraisal, which need not be of the study as it is now: nothing is decided on some of the forms. */
  const last = (): Appraisal | null => {
    const state = graph.state(appraisal);
    return 'value' in state && state.value.toCome.length === 0 ? state.value : null;
  };
  const now = (): Appraisal | null => (graph.state(appraisal).state === 'ready' ? last() : null);
  const record = (): void => {
    const answer = now() ?? last();
    const number = answer && firstTaken(answer, store.valid().options.reference);
    if (answer === null || number === null) return;
    store.edit((study) => withDraft(study, answer, number, today()), { what: 'recording a decision' });
  };
  const none = (): HtmlChild =>
    last() === null
      ? h('p', {}, 'No decision has been recorded; the options are being worked out.')
      : [
          h('p', {}, 'No decision has been recorded.'),
          h(
            'p',
            { class: 'list-actions' },
            listAction('Record a decision', 'Record a decision', 'decision.record', record),
          ),
        ];
  const body = (study: Study, build: () => HtmlChild): HtmlChild => {
    const current = study.decision;
    if (current === null) return none();
    const { issued } = current;
    if (issued === null) return build();
    const withdraw = listAction('Withdraw the issue', 'Withdraw the issue', 'decision.withdraw', () =>
      store.edit(withoutIssue, { what: 'withdrawing the decision' }),
    );
    return issuedRecord(current, issued, withdraw);
  };
  const fields = standing(graph, store, {
    say: problemBeside,
    follows: [appraisal],
    shape({ decision: current }) {
      const answer = last();
      if (current === null) return [answer === null];
      if (current.issued !== null) return current;
      const named = [current.option, ...current.dropped.map(({ option }) => option)];
      return [
        named,
        named.map((number) => nameIn(answer, number)),
        answer?.options.find(({ number }) => number === current.option)?.cost,
        answer?.options.map(({ number }) => number),
        answer && unsaid(current, answer),
        [current.reasons.length, current.questions.length, current.dissent === ''],
      ];
    },
    build: (study, built) =>
      body(study, () =>
        decisionFields(
          {
            store,
            fields: built,
            appraisal: last(),
            now,
            fingerprint: () => fingerprint(store.valid()),
            today,
          },
          study.decision!,
        ),
      ),
  }).element;
  leaveEmptied(fields);
  const finding = page.live({ decision }, (v) => {
    if (v.decision === null) return 'None recorded yet.';
    return `Option ${v.decision.option} is taken forward${v.decision.issued === null ? ': a draft' : ''}.`;
  });
  return page.section(11, 'Decision', finding, [
    page.cell({
      station: '11+010',
      title: 'Decision',
      shows: { decision, appraisal },
      long: true,
      body: h(
        'div',
        { class: 'decision' },
        page.live({ decision, appraisal }, (v) => {
          const isWhole = v.appraisal.toCome.length === 0;
          const since = v.decision !== null && isWhole ? sinceIssued(v.decision, v.appraisal) : [];
          return (
            since.length > 0 &&
            h('span', { class: 'caution since' }, h('b', {}, 'Changed since.'), ` ${since.join(' ')}`)
          );
        }),
        fields,
      ),
      notes: [
        h(
          'p',
          {},
          'Reasons are drafted from the standing and the rulings above; what decides besides them has to be written. ',
          h('span', { class: 'on-screen' }, 'Every sentence can be changed; an emptied one goes.'),
        ),
        h(
          'p',
          {},
          'Issued, it keeps its words, the fingerprint of the study and what each option came to on that day. Forms that were not worked out stand with their reasons at 3+020.',
        ),
        h(
          'p',
          { class: 'caution' },
          h('b', {}, 'Option stage only.'),
          ' It takes an option forward to be designed; it is no check and no approval. A licensed engineer and the local codes decide.',
        ),
      ],
    }),
  ]);
}
