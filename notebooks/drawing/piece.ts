/**
 * A drawing as plain data: a tree of named elements. It becomes elements of a page with `toDom`, text with `toText`,
 * and can be compared with a file without any browser.
 */
export interface Piece {
  readonly tag: string;
  readonly attrs: Readonly<Record<string, string>>;
  readonly children: readonly (Piece | string)[];
}

export type Child = Piece | string | number | null | undefined | false | readonly Child[];

/** Attribute values; `null`, `undefined` and `false` leave the attribute out, `true` writes it empty. */
export type Attrs = Readonly<Record<string, string | number | boolean | null | undefined>>;

/** Numbers are written to the hundredth of a pixel: a tenth of the thinnest line. */
export function num(value: number): string {
  const rounded = Math.round(value * 100) / 100;
  return Object.is(rounded, -0) ? '0' : String(rounded);
}

function flatten(children: readonly Child[], into: (Piece | string)[]): (Piece | string)[] {
  for (const child of children) {
    if (child === null || child === undefined || child === false) continue;
    if (Array.isArray(child)) flatten(child as readonly Child[], into);
    else into.push(typeof child === 'number' ? String(child) : (child as Piece | string));
  }
  return into;
}

/** Makes one element. Works for SVG and HTML alike: `toDom` picks the namespace from the tag `svg` downwards. */
export function el(tag: string, attrs: Attrs = {}, ...children: Child[]): Piece {
  const kept: Record<string, string> = {};
  for (const [name, value] of Object.entries(attrs)) {
    if (value === null || value === undefined || value === false) continue;
    kept[name] = value === true ? '' : typeof value === 'number' ? num(value) : value;
  }
  return { tag, attrs: kept, children: flatten(children, []) };
}

/** A group. */
export const g = (attrs: Attrs, ...children: Child[]): Piece => el('g', attrs, ...children);

/** Path data of an open or closed run of points in pixels. */
export function pathOf(points: readonly (readonly [number, number])[], closed = false): string {
  if (points.length === 0) return '';
  return `M${points.map(([x, y]) => `${num(x)},${num(y)}`).join('L')}${closed ? 'Z' : ''}`;
}
