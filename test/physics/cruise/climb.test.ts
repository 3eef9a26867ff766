import fc from 'fast-check';
import { expect, test } from 'vitest';
import { integrate } from '../../../src/numeric/ode.ts';
import { findRoot } from '../../../src/numeric/roots.ts';
import type { CraftState } from '../../../src/physics/craftState.ts';
import { climbCurve, steadyClimb } from '../../../src/physics/cruise/climb.ts';
import { cruisePitch } from '../../../src/physics/cruise/cruise.ts';
import { pitchCraftOf } from '../../../src/physics/cruise/pitchCraft.ts';
import { flightAt, loadsOn } from '../../../src/physics/cruise/pitchMoments.ts';
import type { AheadHelm } from '../../../src/physics/thrust/ahead.ts';
import { steadySpeed } from '../../../src/physics/thrust/speed.ts';
import { STANDARD_GRAVITY } from '../../../src/units/constants.ts';
import { degrees, finPart, solvedValue, turning } from '../thrust/thrustFixture.ts';
import { balanced, type Wanted } from './cruiseFixture.ts';

const fins = finPart({ fin: { area: 0.8, aspectRatio: 1.2 } });
const helmOf = (vector: number | null, throttle = 0.5): AheadHelm => ({ throttle, vector });

test('balanced, neutral and pushed through its CB it flies level and straight ahead', () => {
  const climb = solvedValue(steadyClimb(balanced(), helmOf(null, 0.1)));
  expect(climb.pitch).toBeCloseTo(0, 9);
  expect(climb.path).toBeCloseTo(0, 9);
  expect(climb.speed).toBeCloseTo(solvedValue(steadySpeed(balanced(), 0.1)), 8);
});

test('a heavy craft without thrust sinks level at the speed of its cross-flow drag, a light one rises as fast', () => {
  const at = (heaviness: number) => solvedValue(steadyClimb(balanced({ heaviness }), helmOf(null, 0)));
  // ½ρ C S w² = H: C between the printed 0.68 and 0.74 of finite cylinders (see pitchMoments.test.ts), S = π.
  const [least, most] = [0.74, 0.68].map((c) =>
    Math.sqrt((0.05 * STANDARD_GRAVITY) / (0.5 * 1.225 * c * Math.PI)),
  );
  expect(-at(0.05).climbRate).toBeGreaterThan(least!);
  expect(-at(0.05).climbRate).toBeLessThan(most!);
  expect(at(-0.05).climbRate).toBeCloseTo(-at(0.05).climbRate, 9);
  expect(at(0.05).path).toBeCloseTo(-90 * degrees, 9);
  expect(at(0)).toMatchObject({ speed: 0, climbRate: 0, path: 0 });
});

test('thrust straight up at the CB lifts it straight up', () => {
  const state = balanced({ thrusterAft: 0, thruster: { pitch: turning() } });
  const climb = solvedValue(steadyClimb(state, helmOf(90 * degrees)));
  expect(climb.path).toBeCloseTo(90 * degrees, 6);
  expect(climb.climbRate).toBeCloseTo(climb.speed, 9);
});

const settings = fc.record({
  aft: fc.double({ min: -0.015, max: 0.015, noNaN: true }),
  thrusterAft: fc.double({ min: -1, max: 1, noNaN: true }),
  thrusterHeight: fc.double({ min: -0.6, max: 0.2, noNaN: true }),
  heaviness: fc.double({ min: -0.02, max: 0.02, noNaN: true }),
});

const vectored = (wanted: Wanted): CraftState =>
  balanced({ ...wanted, thruster: { pitch: turning() }, parts: [fins] });

test('the forces balance along and square to the path, and so do the moments', () => {
  fc.assert(
    fc.property(settings, fc.double({ min: -1.4, max: 1.4, noNaN: true }), (wanted, vector) => {
      const state = vectored(wanted);
      const climb = steadyClimb(state, helmOf(vector, 0.3));
      fc.pre(climb.status === 'solved');
      const { pitch, attack, speed, path, climbRate } = climb.value;
      const craft = pitchCraftOf(state);
      const loads = loadsOn(craft, helmOf(vector, 0.3), flightAt(speed, attack, pitch));
      expect(loads.forward * Math.cos(pitch) - loads.up * Math.sin(pitch)).toBeCloseTo(0, 8);
      expect(loads.forward * Math.sin(pitch) + loads.up * Math.cos(pitch)).toBeCloseTo(craft.heaviness, 8);
      expect(loads.moment).toBeCloseTo(0, 8);
      expect(climbRate).toBeCloseTo(speed * Math.sin(path), 9);
    }),
    { numRuns: 40 },
  );
});

