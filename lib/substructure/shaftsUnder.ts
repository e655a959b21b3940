import type { ShaftUnder, Support, Unit } from '../model/index.ts';
import { substructureData } from './data.ts';

/** Heights are told apart to this, m, and movements, m: a deck is not sized anew for less. */
const HEIGHT_STEP_M = 0.1;
const MOVED_STEP_M = 0.001;

const stepped = (value: number, step: number): number => Number((Math.round(value / step) * step).toFixed(6));

/** Shafts that the deck of a unit is cast in with, as they stand under it; none where it rests on bearings. */
export function shaftsUnder({ supportsM }: Unit, supports: readonly Support[]): ShaftUnder[] {
  return supports.flatMap(({ chainageM, topLevelM, groundLevelM, articulation: { frame } }) => {
    const support = supportsM.indexOf(chainageM);
    if (frame === undefined || support < 0) return [];
    const towards = chainageM < frame.stillM ? 1 : -1;
    const moved = (mm: number): number => towards * stepped(mm / 1000, MOVED_STEP_M);
    return [
      {
        support,
        heightM: stepped(topLevelM - groundLevelM + substructureData.piles.capCoverM, HEIGHT_STEP_M),
        eiKNm2: frame.eiKNm2,
        shortenedM: moved(frame.pushMm - frame.cooledMm),
        cooledM: moved(frame.cooledMm),
      },
    ];
  });
}
