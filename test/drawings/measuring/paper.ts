import { boxOf, having, printed, runsOf, within, type Node } from './svg.ts';

/** A drawing laid under the rule: what one metre is and at which level a pixel lies, by what the drawing says. */
export interface Paper {
  readonly scale: number;
  readonly pxPerM: number;
  /** Level of a pixel down, m, from the datum the drawing states. */
  readonly levelM: (y: number) => number;
}

/** A pixel is a 96th of an inch (CSS Values and Units 3, absolute lengths). */
const PX_PER_MM = 96 / 25.4;

const textsOf = (svg: Node): Node[] => [...within(svg)].filter(({ tag }) => tag === 'text');

/**
 * Pixels of one metre by the scale in words and the size of the sheet in the file: '1:1000 at A3' on a sheet whose width is
 * stated in millimetres. The sheet is held to have one measure for both directions.
 */
export function saidScale(svg: Node): { readonly scale: number; readonly pxPerM: number } {
  const said = textsOf(svg).flatMap(({ text }) => /1:(\d+) at A3/u.exec(text)?.[1] ?? []);
  if (said.length !== 1) throw new Error(`expected one scale in words, received ${String(said.length)}`);
  const [, , wide = NaN, high = NaN] = svg.attrs['viewBox']!.split(' ').map(Number);
  const mm = (name: string): number => Number(/^([\d.]+)mm$/u.exec(svg.attrs[name]!)?.[1]);
  for (const [px, name] of [
    [wide, 'width'],
    [high, 'height'],
  ] as const) {
    // Pixels are written to the hundredth, millimetres to the thousandth.
    if (!(Math.abs(px - mm(name) * PX_PER_MM) <= 0.01))
      throw new Error(`${name}: expected ${String(PX_PER_MM)} px a mm, received ${String(px / mm(name))}`);
  }
  const scale = Number(said[0]);
  return { scale, pxPerM: PX_PER_MM * (1000 / scale) };
}

/** Pixels of one metre by the scale bar: from the left end of its first bar to the right end of its last, by the figures over them. */
export function barScale(svg: Node): number {
  const [bar] = having(svg, 'class', 'scale-bar');
  if (bar === undefined) throw new Error('the drawing has no scale bar');
  const bars = bar.children.filter(({ tag }) => tag === 'rect');
  const from = Number(bars[0]!.attrs['x']);
  const to = Number(bars.at(-1)!.attrs['x']) + Number(bars.at(-1)!.attrs['width']);
  const end = bar.children.find(({ tag, text }) => tag === 'text' && text.endsWith(' m'));
  if (end === undefined) throw new Error('the scale bar names no length in m');
  return (to - from) / printed(end.text);
}

/** The scale and the datum a drawing states. */
export function readPaper(svg: Node): Paper {
  const { scale, pxPerM } = saidScale(svg);
  const [datum] = having(svg, 'class', 'datum');
  if (datum === undefined) throw new Error('the drawing states no datum');
  const line = datum.children.find(({ tag }) => tag === 'path')!;
  const said = datum.children.find(({ tag }) => tag === 'text')!.text;
  const y = runsOf(line)[0]![0]![1];
  const at = printed(said);
  return { scale, pxPerM, levelM: (px) => at + (y - px) / pxPerM };
}

/** Level marks: the figure on the shelf and the pixel down of the tip of the triangle. */
export const levelMarksOf = (svg: Node): { readonly words: string; readonly y: number }[] =>
  having(svg, 'class', 'level-mark').map((mark) => ({
    words: mark.children.find(({ tag }) => tag === 'text')!.text,
    y: boxOf(mark.children.filter(({ tag }) => tag === 'path')[1]!).bottom,
  }));
