import { openDB } from 'idb';
import type { DBSchema } from 'idb';
import type { StoredStudy, StudyCupboard } from './saving.ts';

interface Shelves extends DBSchema {
  readonly studies: { readonly key: string; readonly value: StoredStudy };
}

/** The studies kept by the browser on this device, in IndexedDB. Rejects when the browser keeps nothing. */
export async function deviceCupboard(name = 'spanledger'): Promise<StudyCupboard> {
  const shelves = await openDB<Shelves>(name, 1, {
    upgrade(database) {
      database.createObjectStore('studies', { keyPath: 'id' });
    },
  });
  return {
    all: () => shelves.getAll('studies'),
    get: (id) => shelves.get('studies', id),
    async change(id, next) {
      const work = shelves.transaction('studies', 'readwrite', { durability: 'strict' });
      const study = next(await work.store.get(id));
      if (study !== undefined) await work.store.put(study);
      await work.done;
    },
    remove: (id) => shelves.delete('studies', id),
  };
}
