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
  const { spanM, legTopM, legFootM, heightM, nodes, knees } = shape;
  const soffit = deckNodes
    .filter((node) => node !== knees[0] && node !== knees[1])
    .map((node): [number, number] => [nodes[node]![0], -depthAt(shape, nodes[node]![0])]);
  const knee = depthAt(shape, legTopM / 2);
  const wall = (end: 0 | 1): Shape => {
    const x = end === 0 ? 0 : spanM;
    const z = -heightM[end];
    return {
      part: end === 0 ? 'first wall' : 'last wall',
      material: 'concrete',
      kind: 'polygon',
      points: [
        [x - legTopM / 2, -knee],
        [x + legTopM / 2, -knee],
        [x + legFootM / 2, z],
        [x - legFootM / 2, z],
      ],
    };
  };
  const shapes: Shape[] = [
    wall(0),
    wall(1),
    {
      part: 'deck',
      material: 'concrete',
      kind: 'polygon',
      points: [
        [-legTopM / 2, 0],
        [spanM + legTopM / 2, 0],
        [spanM + legTopM / 2, -knee],
        ...[...soffit].reverse(),
        [-legTopM / 2, -knee],
      ],
    },
  ];
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
  const { spanM, legTopM, wingM, wingRootM, knees } = shape;
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
  return [cut('midspan', spanM / 2, (knees[0] + knees[1]) >> 1), cut('wall', legTopM / 2, knees[0] + 1)];
}
