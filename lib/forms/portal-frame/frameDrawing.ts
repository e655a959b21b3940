import type { SectionCut, Shape } from '../../model/index.ts';
import type { DepthAlong } from '../common/depthAlong.ts';
import { deckFurniture } from '../common/furniture.ts';
import { depthAt, deckOutline } from './frameShape.ts';
import type { FrameModel } from './frameModel.ts';
import type { FrameTendons } from './frameTendons.ts';

/** Depth of the deck from axis to axis of the walls. */
export function frameDepthAlong({ shape, deckXM }: FrameModel): DepthAlong {
  return { xM: [...deckXM], depthM: Array.from(deckXM, (x) => depthAt(shape, x)) };
}

/** The frame from the side: deck with its haunches, both walls, tendons faint. */
export function frameElevation(model: FrameModel, tendons: FrameTendons | null): Shape[] {
  const { shape, deckNodes } = model;
  const { lengthM, legTopM, walls, nodes } = shape;
  const soffit = deckNodes
    .filter((node) => walls.every(({ knee: axis }) => axis !== node))
    .map((node): [number, number] => [nodes[node]![0], -depthAt(shape, nodes[node]![0])]);
  const knee = depthAt(shape, legTopM / 2);
  const shapes: Shape[] = walls.map(({ name, xM: x, heightM, topM, footM }): Shape => {
    const z = -heightM;
    return {
      part: `${name} wall`,
      material: 'concrete',
      kind: 'polygon',
      points: [
        [x - topM / 2, -knee],
        [x + topM / 2, -knee],
        [x + footM / 2, z],
        [x - footM / 2, z],
      ],
    };
  });
  shapes.push({
    part: 'deck',
    material: 'concrete',
    kind: 'polygon',
    points: [
      [-legTopM / 2, 0],
      [lengthM + legTopM / 2, 0],
      [lengthM + legTopM / 2, -knee],
      ...[...soffit].reverse(),
      [-legTopM / 2, -knee],
    ],
  });
  if (tendons)
    shapes.push({
      part: 'tendons',
      material: 'strand',
      kind: 'line',
      points: deckNodes.map((node) => [nodes[node]![0], -tendons.levelM[node]!] as const),
      thicknessM: tendons.ductM,
      faint: true,
    });
  return shapes;
}

/** Cross-sections at midspan and at the face of a wall. */
export function frameSections(model: FrameModel, tendons: FrameTendons | null): SectionCut[] {
  const { shape, task } = model;
  const { legTopM, wingM, wingRootM, knees, middles } = shape;
  const cut = (at: string, xM: number, node: number): SectionCut => {
    const soffitM = task.deck.widthM - 2 * wingM;
    const pitch = tendons ? soffitM / tendons.count : 0;
    const ducts = Array.from({ length: tendons?.count ?? 0 }, (_, i): Shape => {
      const y = (i + 0.5) * pitch - soffitM / 2;
      const z = -tendons!.levelM[node]!;
      return {
        part: 'duct',
        material: 'strand',
        kind: 'line',
        points: [
          [y - tendons!.ductM / 2, z],
          [y + tendons!.ductM / 2, z],
        ],
        thicknessM: tendons!.ductM,
      };
    });
    return {
      at,
      xM,
      shapes: [
        {
          part: 'slab',
          material: 'concrete',
          kind: 'polygon',
          points: deckOutline(task.deck, depthAt(shape, xM), wingM, wingRootM),
        },
        ...ducts,
        ...deckFurniture(task.deck),
      ],
    };
  };
  return [cut('midspan', task.spansM[0]! / 2, middles[0]!), cut('face of wall', legTopM / 2, knees[0] + 1)];
}
