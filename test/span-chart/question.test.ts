import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { guide } from '../../lib/guide.ts';
import {
  askedSpanM,
  hasRoom,
  limits,
  presetQuestion,
  readQuestion,
  taskOf,
  writeQuestion,
  type Question,
} from '../../notebooks/span-chart/question.ts';

const within = (key: keyof typeof limits): fc.Arbitrary<number> =>
  fc.integer({ min: limits[key][0] * 10, max: limits[key][1] * 10 }).map((tenths) => tenths / 10);
const anyQuestion: fc.Arbitrary<Question> = fc.record({
  openingM: within('openingM'),
  pierM: within('pierM'),
  widthM: within('widthM'),
  lengthM: fc.oneof(fc.constant('unknown' as const), within('lengthM')),
  radiusM: fc.oneof(fc.constant('straight' as const), within('radiusM')),
});

describe('askedSpanM(question)', () => {
  it.each([
    [{ ...presetQuestion }, 63],
    [{ ...presetQuestion, pierM: 0 }, 60],
    [{ ...presetQuestion, openingM: 60.1, pierM: 2.2 }, 62.3],
    // No piers fit beside the opening: the abutments hold the span.
    [{ ...presetQuestion, lengthM: 60 }, 60],
    [{ ...presetQuestion, lengthM: 61.5 }, 61.5],
    [{ ...presetQuestion, lengthM: 200 }, 63],
  ] as const)('%o asks for %d m', (question, spanM) => {
    expect(askedSpanM(question)).toBe(spanM);
  });
});

describe('readQuestion(writeQuestion(question))', () => {
  it('comes back as it was, whatever is asked, and the guide can answer it', () => {
    fc.assert(
      fc.property(anyQuestion.filter(hasRoom), (question) => {
        expect(readQuestion(writeQuestion(question))).toEqual({ question, problems: [] });
      }),
      { seed: 4, numRuns: 200 },
    );
    fc.assert(
      fc.property(anyQuestion.filter(hasRoom), (question) => {
        expect(guide(taskOf(question)).span).toBe(askedSpanM(question));
      }),
      { seed: 5, numRuns: 20 },
    );
  });
});

describe('readQuestion(search)', () => {
  it('an empty address asks the preset question', () => {
    expect(readQuestion('')).toEqual({ question: presetQuestion, problems: [] });
  });

  it.each([
    ['?opening=abc', 'openingM', /opening: expected 2 to 2500 m, received 'abc'.*60 m is shown/u],
    ['?width=', 'widthM', /width: expected 3 to 60 m, received ''/u],
    ['?radius=5', 'radiusM', /radius: expected 20 to 20000 m, received '5'.*straight is shown/u],
    ['?opening=1e9', 'openingM', /opening/u],
    [
      '?opening=80&length=70',
      'lengthM',
      /length: expected at least the clear opening of 80 m, received '70'.*unknown/u,
    ],
  ] as const)('%s keeps the preset of %s and says why', (search, key, words) => {
    const { question, problems } = readQuestion(search);
    expect(question[key]).toBe(presetQuestion[key]);
    expect(problems).toHaveLength(1);
    expect(problems[0]).toMatch(words);
  });

  it('one bad figure does not lose the others', () => {
    expect(readQuestion('?opening=120&width=x&radius=400').question).toEqual({
      ...presetQuestion,
      openingM: 120,
      radiusM: 400,
    });
  });
});
