import { level } from '../format.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import type { Design, SectionCut } from '../model.ts';
import type { Asked } from './asked.ts';
import { dimensionChain, uprightDimension } from './dimension.ts';
import type { Paper } from './ink.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import type { Scale } from './scale.ts';
import { largestScale, pxPerMetre } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
import type { SectionPlace } from './sectionCut.ts';
import { cutPiece, cutsShown } from './sectionCut.ts';
import { extentOf, lowestOf, structureOf, webPlaces } from './sectionGeometry.ts';
import { sheet } from './sheet.ts';

/** Words on a leader to a point of the section. */
interface Callout {
  readonly xM: number;
  readonly zM: number;
  readonly words: string;
}

export interface SectionInput {
  readonly design: Design;
  /** Its path, e.g. 'options/1/designs/0'. */
  readonly path?: string;
  readonly widthPx: number;
  readonly scale?: Scale;
  /** One cut or view by its name, e.g. 'pylon'; otherwise the deck, in halves where it is deeper at its piers. */
  readonly at?: string;
  readonly callouts?: readonly Callout[];
  readonly paper?: Paper;
  readonly bar?: boolean;
  readonly prefix?: string;
}

/** An upright dimension at the right of a section: from one height to another, m, with its words. */
interface Height {
  readonly fromM: number;
  readonly toM: number;
  readonly words: string;
  readonly asked: Asked;
}

/** The depth of a design that is drawn, where it is one of the two it was sized with. */
function depthPath({ design, path }: SectionInput, depthM: number): Asked {
  const where = (['midspan', 'support'] as const).find(
    (one) => Math.abs(design.depthM[one] - depthM) < 0.005,
  );
  return path === undefined || where === undefined ? undefined : `${path}/depthM/${where}`;
}

/** Structural depth at each cut, and the whole height where members stand above the road. */
function heights(input: SectionInput, left: SectionCut, right: SectionCut | null): Height[] {
  const depth = (cut: SectionCut, at: string): Height => {
    const low = lowestOf(cut.shapes);
    return { fromM: 0, toM: low, words: `${level(-low)}${at}`, asked: depthPath(input, -low) };
  };
  const out =
    right === null ? [depth(left, '')] : [depth(right, ` at ${right.at}`), depth(left, ` at ${left.at}`)];
  const whole = extentOf(structureOf(left.shapes));
  if (whole.top > 1.6)
    out.push({
      fromM: whole.top,
      toM: whole.bottom,
      words: `${level(whole.top - whole.bottom)} high`,
      asked: undefined,
    });
  return out;
}

