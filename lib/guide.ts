import type { Facts, Flip, FormId, Ruling, Status } from './model/index.ts';
import { formIds } from './model/index.ts';
import type { DepthPair } from './model/index.ts';
import {
  cite,
  depthBand,
  depthMeasure,
  endRatioWindow,
  floorBand,
  midspanDepthBand,
  rule,
  rulesFor,
  rulingOf,
  sideRatioWindow,
  spanWindow,
  statusChange,
  statusOf,
  verdictOf,
  windowOf,
  withRatios,
  type Interval,
  type Rule,
} from './rules/index.ts';

/** The question that comes by phone: what can span this opening? */
export interface GuideTask {
  /** Clear opening between supports, m, > 0. */
  readonly spanM: number;
  /** Deck width, m; 12 where nothing is said. */
  readonly widthM?: number;
  /** Length between abutments, m, at least the span; where nothing is said only the opening is looked at. */
  readonly lengthM?: number;
  /** Plan radius, m; straight where nothing is said. */
  readonly radiusM?: number;
}

/** One form's answer. */
export interface GuideForm {
  readonly form: FormId;
  readonly status: Status;
  /** Middle of the published depth bands, m; for road between or over the main members the floor, or arch and crown. */
  readonly depthM: DepthPair;
  readonly because: readonly string[];
  readonly sources: readonly string[];
  /** The nearest change of one figure that changes the status, and what it becomes. */
  readonly flip?: Flip & { readonly becomes: Status };
}

export interface Guide {
  readonly span: number;
  /** Every form, best first. */
  readonly forms: readonly GuideForm[];
}

const ranks: Readonly<Record<Status, number>> = { in: 0, possible: 1, out: 2 };
const voices: Readonly<Record<Ruling['effect'], number>> = {
  out: 0,
  caution: 1,
  'in favour': 2,
  'to confirm': 3,
};

/** Middle of a band of ratios: as far below its most as above its least, in proportion. */
const middle = ([least, most]: Interval): number => Math.sqrt(least * most);

/** Depths of a first answer, to 50 mm. */
const rounded = (depthM: number): number => Math.max(0.05, Math.round(depthM * 20) / 20);

/**
 * Whether the side spans that the length leaves room for make a continuous unit.
 *
 * @param sideRoom room beside the span on either side, over the span
 */
export function continuityOf(form: FormId, sideRoom: number): 'simple' | 'continuous' {
  const least = endRatioWindow(form)?.[0];
  return least !== undefined && sideRoom >= least ? 'continuous' : 'simple';
}

function depthOf(
  form: FormId,
  spanM: number,
  widthM: number,
  continuity: 'simple' | 'continuous',
): DepthPair {
  const floor = floorBand(form);
  if (floor !== null) {
    const depthM = rounded(widthM * middle(floor));
    return { support: depthM, midspan: depthM };
  }
  const atSupport = spanM * middle(depthBand(form, continuity));
  const band = midspanDepthBand(form);
  const least = windowOf(form, 'midspanDepthM', ['to confirm'])?.[0] ?? 0;
  const atMidspan = Math.max(least, band === null ? atSupport : spanM * middle(band));
  return depthMeasure(form) === 'riseRatio'
    ? { support: rounded(atSupport + atMidspan), midspan: rounded(atMidspan) }
    : { support: rounded(Math.max(atSupport, atMidspan)), midspan: rounded(atMidspan) };
}

/** How deep a span lies inside the usual band: 1 in its middle, 0 at its ends, negative outside, in proportion. */
function depthInside([least, most]: Interval, spanM: number): number {
  const half = Math.log(most / least) / 2;
  return half > 0 ? Math.min(Math.log(spanM / least), Math.log(most / spanM)) / half : -Infinity;
}

function factsOf(form: FormId, task: GuideTask, widthM: number): Facts {
  const { spanM, lengthM = spanM, radiusM = Infinity } = task;
  const sideRoom = (lengthM - spanM) / 2 / spanM;
  const side = sideRatioWindow(form, 2);
  return withRatios({
    mainSpanM: spanM,
    deckWidthM: widthM,
    planRadiusM: radiusM,
    skewDeg: 0,
    continuity: continuityOf(form, sideRoom),
    ...(task.lengthM === undefined ? {} : { unitLengthM: lengthM }),
    // Side spans may be shorter than the room there is, never longer.
    ...(task.lengthM === undefined || side === null
      ? {}
      : { pylons: 2, sideSpanRatio: Math.min(sideRoom, side[1]) }),
  });
}

function outsideUsual(form: FormId, spanM: number): Pick<Ruling, 'because' | 'source'> {
  const { possible, usual } = spanWindow(form);
  const usualRule = rulesFor(form, ['form']).find(
    ({ subject, effect }) => subject === 'span' && effect === 'in favour',
  );
  return {
    because: [
      `${Number(spanM.toFixed(1))} m is outside the usual ${usual[0]} to ${usual[1]} m, within the limits of ${possible[0]} and ${possible[1]} m`,
    ],
    source: usualRule === undefined ? '' : cite(usualRule.sources),
  };
}

const rulingsOn = (asked: readonly Rule[], facts: Facts): readonly Ruling[] =>
  asked.map((entry) => rulingOf(entry, facts)).filter((ruling) => ruling !== null);

function answer(form: FormId, task: GuideTask, widthM: number): GuideForm {
  const facts = factsOf(form, task, widthM);
  // What the question leaves open (method, supports, levels) is the arrangement's business, not the guide's.
  const asked: readonly Rule[] = rulesFor(form, ['form', 'arrangement']).filter(
    (entry) => verdictOf(entry, facts)?.template !== null,
  );
  const rulings = [...rulingsOn(asked, facts)].sort((a, b) => voices[a.effect] - voices[b.effect]);
  const spoken = rulings.some((ruling) => rule(ruling.rule).subject === 'span')
    ? rulings
    : [...rulings, outsideUsual(form, task.spanM)];
  const flip = statusChange(asked, facts);
  return {
    form,
    status: statusOf(rulings),
    depthM: depthOf(form, task.spanM, widthM, facts.continuity === 'continuous' ? 'continuous' : 'simple'),
    because: spoken.flatMap(({ because }) => because),
    sources: [...new Set(spoken.map(({ source }) => source))],
    ...(flip === undefined
      ? {}
      : { flip: { ...flip, becomes: statusOf(rulingsOn(asked, { ...facts, [flip.fact]: flip.to })) } }),
  };
}

/**
 * Every form for a clear opening, from the rules alone, best first: by status, then by how deep the span lies in the
 * form's usual band. Square supports; depths are the middle of the published bands.
 *
 * @param task span and length in m, > 0; length at least the span
 * @throws RangeError where a figure is not a positive number or the length is under the span
 */
export function guide(task: GuideTask): Guide {
  const { spanM, widthM = 12, lengthM = spanM, radiusM = Infinity } = task;
  for (const [name, value] of Object.entries({ spanM, widthM, lengthM, radiusM }))
    if (!(value > 0)) throw new RangeError(`${name}: expected more than 0 m, received ${value} m`);
  if (!(lengthM >= spanM))
    throw new RangeError(`lengthM: expected at least the span of ${spanM} m, received ${lengthM} m`);
  const inside = new Map(formIds.map((form) => [form, depthInside(spanWindow(form).usual, spanM)]));
  const forms = formIds
    .map((form) => answer(form, task, widthM))
    .sort(
      (a, b) => ranks[a.status] - ranks[b.status] || (inside.get(b.form) ?? 0) - (inside.get(a.form) ?? 0),
    );
  return { span: spanM, forms };
}
