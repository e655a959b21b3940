import { fixed, level } from '../format.ts';
import type { AppraisedOption, Obstacle, Site } from '../model.ts';
import { siteOf } from '../model.ts';
import {
  depthAt,
  groundLevel,
  PARAPET_M,
  placedUnits,
  roadLevel,
  slabLevel,
  soffitLevel,
  spansOf,
  supportChainages,
} from './alongOption.ts';
import type { Asked } from './asked.ts';
import { ofOption, overOf } from './asked.ts';
import { uprightDimension } from './dimension.ts';
import type { Room } from './freeLabel.ts';
import { freeLabel } from './freeLabel.ts';
import type { Frame } from './frame.ts';
import { colours, letters } from './ink.ts';
import { textWidth } from './lettering.ts';
import { levelMark, levelMarkBox } from './levelMark.ts';
import { IN_THE_WAY, STRUCTURE, type Box, type Placer } from './placer.ts';
import type { Piece } from './piece.ts';
import { stratumOf } from './strata.ts';
import { likeliest, toeLevel, toeSpread } from './substructure.ts';
import { floodStretches, groundPoints } from './terrain.ts';

/** How far from the upright of an envelope the flag of its foot may stand, px. */
const OUTSIDE_PX = [8, 24, 44, 70, 98] as const;

/** Ground and fill that may stand over the foot of a flag, m. */
const BURIED_M = 0.3;

/**
 * Levels of water, flood, rail and road on shelves, each where there is most room along its own line: in the open where
 * there is a place, and without the word for what it is where only the figure has room.
 */
export function levelMarks(
  site: Site,
  option: AppraisedOption | null,
  obstacles: readonly Obstacle[] | undefined,
  room: Room,
): Piece[] {
  const { frame } = room;
  const ends = option === null ? site : siteOf(site, option.units);
  const isOpen = (m: number, levelM: number): boolean =>
    m > ends.startM && m < ends.endM && groundLevel(site, m) < levelM + BURIED_M;
  const marks: {
    at: readonly number[];
    levelM: number;
    words: string;
    water: boolean;
    asked: Asked;
  }[] = [];
  for (const [index, water] of site.waters.entries()) {
    const at = [0.2, 0.14, 0.25, 0.82, 0.76, 0.5].map(
      (part) => water.fromM + part * (water.toM - water.fromM),
    );
    marks.push({
      at: at.filter((x) => groundLevel(site, x) < water.levelM),
      levelM: water.levelM,
      words: level(water.levelM),
      water: true,
      asked: `site/waters/${String(index)}/levelM`,
    });
  }
  for (const { levelM, fromM, toM, water } of floodStretches(site, frame)) {
    marks.push({
      at: [0.8, 0.7, 0.9, 0.2, 0.3, 0.1, 0.5].map((part) => fromM + part * (toM - fromM)),
      levelM,
      words: `${level(levelM)} flood`,
      water: false,
      asked: `site/waters/${String(water)}/floodLevelM`,
    });
  }
  for (const [index, obstacle] of (obstacles ?? []).entries()) {
    const { kind, clearance } = obstacle;
    if (clearance === null || kind === 'river') continue;
    const isOthers = (m: number): boolean =>
      obstacles!.some((other) => other !== obstacle && m > other.fromM && m < other.toM);
    const outside = [
      ...OUTSIDE_PX.map((px) => clearance.fromM - px / frame.pxPerM),
      ...OUTSIDE_PX.map((px) => clearance.toM + px / frame.pxPerM),
    ];
    marks.push({
      at: [
        ...outside.filter((m) => !isOthers(m)),
        // Within the envelope, at its ends and along it.
        clearance.fromM + OUTSIDE_PX[0] / frame.pxPerM,
        clearance.toM - OUTSIDE_PX[0] / frame.pxPerM,
        ...[0.7, 0.5, 0.3].map((part) => clearance.fromM + part * (clearance.toM - clearance.fromM)),
      ],
      levelM: clearance.datumLevelM,
      words: `${level(clearance.datumLevelM)} ${kind === 'railway' ? 'rail' : kind}`,
      water: false,
      asked: `brief/obstacles/${String(index)}/clearance/datumLevelM`,
    });
  }
  return marks.flatMap(({ at, levelM, words, water, asked }) => {
    const shown = at.filter((m) => m > frame.fromM && m < frame.toM);
    const open = shown.filter((m) => isOpen(m, levelM));
    const candidates = (open.length > 0 ? open : shown).flatMap((m) =>
      (['right', 'left'] as const).map((side) => ({ x: frame.x(m), side })),
    );
    const y = frame.y(levelM);
    const put = (said: string, limit: number): Piece | null => {
      const boxes = candidates.map(({ x, side }) => levelMarkBox(x, y, said, side));
      const chosen = candidates[room.placer.choose(boxes, limit)];
      return chosen === undefined ? null : levelMark(chosen.x, y, said, { side: chosen.side, water, asked });
    };
    return put(words, IN_THE_WAY) ?? put(level(levelM), Infinity) ?? [];
  });
}

