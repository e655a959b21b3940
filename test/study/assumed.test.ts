import { describe, expect, it } from 'vitest';
import {
  assumedAgain,
  confirmed,
  isAssumed,
  startValues,
  startValueWords,
  stillAssumed,
} from '../../lib/study/index.ts';
import type { Study } from '../../lib/model/index.ts';
import { fingerprint, parseStudy, readDraft, readStudy, writeStudy } from '../../lib/study/index.ts';
import { lowFerry, lowFerryText } from '../site/demoBrief.ts';

const marked = (...assumed: string[]): Study => ({ ...lowFerry(), assumed: assumed.toSorted() });
const withBrief = (study: Study, change: Partial<Study['brief']>): Study => ({
  ...study,
  brief: { ...study.brief, ...change },
});

describe('the list of start values in a study file', () => {
  it('may be left out, is read in order and each once, and is written in order', () => {
    expect(lowFerry().assumed).toEqual([]);
    const read = parseStudy({
      ...JSON.parse(lowFerryText),
      assumed: ['brief.road.startLevelM', 'brief.loading', 'brief.loading'],
    });
    if (!read.ok) throw new Error('the study was refused');
    expect(read.value.assumed).toEqual(['brief.loading', 'brief.road.startLevelM']);
    const turned = { ...read.value, assumed: read.value.assumed.toReversed() };
    expect(writeStudy(turned)).toBe(writeStudy(read.value));
    expect(writeStudy(turned)).toContain('"assumed":["brief.loading","brief.road.startLevelM"]');
    expect(readStudy(writeStudy(turned))).toEqual({ ok: true, value: read.value });
  });

  it('is not written where there is none, and leaves the fingerprint as it is', () => {
    const study = lowFerry();
    expect(writeStudy(study)).not.toContain('assumed');
    expect(fingerprint(marked('brief.loading', 'brief.deck'))).toBe(fingerprint(study));
  });

  it.each([
    'brief',
    'title',
    'books.seed',
    'brief.road.levelM',
    'brief.deck.99.widthM',
    'brief.deck.length',
    'brief.deck.0.widthM.more',
    'brief.__proto__',
    'brief.road.toString',
    '',
  ])("'%s' names no field of the brief: a problem at its place, and the file is read as a draft", (path) => {
    const study = marked(path, 'brief.loading');
    const read = parseStudy(study);
    expect(read.ok).toBe(false);
    if (read.ok) return;
    const at = study.assumed.indexOf(path);
    expect(read.problems).toMatchObject([
      { code: 'refused', path: ['assumed', at], received: `'${path}'`, remedy: expect.any(String) as string },
    ]);
    expect(readDraft(writeStudy(study))).toEqual(study);
  });
});

