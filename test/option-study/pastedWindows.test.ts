import { describe, expect, it } from 'vitest';
import { pastedObstacles } from '../../notebooks/option-study/brief/pastedObstacles.ts';
import { pastedProfile } from '../../notebooks/option-study/brief/pastedProfile.ts';
import { putAt } from '../../notebooks/page/index.ts';
import type { Study } from '../../lib/index.ts';
import { abutmentWindows, survey } from '../../lib/site/index.ts';
import { placesOf, workedStudy } from './study.ts';

const windows = { startLatestM: 1264, endEarliestM: 1400 } as const;
const { crossing, ...brief } = workedStudy().brief;
const { startM, endM } = crossing;
/** The worked example with windows for its abutments and nothing under the bridge. */
const open: Study = {
  ...workedStudy(),
  brief: { ...brief, crossing: { ...crossing, ...windows }, obstacles: [], waters: [] },
};

/** As the tables of the brief take what is pasted into them. */
function withGround(text: string): Study {
  const read = pastedProfile(text);
  if (!read.ok) throw new Error(read.why);
  return putAt(open, ['brief', 'crossing', 'ground'], read.points);
}
function withObstacles(text: string): Study {
  const read = pastedObstacles(text);
  if (!read.ok) throw new Error(read.why);
  return putAt(open, ['brief', 'obstacles'], read.obstacles);
}
const windowsOf = ({ brief: given }: Study, roomM: number) => abutmentWindows(survey(given), roomM);

describe('abutment windows beside what is pasted', () => {
  it('a pasted ground line that reaches both ends leaves them as they were', () => {
    const pasted = withGround(`chainage\tlevel\n${startM - 20}\t9\n1300\t4\n${endM + 20}\t9`);
    expect(pasted.brief.crossing).toMatchObject({ startM, endM, ...windows });
    expect(placesOf(pasted)).toEqual([]);
    expect(windowsOf(pasted, 1.5)).toEqual({ start: [startM, 1264], end: [1400, endM] });
  });

  it.each([
    ['beyond the start', `${startM + 10}\t9\n${endM}\t9`, 'brief.crossing.ground.0.chainageM'],
    ['short of the end', `${startM}\t9\n1410\t9`, 'brief.crossing.ground.1.chainageM'],
  ])(
    'a pasted ground line that begins or ends %s is a problem beside it, windows or not',
    (_, text, place) => {
      expect(placesOf(withGround(text))).toEqual([place]);
    },
  );

  it('pasted obstacles narrow them with half a pier of room, and never bury what they name', () => {
    const pasted = withObstacles('Track\trailway\t1258\t1262\tbarred\nDitch\tutility\t1404\t1406\tsoft');
    expect(pasted.brief.crossing).toMatchObject(windows);
    expect(placesOf(pasted)).toEqual([]);
    expect(windowsOf(pasted, 1.5)).toEqual({ start: [startM, 1256.5], end: [1407.5, endM] });
  });

  it('a pasted obstacle at an end of the crossing leaves that abutment where it is; barred, it is a problem beside it', () => {
    const bank = (supports: string): Study =>
      withObstacles(`Bank\tbank\t${startM - 5}\t${startM + 1}\t${supports}`);
    expect(placesOf(bank('barred'))).toEqual(['brief.obstacles.0.supports']);
    expect(placesOf(bank('soft'))).toEqual([]);
    expect(windowsOf(bank('soft'), 1.5)).toEqual({ start: [startM, startM], end: [1400, endM] });
  });
});
