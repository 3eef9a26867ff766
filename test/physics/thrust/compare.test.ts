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

test('as today costs as today; at rest one of a pair costs √2, four cost 1/√2, twice the diameter of one 1/√2', () => {
  const relative = comparison.choices.map(({ count, diameter, atRest }) => [
    count,
    Number(diameter.toFixed(4)),
    atRest.relative,
  ]);
  const near = (value: number) => expect.closeTo(value, 9);
  expect(relative).toEqual([
    [1, 0.2, near(Math.SQRT2)],
    [2, 0.2, near(1)],
    [4, 0.2, near(Math.SQRT1_2)],
    [1, 0.2828, near(1)],
    [1, 0.3, near(Math.SQRT2 / 1.5)],
    [1, 0.4, near(Math.SQRT1_2)],
  ]);
});

// Common practice, no source: one large propeller gives more thrust for its power than several small.
test('several small propellers need more power than one with a larger disc, at rest and at speed', () => {
  const { choices } = comparison;
  const two = choices.find(({ count }) => count === 2)!;
  const large = choices.at(-1)!;
  expect(large.diameter).toBeGreaterThan(Math.SQRT2 * two.diameter);
  expect(large.atRest.power).toBeLessThan(two.atRest.power);
  expect(large.atTop!.power).toBeLessThan(two.atTop!.power);
  // At speed the disc counts for less.
  expect(large.atTop!.relative).toBeGreaterThan(large.atRest.relative);
});

test('discs unequally loaded cost more than one of their area', () => {
  const { choices, today } = solvedValue(comparePropellers(mixed));
  const merged = choices.find(({ diameter }) => Math.abs(discArea(diameter) - today.area) < 1e-12)!;
  expect(merged.atRest.relative).toBeLessThan(1);
  const [large, small] = [idealPower(1, discArea(0.2), 1.225), idealPower(2, discArea(0.1), 1.225)];
  expect(today.atRest).toBeCloseTo(large + small, 3);
});

test('one thruster has no second choice of its own area; none has no choice', () => {
  const single = solvedValue(comparePropellers(stateWith([thrusterPart()])));
  expect(single.choices).toHaveLength(5);
  expect(single.choices[0]!.atRest.relative).toBe(1);
  expect(comparePropellers(stateWith([])).status).toBe('infeasible');
});
