import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { z } from 'zod';
import { fileSentence, sentences } from '../../lib/messages/index.ts';
import type { Problem, Study } from '../../lib/model/index.ts';
import { migrate } from '../../lib/study/migrate.ts';
import { asPriceDate } from '../../lib/study/priceDate.ts';
import {
  fingerprint,
  parseStudy,
  readDraft,
  readStudy,
  studyVersion,
  writeStudy,
  type studySchema,
} from '../../lib/study/index.ts';
import { lowFerry, lowFerryText } from '../site/demoBrief.ts';

type Frozen<T> = T extends (...args: never[]) => unknown
  ? T
  : T extends object
    ? { readonly [K in keyof T]: Frozen<T[K]> }
    : T;
type Same<A, B> = [A] extends [B] ? ([B] extends [A] ? true : false) : false;
type Read = Frozen<z.output<typeof studySchema>>;
/** Compiles only while the file format, once read, is exactly the shape the stages share; the version is a literal. */
const formatIsStudy: Same<Frozen<Omit<Read, 'version'>>, Frozen<Omit<Study, 'version'>>> = true;

interface Loose {
  [key: string]: Loose & string & number & boolean & null;
}

/** The worked example with something spoilt. */
function spoilt(change: (study: Loose) => void): readonly Problem[] {
  const raw = JSON.parse(lowFerryText) as Loose;
  change(raw);
  const read = parseStudy(raw);
  return read.ok ? [] : read.problems;
}

const set = (value: unknown): never => value as never;

