import { expect, it } from 'vitest';
import type { Site } from '../../lib/model/index.ts';
import { expectedLines, standSupports } from '../../lib/substructure/index.ts';
import { quantitiesOf } from '../../lib/takeoff/index.ts';
import { crossing, plainDesign, profile, unitOn } from './crossing.ts';

/** The crossing seen from the other bank. */
const mirrored: Site = {
  ...crossing,
  groundX: crossing.groundX.map((x) => 200 - x).reverse(),
  groundZ: [...crossing.groundZ].reverse(),
  waters: crossing.waters.map((water) => ({ ...water, fromM: 200 - water.toM, toM: 200 - water.fromM })),
};

it('standSupports(mirrored crossing) stands the mirrored supports with the same quantities', () => {
  const there = standSupports(crossing, [unitOn([0, 50, 130, 200])], [plainDesign([50, 80, 70])], profile);
  const back = standSupports(mirrored, [unitOn([0, 70, 150, 200])], [plainDesign([70, 80, 50])], profile);
  back.reverse();
  there.forEach((support, i) => {
    const other = back[i]!;
    expect(other.chainageM).toBeCloseTo(200 - support.chainageM, 9);
    expect(other.articulation.fixed).toBe(support.articulation.fixed);
    const [a, b] = [quantitiesOf(expectedLines(support)), quantitiesOf(expectedLines(other))];
    expect(b.concreteM3).toBeCloseTo(a.concreteM3, 6);
    expect(b.reinforcementKg).toBeCloseTo(a.reinforcementKg, 4);
  });
});
