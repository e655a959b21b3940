import { describe, expect, it } from 'vitest';
import { keyLine } from '../../notebooks/drawing/keyLine.ts';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { stationLine } from '../../notebooks/drawing/stationLine.ts';

const all = (piece: Piece): Piece[] => [
  piece,
  ...piece.children.flatMap((child) => (typeof child === 'string' ? [] : all(child))),
];
const texts = (piece: Piece): string[] =>
  all(piece).flatMap(({ tag, children }) =>
    tag === 'text' ? children.flatMap((child) => (typeof child === 'string' ? child.trim() : [])) : [],
  );
const marks = [
  { name: '1', y: 100, post: true },
  { name: '1+010', y: 140 },
  { name: '1+020', y: 400 },
  { name: '2', y: 700, post: true },
  { name: '2+010', y: 760 },
  { name: '2+020', y: 1900 },
  { name: '2+030', y: 2100 },
];
const input = { heightPx: 2400, marks };
const joined = { at: '1+020', uses: ['1+010'], usedBy: ['2+010', '2+020', '2+030'] };
const curves = (piece: Piece): Piece[] => all(piece).filter(({ attrs }) => attrs['d']?.includes('C'));

describe('stationLine', () => {
  it.each([
    [200, 29],
    [600, 51],
    [1200, 84],
    [5000, 84],
  ])(
    'stationLine stands a span of %d px off the line by 18 px and 0.055 of it, at most 84: %d px',
    (length, off) => {
      const far = [
        { name: '1+010', y: 0 },
        { name: '9+010', y: length },
      ];
      const piece = stationLine({
        heightPx: length + 100,
        marks: far,
        joined: { at: '9+010', uses: ['1+010'], usedBy: [] },
      });
      const [, handle] = /C(-?[\d.]+),/u.exec(curves(piece)[0]?.attrs['d'] ?? '') ?? [];
      // The middle of a cubic curve stands three quarters of the way to its handles.
      expect(Math.abs(0.75 * (112 - Number(handle)) - off)).toBeLessThan(0.35);
    },
  );

  it('stationLine(joined) draws full spans to bearings and dashed ones to rollers, and a dot at the cell', () => {
    const piece = stationLine({ ...input, joined });
    const dashed = curves(piece).filter(({ attrs }) => attrs['stroke-dasharray'] !== undefined);
    expect(curves(piece)).toHaveLength(4);
    expect(dashed).toHaveLength(3);
    const circles = all(piece).filter(({ tag }) => tag === 'circle');
    expect(circles.map(({ attrs }) => Number(attrs['cy']))).toEqual([760, 1900, 2100, 400]);
    expect(texts(piece)).toEqual([]);
  });

  it('stationLine(view) ends spans that leave the screen in one line with words', () => {
    const piece = stationLine({ ...input, joined, view: { top: 300, bottom: 1000 } });
    expect(texts(piece)).toEqual(['from 1+010', 'to 2+020, 1\u00a0more']);
    expect(curves(piece)).toHaveLength(3);
  });

  it('stationLine(view) tells spans that leave over the top from those that leave below', () => {
    const up = { at: '2+010', uses: ['1+010'], usedBy: ['1+020', '2+030'] };
    const piece = stationLine({ ...input, joined: up, view: { top: 600, bottom: 1000 } });
    expect(texts(piece)).toEqual(['from 1+010', 'to 1+020', 'to 2+030']);
    const heights = all(piece)
      .filter(({ tag }) => tag === 'text')
      .map(({ attrs }) => Number(attrs['y']));
    expect(heights).toEqual([614, 627, 992]);
  });

  it('stationLine(lineX) of a narrow band sets those words on two lines', () => {
    const piece = stationLine({ ...input, joined, view: { top: 0, bottom: 1000 }, lineX: 60 });
    expect(texts(piece)).toEqual(['to 2+020,', '1\u00a0more']);
  });

  it('stationLine keeps every span between the edge of the sheet and its line', () => {
    for (const lineX of [112, 60, 13]) {
      for (const curve of curves(stationLine({ ...input, joined, lineX }))) {
        // The middle of a cubic curve stands three quarters of the way to its handles.
        const [, handle] = /C(-?[\d.]+),/u.exec(curve.attrs['d'] ?? '') ?? [];
        expect(lineX - 0.75 * (lineX - Number(handle))).toBeGreaterThanOrEqual(0);
      }
    }
  });

  it('stationLine(marks) dashes the line below a change, breaks it at a failure and dots it below', () => {
    const states = stationLine({
      ...input,
      marks: [
        { name: '1+010', y: 100 },
        { name: '1+020', y: 200, state: 'pending' },
        { name: '1+030', y: 300, state: 'failed' },
        { name: '1+040', y: 400, state: 'held' },
      ],
    });
    const stretches = all(states).filter(({ attrs }) => attrs['stroke-width'] === '1.35');
    const isBreak = ({ attrs }: Piece): boolean => attrs['d']?.includes('l-6,4l12,6l-6,4') === true;
    expect(
      stretches.map((stretch) => (isBreak(stretch) ? 'break' : stretch.attrs['stroke-dasharray'])),
    ).toEqual([undefined, '5 4', undefined, 'break', '1.4 3.2', '1.4 3.2']);
  });

  it('stationLine(marks) stays dotted past the post of a section between two stations that are held', () => {
    const held = stationLine({
      ...input,
      marks: [
        { name: '1+010', y: 100 },
        { name: '1+020', y: 200, state: 'held' },
        { name: '2', y: 300, post: true },
        { name: '2+010', y: 400, state: 'held' },
        { name: '3', y: 500, post: true },
        { name: '3+010', y: 600, state: 'done' },
      ],
    });
    const dashes = all(held)
      .filter(({ attrs }) => attrs['stroke-width'] === '1.35')
      .map(({ attrs }) => attrs['stroke-dasharray']);
    const dotted = '1.4 3.2';
    expect(dashes).toEqual([undefined, dotted, dotted, dotted, dotted, undefined, undefined]);
  });
});

