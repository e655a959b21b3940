import type { SectionCut, Shape } from '../../model/index.ts';
import { constantDepth } from '../common/depthAlong.ts';
import { deckFace, soffitLine, upright } from '../common/elevation.ts';
import { deckFurniture } from '../common/furniture.ts';
import type { SizedSlab } from './sizeSlab.ts';
import type { SlabModel } from './slabModel.ts';

/** The unit from the side: its face, the edge of the wings, voids and tendons faint. */
export function slabElevation(model: SlabModel, { tendons }: SizedSlab): Shape[] {
  const { task, lengthM, outline, supportsM, beam } = model;
  const along = constantDepth(lengthM, task.depthM);
  const shapes: Shape[] = [deckFace('deck', 'concrete', along)];
  if (outline.wingM > 0)
    shapes.push(soffitLine('edge of the wing', 'concrete', constantDepth(lengthM, outline.wingRootM), 0.02));
  if (tendons) {
    const points = Array.from(beam.xM, (x, i): [number, number] => [x, -tendons.depthM[i]!]);
    shapes.push({
      part: 'tendons',
      material: 'strand',
      kind: 'line',
      points,
      thicknessM: tendons.ductM,
      faint: true,
    });
  }
  for (const x of supportsM.slice(1, -1)) shapes.push(upright('pier line', 'concrete', along, x, 0, 0.02));
  return shapes;
}

/** Cross-sections at the middle of the longest span and, on continuous units, over an inner support beside it. */
export function slabSectionCuts(model: SlabModel, { tendons }: SizedSlab): SectionCut[] {
  const { spansM } = model.task;
  const longest = spansM.indexOf(Math.max(...spansM));
  const cuts = [
    cut(model, 'midspan', model.supportsM[longest]! + spansM[longest]! / 2, model.outline.voids, tendons),
  ];
  if (spansM.length > 1)
    cuts.push(cut(model, 'pier', model.supportsM[longest > 0 ? longest : 1]!, [], tendons));
  return cuts;
}

function cut(
  model: SlabModel,
  at: string,
  xM: number,
  voids: SlabModel['outline']['voids'],
  tendons: SizedSlab['tendons'],
): SectionCut {
  return {
    at,
    xM,
    shapes: [
      {
        part: 'slab',
        material: 'concrete',
        kind: 'polygon',
        points: model.outline.outer,
        ...(voids.length > 0 ? { holes: voids } : {}),
      },
      ...ducts(model, xM, tendons),
      ...deckFurniture(model.task.deck),
    ],
  };
}

/** Ducts as short lines at their level, evenly spread over the soffit. */
function ducts(model: SlabModel, xM: number, tendons: SizedSlab['tendons']): Shape[] {
  if (!tendons) return [];
  const { xM: stations } = model.beam;
  let station = 0;
  stations.forEach((x, i) => {
    if (Math.abs(x - xM) < Math.abs(stations[station]! - xM)) station = i;
  });
  const z = -tendons.depthM[station]!;
  const pitch = model.outline.soffitM / tendons.count;
  return Array.from({ length: tendons.count }, (_, i): Shape => {
    const y = (i + 0.5) * pitch - model.outline.soffitM / 2;
    return {
      part: 'duct',
      material: 'strand',
      kind: 'line',
      points: [
        [y - tendons.ductM / 2, z],
        [y + tendons.ductM / 2, z],
      ],
      thicknessM: tendons.ductM,
    };
  });
}
