import { loadStandard } from '../../actions/index.ts';
import { polygonProperties } from '../../mechanics/index.ts';
import type { DeckSpec, UnitTask } from '../../model/index.ts';
import { depthBand } from '../../rules/index.ts';
import { slabDeckData } from '../slab/slabDeckData.ts';
import { wingRoot } from '../slab/slabModel.ts';
import { wingLength } from '../slab/slabSection.ts';
import { portalData } from './portalData.ts';

/** A section across the frame: of the deck, or of a wall over its whole width. */
export interface FrameSection {
  readonly part: 'left wall' | 'deck' | 'right wall';
  readonly depthM: number;
  readonly areaM2: number;
  readonly inertiaM4: number;
  /** Centroid from the outer face (top of the deck, earth side of a wall), m. */
  readonly outerM: number;
  /** Width of the outer and of the inner face, m. */
  readonly outerWidthM: number;
  readonly innerWidthM: number;
}

/**
 * The frame as a chain of nodes, from the foot of the first wall up, over the deck and down to the other foot. x from the
 * axis of the first wall, z from the top of the deck, m. The last deck nodes before the walls stand at their faces.
 */
export interface FrameShape {
  readonly spanM: number;
  readonly kneeM: number;
  readonly midspanM: number;
  /** Walls at the top and at the foot, m. */
  readonly legTopM: number;
  readonly legFootM: number;
  /** From the top of the deck to the top of the footing at each end, m. */
  readonly heightM: readonly [first: number, last: number];
  /** Where a wall reaches deeper into the ground than half a metre. */
  readonly intoGround: boolean;
  readonly wingM: number;
  readonly wingRootM: number;
  readonly wingBarsM2PerM: number;
  readonly nodes: readonly (readonly [x: number, z: number])[];
  /** One a node; of the two at the axes of the walls that of the deck. */
  readonly sections: readonly FrameSection[];
  /** Indices of the nodes at the axes of the walls. */
  readonly knees: readonly [first: number, last: number];
  /** Elements of a wall below the soffit. */
  readonly wallElements: number;
}

const wallElements = 6;
const deckElements = 20;

/** Depth of the deck at a distance from the axis of a wall, m: parabolic haunches, level between them. */
export function depthAt(shape: Pick<FrameShape, 'spanM' | 'kneeM' | 'midspanM'>, xM: number): number {
  const { spanM, kneeM, midspanM } = shape;
  const haunchM = portalData.shape.haunchShare * spanM;
  const from = Math.min(xM, spanM - xM);
  const share = Math.max(0, 1 - Math.max(0, from) / haunchM);
  return midspanM + (kneeM - midspanM) * share ** 2;
}

/** Lays out the frame for the span and the depth at midspan of the task. */
export function frameShape(task: UnitTask): FrameShape {
  const { shape, leg } = portalData;
  const spanM = task.spansM[0]!;
  const midspanM = task.depthM;
  // The least of the band that rules give for the knee, or more where the deck is deeper.
  const kneeM = Math.max(shape.kneeOverMidspan * midspanM, depthBand('portal-frame', 'simple')[0] * spanM);
  const stepped = (value: number): number =>
    Math.max(shape.leastLegM, Math.ceil(value / shape.stepM - 1e-9) * shape.stepM);
  const legTopM = stepped(shape.legOverKnee * kneeM);
  const legFootM = stepped(shape.footOverTop * legTopM);
  const clear = task.clearUnderM ?? [leg.assumedClearM, leg.assumedClearM];
  const least = Math.max(leg.leastM, leg.leastOverSpan * spanM) + kneeM;
  const wanted = clear.map((height) => height + midspanM + leg.belowGroundM);
  const heightM = wanted.map((height) => Math.max(least, height)) as [number, number];
  const wing = wingRoot(task, loadStandard(task.standard));
  const wingM = wingLength(task.deck, midspanM);
  const lines = { spanM, kneeM, midspanM };
  const nodes: [number, number][] = [];
  const sections: FrameSection[] = [];
  const wall = (end: 0 | 1): void => {
    const x = end === 0 ? 0 : spanM;
    const part = end === 0 ? 'left wall' : 'right wall';
    for (let k = 0; k <= wallElements; k++) {
      const up = (end === 0 ? k : wallElements - k) / wallElements;
      const thickM = legFootM + (legTopM - legFootM) * up;
      nodes.push([x, -heightM[end] + up * (heightM[end] - kneeM)]);
      sections.push(wallSection(part, task.deck, thickM));
    }
  };
  const deck = (x: number): void => {
    const section = deckSection(task.deck, depthAt(lines, x), wingM, wing.rootM);
    nodes.push([x, -section.outerM]);
    sections.push(section);
  };
  wall(0);
  const first = nodes.length;
  const face = legTopM / 2;
  deck(0);
  for (let k = 0; k <= deckElements; k++) deck(face + (k * (spanM - legTopM)) / deckElements);
  deck(spanM);
  const last = nodes.length - 1;
  wall(1);
  return {
    ...lines,
    legTopM,
    legFootM,
    heightM,
    intoGround: task.clearUnderM !== undefined && wanted.some((height, i) => height < heightM[i]! - 1e-9),
    wingM,
    wingRootM: wingM > 0 ? wing.rootM : midspanM,
    wingBarsM2PerM: wing.barsM2PerM,
    nodes,
    sections,
    knees: [first, last],
    wallElements,
  };
}

function wallSection(part: FrameSection['part'], deck: DeckSpec, thickM: number): FrameSection {
  return {
    part,
    depthM: thickM,
    areaM2: deck.widthM * thickM,
    inertiaM4: (deck.widthM * thickM ** 3) / 12,
    outerM: thickM / 2,
    outerWidthM: deck.widthM,
    innerWidthM: deck.widthM,
  };
}

/** Outline of the deck at a depth: upright sides under wings of constant length; y across, z from the top, m. */
export function deckOutline(
  deck: DeckSpec,
  depthM: number,
  wingM: number,
  rootM: number,
): readonly (readonly [number, number])[] {
  const half = deck.widthM / 2;
  const side = half - wingM;
  if (!(wingM > 0))
    return [
      [-half, 0],
      [-half, -depthM],
      [half, -depthM],
      [half, 0],
    ];
  const { edgeM } = slabDeckData.wings;
  return [
    [-half, 0],
    [-half, -edgeM],
    [-side, -rootM],
    [-side, -depthM],
    [side, -depthM],
    [side, -rootM],
    [half, -edgeM],
    [half, 0],
  ];
}

function deckSection(deck: DeckSpec, depthM: number, wingM: number, rootM: number): FrameSection {
  const { areaM2, centroidM, inertiaM4 } = polygonProperties(deckOutline(deck, depthM, wingM, rootM));
  return {
    part: 'deck',
    depthM,
    areaM2,
    inertiaM4,
    outerM: -centroidM,
    outerWidthM: deck.widthM,
    innerWidthM: deck.widthM - 2 * wingM,
  };
}
