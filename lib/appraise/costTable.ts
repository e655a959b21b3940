import { formModule } from '../forms/index.ts';
import type { CostTable, FormId } from '../model/index.ts';
import type { Memory, TrialRow } from './memory.ts';
import { openSpans } from './openSpans.ts';
import { PIER_HALF_WIDTH_M } from './requestFor.ts';
import { PIER_LOADS_KN, trialPiers } from './trialPiers.ts';
import { SHARES, trialRows, type FormAndMethod, type RowMakers, type TrialRows } from './trialRows.ts';

/** Place of a value on a rising grid: index of the interval and share within it, held at both ends. */
function between(grid: readonly number[], value: number): readonly [index: number, share: number] {
  let i = 0;
  while (i < grid.length - 2 && grid[i + 1]! < value) i += 1;
  const low = grid[i]!;
  const high = grid[i + 1] ?? low;
  return [i, high > low ? Math.min(1, Math.max(0, (value - low) / (high - low))) : 0];
}

const [SHORTER, WHOLE] = SHARES;

/** What a metre of deck costs in a unit of one row, from its shorter spans to those as long as the governing one. */
function deckCost({ perM }: TrialRow, towardsWhole: number): number {
  return perM[0]! + towardsWhole * (perM[1]! - perM[0]!);
}

/** A span among the trial spans of a form, with what was last read there from the rows on both sides. */
interface Place {
  readonly spanM: number;
  readonly row: TrialRows['row'];
  readonly i: number;
  readonly share: number;
  readonly octaves: number;
  low: number;
  high: number;
  value: number;
}

/** Cost tables of one site and one set of rates; each form and method is sized once. */
export interface TableShelf {
  /** The table the search of one form uses: the form by its method and its approach form by the usual one. */
  readonly tableFor: (asked: FormAndMethod) => CostTable;
  /** The rows that the table of one form is read off: its own and those of its approaches. */
  readonly rowsOf: (asked: FormAndMethod) => readonly TrialRows[];
  /** What a support of a form carries for each metre of the spans beside it, permanent and traffic together, kN/m. */
  readonly loadKNm: (asked: FormAndMethod, form: FormId, governingM: number) => number;
  /** Longest side span over a main span, m, with which the back-stays of a unit on two pylons stay taut. */
  readonly tautSide: (asked: FormAndMethod, mainM: number) => number;
}

/**
 * What the search knows of cost, made by the real sizing, take-off and mean rates: deck cost and depth of each form
 * at a few spans of its possible band, supports by what they meet at their chainage.
 */
