import { fixed, level } from '../format.ts';
import type { Obstacle, Site } from '../model.ts';
import { groundLevel } from './alongOption.ts';
import type { Frame } from './frame.ts';
import { bracketWords } from './barred.ts';
import type { HandleSpec, TypedSpec } from './handle.ts';
import type { Hold } from './hold.ts';
import { colours, letters, pens } from './ink.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, num } from './piece.ts';

/** Dashed mark of a length of 40 px where a handle was taken. */
const wasAt = (x: number, y: number, isUp: boolean): Piece =>
  el('path', {
    d: isUp ? `M${num(x - 20)},${num(y)}h40` : `M${num(x)},${num(y - 20)}v40`,
    stroke: colours.second,
    'stroke-width': pens.thin,
    'stroke-dasharray': '5 3',
  });

/** An end of an obstacle. */
type End = 'from' | 'to';

/** Handle of an edge of an obstacle, at a height y; none off the drawing. */
function edgeSpecs(
  site: Site,
  [index, { name, fromM, toM }]: readonly [number, Obstacle],
  end: End,
  frame: Frame,
  y: number,
  hold: Hold | null,
): HandleSpec[] {
  const at = end === 'from' ? fromM : toM;
  if (at < frame.fromM || at > frame.toM) return [];
  const key = `obstacle/${String(index)}/${end}`;
  return [
    {
      key,
      name: `${name}, ${end} chainage`,
      valueM: at,
      leastM: end === 'from' ? site.startM - 500 : fromM + 0.5,
      mostM: end === 'from' ? toM - 0.5 : site.endM + 500,
      places: 1,
      words: `ch ${fixed(at, 1)}`,
      perPx: [1 / frame.pxPerM, 0],
      x: frame.x(at),
      y,
      before: hold?.key === key ? wasAt(frame.x(hold.valueM), y, false) : null,
    },
  ];
}

/** The width of the main opening over its bracket, on a level line at y, where one obstacle alone makes it. */
function openingSpecs(site: Site, obstacles: readonly Obstacle[], frame: Frame, y: number): TypedSpec[] {
  const opening = site.mainOpening;
  if (opening === null) return [];
  const index = obstacles.findIndex(
    ({ supports, fromM, toM }) => supports === 'hard' && fromM === opening.fromM && toM === opening.toM,
  );
  const whole = obstacles[index];
  const words = bracketWords(site, frame, y).find(({ isMain }) => isMain);
  if (whole === undefined || words === undefined) return [];
  return [
    {
      key: `width/${String(index)}`,
      name: `${whole.name}, width without a pier`,
      valueM: opening.widthM,
      leastM: 1,
      mostM: 2000,
      places: 1,
      words: `${fixed(opening.widthM, 1)} m`,
      x: words.x,
      y: words.y - 4,
      widthPx: textWidth(words.words, letters.drawing),
    },
  ];
}

/**
 * Handles of what the brief says of the crossing: edges of obstacles, headroom over them, road levels at both ends.
 * @param bracketsY level line of the brackets over barred stretches, whose ends and width are taken there; null where there
 * are none and all edges are taken at the ground
 */
export function briefHandles(
  site: Site,
  obstacles: readonly Obstacle[],
  frame: Frame,
  bracketsY: number | null,
  hold: Hold | null,
): (HandleSpec | TypedSpec)[] {
  const isHeld = (key: string): boolean => hold?.key === key;
  const inFrame = (at: number): boolean => at >= frame.fromM && at <= frame.toM;
  const edges = [...obstacles.entries()].flatMap((entry) =>
    (['from', 'to'] as const).flatMap((end) => {
      const { supports, [`${end}M` as const]: at } = entry[1];
      const y = bracketsY !== null && supports === 'hard' ? bracketsY : frame.y(groundLevel(site, at)) + 12;
      return edgeSpecs(site, entry, end, frame, y, hold);
    }),
  );
  const clearances = obstacles.flatMap(({ name, clearance }, index) => {
    if (clearance === null) return [];
    const at = clearance.fromM + 0.3 * (clearance.toM - clearance.fromM);
    if (!inFrame(at)) return [];
    const key = `clearance/${String(index)}`;
    const [x, y] = [frame.x(at), frame.y(clearance.datumLevelM + clearance.headroomM)];
    return {
      key,
      name: `headroom over ${name}`,
      valueM: clearance.headroomM,
      leastM: 0.5,
      mostM: Math.max(100, clearance.headroomM),
      places: 2,
      words: `${level(clearance.headroomM)} clear`,
      perPx: [0, -1 / frame.pxPerM] as const,
      x,
      y,
      before: isHeld(key) ? wasAt(x, y + (clearance.headroomM - hold!.valueM) * frame.pxPerM, true) : null,
    };
  });
  const { startLevelM, endLevelM } = site.road;
  const road = ([site.startM, site.endM] as const).map((at, i) => {
    const key = i === 0 ? 'road/start' : 'road/end';
    const levelM = i === 0 ? startLevelM : endLevelM;
    const [x, y] = [frame.x(at) + (i === 0 ? -16 : 16), frame.y(levelM)];
    return {
      key,
      name: `road level at ${i === 0 ? 'A' : 'B'}`,
      valueM: levelM,
      leastM: levelM - 200,
      mostM: levelM + 200,
      places: 2,
      words: `road ${level(levelM)}`,
      perPx: [0, -1 / frame.pxPerM] as const,
      x,
      y,
      before: isHeld(key) ? wasAt(x, y + (levelM - hold!.valueM) * frame.pxPerM, true) : null,
    };
  });
  const width = bracketsY === null ? [] : openingSpecs(site, obstacles, frame, bracketsY);
  return [...width, ...edges, ...clearances, ...road];
}
