import { bearingLevel, groundAt, type GroundStretch, type Site } from '../model.ts';
import { level } from '../format.ts';
import type { Frame } from './frame.ts';
import { colours, pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

const names: Readonly<Record<string, string>> = {
  rock: 'rock',
  gravel: 'gravel',
  'stiff-clay': 'stiff clay',
  'soft-clay': 'soft clay',
};

/** Level of a line under the ground, m, at a chainage, m. */
type LevelAt = (chainageM: number) => number;

export interface Stratum {
  readonly fromM: number;
  readonly toM: number;
  readonly likely: LevelAt;
  /** Between these it may lie. */
  readonly low: LevelAt;
  readonly high: LevelAt;
  /** Whether any of these follows the ground; else all are level. */
  readonly followsGround: boolean;
  readonly words: string;
  /** The same where there is less room. */
  readonly short: string;
}

/** Bearing stratum of a stretch: its likeliest class, and how far the others lie above and below. */
export function stratumOf(site: Site, { fromM, toM, known, classes }: GroundStretch): Stratum | null {
  const likeliest = classes.reduce<GroundStretch['classes'][number] | null>(
    (best, one) => (best === null || one.odds > best.odds ? one : best),
    null,
  );
  if (likeliest === null) return null;
  const levelsAt = (x: number): number[] => classes.map((one) => bearingLevel(one, groundAt(site, x)));
  const likely = (x: number): number => bearingLevel(likeliest, groundAt(site, x));
  const low = (x: number): number => Math.min(...levelsAt(x));
  const high = (x: number): number => Math.max(...levelsAt(x));
  const middleM = (fromM + toM) / 2;
  const spread = Math.max(high(middleM) - likely(middleM), likely(middleM) - low(middleM));
  const assumed = known ? '' : ', assumed';
  const name = names[likeliest.ground] ?? likeliest.ground;
  const place =
    likeliest.bearingDepthM === undefined
      ? level(likely(middleM))
      : `${likeliest.bearingDepthM.toFixed(1)} m down`;
  const at = `${place}${spread > 0.05 ? ` ± ${spread.toFixed(1)}` : ''}`;
  return {
    fromM,
    toM,
    likely,
    low,
    high,
    followsGround: classes.some(({ bearingDepthM }) => bearingDepthM !== undefined),
    words: `${name}${assumed} ${at}`,
    short: `${name} ${at}`,
  };
}

/** Bearing strata: long dashes at the likeliest level, dots where the others put it. */
export function strata(site: Site, frame: Frame, lowestM: number): Piece {
  const last = site.groundStretches.length - 1;
  return g(
    { class: 'strata', fill: 'none', stroke: colours.third, 'stroke-width': pens.fine },
    site.groundStretches.map((stretch, index) => {
      const stratum = stratumOf(site, stretch);
      if (stratum === null) return null;
      const fromM = index === 0 ? frame.fromM : Math.max(stratum.fromM, frame.fromM);
      const toM = index === last ? frame.toM : Math.min(stratum.toM, frame.toM);
      const knees = stratum.followsGround ? site.groundX.filter((x) => x > fromM && x < toM) : [];
      const along = [fromM, ...knees, toM];
      const line = (at: LevelAt, dash: string): Piece | null => {
        const levels = along.map(at);
        if (Math.max(...levels) < lowestM) return null;
        const d = stratum.followsGround
          ? `M${along.map((x, i) => `${num(frame.x(x))},${num(frame.y(levels[i]!))}`).join('L')}`
          : `M${num(frame.x(fromM))},${num(frame.y(levels[0]!))}H${num(frame.x(toM))}`;
        return el('path', { d, 'stroke-dasharray': dash });
      };
      const apart = (one: LevelAt, other: LevelAt): boolean => along.some((x) => one(x) > other(x) + 0.05);
      return g(
        {},
        line(stratum.likely, '11 5.2'),
        apart(stratum.high, stratum.likely) && line(stratum.high, '1.4 4.4'),
        apart(stratum.likely, stratum.low) && line(stratum.low, '1.4 4.4'),
      );
    }),
  );
}
