import { describe, expect, it } from 'vitest';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { figureScale, STEP_PX } from '../../notebooks/page/figureScale.ts';

const texts = (piece: Piece): string[] =>
  piece.children.flatMap((child) =>
    typeof child === 'string' ? (piece.tag === 'text' ? [child] : []) : texts(child),
  );
const all = (piece: Piece): Piece[] => [
  piece,
  ...piece.children.flatMap((child) => (typeof child === 'string' ? [] : all(child))),
];
const rules = { places: 1, unit: 'm' };

describe('figureScale', () => {
  it('figureScale writes a figure at every fifth step and the value before', () => {
    const scale = figureScale({ before: 60, now: 62, step: 1, rules });
    expect(texts(scale)).toEqual(['55', '60', '65', 'was 60.0']);
  });

  it('figureScale sets the solid pointer as far from the open one as the value has moved', () => {
    const scale = figureScale({ before: 60, now: 62.5, step: 1, rules });
    const [open, solid] = all(scale).filter(({ attrs }) => attrs['d']?.endsWith('h7.6Z'));
    expect(open?.attrs['d']).toMatch(/^M0,/u);
    expect(solid?.attrs['d']).toMatch(new RegExp(`^M${2.5 * STEP_PX},`, 'u'));
    expect(open?.attrs['fill']).not.toBe(solid?.attrs['fill']);
  });

  it('figureScale stops at a limit with a tick in the accent and draws nothing beyond', () => {
    const scale = figureScale({ before: 2.3, now: 2.3, step: 0.1, rules: { ...rules, min: { value: 2 } } });
    const limits = all(scale).filter(({ attrs }) => attrs['stroke-width'] === '2.65');
    expect(limits).toHaveLength(1);
    expect(limits[0]?.attrs['d']).toMatch(new RegExp(`^M${-3 * STEP_PX},`, 'u'));
    expect(texts(scale)).toEqual(['2.0', '2.5', '3.0']);
  });

  it('figureScale says what happens at a mark, and leaves out marks off the scale', () => {
    const marks = [
      { value: 64.6, words: 'option 1 drops out' },
      { value: 90, words: 'option 2 drops out' },
    ];
    const said = texts(figureScale({ before: 60, now: 60, step: 1, rules, marks }));
    expect(said).toContain('64.6: option 1 drops out');
    expect(said.some((words) => words.includes('option 2'))).toBe(false);
  });
});
