import { describe, expect, it } from 'vitest';
import { arrangementFacts } from '../../lib/appraise/facts.ts';
import { workbench } from '../../lib/appraise/workbench.ts';
import { formModule } from '../../lib/forms/index.ts';
import type { FormId, MethodId, Unit } from '../../lib/index.ts';
import { lowFerry } from '../appraise/studies.ts';

const towers = (form: FormId, method: MethodId, spansM: readonly number[]): readonly number[] =>
  formModule(form).temporaryTowersM?.({ method, spansM: [...spansM] }) ?? [];

describe('temporaryTowersM({spansM, method})', () => {
  it('a truss put together by crane stands on towers about every 35 m, one floated in on none', () => {
    expect(towers('truss', 'crane', [63])).toEqual([31.5]);
    expect(towers('truss', 'crane', [90, 35])).toEqual([30, 60]);
    expect(towers('truss', 'float-in', [63])).toEqual([]);
  });

  it('of a steel box the longest inner spans are cantilevered, the others stand on towers 45 m apart', () => {
    expect(towers('steel-box', 'balanced-cantilever', [80, 120, 80])).toEqual([40, 240]);
    expect(towers('steel-box', 'crane', [80, 120])).toEqual([40, 120, 160]);
    expect(towers('steel-box', 'launch', [80, 120, 80])).toEqual([]);
  });

  it('precast beams that are hauled in pieces stand on towers under their splices, others on none', () => {
    expect(towers('precast-i', 'crane', [40, 45, 40])).toEqual([]);
    const at = towers('precast-i', 'crane', [50, 63, 50]);
    expect(at.length).toBe(2);
    expect(at[0]! - 50).toBeCloseTo(113 - at[1]!, 9);
  });

  it('girders and boxes set in one piece or cast need none', () => {
    for (const form of ['composite-i', 'composite-box', 'concrete-box', 'slab'] as const)
      expect(towers(form, formModule(form).methods[0], [40, 60, 40])).toEqual([]);
  });
});

describe('arrangementFacts(site, option).towersBarred', () => {
  const { site } = workbench(lowFerry());
  const barred = (form: FormId, method: MethodId, supportsM: readonly number[]): unknown => {
    const units: readonly Unit[] = [{ form, role: 'main', supportsM: [...supportsM] }];
    return arrangementFacts(site, { method, units })['towersBarred'];
  };

  it('counts towers in the river, in which no support may stand', () => {
    expect(barred('truss', 'crane', [1323.5, 1386.5])).toBe(1);
    expect(barred('truss', 'float-in', [1323.5, 1386.5])).toBe(0);
    expect(barred('composite-i', 'crane', [1240, 1323.5, 1386.5, 1470])).toBe(0);
  });

  it('counts none on land', () => {
    expect(barred('truss', 'crane', [1386.5, 1440])).toBe(0);
  });
});
