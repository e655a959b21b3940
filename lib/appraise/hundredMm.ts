import type { AppraisedOption, WorkedOption } from '../model/index.ts';
import { profileFor } from '../site/index.ts';
import { approachLines } from '../takeoff/index.ts';
import { depthAlong } from './workOption.ts';
import type { Workbench } from './workbench.ts';

/** How much deeper the deck is made to ask what depth costs, m. */
const DEEPER_M = 0.1;

/**
 * What 100 mm more of construction depth does to the approaches of a worked option, at mean rates: fill, walls and money,
 * with the regrading behind fixed ends in the money. 0 where nothing decides the level, or both ends are fixed and nothing
 * is known of the road behind them; null where no road clears with it.
 */
export function hundredMm(
  { site, costOf }: Pick<Workbench, 'site' | 'costOf'>,
  option: WorkedOption,
): AppraisedOption['hundredMm'] {
  const { xM, depthM } = depthAlong(site, option.units, option.designs);
  const found = profileFor(site, { xM, depthM: depthM.map((depth) => depth + DEEPER_M) });
  if (!found.ok) return null;
  const { profile } = found;
  const more = (of: 'fillM3' | 'wallM2'): number =>
    profile.approaches.start[of] -
    option.profile.approaches.start[of] +
    (profile.approaches.end[of] - option.profile.approaches.end[of]);
  return {
    fillM3: more('fillM3'),
    wallM2: more('wallM2'),
    amount: costOf(approachLines(site, profile)) - costOf(approachLines(site, option.profile)),
  };
}
