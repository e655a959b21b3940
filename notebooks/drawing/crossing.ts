import { fixed, length, radiusText, signed } from '../format.ts';
import { formInk } from '../forms/formInk.ts';
import type { AppraisedOption, Obstacle, Site } from '../model.ts';
import { siteOf } from '../model.ts';
import { PARAPET_M, roadLevel, soffitLevel, spanPaths, supportChainages } from './alongOption.ts';
import { bubbleRadius, bubbles } from './bubbles.ts';
import type { Asked } from './asked.ts';
import { ofOption } from './asked.ts';
import { barredBrackets, barredDimension, barredWash, bracketsPx, keyedNames } from './barred.ts';
import type { Envelope } from './clearances.ts';
import { clearances, envelopes } from './clearances.ts';
import { belowGround, depthMarks, levelMarks, names, takeRoom } from './crossingLetters.ts';
import { dataBand } from './dataBand.ts';
import { datumBelow, datumBox, datumLine } from './datumLine.ts';
import { dimensionChain } from './dimension.ts';
import { chainagesShown, elevationBody, levelRange, optionWords, scaleOnSheet } from './elevation.ts';
import { elevationText } from './elevationText.ts';
import type { Frame } from './frame.ts';
import { frameOf } from './frame.ts';
import type { Room } from './freeLabel.ts';
import type { Paper } from './ink.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import { briefHandles } from './briefHandles.ts';
import { handles } from './handles.ts';
import {
  barredPiers,
  freeBar,
  optionHandles,
  pierBays,
  spanChanges,
  supportFeet,
  withChange,
  type InHand,
} from './supportHandles.ts';
import { placer } from './placer.ts';
import type { Piece } from './piece.ts';
import { el, g } from './piece.ts';
import type { Scale } from './scale.ts';
import { pxPerMetre } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
import { sheet } from './sheet.ts';
import { strata } from './strata.ts';

export interface CrossingInput {
  readonly site: Site;
  /** Drawn with this option, or the bare crossing. */
  readonly option: AppraisedOption | null;
  /** Of the brief: gives envelopes their datum and says which are presets. */
  readonly obstacles?: readonly Obstacle[];
  readonly widthPx: number;
  readonly scale?: Scale;
  /** Only this stretch is drawn, m. */
  readonly window?: { readonly fromM: number; readonly toM: number };
  readonly paper?: Paper;
  /** Data band under the elevation; on unless said otherwise, and off at 1:2000 and smaller. */
  readonly band?: boolean;
  readonly bar?: boolean;
  /** Piers, depth, spans and what the brief says can be taken hold of. */
  readonly handles?: InHand;
  readonly prefix?: string;
}

/** What a crossing on a sheet has room for: lettering, where a deck is more than a line, and a band of figures that do not stand too close. */
export const crossingHas = (
  scale: Scale,
  widthPx: number,
): { readonly lettering: boolean; readonly band: boolean } => ({
  lettering: scale < 2000,
  band: scale <= 2000 && widthPx >= 480,
});

/** Gradient of a straight road at its left end; over a crest those at both abutments with its radius. */
function gradients(site: Site, option: AppraisedOption, frame: Frame): Piece {
  const { pieces, crestRadiusM } = option.profile;
  const onBridge = pieces.filter(({ fromM, toM }) => fromM >= site.startM && toM <= site.endM);
  const say = (slope: number): string => `${signed(slope * 100, 1)} %`;
  const first = onBridge[0];
  const last = onBridge[onBridge.length - 1];
  const after = last ? last.gradient + last.curvature1PerM * (last.toM - last.fromM) : NaN;
  const at = (right: boolean, words: string, figure?: Asked): Piece =>
    label(
      right ? frame.right : frame.left,
      frame.y(roadLevel(option, right ? frame.toM : frame.fromM) + PARAPET_M) - 8,
      words,
      { fill: colours.second, halo: true, anchor: right ? 'end' : 'start', figure },
    );
  if (crestRadiusM === null || first === undefined) return at(false, say(option.profile.gradient));
  return g(
    {},
    at(
      false,
      `R ${radiusText(crestRadiusM)}, ${say(first.gradient)}`,
      ofOption(option, 'profile/crestRadiusM'),
    ),
    at(true, say(after)),
  );
}

