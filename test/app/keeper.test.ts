import { expect, test, vi } from 'vitest';

import { Keeper } from '../../src/app/keeper.ts';
import type { KeptCraft } from '../../src/app/kept.ts';

const kept = (text: string, id = 'a'): KeptCraft => ({
  id,
  name: '',
  text,
  changedAt: 0,
  writer: '',
  view: { tilted: false, tab: '' },
});

/** A keep whose writes end when told. */
function slowKeep() {
  const writes: {
    text: string;
    known: string | null;
    end: (displaced?: boolean) => void;
    fail: () => void;
  }[] = [];
  const put = (craft: KeptCraft, known: string | null) =>
    new Promise<{ displaced: boolean }>((resolve, reject) => {
      const end = (displaced = false) => resolve({ displaced });
      writes.push({ text: craft.text, known, end, fail: () => reject(new Error('full')) });
    });
  return { keep: { put, jot: vi.fn(), unjot: vi.fn(async () => {}) }, writes };
}

const turn = () => new Promise((resolve) => setTimeout(resolve));

test('the first change is written at once; those during a write become one write of the newest', async () => {
  const { keep, writes } = slowKeep();
  const keeper = new Keeper(keep, { displaced: vi.fn(), failed: vi.fn() });
  keeper.knows('a', '0');
  for (const text of ['1', '2', '3']) keeper.put(kept(text));
  expect(writes.map(({ text, known }) => [text, known])).toEqual([['1', '0']]);
  writes[0]!.end();
  await turn();
  expect(writes.map(({ text, known }) => [text, known])).toEqual([
    ['1', '0'],
    ['3', '1'],
  ]);
  writes[1]!.end();
  await keeper.settled();
  expect(keep.jot).toHaveBeenCalledTimes(3);
  expect(keep.unjot).toHaveBeenCalledOnce();
  keeper.put(kept('4'));
  expect(writes.at(-1)).toMatchObject({ text: '4', known: '3' });
});

test('changes of two crafts are both written', async () => {
  const { keep, writes } = slowKeep();
  const keeper = new Keeper(keep, { displaced: vi.fn(), failed: vi.fn() });
  keeper.put(kept('x', 'a'));
  keeper.put(kept('y', 'b'));
  keeper.put(kept('z', 'a'));
  for (let i = 0; i < 3; i++) {
    writes[i]!.end();
    await turn();
  }
  await keeper.settled();
  expect(writes.map(({ text }) => text)).toEqual(['x', 'y', 'z']);
});

test('a failed write is reported, and the next one still happens', async () => {
  const { keep, writes } = slowKeep();
  const [displaced, failed] = [vi.fn(), vi.fn()];
  const keeper = new Keeper(keep, { displaced, failed });
  keeper.put(kept('1'));
  keeper.put(kept('2'));
  writes[0]!.fail();
  await turn();
  expect(failed).toHaveBeenCalledOnce();
  expect(writes[1]).toMatchObject({ text: '2', known: null });
  writes[1]!.end(true);
  await keeper.settled();
  expect(displaced).toHaveBeenCalledOnce();
  expect(keep.unjot).toHaveBeenCalledOnce();
  keeper.put(kept('3'));
  writes[2]!.fail();
  await keeper.settled();
  expect(failed).toHaveBeenCalledTimes(2);
  // What could not be put stays jotted down for the next page.
  expect(keep.unjot).toHaveBeenCalledOnce();
});
