import fc from 'fast-check';
import { expect, test } from 'vitest';
import { formatEntry, parseQuantity } from '../../src/units/entry.ts';
import { QUANTITIES, type Quantity } from '../../src/units/quantities.ts';

const siOf = (text: string, quantity: Quantity, system: 'metric' | 'imperial' = 'metric'): number => {
  const parsed = parseQuantity(text, quantity, system);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value;
};

const messageOf = (text: string, quantity: Quantity): string => {
  const parsed = parseQuantity(text, quantity, 'metric');
  return parsed.ok ? `taken as ${parsed.value}` : parsed.message;
};

test.each([
  ['12', 'mass', 0.012],
  ['12 oz', 'mass', 0.340194],
  ['1.2 kg', 'mass', 1.2],
  ['1 lb 4 oz', 'mass', 0.56699],
  ['250mm', 'length', 0.25],
  ['0.3 m', 'smallLength', 0.3],
  ['300', 'smallLength', 0.3],
  ['5ft3in', 'length', 1.6002],
  ['5\' 3"', 'length', 1.6002],
  ['-5 ft 3 in', 'length', -1.6002],
  ['72°F', 'temperature', 295.3722],
  ['20 c', 'temperature', 293.15],
  ['293.15 K', 'temperature', 293.15],
  ['9 °F', 'temperatureDifference', 5],
  ['29.92 inHg', 'pressure', 101320.76],
  ['1013,25', 'pressure', 101325],
  ['2 inh2o', 'gaugePressure', 498.1778],
  ['45 g/m2', 'arealDensity', 0.045],
  ['45 g / m²', 'arealDensity', 0.045],
  ['1.2 kg m^2', 'inertia', 1.2],
  ['3 oz in', 'momentMass', 0.00216023],
  ['98 %', 'fraction', 0.98],
  ['90 deg', 'angle', 1.5707963],
  ['.5', 'ratio', 0.5],
  ['1e-3', 'ratio', 0.001],
] as const)('%s as %s is %f in SI', (text, quantity, si) => {
  expect(siOf(text, quantity)).toBeCloseTo(si, si > 1000 ? 2 : 4);
});

test('a comma is a decimal point, unless it could be thousands', () => {
  expect(siOf('1,5', 'ratio')).toBe(1.5);
  expect(siOf('0,125', 'ratio')).toBe(0.125);
  expect(siOf('1,2345', 'ratio')).toBe(1.2345);
  expect(messageOf('1,234', 'mass')).toContain('1.234 and 1234 are both possible');
});

test('plain sums: in the unit of the field, in the one at the end, or each in its own', () => {
  expect(siOf('120+35', 'mass')).toBeCloseTo(0.155, 12);
  expect(siOf('120 − 35 + 1,5', 'mass')).toBeCloseTo(0.0865, 12);
  expect(siOf('120+35 oz', 'mass')).toBeCloseTo(155 * 0.028349523125, 12);
  expect(siOf('1 m + 20 mm', 'length')).toBeCloseTo(1.02, 12);
  expect(siOf('20+5', 'temperature')).toBeCloseTo(298.15, 12);
  expect(messageOf('1 m + 20', 'length')).toContain('some terms have a unit and some have none');
  expect(messageOf('20 °C + 5 °F', 'temperature')).toContain('temperatures do not add up');
});

test('without a unit the system decides', () => {
  expect(siOf('16', 'mass', 'imperial')).toBeCloseTo(0.45359237, 12);
  expect(siOf('32', 'temperature', 'imperial')).toBeCloseTo(273.15, 12);
});

test('a refusal says what was found and what is allowed', () => {
  expect(messageOf('12 stone', 'mass')).toBe(
    'Found “12 stone”: “stone” is not a unit for a mass. Enter a mass: a number, in g, oz, kg, mg, lb.',
  );
  expect(messageOf('', 'angle')).toBe('Nothing entered. Enter an angle: a number, in °, rad.');
  expect(messageOf('heavy', 'mass')).toMatch(/^“heavy” is not a number\. Enter a mass/);
  expect(messageOf('12 34', 'mass')).toContain('“34” follows without a sign');
  expect(messageOf('12 m', 'mass')).toContain('“m” is not a unit');
  expect(messageOf('3 m', 'ratio')).toContain('a plain number');
  for (const text of ['1..2', '1.2.3', '12+', '--3', '1e999', 'NaN', '5 ft3', '1/2', '120–130', '1,234.5']) {
    expect(parseQuantity(text, 'length', 'metric').ok).toBe(false);
  }
});

test('any text at all is either a finite number or a message', () => {
  const pieces = fc.constantFrom(
    '1',
    '2.5',
    ',',
    '.',
    '-',
    '+',
    ' ',
    'm',
    'ft',
    '"',
    '°',
    'in',
    'e9',
    'x',
    '−',
    '/',
  );
  const texts = fc.oneof(
    fc.string(),
    fc.array(pieces, { maxLength: 8 }).map((list) => list.join('')),
  );
  fc.assert(
    fc.property(texts, (text) => {
      const parsed = parseQuantity(text, 'length', 'metric');
      expect(parsed.ok ? Number.isFinite(parsed.value) : parsed.message.length > 0).toBe(true);
    }),
    { numRuns: 2000 },
  );
});

test('what a field shows, it reads back to ten digits', () => {
  const names = Object.keys(QUANTITIES) as Quantity[];
  const size = fc.double({ min: -1e6, max: 1e6, noNaN: true });
  fc.assert(
    fc.property(
      size,
      fc.constantFrom(...names),
      fc.constantFrom('metric', 'imperial'),
      (si, quantity, system) => {
        const back = siOf(formatEntry(si, quantity, system), quantity, system);
        expect(Math.abs(back - si)).toBeLessThanOrEqual(1e-9 * (Math.abs(si) + 300));
      },
    ),
  );
});

test('a field shows no rounding dust and no padding', () => {
  expect(formatEntry(0.1, 'mass', 'metric')).toBe('100');
  expect(formatEntry(0.17225, 'mass', 'metric')).toBe('172.25');
  expect(formatEntry(293.15, 'temperature', 'metric')).toBe('20');
  expect(formatEntry(-0, 'length', 'metric')).toBe('0');
  expect(formatEntry(Number.NaN, 'length', 'metric')).toBe('');
});
