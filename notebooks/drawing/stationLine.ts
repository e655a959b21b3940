import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { wrapText } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import { sheet } from './sheet.ts';

/** What a station's mark says: done, being worked out, failed, or held at older figures below a failure. */
export type StationState = 'done' | 'pending' | 'failed' | 'held';

export interface StationMark {
  /** E.g. '3+020', or the number of a section for its post. */
  readonly name: string;
  /** Pixels down the sheet. */
  readonly y: number;
  readonly post?: boolean;
  readonly state?: StationState;
}

export interface StationLineInput {
  readonly heightPx: number;
  /** From top to bottom. */
  readonly marks: readonly StationMark[];
  /** Station pointed at, with the stations it uses and those that use it. */
  readonly joined?: {
    readonly at: string;
    readonly uses: readonly string[];
    readonly usedBy: readonly string[];
  };
  /** Part of the sheet on the screen, px; spans that leave it end in words. */
  readonly view?: { readonly top: number; readonly bottom: number };
  /** Where the line stands in its band, px; 112 on the full sheet, 13 on a hand-held screen. */
  readonly lineX?: number;
  readonly bandPx?: number;
}

/** How far a span between two stations stands off the line, px. */
const bulge = (lengthPx: number, most = 84): number => Math.min(most, 18 + 0.055 * lengthPx);

/** A span left of the line: full from what is used, on a bearing; dashed to what uses it, on a roller. */
function span(lineX: number, from: number, to: number, used: boolean): Piece {
  const out = Math.min(bulge(Math.abs(to - from)) * 1.33, Math.max(8, lineX - 4) * 1.33);
  return g(
    {},
    el('path', {
      d: `M${num(lineX)},${num(from)}C${num(lineX - out)},${num(from + (to - from) * 0.2)} ${num(lineX - out)},${num(from + (to - from) * 0.8)} ${num(lineX)},${num(to)}`,
      fill: 'none',
      stroke: colours.ink,
      'stroke-width': pens.thin,
      'stroke-dasharray': used ? undefined : '4 3',
    }),
    used
      ? el('path', { d: `M${num(lineX)},${num(to)}l6.4,-3.4v6.8Z`, fill: colours.ink })
      : el('circle', {
          cx: lineX,
          cy: to,
          r: 2.6,
          fill: colours.sheet,
          stroke: colours.ink,
          'stroke-width': pens.thin,
        }),
  );
}

/** Height of the break line under a failed station with the line that leads to it, px. */
const breakPx = 34;

/** The line from one mark to the next: full, dashed while being worked out, dotted where figures are held; broken under a failure. */
function stretch(lineX: number, from: number, to: number, state: StationState, afterFailure: boolean): Piece {
  const dash = state === 'pending' ? '5 4' : state === 'held' ? '1.4 3.2' : undefined;
  const start = afterFailure ? Math.min(from + breakPx, to) : from;
  const line = { fill: 'none', stroke: colours.ink, 'stroke-width': pens.medium } as const;
  return g(
    {},
    afterFailure &&
      el('path', {
        d: `M${num(lineX)},${num(from)}V${num(start - 22)}l-6,4l12,6l-6,4V${num(start)}`,
        ...line,
      }),
    start < to &&
      el('path', { d: `M${num(lineX)},${num(start)}V${num(to)}`, 'stroke-dasharray': dash, ...line }),
  );
}

/** Stations whose spans leave the screen over one edge of it. */
interface Leavers {
  readonly names: readonly string[];
  readonly used: boolean;
}

/** Words beside the line end this far from it, px. */
const WORDS_OFF_PX = 8;

/**
 * Spans that leave the screen over one edge, those to what is used and those to what uses it each drawn as one, with
 * words at the edge that say where they go.
 */
