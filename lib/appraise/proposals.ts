import { arrange, fits, flatTable, governingSpan } from '../arrange/index.ts';
import { formModule } from '../forms/index.ts';
import type { Arrangement, Effect, FormId, MethodId, Pattern, Unit } from '../model/index.ts';
import { rule, rulingsFor, spanWindow } from '../rules/index.ts';
import { openSpans } from './openSpans.ts';
import { overWindows, supportsOf } from './overWindows.ts';
import { arrangementFacts } from './facts.ts';
import type { Proposals } from './memory.ts';
import { relaxationWords } from './relaxationWords.ts';
import { PIER_HALF_WIDTH_M, requestFor } from './requestFor.ts';
import { ruledOut } from './ruledOut.ts';
import type { FormAndMethod } from './trialRows.ts';
import type { Work } from './work.ts';
import type { Workbench } from './workbench.ts';

/** Proposals of one form at most. */
const PER_FORM = 3;

/** Whether the rules say one of these things of the method by which an arrangement is to be built. */
function isToldOfErection({ site }: Workbench, one: Arrangement, effects: readonly Effect[]): boolean {
  return rulingsFor('arrangement', one.form, arrangementFacts(site, one)).some(
    (ruling) => effects.includes(ruling.effect) && rule(ruling.rule).subject === 'erection',
  );
}

/** Whether they warn of the method, or put it out. */
const meetsTrouble = (bench: Workbench, one: Arrangement): boolean =>
  isToldOfErection(bench, one, ['out', 'caution']);

/**
 * Why a form is not searched in this study: no span of it or of its approach fits between the abutments, or the rules put
 * it out and it is not asked to be worked out all the same. Empty where it is searched.
 */
export function outBecause({ study, site }: Workbench, form: FormId): readonly string[] {
  const { pattern } = formModule(form);
  for (const part of pattern.kind === 'continuous' ? [form] : [form, pattern.approach]) {
    if (!openSpans(part, site.lengthM)) {
      const [least] = spanWindow(part).possible;
      return [`its spans begin at ${least} m; the crossing is ${site.lengthM} m long`];
    }
  }
  if (study.options.workOutAnyway.includes(form)) return [];
  return ruledOut(site, form);
}

/**
 * Searches a form, unless the rules put it out, by its usual method, and by the next one where the rules warn of the
 * first. The cheapest of each method and of each kind is proposed first, as the table tells those apart least
 * surely, then the next best of all, three at most; the rest is counted by reason. Pauses while the table is laid, and
 * between the searches.
 */
export function* proposalsFor(bench: Workbench, form: FormId): Work<Proposals> {
  const out = outBecause(bench, form);
  if (out.length > 0) return { arrangements: [], counts: [], because: out };
  const store = bench.keptHere.proposals;
  const key = `${form} ${bench.booksKey}`;
  return store.get(key) ?? store.put(key, yield* search(bench, form));
}

/**
 * Patterns of a form that are searched on a site: approaches to a flanked unit need something to lead up to and their own
 * spans; side spans beyond pylons are no longer than keeps back-stays taut.
 */
function patternsFor({ site, tables }: Workbench, asked: FormAndMethod): readonly Pattern[] {
  const { form } = asked;
  const { pattern, alsoPatterns = [] } = formModule(form);
  if (pattern.kind === 'pylon') {
    const [least, most] = pattern.twoPylonSide;
    const taut = tables.tautSide(asked, site.mainOpening?.widthM ?? 0);
    return [{ ...pattern, twoPylonSide: [least, Math.max(least, Math.min(most, taut))] }];
  }
  // A deck that is launched comes from an abutment: nothing of another depth may stand in its way.
  if (site.mainOpening === null || asked.method === 'launch') return [pattern];
  // Nor does a unit of its own lead over what far shorter spans than its shortest cross.
  const [leastM] = spanWindow(form).possible;
  const neededM = site.mainOpening.widthM + 2 * PIER_HALF_WIDTH_M;
  if (neededM < OF_ITS_OWN.needed * leastM) return [pattern];
  return [pattern, ...alsoPatterns.filter(({ approach }) => openSpans(approach, site.lengthM))];
}

/**
 * Where a unit of another form or depth is worth having over the opening: the span needed there over the shortest of its form,
 * and its longest span over that of its approaches. Common practice, no source.
 */
const OF_ITS_OWN = { needed: 0.8, overApproaches: 1.25 } as const;

