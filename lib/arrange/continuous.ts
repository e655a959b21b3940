import type { CostTable } from '../model/index.ts';
import { kindFor, type Candidate } from './candidate.ts';
import type { Counter } from './counter.ts';
import { supportCosts } from './curves.ts';
import type { Frame } from './frame.ts';
import { limitsOf, spanFault, spansAlong, type Limits } from './limits.ts';
import { KEPT, type ArrangeRequest } from './request.ts';
import { fewestSpans, governingSpans, mostSpans } from './governingSpans.ts';
import { searchUnit } from './unitSearch.ts';
import type { UnitTask } from './unitTask.ts';
import { worthOf } from './worth.ts';

/** Why a number of spans cannot be laid out with one governing span: open ground first, then the barred stretches. */
function reasonFor(frame: Frame, limits: Limits, spans: number, governingM: number): string {
  const interior = Math.max(limits.minSpacingM, limits.interiorLeast * governingM);
  const shortest =
    spans < 3
      ? spans * limits.minSpacingM
      : (spans - 2) * interior + 2 * Math.max(limits.minSpacingM, limits.endLeast * interior);
  if (shortest > frame.lengthM) return 'span outside the band of the form';
  const even = (frame.lengthM - Math.max(spans - 2, 0) * governingM) / 2;
  for (let i = 0; i < spans - 1; i += 1) {
    const x = even + i * governingM;
    const hit = frame.barred.find(({ fromM, toM }) => x > fromM && x < toM);
    if (hit !== undefined) return `support in a barred stretch: ${hit.name}`;
  }
  return frame.barred.length > 0 ? 'support in a barred stretch' : 'end span outside its window';
}

/**
 * Every arrangement of one continuous unit from abutment to abutment that the search considers: the cheapest for each
 * number of spans and each governing span; the search ends once `enough` are found. What cannot be laid out is counted
 * by reason.
 */
export function continuousCandidates(
  request: ArrangeRequest,
  frame: Frame,
  table: CostTable,
  dropped: Counter,
  enough = Infinity,
): Candidate[] {
  const limits = limitsOf(request.windows);
  const last = frame.X.length - 1;
  const { form } = request;
  const most = Math.min(limits.maxSpanM, frame.lengthM);
  const supports = supportCosts(table, form, frame, Math.min(limits.minSpacingM, most), most);
  const worth = worthOf(request.keep ?? KEPT);
  const task: UnitTask = {
    form,
    X: frame.X,
    firstEnd: last,
    lastEnd: last,
    limits,
    supports,
    endIsPier: false,
    wantedUpTo: worth.boundCost,
  };
  const found = new Map<string, Candidate>();
  const laid = new Set<string>();
  const cut = searchUnit(task, table, (_, spans, governingM, estimate, trace) => {
    laid.add(`${governingM} ${spans}`);
    const at = trace()();
    const fault = spanFault(spansAlong(frame.X, at), limits);
    if (fault !== null) {
      dropped.add(fault);
      return true;
    }
    worth.add(spans, estimate);
    const name = at.join();
    const known = found.get(name);
    if (known === undefined || known.estimate > estimate)
      found.set(name, { kind: kindFor(at.length, 0), estimate, placed: () => [{ form, role: 'main', at }] });
    return found.size < enough;
  });
  for (const governingM of governingSpans(task)) {
    for (let k = fewestSpans(limits, frame.lengthM, governingM); k <= mostSpans(task, governingM); k += 1) {
      if (laid.has(`${governingM} ${k}`)) continue;
      const isDear = k >= (cut.get(governingM) ?? Infinity);
      dropped.add(isDear ? 'dearer than those kept' : reasonFor(frame, limits, k, governingM));
    }
  }
  return [...found.values()];
}
