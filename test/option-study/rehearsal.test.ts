import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Study } from '../../lib/index.ts';
import { placesOf } from '../../notebooks/option-study/handEdits.ts';
import { rehearsal } from '../../notebooks/option-study/rehearsal.ts';
import { answerTo } from '../appraise/answerTo.ts';
import { lowFerry } from '../appraise/studies.ts';

/** Idle moments of a page that never has anything else to do, one after the other. */
let moments: (() => void)[] = [];
const idle = (): void => {
  for (let next = moments.shift(); next !== undefined; next = moments.shift()) next();
};

describe('rehearsal', () => {
  beforeEach(() => {
    moments = [];
    vi.stubGlobal('window', { requestIdleCallback: (job: () => void) => moments.push(job) });
  });
  afterEach(() => vi.unstubAllGlobals());

  const study = lowFerry();
  const option = answerTo(study).options[0]!;
  const inHand = ({ options }: Study) => options.kept.find(({ number }) => number === option.number);

  it('works the option out as it stands, then with its first pier and its depth moved, no two alike', () => {
    const seen: Study[] = [];
    rehearsal((asked) => void seen.push(asked))(study, option, () => true);
    expect(seen).toEqual([]);
    idle();
    expect(seen[0]).toBe(study);
    const moved = seen.slice(1).map((asked) => inHand(asked)!);
    expect(moved.length).toBeGreaterThan(5);
    const piers = moved.map(({ units }) => placesOf(units)[1]!);
    expect(new Set(piers).size).toBe(moved.length);
    expect(new Set(moved.map(({ depthM }) => depthM)).size).toBe(moved.length);
    const at = placesOf(option.units)[1]!;
    for (const pier of piers) expect(Math.abs(pier - at)).toBeGreaterThan(0.1);
    expect(inHand(study)).toBeUndefined();
  });

  it('moves once in the life of a page; after that only what a first move needs is worked out', () => {
    const seen: Study[] = [];
    const rehearse = rehearsal((asked) => void seen.push(asked));
    rehearse(study, option, () => true);
    idle();
    seen.length = 0;
    rehearse(study, option, () => true);
    idle();
    expect(seen).toEqual([study]);
  });

  it('ends as soon as another study is on the page, and goes on with that one', () => {
    const seen: Study[] = [];
    const rehearse = rehearsal((asked) => void seen.push(asked));
    rehearse(study, option, () => seen.length < 3);
    idle();
    expect(seen).toHaveLength(3);
    rehearse(study, option, () => true);
    idle();
    expect(seen[3]).toBe(study);
    expect(seen.length).toBeGreaterThan(5);
  });
});
