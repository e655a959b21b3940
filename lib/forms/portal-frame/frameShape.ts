import { loadStandard } from '../../actions/index.ts';
import { polygonProperties } from '../../mechanics/index.ts';
import type { DeckSpec, UnitTask } from '../../model/index.ts';
import { depthBand } from '../../rules/index.ts';
import { supportPositions } from '../common/supports.ts';
import { slabDeckData } from '../slab/slabDeckData.ts';
import { wingRoot } from '../slab/slabModel.ts';
import { wingLength } from '../slab/slabSection.ts';
import { portalData } from './portalData.ts';

/** A section across the frame: of the deck, or of a wall over its whole width. */
interface FrameSection {
  readonly part: 'left wall' | 'deck' | 'right wall' | 'middle wall';
  readonly depthM: number;
  readonly areaM2: number;
  readonly inertiaM4: number;
  /** Centroid from the outer face (top of the deck, earth side of a wall), m. */
  readonly outerM: number;
  /** Width of the outer and of the inner face, m. */
  readonly outerWidthM: number;
  readonly innerWidthM: number;
}

/** A wall in one with the deck. */
export interface FrameWall {
  readonly name: 'first' | 'middle' | 'last';
  /** Its axis, m. */
  readonly xM: number;
  /** From the top of the deck to the top of the footing, m. */
  readonly heightM: number;
  /** Thickness under the deck and at the foot, m. */
  readonly topM: number;
  readonly footM: number;
  /** Nodes of the wall and its foot among them; node of the deck over its axis. */
  readonly nodes: readonly number[];
  readonly foot: number;
  readonly knee: number;
  /** Node at which each strike of the task hits it. */
  readonly struck: readonly number[];
}

/**
 * The frame as a chain of nodes, from the foot of the first wall up, over the deck and down to the other foot, and behind it
 * the nodes of a wall in the middle, from its foot up. x from the axis of the first wall, z from the top of the deck, m. The
 * last deck nodes before the walls stand at their faces.
 */
export interface FrameShape {
  /** The longest span, and all of them together. */
  readonly spanM: number;
  readonly lengthM: number;
  /** Axes of the walls. */
  readonly supportsM: readonly number[];
  readonly walls: readonly FrameWall[];
  readonly kneeM: number;
  readonly midspanM: number;
  /** Walls at the top and at the foot, m. */
  readonly legTopM: number;
  readonly legFootM: number;
  /** Where a wall reaches deeper into the ground than half a metre. */
  readonly intoGround: boolean;
  readonly wingM: number;
  readonly wingRootM: number;
  readonly wingBarsM2PerM: number;
  readonly nodes: readonly (readonly [x: number, z: number])[];
  /** One a node; of the two at the axes of the walls that of the deck. */
  readonly sections: readonly FrameSection[];
  /** Indices of the nodes at the axes of the outer walls, and in the middle of every span. */
  readonly knees: readonly [first: number, last: number];
  readonly middles: readonly number[];
  /** Nodes of the chain, before those of a wall in the middle. */
  readonly chainNodes: number;
}

/** Elements of a wall below the soffit, where nothing strikes it. */
const wallElements = 6;
const deckElements = 20;

/** Depth of the deck at a distance from the axis of the first wall, m: parabolic haunches, level between them. */
export function depthAt(shape: Pick<FrameShape, 'supportsM' | 'kneeM' | 'midspanM'>, xM: number): number {
  const { supportsM, kneeM, midspanM } = shape;
  const span = spanAt(supportsM, xM);
  const spanM = supportsM[span + 1]! - supportsM[span]!;
  const haunchM = portalData.shape.haunchShare * spanM;
  const from = Math.min(xM - supportsM[span]!, supportsM[span + 1]! - xM);
  const share = Math.max(0, 1 - Math.max(0, from) / haunchM);
  return midspanM + (kneeM - midspanM) * share ** 2;
}

/** The span that a place lies in; the first or the last beyond the ends. */
export function spanAt(supportsM: readonly number[], xM: number): number {
  let span = 0;
  while (span < supportsM.length - 2 && xM > supportsM[span + 1]!) span++;
  return span;
}

