import {
  abutmentWindows,
  PIER_HALF_WIDTH_M,
  survey,
  type AppraisedOption,
  type AskedVariant,
  type KeptOption,
  type Study,
  type Unit,
} from '../../lib/index.ts';
import { fixed } from '../format.ts';
import { supportName } from '../drawing/alongOption.ts';
import { putAt } from '../page/place.ts';
import { obstacleWidth } from './brief/madeFields.ts';
import { laidOn } from './spanChoices.ts';

/** The option as the study keeps it by hand; as it stands, with the depth left open, where it is not kept yet. */
export function keptOf({ options }: Study, option: AppraisedOption): KeptOption {
  const { number, form, method, units } = option;
  return options.kept.find((kept) => kept.number === number) ?? { number, form, method, units, depthM: null };
}

/** The study with an option kept by hand, which becomes the reference: what is in hand is what is looked at. */
export function withKept(study: Study, kept: KeptOption): Study {
  const { options } = study;
  const others = options.kept.filter(({ number }) => number !== kept.number);
  return {
    ...study,
    options: {
      ...options,
      kept: [...others, kept].sort((a, b) => a.number - b.number),
      reference: kept.number,
    },
  };
}

/** Two supports that are one, m. */
export const SAME_M = 0.05;

/** Chainages of all supports of a row of units in order, each once, m. */
export function placesOf(units: readonly Unit[]): number[] {
  const all = units.flatMap(({ supportsM }) => supportsM).sort((a, b) => a - b);
  return all.filter((at, i) => i === 0 || at - all[i - 1]! > SAME_M);
}

/** Units with one support moved; where two units meet both ends move. */
const moved = (units: readonly Unit[], fromM: number, toM: number): Unit[] =>
  units.map((unit) => ({
    ...unit,
    supportsM: unit.supportsM.map((x) => (Math.abs(x - fromM) <= SAME_M ? toM : x)),
  }));

/** The study with one support of an option moved to a chainage, m. A place that an abutment or neighbour takes is kept off. */
export function withPier(study: Study, option: AppraisedOption, index: number, chainageM: number): Study {
  const kept = keptOf(study, option);
  const places = placesOf(kept.units);
  const [before, here, after] = [places[index - 1], places[index], places[index + 1]];
  if (before === undefined || here === undefined || after === undefined) return study;
  const to = Math.min(Math.max(chainageM, before + 1), after - 1);
  return withKept(study, laidOn(kept, moved(kept.units, here, to)));
}

/** What comes of something that was asked for by hand: the study, or why it cannot be had. */
export type Changed =
  | { readonly ok: true; readonly study: Study }
  | { readonly ok: false; readonly why: string };

/** An end of the crossing. */
type End = 'start' | 'end';

/**
 * The study with an abutment of an option moved to a chainage, m: inside the window that the brief leaves it, and short of
 * the pier next to it.
 */
export function withAbutment(study: Study, option: AppraisedOption, end: End, chainageM: number): Changed {
  const kept = keptOf(study, option);
  const places = placesOf(kept.units);
  const site = survey(study.brief);
  const [fromM, toM] = abutmentWindows(site, PIER_HALF_WIDTH_M)[end];
  if (!(toM > fromM))
    return { ok: false, why: `the brief has it fixed: say there how far in the ${end} abutment may stand` };
  if (!(chainageM >= fromM && chainageM <= toM)) {
    const why = `between ${fixed(fromM, 1)} and ${fixed(toM, 1)} m: the window of the brief, as far as what has to pass stays out of the fill`;
    return { ok: false, why };
  }
  const here = end === 'start' ? places[0]! : places.at(-1)!;
  const next = end === 'start' ? places[1]! : places.at(-2)!;
  if (!(Math.abs(next - chainageM) >= 1 && Math.sign(next - chainageM) === Math.sign(next - here))) {
    const neighbour = supportName(places.indexOf(next), places.length);
    return {
      ok: false,
      why: `at least ${fixed(1, 1)} m short of ${neighbour}, which stands at ${fixed(next, 1)}`,
    };
  }
  return { ok: true, study: withKept(study, laidOn(kept, moved(kept.units, here, chainageM))) };
}

/**
 * The study with a span of a given length, m: the support at its end moves, or the one at its start where that one is locked
 * or an abutment; the next span takes up the difference.
 */
