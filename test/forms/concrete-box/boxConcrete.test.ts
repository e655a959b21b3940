import { describe, expect, it } from 'vitest';
import { concrete, lightConcrete } from '../../../lib/actions/index.ts';
import { cantileverBase, cantileverModel } from '../../../lib/forms/cantilever-box/cantileverModel.ts';
import { cantileverFigures } from '../../../lib/forms/cantilever-box/figures.ts';
import { cantileverBox } from '../../../lib/forms/cantilever-box/index.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { boxConcrete, weightOver } from '../../../lib/forms/concrete-box/boxConcrete.ts';
import { boxModel } from '../../../lib/forms/concrete-box/boxModel.ts';
import { boxFigures } from '../../../lib/forms/concrete-box/figures.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import { webShear } from '../../../lib/forms/concrete-box/webShear.ts';
import { deflectionInfluence } from '../../../lib/mechanics/index.ts';
import type { Design } from '../../../lib/model/index.ts';
import { cantileverTask } from '../cantilever-box/cases.ts';
import { boxTask } from './cases.ts';

const light = (middleM: readonly number[], densityKgM3 = 1900) => ({ light: { densityKgM3, middleM } });
const permanentKN = ({ reactions }: Design): number =>
  reactions.reduce((sum, reaction) => sum + reaction.permanentKN, 0);

describe('lightConcrete(standard, strength, density)', () => {
  it('follows section 11 of EN 1992-1-1: LC50 of 1760 kg/m3, worked by hand', () => {
    // eta_E = 0.8^2 = 0.64 on 37.28 GPa; eta_1 = 0.4 + 0.6 x 0.8 = 0.88 on 4.07 MPa; struts 0.5 x 0.88 / 0.6.
    const found = lightConcrete('lm1', 50, 1760);
    expect(found.ecmMPa).toBeCloseTo(0.64 * concrete('lm1', 50).ecmMPa, 6);
    expect(found.ecmMPa / 1e3).toBeCloseTo(23.86, 1);
    expect(found.fctmMPa).toBeCloseTo(0.88 * 4.07, 2);
    expect(found.shearShare).toBeCloseTo(0.7333, 3);
    // Table 11.1: class 1,8 weighs 1950 kg/m3 reinforced, 150 more than dry; here 1760 + 150.
    expect(found.unitWeightKNm3).toBeCloseTo(18.74, 2);
    expect(found.fcdMPa).toBe(concrete('lm1', 50).fcdMPa);
  });

  it('follows w^1.5 and lambda under AASHTO: 0.115 kcf is 1842 kg/m3', () => {
    // lambda = 7.5 x 0.115 = 0.8625; Ec = 33000 x 0.115^1.5 root(6.5 ksi) = 3281 ksi.
    const found = lightConcrete('hl93', 6.5 * 6.894757, 1842.1);
    expect(found.shearShare).toBeCloseTo(0.8625, 3);
    expect(found.ecmMPa / 6.894757 / 3281).toBeCloseTo(1, 2);
  });

  it.each([1200, 2400, NaN])('refuses %d kg/m3', (density) => {
    expect(() => lightConcrete('lm1', 50, density)).toThrow(/1400 to 2200 kg\/m3 oven-dry/u);
  });
});

describe('boxConcrete(task)', () => {
  it.each([
    [light([0, 20]), /light, middle: expected a number for each of 3 spans, received 2\b/u],
    [light([0, 51, 0]), /light, middle, entry 2: expected 0 to 50 m, received 51 m/u],
    [light([0, 20, 0], 900), /density: expected 1400 to 2200 kg\/m3 oven-dry, received 900/u],
    [{ ballastKNm: [10, -1, 10] }, /ballast, entry 2: expected 0 to 2000 kN\/m, received -1 kN\/m/u],
    [{ ...light([0, 20, 0]), method: 'launch' as const }, /received one that is launched/u],
    [{ strengthMPa: -1 }, /strength: expected 20 to 90 MPa, received -1/u],
    [{ boxWidthM: 11.5 }, /box width: expected 2.5 to 11.1 m, received 11.5 m/u],
    [{ boxWidthM: NaN }, /received NaN/u],
  ])('refuses %o', (change, message) => {
    expect(() => concreteBox.size(boxTask([40, 50, 40], 2.4, change))).toThrow(message);
  });

  it('is light throughout where no middles are given', () => {
    const { light: given } = light([]);
    const task = boxTask([40, 50, 40], 2.4, { light: { densityKgM3: given.densityKgM3 } });
    expect(weightOver({ ...boxConcrete(task), task }, 0, 130)).toBeCloseTo(20.11, 2);
  });

  it('weighs a stretch by the share of it that is light', () => {
    const task = boxTask([40, 50, 40], 2.4, light([0, 20, 0]));
    const made = { ...boxConcrete(task), task };
    // Light from 55 to 75 m at (1900 + 150) x 9.81 / 1000 = 20.11 kN/m3.
    expect(weightOver(made, 60, 70)).toBeCloseTo(20.11, 2);
    expect(weightOver(made, 50, 60)).toBeCloseTo((25 + 20.11) / 2, 2);
    expect(weightOver(made, 0, 40)).toBe(25);
  });
});