/** Depth at the deepest support and at the middle of the longest span. */
export function depthMarks(site: Site, option: AppraisedOption, room: Room): Piece[] {
  const { frame } = room;
  const chainages = supportChainages(option);
  const spans = spansOf(option);
  const longest = spans.indexOf(Math.max(...spans));
  const middle = (chainages[longest] ?? 0) + (spans[longest] ?? 0) / 2;
  const inner = chainages.slice(1, -1);
  const deepest = inner.reduce(
    (best, at) => (depthAt(option, at) > depthAt(option, best) + 0.01 ? at : best),
    inner[0] ?? middle,
  );
  const places = depthAt(option, deepest) > depthAt(option, middle) + 0.02 ? [deepest, middle] : [middle];
  return places.flatMap((at) => {
    const depth = depthAt(option, at);
    if (!Number.isFinite(depth) || at < frame.fromM + 2 || at > frame.toM - 2) return [];
    const x = frame.x(at) + (at === deepest && places.length > 1 ? 14 : 0);
    const here = frame.fromM + (x - frame.left) / frame.pxPerM;
    const top = frame.y(slabLevel(site, option, here));
    const bottom = frame.y(soffitLevel(site, option, here));
    room.placer.take({ left: x, right: x + 34, top, bottom }, 2);
    return [uprightDimension(x, top, bottom, level(depth), { asked: overOf(option, at, 'structureM') })];
  });
}

/**
 * Names of waters and ways in italics, as on maps.
 * @param elsewhere those that stand in the key of the drawing
 */
export function names(site: Site, room: Room, elsewhere: ReadonlySet<string>): (Piece | null)[] {
  const { frame } = room;
  const river = site.waters.map((water) => {
    const middle = (Math.max(water.fromM, frame.fromM) + Math.min(water.toM, frame.toM)) / 2;
    if (elsewhere.has(water.name) || water.toM < frame.fromM || water.fromM > frame.toM) return null;
    const bed = Math.min(
      ...site.groundZ.filter(
        (_, i) => (site.groundX[i] ?? 0) >= water.fromM && (site.groundX[i] ?? 0) <= water.toM,
      ),
      groundLevel(site, middle),
    );
    const y = frame.y(bed);
    return freeLabel(
      room,
      [22, 28, 34].map((down) => [frame.x(middle), y + down] as const),
      water.name,
      { size: letters.prose, italic: true, letterSpacing: 1.4, anchor: 'middle', fill: colours.second },
      Infinity,
    );
  });
  const ways = site.zones
    .filter(({ kind, name }) => (kind === 'railway' || kind === 'road') && !elsewhere.has(name))
    .map((zone) => {
      const middle = (zone.fromM + zone.toM) / 2;
      if (middle < frame.fromM || middle > frame.toM) return null;
      const y = frame.y(groundLevel(site, middle));
      const half = textWidth(zone.name, letters.drawing) / 2;
      const onSheet = (x: number): number =>
        Math.min(Math.max(x, frame.left + half), Math.max(frame.right - half, frame.left + half));
      const places = [16, 20, 28, 36, 44].flatMap((down) =>
        [0, -24, 24, -48].map((shift) => [onSheet(frame.x(middle) + shift), y + down] as const),
      );
      return freeLabel(room, places, zone.name, { italic: true, anchor: 'middle', fill: colours.second });
    });
  return [...river, ...ways];
}

/** The level a founding is written at: pile toes, or the two figures the underside of a footing is made of. */
function toePath(option: AppraisedOption, index: number): Asked {
  const support = option.supports[index];
  const foundation = support === undefined ? null : likeliest(support);
  if (support === undefined || foundation === null) return undefined;
  const at = ofOption(
    option,
    `supports/${String(index)}/foundations/${String(support.foundations.indexOf(foundation))}`,
  );
  return foundation.piles === null
    ? [`${at}/footing/topLevelM`, `${at}/footing/depthM`]
    : `${at}/piles/toeLevelM`;
}

/** Where along its line a bearing stratum may be named, as shares of the room there is, the end first. */
const STRATUM_PLACES = Array.from({ length: 17 }, (_, i) => 0.9 - 0.05 * i);

