import { describe, expect, it } from 'vitest';
import { stayLayout, usualPylons } from '../../../lib/forms/cable-stayed/stayLayout.ts';
import { lastingForces } from '../../../lib/forms/cable-stayed/stayForces.ts';

describe('stayLayout(spans, pylons)', () => {
  it('every metre of deck is carried once: stays, end bays', () => {
    for (const [spans, pylons] of [
      [
        [80, 200, 80],
        [1, 2],
      ],
      [[60, 100], [1]],
      [[100, 100], [1]],
    ] as const) {
      const layout = stayLayout(spans, pylons);
      const hung = layout.stays.reduce((sum, stay) => sum + stay.tributaryM, 0);
      const ends = [0, layout.lengthM].map((x) =>
        Math.min(...layout.stays.filter((stay) => !stay.anchor).map((stay) => Math.abs(stay.deckM - x))),
      );
      expect(hung + (ends[0]! + ends[1]!) / 2).toBeCloseTo(layout.lengthM, 9);
    }
  });

  it('mirrored spans give the mirrored fan', () => {
    const there = stayLayout([60, 100], [1]);
    const back = stayLayout([100, 60], [1]);
    const places = (layout: typeof there, mirror: boolean): string[] =>
      layout.stays
        .map(
          (stay) =>
            `${(mirror ? 160 - stay.deckM : stay.deckM).toFixed(6)} ${stay.riseM.toFixed(6)} ${stay.anchor}`,
        )
        .sort();
    expect(places(back, true)).toEqual(places(there, false));
  });

  it('stays are 8 to 14 m apart and the pylon is 0.20 to 0.25 of the main span high', () => {
    for (const main of [120, 200, 300, 450, 600]) {
      const layout = stayLayout([0.4 * main, main, 0.4 * main], [1, 2]);
      expect(layout.pylons[0]!.spacingM).toBeGreaterThanOrEqual(7.5);
      expect(layout.pylons[0]!.spacingM).toBeLessThanOrEqual(14);
      expect(layout.pylons[0]!.heightM / main).toBeGreaterThanOrEqual(0.2);
      expect(layout.pylons[0]!.heightM / main).toBeLessThanOrEqual(0.25);
    }
  });

  it('refuses pylons at the ends, three pylons, one span', () => {
    expect(() => stayLayout([80, 200, 80], [0])).toThrow(/inner supports/u);
    expect(() => stayLayout([80, 100, 100, 80], [1, 2, 3])).toThrow(/one or two/u);
    expect(() => stayLayout([200], [])).toThrow(/at least two spans/u);
  });
});

describe('usualPylons(spans)', () => {
  it('takes both ends of an inner longest span, the inner end of an outer one', () => {
    expect(usualPylons([80, 200, 80])).toEqual([1, 2]);
    expect(usualPylons([60, 100])).toEqual([1]);
    expect(usualPylons([100, 60])).toEqual([1]);
    expect(usualPylons([40, 40, 160])).toEqual([2]);
  });
});

describe('lastingForces(layout, load)', () => {
  it('the outermost main stay, worked out by hand', () => {
    const layout = stayLayout([80, 200, 80], [1, 2]);
    const i = layout.stays.findLastIndex((stay) => stay.pylon === 0 && stay.side === 1 && !stay.anchor);
    // 100 m to midspan in 8.5 steps of 11.765 m; the eighth stay is held 94.12 m out and 44 m up (0.22 x 200):
    // length 103.89 m, sine 0.42351; it carries 100 kN/m x 11.765 m = 1176.5 kN, so 1176.5 / 0.42351 = 2778 kN.
    expect(layout.stays[i]!.lengthM).toBeCloseTo(103.895, 2);
    expect(lastingForces(layout, 100).stayKN[i]).toBeCloseTo(2778, 0);
  });

  it('the top of every pylon is in balance along the road', () => {
    const layout = stayLayout([80, 200, 80], [1, 2]);
    const { stayKN } = lastingForces(layout, 100);
    for (const p of [0, 1]) {
      const sum = layout.stays.reduce(
        (total, stay, i) => total + (stay.pylon === p ? stay.side * stayKN[i]! * stay.cosine : 0),
        0,
      );
      expect(sum).toBeCloseTo(0, 8);
    }
  });

  it('anchor stays against each other take what keeps them taut, in balance', () => {
    const layout = stayLayout([100, 100], [1]);
    const taut = layout.stays.map((stay) => (stay.anchor ? 500 : 0));
    const { stayKN } = lastingForces(layout, 100, taut);
    const anchors = layout.stays.flatMap((stay, i) => (stay.anchor ? [stayKN[i]!] : []));
    expect(anchors).toHaveLength(2);
    for (const force of anchors) expect(force).toBeCloseTo(500, 6);
  });
});
