import { describe, expect, it } from 'vitest';
import { workOption } from '../../lib/appraise/cheapestOption.ts';
import { choiceFaults, keptUnits } from '../../lib/appraise/keptUnits.ts';
import { memory } from '../../lib/appraise/memory.ts';
import { finish } from '../../lib/appraise/work.ts';
import { workbench, type Workbench } from '../../lib/appraise/workbench.ts';
import { girderVariants } from '../../lib/forms/composite-i/girderVariants.ts';
import {
  appraiseKept,
  asMade,
  survey,
  type AskedVariant,
  type Design,
  type Option,
  type Study,
  type Variant,
} from '../../lib/index.ts';
import { expectedLines } from '../../lib/substructure/index.ts';
import { lowFerry } from './studies.ts';
import { answerTo } from './answerTo.ts';

/** An invented channel crossed by four spans of composite girders, its deck of some lanes; the road lies as low as it may. */
function channel(lanes: number, mainM: number): Study {
  const study = lowFerry();
  const { brief, options, books } = study;
  const endM = 3.5 * mainM;
  const strip = (kind: 'parapet' | 'lane', widthM: number) => ({ kind, widthM, ultimateWidthM: widthM });
  const [plain] = brief.groundStretches;
  return {
    ...study,
    books: { ...books, draws: 100 },
    options: { ...options, forms: ['composite-i'] },
    brief: {
      ...brief,
      deck: [
        strip('parapet', 0.5),
        ...Array.from({ length: lanes }, () => strip('lane', 3.5)),
        strip('parapet', 0.5),
      ],
      crossing: {
        ...brief.crossing,
        startM: 0,
        endM,
        ground: [
          { chainageM: 0, levelM: 8 },
          { chainageM: 0.2 * endM, levelM: 0 },
          { chainageM: 0.8 * endM, levelM: 0 },
          { chainageM: endM, levelM: 8 },
        ],
      },
      road: { ...brief.road, startLevelM: 10, endLevelM: 10, mayRiseM: 20, fixedEnd: 'none' },
      waters: [],
      obstacles: [],
      groundStretches: [{ fromM: 0, toM: endM, known: true, classes: [plain!.classes[0]!] }],
    },
  };
}

const optionOn = (mainM: number, variant?: AskedVariant): Option => ({
  number: 1,
  form: 'composite-i',
  method: 'crane',
  units: [
    {
      form: 'composite-i',
      role: 'main',
      supportsM: [0, 0.75 * mainM, 1.75 * mainM, 2.75 * mainM, 3.5 * mainM],
    },
  ],
  depthM: null,
  origin: 'kept',
  ...(variant && { variant }),
});

const boxOn = (mainM: number, variant?: AskedVariant): Option => {
  const { units, ...rest } = optionOn(mainM, variant);
  const boxes = units.map((unit) => ({ ...unit, form: 'concrete-box' as const }));
  return { ...rest, form: 'concrete-box', method: 'falsework', units: boxes };
};

const workOut = (bench: Workbench, mainM: number, variant?: Variant) => {
  const option = finish(workOption(bench, optionOn(mainM, variant)));
  const foundations = option.supports.flatMap((support) => expectedLines({ ...support, lines: [] }));
  return { option, cost: bench.costOf([...option.lines, ...foundations]) };
};

describe('workOption(option whose way of making is open)', () => {
  it.each([
    [2, 60],
    [2, 110],
    [4, 60],
    [6, 100],
  ])('is never dearer than its own plain girders: %i lanes over %i m', (lanes, mainM) => {
    const bench = workbench(channel(lanes, mainM));
    const open = workOut(bench, mainM);
    const plain = workOut(bench, mainM, {});
    expect(open.cost).toBeLessThanOrEqual(plain.cost);
    expect(open.option.designs[0]!.limitingCheck.utilisation).toBeLessThanOrEqual(1);
    // What is not plain has to be worth it.
    const isPlain = Object.keys(open.option.variant!).length === 0;
    expect(open.cost < 0.99 * plain.cost).toBe(!isPlain);
  });

  it('takes substringers and fewer girders on a wide deck over long spans', () => {
    const bench = workbench(channel(5, 100));
    const { option } = workOut(bench, 100);
    const plain = workOut(bench, 100, {}).option;
    expect(option.variant!.substringers).toBe(true);
    const [made, level] = [option.designs[0]!, plain.designs[0]!];
    expect(made.figures['girders']).toBeLessThan(level.figures['girders']!);
    expect(made.lines.some(({ what }) => what === 'substringers')).toBe(true);
    expect(made.sections[0]!.shapes.some(({ part }) => part === 'substringer')).toBe(true);
  });

  it('looks at nothing else on short spans, and at no haunch on a launched deck', () => {
    const { deck } = survey(channel(5, 45).brief);
    expect(girderVariants([33, 45, 45, 33], deck, 'crane')).toEqual([]);
    expect(girderVariants([70, 90, 70], deck, 'launch')).toEqual([{ substringers: true }]);
    expect(girderVariants([90], deck, 'crane')).toEqual([{ substringers: true }]);
  });
});

