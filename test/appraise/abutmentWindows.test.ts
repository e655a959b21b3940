import { describe, expect, it } from 'vitest';
import { expectedLines } from '../../lib/substructure/index.ts';
import { standBetween } from '../../lib/site/index.ts';
import { workOption } from '../../lib/appraise/cheapestOption.ts';
import { proposalsFor } from '../../lib/appraise/proposals.ts';
import { finish } from '../../lib/appraise/work.ts';
import { benchFor, workbench, type Workbench } from '../../lib/appraise/workbench.ts';
import {
  appraiseKept,
  memory,
  readStudy,
  writeStudy,
  type Appraisal,
  type Arrangement,
  type Crossing,
  type RateOverride,
  type Study,
} from '../../lib/index.ts';
import { answerTo } from './answerTo.ts';
import { lowFerry, mirrored } from './studies.ts';

/** The first worked example with windows for its abutments, one form, and draws as few as figures of the middle need. */
function windowed(windows: Partial<Crossing>, form: 'composite-i' | 'concrete-box' = 'composite-i'): Study {
  const study = lowFerry();
  return {
    ...study,
    brief: { ...study.brief, crossing: { ...study.brief.crossing, ...windows } },
    books: { ...study.books, draws: 300 },
    options: { ...study.options, forms: [form] },
  };
}

const both = { startLatestM: 1264, endEarliestM: 1400 } as const;

/** Everything of an appraisal but the fingerprint of what was asked. */
const said = ({ study: _asked, ...rest }: Appraisal): unknown => rest;

const rate = (item: string, p50: number): RateOverride => ({
  item,
  p10: 0.9 * p50,
  p50,
  p90: 1.1 * p50,
  reason: 'to see what it does',
});

/** Money of an arrangement worked out in full between its own abutments, at mean rates. */
function inFull(bench: Workbench, { form, method, units }: Arrangement): number {
  const own = benchFor(bench, units);
  const option = finish(
    workOption(own, { number: 1, form, method, units, depthM: null, origin: 'proposed' }),
  );
  return (
    own.costOf(option.lines) +
    own.costOf(option.supports.flatMap((support) => expectedLines({ ...support, lines: [] })))
  );
}

