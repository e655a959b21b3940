import { loadStandard, notionalLanes, type LoadStandard } from '../../actions/index.ts';
import type { DeckSpec, StandardId } from '../../model/index.ts';
import { stripInfluence, type PatchRow } from '../common/slab/stripInfluence.ts';
import { slabData } from '../common/slab/slabData.ts';
import { slabDeckData } from './slabDeckData.ts';

/** Traffic on one metre of slab, in the same units as the deck as a whole. */
export interface WheelStrips {
  /** Width that carries one lane-1 vehicle (with its lane load under AASHTO) in bending, m. */
  readonly vehicleWidthM: number;
  /** The same in shear near a support, m. */
  readonly shearWidthM: number;
  /** Uniform load on the heaviest metre, kN/m2; 0 under AASHTO, where it goes with the vehicle. */
  readonly uniformKNm2: number;
  /** Wheel moment across the road at midspan, kNm/m; null under AASHTO, where it is a share of the bars along. */
  readonly acrossKNm: number | null;
}

const steps = 40;

/**
 * Width of slab that carries a vehicle. LM1: plate on two edges the distance of the zero moments apart, mirrored at the
 * edges of the deck so that no moment is lost over them, with the heaviest lane in the middle of the others or along a
 * kerb. AASHTO: equivalent strips of 4.6.2.3.
 * @param spanM longest distance between zero moments, m
 * @param depthM structural depth, m
 */
export function wheelStrips(id: StandardId, deck: DeckSpec, spanM: number, depthM: number): WheelStrips {
  const standard = loadStandard(id);
  if (standard.distributionFactors) {
    const widthM = equivalentStripM(standard, deck, spanM);
    return { vehicleWidthM: widthM, shearWidthM: widthM, uniformKNm2: 0, acrossKNm: null };
  }
  const { widthM: laneM, wheelGaugeM } = standard.lanes;
  const { axles } = standard.vehicles[0]!;
  const totalKN = axles.reduce((sum, { loadKN }) => sum + loadKN, 0);
  const middle = axles.reduce((sum, { atM, loadKN }) => sum + (atM * loadKN) / totalKN, 0);
  const patch = slabData.wheelPatchM[id];
  // Wheels spread at 45 degrees through surfacing and down to the middle of the slab.
  const spread = 2 * deck.surfacingM + depthM;
  const shares = laneShares(standard, deck);
  const arrangements = arrangementsOf(standard, deck, shares.length);
  /** Greatest moment at midspan: the vehicle in the middle, or one of its axles there. */
  const momentOf = (
    row: (lane: number) => Omit<PatchRow, 'sideSpanM'>,
    direction: 'span' | 'edges',
  ): number => {
    const lines = shares.map((_, lane) => {
      const sides = { ...row(lane), sideSpanM: patch.alongM + spread };
      return stripInfluence(spanM, spanM / 2, sides, slabData.poisson.value, steps, direction);
    });
    return Math.max(
      ...[middle, ...axles.map(({ atM }) => atM)].map((shift) => {
        let sum = 0;
        for (const { atM, loadKN } of axles)
          lines.forEach((line, lane) => {
            sum += loadKN * shares[lane]! * at(line, 0.5 + (atM - shift) / spanM);
          });
        return sum;
      }),
    );
  };
  const along = Math.max(
    ...arrangements.map(({ lanesM }) =>
      // In the direction of the span the wheels of a lane act over its width.
      momentOf(
        (lane) => ({ alongM: mirrored(deck.widthM, spanM, lanesM[lane]!, lanesM[0]!), sideAlongM: laneM }),
        'span',
      ),
    ),
  );
  const wheels = (offsetM: number): number[] => [offsetM - wheelGaugeM / 2, offsetM + wheelGaugeM / 2];
  const across = Math.max(
    ...arrangements.flatMap(({ lanesM }) =>
      // Under a wheel, or between the two.
      [wheelGaugeM / 2, 0].map((shift) =>
        momentOf(
          (lane) => ({
            alongM: wheels(lanesM[lane]! - lanesM[0]! + shift),
            sideAlongM: patch.acrossM + spread,
          }),
          'edges',
        ),
      ),
    ),
  );
  const lineKNm = axles.reduce(
    (sum, { atM, loadKN }) => sum + loadKN * Math.max(0, spanM / 4 - Math.abs(atM - middle) / 2),
    0,
  );
  return {
    vehicleWidthM: lineKNm / along,
    shearWidthM: shearWidth(standard, shares, patch.acrossM, depthM),
    uniformKNm2: Math.max(
      ...arrangements.map(({ lanesM }) => heaviestUniform(standard, deck, spanM, lanesM[0]!)),
    ),
    // Two wheels share an axle.
    acrossKNm: (across / 2) * (1 + standard.dynamicAllowance),
  };
}

