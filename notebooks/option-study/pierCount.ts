import { formModule, type AppraisedOption, type Study, type Unit } from '../../lib/index.ts';
import { supportName } from '../drawing/alongOption.ts';
import { formLooks } from '../forms/formLook.ts';
import { fixed } from '../format.ts';
import { keptOf, placesOf, SAME_M, withKept, type Changed } from './handEdits.ts';
import { laidOn } from './spanChoices.ts';

/** Shortest span that is left beside a new pier, m. */
const LEAST_SPAN_M = 2;
/** Lengths typed for the two parts of a span may be this much off the whole: they are typed to the decimetre, m. */
const TYPED_M = 0.1;

const refused = (why: string): Changed => ({ ok: false, why });

/** Places of supports after one at `index` has come or gone, `by` being +1 or -1. */
const renumbered = (places: readonly number[], index: number, by: 1 | -1): number[] =>
  places.map((place) => (place >= index ? place + by : place));

/** The locks of an option whose supports are counted anew; nothing where none is left. */
const locks = (locked: readonly number[]): { readonly locked?: readonly number[] } =>
  locked.length > 0 ? { locked } : {};

/** Why a unit cannot have one span more, or null. */
function fullUnit({ form, role, supportsM }: Unit): string | null {
  const { pattern } = formModule(form);
  const name = formLooks[form].short.toLowerCase();
  const isOneSpan = pattern.kind === 'simple-main' && role === 'main';
  const most = isOneSpan ? 1 : pattern.kind === 'continuous' ? (pattern.mostSpans ?? Infinity) : Infinity;
  return supportsM.length - 1 < most
    ? null
    : `${name}: ${most === 1 ? 'one span' : `${fixed(most, 0)} spans`} and no more`;
}

/** The study with one pier more in a span of an option, at a chainage, m; in the middle of the span where none is given. */
export function withPierAdded(
  study: Study,
  option: AppraisedOption,
  span: number,
  chainageM?: number,
): Changed {
  const { locked = [], ...kept } = keptOf(study, option);
  const places = placesOf(kept.units);
  const [fromM, toM] = [places[span], places[span + 1]];
  if (fromM === undefined || toM === undefined) return refused('there is no such span');
  const at = Number((chainageM ?? (fromM + toM) / 2).toFixed(1));
  if (!(at >= fromM + LEAST_SPAN_M && at <= toM - LEAST_SPAN_M))
    return refused(`a pier stands at least ${fixed(LEAST_SPAN_M, 0)} m from the next support`);
  const home = kept.units.findIndex(
    ({ supportsM }) => supportsM[0]! < at && supportsM[supportsM.length - 1]! > at,
  );
  const unit = kept.units[home];
  if (unit === undefined) return refused('no unit of the option stands there');
  const full = fullUnit(unit);
  if (full !== null) return refused(full);
  const place = unit.supportsM.findIndex((x) => x > at);
  const wider: Unit = {
    ...unit,
    supportsM: unit.supportsM.toSpliced(place, 0, at),
    ...(unit.pylons && { pylons: renumbered(unit.pylons, place, 1) }),
  };
  return {
    ok: true,
    study: withKept(study, {
      ...laidOn(kept, kept.units.with(home, wider)),
      ...locks(renumbered(locked, span + 1, 1)),
    }),
  };
}

/** The study with one pier less in an option: the spans on either side become one. */
export function withPierRemoved(study: Study, option: AppraisedOption, index: number): Changed {
  const { locked = [], ...kept } = keptOf(study, option);
  const places = placesOf(kept.units);
  const at = places[index];
  const name = supportName(index, places.length);
  if (at === undefined || index <= 0 || index >= places.length - 1)
    return refused('only a pier can be removed');
  if (locked.includes(index)) return refused(`${name} is locked: unlock it first`);
  const here = (x: number): boolean => Math.abs(x - at) <= SAME_M;
  const homes = kept.units.filter(({ supportsM }) => supportsM.some(here));
  const home = homes[0];
  if (home === undefined || homes.length > 1) return refused(`two units meet at ${name}`);
  const place = home.supportsM.findIndex(here);
  if (home.pylons?.includes(place) === true) return refused(`${name} carries a pylon`);
  const narrower: Unit = {
    ...home,
    supportsM: home.supportsM.toSpliced(place, 1),
    ...(home.pylons && { pylons: renumbered(home.pylons, place, -1) }),
  };
  return {
    ok: true,
    study: withKept(study, {
      ...laidOn(kept, kept.units.with(kept.units.indexOf(home), narrower)),
      ...locks(renumbered(locked, index, -1)),
    }),
  };
}

/** The study with a span parted where its two new lengths were typed, m; together they are the span as it was. */
export function withSpanParted(
  study: Study,
  option: AppraisedOption,
  span: number,
  [firstM, secondM]: readonly [number, number],
): Changed {
  const places = placesOf(keptOf(study, option).units);
  const [fromM, toM] = [places[span], places[span + 1]];
  if (fromM === undefined || toM === undefined) return refused('there is no such span');
  const wholeM = toM - fromM;
  if (!(Math.abs(firstM + secondM - wholeM) <= TYPED_M + 1e-9))
    return refused(
      `the two parts must make up ${fixed(wholeM, 1)} m, and make ${fixed(firstM + secondM, 1)} m`,
    );
  return withPierAdded(study, option, span, fromM + firstM);
}
