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
 */
export function lastingForces(layout: StayLayout, loadKNm: number): LastingForces {
  const stayKN = layout.stays.map((stay) => (stay.anchor ? 0 : (loadKNm * stay.tributaryM) / stay.sine));
  let slack = false;
  layout.pylons.forEach((_, p) => {
    let pull = 0;
    layout.stays.forEach((stay, i) => {
      if (stay.pylon === p) pull += stay.side * stayKN[i]! * stay.cosine;
    });
    // The anchor stays on the side against the pull take it; with anchors on both sides those on the other are idle.
    layout.stays.forEach((stay, i) => {
      if (stay.pylon === p && stay.anchor && stay.side * pull <= 0) stayKN[i] = Math.abs(pull) / stay.cosine;
    });
    const anchors = layout.stays.filter((stay) => stay.pylon === p && stay.anchor);
    if (anchors.length > 0 && anchors.every((stay) => stay.side * pull > 0)) slack = true;
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
