import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth, wrapText } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import { sheet } from './sheet.ts';

interface KeySection {
  readonly number: number;
  readonly name: string;
  /** Where it leads, e.g. '#s3'. */
  readonly href: string;
  /** Names of its stations in order, e.g. '3+010'. */
  readonly stations: readonly string[];
}

export interface KeyLineInput {
  readonly sections: readonly KeySection[];
  readonly widthPx: number;
  readonly joined?: {
    readonly at: string;
    readonly uses: readonly string[];
    readonly usedBy: readonly string[];
  };
}

const numberWidth = (number: number): number => textWidth(String(number), letters.drawing, 600);
const nameWidth = (name: string): number => textWidth(name, letters.drawing);

/** A name broken into at most so many lines, as narrow as they can be. */
function narrowest(name: string, most: number): string[] {
  const words = name.split(' ');
  const runs = words.flatMap((_, from) =>
    words.slice(from).map((__, to) => words.slice(from, from + to + 1)),
  );
  const candidates = runs.map((run) => nameWidth(run.join(' '))).sort((a, b) => a - b);
  const broken = candidates.map((width) => wrapText(name, width + 0.01, letters.drawing));
  return broken.find((lines) => lines.length <= most) ?? [name];
}

/** The station line laid flat under the title: posts named, sections as wide as their names; the spans stand on it like a viaduct. */
export function keyLine(input: KeyLineInput): Piece {
  const { sections, widthPx, joined } = input;
  // Names on one line where there is room, else on two or three; where there is none, the numbers alone.
  const settings = [1, 2, 3].map((most) => {
    const names = sections.map(({ name }) => narrowest(name, most));
    const natural = sections.map(
      ({ number }, index) =>
        numberWidth(number) + 4 + Math.max(0, ...(names[index] ?? []).map(nameWidth)) + 14,
    );
    return { names, natural, sum: natural.reduce((total, one) => total + one, 0) };
  });
  const fitting = settings.find((setting) => setting.sum <= widthPx);
  const named = fitting !== undefined;
  const { names, natural, sum } = fitting ?? settings[0]!;
  const lines = named ? Math.max(1, ...names.map((name) => name.length)) : 1;
  const widths = sections.map((_, index) =>
    named ? ((natural[index] ?? 0) * widthPx) / sum : widthPx / sections.length,
  );
  const lefts = widths.map((_, index) => 3 + widths.slice(0, index).reduce((total, one) => total + one, 0));
  const places = new Map<string, number>();
  sections.forEach((section, index) => {
    const width = widths[index] ?? 0;
    section.stations.forEach((name, at) =>
      places.set(name, (lefts[index] ?? 0) + (width * (at + 1)) / (section.stations.length + 1)),
    );
  });
  const at = joined === undefined ? undefined : places.get(joined.at);
  const y = joined === undefined || at === undefined ? 12 : 52;
  const arc = (from: number, to: number): string => {
    const rise = Math.min(44, 12 + Math.abs(to - from) * 0.16) * 1.33;
    return `M${num(from)},${num(y)}C${num(from + (to - from) * 0.2)},${num(y - rise)} ${num(from + (to - from) * 0.8)},${num(y - rise)} ${num(to)},${num(y)}`;
  };
  const known = (names: readonly string[]): number[] => names.flatMap((name) => places.get(name) ?? []);
  return sheet(
    widthPx,
    y + (named ? 11 + 13 * lines : 22),
    'Sections of this page',
    [
      el('path', { d: `M0,${num(y)}H${num(widthPx)}`, stroke: colours.ink, 'stroke-width': pens.medium }),
      el('path', {
        d: [...places.values()].map((x) => `M${num(x)},${num(y - 2.5)}v5`).join(''),
        stroke: colours.ink,
        'stroke-width': pens.fine,
      }),
      sections.map((section, index) => {
        const x = lefts[index] ?? 0;
        const number = String(section.number);
        // The spaces behind the words part them when they are read aloud.
        return el(
          'a',
          { href: section.href, class: 'post', 'aria-label': `${number} ${section.name}` },
          el('rect', {
            x: x - 3,
            y: y - 12,
            width: Math.max(20, (widths[index] ?? 0) - 4),
            height: 44,
            fill: colours.sheet,
            'fill-opacity': 0,
          }),
          el('path', { d: `M${num(x)},${num(y - 5.5)}v11`, stroke: colours.ink, 'stroke-width': pens.thick }),
          label(named ? x - 1.5 : x, y + 19, `${number} `, {
            weight: 600,
            anchor: named ? 'start' : 'middle',
          }),
          named &&
            (names[index] ?? []).map((line, row) =>
              label(x + numberWidth(section.number) + 4, y + 19 + row * 13, `${line} `, {
                fill: colours.second,
              }),
            ),
        );
      }),
      at !== undefined &&
        g(
          { class: 'spans', fill: 'none', stroke: colours.ink, 'stroke-width': pens.thin },
          el('path', {
            d: known(joined?.uses ?? [])
              .map((x) => arc(at, x))
              .join(''),
          }),
          el('path', {
            d: known(joined?.usedBy ?? [])
              .map((x) => arc(at, x))
              .join(''),
            'stroke-dasharray': '4 3',
          }),
          el('path', {
            d: known(joined?.uses ?? [])
              .map((x) => `M${num(x)},${num(y)}l-3.4,5.4h6.8Z`)
              .join(''),
            fill: colours.ink,
            stroke: 'none',
          }),
          known(joined?.usedBy ?? []).map((x) =>
            el('circle', { cx: x, cy: y + 2.6, r: 2.6, fill: colours.sheet }),
          ),
          el('circle', { cx: at, cy: y, r: 5, fill: colours.ink, stroke: 'none' }),
        ),
    ],
    'group',
    'key-line',
  );
}
