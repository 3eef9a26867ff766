import { expect, test } from 'vitest';
import { readNumberRows } from '../../../src/panels/csv/numberRows.ts';

const COLUMNS = [
  { key: 'at', label: 'Station' },
  { key: 'size', label: 'Girth' },
];

test('rows without heads are in the builder’s unit', () => {
  expect(readNumberRows('0\t0\n0.5\t1.2\n', COLUMNS, 'metric')).toEqual({
    ok: true,
    rows: [
      { at: 0, size: 0 },
      { at: 0.5, size: 1.2 },
    ],
  });
});

test('heads may name the unit of each column', () => {
  expect(readNumberRows('Station (cm),Girth mm\n50,1200', COLUMNS, 'imperial')).toEqual({
    ok: true,
    rows: [{ at: 0.5, size: 1.2 }],
  });
});

test('each bad or missing cell is named by row and column', () => {
  const read = readNumberRows('0,0\n1,wide\n2', COLUMNS, 'metric');
  expect(read.ok ? [] : read.messages.map((message) => message.slice(0, 13))).toEqual([
    'Row 2, girth:',
    'Row 3, girth:',
  ]);
});
