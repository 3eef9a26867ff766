import fc from 'fast-check';
import { expect, test } from 'vitest';
import { catalogue } from '../../src/catalogue/catalogue.ts';
import { catalogueOf } from '../../src/catalogue/catalogueOf.ts';

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
