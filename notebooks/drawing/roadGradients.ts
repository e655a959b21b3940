import { fixed, minus, radiusText } from '../format.ts';
import type { AppraisedOption } from '../model.ts';
import { ofOption } from './asked.ts';
import type { Frame } from './frame.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num, pathOf } from './piece.ts';
import type { RoadStretch } from './roadNeeds.ts';

/** Height of the row of gradients, px. */
export const ROW_PX = 30;

/** A gradient in per cent with its sign. */
const percent = (gradient: number): string =>
  Math.abs(gradient) < 0.00005
    ? 'level'
    : `${gradient < 0 ? minus : '+'}${fixed(Math.abs(gradient) * 100, 1)} %`;

/** Under the levels: where the road runs straight and where it bends, with gradients and radii, between uprights. */
export function gradientRow(
  option: AppraisedOption,
  stretches: readonly RoadStretch[],
  frame: Frame,
  top: number,
): Piece {
  const { crestRadiusM } = option.profile;
  const middle = top + ROW_PX / 2;
  return g(
    { class: 'gradients' },
    stretches.map((stretch) => {
      const [x0, x1] = [frame.x(stretch.fromM), frame.x(stretch.toM)];
      const rise = (gradient: number): number => Math.max(-8, Math.min(8, gradient * 200));
      const [a, b] = [rise(stretch.fromGradient), rise(stretch.toGradient)];
      const { radiusM } = stretch;
      const isCurve = radiusM !== null;
      const words = isCurve
        ? `${radiusM < 0 ? 'crest' : 'sag'} R ${radiusText(radiusM)}, ${percent(stretch.fromGradient)} to ${percent(stretch.toGradient)}`
        : percent(stretch.fromGradient);
      const lengthWords = `${words}, ${fixed(stretch.toM - stretch.fromM, 0)} m`;
      const room = x1 - x0 - 6;
      const said =
        textWidth(lengthWords, letters.drawing) <= room
          ? lengthWords
          : textWidth(words, letters.drawing) <= room
            ? words
            : '';
      const isCrest = isCurve && crestRadiusM !== null && Math.abs(Math.abs(radiusM) - crestRadiusM) < 1;
      return g(
        {},
        el('path', {
          'data-part': isCurve ? 'curve' : 'straight',
          d: isCurve
            ? pathOf(
                [0, 0.125, 0.25, 0.375, 0.5, 0.625, 0.75, 0.875, 1].map((t) => [
                  x0 + t * (x1 - x0),
                  middle - (radiusM < 0 ? 1 : -1) * (4 * t * (1 - t) - 0.5) * Math.min(9, (x1 - x0) / 5),
                ]),
              )
            : `M${num(x0)},${num(middle + (a + b) / 4)}L${num(x1)},${num(middle - (a + b) / 4)}`,
          fill: 'none',
          stroke: colours.ink,
          'stroke-width': pens.thin,
        }),
        said !== '' &&
          label((x0 + x1) / 2, middle + 12, said, {
            anchor: 'middle',
            halo: true,
            figure: isCrest
              ? ofOption(option, 'profile/crestRadiusM')
              : isCurve
                ? undefined
                : ofOption(option, `profile/pieces/${String(stretch.piece)}/gradient`),
          }),
      );
    }),
    label(frame.left + 2, top + ROW_PX - 4, 'gradient', { fill: colours.second, halo: true }),
  );
}