describe.each([
  ['concrete-box', (change: object) => concreteBox.size(boxTask([40, 50, 40], 2.4, change)), [0, 30, 0]],
  [
    'cantilever-box',
    (change: object) => cantileverBox.size(cantileverTask([65, 110, 65], 3, change)),
    [0, 60, 0],
  ],
] as const)('size(%s) with lightweight concrete and ballast', (_, size, middleM) => {
  const plain = size({});
  const lighter = size(light(middleM));

  it('puts the weight that its concrete has on the supports', () => {
    const { lightM3, lightWeightKNm3 } = lighter.figures;
    expect(lightM3).toBeGreaterThan(0);
    const all = lighter.lines
      .filter(({ item }) => item === 'box-concrete')
      .reduce((sum, { quantity }) => sum + quantity, 0);
    const laid = lighter.task.deck.superimposedKNm * lighter.task.spansM.reduce((sum, x) => sum + x, 0);
    const blisters =
      1 +
      quantityOf(
        lighter.lines.filter(({ what }) => what === 'blisters and joints'),
        'box-concrete',
      ) /
        (lightM3! +
          quantityOf(
            lighter.lines.filter(({ what }) => what === 'box'),
            'box-concrete',
          ));
    // Blisters are a share of the box wherever they are.
    const weight = 25 * all + blisters * lightM3! * lightWeightKNm3! - 25 * (blisters - 1) * lightM3! + laid;
    expect(permanentKN(lighter) / weight).toBeCloseTo(1, 2);
  });

  it('is lighter and needs less strand; a density of nearly ordinary concrete changes nearly nothing', () => {
    expect(permanentKN(lighter)).toBeLessThan(permanentKN(plain));
    expect(lighter.figures['strandKgM2']!).toBeLessThan(plain.figures['strandKgM2']!);
    expect(lighter.ownWeightShare).toBeLessThan(plain.ownWeightShare);
    const nearly = size(light([0, 0, 0]));
    expect(nearly.figures['strandKgM2']).toBe(plain.figures['strandKgM2']);
    expect(permanentKN(nearly)).toBeCloseTo(permanentKN(plain), 6);
  });

  it('lays ballast on the ends: they hold down more, and the bill has its gravel', () => {
    const ballasted = size({ ballastKNm: [40, 0, 40] });
    const { spansM } = ballasted.task;
    const kN = 40 * (spansM[0]! + spansM[2]!);
    expect(ballasted.figures['ballastKN']).toBeCloseTo(kN, 6);
    expect(quantityOf(ballasted.lines, 'fill')).toBeCloseTo(kN / 18, 6);
    expect(ballasted.reactions[0]!.permanentKN).toBeGreaterThan(plain.reactions[0]!.permanentKN);
  });

  it('says where its figures come from', () => {
    const manual = new Set([...cantileverFigures, ...boxFigures].map(({ path }) => path));
    const more = Object.keys(size({ ...light(middleM), strengthMPa: 60, ballastKNm: [40, 0, 40] }).figures);
    const added = more.filter((name) => !(name in plain.figures));
    expect(added).toHaveLength(6);
    for (const name of added) expect(manual).toContain(`options/:option/designs/:unit/figures/${name}`);
  });
});

describe('stiffness of a deck with a light middle', () => {
  it('a simple span deflects by hand: the middle half softer by 1 / eta_E', () => {
    // Unit load at midspan, EI = 1: L^3 / 48, of which the middle half makes 7 / 8 (integral of (x / 2)^2 from L / 4).
    const task = boxTask([40], 2.2, light([20]));
    const etaE = (1900 / 2200) ** 2;
    const { beam } = boxModel(task);
    const middle = (beam.xM.length - 1) / 2;
    expect(deflectionInfluence(beam, middle)[middle]! / (40 ** 3 / 48)).toBeCloseTo(1 / 8 + 7 / 8 / etaE, 2);
  });

  it('draws moments from a softer middle to the piers', () => {
    const at = (change: object): number => {
      const base = cantileverBase(cantileverTask([65, 110, 65], 3, change));
      const { superimposed, beam } = cantileverModel(base, 6.5, 3);
      return superimposed.momentKNm[beam.supportAt[1]!]!;
    };
    expect(at(light([0, 60, 0]))).toBeLessThan(at({}));
  });

  it('struts of a light web carry 0.5 eta_1 / 0.6 of those of ordinary concrete', () => {
    const model = boxModel(boxTask([40], 2.2));
    const made = boxConcrete(boxTask([40], 2.2, light([40])));
    const demand = {
      shearKN: 3000,
      momentKNm: 0,
      strandM2: 0,
      barM2: 0,
      axialMPa: 0,
      effectiveM: 2,
      acrossKNm: 0,
    };
    const use = webShear(model, 0.5, 0, demand).crushing;
    expect(webShear({ ...model, concrete: made.light! }, 0.5, 0, demand).crushing / use).toBeCloseTo(
      1 / ((0.5 * (0.4 + (0.6 * 1900) / 2200)) / 0.6),
      3,
    );
  });
});
