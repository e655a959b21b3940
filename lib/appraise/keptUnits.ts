import { formModule } from '../forms/index.ts';
import { abutmentWindows } from '../site/index.ts';
import { sentences } from '../messages/index.ts';
import { saidOf, type KeptOption, type Problem, type Site, type Unit } from '../model/index.ts';
import { askedTask } from './askedTask.ts';
import { PIER_HALF_WIDTH_M } from './requestFor.ts';

export const BEYOND_ABUTMENT = 'a support would stand beyond an abutment';

const within = (x: number, [fromM, toM]: readonly [number, number]): number =>
  Math.min(toM, Math.max(fromM, x));

/**
 * The same supports, with the abutments where the brief has them now, or as near to where they were as its windows leave
 * them; null where a support would lie beyond one.
 */
export function between(site: Site, units: readonly Unit[]): Unit[] | null {
  const last = units.length - 1;
  const windows = abutmentWindows(site, PIER_HALF_WIDTH_M);
  const startM = within(units[0]!.supportsM[0]!, windows.start);
  const endM = within(units[last]!.supportsM.at(-1)!, windows.end);
  const moved = units.map((unit, u) => ({
    ...unit,
    supportsM: unit.supportsM.map((x, i) =>
      u === 0 && i === 0 ? startM : u === last && i === unit.supportsM.length - 1 ? endM : x,
    ),
  }));
  const rises = moved.every(({ supportsM }) => supportsM.every((x, i) => i === 0 || x > supportsM[i - 1]!));
  return rises ? moved : null;
}

/** Why a unit cannot be sized as it is laid out, or null. */
function unsizeable({ form, supportsM, pylons = [] }: Unit): string | null {
  const { name, pattern, mostSpanM = Infinity } = formModule(form);
  const longest = Math.max(...supportsM.slice(1).map((x, i) => x - supportsM[i]!));
  if (longest > mostSpanM) {
    return `${name}: ${Number(longest.toFixed(1))} m cannot be sized; ${Number(mostSpanM.toFixed(1))} m is the longest span`;
  }
  if (pattern.kind !== 'pylon') return null;
  const inner = pylons.every((p, i) => p > (pylons[i - 1] ?? 0) && p < supportsM.length - 1);
  return inner && (pylons.length === 1 || pylons.length === 2)
    ? null
    : `${name}: one or two pylons on inner supports expected`;
}

/** Choices of a form as an option kept by hand asks for them. */
type Chosen = Pick<KeptOption, 'form' | 'method' | 'units' | 'variant'>;

const haunchOverNothing: Problem = {
  code: 'refused',
  path: ['haunchRatio'],
  expected: 'spans that go on over inner supports',
  received: 'a single span, with none to be deeper over',
  remedy: 'Leave the haunch out or add a pier',
};

/** Why the main units of an option cannot be made as its choices ask, by paths of its variant; none where they can. */
export function choiceFaults(site: Site, { form, method, units, variant = {} }: Chosen): readonly Problem[] {
  const module = formModule(form);
  const said = saidOf(variant);
  const isHaunched = said.haunchRatio !== undefined;
  return units
    .filter(({ role }) => role === 'main')
    .flatMap((unit) => [
      ...(isHaunched && unit.supportsM.length === 2 ? [haunchOverNothing] : []),
      ...(module.faults?.(askedTask(site, { method, variant: said }, unit)) ?? []),
    ]);
}

/** Units of an option kept by hand on the crossing as it is now, or why it cannot be worked out at all. */
export function keptUnits(
  site: Site,
  { form, method, units, variant = {} }: Chosen,
): { readonly units: readonly Unit[] } | { readonly because: readonly string[] } {
  const placed = between(site, units);
  if (placed === null) return { because: [BEYOND_ABUTMENT] };
  const because = placed.map(unsizeable).filter((fault) => fault !== null);
  const { name, choices = [] } = formModule(form);
  const foreign = Object.keys(variant).filter((key) => !choices.some((choice) => choice === key));
  if (foreign.length > 0) {
    const has = choices.length === 0 ? 'it is made in one way only' : `it has ${choices.join(', ')}`;
    because.push(`${name}: ${foreign.join(', ')} cannot be chosen; ${has}`);
  } else {
    const faults = choiceFaults(site, { form, method, units: placed, variant });
    because.push(...sentences(faults).map((text) => `${name}: ${text}`));
  }
  return because.length > 0 ? { because } : { units: placed };
}
