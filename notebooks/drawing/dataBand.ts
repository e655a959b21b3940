import type { AppraisedOption, Site } from '../model.ts';
import { chainage, level, unknownMark } from '../format.ts';
import {
  groundLevel,
  leastLimit,
  leastSoffit,
  roadLevel,
  lowestSoffit,
  supportChainages,
} from './alongOption.ts';
import type { Asked } from './asked.ts';
import { overOf } from './asked.ts';
import { datumLine } from './datumLine.ts';
import type { Frame } from './frame.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/** Height of one row, px. */
const bandRow = 15.2;

/** Room the row names take at the left, px. */
const nameRoom = 46;

/**
 * Chainages at which the band states its figures: supports first, then ends of limits and barred stretches, then bends
 * of the ground, then tens; each is taken only where there is room for its figure. The place of an envelope at which least
 * is left steps aside for a support, further along the envelope, and where it cannot the support goes: what is said to be
 * spare is in the band.
 */
function bandChainages(
  site: Site,
  option: AppraisedOption | null,
  frame: Frame,
): { readonly at: number; readonly x: number }[] {
  // Levels far below the datum, and those of a hundred and more, are longer than others.
  const roadsM = option === null ? [] : supportChainages(option).map((x) => roadLevel(option, x));
  const pitch = Math.max(
    33,
    ...[...site.groundZ, ...roadsM].map((z) => textWidth(level(z), letters.drawing) + 3),
  );
  const ground = site.groundX.filter((x, index) => {
    const before = site.groundX[index - 1];
    const after = site.groundX[index + 1];
    return before !== undefined && after !== undefined && x > site.startM && x < site.endM;
  });
  // Along each envelope, the places where least is left come first.
  const tightest = site.soffitLimits
    .filter((limit) => limit.kind !== 'flood')
    .map((limit) => {
      const at = [0.5, 0, 1, 0.25, 0.75, 0.125, 0.875, 0.375, 0.625].map(
        (part) => limit.fromM + part * (limit.toM - limit.fromM),
      );
      const room = (x: number): number =>
        option === null ? 0 : lowestSoffit(site, option, x) - limit.levelM;
      const places = at.sort((one, other) => room(one) - room(other));
      return { places, middleM: (limit.fromM + limit.toM) / 2, leastM: room(places[0]!) };
    });
  const leastOfAllM = Math.min(...tightest.map(({ leastM }) => leastM));
  const tens: number[] = [];
  for (let x = Math.ceil(site.startM / 10) * 10; x <= site.endM; x += 10) tens.push(x);
  const widthOf = (at: number): number => Math.max(pitch, textWidth(chainage(at), letters.drawing, 600) + 5);
  const taken: { readonly at: number; readonly x: number; readonly widthPx: number }[] = [];
  const [least, most] = [frame.left + nameRoom + 14, frame.right - 16];
  const take = (at: number, isEnd = false, asidePx = 0): boolean => {
    const home = frame.x(at) + asidePx;
    // Figures of an abutment at the edge of the sheet step inside: they say their chainage.
    const x = isEnd ? Math.max(least, Math.min(most, home)) : home;
    if (at < frame.fromM || at > frame.toM || x < least || x > most) return false;
    const near = taken.filter((other) => Math.abs(other.x - x) < 2 * pitch);
    if (near.some((other) => Math.abs(other.x - x) < pitch)) return false;
    const widthPx = widthOf(at);
    if (near.some((other) => Math.abs(other.x - x) < (widthPx + other.widthPx) / 2)) return false;
    taken.push({ at, x, widthPx });
    return true;
  };
  const supports = option === null ? [site.startM, site.endM] : supportChainages(option);
  take(site.startM, true);
  take(site.endM, true);
  for (const at of supports) take(at);
  const steps = Array.from({ length: 2 * Math.ceil(pitch) }, (_, px) => px);
  for (const { places, middleM, leastM } of tightest) {
    const [lowest] = places as [number, ...number[]];
    const inwards = Math.sign(middleM - lowest);
    if (steps.some((px) => take(lowest, false, inwards * px)) || places.some((at) => take(at))) continue;
    // The least of all is not left out: a support beside it is.
    const x = frame.x(lowest);
    if (leastM > leastOfAllM || x < least || x > most) continue;
    const beside = taken.filter(
      (other) => Math.abs(other.x - x) < Math.max(pitch, (other.widthPx + widthOf(lowest)) / 2),
    );
    for (const other of beside) taken.splice(taken.indexOf(other), 1);
    take(lowest);
  }
  for (const at of [
    ...site.zones.filter((zone) => zone.hard).flatMap((zone) => [zone.fromM, zone.toM]),
    ...ground,
    ...tens,
  ])
    take(at);
  return taken.sort((a, b) => a.at - b.at);
}

