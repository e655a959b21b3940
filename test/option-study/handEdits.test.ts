import { describe, expect, it } from 'vitest';
import {
  appraise,
  appraiseKept,
  choiceProblems,
  memory,
  readStudy,
  writeStudy,
  type AppraisedOption,
  type Study,
} from '../../lib/index.ts';
import { formChoices, type FigureField } from '../../notebooks/forms/formChoices.ts';
import {
  askedFigure,
  askedWords,
  choicesOf,
  mainSpans,
  wayOf,
  withAskedFigure,
  withWay,
} from '../../notebooks/option-study/choiceEdits.ts';
import { withPierAdded, withPierRemoved } from '../../notebooks/option-study/pierCount.ts';
import {
  handEdit,
  keptOf,
  released,
  withAbutment,
  withDepth,
  withLock,
  withObstacleEdge,
  withPier,
  withSpan,
  withVariant,
} from '../../notebooks/option-study/handEdits.ts';
import { workedStudy } from './study.ts';

const lowFerry = workedStudy();
const kept = memory();
const only: Study = { ...lowFerry, options: { ...lowFerry.options, forms: ['composite-i'] } };
const first = appraise(only, kept);
const option = first.options[0]!;
const numbered: Study = { ...only, options: { ...only.options, register: first.register } };
const placesOf = (study: Study): number[] => [
  ...new Set(keptOf(study, option).units.flatMap((u) => u.supportsM)),
];
const start = placesOf(numbered);

describe('withPier(study, option, index, chainageM)', () => {
  it('keeps the option under its number with the pier moved, as the reference, and moves it again', () => {
    const once = withPier(numbered, option, 1, start[1]! + 3);
    const twice = withPier(once, option, 1, start[1]! + 5);
    expect(twice.options.kept).toHaveLength(1);
    expect(twice.options.kept[0]!.number).toBe(option.number);
    expect(twice.options.reference).toBe(option.number);
    expect(placesOf(twice)).toEqual(start.map((at, i) => (i === 1 ? at + 5 : at)));
  });

  it('moves no abutment and keeps a metre off the neighbours', () => {
    expect(withPier(numbered, option, 0, 0)).toBe(numbered);
    expect(placesOf(withPier(numbered, option, 1, 1e6))[1]).toBe(start[2]! - 1);
  });

  it('gives a study that is read back as it was written', () => {
    const study = withLock(
      withDepth(withPier(numbered, option, 1, start[1]! + 3), option, 2.4),
      option,
      1,
      true,
    );
    const read = readStudy(writeStudy(study));
    expect(read.ok && read.value.options.kept).toEqual(study.options.kept);
  });

  it('stays made as it is where only its depth is typed, and is left to least cost again with it freed', () => {
    const [typed] = withDepth(numbered, option, 1.2).options.kept;
    expect(typed!.variant).toEqual(option.variant ?? {});
    const asked = withDepth(withVariant(numbered, option, { haunchRatio: 1.6 }), option, 2.4);
    expect(asked.options.kept[0]!.variant).toEqual({ haunchRatio: 1.6 });
    expect('variant' in withDepth(numbered, option, null).options.kept[0]!).toBe(false);
  });

  it('has the way it is made chosen by hand, kept in the file, and left to least cost again', () => {
    const chosen = withVariant(numbered, option, { haunchRatio: 1.6 });
    const read = readStudy(writeStudy(chosen));
    expect(read.ok && read.value.options.kept[0]!.variant).toEqual({ haunchRatio: 1.6 });
    const mine = appraise(chosen, kept).options.find(({ number }) => number === option.number)!;
    expect(mine.variant).toEqual({ haunchRatio: 1.6 });
    expect(mine.depthM.support).toBeGreaterThan(1.5 * mine.depthM.midspan);
    const freed = withVariant(chosen, option, null);
    expect('variant' in freed.options.kept[0]!).toBe(false);
  });

  it('is worked out under its number, and gives back the proposal when it is released', () => {
    const moved = withPier(numbered, option, 1, start[1]! + 3);
    const answer = appraise(moved, kept);
    const mine = answer.options.find(({ number }) => number === option.number)!;
    expect(mine.supports[1]!.chainageM).toBe(start[1]! + 3);
    expect(answer.options.map(({ number }) => number).sort((a, b) => a - b)).toEqual(
      first.options.map(({ number }) => number).sort((a, b) => a - b),
    );
    const back = appraise(released(moved, option.number), kept);
    expect(back.options.find(({ number }) => number === option.number)!.units).toEqual(option.units);
  });

  it('a pier in a barred stretch is kept, with the reason, and put out by the rules', () => {
    const { fromM, toM } = first.site.mainOpening!;
    const index = start.findIndex((at) => at > fromM - 5 && at < toM + 5);
    const study = withPier(numbered, option, index, (fromM + toM) / 2);
    expect(appraiseKept(study, option, kept).faults).toContain('support in a barred stretch: River Wend');
    const mine = appraise(study, kept).options.find(({ number }) => number === option.number)!;
    expect(mine.status).toBe('out');
    expect(mine.rulings.find(({ rule }) => rule === 'support-barred')?.effect).toBe('out');
  });

  it('an option the brief has left a pier outside of is said to be dropped, and the others are worked out', () => {
    const study = withPier(numbered, option, 1, start[1]! + 3);
    const { crossing } = study.brief;
    const shorter: Study = {
      ...study,
      brief: { ...study.brief, crossing: { ...crossing, startM: start[1]! + 4 } },
    };
    const answer = appraise(shorter, kept);
    expect(answer.dropped.find((one) => one.option === option.number)?.because).toEqual([
      'a support would stand beyond an abutment',
    ]);
    expect(answer.options.map(({ number }) => number)).not.toContain(option.number);
    expect(answer.register.map(({ number }) => number)).toContain(option.number);
  });
});

