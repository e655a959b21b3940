import { describe, expect, it } from 'vitest';
import { trussGeometry } from '../../../lib/forms/truss/trussGeometry.ts';
import { trussInfluence } from '../../../lib/mechanics/index.ts';
import { wholeTruss } from './wholeTruss.ts';

describe('trussGeometry(span, height, panels, hangers)', () => {
  it.each([
    [80, 10, 10, false],
    [63, 8, 9, false],
    [90, 12, 12, true],
    [100, 14, 10, true],
  ] as const)(
    '%d m span, %d m high, %d panels, hangers %s: sections give the same influence lines as stiffness',
    (span, height, panels, hangers) => {
      const geometry = trussGeometry(span, height, panels, hangers);
      const { truss, memberAt, floorNodes } = wholeTruss(geometry, (i) => 0.02 + 0.001 * (i % 5));
      const lines = trussInfluence(truss, floorNodes).member;
      geometry.members.forEach((member, i) => {
        const index = memberAt.get(i);
        if (index === undefined) return;
        for (let j = 0; j <= panels; j++) expect(member.influence[j]).toBeCloseTo(lines[index]![j]!, 8);
      });
    },
  );

  it('a uniform load on every floor node gives the middle chord wL2/8h', () => {
    const geometry = trussGeometry(80, 10, 8, false);
    const top = geometry.members.find((member) => member.role === 'top-chord' && member.count === 1)!;
    const perNode = top.influence.reduce((sum, v) => sum + v, 0);
    // w = 1/p on p = 10 m: L2 / 8 p h = 80 x 80 / (8 x 10 x 10) = 8 kN for 1 kN a node.
    expect(perNode).toBeCloseTo(-8, 10);
  });

  it('refuses a height of 0 and odd panels with hangers', () => {
    expect(() => trussGeometry(80, 0, 8, false)).toThrow(RangeError);
    expect(() => trussGeometry(80, Number.NaN, 8, false)).toThrow(RangeError);
    expect(() => trussGeometry(80, 10, 9, true)).toThrow(/even number of panels/u);
  });
});
