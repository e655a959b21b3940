import { options, site } from './fixture.ts';
import { standOff } from '../../notebooks/charts/standOff.ts';
import { describe, expect, it } from 'vitest';
import { dominatedSide, edgeOf, undominated } from '../../notebooks/charts/edge.ts';
import { depthCurve, depthTable, flatStretch, oncePerDepth } from '../../notebooks/charts/depthCurve.ts';
import { groupOdds } from '../../notebooks/charts/costIntervals.ts';
import { logTicks } from '../../notebooks/charts/logTicks.ts';
import { costAxis, linearAxis } from '../../notebooks/drawing/axis.ts';
import { readAt } from '../../notebooks/drawing/alongOption.ts';
import { sheetIn } from '../../notebooks/drawing/elevation.ts';
import { textWidth, wrapText } from '../../notebooks/drawing/lettering.ts';
import { el } from '../../notebooks/drawing/piece.ts';
import { placer } from '../../notebooks/drawing/placer.ts';
import { largestScale, pxPerMetre } from '../../notebooks/drawing/scale.ts';
import { inRoom, sheet } from '../../notebooks/drawing/sheet.ts';
import { stackChainage } from '../../notebooks/drawing/stack.ts';
import { toSvgFile, toText } from '../../notebooks/drawing/toText.ts';
import {
  chainage,
  fixed,
  listed,
  money2,
  moneyUnit,
  odds,
  signed,
  powers,
  significant,
  spansText,
  plain,
} from '../../notebooks/format.ts';
import { formLooks } from '../../notebooks/forms/formLook.ts';
import { tint } from '../../notebooks/forms/formInk.ts';
import { contrast } from '../../notebooks/forms/optionNumber.ts';
import { formIds } from '../../lib/model/index.ts';

interface Spot {
  readonly x: number;
  readonly y: number;
}

describe('standOff(places, reference, limitY, panel)', () => {
  it('keeps the numbers of two dozen marks in one spot apart, in the panel, off the limit and off other marks, and their flags do not cross', () => {
    const panel = { left: 0, right: 360, top: 40, bottom: 362 };
    const places = Array.from({ length: 24 }, (_, i) => ({
      option: { ...options[0]!, number: i + 1 },
      x: 100 + (i % 5) * 4,
      y: 120 + i * 7,
    }));
    const stands = [...standOff(places, null, 200, panel)];
    expect(stands).toHaveLength(24);
    for (const [number, { x, y }] of stands) {
      expect(x).toBeGreaterThanOrEqual(panel.left + 12);
      expect(x).toBeLessThanOrEqual(panel.right - 12);
      expect(y).toBeGreaterThanOrEqual(panel.top + 12);
      expect(y).toBeLessThanOrEqual(panel.bottom - 12);
      expect(Math.abs(y - 200)).toBeGreaterThanOrEqual(13);
      for (const [other, at] of stands)
        if (other !== number) {
          expect(Math.hypot(at.x - x, at.y - y)).toBeGreaterThanOrEqual(22);
          const mark = places[other - 1]!;
          expect(Math.hypot(mark.x - x, mark.y - y)).toBeGreaterThanOrEqual(14);
        }
    }
    // Flags do not cross: of two that did, the ends of each would lie on either side of the other.
    const side = (p: Spot, q: Spot, r: Spot): number => (q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x);
    const ends = stands.map(([number, at]) => [places[number - 1]!, at] as const);
    const crossings = ends.flatMap(([a, b], i) =>
      ends
        .slice(i + 1)
        .filter(([c, d]) => side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0),
    );
    expect(crossings).toEqual([]);
  });
});

describe('a long crossing on a narrow sheet', () => {
  const long = { ...site, startM: 0, endM: 1400, lengthM: 1400 };
  const longest = { ...site, startM: 0, endM: 3000, lengthM: 3000 };

  it('sheetIn(site, roomPx) and stackChainage(site, widthPx) keep 1:5000 and take the width that needs', () => {
    for (const roomPx of [1224, 868, 372]) {
      const { scale, widthPx } = sheetIn(long, roomPx);
      expect(scale).toBe(5000);
      expect(widthPx).toBeGreaterThanOrEqual(Math.max(roomPx, 1400 * pxPerMetre(5000)));
      const beside = stackChainage(long, roomPx);
      expect(beside.scale).toBe(5000);
      expect(beside.drawnPx).toBeGreaterThanOrEqual(1400 * pxPerMetre(5000));
      expect(beside.shown.toM - beside.shown.fromM).toBeCloseTo(beside.drawnPx / pxPerMetre(5000), 6);
    }
    // One that a full sheet holds only at a smaller scale is drawn at that.
    for (const roomPx of [1224, 868, 372])
      expect(sheetIn(longest, roomPx).scale).toBe(stackChainage(longest, 1224).scale);
    expect(sheetIn(site, 372).widthPx).toBe(372);
    // On paper nothing is pushed: the sheet is as wide as its room.
    expect(sheetIn(long, 980, false)).toEqual({ scale: 10_000, widthPx: 980 });
    const onPaper = stackChainage(long, 980, undefined, false);
    expect(onPaper.scale).toBe(10_000);
    expect(onPaper.drawnPx).toBeLessThanOrEqual(980);
  });

  it('inRoom(drawing, roomPx, label) is pushed sideways only where it is wider than the room', () => {
    const drawing = sheet(900, 40, 'a drawing', []);
    expect(inRoom(drawing, 900, 'Crossing')).toBe(drawing);
    const pushed = inRoom(drawing, 899, 'Crossing', 'with-bar');
    expect(pushed.children).toEqual([drawing]);
    expect(pushed.attrs).toMatchObject({ class: 'pushed with-bar', tabindex: '0', 'aria-label': 'Crossing' });
  });
});

