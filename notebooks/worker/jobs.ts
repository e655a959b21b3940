import { appraiseSteps, memory } from '../../lib/index.ts';
import type { Study } from '../../lib/index.ts';

/** Kept as long as the worker lives: the next study is nearly always the last one with one thing changed. */
const kept = memory();

/** What the worker of the notebook does. */
export const jobs = { appraise: (study: Study) => appraiseSteps(study, kept) };
