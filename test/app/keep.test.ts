import { IDBFactory } from 'fake-indexeddb';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import 'fake-indexeddb/auto';
import type { KeptCraft } from '../../src/app/kept.ts';
import { openKeep } from '../../src/app/openKeep.ts';

beforeEach(() => vi.stubGlobal('indexedDB', new IDBFactory()));
afterEach(() => vi.unstubAllGlobals());

const kept = (id: string, text: string, changedAt: number): KeptCraft => ({
  id,
  name: id.toUpperCase(),
  text,
  changedAt,
  writer: 'here',
  view: { tilted: true, tab: 'gas' },
});

test('crafts, their view and settings are there when the page is opened again', async () => {
  const first = await openKeep();
  expect(first.lasting).toBe(true);
  await first.put(kept('a', 'text a', 1), null);
  await first.put(kept('b', 'text b', 2), null);
  await first.putSetting('page', { units: 'imperial' });
  const second = await openKeep();
  expect((await second.crafts()).map(({ id }) => id)).toEqual(['b', 'a']);
  expect(await second.craft('a')).toEqual(kept('a', 'text a', 1));
  expect(await second.setting('page')).toEqual({ units: 'imperial' });
  expect(await second.craft('c')).toBeUndefined();
});

test('a removed craft goes with its versions', async () => {
  const keep = await openKeep();
  await keep.put(kept('a', '1', 1), null);
  await keep.put(kept('a', '2', 2), '1');
  expect(await keep.versions('a')).toHaveLength(1);
  await keep.remove('a');
  expect(await keep.crafts()).toEqual([]);
  expect(await keep.versions('a')).toEqual([]);
});

test('two pages writing one craft at the same time lose neither text', async () => {
  const [one, two] = [await openKeep(), await openKeep()];
  await one.put(kept('a', 'start', 1), null);
  const results = await Promise.all([
    one.put({ ...kept('a', 'from one', 2), writer: 'one' }, 'start'),
    two.put({ ...kept('a', 'from two', 3), writer: 'two' }, 'start'),
  ]);
  expect(results.map(({ displaced }) => displaced)).toEqual([false, true]);
  const texts = (await two.versions('a')).map(({ text }) => text);
  expect((await one.craft('a'))?.text).toBe('from two');
  expect(texts).toContain('from one');
});

test('what an ended page had only jotted down comes into the keep, unless that has something newer', async () => {
  const first = await openKeep();
  await first.put(kept('a', 'old', 1), null);
  first.jot({ craft: kept('a', 'new', 2), known: 'old' });
  await first.put(kept('b', 'newer', 4), null);
  first.jot({ craft: kept('b', 'stale', 3), known: null });
  const second = await openKeep();
  expect((await second.craft('a'))?.text).toBe('new');
  expect((await second.craft('b'))?.text).toBe('newer');
  expect(await second.jotted()).toEqual([]);
});

test.each([
  ['is missing', undefined],
  [
    'throws',
    {
      open() {
        throw new DOMException('refused', 'SecurityError');
      },
    },
  ],
])('where IndexedDB %s the page still works, and knows that nothing lasts', async (_, refused) => {
  vi.stubGlobal('indexedDB', refused);
  const keep = await openKeep();
  expect(keep.lasting).toBe(false);
  await keep.put(kept('a', '1', 1), null);
  await keep.put(kept('a', '2', 2), '1');
  await keep.putSetting('page', 1);
  expect((await keep.craft('a'))?.text).toBe('2');
  expect((await keep.versions('a')).map(({ text }) => text)).toEqual(['1']);
  expect(await keep.crafts()).toHaveLength(1);
  expect(await keep.setting('page')).toBe(1);
  await keep.remove('a');
  expect(await keep.crafts()).toEqual([]);
});
