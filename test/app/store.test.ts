import { IDBFactory } from 'fake-indexeddb';
import { beforeEach, expect, test, vi } from 'vitest';
import 'fake-indexeddb/auto';
import { COMMANDS } from '../../src/app/commands.ts';
import type { Keep } from '../../src/app/keep.ts';
import { firstOpening, openAfresh, openKept, openText } from '../../src/app/openings.ts';
import { openKeep } from '../../src/app/openKeep.ts';
import { DEFAULTS, settingsFrom } from '../../src/app/settings.ts';
import { Store } from '../../src/app/store.ts';
import { blankCraft } from '../../src/craft/blank.ts';
import { serialize } from '../../src/craft/serialize.ts';
import { setName, setNotes } from '../../src/edit/edits/craft.ts';

const frames = { request: () => 0, cancel: () => {} };

beforeEach(() => vi.stubGlobal('indexedDB', new IDBFactory()));

async function opened(): Promise<{ store: Store; keep: Keep }> {
  const keep = await openKeep();
  const { opening } = await firstOpening(keep);
  return { keep, store: new Store(keep, opening, DEFAULTS, frames) };
}

const textOf = (store: Store): string => serialize(store.session.getState().craft);

test('a committed change is there when the page is opened again, without any leaving', async () => {
  const { store } = await opened();
  store.apply(setName('Changed'));
  store.view.set({ tilted: true, tab: 'hull' });
  await store.keeper.settled();
  const again = await opened();
  expect(again.store.craftId).toBe(store.craftId);
  expect(textOf(again.store)).toBe(textOf(store));
  expect(again.store.view.get()).toEqual({ tilted: true, tab: 'hull' });
});

test('what a drag shows is not kept until it is let go', async () => {
  const { store, keep } = await opened();
  await store.keeper.settled();
  const drag = store.session.beginDrag('Rename');
  drag.move(setName('Halfway').recipe);
  store.keepNow();
  await store.keeper.settled();
  expect((await keep.craft(store.craftId))?.text).not.toContain('Halfway');
  drag.commit();
  await store.keeper.settled();
  expect((await keep.craft(store.craftId))?.text).toContain('Halfway');
});

test('undo to the start keeps the text of the start', async () => {
  const { store, keep } = await opened();
  const start = textOf(store);
  store.apply(setName('Changed'));
  COMMANDS.undo(store);
  await store.keeper.settled();
  expect((await keep.craft(store.craftId))?.text).toBe(start);
});

test('a craft file opens as a craft of its own, and gives the same bytes', async () => {
  const { store, keep } = await opened();
  const first = store.craftId;
  const text = serialize(blankCraft('From a file', { kind: 'spheroid', length: 2, diameter: 1 }, 2));
  expect(await openText(store, text, 'file.json')).toEqual({ how: 'new', as: 'From a file' });
  expect(textOf(store)).toBe(text);
  await store.keeper.settled();
  expect((await keep.crafts()).map(({ id }) => id).sort()).toEqual([first, store.craftId].sort());
});

test('the same file opened twice is kept once', async () => {
  const { store, keep } = await opened();
  const text = serialize(blankCraft('From a file', { kind: 'spheroid', length: 2, diameter: 1 }, 2));
  await openText(store, text, 'file.json');
  await openText(store, text, 'file.json');
  await store.keeper.settled();
  expect(await keep.crafts()).toHaveLength(2);
});

test('a file that was changed since opens as it is now, and is kept once', async () => {
  const { store, keep } = await opened();
  const text = serialize(blankCraft('Heron', { kind: 'spheroid', length: 2, diameter: 1 }, 2));
  await openText(store, text, 'file.json');
  store.apply(setNotes('Changed'));
  await store.keeper.settled();
  const heron = store.craftId;
  store.start(blankCraft('Other', { kind: 'spheroid', length: 2, diameter: 1 }, 2));
  expect(await openText(store, text, 'file.json')).toEqual({ how: 'earlier', as: 'Heron' });
  expect(store.craftId).toBe(heron);
  expect(store.session.getState().craft.notes).toBe('Changed');
  expect(await openAfresh(store, text, 'file.json')).toEqual({ how: 'renamed', as: 'Heron 2' });
  await store.keeper.settled();
  expect((await keep.crafts()).map(({ name }) => name)).toContain('Heron 2');
});

