import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  allowedText,
  entryText,
  problemSentence,
  readCount,
  readEntry,
  readOptional,
  stepped,
} from '../../../src/panels/fields/entry.ts';

test('a mass typed in grams to the milligram comes back as typed, and is kept without binary dust', () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 10_000_000 }), (milligrams) => {
      const typed = String(milligrams / 1000);
      const read = readEntry(typed, 'mass', 'metric');
      expect(read).toEqual({ ok: true, value: milligrams / 1e6 });
      expect(entryText(milligrams / 1e6, 'mass', 'metric')).toBe(typed);
    }),
  );
});

test('180° is π itself', () => {
  expect(readEntry('180', 'angle', 'metric')).toEqual({ ok: true, value: Math.PI });
});

test('a dragged value shows short, two decimals past what is usual', () => {
  expect(entryText(1.234567891, 'length', 'metric')).toBe('1.23457');
  expect(entryText(Number.NaN, 'length', 'metric')).toBe('');
});

test('sums and other units are read as typed', () => {
  expect(readEntry('12 + 3.5', 'mass', 'metric')).toEqual({ ok: true, value: 0.0155 });
  expect(readEntry('1 in', 'smallLength', 'metric')).toEqual({ ok: true, value: 0.0254 });
});

test('an arrow key changes a metric length by 1 mm, a mass by 1 g, an angle by 1°', () => {
  expect(stepped(0.42, 1, 'length', 'metric')).toBe(0.421);
  expect(stepped(0.42, -10, 'smallLength', 'metric')).toBe(0.41);
  expect(stepped(0.0125, 1, 'mass', 'metric')).toBe(0.0135);
  expect(stepped(Math.PI, 0, 'angle', 'metric')).toBe(Math.PI);
});

test('steps up and down again end where they began', () => {
  fc.assert(
    fc.property(
      fc.integer({ min: -5000, max: 5000 }),
      fc.integer({ min: 1, max: 10 }),
      (millimetres, steps) => {
        const start = millimetres / 1000;
        expect(stepped(stepped(start, steps, 'length', 'metric'), -steps, 'length', 'metric')).toBeCloseTo(
          start,
          12,
        );
      },
    ),
  );
});

test('a whole number is taken only whole', () => {
  expect(readCount(' 3 ')).toEqual({ ok: true, value: 3 });
  for (const text of ['2.5', '-1', 'three', '']) expect(readCount(text).ok, text).toBe(false);
});

test('what the gate refuses is said with the field, what was typed and the bound in the builder’s unit', () => {
  const problem = { path: 'parts[0].mass', found: '-0.005', allowed: 'at least 0' };
  expect(problemSentence('Mass', '-5 g', problem, 'mass', 'metric')).toBe(
    'Mass: found “-5 g”; allowed: at least 0 g.',
  );
  expect(allowedText('at most 6.283185307179586', 'angle', 'imperial')).toBe('at most 360°');
  expect(allowedText('one of a, b', 'mass', 'metric')).toBe('one of a, b');
});

test('a bound that is another field, and a range, come in the builder’s unit too', () => {
  const most = 'at most parts[3].thruster.yaw.most (0.5235987755982988 rad)';
  expect(allowedText(most, 'angle', 'metric')).toBe('at most 30°');
  expect(allowedText('at most targets.heaviness.most (-0.005 kg)', 'mass', 'metric')).toBe('at most -5 g');
  const range = `an angle from ${-Math.PI / 3} to ${Math.PI / 6} rad`;
  expect(allowedText(range, 'angle', 'metric')).toBe('an angle from -60° to 30°');
  expect(allowedText(range, null, 'metric')).toBe(range);
  expect(allowedText('at least -0.523598776', 'angle', 'metric')).toBe('at least -30°');
});

test('where there need be no value nothing is no value, and rubbish is still refused', () => {
  expect(readOptional(' ', 'time', 'metric')).toEqual({ ok: true, value: null });
  expect(readOptional('6', 'time', 'metric')).toEqual({ ok: true, value: 6 });
  expect(readOptional('soon', 'time', 'metric').ok).toBe(false);
  expect(readEntry(' ', 'time', 'metric').ok).toBe(false);
});