interface Row {
  readonly name: string;
  readonly figure: (chainageM: number) => string;
  readonly value?: (chainageM: number) => number;
  readonly bold?: boolean;
  readonly fill?: (chainageM: number) => string;
  readonly asked?: (chainageM: number) => Asked;
}

export interface BandStyle {
  readonly accent: string;
  readonly datumM: number;
}

/**
 * Data band under an elevation: chainage, ground, road, soffit, lowest soffit allowed and what is left of it. The least
 * spare is bold, and in the accent where it is negative.
 * @returns the band, its height in px and the figures as a table
 */
export function dataBand(
  site: Site,
  option: AppraisedOption | null,
  frame: Frame,
  y: number,
  style: BandStyle,
): {
  readonly piece: Piece;
  readonly height: number;
  readonly table: { readonly head: string[]; readonly rows: string[][] };
} {
  const columns = bandChainages(site, option, frame);
  const places = columns.map(({ at }) => at);
  const show = (value: number): string => (Number.isFinite(value) ? level(value) : unknownMark);
  const spare = (at: number): number =>
    option === null ? NaN : lowestSoffit(site, option, at) - leastSoffit(site, at);
  const least = Math.min(...places.map(spare).filter(Number.isFinite));
  const limited = places.some((at) => Number.isFinite(leastSoffit(site, at)));
  const rows: Row[] = [
    { name: 'ch', figure: chainage, bold: true },
    {
      name: 'ground',
      figure: (at) => show(groundLevel(site, at)),
      asked: (at) => `site/groundAt/${String(at)}`,
    },
  ];
  if (option !== null) {
    rows.push(
      {
        name: 'road',
        figure: (at) => show(roadLevel(option, at)),
        asked: (at) => overOf(option, at, 'roadM'),
      },
      {
        name: 'soffit',
        figure: (at) => show(lowestSoffit(site, option, at)),
        asked: (at) =>
          Number.isFinite(lowestSoffit(site, option, at)) ? overOf(option, at, 'soffitM') : undefined,
      },
    );
  }
  if (limited) {
    rows.push({
      name: 'at least',
      figure: (at) => show(leastSoffit(site, at)),
      fill: (at) => (Number.isFinite(leastSoffit(site, at)) ? style.accent : colours.second),
      asked: (at) => leastLimit(site, at),
    });
    if (option !== null)
      rows.push({
        name: 'spare',
        figure: (at) => show(spare(at)),
        value: spare,
        fill: (at) => (spare(at) < -0.005 ? style.accent : colours.ink),
        asked: (at) => (Number.isFinite(spare(at)) ? overOf(option, at, 'spareM') : undefined),
      });
  }
  const height = rows.length * bandRow;
  const line = (at: number, stroke: string, width: number): Piece =>
    el('path', { d: `M${num(frame.left)},${num(at)}H${num(frame.right)}`, stroke, 'stroke-width': width });
  const piece = g(
    { class: 'band' },
    datumLine(frame, { levelM: style.datumM, y }, pens.medium),
    el('path', {
      d: columns
        .map(
          ({ at, x }) =>
            `M${num(frame.x(at))},${num(y - 4)}v4${x === frame.x(at) ? '' : `L${num(x)},${num(y + 4)}`}`,
        )
        .join(''),
      fill: 'none',
      stroke: colours.ink,
      'stroke-width': pens.thin,
    }),
    rows.map((row, index) => {
      const base = y + (index + 1) * bandRow - 4;
      return g(
        {},
        index > 0 && line(y + index * bandRow, colours.rule, pens.fine),
        label(frame.left + 2, base, row.name, { fill: colours.second, size: letters.drawing }),
        columns.map(({ at, x }) => {
          const isLeast = row.value !== undefined && Math.abs(row.value(at) - least) < 0.005;
          return label(x, base, row.figure(at), {
            anchor: 'middle',
            weight: row.bold === true || isLeast ? 600 : 400,
            fill: row.fill?.(at) ?? colours.ink,
            figure: row.asked?.(at),
          });
        }),
      );
    }),
    line(y + height, colours.ink, pens.medium),
  );
  return {
    piece,
    height,
    table: { head: rows.map((row) => row.name), rows: places.map((at) => rows.map((row) => row.figure(at))) },
  };
}
