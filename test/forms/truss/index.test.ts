import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { truss } from '../../../lib/forms/truss/index.ts';
import type { UnitTask } from '../../../lib/model/index.ts';
import { floorDeck } from '../floor/cases.ts';

const task: UnitTask = {
  form: 'truss',
  spansM: [80],
  deck: floorDeck,
  standard: 'lm1',
  planRadiusM: Infinity,
  method: 'crane',
  depthM: 1.4,
  clearUnderM: [9, 9],
};

describe('truss.size(task)', () => {
  const design = truss.size(task);

  it('has only checks within 1 at 80 m and names the worst', () => {
    expect(design.checks.every(({ utilisation }) => utilisation <= 1.0001)).toBe(true);
    expect(design.limitingCheck.utilisation).toBe(
      Math.max(...design.checks.map(({ utilisation }) => utilisation)),
    );
    expect(design.warnings).toEqual([]);
  });

  it('keeps the floor depth as structural depth and chooses the truss height between span/10 and span/6', () => {
    expect(design.depthM).toEqual({ support: 1.4, midspan: 1.4 });
    expect(design.figures['trussHeightOverSpan']).toBeGreaterThanOrEqual(0.1 - 1e-9);
    expect(design.figures['trussHeightOverSpan']).toBeLessThanOrEqual(0.1667 + 1e-9);
  });

  it('reactions carry the weight of everything measured and the superimposed load', () => {
    const steelKN =
      ((quantityOf(design.lines, 'truss-steel') + quantityOf(design.lines, 'plate-girder-steel')) * 9.81) /
      1000;
    const slabKN = quantityOf(design.lines, 'deck-concrete') * 25;
    const total = design.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    // One end cross-girder stands on the bearings and is left out of the load on the trusses; own weight settles to 0.5 %.
    expect(total / (steelKN + slabKN + 40 * 80)).toBeGreaterThan(0.985);
    expect(total / (steelKN + slabKN + 40 * 80)).toBeLessThan(1.005);
  });

  it('chord tension is near M/h of a line girder with the whole load', () => {
    const h = design.figures['trussHeightM']!;
    const w = (2 * design.reactions[0]!.permanentKN) / 80 / 2;
    // Permanent part by hand at the factor 1.35; traffic of the worse plane lies between half of all and all lanes.
    const permanent = (1.35 * w * 80 ** 2) / 8 / h;
    const traffic = design.figures['bottomChordTensionKN']! - permanent;
    const allLanes = (1.35 * (2 * design.reactions[0]!.trafficMaxKN * 80)) / 8 / h;
    expect(traffic).toBeGreaterThan(allLanes * 0.5);
    expect(traffic).toBeLessThan(allLanes * 1.3);
  });

  it('draws members with thickness inside the span, the floor within its depth', () => {
    const members = design.elevation.filter(({ part }) => /chord|diagonal|post|hanger/u.test(part));
    expect(members.length).toBeGreaterThan(20);
    for (const shape of members) {
      expect(shape.thicknessM).toBeGreaterThan(0);
      for (const [x, z] of shape.points) {
        expect(x).toBeGreaterThanOrEqual(-1e-9);
        expect(x).toBeLessThanOrEqual(80 + 1e-9);
        expect(z).toBeGreaterThanOrEqual(-1.4);
      }
    }
    expect(design.sections[0]!.shapes.some(({ part }) => part === 'cross-girder')).toBe(true);
  });

  it('needs towers by crane and none floated in', () => {
    expect(quantityOf(design.lines, 'temporary-tower')).toBeGreaterThan(0);
    expect(quantityOf(truss.size({ ...task, method: 'float-in' }).lines, 'temporary-tower')).toBe(0);
  });

  it('says what it assumed when the height under the span is not given', () => {
    const { clearUnderM, ...rest } = task;
    expect(clearUnderM).toHaveLength(2);
    expect(truss.size(rest).warnings.join(' ')).toContain('not given');
  });

  it('several spans are simple spans, and say so', () => {
    const two = truss.size({ ...task, spansM: [80, 80], clearUnderM: [9, 9, 9] });
    expect(two.warnings.join(' ')).toContain('simple spans');
    expect(quantityOf(two.lines, 'truss-steel')).toBeCloseTo(2 * quantityOf(design.lines, 'truss-steel'), 3);
    expect(two.reactions[1]!.permanentKN).toBeCloseTo(2 * two.reactions[0]!.permanentKN, 6);
  });

  it('a floor too shallow for its cross-girders is overstressed and warned of', () => {
    const shallow = truss.size({ ...task, depthM: 0.6 });
    expect(shallow.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(shallow.warnings.length).toBeGreaterThan(0);
  });

  it('refuses spans it cannot be', () => {
    expect(() => truss.size({ ...task, spansM: [-80] })).toThrow(/spansM\[0\]/u);
    expect(() => truss.size({ ...task, spansM: [900] })).toThrow(/20 to 400 m/u);
  });
});
