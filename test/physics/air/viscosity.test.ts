import { expect, test } from 'vitest';
import { standardAirAt } from '../../../src/physics/air/standardAtmosphere.ts';
import { airViscosity, kinematicViscosity } from '../../../src/physics/air/viscosity.ts';

// U.S. Standard Atmosphere, 1976, table of viscosity: sea level, and 5000 m (from memory).
test.each([
  [288.15, 1.7894e-5],
  [255.676, 1.6282e-5],
])('US Standard Atmosphere 1976: at %f K %f Pa·s', (temperature, viscosity) => {
  expect(airViscosity(temperature) / viscosity).toBeCloseTo(1, 4);
});

test('US Standard Atmosphere 1976 (from memory): at sea level ν = 1.4607e-5 m²/s', () => {
  expect(kinematicViscosity(standardAirAt(0)) / 1.4607e-5).toBeCloseTo(1, 4);
});

// Linstrom & Mallard, NIST Chemistry WebBook (from memory): air at 300 K and 1 bar, 18.5 µPa·s.
test('at 300 K within 0.5 % of 18.5 µPa·s', () => {
  expect(Math.abs(airViscosity(300) / 18.5e-6 - 1)).toBeLessThan(0.005);
});
