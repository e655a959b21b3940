import type { FormId, FormReach, NoReach, PlainDeck } from '../../lib/index.ts';
import type { Call } from './client.ts';
import { startWorkers, type Started } from './startWorkers.ts';

/** Walks to limiting spans off the page's thread, one form after the other in the order in which they are asked. */
export type Reacher = (
  form: FormId,
  deck: PlainDeck,
  call: Pick<Call, 'signal' | 'report'>,
) => Promise<FormReach | NoReach>;

/** Workers that begin with the first wish. */
export function reacher(start: () => readonly Started[] = startWorkers): Reacher {
  let workers: readonly Started[] | undefined;
  let asked = 0;
  return (form, deck, call) => {
    workers ??= start();
    const turn = asked;
    asked += 1;
    return workers[turn % workers.length]!.line.call('reach', { form, deck }, { ...call, turn });
  };
}
