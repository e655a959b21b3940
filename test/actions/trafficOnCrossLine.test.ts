import { describe, expect, it } from 'vitest';
import { trafficOnCrossLine, trafficOnGirder, worstLaneShare } from '../../lib/actions/index.ts';
import type { DeckSpec } from '../../lib/model/index.ts';

const deck: DeckSpec = {
  widthM: 12,
  carriagewayM: 11,
  carriagewayOffsetM: 0,
  lanes: 2,
  footwayM: 0,
  surfacingM: 0.09,
  superimposedKNm: 40,
};

describe('trafficOnCrossLine(standard, deck, line)', () => {
  it('the lever rule as a line gives what two girders get', () => {
    const line = { yM: [-3.5, 3.5], value: [0, 1] };
    const both = trafficOnGirder('lm1', deck, [-3.5, 3.5], 1);
    const one = trafficOnCrossLine('lm1', deck, line);
    expect(one.vehicleFactor).toBeCloseTo(both.vehicleFactor, 9);
    expect(one.udlKNm).toBeCloseTo(both.udlKNm, 9);
  });

  it('worst lane alone: 3 m lane at the kerb over a girder at 3.5 m, by hand', () => {
    // Lane middle at 5.5 - 1.5 = 4 m, lever rule 1 + 0.5 / 7 = 1.0714 of the vehicle.
    expect(worstLaneShare('lm1', deck, { yM: [-3.5, 3.5], value: [0, 1] })).toBeCloseTo(7.5 / 7, 9);
  });
});
