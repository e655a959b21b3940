import { formModule } from '../forms/index.ts';
import type { CostTable, Design, FormId, MeasuredLine, MethodId, Site } from '../model/index.ts';
import { sideRatioWindow, spanWindow } from '../rules/index.ts';
import { deckOnSupport, expectedLines, standPierBetween } from '../substructure/index.ts';
import { methodLines } from '../takeoff/index.ts';
import { depthRange } from './depthRange.ts';
import { leastCostDepth } from './leastCostDepth.ts';
import type { Sizer } from './sizer.ts';

/** Governing spans at which each form is really sized; in between the table is read off straight lines. */
const TABLE_SPANS = 10;
/** Shares of the governing span at which the shorter spans of a unit are sized with the depth of the longest. */
const SHARES = [0.5, 1] as const;
/** Depths tried for each row before the two beside the best. */
const TABLE_TRIALS = 3;
/** Spans under this are culverts, m. */
const LEAST_SPAN_M = 8;
/** End over interior span of a trial unit: inside every published window. */
const TRIAL_END_RATIO = 0.78;

/** A form built by one method. */
export interface FormAndMethod {
  readonly form: FormId;
  readonly method: MethodId;
}

interface Row {
  readonly spanM: number;
  readonly depthM: number;
  /** Money per m of deck at each of `SHARES`. */
  readonly perM: readonly number[];
  /** Money that does not grow with the deck, by number of pylons. */
  readonly fixed: readonly number[];
  readonly design: Design;
}

/** Money of measured lines at one rate per item. */
export type CostOf = (lines: readonly MeasuredLine[]) => number;

const isFixed = (line: MeasuredLine): boolean => line.part === 'pylons' || line.item === 'method-setup';

/** A unit of ordinary proportions for one governing span: its spans, and its pylons where the form has them. */
function trialUnit(form: FormId, spanM: number, pylons: 1 | 2): { spansM: number[]; pylons?: number[] } {
  const pattern = formModule(form).pattern;
  if (pattern.kind === 'simple-main') return { spansM: [spanM] };
  if (pattern.kind === 'continuous') {
    return { spansM: [TRIAL_END_RATIO * spanM, spanM, TRIAL_END_RATIO * spanM] };
  }
  const [least, most] =
    sideRatioWindow(form, pylons) ?? (pylons === 1 ? pattern.onePylonBack : pattern.twoPylonSide);
  const side = ((least + most) / 2) * spanM;
  return pylons === 1
    ? { spansM: [spanM, side], pylons: [1] }
    : { spansM: [side, spanM, side], pylons: [1, 2] };
}

/** Rows of one form and method, each sized when it is first read: a search looks at few of them. */
interface Rows {
  readonly spansM: readonly number[];
  row(index: number): Row;
}

function rowsOf({ form, method }: FormAndMethod, site: Site, size: Sizer, costOf: CostOf): Rows {
  const { possible } = spanWindow(form);
  const least = Math.max(possible[0], LEAST_SPAN_M);
  const most = Math.min(possible[1], site.lengthM);
  if (!(least <= most)) {
    throw new RangeError(`cost table: ${form} has no span that fits a crossing of ${site.lengthM} m`);
  }
  const spansM = Array.from(
    { length: TABLE_SPANS },
    (_, i) => least * Math.pow(most / least, i / (TABLE_SPANS - 1)),
  );
  const hung = formModule(form).pattern.kind === 'pylon';
  const base = {
    form,
    method,
    deck: site.deck,
    standard: site.standard,
    planRadiusM: site.planRadiusM ?? Infinity,
  };

  const sized = (
    spanM: number,
    depthM: number,
    pylons: 1 | 2,
  ): { design: Design; perM: number; fixed: number } => {
    const unit = trialUnit(form, spanM, pylons);
    const design = size({ ...base, depthM, ...unit });
    const lines = [...design.lines, ...methodLines([design])];
    const lengthM = unit.spansM.reduce((sum, span) => sum + span, 0);
    return {
      design,
      perM: costOf(lines.filter((line) => !isFixed(line))) / lengthM,
      fixed: costOf(lines.filter(isFixed)),
    };
  };

  const made = (spanM: number): Row => {
    const { spansM: trialSpans } = trialUnit(form, spanM, 1);
    const depthM = leastCostDepth(
      depthRange(form, method, trialSpans, site.deck),
      (trialM) => {
        const { design, perM } = sized(spanM, trialM, 1);
        return { cost: perM, utilisation: design.limitingCheck.utilisation };
      },
      TABLE_TRIALS,
    );
    const whole = sized(spanM, depthM, 1);
    const perM = SHARES.map((share) =>
      share === 1 || hung ? whole.perM : sized(share * spanM, depthM, 1).perM,
    );
    const fixed = hung ? [whole.fixed, whole.fixed, sized(spanM, depthM, 2).fixed] : [whole.fixed];
    return { spanM, depthM, perM, fixed, design: whole.design };
  };
  const known = new Map<number, Row>();
  return {
    spansM,
    row(index) {
      const found = known.get(index) ?? made(spansM[index]!);
      known.set(index, found);
      return found;
    },
  };
}

