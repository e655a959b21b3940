import { cantileverData } from './cantileverData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { SizedHaunched } from './sizeHaunched.ts';

/** How piers hold the arms until they are joined: shafts that are cast in do so themselves. */
function builtIn({ heldPiers, task }: CantileverModel): string {
  if (heldPiers.length === 0) return 'built in or propped';
  return heldPiers.length === task.spansM.length - 1
    ? 'their shafts, cast in with the deck, take it'
    : 'shafts that are cast in with the deck take it, the others are built in or propped';
}

/** What the engineer has to know of balance and of unequal arms. */
export function haunchedWarnings(model: CantileverModel, { weight }: SizedHaunched): string[] {
  const warnings: string[] = [];
  if (model.arms.length > 0)
    warnings.push(
      `Until its arms are joined a pier takes up to ${(weight.unbalancedKNm / 1e3).toFixed(0)} MNm with one arm a segment ahead: ${builtIn(model)}.`,
    );
  if (model.heldPiers.length > 0 && model.task.shafts === undefined)
    warnings.push(
      'Shafts that the deck is cast in with are not known: what they hold it back by as it shortens and cools is not reckoned with.',
    );
  const last = model.task.spansM.length - 1;
  for (const hold of weight.holds) {
    const arm = model.arms[hold.anchor.longer]!;
    const shorter = model.arms[hold.anchor.shorter]!;
    if (!(arm.armM > arm.balancedM)) continue;
    const missingKN = hold.upliftKN - hold.weightKN;
    const isEnd = hold.support === 0 || hold.support === last + 1;
    // Ballast along a simple span stands on its end by half.
    const { holding } = cantileverData.holdDown;
    const ballastKNm = missingKN / (holding * 0.5 * model.task.spansM[shorter.span]!);
    warnings.push(
      `Span ${arm.span + 1}: the last ${(arm.armM - arm.balancedM).toFixed(0)} m of the arm from support ${arm.support + 1} are held down by span ${shorter.span + 1}, joined before: support ${hold.support + 1} would lift by ${(hold.upliftKN / 1e3).toFixed(1)} MN against ${(hold.weightKN / 1e3).toFixed(1)} MN of weight there${
        missingKN <= 0
          ? ''
          : isEnd
            ? `; ${ballastKNm.toFixed(0)} kN/m more ballast in span ${shorter.span + 1} would hold it`
            : '; tied down or weighted'
      }.`,
    );
  }
  return warnings;
}
