import { describe, expect, it } from 'vitest';
import { strutKgPerM } from '../../../lib/forms/composite-i/bracingMember.ts';
import { flangeSpliceKg, pieceJoints, webSpliceKg } from '../../../lib/forms/composite-i/fieldSplices.ts';
import { compositeI } from '../../../lib/forms/composite-i/index.ts';
import { girderTask } from './cases.ts';

describe('strutKgPerM(length, standard)', () => {
  // Equal angles of EN 10056 as long as 140 times their least radius of gyration, from memory: leg, i, kg/m.
  it.each([
    ['150 x 14', 0.0293, 31.6],
    ['200 x 18', 0.039, 54.2],
  ])('is the mass of angle %s at its longest', (_name, gyrationM, kgPerM) => {
    expect(Math.abs(strutKgPerM(140 * gyrationM, 'hl93') / kgPerM - 1)).toBeLessThan(0.05);
  });
});

describe('field splices', () => {
  it('pieceJoints(391.6) cuts a girder into fourteen equal pieces, pieceJoints(25) into one', () => {
    expect(pieceJoints(391.6)).toHaveLength(13);
    expect(pieceJoints(391.6)[0]).toBeCloseTo(27.97, 2);
    expect(pieceJoints(25)).toEqual([]);
  });

  it('flangeSpliceKg(1.3 m x 100 mm, 345 MPa) by hand', () => {
    // 44.85 MN / 287 kN = 157 bolts, 14 in a row: 12 rows a side, plates 2 x (11 x 75 + 100) = 1850 mm long.
    expect(flangeSpliceKg(1.3, 0.1, 345)).toBeCloseTo(7850 * 1.3 * 0.1 * 1.85 + 2 * 12 * 14, 6);
  });

  it('webSpliceKg(4.6 m x 25 mm) by hand, with two columns of bolts a side until shear asks for more', () => {
    // 4.5 m of plate, 49 bolts in a column, plates 12.5 mm thick and 2 x (75 + 100) = 350 mm long.
    expect(webSpliceKg(4.6, 0.025, 8000)).toBeCloseTo(2 * 7850 * 4.5 * 0.0125 * 0.35 + 2 * 2 * 49, 6);
    // 40 MN: 139 bolts, three columns.
    expect(webSpliceKg(4.6, 0.025, 40_000)).toBeCloseTo(2 * 7850 * 4.5 * 0.0125 * 0.5 + 2 * 3 * 49, 6);
  });

  it('are bolted where girders are bolted on site, and measured', () => {
    const lines = (standard: 'lm1' | 'hl93') =>
      compositeI.size({ ...girderTask([60, 80, 60], 3.4), standard }).lines;
    const splices = lines('hl93').find(({ what }) => what === 'field splices')!;
    // Two girders, six joints: splices of girders of this size weigh 1 to 3 t each (common practice, no source).
    expect(splices.quantity / 12).toBeGreaterThan(800);
    expect(splices.quantity / 12).toBeLessThan(3000);
    expect(lines('lm1').some(({ what }) => what === 'field splices')).toBe(false);
  });
});