describe('figures as printed', () => {
  it('fixed(value, places) puts thin spaces into thousands and a true minus in front', () => {
    expect(fixed(1240, 0)).toBe('1\u2009240');
    expect(fixed(-1234567.891, 2)).toBe('\u22121\u2009234\u2009567.89');
    expect(fixed(-0.001, 2)).toBe('0.00');
    expect(fixed(NaN, 2)).toBe('\u2013');
    expect(fixed(Infinity, 0)).toBe('\u2013');
  });
  it('money2(value) keeps two figures and no more', () => {
    expect([9.66, 12.4, 0.881, 99.6, 3412, 9.96, 0].map(money2)).toEqual([
      '9.7',
      '12',
      '0.88',
      '100',
      '3\u2009400',
      '10',
      '0',
    ]);
  });
  it('powers(text) sets the powers of lengths and what stands after a caret, and nothing else', () => {
    expect(powers('flow 1,684.5 m3/s, A 675.6 m2, 350 kg/m2, I 0.4 m4, 80 mm2')).toBe(
      'flow 1,684.5 m³/s, A 675.6 m², 350 kg/m², I 0.4 m⁴, 80 mm²',
    );
    expect(powers('(q^2 / f)^(1/3), 12 m 3 wide, m20, LM2, form2')).toBe(
      '(q² / f)^(1/3), 12 m 3 wide, m20, LM2, form2',
    );
  });

  it('significant(value, 3) rounds a value that gains a digit', () => {
    expect(significant(9.996, 3)).toBe('10.0');
    expect(significant(-0.04567, 2)).toBe('\u22120.046');
  });
  it('plain(value) drops idle zeros', () => {
    expect([7, 11.5, 12.34, 120, 0.5].map(plain)).toEqual(['7', '11.5', '12.3', '120', '0.5']);
  });
  it('odds(share) goes in steps of five and never says 0 or 100', () => {
    expect([0, 0.02, 0.03, 0.5, 0.62, 0.63, 0.97, 0.98, 1].map(odds)).toEqual([
      '<5',
      '<5',
      '5',
      '50',
      '60',
      '65',
      '95',
      '>95',
      '>95',
    ]);
  });
  it('signed, chainage, spansText and listed read as they are said', () => {
    expect([signed(0.2, 1), signed(-1.3, 1), signed(0.01, 1)]).toEqual(['+0.2', '\u22121.3', '0.0']);
    expect([chainage(1240), chainage(1323.5)]).toEqual(['1\u2009240', '1\u2009323.5']);
    expect(spansText([70, 90.5, 70])).toBe('70 + 90.5 + 70');
    expect(spansText([...Array<number>(11).fill(58.5), 272])).toBe('12 spans up to 272');
    expect(listed(['1', '2', '3'])).toBe('1, 2 and 3');
  });
  it('moneyUnit(currency, largest) turns to thousands below a million', () => {
    expect(moneyUnit('EUR', 11.5e6)).toEqual({ per: 1e6, label: 'M€' });
    expect(moneyUnit('CHF', 4e5)).toEqual({ per: 1e3, label: 'kCHF' });
  });
});

