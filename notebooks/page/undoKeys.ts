/** What the keys for undo and redo take back and bring again. */
export interface Undoable {
  readonly undo: () => void;
  readonly redo: () => void;
}

/**
 * Ctrl or Cmd with Z takes back the last step, with Shift (or Ctrl with Y) it brings it again. Text that is being typed
 * is left to the browser. Returns the way to stop.
 */
export function undoKeys({ undo, redo }: Undoable, target: Document = document): () => void {
  const listen = (event: KeyboardEvent): void => {
    if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
    const typing = event.target instanceof Element && event.target.closest('.typing, input, textarea');
    if (typing !== false && typing !== null) return;
    const key = event.key.toLowerCase();
    if (key === 'z') (event.shiftKey ? redo : undo)();
    else if (key === 'y') redo();
    else return;
    event.preventDefault();
  };
  target.addEventListener('keydown', listen);
  return () => target.removeEventListener('keydown', listen);
}
