import { describe, expect, it } from 'vitest';
import { readStudy, startValues, survey, writeStudy, type Study } from '../../lib/index.ts';
import { copyTitle } from '../../notebooks/shelf/kept.ts';
import { begun, emptyGaps, type Crossed, type Gaps } from '../../notebooks/shelf/newStudy.ts';

/** What is begun from a length and what else is said. */
function studyOf(gaps: Partial<Gaps>, titles: readonly string[] = []): Study {
  const made = begun({ ...emptyGaps, lengthM: 120, ...gaps }, titles);
  if (!made.ok) throw new Error(made.why);
  return made.study;
}
const whyNot = (gaps: Partial<Gaps>): string => {
  const made = begun({ ...emptyGaps, ...gaps });
  return made.ok ? '' : made.why;
};
const widthOf = ({ brief }: Study): number => brief.deck.reduce((sum, { widthM }) => sum + widthM, 0);

describe('begun(gaps)', () => {
  const crossed: readonly Crossed[] = ['river', 'railway', 'road', 'open'];
  it.each(
    crossed.flatMap((what) =>
      [8, 36.5, 120, 1400].flatMap((lengthM) =>
        [
          {},
          { barredM: 0 },
          { barredM: lengthM / 2, headroomM: 4.5 },
          { barredM: lengthM - 2 },
          { heightM: 2 },
          { heightM: 60, roadLevelM: -3 },
        ].map((more): [Crossed, number, Partial<Gaps>] => [what, lengthM, more]),
      ),
    ),
  )('%s in %d m with %o is a study that its own file gives again', (what, lengthM, more) => {
    const study = studyOf({ crossed: what, lengthM, ...more });
    expect(readStudy(writeStudy(study))).toEqual({ ok: true, value: study });
    expect(survey(study.brief).lengthM).toBe(lengthM);
  });

  it('needs the length and nothing else', () => {
    expect(whyNot({})).toContain('length');
    expect(whyNot({ lengthM: 40 })).toBe('');
  });

  it('keeps unknown what nobody has said and asks for every form', () => {
    const { brief, options } = studyOf({});
    expect(brief).toMatchObject({
      budget: 'unknown',
      crossing: { planRadiusM: 'unknown', skewDeg: 'unknown' },
    });
    expect(brief.access).toMatchObject({ haulLengthM: 'unknown', crane: 'unknown' });
    expect(brief.groundStretches.every(({ known }) => !known)).toBe(true);
    expect(options).toMatchObject({ forms: [], register: [], kept: [] });
  });

  it('says each start value it takes, and none for what was given', () => {
    expect(studyOf({}).notice).toMatch(
      /a deck 10\.00 m wide, the river 30\.0 m wide, where a support may stand at a price, the road at level 100\.00/u,
    );
    const given = studyOf({ widthM: 12, barredM: 40, roadLevelM: 21, heightM: 9, headroomM: 5 });
    expect(given.notice).not.toMatch(/deck|wide|level|above/u);
    expect(given.notice).toContain('valley');
  });

  it('marks every start value that it takes, each at a field of the study, and what stood there untouched', () => {
    const { assumed, brief } = studyOf({});
    const lanes = brief.deck.flatMap(({ kind }, i) => (kind === 'lane' ? [`brief.deck.${i}.kind`] : []));
    expect(lanes).toHaveLength(2);
    expect(assumed).toEqual(
      [
        ...brief.deck.map((_, i) => `brief.deck.${i}.widthM`),
        ...lanes,
        'brief.loading',
        'brief.crossing.ground',
        ...['startLevelM', 'endLevelM', 'fixedEnd', 'mayRiseM'].map((key) => `brief.road.${key}`),
        ...['kind', 'fromM', 'toM', 'supports'].map((key) => `brief.obstacles.0.${key}`),
        ...['fromM', 'toM', 'floodFromM', 'floodToM', 'levelM'].map((key) => `brief.waters.0.${key}`),
      ].toSorted(),
    );
  });

  it('marks of what was given only how we have split it, and of a railway the headroom that is a preset', () => {
    const given = studyOf({
      lanes: 2,
      crossed: 'river',
      loading: 'lm1',
      widthM: 12,
      barredM: 40,
      roadLevelM: 21,
      heightM: 9,
      headroomM: 5,
    });
    expect(startValues(given)).toEqual([
      'widths of the strips of the deck',
      'edges of the water of the river',
      'ground line',
    ]);
    const railway = studyOf({ crossed: 'railway', barredM: 24, roadLevelM: 21, heightM: 9 });
    expect(railway.assumed).toContain('brief.obstacles.0.clearance.headroomM');
    expect(railway.assumed).not.toContain('brief.obstacles.0.clearance.datumLevelM');
    expect(railway.assumed).not.toContain('brief.obstacles.0.kind');
    // Without its height over the rails their level is none that somebody has said.
    const height = studyOf({ crossed: 'railway', barredM: 24, roadLevelM: 21 });
    expect(height.assumed).toContain('brief.obstacles.0.clearance.datumLevelM');
  });

  it('puts what is said where it belongs', () => {
    const study = studyOf({
      title: ' Mill Lane ',
      crossed: 'railway',
      barredM: 24,
      headroomM: 5.9,
      roadLevelM: 50,
      heightM: 8,
      loading: 'hl93',
      budget: 4e6,
    });
    expect(study.title).toBe('Mill Lane');
    expect(study.brief).toMatchObject({
      loading: 'hl93',
      budget: { amount: 4e6, priceDate: expect.stringMatching(/^\d{4} Q[1-4]$/u) as string },
      road: { startLevelM: 50, endLevelM: 50, fixedEnd: 'both', mayRiseM: 0 },
      waters: [],
    });
    expect(study.brief.obstacles).toEqual([
      {
        kind: 'railway',
        name: 'the railway',
        fromM: 48,
        toM: 72,
        supports: 'hard',
        pierPremium: 'unknown',
        clearance: { fromM: 48, toM: 72, datumLevelM: 42, headroomM: 5.9, confirmed: false },
      },
    ]);
    expect(survey(study.brief).mainOpening?.widthM).toBe(24);
  });

  it.each([
    [2, 10],
    [2, 7.3],
    [3, 9.5],
    [4, 26],
    [1, 3.5],
  ])('lays out %d lanes on a deck %d m wide', (lanes, widthM) => {
    const study = studyOf({ lanes, widthM });
    expect(widthOf(study)).toBeCloseTo(widthM, 2);
    expect(study.brief.deck.filter(({ kind }) => kind === 'lane')).toHaveLength(lanes);
  });

  it('refuses what cannot be, with the limit', () => {
    expect(whyNot({ lengthM: 40, lanes: 4, widthM: 9 })).toContain('at least 11.0 m');
    expect(whyNot({ lengthM: 40, barredM: 39 })).toContain('at most 38.0 m');
  });

  it('a river has its water in the bed, under the road by the height given', () => {
    const { brief } = studyOf({ barredM: 30, roadLevelM: 20, heightM: 7 });
    const [water] = brief.waters;
    expect(water).toMatchObject({ levelM: 13, floodLevelM: 'unknown' });
    const bed = brief.crossing.ground.filter(({ levelM }) => levelM < 13);
    expect(bed.every(({ chainageM }) => chainageM > water!.fromM && chainageM < water!.toM)).toBe(true);
    expect(bed.length).toBe(2);
  });

  it('names what has no name by its turn', () => {
    expect(studyOf({}).title).toBe('New crossing');
    expect(studyOf({}, ['New crossing', 'New crossing 2']).title).toBe('New crossing 3');
  });
});

describe('copyTitle(title, titles)', () => {
  it('tells duplicates apart and stays a title', () => {
    expect(copyTitle('Mill Lane', ['Mill Lane'])).toBe('Mill Lane, copy');
    expect(copyTitle('Mill Lane', ['Mill Lane', 'Mill Lane, copy'])).toBe('Mill Lane, copy 2');
    expect(copyTitle('x'.repeat(500), []).length).toBeLessThanOrEqual(500);
  });
});
