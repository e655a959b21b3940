import { DEEPEST_M } from '../appraise/depthThatCarries.ts';
import type { OpenDepth } from '../appraise/deckDepth.ts';
import { formModule, sizeableForms } from '../forms/index.ts';
import type { FormId, Problem, StandardId, UnitTask } from '../model/index.ts';
import { standardIds } from '../model/index.ts';
import { BARRIERS_M, deckSpec, LEAST_LANE_M, plainStrips, SURFACING_M } from '../site/index.ts';
import { WIDEST_DECK_M } from './deckWidths.ts';
import { needFlags, readFlags, type Flags } from './flags.ts';
import { numberFlag } from './numberFlag.ts';
import { refuse } from './refusal.ts';
import { rounded } from './rounded.ts';

const flagNames = [
  'form',
  'spans',
  'width',
  'lanes',
  'depth',
  'haunch',
  'carriageway',
  'radius',
  'skew',
  'loading',
  'girders',
  'box-width',
  'strength',
  'light',
  'light-middles',
  'ballast',
  'cast-in',
];
/** Published factors of skew decks end here. */
const MOST_SKEW_DEG = 60;

function oneOf<T extends string>(
  name: string,
  text: string | undefined,
  list: readonly T[],
  problems: Problem[],
): T | undefined {
  const found = list.find((entry) => entry === text);
  if (found) return found;
  problems.push({
    code: text === undefined ? 'missing' : 'not-in-list',
    path: [`--${name}`],
    expected: `one of ${list.join(', ')}`,
    received: text ?? 'nothing',
    remedy: `give --${name}`,
  });
  return undefined;
}

/** Numbers with commas between, or a problem added to the list; undefined when the flag is absent. */
function numbersFlag(flags: Flags, name: string, problems: Problem[]): number[] | undefined {
  const text = flags.values[name];
  if (text === undefined) return undefined;
  const values = text.split(',').map((part) => (part.trim() === '' ? NaN : Number(part)));
  if (!values.some(Number.isNaN)) return values;
  problems.push({
    code: 'wrong-type',
    path: [`--${name}`],
    expected: 'a number for each span with commas between',
    received: text,
    remedy: `give --${name} like 0,90,0, 0 for a span without`,
  });
  return undefined;
}

/** Flags that ask for what some forms read, by what they ask for. */
const formFlags = {
  girders: ['girders'],
  haunch: ['haunch'],
  boxWidthM: ['box-width'],
  strengthMPa: ['strength'],
  light: ['light', 'light-middles'],
  ballastKNm: ['ballast'],
  castInPiers: ['cast-in'],
} as const;
type AskedHere = keyof typeof formFlags;
type ChosenHere = Exclude<AskedHere, 'girders' | 'haunch'>;

/** Whether a form reads what a flag asks for. */
function readsFlag(id: FormId, asked: AskedHere): boolean {
  const { choices = [], reads = [] } = formModule(id);
  return [...choices, ...reads].includes(asked);
}

/** A problem for each flag given that the form does not read. */
function foreignFlags(flags: Flags, form: FormId): Problem[] {
  return (Object.entries(formFlags) as [AskedHere, readonly string[]][]).flatMap(([asked, names]) => {
    const given = names.filter((name) => flags.values[name] !== undefined);
    if (given.length === 0 || readsFlag(form, asked)) return [];
    return [
      {
        code: 'unknown-key',
        path: [`--${given[0]!}`],
        expected: `a form that reads it: ${sizeableForms.filter((id) => readsFlag(id, asked)).join(', ')}`,
        received: form,
        remedy: `leave --${given.join(' and --')} out`,
      } satisfies Problem,
    ];
  });
}

/** What is asked of a concrete box besides the usual: its width, strength, lightweight concrete, ballast, piers in one with it. */
function choicesOf(flags: Flags, problems: Problem[]): Pick<UnitTask, ChosenHere> {
  if (flags.values['light-middles'] !== undefined) needFlags(flags, ['light'], problems);
  const positive = (name: string, unit: string): number | undefined =>
    numberFlag(flags, name, { above: 0, unit }, problems);
  const boxWidthM = positive('box-width', 'm');
  const strengthMPa = positive('strength', 'MPa');
  const densityKgM3 = positive('light', 'kg/m3');
  const middleM = numbersFlag(flags, 'light-middles', problems);
  const ballastKNm = numbersFlag(flags, 'ballast', problems);
  const castInPiers = numberFlag(flags, 'cast-in', { above: 0, whole: true, unit: 'piers' }, problems);
  return {
    ...(boxWidthM === undefined ? {} : { boxWidthM }),
    ...(strengthMPa === undefined ? {} : { strengthMPa }),
    ...(densityKgM3 === undefined
      ? {}
      : { light: { densityKgM3, ...(middleM === undefined ? {} : { middleM }) } }),
    ...(ballastKNm === undefined ? {} : { ballastKNm }),
    ...(castInPiers === undefined ? {} : { castInPiers }),
  };
}

/** A fault of a form at the flag that asked for it. */
function atFlag(fault: Problem): Problem {
  const [choice, ...rest] = fault.path;
  const names: readonly string[] = formFlags[choice as AskedHere];
  const name = names.at(rest[0] === 'middleM' ? 1 : 0)!;
  return { ...fault, path: [`--${name}`, ...rest.filter((step) => typeof step === 'number')] };
}

