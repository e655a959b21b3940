import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { girderLayout } from '../../../lib/forms/composite-i/girderLayout.ts';
import { girderModel } from '../../../lib/forms/composite-i/girderModel.ts';
import { compositeI } from '../../../lib/forms/composite-i/index.ts';
import { runsOf } from '../../../lib/forms/composite-i/plateRun.ts';
import { sizeGirder } from '../../../lib/forms/composite-i/sizeGirder.ts';
import { polygonProperties } from '../../../lib/mechanics/index.ts';
import type { Design } from '../../../lib/model/index.ts';
import { girderTask, plainDeck } from './cases.ts';

const three = girderTask([60, 80, 60], 3.1);

describe('girderLayout(task)', () => {
  it('takes two girders up to 15 m of deck, more beyond, and any count asked for', () => {
    expect(girderLayout(girderTask([40], 2, { widthM: 15 })).count).toBe(2);
    expect(girderLayout(girderTask([40], 2, { widthM: 15.5 })).count).toBe(5);
    expect(girderLayout(girderTask([40], 2, { girders: 4 })).count).toBe(4);
    expect(() => girderLayout(girderTask([40], 2, { girders: 1 }))).toThrow(
      /girders: expected a whole number, 2 or more, received 1/u,
    );
  });

  it('fills the width with spacings and overhangs', () => {
    for (const widthM of [8, 12, 15, 16, 20, 25]) {
      const { count, spacingM, overhangM, offsetsM } = girderLayout(girderTask([40], 2, { widthM }));
      expect((count - 1) * spacingM + 2 * overhangM).toBeCloseTo(widthM, 9);
      expect(offsetsM[0]! + offsetsM[count - 1]!).toBeCloseTo(0, 9);
      if (count > 2) expect(spacingM).toBeLessThanOrEqual(3.8 + 1e-9);
    }
  });
});

