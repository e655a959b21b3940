/** An element of a drawing as anybody reads it from its file: nothing of the program that made it. */
export interface Node {
  readonly tag: string;
  readonly attrs: Readonly<Record<string, string>>;
  readonly children: Node[];
  /** Its own lettering. */
  text: string;
}

export type XY = readonly [x: number, y: number];

const plainText = (text: string): string =>
  text
    .replace(/&lt;/gu, '<')
    .replace(/&gt;/gu, '>')
    .replace(/&quot;/gu, '"')
    .replace(/&amp;/gu, '&');

/** Reads the text of an SVG file. @throws Error on text that is not well formed */
export function readSvg(text: string): Node {
  const root: Node = { tag: '', attrs: {}, children: [], text: '' };
  const open: Node[] = [root];
  for (const [, declared, closed, tag, attributes = '', alone, words] of text.matchAll(
    /(<\?[^>]*\?>)|<\/([\w:-]+)>|<([\w:-]+)((?:\s+[\w:-]+="[^"]*")*)\s*(\/?)>|([^<]+)/gu,
  )) {
    const top = open.at(-1)!;
    if (declared !== undefined) continue;
    if (words !== undefined) top.text += plainText(words);
    else if (closed !== undefined) {
      if (top.tag !== closed) throw new Error(`svg: expected </${top.tag}>, received </${closed}>`);
      open.pop();
    } else if (tag !== undefined) {
      const attrs = Object.fromEntries(
        [...attributes.matchAll(/([\w:-]+)="([^"]*)"/gu)].map(([, name = '', value = '']) => [
          name,
          plainText(value),
        ]),
      );
      const node: Node = { tag, attrs, children: [], text: '' };
      top.children.push(node);
      if (alone === '') open.push(node);
    }
  }
  const [svg] = root.children;
  if (svg?.tag !== 'svg' || open.length > 1) throw new Error('svg: expected one whole svg element');
  return svg;
}

/** Every element from one downwards, itself first. */
export function* within(node: Node): Generator<Node> {
  yield node;
  for (const child of node.children) yield* within(child);
}

/** Elements below one that have an attribute of a value. */
export const having = (node: Node, name: string, value?: string): Node[] =>
  [...within(node)].filter(({ attrs }) =>
    value === undefined ? attrs[name] !== undefined : attrs[name] === value,
  );

/** Elements that are a part of the structure, by the name the drawing gives it. */
export const parts = (node: Node, name: string): Node[] => having(node, 'data-part', name);

/** The runs of a path as points in px; a closed one ends where it began. Knows M, L, H, V, Z and m, l, h, v. */
export function runsOf({ attrs }: Node): XY[][] {
  const d = attrs['d'] ?? '';
  const runs: XY[][] = [];
  let [x, y] = [0, 0];
  for (const [, command = '', rest = ''] of d.matchAll(/([A-Za-z])([^A-Za-z]*)/gu)) {
    const figures = (rest.match(/-?(?:\d+\.?\d*|\.\d+)/gu) ?? []).map(Number);
    const run = runs.at(-1);
    const isBy = command === command.toLowerCase();
    const to = (nx: number, ny: number): void => {
      [x, y] = [nx, ny];
      runs.at(-1)!.push([x, y]);
    };
    switch (command.toUpperCase()) {
      case 'M':
      case 'L':
        for (let i = 0; i + 1 < figures.length; i += 2) {
          if (command.toUpperCase() === 'M' && i === 0) runs.push([]);
          to(figures[i]! + (isBy ? x : 0), figures[i + 1]! + (isBy ? y : 0));
        }
        break;
      case 'H':
        for (const figure of figures) to(figure + (isBy ? x : 0), y);
        break;
      case 'V':
        for (const figure of figures) to(x, figure + (isBy ? y : 0));
        break;
      case 'Z':
        if (run?.[0] !== undefined) to(...run[0]);
        break;
      default:
        throw new Error(`path: expected M, L, H, V or Z, received ${command} in ${d}`);
    }
  }
  return runs;
}

export interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Bounds of a path, px. */
export function boxOf(node: Node): Box {
  const points = runsOf(node).flat();
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
}

/** Pixels down at which runs cross an upright at x; both ends of a stroke that stands upright there. */
export function crossedAt(runs: readonly (readonly XY[])[], x: number): number[] {
  const out: number[] = [];
  for (const run of runs) {
    for (let i = 1; i < run.length; i += 1) {
      const [x0, y0] = run[i - 1]!;
      const [x1, y1] = run[i]!;
      if (x < Math.min(x0, x1) || x > Math.max(x0, x1)) continue;
      if (x0 === x1) out.push(y0, y1);
      else out.push(y0 + ((y1 - y0) * (x - x0)) / (x1 - x0));
    }
  }
  return out;
}

/** A figure as it is printed, with thin spaces and a true minus; NaN where there is none. */
export const printed = (text: string): number => {
  const found = /[−-]?\d[\d\u2009 ]*(?:\.\d+)?/u.exec(text)?.[0];
  return found === undefined ? NaN : Number(found.replace(/[\u2009 ]/gu, '').replace('−', '-'));
};
