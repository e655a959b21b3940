import { describe, expect, it } from 'vitest';
import {
  constructionDepth,
  CROSSFALL,
  roadLevelAt,
  sizeableForms,
  type AppraisedOption,
} from '../../lib/index.ts';
import { exampleNames, type ExampleName } from '../../notebooks/exampleNames.ts';
import { crossing } from '../../notebooks/drawing/crossing.ts';
import { deckStrips } from '../../notebooks/drawing/deckStrips.ts';
import { elevation, wantsWidth } from '../../notebooks/drawing/elevation.ts';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { elevationText } from '../../notebooks/drawing/elevationText.ts';
import { optionNote } from '../../notebooks/drawing/optionWords.ts';
import { plan } from '../../notebooks/drawing/plan.ts';
import { section } from '../../notebooks/drawing/section.ts';
import { roadProfile } from '../../notebooks/drawing/roadProfile.ts';
import { stack, stackChainage } from '../../notebooks/drawing/stack.ts';
import { mainDesign } from '../../notebooks/drawing/sectionRow.ts';
import { textWidth } from '../../notebooks/drawing/lettering.ts';
import { toSvgFile } from '../../notebooks/drawing/toText.ts';
import { expectGolden } from './golden.ts';
import { crossedBy, example, type Crossed } from './measuring/crossings.ts';
import { measureElevation } from './measuring/elevationMarks.ts';
import { chainagesOf, measureOption, near, READING_PX, spareWorkedOut } from './measuring/measureOption.ts';
import { measureUnits } from './measuring/measureUnits.ts';
import { levelMarksOf, readPaper, saidScale } from './measuring/paper.ts';
import { stripsDrawn } from './measuring/sectionMarks.ts';
import { depthOf } from './measuring/workedDepth.ts';
import {
  boxOf,
  crossedAt,
  having,
  parts,
  printed,
  readSvg,
  runsOf,
  within,
  type Box,
  type Node,
} from './measuring/svg.ts';

const file = (piece: Piece): Node => readSvg(toSvgFile(piece));
const wordsOf = (svg: Node): string[] =>
  [...within(svg)].filter(({ tag }) => tag === 'text').map(({ text }) => text);

const elevationOf = ({ appraisal }: Crossed, option: AppraisedOption, widthPx = 980): Node =>
  file(elevation({ site: appraisal.site, option, widthPx }));

/** The crossing as it stands at the head of a study. */
const crossingOf = ({ appraisal, study }: Crossed, option: AppraisedOption): Node =>
  file(crossing({ site: appraisal.site, option, obstacles: study.brief.obstacles, widthPx: 1224 }));

describe('elevation(input), measured', { timeout: 120_000 }, () => {
  it('elevation(frame) has every wall end on its footing, the one that reaches up over the foot of its wall too', () => {
    const crossed = example('stonebeck-lane');
    const frame = crossed.appraisal.options.find(({ form }) => form === 'portal-frame')!;
    const svg = elevationOf(crossed, frame);
    const tops = having(svg, 'class', 'substructure')
      .flatMap((one) => parts(one, 'footing'))
      .map((one) => boxOf(one).top);
    const feet = ['first wall', 'middle wall', 'last wall'].map((name) => boxOf(parts(svg, name)[0]!).bottom);
    expect(tops).toHaveLength(3);
    feet.forEach((foot, w) => expect(foot).toBeLessThanOrEqual(tops[w]! + READING_PX));
    expect(Math.min(...feet.map((foot, w) => Math.abs(foot - tops[w]!)))).toBeLessThanOrEqual(READING_PX);
  });

  it.each(exampleNames)('gives back spans, depths, road and founding of every option of %s', (name) => {
    const crossed = example(name);
    expect(crossed.appraisal.options.length).toBeGreaterThan(0);
    for (const option of crossed.appraisal.options)
      measureOption(elevationOf(crossed, option), crossed.appraisal.site, option);
  });

  it.each(sizeableForms)('gives back those of a %s', (form) => {
    const crossed = crossedBy(form);
    const option = crossed.appraisal.options.find(({ units }) => units.some((unit) => unit.form === form));
    expect(option, `${crossed.name}: ${JSON.stringify(crossed.appraisal.dropped)}`).toBeDefined();
    // Wide enough for the line of the soffit and for foundations.
    const widthPx = 980 * Math.max(1, Math.ceil(crossed.appraisal.site.lengthM / 240));
    measureOption(elevationOf(crossed, option!, widthPx), crossed.appraisal.site, option!);
  });
});

