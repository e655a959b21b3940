import { expect, it } from 'vitest';
import { formModule, sizeableForms } from '../../lib/index.ts';
import { formBuilt, optionNote } from '../../notebooks/drawing/optionWords.ts';
import { example } from '../explain/contexts.ts';

it('optionNote(option) says how a box is made where it is not the usual way', () => {
  const { appraisal } = example();
  const [option] = appraisal.options;
  const note = (variant: object): string => optionNote(appraisal.site, { ...option!, variant });
  const asked = note({
    boxWidthM: 6.6,
    strengthMPa: 60,
    light: { densityKgM3: 1863, middleM: [0, 60, 0] },
    ballastKNm: [20, 0, 0],
  });
  expect(asked).toMatch(
    /, box 6.60 m wide between its webs, concrete of 60 MPa, lightweight concrete of 1\u2009863 kg\/m³ about the middles of spans, ballast in its cells/u,
  );
  expect(note({ ribs: true })).toContain(', slab on ribs');
  expect(note({ light: { densityKgM3: 1800 }, ballastKNm: [0] })).not.toMatch(/middles|ballast/u);
  expect(note({ castInPiers: 2 })).toContain(', cast in with 2 piers');
  expect(note({ castInPiers: 1 })).toContain(', cast in with one pier');
  expect(note({})).not.toMatch(/concrete|box/u);
});

it('formBuilt(option) says a method that is not the usual one of its form, and no other', () => {
  expect(formBuilt({ form: 'concrete-box', method: 'launch' })).toBe('Concrete box, launched');
  expect(formBuilt({ form: 'concrete-box', method: 'falsework' })).toBe('Concrete box');
  expect(formBuilt({ form: 'truss', method: 'float-in' })).toBe('Truss, floated in');
  for (const form of sizeableForms) {
    const [usual] = formModule(form).methods;
    expect(formBuilt({ form, method: usual }), form).not.toMatch(/launched|floated/u);
  }
});
