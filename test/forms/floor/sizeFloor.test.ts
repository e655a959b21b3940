import { describe, expect, it } from 'vitest';
import { sizeFloor, type FloorCase } from '../../../lib/forms/floor/sizeFloor.ts';
import { floorDeck } from './cases.ts';

const floor: FloorCase = {
  standard: 'lm1',
  deck: floorDeck,
  planesM: 13,
  crossSpacingM: 7,
  depthM: 1.4,
  stringers: true,
};

describe('sizeFloor(floor)', () => {
  it('steel of a metre is the beams of a panel over its length', () => {
    const { crossGirder, stringer, stringerOffsetsM, steelKgPerM } = sizeFloor(floor);
    const panel = crossGirder.massKgPerM * 13 + stringer!.massKgPerM * stringerOffsetsM.length * 7;
    expect(steelKgPerM).toBeCloseTo(panel / 7, 9);
  });

  it('stringers stand at most 3 m apart, evenly over the deck', () => {
    const { stringerOffsetsM } = sizeFloor(floor);
    expect(stringerOffsetsM).toEqual([-4.5, -1.5, 1.5, 4.5]);
  });

  it('without stringers the slab spans from cross-girder to cross-girder', () => {
    const close = sizeFloor({ ...floor, stringers: false, crossSpacingM: 4 });
    expect(close.stringer).toBeNull();
    expect(close.slab.midM).toBeGreaterThanOrEqual(0.22);
    expect(close.checks.every(({ utilisation }) => utilisation <= 1.0001)).toBe(true);
  });

  it('planes farther apart need heavier cross-girders', () => {
    const mass = (planesM: number): number => sizeFloor({ ...floor, planesM }).crossGirder.massKgPerM;
    expect(mass(18)).toBeGreaterThan(mass(13));
  });
});