test('where the path is level it is the cruise of cruise.ts, with nothing left over', () => {
  const wanted = { aft: 0.004, thrusterAft: 0.3, thrusterHeight: -0.4, heaviness: 0.01 };
  const path = (vector: number) => solvedValue(steadyClimb(vectored(wanted), helmOf(vector))).path;
  const level = solvedValue(findRoot(path, -1, 1));
  const climb = solvedValue(steadyClimb(vectored(wanted), helmOf(level)));
  const set = balanced({ ...wanted, thruster: { pitch: turning(level) }, parts: [fins] });
  const cruise = solvedValue(cruisePitch(set, { throttle: 0.5 }));
  expect(Math.abs(level)).toBeGreaterThan(1 * degrees);
  expect(cruise.rising).toBeCloseTo(0, 6);
  expect(cruise.pitch).toBeCloseTo(climb.pitch, 6);
  expect(cruise.speed).toBeCloseTo(climb.speed, 6);
});

/** The same forces stepped in time until all is still, with masses and damping that only decide how it gets there. */
function settled(state: CraftState, helm: AheadHelm): number[] {
  const craft = pitchCraftOf(state);
  const [along, across, inertia, damping] = [2.8, 4.6, 3, 4];
  const flown = integrate(
    (_, [u, w, rate, pitch], into) => {
      const { forward, up, moment } = loadsOn(craft, helm, { u: u!, w: w!, pitch: pitch! });
      into[0] = (forward - craft.heaviness * Math.sin(pitch!) + across * w! * rate!) / along;
      into[1] = (up - craft.heaviness * Math.cos(pitch!) - along * u! * rate!) / across;
      into[2] = (moment - damping * rate!) / inertia;
      into[3] = rate!;
    },
    0,
    [0, 0, 0, 0],
    600,
  );
  return [...solvedValue(flown).last];
}

test.each([
  [{ thrusterAft: 0, thrusterHeight: -0.6 }, 40],
  [{ thrusterAft: 1.5, aft: 0.01, heaviness: 0.03 }, -50],
  [{ thrusterAft: -1, thrusterHeight: -0.3, heaviness: -0.04 }, 75],
])('the motion stepped in time settles on it: %o at %i°', (wanted, angle) => {
  const state = vectored(wanted);
  const helm = helmOf(angle * degrees, 0.3);
  const { pitch, attack, speed } = solvedValue(steadyClimb(state, helm));
  const [u, w, rate, last] = settled(state, helm);
  expect(rate).toBeCloseTo(0, 6);
  expect(last).toBeCloseTo(pitch, 5);
  expect(u).toBeCloseTo(speed * Math.cos(attack), 5);
  expect(w).toBeCloseTo(-speed * Math.sin(attack), 5);
});

test('the curve runs over all vectoring, and more thrust up climbs faster about level', () => {
  const curve = climbCurve(vectored({ thrusterAft: 0 }), 0.3);
  expect(curve).toHaveLength(37);
  expect([curve[0]!.vector, curve.at(-1)!.vector]).toEqual([-90 * degrees, 90 * degrees]);
  const rates = curve.slice(12, 25).map(({ climb }) => solvedValue(climb).climbRate);
  expect(rates).toEqual([...rates].sort((a, b) => a - b));
  expect(climbCurve(balanced())).toHaveLength(1);
});

test('faster than the critical speed it says that the nose may swing; too steep it is refused', () => {
  const fast = solvedValue(steadyClimb(balanced(), helmOf(null, 1)));
  expect(fast.cautions).toEqual([expect.stringMatching(/Munk moment overcomes/)]);
  const low = balanced({ thrusterAft: 0, thrusterHeight: -2, depth: 0.05 });
  expect(steadyClimb(low, helmOf(null, 0.8))).toMatchObject({
    status: 'infeasible',
    why: expect.stringMatching(/would pitch to/),
  });
});
