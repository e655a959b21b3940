import { beforeAll, describe, expect, it } from 'vitest';
import {
  appraise,
  appraiseKept,
  memory,
  type Appraisal,
  type AppraisedOption,
  type Study,
} from '../../lib/index.ts';
import type { Memory } from '../../lib/appraise/memory.ts';
import { kept } from '../../lib/kept.ts';
import { lowFerry } from './studies.ts';

const withRiver = (study: Study, fromM: number, toM: number): Study => {
  const obstacles = study.brief.obstacles.map((o) => (o.kind === 'river' ? { ...o, fromM, toM } : o));
  return { ...study, brief: { ...study.brief, obstacles } };
};
const withSteel = (study: Study, p50: number): Study => {
  const rate = { item: 'plate-girder-steel', p10: 0.8 * p50, p50, p90: 1.3 * p50, reason: 'trial' };
  return { ...study, books: { ...study.books, rates: [rate] } };
};
const riverOf = (study: Study): { fromM: number; toM: number } =>
  study.brief.obstacles.find((o) => o.kind === 'river')!;

describe('kept', () => {
  it('kept(2) forgets the oldest of three values', () => {
    const store = kept<number>(2);
    store.put('a', 1);
    store.put('b', 2);
    expect(store.put('c', 3)).toBe(3);
    expect(['a', 'b', 'c'].map((key) => store.get(key))).toEqual([undefined, 2, 3]);
  });
});

describe('memory', () => {
  // A form that stands alone and one with approaches keep everything that can be kept.
  const whole = lowFerry();
  const study: Study = { ...whole, options: { ...whole.options, forms: ['composite-i', 'cable-stayed'] } };
  const { fromM, toM } = riverOf(study);
  const other: Study = {
    ...study,
    brief: { ...study.brief, road: { ...study.brief.road, startLevelM: study.brief.road.startLevelM + 0.3 } },
  };
  const edits: readonly [string, Study][] = [
    ['a wider river', withRiver(study, fromM - 2, toM + 2)],
    ['dearer steel', withSteel(study, 5)],
    ['another level of the road', other],
    ['ground that is known', withGround(study)],
  ];
  let shared: Appraisal[];
  beforeAll(() => {
    const left = memory();
    appraise(study, left);
    shared = edits.map(([, edited]) => appraise(edited, left));
  });

  it.each(edits.map(([what], i) => [what, i] as const))(
    'appraise(%s, memory) gives what it gives without a memory',
    (_, i) => {
      expect(shared[i]).toEqual(appraise(edits[i]![1]));
    },
  );
});

function withGround(study: Study): Study {
  const groundStretches = study.brief.groundStretches.map((stretch) => ({
    ...stretch,
    known: true,
    classes: [{ ...stretch.classes[0]!, odds: 1 }],
  }));
  return { ...study, brief: { ...study.brief, groundStretches } };
}

describe('appraiseKept', () => {
  const study = lowFerry();
  const { fromM, toM } = riverOf(study);
  const left = memory();
  let before: Appraisal;
  let reference: AppraisedOption;
  beforeAll(() => {
    before = appraise(study, left);
    // A steel deck: the edits below change what steel costs.
    reference = before.options.find(({ form }) => form === 'composite-i')!;
  });

  it('appraiseKept(same study) is the option itself, for every option', () => {
    for (const option of before.options) {
      expect(appraiseKept(study, option, memory())).toEqual({ option, faults: [] });
    }
  });

  it('appraiseKept(dearer steel) keeps sizes and road and raises P50 as the pipeline does', () => {
    const dear = withSteel(study, 6);
    const { option, faults } = appraiseKept(dear, reference, left);
    expect(faults).toEqual([]);
    expect(option!.designs).toEqual(reference.designs);
    expect(option!.profile).toEqual(reference.profile);
    expect(option!.cost.p50).toBeGreaterThan(1.02 * reference.cost.p50);
    // The search may move supports and depths only to save money.
    const searched = appraise(dear, left).options.find(({ number }) => number === reference.number)!;
    expect(option!.cost.p50).toBeGreaterThan(0.99 * searched.cost.p50);
  });

  it('appraiseKept(option kept by hand) takes its supports and depth from the study', () => {
    const units = reference.units.map((unit) => ({
      ...unit,
      supportsM: unit.supportsM.map((x, i) => (i === 1 ? x + 1 : x)),
    }));
    const { number, form, method } = reference;
    const byHand = { number, form, method, units, depthM: reference.depthM.midspan + 0.1 };
    const edited = { ...study, options: { ...study.options, kept: [byHand] } };
    const { option } = appraiseKept(edited, reference, left);
    expect(option!.units).toEqual(units);
    expect(option!.depthM.midspan).toBeCloseTo(reference.depthM.midspan + 0.1, 9);
    expect(option).toEqual(appraise(edited, left).options.find((one) => one.number === number));
  });

  it('appraiseKept(edit of the brief) prices anew only what has changed', () => {
    let priced = 0;
    const counting: Memory = {
      ...left,
      priced: { ...left.priced, put: (key, value) => ((priced += 1), left.priced.put(key, value)) },
    };
    const worked = (edited: Study): AppraisedOption => appraiseKept(edited, reference, counting).option!;
    // Its supports stand as before: only what is said of it may be another.
    const narrower = worked(withRiver(study, fromM + 1, toM - 1));
    expect(priced).toBe(0);
    expect(narrower.cost).toEqual(reference.cost);
    const { road } = study.brief;
    const higher = worked({
      ...study,
      brief: { ...study.brief, road: { ...road, startLevelM: road.startLevelM + 0.3 } },
    });
    expect(priced).toBe(1);
    expect(higher.cost).not.toEqual(reference.cost);
  });

  it('appraiseKept(river widened over a pier) says which stretch and still works the option out', () => {
    const { option, faults } = appraiseKept(withRiver(study, fromM - 10, toM), reference, left);
    expect(faults).toEqual(['support in a barred stretch: River Wend']);
    expect(option!.units).toEqual(reference.units);
    expect(option!.status).toBe('out');
  });

  it('appraiseKept(abutment moved) takes the abutment with it, and beyond a pier gives the option up in words', () => {
    const moved = (startM: number): Study => ({
      ...study,
      brief: { ...study.brief, crossing: { ...study.brief.crossing, startM } },
    });
    const { option } = appraiseKept(moved(1242), reference, left);
    expect(option!.units[0]!.supportsM[0]).toBe(1242);
    expect(option!.units[0]!.supportsM[1]).toBe(reference.units[0]!.supportsM[1]);
    const first = reference.units[0]!.supportsM[1]!;
    expect(appraiseKept(moved(first + 1), reference, left)).toEqual({
      option: null,
      faults: ['a support would stand beyond an abutment'],
    });
  });
});
