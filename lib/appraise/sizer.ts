import { formModule } from '../forms/index.ts';
import type { Design, UnitTask } from '../model/index.ts';

/** Sizes units and remembers them: sizing is pure, and an edit of rates or obstacles asks for the same units again. */
export type Sizer = (task: UnitTask) => Design;

/** Designs kept at most; a study asks for a few hundred. */
const KEPT = 4000;

/** A sizer with its own memory. The oldest designs are forgotten first. */
export function sizer(): Sizer {
  const known = new Map<string, Design>();
  return (task) => {
    const key = JSON.stringify(task);
    const found = known.get(key);
    if (found) return found;
    const design = formModule(task.form).size(task);
    if (known.size >= KEPT) {
      const oldest = known.keys().next();
      if (!oldest.done) known.delete(oldest.value);
    }
    known.set(key, design);
    return design;
  };
}
