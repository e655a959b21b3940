import type { FormId } from '../model.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';

type XY = readonly [x: number, y: number];
const bar = (x: number, y: number, width: number, height: number): string =>
  `M${num(x)},${num(y)}h${num(width)}v${num(height)}h${num(-width)}Z`;
const solid = (d: string): Piece => el('path', { d, stroke: 'none', 'fill-rule': 'evenodd' });
const line = (d: string, width: number): Piece => el('path', { d, fill: 'none', 'stroke-width': width });
const run = (...points: XY[]): string => `M${points.map(([x, y]) => `${num(x)},${num(y)}`).join('L')}`;
/** Upright strokes at the given places. */
const uprights = (
  places: readonly number[],
  from: (x: number) => number,
  to: (x: number) => number,
): string => places.map((x) => `M${num(x)},${num(from(x))}V${num(to(x))}`).join('');

/** Parabola through its apex, 16 across the middle of the field. */
const rise =
  (apex: number, foot: number, half: number) =>
  (x: number): number =>
    apex + (foot - apex) * ((x - 16) / half) ** 2;

/** Sections for slab, girder and box, elevations for the rest; solid for concrete, line for steel. */
const builders: Readonly<Record<FormId, () => readonly Piece[]>> = {
  slab: () => [solid(bar(1.5, 6, 29, 4.5))],
  'portal-frame': () => [
    solid(`M1.8,2.7H30.2V14H31.6V15.7H26V14H27.4C27.4,8.6 22.2,5.6 16,5.6S4.6,8.6 4.6,14H6V15.7H.4V14H1.8Z`),
  ],
  'precast-i': () => [
    solid(
      bar(1, 2.6, 30, 2) +
        [5, 12.33, 19.67, 27]
          .map(
            (x) => `${bar(x - 2.2, 5.2, 4.4, 1)}M${num(x - 0.6)},6.2h1.2v5.1l1.5,1.2v1.9h-4.2v-1.9l1.5,-1.2Z`,
          )
          .join(''),
    ),
  ],
  'precast-trough': () => [
    solid(bar(1, 2.6, 30, 2)),
    line(
      run([3, 5.6], [5.8, 13.6], [12.2, 13.6], [15, 5.6]) +
        run([17, 5.6], [19.8, 13.6], [26.2, 13.6], [29, 5.6]),
      1.5,
    ),
  ],
  'adjacent-box': () => [
    solid(
      [0, 1, 2, 3]
        .map((index) => bar(1 + index * 7.6, 4, 7.2, 9.2) + bar(2.5 + index * 7.6, 6.3, 4.2, 5))
        .join(''),
    ),
  ],
  'half-through': () => [
    solid(
      [4.2, 27.8]
        .map((x) => bar(x - 3.2, 1.2, 6.4, 1.5) + bar(x - 0.7, 2.7, 1.4, 10.7) + bar(x - 3.2, 13.3, 6.4, 1.5))
        .join(''),
    ),
    solid(bar(4.9, 8.6, 22.2, 2.2) + bar(4.9, 12.2, 22.2, 1.1)),
  ],
  'composite-i': () => [
    solid(
      bar(1, 2.3, 30, 2.7) +
        [9, 23]
          .map((x) => bar(x - 3, 5.7, 6, 1.2) + bar(x - 0.6, 6.9, 1.2, 6.2) + bar(x - 3.7, 13, 7.4, 1.6))
          .join(''),
    ),
  ],
  'composite-box': () => [
    solid(bar(1, 2.3, 30, 2.7)),
    line(run([7.5, 5.8], [10.8, 14], [21.2, 14], [24.5, 5.8]), 1.3),
  ],
  'concrete-box': () => [
    solid('M1,2.3H31V3.8L24.4,5.5L21.7,14.3H10.3L7.6,5.5L1,3.8ZM11,5.5L12.4,12.1H19.6L21,5.5Z'),
  ],
  'cantilever-box': () => [
    solid(
      'M0,3H32V5.4C28,5.6 25.6,7.6 24.6,11.5H24V16H22.4V11.5H21.8C21,7.6 18.8,5.6 16,5.6S11,7.6 10.2,11.5H9.6V16H8V11.5H7.4C6.4,7.6 4,5.6 0,5.4Z',
    ),
  ],
  'steel-box': () => [
    solid(bar(1, 2.4, 30, 1.2)),
    line(run([7.6, 3.4], [10.5, 14], [21.5, 14], [24.4, 3.4]), 1.2),
    line(
      uprights(
        [3.5, 11, 14.4, 17.6, 21, 28.5],
        () => 3.4,
        () => 5.3,
      ) +
        uprights(
          [6, 26],
          () => 3.4,
          () => 4.5,
        ) +
        uprights(
          [13.5, 16, 18.5],
          () => 11.8,
          () => 13.6,
        ),
      0.9,
    ),
  ],
  truss: () => [
    line(run([4.9, 2.9], [27.1, 2.9]) + run([0.8, 13.3], [31.2, 13.3]), 1.5),
    line(
      run(
        [1.2, 13.3],
        [4.9, 2.9],
        [8.6, 13.3],
        [12.3, 2.9],
        [16, 13.3],
        [19.7, 2.9],
        [23.4, 13.3],
        [27.1, 2.9],
        [30.8, 13.3],
      ),
      1.1,
    ),
  ],
  'tied-arch': () => {
    const arch = rise(1.9, 13, 14.2);
    return [
      line(run([1, 13.1], [31, 13.1]), 1.6),
      line('M1.8,13Q16,-9.2 30.2,13', 1.5),
      line(
        uprights([8, 12, 16, 20, 24], arch, () => 13),
        0.75,
      ),
    ];
  },
  'deck-arch': () => {
    const arch = rise(5, 15, 13);
    return [
      line(run([0, 2.5], [32, 2.5]), 1.5),
      line('M3,15Q16,-5 29,15', 1.5),
      line(
        uprights([4.6, 8, 12, 20, 24, 27.4], () => 2.5, arch),
        0.75,
      ),
    ];
  },
  extradosed: () => [
    solid(
      'M0,8.3H32V10C27.4,10 24.8,10.8 23.9,12.3H23.1V16H21.9V12.3H21.1C20.2,10.8 18.4,10 16,10S11.8,10.8 10.9,12.3H10.1V16H8.9V12.3H8.1C7.2,10.8 4.6,10 0,10Z',
    ),
    solid(bar(8.9, 3.5, 1.2, 5) + bar(21.9, 3.5, 1.2, 5)),
    line(
      [9.5, 22.5]
        .map(
          (x) =>
            run([x - 7.3, 8.4], [x, 4.1], [x + 6.1, 8.4]) + run([x - 4.6, 8.4], [x, 5.7], [x + 3.8, 8.4]),
        )
        .join(''),
      0.75,
    ),
  ],
  'cable-stayed': () => [
    line(run([1, 12.2], [31, 12.2]), 1.5),
    line(run([16, 0.6], [16, 16]), 1.5),
    line(
      run([2.8, 12], [16, 1.1], [29.2, 12]) +
        run([7.2, 12], [16, 2.9], [24.8, 12]) +
        run([11.6, 12], [16, 4.7], [20.4, 12]),
      0.75,
    ),
  ],
  suspension: () => {
    const cable = rise(10, 1.8, 8);
    return [
      line(run([0, 12.7], [32, 12.7]), 1.5),
      line(run([8, 1.4], [8, 16]) + run([24, 1.4], [24, 16]), 1.5),
      line('M0,10.4L8,1.8Q16,18.2 24,1.8L32,10.4', 1.05),
      line(
        uprights([10.7, 13.3, 18.7, 21.3], cable, () => 12.7),
        0.75,
      ),
    ];
  },
};

/**
 * The sign of a form on a field of 32 by 16, placed with its top left corner at x, y px and drawn in one colour.
 * @param scale 1 in tables and charts, 1.6 in print
 */
export function glyph(form: FormId, x: number, y: number, colour: string, scale = 1): Piece {
  const place = `translate(${num(x)} ${num(y)})${scale === 1 ? '' : ` scale(${num(scale)})`}`;
  return g({ transform: place, fill: colour, stroke: colour, 'stroke-linejoin': 'miter' }, builders[form]());
}
