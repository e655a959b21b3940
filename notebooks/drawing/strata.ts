import type { GroundStretch, Site } from '../model.ts';
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

export interface Stratum {
  readonly fromM: number;
  readonly toM: number;
  readonly likelyM: number;
  readonly lowM: number;
  readonly highM: number;
  readonly words: string;
  /** The same where there is less room. */
  readonly short: string;
}

/** Bearing stratum of a stretch: its likeliest class, and how far the others lie above and below. */
export function stratumOf(stretch: GroundStretch): Stratum | null {
  const likely = stretch.classes.reduce<GroundStretch['classes'][number] | null>(
    (best, one) => (best === null || one.odds > best.odds ? one : best),
    null,
  );
  if (likely === null) return null;
  const levels = stretch.classes.map((one) => one.bearingLevelM);
  const lowM = Math.min(...levels);
  const highM = Math.max(...levels);
  const spread = Math.max(highM - likely.bearingLevelM, likely.bearingLevelM - lowM);
  const assumed = stretch.known ? '' : ', assumed';
  const name = names[likely.ground] ?? likely.ground;
  const at = `${level(likely.bearingLevelM)}${spread > 0.05 ? ` ± ${spread.toFixed(1)}` : ''}`;
  return {
    fromM: stretch.fromM,
    toM: stretch.toM,
    likelyM: likely.bearingLevelM,
    lowM,
    highM,
    words: `${name}${assumed} ${at}`,
    short: `${name} ${at}`,
  };
}

/** Bearing strata: long dashes at the likeliest level, dots where the others put it. */
export function strata(site: Site, frame: Frame, lowestM: number): Piece {
  return g(
    { class: 'strata', fill: 'none', stroke: colours.third, 'stroke-width': pens.fine },
    site.groundStretches.map((stretch, index) => {
      const stratum = stratumOf(stretch);
      if (stratum === null) return null;
      const left = frame.x(index === 0 ? frame.fromM : Math.max(stratum.fromM, frame.fromM));
      const right = frame.x(
        index === site.groundStretches.length - 1 ? frame.toM : Math.min(stratum.toM, frame.toM),
      );
      const line = (levelM: number, dash: string): Piece | null =>
        levelM < lowestM
          ? null
          : el('path', {
              d: `M${num(left)},${num(frame.y(levelM))}H${num(right)}`,
              'stroke-dasharray': dash,
            });
      return g(
        {},
        line(stratum.likelyM, '11 5.2'),
        stratum.highM > stratum.likelyM + 0.05 && line(stratum.highM, '1.4 4.4'),
        stratum.lowM < stratum.likelyM - 0.05 && line(stratum.lowM, '1.4 4.4'),
      );
    }),
  );
}
