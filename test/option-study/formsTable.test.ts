import { describe, expect, it } from 'vitest';
import {
  formsAsked,
  readStudy,
  sizeableForms,
  writeStudy,
  type FormId,
  type Study,
} from '../../lib/index.ts';
import { countWords } from '../../notebooks/format.ts';
import {
  askedWords,
  formsNotAsked,
  unsizedWords,
  withForm,
} from '../../notebooks/option-study/formsTable.ts';
import { workedExample } from '../../notebooks/examples.ts';

const asking = (...forms: FormId[]): Study => {
  const study = workedExample('low-ferry');
  return { ...study, options: { ...study.options, forms } };
};

describe('withForm(study, form, isAsked)', () => {
  it('asks for one more and leaves it out again', () => {
    const study = asking('composite-i', 'truss');
    const more = withForm(study, 'cantilever-box', true);
    expect(formsAsked(more)).toEqual(['composite-i', 'cantilever-box', 'truss']);
    expect(withForm(more, 'cantilever-box', false)).toEqual(study);
    expect(readStudy(writeStudy(more))).toEqual({ ok: true, value: more });
  });

  it('leaves one out of all, and all again is an empty list', () => {
    const without = withForm(asking(), 'slab', false);
    expect(formsAsked(without)).toHaveLength(sizeableForms.length - 1);
    expect(formsNotAsked(without)).toEqual(['slab']);
    expect(withForm(without, 'slab', true).options.forms).toEqual([]);
  });

  it('never leaves the last one out: that would ask for all', () => {
    const study = asking('truss');
    expect(withForm(study, 'truss', false)).toBe(study);
  });

  it('every form is asked for or listed as not', () => {
    for (const study of [asking(), asking('truss'), asking('composite-i', 'slab', 'steel-box')]) {
      const all = [...formsAsked(study), ...formsNotAsked(study)];
      expect([...all].sort()).toEqual([...sizeableForms].sort());
    }
  });
});

describe('askedWords(study)', () => {
  it('counts both', () => {
    const count = sizeableForms.length;
    expect(askedWords(asking())).toBe(`All ${countWords(count)} forms are asked for.`);
    expect(askedWords(asking('composite-i', 'truss'))).toBe(
      `Of ${String(count)} forms two are asked for; ${countWords(count - 2)} are not, and nothing is worked out for them.`,
    );
    expect(askedWords(asking('truss'))).toContain('one is asked for');
  });
});

it('forms that are not sized are said by name', () => {
  expect(unsizedWords()).toMatch(/Suspension|suspension/u);
});
