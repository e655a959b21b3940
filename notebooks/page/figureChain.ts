import type { Figure } from '../../lib/index.ts';

/** Answers where a figure comes from. @throws RangeError where there is no such figure any more */
export type Ask = (path: string) => Figure;

/** A line of a chain: a figure, the head of what uses it, or the rest of a long list of those. */
export interface ChainRow {
  /** The way from the root of the chain to this line: the same figure may stand in it twice. */
  readonly key: string;
  /** Steps in from the root. */
  readonly step: number;
  readonly kind: 'figure' | 'used by' | 'more';
  readonly path: string;
  /** Null where the latest appraisal has no such figure, and for lines that are none. */
  readonly figure: Figure | null;
  readonly isOpen: boolean;
  /** Lines that 'more' stands for. */
  readonly count?: number;
}

/** What uses a figure may be hundreds: this many are listed before the rest is asked for. */
const LISTED = 12;

const headOf = (key: string): string => `${key} <`;
const restOf = (key: string): string => `${key} …`;

/** Key of a root of a chain. */
export const rootKey = (path: string): string => path;

function asked(ask: Ask, path: string): Figure | null {
  try {
    return ask(path);
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}

/**
 * Lines of a chain, from the top: each figure, and under one that is open its inputs, then what uses it. What uses a
 * figure is only looked up where it is open.
 * @param open keys of the lines that are open
 */
export function chainRows(ask: Ask, roots: readonly string[], open: ReadonlySet<string>): ChainRow[] {
  const rows: ChainRow[] = [];
  const put = (path: string, key: string, step: number): void => {
    const figure = asked(ask, path);
    const isOpen = figure !== null && open.has(key);
    rows.push({ key, step, kind: 'figure', path, figure, isOpen });
    if (figure === null || !isOpen) return;
    for (const input of new Set(figure.because.inputs.map((one) => one.path)))
      put(input, `${key} ${input}`, step + 1);
    putUsers(figure, key, step + 1);
  };
  const putUsers = (figure: Figure, key: string, step: number): void => {
    const head = headOf(key);
    const isOpen = open.has(head);
    rows.push({ key: head, step, kind: 'used by', path: figure.path, figure: null, isOpen });
    if (!isOpen) return;
    const rest = restOf(key);
    const users = open.has(rest) ? figure.usedBy : figure.usedBy.slice(0, LISTED);
    for (const user of users) put(user, `${head} ${user}`, step + 1);
    const count = figure.usedBy.length - users.length;
    if (count > 0 || users.length === 0)
      rows.push({
        key: rest,
        step: step + 1,
        kind: 'more',
        path: figure.path,
        figure: null,
        isOpen: false,
        count,
      });
  };
  for (const root of roots) put(root, rootKey(root), 0);
  return rows;
}

/** The line a line stands under, or itself where it is a root. */
export function rowAbove(rows: readonly ChainRow[], at: number): number {
  const step = rows[at]?.step ?? 0;
  for (let i = at - 1; i >= 0; i -= 1) if (rows[i]!.step < step) return i;
  return at;
}
