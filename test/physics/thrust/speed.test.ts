import fc from 'fast-check';
import { expect, test } from 'vitest';
import { volumeDragCoefficient } from '../../../src/physics/thrust/drag.ts';
import { pitchSpeedCautions, speedCurve, steadySpeed, topSpeed } from '../../../src/physics/thrust/speed.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { degrees, finPart, solvedValue, stateWith, thrusterPart, turning } from './thrustFixture.ts';

const withThrust = (staticThrust: number, speed = 8) =>
  stateWith([
    thrusterPart({}, { thrust: { kind: 'measured', staticThrust }, pitchSpeed: { kind: 'given', speed } }),
  ]);

test('top speed of a bare hull is where the line of thrust meets Hoerner’s drag', () => {
  const state = withThrust(1);
  const top = solvedValue(topSpeed(state));
  // ν of the US Standard Atmosphere at sea level, 1.4607e-5 m²/s (from memory).
  const coefficient = volumeDragCoefficient((top * 4) / 1.4607e-5, 4);
  const drag = 0.5 * 1.225 * top ** 2 * state.hull.volume ** (2 / 3) * coefficient;
  expect(drag).toBeCloseTo(1 - top / 8, 4);
});

test('with endless pitch speed a constant thrust meets drag at (T/k)^(6/11)', () => {
  const slow = solvedValue(topSpeed(withThrust(0.1, 200)));
  const fast = solvedValue(topSpeed(withThrust(0.2, 200)));
  // The pitch speed of 200 m/s still takes half a per cent.
  expect(fast / slow).toBeCloseTo(2 ** (6 / 11), 2);
});

test('more throttle or less drag is faster, never beyond the pitch speed', () => {
  const thrust = fc.double({ min: 0.01, max: 50, noNaN: true });
  const throttle = fc.double({ min: 0.05, max: 1, noNaN: true });
  fc.assert(
    fc.property(thrust, throttle, (newtons, share) => {
      const state = withThrust(newtons);
      const speed = solvedValue(steadySpeed(state, share));
      expect(speed).toBeLessThan(8 * Math.sqrt(share));
      expect(solvedValue(topSpeed(state))).toBeGreaterThanOrEqual(speed);
    }),
    { numRuns: 30 },
  );
  const finned = stateWith([finPart(), thrusterPart()]);
  expect(solvedValue(topSpeed(finned))).toBeLessThan(solvedValue(topSpeed(withThrust(1))));
});

test('no throttle is no speed; no thruster, or one that points backwards, is told', () => {
  expect(steadySpeed(withThrust(1), 0)).toEqual({ status: 'solved', value: 0 });
  expect(topSpeed(stateWith([partOf('motor', { kind: 'thruster' })]))).toMatchObject({
    status: 'infeasible',
    why: 'No part has the figures of a thruster.',
  });
  const backwards = stateWith([thrusterPart({}, { pitch: turning(120 * degrees, 180 * degrees) })]);
  expect(topSpeed(backwards)).toMatchObject({
    status: 'infeasible',
    why: expect.stringMatching(/\{-0\.(4999|5).* force\}/),
  });
});

test('the curve runs from rest through the steady speed, thrust above drag before it and below after it', () => {
  const state = stateWith([
    finPart(),
    thrusterPart({}, { thrust: { kind: 'power', shaftPower: 12, figureOfMerit: 0.5 } }),
  ]);
  const top = solvedValue(topSpeed(state));
  const curve = speedCurve(state);
  expect(curve).toHaveLength(41);
  expect(curve.at(-1)!.speed).toBeCloseTo(1.2 * top, 12);
  for (const { speed, thrust, drag, hull, fins, pods } of curve) {
    expect(Math.sign(thrust - drag)).toBe(Math.sign(top - speed));
    expect(hull + fins + pods).toBeCloseTo(drag, 12);
  }
  expect(curve[0]!.shaftPower).toBeCloseTo(12, 9);
  expect(curve[0]!.idealPower).toBeCloseTo(6, 9);
  expect(speedCurve(withThrust(1))[0]!.shaftPower).toBeNull();
});

// Common practice, no source.
test('a pitch speed below 5 m/s is told, for flying outdoors', () => {
  expect(pitchSpeedCautions(withThrust(1, 4.2))).toEqual([expect.stringContaining('{4.2 speed}')]);
  expect(pitchSpeedCautions(withThrust(1, 5))).toEqual([]);
});