describe('workOption(wide concrete box whose way of making is open)', () => {
  it('rests the wings on struts where they pay', () => {
    const bench = workbench(channel(6, 75));
    const option = finish(workOption(bench, boxOn(75)));
    const plain = finish(workOption(bench, boxOn(75, {})));
    expect(option.variant).toEqual({ struts: true });
    const [made, level] = [option.designs[0]!, plain.designs[0]!];
    expect(made.figures['cells']).toBeLessThan(level.figures['cells']!);
    expect(made.lines.some(({ what }) => what === 'struts under the wings')).toBe(true);
    expect(bench.costOf(option.lines)).toBeLessThan(0.99 * bench.costOf(plain.lines));
  });

  it('leaves the webs where they are under a shallow box', () => {
    const bench = workbench(channel(5, 50));
    expect(finish(workOption(bench, boxOn(50))).variant).toEqual({});
  });
});

describe('workOption(option of which some ways of making are open)', () => {
  const bench = workbench(channel(6, 75));
  const madeOf = (asked?: AskedVariant) => finish(workOption(bench, boxOn(75, asked)));

  it('keeps what is asked and makes the rest as costs least', () => {
    const strong = madeOf({ strengthMPa: 50, struts: 'unknown', ribs: 'unknown', transverse: 'unknown' });
    expect(strong.variant).toEqual({ strengthMPa: 50, struts: true });
    expect(strong.designs[0]!.task).toMatchObject({ strengthMPa: 50, struts: true });
    const across = madeOf({ transverse: true, struts: 'unknown' });
    expect(across.variant!.transverse).toBe(true);
    expect(bench.costOf(across.lines)).toBeLessThanOrEqual(
      bench.costOf(madeOf({ transverse: true }).lines) * (1 + 1e-9),
    );
  });

  it('makes nothing that was ruled out, and all of it open is as if nothing was asked', () => {
    const without = madeOf({ ribs: 'unknown', transverse: 'unknown' });
    expect(without.variant!.struts).toBeUndefined();
    const open = madeOf({ struts: 'unknown', ribs: 'unknown', transverse: 'unknown' });
    expect(open.variant).toEqual(madeOf().variant);
  });

  it.each([
    [undefined, { struts: true }, { struts: true }],
    [{ struts: 'unknown', boxWidthM: 5 }, { struts: true }, { struts: true, boxWidthM: 5 }],
    [{ struts: 'unknown', boxWidthM: 5 }, {}, { boxWidthM: 5 }],
    [{ ribs: true, struts: 'unknown' }, { struts: true }, null],
    [{}, { struts: true }, null],
    [{ haunchRatio: 1.6 }, { haunchRatio: 2 }, null],
  ] as const)('asMade(%o, %o) is %o', (asked, made, expected) => {
    expect(asMade(asked, made)).toEqual(expected);
  });
});

describe('workOption(box on a skew)', () => {
  const onSkew = (skewDeg: number): Workbench => {
    const study = channel(2, 90);
    return workbench({
      ...study,
      brief: { ...study.brief, crossing: { ...study.brief.crossing, skewDeg } },
    });
  };
  const { units, ...rest } = optionOn(90);
  const arms = (variant?: AskedVariant): Option => ({
    ...rest,
    form: 'cantilever-box',
    method: 'balanced-cantilever',
    units: units.map((unit) => ({ ...unit, form: 'cantilever-box' as const })),
    ...(variant && { variant }),
  });
  const costOf = (bench: Workbench, variant?: AskedVariant) => {
    const option = finish(workOption(bench, arms(variant)));
    const foundations = option.supports.flatMap((support) => expectedLines({ ...support, lines: [] }));
    return { option, cost: bench.costOf([...option.lines, ...foundations]) };
  };

  it('takes its ends square where that saves more than a hundredth, sills and all', () => {
    const bench = onSkew(10);
    const open = costOf(bench);
    const along = costOf(bench, {});
    expect(along.option.designs[0]!.figures['skewTorqueKNm']).toBeGreaterThan(0);
    expect(open.option.variant).toEqual({ squareEnds: true });
    expect(open.cost).toBeLessThan(0.99 * along.cost);
    const [design] = open.option.designs;
    expect(design!.task).toMatchObject({ squareEnds: true, skewDeg: 10 });
    expect(design!.figures).not.toHaveProperty('skewTorqueKNm');
    expect(design!.lines.some(({ what }) => what === 'sills beyond square ends')).toBe(true);
    expect(costOf(bench, { squareEnds: true }).cost).toBeCloseTo(open.cost, 6);
  });

  it('does not even try on a square deck, nor on a hardly skewed one', () => {
    const squareAt = (skewDeg: number): boolean => {
      const bench = onSkew(skewDeg);
      let tried = false;
      const size: Workbench['size'] = (task) => {
        tried ||= task.squareEnds === true;
        return bench.size(task);
      };
      finish(workOption({ ...bench, size }, arms()));
      return tried;
    };
    expect([0, 0.9, 1.1].map(squareAt)).toEqual([false, false, true]);
  });
});

