import type { Problem, UnitTask } from '../../model/index.ts';
import { supportPositions } from '../common/supports.ts';

/** Places that differ by less are one, m. */
const SAME_M = 1e-6;

/**
 * Supports (0-based) of the piers that a deck is cast in with: so many neighbours, those about whose middle the unit lies
 * most evenly, for there the deck moves least over them; of two such runs the one with the longer spans between, then the
 * first. None where none are asked for.
 */
export function castInSupports({
  spansM,
  castInPiers = 0,
}: Pick<UnitTask, 'spansM' | 'castInPiers'>): number[] {
  const x = supportPositions(spansM);
  const inner = spansM.length - 1;
  const middleM = x.at(-1)! / 2;
  let best: { readonly from: number; readonly offM: number; readonly overM: number } | null = null;
  for (let from = 1; castInPiers > 0 && from + castInPiers - 1 <= inner; from++) {
    const [first, last] = [x[from]!, x[from + castInPiers - 1]!];
    const run = { from, offM: Math.abs((first + last) / 2 - middleM), overM: last - first };
    const gainM = best === null ? Infinity : best.offM - run.offM;
    if (gainM > SAME_M || (gainM > -SAME_M && run.overM > best!.overM + SAME_M)) best = run;
  }
  const from = best?.from;
  return from === undefined ? [] : Array.from({ length: castInPiers }, (_, k) => from + k);
}

/** Why a deck cannot be cast in with as many piers as it is asked to be; none where it can. */
export function castInFaults({ spansM, castInPiers }: Pick<UnitTask, 'spansM' | 'castInPiers'>): Problem[] {
  const inner = spansM.length - 1;
  const isCount = Number.isInteger(castInPiers) && castInPiers! >= 1 && castInPiers! <= inner;
  if (castInPiers === undefined || isCount) return [];
  const path: Problem['path'] = ['castInPiers'];
  const received = String(castInPiers);
  return inner === 0
    ? [
        {
          code: 'refused',
          path,
          expected: 'spans that go on over inner piers',
          received: 'a single span, with no pier to be cast in with',
          remedy: 'Leave it on bearings or add a pier',
        },
      ]
    : [
        {
          code: 'too-large-value',
          path,
          expected: `1 to ${inner}, whole piers between the abutments`,
          received,
          remedy: 'Cast it in with fewer piers, or leave it on bearings',
        },
      ];
}
