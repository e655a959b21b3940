import type { SectionCut, Shape } from '../../model/index.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { deckFace } from '../common/elevation.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import { runsOf } from '../composite-i/plateRun.ts';
import { floorSection, girderShape, rectangle } from '../floor/floorShapes.ts';
import { halfThroughData } from './halfThroughData.ts';
import type { HalfThroughUnit } from './halfThroughUnit.ts';
import { edgePlates } from './sizeEdgeGirder.ts';

/** The unit from the side: slab, girder face that rises above the road, flanges by plate, posts faint. */
export function halfThroughElevation(unit: HalfThroughUnit): Shape[] {
  const { case: c, girder, floor } = unit;
  const { depthM } = c.task;
  const topZ = girder.choice.heightM - depthM;
  const shapes: Shape[] = [
    deckFace('slab', 'concrete', constantDepth(c.lengthM, floor.slab.midM)),
    rectangle('edge girder', 'steel', 0, c.lengthM, -depthM, topZ),
  ];
  const startOf = [0];
  for (const lengthM of c.elementM) startOf.push(startOf.at(-1)! + lengthM);
  const flange = (part: string, thicknesses: Float64Array, z: (t: number) => number): void => {
    for (const [from, to, thicknessM] of runsOf(thicknesses))
      shapes.push({
        part,
        material: 'steel',
        kind: 'line',
        points: [
          [startOf[from]!, z(thicknessM)],
          [startOf[to]!, z(thicknessM)],
        ],
        thicknessM,
      });
  };
  flange('top flange', girder.topM, (t) => topZ - t / 2);
  flange('bottom flange', girder.bottomM, (t) => t / 2 - depthM);
  for (const x of crossGirdersAt(unit))
    shapes.push({
      part: 'post',
      material: 'steel',
      kind: 'line',
      points: [
        [x, -depthM],
        [x, topZ],
      ],
      thicknessM: 0.02,
      faint: true,
    });
  return shapes;
}

/** Where cross-girders stand, m from the first support. */
function crossGirdersAt({ case: c, panels }: Pick<HalfThroughUnit, 'case' | 'panels'>): number[] {
  return [
    0,
    ...panels.flatMap((count, span) =>
      Array.from({ length: count }, (_, i) => c.supportsM[span]! + ((i + 1) * c.task.spansM[span]!) / count),
    ),
  ];
}

/** Cross-sections at the middle of the longest span and, on continuous units, over an inner support beside it. */
export function halfThroughSections(unit: HalfThroughUnit): SectionCut[] {
  const { case: c } = unit;
  const { spansM } = c.task;
  const longest = spansM.indexOf(Math.max(...spansM));
  const middle = longest * elementsPerSpan + elementsPerSpan / 2;
  const cuts = [cut(unit, 'midspan', middle, c.supportsM[longest]! + spansM[longest]! / 2)];
  if (spansM.length > 1) {
    const pier = longest > 0 ? longest : 1;
    cuts.push(cut(unit, 'pier', pier * elementsPerSpan, c.supportsM[pier]!));
  }
  return cuts;
}

function cut(
  { case: c, girder, floor }: HalfThroughUnit,
  at: string,
  element: number,
  xM: number,
): SectionCut {
  const { depthM, deck } = c.task;
  const plates = edgePlates(girder, element);
  const topZ = plates.heightM - depthM;
  const { kerb } = halfThroughData;
  const { section } = girder.post;
  const shapes: Shape[] = [...floorSection(floor, deck, c.planesM / 2)];
  for (const side of [-1, 1] as const) {
    const web = (side * c.planesM) / 2;
    const edge = (side * deck.widthM) / 2;
    const face = web - side * section.depthM;
    shapes.push(
      rectangle(
        'post',
        'steel',
        Math.min(web, face),
        Math.max(web, face),
        -floor.slab.midM,
        topZ - plates.topM,
        true,
      ),
      girderShape('edge girder', web, topZ, plates),
      rectangle(
        'robust kerb',
        'concrete',
        Math.min(edge, edge - side * kerb.widthM),
        Math.max(edge, edge - side * kerb.widthM),
        0,
        kerb.heightM,
      ),
    );
  }
  return { at, xM, shapes };
}
