import type { HandleSpec, TypedSpec } from './handle.ts';
import { handle, handlePx, TYPED_AIR_PX, typedFigure, typedPx } from './handle.ts';
import type { Shift, WantedPlace } from './handlesApart.ts';
import { handlesApart, LEAST_TARGET_PX } from './handlesApart.ts';
import type { Hold } from './hold.ts';
import { letters } from './ink.ts';
import type { Piece } from './piece.ts';
import { g } from './piece.ts';
import type { Box } from './placer.ts';

const isTyped = (spec: HandleSpec | TypedSpec): spec is TypedSpec => 'widthPx' in spec;

/** By drawing, how far its handles were moved when it was last drawn with nothing in hand. */
const atRest = new Map<string, ReadonlyMap<string, Shift>>();

/** Farthest a target stands from what it moves, px: its leader is followed no further (common practice, no source). */
const FARTHEST_PX = 2 * LEAST_TARGET_PX;

/** How far the target of a figure may slip and still lie over its lettering, px. */
const SLIP_PX = (LEAST_TARGET_PX - letters.drawing) / 2;

/** A pier that is moved sideways gives up and down, a level sideways: so what it says of the place stays true. */
function freePlaces(specs: readonly (HandleSpec | TypedSpec)[], sheet: Box): ReadonlyMap<string, Shift> {
  const wanted = specs.map((spec): WantedPlace => {
    const { key, x, y } = spec;
    const [width, height] = isTyped(spec) ? typedPx(spec) : handlePx;
    return isTyped(spec)
      ? { key, x, y, width, height, gives: 'down', reach: [TYPED_AIR_PX / 2, SLIP_PX] }
      : {
          ...{ key, x, y, width, height },
          gives: spec.perPx[1] === 0 ? 'down' : 'across',
          reach: [FARTHEST_PX, FARTHEST_PX],
        };
  });
  return handlesApart(wanted, sheet);
}

/**
 * All handles of one drawing, each with a target of its own, in the order in which keys come to them. While one is in hand
 * all stay as far from what they move as they were before: nothing is rearranged under a hand.
 * @param specs those that go first where room is short, first
 * @param sheet what their targets keep inside, px
 * @param drawing what this drawing is known by from one time to the next
 */
export function handles(
  specs: readonly (HandleSpec | TypedSpec)[],
  sheet: Box,
  hold: Hold | null,
  drawing: string,
): Piece {
  const last = hold === null ? undefined : atRest.get(drawing);
  const shifts = last ?? freePlaces(specs, sheet);
  if (hold === null) atRest.set(drawing, shifts);
  const shiftOf = ({ key }: { readonly key: string }): Shift => {
    const shift = shifts.get(key);
    return shift === undefined ? [0, 0] : shift;
  };
  return g(
    { class: 'handles' },
    specs.map((spec) =>
      isTyped(spec) ? typedFigure(spec, shiftOf(spec)) : handle(spec, hold, shiftOf(spec), sheet.right),
    ),
  );
}

/** Names of the handles of a drawing that have no target of their own, in order. */
export function keyedIn({ attrs, children }: Piece): string[] {
  if (attrs['aria-hidden'] === 'true') return [];
  return children.flatMap((child) => {
    if (typeof child === 'string') return [];
    if (attrs['class'] !== 'handles') return child.tag === 'g' || child.tag === 'svg' ? keyedIn(child) : [];
    return child.attrs['class']?.split(' ').includes('keyed') === true ? [child.attrs['aria-label']!] : [];
  });
}
