import type { BarSpec } from './sheet.ts';

/** The pages of the notebook, in the order in which the bar names them. */
const pages = [
  { name: 'shelf', words: 'Shelf', href: './index.html' },
  { name: 'option-study', words: 'Option study', href: './option-study.html' },
  { name: 'span-chart', words: 'Span chart', href: './span-chart.html' },
] as const;

export type PageName = (typeof pages)[number]['name'];

/** Names of the pages for the bar, the same everywhere, with the page one is on marked. */
export const pagesFrom = (here: PageName): BarSpec['pages'] =>
  pages.map(({ name, words, href }) => ({ words, href, here: name === here }));
