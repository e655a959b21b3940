import { expect } from 'vitest';
import {
  constructionDepth,
  roadLevelAt,
  type AppraisedOption,
  type Foundation,
  type Site,
} from '../../../lib/index.ts';
import { measureElevation, spansMeasured, type ElevationMarks } from './elevationMarks.ts';
import { barScale, readPaper, type Paper } from './paper.ts';
import type { Node } from './svg.ts';
import { depthOf, designsAt } from './workedDepth.ts';

/**
 * How far a reading may lie off, px. Coordinates are written to the hundredth: each end of a reading may be half of that
 * off, and the datum as well; a curve of the road is drawn in straight strokes that leave it by no more than a fiftieth.
 */
export const READING_PX = 0.02 + 0.02;
/** Members thinner than the thinnest pen are drawn as thick as the pen (0.25 mm, which is 0.95 px). */
export const HALF_PEN_PX = 0.95 / 2;
/** The scale bar is a few hundred pixels long, and its ends are written to the hundredth. */
const BAR_SHARE = 1e-4;

/** A reading in metres must come within so many pixels of what was worked out. */
export function near(paper: Paper, what: string, measuredM: number, workedM: number, px = READING_PX): void {
  const off = Math.abs(measuredM - workedM) * paper.pxPerM;
  expect
    .soft(off, `${what}: measured ${measuredM.toFixed(3)}, worked out ${workedM.toFixed(3)} m`)
    .toBeLessThanOrEqual(px);
}

/** Chainages of the supports of an option by its units, m. */
export const chainagesOf = ({ units }: AppraisedOption): number[] =>
  units
    .flatMap(({ supportsM }) => supportsM)
    .sort((a, b) => a - b)
    .filter((at, i, all) => i === 0 || at - all[i - 1]! > 0.05);

const likeliest = (foundations: readonly Foundation[]): Foundation | undefined =>
  foundations.toSorted((a, b) => b.odds - a.odds)[0];

/** Spans, road, underside and founding of an option, measured in its drawing. */
export function measureOption(svg: Node, site: Site, option: AppraisedOption): void {
  const paper = readPaper(svg);
  const marks = measureElevation(svg);
  const name = `option ${String(option.number)}, ${option.form}, 1:${String(paper.scale)}`;
  expect(Math.abs(barScale(svg) / paper.pxPerM - 1), `${name}: scale bar`).toBeLessThan(BAR_SHARE);
  const at = chainagesOf(option);
  expect(marks.supports.length, `${name}: supports`).toBe(at.length);
  spansMeasured(marks, paper).forEach((span, i) =>
    near(paper, `${name}: span ${String(i + 1)}`, span, at[i + 1]! - at[i]!),
  );

  const across = (chainageM: number): number => marks.supports[0]!.x + (chainageM - at[0]!) * paper.pxPerM;
  const middles = at.slice(1).map((x, i) => (x + at[i]!) / 2);
  const quarters = at.slice(1).map((x, i) => at[i]! + 0.27 * (x - at[i]!));
  let chordM = -Infinity;
  for (const chainageM of [...at, ...middles, ...quarters]) {
    const where = `${name}: at ${chainageM.toFixed(1)}`;
    const roadM = paper.levelM(marks.roadAt(across(chainageM)));
    near(paper, `${where}, road`, roadM, roadLevelAt(option.profile, chainageM));
    const depthM = depthOf(option, chainageM);
    const underM = roadM - paper.levelM(marks.undersideAt(across(chainageM))) - site.deck.surfacingM;
    const over = designsAt(option, chainageM);
    // Within a wall in one with the deck no underside shows, and a truss shows its chord, which is no deeper than its floor.
    const isWall = at.includes(chainageM) && over.some(({ walls }) => walls !== undefined);
    const isTruss = over.some(({ task }) => task.form === 'truss');
    if (isTruss && over.length === 1) chordM = Math.max(chordM, underM);
    if (!isWall && (!isTruss || underM > depthM))
      near(paper, `${where}, depth of the deck's face`, underM, depthM, READING_PX + HALF_PEN_PX);
    // Small scales show decks solid, without the line of the soffit.
    if (paper.scale >= 2000) continue;
    const soffitM = roadM - paper.levelM(marks.soffitAt(across(chainageM))) - site.deck.surfacingM;
    near(paper, `${where}, structure`, soffitM, depthM);
  }
  const trusses = option.designs.filter(({ task }) => task.form === 'truss');
  if (chordM > -Infinity)
    near(paper, `${name}: foot of the chord`, chordM, trusses[0]!.depthM.midspan, READING_PX + HALF_PEN_PX);
  if (paper.scale < 2000) measureFounding(paper, marks, option, name);
}

/** Footings and piles on the likeliest ground of each support. */
function measureFounding(paper: Paper, marks: ElevationMarks, option: AppraisedOption, name: string): void {
  option.supports.forEach(({ foundations }, i) => {
    const foundation = likeliest(foundations);
    if (foundation === undefined) return;
    const { footing, piles } = foundation;
    const { footing: drawn, toe } = marks.supports[i]!;
    const where = `${name}: support ${String(i + 1)}`;
    expect(drawn, `${where} has a footing`).not.toBeNull();
    near(paper, `${where}, top of footing`, paper.levelM(drawn!.top), footing.topLevelM);
    near(paper, `${where}, founding`, paper.levelM(drawn!.bottom), footing.topLevelM - footing.depthM);
    near(paper, `${where}, length of footing`, (drawn!.right - drawn!.left) / paper.pxPerM, footing.lengthM);
    if (toe !== null) near(paper, `${where}, pile toes`, paper.levelM(toe), piles?.toeLevelM ?? NaN);
  });
}

/** Least of what is spare over an envelope as it is worked out, m: at its ends and at every bend of the depth between. */
export function spareWorkedOut(
  site: Site,
  option: AppraisedOption,
  fromM: number,
  toM: number,
  levelM: number,
): number {
  const bends = option.designs.flatMap(({ depthAlong }, u) =>
    depthAlong.xM.map((x) => x + option.units[u]!.supportsM[0]!),
  );
  const places = [fromM, toM, ...bends.filter((x) => x > fromM && x < toM)];
  return Math.min(
    ...places.map(
      (x) => roadLevelAt(option.profile, x) - constructionDepth(site.deck, depthOf(option, x)) - levelM,
    ),
  );
}
