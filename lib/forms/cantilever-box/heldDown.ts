import { pointLoads, stepped, type CantileverMoments, type Effects } from '../../mechanics/index.ts';
import type { Anchor } from './anchors.ts';
import { cantileverData } from './cantileverData.ts';
import type { CantileverModel } from './cantileverModel.ts';

/** How an anchor holds at the support where it comes nearest to lifting, design values of static equilibrium. */
export interface Hold {
  readonly anchor: Anchor;
  readonly support: number;
  /** By the longer arm, less what the shorter one balances, kN. */
  readonly upliftKN: number;
  /** Weight and ballast that stand there, kN. */
  readonly weightKN: number;
}

/** What joined spans carry before the whole deck is joined, besides the free arms. Moments sagging positive, at the stations. */
export interface HeldDown {
  readonly momentKNm: Float64Array;
  readonly shearLeftKN: Float64Array;
  readonly shearRightKN: Float64Array;
  readonly reactionKN: Float64Array;
  /** Most hogging of all stages before the whole deck is joined. */
  readonly worstKNm: Float64Array;
  readonly holds: readonly Hold[];
  /** Spans whose pieces on falsework, ballast and leaving travellers are in it. */
  readonly spans: ReadonlySet<number>;
}

/** What is there before any arm is held down. */
export interface FreeArms {
  readonly arms: readonly CantileverMoments[];
  /** Moment of the free arms at the stations, that of the right one over a pier. */
  readonly momentKNm: Float64Array;
  readonly travellerKN: number;
  /** Pieces on falsework, kN/m by element. */
  readonly onFalseworkKNm: Float64Array;
  readonly diaphragmKN: readonly number[];
}

type Added = Pick<Effects, 'momentKNm' | 'shearLeftKN' | 'shearRightKN' | 'reactionKN'>;

/**
 * One anchor after the other: its spans are joined, their ballast is laid and their travellers go; then the couple by which
 * the longer arm outweighs the shorter one is let go from the pier and bends them.
 */
export function heldDown(model: CantileverModel, before: FreeArms): HeldDown {
  const { beam, anchors, supportsM } = model;
  const { arms, travellerKN } = before;
  const n = beam.xM.length;
  const out = {
    momentKNm: new Float64Array(n),
    shearLeftKN: new Float64Array(n),
    shearRightKN: new Float64Array(n),
    reactionKN: new Float64Array(supportsM.length),
  };
  const worstKNm = before.momentKNm.slice();
  const ownKN = supportsM.map((_, j) => before.diaphragmKN[j]!);
  arms.forEach(({ shearKN, momentKNm }, k) => {
    const { support } = model.arms[k]!;
    ownKN[support]! += shearKN[0]! - travellerKN;
    const at = beam.supportAt[support]!;
    worstKNm[at] = Math.min(worstKNm[at]!, momentKNm[0]!);
  });
  const spans = new Set<number>();
  const holds: Hold[] = [];
  for (const anchor of anchors) {
    const { firstSpan, lastSpan, fromStation, hogged } = anchor;
    const add = (effects: Added, times = 1): void => {
      // Over the pier the free arms count the moment of the right one: it is there already where that is the longer.
      const to = effects.momentKNm.length - (anchor.side < 0 ? 1 : 0);
      for (let i = 0; i < effects.momentKNm.length; i++) {
        if (i < to) out.momentKNm[fromStation + i]! += times * effects.momentKNm[i]!;
        out.shearLeftKN[fromStation + i]! += i > 0 ? times * effects.shearLeftKN[i]! : 0;
        out.shearRightKN[fromStation + i]! +=
          i < effects.momentKNm.length - 1 ? times * effects.shearRightKN[i]! : 0;
      }
      effects.reactionKN.forEach((kN, j) => {
        out.reactionKN[firstSpan + j]! += times * kN;
      });
    };
    const fresh: number[] = [];
    for (let span = firstSpan; span <= lastSpan; span++) if (!spans.has(span)) fresh.push(span);
    const laid = stepped(anchor.beam, laidOn(model, anchor, fresh, before.onFalseworkKNm));
    add(laid);
    add(
      pointLoads(
        anchor.beam,
        model.arms
          .filter(({ span }) => fresh.includes(span))
          .map((arm) => ({
            xM: arm.pierM + arm.side * arm.armM - supportsM[firstSpan]!,
            loadKN: -travellerKN,
          })),
      ),
    );
    for (const span of fresh) spans.add(span);
    laid.reactionKN.forEach((kN, j) => {
      ownKN[firstSpan + j]! += kN;
    });
    const rootKNm = (k: number): number => -arms[k]!.momentKNm[0]!;
    const travellerKNm = (k: number): number => travellerKN * model.arms[k]!.armM;
    const { longer, shorter } = anchor;
    const longerKNm = rootKNm(longer) - travellerKNm(longer);
    const shorterKNm = rootKNm(shorter) - travellerKNm(shorter);
    // Equal arms of unlike concrete: the heavier side stands on its own.
    if (longerKNm > shorterKNm)
      holds.push(holdOf(anchor, longerKNm, shorterKNm, travellerKNm(longer), ownKN));
    hogged.reactionKN.forEach((kN, j) => {
      ownKN[firstSpan + j]! += (longerKNm - shorterKNm) * kN;
    });
    add(hogged, rootKNm(longer) - rootKNm(shorter));
    for (let i = fromStation; i < fromStation + hogged.momentKNm.length; i++)
      worstKNm[i] = Math.min(worstKNm[i]!, before.momentKNm[i]! + out.momentKNm[i]!);
  }
  return { ...out, worstKNm, holds, spans };
}

/** Pieces on falsework and ballast of spans that are joined now, kN/m by element of the anchor. */
function laidOn(
  { beam, task }: CantileverModel,
  anchor: Anchor,
  spans: readonly number[],
  onFalseworkKNm: Float64Array,
): Float64Array {
  const kNm = new Float64Array(anchor.beam.xM.length - 1);
  for (const span of spans)
    for (let e = beam.supportAt[span]!; e < beam.supportAt[span + 1]!; e++)
      kNm[e - anchor.fromStation] = onFalseworkKNm[e]! + (task.ballastKNm?.[span] ?? 0);
  return kNm;
}

function holdOf(
  anchor: Anchor,
  longerKNm: number,
  shorterKNm: number,
  travellerKNm: number,
  ownKN: readonly number[],
): Hold {
  const { overturning, holding, traveller } = cantileverData.holdDown;
  const coupleKNm = overturning * longerKNm + traveller * travellerKNm - holding * shorterKNm;
  const { firstSpan, hogged } = anchor;
  let worst: Hold | null = null;
  hogged.reactionKN.forEach((perKNm, j) => {
    const support = firstSpan + j;
    if (support === anchor.support) return;
    const upliftKN = Math.max(0, -perKNm * coupleKNm);
    const weightKN = Math.max(0, holding * ownKN[support]!);
    if (worst === null || upliftKN * worst.weightKN > worst.upliftKN * weightKN)
      worst = { anchor, support, upliftKN, weightKN };
  });
  return worst!;
}
