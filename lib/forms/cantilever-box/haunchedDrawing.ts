import type { SectionCut, Shape } from '../../model/index.ts';
import { constantDepth, type DepthAlong } from '../common/depthAlong.ts';
import { deckFace, soffitLine, upright } from '../common/elevation.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { cutOf, underSlabAlong, underSlabOf } from '../concrete-box/boxDrawing.ts';
import { cantileverData } from './cantileverData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { SizedHaunched } from './sizeHaunched.ts';

/** Depth along the deck at the stations of its beam. */
export function haunchedDepth(model: CantileverModel): DepthAlong {
  return { xM: Array.from(model.beam.xM), depthM: Array.from(model.depthM) };
}

/** The unit from the side: deck face, bottom slab, edge of the overhang; segment joints, diaphragms and tendons faint. */
export function haunchedElevation(model: CantileverModel, box: SizedHaunched): Shape[] {
  const { lengthM, layout, supportsM } = model;
  const depth = haunchedDepth(model);
  const { pierM, endM } = boxData.diaphragm;
  const last = supportsM.length - 1;
  const shapes: Shape[] = [
    deckFace('deck', 'concrete', depth),
    {
      part: 'top of the bottom slab',
      material: 'concrete',
      kind: 'line',
      points: depth.xM.map((x, i): [number, number] => [x, -depth.depthM[i]! + box.sections.bottomM[i]!]),
      thicknessM: 0.02,
      faint: true,
    },
    soffitLine('edge of the overhang', 'concrete', constantDepth(lengthM, layout.slab.edgeM), 0.02),
    ...tendons(model, box),
  ];
  supportsM.forEach((x, j) => {
    const inner = j > 0 && j < last;
    const at = j === 0 ? endM / 2 : j === last ? lengthM - endM / 2 : x;
    shapes.push(upright('diaphragm', 'concrete', depth, at, layout.slab.midM, inner ? pierM : endM));
  });
  shapes.push(...underSlabAlong(layout, depth));
  for (const x of jointsOf(model, box)) shapes.push(upright('segment joint', 'concrete', depth, x, 0, 0.02));
  return shapes;
}

/** Joints of the segments of every arm, from the pier table to the tip, x along the unit, m. */
function jointsOf(model: CantileverModel, { weight }: SizedHaunched): number[] {
  const table = cantileverData.pierTableM.value / 2;
  return model.arms.flatMap(({ pierM, side, armM }) => {
    const rest = armM - table;
    if (!(rest > 0)) return [];
    const count = Math.max(1, Math.ceil(rest / weight.segmentM - 1e-9));
    return Array.from({ length: count + 1 }, (_, k) => pierM + side * (table + (rest * k) / count));
  });
}

/** Runs of the deck in which a family has strands, as lines at its level. */
function tendons(model: CantileverModel, { found }: SizedHaunched): Shape[] {
  const { topTendons, bottomTendons } = cantileverData;
  const shapes: Shape[] = [];
  const run = (part: string, strands: Float64Array, level: (i: number) => number): void => {
    let points: [number, number][] = [];
    const close = (): void => {
      if (points.length > 1)
        shapes.push({ part, material: 'strand', kind: 'line', points, thicknessM: 0.1, faint: true });
      points = [];
    };
    strands.forEach((count, i) => {
      if (count > 0) points.push([model.beam.xM[i]!, level(i)]);
      else close();
    });
    close();
  };
  run('tendons of the arms', found.top, () => -topTendons.coverM);
  run('tendons of the spans', found.bottom, (i) => -model.depthM[i]! + bottomTendons.coverM);
  return shapes;
}

/** Cross-sections at the middle of the longest span and over an inner support beside it. */
export function haunchedCuts(model: CantileverModel, { sections }: SizedHaunched): SectionCut[] {
  const { spansM, deck } = model.task;
  const withUnder = (cut: SectionCut, depthM: number): SectionCut => ({
    ...cut,
    shapes: [...underSlabOf(model.layout, depthM), ...cut.shapes],
  });
  const longest = spansM.indexOf(Math.max(...spansM));
  const middleM = model.supportsM[longest]! + spansM[longest]! / 2;
  const cuts = [withUnder(cutOf(deck, 'midspan', middleM, sections.midspan), model.task.depthM)];
  if (spansM.length > 1) {
    const pier = longest > 0 ? longest : 1;
    const section = sections.pierAt.get(pier)!;
    cuts.push(withUnder(cutOf(deck, 'pier', model.supportsM[pier]!, section), section.depthM));
  }
  return cuts;
}
