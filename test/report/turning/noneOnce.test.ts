import { expect, test } from 'vitest';
import { noRow, row } from '../../../src/report/rows.ts';
import { noneOnce } from '../../../src/report/turning/noneOnce.ts';

test('each reason is given once; figures that stand stay, whatever they say', () => {
  const rows = [
    row({ label: 'a', quantity: 'length', value: 1, why: 'Why.' }),
    noRow('b', 'length', 'Why.'),
    noRow('c', 'length', 'Why.'),
    noRow('d', 'length', 'Why not.'),
    row({ label: 'e', quantity: 'length', value: 1, why: 'Why.' }),
  ];
  const left = noneOnce(rows.map((each) => ({ row: each }))).map((each) => each.row.label);
  expect(left).toEqual(['a', 'b', 'd', 'e']);
});
