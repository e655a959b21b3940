import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import { formModule } from '../../../lib/forms/index.ts';
import { itemOf } from '../../../lib/takeoff/index.ts';
import { boxTask, plainDeck, usualSpans } from './cases.ts';

const usual = boxTask([39, 50, 39], 2.5);

describe('concreteBox', () => {
  it('is registered under its id', () => {
    expect(formModule('concrete-box')).toBe(concreteBox);
    expect(concreteBox).toMatchObject({ family: 'box', methods: ['falsework', 'launch'] });
  });

  it.each([
    [{ spansM: [] }, /spansM/u],
    [{ spansM: [40, NaN] }, /spansM\[1\]/u],
    [{ depthM: 0 }, /depthM/u],
    [{ planRadiusM: -1 }, /planRadiusM/u],
  ])('size(%o) says what is wrong', (change, message) => {
    expect(() => concreteBox.size({ ...usual, ...change })).toThrow(message);
  });

  it('sizes an ordinary unit within all limits and without a complaint but for the height', () => {
    const design = concreteBox.size(usual);
    for (const { id, utilisation } of design.checks) expect(utilisation, id).toBeLessThanOrEqual(1);
    expect(design.warnings).toHaveLength(1);
    expect(design.warnings[0]).toMatch(/Height under the deck is not given/u);
    expect(concreteBox.size({ ...usual, clearUnderM: [8, 10, 10, 8] }).warnings).toEqual([]);
  });

  it('measures only items of the bill, each with a quantity', () => {
    for (const method of concreteBox.methods)
      for (const { item, quantity } of concreteBox.size({ ...usual, method }).lines) {
        expect(() => itemOf(item)).not.toThrow();
        expect(quantity).toBeGreaterThan(0);
      }
  });

  it('measures falsework under the soffit, span by span, and none under a launched deck', () => {
    const clearUnderM = [6, 12, 14, 7];
    const cast = concreteBox.size({ ...usual, clearUnderM });
    const volume = 12 * (39 * 9 + 50 * 13 + 39 * 10.5);
    expect(quantityOf(cast.lines, 'falsework')).toBeCloseTo(volume, 6);
    const launched = concreteBox.size({ ...usual, clearUnderM, method: 'launch' });
    expect(quantityOf(launched.lines, 'falsework')).toBe(0);
    expect(launched.lines.some(({ what }) => what === 'centred tendons for launching')).toBe(true);
  });

  it('carries its weight: permanent reactions are the measured concrete and the superimposed load', () => {
    const design = concreteBox.size(usual);
    const sum = design.reactions.reduce((all, { permanentKN }) => all + permanentKN, 0);
    const weight = 25 * quantityOf(design.lines, 'box-concrete') + usual.deck.superimposedKNm * 128;
    expect(sum / weight).toBeCloseTo(1, 4);
  });

  it('holds the decompression of a simple span by hand: P (1 / A + e / W) against the moments', () => {
    const task = boxTask([40], 2.2);
    const { figures, checks } = concreteBox.size(task);
    const { areaM2: A = 0, inertiaM4: I = 0, centroidFromTopM: top = 0 } = figures;
    const W = I / (2.2 - top);
    const lasting = figures.span1OwnKNm! + (task.deck.superimposedKNm * 40 ** 2) / 8;
    // Frequent traffic of LM1 on 11 m between kerbs: tandems 600 + 400 + 200 kN at 0.75, their resultant and half a gap
    // either side of the middle, and (3 x 9 + 8 x 2.5) kN/m at 0.4.
    const tandem = (0.75 * 1200 * (40 - 0.6) ** 2) / (4 * 40);
    const uniform = (0.4 * (27 + 20) * 40 ** 2) / 8;
    const need = (lasting + tandem + uniform) / W / (0.9 * (1 / A + figures.eccentricityMidspanM! / W));
    const service = checks.find(({ id }) => id === 'service-tension')!;
    expect(service.demand / need).toBeGreaterThan(0.98);
    expect(service.demand / need).toBeLessThan(1.02);
    expect(figures.tendonForceKN).toBeGreaterThanOrEqual(service.demand);
  });

  it('draws polygons that close on the task: depth, width and length', () => {
    const { elevation, sections } = concreteBox.size(usual);
    const face = elevation.find(({ part }) => part === 'deck')!;
    expect(Math.max(...face.points.map(([x]) => x))).toBeCloseTo(128, 9);
    expect(Math.min(...face.points.map(([, z]) => z))).toBeCloseTo(-2.5, 12);
    expect(sections.map(({ at }) => at)).toEqual(['midspan', 'pier']);
    for (const { shapes } of sections) {
      const box = shapes.find(({ part }) => part === 'box')!;
      const x = box.points.map(([y]) => y);
      expect(Math.max(...x) - Math.min(...x)).toBeCloseTo(12, 9);
      expect(Math.min(...box.points.map(([, z]) => z))).toBeCloseTo(-2.5, 12);
      expect(box.holes).toHaveLength(1);
    }
    expect(elevation.filter(({ part, faint }) => part === 'construction joint' && faint)).toHaveLength(2);
  });

  it('turns a short radius into thicker webs over the supports and never into fewer strands', () => {
    const straight = concreteBox.size(usual);
    const curved = concreteBox.size({ ...usual, planRadiusM: 150 });
    expect(curved.figures['webAtSupportsM']).toBeGreaterThan(straight.figures['webAtSupportsM']!);
    expect(quantityOf(curved.lines, 'prestress')).toBeGreaterThanOrEqual(
      0.99 * quantityOf(straight.lines, 'prestress'),
    );
  });

  it('turns a shorter radius into more stirrups, in webs no thinner', () => {
    // A straight deck is left out: its webs are one step of their mould thinner, which asks for more stirrups.
    const curves = [600, 300, 150, 100].map((planRadiusM) => concreteBox.size({ ...usual, planRadiusM }));
    const stirrups = curves.map(({ lines }) => lines.find(({ what }) => what === 'stirrups')!.quantity);
    for (let i = 1; i < curves.length; i++) {
      expect(stirrups[i]).toBeGreaterThan(stirrups[i - 1]!);
      expect(curves[i]!.figures['webAtSupportsM']).toBeGreaterThanOrEqual(
        curves[i - 1]!.figures['webAtSupportsM']!,
      );
    }
  });

  it('does not give short spans the strands of one long span', () => {
    const strand = (spansM: number[]): number => concreteBox.size(boxTask(spansM, 2.6)).figures.strandKgM2!;
    const uneven = strand([40, 42, 63, 42, 40]);
    expect(uneven).toBeLessThan(0.9 * strand([50, 63, 63, 63, 50]));
    expect(uneven).toBeGreaterThan(strand([33, 42, 42, 42, 33]));
  });

  it('says which limit is passed where the depth is out of all reason', () => {
    const design = concreteBox.size(boxTask(usualSpans(80, 3), 1.4));
    expect(design.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(design.warnings.some((warning) => warning.includes('of its limit'))).toBe(true);
    for (const value of Object.values(design.figures)) expect(Number.isFinite(value)).toBe(true);
  });

  it('asks for a deck between 8 and 25 m with one to four cells', () => {
    const cells = [8, 13, 15, 20, 25].map(
      (widthM) => concreteBox.size({ ...usual, deck: plainDeck(widthM) }).figures.cells,
    );
    expect(cells).toEqual([1, 1, 2, 2, 3]);
  });
});
