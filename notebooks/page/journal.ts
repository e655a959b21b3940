/** A study as it stood at the last change, until it has been saved. */
export interface Unsaved {
  /** The last valid study. */
  readonly text: string;
  /** The study as typed, while something is wrong with it. */
  readonly draft?: string;
  /** Revision of the stored study it was changed from; 0 for one that has never been saved. */
  readonly revision: number;
}

/** Where changes wait for their saving, so that a tab that is closed or killed meanwhile loses none. */
export interface Journal {
  readonly put: (id: string, unsaved: Unsaved) => void;
  /** What waits for a study; undefined where nothing does, or what does cannot be read. */
  readonly get: (id: string) => Unsaved | undefined;
  readonly clear: (id: string) => void;
}

/**
 * Whether what waits is of the stored revision or newer: also when the page was closed after a saving and before that was
 * noted here.
 */
export const isOf = (unsaved: Unsaved, revision: number): boolean => unsaved.revision >= revision - 1;

const keyOf = (id: string): string => `spanledger.unsaved.${id}`;

/** A journal in what a browser keeps at once. What it has no room for is left to the saving that follows. */
export function journal(storage: Pick<Storage, 'getItem' | 'setItem' | 'removeItem'>): Journal {
  return {
    put(id, unsaved) {
      try {
        storage.setItem(keyOf(id), JSON.stringify(unsaved));
      } catch {
        storage.removeItem(keyOf(id));
      }
    },
    get(id) {
      try {
        const read: unknown = JSON.parse(storage.getItem(keyOf(id)) ?? 'null');
        if (typeof read !== 'object' || read === null || !('text' in read) || !('revision' in read))
          return undefined;
        const { text, revision } = read;
        if (typeof text !== 'string' || typeof revision !== 'number') return undefined;
        const draft = 'draft' in read && typeof read.draft === 'string' && { draft: read.draft };
        return { text, revision, ...draft };
      } catch {
        return undefined;
      }
    },
    clear: (id) => storage.removeItem(keyOf(id)),
  };
}