describe('readStudy', () => {
  it('readStudy(worked example) reads, and the output type of the schema is Study', () => {
    expect(formatIsStudy).toBe(true);
    const study = lowFerry();
    expect(study.notice).toContain('invented');
    expect(study.brief.crossing.ground.length).toBeGreaterThanOrEqual(12);
    expect(study.options.workOutAnyway).toEqual(['composite-i', 'concrete-box', 'truss', 'cable-stayed']);
    expect(study.brief.deck.every((strip) => strip.ultimateWidthM === strip.widthM)).toBe(true);
  });

  it('readStudy(least study) applies every default once', () => {
    const { brief } = lowFerry();
    const { crossing, road, deck } = brief;
    const read = parseStudy({
      format: 'spanledger-study',
      version: 1,
      title: 'Least',
      brief: {
        crossing: { startM: crossing.startM, endM: crossing.endM, ground: crossing.ground },
        road: { startLevelM: road.startLevelM, endLevelM: road.endLevelM },
        deck: deck.map(({ kind, widthM }) => ({ kind, widthM })),
      },
    });
    if (!read.ok) throw new Error(sentences(read.problems).join());
    const study = read.value;
    expect(study.brief.access).toEqual({
      haulLengthM: 'unknown',
      haulMassT: 'unknown',
      crane: 'unknown',
      barge: 'unknown',
      craneMomentTm: 'unknown',
      launchYardM: 'unknown',
    });
    expect(study.brief.demands).toEqual({ lanesKept: 0, gasMain: 'none' });
    expect(study.brief.budget).toBe('unknown');
    expect(study.brief.road.fixedEnd).toBe('both');
    expect(study.brief.groundStretches).toHaveLength(1);
    const [stretch] = study.brief.groundStretches;
    expect(stretch).toMatchObject({ fromM: 1240, toM: 1470, known: false });
    expect(stretch!.classes.reduce((sum, { odds }) => sum + odds, 0)).toBeCloseTo(1, 12);
    // Nothing is said of levels: the bearing stratum follows the ground, never above it.
    for (const { bearingLevelM, bearingDepthM } of stretch!.classes) {
      expect(bearingLevelM).toBeUndefined();
      expect(bearingDepthM).toBeGreaterThan(0);
    }
    expect(study.books.draws).toBe(10_000);
    expect(study.decision).toBeNull();
  });

  it('readStudy(text) refuses text that is not JSON, too large, nested too deep or reaching for a prototype', () => {
    const code = (text: string): string | undefined => {
      const read = readStudy(text);
      return read.ok ? undefined : read.problems[0]!.code;
    };
    expect(code('{nope')).toBe('not-json');
    expect(code(`"${'x'.repeat(5_000_001)}"`)).toBe('too-large');
    expect(code(`${'['.repeat(90_000)}${']'.repeat(90_000)}`)).toBe('refused');
    expect(code(lowFerryText.replace('"weights": {}', '"weights": {"__proto__": {"x": 1}}'))).toBe(
      'unknown-key',
    );
    expect(code('[]')).toBe('wrong-type');
    expect(code('null')).toBe('wrong-type');
    expect(({} as Record<string, unknown>)['x']).toBeUndefined();
  });

  it('parseStudy(version 99) is refused as newer and says what to do', () => {
    const problems = spoilt((s) => (s['version'] = set(99)));
    expect(problems).toHaveLength(1);
    expect(problems[0]!.code).toBe('newer-version');
    expect(sentences(problems)[0]).toBe(
      'version: expected at most 2, received 99. Open it with the version of the tool that wrote it, or a later one.',
    );
  });

  it.each<[string, (s: Loose) => void, Problem['code'], string]>([
    ['another format', (s) => (s['format'] = set('other')), 'wrong-format', 'format'],
    ['no version', (s) => delete s['version'], 'missing', 'version'],
    ['version as text', (s) => (s['version'] = set('1')), 'wrong-type', 'version'],
    ['version 0', (s) => (s['version'] = set(0)), 'too-small', 'version'],
    ['an unknown key', (s) => (s['extra'] = set(1)), 'unknown-key', 'extra'],
    ['text in a number', (s) => (s['brief']!['surfacingM'] = set('0.09')), 'wrong-type', 'brief.surfacingM'],
    ['NaN', (s) => (s['brief']!['surfacingM'] = set(NaN)), 'wrong-type', 'brief.surfacingM'],
    [
      'a level left out',
      (s) => delete s['brief']!['road']['startLevelM'],
      'missing',
      'brief.road.startLevelM',
    ],
    ['an unknown standard', (s) => (s['brief']!['loading'] = set('x')), 'not-in-list', 'brief.loading'],
    [
      'a negative headroom',
      (s) => (s['brief']!['obstacles'][0]['clearance']['headroomM'] = set(-3)),
      'too-small',
      'brief.obstacles[0].clearance.headroomM',
    ],
    [
      'text where unknown is legal',
      (s) => (s['brief']!['budget'] = set('lots')),
      'wrong-type',
      'brief.budget',
    ],
    [
      'a deck strip of no width',
      (s) => (s['brief']!['deck'][2]['widthM'] = set(0)),
      'too-small',
      'brief.deck[2].widthM',
    ],
    [
      'a deck without lanes',
      (s) => (s['brief']!['deck'] = set([{ kind: 'verge', widthM: 3 }])),
      'missing',
      'brief.deck',
    ],
    [
      'a reversed crossing',
      (s) => (s['brief']!['crossing']['endM'] = set(1000)),
      'reversed',
      'brief.crossing.endM',
    ],
    [
      'chainages that fall',
      (s) => (s['brief']!['crossing']['ground'][3]['chainageM'] = set(1245)),
      'reversed',
      'brief.crossing.ground[3].chainageM',
    ],
    [
      'ground that ends too soon',
      (s) => (s['brief']!['crossing']['endM'] = set(1486)),
      'outside',
      'brief.crossing.ground[24].chainageM',
    ],
    [
      'a reversed zone',
      (s) => (s['brief']!['obstacles'][1]['fromM'] = set(1400)),
      'reversed',
      'brief.obstacles[1].toM',
    ],
    [
      'a barred abutment',
      (s) => (s['brief']!['obstacles'][0]['fromM'] = set(1230)),
      'outside',
      'brief.obstacles[0].supports',
    ],
    [
      'a flood below the water',
      (s) => (s['brief']!['waters'][0]['floodLevelM'] = set(5)),
      'too-small',
      'brief.waters[0].floodLevelM',
    ],
    [
      'odds that do not sum',
      (s) => (s['brief']!['groundStretches'][0]['classes'][0]['odds'] = set(0.9)),
      'does-not-sum',
      'brief.groundStretches[0].classes',
    ],
    [
      'a ground class that says neither level nor depth',
      (s) => delete s['brief']!['groundStretches'][0]['classes'][0]['bearingLevelM'],
      'missing',
      'brief.groundStretches[0].classes[0].bearingLevelM',
    ],
    [
      'a ground class that says both level and depth',
      (s) => (s['brief']!['groundStretches'][0]['classes'][0]['bearingDepthM'] = set(3)),
      'outside',
      'brief.groundStretches[0].classes[0].bearingLevelM',
    ],
    [
      'a gap in the ground',
      (s) => (s['brief']!['groundStretches'][1]['fromM'] = set(1290)),
      'outside',
      'brief.groundStretches[1].fromM',
    ],
    [
      'a rate out of order',
      (s) => (s['books']!['rates'] = set([{ item: 'x', p10: 3, p50: 2, p90: 4, reason: 'r' }])),
      'reversed',
      'books.rates[0].p50',
    ],
    [
      'a number given twice',
      (s) =>
        (s['options']!['register'] = set(
          [1, 1].map((number) => ({ number, form: 'truss', method: 'crane', supports: 4 })),
        )),
      'refused',
      'options.register[1].number',
    ],
    [
      'ballast that holds up',
      (s) =>
        (s['options']!['kept'] = set([
          {
            number: 1,
            form: 'cantilever-box',
            method: 'balanced-cantilever',
            units: [{ form: 'cantilever-box', role: 'main', supportsM: [1240, 1300, 1400, 1470] }],
            variant: { boxWidthM: 6, ballastKNm: [100, -1, 0] },
          },
        ])),
      'too-small',
      'options.kept[0].variant.ballastKNm[1]',
    ],
    [
      'a deck cast in with no pier',
      (s) =>
        (s['options']!['kept'] = set([
          {
            number: 1,
            form: 'cantilever-box',
            method: 'balanced-cantilever',
            units: [{ form: 'cantilever-box', role: 'main', supportsM: [1240, 1300, 1400, 1470] }],
            variant: { castInPiers: 0 },
          },
        ])),
      'too-small',
      'options.kept[0].variant.castInPiers',
    ],
    [
      'units that do not join',
      (s) =>
        (s['options']!['kept'] = set([
          {
            number: 1,
            form: 'truss',
            method: 'crane',
            units: [
              { form: 'composite-i', role: 'approach', supportsM: [1240, 1320] },
              { form: 'truss', role: 'main', supportsM: [1321, 1470] },
            ],
          },
        ])),
      'outside',
      'options.kept[0].units[1].supportsM[0]',
    ],
  ])('parseStudy(%s) is refused where it is wrong', (_, change, code, place) => {
    const problems = spoilt(change);
    expect(problems.map((p) => p.code)).toContain(code);
    const sentence = problems
      .filter((p) => p.code === code)
      .map(fileSentence)
      .join('\n');
    expect(sentence).toContain(`(${place})`);
    expect(sentence).toMatch(/^.+: expected .+, received .+\. .+\.$/mu);
  });

  it('parseStudy(several faults) gives every one of them', () => {
    const problems = spoilt((s) => {
      s['brief']!['surfacingM'] = set('x');
      s['brief']!['road']['mayRiseM'] = set(-1);
      s['books']!['seed'] = set(1.5);
    });
    expect(problems.map(({ path }) => path.at(-1))).toEqual(['mayRiseM', 'surfacingM', 'seed']);
  });
});

