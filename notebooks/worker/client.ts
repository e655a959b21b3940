import type { SlowRun } from '../reactive/index.ts';
import type { Answer, ArgOf, Jobs, Line, ResultOf } from './messages.ts';

/** How a job is called. */
export interface Call extends Partial<Pick<SlowRun, 'signal' | 'report'>> {
  /** Its work rests while the worker has some of an earlier turn; 0, the first, unless given. */
  readonly turn?: number;
}

interface Waiting {
  readonly resolve: (value: unknown) => void;
  readonly reject: (error: unknown) => void;
  readonly report: SlowRun['report'] | undefined;
}

/** The page's end of the line to a worker that serves the jobs `J`. */
export interface Client<J extends Jobs> {
  /**
   * Has the job done on `arg`, which must be data that can be cloned. Rejects with the job's error, or with the
   * signal's reason as soon as it is aborted; the worker then stops before its next slice.
   */
  readonly call: <K extends keyof J & string>(
    job: K,
    arg: ArgOf<J[K]>,
    call?: Call,
  ) => Promise<ResultOf<J[K]>>;
  /** Holds all work before its next slice, or lets it go on; it can be given up all the same. */
  readonly hold: (isHeld: boolean) => void;
  /** Rejects with `error` everything still waiting and everything asked from now on: the worker has died or was ended. */
  readonly close: (error: Error) => void;
}

/** Opens the page's end of the line. */
export function client<J extends Jobs>(line: Line): Client<J> {
  const waiting = new Map<number, Waiting>();
  let last = 0;
  let closed: Error | undefined;

  line.addEventListener('message', ({ data }: { data: Answer }) => {
    const call = waiting.get(data.id);
    if (!call) return;
    if ('progress' in data) return call.report?.(data.progress);
    waiting.delete(data.id);
    if ('value' in data) call.resolve(data.value);
    else call.reject(data.error instanceof Error ? Object.assign(data.error, data.fields) : data.error);
  });

  const call = (job: string, arg: unknown, { signal, report, turn = 0 }: Call = {}): Promise<unknown> => {
    const id = (last += 1);
    const stop = (): void => {
      line.postMessage({ id, abort: true });
      waiting.get(id)?.reject(signal?.reason);
      waiting.delete(id);
    };
    return new Promise((resolve, reject) => {
      if (closed) throw closed;
      signal?.throwIfAborted();
      line.postMessage({ id, job, arg, turn });
      waiting.set(id, { resolve, reject, report });
      signal?.addEventListener('abort', stop);
    }).finally(() => signal?.removeEventListener('abort', stop));
  };

  return {
    call: call as Client<J>['call'],
    hold: (isHeld) => line.postMessage({ hold: isHeld }),
    close: (error) => {
      closed ??= error;
      for (const { reject } of waiting.values()) reject(error);
      waiting.clear();
    },
  };
}
