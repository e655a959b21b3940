import { describe, expect, it } from 'vitest';
import { rests } from '../../notebooks/page/rests.ts';

/** A page whose idle moments come when they are told to, each of them `lasts` ms long; a job takes 10 ms. */
function place(lasts = 50) {
  let isFree = true;
  let moments: ((timeLeft: () => number) => void)[] = [];
  let timers: (() => void)[] = [];
  const done: string[] = [];
  let left = 0;
  const queue = rests({
    isFree: () => isFree,
    whenIdle: (job) => void moments.push(job),
    later: (job) => void timers.push(job),
  });
  const job = (name: string) => (): void => {
    done.push(name);
    left -= 10;
  };
  return {
    queue,
    done,
    job,
    setFree: (now: boolean) => (isFree = now),
    idle: (): void => {
      const now = moments;
      moments = [];
      left = lasts;
      for (const run of now) run(() => left);
    },
    time: (): void => {
      const now = timers;
      timers = [];
      for (const run of now) run();
    },
  };
}

describe('rests', () => {
  it('put(job) runs a job once in an idle moment however often it was put', () => {
    const { queue, done, job, idle } = place();
    const one = job('one');
    for (let i = 0; i < 20; i += 1) queue.put(one, 1);
    expect(done).toEqual([]);
    idle();
    expect(done).toEqual(['one']);
    idle();
    expect(done).toEqual(['one']);
  });

  it('put(job) fills one idle moment and goes on in the next, in order', () => {
    const { queue, done, job, idle } = place(25);
    for (const name of ['a', 'b', 'c', 'd']) queue.put(job(name), 1);
    idle();
    expect(done).toEqual(['a', 'b']);
    idle();
    expect(done).toEqual(['a', 'b', 'c', 'd']);
  });

  it('put(job) waits while the page is not free, and asks again', () => {
    const { queue, done, job, idle, time, setFree } = place();
    setFree(false);
    queue.put(job('one'), 1);
    idle();
    time();
    idle();
    expect(done).toEqual([]);
    setFree(true);
    time();
    idle();
    expect(done).toEqual(['one']);
  });

  it('put(job) stops between two jobs when the page is not free any more', () => {
    const { queue, done, job, idle, time, setFree } = place();
    queue.put(() => {
      done.push('grasped');
      setFree(false);
    }, 1);
    queue.put(job('after'), 1);
    idle();
    expect(done).toEqual(['grasped']);
    setFree(true);
    time();
    idle();
    expect(done).toEqual(['grasped', 'after']);
  });

  it('look(place) brings first what is next to what is looked at', () => {
    const { queue, done, job, idle } = place(1);
    for (const at of [1, 3, 5, 7]) queue.put(job(`at ${at}`), at);
    queue.look(5);
    for (let moment = 0; moment < 4; moment += 1) idle();
    expect(done).toEqual(['at 5', 'at 3', 'at 7', 'at 1']);
  });

  it('drop(job) leaves a job undone', () => {
    const { queue, done, job, idle } = place();
    const one = job('one');
    queue.put(one, 1);
    queue.put(job('two'), 1);
    queue.drop(one);
    idle();
    expect(done).toEqual(['two']);
  });

  it('put(job) goes on after a job that fails', () => {
    const { queue, done, job, idle } = place();
    queue.put(() => {
      throw new Error('cannot be drawn');
    }, 1);
    queue.put(job('after'), 1);
    expect(idle).toThrow('cannot be drawn');
    idle();
    expect(done).toEqual(['after']);
  });
});
