import { describe, expect, it } from 'vitest';
import { clearanceState, withClearanceState } from '../../notebooks/option-study/brief/clearanceState.ts';
import {
  withEntry,
  withListOf,
  withoutEntry,
  withPasted,
} from '../../notebooks/option-study/brief/listEdits.ts';
import {
  budgetAmount,
  envelopeWidth,
  groundProved,
  laneCount,
  obstacleWidth,
  planShape,
  priceDate,
  radiusOfCurve,
} from '../../notebooks/option-study/brief/madeFields.ts';
import { hasUltimate, stripForGap, withStripWidth } from '../../notebooks/option-study/brief/stripEdits.ts';
import { afterEdit, type Study } from '../../lib/index.ts';
import { placesOf, workedStudy } from './study.ts';

const study = workedStudy();

describe('made fields', () => {
  it('planShape: a curve has a radius to be typed, straight and unknown have none', () => {
    const curve = planShape.put(study, 'curve');
    expect(typeof curve.brief.crossing.planRadiusM).toBe('number');
    expect(radiusOfCurve.put(curve, 400).brief.crossing.planRadiusM).toBe(400);
    expect(planShape.put(radiusOfCurve.put(curve, 400), 'curve').brief.crossing.planRadiusM).toBe(400);
    expect(planShape.put(curve, 'unknown').brief.crossing.planRadiusM).toBe('unknown');
    expect(placesOf(curve)).toEqual([]);
  });

  it('laneCount: lanes come and go beside the last lane, the other strips stay', () => {
    const kinds = (count: number): string =>
      laneCount
        .put(study, count)
        .brief.deck.map(({ kind }) => kind[0])
        .join('');
    expect(kinds(2)).toBe('bsllsbfp');
    expect(kinds(4)).toBe('bsllllsbfp');
    expect(kinds(1)).toBe('bslsbfp');
  });

  it('obstacleWidth and envelopeWidth: about the middle', () => {
    const wider = obstacleWidth(1).put(study, 80).brief.obstacles[1]!;
    expect([wider.fromM, wider.toM]).toEqual([1315, 1395]);
    const narrower = envelopeWidth(2).put(study, 10).brief.obstacles[2]!.clearance!;
    expect([narrower.fromM, narrower.toM]).toEqual([1350, 1360]);
  });

  it('budgetAmount: given again it comes back with its price date and scope', () => {
    const amount = budgetAmount('2026 Q1');
    const without = amount.put(study, 'unknown');
    expect(without.brief.budget).toBe('unknown');
    expect(amount.put(without, 8e6).brief.budget).toEqual({ ...(study.brief.budget as object), amount: 8e6 });
    const fresh = budgetAmount('2026 Q1').put(without, 8e6);
    expect(fresh.brief.budget).toEqual({ amount: 8e6, priceDate: '2026 Q1', includes: '' });
    expect(placesOf(fresh)).toEqual([]);
  });

  it('groundProved: all stretches at once', () => {
    expect(groundProved.get(study)).toBe('unknown');
    const proved = groundProved.put(study, 'known');
    expect(groundProved.get(proved)).toBe('known');
    expect(groundProved.put(proved, 'part')).toBe(proved);
  });
});

