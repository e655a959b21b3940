import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sentences } from '../../lib/messages/index.ts';
import { formIds, groundClassIds, stripKinds } from '../../lib/model/index.ts';
import { fingerprint, parseStudy, readStudy, writeStudy } from '../../lib/study/index.ts';
import { lowFerryText } from '../site/demoBrief.ts';

const figure = (least: number, most: number): fc.Arbitrary<number> =>
  fc.double({ min: least, max: most, noNaN: true }).map((x) => x + 0);
const orUnknown = <T>(value: fc.Arbitrary<T>): fc.Arbitrary<T | 'unknown'> =>
  fc.oneof(value, fc.constant('unknown' as const));

/** Study files of every shape the format allows, some entries left out. */
const studyFile = fc
  .record({ startM: figure(-1000, 1000), lengthM: figure(20, 4000), parts: fc.integer({ min: 1, max: 12 }) })
  .chain(({ startM, lengthM, parts }) => {
    const endM = startM + lengthM;
    const inside = figure(0.05, 0.9).chain((share) =>
      figure(0.01, 0.09).map((more) => ({
        fromM: startM + share * lengthM,
        toM: startM + (share + more) * lengthM,
      })),
    );
    const ground = fc.array(figure(-50, 80), { minLength: parts + 1, maxLength: parts + 1 }).map((levels) =>
      levels.map((levelM, i) => ({
        chainageM: i === parts ? endM : startM + (i * lengthM) / parts,
        levelM,
      })),
    );
    return fc.record(
      {
        format: fc.constant('spanledger-study'),
        version: fc.constant(1),
        title: fc.string({ minLength: 1, unit: 'grapheme' }),
        notice: fc.string(),
        brief: fc.record(
          {
            crossing: fc.record({
              startM: fc.constant(startM),
              endM: fc.constant(endM),
              ground,
              planRadiusM: fc.oneof(orUnknown(figure(50, 5000)), fc.constant('straight')),
              skewDeg: orUnknown(figure(-60, 60)),
            }),
            road: fc.record({ startLevelM: figure(0, 50), endLevelM: figure(0, 50), mayRiseM: figure(0, 5) }),
            deck: fc
              .array(fc.record({ kind: fc.constantFrom(...stripKinds), widthM: figure(0.1, 5) }), {
                maxLength: 8,
              })
              .map((strips) => [{ kind: 'lane', widthM: 3.5 }, ...strips]),
            obstacles: fc.array(
              inside.map((zone) => ({
                kind: 'road',
                name: 'zone',
                ...zone,
                supports: 'soft',
                clearance: null,
              })),
              { maxLength: 5 },
            ),
            groundStretches: fc.oneof(
              fc.constant('unknown'),
              fc.constantFrom(...groundClassIds).map((ground) => [
                {
                  fromM: startM,
                  toM: endM,
                  known: true,
                  classes: [{ ground, bearingLevelM: -3, odds: 1 }],
                },
              ]),
              fc.constant([{ fromM: startM, toM: endM, classes: 'unknown' }]),
            ),
            budget: orUnknown(figure(1, 1e9).map((amount) => ({ amount, priceDate: '2026 Q1' }))),
          },
          { requiredKeys: ['crossing', 'road', 'deck'] },
        ),
        options: fc.record({ forms: fc.subarray([...formIds]) }),
        priorities: fc.record({
          weights: fc.dictionary(
            fc.string({ minLength: 1 }).filter((k) => !/proto|constructor/u.test(k)),
            figure(0, 9),
          ),
        }),
        notes: fc.array(fc.record({ about: fc.constant('1+020'), text: fc.string({ unit: 'binary' }) }), {
          maxLength: 3,
        }),
      },
      { requiredKeys: ['format', 'version', 'title', 'brief'] },
    );
  });

describe('study file', () => {
  it('reading what is written gives the identical study and fingerprint', () => {
    fc.assert(
      fc.property(studyFile, (file) => {
        const first = parseStudy(file);
        if (!first.ok) throw new Error(sentences(first.problems).join('\n'));
        const second = readStudy(writeStudy(first.value));
        expect(second).toEqual({ ok: true, value: first.value });
        expect(second.ok && fingerprint(second.value)).toBe(fingerprint(first.value));
      }),
      { seed: 20260101, numRuns: 300 },
    );
  });

  it('readStudy never throws on text, whatever it is', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.json()), (text) => {
        const read = readStudy(text);
        expect(read.ok).toBe(false);
        if (!read.ok) expect(sentences(read.problems).length).toBeGreaterThan(0);
      }),
      { seed: 20260102, numRuns: 500 },
    );
  });

  it('a worked example with one value replaced by anything is read or refused with a sentence', () => {
    fc.assert(
      fc.property(fc.nat(), fc.jsonValue(), (pick, value) => {
        const raw = JSON.parse(lowFerryText) as unknown;
        const places: [Record<string, unknown>, string][] = [];
        const walk = (node: unknown): void => {
          if (typeof node !== 'object' || node === null) return;
          for (const key of Object.keys(node)) {
            places.push([node as Record<string, unknown>, key]);
            walk((node as Record<string, unknown>)[key]);
          }
        };
        walk(raw);
        const [node, key] = places[pick % places.length]!;
        node[key] = value;
        const read = readStudy(JSON.stringify(raw));
        if (!read.ok)
          for (const sentence of sentences(read.problems))
            expect(sentence).toMatch(/: expected .+, received /su);
      }),
      { seed: 20260103, numRuns: 1000 },
    );
  });
});
