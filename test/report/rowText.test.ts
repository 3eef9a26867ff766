import { expect, test } from 'vitest';
import type { Row } from '../../src/report/row.ts';
import { rowText } from '../../src/report/rowText.ts';

const ROW: Row = { label: 'Lead', quantity: 'mass', value: 0.157117, unit: 'kg', status: 'solved', why: '' };

test('a figure without uncertainty has the digits usual for it', () => {
  expect(rowText(ROW, 'metric')).toBe('157.1 g');
  expect(rowText({ ...ROW, quantity: 'angle', value: 0.1 }, 'metric')).toBe('5.7°');
});

test('with an uncertainty both are shown to two digits of it', () => {
  expect(rowText({ ...ROW, uncertainty: 0.0024 }, 'metric')).toBe('157.1 ± 2.4 g');
  expect(rowText({ ...ROW, uncertainty: 0.024 }, 'metric')).toBe('157 ± 24 g');
  const pitch: Row = { ...ROW, quantity: 'angle', value: Math.PI / 18, uncertainty: Math.PI / 180 };
  expect(rowText(pitch, 'imperial')).toBe('10.0° ± 1.0°');
});

test('an uncertainty that is only rounding of the arithmetic is not shown', () => {
  expect(rowText({ ...ROW, value: 1e-17, quantity: 'length', uncertainty: 3e-18 }, 'metric')).toBe('0.000 m');
});

test('one that does not reach the digits usually shown is left out, and adds none', () => {
  const length: Row = { ...ROW, quantity: 'length', value: 0.2 };
  expect(rowText({ ...length, uncertainty: 0.000021 }, 'metric')).toBe('0.200 m');
  expect(rowText({ ...length, uncertainty: 0.00049 }, 'metric')).toBe('0.200 m');
  expect(rowText({ ...length, uncertainty: 0.00051 }, 'metric')).toBe('0.20000 ± 0.00051 m');
  expect(rowText({ ...ROW, quantity: 'force', value: 2.14448, uncertainty: 0.00021 }, 'metric')).toBe(
    '2.144 N',
  );
});

test('no value is a word, not a number', () => {
  expect(rowText({ ...ROW, value: null, status: 'infeasible' }, 'metric')).toBe('none');
});
