import type { Arrangement, Site } from '../model/index.ts';
import { riversAt } from '../river/index.ts';
import { abutmentWindows, standBetween } from '../site/index.ts';
import { endsCost } from './endsCost.ts';
import { PIER_HALF_WIDTH_M } from './requestFor.ts';
import type { FormAndMethod } from './trialRows.ts';
import type { Work } from './work.ts';
import type { Workbench } from './workbench.ts';

/** Of each window: its ends and its middle are looked at first. */
const FIRST_LOOKS = [0, 0.5, 1] as const;
/** About the best place the steps are halved, from this share of a window down to the finest. */
const STEPS = [1 / 4, 1 / 8, 1 / 16, 1 / 32] as const;

/** How far in from the end of the crossing an abutment stands, m: on whole metres, and at both ends of its window. */
function inwardM(share: number, roomM: number): number {
  return share >= 1 ? roomM : Math.round(Math.max(0, share) * roomM);
}

/** Shares of both windows at which the abutments stand. */
type Shares = readonly [start: number, end: number];

/** Abutments at two places, with what can be arranged between them, each at its whole trial cost. */
interface Stood {
  readonly shares: Shares;
  readonly arrangements: readonly Arrangement[];
}

/** Bridges with as many supports are one kind. */
export const supportsOf = ({ units }: Arrangement): number =>
  units.reduce((sum, { supportsM }) => sum + supportsM.length - 1, 1);

/** Cheapest of a kind at a place; infinite where there is none. */
const leastOf = ({ arrangements }: Stood, kind: number): number =>
  Math.min(...arrangements.filter((one) => supportsOf(one) === kind).map(({ tableCost }) => tableCost));

/**
 * Arrangements of a form over the places that the windows of its abutments leave open: at each pair of places the usual
 * search between them, with the cost of the two abutments and of the whole road from end to end of the crossing added, so
 * that a longer and a shorter bridge compare. Ends and middles of the windows first; then, for the cheapest numbers of
 * supports in turn, at most `kinds` of them, about the best place of each in steps that are halved. `tableCost` of what is returned is that whole trial cost.
 */
export function* overWindows(
  bench: Workbench,
  asked: FormAndMethod,
  kinds: number,
  arrangeOn: (at: Workbench) => Work<readonly Arrangement[]>,
): Work<readonly Arrangement[]> {
  const { site } = bench;
  const { start, end } = abutmentWindows(site, PIER_HALF_WIDTH_M);
  const rooms = [start[1] - start[0], end[1] - end[0]] as const;
  const tried = new Map<string, Stood>();
  const visit = function* (shares: Shares): Work<Stood> {
    const startM = start[0] + inwardM(shares[0], rooms[0]);
    const endM = end[1] - inwardM(shares[1], rooms[1]);
    const key = `${startM} ${endM}`;
    const before = tried.get(key);
    if (before) return before;
    const at: Workbench = { ...bench, site: standBetween(site, startM, endM) };
    const arrangements: Arrangement[] = [];
    const found = at.site === site || !holdsUpFlood(at.site) ? yield* arrangeOn(at) : [];
    for (const one of found)
      arrangements.push({ ...one, tableCost: one.tableCost + endsCost(at, asked, one) });
    const stood = { shares, arrangements };
    tried.set(key, stood);
    yield;
    return stood;
  };

  const looks = rooms.map((roomM) => (roomM > 0 ? FIRST_LOOKS : [0]));
  for (const a of looks[0]!) for (const b of looks[1]!) yield* visit([a, b]);
  const done = new Set<number>();
  while (done.size < kinds) {
    const next = cheapest([...tried.values()], done);
    if (next === null) break;
    const kind = supportsOf(next.arrangement);
    done.add(kind);
    let best = next.at;
    for (const step of STEPS) {
      for (let moved = true; moved;) {
        const from: Stood = best;
        for (const [a, b] of neighbours(from.shares, step, rooms)) {
          const there = yield* visit([a, b]);
          if (leastOf(there, kind) < leastOf(best, kind)) best = there;
        }
        moved = best !== from;
      }
    }
  }
  return [...tried.values()].flatMap(({ arrangements }) => arrangements);
}

/** Whether approaches as far in as these hold up a flood by more than its authority allows, before a pier stands in it. */
const holdsUpFlood = (site: Site): boolean =>
  riversAt(site, []).some(
    ({ affluxM, allowedAffluxM }) => affluxM !== null && allowedAffluxM !== null && affluxM > allowedAffluxM,
  );

/** The cheapest arrangement found so far that is of none of the kinds given, and where it stands. */
function cheapest(
  tried: readonly Stood[],
  but: ReadonlySet<number>,
): { readonly at: Stood; readonly arrangement: Arrangement } | null {
  return tried
    .flatMap((at) => at.arrangements.map((arrangement) => ({ at, arrangement })))
    .filter(({ arrangement }) => !but.has(supportsOf(arrangement)))
    .reduce<ReturnType<typeof cheapest>>(
      (best, one) => (best === null || one.arrangement.tableCost < best.arrangement.tableCost ? one : best),
      null,
    );
}

/** Places a step away from a pair along each window that has room, inside it. */
function neighbours([a, b]: Shares, step: number, rooms: readonly [number, number]): Shares[] {
  const about = (share: number, roomM: number): number[] =>
    roomM > 0 ? [share - step, share, share + step].filter((s) => s >= 0 && s <= 1) : [share];
  return about(a, rooms[0]).flatMap((s) => about(b, rooms[1]).map((e): Shares => [s, e]));
}
