import { materials } from '../../actions/index.ts';
import type { MeasuredLine } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { boxData } from '../concrete-box/boxData.ts';
import type { FrameModel } from './frameModel.ts';
import { depthAt } from './frameShape.ts';
import type { SizedFrame } from './sizeFrame.ts';

const mm = (lengthM: number): string => (1000 * lengthM).toFixed(0);

/** Measured lines of a frame: deck, walls down to their footings, strand, forms and falsework. */
export function frameLines(model: FrameModel, sized: SizedFrame): MeasuredLine[] {
  const { shape, task } = model;
  const { deckBarsKg, faces, tendons } = sized;
  const steel = (kg: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'reinforcement', kg, what, how);
  const [soffit, top] = faces;
  const lines = [
    measured(
      'deck',
      'deck-concrete',
      model.deckM3,
      'frame deck',
      `${mm(task.depthM)} mm at midspan, ${mm(shape.kneeM)} mm at the walls, to their outer faces`,
    ),
    steel(deckBarsKg.soffit, 'soffit along', `${mm(soffit!.barM)} mm bars, curtailed by halves`),
    steel(deckBarsKg.top, 'top along', `${mm(top!.barM)} mm bars from both knees, curtailed by halves`),
    steel(deckBarsKg.across, 'across', 'wheels and distribution, both faces, wings'),
    ...(deckBarsKg.links > 0 ? [steel(deckBarsKg.links, 'links', 'shear')] : []),
    steel(deckBarsKg.details, 'chairs and details', 'chairs, edges, trimming'),
  ];
  if (tendons)
    lines.push(
      measured(
        'deck',
        'prestress',
        strandKg(model, sized),
        'tendons',
        `${tendons.count} tendons of ${(tendons.strands / tendons.count).toFixed(1)} strands side by side`,
      ),
    );
  lines.push(
    measured(
      'deck',
      'slab-formwork',
      formsM2(model),
      'forms of the soffit and the edges',
      'soffit between the walls, wings, sides',
    ),
    ...shape.walls.flatMap((_, wall) => wallLines(model, sized, wall)),
    falsework(model),
  );
  return lines;
}

function wallLines(model: FrameModel, { wallBarsKg }: SizedFrame, wall: number): MeasuredLine[] {
  const { shape } = model;
  const { name: which, heightM, topM, footM } = shape.walls[wall]!;
  const name = `${which} wall`;
  const { upright, level } = wallBarsKg[wall]!;
  const height = (heightM - shape.kneeM).toFixed(2);
  const [part, item] =
    which === 'middle'
      ? (['piers', 'pier-concrete'] as const)
      : (['abutments', 'abutment-concrete'] as const);
  return [
    measured(
      part,
      item,
      model.wallM3[wall]!,
      name,
      `${mm(footM)} mm at the foot, ${mm(topM)} mm under the deck, ${height} m high`,
    ),
    measured(part, 'reinforcement', upright, `${name} upright`, 'both faces, run into deck and footing'),
    measured(
      part,
      'reinforcement',
      level,
      `${name} level`,
      'both faces against early cracks, links, details',
    ),
  ].map((line) => ({ ...line, support: wall }));
}

/** Strand of the deck with its slack, from face to face of the walls, kg. */
export function strandKg({ shape }: FrameModel, { tendons }: SizedFrame): number {
  if (!tendons) return 0;
  return (
    tendons.areaM2 * (shape.lengthM + shape.legTopM) * boxData.strandSlack.value * materials.steelDensityKgM3
  );
}

function formsM2({ shape, task }: FrameModel): number {
  const { nodes, knees, wingM, wingRootM, lengthM, walls, legTopM } = shape;
  let sides = 0;
  for (let i = knees[0] + 1; i < knees[1] - 1; i++) {
    const a = nodes[i]![0];
    const b = nodes[i + 1]![0];
    sides += ((depthAt(shape, a) + depthAt(shape, b)) / 2 - (wingM > 0 ? wingRootM : 0)) * (b - a);
  }
  return task.deck.widthM * (lengthM - (walls.length - 1) * legTopM) + 2 * sides;
}

function falsework({ task, shape }: FrameModel): MeasuredLine {
  const known = task.clearUnderM !== undefined;
  const { lengthM, walls, kneeM } = shape;
  const under = task.spansM.map((spanM, span) => {
    const mean = (walls[span]!.heightM + walls[span + 1]!.heightM) / 2 - (kneeM + shape.midspanM) / 2;
    return spanM * mean;
  });
  const faceM2 = under.reduce((sum, m2) => sum + m2, 0);
  const height = faceM2 / lengthM;
  const { widthM } = task.deck;
  return measured(
    'temporary-works',
    'falsework',
    faceM2 * widthM,
    'falsework under the deck',
    `${height.toFixed(1)} m high${known ? '' : ' (assumed)'}, ${widthM} m wide, ${lengthM.toFixed(1)} m long`,
  );
}
