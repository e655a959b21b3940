import type { AppraisedOption, MadeOption, Study } from '../model/index.ts';
import { survey } from '../site/index.ts';
import { onGrid, stepsPerM } from './depthGrid.ts';
import { depthRange } from './depthRange.ts';
import { spansOf } from './askedTask.ts';
import { mainUnit } from './workOption.ts';

/** Depths shown on either side of the one an option has. */
const EACH_SIDE = 4;
/** From one of them to the next. */
const STRIDE = 1.09;

/** The band inside which the depth of the main unit of an option is tried, m: published, and never under what can be made. */
export function depthBandOf(
  study: Study,
  { form, method, units, variant = {} }: Pick<AppraisedOption, 'form' | 'method' | 'units' | 'variant'>,
): readonly [least: number, most: number] {
  return depthRange(form, method, spansOf(mainUnit(units)), survey(study.brief), variant);
}

/**
 * An option at its own depth of the main unit, m, and at depths about it inside the published band, rising: worked out,
 * they show what depth does to the cost of the whole crossing. Never fewer than the option itself.
 */
export function depthTrials(study: Study, worked: AppraisedOption): readonly MadeOption[] {
  const { number, form, method, units, designs, variant = {} } = worked;
  const main = mainUnit(units);
  const ownM = designs[units.indexOf(main)]!.task.depthM;
  const [least, most] = depthBandOf(study, worked);
  const depths = new Set([ownM]);
  for (let k = -EACH_SIDE; k <= EACH_SIDE; k++) {
    const depthM = onGrid(ownM * STRIDE ** k);
    const isOwn = Math.abs(depthM - ownM) < 0.5 / stepsPerM(ownM);
    if (!isOwn && depthM >= least && depthM <= most) depths.add(depthM);
  }
  return [...depths]
    .sort((a, b) => a - b)
    .map((depthM) => ({ number, form, method, units, depthM, variant, origin: 'kept' }));
}
