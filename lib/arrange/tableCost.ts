import type { CostTable, FormId, Unit } from '../model/index.ts';
import { aloneWorksAs, endWorksAs, unevenCost } from './curves.ts';

/** A support between two spans, with the form that stands on it. */
interface Standing {
  readonly chainageM: number;
  readonly form: FormId;
  readonly leftM: number;
  readonly rightM: number;
}

/** Intermediate supports of a row of units; one between two units belongs to the main unit. */
function standings(units: readonly Unit[]): Standing[] {
  const all: Standing[] = [];
  units.forEach((unit, u) => {
    const before = units[u - 1];
    unit.supportsM.forEach((chainageM, i) => {
      if (i === unit.supportsM.length - 1) return;
      const rightM = unit.supportsM[i + 1]! - chainageM;
      if (i > 0) all.push({ chainageM, form: unit.form, leftM: chainageM - unit.supportsM[i - 1]!, rightM });
      else if (before !== undefined) {
        const form = before.role === 'main' ? before.form : unit.form;
        all.push({ chainageM, form, leftM: chainageM - before.supportsM.at(-2)!, rightM });
      }
    });
  });
  return all;
}

/** Longest span of a unit, m: the one that governs its depth. */
export function governingSpan(unit: Unit): number {
  return unit.supportsM.reduce(
    (longest, x, i) => (i === 0 ? 0 : Math.max(longest, x - unit.supportsM[i - 1]!)),
    0,
  );
}

/**
 * Cost of a row of units on the cost table, money: decks at the governing span of each unit, end spans of continuous
 * ones and spans alone as the longer inner spans that they work like, fixed costs, and every
 * intermediate support, dearer in a soft zone where the table says so. Abutments are the same for every arrangement and
 * are left out. Uneven spans carry the preference of `unevenCost`. For ordering only.
 */
export function tableCost(units: readonly Unit[], table: CostTable): number {
  let cost = 0;
  for (const unit of units) {
    const governingM = governingSpan(unit);
    cost += table.unitFixed(unit.form, governingM, unit.pylons?.length ?? 0);
    const endWork = endWorksAs(table, unit.form, governingM);
    const isAlone = unit.supportsM.length === 2;
    const atEnd = isAlone ? aloneWorksAs(table, unit.form, governingM) : endWork;
    const hasEnds = unit.pylons === undefined;
    for (let i = 1; i < unit.supportsM.length; i += 1) {
      const span = unit.supportsM[i]! - unit.supportsM[i - 1]!;
      const works = hasEnds && (i === 1 || i === unit.supportsM.length - 1) ? atEnd : 1;
      cost +=
        span * table.deckPerM(unit.form, works * span, governingM) +
        unevenCost(table, unit, span, governingM, works);
    }
  }
  for (const { chainageM, form, leftM, rightM } of standings(units)) {
    cost += table.support(form, chainageM, leftM, rightM);
  }
  return cost;
}