describe('stillAssumed(before, after)', () => {
  it('keeps what is as it was, in a list or group each part of it, and drops what has another value', () => {
    const study = marked('brief.road.startLevelM', 'brief.road.endLevelM', 'brief.crossing.ground');
    const { road, crossing } = study.brief;
    expect(stillAssumed(study, study)).toEqual(study.assumed);
    const raised = withBrief(study, { road: { ...road, startLevelM: road.startLevelM + 1 } });
    expect(stillAssumed(study, raised)).toEqual(['brief.crossing.ground', 'brief.road.endLevelM']);
    const ground = crossing.ground.map((point, i) => (i === 1 ? { ...point, levelM: 7.77 } : point));
    const dug = withBrief(study, { crossing: { ...crossing, ground } });
    const left = stillAssumed(study, dug);
    expect(left).toContain('brief.crossing.ground.1.chainageM');
    expect(left).toContain('brief.crossing.ground.2');
    expect(left).not.toContain('brief.crossing.ground.1.levelM');
    expect(left).not.toContain('brief.crossing.ground');
  });

  it('goes with an entry of a list that others are put before or taken out of', () => {
    const study = marked('brief.deck.0.widthM', 'brief.deck.3.widthM', 'brief.obstacles.1.kind');
    const { deck, obstacles } = study.brief;
    const before = withBrief(study, { deck: [{ ...deck[0]!, widthM: 9 }, ...deck] });
    expect(stillAssumed(study, before)).toEqual([
      'brief.deck.1.widthM',
      'brief.deck.4.widthM',
      'brief.obstacles.1.kind',
    ]);
    const fewer = withBrief(study, { deck: deck.slice(1), obstacles: obstacles.slice(1) });
    expect(stillAssumed(study, fewer)).toEqual(['brief.deck.2.widthM', 'brief.obstacles.0.kind']);
    // A copy of a strip is as wide as its original because nobody has said otherwise.
    const copied = withBrief(study, { deck: [...deck.slice(0, 4), deck[3]!, ...deck.slice(4)] });
    expect(stillAssumed(study, copied)).toContain('brief.deck.4.widthM');
  });

  it('counts the lanes as said once there are others, and an envelope once its authority has confirmed it', () => {
    const { deck, obstacles } = lowFerry().brief;
    const lanes = deck.flatMap(({ kind }, i) => (kind === 'lane' ? [i] : []));
    const study = marked(...lanes.map((i) => `brief.deck.${i}.kind`), 'brief.obstacles.0.clearance');
    const more = withBrief(study, { deck: deck.toSpliced(lanes[0]!, 0, deck[lanes[0]!]!) });
    expect(stillAssumed(study, more)).toEqual(['brief.obstacles.0.clearance']);
    const [first, ...others] = obstacles;
    const clearance = { ...first!.clearance!, confirmed: true };
    const agreed = withBrief(study, { obstacles: [{ ...first!, clearance }, ...others] });
    expect(stillAssumed(study, agreed)).toEqual(lanes.map((i) => `brief.deck.${i}.kind`));
  });
});

describe('confirmed and assumedAgain', () => {
  it('confirmed(study, paths) takes off what is named and what lies in it, and parts what it lies in', () => {
    const study = marked('brief.road', 'brief.deck.0.widthM', 'brief.deck.1.widthM');
    expect(confirmed(study, ['brief.deck']).assumed).toEqual(['brief.road']);
    const one = confirmed(study, ['brief.road.endLevelM']);
    expect(isAssumed(one, 'brief.road.endLevelM')).toBe(false);
    expect(isAssumed(one, 'brief.road.startLevelM')).toBe(true);
    expect(one.brief).toBe(study.brief);
  });

  it('assumedAgain(study, earlier, paths) brings back what was marked there and nothing else', () => {
    const earlier = marked('brief.crossing.ground', 'brief.deck.0.widthM', 'brief.loading');
    const none = { ...earlier, assumed: [] };
    const again = (...paths: string[]): readonly string[] => assumedAgain(none, earlier, paths).assumed;
    expect(again('brief.crossing.ground.0.levelM')).toEqual(['brief.crossing.ground.0.levelM']);
    expect(again('brief.deck')).toEqual(['brief.deck.0.widthM']);
    expect(again('brief.road')).toEqual([]);
  });
});

describe('startValues(study)', () => {
  it('names each start value once however many figures it has, and a nameless one by its path', () => {
    const study = marked(
      'brief.deck.0.widthM',
      'brief.deck.1.widthM',
      'brief.road.maxGradient',
      'brief.obstacles.0.kind',
    );
    const river = study.brief.obstacles[0]!.name;
    expect(startValues(study)).toEqual([
      'widths of the strips of the deck',
      `kind of ${river}`,
      'brief.road.maxGradient',
    ]);
    expect(startValueWords(study)).toMatch(/^3 start values not confirmed: widths/u);
    expect(startValueWords(marked('brief.loading'))).toBe('1 start value not confirmed: load standard');
    expect(startValueWords(lowFerry())).toBe('');
    // In a draft whose list is refused too.
    expect(startValues(marked('brief.obstacles.99.kind'))).toEqual(['brief.obstacles.99.kind']);
  });
});
