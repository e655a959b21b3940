import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { beamsFor, beamShapes, bulbTee } from '../../../lib/forms/precast-i/beamShapes.ts';
import { rankedChoices } from '../../../lib/forms/precast-i/chooseBeams.ts';
import { precastI } from '../../../lib/forms/precast-i/index.ts';
import { precastModel, type PrecastModel } from '../../../lib/forms/common/precast/precastModel.ts';
import { iBeams } from '../../../lib/forms/precast-i/iBeams.ts';
import { strandLosses } from '../../../lib/forms/common/precast/strandLosses.ts';
import { strandPlan, strandsAt } from '../../../lib/forms/common/precast/strandPlan.ts';
import { releaseUse } from '../../../lib/forms/common/precast/spanUse.ts';
import type { StandardId, UnitTask } from '../../../lib/model/index.ts';
import { catalogueBeam } from '../../../lib/forms/precast-i/beamShapes.ts';

function task(
  spansM: readonly number[],
  depthM: number,
  standard: StandardId = 'lm1',
  widthM = 12,
): UnitTask {
  return {
    form: 'precast-i',
    spansM,
    deck: {
      widthM,
      carriagewayM: widthM - 1,
      carriagewayOffsetM: 0,
      lanes: 2,
      footwayM: 0,
      surfacingM: 0.09,
      superimposedKNm: 0.09 * 23.5 * (widthM - 1) + 10,
    },
    standard,
    planRadiusM: Infinity,
    method: 'crane',
    depthM,
  };
}

const modelOf = (asked: UnitTask): PrecastModel => precastModel(iBeams, asked, rankedChoices(asked)[0]!);

