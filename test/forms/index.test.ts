import { describe, expect, it } from 'vitest';
import { formModule, forms, sizeableForms } from '../../lib/forms/index.ts';
import { formIds } from '../../lib/model/index.ts';

describe('formModule(id)', () => {
  it('gives the module of every form it can size, under its own id', () => {
    for (const id of sizeableForms) expect(formModule(id).id).toBe(id);
    expect(Object.keys(forms).sort()).toEqual([...sizeableForms].sort());
  });

  it('refuses a form it cannot size, naming those it can', () => {
    const missing = formIds.find((id) => !sizeableForms.includes(id));
    if (missing !== undefined)
      expect(() => formModule(missing)).toThrow(/form: expected one of .*composite-i.*, received/u);
  });
});
