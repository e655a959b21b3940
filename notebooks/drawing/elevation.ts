import { level, spansPhrase } from '../format.ts';
import type { FormInk } from '../forms/formInk.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import type { AppraisedOption, Site } from '../model.ts';
import { spansOf, structureTop } from './alongOption.ts';
import { elevationText } from './elevationText.ts';
import { datumBelow, datumLine } from './datumLine.ts';
import type { Frame } from './frame.ts';
import { frameOf } from './frame.ts';
import type { Paper } from './ink.ts';
import { pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { el, g } from './piece.ts';
import type { Scale } from './scale.ts';
import { largestScale, pxPerMetre } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
import { sheet } from './sheet.ts';
import { likeliest, substructure, toeLevel } from './substructure.ts';
import { superstructure } from './superstructure.ts';
import { crossedWays, flood, ground, waters } from './terrain.ts';

/** Levels between which an option is drawn. */
export interface LevelRange {
  readonly topM: number;
  readonly bottomM: number;
  /** Piles reach deeper than is drawn and are cut there. */
  readonly cutBelowM: number;
}

/**
 * Levels an elevation takes: from the highest member down to the pile toes, but no further than 15 m under the lowest
 * footing or bed; deeper piles are cut with a break line.
 */
export function levelRange(site: Site, option: AppraisedOption | null, foundations = true): LevelRange {
  const bed = Math.min(...site.groundZ);
  if (option === null)
    return {
      topM: Math.max(site.road.startLevelM, site.road.endLevelM) + 2,
      bottomM: bed - 4,
      cutBelowM: -Infinity,
    };
  const topM = structureTop(site, option);
  if (!foundations) return { topM, bottomM: bed - 2.5, cutBelowM: bed };
  const found = option.supports.flatMap((support) => likeliest(support) ?? []);
  const footings = found.map(({ footing }) => footing.topLevelM - footing.depthM);
  const cutBelowM = Math.min(bed, ...footings) - 15;
  const bottomM =
    Math.min(bed - 2, ...footings, ...found.map((one) => Math.max(toeLevel(one), cutBelowM))) - 1.2;
  return { topM, bottomM, cutBelowM };
}

export interface ElevationStyle {
  /** Solid decks, no foundations: for 1:2000 and smaller. */
  readonly plain?: boolean;
  readonly floodLine?: boolean;
  readonly postsM?: number;
}

/** Ground, water, supports and structure of one option in a frame that is already laid out: the body of every elevation. */
export function elevationBody(
  site: Site,
  option: AppraisedOption | null,
  frame: Frame,
  ink: FormInk,
  range: LevelRange,
  style: ElevationStyle = {},
): Piece {
  const plain = style.plain === true;
  return g(
    { class: 'elevation', 'data-scale': frame.scale, 'data-from-m': frame.fromM },
    waters(site, frame),
    style.floodLine === true && flood(site, frame),
    ground(site, frame, plain ? { pen: pens.medium, hatch: false } : {}),
    crossedWays(site, frame),
    option !== null && substructure(site, option, frame, { cutBelowM: range.cutBelowM, foundations: !plain }),
    option !== null && superstructure(site, option, frame, ink, { plain, postsM: style.postsM ?? 0 }),
  );
}

/** Side margin left of A and right of B, as a share of what is free, and never less than this, px. */
const sideMargin = 30;

/** Chainages shown on a sheet of a given width: the crossing in the middle. */
export function chainagesShown(
  site: Site,
  widthPx: number,
  scale: Scale,
): { readonly fromM: number; readonly toM: number } {
  const free = (widthPx / pxPerMetre(scale) - site.lengthM) / 2;
  return { fromM: site.startM - free, toM: site.endM + free };
}

/** Scale for a whole crossing on a sheet of a given width. */
export const crossingScale = (site: Site, widthPx: number, margin = sideMargin): Scale =>
  largestScale(site.lengthM, widthPx - 2 * margin, 500);

/** Scale of the crossing and of all that is drawn on its chainage, for a sheet of a given width. */
export const scaleOnSheet = (site: Site, widthPx: number): Scale =>
  crossingScale(site, widthPx, widthPx < 700 ? 2 : widthPx < 960 ? 5 : widthPx < 1200 ? sideMargin : 7);

/** Width of a full sheet, px: body and note margin together. */
export const fullSheetPx = 1224;

/** The smallest scale a narrow sheet may drop to: at smaller ones a deck is no more than a line. */
export const leastScale = (onFullSheet: Scale): Scale => (onFullSheet > 5000 ? onFullSheet : 5000);

/**
 * Scale of a whole crossing in a room of some width, px, and the width its sheet then takes: wider than the room where
 * the scale would drop too low in it, to be pushed sideways. On paper nothing is pushed: there it drops as low as it takes.
 */
export function sheetIn(
  site: Site,
  roomPx: number,
  canPush = true,
): { readonly scale: Scale; readonly widthPx: number } {
  const scale = scaleOnSheet(site, roomPx);
  const least = leastScale(scaleOnSheet(site, fullSheetPx));
  if (!canPush || scale <= least) return { scale, widthPx: roomPx };
  return { scale: least, widthPx: wholeWidth(site, least) };
}

/** Width of a sheet that holds a whole crossing at a scale, px. */
export const wholeWidth = (site: Site, scale: Scale): number =>
  Math.ceil(site.lengthM * pxPerMetre(scale)) + 2 * sideMargin;

/** Whether a crossing is drawn at a larger scale when it takes the note margin too. */
export const wantsWidth = (site: Site): boolean => scaleOnSheet(site, fullSheetPx) < scaleOnSheet(site, 980);

export interface ElevationInput {
  readonly site: Site;
  readonly option: AppraisedOption;
  readonly widthPx: number;
  /** Taken from the series by width when left out. */
  readonly scale?: Scale;
  readonly paper?: Paper;
  /** Scale bar under the elevation; on unless said otherwise. */
  readonly bar?: boolean;
  /** Keeps this drawing's patterns apart from others on the page. */
  readonly prefix?: string;
}

/** One sentence that names an option for readers who cannot see the drawing. */
export const optionWords = (option: AppraisedOption): string =>
  `option ${String(option.number)}, ${formLooks[option.form].short.toLowerCase()}, ${spansPhrase(spansOf(option))} m, ${level(option.depthM.midspan)} m deep`;

/** Elevation of one option to true scale, without dimensions. */
export function elevation(input: ElevationInput): Piece {
  const { site, option, widthPx } = input;
  const scale = input.scale ?? crossingScale(site, widthPx, 10);
  const plain = scale >= 2000;
  const prefix = input.prefix ?? `elevation-${String(option.number)}`;
  const range = levelRange(site, option, !plain);
  const ppm = pxPerMetre(scale);
  const top = 8;
  const frame = frameOf(scale, chainagesShown(site, widthPx, scale), 0, { levelM: range.topM, y: top });
  const datum = datumBelow(frame, frame.y(range.bottomM) + 6);
  const bottom = datum.y;
  const ink = formInk(
    input.paper ?? 'colour',
    option.units.map((unit) => unit.form),
    prefix,
  );
  const withBar = input.bar !== false;
  const height = bottom + (withBar ? (widthPx < 620 ? 58 : 44) : 6);
  return sheet(
    widthPx,
    height,
    `Elevation of ${optionWords(option)}, 1 to ${String(scale)}`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      elevationBody(site, option, frame, ink, range, { plain }),
      datumLine(frame, datum, pens.fine),
      withBar &&
        scaleBar(scale, Math.max(frame.x(site.startM), 8), bottom + 24, {
          rightPx: widthPx,
          widthPx: Math.min(400, site.lengthM * ppm),
        }),
    ],
    'img',
    'drawing',
    { id: `${prefix}-words`, words: elevationText(site, option) },
  );
}
