import { describe, expect, it } from 'vitest';
import { compositeBox } from '../../lib/forms/composite-box/index.ts';
import { compositeI } from '../../lib/forms/composite-i/index.ts';
import type { FormModule } from '../../lib/forms/index.ts';
import { tubTask } from '../forms/composite-box/cases.ts';

/**
 * Steel of a composite box over that of twin girders at the same span: about 1.15 to 1.35 (practice of preliminary
 * design, from memory). The law of twin girders is 0.105 L^1.6 + 100 kg/m2 (French practice, from memory). Each form at
 * the depth, of spans over 18 to 30, where it needs least steel and holds its limits.
 */
const ratio = (L: number): { readonly box: number; readonly girders: number; readonly law: number } => {
  const least = (form: FormModule): number =>
    Math.min(
      ...[18, 20, 22, 24, 26, 28, 30].map((over) => {
        const { figures, limitingCheck } = form.size(
          tubTask([0.8 * L, L, 0.8 * L], L / over, { form: form.id }),
        );
        return limitingCheck.utilisation <= 1.0001 ? figures.steelKgM2! : Infinity;
      }),
    );
  return { box: least(compositeBox), girders: least(compositeI), law: 0.105 * L ** 1.6 + 100 };
};

describe('compositeBox.size() against twin girders and their law', () => {
  it.each([60, 80])('needs 1.0 to 1.35 of the steel of twin girders at %i m', (L) => {
    const { box, girders, law } = ratio(L);
    expect(box / girders).toBeGreaterThan(1);
    expect(box / girders).toBeLessThan(1.35);
    expect(box / law).toBeGreaterThan(1.0);
    expect(box / law).toBeLessThan(1.35);
  });

  it('needs no more than 1.35 of the steel of twin girders at 100 m', () => {
    const { box, girders, law } = ratio(100);
    expect(box / girders).toBeLessThan(1.35);
    expect(box / law).toBeLessThan(1.35);
  });
});
