import { faultsOf } from '../arrange/index.ts';
import {
  asMade,
  saidOf,
  type AppraisedOption,
  type MadeOption,
  type Study,
  type Unit,
} from '../model/index.ts';
import { siteOf } from '../site/index.ts';
import { appraiseOptionAt } from './appraiseOption.ts';
import { drawn } from './drawn.ts';
import { between, BEYOND_ABUTMENT } from './keptUnits.ts';
import type { Memory } from './memory.ts';
import { patternOf, requestFor } from './requestFor.ts';
import { workbench } from './workbench.ts';
import { mainUnit } from './workOption.ts';

/** An option as it stood, worked out again for a study that has changed since. */
export interface KeptAppraisal {
  /** Null where it cannot be worked out at all. */
  readonly option: AppraisedOption | null;
  /** Why it may not stand as it is; empty where nothing forbids it. */
  readonly faults: readonly string[];
}

/** Depth of each unit, m: the main unit as typed, the others and an untyped one as they were. */
function depthsOf(units: readonly Unit[], before: AppraisedOption, typedM: number | null): number[] {
  const { depthM } = before.designs[before.units.indexOf(mainUnit(before.units))]!.task;
  return units.map(({ role, form }, k) => {
    if (role === 'main') return typedM ?? depthM;
    const isLike = (unit: Unit | undefined): boolean => unit?.role === role && unit.form === form;
    const like = isLike(before.units[k]) ? k : before.units.findIndex(isLike);
    return before.designs[like]?.task.depthM ?? depthM;
  });
}

/**
 * Works out one option of an earlier appraisal for the study as it is now: as the study keeps it, or else as it stood, with
 * its arrangement and depths frozen. It is what a page shows while a figure is dragged, before the search has answered.
 * Price and checks are those of the pipeline. A brief that forbids the arrangement says why and throws nothing.
 *
 * @throws RangeError on books that cannot be drawn
 */
export function appraiseKept(study: Study, before: AppraisedOption, kept: Memory): KeptAppraisal {
  const bench = workbench(study, kept);
  const { site } = bench;
  const own = study.options.kept.find(({ number }) => number === before.number);
  const { number, form, method } = own ?? before;
  const units = between(site, (own ?? before).units);
  if (units === null) return { option: null, faults: [BEYOND_ABUTMENT] };
  const ownSite = siteOf(site, units);
  const depthsM = depthsOf(units, before, own?.depthM ?? null);
  const depthM = depthsM[units.indexOf(mainUnit(units))]!;
  const variant = asMade(own?.variant, before.variant ?? {}) ?? saidOf(own?.variant ?? {});
  const option: MadeOption = { number, form, method, units, depthM, variant, origin: 'kept' };
  const onDraws = drawn(bench);
  const faults = faultsOf(units, requestFor(option, ownSite, patternOf(form, units)), ownSite);
  try {
    return { option: appraiseOptionAt(bench, onDraws, option, depthsM).option, faults };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return { option: null, faults: [...faults, error.message] };
  }
}
