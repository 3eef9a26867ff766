/** What the crafts dialog does with the crafts that are kept. */
import { parse } from '../craft/parse.ts';
import { serialize } from '../craft/serialize.ts';
import { setName } from '../edit/edits/craft.ts';
import type { CraftEntry } from '../panels/CraftsDialog.tsx';
import { freshId } from './names.ts';
import type { Store } from './store.ts';

/** The kept crafts with their versions, newest first. */
export async function craftEntries({ keep, keeper, craftId }: Store): Promise<CraftEntry[]> {
  await keeper.settled();
  const crafts = await keep.crafts();
  return Promise.all(
    crafts.map(async ({ id, name, changedAt }) => {
      const versions = await keep.versions(id);
      return { id, name, changedAt, current: id === craftId, versions };
    }),
  );
}

/** A name too long for a craft file is cut. */
export async function renameKept(store: Store, id: string, name: string): Promise<void> {
  if (id === store.craftId) return void store.apply(setName(name));
  const kept = await store.keep.craft(id);
  const parsed = kept && parse(kept.text);
  if (!parsed?.ok) return;
  const text = serialize({ ...parsed.craft, name: name.slice(0, 200) });
  await store.keep.put({ ...kept!, name: name.slice(0, 200), text, changedAt: Date.now() }, kept!.text);
}

/** Keeps a copy under a name of its own, and leaves the page on the craft it shows. */
export async function duplicateKept({ keep, keeper }: Store, id: string): Promise<void> {
  await keeper.settled();
  const kept = await keep.craft(id);
  const parsed = kept && parse(kept.text);
  if (!parsed?.ok) return;
  const name = `${parsed.craft.name.slice(0, 190)} (copy)`;
  const text = serialize({ ...parsed.craft, name });
  await keep.put({ ...kept!, id: freshId(), name, text, changedAt: Date.now() }, null);
}