/** Cross-section of one unit to scale with its dimensions. Halves are named. */
export function section(input: SectionInput): Piece {
  const { design, widthPx } = input;
  const prefix = input.prefix ?? 'section';
  const cuts = cutsShown(design, input.at);
  const ink = formInk(input.paper ?? 'colour', [design.task.form], prefix);
  const name = `Cross-section, ${formLooks[design.task.form].short.toLowerCase()}`;
  if (cuts === null)
    return sheet(widthPx, 24, `${name}: not drawn`, [
      label(0, 16, 'No section has been worked out.', { fill: colours.second, size: letters.table }),
    ]);
  const extent = extentOf([...cuts.left.shapes, ...(cuts.right?.shapes ?? [])]);
  const { widthM } = design.task.deck;
  const dimensions = heights(input, cuts.left, cuts.right);
  // Each upright stands clear of the words of the one before.
  const steps = dimensions.map(({ words }) => textWidth(words, letters.drawing) + 18);
  const rightRoom = 22 + steps.reduce((sum, one) => sum + one, 0);
  const reach = Math.max(extent.right, -extent.left, widthM / 2);
  const scale = input.scale ?? largestScale(2 * reach, widthPx - rightRoom - 8);
  const ppm = pxPerMetre(scale);
  const topY = 40;
  const centre = reach * ppm + 4;
  const place: SectionPlace = {
    ppm,
    x: (xM) => centre + xM * ppm,
    y: (zM) => topY + (extent.top - zM) * ppm,
  };
  const bottomY = place.y(extent.bottom);
  const halfAt = `half at ${cuts.left.at}`;
  /** Between the names of the halves; where a half is narrower than its name, they stand a little to the right. */
  const halvesX = Math.max(place.x(0), textWidth(halfAt, letters.drawing) + 10);
  const webs = webPlaces(cuts.left.shapes);
  const edges = [
    ...(webs.some((x) => Math.abs(x) > widthM / 2) ? [] : [-widthM / 2]),
    ...webs,
    ...(webs.some((x) => Math.abs(x) > widthM / 2) ? [] : [widthM / 2]),
  ].filter((x, index, list) => index === 0 || x - (list[index - 1] ?? x) > 0.02);
  const chained = edges.length > 1 && webs.length > 0;
  const chainY = bottomY + 34;
  const uprightX = dimensions.map(
    (_, index) => place.x(reach) + 20 + steps.slice(0, index).reduce((sum, one) => sum + one, 0),
  );
  const barY = (chained ? chainY : bottomY) + 36;
  const extensions = [
    ...dimensions.flatMap(({ fromM, toM }, index) =>
      [fromM, toM]
        .filter((z) => z !== 0)
        .map((z) => `M${num(place.x(0) + 36)},${num(place.y(z))}H${num((uprightX[index] ?? 0) + 4)}`),
    ),
    ...(chained ? edges.map((x) => `M${num(place.x(x))},${num(bottomY + 6)}V${num(chainY + 4)}`) : []),
  ].join('');
  const spoken = `${name}, ${level(widthM)} m wide, ${dimensions.map(({ words }) => words).join(', ')}, 1 to ${String(scale)}`;
  // No wider than it needs, so that checks or figures can stand beside it.
  const width = Math.max(2 * reach * ppm + 8 + rightRoom, 330);
  return sheet(width, input.bar === false ? barY - 20 : barY + 12, spoken, [
    ink.defs.length > 0 && el('defs', {}, ink.defs),
    el('path', { d: extensions, stroke: colours.rule, 'stroke-width': pens.fine, fill: 'none' }),
    cutPiece(design, place, ink, prefix, topY, bottomY, input.at),
    cuts.right !== null && [
      label(halvesX - 10, topY - 6, halfAt, { anchor: 'end', fill: colours.second, halo: true }),
      label(halvesX + 10, topY - 6, `half at ${cuts.right.at}`, { fill: colours.second, halo: true }),
    ],
    dimensionChain([place.x(-widthM / 2), place.x(widthM / 2)], 16, [level(widthM)], {
      weight: 600,
      size: letters.table,
      asked: [input.path === undefined ? undefined : `${input.path}/task/deck/widthM`],
    }),
    dimensions.map(({ fromM, toM, words, asked }, index) =>
      uprightDimension(uprightX[index] ?? 0, place.y(fromM), place.y(toM), words, { asked }),
    ),
    chained &&
      dimensionChain(
        edges.map(place.x),
        chainY,
        edges
          .slice(1)
          .map((x, index) => ((x - (edges[index] ?? x)) * ppm > 26 ? level(x - (edges[index] ?? x)) : '')),
      ),
    (input.callouts ?? []).map(({ xM, zM, words }) => {
      const x = place.x(xM);
      const y = place.y(zM);
      return g(
        {},
        el('path', {
          d: `M${num(x)},${num(y)}l10,14h8`,
          stroke: colours.ink,
          'stroke-width': pens.fine,
          fill: 'none',
        }),
        el('circle', { cx: x, cy: y, r: 1.6 }),
        label(x + 21, y + 18, words, { halo: true }),
      );
    }),
    input.bar !== false &&
      scaleBar(scale, Math.max(8, place.x(-widthM / 2)), barY - 4, {
        heights: false,
        widthPx: Math.max(120, widthM * ppm),
        rightPx: width,
      }),
  ]);
}
