/**
 * Arrangements as mixed-integer programmes for a general-purpose solver (HiGHS): a path of first, interior and last spans
 * over the candidate positions, one binary variable for each, end windows as pairs that exclude each other, solved once
 * for every governing span.
 */
import highsLoader from 'highs';
import type { ArrangeRequest } from '../../lib/arrange/index.ts';
import type { CostTable, Site } from '../../lib/model/index.ts';
import { demoSite, type DemoZone } from '../arrange/demoSite.ts';

type Solver = Awaited<ReturnType<typeof highsLoader>>;

const halfM = 1;
const windows = { minSpanM: 22, maxSpanM: 38, endRatio: [0.6, 0.95] } as const;
const spacing = windows.endRatio[0] * windows.minSpanM;
const PER_SPAN = 1500;

function pier(x: number, phase: number): number {
  return 180_000 + 60_000 * Math.sin(x / 9 + phase);
}

function deckPerM(span: number, governing: number): number {
  return 8000 + 90 * governing + 80 * span;
}

function places(lengthM: number, hard: readonly DemoZone[]): number[] {
  const all = Array.from({ length: lengthM + 1 }, (_, i) => i);
  return all.filter(
    (x) => x === 0 || x === lengthM || hard.every(([from, to]) => x <= from - halfM || x >= to + halfM),
  );
}

/** Least cost with at least three spans, none longer than `G`, all priced at `G`; Infinity when there is none. */
function solve(highs: Solver, { lengthM, hard, phase }: MilpCase, G: number): number {
  const at = places(lengthM, hard).filter((x) => x > 0 && x < lengthM);
  const [least, most] = windows.endRatio;
  const deck = (s: number): number => s * deckPerM(s, G);
  const objective: string[] = [];
  const binaries: string[] = [];
  const flow = new Map(at.map((x) => [x, [] as string[]]));
  const startBad = new Map(at.map((x) => [x, [] as string[]]));
  const endBad = new Map(at.map((x) => [x, [] as string[]]));
  const firsts: string[] = [];
  const lasts: string[] = [];
  const inner: string[] = [];
  const add = (name: string, cost: number, list: string[]): void => {
    objective.push(`${cost.toFixed(6)} ${name}`);
    binaries.push(name);
    list.push(name);
  };
  for (const x of at) {
    const e = lengthM - x;
    if (x >= spacing && x <= G) {
      add(`f${x}`, deck(x) + pier(x, phase) + PER_SPAN * x, firsts);
      flow.get(x)!.push(`+ f${x}`);
    }
    if (e >= spacing && e <= G) {
      add(`l${x}`, deck(e) + PER_SPAN * e, lasts);
      flow.get(x)!.push(`- l${x}`);
    }
    for (const y of at) {
      const s = x - y;
      if (s < Math.max(spacing, least * G) || s > G) continue;
      const name = `i${y}_${x}`;
      add(name, deck(s) + pier(x, phase) + 2 * PER_SPAN * s, inner);
      flow.get(x)!.push(`+ ${name}`);
      flow.get(y)!.push(`- ${name}`);
      if (y < least * s || y > most * s) startBad.get(y)!.push(name);
      if (e < least * s || e > most * s) endBad.get(x)!.push(name);
    }
  }
  if (firsts.length === 0 || lasts.length === 0 || inner.length === 0) return Infinity;
  const rows = [`${firsts.join(' + ')} = 1`, `${lasts.join(' + ')} = 1`, `${inner.join(' + ')} >= 1`];
  for (const x of at) {
    const terms = flow.get(x)!;
    if (terms.length > 0) rows.push(`${terms.join(' ')} = 0`);
    const bad = startBad.get(x)!;
    if (bad.length > 0 && firsts.includes(`f${x}`)) rows.push(`f${x} + ${bad.join(' + ')} <= 1`);
    const worse = endBad.get(x)!;
    if (worse.length > 0 && lasts.includes(`l${x}`)) rows.push(`l${x} + ${worse.join(' + ')} <= 1`);
  }
  const text = `Minimize\n obj: ${objective.join(' + ')}\nSubject To\n${rows.map((row, i) => ` c${i}: ${row}`).join('\n')}\nBinary\n ${binaries.join(' ')}\nEnd\n`;
  const solution = highs.solve(text, { output_flag: false, mip_rel_gap: 0 });
  return solution.Status === 'Optimal' ? solution.ObjectiveValue : Infinity;
}

/** A crossing, its barred stretches and how its pier costs lie. */
export interface MilpCase {
  readonly lengthM: number;
  readonly hard: readonly DemoZone[];
  readonly phase: number;
}

export const milpCases: readonly MilpCase[] = [
  { lengthM: 96, hard: [[40, 60]], phase: 0 },
  {
    lengthM: 110,
    hard: [
      [20, 27],
      [58, 84],
    ],
    phase: 2,
  },
  {
    lengthM: 125,
    hard: [
      [33, 40],
      [52, 60],
      [90, 97],
    ],
    phase: 4,
  },
];

/** Least cost by the solver over all governing spans by whole metres. */
export function leastBySolver(highs: Solver, given: MilpCase): number {
  let least = Infinity;
  for (let G: number = windows.minSpanM; G <= windows.maxSpanM; G += 1) {
    least = Math.min(least, solve(highs, given, G));
  }
  return least;
}

/** The same crossing as the search is asked for it. */
export function searchFor({ lengthM, hard, phase }: MilpCase): [ArrangeRequest, Site, CostTable] {
  const table: CostTable = {
    deckPerM: (_, span, governing) => deckPerM(span, governing),
    depthM: () => 1,
    unitFixed: () => 0,
    support: (_, x, left, right) => pier(x, phase) + PER_SPAN * (left + right),
  };
  const request: ArrangeRequest = {
    form: 'composite-i',
    method: 'crane',
    pattern: { kind: 'continuous' },
    windows,
    pierHalfWidthM: halfM,
    keep: 20,
  };
  return [request, demoSite(lengthM, hard), table];
}
