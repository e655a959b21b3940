import { fillGround, type AskedVariant, type KeptOption, type Study } from '../../lib/index.ts';
import type { Context } from '../../lib/explain/index.ts';
import { levelCrossing } from '../appraise/levelCrossing.ts';
import { lowFerry } from '../appraise/studies.ts';
import { answerTo } from '../appraise/answerTo.ts';

const made = new Map<string, Context>();

/** A study with its appraisal, made once for all tests that ask about it. */
function once(name: string, study: () => Study): Context {
  const found = made.get(name);
  if (found) return found;
  const asked = study();
  const context = { study: asked, appraisal: answerTo(asked) };
  made.set(name, context);
  return context;
}

/** The first worked example with all its options. */
export const example = (): Context => once('example', lowFerry);

/**
 * The same crossing seen differently: American loading, much of the brief unknown, a rate typed over the schedule, both
 * ends of the road free, and one option whose piers and depth were set by hand.
 */
export const otherwise = (): Context =>
  once('otherwise', () => {
    const study = lowFerry();
    const { brief } = study;
    return {
      ...study,
      brief: {
        ...brief,
        loading: 'hl93',
        crossing: { ...brief.crossing, planRadiusM: 'unknown', skewDeg: 'unknown' },
        road: { ...brief.road, fixedEnd: 'none' },
        waters: brief.waters.map((water) => ({ ...water, floodLevelM: 'unknown' })),
        budget: 'unknown',
      },
      books: {
        ...study.books,
        draws: 1000,
        rates: [{ item: 'plate-girder-steel', p10: 3, p50: 3.9, p90: 5.2, reason: 'call to a fabricator' }],
      },
      options: {
        ...study.options,
        forms: ['composite-i'],
        kept: [
          {
            number: 40,
            form: 'composite-i',
            method: 'crane',
            units: [{ form: 'composite-i', role: 'main', supportsM: [1240, 1280, 1321, 1389, 1430, 1470] }],
            depthM: 2.6,
          },
        ],
      },
    };
  });

/** The same crossing with its river known and piers standing in it and on its banks: flow and velocity, bed, afflux allowed, vessels, and an earthquake. */
export const inFlood = (): Context =>
  once('inFlood', () => {
    const study = lowFerry();
    const { brief } = study;
    return {
      ...study,
      brief: {
        ...brief,
        crossing: { ...brief.crossing, groundAccelerationG: 0.16, siteClass: 'C' },
        obstacles: [
          ...brief.obstacles.map((one) =>
            one.kind === 'river' ? ({ ...one, supports: 'none', clearance: null } as const) : one,
          ),
          ...([60_000, 'unknown'] as const).map(
            (pierPremium, i) =>
              ({
                kind: 'bank',
                name: `bank ${i + 1}`,
                fromM: [1278, 1436][i]!,
                toM: [1284, 1442][i]!,
                supports: 'soft',
                pierPremium,
                clearance: null,
              }) as const,
          ),
        ],
        waters: brief.waters.map((water) => ({
          ...water,
          flowM3s: 420,
          velocityMs: 1.5,
          allowedAffluxM: 0.1,
          grainMm: 2,
          vesselDwtT: 40,
        })),
      },
      books: { ...study.books, draws: 300 },
      options: {
        ...study.options,
        forms: ['composite-i'],
        kept: [
          {
            number: 40,
            form: 'composite-i',
            method: 'crane',
            units: [
              {
                form: 'composite-i',
                role: 'main',
                supportsM: [1240, 1281, 1313, 1345, 1377, 1408, 1439, 1470],
              },
            ],
            depthM: null,
          },
        ],
      },
    };
  });

/** A short road bridge as a portal frame, no water about, on ground nobody has looked at: walls in one with the deck instead of abutments. */
export const frame = (): Context =>
  once('frame', () => {
    const study = levelCrossing(24);
    const { brief, books, options } = study;
    return {
      ...study,
      brief: {
        ...brief,
        groundStretches: fillGround('unknown', brief.crossing),
        obstacles: [
          {
            kind: 'road',
            name: 'Mill Road',
            fromM: 107,
            toM: 117,
            supports: 'hard',
            pierPremium: 'unknown',
            clearance: { fromM: 108, toM: 116, datumLevelM: 10.1, headroomM: 5, confirmed: true },
          },
        ],
      },
      books: { ...books, draws: 1000 },
      options: { ...options, forms: ['portal-frame'], workOutAnyway: [] },
    };
  });

