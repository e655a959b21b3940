import { appraiseSteps } from '../../lib/index.ts';

/** What the worker of the notebook does. */
export const jobs = { appraise: appraiseSteps };