/** The barred dimension between envelope and soffit where there is room for its figure, else under the bed. */
function barredPiece(
  site: Site,
  option: AppraisedOption | null,
  list: readonly Envelope[],
  room: Room,
): Piece | null {
  const { frame } = room;
  const opening = site.mainOpening;
  if (opening === null) return null;
  const least = Math.max(
    ...list.filter((one) => one.toM > opening.fromM && one.fromM < opening.toM).map((one) => one.topLevelM),
    ...site.waters.map((water) => water.floodLevelM ?? water.levelM),
  );
  const over =
    option === null
      ? 6
      : Math.min(
          ...[0, 0.25, 0.5, 0.75, 1].map(
            (part) => soffitLevel(site, option, opening.fromM + part * (opening.toM - opening.fromM)) - least,
          ),
        );
  const y =
    Number.isFinite(least) && over * frame.pxPerM >= 14
      ? frame.y(least + Math.min(over / 2, 10 / frame.pxPerM))
      : frame.y(Math.min(...site.groundZ)) + 14;
  room.placer.take(
    { left: frame.x(opening.fromM), right: frame.x(opening.toM), top: y - 6, bottom: y + 6 },
    2,
  );
  return barredDimension(site, frame, y, room.accent);
}

/**
 * General arrangement of the crossing in elevation, to true scale: bearing bubbles, dimensions, structure, envelopes,
 * levels, ground, strata, and the data band below.
 */
