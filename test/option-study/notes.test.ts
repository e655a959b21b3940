import { describe, expect, it } from 'vitest';
import {
  aboutOption,
  firstNote,
  optionIn,
  withNoteText,
} from '../../notebooks/option-study/notes/noteEdits.ts';
import { dayOf, dayWords } from '../../notebooks/page/days.ts';
import { placesOf, workedStudy } from './study.ts';

const study = workedStudy();
const DAY = '2026-03-02';
const written = (about: string, text: string) =>
  withNoteText(study, 0, { ...firstNote(study, about), author: 'A. Mason' }, text, DAY);

describe('notes', () => {
  it('withNoteText: a note begins behind the last one, with the day and who wrote it, and the study is valid', () => {
    const noted = written('3+020', 'Ask the railway');
    expect(noted.notes).toEqual([{ about: '3+020', text: 'Ask the railway', author: 'A. Mason', date: DAY }]);
    expect(placesOf(noted)).toEqual([]);
    const second = withNoteText(noted, 1, firstNote(noted, aboutOption(3)), 'Too many joints', '2026-03-04');
    expect(second.notes.map(({ about, author, date }) => [about, author, date])).toEqual([
      ['3+020', 'A. Mason', DAY],
      ['option 3', 'A. Mason', '2026-03-04'],
    ]);
  });

  it('withNoteText: other words keep what a note is about and who wrote it, and are dated anew', () => {
    const noted = written('3+020', 'Ask the railway');
    const changed = withNoteText(noted, 0, firstNote(noted, '1+010'), 'Asked', '2026-03-09');
    expect(changed.notes).toEqual([
      { about: '3+020', text: 'Asked', author: 'A. Mason', date: '2026-03-09' },
    ]);
  });

  it('withNoteText: without words a note is taken out, and one that never had any is none', () => {
    const noted = written('3+020', 'Ask the railway');
    expect(withNoteText(noted, 0, noted.notes[0]!, '', DAY).notes).toEqual([]);
    expect(written('3+020', '')).toBe(study);
  });

  it('optionIn(about) is the number of an option, and null for a station or anything else', () => {
    expect([aboutOption(12), '3+020', 'option x', 'an option 3'].map(optionIn)).toEqual([
      12,
      null,
      null,
      null,
    ]);
  });
});

describe('days', () => {
  it('dayOf(date) is the day where the clock is, and dayWords says it', () => {
    expect(dayOf(new Date(2026, 2, 2, 23, 59))).toBe(DAY);
    expect(dayWords(DAY)).toBe('2 March 2026');
  });

  it('dayWords: what is no day of the calendar stays as it was written', () => {
    expect(['', 'spring 2025', '2026-02-30', '2026-13-01'].map(dayWords)).toEqual([
      '',
      'spring 2025',
      '2026-02-30',
      '2026-13-01',
    ]);
  });
});
