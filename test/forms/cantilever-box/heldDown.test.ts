import { describe, expect, it } from 'vitest';
import { armsOf } from '../../../lib/forms/cantilever-box/arms.ts';
import { choosePierDepth } from '../../../lib/forms/cantilever-box/choosePierDepth.ts';
import { cantileverFigures } from '../../../lib/forms/cantilever-box/figures.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import { cantileverSpans, cantileverTask } from './cases.ts';

/** End spans of 0.4 of the main span: 36.8 m of arm against 50 m. */
const short = cantileverTask([40, 100, 40], 2.8, { ballastKNm: [60, 0, 60] });
const { model, box } = choosePierDepth(short);
const { weight, found } = box;
const { xM, supportAt } = model.beam;
const pier = supportAt[1]!;
const middle = xM.findIndex((x) => Math.abs(x - 90) < 1e-9);
const at = (x: number): number => xM.findIndex((station) => Math.abs(station - x) < 1e-6);

describe('armsOf()', () => {
  it('lets the longer arm go on to midspan from where the shorter one balances it', () => {
    [36.8, 50, 50, 36.8].forEach((armM, k) => expect(armsOf([40, 100, 40])[k]!.armM).toBeCloseTo(armM, 9));
    for (const { balancedM } of armsOf([40, 100, 40])) expect(balancedM).toBeCloseTo(36.8, 9);
  });

  it('keeps both arms alike where the end span is long enough', () => {
    for (const { armM, balancedM } of armsOf(cantileverSpans(100))) expect(balancedM).toBe(armM);
  });
});

describe('an arm held down by the span joined before it', () => {
  // w a dx about the pier over the whole 50 m, and the traveller at midspan: statics.
  const rootKNm = (): number => {
    let moment = weight.travellerKN * 50;
    for (let i = pier; i < middle; i++) {
      const load = ((weight.loadKNm[i]! + weight.loadKNm[i + 1]!) / 2) * (xM[i + 1]! - xM[i]!);
      moment += load * ((xM[i]! + xM[i + 1]!) / 2 - 40);
    }
    return moment;
  };

  it('hogs at its pier by the whole arm with its traveller at midspan', () => {
    expect(-weight.cantileverKNm[pier]! / rootKNm()).toBeCloseTo(1, 2);
  });

  it('bends the end span by that moment, its own weight and its ballast, and stands on the abutment: by hand', () => {
    // Simple span of 40 m with a moment at one end, all its weight in place, its traveller gone.
    let aboutPier = 0;
    for (let i = 0; i < pier; i++) {
      const load = ((weight.loadKNm[i]! + weight.loadKNm[i + 1]!) / 2 + 60) * (xM[i + 1]! - xM[i]!);
      aboutPier += load * (40 - (xM[i]! + xM[i + 1]!) / 2);
    }
    const standsKN = (aboutPier - rootKNm()) / 40;
    const moment = (x: number): number => {
      let sum = standsKN * x;
      for (let i = 0; i < at(x); i++) {
        const load = ((weight.loadKNm[i]! + weight.loadKNm[i + 1]!) / 2 + 60) * (xM[i + 1]! - xM[i]!);
        sum -= load * (x - (xM[i]! + xM[i + 1]!) / 2);
      }
      return sum;
    };
    for (const x of [20, 30])
      expect(Math.abs(weight.cantileverKNm[at(x)]! - moment(x)) / rootKNm()).toBeLessThan(0.01);
  });

  it('is in equilibrium when joined: permanent reactions are all weight and ballast', () => {
    const box25 = weight.loadKNm.reduce(
      (sum, kNm, i) => (i === 0 ? 0 : sum + ((kNm + weight.loadKNm[i - 1]!) / 2) * (xM[i]! - xM[i - 1]!)),
      0,
    );
    const diaphragms = 25 * weight.diaphragmM3.reduce((sum, m3) => sum + m3, 0);
    const all = weight.reactionKN.reduce((sum, kN) => sum + kN, 0);
    expect(all / (box25 + diaphragms + 60 * 80)).toBeCloseTo(1, 3);
  });

  it('takes the uplift of the abutment from the couple over the span: by hand', () => {
    const { upliftKN, weightKN, support } = weight.holds[0]!;
    expect([0, 3]).toContain(support);
    const longer = rootKNm() - weight.travellerKN * 50;
    let shorter = 0;
    for (let i = at(40 - 36.8); i < pier; i++) {
      const load = ((weight.loadKNm[i]! + weight.loadKNm[i + 1]!) / 2) * (xM[i + 1]! - xM[i]!);
      shorter += load * (40 - (xM[i]! + xM[i + 1]!) / 2);
    }
    // EN 1990 table A2.4(A): 1.05 overturns, 0.95 holds, 1.35 on loads of construction; from memory.
    const couple = 1.05 * longer + 1.35 * weight.travellerKN * 50 - 0.95 * shorter;
    expect(upliftKN / (couple / 40)).toBeCloseTo(1, 1);
    // Ballast stands there by half, with the piece over the abutment and its diaphragm.
    expect(weightKN).toBeGreaterThan(0.95 * 60 * 20);
    expect(weightKN).toBeLessThan(0.95 * (60 * 20 + 3.2 * 300 + 25 * weight.diaphragmM3[0]!));
  });

  it('ties all its tendons back over the pier, and ends them where the end span has no more use for them', () => {
    for (let i = pier; i < middle - 1; i++) expect(found.top[i + 1]).toBeLessThanOrEqual(found.top[i]!);
    for (let i = 1; i <= pier; i++) expect(found.top[i]).toBeGreaterThanOrEqual(found.top[i - 1]!);
    expect(found.top[pier]).toBe(Math.max(...found.top));
  });
});

