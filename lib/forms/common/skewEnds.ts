import type { Design, UnitTask } from '../../model/index.ts';
import { carries } from './carries.ts';
import { aheadM } from './skewPlanes.ts';
import { skewWords } from './skewWords.ts';
import { squareEndLines } from './squareEnds.ts';

/** Figures of a box on skew ends: greatest design torque, kNm, and what it shifts from the acute bearing to the obtuse, kN; none on square ends. */
export const skewFigures = (torqueKNm: number, apartM: number): Record<string, number> =>
  torqueKNm > 0 ? { skewTorqueKNm: torqueKNm, skewBearingKN: torqueKNm / apartM } : {};

/** Use of the bearings that lift first; none where the form has nothing to say of it. */
const uplift = ({ checks }: Design): number | undefined =>
  checks.find(({ id }) => id === 'bearing-uplift')?.utilisation;

/** Bearings at a support: two under every box. */
const bearingsOf = ({ figures }: Design): number => 2 * (figures['boxes'] ?? 1);

const percent = (use: number): string => `${(100 * use).toFixed(0)} % of its limit`;

/**
 * A box on a skew. At its piers two bearings, or what is cast in, stand square to the road under square diaphragms; at its
 * ends they stand along the skew abutments and twist the end spans. Where one of the two would lift there, or where that is
 * asked, the ends are taken square to the road as well, and what closes the wedges to the abutments is measured: neither is
 * what a box is given up for. A bearing that lifts on square ends too is not put down to the skew.
 * @param size sizes a task with its ends on its skew
 */
export function withSkewEnds(task: UnitTask, size: (task: UnitTask) => Design): Design {
  const { skewDeg = 0 } = task;
  if (skewDeg === 0) return size(task);
  if (task.squareEnds) return onSquareEnds(task, size, () => 'all bearings stand square to the road');
  const skew = size(task);
  const lifts = uplift(skew);
  const { skewTorqueKNm = 0, skewBearingKN = 0 } = skew.figures;
  if (lifts === undefined || carries(lifts))
    return {
      ...skew,
      skewPressKN: bearingsOf(skew) * skewBearingKN,
      warnings: [
        ...skew.warnings,
        `${skewWords(skewDeg)}: bearings stand square to the road at the piers, and along the abutments at the ends. There the twist of ${(skewTorqueKNm / 1e3).toFixed(1)} MNm (design) presses the obtuse bearing by ${(skewBearingKN / 1e3).toFixed(1)} MN more and the acute by as much less.`,
      ],
    };
  return onSquareEnds(task, size, (square) => liftsWords(task, lifts, uplift(square)!));
}

/** The same with its ends square to the road. @param why of the design that comes of it, in words */
function onSquareEnds(
  task: UnitTask,
  size: (task: UnitTask) => Design,
  why: (design: Design) => string,
): Design {
  const { skewDeg = 0, squareEnds: _asked, ...square } = task;
  const design = size(square);
  return {
    ...design,
    task,
    lines: [...design.lines, ...squareEndLines(task)],
    warnings: [
      ...design.warnings,
      `${skewWords(skewDeg)}: ${why(design)}. The ends need ${aheadM(task.deck.widthM, skewDeg).toFixed(1)} m of sill and slab beyond them at one edge, which are measured.`,
    ],
  };
}

/** Why ends are not left along a skew. @param lifts use of the bearings there, and `left` of those on square ends */
function liftsWords({ planRadiusM }: UnitTask, lifts: number, left: number): string {
  const squared = 'so the box is sized with all its bearings square to the road';
  if (carries(left))
    return `of two bearings along a skew abutment the acute would lift (${percent(lifts)}), ${squared}; ends along the skew would have to be tied down`;
  const turns = planRadiusM < Infinity ? 'eccentric traffic and the curve' : 'eccentric traffic';
  return `one of two bearings lifts on square supports already, by ${turns} (${percent(left)}; along skew abutments ${percent(lifts)}), ${squared}`;
}