describe('keyLine', () => {
  const sections = ['Brief', 'What can span it', 'Arrangements', 'What would change the answer'].map(
    (name, i) => ({ number: i + 1, name, href: `#s${i + 1}`, stations: [`${i + 1}+010`, `${i + 1}+020`] }),
  );
  const posts = (piece: Piece): number[] =>
    all(piece)
      .filter(({ attrs }) => attrs['class'] === 'post')
      .map((post) => Number(/^M([\d.]+)/u.exec(all(post)[2]?.attrs['d'] ?? '')?.[1]));

  it('keyLine names every post, and its sections are as wide as their names', () => {
    const piece = keyLine({ sections, widthPx: 980 });
    expect(texts(piece)).toEqual(sections.flatMap(({ number, name }) => [String(number), name]));
    const [a = 0, b = 0, c = 0, d = 0] = posts(piece);
    expect(b - a).toBeLessThan(c - b);
    expect(d - c).toBeLessThan(980 - d);
  });

  it('keyLine breaks names onto lines where room is short, and drops them where there is none', () => {
    const narrow = texts(keyLine({ sections, widthPx: 380 }));
    expect(narrow).toContain('What can');
    expect(narrow).toContain('span it');
    expect(texts(keyLine({ sections, widthPx: 120 }))).toEqual(['1', '2', '3', '4']);
  });

  it('keyLine(joined) stands the spans on the line, all of them whole', () => {
    const piece = keyLine({
      sections,
      widthPx: 980,
      joined: { at: '2+010', uses: ['1+010'], usedBy: ['3+010', '4+020'] },
    });
    const drawn = curves(piece).map(({ attrs }) => (attrs['d'] ?? '').split('C').length - 1);
    expect(drawn).toEqual([1, 2]);
  });
});
