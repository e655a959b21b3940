import type { Site } from '../model.ts';
import { length } from '../format.ts';
import { groundLevel } from './alongOption.ts';
import { dimensionChain } from './dimension.ts';
import type { Frame } from './frame.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/** Where no pier may stand: an upright at each end, and between them a dimension with the words. */
export function barredDimension(site: Site, frame: Frame, y: number, accent: string): Piece | null {
  const opening = site.mainOpening;
  if (opening === null) return null;
  const left = frame.x(opening.fromM);
  const right = frame.x(opening.toM);
  const foot = (m: number): number => frame.y(groundLevel(site, m));
  return g(
    { class: 'barred' },
    el('path', {
      d: `M${num(left)},${num(y - 6)}V${num(foot(opening.fromM))}M${num(right)},${num(y - 6)}V${num(foot(opening.toM))}`,
      fill: 'none',
      stroke: accent,
      'stroke-width': pens.fine,
      'stroke-dasharray': '4.6 2.8',
    }),
    dimensionChain([left, right], y, [`${opening.widthM.toFixed(1)} no pier`], {
      asked: ['site/mainOpening/widthM'],
      colour: accent,
      halo: true,
      inLine: true,
    }),
  );
}

/** A stretch barred to supports, m, and what is said of it. */
interface Barred {
  readonly fromM: number;
  readonly toM: number;
  readonly words: string;
  /** What bars it, by name. */
  readonly names: readonly string[];
}

/** Neighbouring hard zones run together, with one name. */
function barredStretches(site: Site): Barred[] {
  const hard = site.zones.filter((zone) => zone.hard).sort((a, b) => a.fromM - b.fromM);
  const out: { fromM: number; toM: number; words: string; names: string[] }[] = [];
  for (const zone of hard) {
    const last = out[out.length - 1];
    if (last !== undefined && zone.fromM <= last.toM + 0.05) {
      last.toM = Math.max(last.toM, zone.toM);
      last.names.push(zone.name);
    } else {
      const { fromM, toM, kind, name } = zone;
      out.push({ fromM, toM, words: kind === 'river' ? 'no pier' : kind, names: [name] });
    }
  }
  return out.map((stretch) =>
    stretch.words === 'no pier'
      ? { ...stretch, words: `no pier, ${length(stretch.toM - stretch.fromM)} m` }
      : stretch,
  );
}

/** Grey wash of the barred stretches over the whole height of a drawing. */
export const barredWash = (site: Site, frame: Frame, top: number, bottom: number): Piece =>
  g(
    { class: 'wash' },
    barredStretches(site).map(({ fromM, toM }) =>
      el('rect', {
        x: frame.x(fromM),
        y: top,
        width: (toM - fromM) * frame.pxPerM,
        height: bottom - top,
        fill: colours.wash,
      }),
    ),
  );

/** On a sheet narrower than this, px, words over brackets that would need a second line stand in a key below instead. */
const KEYED_UNDER_PX = 480;

/** Stretch and scale of a drawing with brackets. */
type Shown = Pick<Frame, 'fromM' | 'toM' | 'pxPerM'>;

interface Bracket extends Barred {
  /** Line that its words stand in, counted up from the bracket. */
  readonly line: number;
  /** What its letter stands for in the key below; absent where its words stand over it. */
  readonly keyed?: string;
}

/** The brackets over barred stretches, each with its words, or with a letter where there is no room for the words of all. */
function bracketsOf(site: Site, { fromM, toM, pxPerM }: Shown): readonly Bracket[] {
  const said = bracketLines(barredStretches(site), pxPerM);
  const isKeyed = (toM - fromM) * pxPerM < KEYED_UNDER_PX && said.some(({ line }) => line > 0);
  if (!isKeyed) return said;
  const lettered = said.map((stretch, i) => {
    const { words, names } = stretch;
    const isNamed = !words.startsWith('no pier');
    return {
      ...stretch,
      words: String.fromCodePoint(A + i),
      keyed: isNamed ? names.join(', ') : `${names.join(', ')} (${words})`,
    };
  });
  return bracketLines(lettered, pxPerM);
}

