import { describe, expect, it } from 'vitest';
import { parseStudy, type Study } from '../../lib/index.ts';
import { problemBeside } from '../../notebooks/option-study/brief/problemBeside.ts';
import { putAt, type Path } from '../../notebooks/page/place.ts';
import { workedStudy } from './study.ts';

const said = (path: Path, value: unknown): string[] => {
  const read = parseStudy(putAt<Study>(workedStudy(), ['brief', ...path], value));
  return read.ok ? [] : read.problems.map(problemBeside);
};

describe('problemBeside', () => {
  it('says what was expected with the unit behind its number, and no keys of the file', () => {
    expect(said(['obstacles', 1, 'toM'], 1300)).toEqual([
      'Expected more than the start at 1325 m, not 1300 m. Exchange the start and the end or correct one of them.',
    ]);
    expect(said(['crossing', 'ground', 0, 'chainageM'], 1239.5)).toEqual([]);
    expect(
      said(
        ['crossing', 'ground'],
        [
          { chainageM: 1250, levelM: 3 },
          { chainageM: 1480, levelM: 3 },
        ],
      ),
    ).toEqual([
      'Expected at most 1240 m, the start of the crossing, not 1250 m. Add ground levels up to both abutments.',
    ]);
    expect(said(['deck'], [{ kind: 'verge', widthM: 3, ultimateWidthM: 3 }])).toEqual([
      "Expected at least one strip of kind 'lane', not none. Add a lane.",
    ]);
  });
});
