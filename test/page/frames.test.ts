import { describe, expect, it } from 'vitest';
import { frames, turns } from '../../notebooks/page/frames.ts';

/** A screen whose frames come when they are told to. */
function screen() {
  let runs: (() => void)[] = [];
  const queue = frames((run) => runs.push(run));
  const frame = (): void => {
    const now = runs;
    runs = [];
    for (const run of now) run();
  };
  return { queue, frame, asked: () => runs.length };
}

describe('frames', () => {
  it('request(job) runs a job once a frame however often it was asked for', () => {
    const { queue, frame, asked } = screen();
    let count = 0;
    const job = (): void => void (count += 1);
    for (let i = 0; i < 50; i += 1) queue.request(job);
    expect(asked()).toBe(1);
    expect(count).toBe(0);
    frame();
    expect(count).toBe(1);
    frame();
    expect(count).toBe(1);
  });

  it('request(job) from inside a frame waits for the next one', () => {
    const { queue, frame } = screen();
    const seen: string[] = [];
    const second = (): void => void seen.push('second');
    queue.request(() => {
      seen.push('first');
      queue.request(second);
    });
    frame();
    expect(seen).toEqual(['first']);
    frame();
    expect(seen).toEqual(['first', 'second']);
  });

  it('flush() runs what waits now, and the frame that comes then finds nothing', () => {
    const { queue, frame } = screen();
    let count = 0;
    queue.request(() => void (count += 1));
    queue.flush();
    expect(count).toBe(1);
    frame();
    expect(count).toBe(1);
  });
});

describe('turns', () => {
  it('hand(run) comes before drawing(run), and what it changes is drawn in the same frame', () => {
    let runs: (() => void)[] = [];
    const { hand, drawing } = turns((run) => runs.push(run));
    const frame = (): void => {
      const now = runs;
      runs = [];
      for (const run of now) run();
    };
    const seen: string[] = [];
    const queue = frames(drawing);
    queue.request(() => seen.push('drawn before'));
    hand(() => {
      seen.push('moved');
      queue.request(() => seen.push('drawn after'));
    });
    expect(runs.length).toBe(1);
    frame();
    expect(seen).toEqual(['moved', 'drawn before', 'drawn after']);
    expect(runs.length).toBe(0);
  });

  it('drawing(run) from inside a drawing waits for the next frame', () => {
    const runs: (() => void)[] = [];
    const { drawing } = turns((run) => runs.push(run));
    const seen: string[] = [];
    drawing(() => {
      seen.push('first');
      drawing(() => seen.push('second'));
    });
    runs.splice(0)[0]!();
    expect(seen).toEqual(['first']);
    runs.splice(0)[0]!();
    expect(seen).toEqual(['first', 'second']);
  });
});
