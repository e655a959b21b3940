import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { precastTrough } from '../../../lib/forms/precast-trough/index.ts';
import { troughShape } from '../../../lib/forms/precast-trough/troughShape.ts';
import type { StandardId, UnitTask } from '../../../lib/model/index.ts';

function task(
  spansM: readonly number[],
  depthM: number,
  standard: StandardId = 'lm1',
  widthM = 12,
): UnitTask {
  return {
    form: 'precast-trough',
    spansM,
    deck: {
      widthM,
      carriagewayM: widthM - 1,
      carriagewayOffsetM: 0,
      lanes: 2,
      footwayM: 0,
      surfacingM: 0.09,
      superimposedKNm: 0.09 * 23.5 * (widthM - 1) + 10,
    },
    standard,
    planRadiusM: Infinity,
    method: 'crane',
    depthM,
  };
}

describe('precastTrough.size(task)', () => {
  it.each(['lm1', 'hl93'] as const)(
    'holds every check over usual spans within its published depths, %s',
    (standard) => {
      for (const spanM of [18, 24, 30, 36])
        expect(
          precastTrough.size(task([spanM, spanM], 0.06 * spanM, standard)).warnings,
          `${spanM} m`,
        ).toEqual([]);
    },
  );

  it('makes pieces of 36 m past 60 t, as they were hauled at Georges River (project page, read)', () => {
    const { massT, lengthM } = precastTrough.size(task([36, 36], 1.9)).heaviestPiece!;
    expect(lengthM).toBe(36);
    expect(massT).toBeGreaterThan(60);
    expect(massT).toBeLessThan(85);
  });

  it('is far stiffer in torsion once the slab closes it', () => {
    const { figures } = precastTrough.size(task([30], 1.7));
    expect(figures['closedTorsionM4']! / figures['openTorsionM4']!).toBeGreaterThan(20);
  });

  it('lays all of its weight on its supports', () => {
    const asked = task([25, 32, 25], 1.7);
    const { lines, reactions } = precastTrough.size(asked);
    const m3 = quantityOf(lines, 'precast-concrete') + quantityOf(lines, 'deck-concrete');
    const down = reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    expect(down).toBeCloseTo(25 * m3 + asked.deck.superimposedKNm * 82, 3);
  });

  it('needs more strand for a longer span, less for a deeper trough, more in each where there are fewer', () => {
    const strands = (spanM: number, depthM: number, girders: number): number =>
      precastTrough.size({ ...task([spanM], depthM), girders }).figures['span1Strands']!;
    expect(strands(34, 1.8, 5)).toBeGreaterThan(strands(28, 1.8, 5));
    expect(strands(30, 1.5, 5)).toBeGreaterThan(strands(30, 2, 5));
    expect(strands(30, 1.8, 4)).toBeGreaterThan(strands(30, 1.8, 6));
  });

  it('says which limit a span is past', () => {
    const shallow = precastTrough.size(task([40], 1));
    expect(shallow.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(shallow.warnings.length).toBeGreaterThan(0);
  });
});

describe('troughShape(depthM, standard)', () => {
  it('has the section of its plates: bottom, two webs, two flanges, fillets', () => {
    const shape = troughShape(1.5, 'hl93');
    const bottom = 0.275;
    const inner = (0.95 / 2 + 0.1 * bottom - 0.125) * 2;
    const plates =
      ((0.95 + 0.95 + 0.2 * bottom) / 2) * bottom + 2 * 0.125 * (1.5 - 0.1 - bottom) + 2 * 0.45 * 0.1;
    expect(inner).toBeGreaterThan(0.6);
    // Two fillets of 0.1 by 0.1 m on faces that lean 1 in 10.
    expect(shape.areaM2).toBeCloseTo(plates + 0.01, 2);
    expect(shape.centroidM).toBeLessThan(0.75);
  });

  it('holds three rows of strands or more in its bottom slab', () => {
    for (const depthM of [0.75, 1.2, 1.8])
      expect(troughShape(depthM, 'lm1').rows.length).toBeGreaterThanOrEqual(3);
  });
});
