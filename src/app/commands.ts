/** What can be asked of the page, by button or by key. Each command is one small function on the store. */

import { nudgeEdit, nudgeFor } from '../canvas/gestures/nudge.ts';
import { step } from '../edit/edit.ts';
import { removeHardpoints } from '../edit/edits/hardpoints.ts';
import { duplicateParts, hasRoom, removeParts } from '../edit/edits/parts.ts';
import { removeWires } from '../edit/edits/wires.ts';
import { called, idsOf, type Selectable } from '../edit/selection.ts';
import { hullLengthOf } from '../panels/defaults.ts';
import { assessed } from './assessed.ts';
import { chooseFile, type Saved, saveCraft } from './files.ts';
import { type Opened, openText } from './openings.ts';
import { nextTheme, otherUnits } from './settings.ts';
import type { Store } from './store.ts';

type Command = (store: Store) => void;

const nudging =
  (key: string, shift = false): Command =>
  (store) => {
    const edit = nudgeEdit(store.session.getState().selection, nudgeFor(key, shift, 'side')!);
    if (edit) store.apply(edit);
  };

const COMMAND_TABLE = {
  new: (store) => store.dialog.set('newCraft'),
  crafts: (store) => store.dialog.set('crafts'),
  keys: (store) => store.dialog.set('keys'),
  open: (store) => void openChosen(store),
  save: (store) => void save(store),
  undo: (store) => store.session.undo(),
  redo: (store) => store.session.redo(),
  tilt: (store) => store.view.set({ ...store.view.get(), tilted: !store.view.get().tilted }),
  fit: (store) => store.fit.set(store.fit.get() + 1),
  several: (store) => store.hands.set({ ...store.hands.get(), several: !store.hands.get().several }),
  snap: (store) => store.hands.set({ ...store.hands.get(), snap: !store.hands.get().snap }),
  units: (store) =>
    store.settings.set({ ...store.settings.get(), units: otherUnits(store.settings.get().units) }),
  theme: (store) =>
    store.settings.set({ ...store.settings.get(), theme: nextTheme(store.settings.get().theme) }),
  selectAll: (store) => store.session.select(allParts(store)),
  duplicate: (store) => duplicate(store),
  remove: (store) => removeSelected(store),
  nudgeFore: nudging('ArrowLeft'),
  nudgeAft: nudging('ArrowRight'),
  nudgeUp: nudging('ArrowUp'),
  nudgeDown: nudging('ArrowDown'),
  leapFore: nudging('ArrowLeft', true),
  leapAft: nudging('ArrowRight', true),
  leapUp: nudging('ArrowUp', true),
  leapDown: nudging('ArrowDown', true),
  escape: (store) => {
    if (!store.session.cancelDrag()) store.session.select([]);
  },
} satisfies Record<string, Command>;

export type CommandId = keyof typeof COMMAND_TABLE;

export const COMMANDS: Readonly<Record<CommandId, Command>> = COMMAND_TABLE;

const allParts = (store: Store): Selectable[] =>
  store.session.getState().craft.parts.order.map((id) => ({ kind: 'part', id }));

function duplicate(store: Store): void {
  const { craft, selection } = store.session.getState();
  const ids = idsOf(selection, 'part');
  if (ids.length === 0) return;
  if (!hasRoom(craft, ids.length)) {
    store.notices.add('There is no room for so many parts.', 'bad');
    return;
  }
  const before = new Set(craft.parts.order);
  const hullLength = hullLengthOf(assessed(craft, store.settings.get().units));
  if (!store.apply(duplicateParts(ids, called(craft, 'part', ids), hullLength))) return;
  const added = store.session.getState().craft.parts.order.filter((id) => !before.has(id));
  store.session.select(added.map((id) => ({ kind: 'part', id })));
}

/** Takes away what is selected, as one step. */
function removeSelected(store: Store): void {
  const { craft, selection } = store.session.getState();
  const removals = REMOVALS.flatMap(([kind, removal]) => {
    const ids = idsOf(selection, kind);
    return ids.length ? [removal(ids, called(craft, kind, ids))] : [];
  });
  const [first] = removals;
  if (!first) return;
  const label = removals.length === 1 ? first.label : `Remove ${selection.length} things`;
  store.apply(
    step(label, (draft) => {
      for (const { recipe } of removals) recipe(draft);
    }),
  );
}

const REMOVALS = [
  ['part', removeParts],
  ['wire', removeWires],
  ['hardpoint', removeHardpoints],
] as const;

async function openChosen(store: Store): Promise<void> {
  const file = await chooseFile();
  if (file) await openFile(store, file);
}

export async function openFile(store: Store, file: File): Promise<void> {
  const opened = await openText(store, await file.text(), file.name);
  if (opened) store.notices.add(`Opened ${file.name}.${OPENED_WORDS[opened.how](opened.as)}`);
}

const OPENED_WORDS: Readonly<Record<Opened['how'], (as: string) => string>> = {
  new: () => '',
  kept: () => ' It was kept here already.',
  earlier: (as) =>
    ` It is kept here as “${as}” and was changed since: this is how it is now. As in the file it stands under Crafts, earlier versions.`,
  renamed: (as) => ` Another craft of that name is kept here and differs, so this one is called “${as}”.`,
};

async function save(store: Store): Promise<void> {
  try {
    const id = store.craftId;
    const { saved, handle } = await saveCraft(
      store.session.getState().craft,
      store.fileHandles.get(id) ?? null,
    );
    if (handle) store.fileHandles.set(id, handle);
    if (saved !== 'cancelled') store.notices.add(savedText(saved));
  } catch (error) {
    store.notices.add(`The file was not saved: ${(error as Error).message}`, 'bad');
  }
}

const savedText = ({ as }: Exclude<Saved, 'cancelled'>): string => `Saved as ${as}.`;
