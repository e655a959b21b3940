import type { AppraisedOption, Obstacle, Site } from '../model.ts';
import { groundLevel, leastSoffit, lowestSoffit, PARAPET_M, roadLevel } from './alongOption.ts';
import { overOf } from './asked.ts';
import { dimensionChain, figureLines, uprightDimension, type Figure } from './dimension.ts';
import type { Frame } from './frame.ts';
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

/** Where no pier may stand: an upright at each end, and between them a dimension with the words. */
export function barredDimension(site: Site, frame: Frame, y: number, accent: string): Piece | null {
  const opening = site.mainOpening;
  if (opening === null) return null;
  const left = frame.x(opening.fromM);
  const right = frame.x(opening.toM);
  const foot = (m: number): number => frame.y(groundLevel(site, m));
  return g(
    { class: 'barred' },
    el('path', {
      d: `M${num(left)},${num(y - 6)}V${num(foot(opening.fromM))}M${num(right)},${num(y - 6)}V${num(foot(opening.toM))}`,
      fill: 'none',
      stroke: accent,
      'stroke-width': pens.fine,
      'stroke-dasharray': '4.6 2.8',
    }),
    dimensionChain([left, right], y, [`${opening.widthM.toFixed(1)} no pier`], {
      asked: ['site/mainOpening/widthM'],
      colour: accent,
      halo: true,
      inLine: true,
    }),
  );
}

/** A stretch barred to supports, m, and what is said of it. */
interface Barred {
  readonly fromM: number;
  readonly toM: number;
  readonly words: string;
}

/** Neighbouring hard zones run together, with one name. */
function barredStretches(site: Site): Barred[] {
  const hard = site.zones.filter((zone) => zone.hard).sort((a, b) => a.fromM - b.fromM);
  const out: { fromM: number; toM: number; words: string }[] = [];
  for (const zone of hard) {
    const last = out[out.length - 1];
    if (last !== undefined && zone.fromM <= last.toM + 0.05) last.toM = Math.max(last.toM, zone.toM);
    else out.push({ fromM: zone.fromM, toM: zone.toM, words: zone.kind === 'river' ? 'no pier' : zone.kind });
  }
  return out.map((stretch) =>
    stretch.words === 'no pier'
      ? { ...stretch, words: `no pier, ${length(stretch.toM - stretch.fromM)} m` }
      : stretch,
  );
}

/** Grey wash of the barred stretches over the whole height of a drawing. */
export const barredWash = (site: Site, frame: Frame, top: number, bottom: number): Piece =>
  g(
    { class: 'wash' },
    barredStretches(site).map(({ fromM, toM }) =>
      el('rect', {
        x: frame.x(fromM),
        y: top,
        width: (toM - fromM) * frame.pxPerM,
        height: bottom - top,
        fill: colours.wash,
      }),
    ),
  );

/** Barred stretches with the line their words stand in, counted up from the bracket: those that would touch stand in different ones. */
function bracketLines(site: Site, pxPerM: number): (Barred & { readonly line: number })[] {
  /** How far the words of each line reach, px from chainage nought. */
  const reach: number[] = [];
  return barredStretches(site).map((stretch) => {
    const middle = ((stretch.fromM + stretch.toM) / 2) * pxPerM;
    const half = textWidth(stretch.words, letters.drawing) / 2;
    const free = reach.findIndex((right) => middle - half >= right + 6);
    const line = free < 0 ? reach.length : free;
    reach[line] = middle + half;
    return { ...stretch, line };
  });
}

/** From a bracket up to its words, and from one line of words to the next, px. */
const WORDS_PX = 5;
const LINE_PX = 12;

/** Height that brackets take over their level line, to the top of their words with some air, px; 0 where nothing is barred. */
export function bracketsPx(site: Site, pxPerM: number): number {
  const lines = bracketLines(site, pxPerM).map(({ line }) => line + 1);
  return lines.length === 0 ? 0 : WORDS_PX + LINE_PX * Math.max(...lines) + 2;
}

/** The words over each bracket of a level line at y: where their middle stands, and whether they are those of the main opening. */
export const bracketWords = (
  site: Site,
  frame: Frame,
  y: number,
): (Barred & { readonly x: number; readonly y: number; readonly isMain: boolean })[] =>
  bracketLines(site, frame.pxPerM).map((stretch) => ({
    ...stretch,
    x: frame.x((stretch.fromM + stretch.toM) / 2),
    y: y - WORDS_PX - stretch.line * LINE_PX,
    isMain: site.mainOpening?.fromM === stretch.fromM && site.mainOpening.toM === stretch.toM,
  }));

/** Accent bracket with its words on top of each barred stretch. */
export const barredBrackets = (site: Site, frame: Frame, y: number, accent: string): Piece =>
  g(
    { class: 'brackets' },
    bracketWords(site, frame, y).map((stretch) =>
      g(
        {},
        el('path', {
          d: `M${num(frame.x(stretch.fromM))},${num(y + 6)}V${num(y)}H${num(frame.x(stretch.toM))}V${num(y + 6)}`,
          fill: 'none',
          stroke: accent,
          'stroke-width': pens.medium,
        }),
        label(stretch.x, stretch.y, stretch.words, {
          anchor: 'middle',
          fill: accent,
          figure:
            stretch.isMain && stretch.words.startsWith('no pier') ? 'site/mainOpening/widthM' : undefined,
        }),
      ),
    ),
  );
