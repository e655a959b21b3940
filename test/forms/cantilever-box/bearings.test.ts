import { describe, expect, it } from 'vitest';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import type { Check, UnitTask } from '../../../lib/model/index.ts';
import { cantileverTask } from './cases.ts';

const at = (changes: Partial<UnitTask> = {}) =>
  cantileverBox.size(cantileverTask([90, 150, 90], 3.5, changes));
const of = ({ checks }: { checks: readonly Check[] }, id: string) => checks.find((check) => check.id === id);

describe('bearing checks of a cantilevered box', () => {
  it('agree with eccentric traffic on its end span worked out by hand', () => {
    const design = at();
    const uplift = of(design, 'bearing-uplift')!;
    // LM1 on 11 m: lanes at 4 and 1 m, the third on the other side: 600 x 4 + 400 x 1 = 2,800 kNm of vehicles, 27 x 4 +
    // 7.5 x 1 = 115.5 kN of uniform load, on half of 90 m: 115.5 x 45 = 5,198; 7,998 kNm in all, no farther out than 4 m.
    const torque = 2800 + 115.5 * 45;
    const lastingKN = design.reactions[0]!.permanentKN;
    // Half of the lasting reaction stands on each of the two bearings; the ends have least of it.
    expect(uplift.capacity).toBeCloseTo(lastingKN / 2, 6);
    // demand = 1.35 (T - T / 4 x apart / 2) / apart = 1.35 T (1 / apart - 1 / 8).
    const apartM = 1 / (uplift.demand / (1.35 * torque) + 1 / 8);
    // The soffit of the end is wider than that over the piers, where the bearings stand closest.
    expect(apartM).toBeGreaterThan(design.figures['bearingsApartM']!);
    expect(apartM).toBeLessThan(design.figures['webSpacingM']! * design.figures['cells']!);
  });

  it('hold the whole deck by its lasting reactions at half the least distance', () => {
    const design = at();
    const sum = design.reactions.reduce((total, { permanentKN }) => total + permanentKN, 0);
    expect(of(design, 'overturning')!.capacity).toBeCloseTo((sum * design.figures['bearingsApartM']!) / 2, 3);
  });

  it('are used more as the curve tightens', () => {
    const uses = [Infinity, 1000, 400].map((planRadiusM) => {
      const design = at({ planRadiusM });
      return ['bearing-uplift', 'overturning'].map((id) => of(design, id)!.utilisation);
    });
    for (const k of [0, 1]) {
      expect(uses[1]![k]).toBeGreaterThan(uses[0]![k]!);
      expect(uses[2]![k]).toBeGreaterThan(uses[1]![k]!);
    }
  });

  it('choose a shallower pier with a wider soffit where deep ones stand too close on a curve', () => {
    const [wide, tight] = [400, 300].map((planRadiusM) => at({ planRadiusM }));
    expect(tight!.depthM.support).toBeLessThan(wide!.depthM.support);
    expect(tight!.figures['bearingsApartM']).toBeGreaterThan(wide!.figures['bearingsApartM']!);
    expect(of(tight!, 'bearing-uplift')!.utilisation).toBeLessThanOrEqual(1);
  });

  it('leave piers out that are cast in: the ends alone may lift, and nothing overturns about bearings', () => {
    const castIn = at({ castInPiers: 2 });
    expect(of(castIn, 'bearing-uplift')!.capacity).toBeCloseTo(castIn.reactions[0]!.permanentKN / 2, 6);
    expect(of(castIn, 'overturning')).toBeUndefined();
  });
});
