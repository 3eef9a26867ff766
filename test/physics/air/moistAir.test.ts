import { createRequire } from 'node:module';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  compressibility,
  enhancementFactor,
  moistAirCautions,
  moistAirDensity,
  saturationPressure,
  vapourFraction,
} from '../../../src/physics/air/moistAir.ts';

interface Psychrometrics {
  readonly SI: number;
  SetUnitSystem(system: number): void;
  GetSatVapPres(celsius: number): number;
  GetHumRatioFromRelHum(celsius: number, humidity: number, pressure: number): number;
  GetMoistAirDensity(celsius: number, humidityRatio: number, pressure: number): number;
}

const rival = createRequire(import.meta.url)('psychrolib') as Psychrometrics;
rival.SetUnitSystem(rival.SI);

const kelvin = (celsius: number) => celsius + 273.15;

test('20 °C, 1013.25 hPa, 50 %: 1.199314 kg/m³ (worked example, checked by hand)', () => {
  expect(moistAirDensity(293.15, 101_325, 0.5)).toBeCloseTo(1.199314, 6);
});

// OIML R 111-1:2004, E.3: ρ = (0.34848 p − 0.009 h exp(0.061 t))/(273.15 + t), p in hPa, h in %, t in °C; stated to
// 2 parts in 10,000 for 900–1100 hPa, 10–30 °C, humidity below 80 % (all from memory). It approximates the formula
// before 2007, and near 10 °C it stands up to 2.9 parts in 10,000 from this one.
test.each([
  [15, 27, 2e-4],
  [10, 30, 3e-4],
])('from %i to %i °C the approximation of OIML R 111 agrees to %f', (coldest, warmest, most) => {
  const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  fc.assert(
    fc.property(between(900, 1100), between(coldest, warmest), between(0, 80), (p, t, h) => {
      const approximate = (0.34848 * p - 0.009 * h * Math.exp(0.061 * t)) / (273.15 + t);
      expect(Math.abs(moistAirDensity(kelvin(t), 100 * p, h / 100) / approximate - 1)).toBeLessThan(most);
    }),
  );
});

test('saturation pressure at 20 °C and 25 °C is 2339.3 and 3169.9 Pa (IAPWS-95, from memory)', () => {
  expect(saturationPressure(293.15) / 2339.3).toBeCloseTo(1, 3);
  expect(saturationPressure(298.15) / 3169.9).toBeCloseTo(1, 3);
});

test('at 20 °C, 1013.25 hPa: enhancement 1.0040, compressibility of dry air 0.9996 (from memory)', () => {
  expect(enhancementFactor(293.15, 101_325)).toBeCloseTo(1.004, 4);
  expect(compressibility(293.15, 101_325, 0)).toBeCloseTo(0.9996, 4);
});

test('dry air at 0 °C, 1013.25 hPa is 1.293 kg/m³ (handbook value, from memory)', () => {
  expect(moistAirDensity(273.15, 101_325, 0)).toBeCloseTo(1.293, 3);
});

test('rival library psychrolib (ASHRAE): saturation pressure over water within 0.02 % from 0 to 70 °C', () => {
  for (let t = 0; t <= 70; t += 1) {
    expect(Math.abs(saturationPressure(kelvin(t)) / rival.GetSatVapPres(t) - 1)).toBeLessThan(2e-4);
  }
});

const rivalDensity = (t: number, p: number, h: number) =>
  rival.GetMoistAirDensity(t, rival.GetHumRatioFromRelHum(t, h, p), p);

test('rival library psychrolib: density within 0.05 % in the stated range, its air being an ideal gas', () => {
  const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  fc.assert(
    fc.property(between(15, 27), between(60_000, 110_000), between(0, 1), (t, p, h) => {
      const ratio = moistAirDensity(kelvin(t), p, h) / rivalDensity(t, p, h);
      expect(Math.abs(ratio - 1)).toBeLessThan(5e-4);
      // With its ideal gas corrected by Z, what is left is CO₂, R and the enhancement factor: about 0.01 %.
      const real = ratio * compressibility(kelvin(t), p, vapourFraction(kelvin(t), p, h));
      expect(Math.abs(real - 1)).toBeLessThan(1.5e-4);
    }),
  );
});

test('rival library psychrolib: density within 0.15 % far outside the stated range', () => {
  for (let t = -40; t <= 50; t += 5) {
    for (const p of [30_000, 60_000, 101_325, 110_000]) {
      for (const h of [0, 0.5, 1]) {
        expect(Math.abs(moistAirDensity(kelvin(t), p, h) / rivalDensity(t, p, h) - 1)).toBeLessThan(1.5e-3);
      }
    }
  }
});

const temperatures = fc.double({ min: 250, max: 320, noNaN: true });
const pressures = fc.double({ min: 60_000, max: 110_000, noNaN: true });
const humidities = fc.double({ min: 0, max: 0.95, noNaN: true });

test('air is denser when colder, when drier and under more pressure', () => {
  fc.assert(
    fc.property(temperatures, pressures, humidities, (t, p, h) => {
      const here = moistAirDensity(t, p, h);
      expect(moistAirDensity(t + 1, p, h)).toBeLessThan(here);
      expect(moistAirDensity(t, p, h + 0.05)).toBeLessThan(here);
      expect(moistAirDensity(t, p + 100, h)).toBeGreaterThan(here);
    }),
  );
});

test('every day the loading gate lets in has a finite, positive density', () => {
  const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  fc.assert(
    fc.property(between(200, 350), between(20_000, 120_000), between(0, 1), (t, p, h) => {
      const density = moistAirDensity(t, p, h);
      expect(density).toBeGreaterThan(0);
      expect(density).toBeLessThan(2.2);
    }),
  );
});

test('cautions outside 15–27 °C and 600–1100 hPa, none inside', () => {
  expect(moistAirCautions(kelvin(20), 101_325)).toEqual([]);
  expect(moistAirCautions(kelvin(14), 101_325)).toHaveLength(1);
  expect(moistAirCautions(kelvin(28), 59_000)).toHaveLength(2);
});
