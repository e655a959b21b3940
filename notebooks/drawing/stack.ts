import { moneyUnit } from '../format.ts';
import { formInk } from '../forms/formInk.ts';
import { linearAxis, spreadValues } from './axis.ts';
import { chainagesShown, crossingScale } from './elevation.ts';
import { narrowStack } from './narrowStack.ts';
import type { Piece } from './piece.ts';
import type { StackInput, StackSheet } from './stackSheet.ts';
import { narrowBelow } from './stackSheet.ts';
import { wideStack } from './wideStack.ts';

export type { StackInput } from './stackSheet.ts';

/**
 * The stack: one row per option on one chainage and one scale, with its cost on one common axis. A row is chosen by
 * click or key; `listenToStack` turns that into an event.
 */
export function stack(input: StackInput): Piece {
  const paper = input.paper ?? 'colour';
  const ink = formInk(
    paper,
    input.options.flatMap((option) => option.units.map((unit) => unit.form)),
    input.prefix ?? 'stack',
  );
  const narrow = input.widthPx < narrowBelow;
  const costPx = narrow ? 0 : Math.min(244, Math.max(200, input.widthPx * 0.2));
  const bodyPx = input.widthPx - costPx;
  const scale = input.scale ?? crossingScale(input.site, bodyPx, narrow ? 2 : 16);
  const largest = Math.max(0, ...input.options.map((option) => option.cost.p90));
  const values = spreadValues(
    input.options.map((option) => option.cost),
    input.budget === null ? [] : [input.budget],
  );
  const shared: StackSheet = {
    input,
    ink,
    scale,
    shown: chainagesShown(input.site, bodyPx, scale),
    axis: narrow
      ? linearAxis(values, 4, input.widthPx - 4)
      : linearAxis(values, bodyPx + 30, input.widthPx - 8, 7),
    unit: moneyUnit(input.currency, largest),
  };
  return narrow ? narrowStack(shared) : wideStack(shared, bodyPx);
}
