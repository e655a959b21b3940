import type { SectionCut, Shape } from '../../model/index.ts';
import { constantDepth, depthAt, type DepthAlong } from '../common/depthAlong.ts';
import { deckFace, soffitLine, upright } from '../common/elevation.ts';
import { deckFurniture } from '../common/furniture.ts';
import { girderShape } from '../floor/floorShapes.ts';
import { elementsPerSpan } from './elementsPerSpan.ts';
import type { GirderModel } from './girderModel.ts';
import { platesAt, runsOf, type PlateRun } from './plateRun.ts';

type Point = readonly [x: number, z: number];

/** The unit from the side: slab, girder face, bottom flange by plate thickness, bracing and plate joints faint. */
export function girderElevation(model: GirderModel, run: PlateRun): Shape[] {
  const soffit = girderDepthAlong(model);
  const slab = constantDepth(model.lengthM, model.slab.rootM);
  const shapes: Shape[] = [
    deckFace('slab', 'concrete', slab),
    deckFace('girder', 'steel', soffit, model.slab.rootM),
  ];
  let x = 0;
  const startOf = model.elementM.map((length) => {
    const start = x;
    x += length;
    return start;
  });
  for (const [from, to, thicknessM] of runsOf(run.bottomM)) {
    const end = to < startOf.length ? startOf[to]! : model.lengthM;
    shapes.push(soffitLine('bottom flange', 'steel', stretch(soffit, startOf[from]!, end), thicknessM));
    if (from > 0)
      shapes.push(upright('plate joint', 'steel', soffit, startOf[from]!, model.slab.rootM, 0.01));
  }
  for (const braceM of model.braceAtM)
    shapes.push(upright('stiffener', 'steel', soffit, braceM, model.slab.rootM, 0.02));
  return shapes;
}

/** Structural depth along the unit: two points where it is constant, every station where it is haunched. */
export function girderDepthAlong(model: GirderModel): DepthAlong {
  const { haunched, atStationM } = model.heights;
  if (!haunched) return constantDepth(model.lengthM, model.girderM + model.slab.rootM);
  let x = 0;
  return {
    xM: [0, ...Array.from(model.elementM, (lengthM) => (x += lengthM))],
    depthM: Array.from(atStationM, (heightM) => heightM + model.slab.rootM),
  };
}

function stretch(along: DepthAlong, fromM: number, toM: number): DepthAlong {
  const between = along.xM.flatMap((x, i) =>
    x > fromM + 1e-6 && x < toM - 1e-6 ? [[x, along.depthM[i]!] as const] : [],
  );
  return {
    xM: [fromM, ...between.map(([x]) => x), toM],
    depthM: [depthAt(along, fromM), ...between.map(([, depthM]) => depthM), depthAt(along, toM)],
  };
}

/** Cross-sections at the middle of the longest span and, on continuous units, over an inner support beside it. */
export function girderSections(model: GirderModel, run: PlateRun, crossGirderM: number): SectionCut[] {
  const { spansM } = model.task;
  const longest = spansM.indexOf(Math.max(...spansM));
  const middle = longest * elementsPerSpan + elementsPerSpan / 2;
  const cuts = [
    cut(model, run, crossGirderM, 'midspan', middle, model.supportsM[longest]! + spansM[longest]! / 2),
  ];
  if (spansM.length > 1) {
    const pier = longest > 0 ? longest : 1;
    cuts.push(cut(model, run, crossGirderM, 'pier', pier * elementsPerSpan, model.supportsM[pier]!));
  }
  return cuts;
}

function cut(
  model: GirderModel,
  run: PlateRun,
  crossGirderM: number,
  at: string,
  element: number,
  xM: number,
): SectionCut {
  const shapes: Shape[] = [];
  const { offsetsM } = model.layout;
  if (crossGirderM > 0) shapes.push(crossGirder(model, run, crossGirderM));
  const heightM = model.heights.atStationM[element]!;
  for (const y of offsetsM) shapes.push(...girderAt(model, run, element, heightM, y));
  const { substringers, layout, slab } = model;
  if (substringers)
    for (const y of layout.offsetsM.slice(1))
      shapes.push(girderShape('substringer', y - layout.spacingM / 2, -slab.rootM, substringers.beam.plates));
  shapes.push({
    part: 'slab',
    material: 'concrete',
    kind: 'polygon',
    points: slabOutline(model, run.topWidthM),
  });
  shapes.push(...deckFurniture(model.task.deck));
  return { at, xM, shapes };
}

/** The three plates of one girder as rectangles. */
function girderAt(model: GirderModel, run: PlateRun, element: number, heightM: number, y: number): Shape[] {
  const { topM, bottomM, webM, topWidthM, bottomWidthM } = platesAt(run, element);
  const top = -model.slab.rootM;
  const soffit = top - heightM;
  const plate = (part: string, widthM: number, from: number, to: number): Shape => ({
    part,
    material: 'steel',
    kind: 'polygon',
    points: [
      [y - widthM / 2, from],
      [y + widthM / 2, from],
      [y + widthM / 2, to],
      [y - widthM / 2, to],
    ],
  });
  return [
    plate('bottom flange', bottomWidthM, soffit, soffit + bottomM),
    plate('web', webM, soffit + bottomM, top - topM),
    plate('top flange', topWidthM, top - topM, top),
  ];
}

function crossGirder(model: GirderModel, run: PlateRun, heightM: number): Shape {
  const { offsetsM } = model.layout;
  const left = offsetsM[0]! + run.webM[0]! / 2;
  const right = offsetsM[offsetsM.length - 1]! - run.webM[0]! / 2;
  const middle = -model.slab.rootM - model.girderM / 2;
  return {
    part: 'cross-girder',
    material: 'steel',
    kind: 'polygon',
    points: [
      [left, middle - heightM / 2],
      [right, middle - heightM / 2],
      [right, middle + heightM / 2],
      [left, middle + heightM / 2],
    ],
    faint: true,
  };
}

/** Outline of the slab: level top, thickest over the girders, thinner between them and at the edges. */
function slabOutline(model: GirderModel, flangeM: number): Point[] {
  const { slab, layout, task } = model;
  const half = task.deck.widthM / 2;
  const seat = flangeM / 2;
  const under: Point[] = [[-half, -slab.edgeM]];
  layout.offsetsM.forEach((y, i) => {
    under.push([y - seat, -slab.rootM], [y + seat, -slab.rootM]);
    if (i === layout.count - 1 || slab.midM === slab.rootM) return;
    const taper = Math.max(seat, layout.spacingM / 4);
    under.push([y + taper, -slab.midM], [y + layout.spacingM - taper, -slab.midM]);
  });
  under.push([half, -slab.edgeM]);
  return [...under, [half, 0], [-half, 0]];
}
