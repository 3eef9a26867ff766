import fc from 'fast-check';
import { expect, test } from 'vitest';
import { catalogue } from '../../src/catalogue/catalogue.ts';
import { catalogueOf } from '../../src/catalogue/catalogueOf.ts';
import { thrusterFacts } from '../../src/report/thrusterAs.ts';

const data = (): Record<string, Record<string, unknown>[]> => JSON.parse(JSON.stringify(catalogue));
const problemsOf = (seeds: unknown) => {
  const outcome = catalogueOf(seeds);
  return outcome.ok ? [] : outcome.problems;
};

test('the lists of the seed files make a catalogue', () => {
  expect(catalogueOf(data())).toEqual({ ok: true, catalogue });
});

test('what is missing, unknown or out of range is named by path, with what was found and what is allowed', () => {
  const seeds = data();
  delete seeds.films![2]!.source;
  seeds.gases![0]!.purity = 98;
  seeds.parts![3]!.maker = 'x';
  seeds.conductors![1]!.massPerMetre = '5';
  expect(problemsOf(seeds)).toEqual([
    { path: 'films[2].source', found: 'nothing', allowed: 'text' },
    { path: 'gases[0].purity', found: '98', allowed: 'at most 1' },
    { path: 'conductors[1].massPerMetre', found: '"5"', allowed: 'a finite number' },
    expect.objectContaining({ path: 'parts[3].maker' }),
  ]);
});

test('a source may not be empty', () => {
  const seeds = data();
  seeds.parts![0]!.source = '';
  expect(problemsOf(seeds)).toEqual([
    { path: 'parts[0].source', found: '""', allowed: 'at least 1 characters' },
  ]);
});

test('an id stands once in its list', () => {
  const seeds = data();
  seeds.films![1]!.id = seeds.films![0]!.id;
  expect(problemsOf(seeds)).toEqual([
    { path: 'films[1].id', found: '"pet-6"', allowed: 'an id of its own (films[0] has this one)' },
  ]);
});

/** Pitch speed over the flow a propeller at rest makes through itself, √(T/2ρA): 1.9 for the 9 × 4.7 in one of UIUC (second-hand). */
test('every thruster has figures of one propeller: efficient as small ones are, and as fast as it pushes', () => {
  const thrusters = catalogue.parts.filter(({ kind }) => kind === 'thruster');
  expect(new Set(thrusters.map(({ size }) => size.width)).size).toBeGreaterThan(6);
  for (const { id, thruster, size, mass } of thrusters) {
    if (thruster?.thrust.kind !== 'power') throw new Error(`${id}: no shaft power`);
    expect(thruster.thrust.figureOfMerit, id).toBeGreaterThanOrEqual(0.4);
    expect(thruster.thrust.figureOfMerit, id).toBeLessThanOrEqual(0.65);
    // Not above 1.3 W on each gram of motor and propeller: common practice, no source.
    expect(thruster.thrust.shaftPower / mass, id).toBeLessThan(1300);
    expect(Math.max(size.width, size.height) - thruster.diameter, id).toBeLessThan(0.01);
    const { staticThrust, pitchSpeed } = thrusterFacts(thruster, 1.2);
    const flow = Math.sqrt(staticThrust / (2 * 1.2 * Math.PI * (thruster.diameter / 2) ** 2));
    expect(pitchSpeed / flow, id).toBeGreaterThan(1.4);
    expect(pitchSpeed / flow, id).toBeLessThan(3);
  }
});

test('every fin has an outline no larger than its box', () => {
  for (const { id, kind, fin, size } of catalogue.parts) {
    if (kind !== 'fin') continue;
    expect(fin!.area, id).toBeLessThanOrEqual(size.length * size.height);
    expect(Math.sqrt(fin!.area * fin!.aspectRatio), id).toBeCloseTo(size.height, 3);
  }
});

test('no value whatever makes it throw', () => {
  fc.assert(
    fc.property(fc.jsonValue(), (value) => {
      expect(problemsOf(value).length).toBeGreaterThan(0);
      expect(problemsOf({ ...data(), films: value }).length).toBeGreaterThanOrEqual(
        Array.isArray(value) && value.length === 0 ? 0 : 1,
      );
    }),
    { numRuns: 200 },
  );
});
