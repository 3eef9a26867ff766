import fc from 'fast-check';
import { expect, test } from 'vitest';
import { criticalSpeed } from '../../../src/physics/cruise/critical.ts';
import { cruisePitch } from '../../../src/physics/cruise/cruise.ts';
import { addedMassOf } from '../../../src/physics/hull/addedMass.ts';
import { volumeDragCoefficient } from '../../../src/physics/thrust/drag.ts';
import { steadySpeed } from '../../../src/physics/thrust/speed.ts';
import { STANDARD_GRAVITY } from '../../../src/units/constants.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { degrees, finPart, solvedValue, stateWith, turning } from '../thrust/thrustFixture.ts';
import { balanced } from './cruiseFixture.ts';

/** Large enough to hold the nose at any speed. */
const fins = finPart({ fin: { area: 0.8, aspectRatio: 1.2 } });

test('thrust through the CB along the axis does not pitch a level craft, at any speed below the critical', () => {
  const state = balanced();
  const critical = solvedValue(criticalSpeed(state)).speed!;
  for (const share of [0.1, 0.5, 0.99]) {
    const cruise = solvedValue(cruisePitch(state, { speed: share * critical }));
    expect(cruise.pitch).toBeCloseTo(0, 10);
  }
});

test('at no speed it floats as at rest', () => {
  const offset = fc.double({ min: -0.03, max: 0.03, noNaN: true });
  fc.assert(
    fc.property(offset, fc.double({ min: -0.2, max: 0.2, noNaN: true }), (aft, heaviness) => {
      const state = balanced({ aft, heaviness });
      const at = (speed: number) => solvedValue(cruisePitch(state, { speed }));
      expect(at(0).pitch).toBeCloseTo(Math.atan2(aft, 0.1), 12);
      expect(at(0.01).pitch).toBeCloseTo(Math.atan2(aft, 0.1), 4);
      expect(at(0).throttle).toBe(0);
    }),
    { numRuns: 30 },
  );
});

test('level craft: straight ahead, so its speed is that of speed.ts', () => {
  const state = balanced({ parts: [fins] });
  const cruise = solvedValue(cruisePitch(state, { throttle: 0.5 }));
  expect(cruise.speed).toBeCloseTo(solvedValue(steadySpeed(state, 0.5)), 8);
  expect(cruise.rising).toBeCloseTo(0, 9);
});

test('the moments add up to nil, and the drawn craft is pitched to the side of its couple', () => {
  const low = balanced({ thrusterAft: 0, thrusterHeight: -0.7, parts: [fins] });
  const cruise = solvedValue(cruisePitch(low, { throttle: 0.5 }));
  expect(Object.values(cruise.terms).reduce((sum, each) => sum + each, 0)).toBeCloseTo(0, 9);
  expect(cruise.pitch).toBeGreaterThan(0);
  expect(cruise.terms.thrust).toBeGreaterThan(0);
  expect(cruise.terms.depth).toBeLessThan(0);
  const high = balanced({ thrusterAft: 0, thrusterHeight: 0.7, parts: [fins] });
  expect(solvedValue(cruisePitch(high, { throttle: 0.5 })).pitch).toBeCloseTo(-cruise.pitch, 8);
});

test('a pod below the CB and nothing else pitches the nose down', () => {
  const pod = partOf('pod', { place: { kind: 'free', x: 2, y: 0, z: -0.6 }, dragArea: 0.05 });
  const cruise = solvedValue(cruisePitch(balanced({ parts: [fins, pod] }), { speed: 1.5 }));
  expect(cruise.pitch).toBeLessThan(0);
});