describe('writeStudy', () => {
  it('readStudy(writeStudy(study)) is the identical study', () => {
    const study = lowFerry();
    const back = readStudy(writeStudy(study));
    expect(back).toEqual({ ok: true, value: study });
  });

  it('fingerprint(study) is the SHA-256 of the canonical text, checked with another library', () => {
    const study = lowFerry();
    expect(fingerprint(study)).toBe(createHash('sha256').update(writeStudy(study), 'utf8').digest('hex'));
  });

  it('fingerprint(study) does not depend on the order of keys and follows every change', () => {
    const study = lowFerry();
    const turned = Object.fromEntries(Object.entries(study).reverse()) as unknown as Study;
    expect(fingerprint(turned)).toBe(fingerprint(study));
    expect(fingerprint({ ...study, title: `${study.title}.` })).not.toBe(fingerprint(study));
  });
});

describe('fingerprint', () => {
  it('fingerprint(study) is that of before, once numbers have been given to options', () => {
    const study = lowFerry();
    const register = [{ number: 1, form: 'composite-i', method: 'crane', supports: 4 }] as unknown;
    const numbered = { ...study, options: { ...study.options, register } } as Study;
    expect(writeStudy(numbered)).not.toBe(writeStudy(study));
    expect(fingerprint(numbered)).toBe(fingerprint(study));
  });

  it('fingerprint(study) is that of what is asked: a note, a decision and the reference change nothing of it', () => {
    const study = lowFerry();
    const told: Study = {
      ...study,
      options: { ...study.options, reference: 2 },
      notes: [{ about: '3+020', text: 'Ask the railway', author: 'A. Mason', date: '2026-03-02' }],
    };
    expect(fingerprint(told)).toBe(fingerprint(study));
    expect(fingerprint({ ...told, brief: { ...told.brief, surfacingM: 0.1 } })).not.toBe(fingerprint(study));
  });
});