describe('crossing(input), measured', { timeout: 120_000 }, () => {
  it.each(exampleNames)('gives back what every option of %s is, and prints its spans', (name) => {
    const crossed = example(name);
    for (const option of crossed.appraisal.options) {
      const svg = crossingOf(crossed, option);
      measureOption(svg, crossed.appraisal.site, option);
      const paper = readPaper(svg);
      const words = wordsOf(svg);
      const at = chainagesOf(option);
      if (paper.scale < 2000)
        for (const [i, x] of at.slice(1).entries()) expect(words).toContain((x - at[i]!).toFixed(1));
    }
  });

  it.each(exampleNames)('stands every level mark of %s at the level it states', (name) => {
    const crossed = example(name);
    const svg = crossingOf(crossed, crossed.appraisal.options[0]!);
    const paper = readPaper(svg);
    for (const { words, y } of levelMarksOf(svg)) {
      // Levels are printed to the centimetre.
      const off = Math.abs(paper.levelM(y) - printed(words));
      expect(off * paper.pxPerM, words).toBeLessThanOrEqual(READING_PX + 0.005 * paper.pxPerM);
    }
  });

  it.each(exampleNames)('leaves over each envelope of %s what the option has spare', (name) => {
    const { appraisal, study } = example(name);
    const { site } = appraisal;
    // The soffit is drawn on the line of the road; at its edge the deck is lower by the fall of the carriageway.
    const fallM = constructionDepth(site.deck, 0) - site.deck.surfacingM;
    const spares: number[] = [];
    for (const option of appraisal.options)
      for (const obstacle of study.brief.obstacles) {
        const { clearance } = obstacle;
        if (clearance === null) continue;
        const { fromM, toM, datumLevelM, headroomM } = clearance;
        const window = { fromM: fromM - 20, toM: toM + 20 };
        const svg = file(
          crossing({ site, option, obstacles: [obstacle], widthPx: 980, scale: 500, window, band: false }),
        );
        const paper = readPaper(svg);
        const marks = measureElevation(svg);
        const [drawn] = marks.envelopes;
        const where = `option ${String(option.number)} over ${obstacle.name}`;
        expect(marks.envelopes, where).toHaveLength(1);
        near(paper, `${where}, foot`, paper.levelM(drawn!.bottom), datumLevelM);
        near(paper, `${where}, top`, paper.levelM(drawn!.top), datumLevelM + headroomM);
        near(paper, `${where}, width`, (drawn!.right - drawn!.left) / paper.pxPerM, toM - fromM);
        const steps = 400;
        const gaps = Array.from({ length: steps + 1 }, (_, i) => {
          const x = drawn!.left + ((drawn!.right - drawn!.left) * i) / steps;
          return (drawn!.top - marks.soffitAt(x)) / paper.pxPerM - fallM;
        });
        const measured = Math.min(...gaps);
        near(
          paper,
          `${where}, spare`,
          measured,
          spareWorkedOut(site, option, fromM, toM, datumLevelM + headroomM),
        );
        if (option.headroom !== null && option.headroom.reason.includes('over'))
          spares.push(option.headroom.spareM - measured);
      }
    // What decides an option is never more than what is left over one of its envelopes.
    for (const spare of spares) expect(spare).toBeLessThan(0.02);
  });

  it.each(exampleNames)(
    'bands the chainages of %s where they lie, with the levels that are drawn there',
    (name) => {
      const crossed = example(name);
      const { site, options } = crossed.appraisal;
      const svg = file(
        crossing({ site, option: options[0]!, obstacles: crossed.study.brief.obstacles, widthPx: 980 * 2 }),
      );
      const [band] = having(svg, 'class', 'band');
      if (readPaper(svg).scale > 2000) return;
      const paper = readPaper(svg);
      const marks = measureElevation(svg);
      // A tick at each place; where the figures step aside for a support, drawn on to them.
      const ticks = runsOf(band!.children.find(({ tag }) => tag === 'path')!);
      const rows = band!.children.filter(({ tag }) => tag === 'g').slice(1);
      const figures = new Map(
        rows.map((row) => {
          const [head, ...others] = row.children.filter(({ tag }) => tag === 'text');
          return [
            head!.text,
            others.map(({ attrs, text }) => ({ x: Number(attrs['x']), value: printed(text) })),
          ];
        }),
      );
      const chainages = figures.get('ch')!;
      const start = chainagesOf(options[0]!)[0]!;
      expect(ticks).toHaveLength(chainages.length);
      chainages.forEach(({ x: writtenAt, value }, i) => {
        const tick = ticks[i]!;
        expect(tick.at(-1)![0]).toBeCloseTo(writtenAt, 1);
        const [x] = tick[0]!;
        // Chainages are printed to the decimetre, levels to the centimetre.
        near(
          paper,
          `ch ${String(value)}`,
          (x - marks.supports[0]!.x) / paper.pxPerM,
          value - start,
          READING_PX + 0.05 * paper.pxPerM,
        );
        const level = (row: string): number => figures.get(row)![i]!.value;
        const px = READING_PX + 0.005 * paper.pxPerM;
        near(paper, `ground at ${String(value)}`, paper.levelM(marks.groundAt(x)), level('ground'), px);
        if (value >= start && value <= site.endM)
          near(paper, `road at ${String(value)}`, paper.levelM(marks.roadAt(x)), level('road'), px);
      });
    },
  );
});

