import type { AppraisedOption } from '../model.ts';

/** A mark of a panel, px. */
export interface Place {
  readonly option: AppraisedOption;
  readonly x: number;
  readonly y: number;
}

/** Where a number stands, px, and whether on a flag beside its place. */
interface Stand {
  readonly x: number;
  readonly y: number;
  readonly flag: boolean;
}

/** Room of a panel, px. */
export interface PanelRoom {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Least distance from the middle of a number, px: to another, to a mark or the foot of a flag, to the limit, to an edge of the panel, to the line of a flag that passes. */
const APART = { number: 22, mark: 14, limit: 13, edge: 12, line: 12.5 } as const;

/** A line that passes a mark keeps this far from it, px. */
const LINE_TO_MARK_PX = 5;

/** What stands wrong, in px of flag that may be spent to put it right. */
const WRONG = { hidden: 4000, through: 500, crossing: 500, grazing: 60 } as const;

/** Lengths of flags that are tried, px, each in so many directions. */
const REACHES_PX = [22, 26, 32, 39, 47, 57, 69, 83, 100, 120, 144, 173];
const DIRECTIONS = 24;

/** The reference leaves its place only where others cannot. */
const REFERENCE_WEIGHT = 4;

/** Each pass leaves less that is wrong than the one before; few find anything after the fourth. */
const MOST_PASSES = 10;

/** What gains less is left as it is, px: sums of the same lengths in another order are no gain. */
const LEAST_GAIN_PX = 1e-6;

interface Point {
  readonly x: number;
  readonly y: number;
}

/** A number with the mark it belongs to. */
interface Flag {
  readonly mark: Point;
  readonly at: Point;
}

/** A root of squares: `Math.hypot`, which also guards against overflow, is many times slower and asked thousands of times here. */
const apart = (a: Point, b: Point): number => Math.sqrt((a.x - b.x) ** 2 + (a.y - b.y) ** 2);

/** Distance of a point from a flag's line, px; a number on its own mark has none. */
function fromLine({ mark, at }: Flag, point: Point): number {
  const dx = at.x - mark.x;
  const dy = at.y - mark.y;
  const square = dx * dx + dy * dy;
  if (square === 0) return Infinity;
  const along = ((point.x - mark.x) * dx + (point.y - mark.y) * dy) / square;
  const t = Math.max(0, Math.min(1, along));
  return Math.sqrt((mark.x + t * dx - point.x) ** 2 + (mark.y + t * dy - point.y) ** 2);
}

/** Which side of a flag's line a point is on, by its sign. */
const sideOf = ({ mark, at }: Flag, point: Point): number =>
  (at.x - mark.x) * (point.y - mark.y) - (at.y - mark.y) * (point.x - mark.x);

const cross = (a: Flag, b: Flag): boolean =>
  sideOf(a, b.mark) * sideOf(a, b.at) < 0 && sideOf(b, a.mark) * sideOf(b, a.at) < 0;

/** What two flags do to each other that they should not, whatever marks stand between. */
const wrongBetween = (a: Flag, b: Flag): number =>
  (apart(a.at, b.at) < APART.number ? WRONG.hidden : 0) +
  (cross(a, b) ? WRONG.crossing : 0) +
  (fromLine(a, b.at) < APART.line ? WRONG.through : 0) +
  (fromLine(b, a.at) < APART.line ? WRONG.through : 0);

/** Places for the number of a mark: the mark itself, then round about it, inside the panel. */
function standsAbout({ x, y }: Point, { left, right, top, bottom }: PanelRoom): Point[] {
  const round = REACHES_PX.flatMap((reach) =>
    Array.from({ length: DIRECTIONS }, (_, step) => {
      const angle = ((step + 0.5) / DIRECTIONS) * 2 * Math.PI;
      return { x: x + reach * Math.cos(angle), y: y + reach * Math.sin(angle) };
    }),
  );
  return [
    { x, y },
    ...round.filter(
      (at) =>
        at.x >= left + APART.edge &&
        at.x <= right - APART.edge &&
        at.y >= top + APART.edge &&
        at.y <= bottom - APART.edge,
    ),
  ];
}

/**
 * Where each number stands: on its own mark, or on a flag beside it where marks are too close. Numbers keep clear of each
 * other, of other marks and of the limit as long as the panel has the room; flags are short, cross as little as can be
 * and pass no other number. Found by moving one number after another to where it does best, then exchanging pairs, until
 * neither helps: a local optimum, the same for the same marks.
 */
export function standOff(
  places: readonly Place[],
  reference: number | null,
  limitY: number | null,
  panel: PanelRoom,
): Map<number, Stand> {
  const flags: Flag[] = places.map(({ x, y }) => ({ mark: { x, y }, at: { x, y } }));
  /** What it costs to have a number there were it the only one: length of flag, marks and limit in its way. */
  const alone = (index: number, at: Point): number => {
    const { x, y, option } = places[index]!;
    const flag = { mark: { x, y }, at };
    const reach = apart(flag.mark, at);
    let cost = reach * (option.number === reference ? REFERENCE_WEIGHT : 1);
    if (limitY !== null && reach > 0 && Math.abs(at.y - limitY) < APART.limit) cost += WRONG.hidden;
    places.forEach((mark, other) => {
      if (other === index) return;
      if (apart(at, mark) < APART.mark) cost += WRONG.hidden;
      if (fromLine(flag, mark) < LINE_TO_MARK_PX) cost += WRONG.grazing;
    });
    return cost;
  };
  const choices = places.map((place, index) =>
    standsAbout(place, panel)
      .map((at) => ({ at, cost: alone(index, at) }))
      .sort((a, b) => a.cost - b.cost),
  );
  /** What others add, as they stand; not asked further once it is as much as `most`. */
  const among = (index: number, at: Point, most = Infinity): number => {
    const flag = { mark: flags[index]!.mark, at };
    let cost = 0;
    for (let other = 0; other < flags.length && cost < most; other += 1)
      if (other !== index) cost += wrongBetween(flag, flags[other]!);
    return cost;
  };
  const costOf = (index: number, at: Point): number => alone(index, at) + among(index, at);
  const move = (index: number): boolean => {
    const { mark, at } = flags[index]!;
    let best = at;
    let least = costOf(index, at) - LEAST_GAIN_PX;
    for (const choice of choices[index]!) {
      // Those that follow cost as much on their own.
      if (choice.cost >= least) break;
      const cost = choice.cost + among(index, choice.at, least - choice.cost);
      if (cost < least) [best, least] = [choice.at, cost];
    }
    flags[index] = { mark, at: best };
    return best !== at;
  };
  const exchange = (i: number, j: number): boolean => {
    const [a, b] = [flags[i]!, flags[j]!];
    if (apart(a.at, a.mark) === 0 || apart(b.at, b.mark) === 0) return false;
    const before = costOf(i, a.at) + costOf(j, b.at) - wrongBetween(a, b);
    flags[i] = { mark: a.mark, at: b.at };
    flags[j] = { mark: b.mark, at: a.at };
    const after = costOf(i, b.at) + costOf(j, a.at) - wrongBetween(flags[i], flags[j]);
    if (after < before - LEAST_GAIN_PX) return true;
    flags[i] = a;
    flags[j] = b;
    return false;
  };
  for (let pass = 0, changed = true; changed && pass < MOST_PASSES; pass += 1) {
    changed = false;
    for (let i = 0; i < flags.length; i += 1) changed = move(i) || changed;
    for (let i = 0; i < flags.length; i += 1)
      for (let j = i + 1; j < flags.length; j += 1) changed = exchange(i, j) || changed;
  }
  return new Map(
    places.map(({ option }, index) => {
      const { mark, at } = flags[index]!;
      return [option.number, { ...at, flag: at.x !== mark.x || at.y !== mark.y }];
    }),
  );
}
