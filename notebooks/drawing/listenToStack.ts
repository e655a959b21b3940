/** Told when a row of a stack is chosen by click, Enter or space; bubbles. */
export const chooseReference = 'choose-reference';
export type ChooseReference = CustomEvent<{ readonly number: number }>;

/** Makes the rows of a stack that stands in the page answer to pointer and keys. */
export function listenToStack(stack: Element): void {
  const choose = (event: Event): void => {
    // What is taken hold of is not chosen.
    if (event.target instanceof Element && event.target.closest('[data-handle]') !== null) return;
    const row = event.target instanceof Element ? event.target.closest('[data-option]') : null;
    const number = Number(row?.getAttribute('data-option'));
    if (row === null || !Number.isFinite(number)) return;
    event.preventDefault();
    stack.dispatchEvent(new CustomEvent(chooseReference, { bubbles: true, detail: { number } }));
  };
  stack.addEventListener('click', choose);
  stack.addEventListener('keydown', (event) => {
    const { key } = event as KeyboardEvent;
    if (key === 'Enter' || key === ' ') choose(event);
  });
}
