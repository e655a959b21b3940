import { h } from '../html.ts';
import type { Origin } from './figureSpec.ts';
import { originWords } from './figureSpec.ts';
import { nextId } from './nextId.ts';
import type { Way } from './refusal.ts';
import { markRefused, refusalSlot } from './refusal.ts';

export interface Choice<T extends string> {
  readonly value: T;
  readonly words: string;
}

/** A word of a sentence that can be exchanged for others. `'unknown'` among the choices is written as not known. */
export interface ChoiceSpec<T extends string> {
  /** What is chosen, for those who do not see the sentence: 'load standard'. */
  readonly label: string;
  readonly value: T;
  readonly choices: readonly Choice<T>[];
  readonly origin?: Origin;
  /** Tells a field from others of its cell across drawings of it anew; the label unless given. */
  readonly key?: string;
  readonly change: (value: T) => void;
  /** Offered below a start value: that it stands. */
  readonly confirm?: () => void;
}

export interface ChoiceInput<T extends string> {
  readonly element: HTMLElement;
  readonly set: (value: T, origin?: Origin) => void;
  readonly refuse: (words: string | null, ways?: readonly Way[]) => void;
}

/** A choice in a sentence: the word itself is the control; arrow keys or the first letter choose another. */
export function choiceInput<T extends string>(spec: ChoiceSpec<T>): ChoiceInput<T> {
  let { value } = spec;
  let origin = spec.origin ?? 'typed';
  const refusal = refusalSlot(`${nextId('choice')}-refusal`);
  const field = h(
    'select',
    { 'aria-label': spec.label },
    spec.choices.map((choice) => h('option', { value: choice.value }, choice.words)),
  );
  const below = h('span', { class: 'below' });
  const element = h(
    'span',
    { class: 'entry', 'data-key': spec.key ?? spec.label },
    field,
    below,
    refusal.element,
  );
  const confirm = h(
    'button',
    { type: 'button', class: 'action', 'aria-label': `confirm ${spec.label}` },
    'confirm',
  );
  confirm.addEventListener('click', () => {
    field.focus();
    spec.confirm?.();
  });
  const offer = (): void => {
    const isOffered = origin === 'assumed' && spec.confirm !== undefined && element.matches(':focus-within');
    // Put there again it would lose the focus.
    if (isOffered !== confirm.isConnected) below.replaceChildren(...(isOffered ? [confirm] : []));
  };
  const dress = (isRefused = false): void => {
    field.value = value;
    field.className = `fig ${value === 'unknown' ? 'unknown' : origin}${isRefused ? ' refused' : ''}`;
    if (originWords[origin].length === 0) field.removeAttribute('aria-description');
    else field.setAttribute('aria-description', originWords[origin].join('; '));
    markRefused(field, isRefused ? refusal : null);
    if (!isRefused) refusal.clear();
    offer();
  };
  element.addEventListener('focusin', offer);
  element.addEventListener('focusout', ({ relatedTarget }) => {
    if (!(relatedTarget instanceof Node && element.contains(relatedTarget))) below.replaceChildren();
  });
  field.addEventListener('change', () => {
    const chosen = spec.choices.find((choice) => choice.value === field.value);
    if (chosen === undefined || chosen.value === value) return;
    value = chosen.value;
    origin = 'typed';
    dress();
    spec.change(value);
  });
  dress();
  return {
    element,
    set(next, from = origin) {
      if (next === value && from === origin) return;
      value = next;
      origin = from;
      dress();
    },
    refuse(words, ways = []) {
      if (words !== null) refusal.say(words, ways);
      dress(words !== null);
    },
  };
}
