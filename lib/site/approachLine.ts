/** A stretch of an approach, counted outward from its abutment. */
export interface Outward {
  readonly lengthM: number;
  /** Level at its inner end, m. */
  readonly levelM: number;
  /** Fall outward there, as a ratio, and its change per metre: positive on a crest, negative in a sag. */
  readonly fall: number;
  readonly bend1PerM: number;
}

/** What an approach is laid out by. */
export interface ApproachRules {
  readonly gradient: number;
  readonly crestRadiusM: number;
  readonly sagRadiusM: number;
  /** Ground level outward from the abutment, m, by distance; level beyond the last survey point. */
  readonly groundAt: (outM: number) => number;
  /** Lowest ground it may come to, m. */
  readonly lowestGroundM: number;
}

export interface ApproachLine {
  readonly stretches: readonly Outward[];
  readonly lengthM: number;
  /** Whether it keeps the gradient and the curves and ends where it may. */
  readonly fits: boolean;
}

/** Steps in which the place is looked for where a road comes down to the ground, m. */
const STEP_M = 4;
const HALVINGS = 50;

/** Level and fall at a distance along stretches. */
interface Reached {
  readonly levelM: number;
  readonly fall: number;
}

function along(stretch: Outward, atM: number): Reached {
  const { levelM, fall, bend1PerM } = stretch;
  return { levelM: levelM - fall * atM - (bend1PerM * atM * atM) / 2, fall: fall + bend1PerM * atM };
}

/** Strings stretches of given lengths and bends together from a level and a fall; those without length are left out. */
export function strung(
  levelM: number,
  parts: readonly { readonly fall: number; readonly lengthM: number; readonly bend1PerM: number }[],
): Outward[] {
  const out: Outward[] = [];
  let level = levelM;
  for (const { fall, lengthM, bend1PerM } of parts) {
    if (!(lengthM > 1e-9)) continue;
    const stretch: Outward = { lengthM, levelM: level, fall, bend1PerM };
    out.push(stretch);
    level = along(stretch, lengthM).levelM;
  }
  return out;
}

export const lengthOf = (stretches: readonly Outward[]): number =>
  stretches.reduce((sum, { lengthM }) => sum + lengthM, 0);

/** Bend of a curve, 1/m; where gradients meet at an angle there is no curve to bend. */
export const bendOf = (radiusM: number): number => (radiusM > 0 ? 1 / radiusM : 0);

/** First distance at which a value that begins above 0 has come down to it, by steps and halving; null where it never does. */
function firstDown(mostM: number, value: (at: number) => number): number | null {
  for (let before = 0; before < mostM; before += STEP_M) {
    const after = Math.min(before + STEP_M, mostM);
    if (value(after) > 0) continue;
    let low = before;
    let high = after;
    for (let i = 0; i < HALVINGS && high - low > 1e-9; i += 1) {
      const middle = (low + high) / 2;
      if (value(middle) > 0) low = middle;
      else high = middle;
    }
    return high;
  }
  return null;
}

/**
 * The lowest approach whose tie-in moves: from the level and the fall at the abutment over the sharpest crest to the
 * steepest gradient, down that, and through the sharpest sag onto the ground, where it ends level. Over ground that rises
 * towards it the sag may end in cutting.
 */
export function movingApproach(levelM: number, fall: number, rules: ApproachRules): ApproachLine {
  const { gradient, crestRadiusM, sagRadiusM, groundAt } = rules;
  const crest = {
    lengthM: crestRadiusM * Math.max(0, gradient - fall),
    levelM,
    fall,
    bend1PerM: bendOf(crestRadiusM),
  };
  const steepest = Math.max(gradient, fall);
  const foot = along(crest, crest.lengthM).levelM;
  const reached = (at: number): Reached =>
    at < crest.lengthM
      ? along(crest, at)
      : { levelM: foot - steepest * (at - crest.lengthM), fall: steepest };
  const sagLength = (at: Reached): number => sagRadiusM * Math.max(0, at.fall);
  /** Height above the ground at which a sag begun at a distance ends. */
  const landing = (at: number): number => {
    const here = reached(at);
    const sag = sagLength(here);
    return here.levelM - (sag * Math.max(0, here.fall)) / 2 - groundAt(at + sag);
  };
  if (!(levelM > groundAt(0))) return { stretches: [], lengthM: 0, fits: true };
  const mostM =
    crest.lengthM + Math.max(0, foot - rules.lowestGroundM) / steepest + sagRadiusM * steepest + STEP_M;
  const begins = landing(0) > 0 ? (firstDown(mostM, landing) ?? mostM) : 0;
  const here = reached(begins);
  const sag = sagLength(here);
  const grade = begins < crest.lengthM ? 0 : begins - crest.lengthM;
  const stretches = strung(levelM, [
    { fall, lengthM: Math.min(begins, crest.lengthM), bend1PerM: crest.bend1PerM },
    { fall: steepest, lengthM: grade, bend1PerM: 0 },
    {
      fall: here.fall,
      lengthM: sag,
      bend1PerM: -bendOf(sagRadiusM),
    },
  ]);
  return { stretches, lengthM: lengthOf(stretches), fits: true };
}

/**
 * An approach whose tie-in stays, at a distance behind the abutment and level with the ground there: one gradient between
 * a curve at the abutment and one at the tie-in. It fits where that gradient and both curves do.
 */
export function fixedApproach(
  levelM: number,
  fall: number,
  tieInM: number,
  rules: ApproachRules,
): ApproachLine {
  const { gradient, crestRadiusM, sagRadiusM } = rules;
  const drop = levelM - rules.groundAt(tieInM);
  const parts = (grade: number) => {
    const first = grade > fall ? crestRadiusM : sagRadiusM;
    const last = grade > 0 ? sagRadiusM : crestRadiusM;
    const curve = first * Math.abs(grade - fall);
    const end = last * Math.abs(grade);
    return [
      { fall, lengthM: curve, bend1PerM: Math.sign(grade - fall) * bendOf(first) },
      { fall: grade, lengthM: tieInM - curve - end, bend1PerM: 0 },
      { fall: grade, lengthM: end, bend1PerM: -Math.sign(grade) * bendOf(last) },
    ] as const;
  };
  const fallsBy = (grade: number): number =>
    parts(grade).reduce(
      (sum, { fall: from, lengthM, bend1PerM }) => sum + lengthM * (from + (bend1PerM * lengthM) / 2),
      0,
    );
  let low = -gradient;
  let high = gradient;
  for (let i = 0; i < HALVINGS; i += 1) {
    const middle = (low + high) / 2;
    if (fallsBy(middle) < drop) low = middle;
    else high = middle;
  }
  const grade = (low + high) / 2;
  const laid = parts(grade);
  const fits = Math.abs(fallsBy(grade) - drop) <= 1e-6 && laid[1].lengthM >= -1e-9;
  return { stretches: strung(levelM, laid), lengthM: tieInM, fits };
}