/** The same over two unequal spans with a wall between them, kept by hand beside what is found, and an earthquake. */
export const frameOfTwo = (): Context =>
  once('frameOfTwo', () => {
    const { study } = frame();
    const { brief, books, options } = study;
    const [road] = brief.obstacles;
    return {
      ...study,
      brief: {
        ...brief,
        crossing: { ...brief.crossing, endM: 138, groundAccelerationG: 0.12, siteClass: 'B' },
        obstacles: [road!, { ...road!, name: 'Mill Lane', fromM: 124, toM: 132, clearance: null }],
      },
      books: { ...books, draws: 300 },
      options: {
        ...options,
        kept: [
          {
            number: 7,
            form: 'portal-frame',
            method: 'falsework',
            units: [{ form: 'portal-frame', role: 'main', supportsM: [100, 120.5, 138] }],
            depthM: null,
          },
        ],
      },
    };
  });

/** The crossing with a wide deck under HL-93, its options kept by hand in every way that a form leaves open. */
export const variants = (): Context =>
  once('variants', () => {
    const study = lowFerry();
    const { brief, books, options } = study;
    const { startM, endM } = brief.crossing;
    const strip = (kind: 'parapet' | 'lane' | 'footway', widthM: number) => ({
      kind,
      widthM,
      ultimateWidthM: widthM,
    });
    const supportsM = (endShare: number): number[] => {
      const endSpanM = endShare * (endM - startM);
      return [startM, startM + endSpanM, endM - endSpanM, endM];
    };
    const methods = {
      'composite-i': 'crane',
      'concrete-box': 'falsework',
      'cantilever-box': 'balanced-cantilever',
      'composite-box': 'crane',
    } as const;
    const kept = (
      number: number,
      form: keyof typeof methods,
      variant: AskedVariant,
      endShare = 0.28,
    ): KeptOption => ({
      number,
      form,
      method: methods[form],
      units: [{ form, role: 'main', supportsM: supportsM(endShare) }],
      depthM: null,
      variant,
    });
    return {
      ...study,
      brief: {
        ...brief,
        loading: 'hl93',
        deck: [
          strip('parapet', 0.5),
          ...Array.from({ length: 4 }, () => strip('lane', 3.5)),
          strip('footway', 2.5),
          strip('parapet', 0.5),
        ],
        demands: { lanesKept: 2, gasMain: 'outside' },
      },
      books: { ...books, draws: 1000 },
      options: {
        ...options,
        forms: ['composite-i'],
        workOutAnyway: ['composite-i', 'composite-box', 'concrete-box', 'cantilever-box'],
        kept: [
          kept(40, 'composite-i', { haunchRatio: 1.6, substringers: true }),
          kept(47, 'composite-i', { haunchRatio: 'unknown', substringers: true }),
          kept(41, 'concrete-box', { transverse: true }),
          kept(42, 'concrete-box', { struts: true }),
          kept(43, 'cantilever-box', { struts: true }),
          kept(46, 'concrete-box', { ribs: true }),
          kept(44, 'concrete-box', { boxWidthM: 9, light: { densityKgM3: 1800 } }),
          kept(45, 'cantilever-box', {
            strengthMPa: 60,
            light: { densityKgM3: 1900, middleM: [0, 60, 0] },
            ballastKNm: [20, 0, 30],
          }),
          { ...kept(48, 'cantilever-box', { castInPiers: 2 }), depthM: 3 },
          kept(49, 'composite-box', { squareEnds: true }),
          kept(50, 'composite-box', {}),
          // Arms longer than the end spans balance, held down by them and what is laid in them.
          kept(39, 'cantilever-box', { ballastKNm: [60, 0, 60] }, 0.22),
        ],
      },
    };
  });

/** The crossing with a window for each abutment: bridges shorter than the crossing, their approaches between walls. */
export const inWindows = (): Context =>
  once('inWindows', () => {
    const study = lowFerry();
    const { brief, books, options } = study;
    return {
      ...study,
      brief: {
        ...brief,
        crossing: { ...brief.crossing, startLatestM: 1264, endEarliestM: 1430 },
        road: { ...brief.road, fixedEnd: 'start', startGradient: 0.03, approachSides: 'walls' },
        waters: brief.waters.map((water) => ({ ...water, flowM3s: 420, allowedAffluxM: 0.2 })),
      },
      books: { ...books, draws: 300 },
      options: { ...options, forms: ['composite-i', 'truss'], workOutAnyway: ['composite-i', 'truss'] },
    };
  });
