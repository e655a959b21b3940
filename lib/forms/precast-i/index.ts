import { pretensioned } from '../common/precast/pretensioned.ts';
import { sizePrecast } from '../common/precast/sizePrecast.ts';
import type { FormModule } from '../formModule.ts';
import { iBeams } from './iBeams.ts';
import { mustBeSpliced, sizeSpliced } from './spliced/sizeSpliced.ts';
import { splicePlan } from './spliced/splicePlan.ts';

/**
 * Precast pretensioned I and bulb-tee beams in one piece under a slab cast in place: each span carries its own weight and
 * the wet slab by itself, the deck is continuous for traffic. `depthM` of the task is soffit to top of slab: the deepest
 * beam of the market that fits under slab and fill is taken, so that a deck may come out shallower than asked, and never
 * deeper unless the shallowest beam is. Spans of about 9 to 50 m, decks of 6 to 30 m.
 */
export const precastI: FormModule = {
  id: 'precast-i',
  family: 'girder',
  name: 'Precast I-beams',
  pattern: { kind: 'continuous' },
  methods: ['crane'],
  joined: 'after-placing',
  reads: ['girders'],
  temporaryTowersM: (task) =>
    mustBeSpliced(task) ? splicePlan(task.spansM, pretensioned.haul.lengthM).atM : [],
  size: (task) => (mustBeSpliced(task) ? sizeSpliced(task) : sizePrecast(iBeams, task)),
};
