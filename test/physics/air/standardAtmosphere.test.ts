import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
  pressureHeight,
  standardAirAt,
  standardPressure,
} from '../../../src/physics/air/standardAtmosphere.ts';
import { stationPressure } from '../../../src/physics/air/stationPressure.ts';

// U.S. Standard Atmosphere, 1976, table I, by geometric height.
test.each([
  [0, 288.1, 101325, 1.225],
  [500, 284.9, 95461, 1.167],
  [1000, 281.7, 89876, 1.112],
  [1500, 278.4, 84559, 1.058],
  [2000, 275.2, 79501, 1.007],
  [3000, 268.7, 70121, 0.909],
])(
  'US Standard Atmosphere 1976 at %i m: %f K, %i Pa, %f kg/m³',
  (elevation, temperature, pressure, density) => {
    const air = standardAirAt(elevation);
    expect(Math.abs(air.temperature - temperature)).toBeLessThanOrEqual(0.0501);
    expect(Math.abs(air.pressure - pressure)).toBeLessThan(1);
    expect(Math.abs(air.density - density)).toBeLessThanOrEqual(0.0005);
  },
);

test('11,000 m, US Standard Atmosphere 1976 (from memory): 216.77 K, 22,700 Pa, 0.36480 kg/m³', () => {
  const air = standardAirAt(11_000);
  expect(air.temperature).toBeCloseTo(216.77, 1);
  expect(air.pressure / 22_700).toBeCloseTo(1, 3);
  expect(air.density / 0.3648).toBeCloseTo(1, 3);
});

const elevations = fc.double({ min: -500, max: 10_900, noNaN: true });

test('pressure falls with height as the weight of the air between: dp/dH = −ρ g in geopotential metres', () => {
  fc.assert(
    fc.property(fc.double({ min: -500, max: 10_900, noNaN: true }), (height) => {
      const fall = (standardPressure(height + 1) - standardPressure(height - 1)) / 2;
      const specificGasConstant = 8.31432 / 28.9644e-3;
      const density = standardPressure(height) / (specificGasConstant * (288.15 - 0.0065 * height));
      expect(fall / (-density * 9.80665)).toBeCloseTo(1, 6);
    }),
  );
});

test('pressure height undoes pressure', () => {
  fc.assert(
    fc.property(elevations, (height) => {
      expect(pressureHeight(standardPressure(height))).toBeCloseTo(height, 6);
    }),
  );
});

test('QNH: at sea level it is the station pressure; on a standard day it is 1013.25 hPa everywhere', () => {
  fc.assert(
    fc.property(elevations, fc.double({ min: 94_000, max: 106_000, noNaN: true }), (elevation, qnh) => {
      expect(stationPressure(qnh, 0)).toBeCloseTo(qnh, 6);
      expect(stationPressure(101_325, elevation)).toBeCloseTo(standardAirAt(elevation).pressure, 6);
    }),
  );
});

// The altimeter-setting equation of the Smithsonian Meteorological Tables (from memory), in hPa and metres. Its
// 0.3 hPa stands for an instrument 10 ft above the elevation, and is left out here.
test('QNH agrees with the altimeter-setting equation of the Smithsonian Meteorological Tables', () => {
  const setting = (p: number, elevation: number) => {
    const n = 0.190284;
    return p * (1 + ((1013.25 ** n * 0.0065) / 288) * (elevation / p ** n)) ** (1 / n);
  };
  for (const elevation of [100, 500, 1500]) {
    const station = stationPressure(98_000, elevation) / 100;
    expect(Math.abs(setting(station, elevation) - 980)).toBeLessThan(0.2);
  }
});

test('higher QNH or lower elevation means more pressure', () => {
  expect(stationPressure(102_000, 300)).toBeGreaterThan(stationPressure(101_000, 300));
  expect(stationPressure(101_000, 200)).toBeGreaterThan(stationPressure(101_000, 300));
});

test('common practice, no source: near the ground 8.3 m of height are about 1 hPa', () => {
  expect((101_325 - stationPressure(101_325, 83)) / 100).toBeCloseTo(10, 0);
});
