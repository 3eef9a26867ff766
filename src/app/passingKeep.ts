/** A keep in memory, for a browser window that refuses to store anything. */
import type { Keep } from './keep.ts';
import { type KeptCraft, type KeptVersion, merge, newestFirst, plansSetting } from './kept.ts';

export class PassingKeep implements Keep {
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
    this.#settings.delete(plansSetting(id));
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

  jot() {}

  async jotted() {
    return [];
  }

  async unjot() {}
}
