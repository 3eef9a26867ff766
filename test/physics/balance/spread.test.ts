import { expect, test } from 'vitest';
import { covarianceOf, spreadOf, standardOf } from '../../../src/physics/balance/spread.ts';
import { pointMass, sumsOf } from '../../../src/physics/mass/body.ts';

test('one mass: its own uncertainty, and its lever for the CG', () => {
  const bodies = [pointMass(1, [0, 0, 0]), pointMass(1, [2, 0, 0])];
  const covariance = covarianceOf([{ u: 0.01, at: [[2, 0, 0]] }]);
  const sums = sumsOf(bodies);
  expect(spreadOf(({ mass }) => mass, sums, covariance)).toBeCloseTo(0.01, 12);
  // dx_G/dm = (x − x_G)/W = (2 − 1)/2
  expect(spreadOf(({ mass, moment }) => moment[0] / mass, sums, covariance)).toBeCloseTo(0.005, 6);
});

test('pieces that share one mass err together; separate ones do not', () => {
  const sums = sumsOf([pointMass(1, [1, 0, 0]), pointMass(1, [1, 0, 0])]);
  const shared = covarianceOf([
    {
      u: 0.01,
      at: [
        [1, 0, 0],
        [1, 0, 0],
      ],
    },
  ]);
  const apart = covarianceOf([
    { u: 0.01, at: [[1, 0, 0]] },
    { u: 0.01, at: [[1, 0, 0]] },
  ]);
  expect(spreadOf(({ mass }) => mass, sums, shared)).toBeCloseTo(0.02, 12);
  expect(spreadOf(({ mass }) => mass, sums, apart)).toBeCloseTo(0.01 * Math.SQRT2, 12);
});

test('a pair that errs together never heels the craft', () => {
  const sums = sumsOf([pointMass(1, [1, 0.4, -0.3]), pointMass(1, [1, -0.4, -0.3])]);
  const pair = covarianceOf([
    {
      u: 0.05,
      at: [
        [1, 0.4, -0.3],
        [1, -0.4, -0.3],
      ],
    },
  ]);
  expect(spreadOf(({ moment }) => moment[1], sums, pair)).toBe(0);
});

test('first order agrees with a Monte Carlo of rectangular masses (JCGM 101)', () => {
  const parts = [
    { mass: 0.35, tolerance: 0.02, at: [1.5, 0, 0] as const },
    { mass: 0.11, tolerance: 0.01, at: [2.97, 0, 0] as const },
    { mass: 0.14, tolerance: 0.01, at: [1.45, 0, -0.54] as const },
    { mass: 0.17, tolerance: 0.015, at: [1.3, 0, -0.53] as const },
  ];
  const figure = ({ moment: [x, , z], mass }: { mass: number; moment: readonly [number, number, number] }) =>
    Math.atan2(x - 1.5 * mass, -z);
  const covariance = covarianceOf(parts.map(({ tolerance, at }) => ({ u: standardOf(tolerance), at: [at] })));
  const first = spreadOf(figure, sumsOf(parts.map(({ mass, at }) => pointMass(mass, at))), covariance)!;
  let seed = 12_345;
  const random = () => {
    seed = (1_103_515_245 * seed + 12_345) % 2_147_483_648;
    return seed / 2_147_483_648;
  };
  const tries = Array.from({ length: 20_000 }, () =>
    figure(
      sumsOf(parts.map(({ mass, tolerance, at }) => pointMass(mass + tolerance * (2 * random() - 1), at))),
    ),
  );
  const mean = tries.reduce((sum, each) => sum + each, 0) / tries.length;
  const spread = Math.sqrt(tries.reduce((sum, each) => sum + (each - mean) ** 2, 0) / (tries.length - 1));
  expect(Math.abs(first / spread - 1)).toBeLessThan(0.03);
});

test('no tolerance, no uncertainty', () => {
  expect(spreadOf(({ mass }) => mass, sumsOf([pointMass(1, [0, 0, 0])]), covarianceOf([]))).toBe(0);
});