function leavers(kinds: readonly Leavers[], lineX: number, from: number, edgeY: number): Piece[] {
  const down = edgeY > from;
  let wordsY = down ? edgeY - 8 : edgeY + 14;
  return kinds.flatMap(({ names, used }) => {
    const [first] = names;
    if (first === undefined) return [];
    const more = names.length > 1 ? `, ${String(names.length - 1)}\u00a0more` : '';
    // A narrow band takes the words on several lines.
    const lines = wrapText(`${used ? 'from' : 'to'} ${first}${more}`, lineX - WORDS_OFF_PX, letters.drawing);
    const top = down ? wordsY - 13 * (lines.length - 1) : wordsY;
    wordsY = down ? top - 13 : top + 13 * lines.length;
    const endY = down ? top - 12 : top + 13 * (lines.length - 1) + 4;
    const out = Math.min(bulge(Math.abs(edgeY - from)), Math.max(8, lineX - 4));
    return [
      el('path', {
        d: `M${num(lineX)},${num(from)}C${num(lineX - out)},${num(from + (endY - from) * 0.2)} ${num(lineX - out)},${num(from + (endY - from) * 0.6)} ${num(lineX - out)},${num(endY)}`,
        fill: 'none',
        stroke: colours.ink,
        'stroke-width': pens.thin,
        'stroke-dasharray': used ? undefined : '4 3',
      }),
      ...lines.map((line, i) =>
        label(lineX - WORDS_OFF_PX, top + i * 13, line, { anchor: 'end', halo: true }),
      ),
    ];
  });
}

/** The station line in its band, to be laid over the left of the sheet. */
export function stationLine(input: StationLineInput): Piece {
  const lineX = input.lineX ?? 112;
  const { marks, joined, view } = input;
  const yOf = new Map(marks.map((mark) => [mark.name, mark.y]));
  const at = joined === undefined ? undefined : yOf.get(joined.at);
  const { top, bottom } = view ?? { top: -Infinity, bottom: Infinity };
  const place = (names: readonly string[] = []) => {
    const known = names.flatMap((name) => {
      const y = yOf.get(name);
      return y === undefined ? [] : [{ name, y }];
    });
    return {
      seen: known.filter(({ y }) => y >= top && y <= bottom),
      above: known.filter(({ y }) => y < top).map(({ name }) => name),
      below: known.filter(({ y }) => y > bottom).map(({ name }) => name),
    };
  };
  const uses = place(joined?.uses);
  const usedBy = place(joined?.usedBy);
  const over = (side: 'above' | 'below'): Leavers[] => [
    { names: uses[side], used: true },
    { names: usedBy[side], used: false },
  ];
  let from = 0;
  let state = 'done' as StationState;
  const stretches: Piece[] = [];
  for (const mark of marks) {
    // A post has no figures of its own: the line goes on to it as it left the station before.
    const next: StationState = mark.state ?? (mark.post === true && state === 'held' ? state : 'done');
    stretches.push(stretch(lineX, from, mark.y, next === 'failed' ? 'done' : next, state === 'failed'));
    from = mark.y;
    state = next;
  }
  stretches.push(
    stretch(
      lineX,
      from,
      input.heightPx,
      state === 'pending' ? 'pending' : state === 'done' ? 'done' : 'held',
      state === 'failed',
    ),
  );
  return sheet(
    input.bandPx ?? 168,
    input.heightPx,
    'Station line of this page',
    [
      stretches,
      marks.map((mark) =>
        mark.post === true
          ? el('path', {
              d: `M${num(lineX - 12.5)},${num(mark.y)}h25`,
              stroke: colours.ink,
              'stroke-width': pens.heavy,
            })
          : mark.state === 'pending'
            ? el('path', {
                d: `M${num(lineX)},${num(mark.y - 4)}l3.4,4l-3.4,4l-3.4,-4Z`,
                fill: colours.sheet,
                stroke: colours.ink,
                'stroke-width': pens.thin,
              })
            : el('path', {
                d: `M${num(lineX - 4.5)},${num(mark.y)}h9`,
                stroke: colours.ink,
                'stroke-width': pens.thin,
              }),
      ),
      at !== undefined && [
        uses.seen.map(({ y }) => span(lineX, at, y, true)),
        usedBy.seen.map(({ y }) => span(lineX, at, y, false)),
        el('circle', { cx: lineX, cy: at, r: 5, fill: colours.ink }),
        leavers(over('above'), lineX, at, top),
        leavers(over('below'), lineX, at, bottom),
      ],
    ],
    'img',
    'stations',
  );
}
