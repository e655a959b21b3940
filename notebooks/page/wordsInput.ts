import { h } from '../html.ts';
import type { Origin } from './figureSpec.ts';
import { originWords } from './figureSpec.ts';
import { nextId } from './nextId.ts';
import type { Way } from './refusal.ts';
import { markRefused, refusalSlot } from './refusal.ts';

/** Words to be typed in a sentence: a name, a title, a reason. */
export interface WordsSpec {
  /** What they are, for those who do not see the sentence: 'name of the river'. */
  readonly label: string;
  readonly value: string;
  readonly origin?: Origin;
  /** Tells a field from others of its cell across drawings of it anew; the label unless given. */
  readonly key?: string;
  /** Most characters; 200 unless given. */
  readonly most?: number;
  /** Once at the end of each go that changed them. Spaces round them are left out. */
  readonly change: (value: string) => void;
  /** Enter on a start value that was left as it is. */
  readonly confirm?: () => void;
}

export interface WordsInput {
  readonly element: HTMLElement;
  /** Shows other words; those being typed are left alone. */
  readonly set: (value: string, origin?: Origin) => void;
  readonly refuse: (words: string | null, ways?: readonly Way[]) => void;
}

/** Words to be changed in place. Enter keeps, Escape goes back; words that are too long are refused. */
export function wordsInput(spec: WordsSpec): WordsInput {
  const { label, most = 200 } = spec;
  let { value } = spec;
  let origin = spec.origin ?? 'typed';
  let isTyping = false;
  const refusal = refusalSlot(`${nextId('words')}-refusal`);
  const field = h('span', {
    role: 'textbox',
    tabindex: 0,
    contenteditable: 'plaintext-only',
    'aria-label': label,
  });
  const element = h('span', { class: 'entry', 'data-key': spec.key ?? label }, field, refusal.element);

  const dress = (isRefused = false): void => {
    field.className = `fig words ${origin}${isRefused ? ' refused' : ''}`;
    field.setAttribute(
      'aria-description',
      [...originWords[origin], 'Enter keeps, Escape goes back'].join('; '),
    );
    markRefused(field, isRefused ? refusal : null);
    if (!isRefused) refusal.clear();
  };
  const setTyping = (next: boolean): void => {
    isTyping = next;
    element.classList.toggle('typing', next);
  };
  const write = (): void => {
    setTyping(false);
    if (field.textContent !== value) field.textContent = value;
    dress();
  };
  const refuse = (words: string, ways: readonly Way[]): void => {
    refusal.say(words, ways);
    dress(true);
  };
  const keep = (): void => {
    if (!isTyping) return;
    setTyping(false);
    const typed = field.textContent.replace(/\s+/gu, ' ').trim();
    if (typed.length > most) {
      refuse(`Refused: at most ${most} characters, not ${typed.length}. '${value}' is kept.`, [
        { words: `Back to '${value}'`, take: write },
      ]);
      return;
    }
    const isChanged = typed !== value;
    value = typed;
    if (isChanged) origin = 'typed';
    write();
    if (isChanged) spec.change(value);
  };

  field.addEventListener('input', () => setTyping(true));
  field.addEventListener('blur', keep);
  field.addEventListener('keydown', (event) => {
    if (event.key === 'Enter' && !isTyping && origin === 'assumed') spec.confirm?.();
    else if (event.key === 'Enter') keep();
    else if (event.key === 'Escape') write();
    else return;
    event.preventDefault();
    event.stopPropagation();
  });

  write();
  return {
    element,
    set(next, from = origin) {
      if (isTyping || (next === value && from === origin)) return;
      value = next;
      origin = from;
      write();
    },
    refuse(words, ways = []) {
      if (words === null) dress();
      else refuse(words, ways);
    },
  };
}
