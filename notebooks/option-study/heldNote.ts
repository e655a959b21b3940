import { h, type HtmlChild } from '../html.ts';

/** Brings the first entry that is refused on the screen, and puts the caret there. */
function goToFault(event: Event): void {
  const fault = document.querySelector<HTMLElement>('[aria-invalid=true]');
  if (fault === null) return;
  event.preventDefault();
  fault.focus();
  fault.scrollIntoView({ block: 'center' });
}

/** That the answers are not those of the brief as it is typed, with a way to what is refused; nothing while all is well. */
export function heldNote(problems: number): HtmlChild {
  if (problems === 0) return null;
  const which = problems === 1 ? 'an entry is refused' : `${problems} entries are refused`;
  return [
    h('b', {}, 'Held.'),
    ' Every answer below is for the study as it was before ',
    h('a', { href: '#s1', onclick: goToFault }, which),
    '. ',
  ];
}