describe('start values', () => {
  const lanes = ['brief.deck.2.kind', 'brief.deck.3.kind'];
  const widths = ['brief.deck.2.widthM', 'brief.deck.3.widthM', 'brief.deck.5.widthM'];
  const begun: Study = { ...study, assumed: [...lanes, ...widths].toSorted() };
  const marksAfter = (change: (from: Study) => Study): readonly string[] =>
    afterEdit(begun, change(begun)).assumed;

  it('another number of lanes is said by whoever changes it; a new lane is as wide as nobody has said', () => {
    expect(laneCount.from?.(begun).map((path) => path.join('.'))).toEqual(lanes);
    expect(marksAfter((from) => laneCount.put(from, 3))).toEqual([
      'brief.deck.2.widthM',
      'brief.deck.3.widthM',
      'brief.deck.4.widthM',
      'brief.deck.6.widthM',
    ]);
    expect(marksAfter((from) => laneCount.put(from, 2))).toEqual(begun.assumed);
  });

  it('a width that is changed is none, and the others go with their strips', () => {
    expect(marksAfter((from) => withStripWidth(from, 2, 3.65))).toEqual(
      [...lanes, 'brief.deck.3.widthM', 'brief.deck.5.widthM'].toSorted(),
    );
    const list = ['brief', 'deck'];
    expect(marksAfter((from) => withoutEntry(from, list, 0))).toEqual([
      'brief.deck.1.kind',
      'brief.deck.1.widthM',
      'brief.deck.2.kind',
      'brief.deck.2.widthM',
      'brief.deck.4.widthM',
    ]);
  });

  it('a pasted list holds none, even where it says the same, and taken back it has its own again', () => {
    const list = ['brief', 'crossing', 'ground'];
    const sketched: Study = { ...study, assumed: ['brief.crossing.ground', 'brief.loading'] };
    const { ground } = sketched.brief.crossing;
    const raised = ground.map((point) => ({ ...point, levelM: point.levelM + 1 }));
    const pasted = afterEdit(sketched, withPasted(sketched, list, raised));
    expect(pasted.assumed).toEqual(['brief.loading']);
    const back = afterEdit(pasted, withListOf(pasted, list, sketched));
    expect(back).toEqual(sketched);
  });
});

describe('clearances', () => {
  it('are a preset until confirmed, and start over the whole stretch from the water or the ground', () => {
    const [railway, river] = study.brief.obstacles;
    expect(clearanceState(railway!)).toBe('preset');
    const confirmed = withClearanceState(study.brief, railway!, 'confirmed');
    expect(confirmed.clearance).toEqual({ ...railway!.clearance, confirmed: true });
    const given = withClearanceState(study.brief, river!, 'preset');
    expect(given.clearance).toMatchObject({ fromM: 1325, toM: 1385, datumLevelM: 7.2, confirmed: false });
    const dry = withClearanceState(
      study.brief,
      { ...river!, kind: 'road', fromM: 1400, toM: 1440 },
      'preset',
    );
    expect(dry.clearance?.datumLevelM).toBe(10.54);
    expect(withClearanceState(study.brief, railway!, 'none').clearance).toBeNull();
  });
});

describe('strips', () => {
  it('carry their ultimate width with them only while it is the same', () => {
    const wider = withStripWidth(study, 2, 3.65).brief.deck[2]!;
    expect(wider).toEqual({ kind: 'lane', widthM: 3.65, ultimateWidthM: 3.65 });
    expect(hasUltimate(study.brief.deck)).toBe(false);
    const apart = {
      ...study,
      brief: {
        ...study.brief,
        deck: study.brief.deck.map((strip, i) => (i === 2 ? { ...strip, ultimateWidthM: 4 } : strip)),
      },
    };
    expect(hasUltimate(apart.brief.deck)).toBe(true);
    expect(withStripWidth(apart, 2, 3.65).brief.deck[2]!.ultimateWidthM).toBe(4);
  });

  it('a gap takes a strip like its left neighbour', () => {
    const { deck } = study.brief;
    expect(stripForGap(deck, 0).kind).toBe('barrier');
    expect(stripForGap(deck, 3).kind).toBe('lane');
    const added = withEntry(study, ['brief', 'deck'], 8, stripForGap(deck, 8));
    expect(added.brief.deck.map(({ kind }) => kind).slice(-2)).toEqual(['parapet', 'parapet']);
    expect(withoutEntry(added, ['brief', 'deck'], 8).brief.deck).toEqual(deck);
  });
});

describe('priceDate', () => {
  const typed = (words: string): unknown => {
    const { budget } = priceDate.put(workedStudy(), words).brief;
    return budget === 'unknown' ? budget : budget.priceDate;
  };

  it('takes a quarter as people write it, a question mark as undated, and leaves other words to be refused', () => {
    expect(typed('q2 2027')).toBe('2027 Q2');
    expect(typed('2027-04')).toBe('2027-04');
    expect([typed('?'), typed('undated')]).toEqual(['unknown', 'unknown']);
    expect(priceDate.get(priceDate.put(workedStudy(), '?'))).toBe('undated');
    expect(typed('hello')).toBe('hello');
    expect(placesOf(priceDate.put(workedStudy(), 'hello'))).toEqual(['brief.budget.priceDate']);
  });
});
