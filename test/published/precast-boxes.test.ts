import { describe, expect, it } from 'vitest';
import json from '../../data/girders/aashto-box.json' with { type: 'json' };
import { boxBeam } from '../../lib/forms/adjacent-box/boxBeam.ts';
import { adjacentBox } from '../../lib/forms/adjacent-box/index.ts';
import { inch } from '../forms/precast-i/cases.ts';

const within = (ours: number, published: number, tolerance: number): void => {
  expect(Math.abs(ours / published - 1), `${ours} against ${published}`).toBeLessThanOrEqual(tolerance);
};

describe('boxBeam(widthM, depthM, standard)', () => {
  /** Source in data/girders/aashto-box.json; plates from memory, so that this tests them too. */
  it.each(json.girders.map((one) => [one.name, one] as const))(
    'has the published area, centroid and inertia of %s',
    (_, { widthIn, depthIn, published }) => {
      const beam = boxBeam(widthIn * inch, depthIn * inch, 'hl93');
      within(beam.areaM2 / inch ** 2, published.areaIn2, 0.001);
      within(beam.centroidM / inch, published.bottomIn, 0.001);
      within(beam.inertiaM4 / inch ** 4, published.inertiaIn4, 0.001);
    },
  );

  it('has two rows of 22 strands in the bottom slab of 48 in (11 pairs at 2 in, AASHTO/PCI boxes, from memory)', () => {
    const { rows } = boxBeam(48 * inch, 39 * inch, 'hl93');
    expect(rows.slice(0, 2).map(({ count }) => count)).toEqual([22, 22]);
  });
});

/**
 * AASHTO LRFD table 4.6.2.2.2b-1, type (f), adjacent boxes tied to act as one, two lanes or more loaded (from memory):
 * g = k (b / 305)^0.6 (b / 12 L)^0.2 (I / J)^0.06, k = 2.5 Nb^-0.2 >= 1.5, b in inches, L in feet.
 */
describe('moment share of a box under HL-93', () => {
  it.each([20, 28, 36])('comes near the factor for tied boxes at %d m, without being set by it', (spanM) => {
    const { figures } = adjacentBox.size({
      form: 'adjacent-box',
      spansM: [spanM],
      deck: {
        widthM: 12,
        carriagewayM: 11,
        carriagewayOffsetM: 0,
        lanes: 2,
        footwayM: 0,
        surfacingM: 0.09,
        superimposedKNm: 33,
      },
      standard: 'hl93',
      planRadiusM: Infinity,
      method: 'crane',
      depthM: 1.3,
    });
    const bIn = figures['spacingM']! / inch;
    const k = Math.max(1.5, 2.5 * figures['beamLines']! ** -0.2);
    // (I / J)^0.06 is 0.96 to 1 for boxes: taken as 1.
    const g = k * (bIn / 305) ** 0.6 * (bIn / 12 / (spanM / 0.3048)) ** 0.2;
    // Hinges share less than the factor's one plate at short spans and more at long ones; 12 % either way.
    within(figures['laneVehicles']!, g, 0.12);
  });
});
