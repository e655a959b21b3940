import { describe, expect, it } from 'vitest';
import { liftedSupports } from '../../../lib/appraise/liftedSupports.ts';
import { armsOf } from '../../../lib/forms/cantilever-box/arms.ts';
import { choosePierDepth } from '../../../lib/forms/cantilever-box/choosePierDepth.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import { depthAt } from '../../../lib/forms/common/depthAlong.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { formModule } from '../../../lib/forms/index.ts';
import { imposedCurvature } from '../../../lib/mechanics/index.ts';
import { itemOf } from '../../../lib/takeoff/index.ts';
import { cantileverSpans, cantileverTask } from './cases.ts';

const usual = cantileverTask(cantileverSpans(100), 2.8);
const design = cantileverBox.size(usual);

describe('armsOf()', () => {
  it('meets in the middle of inner spans and leaves the rest of the end spans to falsework', () => {
    expect(armsOf([62, 100, 62]).map(({ armM }) => armM)).toEqual([50, 50, 50, 50]);
  });

  it('finds none in a single span', () => {
    expect(armsOf([60])).toEqual([]);
  });
});

describe('cantileverBox', () => {
  it('is registered under its id', () => {
    expect(formModule('cantilever-box')).toBe(cantileverBox);
    expect(cantileverBox).toMatchObject({ family: 'box', methods: ['balanced-cantilever'] });
  });

  it('sizes an ordinary unit within all limits and says what its piers take', () => {
    for (const { id, utilisation } of design.checks) expect(utilisation, id).toBeLessThanOrEqual(1.0001);
    expect(design.warnings).toHaveLength(2);
    expect(design.warnings[0]).toMatch(/a pier takes up to \d+ MNm/u);
    expect(cantileverBox.size({ ...usual, clearUnderM: [9, 20, 20, 9] }).warnings).toHaveLength(1);
  });

  it('draws a haunch from the depth at midspan to that over the piers, the same on both sides', () => {
    const { support, midspan } = design.depthM;
    expect(midspan).toBe(2.8);
    expect(support).toBeGreaterThan(midspan);
    const at = (xM: number): number => depthAt(design.depthAlong, xM);
    expect(at(62)).toBeCloseTo(support, 9);
    expect(at(112)).toBeCloseTo(midspan, 9);
    expect(at(0)).toBeCloseTo(midspan, 9);
    expect(at(82)).toBeCloseTo(at(142), 6);
    expect(at(87)).toBeGreaterThan(midspan);
    // Between a straight haunch and a parabola.
    expect((at(87) - midspan) / (support - midspan)).toBeGreaterThan(0.25);
    expect((at(87) - midspan) / (support - midspan)).toBeLessThan(0.5);
  });

  it('measures only items of the bill, travellers among them and falsework under the ends alone', () => {
    for (const { item } of design.lines) expect(() => itemOf(item)).not.toThrow();
    expect(design.lines.filter(({ item }) => item === 'method-setup')).toHaveLength(1);
    const known = cantileverBox.size({ ...usual, clearUnderM: [9, 20, 20, 9] });
    // 12 m at each end, mean height of the soffit 14.5 m.
    expect(quantityOf(known.lines, 'falsework')).toBeCloseTo(2 * 12 * 12 * 14.5, 6);
  });

  it('carries its weight: permanent reactions are the measured concrete and the superimposed load', () => {
    const sum = design.reactions.reduce((all, { permanentKN }) => all + permanentKN, 0);
    const weight = 25 * quantityOf(design.lines, 'box-concrete') + usual.deck.superimposedKNm * 224;
    expect(sum / weight).toBeCloseTo(1, 3);
  });

  it('is the same from either end', () => {
    const one = cantileverBox.size(cantileverTask([60, 100, 80, 50], 2.6));
    const other = cantileverBox.size(cantileverTask([50, 80, 100, 60], 2.6));
    for (const item of ['box-concrete', 'prestress', 'reinforcement'])
      expect(quantityOf(other.lines, item) / quantityOf(one.lines, item)).toBeCloseTo(1, 2);
    one.reactions.forEach(({ permanentKN }, j) =>
      expect(other.reactions[4 - j]!.permanentKN / permanentKN).toBeCloseTo(1, 2),
    );
  });

  it('refuses a single span by its first check', () => {
    const { checks, limitingCheck } = cantileverBox.size(cantileverTask([60], 3));
    expect(checks[0]!.id).toBe('balance');
    expect(limitingCheck.utilisation).toBe(Infinity);
  });

  it('says when an end lifts', () => {
    const design = cantileverBox.size(cantileverTask([35, 100, 35], 2.8));
    expect(liftedSupports(design)[0]).toMatch(/^The first support is pulled up/u);
  });
});

describe('stages of a cantilevered box', () => {
  const { model, box } = choosePierDepth(usual);
  const { weight, sections, found } = box;
  const pier = model.beam.supportAt[1]!;
  const middle = model.beam.xM.findIndex((x) => Math.abs(x - 112) < 1e-9);

  it('hogs at the pier by the weight of an arm and its traveller before the arms are joined', () => {
    let moment = weight.travellerKN * 50;
    const { xM } = model.beam;
    for (let i = pier; i < middle; i++) {
      const load = ((weight.loadKNm[i]! + weight.loadKNm[i + 1]!) / 2) * (xM[i + 1]! - xM[i]!);
      moment += load * ((xM[i]! + xM[i + 1]!) / 2 - 62);
    }
    expect(-weight.cantileverKNm[pier]! / moment).toBeCloseTo(1, 2);
  });

  it('creeps from the moments of the stages towards those of a deck struck at once, and not past them', () => {
    for (const i of [pier, middle]) {
      const [open, lasting, once] = [weight.openKNm[i]!, weight.lastingKNm[i]!, weight.atOnce.momentKNm[i]!];
      // phi / (1 + 0.8 phi) with phi = 1.5.
      expect((lasting - open) / (once - open)).toBeCloseTo(1.5 / 2.2, 9);
    }
    expect(weight.lastingKNm[middle]).toBeGreaterThan(weight.openKNm[middle]!);
  });

  it('has the parasitic moments that the beam solver gives for the same curvature', () => {
    const kN = model.strandM2 * 1e3 * found.stresses.bottom.lastingMPa;
    const kappa = found.bottom.map(
      (strands, i) => (-strands * kN * (sections.lowM[i]! - 0.13)) / model.stiffness[i]!,
    );
    const { momentKNm } = imposedCurvature(model.beam, kappa);
    momentKNm.forEach((moment, i) => expect(Math.abs(found.parasiticBottomKNm[i]! - moment)).toBeLessThan(1));
  });

  it('keeps the top over the pier pressed while cantilevering, by hand', () => {
    const { areaM2, inertiaM4, topM } = sections.pier;
    const force = 0.9 * found.top[pier]! * model.strandM2 * found.stresses.top.initialMPa * 1e3;
    const arm = topM - 0.16;
    const pressed = force / areaM2 + ((force * arm + weight.cantileverKNm[pier]!) * topM) / inertiaM4;
    expect(pressed).toBeGreaterThan(0);
  });

  it('ends tendons of the arms towards the tips and those of the spans towards the piers', () => {
    for (let i = pier; i < middle - 1; i++) {
      expect(found.top[i + 1]).toBeLessThanOrEqual(found.top[i]!);
      expect(found.bottom[i + 1]).toBeGreaterThanOrEqual(found.bottom[i]!);
    }
    expect(found.bottom[pier]).toBe(0);
  });
});
