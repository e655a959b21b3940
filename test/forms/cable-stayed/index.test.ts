import { describe, expect, it } from 'vitest';
import { liftedSupports } from '../../../lib/appraise/liftedSupports.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { cableStayed } from '../../../lib/forms/cable-stayed/index.ts';
import type { UnitTask } from '../../../lib/model/index.ts';

const task: UnitTask = {
  form: 'cable-stayed',
  spansM: [80, 200, 80],
  pylons: [1, 2],
  deck: {
    widthM: 16,
    carriagewayM: 11,
    carriagewayOffsetM: 0,
    lanes: 3,
    footwayM: 3,
    surfacingM: 0.09,
    superimposedKNm: 55,
  },
  standard: 'lm1',
  planRadiusM: Infinity,
  method: 'stay-cantilever',
  depthM: 1.9,
  clearUnderM: [10, 22, 22, 10],
};

describe('cableStayed.size(task)', () => {
  const design = cableStayed.size(task);

  it('holds up all of its lasting load, and traffic reactions of a full deck add up', () => {
    const total = design.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    expect(total).toBeCloseTo(design.figures['permanentKNm']! * 360, 3);
  });

  it('lasting load is what its lines weigh and the superimposed load, own weight settled to 0.5 %', () => {
    const deck = design.lines.filter(({ part }) => part === 'deck');
    const steelKN = (quantityOf(deck, 'plate-girder-steel') * 9.81) / 1000;
    const staysKN = (quantityOf(deck, 'stay-cable') * 9.81) / 2000;
    const slabKN = quantityOf(deck, 'deck-concrete') * 25;
    const total = steelKN + staysKN + slabKN + 55 * 360;
    // One cross-girder more than bays is measured.
    expect(design.figures['permanentKNm']! * 360).toBeGreaterThan(0.985 * total);
    expect(design.figures['permanentKNm']! * 360).toBeLessThan(1.01 * total);
  });

  it('has its checks within 1 and names the worst', () => {
    expect(design.checks.every(({ utilisation }) => utilisation <= 1.0001)).toBe(true);
    expect(design.limitingCheck.utilisation).toBe(
      Math.max(...design.checks.map(({ utilisation }) => utilisation)),
    );
  });

  it('anchor piers are pulled up and it says so', () => {
    expect(design.reactions[0]!.permanentKN).toBeLessThan(0);
    expect(liftedSupports(design)).toHaveLength(2);
  });

  it('pylons are measured above and below the deck, on their own supports', () => {
    const pylons = design.lines.filter(({ part }) => part === 'pylons');
    expect(new Set(pylons.map(({ support }) => support))).toEqual(new Set([1, 2]));
    expect(pylons.some(({ what }) => what.includes('below'))).toBe(true);
    const lower = cableStayed.size({ ...task, clearUnderM: [10, 5, 5, 10] });
    expect(quantityOf(lower.lines, 'pylon-concrete')).toBeLessThan(
      quantityOf(design.lines, 'pylon-concrete'),
    );
  });

  it('draws every stay of one plane from the deck to the pylon, and legs down to the ground', () => {
    const stays = design.elevation.filter(({ material }) => material === 'stay');
    expect(stays).toHaveLength(design.figures['staysPerPlane']!);
    for (const { points } of stays) {
      expect(points[0]![1]).toBe(0);
      expect([80, 280]).toContain(Math.round(points[1]![0]));
      expect(points[1]![1]).toBeLessThanOrEqual(design.figures['pylonHeightM']! + 1e-9);
    }
    const legs = design.elevation.filter(({ part }) => part === 'pylon');
    expect(Math.min(...legs.flatMap(({ points }) => points.map(([, z]) => z)))).toBeCloseTo(
      -22 - task.depthM,
      9,
    );
    expect(design.sections.map(({ at }) => at)).toEqual(['midspan', 'pylon']);
  });

  it('finds its pylons when the task does not name them, and says what height it assumed', () => {
    const { pylons, clearUnderM, ...bare } = task;
    expect([pylons, clearUnderM]).toBeDefined();
    const found = cableStayed.size(bare);
    expect(found.figures['pylons']).toBe(2);
    expect(found.warnings.join(' ')).toContain('not given');
  });

  it('a mirrored bridge is the mirror image', () => {
    const one = cableStayed.size({ ...task, spansM: [70, 120], pylons: [1], clearUnderM: [10, 22, 10] });
    const other = cableStayed.size({ ...task, spansM: [120, 70], pylons: [1], clearUnderM: [10, 22, 10] });
    for (const item of ['plate-girder-steel', 'stay-cable', 'pylon-concrete', 'deck-concrete'])
      expect(quantityOf(one.lines, item) / quantityOf(other.lines, item)).toBeCloseTo(1, 6);
    one.reactions.forEach((reaction, i) =>
      expect(reaction.permanentKN).toBeCloseTo(other.reactions[2 - i]!.permanentKN, 3),
    );
  });

  it('is sized for main spans from 60 to 600 m; nothing but the deck beyond the reach of the load model may be over its limit', () => {
    for (const main of [60, 100, 400, 600]) {
      const sized = cableStayed.size({
        ...task,
        spansM: [0.42 * main, main, 0.42 * main],
        depthM: Math.max(1.6, main / 200),
        clearUnderM: [10, 22, 22, 10],
      });
      expect(sized.reactions).toHaveLength(4);
      // At 600 m with lane loads written for 200 m the compressed edge girders are the first to give out.
      const over = sized.checks.filter(({ utilisation }) => utilisation > 1.0001).map(({ id }) => id);
      expect(
        main < 600 ? over : over.filter((id) => id !== 'edge-girder' && id !== 'slab-compression'),
      ).toEqual([]);
      expect(quantityOf(sized.lines, 'stay-cable')).toBeGreaterThan(0);
    }
  });

  it('refuses what cannot be', () => {
    expect(() => cableStayed.size({ ...task, spansM: [200], pylons: [0] })).toThrow(/inner supports/u);
    expect(() => cableStayed.size({ ...task, depthM: 0 })).toThrow(/depthM/u);
  });
});
