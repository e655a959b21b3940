import { describe, expect, it } from 'vitest';
import { patternOf, requestFor } from '../../lib/appraise/requestFor.ts';
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
      expect(unit.endRatio).toEqual([0.5, 1]);
      expect(request.windows.minSpanM).toBeGreaterThan(0);
      expect(request.windows.maxSpanM).toBeLessThanOrEqual(mostSpanM);
      expect(request.windows.endRatio !== undefined).toBe(pattern.kind === 'continuous');
    },
  );
});

describe('patternOf', () => {
  const main = { form: 'cantilever-box', role: 'main', supportsM: [100, 160, 260, 320] } as const;

  it.each(['concrete-box', 'composite-i'] as const)(
    'patternOf(box cantilever with approaches of %s) is the pattern with such approaches',
    (form) => {
      const before = { form, role: 'approach', supportsM: [0, 50, 100] } as const;
      expect(patternOf('cantilever-box', [before, main])).toMatchObject({ kind: 'flanked', approach: form });
    },
  );

  it('patternOf(one unit) is the pattern of the form itself', () => {
    expect(patternOf('cantilever-box', [main])).toEqual(formModule('cantilever-box').pattern);
  });
});
