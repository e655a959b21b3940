import { confirmed, isAssumed } from '../../../lib/index.ts';
import { h, type HtmlChild } from '../../html.ts';
import type { Fields, StudyStore } from '../../page/index.ts';

/**
 * Puts what fields say against their value below the row or drawing they stand in, each with the name of its field:
 * a table cell is too narrow for a sentence. Takes no room while nothing is said.
 */
export function saidBelow(within: Element): HTMLElement {
  const told = Array.from(within.querySelectorAll('.entry > .refusal'), (refusal) => {
    const field = refusal.parentElement?.querySelector('[aria-label]');
    return h('span', { class: 'told' }, h('b', {}, `${field?.getAttribute('aria-label') ?? ''}: `), refusal);
  });
  return h('div', { class: 'told-below' }, told);
}

/** A row of fields, and below it the row that says what is wrong in it. */
export function fieldRow(cells: readonly HtmlChild[]): HTMLElement[] {
  const row = h(
    'tr',
    { class: 'fields' },
    cells.map((cell, i) => h(i === 0 ? 'th' : 'td', i === 0 ? { scope: 'row' } : {}, cell)),
  );
  return [row, h('tr', { class: 'told-row' }, h('td', { colspan: cells.length }, saidBelow(row)))];
}

/**
 * A word that changes a list: add, take out. It keeps the focus when its list is drawn anew; where it goes with its
 * entry, the focus goes to the last of its kind.
 * @param key tells it from the other actions; up to the last point it is that of its kind
 */
export function listAction(words: string, name: string, key: string, act: () => void): HTMLElement {
  const kind = key.slice(0, key.lastIndexOf('.'));
  const button = h(
    'button',
    { type: 'button', class: 'action list', 'data-key': key, 'aria-label': name },
    words,
  );
  button.addEventListener('click', () => {
    const part = button.closest('.standing');
    act();
    if (part === null || button.ownerDocument.activeElement !== button.ownerDocument.body) return;
    const others = Array.from(
      part.querySelectorAll<HTMLElement>(`.action[data-key^="${CSS.escape(kind)}."]`),
    );
    others.at(-1)?.focus();
  });
  return button;
}

/** What can be confirmed in one go. */
interface ConfirmSpec {
  readonly words: string;
  /** What is confirmed: 'ground line'. */
  readonly what: string;
  readonly key: string;
  /** Where it stands, as the study names it: 'brief.crossing.ground'. */
  readonly paths: readonly string[];
}

/** A word that confirms several start values as they stand; not there while none of them is one. */
export function confirmAction(
  fields: Fields,
  store: StudyStore,
  { words, what, key, paths }: ConfirmSpec,
): HTMLElement {
  const action = listAction(words, `confirm ${what} as it stands`, key, () => {
    const isByKey = action.matches(':focus-visible');
    const [entry, part] = [action.closest('.point, .strip'), action.closest('.standing')];
    store.edit((study) => confirmed(study, paths), { what: `confirming ${what}` });
    // It goes with what it confirms; the keyboard stays with the figures.
    const near = entry?.isConnected === true ? entry : part;
    if (isByKey) near?.querySelector<HTMLElement>('.fig')?.focus();
  });
  fields.follow([], (draft) =>
    action.toggleAttribute('hidden', !paths.some((path) => isAssumed(draft, path))),
  );
  return action;
}

/** Gives the focus to the field of that key inside a part, where it stands. */
export function focusField(within: Element, key: string): void {
  const entry = within.querySelector(`[data-key="${CSS.escape(key)}"]`);
  const field = entry?.querySelector('.fig') ?? entry;
  if (field instanceof HTMLElement) field.focus();
}

/** Says words in a place, and leaves it alone while it says them already. */
export function sayIn(place: Element, words: string): void {
  if (place.textContent !== words) place.textContent = words;
}