describe('compositeI.size(task)', () => {
  const design = compositeI.size(three);

  it('keeps the depth asked for, soffit to top of slab', () => {
    expect(design.depthM).toEqual({ support: 3.1, midspan: 3.1 });
    expect(design.figures['girderHeightM']! + design.figures['slabAtGirderM']!).toBeCloseTo(3.1, 9);
  });

  it('measures plates that add up to the steel of the figures', () => {
    const area = 200 * 12;
    expect(quantityOf(design.lines, 'plate-girder-steel') / area).toBeCloseTo(
      design.figures['steelKgM2']!,
      6,
    );
    const plates = design.lines.filter((line) => /flanges|webs/u.test(line.what));
    expect(plates.reduce((sum, line) => sum + line.quantity, 0) / area).toBeCloseTo(
      design.figures['plateKgM2']!,
      6,
    );
  });

  it('carries its permanent loads: reactions sum to weight of steel, slab and superimposed load', () => {
    const steelKN = quantityOf(design.lines, 'plate-girder-steel') * 9.81e-3;
    const slabKN = quantityOf(design.lines, 'deck-concrete') * 25;
    const laidKN = three.deck.superimposedKNm * 200;
    const sum = design.reactions.reduce((all, reaction) => all + reaction.permanentKN, 0);
    // Own weight is brought into agreement to 0.5 %.
    expect(sum / (steelKN + slabKN + laidKN)).toBeGreaterThan(0.995);
    expect(sum / (steelKN + slabKN + laidKN)).toBeLessThan(1.005);
  });

  it('is symmetrical on symmetrical spans and mirrors with its spans', () => {
    const [a, b, c, d] = design.reactions;
    expect(a!.permanentKN).toBeCloseTo(d!.permanentKN, 3);
    // Vehicles are placed to about a hundred thousandth.
    expect(b!.trafficMaxKN / c!.trafficMaxKN).toBeCloseTo(1, 5);
    const there = compositeI.size(girderTask([35, 50, 42], 2.2));
    const back = compositeI.size(girderTask([42, 50, 35], 2.2));
    const steel = (design: Design): number => quantityOf(design.lines, 'plate-girder-steel');
    expect(steel(back) / steel(there)).toBeCloseTo(1, 5);
    expect(back.reactions[2]!.trafficMaxKN / there.reactions[1]!.trafficMaxKN).toBeCloseTo(1, 5);
  });

  it('draws sections whose polygons hold the steel and the slab that were measured', () => {
    const [midspan, pier] = design.sections;
    expect(design.sections.map((cut) => cut.at)).toEqual(['midspan', 'pier']);
    const areaOf = (cut: (typeof design.sections)[number], part: string): number =>
      cut.shapes
        .filter((shape) => shape.part === part && shape.kind === 'polygon')
        .reduce((sum, shape) => sum + polygonProperties(shape.points).areaM2, 0);
    const steel = ['top flange', 'bottom flange', 'web'].reduce(
      (sum, part) => sum + areaOf(midspan!, part),
      0,
    );
    expect(steel / 2).toBeCloseTo(design.figures['midspanSteelAreaM2']!, 9);
    expect(areaOf(pier!, 'bottom flange')).toBeGreaterThan(areaOf(midspan!, 'bottom flange'));
    // The flange seats are drawn level, which the mean thickness leaves out: 3 %.
    expect(areaOf(midspan!, 'slab') / (12 * design.figures['slabMeanM']!)).toBeGreaterThan(0.97);
    expect(areaOf(midspan!, 'slab') / (12 * design.figures['slabMeanM']!)).toBeLessThan(1.03);
  });

  it('draws an elevation that ends at the abutments and at the soffit', () => {
    const points = design.elevation.flatMap((shape) => shape.points);
    expect(Math.min(...points.map(([x]) => x))).toBe(0);
    expect(Math.max(...points.map(([x]) => x))).toBe(200);
    expect(Math.min(...points.map(([, z]) => z))).toBeCloseTo(-3.1, 9);
  });

  it('reports every limit state with a plain label, and the highest as limiting', () => {
    const ids = design.checks.map((check) => check.id);
    for (const id of [
      'casting',
      'bending-spans',
      'bending-piers',
      'service-stress',
      'fatigue',
      'shear',
      'deflection',
    ])
      expect(ids).toContain(id);
    const highest = Math.max(...design.checks.map((check) => check.utilisation));
    expect(design.limitingCheck.utilisation).toBe(highest);
    expect(highest).toBeLessThanOrEqual(1.0001);
    expect(design.warnings).toEqual([]);
  });

  it('says so in a warning when no practical plate is enough', () => {
    const shallow = compositeI.size(girderTask([60, 80, 60], 1.6));
    expect(shallow.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(shallow.warnings.join(' ')).toMatch(/with the heaviest practical plates/u);
  });

  it('says so when the thickest web is too slender for the depth', () => {
    const deep = compositeI.size(girderTask([50], 10));
    expect(deep.checks.find((check) => check.id === 'web-slenderness')!.utilisation).toBeGreaterThan(1);
    expect(design.checks.some((check) => check.id === 'web-slenderness')).toBe(false);
  });

  it('adds a launching check to a launched deck', () => {
    const launched = compositeI.size(girderTask([60, 80, 60], 3.1, { method: 'launch' }));
    expect(launched.checks.some((check) => check.id === 'launching')).toBe(true);
    expect(design.checks.some((check) => check.id === 'launching')).toBe(false);
  });

  it('lets curvature in plan load the outer girder, the more the tighter', () => {
    const steel = [Infinity, 1000, 400, 200].map((planRadiusM) =>
      quantityOf(compositeI.size(girderTask([40, 50, 40], 2.2, { planRadiusM })).lines, 'plate-girder-steel'),
    );
    for (let i = 1; i < steel.length; i++) expect(steel[i]!).toBeGreaterThan(steel[i - 1]!);
  });

  it('shows uplift at the ends of short end spans', () => {
    const { reactions } = compositeI.size(girderTask([20, 60, 20], 2.4));
    expect(reactions[0]!.permanentKN + reactions[0]!.trafficMinKN).toBeLessThan(0);
  });

  it('refuses spans, depths and decks that cannot be', () => {
    expect(() => compositeI.size(girderTask([], 2))).toThrow(/spansM: expected at least one span/u);
    expect(() => compositeI.size(girderTask([40, -3], 2))).toThrow(
      /spansM\[1\]: expected more than 0 m, received -3/u,
    );
    expect(() => compositeI.size(girderTask([40], Number.NaN))).toThrow(/depthM: expected more than 0 m/u);
    const deck = { ...plainDeck(10), carriagewayM: 11 };
    expect(() => compositeI.size(girderTask([40], 2, { deck }))).toThrow(/deck.carriagewayM/u);
  });
});

describe('sizeGirder(model)', () => {
  it('steps flanges along the envelope in few plates', () => {
    const { run } = sizeGirder(girderModel(three));
    for (const thickness of [run.topM, run.bottomM]) {
      const runs = runsOf(thickness);
      // Plates of 60-80-60 m: more than one a span, fewer than one every 8 m.
      expect(runs.length).toBeGreaterThan(5);
      expect(runs.length).toBeLessThan(25);
    }
    const pier = 20;
    expect(run.bottomM[pier]!).toBe(Math.max(...run.bottomM));
  });
});
