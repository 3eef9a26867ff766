import fc from 'fast-check';
import { expect, test } from 'vitest';
import { QUANTITIES, type Quantity } from '../../src/units/quantities.ts';
import { siSymbolOf, typedUnitsOf, type UnitSystem, unitOf } from '../../src/units/units.ts';

const quantities = Object.keys(QUANTITIES) as Quantity[];
const systems: UnitSystem[] = ['metric', 'imperial'];
const to = (quantity: Quantity, system: UnitSystem, si: number) => unitOf(quantity, system).toDisplay(si);

test('every quantity goes to the screen and back unchanged', () => {
  fc.assert(
    fc.property(
      fc.constantFrom(...quantities),
      fc.constantFrom(...systems),
      fc.double({ min: -1e6, max: 1e6, noNaN: true }),
      (quantity, system, si) => {
        const unit = unitOf(quantity, system);
        const back = unit.fromDisplay(unit.toDisplay(si));
        expect(Math.abs(back - si)).toBeLessThanOrEqual(1e-12 * (Math.abs(si) + 1000));
      },
    ),
  );
});

test('a larger value shows larger, in either system', () => {
  for (const quantity of quantities) {
    for (const system of systems) expect(to(quantity, system, 2)).toBeGreaterThan(to(quantity, system, 1));
  }
});

test('yard and pound of 1959: 16 oz are 0.45359237 kg, 36 in are 0.9144 m, exactly', () => {
  expect(to('mass', 'imperial', 0.45359237)).toBeCloseTo(16, 13);
  expect(to('length', 'imperial', 0.9144)).toBeCloseTo(36, 13);
  expect(to('elevation', 'imperial', 0.3048)).toBeCloseTo(1, 14);
});

// NIST SP 811 (2008), appendix B.8, seven digits as printed (from memory): factors from the unit to SI.
test.each([
  ['volume', 2.831685e-2],
  ['area', 9.290304e-2],
  ['density', 1.601846e1],
  ['arealDensity', 3.390575e-2],
  ['pressure', 3.386389e3],
  ['gaugePressure', 2.490889e2],
  ['speed', 4.4704e-1],
  ['force', 2.780139e-1],
  ['inertia', 4.214011e-2],
] as const)('one imperial unit of %s is %f in SI (NIST SP 811)', (quantity, si) => {
  expect(unitOf(quantity, 'imperial').fromDisplay(1) / si).toBeCloseTo(1, 6);
});

test('temperatures: −40 is the same in °C and °F, water freezes at 32 °F and boils at 212 °F', () => {
  expect(unitOf('temperature', 'imperial').fromDisplay(-40)).toBeCloseTo(233.15, 12);
  expect(unitOf('temperature', 'metric').fromDisplay(-40)).toBeCloseTo(233.15, 12);
  expect(to('temperature', 'imperial', 273.15)).toBeCloseTo(32, 12);
  expect(to('temperature', 'imperial', 373.15)).toBeCloseTo(212, 12);
});

test('a temperature difference has no zero of its own: 5 K are 9 °F and 5 °C', () => {
  expect(to('temperatureDifference', 'imperial', 5)).toBeCloseTo(9, 12);
  const celsius = typedUnitsOf('temperatureDifference').find(({ symbol }) => symbol === '°C');
  expect(celsius?.fromDisplay(5)).toBe(5);
});

test('derived units: 1 g 1 m aft is 1 g·m; 1 rad/kg is 0.0573 °/g; 29.92 inHg is 1013.2 hPa', () => {
  expect(to('momentMass', 'metric', 0.001)).toBeCloseTo(1, 14);
  expect(to('anglePerMass', 'metric', 1)).toBeCloseTo(180 / Math.PI / 1000, 14);
  expect(to('momentPerAngle', 'metric', 180 / Math.PI)).toBeCloseTo(1, 14);
  expect(unitOf('pressure', 'imperial').fromDisplay(29.92)).toBeCloseTo(101320.76, 2);
});

test('a mechanical horsepower is 745.69987 W (NIST SP 811, appendix B.8: 550 ft·lbf/s)', () => {
  const horsepower = typedUnitsOf('power').find(({ symbol }) => symbol === 'hp');
  expect(horsepower?.fromDisplay(1)).toBeCloseTo(745.69987, 5);
});

test('files and JSON are SI: kg, m, rad, K, Pa, m³', () => {
  const wanted = {
    mass: 'kg',
    smallLength: 'm',
    angle: 'rad',
    temperature: 'K',
    pressure: 'Pa',
    volume: 'm³',
    fraction: '',
  };
  for (const [quantity, symbol] of Object.entries(wanted))
    expect(siSymbolOf(quantity as Quantity)).toBe(symbol);
});

test('the SI unit can be typed for every quantity and has size 1', () => {
  for (const quantity of quantities) {
    const si = typedUnitsOf(quantity).find(({ symbol }) => symbol === siSymbolOf(quantity));
    expect(si?.fromDisplay(1.25)).toBe(1.25);
  }
});