describe('withSpan(study, option, span, lengthM)', () => {
  const spansOf = (study: Study): number[] =>
    placesOf(study)
      .slice(1)
      .map((at, i) => at - placesOf(study)[i]!);
  const spans = spansOf(numbered);

  it('moves the support at its end; the next span takes up the difference', () => {
    const typed = withSpan(numbered, option, 1, spans[1]! + 4);
    expect(typed.ok && spansOf(typed.study)).toEqual(
      spans.map((span, i) => (i === 1 ? span + 4 : i === 2 ? span - 4 : span)),
    );
  });

  it('moves the support at its start where that at its end is an abutment or locked', () => {
    const last = spans.length - 1;
    const end = withSpan(numbered, option, last, spans[last]! + 2);
    expect(end.ok && spansOf(end.study).slice(-2)).toEqual([spans[last - 1]! - 2, spans[last]! + 2]);
    const locked = withSpan(withLock(numbered, option, 2, true), option, 1, spans[1]! + 2);
    expect(locked.ok && spansOf(locked.study).slice(0, 3)).toEqual([spans[0]! - 2, spans[1]! + 2, spans[2]]);
  });

  it('is refused with the reason where both ends are held or the next span would be gone', () => {
    const both = withLock(withLock(numbered, option, 1, true), option, 2, true);
    expect(withSpan(both, option, 1, 40)).toMatchObject({
      ok: false,
      why: expect.stringContaining('unlock') as string,
    });
    expect(withSpan(numbered, option, 1, 1000)).toMatchObject({
      ok: false,
      why: expect.stringContaining('next span') as string,
    });
    expect(withSpan(numbered, option, 1, NaN).ok).toBe(false);
  });
});

describe('withAbutment(study, option, end, chainageM)', () => {
  const { crossing } = numbered.brief;
  const windowed = (window: object): Study => ({
    ...numbered,
    brief: { ...numbered.brief, crossing: { ...crossing, ...window } },
  });
  const endM = crossing.endM;
  const open = windowed({ endEarliestM: endM - 25 });
  const said = (study: Study, end: 'start' | 'end', at: number): string => {
    const changed = withAbutment(study, option, end, at);
    return changed.ok ? 'moved' : changed.why;
  };

  it('moves it in its window with the option kept, and the spans and the length follow', () => {
    const changed = withAbutment(open, option, 'end', endM - 10);
    if (!changed.ok) throw new Error(changed.why);
    expect(placesOf(changed.study)).toEqual([...start.slice(0, -1), endM - 10]);
    expect(changed.study.options.reference).toBe(option.number);
    const now = appraiseKept(changed.study, option, kept).option!;
    expect(now.supports.at(-1)!.chainageM).toBe(endM - 10);
    expect(now.endM).toBe(endM - 10);
    // A shorter bridge carries a longer fill.
    expect(now.profile).not.toEqual(option.profile);
  });

  it('refuses a place outside the window, with the window', () => {
    expect(said(open, 'end', endM - 30)).toContain('between 1\u2009445.0 and 1\u2009470.0 m');
    expect(said(open, 'end', endM + 1)).toContain('the window of the brief');
    expect(said(open, 'end', NaN)).toContain('the window of the brief');
  });

  it('lets no fill bury what has to pass, however wide the window', () => {
    const wide = windowed({ startLatestM: 1300 });
    const [first] = numbered.brief.obstacles.map(({ fromM }) => fromM).sort((a, b) => a - b);
    expect(said(wide, 'start', first! - 2)).toBe('moved');
    expect(said(wide, 'start', first! - 1)).toContain('stays out of the fill');
  });

  it('stops short of the pier next to it', () => {
    const wide = windowed({ endEarliestM: start.at(-2)! - 5 });
    const why = said(wide, 'end', start.at(-2)! + 0.5);
    expect(why).toMatch(/^at least 1\.0 m short of P\d, which stands at /u);
  });

  it('says where an abutment that the brief has fixed is freed', () => {
    expect(said(open, 'start', crossing.startM)).toContain('the brief has it fixed');
  });
});

