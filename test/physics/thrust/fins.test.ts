import fc from 'fast-check';
import { expect, test } from 'vitest';
import { finForce, finSlope, finsOf } from '../../../src/physics/thrust/fins.ts';
import { finPart, stateWith } from './thrustFixture.ts';

const fins = finsOf(stateWith([finPart()]));
const [fin] = fins;
const RHO = 1.225;

test('slope of the normal force: πA/2 for a very low fin (R. T. Jones), 2π for an endless one (thin-wing theory)', () => {
  expect(finSlope(1e-3) / ((Math.PI * 1e-3) / 2)).toBeCloseTo(1, 3);
  expect(finSlope(1e6) / (2 * Math.PI)).toBeCloseTo(1, 5);
  // Helmbold’s formula worked by hand: A = 1, 2π/(2 + √5).
  expect(finSlope(1)).toBeCloseTo(1.4833, 4);
});

test('small angles: q S a β; square to the stream: a plate of 1.2', () => {
  const [speed, angle] = [3, 1e-4];
  const force = finForce(fin!, RHO, speed * Math.cos(angle), speed * Math.sin(angle));
  expect(-force / (0.5 * RHO * 9 * 0.12 * finSlope(1.2) * angle)).toBeCloseTo(1, 3);
  expect(finForce(fin!, RHO, 0, 2)).toBeCloseTo(-0.5 * RHO * 4 * 0.12 * 1.2, 12);
});

test('it opposes the motion square to the fin, and is the same forwards, backwards and mirrored', () => {
  const speed = fc.double({ min: -10, max: 10, noNaN: true });
  fc.assert(
    fc.property(speed, speed, (along, across) => {
      const force = finForce(fin!, RHO, along, across);
      expect(force * across).toBeLessThanOrEqual(0);
      expect(finForce(fin!, RHO, -along, across)).toBe(force);
      expect(finForce(fin!, RHO, along, -across)).toBeCloseTo(-force, 12);
    }),
  );
});

test('four fins in a ring stand at a quarter turn from each other, the first on top', () => {
  expect(fins.map(({ clock }) => clock)).toEqual(
    [0, 1, 2, 3].map((i) => expect.closeTo((i * Math.PI) / 2, 12)),
  );
  expect(fin!.at[2]).toBeGreaterThan(0.15);
  expect(finsOf(stateWith([finPart({ fin: null })]))).toEqual([]);
});