describe('flags of a crossing', { timeout: 120_000 }, () => {
  it.each(exampleNames)('keep off the piers and walls of every option of %s', (name) => {
    const crossed = example(name);
    for (const option of crossed.appraisal.options) {
      const svg = crossingOf(crossed, option);
      const standing = [...parts(svg, 'shaft'), ...parts(svg, 'wall')].map(boxOf);
      for (const mark of having(svg, 'class', 'level-mark')) {
        const [shelf, triangle] = mark.children.map(boxOf) as [Box, Box];
        const words = mark.children.find(({ tag }) => tag === 'text')!.text;
        expect(shelf.right - shelf.left).toBeGreaterThan(10);
        const struck = standing.filter(
          ({ left, right, top, bottom }) =>
            left < shelf.right && right > shelf.left && top < triangle.bottom && bottom > shelf.top,
        );
        expect(struck, `option ${String(option.number)}, ${words}`).toEqual([]);
      }
    }
  });
});

describe('section(input), measured', { timeout: 120_000 }, () => {
  it.each(exampleNames)('gives back deck, carriageway and depth of every unit of %s', (name) => {
    for (const option of example(name).appraisal.options) measureUnits(option, () => true);
  });

  it.each(sizeableForms)('gives back those of a %s', (form) => {
    const { appraisal } = crossedBy(form);
    const option = appraisal.options.find(({ units }) => units.some((unit) => unit.form === form));
    measureUnits(option!, (one) => one === form);
  });
});

