import { moneyUnit } from '../format.ts';
import type { AppraisedOption, Site } from '../model.ts';
import { formInk } from '../forms/formInk.ts';
import { costAxis, spreadValues } from './axis.ts';
import { chainagesShown, crossingScale, fullSheetPx, leastScale, wholeWidth } from './elevation.ts';
import { narrowStack } from './narrowStack.ts';
import type { Piece } from './piece.ts';
import type { Scale } from './scale.ts';
import type { StackInput, StackSheet } from './stackSheet.ts';
import { narrowBelow } from './stackSheet.ts';
import { rangeWhileHeld } from './whileHeld.ts';
import { rowHeight, stackFoot, stackHead, wideStack } from './wideStack.ts';

export type { StackInput } from './stackSheet.ts';

/** Where the axis of cost starts, right of the elevations, px. */
const costStart = 100;

/**
 * Scale of the elevations of a stack, the stretch they show and their width: what stands under them takes the same. On a
 * sheet too narrow for a long crossing they are wider than it, and pushed sideways; on paper nothing is pushed.
 */
export function stackChainage(site: Site, widthPx: number, asked?: Scale, canPush = true) {
  const narrow = widthPx < narrowBelow;
  const costPx = narrow ? 0 : Math.min(244, Math.max(200, widthPx * 0.2));
  const bodyPx = widthPx - costPx;
  const beside = asked ?? crossingScale(site, bodyPx, narrow ? 2 : 16);
  // Long crossings take the whole width, under their costs, where that gains a scale.
  const whole = asked ?? crossingScale(site, widthPx, 16);
  const least = asked ?? leastScale(crossingScale(site, fullSheetPx, 16));
  const isPushed = canPush && Math.min(beside, whole) > least;
  const isTall = !narrow && (isPushed || (beside >= 5000 && whole < beside));
  const scale = isPushed ? least : isTall ? whole : beside;
  const drawnPx = isPushed ? wholeWidth(site, least) : isTall ? widthPx : bodyPx;
  return { narrow, bodyPx, drawnPx, isTall, scale, shown: chainagesShown(site, drawnPx, scale) } as const;
}

/** What all rows share, and the width of the elevations. */
function layOut(
  input: StackInput,
  canPush: boolean,
): {
  readonly shared: StackSheet;
  readonly bodyPx: number;
  readonly narrow: boolean;
} {
  const ink = formInk(
    input.paper ?? 'colour',
    input.options.flatMap((option) => option.units.map((unit) => unit.form)),
    input.prefix ?? 'stack',
  );
  const { narrow, bodyPx, drawnPx, isTall, scale, shown } = stackChainage(
    input.site,
    input.widthPx,
    input.scale,
    canPush,
  );
  const largest = Math.max(0, ...input.options.map((option) => option.cost.p90));
  const costs = spreadValues(
    input.options.map((option) => option.cost),
    input.budget === null ? [] : [input.budget],
  );
  const [low, high] = [Math.min(...costs), Math.max(...costs)];
  const values = rangeWhileHeld(
    input.hands?.hold,
    `costs ${input.prefix ?? ''}`,
    [low, high],
    (high - low) / 8 || 1,
  );
  const shared: StackSheet = {
    input,
    ink,
    scale,
    shown,
    isTall,
    sheetPx: Math.max(input.widthPx, drawnPx),
    axis: narrow
      ? costAxis(values, 4, input.widthPx - 4)
      : // Right of the prices per m2, so that the line of the budget does not run through them.
        costAxis(values, bodyPx + costStart, input.widthPx - 8, 4),
    unit: moneyUnit(input.currency, largest),
  };
  return { shared, bodyPx, narrow };
}

/**
 * The stack: one row per option on one chainage and one scale, with its cost on one common axis. A row is chosen by
 * click or key; `listenToStack` turns that into an event.
 */
export function stack(input: StackInput): Piece {
  const { shared, bodyPx, narrow } = layOut(input, true);
  return narrow ? narrowStack(shared) : wideStack(shared, bodyPx);
}

/**
 * The stack in parts no higher than a page, on the same scales, for printing; the width must be that of a full sheet.
 * @param heightPx room on a page
 * @param firstPx room on the page on which it begins, under what stands there already
 */
export function stackOnPaper(input: StackInput, heightPx: number, firstPx = heightPx): Piece[] {
  const { shared, bodyPx } = layOut(input, false);
  const roomOn = (page: number): number => (page === 0 ? firstPx : heightPx) - stackHead - stackFoot;
  const parts: AppraisedOption[][] = [];
  let left = 0;
  for (const option of input.options) {
    const height = rowHeight(shared, option, bodyPx);
    const last = parts[parts.length - 1];
    if (last === undefined || height > left) {
      parts.push([option]);
      left = roomOn(parts.length - 1) - height;
    } else {
      last.push(option);
      left -= height;
    }
  }
  return parts.map((options) => wideStack({ ...shared, input: { ...input, options } }, bodyPx));
}
