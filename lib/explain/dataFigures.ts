import { described, type Descriptor } from '../model/index.ts';
import { shelved } from './shelf.ts';

/** Figures of the data files: each says its own unit and source. */
export const dataFigures: readonly Descriptor[] = [
  described({
    path: 'data/*',
    when: (at) => shelved(at.name('*')) !== undefined,
    label: (at) => shelved(at.name('*'))!.label,
    unit: (at) => shelved(at.name('*'))!.unit,
    kind: 'preset',
    method: 'figure of practice',
    formula: 'taken as it is',
    sources: (at) => {
      const { source } = shelved(at.name('*'))!;
      return source === null ? [] : [source];
    },
  }),
];
