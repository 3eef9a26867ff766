import { expect, test } from 'vitest';
import { catalogue } from '../../src/catalogue/catalogue.ts';
import { PART_KINDS } from '../../src/craft/schema.ts';

const { parts, gases } = catalogue;

test('there are some 40 parts or more, of every kind', () => {
  expect(parts.length).toBeGreaterThanOrEqual(40);
  expect([...new Set(parts.map(({ kind }) => kind))].sort()).toEqual([...PART_KINDS].sort());
});

test.each(parts)('$id is invented, and has a mass, a believable tolerance and a size', (part) => {
  expect(part.source).toMatch(/^generic, invented for the starter catalogue/);
  // Figures of thrust are not invented one by one: the source says how they hang together.
  expect(part.source.includes('momentum theory')).toBe(part.thruster !== undefined);
  expect(part.mass).toBeGreaterThan(0);
  expect(part.massTolerance).toBeGreaterThan(0);
  expect(part.massTolerance).toBeLessThanOrEqual(part.mass * 0.2);
  for (const side of Object.values(part.size)) {
    expect(side).toBeGreaterThan(0);
    expect(side).toBeLessThan(1.2);
  }
});

test('no part is denser than lead (11.34 g/cm³, from memory) or lighter than the air it fills', () => {
  for (const { id, mass, size } of parts) {
    const density = mass / (size.length * size.width * size.height);
    expect(density, id).toBeLessThan(11_340);
    expect(density, id).toBeGreaterThan(1.2);
  }
});

test('lithium cells and propellers carry their caution', () => {
  for (const { kind, note, id } of parts) {
    if (kind === 'battery') expect(note, id).toMatch(/^Lithium cell/);
    if (kind === 'thruster') expect(note, id).toMatch(/propeller cuts/);
  }
});

test('gases carry the caution of what they are, and say how far their purity is known', () => {
  expect(gases.map(({ lifting }) => lifting)).toContain('hydrogen');
  for (const { lifting, note, source } of gases) {
    expect(note).toMatch(
      lifting === 'helium' ? /gives no warning to whoever breathes it/ : /^Burns and explodes/,
    );
    expect(source).toMatch(/no source/);
  }
});