describe('cantileverBox with end spans that are too short to balance', () => {
  const bare = cantileverBox.size(cantileverTask([40, 100, 40], 2.8));
  const use = (ballast: number): number =>
    cantileverBox
      .size(cantileverTask([40, 100, 40], 2.8, { ballastKNm: [ballast, 0, ballast] }))
      .checks.find(({ id }) => id === 'hold-down')!.utilisation;

  it('refuses an abutment that would lift and says which ballast would hold it', () => {
    expect(bare.checks.find(({ id }) => id === 'hold-down')!.utilisation).toBeGreaterThan(1);
    const said = bare.warnings.find((text) => /held down by span 1/u.test(text))!;
    const ballast = Number(/(\d+) kN\/m more ballast in span 1/u.exec(said)![1]);
    expect(use(ballast + 2)).toBeLessThanOrEqual(1.02);
    expect(use(ballast / 2)).toBeGreaterThan(1);
  });

  it('refuses more gravel than the cells of the end span hold, by hand', () => {
    const { checks, figures, task } = cantileverBox.size({ ...short, ballastKNm: [400, 0, 400] });
    const room = checks.find(({ id }) => id === 'ballast-room')!;
    expect(room.demand).toBeCloseTo((400 * 40) / 18, 6);
    // Height inside grows from midspan to the pier by about 0.37 of what the haunch adds over 36.8 m; width from the webs.
    const inner = figures['boxInnerHeightM']!;
    expect(room.capacity).toBeGreaterThan(inner * 0.5 * figures['webSpacingM']! * 40);
    expect(room.capacity).toBeLessThan((inner + 4) * task.deck.widthM * 40);
    expect(room.utilisation).toBeGreaterThan(1);
  });

  it('leaves nothing of the main span to falsework', () => {
    expect(bare.figures['onFalseworkM']).toBeCloseTo(2 * 3.2, 6);
    expect(bare.figures['heldArmM']).toBeCloseTo(13.2, 6);
  });

  it('has no such stage, check or figure where the arms balance', () => {
    const usual = cantileverBox.size(cantileverTask(cantileverSpans(100), 2.8));
    expect(usual.checks.some(({ id }) => id === 'hold-down')).toBe(false);
    expect(usual.figures['heldArmM']).toBeUndefined();
  });

  it('says where its figures come from', () => {
    const manual = new Set(cantileverFigures.map(({ path }) => path));
    expect(bare.figures).toHaveProperty('span1HoldingWebM');
    expect(bare.figures).not.toHaveProperty('span2HoldingWebM');
    for (const name of ['heldArmM', 'upliftKN', 'holdingKN']) {
      expect(bare.figures).toHaveProperty(name);
      expect(manual).toContain(`options/:option/designs/:unit/figures/${name}`);
    }
  });
});
