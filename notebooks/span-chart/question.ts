import type { GuideTask } from '../../lib/index.ts';

/** The question that comes by telephone. Lengths in m. */
export interface Question {
  /** Clear between the faces of the piers. */
  readonly openingM: number;
  /** Thickness of a pier along the road. */
  readonly pierM: number;
  readonly widthM: number;
  /** Between the abutments. */
  readonly lengthM: number | 'unknown';
  readonly radiusM: number | 'straight';
}

/** What each figure of a question may be, m. */
export const limits = {
  openingM: [2, 2500],
  pierM: [0, 20],
  widthM: [3, 60],
  lengthM: [2, 20_000],
  radiusM: [20, 20_000],
} as const satisfies Readonly<Record<keyof Question, readonly [least: number, most: number]>>;

/** What is asked as long as nobody has said anything else. */
export const presetQuestion: Question = {
  openingM: 60,
  pierM: 3,
  widthM: 12.5,
  lengthM: 'unknown',
  radiusM: 'straight',
};

/** Plan radius that is shown first when a straight road becomes a curve, m. */
export const FIRST_RADIUS_M = 500;

/**
 * The span that is asked for, m, axis to axis of the piers: the opening and half a pier at either end, and no more
 * than the length between the abutments.
 */
export const askedSpanM = ({ openingM, pierM, lengthM }: Question): number =>
  Math.min(Number((openingM + pierM).toFixed(2)), lengthM === 'unknown' ? Infinity : lengthM);

/** The same question as the guide takes it. */
export const taskOf = (question: Question): GuideTask => ({
  spanM: askedSpanM(question),
  widthM: question.widthM,
  ...(question.lengthM === 'unknown' ? {} : { lengthM: question.lengthM }),
  ...(question.radiusM === 'straight' ? {} : { radiusM: question.radiusM }),
});

/** Whether the abutments leave room for the opening. */
export const hasRoom = ({ openingM, lengthM }: Question): boolean =>
  lengthM === 'unknown' || lengthM >= openingM;

/** Names of the figures in an address. */
const names: Readonly<Record<keyof Question, string>> = {
  openingM: 'opening',
  pierM: 'pier',
  widthM: 'width',
  lengthM: 'length',
  radiusM: 'radius',
};
const keys = Object.keys(names) as (keyof Question)[];

/**
 * The question an address asks; what it leaves out is preset.
 * @param search as `location.search`, e.g. '?opening=60&width=12.5&length=230'
 * @returns the question, and in words what could not be taken; the preset stands in its place
 */
export function readQuestion(search: string): {
  readonly question: Question;
  readonly problems: readonly string[];
} {
  const given = new URLSearchParams(search);
  const problems: string[] = [];
  const refuse = (key: keyof Question, expected: string): void => {
    const preset = presetQuestion[key];
    const shown = typeof preset === 'number' ? `${preset} m` : preset;
    problems.push(
      `${names[key]}: expected ${expected}, received '${given.get(names[key]) ?? ''}' in the address; ${shown} is shown.`,
    );
  };
  const read: Partial<Record<keyof Question, number>> = {};
  for (const key of keys) {
    const text = given.get(names[key]);
    if (text === null || text === presetQuestion[key]) continue;
    const value = text.trim() === '' ? Number.NaN : Number(text);
    const [least, most] = limits[key];
    if (value >= least && value <= most) read[key] = value;
    else refuse(key, `${least} to ${most} m`);
  }
  const question: Question = { ...presetQuestion, ...read };
  if (hasRoom(question)) return { question, problems };
  refuse('lengthM', `at least the clear opening of ${question.openingM} m`);
  return { question: { ...question, lengthM: 'unknown' }, problems };
}

/** The address that asks a question: '?opening=60&pier=3&width=12.5'. What is unknown or straight is left out. */
export function writeQuestion(question: Question): string {
  const address = new URLSearchParams();
  for (const key of keys)
    if (typeof question[key] === 'number') address.set(names[key], String(question[key]));
  return `?${address.toString()}`;
}
