import { polygonProperties } from '../../mechanics/index.ts';
import type { DeckSpec } from '../../model/index.ts';
import { slabDeckData } from './slabDeckData.ts';

type Point = readonly [y: number, z: number];

/** Outline of a slab deck: y across from its middle, z up from the top (down is negative), m. */
export interface SlabOutline {
  readonly outer: readonly Point[];
  readonly voids: readonly (readonly Point[])[];
  readonly soffitM: number;
  /** Length of each wing and its thickness where it joins the side, m. */
  readonly wingM: number;
  readonly wingRootM: number;
  readonly voidDiameterM: number;
}

/** Properties of a section of the deck; depths from the top. */
export interface SlabSection {
  readonly areaM2: number;
  readonly inertiaM4: number;
  readonly topM: number;
  readonly lowM: number;
  /** Concrete between the voids at their middle, m. */
  readonly websM: number;
  /** Concrete above and below the voids; the whole depth where there are none, m. */
  readonly aboveM: number;
  readonly belowM: number;
}

const corners = 24;

/**
 * Outline of a slab of constant depth: plain when thin, cut back under its edges when deeper, with round voids past the
 * depth of `data/forms/slab-deck.json` where two or more fit in.
 * @param wingRootM thickness of the wing at the side, m
 */
export function slabOutline(deck: DeckSpec, depthM: number, wingRootM: number): SlabOutline {
  const wingM = wingLength(deck, depthM);
  const half = deck.widthM / 2;
  const { edgeM, sideSlope } = slabDeckData.wings;
  const side = half - wingM;
  const soffit = side - (wingM > 0 ? sideSlope * (depthM - wingRootM) : 0);
  const outer: Point[] =
    wingM > 0
      ? [
          [-half, 0],
          [-half, -edgeM],
          [-side, -wingRootM],
          [-soffit, -depthM],
          [soffit, -depthM],
          [side, -wingRootM],
          [half, -edgeM],
          [half, 0],
        ]
      : [
          [-half, 0],
          [-half, -depthM],
          [half, -depthM],
          [half, 0],
        ];
  const { diameterM, middles, depth } = voidsOf(depthM, 2 * soffit);
  return {
    outer,
    voids: middles.map((y) => circle(y, -depth, diameterM)),
    soffitM: 2 * soffit,
    wingM,
    wingRootM: wingM > 0 ? wingRootM : depthM,
    voidDiameterM: diameterM,
  };
}

/** Length of the wings of a slab of given depth, m: growing with it, short of a share of the width. */
export function wingLength(deck: DeckSpec, depthM: number): number {
  const { fromDepthM, lengthPerDepth, mostM, mostOverWidth } = slabDeckData.wings;
  return Math.max(0, Math.min(mostM, mostOverWidth * deck.widthM, lengthPerDepth * (depthM - fromDepthM)));
}

function voidsOf(
  depthM: number,
  soffitM: number,
): { readonly diameterM: number; readonly middles: readonly number[]; readonly depth: number } {
  const { fromDepthM, aboveM, belowM, ribM, edgeM, mostDiameterM } = slabDeckData.voids;
  const diameterM = Math.min(mostDiameterM, depthM - aboveM - belowM);
  const count = Math.floor((soffitM - 2 * edgeM + ribM) / (diameterM + ribM) + 1e-9);
  if (!(depthM > fromDepthM) || count < 2) return { diameterM: 0, middles: [], depth: 0 };
  const pitch = (soffitM - 2 * edgeM - diameterM) / (count - 1);
  const first = (-pitch * (count - 1)) / 2;
  return {
    diameterM,
    middles: Array.from({ length: count }, (_, i) => first + i * pitch),
    // A void of the largest size is centred in the room it has.
    depth: aboveM + (depthM - aboveM - belowM) / 2,
  };
}

/** Polygon of the same area as the circle. */
function circle(y: number, z: number, diameterM: number): Point[] {
  const step = (2 * Math.PI) / corners;
  const radius = (diameterM / 2) * Math.sqrt(step / Math.sin(step));
  return Array.from({ length: corners }, (_, i) => [
    y + radius * Math.cos(i * step),
    z + radius * Math.sin(i * step),
  ]);
}

/** Properties of the outline with its voids, and without them (solid over supports). */
export function slabSections(
  outline: SlabOutline,
  depthM: number,
): { readonly span: SlabSection; readonly solid: SlabSection } {
  const solid = sectionOf(outline, depthM, []);
  return { span: outline.voids.length > 0 ? sectionOf(outline, depthM, outline.voids) : solid, solid };
}

function sectionOf(outline: SlabOutline, depthM: number, voids: readonly (readonly Point[])[]): SlabSection {
  const { areaM2, centroidM, inertiaM4 } = polygonProperties(outline.outer, voids);
  const room = depthM - outline.voidDiameterM;
  const { aboveM, belowM } = slabDeckData.voids;
  return {
    areaM2,
    inertiaM4,
    topM: -centroidM,
    lowM: depthM + centroidM,
    websM: outline.soffitM - voids.length * outline.voidDiameterM,
    aboveM: voids.length > 0 ? (room * aboveM) / (aboveM + belowM) : depthM,
    belowM: voids.length > 0 ? (room * belowM) / (aboveM + belowM) : depthM,
  };
}