export function withSpan(study: Study, option: AppraisedOption, span: number, lengthM: number): Changed {
  const kept = keptOf(study, option);
  const places = placesOf(kept.units);
  const [fromM, toM] = [places[span]!, places[span + 1]!];
  const last = places.length - 1;
  const isFree = (index: number): boolean =>
    index > 0 && index < last && kept.locked?.includes(index) !== true;
  const end = isFree(span + 1) ? span + 1 : isFree(span) ? span : null;
  if (end === null) {
    const why =
      places.length === 2
        ? 'the crossing is one span; its ends are those of the brief'
        : 'both its ends are held: unlock a pier first';
    return { ok: false, why };
  }
  const target = end === span ? toM - lengthM : fromM + lengthM;
  const neighbour = end === span ? places[span - 1]! : places[span + 2]!;
  const most = Math.abs(neighbour - (end === span ? toM : fromM)) - 1;
  if (!(lengthM >= 1 && lengthM <= most)) {
    const other = supportName(end === span ? span - 1 : span + 2, places.length);
    const [least, atMost] = [fixed(1, 1), fixed(most, 1)];
    return { ok: false, why: `between ${least} and ${atMost} m, or the next span up to ${other} is gone` };
  }
  return {
    ok: true,
    study: withKept(study, laidOn(kept, moved(kept.units, places[end]!, target))),
  };
}

/**
 * The study with the depth of an option typed, m; null leaves it to least cost again. Where nothing has been asked of how it
 * is made it stays made as it is: a depth typed to see what it costs does not come back haunched.
 */
export function withDepth(study: Study, option: AppraisedOption, depthM: number | null): Study {
  const kept = keptOf(study, option);
  const variant = depthM === null ? kept.variant : (kept.variant ?? option.variant ?? {});
  return withKept(study, { ...kept, depthM, ...(variant !== undefined && { variant }) });
}

/** The study with the way an option is asked to be made; null leaves it to least cost again. */
export function withVariant(study: Study, option: AppraisedOption, variant: AskedVariant | null): Study {
  const { variant: _before, ...kept } = keptOf(study, option);
  return withKept(study, { ...kept, ...(variant !== null && { variant }) });
}

/** The study with a pier of an option locked or freed. */
export function withLock(study: Study, option: AppraisedOption, index: number, isLocked: boolean): Study {
  const { locked = [], ...kept } = keptOf(study, option);
  const others = locked.filter((one) => one !== index);
  const next = isLocked ? [...others, index].sort((a, b) => a - b) : others;
  return withKept(study, { ...kept, ...(next.length > 0 && { locked: next }) });
}

/** The study with an option given back to the search, which finds its piers and depth anew. */
export function released(study: Study, number: number): Study {
  const { options } = study;
  return {
    ...study,
    options: { ...options, kept: options.kept.filter((kept) => kept.number !== number) },
  };
}

/** The study with an edge of an obstacle moved, m; an envelope that begins or ends with it goes along. */
export function withObstacleEdge(study: Study, index: number, end: 'from' | 'to', chainageM: number): Study {
  const obstacle = study.brief.obstacles[index];
  if (obstacle === undefined) return study;
  const key = end === 'from' ? 'fromM' : 'toM';
  const { clearance } = obstacle;
  const goesAlong = clearance !== null && Math.abs(clearance[key] - obstacle[key]) <= SAME_M;
  return putAt(study, ['brief', 'obstacles', index], {
    ...obstacle,
    [key]: chainageM,
    ...(goesAlong && { clearance: { ...clearance, [key]: chainageM } }),
  });
}

/** A change by hand: what it is in words for undo, and what comes of a value, m. */
export interface HandEdit {
  readonly what: string;
  readonly put: (study: Study, value: number) => Changed;
}

const always = (what: string, put: (study: Study, value: number) => Study): HandEdit => ({
  what,
  put: (study, value) => ({ ok: true, study: put(study, value) }),
});

/** What a handle of a drawing changes; null for a handle nobody knows. */
export function handEdit(key: string, option: AppraisedOption | null): HandEdit | null {
  const [kind, first = '', second = ''] = key.split('/');
  const index = Number(first);
  if (kind === 'obstacle' && (second === 'from' || second === 'to'))
    return always('edge of an obstacle', (study, at) => withObstacleEdge(study, index, second, at));
  if (kind === 'width') return always('no-pier width', obstacleWidth(index).put);
  if (kind === 'clearance') {
    const path = ['brief', 'obstacles', index, 'clearance', 'headroomM'];
    return always('headroom', (study, value) => putAt(study, path, value));
  }
  if (kind === 'road') {
    const path = ['brief', 'road', first === 'start' ? 'startLevelM' : 'endLevelM'];
    return always('road level', (study, value) => putAt(study, path, value));
  }
  if (option === null) return null;
  if (kind === 'pier') return always('moving a pier', (study, at) => withPier(study, option, index, at));
  if (kind === 'depth') return always('depth', (study, value) => withDepth(study, option, value));
  if (kind === 'abutment' && (first === 'start' || first === 'end'))
    return { what: 'moving an abutment', put: (study, at) => withAbutment(study, option, first, at) };
  if (kind === 'span') return { what: 'span', put: (study, value) => withSpan(study, option, index, value) };
  return null;
}