export function crossing(input: CrossingInput): Piece {
  const { site, option, widthPx } = input;
  const paper = input.paper ?? 'colour';
  const prefix = input.prefix ?? 'crossing';
  const scale = input.scale ?? scaleOnSheet(site, widthPx);
  const has = crossingHas(scale, widthPx);
  const small = !has.lettering;
  const withBand = input.band ?? has.band;
  const withBar = input.bar ?? true;
  const range = levelRange(site, option, !small);
  const shown = input.window ?? chainagesShown(site, widthPx, scale);
  const width = input.window === undefined ? widthPx : (shown.toM - shown.fromM) * pxPerMetre(scale);
  const ink = formInk(paper, option?.units.map((unit) => unit.form) ?? [], prefix);

  const bubbleY = bubbleRadius + 2;
  const dimensionTop = small ? 20 : bubbleY + bubbleRadius + 20;
  const several = option !== null && option.supports.length > 2;
  const dimensionBottom = dimensionTop + (several && !small ? 22 : 0);
  // A small drawing has no room under its deck: what is barred is said over everything.
  const bracketsY = dimensionBottom + (small ? bracketsPx(site, pxPerMetre(scale)) : 0);
  const structureY = option === null && bracketsY === dimensionBottom ? 24 : bracketsY + (small ? 10 : 18);
  const frame = frameOf(scale, shown, 0, { levelM: range.topM, y: structureY });
  const bottomY = frame.y(range.bottomM) + (small ? 30 : 22);
  const room: Room = {
    frame,
    accent: ink.accent,
    placer: placer({ left: 0, top: 0, right: width, bottom: bottomY }),
  };
  takeRoom(site, option, frame, room.placer);
  const datum = datumBelow(frame, bottomY + 5);
  room.placer.take(datumBox(frame, datum), 3);

  const list = envelopes(site, input.obstacles).filter(
    (one) => one.toM > shown.fromM && one.fromM < shown.toM,
  );
  const barred = small ? null : barredPiece(site, option, list, room);
  const marked = small ? null : clearances(site, option, list, room, widthPx < 480);
  const depths = option === null || small ? [] : depthMarks(site, option, room);
  // On a hand-held screen lettering of levels and founding would touch.
  const cramped = small || widthPx < 480;
  const levels = cramped ? [] : levelMarks(site, option, input.obstacles, room);
  // What stands in the key below is not said twice.
  const keyed = small ? keyedNames(site, frame) : new Set<string>();
  const named = names(site, room, keyed);
  const below = cramped ? [] : belowGround(site, option, room, range.bottomM);

  const chainages = option === null ? [site.startM, site.endM] : supportChainages(option);
  const inside = chainages.filter((at) => at >= shown.fromM - 1e-6 && at <= shown.toM + 1e-6);
  const figures = inside
    .slice(1)
    .map((at, index) => (small ? length(at - (inside[index] ?? at)) : fixed(at - (inside[index] ?? at), 1)));
  const changes = option === null ? [] : spanChanges(option, input.handles?.hold ?? null);
  const ends = option === null ? site : siteOf(site, option.units);
  const isShorter = option?.startM !== undefined;
  const total = fixed(ends.lengthM, 1);
  const band = withBand
    ? dataBand(site, option, frame, datum.y, { accent: ink.accent, datumM: datum.levelM })
    : null;
  const afterBand = datum.y + (band?.height ?? 0);
  const height = afterBand + (withBar ? (width < 620 ? 56 : 42) : 4);
  const clip = `${prefix}-window`;
  // What stands at the abutments may reach past the sheet; a stretch ends with it.
  const over = input.window === undefined ? 14 : 0;
  const figureWidth = Math.max(...figures.map((figure) => textWidth(figure, letters.table)));
  const bodyEnd = frame.y(range.bottomM);
  const hands = input.handles;
  const narrowest = Math.min(
    ...inside.slice(1).map((at, index) => frame.x(at) - frame.x(inside[index] ?? at)),
  );
  const dimensionSize = figureWidth + 6 < narrowest ? letters.table : letters.drawing;

  return sheet(
    width,
    height,
    option === null
      ? `The crossing, ground and what it must clear, 1 to ${String(scale)}`
      : `The crossing with ${optionWords(option)}, 1 to ${String(scale)}`,
    [
      el(
        'defs',
        {},
        ink.defs,
        el(
          'clipPath',
          { id: clip },
          el('rect', { x: -over, y: 0, width: width + 2 * over, height: bottomY + 5 }),
        ),
      ),
      g(
        { 'clip-path': `url(#${clip})` },
        (small || input.window !== undefined) &&
          barredWash(site, frame, small ? bracketsY : structureY, bottomY),
        !small && strata(site, frame, range.bottomM),
        option !== null &&
          !small &&
          bubbles(option, frame, bubbleY, (at) => frame.y(soffitLevel(site, option, at)) + 4),
        elevationBody(site, option, frame, ink, range, {
          plain: small && scale > 2500,
          floodLine: !small,
          postsM: small ? 0 : 2.5,
        }),
        barred,
        marked,
        option !== null && !small && gradients(site, option, frame),
        depths,
        levels,
        named,
        below,
        option !== null && !small && barredPiers(site, option, frame, ink.accent),
        option !== null &&
          hands !== undefined && [
            supportFeet(site, option, frame, bodyEnd + 6, hands.locked),
            freeBar(site, option, frame, bodyEnd + 14, hands.hold),
          ],
      ),
      several &&
        !small &&
        inside.length === chainages.length &&
        dimensionChain([frame.x(ends.startM), frame.x(ends.endM)], dimensionTop, [total], {
          weight: 600,
          size: letters.table,
          // The axis of a support may run through it.
          halo: true,
          asked: [isShorter ? `options/${String(option.number)}/lengthM` : 'site/lengthM'],
        }),
      inside.length > 1 &&
        dimensionChain(
          inside.map(frame.x),
          dimensionBottom,
          figures.map((figure, i) =>
            withChange(figure, changes[i] ?? '', ((inside[i + 1] ?? 0) - (inside[i] ?? 0)) * frame.pxPerM),
          ),
          {
            weight: 600,
            size: dimensionSize,
            asked:
              inside.length === chainages.length && option !== null ? spanPaths(option) : ['site/lengthM'],
          },
        ),
      band?.piece,
      small && barredBrackets(site, frame, bracketsY, ink.accent),
      hands !== undefined && [
        option !== null && pierBays(site, option, frame),
        handles(
          [
            ...(option === null ? [] : optionHandles(site, option, frame, dimensionBottom - 8, hands)),
            ...(input.obstacles === undefined
              ? []
              : briefHandles(site, input.obstacles, frame, small ? bracketsY : null, hands.hold)),
          ],
          { left: 0, top: 0, right: width, bottom: datum.y },
          hands.hold,
          prefix,
        ),
      ],
      withBar &&
        scaleBar(scale, Math.max(frame.x(site.startM), 8), afterBand + 26, {
          rightPx: width,
          widthPx: Math.min(400, width * 0.7),
        }),
      !withBand && datumLine(frame, datum, pens.fine),
    ],
    hands === undefined ? 'img' : 'group',
    'drawing',
    option === null ? undefined : { id: `${prefix}-words`, words: elevationText(site, option) },
  );
}
