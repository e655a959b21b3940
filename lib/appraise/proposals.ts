import { arrange, type Relaxation } from '../arrange/index.ts';
import { formModule } from '../forms/index.ts';
import type { Arrangement, DroppedCount, FormId } from '../model/index.ts';
import { requestFor } from './requestFor.ts';
import { relaxationWords } from './relaxationWords.ts';
import type { Workbench } from './workbench.ts';

/** Proposals of one form at most. */
const PER_FORM = 3;

/** Best arrangements of one form, or why there are none. */
export interface Proposals {
  readonly arrangements: readonly Arrangement[];
  readonly counts: readonly DroppedCount[];
  /** Smallest relaxations, smallest first, where nothing fits. */
  readonly because: readonly string[];
}

/**
 * Searches a form by every method it may be built by. The cheapest of each method is proposed first, then the next best
 * of all, three at most; the rest is counted.
 */
export function proposalsFor(bench: Workbench, form: FormId): Proposals {
  const { site } = bench;
  const counts: DroppedCount[] = [];
  const relaxations: Relaxation[] = [];
  const byMethod = formModule(form).methods.map((method) => {
    const result = arrange(requestFor({ form, method }, site), site, bench.tables.tableFor({ form, method }));
    counts.push(...result.dropped);
    relaxations.push(...result.relaxations);
    return result.arrangements;
  });
  const byCost = (a: Arrangement, b: Arrangement): number => a.tableCost - b.tableCost;
  const first = byMethod.flatMap((list) => list.slice(0, 1)).sort(byCost);
  const rest = byMethod.flatMap((list) => list.slice(1)).sort(byCost);
  const all = [...first, ...rest];
  if (all.length > PER_FORM) {
    counts.push({ form, reason: 'dearer than the proposals of its form', count: all.length - PER_FORM });
  }
  return {
    arrangements: all.slice(0, PER_FORM),
    counts,
    because: all.length > 0 ? [] : [...new Set(relaxations.map(relaxationWords))],
  };
}
