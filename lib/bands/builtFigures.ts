import { described, formWords, type At, type Descriptor, type FormId } from '../model/index.ts';
import { builtSpans } from './builtSpans.ts';

const built = (at: At) => builtSpans(at.name('form') as FormId);
const words = (at: At): string => formWords(at.name('form') as FormId);

/** Spans of built bridges, as the record counts them; only of forms that it tells apart. */
export const builtFigures: readonly Descriptor[] = [
  ...([5, 50, 95] as const).map((percent) =>
    described({
      path: `built/:form/p${percent}`,
      when: (at) => built(at) !== null,
      label: (at) => `main span that ${percent} % of the built ${words(at)} do not exceed`,
      unit: 'm',
      kind: 'preset',
      method: 'as recorded',
      formula: (at) => `${built(at)!.recordedAs}; ${built(at)!.scope}`,
      value: (at) => built(at)![`p${percent}`],
      sources: (at) => [built(at)!.source],
    }),
  ),
  described({
    path: 'built/:form/count',
    when: (at) => built(at) !== null,
    label: (at) => `${words(at)} on record`,
    unit: 'no',
    kind: 'preset',
    method: 'as recorded',
    formula: (at) => `${built(at)!.recordedAs}; ${built(at)!.scope}`,
    value: (at) => built(at)!.count,
    sources: (at) => [built(at)!.source],
  }),
];
