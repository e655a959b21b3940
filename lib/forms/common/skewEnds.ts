import type { Design, UnitTask } from '../../model/index.ts';
import { carries } from './carries.ts';
import { aheadM } from './skewPlanes.ts';
import { skewWords } from './skewWords.ts';

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
 * ends they stand along the skew abutments and twist the end spans. Where one of the two would lift there, the ends are
 * taken square to the road as well, which is said with what it costs: neither is what a box is given up for. A bearing
 * that lifts on square ends too is not put down to the skew.
 * @param size sizes a task with its ends on its skew
 */
export function withSkewEnds(task: UnitTask, size: (task: UnitTask) => Design): Design {
  const { skewDeg = 0, ...square } = task;
  if (skewDeg === 0) return size(task);
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
  const plain = size(square);
  const left = uplift(plain)!;
  const turns = task.planRadiusM < Infinity ? 'eccentric traffic and the curve' : 'eccentric traffic';
  const why = carries(left)
    ? `of two bearings along a skew abutment the acute would lift (${percent(lifts)}), so the box is sized with all its bearings square to the road`
    : `one of two bearings lifts on square supports already, by ${turns} (${percent(left)}; along skew abutments ${percent(lifts)}), so the box is sized with all its bearings square to the road`;
  const tied = carries(left) ? '; ends along the skew would have to be tied down' : '';
  return {
    ...plain,
    task,
    warnings: [
      ...plain.warnings,
      `${skewWords(skewDeg)}: ${why}. Its ends then need ${aheadM(task.deck.widthM, skewDeg).toFixed(1)} m of slab or sill beyond them at one edge, which is not measured${tied}.`,
    ],
  };
}