test('another craft of the same name is numbered', async () => {
  const { store } = await opened();
  const textOfLength = (length: number) =>
    serialize(blankCraft('Heron', { kind: 'spheroid', length, diameter: 1 }, length));
  await openText(store, textOfLength(2), 'a.json');
  expect(await openText(store, textOfLength(3), 'b.json')).toEqual({ how: 'renamed', as: 'Heron 2' });
  expect(store.session.getState().craft.name).toBe('Heron 2');
  expect(await openText(store, textOfLength(2), 'a.json')).toEqual({ how: 'kept', as: 'Heron' });
});

test.each(['', '{', '[]', '{"steelyard":1}', 'null', '{"steelyard":99}'])(
  'a broken file (%j) shows its problems and leaves the craft before',
  async (text) => {
    const { store } = await opened();
    store.apply(setName('Mine'));
    const before = store.session.getState();
    expect(await openText(store, text, 'broken.json')).toBeNull();
    expect(store.session.getState()).toBe(before);
    expect(store.refusal.get()?.name).toBe('broken.json');
    expect(store.refusal.get()?.problems.length).toBeGreaterThan(0);
  },
);

test('going to another kept craft and back loses nothing of either', async () => {
  const { store } = await opened();
  store.apply(setName('First'));
  const [first, firstText] = [store.craftId, textOf(store)];
  store.start(blankCraft('Second', { kind: 'spheroid', length: 2, diameter: 1 }, 2));
  store.apply(setName('Second, changed'));
  const second = store.craftId;
  await openKept(store, first);
  expect(textOf(store)).toBe(firstText);
  expect(store.session.getState().undoLabel).toBeNull();
  await openKept(store, second);
  expect(store.session.getState().craft.name).toBe('Second, changed');
});

test('two pages on one craft: the newest wins, the other is told and finds its text among the versions', async () => {
  const one = (await opened()).store;
  await one.keeper.settled();
  const two = (await opened()).store;
  expect(two.craftId).toBe(one.craftId);
  two.apply(setName('From two'));
  await two.keeper.settled();
  one.apply(setName('From one'));
  await one.keeper.settled();
  expect(one.notices.get().map(({ tone }) => tone)).toContain('bad');
  expect(two.notices.get()).toEqual([]);
  expect((await one.keep.craft(one.craftId))?.name).toBe('From one');
  expect((await one.keep.versions(one.craftId)).map(({ name }) => name)).toContain('From two');
});

test('a kept text that no longer loads is shown as a problem, stays kept, and the page opens on a sample', async () => {
  const { store, keep } = await opened();
  await store.keeper.settled();
  const kept = (await keep.craft(store.craftId))!;
  await keep.put({ ...kept, text: '{"steelyard":1}' }, kept.text);
  const { opening, refusal } = await firstOpening(keep);
  expect(opening.id).not.toBe(kept.id);
  expect(refusal?.problems.length).toBeGreaterThan(0);
  expect((await keep.craft(kept.id))?.text).toBe('{"steelyard":1}');
});

test('an edit that the gate refuses says so and changes nothing', async () => {
  const { store } = await opened();
  const before = store.session.getState().craft;
  expect(store.apply(setName('x'.repeat(500)))).toBe(false);
  expect(store.session.getState().craft).toBe(before);
  expect(store.notices.get()[0]).toMatchObject({ tone: 'bad' });
});

test('a browser that stops writing is reported with a way to try again', async () => {
  const { store, keep } = await opened();
  await store.keeper.settled();
  const put = vi.spyOn(keep, 'put').mockRejectedValueOnce(new Error('quota'));
  store.apply(setName('Unwritten'));
  await store.keeper.settled();
  const [notice] = store.notices.get();
  expect(notice).toMatchObject({ tone: 'bad', action: { label: 'Try again' } });
  notice!.action!.run();
  await store.keeper.settled();
  expect(put).toHaveBeenCalledTimes(2);
  expect((await keep.craft(store.craftId))?.name).toBe('Unwritten');
});

test('settings are kept', async () => {
  const { store, keep } = await opened();
  COMMANDS.units(store);
  COMMANDS.theme(store);
  await vi.waitFor(async () =>
    expect(settingsFrom(await keep.setting('page'))).toEqual({ units: 'imperial', theme: 'light' }),
  );
  expect(settingsFrom('rubbish')).toEqual(DEFAULTS);
  expect(settingsFrom({ units: 'furlongs', theme: 'dark' })).toEqual({ units: 'metric', theme: 'dark' });
});
