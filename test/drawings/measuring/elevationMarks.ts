import type { Paper } from './paper.ts';
import { boxOf, crossedAt, having, parts, runsOf, type Node, type XY } from './svg.ts';

/** A support as it is drawn, px. */
interface SupportMarks {
  readonly x: number;
  /** Underside of the deck over it, down to the bearings; NaN where it is drawn in one with the deck. */
  readonly bearing: { readonly top: number; readonly bottom: number } | null;
  readonly footing: {
    readonly left: number;
    readonly right: number;
    readonly top: number;
    readonly bottom: number;
  } | null;
  /** Toes of its piles; null where it has none, or where they are cut. */
  readonly toe: number | null;
}

/** What can be measured in an elevation with a scale rule, px. */
export interface ElevationMarks {
  readonly supports: readonly SupportMarks[];
  readonly roadAt: (x: number) => number;
  /** The firm line of the underside; the lower where two units meet; NaN where none is drawn. */
  readonly soffitAt: (x: number) => number;
  /** The lowest a deck is drawn with its faces and members, cables, pylons and walls aside. */
  readonly undersideAt: (x: number) => number;
  readonly groundAt: (x: number) => number;
  readonly envelopes: readonly {
    readonly left: number;
    readonly right: number;
    readonly top: number;
    readonly bottom: number;
  }[];
}

/** A reading a hundredth of a pixel past the end of a line is one at its end. */
const END_PX = 0.02;

const lowestCrossed = (runs: readonly (readonly XY[])[], x: number): number => {
  const xs = runs.flat().map(([at]) => at);
  const least = Math.min(...xs);
  const most = Math.max(...xs);
  if (x < least - END_PX || x > most + END_PX) return NaN;
  return Math.max(...crossedAt(runs, Math.min(Math.max(x, least), most)));
};

/** The largest figure that is one; NaN where there is none. */
const largest = (figures: readonly number[]): number => {
  const known = figures.filter(Number.isFinite);
  return known.length === 0 ? NaN : Math.max(...known);
};

/** Not the underside: what hangs the deck up, what it stands on, and web members, whose ends reach past the axes they meet on. */
const besideDeck =
  /^(?:pylon|tower|stay|anchor stay|hanger|cable|parapet|road|soffit|diagonal|post|end post|.*wall|.*leg)/u;

/** A steel member is drawn as a line as thick as it is. */
const halfOf = ({ attrs }: Node): number =>
  attrs['fill'] === 'none' ? Number(attrs['stroke-width']) / 2 : 0;

function marksOf(group: Node, index: number, last: number, road: readonly XY[]): SupportMarks {
  const one = (name: string): Node | undefined => parts(group, name)[0];
  const [footing, bearing, shaft] = [one('footing'), one('bearing'), one('shaft')].map((part) =>
    part === undefined ? null : boxOf(part),
  ) as [SupportMarks['footing'], SupportMarks['footing'], SupportMarks['footing']];
  const piles = one('piles');
  const middle = shaft ?? footing;
  const x =
    index === 0
      ? road[0]![0]
      : index === last
        ? road.at(-1)![0]
        : middle === null
          ? NaN
          : (middle.left + middle.right) / 2;
  return { x, bearing, footing, toe: piles === undefined ? null : boxOf(piles).bottom };
}

/** Supports without a mark of their own stand under the pylon that is drawn between their neighbours. */
function underPylons(supports: readonly SupportMarks[], pylons: readonly number[]): SupportMarks[] {
  return supports.map((support, i) => {
    if (Number.isFinite(support.x)) return support;
    const [left, right] = [supports[i - 1]!.x, supports.slice(i + 1).find(({ x }) => Number.isFinite(x))!.x];
    const x =
      pylons.find((at) => at > (Number.isFinite(left) ? left : -Infinity) + 1 && at < right - 1) ?? NaN;
    return { ...support, x };
  });
}

/** Measures the elevation of an option: its marks by the names the drawing gives them. */
export function measureElevation(svg: Node): ElevationMarks {
  const [body] = having(svg, 'class', 'elevation');
  if (body === undefined) throw new Error('the drawing has no elevation');
  const lines = (name: string): XY[][] => parts(body, name).flatMap(runsOf);
  const road = lines('road')[0]!;
  const soffits = parts(body, 'soffit').map(runsOf);
  const ground = lines('ground');
  const decks = having(body, 'data-form').flatMap((unit) =>
    having(unit, 'data-part')
      .filter(({ attrs }) => !besideDeck.test(attrs['data-part']!))
      .map((part) => ({ runs: runsOf(part), half: halfOf(part) })),
  );
  const groups = having(body, 'data-support').sort(
    (a, b) => Number(a.attrs['data-support']) - Number(b.attrs['data-support']),
  );
  const pylons = parts(body, 'pylon')
    .map(boxOf)
    .map(({ left, right }) => (left + right) / 2);
  const marked = groups.map((group, index) => marksOf(group, index, groups.length - 1, road));
  return {
    supports: underPylons(marked, pylons),
    roadAt: (x) => lowestCrossed([road], x),
    soffitAt: (x) => largest(soffits.map((runs) => lowestCrossed(runs, x))),
    undersideAt: (x) => largest(decks.map(({ runs, half }) => lowestCrossed(runs, x) + half)),
    groundAt: (x) => lowestCrossed(ground, x),
    envelopes: parts(svg, 'envelope').map(boxOf),
  };
}

/** Spans in metres between neighbouring supports. */
export const spansMeasured = ({ supports }: ElevationMarks, { pxPerM }: Paper): number[] =>
  supports.slice(1).map(({ x }, i) => (x - supports[i]!.x) / pxPerM);
