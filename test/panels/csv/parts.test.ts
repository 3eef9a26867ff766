import fc from 'fast-check';
import { expect, test } from 'vitest';
import { finOfBox } from '../../../src/craft/firstFigures.ts';
import type { Place } from '../../../src/craft/placeSchema.ts';
import { MASS_SOURCES, PART_KINDS, type Part } from '../../../src/craft/schema.ts';
import { stationDoubt } from '../../../src/panels/csv/doubt.ts';
import { readParts } from '../../../src/panels/csv/readParts.ts';
import { partsCsv } from '../../../src/panels/csv/writeParts.ts';

const HOME: Place = { kind: 'keel', station: 1.2, drop: 0 };

/** Nanometres and micrograms, as edits leave them. */
const length = fc.integer({ min: -50e9, max: 50e9 }).map((nm) => nm / 1e9);
const distance = fc.integer({ min: 0, max: 50e9 }).map((nm) => nm / 1e9);
const mass = fc.integer({ min: 0, max: 1e9 }).map((micrograms) => micrograms / 1e9);
const clock = fc.integer({ min: 0, max: 6_283_185_307 }).map((nanoradians) => nanoradians / 1e9);
const place = fc.oneof(
  fc.record({ kind: fc.constant('skin' as const), station: length, clock, standoff: length }),
  fc.record({ kind: fc.constant('keel' as const), station: length, drop: distance }),
  fc.record({ kind: fc.constant('axis' as const), station: length }),
  fc.record({ kind: fc.constant('free' as const), x: length, y: length, z: length }),
);
const copies = fc.oneof(
  fc.record({ kind: fc.constant('together' as const), count: fc.integer({ min: 1, max: 64 }) }),
  fc.constant({ kind: 'pair' as const }),
  fc.record({ kind: fc.constant('ring' as const), count: fc.integer({ min: 2, max: 64 }) }),
);
const text = fc.string({ maxLength: 40, unit: 'grapheme' }).map((each) => each.trim().replaceAll('\r', ''));
/** A table has no outline of fins: they are taken from their box. */
const part: fc.Arbitrary<Part> = fc
  .record({
    id: fc.constant('part'),
    kind: fc.constantFrom(...PART_KINDS),
    name: text,
    mass,
    massTolerance: mass,
    massSource: fc.constantFrom(...MASS_SOURCES),
    place,
    copies,
    size: fc.record({ length: distance, width: distance, height: distance }),
    cgOffset: length,
    locked: fc.boolean(),
    slide: fc.constant(null),
    thruster: fc.constant(null),
    fin: fc.constant(null),
    dragArea: fc.constant(null),
    notes: text,
  })
  .map((each) => (each.kind === 'fin' ? { ...each, fin: finOfBox(each.size) } : each));

const withoutId = ({ id: _, ...fields }: Part) => fields;

/** Angles are written to 1e-6°, 1.7e-8 rad. */
function expectSame(given: readonly Part[], read: readonly Omit<Part, 'id'>[]) {
  expect(read).toHaveLength(given.length);
  for (const [i, each] of given.entries()) {
    const { place: before, ...rest } = withoutId(each);
    const { place: after, ...others } = read[i]!;
    expect(others).toEqual(rest);
    const [clockBefore, clockAfter] = [before, after].map((at) => (at.kind === 'skin' ? at.clock : 0));
    expect(clockAfter).toBeCloseTo(clockBefore!, 7);
    expect({ ...after, clock: 0 }).toEqual({ ...before, clock: 0 });
  }
}

test.each(['metric', 'imperial'] as const)(
  'what is written in %s units reads back as the same parts',
  (units) => {
    fc.assert(
      fc.property(fc.array(part, { minLength: 1, maxLength: 8 }), (parts) => {
        const reading = readParts(partsCsv(parts, units), units, HOME);
        expect(reading.problems).toEqual([]);
        expectSame(parts, reading.good);
      }),
    );
  },
);

test('a table says its units itself, whatever units the reader uses', () => {
  fc.assert(
    fc.property(part, (each) => {
      expectSame([each], readParts(partsCsv([each], 'imperial'), 'metric', HOME).good);
    }),
  );
});

test('name, mass, station and kind pasted without heads are taken in that order', () => {
  const { good, problems } = readParts('Camera\t42.5\t0.31\tcamera\nClip\t3 g', 'metric', HOME);
  expect(problems).toEqual([]);
  expect(good.map(({ name, mass: m, kind, place: p }) => [name, m, kind, p])).toEqual([
    ['Camera', 0.0425, 'camera', { kind: 'keel', station: 0.31, drop: 0 }],
    ['Clip', 0.003, 'load', HOME],
  ]);
});

test.each([
  ['Part name;Weight (oz)\nFin;2', 2 * 0.028349523125],
  ['Item,Mass of one piece [kg],Supplier\nFin,0.25,anyone', 0.25],
  ['name\tmass\nFin\t12,5 g', 0.0125],
  ['name,mass g,station mm\n"Fin, left",1+2,100', 0.003],
])('heads in other words and units are understood: %s', (table, kilograms) => {
  const { good, problems } = readParts(table, 'metric', HOME);
  expect(problems).toEqual([]);
  expect(good[0]!.mass).toBeCloseTo(kilograms, 15);
});

