/**
 * Lets the hand leave a field of words that Enter finds empty. What was emptied goes, and what came to stand in its place
 * in the list must not take what is typed next.
 */
export function leaveEmptied(part: HTMLElement): void {
  const leave = (event: KeyboardEvent): void => {
    if (event.key !== 'Enter' || !(event.target instanceof HTMLElement)) return;
    if (event.target.matches('.words') && event.target.textContent.trim() === '') event.target.blur();
  };
  part.addEventListener('keydown', leave, { capture: true });
}
