import type { Study } from '../model/index.ts';

/**
 * What of a study its answer hangs on: views, numbers given before, what is confirmed of its start values, priorities, notes
 * and the decision are left out. The same study with other notes asks the same.
 */
export const askedOf = (study: Study): Study => ({
  ...study,
  assumed: [],
  options: { ...study.options, reference: null, register: [] },
  priorities: { weights: {} },
  notes: [],
  decision: null,
});
