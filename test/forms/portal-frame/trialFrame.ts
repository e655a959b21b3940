import type { Design, UnitTask } from '../../../lib/model/index.ts';

/** A deck 12 m wide with two lanes and a footway. */
export const deck = {
  widthM: 12,
  carriagewayM: 9,
  carriagewayOffsetM: 0,
  lanes: 2,
  footwayM: 2,
  surfacingM: 0.09,
  superimposedKNm: 45,
};

/** A frame under that deck, its walls 5.5 m clear. */
export const task = (spansM: readonly number[], depthM: number, more: Partial<UnitTask> = {}): UnitTask => ({
  form: 'portal-frame',
  method: 'falsework',
  spansM,
  deck,
  standard: 'lm1',
  planRadiusM: Infinity,
  depthM,
  clearUnderM: [5.5, ...spansM.map(() => 5.5)],
  ...more,
});

/** Utilisation of the check of a name. */
export const useOf = (design: Design, id: string): number =>
  design.checks.find((check) => check.id === id)!.utilisation;
