import fc from 'fast-check';
import { expect, test } from 'vitest';
import { cellFrom } from '../../../src/panels/ledger/cellKeys.ts';

const GRID = { ids: ['a', 'b', 'c'], keys: ['name', 'mass', 'station'] };
const MIDDLE = { id: 'b', key: 'mass' };

test.each([
  ['ArrowUp', false, 'a', 'mass'],
  ['ArrowDown', false, 'c', 'mass'],
  ['ArrowLeft', false, 'b', 'name'],
  ['ArrowRight', false, 'b', 'station'],
  ['Home', false, 'b', 'name'],
  ['End', false, 'b', 'station'],
  ['Home', true, 'a', 'name'],
  ['End', true, 'c', 'station'],
  ['PageDown', false, 'c', 'mass'],
  ['PageUp', false, 'a', 'mass'],
])('%s (with Ctrl: %s) leads to %s %s', (key, ctrl, id, column) => {
  expect(cellFrom(MIDDLE, key, ctrl, GRID)).toEqual({ id, key: column });
});

test('no key leads out of the table, and other keys lead nowhere', () => {
  const key = fc.constantFrom(
    'ArrowUp',
    'ArrowDown',
    'ArrowLeft',
    'ArrowRight',
    'Home',
    'End',
    'PageUp',
    'PageDown',
  );
  fc.assert(
    fc.property(fc.array(key, { maxLength: 20 }), (keys) => {
      const end = keys.reduce((at, each) => cellFrom(at, each, false, GRID)!, MIDDLE);
      expect(GRID.ids).toContain(end.id);
      expect(GRID.keys).toContain(end.key);
    }),
  );
  expect(cellFrom(MIDDLE, 'x', false, GRID)).toBeNull();
});