describe('precastI.size(task)', () => {
  it('holds every check over usual spans at usual depths, within the published quantities', () => {
    for (const standard of ['lm1', 'hl93'] as const)
      for (const spanM of [25, 30, 35, 40]) {
        const design = precastI.size(task([spanM, spanM, spanM], 0.06 * spanM, standard));
        if (standard === 'hl93' && spanM === 25) continue;
        expect(design.warnings, `${standard} ${spanM}`).toEqual([]);
        // Concrete 0.35 to 0.55 m3/m2 and strand 12 to 25 kg/m2 of ordinary decks (from memory); deep beams at 40 m past it.
        expect(design.figures['concreteM3M2']).toBeGreaterThan(0.35);
        expect(design.figures['concreteM3M2']).toBeLessThan(0.65);
        expect(design.figures['strandKgM2']).toBeGreaterThan(12);
        expect(design.figures['strandKgM2']).toBeLessThan(26);
      }
  });

  it('is never deeper than asked unless the shallowest beam is', () => {
    const shallowest = beamShapes('lm1')[0]!.depthM;
    for (let depthM = 0.9; depthM < 3; depthM += 0.07) {
      const { depthM: made, figures } = precastI.size(task([35], depthM));
      if (figures['beamHeightM']! > shallowest + 1e-6)
        expect(made.midspan).toBeLessThanOrEqual(depthM + 1e-6);
      expect(made.midspan).toBeCloseTo(figures['beamHeightM']! + figures['fillM']! + figures['slabM']!, 9);
    }
  });

  it('lays all of its weight on its supports', () => {
    const asked = task([30, 35, 30], 2);
    const { lines, reactions } = precastI.size(asked);
    const m3 = quantityOf(lines, 'precast-concrete') + quantityOf(lines, 'deck-concrete');
    const down = reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    expect(down).toBeCloseTo(25 * m3 + asked.deck.superimposedKNm * 95, 3);
  });

  it('needs more strand for a longer span, less for a deeper beam, and less beams further apart cost more each', () => {
    const strands = (spanM: number, depthM: number, girders: number): number =>
      precastI.size({ ...task([spanM], depthM), girders }).figures['span1Strands']!;
    expect(strands(35, 2, 6)).toBeGreaterThan(strands(30, 2, 6));
    expect(strands(35, 2, 6)).toBeGreaterThan(strands(35, 2.3, 6));
    expect(strands(35, 2, 5)).toBeGreaterThan(strands(35, 2, 7));
  });

  it('asks more of straight beams under a curved deck, and lays the same weight down', () => {
    const straight = precastI.size({ ...task([30, 30], 1.9), girders: 6 });
    const curved = precastI.size({ ...task([30, 30], 1.9), girders: 6, planRadiusM: 300 });
    // Sagitta 900 / 2400 = 0.375 m, a third of it 0.125 m; 6 beams: n a / sum a2 = 6 x 2.5 s / 17.5 s2.
    const spacingM = straight.figures['spacingM']!;
    expect(curved.figures['curvatureFactor']).toBeCloseTo(1 + ((6 * 2.5) / 17.5 / spacingM) * 0.125, 9);
    expect(curved.figures['span1DesignKNm']).toBeGreaterThan(straight.figures['span1DesignKNm']!);
    expect(curved.reactions[1]!.permanentKN).toBeCloseTo(straight.reactions[1]!.permanentKN, 6);
    expect(curved.reactions[1]!.trafficMaxKN).toBeCloseTo(straight.reactions[1]!.trafficMaxKN, 6);
  });

  it('says which limit a span is past', () => {
    const shallow = precastI.size(task([45, 45], 1.4));
    expect(shallow.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(shallow.warnings.length).toBeGreaterThan(0);
  });

  it('counts bars over the piers only where the deck is continuous', () => {
    const bars = (spansM: readonly number[]): number =>
      precastI.size(task(spansM, 1.8)).lines.find(({ what }) => what === 'bars over the piers')!.quantity;
    expect(bars([30])).toBe(0);
    expect(bars([30, 30])).toBeGreaterThan(0);
    expect(bars([30, 30, 30])).toBeGreaterThan(bars([30, 30]));
  });

  it('refuses part of a beam', () => {
    expect(() => precastI.size({ ...task([30], 1.8), girders: 1 })).toThrow(
      /girders: expected a whole number, 2 or more, received 1/u,
    );
    expect(() => precastI.size(task([0], 1.8))).toThrow(/spansM\[0\]: expected more than 0 m/u);
  });
});

describe('strandRows(points, depthM, standard)', () => {
  it('leaves the strand pattern of a BT-72: 12, 12, 8, 4 and pairs in the web (PCI example 9.1a, from memory)', () => {
    expect(
      catalogueBeam('BT-72')
        .rows.slice(0, 6)
        .map(({ count }) => count),
    ).toEqual([12, 12, 8, 4, 2, 2]);
  });

  it('fits more strands in a deeper bulb-tee', () => {
    const fit = (depthM: number): number =>
      bulbTee(depthM, 'lm1').rows.reduce((sum, row) => sum + row.count, 0);
    expect(fit(2)).toBeGreaterThan(fit(1.4));
    expect(fit(1.4)).toBeGreaterThan(fit(1));
  });
});

describe('beamsFor(standard, mostM)', () => {
  it('takes both published girders of 72 in, and the shallowest where none fits', () => {
    expect(beamsFor('hl93', 1.85).map(({ name }) => name)).toEqual(['AASHTO VI', 'BT-72']);
    expect(beamsFor('hl93', 0.1).map(({ name }) => name)).toEqual(['AASHTO I']);
    expect(beamsFor('lm1', 1.27).map(({ depthM }) => Number(depthM.toFixed(6)))).toEqual([1.2]);
  });
});

describe('strandPlan(model, spanM, low, relieved, top) and strandsAt(...)', () => {
  it('takes debonded strands off the ends only', () => {
    const model = modelOf(task([32], 1.9));
    const plan = strandPlan(model, 32, 30, 10, 2);
    const there = { areaM2: 0, zM: 0 };
    strandsAt(model, plan, 0, there);
    expect(there.areaM2 / model.strandM2).toBeCloseTo(22, 9);
    expect(there.zM).toBeCloseTo(plan.endM, 9);
    strandsAt(model, plan, 0.5, there);
    expect(there.areaM2 / model.strandM2).toBeCloseTo(32, 9);
    expect(there.zM).toBeCloseTo(plan.midM, 9);
  });

  it('relieves the top at release by debonding, by draping and by strands in the top flange', () => {
    for (const standard of ['lm1', 'hl93'] as const) {
      const model = modelOf(task([32], 1.9, standard));
      const use = (relieved: number, top: number): number =>
        releaseUse(model, 0, strandPlan(model, 32, 30, relieved, top)).releaseTop.demand;
      expect(use(4, 0)).toBeLessThan(use(0, 0));
      expect(use(0, 2)).toBeLessThan(use(0, 0));
    }
  });
});

describe('strandLosses(model, count, eM, spanM)', () => {
  it('loses a fifth to a third of the jacking stress in ordinary beams (common practice, no source)', () => {
    for (const standard of ['lm1', 'hl93'] as const) {
      const model = modelOf(task([32], 1.9, standard));
      const { transferMPa, lastingMPa } = strandLosses(model, 40, model.shape.centroidM - 0.14, 32);
      expect(lastingMPa).toBeLessThan(transferMPa);
      expect(1 - lastingMPa / model.jackMPa).toBeGreaterThan(0.15);
      expect(1 - lastingMPa / model.jackMPa).toBeLessThan(0.33);
    }
  });
});
