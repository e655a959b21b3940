import type { SupportReaction } from '../../model/index.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { onFalseworkM } from './haunchedLines.ts';
import type { SizedHaunched } from './sizeHaunched.ts';

/** What the engineer has to know of balance, of unequal arms and of ends that lift. */
export function haunchedWarnings(
  model: CantileverModel,
  { weight }: SizedHaunched,
  reactions: readonly SupportReaction[],
): string[] {
  const warnings: string[] = [];
  if (model.arms.length > 0)
    warnings.push(
      `Until its arms are joined a pier takes up to ${(weight.unbalancedKNm / 1e3).toFixed(0)} MNm with one arm a segment ahead: built in or propped.`,
    );
  const last = model.task.spansM.length - 1;
  onFalseworkM(model).forEach((lengthM, span) => {
    if (span > 0 && span < last && lengthM > weight.segmentM)
      warnings.push(
        `Span ${span + 1} is longer than its neighbours: ${lengthM.toFixed(0)} m of it are left between balanced arms and stand on falsework.`,
      );
  });
  const factor = model.standard.factors.uls.traffic;
  for (const j of [0, reactions.length - 1]) {
    const { permanentKN, trafficMinKN } = reactions[j]!;
    const leastKN = permanentKN + factor * trafficMinKN;
    if (leastKN < 0)
      warnings.push(
        `End bearing ${j === 0 ? 'of the first' : 'of the last'} span lifts by ${(-leastKN).toFixed(0)} kN at the ultimate limit: tied down or weighted.`,
      );
  }
  return warnings;
}
