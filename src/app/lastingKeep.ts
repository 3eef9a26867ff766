/** The keep in IndexedDB. A craft and its versions change in one transaction, so tabs cannot write over each other unseen. */
import { type DBSchema, type IDBPDatabase, openDB } from 'idb';
import type { Keep, Unmerged } from './keep.ts';
import { type KeptCraft, type KeptVersion, merge, newestFirst, plansSetting } from './kept.ts';

interface Tables extends DBSchema {
  crafts: { key: string; value: KeptCraft };
  versions: { key: string; value: readonly KeptVersion[] };
  settings: { key: string; value: unknown };
  jotted: { key: string; value: Unmerged };
}

/**
 * Relaxed hands a write to the system within a millisecond, so that a killed browser loses nothing; strict waits for
 * the disk, up to a third of a second, in which a killed browser loses it.
 */
const RELAXED = { durability: 'relaxed' } as const;

/** Rejects where the browser refuses. */
export const openLastingKeep = async (): Promise<Keep> =>
  new LastingKeep(
    await openDB<Tables>('steelyard', 1, {
      upgrade(db) {
        db.createObjectStore('crafts', { keyPath: 'id' });
        for (const table of ['versions', 'settings', 'jotted'] as const) db.createObjectStore(table);
      },
    }),
  );

/** Two pages jot the same craft down side by side. */
const jotKey = ({ writer, id }: KeptCraft): string => `${writer} ${id}`;

class LastingKeep implements Keep {
  readonly lasting = true;

  constructor(private readonly db: IDBPDatabase<Tables>) {}

  async crafts() {
    return newestFirst(await this.db.getAll('crafts'));
  }

  craft(id: string) {
    return this.db.get('crafts', id);
  }

  async put(next: KeptCraft, known: string | null) {
    const work = this.db.transaction(['crafts', 'versions'], 'readwrite', RELAXED);
    const crafts = work.objectStore('crafts');
    const versions = work.objectStore('versions');
    const [before, earlier] = await Promise.all([crafts.get(next.id), versions.get(next.id)]);
    const merged = merge(earlier ?? [], before, next, known);
    await Promise.all([crafts.put(merged.craft), versions.put(merged.versions, next.id), work.done]);
    return merged;
  }

  async remove(id: string) {
    const work = this.db.transaction(['crafts', 'versions', 'settings'], 'readwrite', RELAXED);
    await Promise.all([
      work.objectStore('crafts').delete(id),
      work.objectStore('versions').delete(id),
      work.objectStore('settings').delete(plansSetting(id)),
      work.done,
    ]);
  }

  async versions(id: string) {
    return (await this.db.get('versions', id)) ?? [];
  }

  setting(name: string) {
    return this.db.get('settings', name);
  }

  async putSetting(name: string, value: unknown) {
    await this.db.put('settings', value, name);
  }

  jot(entry: Unmerged) {
    const work = this.db.transaction('jotted', 'readwrite', RELAXED);
    // A failure shows again, and is told, when the same craft is put.
    Promise.all([work.store.put(entry, jotKey(entry.craft)), work.done]).catch(() => {});
    work.commit();
  }

  jotted() {
    return this.db.getAll('jotted');
  }

  unjot(craft: KeptCraft) {
    return this.db.delete('jotted', jotKey(craft));
  }
}
