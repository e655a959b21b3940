import { carryingWords } from '../appraise/carryingWords.ts';
import { depthMissed } from '../appraise/depthMissed.ts';
import { depthRange } from '../appraise/depthRange.ts';
import { depthRulings } from '../appraise/depthRulings.ts';
import { DEEPEST_M, depthThatCarries, type DepthFound } from '../appraise/depthThatCarries.ts';
import { liftedSupports } from '../appraise/liftedSupports.ts';
import { finish } from '../appraise/work.ts';
import { cannotCarry, formModule, sizeableForms } from '../forms/index.ts';
import type { DeckStrip, Design, FormId, Problem, StandardId, UnitTask } from '../model/index.ts';
import { standardIds } from '../model/index.ts';
import { meanRates, ratesFor } from '../price/index.ts';
import { deckSpec } from '../site/index.ts';
import { perM2, splitQuantities } from '../takeoff/index.ts';
import { needFlags, readFlags, type Flags } from './flags.ts';
import { numberFlag } from './numberFlag.ts';
import { refuse } from './refusal.ts';
import { rounded } from './rounded.ts';
import { jsonText, type Said } from './said.ts';

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
/** The least that can be asked for as a depth, m. */
const FLATTEST_M = 0.01;
const SURFACING_M = 0.09;
/** Published factors of skew decks end here. */
const MOST_SKEW_DEG = 60;
/** Barriers take what the carriageway leaves of the width, half on each side. */
const BARRIERS_M = 1;
/** No traffic lane is marked narrower, m (common practice, no source). */
const LEAST_LANE_M = 2.5;

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

interface Asked {
  readonly task: Omit<UnitTask, 'depthM'>;
  readonly depthM: number | undefined;
  /** Depth over piers / depth at midspan; 1 for constant depth. */
  readonly haunch: number;
}

function readTask(argv: readonly string[]): Asked {
  const problems: Problem[] = [];
  const flags = readFlags(flagNames, argv);
  const form: FormId | undefined = oneOf('form', flags.values['form'], sizeableForms, problems);
  const spansM = spansOf(flags, problems);
  const metres = (name: string, most: number): number | undefined =>
    numberFlag(flags, name, { above: 0, most, unit: 'm' }, problems);
  const widthM = metres('width', 60);
  const lanes = numberFlag(flags, 'lanes', { above: 0, most: 16, whole: true, unit: 'lanes' }, problems);
  const depthM = metres('depth', DEEPEST_M);
  const haunch =
    numberFlag(flags, 'haunch', { above: 1, most: 4, unit: 'times the midspan depth' }, problems) ?? 1;
  const carriagewayM = metres('carriageway', 60) ?? (widthM === undefined ? undefined : widthM - BARRIERS_M);
  const planRadiusM = metres('radius', 1e6) ?? Infinity;
  // Either way: + and - are mirror images.
  const skewDeg = Math.abs(
    numberFlag(flags, 'skew', { above: -MOST_SKEW_DEG, most: MOST_SKEW_DEG, unit: 'degrees' }, problems) ?? 0,
  );
  if (form && skewDeg > 0 && !formModule(form).readsSkew)
    problems.push({
      code: 'unknown-key',
      path: ['--skew'],
      expected: `a form that reads it: ${sizeableForms.filter((id) => formModule(id).readsSkew).join(', ')}`,
      received: form,
      remedy: 'leave --skew out; its deck is sized as square',
    });
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
  const kerbToKerb = carriagewayM!;
  const edge: DeckStrip = {
    kind: 'barrier',
    widthM: (widthM - kerbToKerb) / 2,
    ultimateWidthM: (widthM - kerbToKerb) / 2,
  };
  const lane: DeckStrip = { kind: 'lane', widthM: kerbToKerb / lanes, ultimateWidthM: kerbToKerb / lanes };
  const strips = [edge, ...Array.from({ length: lanes }, () => lane), edge];
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
  return { depthM, haunch, task };
}

/** A reason of a rule as a sentence. */
function sentenceOf(reason: string): string {
  return `${reason[0]!.toUpperCase()}${reason.slice(1)}.`;
}

/** The task at a midspan depth, deeper over the piers where that was asked for. */
function taskAt({ task, haunch }: Asked, midspanM: number): UnitTask {
  return {
    ...task,
    depthM: midspanM,
    ...(haunch > 1 ? { haunch: { pierDepthM: haunch * midspanM, law: 'parabolic' as const } } : {}),
  };
}

