import type { Problem, Result, Study } from '../../lib/index.ts';

/** A study as it lies on the device: its text as the tool writes it, and what a list of studies shows of it. */
export interface StoredStudy {
  readonly id: string;
  readonly title: string;
  readonly reference: string;
  /** The last valid study. */
  readonly text: string;
  /** The study as typed, while something is wrong with it. */
  readonly draft?: string;
  /** Moment of saving, ISO 8601. */
  readonly savedAt: string;
  /** Counts the times it was saved; tells whether somebody else saved it meanwhile. */
  readonly revision: number;
}

/** Where studies are kept. `change` reads and writes one study without anybody else in between. */
export interface StudyCupboard {
  readonly all: () => Promise<readonly StoredStudy[]>;
  readonly get: (id: string) => Promise<StoredStudy | undefined>;
  /** Puts what `next` makes of the stored study in its place; undefined leaves it as it is. */
  readonly change: (
    id: string,
    next: (stored: StoredStudy | undefined) => StoredStudy | undefined,
  ) => Promise<void>;
  readonly remove: (id: string) => Promise<void>;
}

/** The way in and the way out of a study file. */
export interface StudyFormat {
  readonly readStudy: (text: string) => Result<Study>;
  /** A study as typed, with what is refused in it; null where it cannot be read. */
  readonly readDraft: (text: string) => Study | null;
  readonly writeStudy: (study: Study) => string;
}

export type StudyEntry = Omit<StoredStudy, 'text' | 'draft'>;

/** The last valid study, and the study as typed while something is wrong with it; null where nothing is. */
export interface TypedStudy {
  readonly study: Study;
  readonly draft: Study | null;
}

/** A study as it was kept. Refused where the valid one cannot be read; a draft that cannot be is left out. */
export function readTyped(
  { readStudy, readDraft }: StudyFormat,
  { text, draft }: Pick<StoredStudy, 'text' | 'draft'>,
): Result<TypedStudy> {
  const read = readStudy(text);
  if (!read.ok) return read;
  const study = read.value;
  return { ok: true, value: { study, draft: draft === undefined ? null : readDraft(draft) } };
}

/** A study as it is to be kept, the way `readTyped` reads it. */
export const writeTyped = (
  { writeStudy }: StudyFormat,
  { study, draft }: TypedStudy,
): Pick<StoredStudy, 'text' | 'draft'> => ({
  text: writeStudy(study),
  ...(draft !== null && { draft: writeStudy(draft) }),
});

/** A study that was read, and the revision a later saving of it starts from. */
export interface LoadedStudy extends TypedStudy {
  readonly revision: number;
}

export interface StudyShelf {
  /** What lies on the device, newest first. */
  readonly list: () => Promise<readonly StudyEntry[]>;
  /** Reads a study; what cannot be read is refused with its reasons and left as it is. */
  readonly load: (id: string) => Promise<Result<LoadedStudy>>;
  /**
   * Saves a study over the revision it was read from or last saved as (0 for a new one). Refused, with nothing
   * written: a study that could not be read again, one that was saved elsewhere meanwhile, and any saving over a
   * stored study that is newer than this tool or damaged.
   */
  readonly save: (id: string, typed: TypedStudy, revision: number) => Promise<Result<StudyEntry>>;
  readonly remove: (id: string) => Promise<void>;
}

const refused = (expected: string, received: string, remedy: string): Problem => ({
  code: 'refused',
  path: [],
  expected,
  received,
  remedy,
});

const entryOf = ({ id, title, reference, savedAt, revision }: StoredStudy): StudyEntry => ({
  id,
  title,
  reference,
  savedAt,
  revision,
});

/** Why nothing may be written over what is stored; empty when it may. */
function overwriteProblems(
  stored: StoredStudy | undefined,
  revision: number,
  { readStudy }: StudyFormat,
): readonly Problem[] {
  if (stored === undefined) return [];
  const read = readStudy(stored.text);
  if (!read.ok) return read.problems;
  if (stored.revision === revision) return [];
  return [
    refused(
      'the stored study as this page read it',
      `one saved elsewhere at ${timeOf(stored.savedAt)}`,
      'Save this one as a file or under another name, or open the stored one again',
    ),
  ];
}

/**
 * The studies of this device.
 * @param now the moment of saving
 */
export function studyShelf(cupboard: StudyCupboard, format: StudyFormat, now: () => Date): StudyShelf {
  return {
    async list() {
      const stored = await cupboard.all();
      return stored.map(entryOf).sort((a, b) => (a.savedAt < b.savedAt ? 1 : -1));
    },

    async load(id) {
      const stored = await cupboard.get(id);
      if (stored === undefined) {
        const missing = refused(
          `a study '${id}' on this device`,
          'none',
          'Choose one from the shelf or open its file',
        );
        return { ok: false, problems: [missing] };
      }
      const read = readTyped(format, stored);
      return read.ok ? { ok: true, value: { ...read.value, revision: stored.revision } } : read;
    },

    async save(id, typed, revision) {
      const { study } = typed;
      const texts = writeTyped(format, typed);
      const read = format.readStudy(texts.text);
      if (!read.ok) return read;
      const mine: StoredStudy = {
        id,
        title: study.title,
        reference: study.reference,
        ...texts,
        savedAt: now().toISOString(),
        revision: revision + 1,
      };
      const problems: Problem[] = [];
      await cupboard.change(id, (stored) => {
        problems.push(...overwriteProblems(stored, revision, format));
        return problems.length === 0 ? mine : undefined;
      });
      return problems.length === 0 ? { ok: true, value: entryOf(mine) } : { ok: false, problems };
    },

    remove: (id) => cupboard.remove(id),
  };
}

const timeOf = (savedAt: string): string => {
  const date = new Date(savedAt);
  return [date.getHours(), date.getMinutes()].map((part) => String(part).padStart(2, '0')).join(':');
};

/**
 * When a study was saved, in the time of the device: 'saved 14:02 on this device'.
 * @param isFaulty something in it is refused still
 */
export const savedWords = (savedAt: string, isFaulty = false): string =>
  `saved ${timeOf(savedAt)} on this device${isFaulty ? ' as typed, with what is refused' : ''}`;

/** Name of the file of a study: 'WEN 07 River Wend' -> 'wen-07-river-wend.spanledger.json'. */
export function fileName(study: Pick<Study, 'title' | 'reference'>): string {
  const words = `${study.reference} ${study.title}`
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/gu, '-')
    .replace(/^-|-$/gu, '');
  return `${words === '' ? 'study' : words.slice(0, 80)}.spanledger.json`;
}
