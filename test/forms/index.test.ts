import { describe, expect, it } from 'vitest';
import { formModule, forms, sizeableForms } from '../../lib/forms/index.ts';
import { families, familyOf, formIds } from '../../lib/model/index.ts';

describe('formModule(id)', () => {
  it('gives the module of every form it can size, under its own id', () => {
    for (const id of sizeableForms) expect(formModule(id).id).toBe(id);
    expect(Object.keys(forms).sort()).toEqual([...sizeableForms].sort());
  });

  it('puts every form into its family, and the list of forms goes family by family', () => {
    for (const id of sizeableForms) expect(formModule(id).family).toBe(familyOf[id]);
    const order = formIds.map((id) => families.indexOf(familyOf[id]));
    expect(order).toEqual([...order].sort((a, b) => a - b));
  });

  it('refuses a form it cannot size, naming those it can', () => {
    const missing = formIds.find((id) => !sizeableForms.includes(id));
    if (missing !== undefined)
      expect(() => formModule(missing)).toThrow(/form: expected one of .*composite-i.*, received/u);
  });
});
