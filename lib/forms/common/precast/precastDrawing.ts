import type { SectionCut, Shape } from '../../../model/index.ts';
import { constantDepth } from '../depthAlong.ts';
import { deckFace, upright } from '../elevation.ts';
import { deckFurniture } from '../furniture.ts';
import { diaphragmsWithin } from './beamMoments.ts';
import { pretensioned } from './pretensioned.ts';
import type { PrecastModel } from './precastModel.ts';
import type { StrandPlan } from './strandPlan.ts';

type Point = readonly [x: number, z: number];

/** Structural depth: beam, fill and slab, m. */
export function structuralDepthM(model: PrecastModel): number {
  return model.shape.depthM + model.haunchM + model.slab.rootM;
}

/** Height of the strands of a span above the soffit at midspan and at the ends, m. */
type StrandLevels = Pick<StrandPlan, 'midM' | 'endM'>;

/** The unit from the side: slab, beams span by span, their flanges, diaphragms and strands faint. */
export function precastElevation(model: PrecastModel, strands: readonly StrandLevels[]): Shape[] {
  const { shape, slab, haunchM, supportsM, lengthM } = model;
  const depthM = structuralDepthM(model);
  const whole = constantDepth(lengthM, depthM);
  const topM = slab.rootM + haunchM;
  const shapes: Shape[] = [deckFace('slab', 'concrete', constantDepth(lengthM, slab.rootM))];
  model.task.spansM.forEach((spanM, span) => {
    const from = supportsM[span]!;
    const along = { xM: [from, from + spanM], depthM: [depthM, depthM] };
    shapes.push(deckFace('beam', 'concrete', along, topM));
    const flange = topM + shape.depthM - shape.bottomFlangeM;
    shapes.push({ ...levelLine('bottom flange', from, from + spanM, flange), faint: true });
    shapes.push({ ...strandLine(model, span, strands[span]!), faint: true });
    const count = diaphragmsWithin(model, spanM);
    for (let k = 1; k <= count; k++)
      shapes.push(
        upright(
          'diaphragm',
          'concrete',
          whole,
          from + (spanM * k) / (count + 1),
          topM,
          model.kind.diaphragm.withinM,
        ),
      );
  });
  for (const x of supportsM.slice(1, -1))
    shapes.push(upright('diaphragm', 'concrete', whole, x, topM, model.kind.diaphragm.pierM));
  return shapes;
}

function levelLine(part: string, from: number, to: number, belowM: number): Shape {
  return {
    part,
    material: 'concrete',
    kind: 'line',
    points: [
      [from, -belowM],
      [to, -belowM],
    ],
    thicknessM: 0.01,
  };
}

/** Middle line of the strands of a span. */
function strandLine(model: PrecastModel, span: number, plan: StrandLevels): Shape {
  const from = model.supportsM[span]!;
  const spanM = model.task.spansM[span]!;
  const soffit = -structuralDepthM(model);
  const bend = pretensioned.relief[model.kind.relief[model.standardId]].endOver * spanM;
  return {
    part: 'strands',
    material: 'strand',
    kind: 'line',
    points: [
      [from, soffit + plan.endM],
      [from + bend, soffit + plan.midM],
      [from + spanM - bend, soffit + plan.midM],
      [from + spanM, soffit + plan.endM],
    ],
    thicknessM: 0.03,
  };
}

/** Cross-sections at the middle of the longest span and, on continuous units, beside an inner support. */
export function precastSections(model: PrecastModel, more: readonly Shape[]): SectionCut[] {
  const { spansM } = model.task;
  const longest = spansM.indexOf(Math.max(...spansM));
  const cuts = [cut(model, 'midspan', model.supportsM[longest]! + spansM[longest]! / 2, false, more)];
  if (spansM.length > 1) {
    const pier = longest > 0 ? longest : 1;
    cuts.push(cut(model, 'pier', model.supportsM[pier]!, true, more));
  }
  return cuts;
}

function cut(model: PrecastModel, at: string, xM: number, pier: boolean, more: readonly Shape[]): SectionCut {
  const { layout, shape, haunchM } = model;
  const soffit = -structuralDepthM(model);
  const shapes: Shape[] = [];
  const outer = layout.offsetsM[layout.count - 1]!;
  if (pier)
    shapes.push({
      part: 'diaphragm',
      material: 'concrete',
      kind: 'polygon',
      points: box(-outer, outer, soffit, soffit + shape.depthM + haunchM),
      faint: true,
    });
  for (const y of layout.offsetsM) {
    shapes.push({
      part: 'beam',
      material: 'concrete',
      kind: 'polygon',
      points: moved(shape.points, y, soffit),
      ...(shape.holes.length > 0 ? { holes: shape.holes.map((hole) => moved(hole, y, soffit)) } : {}),
    });
    const top = soffit + shape.depthM;
    if (haunchM > 0)
      for (const [from, to] of shape.seats)
        shapes.push({
          part: 'fill',
          material: 'concrete',
          kind: 'polygon',
          points: box(y + from, y + to, top, top + haunchM),
        });
  }
  shapes.push({ part: 'slab', material: 'concrete', kind: 'polygon', points: slabOutline(model) });
  shapes.push(...more, ...deckFurniture(model.task.deck));
  return { at, xM, shapes };
}

function moved(points: readonly Point[], y: number, z: number): Point[] {
  return points.map(([x, up]): Point => [y + x, z + up]);
}

function box(x1: number, x2: number, z1: number, z2: number): Point[] {
  return [
    [x1, z1],
    [x2, z1],
    [x2, z2],
    [x1, z2],
  ];
}

/** Outline of the slab: level, thinner towards the edges. */
function slabOutline(model: PrecastModel): Point[] {
  const { slab, layout, task, shape } = model;
  const half = task.deck.widthM / 2;
  const seat = Math.min(half, layout.offsetsM[layout.count - 1]! + shape.acrossM / 2);
  return [
    [-half, 0],
    [half, 0],
    [half, -slab.edgeM],
    [seat, -slab.rootM],
    [-seat, -slab.rootM],
    [-half, -slab.edgeM],
  ];
}
