import { describe, expect, it } from 'vitest';
import { launchYardNeeded } from '../../lib/appraise/launchYardNeeded.ts';
import { halfDeckNeeded, pickMoment, widening } from '../../lib/appraise/methodFacts.ts';
import { pickRadius } from '../../lib/appraise/pickRadius.ts';
import { survey, type FormId, type Study } from '../../lib/index.ts';
import { lowFerry } from './studies.ts';
import { answerTo } from './answerTo.ts';

type Change = Partial<Pick<Study['brief'], 'access' | 'demands' | 'deck'>>;

const asked = (forms: readonly FormId[], change: (brief: Study['brief']) => Change): Study => {
  const study = lowFerry();
  return {
    ...study,
    brief: { ...study.brief, ...change(study.brief) },
    options: { ...study.options, forms, workOutAnyway: forms },
    books: { ...study.books, draws: 100 },
  };
};
const effects = (study: Study, rule: string) =>
  answerTo(study).options.map(({ method, rulings }) => [
    method,
    rulings.find((ruling) => ruling.rule === rule)?.effect,
  ]);

describe('launchYardNeeded(spans, material)', () => {
  it('is the tail that outweighs deck and nose over the first span, by hand', () => {
    // Steel 60-80-60: nose 24 m, deck 36 m ahead. 36^2/2 + 0.3 x 24 x (36 + 12) = 993.6; sqrt(2 x 1.2 x 993.6) = 48.8.
    expect(launchYardNeeded([60, 80, 60], 'steel')).toBeCloseTo(48.83, 2);
    // Concrete: nose 48 m, deck 12 m ahead. 72 + 0.1 x 48 x 36 = 244.8; sqrt(2.4 x 244.8) = 24.2, less than a bed and a half.
    expect(launchYardNeeded([60, 80, 60], 'concrete')).toBe(30);
  });
});

describe('pickRadius(site, unit)', () => {
  it('reaches from beside the deck to the middle of the widest stretch no crane stands on', () => {
    const site = survey(lowFerry().brief);
    const { startM, endM } = site;
    const unit = { form: 'composite-i', role: 'main', supportsM: [startM, endM] } as const;
    const dry = { ...site, zones: [], waters: [] };
    expect(pickRadius(dry, unit)).toBeCloseTo(site.deck.widthM / 2 + 5, 9);
    const widest = Math.max(
      ...[...site.waters, ...site.zones.filter(({ hard }) => hard)].map(({ fromM, toM }) => toM - fromM),
    );
    expect(pickRadius(site, unit)).toBeCloseTo(Math.hypot(widest / 2, site.deck.widthM / 2 + 5), 9);
  });
});

it('pickMoment(60 t, 20 m) is within four fifths of a chart of 1500 tm; halfDeckNeeded(2 lanes) is 7 m', () => {
  expect(pickMoment(60, 20)).toBeCloseTo(1500, 9);
  expect(halfDeckNeeded(2)).toBeCloseTo(7, 9);
});

it('widening(deck) counts what strips grow by, and never what they lose', () => {
  const strip = (widthM: number, ultimateWidthM: number) => ({
    kind: 'lane' as const,
    widthM,
    ultimateWidthM,
  });
  expect(widening([strip(3.5, 3.5), strip(2, 3.5), strip(1.5, 1)])).toBeCloseTo(1.5, 9);
});

describe('appraise(what the site and the brief ask of the method)', () => {
  it('puts launched decks out without a yard, warns of a short one, asks where it is not known', () => {
    const launched = (launchYardM: number | 'unknown') =>
      asked(['concrete-box'], ({ access }) => ({ access: { ...access, launchYardM } }));
    const launches = (study: Study, rule: string) =>
      new Set(
        effects(study, rule).flatMap(([method, effect]) => (method === 'launch' ? [effect ?? 'none'] : [])),
      );
    expect(launches(launched(0), 'launch-yard-none')).toEqual(new Set(['out']));
    expect(launches(launched(20), 'launch-yard-short')).toEqual(new Set(['caution']));
    expect(launches(launched(200), 'launch-yard-short')).toEqual(new Set(['none']));
    expect(launches(launched('unknown'), 'launch-yard-none')).toEqual(new Set(['to confirm']));
  });

  it('warns of a crane too small for the heaviest piece at its radius', () => {
    const crane = (craneMomentTm: number | 'unknown') =>
      effects(
        asked(['composite-i'], ({ access }) => ({ access: { ...access, craneMomentTm } })),
        'crane-reach',
      );
    expect(crane(20).every(([, effect]) => effect === 'caution')).toBe(true);
    expect(crane(1e5).every(([, effect]) => effect === undefined)).toBe(true);
    expect(crane('unknown').every(([, effect]) => effect === undefined)).toBe(true);
  });

  it('builds many girders in two halves beside traffic, twin girders and a truss not', () => {
    const halves = (form: FormId, rule: string) =>
      effects(
        asked([form], ({ demands }) => ({ demands: { ...demands, lanesKept: 1 } })),
        rule,
      );
    expect(halves('truss', 'halves-whole').every(([, effect]) => effect === 'out')).toBe(true);
    expect(halves('composite-i', 'halves-lines').every(([, effect]) => effect === 'out')).toBe(true);
  });

  it('keeps a hidden gas main out of closed cells and lets girders carry it', () => {
    const hidden = (form: FormId) =>
      effects(
        asked([form], ({ demands }) => ({ demands: { ...demands, gasMain: 'inside' } })),
        'gas-inside',
      );
    expect(hidden('concrete-box').every(([, effect]) => effect === 'out')).toBe(true);
    expect(hidden('composite-i').every(([, effect]) => effect === undefined)).toBe(true);
  });

  it('favours girders where the deck grows one day and warns of boxes', () => {
    const grown = (form: FormId, rule: string) =>
      effects(
        asked([form], ({ deck }) => ({
          deck: deck.map((strip, i) => (i === 1 ? { ...strip, ultimateWidthM: strip.widthM + 3 } : strip)),
        })),
        rule,
      );
    expect(grown('composite-i', 'widening-open').every(([, effect]) => effect === 'in favour')).toBe(true);
    expect(grown('concrete-box', 'widening-closed').every(([, effect]) => effect === 'caution')).toBe(true);
  });
});
