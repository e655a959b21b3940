import { formIds, formsAsked, sizeableForms, type FormId, type Study } from '../../lib/index.ts';
import { formLooks } from '../forms/formLook.ts';
import { countWords, listed } from '../format.ts';
import { h } from '../html.ts';
import type { StudyStore } from '../page/index.ts';

/** The study with a form asked for or left out. Every form asked for is an empty list; the last one is never left out. */
export function withForm(study: Study, form: FormId, isAsked: boolean): Study {
  const asked = new Set(formsAsked(study));
  if (isAsked) asked.add(form);
  else asked.delete(form);
  if (asked.size === 0) return study;
  const forms = sizeableForms.every((one) => asked.has(one)) ? [] : formIds.filter((one) => asked.has(one));
  return { ...study, options: { ...study.options, forms } };
}

/** Forms that a study does not ask for, in their usual order. */
export function formsNotAsked(study: Study): FormId[] {
  const asked = formsAsked(study);
  return formIds.filter((form) => sizeableForms.includes(form) && !asked.includes(form));
}

/** What asks for a form or leaves it out; it can be seen without pointing at its row. */
export function formAction(store: StudyStore, form: FormId, isAsked: boolean): HTMLElement {
  const words = isAsked ? 'leave it out' : 'ask for it';
  const button = h(
    'button',
    {
      type: 'button',
      class: 'action list',
      'data-key': `form.${form}`,
      'aria-label': `${formLooks[form].short}: ${words}`,
      onclick: () =>
        store.edit((study) => withForm(study, form, !isAsked), {
          what: isAsked ? `leaving out ${formLooks[form].short}` : `asking for ${formLooks[form].short}`,
        }),
    },
    words,
  );
  return h('span', {}, button);
}

/** 'All seventeen forms are asked for.' or how many are, and which are not. */
export function askedWords(study: Study): string {
  const [asked, not] = [formsAsked(study), formsNotAsked(study)];
  if (not.length === 0) return `All ${countWords(asked.length)} forms are asked for.`;
  const are = not.length === 1 ? 'one is not' : `${countWords(not.length)} are not`;
  return `Of ${String(asked.length + not.length)} forms ${countWords(asked.length)} ${asked.length === 1 ? 'is' : 'are'} asked for; ${are}, and nothing is worked out for them.`;
}

/** Which forms are asked for and which are not, where some are not. */
export function listWords(study: Study): string {
  const names = (forms: readonly FormId[]): string =>
    listed(forms.map((form) => formLooks[form].short.toLowerCase().replace(/ i$/u, ' I')));
  const asked = formsAsked(study);
  return `Asked for: ${names(formIds.filter((form) => asked.includes(form)))}. Not asked for: ${names(formsNotAsked(study))}.`;
}

/** Forms that stand in the chart of spans and that no study can have worked out; empty where there are none. */
export function unsizedWords(): string {
  const unsized = formIds.filter((form) => !sizeableForms.includes(form));
  if (unsized.length === 0) return '';
  const they = unsized.length === 1 ? 'it is' : 'they are';
  return `Not worked out by this tool and so not to be asked for: ${listed(unsized.map((form) => formLooks[form].short.toLowerCase()))}. At 2+010 ${they} judged by span alone.`;
}

/** Every form, whether the study asks for it, and the way to ask for it or leave it out. */
export function formsTable(study: Study, store: StudyStore): HTMLElement {
  const asked = formsAsked(study);
  const line = (form: FormId): HTMLElement => {
    const isAsked = asked.includes(form);
    const isLast = isAsked && asked.length === 1;
    return h(
      'tr',
      {},
      h('th', { scope: 'row' }, formLooks[form].short),
      h('td', { class: 'text' }, isAsked ? 'asked for' : 'not asked for'),
      h('td', {}, isLast ? 'the only one' : formAction(store, form, isAsked)),
    );
  };
  const all = formIds.filter((form) => sizeableForms.includes(form));
  const half = Math.ceil(all.length / 2);
  return h(
    'div',
    { class: 'beside' },
    [all.slice(0, half), all.slice(half)].map((forms) =>
      h('table', { class: 'forms-asked' }, h('tbody', {}, forms.map(line))),
    ),
  );
}
