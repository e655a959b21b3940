/** What changes a study when it is typed in, pressed or dragged. */
const CHANGES = '.fig, select, textarea, [contenteditable], [data-handle], .action.list, [data-option]';

/** Keys that only move about. */
const MOVES = new Set(['Tab', 'Shift', 'Escape']);

/**
 * Lets a page be read and not changed: fields, handles and actions of the study do not answer, everything else does.
 * @returns the way to switch it on and off
 */
export function readOnly(sheet: HTMLElement): (isReadOnly: boolean) => void {
  let isOn = false;
  const refuse = (event: Event): void => {
    if (!isOn || !(event.target instanceof Element) || event.target.closest(CHANGES) === null) return;
    if (event instanceof KeyboardEvent && (MOVES.has(event.key) || event.ctrlKey || event.metaKey)) return;
    // A figure may be asked where it comes from all the same.
    if (event.target.closest('[data-figure]') !== null) return;
    event.preventDefault();
    event.stopPropagation();
  };
  for (const type of ['pointerdown', 'mousedown', 'click', 'keydown', 'beforeinput', 'paste', 'change'])
    sheet.addEventListener(type, refuse, { capture: true });
  return (next) => {
    isOn = next;
    sheet.classList.toggle('read-only', next);
  };
}
