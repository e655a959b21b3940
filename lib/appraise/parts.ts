import { formModule } from '../forms/index.ts';
import type { Dropped, FormId, Option, Study } from '../model/index.ts';
import { appraiseOption, type PricedAppraisal } from './appraiseOption.ts';
import { drawn } from './drawn.ts';
import { formsAsked } from './formsAsked.ts';
import type { Memory, Proposals, TrialRow } from './memory.ts';
import { outBecause, proposalsFor } from './proposals.ts';
import type { TrialRows } from './trialRows.ts';
import { saying } from './work.ts';
import { workbench } from './workbench.ts';

/** How far work has come: `done` of `of` steps, and what is being worked out. */
export interface Step {
  readonly done: number;
  readonly of: number;
  readonly what: string;
}

/** Work in steps between which a worker may pause or drop it. */
export type Steps<T> = Generator<Step, T, unknown>;

/** One of several who work on the same study: the `share`-th (0-based) of `of`. */
export interface Share {
  readonly share: number;
  readonly of: number;
}

/** A row of a cost table and what it is kept under: what those who work on one study hand each other. */
export type LaidRow = readonly [key: string, row: TrialRow];

/**
 * Sizes the rows that a share of the cost tables of some forms of a study is read off; a form and an approach have one each.
 * A table that forms asked for before these are read off as well is laid with them.
 */
export function* laySteps(
  study: Study,
  forms: readonly FormId[],
  { share, of }: Share,
  kept: Memory,
): Steps<LaidRow[]> {
  const bench = workbench(study, kept);
  const tables = new Map<TrialRows, FormId>();
  for (const form of formsAsked(study)) {
    if (outBecause(bench, form).length > 0) continue;
    for (const rows of bench.tables.rowsOf({ form, method: formModule(form).methods[0] })) {
      if (!tables.has(rows)) tables.set(rows, form);
    }
  }
  const mine = [...tables]
    .flatMap(([rows, form]) => (forms.includes(form) ? [rows] : []))
    .filter((_, i) => i % of === share)
    .flatMap((table) => [...table.spansM.keys()].map((index) => ({ table, index })));
  const laid: LaidRow[] = [];
  for (const { table, index } of mine) {
    const step = { done: laid.length, of: mine.length, what: 'sizing trial spans' };
    yield step;
    laid.push([table.key(index), yield* saying(step, table.make(index))]);
  }
  return laid;
}

/** What was found for one form. */
export interface FormProposals extends Proposals {
  readonly form: FormId;
}

/** Searches the arrangements of some forms of a study. */
export function* proposeSteps(study: Study, forms: readonly FormId[], kept: Memory): Steps<FormProposals[]> {
  const bench = workbench(study, kept);
  const found: FormProposals[] = [];
  for (const form of forms) {
    const step = { done: found.length, of: forms.length, what: `arranging ${formModule(form).name}` };
    yield step;
    try {
      found.push({ form, ...(yield* saying(step, proposalsFor(bench, form))) });
    } catch (error) {
      found.push({ form, arrangements: [], counts: [], because: [refusalOf(error)] });
    }
  }
  return found;
}

/** Why a form or an option cannot serve what is asked of it; anything else that is thrown is a fault and goes on. */
function refusalOf(error: unknown): string {
  if (!(error instanceof RangeError)) throw error;
  return error.message;
}

/** An option worked out, or why it cannot be. */
export type Outcome = PricedAppraisal | Dropped;

/** Works out, prices and rules on some options of a study, each by itself: one that cannot be sized stops none of the others. */
export function* workOutSteps(study: Study, options: readonly Option[], kept: Memory): Steps<Outcome[]> {
  const bench = workbench(study, kept);
  const onDraws = drawn(bench);
  const outcomes: Outcome[] = [];
  for (const option of options) {
    const step = { done: outcomes.length, of: options.length, what: `working out option ${option.number}` };
    yield step;
    try {
      outcomes.push(yield* saying(step, appraiseOption(bench, onDraws, option)));
    } catch (error) {
      outcomes.push({ form: option.form, option: option.number, because: [refusalOf(error)] });
    }
  }
  return outcomes;
}
