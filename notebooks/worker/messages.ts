import type { Progress } from '../reactive/index.ts';
import type { Steps } from './sliced.ts';

/** The work a worker takes, by name: each piece makes steps from one argument that can be cloned. */
export type Jobs = Readonly<Record<string, (arg: never) => Steps<unknown>>>;

/** What a job works on, and what it comes to. */
export type ArgOf<J> = J extends (arg: infer A) => Steps<unknown> ? A : never;
export type ResultOf<J> = J extends (arg: never) => Steps<infer T> ? T : never;

/**
 * What the page says: start a piece of work under a new number, give the one of that number up, hold all or go on. Work
 * rests while there is some of an earlier turn.
 */
export type Wish =
  | { readonly id: number; readonly job: string; readonly arg: unknown; readonly turn: number }
  | { readonly id: number; readonly abort: true }
  | { readonly hold: boolean };

/** What the worker says about the work of that number; nothing more once it has been given up. */
export type Answer =
  | { readonly id: number; readonly progress: Progress }
  | { readonly id: number; readonly value: unknown }
  | { readonly id: number; readonly error: unknown; readonly fields: object };

/** One end of the line: a `Worker`, the inside of one, or a message port. */
export interface Line {
  postMessage(message: unknown, options?: { transfer: Transferable[] }): void;
  addEventListener(type: 'message', listen: (event: MessageEvent) => void): void;
}
