import { describe, expect, it } from 'vitest';
import rates from '../../data/rates/demo-2026.json' with { type: 'json' };
import { concreteBox } from '../../lib/forms/concrete-box/index.ts';
import { standardIds, type UnitTask } from '../../lib/model/index.ts';
import { boxTask, usualSpans } from '../forms/concrete-box/cases.ts';

const figure = (task: UnitTask, name: string): number => concreteBox.size(task).figures[name]!;

/**
 * Empirical laws of box decks, both from memory and never opened: SETRA guide on cantilever-built decks, concrete
 * 0.40 + 0.0035 L m3/m2; Menn, Prestressed Concrete Bridges, concrete 0.35 + 0.0045 L m3/m2 and prestress 0.4 L kg/m2
 * (19 bridges of 1958 to 1985). The two differ by up to 16 % from one another; a band of 20 % for concrete and 30 % for
 * prestress was set before the model was compared.
 */
describe('concreteBox.size() against empirical quantity laws', () => {
  const unit = (mainM: number): UnitTask => boxTask(usualSpans(mainM, 3), mainM / 20);

  it.each([40, 60, 80])('needs about the concrete of both laws at %i m', (mainM) => {
    const concrete = figure(unit(mainM), 'concreteM3M2');
    for (const law of [0.4 + 0.0035 * mainM, 0.35 + 0.0045 * mainM])
      expect(Math.abs(concrete / law - 1)).toBeLessThan(0.2);
  });

  it.each([40, 60, 80])('needs about the prestress of the law at %i m', (mainM) => {
    expect(Math.abs(figure(unit(mainM), 'strandKgM2') / (0.4 * mainM) - 1)).toBeLessThan(0.3);
  });

  // SETRA guide 130 to 170 kg/m3, segmental decks 120 to 160, Menn 90 + 0.35 L; all from memory.
  it.each([40, 60, 80])('needs 100 to 170 kg of bars per m3 at %i m', (mainM) => {
    const bars = figure(unit(mainM), 'barsKgM3');
    expect(bars).toBeGreaterThan(100);
    expect(bars).toBeLessThan(170);
  });
});

describe('concreteBox.size() launched', () => {
  const unit = (mainM: number, method: 'falsework' | 'launch'): UnitTask =>
    boxTask([0.78 * mainM, mainM, mainM, mainM, 0.78 * mainM], mainM / 16, { method });

  // Rosignoli, Bridge Launching: with a nose of 0.6 L the moment at landing is about 1.5 times that of an inner span;
  // from memory. The inner span has w L2 / 12.
  it('meets about 1.5 times the moment of an inner span when it lands', () => {
    const { figures, task } = concreteBox.size(unit(50, 'launch'));
    const weight = 25 * 1.03 * figures.areaM2!;
    const inner = (weight * Math.max(...task.spansM) ** 2) / 12;
    expect(-figures.launchingHogKNm! / inner).toBeGreaterThan(1.4);
    expect(-figures.launchingHogKNm! / inner).toBeLessThan(1.6);
  });

  // Launched decks of 40 to 60 m take 30 to 50 % more prestress than those on falsework; from memory.
  it('takes more prestress than on falsework, and 30 to 50 % more at 60 m', () => {
    const more = [40, 50, 60].map(
      (mainM) =>
        figure(unit(mainM, 'launch'), 'strandKgM2') / figure(unit(mainM, 'falsework'), 'strandKgM2') - 1,
    );
    expect(Math.min(...more)).toBeGreaterThan(0);
    expect(more[2]).toBeGreaterThan(0.3);
    expect(more[2]).toBeLessThan(0.5);
  });

  // 40 to 60 m without temporary piers (contractors' pages, read); depth 1/14 to 1/17 of the span (read, and from memory).
  it('holds at 60 m and not at 90 m without temporary piers', () => {
    const use = (mainM: number): number =>
      concreteBox.size(unit(mainM, 'launch')).checks.find(({ id }) => id === 'launching')!.utilisation;
    expect(use(60)).toBeLessThan(1);
    expect(use(90)).toBeGreaterThan(1);
  });
});

describe('concreteBox.size() and published depths', () => {
  // Poon 2009 (abstract read): the cost of boxes on falsework is nearly flat from 1/10 to 1/35 of the span.
  it('costs nearly the same from 1/12 to 1/30 of the span, at the invented demonstration rates', () => {
    const price = new Map(rates.rates.map(({ item, p50 }) => [item, p50]));
    const costs = [12, 15, 18, 22, 26, 30].map((over) => {
      const { lines } = concreteBox.size(boxTask(usualSpans(50, 4), 50 / over));
      return lines.reduce((sum, { item, quantity }) => sum + quantity * price.get(item)!, 0);
    });
    expect(Math.max(...costs) / Math.min(...costs)).toBeLessThan(1.1);
  });

  // AASHTO LRFD table 2.5.2.6.3-1 (read): 0.045 of a simple and 0.040 of a continuous span, meant to keep deflections in check.
  it.each(standardIds)('deflects less than span / 800 at the optional minimum depth under %s', (standard) => {
    for (const [count, ratio] of [
      [1, 0.045],
      [3, 0.04],
    ] as const) {
      const design = concreteBox.size(boxTask(usualSpans(45, count), 45 * ratio, { standard }));
      expect(design.checks.find(({ id }) => id === 'deflection')!.utilisation).toBeLessThan(1);
    }
  });
});

describe('end spans of concrete boxes', () => {
  const endOf = (ratio: number): { lastingKN: number; trafficKN: number } => {
    const { reactions, figures } = concreteBox.size(boxTask([ratio * 50, 50, ratio * 50], 2.5));
    // The diaphragm stands on the bearing and is not part of the uniform beam of the published ratios.
    return {
      lastingKN: reactions[0]!.permanentKN - figures.endDiaphragmKN!,
      trafficKN: reactions[0]!.trafficMinKN,
    };
  };

  // Statics: a uniform end span of less than about 0.38 of its neighbour lifts under its own weight
  // (three spans: 2 a2 (3 + 2 a) = 1 + a3, a = 0.374).
  it('lift under permanent load at 0.36 of the neighbour and not at 0.39', () => {
    expect(endOf(0.36).lastingKN).toBeLessThan(0);
    expect(endOf(0.39).lastingKN).toBeGreaterThan(0);
  });

  // Worked out apart from this model on a two-lane deck: with LM1 at the ultimate limit uplift lasts to about 0.47.
  it('lift at the ultimate limit under traffic at 0.45 and not at 0.49', () => {
    const left = (ratio: number): number => endOf(ratio).lastingKN + 1.35 * endOf(ratio).trafficKN;
    expect(left(0.45)).toBeLessThan(0);
    expect(left(0.49)).toBeGreaterThan(0);
  });
});