describe('deckStrips(input), measured', () => {
  it.each(exampleNames)('gives back the strips of %s, each with its width', (name) => {
    const { brief } = example(name).study;
    const marginPx = 20;
    const scale = 100;
    const svg = readSvg(
      toSvgFile(
        deckStrips({
          strips: brief.deck,
          surfacingM: brief.surfacingM,
          crossfall: CROSSFALL,
          scale,
          marginPx,
        }),
      ),
    );
    const pxPerM = 96 / 0.0254 / scale;
    const drawn = stripsDrawn(svg);
    expect(drawn.map(({ kind }) => kind)).toEqual(brief.deck.map(({ kind }) => kind));
    let edge = marginPx;
    drawn.forEach(({ left, right }, i) => {
      expect(Math.abs(left - edge)).toBeLessThanOrEqual(READING_PX);
      expect(Math.abs((right - left) / pxPerM - brief.deck[i]!.widthM) * pxPerM).toBeLessThanOrEqual(
        READING_PX,
      );
      edge += brief.deck[i]!.widthM * pxPerM;
    });
  });
});

describe('roadProfile(input), measured', { timeout: 120_000 }, () => {
  it.each(exampleNames)('says how heights are exaggerated, and gives back road and needs of %s', (name) => {
    const { site, options } = example(name).appraisal;
    for (const option of options) {
      const { drawnPx: widthPx, scale, shown } = stackChainage(site, 1224);
      const svg = file(roadProfile({ site, option, widthPx, scale, shown }));
      const said = wordsOf(svg).flatMap((text) => /^heights × (\d+)$/u.exec(text)?.[1] ?? []);
      const times = Number(said[0] ?? 1);
      const flat = readPaper(svg);
      expect(flat.scale).toBe(scale);
      // Levels by the datum, with heights as many times as large as lengths.
      const [line] = having(svg, 'class', 'datum');
      const datumY = runsOf(line!.children.find(({ tag }) => tag === 'path')!)[0]![0]![1];
      const paper = {
        ...flat,
        pxPerM: flat.pxPerM * times,
        levelM: (y: number) => flat.levelM(datumY) + (datumY - y) / (flat.pxPerM * times),
      };
      const road = parts(svg, 'road').flatMap(runsOf);
      const x = (at: number): number => (at - shown.fromM) * flat.pxPerM;
      const at = chainagesOf(option);
      for (const chainageM of [...at, ...at.slice(1).map((one, i) => (one + at[i]!) / 2)]) {
        const measured = paper.levelM(Math.max(...crossedAt(road, x(chainageM))));
        const where = `option ${String(option.number)}, road at ${String(chainageM)}`;
        near(paper, where, measured, roadLevelAt(option.profile, chainageM), READING_PX + 0.02);
      }
      const needs = having(svg, 'data-limit');
      for (const need of needs) {
        const limit = site.soffitLimits[Number(need.attrs['data-limit'])]!;
        const run = runsOf(parts(need, 'level needed')[0]!)[0]!;
        for (const [px, y] of [run[0]!, run.at(-1)!]) {
          const chainageM = shown.fromM + px / flat.pxPerM;
          const needed = limit.levelM + constructionDepth(site.deck, depthOf(option, chainageM));
          near(paper, `need of ${limit.reason}`, paper.levelM(y), needed, READING_PX + 0.02);
        }
      }
      expect(needs).toHaveLength(
        site.soffitLimits.filter(({ fromM, toM }) => fromM < site.endM && toM > site.startM).length,
      );
    }
  });
});

