import { materials } from '../../actions/index.ts';
import { remedyFor, sentences } from '../../messages/index.ts';
import type { Problem, UnitTask } from '../../model/index.ts';
import { boxData } from './boxData.ts';

/** What a box may be asked to be, without its depth. */
type Asked = Omit<UnitTask, 'depthM'>;

/**
 * Why a concrete box cannot be made as it is asked: width of the box, strength, lightweight concrete, ballast. Paths are
 * those of a `Variant`; none where it can be made.
 */
export function boxFaults(task: Asked): Problem[] {
  const { deck, spansM, light, method } = task;
  const { leastMPa, mostMPa } = materials.concreteMPa;
  const { leastKgM3, mostKgM3 } = materials.lightConcrete;
  const mostBoxM = deck.widthM - boxData.webMostM.value;
  return [
    ...within(['boxWidthM'], task.boxWidthM, boxData.layout.leastBoxM, mostBoxM, 'm'),
    ...within(['strengthMPa'], task.strengthMPa, leastMPa, mostMPa, 'MPa'),
    ...within(['light', 'densityKgM3'], light?.densityKgM3, leastKgM3, mostKgM3, 'kg/m3 oven-dry'),
    ...(light && method === 'launch' ? [launchedLight] : []),
    ...(task.ribs && (task.struts || task.transverse) ? [ribsBeside] : []),
    ...bySpan(['light', 'middleM'], light?.middleM, spansM, 'm'),
    ...bySpan(
      ['ballastKNm'],
      task.ballastKNm,
      spansM.map(() => boxData.ballast.mostKNm),
      'kN/m',
    ),
  ];
}

/** @throws RangeError saying why a box cannot be made as it is asked, where there is a fault */
export function refuse(faults: readonly Problem[]): void {
  if (faults.length > 0) throw new RangeError(sentences(faults).join(' '));
}

const launchedLight: Problem = {
  code: 'refused',
  path: ['light', 'densityKgM3'],
  expected: 'a deck that is cast in its place',
  received: 'one that is launched',
  remedy: 'Leave the lightweight concrete out: it is not followed over the launching piers',
};

const ribsBeside: Problem = {
  code: 'refused',
  path: ['ribs'],
  expected: 'a slab that is carried in one way',
  received: 'ribs beside struts or tendons across',
  remedy: 'Leave the ribs out, or struts and tendons across',
};

/** A value outside its range as a problem; none where it is absent or inside. */
function within(
  path: Problem['path'],
  value: number | undefined,
  least: number,
  most: number,
  unit: string,
): Problem[] {
  if (value === undefined || (value >= least && value <= most + 1e-9)) return [];
  const code = value < least ? 'too-small' : value > most ? 'too-large-value' : 'wrong-type';
  const expected = `${short(least)} to ${short(most)}`;
  return [{ code, path, expected, received: String(value), unit, remedy: remedyFor(code) }];
}

/** Values by span, 0 to the most of each. */
function bySpan(
  path: Problem['path'],
  values: readonly number[] | undefined,
  most: readonly number[],
  unit: string,
): Problem[] {
  if (values === undefined) return [];
  if (values.length === most.length)
    return values.flatMap((value, span) => within([...path, span], value, 0, most[span]!, unit));
  const expected =
    most.length === 1 ? 'one number for the one span' : `a number for each of ${most.length} spans`;
  return [
    {
      code: 'wrong-type',
      path,
      expected,
      received: String(values.length),
      remedy: `Give ${expected}, 0 for a span without`,
    },
  ];
}

const short = (value: number): string => String(Number(value.toFixed(3)));
