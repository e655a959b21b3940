import { asPriceDate, type Budget, type Crossing, type Study } from '../../../lib/index.ts';
import type { Figure, Made, Path } from '../../page/index.ts';
import { putAt } from '../../page/place.ts';
import { priceDateWords } from '../words.ts';

/** How the road lies in plan. */
export type PlanShape = 'straight' | 'curve' | 'unknown';

const planRadius: readonly string[] = ['brief', 'crossing', 'planRadiusM'];

/** Radius taken when a line is first said to be a curve, m; typed over at once. */
const FIRST_RADIUS_M = 500;

export const planShapeOf = ({ planRadiusM }: Crossing): PlanShape =>
  typeof planRadiusM === 'number' ? 'curve' : planRadiusM;

/** Straight, a curve, or not known: the kind of answer that the plan radius holds. */
export const planShape: Made<PlanShape> = {
  key: 'brief.crossing.planShape',
  get: ({ brief }) => planShapeOf(brief.crossing),
  put: (study, shape) =>
    planShapeOf(study.brief.crossing) === shape
      ? study
      : putAt(study, planRadius, shape === 'curve' ? FIRST_RADIUS_M : shape),
  from: () => [planRadius],
};

/** The radius of a curve, m. */
export const radiusOfCurve: Made<Figure> = {
  key: planRadius.join('.'),
  has: ({ brief }) => typeof brief.crossing.planRadiusM === 'number',
  get: ({ brief }) =>
    typeof brief.crossing.planRadiusM === 'number' ? brief.crossing.planRadiusM : 'unknown',
  put: (study, value) => putAt(study, planRadius, value),
  owns: [planRadius],
};

const isLane = ({ kind }: { readonly kind: string }): boolean => kind === 'lane';

/** How many lanes the deck carries: more are put beside the last one and are as wide, fewer take the last ones away. */
export const laneCount: Made<Figure> = {
  key: 'brief.deck.lanes',
  get: ({ brief }) => brief.deck.filter(isLane).length,
  put(study, count) {
    if (count === 'unknown') return study;
    const { deck } = study.brief;
    const places = deck.flatMap((strip, i) => (isLane(strip) ? [i] : []));
    const last = places.at(-1);
    if (last === undefined) return study;
    const gone = new Set(places.slice(count));
    const more = Array.from({ length: Math.max(0, count - places.length) }, () => deck[last]!);
    const kept = deck.flatMap((strip, i) => (gone.has(i) ? [] : i === last ? [strip, ...more] : [strip]));
    return putAt(study, ['brief', 'deck'], kept);
  },
  from: ({ brief }) =>
    brief.deck.flatMap((strip, i) => (isLane(strip) ? [['brief', 'deck', i, 'kind']] : [])),
};

/** Width of the stretch of an obstacle, m; changed about its middle. */
export const obstacleWidth = (index: number): Made<Figure> => ({
  key: `brief.obstacles.${index}.width`,
  has: ({ brief }) => index < brief.obstacles.length,
  get: ({ brief }) => widthOf(brief.obstacles[index]!),
  put: (study, widthM) =>
    putAt(study, ['brief', 'obstacles', index], widened(study.brief.obstacles[index]!, widthM)),
  from: () => endsOf(['brief', 'obstacles', index]),
});

/** Width of the envelope over an obstacle, m; changed about its middle. */
export const envelopeWidth = (index: number): Made<Figure> => ({
  key: `brief.obstacles.${index}.clearance.width`,
  has: ({ brief }) => (brief.obstacles[index]?.clearance ?? null) !== null,
  get: ({ brief }) => widthOf(brief.obstacles[index]!.clearance!),
  put: (study, widthM) =>
    putAt(
      study,
      ['brief', 'obstacles', index, 'clearance'],
      widened(study.brief.obstacles[index]!.clearance!, widthM),
    ),
  from: () => endsOf(['brief', 'obstacles', index, 'clearance']),
});

interface Stretch {
  readonly fromM: number;
  readonly toM: number;
}
const endsOf = (stretch: Path): Path[] => ['fromM', 'toM'].map((key) => [...stretch, key]);
const toMillimetre = (metres: number): number => Number(metres.toFixed(3));
const widthOf = ({ fromM, toM }: Stretch): number => toMillimetre(toM - fromM);

function widened<T extends Stretch>(stretch: T, widthM: Figure): T {
  if (widthM === 'unknown') return stretch;
  const middleM = (stretch.fromM + stretch.toM) / 2;
  return { ...stretch, fromM: toMillimetre(middleM - widthM / 2), toM: toMillimetre(middleM + widthM / 2) };
}

/**
 * The budget, money, or not known. A budget that is given again comes back with the price date and scope it had.
 * @param firstPriceDate price date of a budget that never had one
 */
export function budgetAmount(firstPriceDate: string): Made<Figure> {
  let had: Omit<Budget, 'amount'> = { priceDate: firstPriceDate, includes: '' };
  return {
    key: 'brief.budget.amount',
    get: ({ brief: { budget } }) => (budget === 'unknown' ? budget : budget.amount),
    put(study, amount) {
      const { budget } = study.brief;
      if (budget !== 'unknown') had = { priceDate: budget.priceDate, includes: budget.includes };
      return putAt(study, ['brief', 'budget'], amount === 'unknown' ? amount : { amount, ...had });
    },
    owns: [['brief', 'budget', 'amount']],
  };
}

const priceDatePath = ['brief', 'budget', 'priceDate'];

/** The price date of a budget in words: a date that can be told is written as the study writes it, '?' is undated. */
export const priceDate: Made<string> = {
  key: priceDatePath.join('.'),
  has: ({ brief }) => brief.budget !== 'unknown',
  get: ({ brief: { budget } }) => (budget === 'unknown' ? '' : priceDateWords(budget.priceDate)),
  put(study, words) {
    const isUnknown = ['?', 'unknown', priceDateWords('unknown')].includes(words);
    return putAt(study, priceDatePath, isUnknown ? 'unknown' : (asPriceDate(words) ?? words));
  },
  owns: [priceDatePath],
};

/** Whether the ground is proved all along: of all its stretches, of none, or of some. */
export type Proved = 'known' | 'unknown' | 'part';

export const provedOf = (study: Study): Proved => {
  const known = study.brief.groundStretches.filter((stretch) => stretch.known).length;
  if (known === 0) return 'unknown';
  return known === study.brief.groundStretches.length ? 'known' : 'part';
};

export const groundProved: Made<Proved> = {
  key: 'brief.groundStretches.known',
  get: provedOf,
  put: (study, proved) =>
    proved === 'part'
      ? study
      : putAt(
          study,
          ['brief', 'groundStretches'],
          study.brief.groundStretches.map((stretch) => ({ ...stretch, known: proved === 'known' })),
        ),
  from: ({ brief }) => brief.groundStretches.map((_, i) => ['brief', 'groundStretches', i, 'known']),
};
