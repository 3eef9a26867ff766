/** The ways in which a craft comes onto the page: from a file, from the keep, from the samples. */
import type { Craft } from '../craft/craft.ts';
import { parse } from '../craft/parse.ts';
import { serialize } from '../craft/serialize.ts';
import type { Keep } from './keep.ts';
import type { KeptCraft } from './kept.ts';
import { craftOfTab, freeName, freshId } from './names.ts';
import { firstSample } from './samples.ts';
import { FIRST_VIEW, type Opening, type Refusal, type Store } from './store.ts';

/** How the text of a craft came onto the page. `as`: the name it has now. */
export interface Opened {
  /** new: as it is. kept: it was kept already. earlier: kept already, and changed since. renamed: another of its name is kept. */
  readonly how: 'new' | 'kept' | 'earlier' | 'renamed';
  readonly as: string;
}

/**
 * Opens the text of a craft file; one that is kept already, now or as an earlier version, opens as what it is now.
 * Null on problems: the craft before stays, and the problems are shown.
 */
export async function openText(store: Store, text: string, name: string): Promise<Opened | null> {
  const parsed = parsedOr(store, text, name);
  if (!parsed) return null;
  const canonical = serialize(parsed);
  await store.keeper.settled();
  const crafts = await store.keep.crafts().catch(() => []);
  const same = crafts.find((kept) => kept.text === canonical);
  if (same) return takeKept(store, same, 'kept');
  const since = await changedSince(store, crafts, canonical);
  return since ? takeKept(store, since, 'earlier') : startAs(store, parsed, crafts);
}

/** Opens the text as a craft of its own, whatever is kept; null on problems. */
export async function openAfresh(store: Store, text: string, name: string): Promise<Opened | null> {
  const parsed = parsedOr(store, text, name);
  if (!parsed) return null;
  await store.keeper.settled();
  const crafts = await store.keep.crafts().catch(() => []);
  const same = crafts.find((kept) => kept.text === serialize(parsed));
  return same ? takeKept(store, same, 'kept') : startAs(store, parsed, crafts);
}

function parsedOr(store: Store, text: string, name: string): Craft | null {
  const parsed = parse(text);
  if (parsed.ok) return parsed.craft;
  store.refusal.set({ name, problems: parsed.problems });
  return null;
}

function takeKept(store: Store, kept: KeptCraft, how: 'kept' | 'earlier'): Opened | null {
  const opening = openingOf(kept);
  if ('problems' in opening) {
    store.refusal.set(opening);
    return null;
  }
  store.take(opening);
  return { how, as: kept.name };
}

async function changedSince(
  { keep }: Store,
  crafts: readonly KeptCraft[],
  text: string,
): Promise<KeptCraft | undefined> {
  for (const craft of crafts) {
    const versions = await keep.versions(craft.id).catch(() => []);
    if (versions.some((version) => version.text === text)) return craft;
  }
  return undefined;
}

/** Two kept crafts of one name could not be told apart, so the newcomer is numbered. */
function startAs(store: Store, craft: Craft, crafts: readonly KeptCraft[]): Opened {
  const as = freeName(craft.name, new Set(crafts.map(({ name }) => name)));
  store.start(as === craft.name ? craft : { ...craft, name: as });
  return { how: as === craft.name ? 'new' : 'renamed', as };
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