const A = 'a'.codePointAt(0)!;

/** Names of what bars stretches whose brackets have letters. */
export const keyedNames = (site: Site, shown: Shown): ReadonlySet<string> =>
  new Set(bracketsOf(site, shown).flatMap(({ keyed, names }) => (keyed === undefined ? [] : names)));

/** Brackets with the line their words stand in, counted up from the bracket: those that would touch stand in different ones. */
function bracketLines<T extends Barred>(
  stretches: readonly T[],
  pxPerM: number,
): (T & { readonly line: number })[] {
  /** How far the words of each line reach, px from chainage nought. */
  const reach: number[] = [];
  return stretches.map((stretch) => {
    const middle = ((stretch.fromM + stretch.toM) / 2) * pxPerM;
    const half = textWidth(stretch.words, letters.drawing) / 2;
    const free = reach.findIndex((right) => middle - half >= right + 6);
    const line = free < 0 ? reach.length : free;
    reach[line] = middle + half;
    return { ...stretch, line };
  });
}

/** From a bracket up to its words, and from one line of words to the next, px. */
const WORDS_PX = 5;
const LINE_PX = 12;

/**
 * Height that brackets take over their level line, to the top of their words with some air, px; 0 where nothing is barred.
 * Letters take as much as the words they stand for: brackets that are close need the room to be taken hold of.
 */
export function bracketsPx(site: Site, pxPerM: number): number {
  const lines = bracketLines(barredStretches(site), pxPerM).map(({ line }) => line + 1);
  return lines.length === 0 ? 0 : WORDS_PX + LINE_PX * Math.max(...lines) + 2;
}

/** The words over each bracket of a level line at y: where their middle stands, and whether they are those of the main opening. */
export const bracketWords = (
  site: Site,
  frame: Frame,
  y: number,
): (Bracket & { readonly x: number; readonly y: number; readonly isMain: boolean })[] =>
  bracketsOf(site, frame).map((stretch) => ({
    ...stretch,
    x: frame.x((stretch.fromM + stretch.toM) / 2),
    y: y - WORDS_PX - stretch.line * LINE_PX,
    isMain: site.mainOpening?.fromM === stretch.fromM && site.mainOpening.toM === stretch.toM,
  }));

/** Accent bracket with its words on top of each barred stretch. */
export const barredBrackets = (site: Site, frame: Frame, y: number, accent: string): Piece =>
  g(
    { class: 'brackets' },
    bracketWords(site, frame, y).map((stretch) =>
      g(
        { 'data-letter': stretch.keyed === undefined ? undefined : stretch.words },
        stretch.keyed !== undefined && el('title', {}, stretch.keyed),
        el('path', {
          d: `M${num(frame.x(stretch.fromM))},${num(y + 6)}V${num(y)}H${num(frame.x(stretch.toM))}V${num(y + 6)}`,
          fill: 'none',
          stroke: accent,
          'stroke-width': pens.medium,
        }),
        label(stretch.x, stretch.y, stretch.words, {
          anchor: 'middle',
          fill: accent,
          figure:
            stretch.isMain && stretch.words.startsWith('no pier') ? 'site/mainOpening/widthM' : undefined,
        }),
      ),
    ),
  );

/** What the letters over the brackets of a drawing stand for, in order; empty where words stand over them. */
export function bracketKey({ children }: Piece): { readonly letter: string; readonly names: string }[] {
  return children.flatMap((child) => {
    if (typeof child === 'string') return [];
    const letter = child.attrs['data-letter'];
    if (letter === undefined) return child.tag === 'g' || child.tag === 'svg' ? bracketKey(child) : [];
    const title = child.children.find((one): one is Piece => typeof one !== 'string' && one.tag === 'title');
    return [{ letter, names: title?.children.filter((one) => typeof one === 'string').join('') ?? '' }];
  });
}
