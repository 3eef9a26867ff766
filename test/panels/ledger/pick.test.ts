import fc from 'fast-check';
import { expect, test } from 'vitest';
import { idsOf, type Selection } from '../../../src/edit/selection.ts';
import { PLAIN, picked } from '../../../src/panels/ledger/pick.ts';

const ORDER = ['a', 'b', 'c', 'd', 'e'];
const EXTEND = { toggle: false, extend: true };
const TOGGLE = { toggle: true, extend: false };
const parts = (...ids: string[]): Selection => ids.map((id) => ({ kind: 'part', id }));

test('a plain click selects that row alone', () => {
  expect(picked(parts('a', 'c'), 'part', 'b', ORDER, PLAIN)).toEqual(parts('b'));
});

test('with Ctrl a row goes in or out', () => {
  expect(picked(parts('a'), 'part', 'c', ORDER, TOGGLE)).toEqual(parts('a', 'c'));
  expect(picked(parts('a', 'c'), 'part', 'a', ORDER, TOGGLE)).toEqual(parts('c'));
});

test('with Shift everything from the first picked to the row is selected, either way, and the first stays first', () => {
  const row = fc.constantFrom(...ORDER);
  fc.assert(
    fc.property(row, row, row, (first, second, third) => {
      const once = picked(parts(first), 'part', second, ORDER, EXTEND);
      const ids = idsOf(picked(once, 'part', third, ORDER, EXTEND), 'part');
      const [low, high] = [first, third].toSorted();
      expect(ids.toSorted()).toEqual(ORDER.filter((id) => id >= low! && id <= high!));
      expect(ids[0]).toBe(first);
    }),
  );
});

test('with Shift and nothing of that kind picked before, only the row is selected', () => {
  expect(picked([{ kind: 'wire', id: 'a' }], 'part', 'c', ORDER, EXTEND)).toEqual(parts('c'));
});
