import type { Arrangement, Dropped, Option, OptionsSlice, RegisterEntry, Site } from '../model/index.ts';
import { keptUnits } from './keptUnits.ts';

/** Options with their numbers, and the register as the study keeps it from now on. */
export interface Registered {
  readonly options: readonly Option[];
  readonly register: readonly RegisterEntry[];
  /** Numbers given before that nothing proposes any more. */
  readonly retired: readonly number[];
  /** Options kept by hand that cannot be worked out, each with the reasons. */
  readonly unworkable: readonly Dropped[];
}

/** Supports of an arrangement, abutments included; neighbouring units share one. */
function supportsOf(units: Arrangement['units']): number {
  return units.reduce((sum, unit) => sum + unit.supportsM.length - 1, 1);
}

/**
 * Numbers the proposals. A proposal is known by form, method and number of supports and keeps its number for life; a new
 * one takes the next free number in the order in which proposals come. Options kept by hand hold their own numbers.
 * Of two proposals that are known by the same three the first stays. A kept option that cannot be worked out on the site
 * holds its number too.
 */
export function numberOptions(
  proposals: readonly Arrangement[],
  slice: OptionsSlice,
  site: Site,
): Registered {
  const register = [...slice.register];
  const kept: Option[] = [];
  const unworkable: Dropped[] = [];
  for (const option of slice.kept) {
    const placed = keptUnits(site, option);
    if ('units' in placed) kept.push({ ...option, units: placed.units, origin: 'kept' });
    else unworkable.push({ form: option.form, option: option.number, because: placed.because });
  }
  const taken = new Set(slice.kept.map((option) => option.number));
  let next = Math.max(0, ...register.map((entry) => entry.number), ...taken) + 1;
  const proposed: Option[] = [];
  for (const { form, method, units } of proposals) {
    const supports = supportsOf(units);
    let entry = register.find((e) => e.form === form && e.method === method && e.supports === supports);
    if (!entry) {
      entry = { number: next, form, method, supports };
      next += 1;
      register.push(entry);
    }
    // A kept option has taken this proposal's place under its number.
    if (taken.has(entry.number)) continue;
    taken.add(entry.number);
    proposed.push({ number: entry.number, form, method, units, depthM: null, origin: 'proposed' });
  }
  return {
    options: [...kept, ...proposed].sort((a, b) => a.number - b.number),
    register,
    retired: register.map((entry) => entry.number).filter((number) => !taken.has(number)),
    unworkable,
  };
}
