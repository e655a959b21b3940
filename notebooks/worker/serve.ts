import type { Progress } from '../reactive/index.ts';
import type { Answer, Jobs, Line, Wish } from './messages.ts';
import { sliced } from './sliced.ts';
import type { Slicing } from './sliced.ts';
import { transferables } from './transferables.ts';

/** How the work is cut, and how often the page is told how far it has come. */
interface Serving extends Pick<Slicing, 'now' | 'budgetMs' | 'breathe'> {
  /** From one word of progress to the next, ms; after every slice unless given. Each of them costs the page time. */
  readonly tellEveryMs?: number;
}

/**
 * Answers the wishes that come down the line with the jobs given: those of the earliest turn first, several of one turn
 * side by side. Results move rather than being copied where they can, so a job must not keep arrays that it hands out.
 */
export function serve(line: Line, jobs: Jobs, { tellEveryMs = 0, ...slicing }: Serving): void {
  const live = new Map<number, { readonly controller: AbortController; readonly turn: number }>();
  let isHeld = false;
  let held: (() => void)[] = [];
  const goOn = (): void => {
    const waiting = held;
    held = [];
    for (const resolve of waiting) resolve();
  };
  const isLater = (turn: number): boolean => [...live.values()].some((other) => other.turn < turn);
  /** Lets messages through, and waits while all work is held or there is some of an earlier turn. */
  const breathe = async (signal: AbortSignal, turn: number): Promise<void> => {
    await slicing.breathe();
    while ((isHeld || isLater(turn)) && !signal.aborted)
      await new Promise<void>((resolve) => held.push(resolve));
  };
  const say = (answer: Answer, transfer: Transferable[] = []): void => line.postMessage(answer, { transfer });

  const work = async (id: number, job: string, arg: unknown, turn: number): Promise<void> => {
    const controller = new AbortController();
    const { signal } = controller;
    live.set(id, { controller, turn });
    try {
      const start = jobs[job];
      if (!start) throw new Error(`job '${job}': expected one of ${Object.keys(jobs).join(', ')}`);
      let toldAt = -Infinity;
      const report = (progress: Progress): void => {
        const now = slicing.now();
        if (now - toldAt < tellEveryMs) return;
        toldAt = now;
        say({ id, progress });
      };
      const value = await sliced(start(arg as never), {
        ...slicing,
        breathe: () => breathe(signal, turn),
        signal,
        report,
      });
      say({ id, value }, transferables(value));
    } catch (error) {
      if (!signal.aborted) sayError(id, error);
    } finally {
      live.delete(id);
      goOn();
    }
  };

  /** An error keeps its name and message on the way by itself; its own fields travel beside it. */
  const sayError = (id: number, thrown: unknown): void => {
    // Not every engine clones a DOMException.
    const error = thrown instanceof DOMException ? new Error(`${thrown.name}: ${thrown.message}`) : thrown;
    const fields = error instanceof Error ? Object.assign({}, error) : {};
    try {
      say({ id, error, fields });
    } catch {
      say({ id, error: new Error(String(error)), fields: {} });
    }
  };

  line.addEventListener('message', ({ data }: { data: Wish }) => {
    if ('hold' in data) isHeld = data.hold;
    else if ('abort' in data) live.get(data.id)?.controller.abort();
    else void work(data.id, data.job, data.arg, data.turn);
    goOn();
  });
}
