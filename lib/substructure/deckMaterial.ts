import type { Design } from '../model/index.ts';
import type { DeckMaterial } from './loads.ts';

/** Kind of deck for movements, from what was measured: strand makes it prestressed, steel members composite. */
export function deckMaterial(design: Pick<Design, 'lines'>): DeckMaterial {
  const has = (ending: string): boolean =>
    design.lines.some((line) => line.item.endsWith(ending) && line.quantity > 0);
  if (has('prestress')) return 'prestressed';
  return has('-steel') ? 'composite' : 'reinforced';
}
