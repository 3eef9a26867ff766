import fc from 'fast-check';
import { expect, test } from 'vitest';
import { listed } from '../../src/craft/craft.ts';
import { SHAPE_KINDS } from '../../src/craft/hullSchema.ts';
import { PLACE_KINDS } from '../../src/craft/placeSchema.ts';
import { PART_KINDS } from '../../src/craft/schema.ts';
import { newCraft } from '../../src/panels/newCraft.ts';
import { assess } from '../../src/report/assess.ts';

const asked = fc.record({
  name: fc.string({ maxLength: 50 }),
  length: fc.double({ min: 0.5, max: 12, noNaN: true }),
  diameter: fc.double({ min: 0.2, max: 3, noNaN: true }),
  shape: fc.constantFrom(...SHAPE_KINDS),
  part: fc.record({
    name: fc.string({ maxLength: 50 }),
    kind: fc.constantFrom(...PART_KINDS),
    place: fc.constantFrom(...PLACE_KINDS),
    mass: fc.option(fc.double({ min: 0, max: 5, noNaN: true })),
    station: fc.option(fc.double({ min: 0, max: 12, noNaN: true })),
  }),
});

test('name, length, diameter and shape are enough for a craft, with the first part if it has a mass', () => {
  fc.assert(
    fc.property(asked, (answers) => {
      const made = newCraft(answers);
      expect(made.ok).toBe(true);
      if (!made.ok) return;
      const parts = listed(made.craft.parts);
      expect(parts.map(({ mass, kind, place }) => [mass, kind, place.kind])).toEqual(
        answers.part.mass === null ? [] : [[answers.part.mass, answers.part.kind, answers.part.place]],
      );
    }),
  );
});

test('a new spheroid gets an answer at once', () => {
  const part = { name: 'Gondola', kind: 'gondola', place: 'keel', mass: 0.1, station: 1 } as const;
  const made = newCraft({ name: 'New', length: 3, diameter: 1, shape: 'spheroid', part });
  const { rows } = assess(made.ok ? made.craft : expect.unreachable());
  // Prolate spheroid: V = π L D² / 6.
  expect(rows['hull.volume']!.value).toBeCloseTo(Math.PI / 2, 9);
  expect(rows['float.pitch']!.value).toBeLessThan(0);
});

test.each([
  [{ length: -1 }, 'hull.shape.length'],
  [{ diameter: 0 }, 'hull.shape.diameter'],
])('%o is refused, naming the field', (change, path) => {
  const part = { name: '', kind: 'load', place: 'keel', mass: null, station: null } as const;
  const made = newCraft({ name: 'New', length: 3, diameter: 1, shape: 'naca4', part, ...change });
  expect(made.ok ? [] : made.problems.map((problem) => problem.path)).toContain(path);
});
