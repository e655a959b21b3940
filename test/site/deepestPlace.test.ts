import { describe, expect, it } from 'vitest';
import { deepestPlace } from '../../lib/site/index.ts';

const place = (...points: readonly (readonly [x: number, z: number])[]): number =>
  deepestPlace({
    startM: 100,
    endM: 300,
    groundX: points.map(([x]) => x),
    groundZ: points.map(([, z]) => z),
  });

describe('deepestPlace(site)', () => {
  it('is the lowest point of a valley, and the middle of a level floor', () => {
    expect(place([80, 20], [150, 3], [320, 20])).toBe(150);
    expect(place([80, 20], [140, 3], [200, 3], [320, 20])).toBe(170);
    // Half a metre up and down is still the floor.
    expect(place([80, 20], [140, 3.3], [160, 3.4], [180, 3], [320, 20])).toBe(160);
  });

  it('is the middle of the wider of two floors, of two alike of the one nearer to the middle', () => {
    expect(place([80, 20], [120, 3], [130, 3], [160, 9], [210, 3], [260, 3], [320, 20])).toBe(235);
    expect(place([80, 20], [120, 3], [140, 3], [160, 9], [200, 3], [220, 3], [320, 20])).toBe(210);
  });

  it('turns round with the crossing, and favours neither of two alike in everything', () => {
    expect(place([80, 20], [250, 3], [320, 20])).toBe(250);
    expect(place([80, 20], [140, 3], [160, 3], [200, 9], [240, 3], [260, 3], [320, 20])).toBe(200);
    expect(place([80, 20], [320, 20])).toBe(200);
  });
});
