import { describe, expect, it } from 'vitest';
import { byCost } from '../../notebooks/charts/rowHead.ts';
import { ranking } from '../../notebooks/charts/ranking.ts';
import { leastSoffit, lowestSoffit, supportChainages } from '../../notebooks/drawing/alongOption.ts';
import { bracketKey } from '../../notebooks/drawing/barred.ts';
import { crossing } from '../../notebooks/drawing/crossing.ts';
import { elevation } from '../../notebooks/drawing/elevation.ts';
import { pxPerMetre } from '../../notebooks/drawing/scale.ts';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { stack, stackOnPaper } from '../../notebooks/drawing/stack.ts';
import { toText } from '../../notebooks/drawing/toText.ts';
import { expectGolden, elements, wordsOf } from './golden.ts';
import { budget, obstacles, options, site, standing } from './fixture.ts';
import { sheets } from './sheets.ts';

const second = options[1]!;

describe('golden drawings', () => {
  it.each(Object.keys(sheets))('%s is as it was last accepted', (name) => {
    expectGolden(name, sheets[name]!());
  });
});

describe('every drawing', () => {
  it.each(Object.keys(sheets))('%s holds no style attribute, no script and only finite figures', (name) => {
    for (const { tag, attrs } of elements(sheets[name]!())) {
      expect(tag).not.toMatch(/^(style|script|foreignObject)$/);
      expect(attrs).not.toHaveProperty('style');
      for (const value of Object.values(attrs)) expect(value).not.toMatch(/NaN|Infinity|undefined/);
    }
  });

  it.each(Object.keys(sheets))('%s has a name and a role, and prints no unknown figure as one', (name) => {
    const piece = sheets[name]!();
    expect(piece.tag).toBe('svg');
    expect(piece.attrs['role']).toMatch(/^(img|group)$/);
    expect(piece.attrs['aria-label']!.length).toBeGreaterThan(8);
    expect(wordsOf(piece).join(' ')).not.toMatch(/NaN|Infinity|undefined|null/);
  });

  it.each(Object.keys(sheets))('%s refers only to patterns and windows of its own', (name) => {
    const piece = sheets[name]!();
    const own = new Set([...elements(piece)].flatMap(({ attrs }) => attrs['id'] ?? []));
    const text = toText(piece);
    for (const [, id = ''] of text.matchAll(/url\(#([^)]+)\)/g)) expect(own).toContain(id);
  });
});

/** Numbers of every path of a drawing that has the given class somewhere above it. */
function bubblesOf(widthPx: number): { readonly x: number; readonly words: string }[] {
  const piece = crossing({ site, option: second, obstacles, widthPx });
  const group = [...elements(piece)].find(({ attrs }) => attrs['class'] === 'bubbles')!;
  const circles = [...elements(group)]
    .filter(({ tag }) => tag === 'circle')
    .map(({ attrs }) => Number(attrs['cx']));
  return wordsOf(group).map((words, index) => ({ x: circles[index]!, words }));
}

describe('crossing(input)', () => {
  it('stands its bubbles at the true distances of 1:1000', () => {
    const bubbles = bubblesOf(980);
    expect(bubbles.map(({ words }) => words)).toEqual(['A', 'P1', 'P2', 'B']);
    // One metre at 1:1000 is one millimetre, and 25.4 of them are 96 px.
    const metre = 96 / 25.4;
    expect(bubbles[1]!.x - bubbles[0]!.x).toBeCloseTo(70 * metre, 1);
    expect(bubbles[3]!.x - bubbles[0]!.x).toBeCloseTo(230 * metre, 1);
  });

  it('states the least spare of the band in bold and the depth at its deepest pier', () => {
    const piece = crossing({ site, option: second, obstacles, widthPx: 980 });
    expect(wordsOf(piece)).toContain('3.60');
    const spares = supportChainages(second).map(
      (at) => lowestSoffit(site, second, at) - leastSoffit(site, at),
    );
    expect(Math.min(...spares.filter(Number.isFinite))).toBeGreaterThan(0);
    const bold = [...elements(piece)]
      .filter(({ tag, attrs }) => tag === 'text' && attrs['font-weight'] === '600')
      .flatMap(({ children }) => children);
    // At the far end of the railway's envelope: underside 17.64 on the road line, 0.025 x 4.5 lower at the edge, at least 17.10.
    expect(bold).toContain('0.42');
  });

  it('keeps the band down to 480 px, with the least spare of all in it', () => {
    for (const widthPx of [980, 700, 640, 578, 480]) {
      const piece = crossing({ site, option: second, obstacles, widthPx });
      const bold = [...elements(piece)]
        .filter(({ tag, attrs }) => tag === 'text' && attrs['font-weight'] === '600')
        .flatMap(({ children }) => children);
      expect([widthPx, bold.includes('0.42')]).toEqual([widthPx, true]);
    }
    expect(wordsOf(crossing({ site, option: second, obstacles, widthPx: 358 }))).not.toContain('spare');
  });

  it('says a depth too low in words', () => {
    const deep = {
      ...second,
      profile: {
        ...second.profile,
        startLevelM: second.profile.startLevelM - 1,
        endLevelM: second.profile.endLevelM - 1,
        pieces: second.profile.pieces.map((piece) => ({ ...piece, levelM: piece.levelM - 1 })),
      },
    };
    expect(
      wordsOf(crossing({ site, option: deep, obstacles, widthPx: 980 })).some((words) =>
        words.endsWith('too low'),
      ),
    ).toBe(true);
  });

  it('with handles gives every pier one that keys can reach, and the abutments none', () => {
    const piece = crossing({
      site,
      option: second,
      obstacles,
      widthPx: 980,
      handles: { hold: null, locked: [] },
    });
    const handles = [...elements(piece)].filter(({ attrs }) => attrs['data-handle']?.startsWith('pier/'));
    expect(
      handles.map(({ attrs }) => [attrs['data-handle'], attrs['aria-valuenow'], attrs['tabindex']]),
    ).toEqual([
      ['pier/1', '1310', '0'],
      ['pier/2', '1400', '0'],
    ]);
    expect(piece.attrs['role']).toBe('group');
  });

  it('at a small scale says over everything what is barred, and takes the main opening by its bracket, and has every handle of a large drawing', () => {
    const small = (handles: boolean): Piece =>
      crossing({
        site,
        option: second,
        obstacles,
        widthPx: 358,
        ...(handles && { handles: { hold: null, locked: [] } }),
      });
    const bars = [...elements(small(false))].find(({ attrs }) => attrs['class'] === 'brackets')!;
    const words = [...elements(bars)].filter(({ tag }) => tag === 'text');
    expect(wordsOf(bars)).toEqual(['railway', 'no pier, 60 m']);
    expect(words.map(({ attrs }) => attrs['data-figure'])).toEqual([undefined, 'site/mainOpening/widthM']);
    // Between the dimensions and the structure.
    const deck = [...elements(small(false))].find(({ attrs }) => attrs['class'] === 'elevation')!;
    const tops = [...elements(deck)].flatMap(({ attrs }) =>
      [...(attrs['d'] ?? '').matchAll(/[ML][\d.]+,([\d.]+)/gu)].map(([, y]) => Number(y)),
    );
    for (const { attrs } of words) expect(Number(attrs['y'])).toBeLessThan(Math.min(...tops));
    const [dimension] = [...elements(small(false))].filter(
      ({ tag, attrs }) => tag === 'text' && attrs['y'] === '16',
    );
    expect(dimension).toBeDefined();
    for (const { attrs } of words) expect(Number(attrs['y'])).toBeGreaterThan(16 + 11);

    const held = [...elements(small(true))].filter(({ attrs }) => attrs['data-handle'] !== undefined);
    const keysOf = (pieces: readonly Piece[]): string[] =>
      pieces.map(({ attrs }) => attrs['data-handle'] ?? '').sort();
    const large = crossing({
      site,
      option: second,
      obstacles,
      widthPx: 980,
      handles: { hold: null, locked: [] },
    });
    const inLarge = [...elements(large)].filter(({ attrs }) => attrs['data-handle'] !== undefined);
    expect(keysOf(held)).toEqual([...keysOf(inLarge), 'width/1'].sort());
    const opening = held.filter(({ attrs }) => /^width|obstacle\/1/u.test(attrs['data-handle']!));
    expect(
      opening.map(({ attrs }) => [
        attrs['data-handle'],
        attrs['role'],
        attrs['aria-valuenow'],
        attrs['tabindex'],
      ]),
    ).toEqual([
      ['width/1', 'spinbutton', '60', '0'],
      ['obstacle/1/from', 'slider', '1325', '0'],
      ['obstacle/1/to', 'slider', '1385', '0'],
    ]);
    expect([...elements(small(false))].some(({ attrs }) => attrs['data-handle'] !== undefined)).toBe(false);
  });

  describe('with brackets so close that their words would touch', () => {
    const zone = site.zones.find(({ hard }) => hard)!;
    const zones = ['Up line', 'Down line', 'Siding'].map((name, i) => ({
      ...zone,
      name,
      kind: 'railway' as const,
      fromM: 1300 + 20 * i,
      toM: 1306 + 20 * i,
    }));
    const close = { ...site, zones, mainOpening: { fromM: 1300, toM: 1306, widthM: 6 } };
    const at = (widthPx: number): Piece =>
      crossing({ site: close, option: second, obstacles, widthPx, scale: 5000 });
    const lettersOf = (piece: Piece): Piece[] => {
      const bars = [...elements(piece)].find(({ attrs }) => attrs['class'] === 'brackets')!;
      return [...elements(bars)].filter(({ tag }) => tag === 'text');
    };

    it('puts the words in lines of their own', () => {
      const piece = at(620);
      expect(new Set(lettersOf(piece).map(({ attrs }) => attrs['y'])).size).toBe(3);
      expect(bracketKey(piece)).toEqual([]);
    });

    it('on a hand-held screen puts letters over them and says what they stand for, once', () => {
      const piece = at(358);
      expect(lettersOf(piece).map(({ children }) => children[0])).toEqual(['a', 'b', 'c']);
      expect(new Set(lettersOf(piece).map(({ attrs }) => attrs['y'])).size).toBe(1);
      expect(bracketKey(piece)).toEqual([
        { letter: 'a', names: 'Up line' },
        { letter: 'b', names: 'Down line' },
        { letter: 'c', names: 'Siding' },
      ]);
      expect(wordsOf(piece)).not.toContain('Siding');
    });
  });

  it('draws a site without zones, water, limits or ground classes', () => {
    const bare = { ...site, zones: [], waters: [], soffitLimits: [], groundStretches: [], mainOpening: null };
    const words = wordsOf(crossing({ site: bare, option: null, widthPx: 980 }));
    expect(words).toContain('ground');
    expect(words).not.toContain('at least');
  });
});

describe('elevation(input)', () => {
  it('draws lengths and heights at one scale', () => {
    const piece = elevation({ site, option: options[4]!, widthPx: 980, scale: 1000 });
    const pylon = [...elements(piece)].find(({ attrs }) => attrs['data-form'] === 'cable-stayed')!;
    const shapes = [...elements(pylon)]
      .filter(({ tag }) => tag === 'path')
      .map(({ attrs }) =>
        [...attrs['d']!.matchAll(/(-?[\d.]+),(-?[\d.]+)/g)].map(
          ([, x, y]) => [Number(x), Number(y)] as const,
        ),
      );
    const leg = shapes.find(
      (points) => points.length === 4 && Math.abs(points[0]![1] - points[2]![1]) > 150,
    )!;
    // The leg of the fixture is 50 m high and 3.2 m wide at its foot; the road falls by 9.8 mm a metre.
    expect(Math.abs(leg[0]![1] - leg[3]![1])).toBeCloseTo(50 * pxPerMetre(1000), 0);
    expect(Math.abs(leg[0]![0] - leg[1]![0])).toBeCloseTo(3.2 * pxPerMetre(1000), 1);
  });
});

describe('stack(input)', () => {
  const piece = stack({ site, options, standing, budget, currency: 'EUR', reference: 2, widthPx: 1224 });
  const rows = [...elements(piece)].filter(({ attrs }) => attrs['data-option'] !== undefined);

  it('has one row per option that keys can reach, and presses only the reference', () => {
    expect(rows.map(({ attrs }) => attrs['data-option'])).toEqual(['1', '2', '3', '4', '5', '6']);
    const buttons = rows.map((row) => [...elements(row)].find(({ attrs }) => attrs['class'] === 'frame')!);
    for (const { attrs } of buttons) expect([attrs['role'], attrs['tabindex']]).toEqual(['button', '0']);
    expect(buttons.map(({ attrs }) => attrs['aria-pressed'])).toEqual([
      'false',
      'true',
      'false',
      'false',
      'false',
      'false',
    ]);
  });

  it('prints costs to two figures and odds in steps of five', () => {
    const words = rows.map(wordsOf);
    expect(words[1]).toEqual(expect.arrayContaining(['9.7', '8.0 to 12', '90 % within budget', 'reference']));
    expect(words[4]).toEqual(expect.arrayContaining(['16', '13 to 21', '5 % within budget', 'out']));
  });

  it('leaves out budget and odds where there is none', () => {
    const without = stack({
      site,
      options,
      standing: { ...standing, within: {} },
      budget: null,
      currency: 'EUR',
      reference: null,
      widthPx: 1224,
    });
    expect(wordsOf(without).join(' ')).not.toMatch(/budget|reference/);
  });
});

describe('stackOnPaper(input, height)', () => {
  it('parts the rows without losing one, each part no higher than the page, on one money axis', () => {
    const parts = stackOnPaper(
      { site, options, standing, budget, currency: 'EUR', reference: 2, widthPx: 1224 },
      600,
    );
    expect(parts.length).toBeGreaterThan(1);
    for (const part of parts) expect(Number(part.attrs['height'])).toBeLessThanOrEqual(600);
    const rowsOf = (part: (typeof parts)[number]) =>
      [...elements(part)].flatMap(({ attrs }) => attrs['data-option'] ?? []);
    expect(parts.flatMap(rowsOf)).toEqual(['1', '2', '3', '4', '5', '6']);
    const budgetAt = parts
      .map(
        (part) => [...elements(part)].find(({ attrs }) => attrs['class'] === 'budget')!.children[0] as Piece,
      )
      .map(({ attrs }) => attrs['d']!.split(',')[0]);
    expect(new Set(budgetAt).size).toBe(1);
  });
});

describe('stackOnPaper(input, height, first)', () => {
  it('leaves room on its first page for what stands there', () => {
    const input = { site, options, standing, budget, currency: 'EUR', reference: 2, widthPx: 1224 };
    const [first, ...others] = stackOnPaper(input, 960, 500);
    expect(Number(first!.attrs['height'])).toBeLessThanOrEqual(500);
    for (const part of others) expect(Number(part.attrs['height'])).toBeLessThanOrEqual(960);
    const rows = [first!, ...others].flatMap((part) =>
      [...elements(part)].flatMap(({ attrs }) => attrs['data-option'] ?? []),
    );
    expect(rows).toEqual(['1', '2', '3', '4', '5', '6']);
  });
});

describe('ranking(input)', () => {
  it('gives differences from the reference and says what cannot be separated', () => {
    const text = toText(
      ranking({ options: byCost(options), standing, budget, currency: 'EUR', reference: 2 }),
    );
    expect(text).toContain('+0.2');
    expect(text).toContain('cannot be separated from 4 and 6');
    expect(text).not.toContain(' style=');
  });
});
