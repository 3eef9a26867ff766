import fc from 'fast-check';
import { expect, test } from 'vitest';
import { daySchema } from '../../../src/craft/schema.ts';
import { airOf } from '../../../src/physics/air/day.ts';

test('a measured day keeps what was measured', () => {
  const day = { kind: 'measured', temperature: 293.15, pressure: 101_325, humidity: 0.5 } as const;
  const { density, ...rest } = airOf(day);
  expect(rest).toEqual({ temperature: 293.15, pressure: 101_325, humidity: 0.5, cautions: [] });
  expect(density).toBeCloseTo(1.199314, 6);
});

test('a QNH day is the measured day at its station pressure', () => {
  const qnh = airOf({ kind: 'qnh', temperature: 290, qnh: 100_900, elevation: 430, humidity: 0.7 });
  const { pressure } = qnh;
  expect(qnh).toEqual(airOf({ kind: 'measured', temperature: 290, pressure, humidity: 0.7 }));
  expect(pressure).toBeLessThan(100_900);
});

test('a standard day is dry and equals the measured day of the same dry air within 0.06 %', () => {
  for (const elevation of [-500, 0, 1000, 5000]) {
    const standard = airOf({ kind: 'standard', elevation });
    const { temperature, pressure } = standard;
    expect(standard.humidity).toBe(0);
    // The standard atmosphere is an ideal gas; the rest is air's compressibility.
    const measured = airOf({ kind: 'measured', temperature, pressure, humidity: 0 }).density;
    expect(Math.abs(standard.density / measured - 1)).toBeLessThan(6e-4);
  }
});

test('a cold day carries its caution', () => {
  const air = airOf({ kind: 'measured', temperature: 278, pressure: 101_325, humidity: 0.5 });
  expect(air.cautions.join(' ')).toContain('15 to 27 °C');
});

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const days = fc.oneof(
  fc.record({
    kind: fc.constant('measured' as const),
    temperature: between(200, 350),
    pressure: between(20_000, 120_000),
    humidity: between(0, 1),
  }),
  fc.record({
    kind: fc.constant('qnh' as const),
    temperature: between(200, 350),
    qnh: between(20_000, 120_000),
    elevation: between(-500, 5000),
    humidity: between(0, 1),
  }),
  fc.record({ kind: fc.constant('standard' as const), elevation: between(-500, 5000) }),
);

test('every day the loading gate lets in has finite, positive air', () => {
  fc.assert(
    fc.property(days, (day) => {
      expect(daySchema.safeParse(day).success).toBe(true);
      const { temperature, pressure, density } = airOf(day);
      for (const value of [temperature, pressure, density]) {
        expect(value).toBeGreaterThan(0);
        expect(value).toBeLessThan(Number.POSITIVE_INFINITY);
      }
    }),
  );
});
