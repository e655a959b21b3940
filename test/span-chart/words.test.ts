import { describe, expect, it } from 'vitest';
import { builtBucket } from '../../lib/bands/builtSpans.ts';
import { depthGuidance } from '../../lib/depthGuidance.ts';
import { guide } from '../../lib/guide.ts';
import { formIds } from '../../lib/model/index.ts';
import { flipWords, spanRows } from '../../notebooks/charts/spanRows.ts';
import { knownWords, references, referenceTo } from '../../notebooks/span-chart/references.ts';
import { answerWords, builtWords, firstTurnWords, ratioWords } from '../../notebooks/span-chart/words.ts';

describe('flipWords({flip})', () => {
  const flip = (fact: string, from: number, to: number, becomes: 'in' | 'possible' | 'out') =>
    flipWords({ flip: { fact, from, to, becomes, unit: 'm' } });
  it.each([
    ['mainSpanM', 63, 91.1, 'possible', 'possible over 91 m, 28 m longer'],
    ['mainSpanM', 63, 59.9, 'out', 'out under 60 m, 3 m shorter'],
    ['mainSpanM', 63, 61, 'in', 'in at 61 m, 2 m shorter'],
    ['mainSpanM', 30, 30.1, 'possible', 'possible over 30 m, if any longer'],
    ['deckWidthM', 12.5, 18.1, 'possible', 'possible over 18 m of deck, 5.5 m wider'],
    ['planRadiusM', 300, 249, 'possible', 'possible at a plan radius of 249 m, 51 m tighter'],
    ['unitLengthM', 230, 60, 'in', 'in at 60 m between abutments, 170 m shorter'],
    ['sideSpanRatio', 0.2, 0.33, 'in', 'in with side spans of 0.33 of the main span instead of 0.20'],
  ] as const)('%s from %d to %d, %s: %s', (fact, from, to, becomes, words) => {
    expect(flip(fact, from, to, becomes)).toBe(words);
  });
  it('is silent where no single figure turns the form', () => {
    expect(flipWords({})).toBeUndefined();
  });
});

describe('spanRows(guide, order)', () => {
  const answer = guide({ spanM: 63, widthM: 12.5, radiusM: 300 });
  it('gives every form its windows, its statistics where the record knows it, and the guide’s own words', () => {
    const rows = spanRows(answer, formIds);
    expect(rows.map(({ form }) => form)).toEqual(formIds);
    const composite = rows.find(({ form }) => form === 'composite-i')!;
    expect(composite).toMatchObject({
      usual: [30, 91],
      possible: [12, 122],
      statistics: [29, 55, 94],
      bridges: 4264,
    });
    expect(composite.words).toContain('63\u00a0m lies in the usual range');
    const trough = rows.find(({ form }) => form === 'precast-trough')!;
    expect(trough.statistics).toBeUndefined();
    expect(trough.words).toContain('stop at 44\u00a0m');
    const arch = rows.find(({ form }) => form === 'tied-arch')!;
    expect(arch.words).toMatch(/plan radius 300.*outside the usual 75/u);
  });
});

describe('words of the page', () => {
  it('answerWords names the forms that are in and counts the others', () => {
    expect(answerWords(guide({ spanM: 63, widthM: 12.5 }))).toBe(
      'Composite box, composite I and cantilever-built box are in; seven more are possible, seven are out.',
    );
  });
  it('answerWords says so when no form is in', () => {
    expect(answerWords(guide({ spanM: 2100 }))).toMatch(/^No form is in; no more are possible/u);
  });
  it('firstTurnWords names the nearest change of the span', () => {
    expect(firstTurnWords(guide({ spanM: 63, widthM: 12.5 }))).toBe(
      'First to change: concrete box, in at 61 m, 2 m shorter.',
    );
  });
  it('ratioWords gives a band as one over, with what is built and what it is taken of', () => {
    const [support, midspan] = depthGuidance('cantilever-box', { spanM: 63 });
    expect(ratioWords(support!)).toBe('1/20 to 1/16 of the span');
    expect(ratioWords(midspan!)).toBe('1/50 to 1/30 of the span; at least 2.20 m for access');
    expect(ratioWords(depthGuidance('truss', { spanM: 63 })[1]!)).toBe('1/13 to 1/7 of the deck width');
    expect(ratioWords(depthGuidance('concrete-box', { spanM: 50, lengthM: 200 })[1]!)).toContain(
      ', launched',
    );
  });
  it('builtWords names the two most built, leaves doubted shares out, and is honest beyond the record', () => {
    expect(builtWords(builtBucket(63))).toBe(
      'Of 3\u2009114 bridges with a longest span of 50 to 75 m: 62 % steel I-girder and 16 % prestressed box.',
    );
    expect(builtWords(builtBucket(180))).toMatch(/19 % steel arch and 17 % steel truss/u);
    expect(builtWords(builtBucket(700))).toMatch(/^Beyond 500 m too few/u);
  });
});

describe('references', () => {
  it('number every work that any chart of the page cites, at any span and length, once', () => {
    expect(references.map(({ number }) => number)).toEqual(references.map((_, index) => index + 1));
    expect(new Set(references.map(({ work }) => work.id)).size).toBe(references.length);
    for (const spanM of [10, 60, 400])
      for (const lengthM of [spanM, 4 * spanM])
        for (const form of formIds)
          for (const { sources } of depthGuidance(form, { spanM, lengthM }))
            for (const id of sources) expect(referenceTo(id).number).toBeGreaterThan(0);
  });
  it('say how a work is known', () => {
    const known = (id: string): string => knownWords(references.find(({ work }) => work.id === id)!.work);
    expect([known('khan-2010'), known('setra-pt-slab'), known('common-practice')]).toEqual([
      'read',
      'from memory',
      'no source',
    ]);
  });
  it('refuse a work that is not listed', () => {
    expect(() => referenceTo('nobody')).toThrow(/source nobody: expected one of the list/u);
  });
});
