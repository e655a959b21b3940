import type { SectionCut, Shape } from '../../model/index.ts';
import { deckFurniture } from '../common/furniture.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import { platesAt, type PlateRun } from '../composite-i/plateRun.ts';
import { boxMiddles, type BoxGirderModel } from './boxGirderModel.ts';

type Point = readonly [x: number, z: number];

/** Cross-sections at the middle of the longest span and, on continuous units, over an inner support beside it. */
export function boxGirderSections(model: BoxGirderModel, run: PlateRun): SectionCut[] {
  const { spansM } = model.task;
  const longest = spansM.indexOf(Math.max(...spansM));
  const middle = longest * elementsPerSpan + elementsPerSpan / 2;
  const cuts = [cut(model, run, 'midspan', middle, model.supportsM[longest]! + spansM[longest]! / 2)];
  if (spansM.length > 1) {
    const pier = longest > 0 ? longest : 1;
    cuts.push(cut(model, run, 'pier', pier * elementsPerSpan, model.supportsM[pier]!));
  }
  return cuts;
}

function cut(model: BoxGirderModel, run: PlateRun, at: string, element: number, xM: number): SectionCut {
  const shapes: Shape[] = boxMiddles(model.tubs).flatMap((y) => tubAt(model, run, element, y));
  shapes.push({
    part: 'slab',
    material: 'concrete',
    kind: 'polygon',
    points: slabOutline(model, run.topWidthM),
  });
  return { at, xM, shapes: [...shapes, ...deckFurniture(model.task.deck)] };
}

/** Plates of one tub: bottom plate, leaning webs, top flanges, ribs faint. */
function tubAt(model: BoxGirderModel, run: PlateRun, element: number, y: number): Shape[] {
  const { shape, slab, field } = model;
  const { topM, bottomM, webM, topWidthM } = platesAt(run, element);
  const top = -slab.rootM;
  const soffit = top - model.girderM;
  const plate = (part: string, points: readonly Point[], faint = false): Shape => ({
    part,
    material: 'steel',
    kind: 'polygon',
    points,
    ...(faint ? { faint } : {}),
  });
  const rect = (part: string, from: number, to: number, low: number, high: number, faint = false): Shape =>
    plate(
      part,
      [
        [from, low],
        [to, low],
        [to, high],
        [from, high],
      ],
      faint,
    );
  const lean = (webM * shape.slant) / 2;
  const sides = [-1, 1].flatMap((side): Shape[] => {
    const low = y + (side * shape.bottomM) / 2;
    const high = y + (side * shape.topM) / 2;
    return [
      plate('web', [
        [low - lean, soffit + bottomM],
        [low + lean, soffit + bottomM],
        [high + lean, top - topM],
        [high - lean, top - topM],
      ]),
      rect('top flange', high - topWidthM / 2, high + topWidthM / 2, top - topM, top),
    ];
  });
  const ribs = Math.round(shape.bottomM / field.pitchM) - 1;
  const { heightM } = field.stiffener;
  const rib = Array.from({ length: ribs }, (_, i): Shape => {
    const x = y - shape.bottomM / 2 + (i + 1) * field.pitchM;
    return rect('rib', x - 0.006, x + 0.006, soffit + bottomM, soffit + bottomM + heightM, true);
  });
  const half = shape.bottomM / 2 + lean;
  return [rect('bottom plate', y - half, y + half, soffit, soffit + bottomM), ...sides, ...rib];
}

/** Level top, thickest over the webs, thinner between those of one box where it is haunched, and at the edges. */
function slabOutline({ slab, tubs, task }: BoxGirderModel, flangeM: number): Point[] {
  const half = task.deck.widthM / 2;
  const seat = flangeM / 2;
  const under: Point[] = [[-half, -slab.edgeM]];
  tubs.offsetsM.forEach((y, i) => {
    under.push([y - seat, -slab.rootM], [y + seat, -slab.rootM]);
    if (i === tubs.count - 1 || slab.midM === slab.rootM) return;
    const taper = Math.max(seat, tubs.spacingM / 4);
    under.push([y + taper, -slab.midM], [y + tubs.spacingM - taper, -slab.midM]);
  });
  under.push([half, -slab.edgeM]);
  return [...under, [half, 0], [-half, 0]];
}
