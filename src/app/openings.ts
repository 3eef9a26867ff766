/** The ways in which a craft comes onto the page: from a file, from the keep, from the samples. */
import { parse } from '../craft/parse.ts';
import { serialize } from '../craft/serialize.ts';
import type { Keep } from './keep.ts';
import type { KeptCraft } from './kept.ts';
import { craftOfTab, freshId } from './names.ts';
import { firstSample } from './samples.ts';
import { FIRST_VIEW, type Opening, type Refusal, type Store } from './store.ts';

/** Opens the text of a craft file. On problems the craft before stays, and the problems are shown. */
export async function openText(store: Store, text: string, name: string): Promise<boolean> {
  const parsed = parse(text);
  if (!parsed.ok) {
    store.refusal.set({ name, problems: parsed.problems });
    return false;
  }
  const canonical = serialize(parsed.craft);
  await store.keeper.settled();
  const same = (await store.keep.crafts().catch(() => [])).find((kept) => kept.text === canonical);
  if (same) store.take({ id: same.id, craft: parsed.craft, view: same.view, known: same.text });
  else store.start(parsed.craft);
  return true;
}

/** Opens a craft from the keep. */
export async function openKept(store: Store, id: string): Promise<void> {
  await store.keeper.settled();
  const kept = await store.keep.craft(id);
  const opening = kept && openingOf(kept);
  if (!opening) store.notices.add('That craft is no longer kept here.', 'bad');
  else if ('problems' in opening) store.refusal.set(opening);
  else store.take(opening);
}

const openingOf = ({ id, name, text, view }: KeptCraft): Opening | Refusal => {
  const parsed = parse(text);
  return parsed.ok ? { id, craft: parsed.craft, view, known: text } : { name, problems: parsed.problems };
};

/** What the page opens on: the craft of this tab, else the last one of all tabs, else the first sample. */
export async function firstOpening(keep: Keep): Promise<{ opening: Opening; refusal: Refusal | null }> {
  const kept = await lastKept(keep).catch(() => undefined);
  const opening = kept && openingOf(kept);
  if (opening && 'craft' in opening) return { opening, refusal: null };
  const sample = { id: freshId(), craft: await firstSample(), view: FIRST_VIEW, known: null };
  return { opening: sample, refusal: opening ?? null };
}

async function lastKept(keep: Keep): Promise<KeptCraft | undefined> {
  const ofTab = craftOfTab();
  const current = await keep.setting('current');
  const ids = [ofTab, current].filter((id) => typeof id === 'string');
  for (const id of ids) {
    const kept = await keep.craft(id);
    if (kept) return kept;
  }
  return undefined;
}
