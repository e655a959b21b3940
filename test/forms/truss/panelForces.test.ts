import { describe, expect, it } from 'vitest';
import { trafficOnDeck } from '../../../lib/actions/index.ts';
import { heightFactor, panelForces } from '../../../lib/forms/truss/panelForces.ts';
import { trussGeometry } from '../../../lib/forms/truss/trussGeometry.ts';

/** One lane of 3 m and nothing else. */
const oneLane = {
  widthM: 4,
  carriagewayM: 3,
  carriagewayOffsetM: 0,
  lanes: 1,
  footwayM: 0,
  surfacingM: 0,
  superimposedKNm: 0,
};

describe('panelForces(...)', () => {
  it('bottom chord of an 80 m truss under lane 1 of LM1 is M/h, worked out by hand', () => {
    const spanM = 80;
    const heightM = 10;
    const load = trafficOnDeck('lm1', oneLane);
    const geometry = trussGeometry(spanM, heightM, 10, true);
    const forces = panelForces(spanM, 10, true, load, 0);
    const most = Math.max(
      ...geometry.members.map((member, i) =>
        member.role === 'bottom-chord'
          ? forces.members[i]!.trafficMax * heightFactor(member.role, geometry)
          : 0,
      ),
    );
    // By hand: 27 kN/m x 80^2 / 8 = 21 600; tandem 2 x 300 kN, one axle at midspan, the other 1.2 m off:
    // 300 x 20 + 300 x (20 - 0.6) = 11 820; (21 600 + 11 820) / 10 = 3 342 kN.
    expect(most).toBeCloseTo(3342, 6);
  });

  it('end post carries the end panel shear over the sine of its slope, worked out by hand', () => {
    const geometry = trussGeometry(80, 10, 10, false);
    const forces = panelForces(80, 10, false, trafficOnDeck('lm1', oneLane), 0);
    const i = geometry.members.findIndex((member) => member.role === 'end-post');
    const compression = -forces.members[i]!.trafficMin * heightFactor('end-post', geometry);
    // End panel shear: influence 0 at the bearing, 0.9 at the first floor node (8 m), 0 at the far end.
    // 27 x 0.9 x 80 / 2 = 972; axles at 8 m and 9.2 m: 300 x 0.9 + 300 x 0.9 x (80 - 9.2) / 72 = 535.5.
    const shear = 972 + 535.5;
    expect(compression).toBeCloseTo(shear / (10 / Math.hypot(4, 10)), 6);
  });
});
