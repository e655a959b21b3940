import { breather } from './breather.ts';
import { jobs } from './jobs.ts';
import { serve } from './serve.ts';

serve(self, jobs, { now: () => performance.now(), breathe: breather(), tellEveryMs: 100 });
