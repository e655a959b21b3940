import { formModule } from '../forms/index.ts';
import type { MadeOption, Site, Unit, UnitTask } from '../model/index.ts';

/** Spans of a unit, m. */
export function spansOf(unit: Unit): number[] {
  return unit.supportsM.slice(1).map((x, i) => x - unit.supportsM[i]!);
}

/** The skew a unit is sized for: none where the supports are square or nobody knows; + and - are mirror images. */
export const skewOn = ({ skewDeg }: Pick<Site, 'skewDeg'>): Pick<UnitTask, 'skewDeg'> =>
  skewDeg === null || skewDeg === 0 ? {} : { skewDeg: Math.abs(skewDeg) };

/** What a unit of an option is asked to be, but for its depth and what it stands over. */
export function askedTask(
  site: Site,
  { method, variant = {} }: Pick<MadeOption, 'method' | 'variant'>,
  unit: Unit,
): Omit<UnitTask, 'depthM'> {
  const isMain = unit.role === 'main';
  // A ratio of depths is one only beside a depth.
  const { haunchRatio: _depths, ...choices } = variant;
  return {
    form: unit.form,
    method: isMain ? method : formModule(unit.form).methods[0],
    spansM: spansOf(unit),
    deck: site.deck,
    standard: site.standard,
    planRadiusM: site.planRadiusM ?? Infinity,
    ...skewOn(site),
    ...(isMain ? choices : {}),
    ...(unit.pylons ? { pylons: unit.pylons } : {}),
  };
}
