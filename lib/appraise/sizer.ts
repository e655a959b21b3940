import { formModule } from '../forms/index.ts';
import type { Design, UnitTask } from '../model/index.ts';
import { remembered, type Kept } from '../kept.ts';

/** Sizes units and remembers them: sizing is pure, and an edit of rates or obstacles asks for the same units again. */
export type Sizer = (task: UnitTask) => Design;

/** A sizer that remembers in `designs`. */
export const sizer =
  (designs: Kept<Design>): Sizer =>
  (task) =>
    remembered(designs, JSON.stringify(task), () => formModule(task.form).size(task));
