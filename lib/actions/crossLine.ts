/** Influence of transverse position on a member: straight between points, y across the deck in m, rising. */
export interface CrossLine {
  readonly yM: readonly number[];
  readonly value: readonly number[];
}

/** Value at y; the end pieces run on beyond the ends. */
export function crossValue(line: CrossLine, y: number): number {
  const { yM, value } = line;
  let i = 1;
  while (i < yM.length - 1 && y > yM[i]!) i++;
  const y0 = yM[i - 1]!;
  const y1 = yM[i]!;
  return value[i - 1]! + ((value[i]! - value[i - 1]!) * (y - y0)) / (y1 - y0);
}

/** Integral of the positive part of the line from `from` to `to`. */
export function crossPositiveArea(line: CrossLine, from: number, to: number): number {
  const inner = line.yM.filter((y) => y > from && y < to);
  const cuts = [from, ...inner, to];
  let sum = 0;
  for (let i = 1; i < cuts.length; i++) {
    const width = cuts[i]! - cuts[i - 1]!;
    const a = crossValue(line, cuts[i - 1]!);
    const b = crossValue(line, cuts[i]!);
    if (a >= 0 && b >= 0) sum += (width * (a + b)) / 2;
    else if (a > 0 || b > 0) sum += (width * Math.max(a, b) ** 2) / (2 * Math.abs(a - b));
  }
  return sum;
}
