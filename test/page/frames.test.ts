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

/** Turns on a screen whose frames come, and whose clock goes, when they are told to. */
function turning() {
  const runs: (() => void)[] = [];
  const shown: (() => void)[] = [];
  let nowMs = 0;
  const made = turns({
    next: (run) => runs.push(run),
    shown: (run) => shown.push(run),
    now: () => nowMs,
  });
  const frame = (): void => {
    for (const run of runs.splice(0)) run();
    for (const run of shown.splice(0)) run();
  };
  return { ...made, frame, asked: () => runs.length, pass: (ms: number) => void (nowMs += ms) };
}

describe('turns', () => {
  it('hand(run) comes before drawing(run), and what it changes is drawn in the same frame', () => {
    const { hand, drawing, frame, asked } = turning();
    const seen: string[] = [];
    const queue = frames(drawing);
    queue.request(() => seen.push('drawn before'));
    hand(() => {
      seen.push('moved');
      queue.request(() => seen.push('drawn after'));
    });
    expect(asked()).toBe(1);
    frame();
    expect(seen).toEqual(['moved', 'drawn before', 'drawn after']);
    expect(asked()).toBe(0);
  });

  it('drawing(run) from inside a drawing waits for the next frame', () => {
    const { drawing, frame } = turning();
    const seen: string[] = [];
    drawing(() => {
      seen.push('first');
      drawing(() => seen.push('second'));
    });
    frame();
    expect(seen).toEqual(['first']);
    frame();
    expect(seen).toEqual(['first', 'second']);
  });

  it('ending(run) comes at the end of the next frame, once', () => {
    const { hand, drawing, ending, frame, asked } = turning();
    const seen: string[] = [];
    ending(() => seen.push('end'));
    drawing(() => seen.push('drawn'));
    hand(() => seen.push('moved'));
    frame();
    frame();
    expect(seen).toEqual(['moved', 'drawn', 'end']);
    expect(asked()).toBe(0);
  });

  /** Three steps of a drag in which the hand and the drawing take so long each; what was done in each frame. */
  function dragged(handMs: number, drawMs: number, follows = true): string[] {
    const { hand, drawing, ending, frame, pass } = turning();
    const done: string[] = [];
    let step = '';
    let isAsked = false;
    for (let at = 0; at < 6; at += 1) {
      if (!isAsked)
        hand(() => {
          isAsked = false;
          pass(handMs);
          step += 'hand ';
          drawing(() => {
            pass(drawMs);
            step += 'drawn ';
          });
        });
      isAsked = true;
      if (follows) ending(() => (step += 'end'));
      frame();
      done.push(step);
      step = '';
    }
    return done;
  }

  it('a hand and a drawing that take longer than a frame together get a frame each, with an ending in both', () => {
    // How long a drawing takes is known after the first.
    expect(dragged(15, 30)).toEqual([
      'hand drawn end',
      'hand end',
      'drawn end',
      'hand end',
      'drawn end',
      'hand end',
    ]);
  });

  it('a hand and a drawing that fit into a frame together share it, as do a hand that takes next to nothing and one nothing follows', () => {
    expect(dragged(10, 15)).toEqual(Array(6).fill('hand drawn end'));
    expect(dragged(2, 60)).toEqual(Array(6).fill('hand drawn end'));
    // A frame with nothing to show in it would be lost.
    expect(dragged(15, 30, false)).toEqual(Array(6).fill('hand drawn '));
  });
});
