/**
 * Where the work is kept: IndexedDB in this browser, or only in memory when the browser refuses that (a private
 * window). A craft and its versions change in one transaction, so two tabs cannot write over each other unseen.
 */
import { type DBSchema, type IDBPDatabase, openDB } from 'idb';
import { type KeptCraft, type KeptVersion, merge } from './kept.ts';

export interface Keep {
  /** False when nothing outlives this page. */
  readonly lasting: boolean;
  /** Newest first. */
  crafts(): Promise<readonly KeptCraft[]>;
  craft(id: string): Promise<KeptCraft | undefined>;
  /** Keeps the craft, merged with what is there; see `merge`. */
  put(craft: KeptCraft, known: string | null): Promise<{ readonly displaced: boolean }>;
  remove(id: string): Promise<void>;
  versions(id: string): Promise<readonly KeptVersion[]>;
  setting(name: string): Promise<unknown>;
  putSetting(name: string, value: unknown): Promise<void>;
}

interface Tables extends DBSchema {
  crafts: { key: string; value: KeptCraft };
  versions: { key: string; value: readonly KeptVersion[] };
  settings: { key: string; value: unknown };
}

const NAME = 'steelyard';

/** Milliseconds after which a browser that does not answer counts as refusing. */
const PATIENCE = 3000;

/** The keep of this browser; never rejects. */
export async function openKeep(): Promise<Keep> {
  try {
    return new LastingKeep(await withPatience(opened()));
  } catch {
    return new PassingKeep();
  }
}

const opened = (): Promise<IDBPDatabase<Tables>> =>
  openDB<Tables>(NAME, 1, {
    upgrade(db) {
      db.createObjectStore('crafts', { keyPath: 'id' });
      db.createObjectStore('versions');
      db.createObjectStore('settings');
    },
  });

const withPatience = <T>(promise: Promise<T>): Promise<T> =>
  Promise.race([
    promise,
    new Promise<never>((_, reject) => setTimeout(() => reject(new Error('no answer')), PATIENCE)),
  ]);

const newestFirst = (crafts: readonly KeptCraft[]): readonly KeptCraft[] =>
  [...crafts].sort((a, b) => b.changedAt - a.changedAt);

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
    const work = this.db.transaction(['crafts', 'versions'], 'readwrite', { durability: 'strict' });
    const crafts = work.objectStore('crafts');
    const versions = work.objectStore('versions');
    const [before, earlier] = await Promise.all([crafts.get(next.id), versions.get(next.id)]);
    const merged = merge(earlier ?? [], before, next, known);
    await Promise.all([crafts.put(merged.craft), versions.put(merged.versions, next.id), work.done]);
    return merged;
  }

  async remove(id: string) {
    const work = this.db.transaction(['crafts', 'versions'], 'readwrite');
    await Promise.all([
      work.objectStore('crafts').delete(id),
      work.objectStore('versions').delete(id),
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
}

class PassingKeep implements Keep {
  readonly lasting = false;
  readonly #crafts = new Map<string, KeptCraft>();
  readonly #versions = new Map<string, readonly KeptVersion[]>();
  readonly #settings = new Map<string, unknown>();

  async crafts() {
    return newestFirst([...this.#crafts.values()]);
  }

  async craft(id: string) {
    return this.#crafts.get(id);
  }

  async put(next: KeptCraft, known: string | null) {
    const merged = merge(this.#versions.get(next.id) ?? [], this.#crafts.get(next.id), next, known);
    this.#crafts.set(next.id, merged.craft);
    this.#versions.set(next.id, merged.versions);
    return merged;
  }

  async remove(id: string) {
    this.#crafts.delete(id);
    this.#versions.delete(id);
  }

  async versions(id: string) {
    return this.#versions.get(id) ?? [];
  }

  async setting(name: string) {
    return this.#settings.get(name);
  }

  async putSetting(name: string, value: unknown) {
    this.#settings.set(name, value);
  }
}