describe('axis of costs', () => {
  const twoFigures = (tick: number): boolean => Number(tick.toPrecision(2)) === tick;

  it('marks even steps that two figures can print', () => {
    const costs = [9.1e6, 11.4e6];
    expect(linearAxis(costs, 0, 600, 7).ticks.every(twoFigures)).toBe(false);
    expect(costAxis(costs, 0, 600, 7).ticks).toEqual([10e6, 11e6]);
  });

  it('keeps its marks and the same places where two figures print them already', () => {
    const costs = [21e6, 64e6];
    expect(costAxis(costs, 0, 600, 7).ticks).toEqual(linearAxis(costs, 0, 600, 7).ticks);
    expect(costAxis(costs, 0, 600, 7).x(40e6)).toBe(linearAxis(costs, 0, 600, 7).x(40e6));
  });

  it('marks nothing that is finer than a cost is known', () => {
    for (const costs of [
      [12.31e6, 12.34e6],
      [10.2e6, 10.9e6],
      [980e3, 1.04e6],
    ])
      expect(costAxis(costs, 0, 600, 7).ticks.filter((tick) => !twoFigures(tick))).toEqual([]);
  });
});

describe('scale', () => {
  it('pxPerMetre(scale) draws 1:1000 at a millimetre a metre', () => {
    // CSS defines 96 px as one inch, 25.4 mm (CSS Values and Units 3, section 6.2, from memory).
    expect(pxPerMetre(1000)).toBeCloseTo(96 / 25.4, 10);
    expect(259 * pxPerMetre(1000)).toBeLessThan(980);
  });
  it('largestScale(length, width) takes the largest of the series that fits', () => {
    expect(largestScale(12.5, 640)).toBe(100);
    expect(largestScale(230, 980, 500)).toBe(1000);
    expect(largestScale(260, 980, 500)).toBe(2000);
    expect(largestScale(1400, 980)).toBe(10_000);
    expect(largestScale(9000, 980)).toBe(20_000);
  });
});

describe('forms', () => {
  it.each(formIds)('%s stands out from the sheet by 3 to 1', (form) => {
    // WCAG 2.2, success criterion 1.4.11: graphical objects need 3 : 1.
    expect(contrast(formLooks[form].colour, '#FFFFFF')).toBeGreaterThanOrEqual(3);
  });
  it('contrast(a, b) agrees with black on white, 21 to 1 (WCAG 2.2, definition of contrast ratio)', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 6);
    expect(contrast('#777777', '#FFFFFF')).toBeCloseTo(4.48, 2);
  });
  it('no two forms share colour or hatch', () => {
    expect(new Set(formIds.map((form) => formLooks[form].colour)).size).toBe(formIds.length);
    expect(new Set(formIds.map((form) => JSON.stringify(formLooks[form].hatch))).size).toBe(formIds.length);
  });
  it('tint(colour, part) mixes into white', () => {
    expect([tint('#000000', 0), tint('#000000', 1), tint('#FF0000', 0.5)]).toEqual([
      '#FFFFFF',
      '#000000',
      '#FF8080',
    ]);
  });
});

describe('lettering', () => {
  it('textWidth(text, size) grows with size and weight, and figures are of one width', () => {
    expect(textWidth('111', 10)).toBe(textWidth('888', 10));
    expect(textWidth('bridge', 20)).toBeCloseTo(2 * textWidth('bridge', 10), 10);
    expect(textWidth('bridge', 10, 600)).toBeGreaterThan(textWidth('bridge', 10));
  });
  it('wrapText(text, width, size) breaks between words only', () => {
    expect(wrapText('one two three', 1, 10)).toEqual(['one', 'two', 'three']);
    expect(wrapText('one two three', 1000, 10)).toEqual(['one two three']);
  });
  it('placer chooses the free place and remembers it', () => {
    const room = placer({ left: 0, top: 0, right: 100, bottom: 100 });
    const here = { left: 0, right: 10, top: 0, bottom: 10 };
    const there = { left: 20, right: 30, top: 0, bottom: 10 };
    expect(room.choose([here, there])).toBe(0);
    expect(room.choose([here, there])).toBe(1);
    expect(room.choose([here], 1)).toBe(-1);
  });
});

describe('markup', () => {
  it('toText(piece) escapes what people type', () => {
    expect(toText(el('text', { 'aria-label': 'a "b" <c>' }, '5 < 6 & 7'))).toBe(
      '<text aria-label="a &quot;b&quot; &lt;c&gt;">5 &lt; 6 &amp; 7</text>\n',
    );
  });
  it('el(tag, attrs) leaves out what is not set and rounds to the hundredth', () => {
    expect(
      el('rect', { x: 1.23456, y: -0.001, fill: null, class: undefined, hidden: false, open: true }).attrs,
    ).toEqual({ x: '1.23', y: '0', open: '' });
  });
  it('toSvgFile(piece) states true size in millimetres', () => {
    expect(toSvgFile(el('svg', { width: 960, height: 96 }))).toContain('width="254mm" height="25.4mm"');
  });
});

