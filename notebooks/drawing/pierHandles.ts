import { fixed } from '../format.ts';
import type { AppraisedOption } from '../model.ts';
import { supportName } from './alongOption.ts';
import type { Frame } from './frame.ts';
import { colours, pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/**
 * Handles of the piers: open squares of 6.2 px halfway up the shaft with a tick either side at 7.6, the way they move.
 * Each is a slider for keys and readers; `data-support` is the index of its support, `data-from-m` and `data-scale` of the
 * elevation turn pixels into chainage. Abutments do not move.
 */
export function pierHandles(option: AppraisedOption, frame: Frame): Piece {
  const last = option.supports.length - 1;
  return g(
    { class: 'handles' },
    option.supports.map((support, index) => {
      if (index === 0 || index === last || support.chainageM < frame.fromM || support.chainageM > frame.toM)
        return null;
      const x = frame.x(support.chainageM);
      const y = frame.y((support.topLevelM + support.groundLevelM) / 2);
      const name = supportName(index, option.supports.length);
      return g(
        {
          class: 'handle',
          'data-support': index,
          role: 'slider',
          tabindex: 0,
          'aria-label': `${name}, chainage`,
          'aria-valuenow': support.chainageM,
          'aria-valuemin': option.supports[index - 1]?.chainageM,
          'aria-valuemax': option.supports[index + 1]?.chainageM,
          'aria-valuetext': `${fixed(support.chainageM, 1)} m`,
        },
        el('rect', {
          class: 'grip',
          x: x - 22,
          y: y - 22,
          width: 44,
          height: 44,
          fill: colours.sheet,
          'fill-opacity': 0,
        }),
        el('rect', {
          x: x - 3.1,
          y: y - 3.1,
          width: 6.2,
          height: 6.2,
          fill: colours.sheet,
          stroke: colours.ink,
          'stroke-width': pens.medium,
        }),
        el('path', {
          d: `M${num(x - 7.6)},${num(y - 3)}v6M${num(x + 7.6)},${num(y - 3)}v6`,
          stroke: colours.ink,
          'stroke-width': pens.medium,
        }),
      );
    }),
  );
}
