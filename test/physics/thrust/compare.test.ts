import { expect, test } from 'vitest';
import { comparePropellers } from '../../../src/physics/thrust/compare.ts';
import { dragOf } from '../../../src/physics/thrust/drag.ts';
import { discArea, idealPower } from '../../../src/physics/thrust/propeller.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { solvedValue, stateWith, thrusterOf, thrusterPart } from './thrustFixture.ts';

const pair = stateWith([
  thrusterPart({ place: { kind: 'free', x: 2, y: 0.6, z: 0 }, copies: { kind: 'pair' } }),
]);
const mixed = stateWith([
  thrusterPart(),
  partOf('small', { thruster: thrusterOf({ diameter: 0.1, thrust: { kind: 'measured', staticThrust: 2 } }) }),
]);
const comparison = solvedValue(comparePropellers(pair));

test('today’s thrust at rest and at top speed, where it is the drag', () => {
  expect(comparison.atRest).toEqual({ thrust: 2, speed: 0 });
  expect(comparison.atTop!.thrust).toBeCloseTo(dragOf(pair).at(comparison.atTop!.speed), 9);
});

test('at rest one of a pair costs √2, four 1/√2, the same area as today, two of half the diameter twice; today is not repeated', () => {
  const relative = comparison.choices.map(({ count, diameter, atRest }) => [
    count,
    Number(diameter.toFixed(4)),
    atRest.relative,
  ]);
  const near = (value: number) => expect.closeTo(value, 9);
  expect(relative).toEqual([
    [1, 0.2, near(Math.SQRT2)],
    [4, 0.2, near(Math.SQRT1_2)],
    [1, 0.2828, near(1)],
    [4, 0.1414, near(1)],
    [2, 0.1, near(2)],
    [4, 0.1, near(Math.SQRT2)],
    [1, 0.3, near(Math.SQRT2 / 1.5)],
    [1, 0.4, near(Math.SQRT1_2)],
  ]);
});

// Common practice, no source: one large propeller gives more thrust for its power than several small.
test('several small propellers need more power than one with a larger disc, at rest and at speed', () => {
  const { choices } = comparison;
  const two = choices.find(({ count }) => count === 2)!;
  const large = choices.at(-1)!;
  expect(large.area).toBeGreaterThan(two.area);
  expect(large.atRest.power).toBeLessThan(two.atRest.power);
  expect(large.atTop!.power).toBeLessThan(two.atTop!.power);
  // At speed the disc counts for less.
  expect(large.atTop!.relative).toBeGreaterThan(large.atRest.relative);
});

test('discs unequally loaded cost more than one of their area', () => {
  const { choices, today } = solvedValue(comparePropellers(mixed));
  const merged = choices.find(({ count, area }) => count === 1 && Math.abs(area - today.area) < 1e-12)!;
  expect(merged.atRest.relative).toBeLessThan(1);
  const [large, small] = [idealPower(1, discArea(0.2), 1.225), idealPower(2, discArea(0.1), 1.225)];
  expect(today.atRest).toBeCloseTo(large + small, 3);
});

test('no choice repeats today or another; each says the area of its discs', () => {
  for (const state of [stateWith([thrusterPart()]), pair, mixed]) {
    const { choices, today } = solvedValue(comparePropellers(state));
    const names = choices.map(({ count, diameter }) => `${count} of ${diameter.toFixed(6)}`);
    expect(new Set(names).size).toBe(names.length);
    if (state !== mixed) expect(names).not.toContain(`${today.count} of 0.200000`);
    for (const { count, diameter, area } of choices) expect(area).toBeCloseTo(count * discArea(diameter), 12);
  }
  expect(comparePropellers(stateWith([])).status).toBe('infeasible');
});
