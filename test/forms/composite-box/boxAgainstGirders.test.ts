import { describe, expect, it } from 'vitest';
import { compositeBox } from '../../../lib/forms/composite-box/index.ts';
import { compositeI } from '../../../lib/forms/composite-i/index.ts';
import { openTorsion } from '../../../lib/mechanics/index.ts';
import type { Design } from '../../../lib/model/index.ts';
import { tubTask } from './cases.ts';

/**
 * One deck of 12 m on two I-girders and on one box of the same steel: the box at a depth of span / 25, the girders at
 * the depth at which they need as much. Formulas of beams and thin-walled sections (any text): two girders resist
 * turning by bending against one another, 24 E I s2 / L3 at midspan between forks; a closed section by 4 G J / L.
 */
const spanM = 60;
const E = 210e6;
const G = 81e6;
const figure = (design: Design, name: string): number => design.figures[name]!;
const box = compositeBox.size(tubTask([spanM], spanM / 25, { widthM: 12 }));
const girdersAt = (depthM: number): Design =>
  compositeI.size(tubTask([spanM], depthM, { widthM: 12, form: 'composite-i', girders: 2 }));

/** Depth at which two girders take the steel of the box: they grow heavier as they grow shallower. */
function sameSteel(): Design {
  const wanted = figure(box, 'steelKgM2');
  let least = 1.4;
  let most = 3.2;
  for (let round = 0; round < 30; round++) {
    const depthM = (least + most) / 2;
    if (figure(girdersAt(depthM), 'steelKgM2') > wanted) least = depthM;
    else most = depthM;
  }
  return girdersAt(most);
}
const girders = sameSteel();

/** Torsion constants, m4: Bredt for the box with its slab; sum of s t3 / 3 for girders and slab. */
const closedM4 = figure(box, 'torsionConstantM4');
const openM4 =
  2 *
    openTorsion([
      { lengthM: figure(girders, 'topFlangeWidthM'), thicknessM: figure(girders, 'midspanTopFlangeM') },
      { lengthM: figure(girders, 'bottomFlangeWidthM'), thicknessM: figure(girders, 'midspanBottomFlangeM') },
      { lengthM: figure(girders, 'girderHeightM'), thicknessM: figure(girders, 'midspanWebM') },
    ]) +
  (12 * figure(girders, 'slabMeanM') ** 3) / 3 / figure(girders, 'modularRatio');

/** Turning stiffness at midspan, kNm per radian: halves bending against one another, and pure torsion. */
const bending = (inertiaM4: number, apartM: number): number =>
  (24 * E * inertiaM4 * apartM ** 2) / spanM ** 3;
const twisting = (constantM4: number): number => (4 * G * constantM4) / spanM;
const sides = {
  girders: {
    apartM: figure(girders, 'spacingM'),
    bent: bending(figure(girders, 'midspanCompositeInertiaM4'), figure(girders, 'spacingM')),
    twisted: twisting(openM4),
  },
  box: {
    apartM: figure(box, 'webSpacingM'),
    bent: bending(figure(box, 'midspanCompositeInertiaM4'), figure(box, 'webSpacingM')),
    twisted: twisting(closedM4),
  },
};

/** Share of a load `y` from the middle that bends the side it stands on. */
const shareAt = (y: number, side: (typeof sides)['box']): number =>
  0.5 + ((y / side.apartM) * side.bent) / (side.bent + side.twisted);

describe('one box against two girders of the same steel', () => {
  it('compares decks of equal steel, within 3 %', () => {
    expect(figure(girders, 'steelKgM2') / figure(box, 'steelKgM2')).toBeGreaterThan(0.97);
    expect(figure(girders, 'steelKgM2') / figure(box, 'steelKgM2')).toBeLessThan(1.03);
  });

  it('has a torsion constant more than twenty times that of the open deck', () => {
    expect(closedM4 / openM4).toBeGreaterThan(20);
  });

  it('turns several times less under the same torque', () => {
    const stiffness = ({ bent, twisted }: (typeof sides)['box']): number => bent + twisted;
    expect(stiffness(sides.box) / stiffness(sides.girders)).toBeGreaterThan(3);
  });

  it('spreads lane 1 of LM1, 4 m from the middle, almost evenly where two girders nearly follow the lever rule', () => {
    const lever = 0.5 + 4 / sides.girders.apartM;
    expect(shareAt(4, sides.girders)).toBeGreaterThan(0.5 + 0.8 * (lever - 0.5));
    expect(shareAt(4, sides.girders)).toBeLessThanOrEqual(lever);
    expect(shareAt(4, sides.box)).toBeLessThan(0.65);
    // What each form is sized with: the lever rule on girders, halves of the whole box with its torsion apart.
    expect(figure(girders, 'laneVehicles')).toBeGreaterThan(1.2 * figure(box, 'halfVehicles'));
  });
});
