import { describe, expect, it } from 'vitest';
import { costIntervals } from '../../notebooks/charts/costIntervals.ts';
import { crossing } from '../../notebooks/drawing/crossing.ts';
import { pens } from '../../notebooks/drawing/ink.ts';
import { textWidth } from '../../notebooks/drawing/lettering.ts';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { toSvgFile } from '../../notebooks/drawing/toText.ts';
import { exampleNames } from '../../notebooks/exampleNames.ts';
import { example } from './measuring/crossings.ts';
import { boxOf, having, readSvg, within, type Node } from './measuring/svg.ts';

/** Size of the lettering of a drawing; capitals are 0.7 of it. */
const LETTERING_PX = 11;

const file = (piece: Piece): Node => readSvg(toSvgFile(piece));

describe('figures of envelopes', { timeout: 120_000 }, () => {
  it.each(exampleNames)('keep off the piers and walls of every option of %s', (name) => {
    const { study, appraisal } = example(name);
    const { site, options } = appraisal;
    for (const option of options) {
      for (const widthPx of [760, 980, 1224]) {
        const svg = file(crossing({ site, option, obstacles: study.brief.obstacles, widthPx }));
        const standing = [...within(svg)]
          .filter(({ attrs }) => /^(?:shaft|abutment|.*wall)$/u.test(attrs['data-part'] ?? ''))
          .map(boxOf);
        expect(standing.length).toBeGreaterThan(0);
        const [envelopes] = having(svg, 'class', 'clearances');
        for (const { tag, text, attrs } of envelopes === undefined ? [] : within(envelopes)) {
          if (tag !== 'text') continue;
          const wide = textWidth(text, LETTERING_PX);
          const before = { middle: wide / 2, end: wide }[attrs['text-anchor'] ?? ''] ?? 0;
          const [left, foot] = [Number(attrs['x']) - before, Number(attrs['y'])];
          const struck = standing.filter(
            (one) =>
              one.left < left + wide &&
              one.right > left &&
              one.top < foot &&
              one.bottom > foot - 0.7 * LETTERING_PX,
          );
          expect(struck, `option ${String(option.number)} at ${String(widthPx)} px, ${text}`).toEqual([]);
        }
      }
    }
  });
});

describe('costIntervals(input)', { timeout: 120_000 }, () => {
  it.each(exampleNames)('writes no cost across the line of the budget of %s', (name) => {
    const { study, appraisal } = example(name);
    const { options, standing } = appraisal;
    const budget = study.brief.budget === 'unknown' ? null : study.brief.budget.amount;
    for (const widthPx of [380, 760, 980]) {
      const svg = file(
        costIntervals({ options, standing, budget, currency: 'EUR', reference: null, widthPx }),
      );
      const limit = [...within(svg)].filter(
        ({ tag, attrs }) => tag === 'path' && attrs['stroke-width'] === String(pens.heavy),
      );
      expect(limit).toHaveLength(1);
      const at = boxOf(limit[0]!).left;
      const costs = [...within(svg)].filter(({ attrs }) => /\/cost\/p\d0$/u.test(attrs['data-figure'] ?? ''));
      expect(costs).toHaveLength(3 * options.length);
      const across = costs.filter(({ text, attrs }) => {
        const wide = textWidth(text, Number(attrs['font-size'] ?? LETTERING_PX));
        const before = { middle: wide / 2, end: wide }[attrs['text-anchor'] ?? ''] ?? 0;
        const left = Number(attrs['x']) - before;
        return left < at && left + wide > at;
      });
      expect(across.map(({ text }) => text)).toEqual([]);
    }
  });
});
