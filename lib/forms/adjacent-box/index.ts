import { sizePrecast } from '../common/precast/sizePrecast.ts';
import type { FormModule } from '../formModule.ts';
import { boxBeams } from './boxBeams.ts';

/**
 * Precast pretensioned box beams laid side by side, joined by grouted keys, ties across and a thin topping: torsion and the
 * shear of the keys share the load out. `depthM` of the task is soffit to top of topping; the deepest box that fits is taken.
 * Spans of about 9 to 43 m, decks of 6 to 30 m.
 */
export const adjacentBox: FormModule = {
  id: 'adjacent-box',
  family: 'box',
  name: 'Adjacent box beams',
  pattern: { kind: 'continuous' },
  methods: ['crane'],
  joined: 'never',
  ignoresHeight: true,
  reads: ['girders'],
  size: (task) => sizePrecast(boxBeams, task),
};
