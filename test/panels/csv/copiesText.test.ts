import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Copies } from '../../../src/craft/schema.ts';
import { copiesText, readCopies } from '../../../src/panels/csv/copiesText.ts';

const copies = fc.oneof<fc.Arbitrary<Copies>[]>(
  fc.record({ kind: fc.constant('together' as const), count: fc.integer({ min: 1, max: 64 }) }),
  fc.constant({ kind: 'pair' as const }),
  fc.record({ kind: fc.constant('ring' as const), count: fc.integer({ min: 2, max: 64 }) }),
);

test('what is written is read back', () => {
  fc.assert(
    fc.property(copies, (each) => {
      expect(readCopies(copiesText(each))).toEqual({ ok: true, value: each });
    }),
  );
});

test('other words are refused with what is allowed', () => {
  for (const text of ['some', '2.5', '-1', 'ring', 'pair 2']) {
    const read = readCopies(text);
    expect(read.ok ? '' : read.message, text).toContain('allowed: a whole number, pair, or ring');
  }
});
