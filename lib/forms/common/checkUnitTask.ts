import type { UnitTask } from '../../model/index.ts';

/**
 * Refuses a unit that cannot exist.
 * @throws RangeError naming what was expected and received, for spans, depth or width that are not positive, or a
 * carriageway wider than its deck
 */
export function checkUnitTask(task: UnitTask): void {
  const { spansM, deck, depthM, planRadiusM } = task;
  if (spansM.length === 0) throw new RangeError('spansM: expected at least one span, received none');
  spansM.forEach((span, i) => positive(span, `spansM[${i}]`, 'm'));
  positive(depthM, 'depthM', 'm');
  positive(deck.widthM, 'deck.widthM', 'm');
  positive(planRadiusM, 'planRadiusM', 'm');
  if (!(deck.carriagewayM <= deck.widthM))
    throw new RangeError(
      `deck.carriagewayM: expected at most the deck width ${deck.widthM} m, received ${deck.carriagewayM} m`,
    );
}

function positive(value: number, name: string, unit: string): void {
  if (!(value > 0)) throw new RangeError(`${name}: expected more than 0 ${unit}, received ${value}`);
}
