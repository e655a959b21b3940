import type { HundredMm, RoadProfile, WorkedOption } from '../model/index.ts';
import { easedProfile, profileFor } from '../site/index.ts';
import { approachLines } from '../takeoff/index.ts';
import { depthAlong } from './workOption.ts';
import type { Workbench } from './workbench.ts';

/** How much deeper the deck is made to ask what depth costs, m. */
const DEEPER_M = 0.1;

const ends = ['start', 'end'] as const;

/** Face of the walls of the approaches and of the regrading behind fixed ends, m2. */
const faceM2 = ({ approaches, regrading }: RoadProfile): number =>
  ends.reduce((sum, end) => sum + approaches[end].wallM2 + (regrading?.[end]?.wallM2 ?? 0), 0);

/**
 * What 100 mm more of construction depth does to the approaches of a worked option, the regrading of the road behind fixed
 * ends among them: quantities, and money at mean rates. 0 where nothing decides the level, or both ends are fixed and
 * nothing is known of the road behind them; null where no road clears with it. A crest that spares the curve behind a fixed
 * end is left to do so.
 */
export function hundredMm(
  { site, costOf }: Pick<Workbench, 'site' | 'costOf'>,
  option: WorkedOption,
): HundredMm | null {
  const { xM, depthM } = depthAlong(site, option.units, option.designs);
  const found = profileFor(site, { xM, depthM: depthM.map((depth) => depth + DEEPER_M) });
  if (!found.ok) return null;
  const { easedFor } = option.profile;
  const deeper = (easedFor && easedProfile(site, found.profile, easedFor)) ?? found.profile;
  const before = approachLines(site, option.profile);
  const after = approachLines(site, deeper);
  const more = (item: string): number => {
    const [now = 0, then = 0] = [before, after].map((lines) =>
      lines.reduce((sum, line) => (line.item === item ? sum + line.quantity : sum), 0),
    );
    return then - now;
  };
  return {
    fillM3: more('fill'),
    cutM3: more('excavation'),
    wallM2: faceM2(deeper) - faceM2(option.profile),
    surfacingM2: more('surfacing'),
    parapetM: more('parapet'),
    amount: costOf(after) - costOf(before),
  };
}
