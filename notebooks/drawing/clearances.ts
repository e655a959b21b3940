import type { AppraisedOption, Obstacle, Site } from '../model.ts';
import { groundLevel, leastSoffit, lowestSoffit, PARAPET_M, roadLevel } from './alongOption.ts';
import { overOf } from './asked.ts';
import { figureLines, uprightDimension, type Figure } from './dimension.ts';
import { freeLabel, type Room } from './freeLabel.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import { IN_THE_WAY, STRUCTURE, type Box, type Placer } from './placer.ts';
import type { Piece } from './piece.ts';
import { el, g, num, pathOf } from './piece.ts';
import { length, level } from '../format.ts';

/** An envelope to be kept free. */
export interface Envelope {
  readonly fromM: number;
  readonly toM: number;
  readonly footLevelM: number;
  readonly topLevelM: number;
  readonly railway: boolean;
  readonly water: boolean;
  readonly confirmed: boolean;
  /** Path of the clearance it was read from, where it was read from the brief. */
  readonly path?: string;
}

/**
 * Envelopes of the obstacles, or, where the brief's obstacles are not given, what the site's soffit limits say: their
 * foot is then the ground or the water under them.
 */
export function envelopes(site: Site, obstacles?: readonly Obstacle[]): Envelope[] {
  if (obstacles !== undefined) {
    return obstacles.flatMap(({ kind, clearance }, index) =>
      clearance === null
        ? []
        : [
            {
              fromM: clearance.fromM,
              toM: clearance.toM,
              footLevelM: clearance.datumLevelM,
              topLevelM: clearance.datumLevelM + clearance.headroomM,
              railway: kind === 'railway',
              water: kind === 'river',
              confirmed: clearance.confirmed,
              path: `brief/obstacles/${String(index)}/clearance`,
            },
          ],
    );
  }
  return site.soffitLimits
    .filter((limit) => limit.kind !== 'flood')
    .map((limit) => {
      const middle = (limit.fromM + limit.toM) / 2;
      const water = site.waters.find(
        (one) => limit.kind === 'river' && middle >= one.fromM && middle <= one.toM,
      );
      return {
        fromM: limit.fromM,
        toM: limit.toM,
        footLevelM: water?.levelM ?? groundLevel(site, middle),
        topLevelM: limit.levelM,
        railway: limit.kind === 'railway',
        water: limit.kind === 'river',
        confirmed: true,
      };
    });
}

/** What is left between an envelope and the soffit, and the chainage at which it is least. */
interface Spare extends Figure {
  readonly atM: number;
}

/** What is left between an envelope and the soffit where it is less than a metre. */
function spareOver(
  site: Site,
  option: AppraisedOption | null,
  one: Envelope,
  accent: string,
): Spare | undefined {
  if (option === null) return undefined;
  const places = [0, 0.25, 0.5, 0.75, 1].map((part) => one.fromM + part * (one.toM - one.fromM));
  const spares = places.map((at) => lowestSoffit(site, option, at) - one.topLevelM);
  const least = Math.min(...spares);
  if (!Number.isFinite(least) || least >= 1) return undefined;
  const at = places[spares.indexOf(least)] ?? NaN;
  const isLow = least < -0.005;
  return {
    words: isLow ? `${level(-least)} too low` : `${level(least)} spare`,
    colour: isLow ? accent : colours.ink,
    atM: at,
    // Where a flood asks for more than the envelope, what is spare there is another figure.
    asked: Math.abs(leastSoffit(site, at) - one.topLevelM) < 1e-9 ? overOf(option, at, 'spareM') : undefined,
  };
}

/** An upright dimension beside an envelope stands this far from it, px. */
const LINE_AT_PX = 7;
/** From the line of an upright dimension to its figure, px. */
const LINED_PX = 7;

/** Figures beside an envelope may touch the ground or its own outline; what covers more than this is on a pier, px2. */
const ON_STRUCTURE = STRUCTURE * IN_THE_WAY;

type LineAnchor = 'start' | 'middle' | 'end';

/** Where the headroom of an envelope may be written, with its dimension line or without. */
interface Beside {
  readonly x: number;
  readonly anchor: LineAnchor;
  readonly isLined: boolean;
  readonly box: Box;
}

/** Sides of an envelope on the sheet, px. */
type Sides = Readonly<Record<'left' | 'right' | 'top' | 'foot', number>>;