/** Place of a value on a rising grid: index of the interval and share within it, held at both ends. */
function between(grid: readonly number[], value: number): readonly [index: number, share: number] {
  let i = 0;
  while (i < grid.length - 2 && grid[i + 1]! < value) i += 1;
  const low = grid[i]!;
  const high = grid[i + 1] ?? low;
  return [i, high > low ? Math.min(1, Math.max(0, (value - low) / (high - low))) : 0];
}

/** Cost tables of one site and one set of rates; each form and method is sized once. */
export interface TableShelf {
  /** The table the search of one form uses: the form by its method and its approach form by the usual one. */
  tableFor(asked: FormAndMethod): CostTable;
}

/**
 * Loads, kN, at which a trial pier is really sized at each chainage, permanent and traffic together; in between its cost is
 * read off straight lines. A pier feels the form it carries through its load.
 */
const PIER_LOADS_KN = [1500, 4000, 8000, 14000, 24000, 45000, 90000] as const;
/** Of that load, what is permanent, and the depth of the deck on it, m: ordinary road decks. */
const PIER_PERMANENT = 0.7;
const PIER_DECK_DEPTH_M = 2;
/** Span over which the trial load is spread, m: gives wind and friction their size. */
const PIER_SPAN_M = 40;

/**
 * What the search knows of cost, made by the real sizing, take-off and mean rates: deck cost and depth of each form
 * at ten spans of its possible band, supports by what they meet at their chainage.
 *
 * @param costOf money of measured lines at mean rates
 */
export function tableShelf(site: Site, size: Sizer, costOf: CostOf): TableShelf {
  const shelf = new Map<string, Rows>();
  const piers = new Map<number, number>();
  const rowsFor = (asked: FormAndMethod): Rows => {
    const key = `${asked.form} ${asked.method}`;
    const found = shelf.get(key) ?? rowsOf(asked, site, size, costOf);
    shelf.set(key, found);
    return found;
  };
  const roadLevel = (chainageM: number): number => {
    const { road, startM, lengthM } = site;
    return road.startLevelM + ((road.endLevelM - road.startLevelM) * (chainageM - startM)) / lengthM;
  };

  /** A trial pier at a chainage under one of the loads, at mean rates with the odds of the ground. */
  const pierCost = (chainageM: number, load: number): number => {
    const key = chainageM * PIER_LOADS_KN.length + load;
    const found = piers.get(key);
    if (found !== undefined) return found;
    const perM = PIER_LOADS_KN[load]! / PIER_SPAN_M;
    const deck = {
      permanentKNm: PIER_PERMANENT * perM,
      trafficKNm: (1 - PIER_PERMANENT) * perM,
      depthM: PIER_DECK_DEPTH_M,
    };
    const pier = standPierBetween(site, deck, chainageM, PIER_SPAN_M, PIER_SPAN_M, roadLevel(chainageM));
    const cost = costOf(expectedLines(pier));
    piers.set(key, cost);
    return cost;
  };

  const tableFor = (asked: FormAndMethod): CostTable => {
    const rowsBy = (form: FormId): Rows =>
      rowsFor(form === asked.form ? asked : { form, method: formModule(form).methods[0] });
    const read = (form: FormId, spanM: number, value: (row: Row) => number): number => {
      const rows = rowsBy(form);
      const [i, share] = between(rows.spansM, spanM);
      const low = share < 1 ? value(rows.row(i)) : 0;
      const high = share > 0 ? value(rows.row(i + 1)) : 0;
      return (1 - share) * low + share * high;
    };
    return {
      deckPerM(form, spanM, governingM) {
        const [i, within] = between(SHARES, governingM > 0 ? spanM / governingM : 1);
        const at = (k: number): number => read(form, governingM, (row) => row.perM[k]!);
        return at(i) + within * (at(i + 1) - at(i));
      },
      depthM: (form, governingM) => read(form, governingM, (row) => row.depthM),
      unitFixed: (form, governingM, pylons = 0) =>
        read(form, governingM, (row) => row.fixed[Math.min(pylons, row.fixed.length - 1)]!),
      support(form, chainageM, spanLeftM, spanRightM) {
        const mean = (spanLeftM + spanRightM) / 2;
        const rows = rowsBy(form);
        const [i, share] = between(rows.spansM, mean);
        const { permanentKNm, trafficKNm } = deckOnSupport(rows.row(share > 0.5 ? i + 1 : i).design);
        const loadKN = (permanentKNm + trafficKNm) * mean;
        const [k, within] = between(PIER_LOADS_KN, loadKN);
        const low = pierCost(chainageM, k);
        return within > 0 ? low + within * (pierCost(chainageM, k + 1) - low) : low;
      },
    };
  };
  return { tableFor };
}
