import { standardNames } from '../../lib/index.ts';
import { emptyGaps, type Crossed, type Gaps } from './newStudy.ts';

/** Where the sentence of a new study waits, half filled, until the study is made. */
export interface KeptGaps {
  /** What was filled; nothing where nothing waits, or what does cannot be read. */
  readonly get: () => Gaps;
  readonly put: (gaps: Gaps) => void;
  readonly clear: () => void;
}

const KEY = 'spanledger.new-study';

const crossings: readonly Crossed[] = ['river', 'railway', 'road', 'open'];

/** Whether something can stand in a gap: of the kind that stands there while it is empty, and of those on offer. */
function fits(gap: keyof Gaps, value: unknown): boolean {
  if (gap === 'title') return typeof value === 'string';
  if (value === 'unknown') return true;
  if (gap === 'crossed') return crossings.some((one) => one === value);
  if (gap === 'loading') return typeof value === 'string' && Object.hasOwn(standardNames, value);
  return typeof value === 'number' && Number.isFinite(value);
}

/** The sentence in what a browser keeps at once. What it has no room for, or keeps from pages, is not kept. */
export function keptGaps(storage: () => Pick<Storage, 'getItem' | 'setItem' | 'removeItem'>): KeptGaps {
  return {
    get() {
      try {
        const read: unknown = JSON.parse(storage().getItem(KEY) ?? '{}');
        if (typeof read !== 'object' || read === null) return emptyGaps;
        const filled = Object.keys(emptyGaps)
          .map((key) => [key, (read as Readonly<Record<string, unknown>>)[key]] as const)
          .filter(([key, value]) => fits(key as keyof Gaps, value));
        return { ...emptyGaps, ...Object.fromEntries(filled) };
      } catch {
        return emptyGaps;
      }
    },
    put(gaps) {
      try {
        storage().setItem(KEY, JSON.stringify(gaps));
      } catch {
        // Nothing can be kept here; the sentence stands on the page all the same.
      }
    },
    clear() {
      try {
        storage().removeItem(KEY);
      } catch {
        // Nothing is kept here.
      }
    },
  };
}
