import { describe, expect, it } from 'vitest';
import { figure } from '../../lib/explain/index.ts';
import type { Facts, Figure } from '../../lib/model/index.ts';
import { rule, rulingOf } from '../../lib/rules/index.ts';
import { example, otherwise } from './contexts.ts';

const ask = (path: string | readonly (string | number)[]): Figure => figure(example(), path);
const inputs = (path: string): string[] => ask(path).because.inputs.map((input) => input.path);
/** The cheapest option with steel girders: the first line of its bill is their plate. */
const steel = () => example().appraisal.options.find(({ form }) => form === 'composite-i')!;
const first = (): number => steel().number;

describe('figure', () => {
  it("figure('options/n/cost') walks down from the median to a rate with its tenders and to what was typed", () => {
    const root = `options/${first()}`;
    const cost = ask(`${root}/cost`);
    expect(cost.path).toBe(`${root}/cost/p50`);
    expect(cost.unit).toBe('EUR');
    expect(cost.range).toEqual(steel().cost);
    expect(cost.because.method).toBe('median of 10 000 draws');
    expect(inputs(cost.path)).toContain(`${root}/parts/deck/p50`);
    expect(inputs(`${root}/parts/deck`)).toContain(`${root}/lines/0`);
    expect(inputs(`${root}/lines/0`)).toEqual([`${root}/lines/0/quantity`, 'rates/plate-girder-steel/mean']);
    expect(inputs('rates/plate-girder-steel/mean')).toEqual([
      'rates/plate-girder-steel/p10',
      'rates/plate-girder-steel/p50',
      'rates/plate-girder-steel/p90',
    ]);
    const rate = ask('rates/plate-girder-steel');
    expect(rate.kind).toBe('preset');
    expect(rate.unit).toBe('EUR/kg');
    expect(rate.because.formula).toContain('14 tenders, 2026 Q1, Wend valley (invented)');
    expect(inputs(`${root}/deckAreaM2`)).toEqual(['site/lengthM', 'site/deck/widthM']);
    expect(ask('brief/deck/2/widthM')).toMatchObject({ kind: 'typed', value: 3.5, unit: 'm' });
  });

  it('figure(path).usedBy walks up again', () => {
    const root = `options/${first()}`;
    expect(ask('rates/plate-girder-steel/mean').usedBy).toContain(`${root}/lines/0`);
    expect(ask(`${root}/lines/0`).usedBy).toContain(`${root}/parts/deck/p50`);
    expect(ask(`${root}/parts/deck`).usedBy).toContain(`${root}/cost/p50`);
    expect(ask(`${root}/cost/p50`).usedBy).toContain(`${root}/pricePerM2/withApproaches`);
  });

  it('figure(path) takes the steps of a path as a list', () => {
    const { number } = example().appraisal.options[1]!;
    expect(ask(['options', number, 'supports', 1, 'heightM'])).toEqual(
      ask(`options/${number}/supports/1/heightM`),
    );
  });

  it('figure(path).kind tells a confirmed clearance from a preset and a default from what was typed', () => {
    expect(ask('brief/obstacles/0/clearance/headroomM')).toMatchObject({ kind: 'preset', value: 5.9 });
    expect(ask('brief/obstacles/0/clearance/headroomM').because.method).toBe('preset, to be confirmed');
    expect(ask('brief/obstacles/2/clearance/headroomM').kind).toBe('typed');
    expect(ask('brief/road/maxGradient').kind).toBe('preset');
    expect(ask('brief/road/mayRiseM').kind).toBe('typed');
    expect(ask('brief/access/haulLengthM').kind).toBe('unknown');
    expect(figure(otherwise(), 'brief/waters/0/floodLevelM').kind).toBe('unknown');
    expect(figure(otherwise(), 'site/planRadiusM').kind).toBe('unknown');
    expect(figure(otherwise(), 'brief/budget').kind).toBe('unknown');
  });

  it('figure(path) of a typed rate gives its reason', () => {
    const rate = figure(otherwise(), 'rates/plate-girder-steel');
    expect(rate).toMatchObject({ kind: 'typed', value: 3.9 });
    expect(rate.because.formula).toBe('typed over the schedule: call to a fabricator');
    expect(rate.because.sources.map(({ id }) => id)).toEqual(['brief']);
  });

  it('figure(path) of an option set by hand ends at what was set', () => {
    const depth = figure(otherwise(), 'options/40/designs/0/task/depthM');
    expect(depth.because.inputs.map(({ path, kind }) => [path, kind])).toEqual([['kept/0/depthM', 'typed']]);
    const pier = figure(otherwise(), 'options/40/units/0/supportsM/2');
    expect(pier.because.inputs).toMatchObject([
      { path: 'kept/0/units/0/supportsM/2', value: 1321, kind: 'typed' },
    ]);
  });

  it('figure(path) of a factor names its standard and says whether it was read', () => {
    const factor = ask('data/substructure/factors/permanent');
    expect(factor).toMatchObject({ value: 1.35, kind: 'preset', unit: '' });
    expect(factor.because.sources).toEqual([
      { id: 'en-1990', text: 'EN 1990 table A2.4(B) (from memory)', read: false },
    ]);
    expect(factor.usedBy).toContain(`options/${first()}/supports/0/articulation/bearingMN`);
  });

  it('figure(ruling) gives the facts from which the rule says the same again', () => {
    for (const context of [example(), otherwise()]) {
      for (const option of context.appraisal.options) {
        for (const ruling of option.rulings) {
          const { value, because } = figure(
            context,
            `options/${option.number}/rulings/${ruling.rule}/effect`,
          );
          // An unknown is held as null where the rules read 'unknown'.
          const facts: Facts = Object.fromEntries(
            because.inputs.map((input) => [input.path.split('/').at(-1)!, input.value ?? 'unknown']),
          );
          const again = rulingOf(rule(ruling.rule), facts);
          expect(again?.effect, ruling.rule).toBe(value);
          expect(again?.because.join('; '), ruling.rule).toBe(because.formula);
          expect(because.sources.length).toBeGreaterThan(0);
        }
      }
    }
  });

  it('figure(path) refuses a path at which there is no figure, naming it', () => {
    for (const path of [
      '',
      'options/999/cost/p50',
      `options/${first()}/cost/p51`,
      'rates/gold',
      'data/substructure',
      'standing/odds/1/1',
      'standing/odds/998/999',
    ]) {
      expect(() => figure(example(), path), path).toThrow(RangeError);
      expect(() => figure(example(), path), path).toThrow(/: expected .+, received '/);
    }
    expect(() => ask('site/depthM')).toThrow("path: expected a figure of the study, received 'site/depthM'");
  });

  it('figure leaves study and appraisal as they are', () => {
    const before = JSON.stringify(example());
    ask(`options/${first()}/cost/p50`);
    expect(ask(`options/${first()}/cost/p50`).usedBy.length).toBeGreaterThan(0);
    expect(JSON.stringify(example())).toBe(before);
  });
});
