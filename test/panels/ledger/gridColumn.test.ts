import { expect, test } from 'vitest';
import { fitting, widthOf } from '../../../src/panels/ledger/gridColumn.ts';
import { PART_GRID } from '../../../src/panels/ledger/partColumns.tsx';

const keysAt = (room: number) => fitting(PART_GRID, room).map(({ key }) => key);
const NEEDED = ['name', 'mass', 'tolerance', 'place', 'station', 'moment', 'locked'];

test('with room for all, all columns stand', () => {
  expect(fitting(PART_GRID, widthOf(PART_GRID))).toEqual(PART_GRID);
  expect(fitting(PART_GRID, Number.POSITIVE_INFINITY)).toEqual(PART_GRID);
});

test('source gives way first, then copies, then kind; what balances the craft never does', () => {
  expect(keysAt(widthOf(PART_GRID) - 1)).not.toContain('source');
  expect(keysAt(widthOf(PART_GRID) - 1)).toContain('copies');
  expect(keysAt(0)).toEqual(NEEDED);
  // The ledger beside the panels on a page of 1024 px: 697 px at 13 px a letter.
  expect(keysAt(697 / 13).filter((key) => NEEDED.includes(key))).toEqual(NEEDED);
  expect(widthOf(fitting(PART_GRID, 697 / 13))).toBeLessThanOrEqual(697 / 13);
});
