import { describe, expect, it } from 'vitest';
import { adjacentBox } from '../../../lib/forms/adjacent-box/index.ts';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import type { StandardId, UnitTask } from '../../../lib/model/index.ts';

function task(
  spansM: readonly number[],
  depthM: number,
  standard: StandardId = 'lm1',
  widthM = 12,
): UnitTask {
  return {
    form: 'adjacent-box',
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

describe('adjacentBox.size(task)', () => {
  it.each(['lm1', 'hl93'] as const)(
    'holds every check over usual spans within its published depths, %s',
    (standard) => {
      for (const spanM of [15, 20, 26, 32])
        expect(
          adjacentBox.size(task([spanM, spanM], 0.045 * spanM, standard)).warnings,
          `${spanM} m`,
        ).toEqual([]);
    },
  );

  it('fills the deck with beams of a practical width', () => {
    for (let widthM = 6; widthM <= 30; widthM += 1.7) {
      const { figures } = adjacentBox.size(task([25], 1.1, 'lm1', widthM));
      expect(figures['spacingM']! * figures['beamLines']!).toBeCloseTo(widthM, 9);
      expect(figures['spacingM']).toBeGreaterThanOrEqual(0.92);
      expect(figures['spacingM']).toBeLessThanOrEqual(1.52);
    }
  });

  it('lays all of its weight on its supports', () => {
    const asked = task([22, 28, 22], 1.2);
    const { lines, reactions } = adjacentBox.size(asked);
    const grout = lines.find(({ what }) => what === 'grout in the keys')!.quantity;
    const m3 = quantityOf(lines, 'precast-concrete') + quantityOf(lines, 'deck-concrete') - grout;
    const down = reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    expect(down).toBeCloseTo(25 * m3 + asked.deck.superimposedKNm * 72, 3);
  });

  it('needs more strand for a longer span and less for a deeper beam', () => {
    const strands = (spanM: number, depthM: number): number =>
      adjacentBox.size({ ...task([spanM], depthM), girders: 9 }).figures['span1Strands']!;
    expect(strands(30, 1.2)).toBeGreaterThan(strands(25, 1.2));
    expect(strands(30, 1.2)).toBeGreaterThan(strands(30, 1.4));
  });

  it('is the same for a span whether others follow or not: spans are linked, not continuous', () => {
    const one = adjacentBox.size(task([26], 1.1));
    const three = adjacentBox.size(task([26, 26, 26], 1.1));
    expect(three.figures['span2Strands']).toBe(one.figures['span1Strands']);
    expect(three.reactions[0]!.trafficMaxKN).toBeCloseTo(one.reactions[0]!.trafficMaxKN, 6);
  });

  it('says which limit a span is past', () => {
    const shallow = adjacentBox.size(task([35], 0.7));
    expect(shallow.limitingCheck.utilisation).toBeGreaterThan(1);
    expect(shallow.warnings.length).toBeGreaterThan(0);
  });

  it('refuses part of a beam', () => {
    expect(() => adjacentBox.size({ ...task([20], 1), girders: 1.5 })).toThrow(
      /girders: expected a whole number, 2 or more, received 1.5/u,
    );
  });
});