describe('readDraft', () => {
  it('readDraft(text) holds any one figure however far out it lies, as it was typed', () => {
    type Plain = Readonly<Record<string, unknown>>;
    const study = lowFerry();
    const figures = (value: unknown, path: readonly string[]): (readonly string[])[] =>
      typeof value === 'number'
        ? [path]
        : typeof value === 'object' && value !== null
          ? Object.entries(value).flatMap(([key, part]) => figures(part, [...path, key]))
          : [];
    const put = (part: unknown, [key, ...rest]: readonly string[], by: number): unknown => {
      if (key === undefined) return by;
      const next = put((part as Plain)[key], rest, by);
      return Array.isArray(part)
        ? part.map((one: unknown, i) => (String(i) === key ? next : one))
        : { ...(part as Plain), [key]: next };
    };
    const places = figures(study, []).filter(([top]) => top !== 'version');
    expect(places.length).toBeGreaterThan(80);
    for (const place of places) {
      for (const by of [-9e15, 9e15]) {
        const draft = put(study, place, by) as Study;
        expect([place, readDraft(writeStudy(draft))]).toEqual([place, draft]);
      }
    }
  });
});

describe('the price date of a budget', () => {
  const dated = (priceDate: string): readonly Problem[] =>
    spoilt((study) => {
      study['brief']!['budget']['priceDate'] = set(priceDate);
    });

  it.each(['2026 Q1', '2026-03', '2026-03-15', '2024-02-29', 'unknown'])('%s is taken', (priceDate) => {
    expect(dated(priceDate)).toEqual([]);
  });

  it.each(['hello', '2026', 'Q1 2026', '2026 Q5', '2026-13', '2026-02-30', 'March 2026', ' 2026 Q1'])(
    '%s is refused, with what is expected',
    (priceDate) => {
      const [said] = sentences(dated(priceDate));
      expect(said).toContain(
        "price date: expected a quarter ('2026 Q1'), a month ('2026-03'), a day ('2026-03-15') or 'unknown'",
      );
      expect(said).toContain(`received '${priceDate}'`);
    },
  );

  it('asPriceDate(words) puts a quarter right that can be told, and makes up no other', () => {
    expect(['Q1 2026', '2026Q1', '2026-q1', 'q3/2025', ' 2026-03 '].map(asPriceDate)).toEqual([
      '2026 Q1',
      '2026 Q1',
      '2026 Q1',
      '2025 Q3',
      '2026-03',
    ]);
    expect(['', 'hello', 'spring 2026', '2026', '2023-02-29', '03/2026'].map(asPriceDate)).toEqual(
      Array(6).fill(null),
    );
  });

  it('a study of version 1 opens whatever words it has there, and none of them is lost', () => {
    const opened = (budget: object): Study['brief']['budget'] => {
      const raw = JSON.parse(lowFerryText) as { brief: object };
      const read = parseStudy({ ...raw, version: 1, brief: { ...raw.brief, budget } });
      if (!read.ok) throw new Error(sentences(read.problems).join(' '));
      expect(read.value.version).toBe(studyVersion);
      return read.value.brief.budget;
    };
    const long = 'x'.repeat(20_000);
    expect(opened({ amount: 7e6, priceDate: 'spring 2026', includes: 'Bridge' })).toEqual({
      amount: 7e6,
      priceDate: 'unknown',
      includes: 'Bridge; price date as written: spring 2026',
    });
    expect(opened({ amount: 7e6, priceDate: 'hello' })).toEqual({
      amount: 7e6,
      priceDate: 'unknown',
      includes: 'price date as written: hello',
    });
    expect(opened({ amount: 7e6, priceDate: 'h'.repeat(500), includes: long })).toMatchObject({
      includes: `${long}; price date as written: ${'h'.repeat(500)}`,
    });
    expect(opened({ amount: 7e6, priceDate: 'Q2 2025' })).toMatchObject({
      priceDate: '2025 Q2',
      includes: '',
    });
    expect(opened({ amount: 7e6, priceDate: '2026 Q1' })).toMatchObject({ priceDate: '2026 Q1' });
  });

  it('what version 1 could not be either is refused as before', () => {
    for (const budget of [
      'free',
      { amount: 7e6 },
      { amount: 7e6, priceDate: 3 },
      { amount: 7e6, priceDate: '' },
    ]) {
      const problems = spoilt((study) => {
        study['version'] = set(1);
        study['brief']!['budget'] = set(budget);
      });
      expect(problems.length).toBeGreaterThan(0);
    }
  });
});

describe('migrate', () => {
  const steps = {
    1: (old: Readonly<Record<string, unknown>>) => ({ ...old, version: 2, b: old['a'] }),
    2: (old: Readonly<Record<string, unknown>>) => ({ ...old, version: 3, c: old['b'] }),
  };

  it('migrate(from, to) applies each step in turn', () => {
    expect(migrate({ version: 1, a: 7 }, 1, 3, steps)).toEqual({ version: 3, a: 7, b: 7, c: 7 });
    expect(migrate({ version: 3 }, 3, 3, steps)).toEqual({ version: 3 });
  });

  it('migrate without a step for a version is a fault of the tool', () => {
    expect(() => migrate({}, 1, 2, {})).toThrow('no migration from version 1');
  });
});