export function tableShelf(makers: RowMakers, { piers }: Pick<Memory, 'piers'>): TableShelf {
  const shelf = new Map<string, TrialRows>();
  const rowsFor = (asked: FormAndMethod): TrialRows => {
    const key = `${asked.form} ${asked.method}`;
    const found = shelf.get(key) ?? trialRows(asked, makers);
    shelf.set(key, found);
    return found;
  };
  const isOpen = (form: FormId): boolean => openSpans(form, makers.site.lengthM) !== undefined;
  const usual = (form: FormId): FormAndMethod => ({ form, method: formModule(form).methods[0] });

  const pierCost = trialPiers(makers, piers);

  const tableFor = (asked: FormAndMethod): CostTable => {
    const byForm = new Map<FormId, TrialRows>();
    const rowsBy = (form: FormId): TrialRows => {
      let rows = byForm.get(form);
      if (!rows) byForm.set(form, (rows = rowsFor(form === asked.form ? asked : usual(form))));
      return rows;
    };
    // Asked span after span of one governing span, and of ends that are worth the same: the powers are taken once.
    const places = new Map<FormId, Place>();
    const placeOf = (form: FormId, spanM: number): Place => {
      const known = places.get(form);
      if (known?.spanM === spanM) return known;
      const { spansM, row } = rowsBy(form);
      const [i, share] = between(spansM, spanM);
      const octaves =
        share > 0 && share < 1 ? Math.log(spanM / spansM[i]!) / Math.log(spansM[i + 1]! / spansM[i]!) : 0;
      const place = { spanM, share, octaves, row, i, low: NaN, high: NaN, value: NaN };
      places.set(form, place);
      return place;
    };
    /** Between the rows on both sides of a place. */
    const across = (place: Place, low: number, high: number): number => {
      const { share, octaves } = place;
      if (!(share > 0 && share < 1 && low > 0 && high > 0)) return (1 - share) * low + share * high;
      if (low !== place.low || high !== place.high) {
        place.low = low;
        place.high = high;
        place.value = low * Math.pow(high / low, octaves);
      }
      return place.value;
    };
    const read = (form: FormId, spanM: number, value: (row: TrialRow) => number): number => {
      const place = placeOf(form, spanM);
      const { share, row, i } = place;
      return across(place, share < 1 ? value(row(i)) : 0, share > 0 ? value(row(i + 1)) : 0);
    };
    let asking: { form?: FormId; mean: number; onLoads: ReturnType<typeof between> } = {
      mean: NaN,
      onLoads: [0, 0],
    };
    const { mainOpening } = makers.site;
    return {
      forcedSpanM: mainOpening === null ? 0 : mainOpening.widthM + 2 * PIER_HALF_WIDTH_M,
      deckPerM(form, spanM, governingM) {
        const governing = Math.max(governingM, spanM);
        const of = governing > 0 ? spanM / governing : 1;
        const towardsWhole = Math.min(1, Math.max(0, (of - SHORTER) / (WHOLE - SHORTER)));
        const place = placeOf(form, governing);
        const { share, row, i } = place;
        const low = share < 1 ? deckCost(row(i), towardsWhole) : 0;
        return across(place, low, share > 0 ? deckCost(row(i + 1), towardsWhole) : 0);
      },
      endWorksAs: (form, governingM) => read(form, governingM, (row) => row.endWorksAs),
      aloneWorksAs: (form, governingM) => read(form, governingM, (row) => row.aloneWorksAs),
      depthM: (form, governingM) => read(form, governingM, (row) => row.depthM),
      unitFixed: (form, governingM, pylons = 0) =>
        read(form, governingM, (row) => row.fixed[Math.min(pylons, row.fixed.length - 1)]!),
      support(form, chainageM, spanLeftM, spanRightM) {
        const mean = (spanLeftM + spanRightM) / 2;
        // Asked for place after place with the same spans.
        if (form !== asking.form || mean !== asking.mean) {
          const rows = rowsBy(form);
          const [i, share] = between(rows.spansM, mean);
          const loadKN = rows.row(share > 0.5 ? i + 1 : i).loadKNm * mean;
          asking = { form, mean, onLoads: between(PIER_LOADS_KN, loadKN) };
        }
        const [k, within] = asking.onLoads;
        const low = pierCost(chainageM, k);
        return within > 0 ? low + within * (pierCost(chainageM, k + 1) - low) : low;
      },
    };
  };
  /** The row of the first trial span that is as long as a span, m, or of the longest. */
  const rowOver = ({ spansM, row }: TrialRows, longM: number): TrialRow => {
    const next = spansM.findIndex((spanM) => spanM >= longM);
    return row(next < 0 ? spansM.length - 1 : next);
  };
  return {
    tableFor,
    tautSide: (asked, mainM) => rowOver(rowsFor(asked), mainM).tautSide,
    loadKNm: (asked, form, governingM) =>
      rowOver(rowsFor(form === asked.form ? asked : usual(form)), governingM).loadKNm,
    rowsOf(asked) {
      const { pattern, alsoPatterns = [] } = formModule(asked.form);
      const patterns = pattern.kind === 'continuous' ? alsoPatterns : [pattern];
      const approaches = patterns.map(({ approach }) => approach).filter(isOpen);
      return [rowsFor(asked), ...approaches.map((approach) => rowsFor(usual(approach)))];
    },
  };
}