/** Headroom of an envelope, and what is spare under it, beside it or within; null where all places are worse than `limit`. */
function besideEnvelope(
  { left, right, top, foot }: Sides,
  headroom: Figure,
  spare: Figure | undefined,
  room: Placer,
  limit: number,
): Piece | Piece[] | null {
  const widest = Math.max(
    textWidth(headroom.words, letters.drawing),
    textWidth(spare?.words ?? '', letters.drawing),
  );
  const middle = (top + foot) / 2;
  const [high, low] = spare === undefined ? [middle - 6, middle + 6] : [middle - 10, middle + 10];
  const width = right - left;
  const beside = (x: number, anchor: LineAnchor, isLined: boolean): Beside => {
    const reach = widest + (isLined ? LINED_PX : 0);
    const from = anchor === 'middle' ? x - reach / 2 : anchor === 'end' ? x - reach : x;
    return { x, anchor, isLined, box: { left: from, right: from + reach, top: high, bottom: low } };
  };
  const [outer, lined, bare] = [LINE_AT_PX, true, false];
  const places = [
    beside(right + outer, 'start', lined),
    beside(left - outer, 'end', lined),
    // Within it where it is wide enough, off what crosses below its middle.
    ...(width > 1.3 * (widest + LINED_PX + outer)
      ? [beside(right - outer, 'end', lined), beside(left + outer, 'start', lined)]
      : []),
    // Without its line where it has no room beside one.
    ...(width > widest + 8 && foot - top > low - high + 3
      ? [beside((left + right) / 2, 'middle', bare)]
      : []),
    beside(right + 4, 'start', bare),
    beside(left - 4, 'end', bare),
  ];
  const place =
    places[
      room.choose(
        places.map(({ box }) => box),
        limit,
      )
    ];
  if (place === undefined) return null;
  const { x, anchor, isLined } = place;
  return isLined
    ? uprightDimension(x, top, foot, headroom.words, {
        ...headroom,
        side: anchor === 'end' ? 'left' : 'right',
        under: spare,
      })
    : figureLines(x, middle, [headroom, spare], { anchor, halo: true });
}

/** From the parapet up to lettering over it, and the foot of such lettering to the line that leads down from it, px. */
const OVER_PX = 4;
const LEAD_PX = 2;

/** What is spare over an envelope, written over the deck with a line down to where it is least; null where there is no room. */
function spareOnDeck(
  option: AppraisedOption,
  one: Envelope,
  { words, colour, asked, atM }: Spare,
  room: Room,
): Piece | null {
  const { frame } = room;
  const x = frame.x(atM);
  const y = frame.y(roadLevel(option, atM) + PARAPET_M) - OVER_PX;
  const half = textWidth(words, letters.drawing) / 2;
  const places = [0, 0.5, -0.5].map((aside) => [x + aside * half, y] as const);
  const put = freeLabel(room, places, words, { anchor: 'middle', fill: colour, figure: asked }, IN_THE_WAY);
  return (
    put &&
    g(
      {},
      el('path', {
        d: `M${num(x)},${num(y + LEAD_PX)}V${num(frame.y(one.topLevelM))}`,
        stroke: colour,
        'stroke-width': pens.fine,
      }),
      put,
    )
  );
}

/**
 * One envelope: its outline, and its headroom with what is spare, within it or at the side. Where there is no room for
 * both, what is spare stands over the deck, or is left to the data band.
 */
function envelopePiece(
  site: Site,
  option: AppraisedOption | null,
  one: Envelope,
  room: Room,
  isBare: boolean,
): Piece {
  const { frame, placer, accent } = room;
  const left = frame.x(one.fromM);
  const right = frame.x(one.toM);
  const top = frame.y(one.topLevelM);
  const foot = frame.y(one.footLevelM);
  const cut = one.railway ? Math.min(5, (right - left) / 4, (foot - top) / 3) : 0;
  const outline = el('path', {
    'data-part': 'envelope',
    d: pathOf([
      [left, foot],
      [left, top + cut],
      [left + cut, top],
      [right - cut, top],
      [right, top + cut],
      [right, foot],
    ]),
    fill: 'none',
    stroke: accent,
    'stroke-width': pens.medium,
  });
  if (isBare) return outline;
  const headroom = (one.topLevelM - one.footLevelM).toFixed(2);
  const inside = `${length(one.toM - one.fromM)} × ${headroom}`;
  placer.takeLine(
    [
      [left, foot],
      [left, top],
      [right, top],
      [right, foot],
    ],
    2,
    2,
  );
  if (one.water && right - left > textWidth(inside, letters.drawing) + 8 && foot - top > 14) {
    placer.take({ left, right, top, bottom: foot }, 2);
    return g(
      {},
      outline,
      label((left + right) / 2, (top + foot) / 2 + 4, inside, {
        anchor: 'middle',
        fill: accent,
        figure:
          one.path === undefined
            ? undefined
            : ['fromM', 'toM', 'headroomM'].map((end) => `${one.path!}/${end}`),
      }),
    );
  }
  const sides = { left, right, top, foot };
  const figure: Figure = {
    words: headroom,
    colour: accent,
    asked: one.path === undefined ? undefined : `${one.path}/headroomM`,
  };
  const spare = spareOver(site, option, one, accent);
  return g(
    {},
    outline,
    besideEnvelope(sides, figure, spare, placer, ON_STRUCTURE) ?? [
      besideEnvelope(sides, figure, undefined, placer, Infinity),
      option !== null && spare !== undefined && spareOnDeck(option, one, spare, room),
    ],
  );
}

/** Outline of each envelope in the accent with its headroom, unless it is to be bare; over a railway the upper corners are cut. */
export function clearances(
  site: Site,
  option: AppraisedOption | null,
  list: readonly Envelope[],
  room: Room,
  isBare = false,
): Piece {
  return g(
    { class: 'clearances' },
    list.map((one) => envelopePiece(site, option, one, room, isBare)),
  );
}