describe('workOption(variant that was chosen)', () => {
  it('keeps to it, in depth, drawing and price', () => {
    const bench = workbench(channel(2, 60));
    const { option } = workOut(bench, 60, { haunchRatio: 2 });
    const [design] = option.designs;
    expect(option.variant).toEqual({ haunchRatio: 2 });
    expect(option.depthM.support).toBeCloseTo(2 * option.depthM.midspan, 1);
    // Published bands of pier and midspan depth: 1/25 to 1/18 and 1/50 to 1/30.
    expect(option.depthM.midspan / 60).toBeLessThanOrEqual(0.0334);
    expect(option.depthM.support / 60).toBeLessThanOrEqual(0.057);
    expect(Math.max(...design!.depthAlong.depthM)).toBeCloseTo(option.depthM.support, 9);
  });

  const boxAsked: Variant = {
    boxWidthM: 5,
    strengthMPa: 60,
    light: { densityKgM3: 1800 },
    ballastKNm: [5, 0, 0, 5],
  };

  it('makes a box as wide, strong and light as asked, and pays lightweight concrete at its own rate', () => {
    const bench = workbench(channel(2, 60));
    const asked = finish(workOption(bench, boxOn(60, boxAsked)));
    const usual = finish(
      workOption(bench, boxOn(60, { ...boxAsked, light: { densityKgM3: 1800, middleM: [0, 0, 0, 0] } })),
    );
    const [light, ordinary] = [asked.designs[0]!, usual.designs[0]!];
    expect(light.task).toMatchObject(boxAsked);
    expect(light.figures).toMatchObject({ webSpacingM: 5, concreteStrengthMPa: 60 });
    // All of the box but its diaphragms and blisters is of lightweight concrete.
    const items = (design: Design): string[] => design.lines.map(({ item }) => item);
    expect(items(light)).toContain('light-concrete');
    expect(light.lines.some(({ what }) => what === 'box')).toBe(false);
    expect(items(ordinary)).not.toContain('light-concrete');
    const permanent = (design: Design): number =>
      design.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    expect(permanent(light)).toBeLessThan(permanent(ordinary));
    const [line] = light.lines.filter(({ item }) => item === 'light-concrete');
    expect(bench.costOf([line!])).toBeGreaterThan(bench.costOf([{ ...line!, item: 'box-concrete' }]));
  });

  it.each([
    [{ boxWidthM: 40 }, /Concrete box: box width: expected 2.5 to [\d.]+ m, received 40 m/u],
    [{ strengthMPa: 120 }, /strength: expected 20 to 90 MPa, received 120 MPa/u],
    [{ light: { densityKgM3: 2400 } }, /density: expected 1400 to 2200 kg\/m3/u],
    [{ light: { densityKgM3: 1800, middleM: [10, 20] } }, /one number for the one span, received 2/u],
    [{ ballastKNm: [10, 10] }, /ballast: expected one number for the one span, received 2/u],
  ] as const)('is refused with the number where its spans do not allow it: %o', (variant, said) => {
    const site = survey(lowFerry().brief);
    const units = [{ form: 'concrete-box', role: 'main', supportsM: [site.startM, site.endM] }] as const;
    expect(keptUnits(site, { form: 'concrete-box', method: 'falsework', units, variant })).toMatchObject({
      because: [expect.stringMatching(said)],
    });
  });

  it('is refused where a haunch has no inner support to be over', () => {
    const site = survey(lowFerry().brief);
    const units = [
      { form: 'composite-i', role: 'main', supportsM: [site.startM, site.startM + 60] },
    ] as const;
    const asked = { form: 'composite-i', method: 'crane', variant: { haunchRatio: 1.6 } } as const;
    expect(choiceFaults(site, { ...asked, units })).toMatchObject([{ path: ['haunchRatio'] }]);
    const [{ form, role, supportsM }] = units;
    const two = [{ form, role, supportsM: [...supportsM, site.startM + 120] }];
    expect(choiceFaults(site, { ...asked, units: two })).toEqual([]);
  });

  it('is refused where the form has none', () => {
    const study = lowFerry();
    const site = survey(study.brief);
    const { startM, endM } = site;
    const units = [{ form: 'concrete-box', role: 'main', supportsM: [startM, endM] }] as const;
    const placed = keptUnits(site, {
      form: 'concrete-box',
      method: 'falsework',
      units,
      variant: { haunchRatio: 2 },
    });
    expect(placed).toMatchObject({
      because: [
        expect.stringMatching(/haunchRatio cannot be chosen; it has transverse, struts, ribs, boxWidthM,/u),
      ],
    });
  });
});

it('appraiseKept(haunched option) drags it as it is made', () => {
  const study = channel(4, 60);
  const kept = memory();
  const { number, form, method, units } = optionOn(60);
  const asked: Study = {
    ...study,
    options: {
      ...study.options,
      kept: [{ number, form, method, units, depthM: null, variant: { haunchRatio: 1.6 } }],
    },
  };
  const option = answerTo(asked).options.find((one) => one.number === 1)!;
  const dragged = appraiseKept(study, option, kept).option!;
  expect(dragged.designs).toEqual(option.designs);
  expect(dragged.cost).toEqual(option.cost);
});