/** Whether a unit between approaches is hardly longer than they are. */
function isHardlyLonger({ units }: Arrangement): boolean {
  const longest = (role: Unit['role']): number =>
    Math.max(0, ...units.filter((unit) => unit.role === role).map(governingSpan));
  return longest('main') < OF_ITS_OWN.overApproaches * longest('approach');
}

/**
 * Whether any pattern of a form fits a site, whatever it costs: where none does, none of its trial units is worth sizing.
 * Not asked where the abutments may move, and where back-stays, which are sized, have a say.
 */
function mayFit(bench: Workbench, asked: FormAndMethod): boolean {
  const { site } = bench;
  if (site.windows || formModule(asked.form).pattern.kind === 'pylon') return true;
  return patternsFor(bench, asked).some((pattern) => fits(requestFor(asked, site, pattern), site));
}

/** Options are told apart by their number of supports: the cheaper of two with as many stays. */
const isFirstOfItsSupports = (one: Arrangement, i: number, all: readonly Arrangement[]): boolean =>
  all.findIndex((other) => supportsOf(other) === supportsOf(one)) === i;

/** Table cost over that of the cheapest up to which another kind is still worth working out. */
const OTHER_KINDS = 1.2;

/** The cheapest arrangement of its kind in a list that rises, unless it is far dearer than the cheapest of all. */
const isFirstOfItsKind = (one: Arrangement, i: number, all: readonly Arrangement[]): boolean =>
  one.tableCost <= OTHER_KINDS * all[0]!.tableCost &&
  all.findIndex((other) => kindOf(other) === kindOf(one)) === i;

/** What arrangements are told apart by before their spans: the forms of their units, and one pylon or two. */
const kindOf = ({ units }: Arrangement): string =>
  [...new Set(units.map(({ form, pylons = [] }) => `${form} ${pylons.length}`))].sort().join();

function* search(bench: Workbench, form: FormId): Work<Proposals> {
  const counts = new Map<string, number>();
  const count = (reason: string, more: number): void => {
    if (more > 0) counts.set(reason, (counts.get(reason) ?? 0) + more);
  };
  const because: string[] = [];
  const byOne = function* (method: MethodId): Work<readonly Arrangement[]> {
    const asked = { form, method };
    const isSized = mayFit(bench, asked);
    for (const rows of isSized ? bench.tables.rowsOf(asked) : []) {
      for (const index of rows.spansM.keys()) yield* rows.make(index);
    }
    const found: Arrangement[] = [];
    const on = function* (at: Workbench): Work<readonly Arrangement[]> {
      const here: Arrangement[] = [];
      for (const pattern of patternsFor(at, asked)) {
        const table = isSized ? at.tables.tableFor(asked) : flatTable;
        const result = arrange(requestFor(asked, at.site, pattern), at.site, table);
        for (const dropped of result.dropped) count(dropped.reason, dropped.count);
        if (found.length + here.length === 0) because.push(...result.relaxations.map(relaxationWords));
        const isFlanked = pattern.kind === 'flanked';
        const worthy = result.arrangements.filter((one) => !(isFlanked && isHardlyLonger(one)));
        count('main span hardly longer than its approaches', result.arrangements.length - worthy.length);
        here.push(...worthy);
        yield;
      }
      return here;
    };
    found.push(...(bench.site.windows ? yield* overWindows(bench, asked, PER_FORM, on) : yield* on(bench)));
    return found.sort((a, b) => a.tableCost - b.tableCost).filter(isFirstOfItsSupports);
  };

  const byMethod: (readonly Arrangement[])[] = [];
  for (const method of formModule(form).methods) {
    const all = yield* byOne(method);
    // A method that cannot be had here is no way out of the trouble with the usual one.
    const found = byMethod.length === 0 ? all : all.filter((one) => !isToldOfErection(bench, one, ['out']));
    count('cannot be built by another method here', all.length - found.length);
    byMethod.push(found);
    if (found[0] && !meetsTrouble(bench, found[0])) break;
  }
  const byCost = (a: Arrangement, b: Arrangement): number => a.tableCost - b.tableCost;
  const first = byMethod.flatMap((list) => list.filter(isFirstOfItsKind));
  const rest = byMethod.flat().filter((one) => !first.includes(one));
  const all = [...first.sort(byCost), ...rest.sort(byCost)];
  count('dearer than the proposals of its form', all.length - PER_FORM);
  return {
    arrangements: all.slice(0, PER_FORM),
    counts: [...counts].map(([reason, n]) => ({ form, reason, count: n })),
    because: all.length > 0 ? [] : [...new Set(because)],
  };
}
