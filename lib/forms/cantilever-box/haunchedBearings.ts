import type { Check, SupportReaction } from '../../model/index.ts';
import { skewTurnings } from '../common/skewTurning.ts';
import { bearingChecks, bearingsApart } from '../concrete-box/boxBearings.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { haunchedSkew } from './haunchedSkew.ts';
import type { SizedHaunched } from './sizeHaunched.ts';

/**
 * Characteristic reactions of the whole deck: own weight through its stages and creep with diaphragms, superimposed
 * load, traffic. The parasitic part of the tendons adds up to nothing and is left out.
 */
export function haunchedReactions(model: CantileverModel, { weight }: SizedHaunched): SupportReaction[] {
  const { most } = model.traffic;
  const last = model.supportsM.length - 1;
  // At the two ends the reaction is the shear beside it.
  const end = (j: number): number =>
    j === 0 ? most.shearMaxKN[0]! : j === last ? -most.shearMinKN[most.shearMinKN.length - 1]! : 0;
  return model.supportsM.map((_, j) => ({
    permanentKN: weight.reactionKN[j]! + model.superimposed.reactionKN[j]!,
    trafficMaxKN: Math.max(most.reactionMaxKN[j]!, end(j)),
    trafficMinKN: most.reactionMinKN[j]!,
  }));
}

/** Distance of the two bearings at the supports, m: of a haunched box with leaning webs the least is over its piers. */
export function haunchedApart(
  { beam }: CantileverModel,
  { sections }: Pick<SizedHaunched, 'sections'>,
): number[] {
  return Array.from(beam.supportAt, (station) => bearingsApart(sections.bottomWidthM[station]!));
}

/** Uplift of one of two bearings and overturning, as of a box of constant depth; not where the deck is cast in. */
export function haunchedBearingChecks(model: CantileverModel, box: SizedHaunched): Check[] {
  const at = <T>(values: ArrayLike<T>): T[] =>
    Array.from(model.beam.supportAt, (station) => values[station]!);
  const skew = haunchedSkew(model, box.sections, box.weight);
  const castIn = new Set(model.heldPiers.map(({ support }) => support));
  return bearingChecks(
    {
      model,
      ownKNm: box.weight.lastingKNm,
      depthM: at(model.depthM),
      bottomWidthM: at(box.sections.bottomWidthM),
      skew: skewTurnings(skew, model.task.spansM, model.traffic.load.udlKNm),
      onTwo: model.supportsM.map((_, j) => !castIn.has(j)),
    },
    haunchedReactions(model, box),
  );
}
