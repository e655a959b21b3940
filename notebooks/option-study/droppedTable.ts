import { ruledOut } from '../../lib/index.ts';
import type { Appraisal, FormId } from '../../lib/index.ts';
import { formLooks } from '../forms/formLook.ts';
import { fixed, listed } from '../format.ts';
import { h, type HtmlChild } from '../html.ts';
import type { StudyStore } from '../page/index.ts';
import { formAction, formsNotAsked } from './formsTable.ts';

/** How many arrangements were dropped without being worked out. */
export const droppedTotal = ({ droppedCounts }: Appraisal): number =>
  droppedCounts.reduce((sum, dropped) => sum + dropped.count, 0);

/** The study with a form worked out although a rule puts it out, or left out again. */
const anyway = (store: StudyStore, form: FormId, isAsked: boolean): void =>
  store.edit(
    (study) => {
      const others = study.options.workOutAnyway.filter((one) => one !== form);
      const workOutAnyway = isAsked ? [...others, form] : others;
      return { ...study, options: { ...study.options, workOutAnyway } };
    },
    { what: isAsked ? 'working a form out anyway' : 'leaving a form out' },
  );

/** What may be done about a form that the rules put out. */
function anywayAction(store: StudyStore, form: FormId, isAsked: boolean): HTMLElement {
  const words = isAsked ? 'leave it out again' : 'work it out anyway';
  return h(
    'button',
    {
      type: 'button',
      class: 'action list',
      'data-key': `anyway.${form}`,
      'aria-label': `${formLooks[form].short}: ${words}`,
      onclick: () => anyway(store, form, !isAsked),
    },
    words,
  );
}

/** Forms worked out against the rules, each with the way back. */
export function anywayWords(store: StudyStore, { site, options }: Appraisal): HtmlChild {
  const { workOutAnyway } = store.valid().options;
  const against = workOutAnyway.filter((form) => ruledOut(site, form).length > 0);
  return against.map((form) => {
    const numbers = options.filter((option) => option.form === form).map(({ number }) => String(number));
    const as = numbers.length === 0 ? '' : ` as option ${listed(numbers)}`;
    return h(
      'p',
      { class: 'small' },
      `${formLooks[form].short} is worked out${as} although ${ruledOut(site, form).join('; ')}; it never leads. `,
      anywayAction(store, form, true),
    );
  });
}

/** What was not worked out, by form and reason. */
export function droppedTable(appraisal: Appraisal, store: StudyStore): HTMLElement {
  const { workOutAnyway } = store.valid().options;
  const isOut = (form: FormId): boolean =>
    !workOutAnyway.includes(form) && ruledOut(appraisal.site, form).length > 0;
  const rows = [
    ...appraisal.dropped.map(({ form, because }) => ({
      form,
      reason: because.join('; '),
      count: null,
      figure: undefined,
    })),
    ...appraisal.droppedCounts.map((one, i) => ({ ...one, figure: `droppedCounts/${i}/count` })),
  ];
  return h(
    'details',
    { class: 'behind' },
    h('summary', {}, `The ${fixed(droppedTotal(appraisal), 0)} arrangements dropped, by reason`),
    h(
      'table',
      {},
      h(
        'thead',
        {},
        h(
          'tr',
          {},
          ['form', 'reason', 'arrangements'].map((word) => h('th', { scope: 'col' }, word)),
        ),
      ),
      h(
        'tbody',
        {},
        rows.map(({ form, reason, count, figure }) =>
          h(
            'tr',
            {},
            h('th', { scope: 'row' }, formLooks[form].short),
            h('td', { class: 'text' }, reason),
            h(
              'td',
              { 'data-figure': figure },
              count === null
                ? ['form dropped', isOut(form) && [' ', anywayAction(store, form, false)]]
                : fixed(count, 0),
            ),
          ),
        ),
        formsNotAsked(store.valid()).map((form) =>
          h(
            'tr',
            {},
            h('th', { scope: 'row' }, formLooks[form].short),
            h('td', { class: 'text' }, 'not asked for'),
            h('td', {}, 'form not worked out ', formAction(store, form, false)),
          ),
        ),
      ),
    ),
  );
}
