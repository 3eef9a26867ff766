import { expect, test } from 'vitest';
import { kept } from '../../src/numeric/kept.ts';

test('made once for the same object and the same rest, anew when either is another', () => {
  let made = 0;
  const sum = kept((key: { n: number }, more: object, times: number) => {
    made += 1;
    return { value: key.n * times, more };
  });
  const [a, b, rest] = [{ n: 1 }, { n: 1 }, {}];
  const first = sum(a, rest, 2);
  expect(sum(a, rest, 2)).toBe(first);
  expect(made).toBe(1);
  expect(sum(b, rest, 2)).not.toBe(first);
  expect(sum(a, {}, 2)).not.toBe(first);
  expect(sum(a, rest, 3).value).toBe(3);
  expect(made).toBe(4);
});
