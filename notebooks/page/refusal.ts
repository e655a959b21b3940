import { h } from '../html.ts';

/** A way on from a refusal or a failure: what it is called and what it does. */
export interface Way {
  readonly words: string;
  readonly take: () => void;
}

/** Ways on, as actions in a row. */
export function waysOn(ways: readonly Way[]): HTMLElement[] {
  return ways.map(({ words, take }) => h('button', { type: 'button', class: 'action', click: take }, words));
}

export interface RefusalSlot {
  readonly element: HTMLElement;
  readonly say: (words: string, ways: readonly Way[]) => void;
  readonly clear: () => void;
}

/** The place below a field's line where a refusal is said; it takes no room while there is none. */
export function refusalSlot(id: string): RefusalSlot {
  const element = h('span', { class: 'refusal', id, role: 'status' });
  const tell = (): void => {
    const told = element.closest('.told');
    if (told !== null) speaks(told);
  };
  return {
    element,
    say(words, ways) {
      element.replaceChildren(
        h('span', { class: 'why' }, words),
        ...(ways.length === 0 ? [] : [h('span', { class: 'ways' }, waysOn(ways))]),
      );
      tell();
    },
    clear() {
      element.replaceChildren();
      tell();
    },
  };
}

/** Marks a place below a row of fields, and that row, where one of its fields is refused. */
export function speaks(told: Element): void {
  told.classList.toggle('speaks', told.querySelector('.refusal:not(:empty)') !== null);
  const row = told.closest('.told-row');
  const isTold = row?.querySelector('.speaks') != null;
  row?.previousElementSibling?.classList.toggle('told-of', isTold);
}

/** Tells those who do not see it whether a field is refused, and by what words. */
export function markRefused(field: HTMLElement, refusal: RefusalSlot | null): void {
  if (refusal === null) {
    field.removeAttribute('aria-invalid');
    field.removeAttribute('aria-describedby');
  } else {
    field.setAttribute('aria-invalid', 'true');
    field.setAttribute('aria-describedby', refusal.element.id);
  }
}