/** Lays out the frame for the spans and the depth at midspan of the task. */
export function frameShape(task: UnitTask): FrameShape {
  const { shape, leg } = portalData;
  const { spansM } = task;
  const spanM = Math.max(...spansM);
  const supportsM = supportPositions(spansM);
  const lengthM = supportsM[supportsM.length - 1]!;
  const midspanM = task.depthM;
  // The least of the band that rules give for the knee, or more where the deck is deeper.
  const kneeM = Math.max(shape.kneeOverMidspan * midspanM, depthBand('portal-frame', 'simple')[0] * spanM);
  const stepped = (value: number): number =>
    Math.max(shape.leastLegM, Math.ceil(value / shape.stepM - 1e-9) * shape.stepM);
  const legTopM = stepped(shape.legOverKnee * kneeM);
  const legFootM = stepped(shape.footOverTop * legTopM);
  const clear = task.clearUnderM ?? supportsM.map(() => leg.assumedClearM);
  const least = Math.max(leg.leastM, leg.leastOverSpan * spanM) + kneeM;
  const wanted = clear.map((height) => height + midspanM + leg.belowGroundM);
  const heightM = wanted.map((height) => Math.max(least, height));
  const wing = wingRoot(task, loadStandard(task.standard));
  const wingM = wingLength(task.deck, midspanM);
  const lines = { spanM, lengthM, supportsM, kneeM, midspanM };
  const nodes: [number, number][] = [];
  const sections: FrameSection[] = [];
  /** Depths below the top at which a wall is struck, between its foot and the soffit. */
  const struckM = supportsM.map((_, support) =>
    (task.strikes?.[support] ?? []).map(({ aboveGroundM }) =>
      Math.min(heightM[support]!, Math.max(kneeM, clear[support]! + midspanM - aboveGroundM)),
    ),
  );
  /** Shares of the height below the soffit at which a wall has nodes: even steps, and where it is struck. */
  const upsOf = (support: number): number[] => {
    const height = heightM[support]!;
    const even = Array.from({ length: wallElements + 1 }, (_, k) => k / wallElements);
    const struck = struckM[support]!.map((depth) => (height - depth) / (height - kneeM));
    const more = struck.filter(
      (up, k) => struck.indexOf(up) === k && even.every((one) => Math.abs(one - up) > 1e-6),
    );
    return [...even, ...more].sort((a, b) => a - b);
  };
  /** Nodes of a wall, the last one from its soffit down. */
  const wall = (support: number): number[] => {
    const height = heightM[support]!;
    const last = support === spansM.length;
    const part = support === 0 ? 'left wall' : last ? 'right wall' : 'middle wall';
    const ups = upsOf(support);
    return (last ? ups.reverse() : ups).map((up) => {
      // A wall between two spans is bent less than those that hold the fill: as thick all the way as they are on top.
      const thickM = part === 'middle wall' ? legTopM : legFootM + (legTopM - legFootM) * up;
      sections.push(wallSection(part, task.deck, thickM));
      return nodes.push([supportsM[support]!, -height + up * (height - kneeM)]) - 1;
    });
  };
  const deck = (x: number): void => {
    const section = deckSection(task.deck, depthAt(lines, x), wingM, wing.rootM);
    nodes.push([x, -section.outerM]);
    sections.push(section);
  };
  const firstNodes = wall(0);
  const face = legTopM / 2;
  const atAxes = [nodes.length];
  deck(0);
  spansM.forEach((span, s) => {
    const from = supportsM[s]! + face;
    for (let k = 0; k <= deckElements; k++) deck(from + (k * (span - legTopM)) / deckElements);
    atAxes.push(nodes.length);
    deck(supportsM[s + 1]!);
  });
  const lastNodes = wall(spansM.length);
  const chainNodes = nodes.length;
  const middleNodes = spansM.length > 1 ? wall(1) : [];
  const walls = supportsM.map((xM, support): FrameWall => {
    const at = support === 0 ? firstNodes : support === spansM.length ? lastNodes : middleNodes;
    const name = support === 0 ? 'first' : support === spansM.length ? 'last' : 'middle';
    return {
      name,
      xM,
      heightM: heightM[support]!,
      topM: legTopM,
      footM: name === 'middle' ? legTopM : legFootM,
      nodes: at,
      foot: name === 'last' ? at[at.length - 1]! : at[0]!,
      knee: atAxes[support]!,
      struck: struckM[support]!.map((depth) =>
        at.reduce((a, b) => (Math.abs(nodes[b]![1] + depth) < Math.abs(nodes[a]![1] + depth) ? b : a)),
      ),
    };
  });
  return {
    ...lines,
    legTopM,
    legFootM,
    walls,
    intoGround: task.clearUnderM !== undefined && wanted.some((height, i) => height < heightM[i]! - 1e-9),
    wingM,
    wingRootM: wingM > 0 ? wing.rootM : midspanM,
    wingBarsM2PerM: wing.barsM2PerM,
    nodes,
    sections,
    knees: [atAxes[0]!, atAxes[atAxes.length - 1]!],
    middles: atAxes.slice(1).map((node, s) => (atAxes[s]! + node) >> 1),
    chainNodes,
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
