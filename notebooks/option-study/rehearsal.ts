import type { AppraisedOption, Study } from '../../lib/index.ts';
import { whenIdle } from '../page/index.ts';
import { placesOf, withDepth, withPier } from './handEdits.ts';

/** After so many steps the first moves of a drag were answered nearly as quickly as later ones. */
const STEPS = 12;

/** Rehearses a drag of an option's pier and depth; while `isStill` says that the study is the one on the page. */
export type Rehearse = (study: Study, option: AppraisedOption, isStill: () => boolean) => void;

/**
 * Rehearses in idle moments what a drag will ask for, a step in each: the option as it stands, so that what its first move
 * needs is there by then, and once for the life of the page some moves, after which the engine has quick code for them.
 * @param work works an option of a study out; what it comes to is thrown away
 */
export function rehearsal(work: (study: Study, option: AppraisedOption) => void): Rehearse {
  let movesLeft = STEPS;
  return (study, option, isStill) => {
    const pierM = placesOf(option.units)[1]!;
    const moved = (step: number): Study =>
      withDepth(withPier(study, option, 1, pierM + 0.5 * step), option, option.depthM.midspan + 0.01 * step);
    const soon = (now: Study): void =>
      whenIdle(() => {
        if (!isStill()) return;
        work(now, option);
        if (movesLeft === 0) return;
        const next = moved(movesLeft);
        movesLeft -= 1;
        soon(next);
      });
    soon(study);
  };
}
