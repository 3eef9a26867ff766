import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { GridColumn, GridItem } from '../../../src/panels/ledger/gridColumn.ts';
import { keptOrder, nextSort, sortedIds } from '../../../src/panels/ledger/order.ts';

interface Item extends GridItem {
  readonly mass: number;
}
const COLUMNS: readonly GridColumn<Item>[] = [
  { key: 'name', title: 'Name', width: 8, sortBy: ({ name }) => name, text: ({ name }) => name },
  { key: 'mass', title: 'Mass', width: 8, sortBy: ({ mass }) => mass, text: ({ mass }) => String(mass) },
];
const items = fc
  .array(fc.record({ name: fc.string(), mass: fc.integer({ min: 0, max: 5 }) }), { maxLength: 30 })
  .map((all) => all.map((each, i): Item => ({ id: `i${i}`, ...each })));

test('sorting keeps every row, puts them in order, and leaves equals as they stood', () => {
  fc.assert(
    fc.property(items, fc.boolean(), (rows, descending) => {
      const ids = sortedIds(rows, COLUMNS, { key: 'mass', descending });
      const sorted = ids.map((id) => rows.find((row) => row.id === id)!);
      expect(ids.toSorted()).toEqual(rows.map(({ id }) => id).toSorted());
      sorted.slice(1).forEach((row, i) => {
        const before = sorted[i]!;
        const step = descending ? before.mass - row.mass : row.mass - before.mass;
        expect(step).toBeGreaterThanOrEqual(0);
        if (step === 0) expect(rows.indexOf(before)).toBeLessThan(rows.indexOf(row));
      });
    }),
  );
});

test('names sort as people count: Fin 2 before Fin 10', () => {
  const rows = ['Fin 10', 'battery', 'Fin 2'].map((name) => ({ id: name, name, mass: 0 }));
  expect(sortedIds(rows, COLUMNS, { key: 'name', descending: false })).toEqual([
    'battery',
    'Fin 2',
    'Fin 10',
  ]);
});

test('a head pressed three times sorts up, down, and not at all', () => {
  const up = nextSort(null, 'mass');
  const down = nextSort(up, 'mass');
  expect([up, down, nextSort(down, 'mass')]).toEqual([
    { key: 'mass', descending: false },
    { key: 'mass', descending: true },
    null,
  ]);
  expect(nextSort(down, 'name')).toEqual({ key: 'name', descending: false });
});

test('rows keep their places while some come and go', () => {
  expect(keptOrder(['c', 'a', 'b'], ['a', 'b', 'd', 'c'])).toEqual(['c', 'a', 'b', 'd']);
  expect(keptOrder(['c', 'a', 'b'], ['a', 'b'])).toEqual(['a', 'b']);
});
