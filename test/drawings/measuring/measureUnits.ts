import { expect } from 'vitest';
import type { AppraisedOption } from '../../../lib/index.ts';
import { section } from '../../../notebooks/drawing/section.ts';
import { toSvgFile } from '../../../notebooks/drawing/toText.ts';
import { HALF_PEN_PX, READING_PX } from './measureOption.ts';
import { barScale, saidScale } from './paper.ts';
import { measureSection } from './sectionMarks.ts';
import { readSvg } from './svg.ts';
import { depthOfUnit } from './workedDepth.ts';

/** Deck, carriageway and depth of the units of an option whose form is wanted, measured in their sections. */
export function measureUnits(option: AppraisedOption, isWanted: (form: string) => boolean): void {
  option.designs.forEach((design) => {
    const { form, deck } = design.task;
    if (!isWanted(form)) return;
    const svg = readSvg(toSvgFile(section({ design, widthPx: 900 })));
    const { pxPerM } = saidScale(svg);
    expect(Math.abs(barScale(svg) / pxPerM - 1)).toBeLessThan(3e-4);
    const marks = measureSection(svg);
    const name = `option ${String(option.number)}, ${form}`;
    const near = (what: string, measured: number, workedOut: number, px: number): void =>
      expect
        .soft(
          Math.abs(measured - workedOut) * pxPerM,
          `${name}, ${what}: measured ${measured.toFixed(3)}, worked out ${workedOut.toFixed(3)} m`,
        )
        .toBeLessThanOrEqual(px);
    near('width', marks.widthM, deck.widthM, READING_PX);
    const carriageway = marks.surfaced.reduce((sum, [from, to]) => sum + to - from, 0);
    near('carriageway', carriageway, deck.carriagewayM, READING_PX);
    const [from = NaN] = marks.surfaced[0] ?? [];
    const to = marks.surfaced.at(-1)?.[1] ?? NaN;
    near('middle of the carriageway', (from + to) / 2 - deck.widthM / 2, deck.carriagewayOffsetM, READING_PX);
    const depths = Object.entries(marks.depthM);
    expect(depths.length, name).toBeGreaterThan(0);
    for (const [at, depthM] of depths) {
      const { xM } = design.sections.find((cut) => cut.at === at)!;
      near(`depth at ${at}`, depthM, depthOfUnit(design, xM), READING_PX + HALF_PEN_PX);
    }
    const least = Math.min(...depths.map(([, depthM]) => depthM));
    near('least depth', least, design.depthM.midspan, READING_PX + HALF_PEN_PX);
    expect(marks.words, name).toContain(deck.widthM.toFixed(2));
  });
}
