import type { FormId } from '../model/index.ts';
import { adjacentBox } from './adjacent-box/index.ts';
import { cableStayed } from './cable-stayed/index.ts';
import { cantileverBox } from './cantilever-box/index.ts';
import { compositeBox } from './composite-box/index.ts';
import { compositeI } from './composite-i/index.ts';
import { concreteBox } from './concrete-box/index.ts';
import type { FormModule } from './formModule.ts';
import { portalFrame } from './portal-frame/index.ts';
import { slab } from './slab/index.ts';
import { halfThrough } from './half-through/index.ts';
import { precastI } from './precast-i/index.ts';
import { precastTrough } from './precast-trough/index.ts';
import { steelBox } from './steel-box/index.ts';
import { truss } from './truss/index.ts';

export { cannotCarry, carries } from './common/carries.ts';
export { isWorthSquaring } from './common/squareEnds.ts';
export { supportUpliftKN } from './common/supportUplift.ts';
export type { FormModule, Pattern } from './formModule.ts';

/** Every form the tool can size, by id. Adding a form is one line here beside its folder. */
export const forms: Readonly<Partial<Record<FormId, FormModule>>> = {
  slab,
  'portal-frame': portalFrame,
  'precast-i': precastI,
  'precast-trough': precastTrough,
  'adjacent-box': adjacentBox,
  'half-through': halfThrough,
  'composite-i': compositeI,
  'composite-box': compositeBox,
  'concrete-box': concreteBox,
  'cantilever-box': cantileverBox,
  'steel-box': steelBox,
  truss,
  'cable-stayed': cableStayed,
};

/** Ids of the forms the tool can size, in the order in which they are listed everywhere. */
export const sizeableForms: readonly FormId[] = Object.values(forms).map((form) => form.id);

/**
 * The module of a form.
 * @throws RangeError for a form the tool knows by name but cannot size yet, or does not know
 */
export function formModule(id: FormId): FormModule {
  const form = forms[id];
  if (!form)
    throw new RangeError(
      `form: expected one of ${sizeableForms.join(', ')}, received ${id}; choose another form`,
    );
  return form;
}
