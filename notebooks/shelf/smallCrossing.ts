import { elevationBody, levelRange } from '../drawing/elevation.ts';
import { frameOf } from '../drawing/frame.ts';
import { colours, pens } from '../drawing/ink.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, num } from '../drawing/piece.ts';
import type { Scale } from '../drawing/scale.ts';
import { pxPerMetre } from '../drawing/scale.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { fixed } from '../format.ts';
import type { Site } from '../model.ts';

/** Ground shown beyond either abutment, px. */
const BEYOND_PX = 14;

/**
 * A crossing as it is told from others on a shelf: ground, water, what is crossed, and the road dashed from abutment to
 * abutment, to true scale and without lettering. A crossing wider than the room is drawn at 1:5000 and runs off it.
 *
 * @param prefix keeps the patterns of this drawing apart from those of others on the page
 */
export function smallCrossing(site: Site, scale: Scale, prefix: string): Piece {
  const ppm = pxPerMetre(scale);
  const shown = { fromM: site.startM - BEYOND_PX / ppm, toM: site.endM + BEYOND_PX / ppm };
  const range = levelRange(site, null, false);
  const frame = frameOf(scale, shown, 0, { levelM: range.topM, y: 4 });
  const { startLevelM, endLevelM } = site.road;
  return sheet(
    frame.right,
    frame.y(range.bottomM) + 3,
    `The crossing, ${fixed(site.lengthM, 0)} m long, 1 to ${String(scale)}`,
    [
      elevationBody(site, null, frame, formInk('colour', [], prefix), range, { plain: scale > 2500 }),
      el('path', {
        class: 'road',
        d: `M${num(frame.x(site.startM))},${num(frame.y(startLevelM))}L${num(frame.x(site.endM))},${num(frame.y(endLevelM))}`,
        stroke: colours.ink,
        'stroke-width': pens.thin,
        'stroke-dasharray': '6 3.4',
        fill: 'none',
      }),
      [site.startM, site.endM].map((at, end) =>
        el('path', {
          d: `M${num(frame.x(at))},${num(frame.y(end === 0 ? startLevelM : endLevelM) - 3.5)}v7`,
          stroke: colours.ink,
          'stroke-width': pens.thin,
        }),
      ),
    ],
  );
}