/** Value at a share of the span, straight between the steps. */
function at(line: Float64Array, share: number): number {
  const i = Math.max(0, Math.min(steps - 1e-9, share * steps));
  const left = Math.floor(i);
  return line[left]! + (i - left) * (line[left + 1]! - line[left]!);
}

/** Shares of the lane-1 vehicle in the lanes that carry one, heaviest first. */
function laneShares(standard: LoadStandard, deck: DeckSpec): number[] {
  const { vehicleShare, adjustment } = standard.lanes;
  const { count } = notionalLanes(standard.lanes, deck.carriagewayM);
  return vehicleShare
    .slice(0, count)
    .map((share, i) => share * (adjustment.vehicle[i] ?? 1))
    .filter((share) => share > 0);
}

/** Middles of the lanes from the left edge of the deck, heaviest lane first, m. */
interface Arrangement {
  readonly lanesM: readonly number[];
}

/** Heaviest lane along the kerb nearer to its edge, and in the middle of the carriageway where lanes fit on both sides. */
function arrangementsOf(standard: LoadStandard, deck: DeckSpec, lanes: number): Arrangement[] {
  const laneM = Math.min(standard.lanes.widthM, deck.carriagewayM / lanes);
  const verge = (deck.widthM - deck.carriagewayM) / 2;
  const kerbM = verge - Math.abs(deck.carriagewayOffsetM);
  const list = Array.from({ length: lanes }, (_, i) => i);
  const out: Arrangement[] = [{ lanesM: list.map((i) => kerbM + (i + 0.5) * laneM) }];
  const middleM = deck.widthM / 2 + deck.carriagewayOffsetM;
  if (lanes > 2)
    out.push({ lanesM: list.map((i) => middleM + (i % 2 === 0 ? 1 : -1) * Math.ceil(i / 2) * laneM) });
  return out;
}

/**
 * Distances from a section of a load and of its images in both edges of the deck, as far as they bend the section at all;
 * positions from the left edge, m.
 */
function mirrored(widthM: number, spanM: number, loadM: number, sectionM: number): number[] {
  const far = Math.ceil(spanM / widthM);
  return Array.from({ length: 2 * far + 1 }, (_, i) => 2 * (i - far) * widthM).flatMap((period) => [
    period + loadM - sectionM,
    period - loadM - sectionM,
  ]);
}

/** Wheels of lanes beside each other spread to both sides: width of a lane-1 vehicle with the worst number of lanes, m. */
function shearWidth(
  standard: LoadStandard,
  shares: readonly number[],
  patchM: number,
  depthM: number,
): number {
  const spread = 2 * slabDeckData.strip.shearSpread * (depthM - slabDeckData.bars.coverM);
  let sum = 0;
  return Math.min(
    ...shares.map((share, i) => {
      sum += share;
      return (standard.lanes.wheelGaugeM + patchM + i * standard.lanes.widthM + spread) / sum;
    }),
  );
}

/** Load that, on the whole plate, bends it as the heaviest lane among lighter ones does, kN/m2. */
function heaviestUniform(standard: LoadStandard, deck: DeckSpec, spanM: number, laneM: number): number {
  const { widthM, uniformKNm2, adjustment } = standard.lanes;
  const first = uniformKNm2[0]! * (adjustment.uniform[0] ?? 1);
  const others = (uniformKNm2[1] ?? standard.lanes.furtherUniformKNm2) * (adjustment.uniform[1] ?? 1);
  const row = { alongM: mirrored(deck.widthM, spanM, laneM, laneM), sideAlongM: widthM, sideSpanM: spanM };
  const perKN = stripInfluence(spanM, spanM / 2, row, slabData.poisson.value, steps)[steps / 2]!;
  const laneShare = (widthM * spanM * perKN) / (spanM ** 2 / 8);
  return others + (first - others) * Math.min(1, laneShare);
}

/** AASHTO LRFD 4.6.2.3: narrower of the strips of one lane and of several; lengths m. */
export function equivalentStripM(standard: LoadStandard, deck: DeckSpec, spanM: number): number {
  const { oneM, onePer, moreM, morePer, longestM, widestOneM, widestMoreM } = slabDeckData.equivalentStrip;
  const lengthM = Math.min(spanM, longestM);
  const one = oneM + onePer * Math.sqrt(lengthM * Math.min(deck.widthM, widestOneM));
  const lanes = Math.floor(deck.carriagewayM / standard.lanes.widthM);
  if (lanes < 2) return one;
  const more = moreM + morePer * Math.sqrt(lengthM * Math.min(deck.widthM, widestMoreM));
  return Math.min(one, more, deck.widthM / lanes);
}
