import { level } from '../format.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import { optionNumber } from '../forms/optionNumber.ts';
import type { AppraisedOption, Design } from '../model.ts';
import { ofOption } from './asked.ts';
import type { Paper } from './ink.ts';
import { onWalls } from './optionWords.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { wrapText } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import type { Scale } from './scale.ts';
import { pxPerMetre } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
import type { SectionPlace } from './sectionCut.ts';
import { cutPiece, cutsShown } from './sectionCut.ts';
import type { Extent } from './sectionGeometry.ts';
import { extentOf } from './sectionGeometry.ts';
import { sheet } from './sheet.ts';

export interface SectionRowInput {
  readonly options: readonly AppraisedOption[];
  readonly reference: number | null;
  readonly widthPx: number;
  readonly scale?: Scale;
  /** Two or three short lines under each section; depths where left out. */
  readonly words?: Readonly<Record<number, readonly string[]>>;
  readonly paper?: Paper;
  readonly prefix?: string;
}

interface Drawn {
  readonly option: AppraisedOption;
  readonly design: Design;
  readonly extent: Extent;
}

const mainIndex = (option: AppraisedOption): number =>
  Math.max(
    0,
    option.units.findIndex((unit, index) => unit.role === 'main' && option.designs[index] !== undefined),
  );

/** Design of the main unit of an option. */
export const mainDesign = (option: AppraisedOption): Design | undefined => option.designs[mainIndex(option)];

/** Path of that design. */
export const mainDesignPath = (option: AppraisedOption): string =>
  ofOption(option, `designs/${String(mainIndex(option))}`);

/** The depths of the lines under a section. */
const depthPaths = (option: AppraisedOption, { depthM }: Design): string[] =>
  (depthM.support > depthM.midspan + 0.05 ? ['support', 'midspan'] : ['midspan']).map(
    (where) => `${mainDesignPath(option)}/depthM/${where}`,
  );

function depthLines(design: Design): string[] {
  const { support, midspan } = design.depthM;
  return support > midspan + 0.05
    ? [`${level(support)} at ${onWalls([design]) ? 'wall' : 'pier'}, ${level(midspan)} at midspan`]
    : [`${level(midspan)} m deep`];
}

/** Sections of several options side by side on one road level and one scale; in as many rows as the width asks for. */
export function sectionRow(input: SectionRowInput): Piece {
  const { options, widthPx } = input;
  const prefix = input.prefix ?? 'sections';
  const ink = formInk(
    input.paper ?? 'colour',
    options.map((option) => option.form),
    prefix,
  );
  const drawn = options.flatMap((option): Drawn[] => {
    const design = mainDesign(option);
    const cuts = design === undefined ? null : cutsShown(design);
    return design === undefined || cuts === null
      ? []
      : [{ option, design, extent: extentOf([...cuts.left.shapes, ...(cuts.right?.shapes ?? [])]) }];
  });
  const scale = input.scale ?? 250;
  const ppm = pxPerMetre(scale);
  const widest = Math.max(...drawn.map(({ extent }) => extent.right - extent.left), 1) * ppm + 22;
  const most = Math.max(1, Math.floor(widthPx / widest));
  // Rows are filled evenly: six sections that do not fit into one row stand three and three.
  const perLine = Math.ceil(drawn.length / Math.ceil(drawn.length / most)) || 1;
  const column = widthPx / perLine;
  const linesOf = ({ option, design }: Drawn): string[] =>
    (input.words?.[option.number] ?? [formLooks[option.form].short, ...depthLines(design)]).flatMap((text) =>
      wrapText(text, column - 34, letters.table),
    );
  let y = 0;
  const rows: Piece[] = [];
  for (let from = 0; from < drawn.length; from += perLine) {
    const group = drawn.slice(from, from + perLine);
    const top = Math.max(...group.map(({ extent }) => extent.top), 1.4);
    const bottom = Math.min(...group.map(({ extent }) => extent.bottom), -1);
    const road = y + top * ppm + 10;
    const foot = road - bottom * ppm + 26;
    rows.push(
      g(
        {},
        el('path', {
          d: `M0,${num(road)}H${num(widthPx)}`,
          stroke: colours.rule,
          'stroke-width': pens.fine,
          'stroke-dasharray': '9 2.4 1.6 2.4',
        }),
        group.map((one, index) => {
          const { option, design, extent } = one;
          const left = index * column;
          const centre = left + Math.max(extent.right, -extent.left) * ppm + 4;
          const place: SectionPlace = { ppm, x: (xM) => centre + xM * ppm, y: (zM) => road - zM * ppm };
          const filled = option.number === input.reference;
          return g(
            { class: 'one' },
            cutPiece(
              design,
              place,
              ink,
              `${prefix}-${String(option.number)}`,
              road - extent.top * ppm,
              road - extent.bottom * ppm,
            ),
            optionNumber(option.number, left + 10, foot, {
              colour: filled ? ink.accent : ink.line(option.form),
              filled,
            }),
            linesOf(one).map((text, at) =>
              label(left + 27, foot + 4.5 + at * 16, text, {
                size: letters.table,
                fill: at === 0 ? colours.ink : colours.second,
                figure: input.words?.[option.number] === undefined ? depthPaths(option, design) : undefined,
              }),
            ),
          );
        }),
      ),
    );
    y = foot + Math.max(1, ...group.map((one) => linesOf(one).length)) * 16 + 18;
  }
  return sheet(
    widthPx,
    y + (widthPx < 480 ? 40 : 26),
    `Cross-sections of ${String(drawn.length)} options on one road level, 1 to ${String(scale)}`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      rows,
      scaleBar(scale, 8, y + 12, { heights: false, what: 'sections', widthPx: 320, rightPx: widthPx }),
    ],
  );
}
