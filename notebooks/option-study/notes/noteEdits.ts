import type { Note, Study } from '../../../lib/index.ts';
import { withoutEntry } from '../brief/listEdits.ts';

/** What a note on an option is about. */
export const aboutOption = (number: number): string => `option ${number}`;

/** Number of the option that a note is about; null where it is about something else. */
export function optionIn(about: string): number | null {
  const number = /^option (\d+)$/u.exec(about)?.[1];
  return number === undefined ? null : Number(number);
}

/** A note of nobody yet: who wrote the last one goes on writing. */
export const firstNote = ({ notes }: Study, about: string): Note => ({
  about,
  text: '',
  author: notes.at(-1)?.author ?? '',
  date: '',
});

/**
 * The study with the words of a note, dated by the day they are written; without words it is taken out.
 * @param index its place among the notes; one behind the last begins a note
 * @param first what a note begins with
 * @param today '2026-12-02'
 */
export function withNoteText(study: Study, index: number, first: Note, text: string, today: string): Study {
  const before = study.notes[index];
  if (text === '') return before === undefined ? study : withoutEntry(study, ['notes'], index);
  const note = { ...(before ?? first), text, date: today };
  return {
    ...study,
    notes: before === undefined ? [...study.notes, note] : study.notes.with(index, note),
  };
}
