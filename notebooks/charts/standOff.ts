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

/** Flags stand this far apart in a column, and columns of them as well, px. */
const APART_PX = 24;
/** From the outermost mark of a cluster to its first column of flags, px. */
const FIRST_PX = 32;

/** Heights, px, for flags in the order of their places: the slots that are least far from them altogether; null without enough. */
function inSlots(wanted: readonly number[], slots: readonly number[]): { ys: number[]; cost: number } | null {
  if (slots.length < wanted.length) return null;
  // least[k][j]: cost of the first k flags in the first j slots.
  const least: number[][] = [new Array<number>(slots.length + 1).fill(0)];
  for (const [k, y] of wanted.entries()) {
    const row = [Infinity];
    slots.forEach((slot, j) => row.push(Math.min(row[j]!, least[k]![j]! + Math.abs(slot - y))));
    least.push(row);
  }
  const ys: number[] = [];
  let j = slots.length;
  for (let k = wanted.length; k > 0; k -= 1) {
    while (least[k]![j - 1]! <= least[k]![j]!) j -= 1;
    ys.unshift(slots[j - 1]!);
    j -= 1;
  }
  return { ys, cost: least.at(-1)!.at(-1)! };
}

/** Flags of one cluster, from top to bottom, in as few columns at one side of it as hold them. */
function flagsOf(
  rest: readonly Place[],
  taken: readonly { readonly x: number; readonly y: number; readonly reach: number }[],
  limitY: number | null,
  panel: PanelRoom,
): Stand[] {
  const most = Math.max(...rest.map((one) => one.x));
  const least = Math.min(...rest.map((one) => one.x));
  const isFree = (x: number, y: number): boolean =>
    (limitY === null || Math.abs(y - limitY) >= 13) &&
    taken.every((one) => Math.hypot(one.x - x, one.y - y) >= one.reach);
  let best: Stand[] = rest.map(({ x, y }) => ({ x, y, flag: true }));
  let bestCost = Infinity;
  for (const side of [1, -1] as const) {
    const edge = side === 1 ? most : least;
    const columns: { readonly x: number; readonly slots: number[] }[] = [];
    for (
      let x = edge + side * FIRST_PX;
      x <= panel.right - 12 && x >= panel.left + 12;
      x += side * APART_PX
    ) {
      // Slots in steps of a quarter, of which those are kept that leave a whole step to the one before.
      const slots: number[] = [];
      for (let y = panel.top + 12; y <= panel.bottom - 12; y += 4)
        if (isFree(x, y) && y - (slots.at(-1) ?? -Infinity) >= APART_PX) slots.push(y);
      columns.push({ x, slots });
      const room = columns.reduce((sum, column) => sum + column.slots.length, 0);
      if (room < rest.length) continue;
      // The places are shared out in order: each column takes those of its share of the room.
      const stands: Stand[] = [];
      let cost = (columns.length - 1) * 60;
      let from = 0;
      for (const [c, column] of columns.entries()) {
        const left = columns.slice(c + 1).reduce((sum, one) => sum + one.slots.length, 0);
        const even = Math.ceil((rest.length - from) / (columns.length - c));
        const count = Math.min(column.slots.length, Math.max(even, rest.length - from - left));
        const chunk = rest.slice(from, from + count);
        const laid = inSlots(
          chunk.map(({ y }) => y),
          column.slots,
        );
        if (laid === null) break;
        cost += laid.cost;
        laid.ys.forEach((y) => stands.push({ x: column.x, y, flag: true }));
        from += count;
      }
      if (stands.length === rest.length && cost < bestCost) {
        bestCost = cost;
        best = stands;
      }
      break;
    }
  }
  return best;
}

/**
 * Where each number stands: on its own place, or, where marks are closer than 26 px, on a flag beside them, 24 px apart,
 * in the same order from top to bottom in as few columns as hold them, clear of other numbers and never on the limit.
 */
export function standOff(
  places: readonly Place[],
  reference: number | null,
  limitY: number | null,
  panel: PanelRoom,
): Map<number, Stand> {
  const out = new Map<number, Stand>();
  const clusters: Place[][] = [];
  const left = new Set(places);
  for (const place of places) {
    if (!left.delete(place)) continue;
    const cluster = [place];
    for (let grown = true; grown;) {
      grown = false;
      for (const other of left) {
        if (!cluster.some((one) => Math.hypot(one.x - other.x, one.y - other.y) < 26)) continue;
        cluster.push(other);
        left.delete(other);
        grown = true;
      }
    }
    clusters.push(cluster);
  }
  const flagged: Place[][] = [];
  for (const cluster of clusters) {
    // The reference keeps its place where 14 px about it are free; a mark alone keeps its own.
    const stays =
      cluster.length === 1
        ? cluster
        : cluster.filter(
            (one) =>
              one.option.number === reference &&
              cluster.every((other) => other === one || Math.hypot(one.x - other.x, one.y - other.y) >= 14),
          );
    for (const one of stays) out.set(one.option.number, { x: one.x, y: one.y, flag: false });
    const rest = cluster.filter((one) => !stays.includes(one)).sort((a, b) => a.y - b.y);
    if (rest.length > 0) flagged.push(rest);
  }
  for (const rest of flagged) {
    const numbers = [...out.values()].map(({ x, y }) => ({ x, y, reach: 22 }));
    // A number may hide no other mark.
    const dots = places.map(({ x, y }) => ({ x, y, reach: 14 }));
    const stands = flagsOf(rest, [...numbers, ...dots], limitY, panel);
    rest.forEach((one, index) => out.set(one.option.number, stands[index]!));
  }
  return out;
}
