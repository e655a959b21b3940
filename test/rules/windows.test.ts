import { describe, expect, it } from 'vitest';
import { formIds } from '../../lib/model/index.ts';
import {
  depthBand,
  depthMeasure,
  endRatioWindow,
  floorBand,
  leastHeadroomSpareM,
  midspanDepthBand,
  rule,
  rulingsFor,
  sideRatioWindow,
  spanWindow,
  statusOf,
  windowOf,
} from '../../lib/rules/index.ts';

/** The limit written in a rule, read from the data itself. */
function written(id: string): unknown {
  const { condition } = rule(id);
  return 'between' in condition ? condition.between : 'value' in condition ? condition.value : null;
}

describe('windowOf(form, fact, effects, given)', () => {
  it('[R14] is what barring rules leave open', () => {
    expect(windowOf('composite-i', 'mainSpanM', ['out'])).toEqual([
      written('composite-i-span-least'),
      written('composite-i-span-most'),
    ]);
    expect(windowOf('composite-i', 'planRadiusM', ['caution'])).toEqual([
      written('composite-i-curve'),
      Infinity,
    ]);
  });
  it('[R14] is where favouring rules hold', () => {
    expect(windowOf('composite-i', 'mainSpanM', ['in favour'])).toEqual(written('composite-i-span-usual'));
  });
  it('[R14] both together narrow each other', () => {
    expect(windowOf('half-through', 'mainSpanM', ['out', 'in favour'])).toEqual(
      written('half-through-span-usual'),
    );
  });
  it('[R14] a rule that hangs on an unknown fact bars nothing for certain', () => {
    expect(windowOf('composite-i', 'endSpanRatio', ['caution'])).toEqual([-Infinity, Infinity]);
    expect(windowOf('composite-i', 'endSpanRatio', ['caution'], { continuity: 'continuous' })).toEqual([
      0.5, 1,
    ]);
  });
  it('[R15] a rule that is silent under the given facts narrows nothing', () => {
    expect(windowOf('composite-i', 'endSpanRatio', ['out', 'caution'], { continuity: 'simple' })).toEqual([
      -Infinity,
      Infinity,
    ]);
    expect(depthBand('composite-i', 'simple')).not.toEqual(depthBand('composite-i', 'continuous'));
  });
  it('[R14] is null where no favouring rule holds, open where no rule speaks', () => {
    expect(windowOf('slab', 'sagRatio', ['in favour'])).toBeNull();
    expect(windowOf('slab', 'sagRatio', ['out'])).toEqual([-Infinity, Infinity]);
  });
});

describe('spanWindow(form)', () => {
  it.each(formIds)('%s: usual lies inside possible, and rulings agree at its ends', (form) => {
    const { possible, usual } = spanWindow(form);
    expect(possible[0]).toBeLessThanOrEqual(usual[0]);
    expect(usual[0]).toBeLessThan(usual[1]);
    expect(usual[1]).toBeLessThanOrEqual(possible[1]);
    const status = (mainSpanM: number) =>
      statusOf(
        rulingsFor(['form', 'arrangement'], form, {
          mainSpanM,
          planRadiusM: Infinity,
          skewDeg: 0,
          deckWidthM: Math.max(12, mainSpanM / 40),
        }).filter(({ rule: id }) => rule(id).subject === 'span'),
      );
    expect(status(usual[0])).toBe('in');
    expect(status(usual[1])).toBe('in');
    expect(status(possible[1])).not.toBe('out');
    expect(status(possible[1] + 0.1)).toBe('out');
    if (possible[0] > 0) {
      expect(status(possible[0])).not.toBe('out');
      expect(status(possible[0] - 0.1)).toBe('out');
    }
  });
});

describe('depthBand(form, continuity, method)', () => {
  it.each(formIds)('%s has a band of its measure for both kinds of span it knows', (form) => {
    for (const continuity of ['simple', 'continuous'] as const) {
      const [least, most] = depthBand(form, continuity);
      expect(least).toBeGreaterThan(0);
      expect(least).toBeLessThan(most);
      expect(most).toBeLessThan(0.3);
    }
  });
  it('measures the truss by its height and the floor by the deck width', () => {
    expect(depthMeasure('truss')).toBe('trussHeightRatio');
    expect(depthMeasure('concrete-box')).toBe('depthRatio');
    expect(floorBand('truss')).not.toBeNull();
    expect(floorBand('concrete-box')).toBeNull();
  });
  it('launching needs more depth than falsework', () => {
    expect(depthBand('concrete-box', 'continuous', 'launch')[1]).toBeGreaterThan(
      depthBand('concrete-box', 'continuous', 'falsework')[1],
    );
  });
  it('gives forms of varying depth a midspan band below the support band', () => {
    for (const form of ['cantilever-box', 'extradosed', 'portal-frame'] as const)
      expect(midspanDepthBand(form)![1]).toBeLessThanOrEqual(depthBand(form, 'continuous')[0] + 1e-9);
    expect(midspanDepthBand('composite-i')).toBeNull();
  });
});

describe('endRatioWindow(form), sideRatioWindow(form, pylons), leastHeadroomSpareM(form)', () => {
  it('continuous girders and boxes keep their end spans between uplift and governing the deck', () => {
    expect(endRatioWindow('composite-i')).toEqual([0.5, 1]);
    expect(endRatioWindow('concrete-box')).toEqual([0.5, 1]);
    expect(endRatioWindow('slab')).toEqual([0.5, 1]);
    expect(endRatioWindow('truss')).toBeNull();
  });
  it('side spans of stayed decks stay under half the main span', () => {
    expect(sideRatioWindow('cable-stayed', 2)![1]).toBeLessThan(0.5);
    expect(sideRatioWindow('cable-stayed', 1)).toEqual([0.5, 1]);
    expect(sideRatioWindow('extradosed', 1)).toBeNull();
    expect(sideRatioWindow('composite-i', 2)).toBeNull();
  });
  it('no envelope may be fouled', () => {
    expect(leastHeadroomSpareM('truss')).toBe(0);
  });
});
