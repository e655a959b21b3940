import { leastCostDepth } from '../appraise/leastCostDepth.ts';
import { depthRange } from '../appraise/depthRange.ts';
import { finish } from '../appraise/work.ts';
import { formModule, sizeableForms } from '../forms/index.ts';
import type { DeckStrip, FormId, Problem, StandardId, UnitTask } from '../model/index.ts';
import { standardIds } from '../model/index.ts';
import { meanRates, ratesFor } from '../price/index.ts';
import { deckSpec } from '../site/index.ts';
import { perM2, splitQuantities } from '../takeoff/index.ts';
import { numberFlag, readFlags, refuse, type Flags } from './flags.ts';
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
  'loading',
  'girders',
];
const SURFACING_M = 0.09;
/** Barriers take what the carriageway leaves of the width, half on each side. */
const BARRIERS_M = 1;

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
  const depthM = metres('depth', 40);
  const haunch =
    numberFlag(flags, 'haunch', { above: 1, most: 4, unit: 'times the midspan depth' }, problems) ?? 1;
  const carriagewayM = metres('carriageway', 60) ?? (widthM === undefined ? undefined : widthM - BARRIERS_M);
  const planRadiusM = metres('radius', 1e6) ?? Infinity;
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
  for (const [name, value] of [
    ['width', widthM],
    ['lanes', lanes],
  ] as const) {
    if (value === undefined && flags.values[name] === undefined) {
      problems.push({
        code: 'missing',
        path: [`--${name}`],
        expected: 'a number',
        received: 'nothing',
        remedy: `give --${name}`,
      });
    }
  }
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
  return {
    depthM,
    haunch,
    task: {
      form,
      spansM,
      deck: deckSpec(strips, SURFACING_M, standard),
      standard,
      planRadiusM,
      method: module.methods[0],
      ...(girders === undefined ? {} : { girders }),
      ...(module.pattern.kind === 'pylon' ? { pylons: pylonsOf(spansM) } : {}),
    },
  };
}

const { task, depthM: asked, haunch } = readTask(process.argv.slice(2));
/** The task at a midspan depth, deeper over the piers where that was asked for. */
const taskAt = (midspanM: number): UnitTask => ({
  ...task,
  depthM: midspanM,
  ...(haunch > 1 ? { haunch: { pierDepthM: haunch * midspanM, law: 'parabolic' as const } } : {}),
});
const module = formModule(task.form);
const mean = meanRates(ratesFor({ ratePack: 'demo-2026', rates: [] }));
const depthM =
  asked ??
  finish(
    leastCostDepth(depthRange(task.form, task.method, task.spansM, task.deck), (trialM) => {
      const { lines, limitingCheck } = module.size(taskAt(trialM));
      const cost = lines.reduce((sum, line) => sum + line.quantity * mean[line.item]!, 0);
      return { cost, utilisation: limitingCheck.utilisation };
    }),
  );
const design = module.size(taskAt(depthM));
const { superstructure, supports } = splitQuantities(design.lines);
const deckAreaM2 = task.spansM.reduce((sum, span) => sum + span, 0) * task.deck.widthM;
process.stdout.write(
  `${JSON.stringify(
    rounded({
      form: task.form,
      spans: task.spansM,
      deckAreaM2,
      depthM: design.depthM,
      quantities: superstructure,
      perM2: perM2(superstructure, deckAreaM2),
      supports,
      checks: design.checks.map(({ id, label, utilisation }) => ({ id, label, utilisation })),
      limitingCheck: design.limitingCheck.id,
      ownWeightShare: design.ownWeightShare,
      warnings: design.warnings,
    }),
    null,
    2,
  )}\n`,
);
