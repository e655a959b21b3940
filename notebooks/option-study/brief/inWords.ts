import { h } from '../../html.ts';
import type { Fields, FigureSpec, Path } from '../../page/index.ts';

type Rules = Partial<Omit<FigureSpec, 'value' | 'label' | 'places' | 'unit'>>;

/** Fields as the sentences use them: a level or a headroom in hundredths, a chainage in tenths or whole. */
export function inWords(fields: Fields) {
  return {
    fields,
    /** A chainage, m. */
    chainage: (path: Path, label: string, places = 0): HTMLElement =>
      fields.figure(path, { label, places, unit: 'm' }),
    /** A level or a height, m. */
    height: (path: Path, label: string, rules: Rules = {}): HTMLElement =>
      fields.figure(path, { label, places: 2, unit: 'm', step: 0.1, ...rules }),
  };
}
export type InWords = ReturnType<typeof inWords>;

/** A name of the map: water, railway, place. */
export const place = (name: string): HTMLElement => h('i', {}, name);
