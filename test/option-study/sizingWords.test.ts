import { describe, expect, it } from 'vitest';
import { formModule } from '../../lib/forms/index.ts';
import type { AppraisedOption, Unit } from '../../lib/index.ts';
import { sizingSaid } from '../../notebooks/option-study/sizingWords.ts';

const main: Unit = { form: 'adjacent-box', role: 'main', supportsM: [0, 25] };
const sizedAt = (depthM: number): AppraisedOption['designs'][number] =>
  formModule('adjacent-box').size({
    form: 'adjacent-box',
    spansM: [25],
    deck: {
      widthM: 12,
      carriagewayM: 11,
      carriagewayOffsetM: 0,
      lanes: 2,
      footwayM: 0,
      surfacingM: 0.09,
      superimposedKNm: 33,
    },
    standard: 'lm1',
    planRadiusM: Infinity,
    method: 'crane',
    depthM,
  });

describe('sizingSaid', () => {
  it('says that beams could not be made with the depth asked for, and nothing of a depth nobody asked for', () => {
    const option = { units: [main], designs: [sizedAt(1.2)] };
    expect(sizingSaid(option, true).flatMap(({ words }) => words)[0]).toMatch(
      /^A depth of 1\.20 m was asked for/,
    );
    expect(sizingSaid(option, false).flatMap(({ words }) => words)).toEqual(option.designs[0]!.warnings);
  });

  it('keeps the words of each unit apart and leaves out units with nothing to say', () => {
    const quiet = { ...sizedAt(1.15), warnings: [] };
    const loud = { ...quiet, warnings: ['Something has to be provided.'] };
    const approach: Unit = { form: 'adjacent-box', role: 'approach', supportsM: [25, 50] };
    const said = sizingSaid({ units: [main, approach], designs: [quiet, loud] }, false);
    expect(said).toEqual([{ unit: 'Approach, Adjacent box beams:', words: loud.warnings }]);
  });
});
