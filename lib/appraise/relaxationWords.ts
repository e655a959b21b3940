import type { Relaxation } from '../arrange/index.ts';
import { formModule } from '../forms/index.ts';
import { inText } from '../messages/index.ts';
import type { FormId } from '../model/index.ts';

const figure = (value: number, unit: string): string =>
  unit === 'm' ? `${value.toFixed(1)} m` : value.toFixed(2);

/** Name of the form that a window of spans belongs to, within a sentence. */
const formWords = (id: string): string => inText(formModule(id as FormId).name);

/** One way to let an arrangement in, as a sentence. */
export function relaxationWords({ what, name, from, to, unit }: Relaxation): string {
  const change = `${figure(from, unit)} to ${figure(to, unit)}`;
  switch (what) {
    case 'zone':
      return `fits if the barred stretch of ${name} goes from ${change}`;
    case 'longest-span':
      return `fits if the longest span (${formWords(name)}) goes from ${change}`;
    case 'shortest-span':
      return `fits if the shortest span (${formWords(name)}) goes from ${change}`;
    case 'end-ratio':
      return `fits if end spans over their neighbours (${formWords(name)}) go from ${change}`;
  }
}