/** A bare spheroid with its thruster under the CB, balance written out by hand and halved to. */
test('bare hull, thruster below: W g h sin θ = T d + (k₃ − k₁) ρV ½U² sin 2θ, T from drag along the path', () => {
  const [height, depth, speed] = [-0.7, 0.15, 1.2];
  const state = balanced({ depth, thrusterAft: 0, thrusterHeight: height });
  const { density } = state.air;
  const { volume } = state.hull;
  const { heave, surge } = addedMassOf(state.hull);
  const left = (pitch: number): number => {
    const [u, w] = [speed * Math.cos(pitch), speed * Math.sin(pitch)];
    const drag = 0.5 * density * u * u * volume ** (2 / 3) * volumeDragCoefficient((u * 4) / 1.4607e-5, 4);
    // Of a cylinder about four diameters long, 0.73 on the outline: hardly a part of it at these angles.
    const cross = 0.5 * density * 0.73 * Math.PI * w * w * Math.sign(w);
    const thrust = drag + cross * Math.tan(pitch);
    const munk = (heave - surge) * density * volume * 0.5 * speed ** 2 * Math.sin(2 * pitch);
    const weight = state.loading.solid.mass * STANDARD_GRAVITY * depth * Math.sin(pitch);
    return -height * thrust + munk - weight;
  };
  let [low, high] = [0, 0.5];
  for (let i = 0; i < 60; i += 1) {
    const middle = (low + high) / 2;
    if (left(middle) > 0) low = middle;
    else high = middle;
  }
  const { pitch } = solvedValue(cruisePitch(state, { speed }));
  expect(low).toBeGreaterThan(1 * degrees);
  expect(Math.abs(pitch / low - 1)).toBeLessThan(0.005);
});

test('asked by throttle or by the speed that it gives, it is the same cruise', () => {
  const throttle = fc.double({ min: 0.05, max: 1, noNaN: true });
  const height = fc.double({ min: -0.7, max: 0.3, noNaN: true });
  fc.assert(
    fc.property(throttle, height, fc.double({ min: -0.02, max: 0.02, noNaN: true }), (share, z, aft) => {
      const state = balanced({
        aft,
        heaviness: 0.05,
        thrusterAft: 0.2,
        thrusterHeight: z,
        thruster: { pitch: turning(10 * degrees) },
        parts: [fins],
      });
      const byThrottle = solvedValue(cruisePitch(state, { throttle: share }));
      const bySpeed = solvedValue(cruisePitch(state, { speed: byThrottle.speed }));
      expect(bySpeed.pitch).toBeCloseTo(byThrottle.pitch, 7);
      expect(bySpeed.throttle).toBeCloseTo(share, 7);
      expect(bySpeed.thrust).toBeCloseTo(byThrottle.thrust, 7);
    }),
    { numRuns: 25 },
  );
});

test('from the critical speed on no attitude is given, and the sentence names both speeds', () => {
  const state = balanced({ aft: 0.001 });
  const critical = solvedValue(criticalSpeed(state)).speed!;
  expect(cruisePitch(state, { speed: 0.98 * critical }).status).toBe('solved');
  expect(cruisePitch(state, { speed: 1.02 * critical })).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining(`{${critical} speed}`),
  });
  expect(solvedValue(steadySpeed(state, 1))).toBeGreaterThan(2 * critical);
  expect(cruisePitch(state, { throttle: 1 })).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining(`{${critical} speed}`),
  });
});

test('why not: no thruster, too steep at rest, too little thrust, thrust backwards, couple too strong', () => {
  const why = (answer: ReturnType<typeof cruisePitch>) => (answer.status === 'infeasible' ? answer.why : '');
  expect(why(cruisePitch(stateWith([]), { throttle: 1 }))).toBe('No part has the figures of a thruster.');
  expect(why(cruisePitch(balanced({ aft: 0.3 }), { throttle: 1 }))).toMatch(/too steep to fly/);
  expect(why(cruisePitch(balanced({ depth: 2, parts: [fins] }), { speed: 7 }))).toMatch(
    /of thrust; the thrusters give/,
  );
  const backwards = balanced({ thruster: { pitch: turning(150 * degrees, 180 * degrees) } });
  expect(why(cruisePitch(backwards, { throttle: 1 }))).toMatch(/does not move ahead/);
  const brake = partOf('brake', { place: { kind: 'axis', station: 2 }, dragArea: 2 });
  const strong = balanced({ thrusterAft: 0, thrusterHeight: -1.5, parts: [brake] });
  expect(why(cruisePitch(strong, { throttle: 1 }))).toMatch(/no attitude within/);
});

test('a steep angle of attack is told', () => {
  const state = balanced({ aft: 0.04, parts: [fins] });
  expect(solvedValue(cruisePitch(state, { speed: 0.5 })).cautions).toEqual([
    expect.stringMatching(/fins stall/),
  ]);
});