describe('stack(input) of a long crossing', { timeout: 120_000 }, () => {
  it('draws its elevations over the whole width at 1:5000, each under its cost, and says so', () => {
    const { site, options, standing } = example('sarrow-estuary').appraisal;
    const drawing = stack({
      site,
      options,
      standing,
      budget: null,
      currency: 'EUR',
      reference: null,
      widthPx: 1224,
    });
    const svg = file(drawing);
    expect(stackChainage(site, 1224)).toMatchObject({ isTall: true, scale: 5000, drawnPx: 1224 });
    expect(saidScale(svg).scale).toBe(5000);
    const bodies = having(svg, 'class', 'elevation');
    expect(bodies).toHaveLength(options.length);
    for (const [i, body] of bodies.entries()) {
      const [road] = parts(body, 'road').map(boxOf);
      expect(road!.right - road!.left).toBeCloseTo(site.lengthM * saidScale(svg).pxPerM, 1);
      const row = having(svg, 'data-option')[i]!;
      const cost = having(row, 'class', 'figures')[0]!;
      const lowest = Math.max(
        ...[...within(cost)].filter(({ tag }) => tag === 'text').map(({ attrs }) => Number(attrs['y'])),
      );
      const decks = having(body, 'data-form').flatMap((unit) => having(unit, 'data-part'));
      const beside = decks.map(boxOf).filter(({ right }) => right > 980);
      expect(Math.min(...beside.map(({ top }) => top))).toBeGreaterThan(lowest);
    }
  });
});

describe('stack(input) beside its costs', { timeout: 120_000 }, () => {
  it('writes the unit of its axis clear of the line of a budget that stands at the end of it', () => {
    const { site, options, standing } = example('low-ferry').appraisal;
    const most = Math.max(...options.map(({ cost }) => cost.p90));
    const drawing = { site, options, standing, currency: 'EUR', reference: null, widthPx: 1224 };
    for (const budget of [0.9 * most, most, 1.2 * most]) {
      const svg = file(stack({ ...drawing, budget }));
      const [line] = having(svg, 'class', 'budget')[0]!.children.map(boxOf);
      const unit = having(svg, 'class', 'axis')[0]!.children.find(({ text }) => text === 'M€')!;
      const right = Number(unit.attrs['x']);
      expect(line!.left < right - textWidth('M€', 11) - 2 || line!.left > right + 2).toBe(true);
    }
  });
});

describe('data band of an example', { timeout: 120_000 }, () => {
  it('has the place at which a deck hangs lowest into an envelope, beside the support that stands close to it', () => {
    const { site, options } = example('stonebeck-lane').appraisal;
    const frame = options.find(
      ({ form, units }) => form === 'portal-frame' && units[0]!.supportsM.length === 3,
    )!;
    const said = elevationText(site, frame);
    const [, low, at] = /(\d\.\d\d) m too low at chainage ([\d.]+)/u.exec(said)!;
    const middle = frame.units[0]!.supportsM[1]!;
    // Closer to the wall between the carriageways than two figures have room.
    expect(Math.abs(middle - Number(at))).toBeLessThan(3);
    const words = wordsOf(file(crossing({ site, option: frame, widthPx: 760 })));
    expect(words).toContain(at);
    expect(words).toContain(`−${low}`);
    expect(words).toContain(middle.toFixed(1));
    expect(optionNote(site, frame)).toContain('m at walls');
  });
});

describe('golden drawings of the examples', { timeout: 120_000 }, () => {
  const sheetsOf = (name: ExampleName): Record<string, () => Piece> => {
    const { appraisal, study } = example(name);
    const { site, options, standing } = appraisal;
    const option = options.find(({ number }) => number === (study.options.reference ?? standing.leader))!;
    const widthPx = wantsWidth(site) ? 1224 : 980;
    const { drawnPx, scale, shown } = stackChainage(site, 1224);
    const onChainage = { widthPx: drawnPx, scale, shown };
    return {
      crossing: () => crossing({ site, option, obstacles: study.brief.obstacles, widthPx }),
      plan: () => plan({ site, option, widthPx, bar: true }),
      section: () => section({ design: mainDesign(option)!, widthPx: 580 }),
      road: () => roadProfile({ site, option, ...onChainage }),
    };
  };
  it.each(
    exampleNames.flatMap((name) =>
      ['crossing', 'plan', 'section', 'road'].map((what) => [name, what] as const),
    ),
  )('%s, %s of the reference, is as it was last accepted', (name, what) => {
    expectGolden(`example-${name}-${what}`, sheetsOf(name)[what]!());
  });
});