describe('handEdit(key, option)', () => {
  it('moves edges, headroom and road levels of the brief', () => {
    const put = (key: string, value: number): Study => {
      const changed = handEdit(key, option)!.put(numbered, value);
      if (!changed.ok) throw new Error(changed.why);
      return changed.study;
    };
    expect(put('road/start', 21.3).brief.road.startLevelM).toBe(21.3);
    expect(put('road/end', 18.1).brief.road.endLevelM).toBe(18.1);
    const index = numbered.brief.obstacles.findIndex(({ clearance }) => clearance !== null);
    expect(put(`clearance/${index}`, 6.2).brief.obstacles[index]!.clearance!.headroomM).toBe(6.2);
    expect(put(`obstacle/${index}/to`, 1290).brief.obstacles[index]!.toM).toBe(1290);
    const { fromM, toM } = numbered.brief.obstacles[index]!;
    const wide = put(`width/${index}`, toM - fromM + 4).brief.obstacles[index]!;
    expect([wide.fromM, wide.toM]).toEqual([fromM - 2, toM + 2]);
    expect(handEdit('somewhere/1', option)).toBeNull();
    expect(handEdit('pier/1', null)).toBeNull();
  });

  it('withObstacleEdge(...) takes along an envelope that ends there and leaves another alone', () => {
    const obstacles = numbered.brief.obstacles.map((one) =>
      one.clearance === null
        ? one
        : { ...one, clearance: { ...one.clearance, toM: one.toM, fromM: one.fromM + 1 } },
    );
    const study: Study = { ...numbered, brief: { ...numbered.brief, obstacles } };
    const index = obstacles.findIndex(({ clearance }) => clearance !== null);
    const { fromM, toM } = obstacles[index]!;
    expect(withObstacleEdge(study, index, 'to', toM + 2).brief.obstacles[index]!.clearance!.toM).toBe(
      toM + 2,
    );
    expect(withObstacleEdge(study, index, 'from', fromM - 2).brief.obstacles[index]!.clearance!.fromM).toBe(
      fromM + 1,
    );
  });
});

