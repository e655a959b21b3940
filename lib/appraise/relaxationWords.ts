import type { Relaxation } from '../arrange/index.ts';

const figure = (value: number, unit: string): string =>
  unit === 'm' ? `${value.toFixed(1)} m` : value.toFixed(2);

/** One way to let an arrangement in, as a sentence. */
export function relaxationWords({ what, name, from, to, unit }: Relaxation): string {
  const change = `${figure(from, unit)} to ${figure(to, unit)}`;
  switch (what) {
    case 'zone':
      return `fits if the barred stretch of ${name} goes from ${change}`;
    case 'longest-span':
      return `fits if the longest span of ${name} goes from ${change}`;
    case 'shortest-span':
      return `fits if the shortest span of ${name} goes from ${change}`;
    case 'end-ratio':
      return `fits if end spans of ${name} over their neighbours go from ${change}`;
  }
}
