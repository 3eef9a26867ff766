import fc from 'fast-check';
import { expect, test } from 'vitest';
import { blankCraft } from '../../src/craft/blank.ts';
import { serialize } from '../../src/craft/serialize.ts';
import { craftFrom, sampleCraft, samples } from '../samples/readSamples.ts';

test.each(samples)('$name opened and saved gives the same bytes', ({ text }) => {
  expect(serialize(craftFrom(text))).toBe(text);
});

/** The same value with the fields of every object in another order. */
function shuffled(value: unknown, turn: number): unknown {
  if (Array.isArray(value)) return value.map((each) => shuffled(each, turn));
  if (value === null || typeof value !== 'object') return value;
  const entries = Object.entries(value).map(([key, each]) => [key, shuffled(each, turn)]);
  return Object.fromEntries(
    [...entries.slice(turn % entries.length), ...entries.slice(0, turn % entries.length)].reverse(),
  );
}

test('the order of fields in the file does not matter to what is saved', () => {
  fc.assert(
    fc.property(fc.constantFrom(...samples), fc.nat(20), ({ text }, turn) => {
      expect(serialize(craftFrom(JSON.stringify(shuffled(JSON.parse(text), turn))))).toBe(text);
    }),
    { numRuns: 60 },
  );
});

test('a part taken away and put back is saved where it stood', () => {
  const craft = sampleCraft('museum-atrium');
  const [first] = craft.parts.order;
  const { [first!]: taken, ...rest } = craft.parts.byId;
  const restored = { ...craft, parts: { ...craft.parts, byId: { ...rest, [first!]: taken! } } };
  expect(serialize(restored)).toBe(serialize(craft));
});

test('whatever number a field may hold comes back as it was', () => {
  const craft = sampleCraft('worked-example');
  fc.assert(
    fc.property(fc.double({ min: 0, max: 1000, noNaN: true }), (mass) => {
      const byId = { ...craft.parts.byId, battery: { ...craft.parts.byId.battery!, mass } };
      const changed = { ...craft, parts: { ...craft.parts, byId } };
      expect(craftFrom(serialize(changed)).parts.byId.battery!.mass).toBe(mass);
    }),
  );
});

test('a blank craft of each size passes its own gate', () => {
  for (const length of [0.05, 0.5, 12, 50]) {
    const craft = blankCraft('New', { kind: 'spheroid', length, diameter: length * 0.4 }, length);
    expect(craftFrom(serialize(craft))).toEqual(craft);
  }
});