/** The depth of least cost of the deck at the mean rates that come with the tool; beyond the published band where none in it carries. */
function depthSought(asked: Asked): DepthFound {
  const { form, method, spansM } = asked.task;
  const mean = meanRates(ratesFor({ ratePack: 'demo-2026', rates: [] }));
  return finish(
    depthThatCarries(depthRange(form, method, spansM, asked.task), (trialM) => {
      const { lines, limitingCheck } = formModule(form).size(taskAt(asked, trialM));
      const cost = lines.reduce((sum, line) => sum + line.quantity * mean[line.item]!, 0);
      return { cost, utilisation: limitingCheck.utilisation };
    }),
  );
}

/** The depth asked for, or that of least cost; what cannot carry, or cannot be made near to the depth asked for, is refused. */
function designOf(asked: Asked): Design {
  const module = formModule(asked.task.form);
  const sizeAt = (depthM: number): Design => module.size(taskAt(asked, depthM));
  if (asked.depthM === undefined) {
    const { depthM, triedToM } = depthSought(asked);
    const design = sizeAt(depthM);
    if (cannotCarry([design]) === null) return design;
    const band = depthRange(asked.task.form, asked.task.method, asked.task.spansM, asked.task);
    const deeper =
      triedToM === null
        ? ''
        : `, and deeper ones beyond it to ${rounded(sizeAt(triedToM).depthM.midspan)} m,`;
    return refuse([
      {
        code: 'refused',
        path: ['--spans'],
        expected: 'spans that the form can carry, all checks within their limits',
        received: `${asked.task.spansM.join(',')} m, of which none can be built: nearest at ${rounded(depthM)} m deep, ${carryingWords(design)}`,
        remedy: `Depths of the published band, ${band.map((end) => rounded(end)).join(' to ')} m${deeper} do not carry: give shorter spans, fewer lanes or another form`,
      },
    ]);
  }
  const design = sizeAt(asked.depthM);
  if (depthMissed(design) !== null) refuseWhatBeamsCannotMake(asked.depthM, sizeAt);
  if (cannotCarry([design]) === null) return design;
  return refuse([
    {
      code: 'refused',
      path: ['--depth'],
      expected: 'a depth at which all checks are within their limits',
      received: `${asked.depthM} m, ${carryingWords(design)}`,
      remedy: 'leave --depth out for that of least cost that carries, or give shorter spans',
    },
  ]);
}

/** Beams come in steps of depth: a depth shallower or deeper than all of them is refused. */
function refuseWhatBeamsCannotMake(depthM: number, sizeAt: (depthM: number) => Design): void {
  const [least, most] = [FLATTEST_M, DEEPEST_M].map((end) => sizeAt(end).depthM.midspan) as [number, number];
  if (depthM >= least && depthM <= most) return;
  refuse([
    {
      code: depthM < least ? 'too-small' : 'too-large-value',
      path: ['--depth'],
      expected: `a depth this form can be made with, ${rounded(least)} to ${rounded(most)}`,
      received: String(depthM),
      unit: 'm',
      remedy: 'give a depth between them, or leave --depth out for that of least cost',
    },
  ]);
}

/**
 * `size --form ID --spans 60,80,60 --width 12 --lanes 3 [--depth 3.1] ...`: quantities and checks of one unit, as JSON.
 * `--skew` is the skew of the supports from square, degrees, either way; spans are those along the road.
 * Without a depth the one of least cost in the published band is taken, beyond it where none inside carries. What cannot
 * carry is refused with the checks that stand in the way. Concrete boxes read `--box-width`
 * (between the axes of the outer webs, m), `--strength` (MPa), `--light` (oven-dry density, kg/m3; with `--light-middles`
 * only a length about the middle of each span, m), and `--ballast` (kN/m by span); cantilevered ones `--cast-in` (piers in
 * the middle that the deck is cast in with).
 */
export function sizeCommand(argv: readonly string[]): Said {
  const asked = readTask(argv);
  const { form, spansM, deck } = asked.task;
  const design = designOf(asked);
  const missed = depthMissed(design);
  const { superstructure, supports } = splitQuantities(design.lines);
  const deckAreaM2 = spansM.reduce((sum, span) => sum + span, 0) * deck.widthM;
  return {
    out: jsonText(
      rounded({
        form,
        spans: spansM,
        deckAreaM2,
        depthM: design.depthM,
        quantities: superstructure,
        perM2: perM2(superstructure, deckAreaM2),
        supports,
        checks: design.checks.map(({ id, label, utilisation }) => ({ id, label, utilisation })),
        limitingCheck: design.limitingCheck.id,
        ownWeightShare: design.ownWeightShare,
        warnings: [
          ...(asked.depthM === undefined || missed === null ? [] : [missed]),
          ...design.warnings,
          ...depthRulings(design).map(
            ({ because, source }) => `${sentenceOf(because[0]!)} Source: ${source}.`,
          ),
          ...liftedSupports(design),
        ],
      }),
    ),
  };
}
