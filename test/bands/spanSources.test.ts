import { describe, expect, it } from 'vitest';
import { spanSources } from '../../lib/bands/spanSources.ts';
import { formIds } from '../../lib/model/index.ts';
import { source, spanWindow } from '../../lib/rules/index.ts';

const foot = 0.3048;

describe('spanSources(form)', () => {
  it.each(formIds)('%s has at least one source, each in the bibliography, with an end at least', (form) => {
    const ranges = spanSources(form);
    expect(ranges.length).toBeGreaterThan(0);
    for (const { source: id, fromM, toM } of ranges) {
      expect(source(id).id).toBe(id);
      expect(fromM ?? toM).not.toBeNull();
      if (fromM !== null && toM !== null) expect(fromM).toBeLessThan(toM);
    }
  });

  /** Khan 2010, table 1.2 (read), feet. */
  it.each([
    ['slab', 20, 50],
    ['adjacent-box', 50, 140],
    ['precast-i', 30, 150],
    ['composite-i', 60, 300],
    ['composite-box', 100, 600],
    ['concrete-box', 140, 200],
    ['cantilever-box', 130, 750],
    ['truss', 500, 1800],
    ['deck-arch', 500, 1700],
    ['suspension', 1000, 6500],
  ] as const)('%s: Khan gives %d to %d ft', (form, fromFt, toFt) => {
    const khan = spanSources(form).find((one) => one.source === 'khan-2010')!;
    expect(Math.abs(khan.fromM! - fromFt * foot)).toBeLessThan(0.6);
    expect(Math.abs(khan.toM! - toFt * foot)).toBeLessThan(0.6);
  });

  it.each(formIds)('%s: what is usual lies inside what some source names', (form) => {
    const { usual } = spanWindow(form);
    const ranges = spanSources(form);
    expect(Math.max(...ranges.map(({ toM }) => toM ?? Infinity))).toBeGreaterThanOrEqual(usual[1]);
    expect(Math.min(...ranges.map(({ fromM }) => fromM ?? 0))).toBeLessThanOrEqual(usual[0]);
  });
});
