import type { StayLayout } from './stayLayout.ts';

/** Lasting forces of one plane, kN. */
export interface LastingForces {
  /** Tension of each stay of the layout. */
  readonly stayKN: readonly number[];
  /** True where a back span is so long that its anchor stays would have to push. */
  readonly slack: boolean;
}

/**
 * Stay forces under lasting load of `loadKNm` per plane: each suspended stay holds up its own length of deck, so that the
 * deck lies level and bends only between stays; anchor stays bring the top of each pylon into balance, so that the pylon
 * stands straight.
 * @param tautKN lasting tension each anchor stay needs to stay taut under traffic, by stay; it can be given only where
 * anchor stays on both sides of a pylon pull against each other
 */
export function lastingForces(
  layout: StayLayout,
  loadKNm: number,
  tautKN: readonly number[] = layout.stays.map(() => 0),
): LastingForces {
  const stayKN = layout.stays.map((stay) => (stay.anchor ? 0 : (loadKNm * stay.tributaryM) / stay.sine));
  let slack = false;
  layout.pylons.forEach((_, p) => {
    let pull = 0;
    layout.stays.forEach((stay, i) => {
      if (stay.pylon === p) pull += stay.side * stayKN[i]! * stay.cosine;
    });
    const anchors = layout.stays.flatMap((stay, i) => (stay.pylon === p && stay.anchor ? [i] : []));
    const against = anchors.filter((i) => layout.stays[i]!.side * pull < 0);
    // Against each other: both take the pull that keeps the slacker one taut, one of them the balance as well.
    const shared =
      anchors.length > 1 ? Math.max(...anchors.map((i) => tautKN[i]! * layout.stays[i]!.cosine)) : 0;
    for (const i of anchors) {
      const balance = against.includes(i) ? Math.abs(pull) : 0;
      stayKN[i] = (shared + balance) / layout.stays[i]!.cosine;
    }
    if (anchors.length > 0 && against.length === 0 && anchors.length < 2 && Math.abs(pull) > 1e-9)
      slack = true;
  });
  return { stayKN, slack };
}

/** Push in the deck at distance from the pylon beyond `fromM` on one side: horizontals of the stays held farther out, kN. */
export function deckPush(
  layout: StayLayout,
  stayKN: readonly number[],
  pylon: number,
  side: -1 | 1,
  fromM: number,
): number {
  const x0 = layout.pylons[pylon]!.xM;
  let sum = 0;
  layout.stays.forEach((stay, i) => {
    if (stay.pylon === pylon && stay.side === side && Math.abs(stay.deckM - x0) >= fromM - 1e-9)
      sum += stayKN[i]! * stay.cosine;
  });
  return sum;
}
