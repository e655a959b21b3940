import { describe, expect, it } from 'vitest';
import { requestFor } from '../../lib/appraise/requestFor.ts';
import { formModule, sizeableForms } from '../../lib/forms/index.ts';
import { survey } from '../../lib/site/index.ts';
import { lowFerry } from './studies.ts';

const site = survey(lowFerry().brief);

describe('requestFor', () => {
  it.each(sizeableForms)(
    'requestFor(%s) gives every continuous unit of several spans its window of end spans from the rules',
    (form) => {
      const { pattern, methods, mostSpanM = Infinity } = formModule(form);
      const request = requestFor({ form, method: methods[0] }, site);
      const unit = pattern.kind === 'continuous' ? request.windows : request.approach!;
      const single = pattern.kind === 'continuous' && pattern.mostSpans === 1;
      expect(unit.endRatio).toEqual(single ? undefined : [0.5, 1]);
      expect(request.windows.minSpanM).toBeGreaterThan(0);
      expect(request.windows.maxSpanM).toBeLessThanOrEqual(mostSpanM);
      expect(request.windows.endRatio !== undefined).toBe(pattern.kind === 'continuous' && !single);
    },
  );
});
