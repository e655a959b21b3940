import { describe, expect, it } from 'vitest';
import { formModule } from '../../lib/forms/index.ts';
import type { Design, FormId, UnitTask } from '../../lib/model/index.ts';
import { skewOn } from '../../lib/appraise/askedTask.ts';
import { girderTask } from './composite-i/cases.ts';

/** Units of the forms whose shears mind a skew, each of ordinary proportions. */
const units: readonly (readonly [FormId, readonly number[], number])[] = [
  ['composite-i', [40, 50, 40], 2.1],
  ['composite-box', [45, 60, 45], 2.4],
  ['concrete-box', [35, 45, 35], 2.1],
  ['precast-i', [28], 1.7],
  ['precast-trough', [26], 1.5],
  ['adjacent-box', [20], 0.9],
  ['slab', [14, 18, 14], 0.9],
];

const sized = (form: FormId, spansM: readonly number[], depthM: number, skew: Partial<UnitTask>): Design =>
  formModule(form).size({ ...girderTask(spansM, depthM, skew), form, method: formModule(form).methods[0] });

/** Greatest use of its shear checks; what carries shear are links and plates, or thicker webs of concrete. */
const shearUse = ({ checks }: Design): number =>
  Math.max(...checks.flatMap(({ id, utilisation }) => (id.startsWith('shear') ? [utilisation] : [])));
const amount = ({ lines }: Design, isOf: (item: string) => boolean): number =>
  lines.reduce((sum, { item, quantity }) => (isOf(item) ? sum + quantity : sum), 0);
const metal = (design: Design): number =>
  amount(design, (item) => item.endsWith('-steel') || item === 'reinforcement');
const concrete = (design: Design): number => amount(design, (item) => item.endsWith('concrete'));

describe.each(units)('size(%s) of a skew deck', (form, spansM, depthM) => {
  it('is that of a square one to the last digit at 0', () => {
    const { task: _square, ...square } = sized(form, spansM, depthM, {});
    const { task: _none, ...none } = sized(form, spansM, depthM, { skewDeg: 0 });
    expect(none).toEqual(square);
  });

  it('carries more shear: more of what resists it, or more of its strength used', () => {
    // Beyond that a box takes its ends square, and says so.
    const skews = form.endsWith('-box') && form !== 'adjacent-box' ? [0, 5, 10, 15] : [0, 20, 40, 60];
    const all = skews.map((skewDeg) => sized(form, spansM, depthM, { skewDeg }));
    for (let i = 1; i < all.length; i++) {
      const [before, after] = [all[i - 1]!, all[i]!];
      const more =
        metal(after) > metal(before) + 1e-6 ||
        concrete(after) > concrete(before) + 1e-6 ||
        shearUse(after) > shearUse(before) + 1e-9;
      expect(more, `${form} ${skews[i]}`).toBe(true);
    }
  });

  it('weighs on its supports with the traffic of a square one', () => {
    const traffic = (skewDeg: number): number[] =>
      sized(form, spansM, depthM, { skewDeg }).reactions.map(({ trafficMaxKN }) => trafficMaxKN);
    const square = traffic(0);
    // Plates and beams change with shear, and with them a little how stiff the deck is along its length.
    traffic(45).forEach((kN, j) => expect(kN / square[j]!).toBeCloseTo(1, 2));
  });
});

it('size(portal-frame) says what a skew leaves out of its deck, and nothing on square supports', () => {
  const said = (skewDeg: number): string => sized('portal-frame', [18], 0.9, { skewDeg }).warnings.join(' ');
  expect(said(20)).toMatch(/Skew 20 degrees.*obtuse corners/);
  expect(said(0)).not.toContain('Skew');
});

it('size(portal-frame) makes its walls twice as long at 60 degrees, and leaves its deck', () => {
  const at = (skewDeg: number) => {
    const { lines } = sized('portal-frame', [18], 0.9, { skewDeg });
    const of = (what: string): number => lines.find((line) => line.what === what)!.quantity;
    return { wall: of('first wall'), upright: of('first wall upright'), deck: of('frame deck') };
  };
  expect(at(60).wall).toBeCloseTo(2 * at(0).wall, 9);
  expect(at(60).upright).toBeCloseTo(2 * at(0).upright, 6);
  expect(at(60).deck).toBe(at(0).deck);
});

it('skewOn(site) gives a unit its skew either way, none on square supports and where nobody knows', () => {
  expect(skewOn({ skewDeg: -20 })).toEqual({ skewDeg: 20 });
  expect(skewOn({ skewDeg: 20 })).toEqual({ skewDeg: 20 });
  expect(skewOn({ skewDeg: 0 })).toEqual({});
  expect(skewOn({ skewDeg: null })).toEqual({});
});