describe('figures behind charts', () => {
  it('readAt(xs, ys, x) reads straight between and holds outside', () => {
    expect([-1, 0, 0.5, 1, 3].map((x) => readAt([0, 1], [10, 20], x))).toEqual([10, 10, 15, 20, 20]);
    expect(readAt([], [], 1)).toBeNaN();
  });
  it('undominated(points) keeps what nothing beats, ties included', () => {
    const points = [
      { number: 1, x: 1, y: 3 },
      { number: 2, x: 2, y: 2 },
      { number: 3, x: 2, y: 3 },
      { number: 4, x: 2, y: 2 },
    ];
    expect([...undominated(points)]).toEqual([1, 2, 4]);
    expect(edgeOf(points)[0]).toEqual([1, Infinity]);
    expect(edgeOf(points).at(-1)).toEqual([Infinity, 2]);
    expect(dominatedSide([])).toEqual([]);
  });
  it('flatStretch(points) finds the depths within one per cent of a parabola', () => {
    // cost = 100 (1 + (d - 2)^2) is within 1 % of 100 from 1.9 to 2.1.
    const points = Array.from({ length: 201 }, (_, i) => ({
      depthM: 1 + i * 0.01,
      cost: 100 * (1 + (i * 0.01 - 1) ** 2),
    }));
    const [low, high] = flatStretch(points)!;
    expect(low).toBeCloseTo(1.9, 3);
    expect(high).toBeCloseTo(2.1, 3);
    expect(flatStretch([])).toBeNull();
  });
  it('groupOdds(group, standing) names the cheaper of two and the range of more', () => {
    const standing = {
      leader: 1,
      groups: [],
      within: {},
      because: [],
      odds: { 1: { 2: 0.62, 3: 0.7 }, 2: { 1: 0.38, 3: 0.55 }, 3: { 1: 0.3, 2: 0.45 } },
    };
    expect(groupOdds([1, 2], standing)).toBe('60 % that 1 is cheaper');
    expect(groupOdds([1, 2, 3], standing)).toBe('55 to 70 %, either way round');
  });
  it('logTicks(low, high, place) keeps its distance and its round values', () => {
    const ticks = logTicks(8, 22, (value) => 300 * Math.log10(value));
    expect(ticks).toContain(10);
    for (let i = 1; i < ticks.length; i += 1)
      expect(300 * Math.log10(ticks[i]! / ticks[i - 1]!)).toBeGreaterThanOrEqual(15);
  });
});

it('oncePerDepth(points) keeps the cheapest of each depth that prints alike, rising', () => {
  const points = [
    { depthM: 1.6, cost: 9 },
    { depthM: 1.2, cost: 8 },
    { depthM: 1.201, cost: 7 },
    { depthM: 1.2, cost: 8.5 },
  ];
  expect(oncePerDepth(points)).toEqual([
    { depthM: 1.201, cost: 7 },
    { depthM: 1.6, cost: 9 },
  ]);
});

it('depthCurve({points}) and its table name no cost finer than two figures', () => {
  for (const spread of [0.002, 0.02, 0.2, 2]) {
    const points = [2, 2.2, 2.4, 2.6].map((depthM, i) => ({
      depthM,
      cost: 6.147e6 * (1 + (spread * i) / 3),
    }));
    const input = {
      form: 'composite-i',
      points,
      depthM: 2,
      limits: [],
      currency: 'EUR',
      widthPx: 660,
    } as const;
    const text = toText(depthCurve(input));
    expect(text).toContain('% over the least, 6.1 M€ for the crossing');
    const ticks = Array.from(text.matchAll(/text-anchor="end"[^>]*>([\d.]+)</gu), ([, tick]) => Number(tick));
    expect(ticks.length).toBeGreaterThan(2);
    expect(ticks).toEqual(ticks.map((tick) => Number(tick.toPrecision(2))));
    expect(new Set(ticks).size).toBe(ticks.length);
    const { rows } = depthTable(input);
    expect(rows[0]).toEqual([{ text: '2.00' }, { text: '6.1' }, '0.0']);
    expect(rows.at(-1)![2]).toBe((100 * spread).toFixed(1));
  }
});

it('depthCurve({points}) of a narrow band of depth names no two ticks alike', () => {
  const points = [1, 1.1, 1.2, 1.3].map((depthM) => ({ depthM, cost: 2e6 + 1e5 * depthM }));
  const drawn = depthCurve({
    form: 'precast-trough',
    points,
    depthM: 1.1,
    limits: [],
    currency: 'EUR',
    widthPx: 660,
  });
  const ticks = Array.from(
    toText(drawn).matchAll(/text-anchor="middle"[^>]*>(\d\.\d+)</gu),
    ([, text]) => text,
  );
  expect(ticks.length).toBeGreaterThan(3);
  // The depth now is named once more at its mark.
  expect(ticks.length - new Set(ticks).size).toBeLessThanOrEqual(1);
});
