import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Gas } from '../../../src/craft/schema.ts';
import { gasDensity, gasMolarMass } from '../../../src/physics/air/gas.ts';
import { compressibility, moistAirDensity } from '../../../src/physics/air/moistAir.ts';

const gasOf = (change: Partial<Gas> = {}): Gas => ({
  lifting: 'helium',
  purity: 1,
  superheat: 0,
  gaugePressure: 0,
  ...change,
});

const POUNDS_PER_KCF = (1000 * 0.3048 ** 3) / 0.45359237;
const fahrenheit = (f: number) => (f - 32) / 1.8 + 273.15;
const INCH_OF_MERCURY = 3386.389;

/** Dry air less gas, in pounds per 1000 cubic feet. */
const liftAt = (gas: Gas, f: number, inches: number): number => {
  const air = { temperature: fahrenheit(f), pressure: inches * INCH_OF_MERCURY };
  return (moistAirDensity(air.temperature, air.pressure, 0) - gasDensity(gas, air)) * POUNDS_PER_KCF;
};

const room = { temperature: 293.15, pressure: 101_325 };

test('98 % helium at 20 °C, 1013.25 hPa: 0.187148 kg/m³ (worked example, checked by hand)', () => {
  expect(gasDensity(gasOf({ purity: 0.98 }), room)).toBeCloseTo(0.187148, 6);
});

test('helium at 0 °C, 101325 Pa is 0.1785 kg/m³ (handbook value)', () => {
  const density = gasDensity(gasOf(), { temperature: 273.15, pressure: 101_325 });
  expect(Math.abs(density - 0.1785)).toBeLessThan(1e-4);
});

test('hydrogen at 0 °C, 101325 Pa is 0.0899 kg/m³ (handbook value, from memory)', () => {
  const density = gasDensity(gasOf({ lifting: 'hydrogen' }), { temperature: 273.15, pressure: 101_325 });
  expect(density).toBeCloseTo(0.0899, 4);
});

test('60 °F, 29.92 inHg: air 76.36, helium 10.54, lift 65.82 lb/kcf (US airship handbook, second-hand)', () => {
  const air = { temperature: fahrenheit(60), pressure: 29.92 * INCH_OF_MERCURY };
  const airDensity = moistAirDensity(air.temperature, air.pressure, 0) * POUNDS_PER_KCF;
  expect(Math.abs(airDensity - 76.36)).toBeLessThan(0.05);
  expect(Math.abs(gasDensity(gasOf(), air) * POUNDS_PER_KCF - 10.54)).toBeLessThan(0.05);
  expect(Math.abs(liftAt(gasOf(), 60, 29.92) - 65.82)).toBeLessThan(0.05);
});

// G. Whale, British Airships, 1919: hydrogen that lifts 70 lb/kcf at 30 inHg and 60 °F.
const whale = gasOf({ lifting: 'hydrogen', purity: 70 / liftAt(gasOf({ lifting: 'hydrogen' }), 60, 30) });

test('Whale 1919: hydrogen lifting 70 lb/kcf at 60 °F lifts 66.2 at 90 °F, and 65.33 at 28 inHg', () => {
  expect(whale.purity).toBeGreaterThan(0.95);
  expect(whale.purity).toBeLessThan(1);
  expect(Math.abs(liftAt(whale, 60, 30) - 70)).toBeLessThan(0.05);
  expect(Math.abs(liftAt(whale, 90, 30) - 66.2)).toBeLessThan(0.05);
  expect(Math.abs(liftAt(whale, 60, 28) - 65.33)).toBeLessThan(0.05);
});

test('Whale 1919: lift is in proportion to purity', () => {
  const full = liftAt(gasOf({ lifting: 'hydrogen' }), 60, 30);
  for (const purity of [0.98, 0.9, 0.5]) {
    // Within 0.1 %: what is left is air's compressibility, which the ideal gas lacks.
    expect(liftAt(gasOf({ lifting: 'hydrogen', purity }), 60, 30) / full / purity).toBeCloseTo(1, 3);
  }
});

const purities = fc.double({ min: 0, max: 1, noNaN: true });
const liftings = fc.constantFrom('helium', 'hydrogen') as fc.Arbitrary<Gas['lifting']>;

test('molar mass runs in a straight line from air to the pure gas', () => {
  fc.assert(
    fc.property(liftings, purities, (lifting, purity) => {
      const pure = gasMolarMass({ lifting, purity: 1 });
      const air = gasMolarMass({ lifting, purity: 0 });
      expect(gasMolarMass({ lifting, purity })).toBeCloseTo(air + purity * (pure - air), 15);
    }),
  );
});

test('gas without purity is dry air, but for the compressibility of air (0.04 %)', () => {
  const ratio = gasDensity(gasOf({ purity: 0 }), room) / moistAirDensity(room.temperature, room.pressure, 0);
  expect(ratio).toBeCloseTo(compressibility(room.temperature, room.pressure, 0), 5);
  expect(ratio).toBeCloseTo(0.9996, 4);
});

test('superheat thins the gas, gauge pressure thickens it, each in proportion', () => {
  fc.assert(
    fc.property(
      liftings,
      purities,
      fc.double({ min: 0, max: 40, noNaN: true }),
      (lifting, purity, superheat) => {
        const gas = gasOf({ lifting, purity });
        const still = gasDensity(gas, room);
        expect(gasDensity({ ...gas, superheat }, room) / still).toBeCloseTo(
          293.15 / (293.15 + superheat),
          12,
        );
        expect(gasDensity({ ...gas, gaugePressure: 500 }, room) / still).toBeCloseTo(101_825 / 101_325, 12);
      },
    ),
  );
});

test('common practice, no source: 3 K of superheat is worth about 0.16 % of the lift of helium', () => {
  const gain = liftAt(gasOf({ superheat: 3 }), 60, 30) / liftAt(gasOf(), 60, 30) - 1;
  expect(gain).toBeCloseTo(0.0016, 3);
});
