import {
  described,
  formWords,
  type At,
  type Descriptor,
  type FormId,
  type MethodId,
} from '../model/index.ts';
import { rulesFor } from './book.ts';
import type { Subject } from './rule.ts';
import {
  depthBand,
  endRatioWindow,
  floorBand,
  haunchedDepthBands,
  midspanDepthBand,
  spanWindow,
  type Interval,
} from './windows.ts';

const form = (at: At): FormId => at.name('form') as FormId;

/** Sources of the rules of a form that speak of one subject. */
const sourcesOn =
  (subject: Subject) =>
  (at: At): string[] => [
    ...new Set(rulesFor(form(at)).flatMap((rule) => (rule.subject === subject ? rule.sources : []))),
  ];

const window = (
  what: string,
  label: string,
  unit: string,
  formula: string,
  subject: Subject,
  of: (at: At) => Interval,
): Descriptor[] =>
  (['least', 'most'] as const).map((end, i) =>
    described({
      path: `windows/:form/${what}/${end}`,
      label: (at) => `${end} ${label} of ${formWords(form(at))}`,
      unit,
      kind: 'preset',
      method: 'rules',
      formula,
      value: (at) => of(at)[i]!,
      sources: sourcesOn(subject),
    }),
  );

const any: Interval = [NaN, NaN];

/** Windows that the rules leave to the search. */
export const windowFigures: readonly Descriptor[] = [
  ...window(
    'span',
    'span',
    'm',
    'what no rule of the form puts out',
    'span',
    (at) => spanWindow(form(at)).possible,
  ),
  ...window(
    'usual',
    'usual span',
    'm',
    'range that guidance favours, at least',
    'span',
    (at) => spanWindow(form(at)).usual,
  ),
  ...window(
    'endRatio',
    'end span over the next',
    '',
    'what rules leave without a caution',
    'layout',
    (at) => endRatioWindow(form(at)) ?? any,
  ),
  ...window(
    'depth/:continuity/:method',
    'depth over span',
    '',
    'band that published guidance favours',
    'depth',
    (at) =>
      depthBand(form(at), at.name('continuity') as 'simple' | 'continuous', at.name('method') as MethodId),
  ),
  ...window(
    'midspan',
    'midspan depth over span',
    '',
    'band that published guidance favours',
    'depth',
    (at) => midspanDepthBand(form(at)) ?? any,
  ),
  ...(['midspan', 'pier'] as const).flatMap((place) =>
    window(
      `haunched/${place}`,
      `${place} depth of haunched units over span`,
      '',
      'band that published guidance favours',
      'depth',
      (at) => haunchedDepthBands(form(at))?.[place] ?? any,
    ),
  ),
  ...window(
    'floor',
    'floor depth over deck width',
    '',
    'band that published guidance favours',
    'depth',
    (at) => floorBand(form(at)) ?? any,
  ),
];

/** Paths of the published band behind the depth of a unit, and what it is measured by. */
export function depthWindow(
  { form: of, method, spansM }: { form: FormId; method: MethodId; spansM: readonly number[] },
  isHaunched: boolean,
): { readonly paths: readonly string[]; readonly by: 'span' | 'deck width' } {
  const ends = ['least', 'most'] as const;
  if (floorBand(of)) return { paths: ends.map((end) => `windows/${of}/floor/${end}`), by: 'deck width' };
  if (isHaunched && haunchedDepthBands(of)) {
    const places = ['midspan', 'pier'] as const;
    const paths = places.flatMap((place) => ends.map((end) => `windows/${of}/haunched/${place}/${end}`));
    return { paths, by: 'span' };
  }
  if (midspanDepthBand(of)) return { paths: ends.map((end) => `windows/${of}/midspan/${end}`), by: 'span' };
  const continuity = spansM.length > 1 ? 'continuous' : 'simple';
  return { paths: ends.map((end) => `windows/${of}/depth/${continuity}/${method}/${end}`), by: 'span' };
}
