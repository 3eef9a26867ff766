import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type KeptCraft, type KeptVersion, MOST_VERSIONS, merge, VERSION_SPAN } from '../../src/app/kept.ts';

const kept = (text: string, changedAt: number, writer = 'here'): KeptCraft => ({
  id: 'one',
  name: 'One',
  text,
  changedAt,
  writer,
  view: { tilted: false, tab: 'hull' },
});

const texts = (versions: readonly KeptVersion[]): string[] => versions.map(({ text }) => text);

test('the first text has no version before it', () => {
  expect(merge([], undefined, kept('a', 0), null)).toEqual({
    craft: kept('a', 0),
    versions: [],
    displaced: false,
  });
});

test('a page’s own text becomes a version when its last one is old enough', () => {
  const first = merge([], kept('a', 0), kept('b', 1), 'a');
  expect(texts(first.versions)).toEqual(['a']);
  const soon = merge(first.versions, kept('b', VERSION_SPAN - 1), kept('c', VERSION_SPAN), 'b');
  expect(texts(soon.versions)).toEqual(['a']);
  const later = merge(soon.versions, kept('c', VERSION_SPAN), kept('d', VERSION_SPAN + 1), 'c');
  expect(texts(later.versions)).toEqual(['c', 'a']);
  expect(later.displaced).toBe(false);
});

test('what another page wrote becomes a version at once, and is reported', () => {
  const merged = merge([], kept('theirs', 5, 'there'), kept('ours', 6), 'older');
  expect(merged.displaced).toBe(true);
  expect(merged.craft.text).toBe('ours');
  expect(texts(merged.versions)).toEqual(['theirs']);
});

test('a page that only looks never takes away what another page wrote', () => {
  const ours = { ...kept('read', 9), view: { tilted: true, tab: 'notes' } };
  const merged = merge([], kept('theirs', 5, 'there'), ours, 'read');
  expect(merged.craft).toEqual({ ...kept('theirs', 5, 'there'), view: ours.view });
  expect(merged.displaced).toBe(false);
});

test('the newest text of every page is always the craft or among its versions', () => {
  const write = fc.record({ page: fc.nat(3), wait: fc.nat(2 * VERSION_SPAN) });
  fc.assert(
    fc.property(fc.array(write, { maxLength: 60 }), (writes) => {
      let state: { craft?: KeptCraft; versions: readonly KeptVersion[] } = { versions: [] };
      const known: Record<number, string> = {};
      let now = 0;
      writes.forEach(({ page, wait }, i) => {
        now += wait;
        const next = kept(`${page}:${i}`, now, `page ${page}`);
        state = merge(state.versions, state.craft, next, known[page] ?? null);
        known[page] = next.text;
        expect(state.versions.length).toBeLessThanOrEqual(MOST_VERSIONS);
        const held = [state.craft!.text, ...texts(state.versions)];
        const lately = writes.slice(Math.max(0, i - 8), i + 1).map((each) => each.page);
        for (const each of new Set(lately)) expect(held).toContain(known[each]);
      });
    }),
  );
});