describe('appraise with windows for the abutments', () => {
  it('appraise(windows of no width) is the fixed crossing to the last figure', () => {
    const fixed = said(answerTo(windowed({})));
    const { startM, endM } = lowFerry().brief.crossing;
    expect(said(answerTo(windowed({ startLatestM: startM, endEarliestM: endM })))).toEqual(fixed);
    expect(said(answerTo(windowed({ startLatestM: 'unknown', endEarliestM: 'unknown' })))).toEqual(fixed);
  });

  it('appraise(windows) finds a cheaper crossing than the fixed one, each option between its own abutments', () => {
    const fixed = answerTo(windowed({}));
    const free = answerTo(windowed(both));
    expect(free.options[0]!.cost.p50).toBeLessThan(fixed.options[0]!.cost.p50);
    for (const option of free.options) {
      const places = option.units.flatMap(({ supportsM }) => supportsM);
      expect([option.startM, option.endM]).toEqual([places[0], places.at(-1)]);
      expect(option.startM).toBeGreaterThanOrEqual(1240);
      // Half a pier's room is left before the railway, whatever the brief allows.
      expect(option.startM).toBeLessThanOrEqual(1265.6 - 1.5);
      expect(option.endM).toBeGreaterThanOrEqual(1400);
      expect(option.supports[0]!.chainageM).toBe(option.startM);
      expect(option.deckAreaM2).toBeCloseTo((option.endM! - option.startM!) * free.site.deck.widthM, 6);
      // Deck and fill together carry surfacing over the whole crossing.
      const surfaced = option.lines.filter(({ item }) => item === 'surfacing');
      const areaM2 = surfaced.reduce((sum, { quantity }) => sum + quantity, 0);
      expect(areaM2).toBeCloseTo(230 * free.site.deck.widthM, 6);
    }
    expect(fixed.options[0]).not.toHaveProperty('startM');
  });

  it('appraise(mirrored windows) mirrors every arrangement, and its cost as far as depths are chosen', () => {
    // Ground is drawn place by place: with 300 draws two of a pair differ by more than 1 % by chance.
    const few = windowed(both);
    const there = { ...few, books: { ...few.books, draws: 4000 } };
    const turned = mirrored(there);
    const { startM, endM } = there.brief.crossing;
    const study = {
      ...turned,
      brief: {
        ...turned.brief,
        crossing: {
          ...turned.brief.crossing,
          startLatestM: startM + endM - both.endEarliestM,
          endEarliestM: startM + endM - both.startLatestM,
        },
      },
    };
    const [one, other] = [answerTo(there), answerTo(study)];
    expect(other.options.length).toBe(one.options.length);
    one.options.forEach((option) => {
      const back = other.options.find(({ supports }) => supports.length === option.supports.length)!;
      expect(startM + endM - back.endM!).toBeCloseTo(option.startM!, 6);
      expect(startM + endM - back.startM!).toBeCloseTo(option.endM!, 6);
      // A unit of uneven spans turned round is sized alike to within 0.02 %, plates being cut to length from one end; so a
      // depth may go one step of 50 mm the other way on the edge of what counts as flat, 1 % of the cost.
      expect(Math.abs(back.depthM.midspan - option.depthM.midspan)).toBeLessThan(0.051);
      expect(Math.abs(back.cost.p50 / option.cost.p50 - 1)).toBeLessThan(0.01);
    });
  });

  it('appraise(dearer fill) makes the bridge longer, never shorter', () => {
    const lengths = [1, 60, 240].map((perM3) => {
      const study = windowed({ endEarliestM: 1400 });
      const { options } = answerTo({ ...study, books: { ...study.books, rates: [rate('fill', perM3)] } });
      const { startM, endM } = options[0]!;
      return endM! - startM!;
    });
    expect(lengths[0]!).toBeLessThanOrEqual(lengths[1]!);
    expect(lengths[1]!).toBeLessThan(lengths[2]!);
  });

  it.each(['composite-i', 'concrete-box'] as const)(
    'proposalsFor(%s) over a coarse grid of places, each worked out in full, finds nothing cheaper by more than 1 %',
    (form) => {
      const study = windowed(both, form);
      const bench = workbench(study, memory());
      const found = finish(proposalsFor(bench, form)).arrangements;
      const ours = Math.min(...found.map((one) => inFull(bench, one)));
      const { windows: _none, ...site } = bench.site;
      let least = Infinity;
      let looked = 0;
      for (const startM of [1240, 1248, 1256, 1264]) {
        for (const endM of [1400, 1418, 1435, 1453, 1470]) {
          const fixed: Workbench = {
            ...bench,
            site: standBetween(site, startM, endM),
            keptHere: workbench(study, memory()).keptHere,
          };
          for (const one of finish(proposalsFor(fixed, form)).arrangements.slice(0, 2)) {
            least = Math.min(least, inFull(bench, one));
            looked += 1;
          }
        }
      }
      expect(looked).toBeGreaterThan(25);
      expect(ours).toBeLessThanOrEqual(1.01 * least);
    },
    120_000,
  );

  it('appraise(flood with an afflux allowed) leaves the flood its way: no approach as far in as without', () => {
    const study = windowed({ endEarliestM: 1386.5 });
    const rivers = (allowedAffluxM: number): Study => ({
      ...study,
      brief: {
        ...study.brief,
        waters: study.brief.waters.map((water) => ({ ...water, velocityMs: 2.2, allowedAffluxM })),
      },
      books: { ...study.books, rates: [rate('fill', 1)] },
    });
    const [strict, free] = [0.005, 0.1].map((allowed) => answerTo(rivers(allowed)).options[0]!);
    expect(strict!.endM! - strict!.startM!).toBeGreaterThan(free!.endM! - free!.startM!);
  });

  it('appraiseKept(study, option) keeps an option between its own abutments, and within their windows when these close', () => {
    const study = windowed(both);
    const before = answerTo(study).options[0]!;
    const again = appraiseKept(study, before, memory()).option!;
    expect([again.startM, again.endM]).toEqual([before.startM, before.endM]);
    expect(again.cost.p50).toBeCloseTo(before.cost.p50, 6);
    const { startLatestM: _open, ...crossing } = study.brief.crossing;
    const closed = appraiseKept({ ...study, brief: { ...study.brief, crossing } }, before, memory());
    expect(closed.option!.startM).toBe(1240);
    expect(closed.option!.endM).toBe(before.endM);
  });

  it('readStudy(windows outside the crossing, or over each other) says which and how to mend it', () => {
    const read = (windows: Partial<Crossing>) => readStudy(writeStudy(windowed(windows)));
    expect(read({ startLatestM: 1264, endEarliestM: 'unknown' }).ok).toBe(true);
    for (const [windows, key] of [
      [{ startLatestM: 1239 }, 'startLatestM'],
      [{ startLatestM: 1470 }, 'startLatestM'],
      [{ endEarliestM: 1471 }, 'endEarliestM'],
      [{ startLatestM: 1400, endEarliestM: 1390 }, 'endEarliestM'],
    ] as const) {
      const answer = read(windows);
      expect(answer.ok ? [] : answer.problems.map(({ path }) => path)).toEqual([['brief', 'crossing', key]]);
    }
  });
});
