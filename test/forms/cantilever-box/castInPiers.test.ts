import { describe, expect, it } from 'vitest';
import { trafficOnDeck } from '../../../lib/actions/index.ts';
import { castInFaults, castInSupports } from '../../../lib/forms/cantilever-box/castInPiers.ts';
import { heldKNm, heldPier, type DeckGeometry } from '../../../lib/forms/cantilever-box/heldPiers.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import { lineBeam } from '../../../lib/mechanics/index.ts';
import { plainDeck } from '../composite-i/cases.ts';
import { cantileverTask } from './cases.ts';

const spans = [65, 110, 65];
const onBearings = cantileverBox.size(cantileverTask(spans, 2.8));
const castIn = cantileverBox.size(cantileverTask(spans, 2.8, { castInPiers: 2 }));

describe('castInSupports()', () => {
  it('takes neighbours about the middle of the unit, of two such runs the one with the longer spans between', () => {
    expect(castInSupports({ spansM: spans })).toEqual([]);
    expect(castInSupports({ spansM: spans, castInPiers: 2 })).toEqual([1, 2]);
    expect(castInSupports({ spansM: [60, 100, 180, 100, 60], castInPiers: 2 })).toEqual([2, 3]);
    expect(castInSupports({ spansM: [60, 180, 100, 60], castInPiers: 1 })).toEqual([2]);
    expect(castInSupports({ spansM: [70, 120, 100, 50], castInPiers: 2 })).toEqual([1, 2]);
    expect(castInSupports({ spansM: [50, 100, 120, 70], castInPiers: 2 })).toEqual([2, 3]);
  });

  it('refuses more piers than there are, none at all in a single span, and parts of one', () => {
    const said = (spansM: number[], castInPiers: number): string[] =>
      castInFaults({ spansM, castInPiers }).map(({ code, received }) => `${code} ${received}`);
    expect(said(spans, 2)).toEqual([]);
    expect(said(spans, 3)).toEqual(['too-large-value 3']);
    expect(said(spans, 1.5)).toEqual(['too-large-value 1.5']);
    expect(said([90], 1)).toEqual(['refused a single span, with no pier to be cast in with']);
    expect(() => cantileverBox.size(cantileverTask(spans, 2.8, { castInPiers: 3 }))).toThrow(
      /1 to 2, whole piers/,
    );
  });
});

describe('heldPier()', () => {
  const load = trafficOnDeck('lm1', plainDeck(12));
  const held = (deck: DeckGeometry) => heldPier(deck, lineBeam(deck), 1, load);
  const even = { spansM: [40, 60], eiKNm2: () => 1, stationsPerSpan: 20, extraStationsM: [] };

  it('turns a deck of constant stiffness by 3 E I / l on either side of its pier, the far ends turning', () => {
    expect(held(even).turnKNm).toBeCloseTo(3 / 40 + 3 / 60, 9);
    const long = { ...even, spansM: [40, 60, 40] };
    // Right of the first pier the span of 60 m, whose far end turns against the 40 m beyond: 4 / a - (2 / a)^2 / (4 / a + 3 / b).
    const [a, b] = [60, 40];
    const right = 4 / a - (2 / a) ** 2 / (4 / a + 3 / b);
    expect(held(long).turnKNm).toBeCloseTo(3 / 40 + right, 9);
  });

  it('holds an even load by the difference of w l^2 / 8 on both sides', () => {
    expect(heldKNm(held(even), 10)).toBeCloseTo((10 * (60 ** 2 - 40 ** 2)) / 8, 6);
    expect(heldKNm(held(even), [20, 10])).toBeCloseTo((10 * 60 ** 2 - 20 * 40 ** 2) / 8, 6);
  });
});

describe('a box cast in with its piers', () => {
  it('stands on bearings unless it is asked to be cast in, to the last figure what it was', () => {
    expect(onBearings.castIn).toBeUndefined();
    expect(castIn.castIn!.map(({ support }) => support)).toEqual([1, 2]);
  });

  it('hogs no less over its piers and sags no less than on bearings: the shafts may be soft or stiff', () => {
    const hog = ({ figures }: typeof castIn): number => figures['pier1TrafficKNm']!;
    expect(hog(castIn)).toBeLessThan(hog(onBearings));
    // Between w l^2 / 12 of a built-in span and what it was: never twice as much.
    expect(hog(castIn)).toBeGreaterThan(1.5 * hog(onBearings));
    for (const s of [1, 2, 3])
      expect(castIn.figures[`span${s}TrafficKNm`]).toBeGreaterThanOrEqual(
        onBearings.figures[`span${s}TrafficKNm`]!,
      );
  });

  it('is the same from either end', () => {
    const there = cantileverBox.size(cantileverTask([60, 110, 70], 2.8, { castInPiers: 2 })).castIn!;
    const back = cantileverBox.size(cantileverTask([70, 110, 60], 2.8, { castInPiers: 2 })).castIn!;
    for (const key of ['deckTurnKNm', 'laidKNm', 'trafficKNm'] as const)
      expect(back[1]![key] / there[0]![key]).toBeCloseTo(1, 4);
  });
});
