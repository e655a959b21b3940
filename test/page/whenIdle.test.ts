import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { idle, whenIdle } from '../../notebooks/page/whenIdle.ts';

beforeEach(() => {
  vi.useFakeTimers();
  // A browser that finds no moment idle: a job is run when its time is out, and only if it was given one.
  const requestIdleCallback = (
    job: (moment: { timeRemaining: () => number }) => void,
    { timeout }: { timeout?: number } = {},
  ): void => {
    if (timeout !== undefined) setTimeout(() => job({ timeRemaining: () => 0 }), timeout);
  };
  vi.stubGlobal('window', { requestIdleCallback });
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

it('whenIdle(job) is run within half a second where no moment is idle, and told that nothing is left of it', () => {
  const left: number[] = [];
  whenIdle((timeLeft) => left.push(timeLeft()));
  expect(left).toEqual([]);
  vi.advanceTimersByTime(500);
  expect(left).toEqual([0]);
});

it('idle(signal) resolves where no moment is idle, and never once it is given up', async () => {
  const given = new AbortController();
  let [isLeft, isGiven] = [false, false];
  void idle(new AbortController().signal).then(() => (isLeft = true));
  void idle(given.signal).then(() => (isGiven = true));
  given.abort();
  await vi.advanceTimersByTimeAsync(500);
  expect([isLeft, isGiven]).toEqual([true, false]);
});
