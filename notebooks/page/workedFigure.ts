import { dataFigure, type Asked } from '../drawing/asked.ts';
import { h } from '../html.ts';

/** A figure in running text that has been worked out: it can be asked where it comes from. */
export const workedFigure = (figure: Asked, words: string): HTMLElement =>
  h(
    'span',
    {
      class: 'worked',
      role: 'button',
      tabindex: 0,
      'aria-label': `${words}, where from?`,
      'data-figure': dataFigure(figure),
    },
    words,
  );
