import type { DeckSpec, SectionCut, Shape } from '../../model/index.ts';
import { constantDepth, type DepthAlong } from '../common/depthAlong.ts';
import { deckFace, soffitLine, upright } from '../common/elevation.ts';
import { deckFurniture } from '../common/furniture.ts';
import { boxData } from './boxData.ts';
import type { BoxLayout } from './boxLayout.ts';
import type { BoxModel } from './boxModel.ts';
import type { BoxSection } from './boxSection.ts';
import type { SizedBox } from './sizeBox.ts';
import type { Ribs } from './ribs.ts';
import { strutShape } from './struts.ts';

/** The unit from the side: deck face, bottom slab, edge of the overhang, construction joints and diaphragms faint. */
export function boxElevation(model: BoxModel, box: SizedBox): Shape[] {
  const { lengthM, layout, supportsM, task } = model;
  const along = constantDepth(lengthM, task.depthM);
  const edge = constantDepth(lengthM, layout.slab.edgeM);
  const { pierM, endM } = boxData.diaphragm;
  const last = supportsM.length - 1;
  const shapes: Shape[] = [
    deckFace('deck', 'concrete', along),
    soffitLine('bottom slab', 'concrete', along, box.thicknesses.bottomM),
    soffitLine('edge of the overhang', 'concrete', edge, 0.02),
    { ...tendonLine(model, box), faint: true },
  ];
  supportsM.forEach((x, j) => {
    const inner = j > 0 && j < last;
    const at = j === 0 ? endM / 2 : j === last ? lengthM - endM / 2 : x;
    shapes.push(upright('diaphragm', 'concrete', along, at, layout.slab.midM, inner ? pierM : endM));
  });
  shapes.push(...underSlabAlong(layout, along));
  for (const x of jointsOf(model)) shapes.push(upright('construction joint', 'concrete', along, x, 0, 0.02));
  return shapes;
}

/** Where casting stops: a fifth of the span past each pier on falsework, every half span of a launched deck. */
function jointsOf({ task, supportsM, lengthM }: BoxModel): number[] {
  if (task.method === 'launch') {
    const segmentM = Math.max(...task.spansM) / 2;
    const count = Math.max(1, Math.round(lengthM / segmentM));
    return Array.from({ length: count - 1 }, (_, i) => (lengthM * (i + 1)) / count);
  }
  return supportsM.slice(1, -1).map((x, j) => x + boxData.pierZone.overSpan * task.spansM[j + 1]!);
}

/** Middle line of the draped tendons. */
function tendonLine(model: BoxModel, box: SizedBox): Shape {
  const points = Array.from(model.beam.xM, (x, i): [number, number] => [x, -box.tendons.depthM[i]!]);
  return { part: 'tendons', material: 'strand', kind: 'line', points, thicknessM: box.tendons.group.ductM };
}

/** Cross-sections at the middle of the longest span and, on continuous units, over an inner support beside it. */
export function boxSections(model: BoxModel, box: SizedBox): SectionCut[] {
  const { spansM } = model.task;
  const longest = spansM.indexOf(Math.max(...spansM));
  const cuts = [
    cutOf(model.task.deck, 'midspan', model.supportsM[longest]! + spansM[longest]! / 2, box.sections.span),
  ];
  if (spansM.length > 1) {
    const pier = longest > 0 ? longest : 1;
    cuts.push(cutOf(model.task.deck, 'pier', model.supportsM[pier]!, box.sections.pier));
  }
  const under = underSlabOf(model.layout, model.task.depthM);
  return cuts.map((cut) => ({ ...cut, shapes: [...under, ...cut.shapes] }));
}

/** Struts under the wings, or ribs, seen from the side, faint. */
export function underSlabAlong({ struts, ribs, slab }: BoxLayout, along: DepthAlong): Shape[] {
  const lengthM = along.xM.at(-1)!;
  if (ribs) {
    const soffit = constantDepth(lengthM, ribs.rootM);
    return placesAlong(lengthM, ribs.spacingM).map((x) =>
      upright('rib', 'concrete', soffit, x, slab.midM, ribs.widthM),
    );
  }
  if (!struts) return [];
  const { footAboveSoffitM, headBelowTopM } = boxData.struts;
  const feet = { xM: along.xM, depthM: along.depthM.map((depth) => depth - footAboveSoffitM) };
  return placesAlong(lengthM, struts.spacingM).map((x) =>
    upright('strut', 'concrete', feet, x, headBelowTopM, struts.sideM),
  );
}

/** Places at a spacing along a deck, as many before as behind its middle, m. */
function placesAlong(lengthM: number, spacingM: number): number[] {
  const count = Math.max(1, Math.floor(lengthM / spacingM));
  const firstM = (lengthM - (count - 1) * spacingM) / 2;
  return Array.from({ length: count }, (_, k) => firstM + k * spacingM);
}

/** Struts or ribs of a section of a depth, m. */
export function underSlabOf(layout: BoxLayout, depthM: number): Shape[] {
  return layout.ribs ? ribsOf(layout, layout.ribs) : strutsOf(layout, depthM);
}

/** One rib behind the section: from edge to edge under the slab, deepest at the webs and between them. */
function ribsOf({ slab, cells, spacingM, overhangM }: BoxLayout, { rootM, edgeM }: Ribs): Shape[] {
  const webM = (cells * spacingM) / 2;
  const tipM = webM + overhangM;
  const points: [number, number][] = [
    [-tipM, -slab.midM],
    [-tipM, -edgeM],
    [-webM, -rootM],
    [webM, -rootM],
    [tipM, -edgeM],
    [tipM, -slab.midM],
  ];
  return [{ part: 'rib', material: 'concrete', kind: 'polygon', points, faint: true }];
}

/** Struts under the wings of a section of a depth, m: from the foot of the outer webs to the heads, as lines. */
function strutsOf({ struts, cells, spacingM, slope }: BoxLayout, depthM: number): Shape[] {
  if (!struts) return [];
  const { headBelowTopM } = boxData.struts;
  const headM = (cells * spacingM) / 2 + struts.outM;
  const { riseM, runM } = strutShape(struts.outM, depthM, slope);
  return [-1, 1].map((side) => ({
    part: 'strut',
    material: 'concrete',
    kind: 'line',
    points: [
      [side * headM, -headBelowTopM],
      [side * (headM - runM), -headBelowTopM - riseM],
    ],
    thicknessM: struts.sideM,
  }));
}

/** A section of a box with what stands on its deck. */
export function cutOf(deck: DeckSpec, at: string, xM: number, { outline }: BoxSection): SectionCut {
  return {
    at,
    xM,
    shapes: [
      {
        part: 'box',
        material: 'concrete',
        kind: 'polygon',
        points: outline.outer,
        ...(outline.cells.length > 0 ? { holes: outline.cells } : {}),
      },
      ...deckFurniture(deck),
    ],
  };
}