/** Founding levels with their spread beside the piles, and the bearing stratum named on its own line. */
export function belowGround(
  site: Site,
  option: AppraisedOption | null,
  room: Room,
  lowestM: number,
): (Piece | null)[] {
  const { frame } = room;
  const toes = (option?.supports ?? []).map((support, index) => {
    const foundation = likeliest(support);
    if (foundation === null || support.chainageM < frame.fromM || support.chainageM > frame.toM) return null;
    const toe = toeLevel(foundation);
    const spread = toeSpread(support);
    const words = `${foundation.piles === null ? 'founded' : 'toe'} ${fixed(toe, 1)}${spread > 0.05 ? ` ± ${spread.toFixed(spread < 5 ? 1 : 0)}` : ''}`;
    const y = Math.min(frame.y(Math.max(toe, lowestM)), frame.y(lowestM)) - 2;
    const right = frame.x(support.chainageM + foundation.footing.lengthM / 2) + 4;
    const widthPx = textWidth(words, letters.drawing);
    const left = frame.x(support.chainageM - foundation.footing.lengthM / 2) - 4 - widthPx;
    return freeLabel(
      room,
      [
        [right, y],
        [left, y],
        [right, y - 12],
        [left, y - 12],
        // Under a footing; under piles the end of the drawing is near.
        ...(foundation.piles === null ? [[frame.x(support.chainageM) - widthPx / 2, y + 14] as const] : []),
      ],
      words,
      { fill: colours.second, figure: option === null ? undefined : toePath(option, index) },
    );
  });
  const said = new Set<string>();
  const bearing = site.groundStretches.map((stretch) => {
    const stratum = stratumOf(site, stretch);
    if (stratum === null || said.has(stratum.words)) return null;
    const from = frame.x(Math.max(stratum.fromM, frame.fromM));
    const to = frame.x(Math.min(stratum.toM, frame.toM));
    const levelAt = (x: number): number => stratum.likely(frame.fromM + (x - frame.left) / frame.pxPerM);
    const put = (words: string): Piece | null => {
      const width = textWidth(words, letters.drawing) + 12;
      if (to - from < width + 20) return null;
      const candidates = STRATUM_PLACES.map((part) => from + part * (to - from - width)).filter(
        (x) => levelAt(x) >= lowestM,
      );
      const boxes = candidates.map((x) => levelMarkBox(x, frame.y(levelAt(x)), words, 'right'));
      const x = candidates[room.placer.choose(boxes, IN_THE_WAY)];
      return x === undefined ? null : levelMark(x, frame.y(levelAt(x)), words, { colour: colours.second });
    };
    const mark = put(stratum.words) ?? put(stratum.short);
    if (mark !== null) said.add(stratum.words);
    return mark;
  });
  return [...toes, ...bearing];
}

/** A deck is taken in pieces about as long as this, so that one on a slope takes no more than its own depth, px. */
const DECK_PIECE_PX = 40;

/** How far lettering keeps off a pier or a wall, px. */
const CLEAR_PX = 3;

/** The box round some points with a margin, px. */
function around(points: readonly (readonly [x: number, y: number])[], marginPx: number): Box {
  const [xs, ys] = [points.map(([x]) => x), points.map(([, y]) => y)];
  return {
    left: Math.min(...xs) - marginPx,
    right: Math.max(...xs) + marginPx,
    top: Math.min(...ys),
    bottom: Math.max(...ys),
  };
}

/** Everything lettering must keep off: structure, ground, supports and their axes. */
export function takeRoom(site: Site, option: AppraisedOption | null, frame: Frame, room: Placer): void {
  room.takeLine(groundPoints(site, frame), 2, 1.4);
  if (option === null) return;
  for (const { design, fromM, toM } of placedUnits(option)) {
    for (const shape of design.elevation) {
      if (shape.faint === true) continue;
      const points = shape.points.map(
        ([x, z]) => [frame.x(fromM + x), frame.y(slabLevel(site, option, fromM + x) + z)] as const,
      );
      room.takeLine(points, 1.5, 1);
      if (shape.part.endsWith(' wall')) room.take(around(points, CLEAR_PX), STRUCTURE);
    }
    const pieces = Math.max(1, Math.ceil(((toM - fromM) * frame.pxPerM) / DECK_PIECE_PX));
    const place = (i: number): number => fromM + ((toM - fromM) * i) / pieces;
    for (let i = 0; i < pieces; i += 1) {
      const [left, middle, right] = [place(i), place(i + 0.5), place(i + 1)];
      room.take(
        {
          left: frame.x(left),
          right: frame.x(right),
          top: frame.y(roadLevel(option, middle) + PARAPET_M),
          bottom: frame.y(soffitLevel(site, option, middle)),
        },
        2,
      );
    }
  }
  for (const support of option.supports) {
    const x = frame.x(support.chainageM);
    // Its axis, down from its bubble.
    room.take({ left: x - CLEAR_PX, right: x + CLEAR_PX, top: 0, bottom: frame.y(support.topLevelM) });
    const foundation = likeliest(support);
    const half = Math.max(support.shaft.lengthM, 1) / 2;
    room.take(
      {
        left: frame.x(support.chainageM - half) - CLEAR_PX,
        right: frame.x(support.chainageM + half) + CLEAR_PX,
        top: frame.y(support.topLevelM),
        bottom: frame.y(foundation?.footing.topLevelM ?? support.groundLevelM),
      },
      STRUCTURE,
    );
    if (foundation !== null) {
      const wide = foundation.footing.lengthM / 2;
      room.take(
        {
          left: frame.x(support.chainageM - wide),
          right: frame.x(support.chainageM + wide),
          top: frame.y(foundation.footing.topLevelM),
          bottom: frame.y(toeLevel(foundation)),
        },
        3,
      );
    }
  }
}
