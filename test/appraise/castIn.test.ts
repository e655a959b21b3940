import { describe, expect, it } from 'vitest';
import type { AskedVariant, KeptOption, Study } from '../../lib/index.ts';
import { figure } from '../../lib/explain/index.ts';
import { answerTo } from './answerTo.ts';
import { lowFerry } from './studies.ts';

/** The worked example with its road so much higher that its piers are tall, and box cantilevers kept by hand. */
function valley(raisedM: number, variants: readonly AskedVariant[]): Study {
  const study = lowFerry();
  const { brief, options, books } = study;
  const { road } = brief;
  return {
    ...study,
    brief: {
      ...brief,
      road: {
        ...road,
        startLevelM: road.startLevelM + raisedM,
        endLevelM: road.endLevelM + raisedM,
      },
    },
    books: { ...books, draws: 200 },
    options: {
      ...options,
      forms: ['composite-i'],
      workOutAnyway: ['cantilever-box'],
      kept: variants.map((variant, k): KeptOption => ({
        number: 41 + k,
        form: 'cantilever-box',
        method: 'balanced-cantilever',
        units: [{ form: 'cantilever-box', role: 'main', supportsM: [1240, 1302, 1408, 1470] }],
        depthM: 3,
        variant,
      })),
    },
  };
}

describe('box cantilevers kept by hand', () => {
  const study = valley(30, [{}, { castInPiers: 2 }, { castInPiers: 'unknown' }]);
  const appraisal = answerTo(study);
  const option = (number: number) => appraisal.options.find((one) => one.number === number)!;
  const [onBearings, castIn, unknown] = [option(41), option(42), option(43)];
  const rulings = ({ rulings: all }: typeof castIn): string[] =>
    all.filter(({ rule }) => rule.startsWith('cast-in')).map(({ rule, effect }) => `${rule} ${effect}`);

  it('stand on bearings where nothing is said or known of their piers', () => {
    expect(unknown.supports).toEqual(onBearings.supports);
    expect(unknown.lines).toEqual(onBearings.lines);
    expect(unknown.variant).toEqual({});
  });

  it('cast in with tall piers have no bearings there to buy or to renew, and may be built', () => {
    expect(castIn.supports.map(({ articulation }) => articulation.bearings)).toEqual([2, 0, 0, 2]);
    const bearingMN = ({ lines }: typeof castIn): number =>
      lines.reduce((sum, { item, quantity }) => (item === 'bearing' ? sum + quantity : sum), 0);
    expect(bearingMN(castIn)).toBeLessThan(0.3 * bearingMN(onBearings));
    expect(rulings(castIn)).toEqual(['cast-in-piers in favour']);
    expect(rulings(onBearings)).toEqual([]);
  });

  it('are ruled out by piers too stocky to follow the deck, with height, movement and how much too much', () => {
    const low = answerTo(valley(0, [{ castInPiers: 2 }])).options.find(({ number }) => number === 41)!;
    expect(low.status).toBe('out');
    const ruling = low.rulings.find(({ rule }) => rule === 'cast-in-shaft')!;
    expect(ruling.because.join(' ')).toMatch(
      /shaft [\d.]+ m high .* moves \d+ mm over it, is bent 1\.\d+ times/u,
    );
  });

  it('say where the moment of a shaft comes from, back to the movement and the couples of the deck', () => {
    const path = 'options/42/supports/1/articulation/frame';
    const inputs = figure({ study, appraisal }, `${path}/designKNm`).because.inputs.map(
      (input) => input.path,
    );
    expect(inputs).toEqual(expect.arrayContaining([`${path}/pushedKNm`, `${path}/turnedKNm`]));
    const pushed = figure({ study, appraisal }, `${path}/pushedKNm`).because.inputs.map(
      (input) => input.path,
    );
    expect(pushed).toEqual(
      expect.arrayContaining([
        `${path}/pushMm`,
        `${path}/eiKNm2`,
        'options/42/designs/0/castIn/0/deckTurnKNm',
      ]),
    );
  });
});
