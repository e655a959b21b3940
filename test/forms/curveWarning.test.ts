import { expect, it } from 'vitest';
import { formModule } from '../../lib/forms/index.ts';
import { girderTask } from './composite-i/cases.ts';

it.each([
  ['slab', [15, 20, 15], 1, /straight deck/u],
  ['portal-frame', [20], 0.9, /straight deck/u],
  ['concrete-box', [35, 45, 35], 2.1, /bending is that of a straight deck/u],
  ['cantilever-box', [65, 110, 65], 3, /bending is that of a straight deck/u],
] as const)(
  'size(%s) says what a curve leaves out from 12 degrees a span on',
  (form, spansM, depthM, says) => {
    const turning = (degrees: number): string => {
      const planRadiusM = (Math.max(...spansM) * 180) / Math.PI / degrees;
      const method = formModule(form).methods[0];
      return formModule(form)
        .size({ ...girderTask(spansM, depthM, { planRadiusM }), form, method })
        .warnings.join(' ');
    };
    expect(turning(13)).toMatch(says);
    expect(turning(13)).toContain('turns through 13°');
    expect(turning(11)).not.toMatch(says);
  },
);