function spansOf(flags: Flags, problems: Problem[]): number[] {
  const text = flags.values['spans'];
  const spans = (text ?? '').split(',').map((part) => (part.trim() === '' ? NaN : Number(part)));
  if (spans.every((span) => span > 0 && span <= 3000)) return spans;
  problems.push({
    code: text === undefined ? 'missing' : spans.some(Number.isNaN) ? 'wrong-type' : 'too-small',
    path: ['--spans'],
    expected: 'spans above 0, at most 3000, with commas between',
    received: text ?? 'nothing',
    unit: 'm',
    remedy: 'give --spans like 60,80,60',
  });
  return [];
}

/** Pylons of a hung unit: at both ends of its longest span, but not at the ends of the unit. */
function pylonsOf(spans: readonly number[]): number[] {
  const main = spans.indexOf(Math.max(...spans));
  return [main, main + 1].filter((support) => support > 0 && support < spans.length);
}

/** A unit that the command line asks for. */
export interface Asked extends OpenDepth {
  /** The depth asked for, m; undefined where it is left open. */
  readonly depthM: number | undefined;
  /** Asked is how far the form reaches, with spans in this proportion. */
  readonly limit: boolean;
}

/**
 * Reads the flags of `size`.
 *
 * @throws Refusal with everything that is wrong with them
 */
export function readTask(argv: readonly string[]): Asked {
  const problems: Problem[] = [];
  const flags = readFlags(flagNames, argv, { switches: ['limit'] });
  const form: FormId | undefined = oneOf('form', flags.values['form'], sizeableForms, problems);
  const spansM = spansOf(flags, problems);
  const metres = (name: string, most: number): number | undefined =>
    numberFlag(flags, name, { above: 0, most, unit: 'm' }, problems);
  const widthM = metres('width', WIDEST_DECK_M);
  const lanes = numberFlag(flags, 'lanes', { above: 0, most: 16, whole: true, unit: 'lanes' }, problems);
  const depthM = metres('depth', DEEPEST_M);
  const haunch =
    numberFlag(flags, 'haunch', { above: 1, most: 4, unit: 'times the midspan depth' }, problems) ?? 1;
  const carriagewayM =
    metres('carriageway', WIDEST_DECK_M) ?? (widthM === undefined ? undefined : widthM - BARRIERS_M);
  const planRadiusM = metres('radius', 1e6) ?? Infinity;
  // Either way: + and - are mirror images.
  const skewDeg = Math.abs(
    numberFlag(flags, 'skew', { above: -MOST_SKEW_DEG, most: MOST_SKEW_DEG, unit: 'degrees' }, problems) ?? 0,
  );
  const girders = numberFlag(
    flags,
    'girders',
    { above: 1, most: 20, whole: true, unit: 'girders' },
    problems,
  );
  const standard: StandardId | undefined = oneOf(
    'loading',
    flags.values['loading'] ?? 'lm1',
    standardIds,
    problems,
  );
  const choices = choicesOf(flags, problems);
  if (form) problems.push(...foreignFlags(flags, form));
  needFlags(flags, ['width', 'lanes'], problems);
  if (flags.on.has('limit') && depthM !== undefined)
    problems.push({
      code: 'unknown-key',
      path: ['--depth'],
      expected: 'nothing with --limit, which seeks the depth at each span',
      received: String(depthM),
      unit: 'm',
      remedy: 'leave --depth or --limit out',
    });
  if (widthM !== undefined && carriagewayM !== undefined && !(carriagewayM > 0 && carriagewayM <= widthM)) {
    problems.push({
      code: 'outside',
      path: ['--carriageway'],
      expected: `more than 0, at most the deck width ${widthM}`,
      received: String(carriagewayM),
      unit: 'm',
      remedy: 'give the width between kerbs',
    });
  }
  const closesM = spansM.reduce((sum, span) => sum + span, 0) / (2 * Math.PI);
  const leastRadiusM = Math.max(closesM, (widthM ?? 0) / 2);
  if (!(planRadiusM > leastRadiusM)) {
    problems.push({
      code: 'too-small',
      path: ['--radius'],
      expected: `more than half the deck width and no full circle, ${rounded(leastRadiusM)}`,
      received: String(planRadiusM),
      unit: 'm',
      remedy: 'give a wider curve, or leave --radius out for a straight deck',
    });
  }
  if (lanes !== undefined && carriagewayM !== undefined && carriagewayM / lanes < LEAST_LANE_M) {
    problems.push({
      code: 'too-large-value',
      path: ['--lanes'],
      expected: `on ${carriagewayM} m between kerbs at most ${Math.max(1, Math.floor(carriagewayM / LEAST_LANE_M))}`,
      received: String(lanes),
      unit: 'lanes',
      remedy: 'give fewer lanes, or a wider deck or carriageway',
    });
  }
  if (form && formModule(form).pattern.kind === 'pylon' && spansM.length === 1) {
    problems.push({
      code: 'outside',
      path: ['--spans'],
      expected: 'two spans or more, a pylon between them',
      received: String(spansM[0]),
      unit: 'm',
      remedy: 'give the side span too, like 100,60',
    });
  }
  if (problems.length > 0 || !form || !standard || widthM === undefined || lanes === undefined)
    refuse(problems);
  const strips = plainStrips(widthM, carriagewayM!, lanes);
  const module = formModule(form);
  const task: Asked['task'] = {
    form,
    spansM,
    deck: deckSpec(strips, SURFACING_M, standard),
    standard,
    planRadiusM,
    ...(skewDeg > 0 ? { skewDeg } : {}),
    method: module.methods[0],
    ...(girders === undefined ? {} : { girders }),
    ...choices,
    ...(module.pattern.kind === 'pylon' ? { pylons: pylonsOf(spansM) } : {}),
  };
  const faults = module.faults?.(task) ?? [];
  if (faults.length > 0) refuse(faults.map(atFlag));
  return { depthM, haunch, task, limit: flags.on.has('limit') };
}
