import type { CostTable, FormId } from '../../lib/model/index.ts';

/** Plausible invented figures: deck rate a + b G, a little less for spans below the governing one. */
const rates: Readonly<Partial<Record<FormId, readonly [a: number, b: number, fixed: number]>>> = {
  'composite-i': [9000, 170, 100_000],
  'concrete-box': [9500, 190, 300_000],
  truss: [14_000, 130, 200_000],
  'cable-stayed': [18_000, 70, 1_500_000],
};

/** A cost table made up for tests; `pier(chainage)` is what a support costs before its spans count. */
export function demoTable(pier: (chainageM: number) => number = () => 250_000): CostTable {
  const rate = (form: FormId): readonly [number, number, number] => rates[form] ?? [10_000, 150, 0];
  return {
    deckPerM(form, spanM, governingM) {
      const [a, b] = rate(form);
      return a + b * (0.5 * governingM + 0.5 * spanM);
    },
    depthM: (_, governingM) => governingM / 22,
    unitFixed: (form, _, pylons = 0) => rate(form)[2] * Math.max(pylons, 1),
    support: (_, chainageM, leftM, rightM) => pier(chainageM) + 2500 * (leftM + rightM),
  };
}