describe('choices of a form, asked of an option', () => {
  const boxes: Study = { ...lowFerry, options: { ...lowFerry.options, forms: ['concrete-box'] } };
  const answer = appraise(boxes, kept);
  const box = answer.options[0]!;
  const study: Study = { ...boxes, options: { ...boxes.options, register: answer.register } };
  const [width] = formChoices.boxWidthM.fields as [FigureField];
  const [density, middle] = formChoices.light.fields as [FigureField, FigureField];
  const [ballast] = formChoices.ballastKNm.fields as [FigureField];
  const [haunch] = formChoices.haunchRatio.fields as [FigureField];
  const variantIn = (from: Study, of: AppraisedOption = box) =>
    from.options.kept.find(({ number }) => number === of.number)?.variant;
  const wide = withAskedFigure(study, box, width, 6);

  it('are those that the form has, each with a field', () => {
    expect(choicesOf('concrete-box')).toEqual([
      'transverse',
      'struts',
      'ribs',
      'boxWidthM',
      'strengthMPa',
      'light',
      'ballastKNm',
      'squareEnds',
    ]);
    expect(choicesOf('composite-i')).toEqual(['haunchRatio', 'substringers']);
    expect(choicesOf('cantilever-box')).toEqual([...choicesOf('concrete-box'), 'castInPiers']);
    expect(choicesOf('truss')).toEqual([]);
  });

  it('keep the option as the reference, leave the other ways to the search, and are read back', () => {
    expect(askedFigure(study, box, width)).toBe('unknown');
    expect(wide.options.reference).toBe(box.number);
    expect(askedFigure(wide, box, width)).toBe(6);
    expect(variantIn(wide)).toEqual({
      boxWidthM: 6,
      transverse: 'unknown',
      struts: 'unknown',
      ribs: 'unknown',
      squareEnds: 'unknown',
    });
    const read = readStudy(writeStudy(wide));
    expect(read.ok && read.value.options.kept).toEqual(wide.options.kept);
    expect(askedWords(wide.options.kept[0]!)).toEqual(['box 6.00 m wide between its webs']);
  });

  it('are worked out at once and by the search, and are said to come from where they were typed', () => {
    expect(appraiseKept(wide, box, kept).option!.designs[0]!.task.boxWidthM).toBe(6);
    const mine = appraise(wide, kept).options.find(({ number }) => number === box.number)!;
    expect(mine.variant).toMatchObject({ boxWidthM: 6 });
    expect(mine.cost).not.toEqual(box.cost);
  });

  it('are given back one by one; with the last the option is made as the form finds', () => {
    const both = withWay(wide, box, 'ribs', 'without');
    expect(wayOf(both, box, 'ribs')).toBe('without');
    expect(askedWords(both.options.kept[0]!)).toEqual(['box 6.00 m wide between its webs', 'no ribs']);
    const one = withAskedFigure(both, box, width, 'unknown');
    expect(variantIn(one)).toEqual({ transverse: 'unknown', struts: 'unknown', squareEnds: 'unknown' });
    expect(variantIn(withWay(one, box, 'ribs', 'unknown'))).toBeUndefined();
    expect(withWay(study, box, 'ribs', 'unknown')).toBe(study);
    expect(withAskedFigure(study, box, width, 'unknown')).toBe(study);
  });

  it('that cannot be are told at their places, only where they are newly asked', () => {
    const far = withAskedFigure(study, box, width, 40);
    const [problem, ...others] = choiceProblems(far, study);
    expect(problem).toMatchObject({
      path: ['options', 'kept', 0, 'variant', 'boxWidthM'],
      received: '40',
      unit: 'm',
    });
    expect(others).toEqual([]);
    expect(choiceProblems(wide, study)).toEqual([]);
    expect(choiceProblems(far, far)).toEqual([]);
    const ribbed = withWay(withWay(study, box, 'ribs', 'with'), box, 'struts', 'with');
    expect(choiceProblems(ribbed, study).map(({ path }) => path.at(-1))).toEqual(['ribs']);
  });

  it('a haunch of 1 is a constant depth, and none is made over a single span', () => {
    const plain = withAskedFigure(numbered, option, haunch, 1);
    expect(variantIn(plain, option)).toEqual({ substringers: 'unknown' });
    expect(askedFigure(plain, option, haunch)).toBe(1);
    expect(askedWords(plain.options.kept[0]!)).toEqual(['constant depth']);
    const deep = withAskedFigure(plain, option, haunch, 1.6);
    expect(variantIn(deep, option)).toEqual({ haunchRatio: 1.6, substringers: 'unknown' });
    expect(choiceProblems(deep, plain)).toEqual([]);
    const single = start.slice(1, -1).reduce((left) => {
      const fewer = withPierRemoved(left, option, 1);
      return fewer.ok ? fewer.study : left;
    }, deep);
    expect(mainSpans(single, option)).toHaveLength(1);
    expect(choiceProblems(single, numbered).map(({ path }) => path.at(-1))).toEqual(['haunchRatio']);
  });

  it('a figure by span begins from the usual one and goes when all spans have that again', () => {
    const spans = mainSpans(study, box);
    const light = withAskedFigure(study, box, density, 1800);
    const middles = withAskedFigure(light, box, middle, 20, 1);
    expect(variantIn(middles)).toMatchObject({
      light: { densityKgM3: 1800, middleM: spans.map((span, i) => (i === 1 ? 20 : span)) },
    });
    expect(askedFigure(middles, box, middle, 0)).toBe('unknown');
    expect(variantIn(withAskedFigure(middles, box, middle, 'unknown', 1))).toEqual(variantIn(light));
    expect(variantIn(withAskedFigure(middles, box, density, 'unknown'))).toBeUndefined();
    const loaded = withAskedFigure(study, box, ballast, 60, 0);
    expect(variantIn(loaded)).toMatchObject({ ballastKNm: spans.map((_, i) => (i === 0 ? 60 : 0)) });
    expect(variantIn(withAskedFigure(loaded, box, ballast, 0, 0))).toBeUndefined();
  });

  it('figures by span go along where supports are moved, added and taken away', () => {
    const light = withAskedFigure(withAskedFigure(study, box, density, 1800), box, middle, 20, 1);
    const loaded = withAskedFigure(light, box, ballast, 60, 0);
    const pier = mainSpans(study, box)[0]!;
    const moved = withPier(loaded, box, 1, box.supports[1]!.chainageM - 4);
    expect(mainSpans(moved, box)[0]).toBeCloseTo(pier - 4, 9);
    expect(askedFigure(moved, box, middle, 0)).toBe('unknown');
    expect(askedFigure(moved, box, middle, 1)).toBe(20);
    expect(choiceProblems(moved, study)).toEqual([]);
    const added = withPierAdded(loaded, box, 0);
    if (!added.ok) throw new Error(added.why);
    expect([0, 1, 2].map((span) => askedFigure(added.study, box, ballast, span))).toEqual([
      60,
      60,
      'unknown',
    ]);
    expect(choiceProblems(added.study, study)).toEqual([]);
    const fewer = withPierRemoved(added.study, box, 1);
    expect(fewer.ok && variantIn(fewer.study)).toEqual(variantIn(loaded));
  });
});
