import type { UnitTask } from '../../model/index.ts';
import { depthBand, midspanDepthBand } from '../../rules/index.ts';
import { carries } from '../common/carries.ts';
import { limiting } from '../common/checks.ts';
import type { Check } from '../../model/index.ts';
import { cantileverData } from './cantileverData.ts';
import {
  cantileverBase,
  cantileverModel,
  type CantileverBase,
  type CantileverModel,
} from './cantileverModel.ts';
import { haunchedChecks } from './haunchedChecks.ts';
import { strandTotalKg } from './haunchedLines.ts';
import { sizeHaunched, type SizedHaunched } from './sizeHaunched.ts';

/** A deck sized with one depth over its piers. */
export interface HaunchedDeck {
  readonly model: CantileverModel;
  readonly box: SizedHaunched;
  readonly checks: readonly Check[];
}

/** Growth of the inertia with the depth that the first beam is made with; the sections found then say better. */
const firstPower = 3;
/** Difference of that power which asks for another beam. */
const samePower = 0.25;

/**
 * Depths over the piers across the published band (with a midspan beyond its own band as far beyond this), deepest first
 * (a shallower box is nowhere thinner, so that each starts from the one before), none less than at midspan: the one with
 * the least worth of concrete and strand among those that hold; where none holds the one that comes nearest, with
 * upright webs if those do better.
 */
export function choosePierDepth(task: UnitTask): HaunchedDeck {
  const base = cantileverBase(task);
  const count = cantileverData.depthTrials.value;
  const [least, inBand] = depthBand('cantilever-box', 'continuous');
  const most = inBand * beyondBand(task.depthM / base.governingM);
  const depths =
    base.arms.length === 0
      ? [task.depthM]
      : [
          ...new Set(
            Array.from({ length: count }, (_, k) =>
              Math.max(task.depthM, (most - ((most - least) * k) / (count - 1)) * base.governingM),
            ),
          ),
        ];
  let best: Trial | null = null;
  let before: Trial | null = null;
  for (const depthM of depths) {
    const trial: Trial = trialOf(sized(base, depthM, before?.deck ?? null, false));
    if (best === null || better(trial, best)) best = trial;
    // Worth has one lowest place: once it rises, or nothing holds any more, a shallower pier is no better.
    else break;
    before = trial;
  }
  // Upright webs leave more width to the bottom slab, where the depth alone does not do.
  if (!carries(best!.use) && base.arms.length > 0) {
    const upright = trialOf(sized(base, best!.deck.model.pierDepthM, best!.deck, true));
    if (better(upright, best!)) best = upright;
  }
  return best!.deck;
}

/** How many times the deepest published depth a midspan is, none less than once: over the piers as much is tried beyond the band. */
function beyondBand(midspanRatio: number): number {
  return Math.max(1, midspanRatio / midspanDepthBand('cantilever-box')![1]);
}

interface Trial {
  readonly deck: HaunchedDeck;
  readonly worth: number;
  readonly use: number;
}

function trialOf(deck: HaunchedDeck): Trial {
  return { deck, worth: worthM3(deck), use: limiting(deck.checks).utilisation };
}

function better(one: Trial, other: Trial): boolean {
  const holds = carries(one.use);
  if (holds !== carries(other.use)) return holds;
  return holds ? one.worth < other.worth : one.use < other.use;
}

/**
 * Sizes on a beam with the stiffness of the deck before (a usual one where there is none), and once more where the
 * sections found are stiffer or softer over the piers.
 */
function sized(
  base: CantileverBase,
  pierDepthM: number,
  before: HaunchedDeck | null,
  upright: boolean,
): HaunchedDeck {
  const guess = before ? powerOf(before) : firstPower;
  let model = cantileverModel(base, pierDepthM, guess, upright);
  let box = sizeHaunched(model, before?.box ?? null);
  const power = powerOf({ model, box });
  if (Math.abs(power - guess) > samePower) {
    model = cantileverModel(base, pierDepthM, power, upright);
    box = sizeHaunched(model, box);
  }
  return { model, box, checks: haunchedChecks(model, box) };
}

/** Power of the depth by which the inertia grows towards the piers. */
function powerOf({ model, box }: Pick<HaunchedDeck, 'model' | 'box'>): number {
  const deeper = Math.log(model.pierDepthM / model.task.depthM);
  const { pier, midspan } = box.sections;
  return deeper > 0.05 ? Math.log(pier.inertiaM4 / midspan.inertiaM4) / deeper : firstPower;
}

/** Concrete and strand as cubic metres of box. */
function worthM3({ model, box }: HaunchedDeck): number {
  return box.weight.boxM3 + strandTotalKg(model, box) / cantileverData.strandWorth.kgPerM3;
}
