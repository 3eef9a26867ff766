import fc from 'fast-check';
import { expect, test } from 'vitest';
import { decimalsFor, formatNumber, formatQuantity } from '../../src/units/format.ts';
import { QUANTITIES, type Quantity } from '../../src/units/quantities.ts';

test('fixed decimals, a true minus sign, a hyphen for terminals', () => {
  expect(formatNumber(157.117, 1)).toBe('157.1');
  expect(formatNumber(-3.25, 2)).toBe('−3.25');
  expect(formatNumber(-3.25, 2, { ascii: true })).toBe('-3.25');
  expect(formatNumber(1234.5, -2)).toBe('1200');
});

test('what rounds to zero has no sign; what is no number is a dash', () => {
  expect(formatNumber(-0, 1)).toBe('0.0');
  expect(formatNumber(-0.04, 1)).toBe('0.0');
  expect(formatNumber(-4, -1)).toBe('0');
  expect(formatNumber(Number.NaN, 1)).toBe('–');
  expect(formatNumber(Number.NEGATIVE_INFINITY, 1, { ascii: true })).toBe('-');
  expect(formatQuantity(Number.NaN, 'mass', 'metric')).toBe('–');
});

test('quantities carry the unit of the system', () => {
  expect(formatQuantity(0.157117, 'mass', 'metric')).toBe('157.1 g');
  expect(formatQuantity(0.157117, 'mass', 'imperial')).toBe('5.54 oz');
  expect(formatQuantity(0.941239, 'angle', 'metric')).toBe('53.9°');
  expect(formatQuantity(270.15, 'temperature', 'metric')).toBe('−3.0 °C');
  expect(formatQuantity(0.98, 'fraction', 'metric')).toBe('98.0 %');
  expect(formatQuantity(3, 'ratio', 'metric')).toBe('3.000');
  expect(formatQuantity(-0.5672, 'mass', 'metric', { ascii: true })).toBe('-567.2 g');
});

test('JCGM 100 example H.1: 50.000838 mm with u = 32 nm is shown to the nanometre', () => {
  const shown = formatQuantity(0.050000838, 'smallLength', 'metric', { uncertainty: 32e-9 });
  expect(shown).toBe('50.000838 mm');
});

test('JCGM 100, 7.2.2: m = 100.02147 g with u = 0.35 mg', () => {
  expect(formatQuantity(0.1000214749, 'mass', 'metric', { uncertainty: 0.35e-6 })).toBe('100.02147 g');
});

test('an uncertainty of a temperature is a step, not a temperature', () => {
  expect(formatQuantity(293.15, 'temperature', 'metric', { uncertainty: 0.25 })).toBe('20.00 °C');
  expect(formatQuantity(293.15, 'temperature', 'imperial', { uncertainty: 12 })).toBe('68 °F');
});

test('the uncertainty, rounded to those decimals, has two significant digits', () => {
  fc.assert(
    fc.property(fc.double({ min: 1e-9, max: 1e6, noNaN: true }), (uncertainty) => {
      const tens = 10 ** decimalsFor(uncertainty, 0);
      const digits = Number((uncertainty * tens).toPrecision(12));
      expect(Math.round(digits)).toBeGreaterThanOrEqual(10);
      expect(Math.round(digits)).toBeLessThanOrEqual(99);
    }),
  );
});

test('without a usable uncertainty the default decimals hold', () => {
  for (const uncertainty of [0, -1, Number.NaN, Number.POSITIVE_INFINITY]) {
    expect(formatQuantity(0.157117, 'mass', 'metric', { uncertainty })).toBe('157.1 g');
  }
});

test('nothing on screen is ever NaN, Infinity or a negative zero', () => {
  const names = Object.keys(QUANTITIES) as Quantity[];
  fc.assert(
    fc.property(fc.double(), fc.constantFrom(...names), fc.double(), (si, quantity, uncertainty) => {
      const text = formatQuantity(si, quantity, 'imperial', { uncertainty });
      expect(text).not.toMatch(/NaN|Infinity|^[-−]0*(\.0*)?( |°|$)/);
    }),
  );
});