test.each([
  ['metric', 0.034, 2.9, ['mass in g', 'station in m', '± in g']],
  // 34 oz and 2.9 in, by the international pound and inch of 1959.
  ['imperial', 34 * 0.028349523125, 2.9 * 0.0254, ['mass in oz', 'station in in', '± in oz']],
] as const)(
  'a head without a unit has the one the %s ledger shows, and says so',
  (units, mass, station, says) => {
    const { good, assumed } = readParts('name,mass,station,±\nCamera,34,2.9,1', units, HOME);
    expect(good[0]!.mass).toBeCloseTo(mass, 12);
    expect(good[0]!.place).toMatchObject({ kind: 'keel' });
    expect((good[0]!.place as { station: number }).station).toBeCloseTo(station, 12);
    expect(assumed.map(({ column, unit }) => `${column} in ${unit}`)).toEqual(says);
  },
);

test('a unit in the head or in each cell is not assumed', () => {
  const { good, assumed } = readParts('name,mass g,station\nA,34,700 mm\nB,12,2 ft', 'metric', HOME);
  expect(assumed).toEqual([]);
  expect(good.map(({ place: at }) => (at as { station: number }).station)).toEqual([0.7, 0.6096]);
});

test('stations that look meant in another unit raise a doubt', () => {
  const stations = (text: string) => readParts(`name,mass,station ${text}`, 'metric', HOME).good;
  expect(stationDoubt(stations('m\nA,1,0.2\nB,1,2.9'), 3)).toBeNull();
  expect(stationDoubt(stations('mm\nA,1,0.2\nB,1,2.9'), 3)).toBe('crowded');
  expect(stationDoubt(stations('m\nA,1,0.2\nB,1,29'), 3)).toBe('beyond');
  expect(stationDoubt(stations('m\nNose weight,1,0'), 3)).toBeNull();
});

test('a column that means nothing here is named, not guessed at', () => {
  expect(readParts('name,mass,supplier\nFin,3,anyone', 'metric', HOME).ignored).toEqual(['supplier']);
});

test('every bad cell is named by row and column with what is allowed; the good rows stay apart', () => {
  const table =
    'name,mass g,kind,copies\nA,5,fin,1\nB,heavy,fin,1\nC,5,wheel,two\nD,,fin,1\nE,-3,fin,1\nF,1,fin,99';
  const { good, rows, problems } = readParts(table, 'metric', HOME);
  expect(rows).toBe(6);
  expect(good.map(({ name }) => name)).toEqual(['A']);
  expect(problems.map(({ row, column, found }) => [row, column, found])).toEqual([
    [3, 'mass g', '“heavy”'],
    [4, 'kind', '“wheel”'],
    [4, 'copies', '“two”'],
    [5, 'mass g', 'nothing'],
    [6, 'mass g', '“-3”'],
    [7, 'copies', '“99”'],
  ]);
  expect(problems.map(({ allowed }) => allowed)).toEqual([
    'a mass: a number, in g, oz, kg, mg, lb',
    `one of ${PART_KINDS.join(', ')}`,
    'a whole number, pair, or ring and a whole number',
    'a mass',
    'at least 0 g',
    'at most 64',
  ]);
});

test('a head in a unit that is no mass, a column twice and a table without masses are refused whole', () => {
  const first = (table: string) => readParts(table, 'metric', HOME);
  expect(first('name,mass m\nA,1').problems[0]).toMatchObject({ row: 1, column: 'mass m' });
  expect(first('name,mass,weight\nA,1,2').problems[0]).toMatchObject({ column: 'weight' });
  expect(first('name,station\nA,1').problems[0]).toMatchObject({ column: 'mass', found: 'no such column' });
});

test('no text makes it throw, and a row is either good or has a problem', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'binary', maxLength: 300 }), (rubbish) => {
      const { good, rows, problems } = readParts(rubbish, 'metric', HOME);
      expect(good.length === rows || problems.length > 0).toBe(true);
    }),
  );
});

test('a clock angle is written without dust', () => {
  const at = { kind: 'skin', station: 1, clock: (60 * Math.PI) / 180, standoff: 0 } as const;
  const [heads, line] = partsCsv([{ ...blank, place: at }], 'metric').split('\r\n');
  expect(line!.split(',')[heads!.split(',').indexOf('clock angle °')]).toBe('60');
});

test('a name that a spreadsheet would run as a formula is written as text', () => {
  const [, line] = partsCsv([{ ...blank, name: '=1+1' }], 'metric').split('\r\n');
  expect(line!.startsWith("'=1+1,")).toBe(true);
});

const blank: Part = {
  id: 'part',
  kind: 'load',
  name: '',
  mass: 0,
  massTolerance: 0,
  massSource: 'estimated',
  place: HOME,
  copies: { kind: 'pair' },
  size: { length: 0, width: 0, height: 0 },
  cgOffset: 0,
  locked: false,
  slide: null,
  thruster: null,
  fin: null,
  dragArea: null,
  notes: '',
};
