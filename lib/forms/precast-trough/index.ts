import { sizePrecast } from '../common/precast/sizePrecast.ts';
import type { FormModule } from '../formModule.ts';
import { troughs } from './troughs.ts';

/**
 * Precast pretensioned open troughs under a slab cast in place, which closes them: open while they are handled, stiff in
 * torsion once the slab is hard. `depthM` of the task is soffit to top of slab; the deepest trough that fits under slab and
 * fill is taken. Spans of about 14 to 44 m, decks of 6 to 30 m.
 */
export const precastTrough: FormModule = {
  id: 'precast-trough',
  family: 'girder',
  name: 'Precast troughs',
  pattern: { kind: 'continuous' },
  methods: ['crane'],
  joined: 'after-placing',
  ignoresHeight: true,
  reads: ['girders'],
  size: (task) => sizePrecast(troughs, task),
};
