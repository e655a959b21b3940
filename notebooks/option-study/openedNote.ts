import { h, type HtmlChild } from '../html.ts';

/**
 * That a file has become a study of its own, and where the one before it lies.
 * @param earlier the study that was on the page; null where it had never been changed, so that nothing of it is kept
 */
export const openedNote = (earlier: { readonly id: string; readonly title: string } | null): HtmlChild => [
  'Opened as a study of its own, with an Undo of its own. ',
  earlier !== null && [
    h('a', { href: `./option-study.html?study=${encodeURIComponent(earlier.id)}` }, earlier.title),
    ' is kept on the shelf as it was left. ',
  ],
];
