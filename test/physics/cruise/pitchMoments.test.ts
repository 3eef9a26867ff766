import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { CraftState } from '../../../src/physics/craftState.ts';
import { pitchCraftOf } from '../../../src/physics/cruise/pitchCraft.ts';
import { flightAt, loadsOn, type PitchTerms } from '../../../src/physics/cruise/pitchMoments.ts';
import { addedMassOf } from '../../../src/physics/hull/addedMass.ts';
import { finForce } from '../../../src/physics/thrust/fins.ts';
import { STANDARD_GRAVITY } from '../../../src/units/constants.ts';
import { partOf } from '../../edit/craftFixture.ts';
import { degrees, finPart, stateWith, thrusterPart, turning } from '../thrust/thrustFixture.ts';
import { balanced } from './cruiseFixture.ts';

const AHEAD = { throttle: 1, vector: null };

const termsOf = (state: CraftState, speed: number, attack: number, pitch = attack): PitchTerms =>
  loadsOn(pitchCraftOf(state), AHEAD, flightAt(speed, attack, pitch)).terms;

// Munk couple (k₂ − k₁) q V sin 2α: NACA TR-184; the value computed from it: 4 × 1 m, ρ 1.2, 2 m/s, 10° give 1.338 N·m.
test('Munk moment of a 4 × 1 m spheroid at 10° and 2 m/s in air of 1.2 kg/m³: 1.338 N·m nose-up', () => {
  const state = balanced();
  const light = { ...state, air: { ...state.air, density: 1.2 } };
  expect(termsOf(light, 2, 10 * degrees).munk).toBeCloseTo(1.338, 3);
});

test('Munk moment is how the kinetic energy of the air grows with the angle of attack', () => {
  const state = balanced();
  const { surge, heave } = addedMassOf(state.hull);
  const air = state.air.density * state.hull.volume;
  const energy = (attack: number) =>
    0.5 * air * 9 * (surge * Math.cos(attack) ** 2 + heave * Math.sin(attack) ** 2);
  for (const attack of [-0.6, 0.1, 0.5]) {
    const slope = (energy(attack + 1e-5) - energy(attack - 1e-5)) / 2e-5;
    expect(termsOf(state, 3, attack).munk).toBeCloseTo(slope, 6);
  }
});

test('weight and lift: the moment is −dE/dθ of the potential energy of every mass and of the lift', () => {
  const state = balanced({ heaviness: 0.1, aft: 0.07, depth: 0.12, thrusterHeight: -0.6 });
  const [bx, , bz] = state.loading.cb;
  // Height of a point above the CB when the nose is up by θ: stations aft sink, heights shorten.
  const energy = (pitch: number) =>
    STANDARD_GRAVITY *
    state.bodies.reduce(
      (sum, { mass, cg: [x, , z] }) => sum + mass * ((z - bz) * Math.cos(pitch) - (x - bx) * Math.sin(pitch)),
      0,
    );
  for (const pitch of [-1, 0, 0.3]) {
    const { tailHeaviness, depth } = termsOf(state, 0, 0, pitch);
    const slope = (energy(pitch + 1e-5) - energy(pitch - 1e-5)) / 2e-5;
    expect(tailHeaviness + depth).toBeCloseTo(-slope, 7);
  }
});

/** r × F about the CB, in hull axes x aft, z up; its y component turns the nose up. */
const crossed = ([x, z]: readonly [number, number], [fx, fz]: readonly [number, number]): number =>
  z * fx - x * fz;

test('thrust and drag of what hangs below, as vectors crossed in hull axes', () => {
  const pod = partOf('pod', { place: { kind: 'free', x: 1.5, y: 0, z: -0.6 }, dragArea: 0.02 });
  const angle = 25 * degrees;
  const state = balanced({
    thrusterAft: 0.5,
    thrusterHeight: -0.7,
    thruster: { pitch: turning(angle) },
    parts: [pod],
  });
  const [terms, q] = [termsOf(state, 2, 0), 0.5 * state.air.density * 4];
  const thrust = 1 - (2 * Math.cos(angle)) / 8;
  const push = [-thrust * Math.cos(angle), thrust * Math.sin(angle)] as const;
  expect(terms.thrust).toBeCloseTo(crossed([0.5, -0.7], push), 12);
  expect(terms.podDrag).toBeCloseTo(crossed([-0.5, -0.6], [q * 0.02, 0]), 12);
  expect(terms.podDrag).toBeLessThan(0);
});

test('fins: level ones behind the CB turn the nose down at an angle of attack, upright ones do not', () => {
  const state = balanced({ parts: [finPart()] });
  const flight = flightAt(3, 0.1, 0.1);
  const { terms, up } = loadsOn(pitchCraftOf(state), { throttle: 0, vector: null }, flight);
  const fin = pitchCraftOf(state).fins.find(({ clock }) => Math.abs(clock - Math.PI / 2) < 1e-9)!;
  const lift = 2 * Math.abs(finForce(fin, state.air.density, flight.u, flight.w));
  expect(terms.fins).toBeCloseTo(-(fin.at[0] - 2) * lift, 9);
  expect(up).toBeGreaterThan(lift);
});

test('a ring of fins turned by an eighth gives the same moment at small angles', () => {
  const at = (clock: number) =>
    balanced({ parts: [finPart({ place: { kind: 'skin', station: 3.5, clock, standoff: 0.15 } })] });
  const moment = (clock: number) => termsOf(at(clock), 3, 1e-4).fins;
  expect(moment(Math.PI / 4) / moment(0)).toBeCloseTo(1, 3);
});

test('cross-flow: between two printed finite cylinders, at the CB of a spheroid', () => {
  const { up, terms } = loadsOn(
    pitchCraftOf(balanced()),
    { throttle: 0, vector: null },
    { u: 0, w: 1.5, pitch: 0 },
  );
  // Cylinder broadside, length over diameter 2 and 5: 0.68 and 0.74 (Aeronautical Engineer’s Data Book, p. 95).
  const coefficient = -up / (0.5 * 1.225 * 1.5 ** 2 * Math.PI);
  expect(coefficient).toBeGreaterThan(0.68);
  expect(coefficient).toBeLessThan(0.74);
  expect(terms.crossFlow).toBeCloseTo(0, 9);
});

test('cross-flow on a hull with a long tail acts behind its CB: strips added one by one', () => {
  const shape = { kind: 'twoSpheroid', foreLength: 1, aftLength: 3, diameter: 1 } as const;
  const state = stateWith([thrusterPart()], shape);
  const craft = pitchCraftOf(state);
  let [area, moment] = [0, 0];
  for (let x = 0.0005; x < 4; x += 0.001) {
    const strip = 2 * state.hull.radius(x, Math.PI / 2) * 0.001;
    area += strip;
    moment += strip * (state.hull.cbStation - x);
  }
  expect(craft.crossFlow.ahead).toBeCloseTo(moment / area, 4);
  expect(craft.crossFlow.ahead).toBeLessThan(-0.05);
  // Moving up, the air pushes the tail down.
  expect(loadsOn(craft, AHEAD, { u: 0, w: 1, pitch: 0 }).terms.crossFlow).toBeGreaterThan(0);
});

test('top and bottom exchanged, air and thrust pitch the craft the other way', () => {
  const parts = (sign: 1 | -1) => [
    partOf('pod', { place: { kind: 'free', x: 1.5, y: 0, z: -0.6 * sign }, dragArea: 0.02 }),
    finPart({
      place: { kind: 'free', x: 3.5, y: 0.2, z: -0.4 * sign },
      copies: { kind: 'pair' },
      fin: { area: 0.1, aspectRatio: 1.5 },
    }),
  ];
  const craftOf = (sign: 1 | -1, angle: number) =>
    pitchCraftOf(
      balanced({
        thrusterHeight: -0.5 * sign,
        thruster: { pitch: turning(sign * angle) },
        parts: parts(sign),
      }),
    );
  const signed = fc.double({ min: -0.6, max: 0.6, noNaN: true });
  fc.assert(
    fc.property(fc.double({ min: 0, max: 6, noNaN: true }), signed, signed, (speed, attack, angle) => {
      const here = loadsOn(craftOf(1, angle), AHEAD, flightAt(speed, attack, 0));
      const there = loadsOn(craftOf(-1, angle), AHEAD, flightAt(speed, -attack, 0));
      for (const term of ['thrust', 'podDrag', 'finDrag', 'munk', 'fins', 'crossFlow'] as const)
        expect(there.terms[term]).toBeCloseTo(-here.terms[term], 9);
      expect(there.up).toBeCloseTo(-here.up, 9);
      expect(there.forward).toBeCloseTo(here.forward, 9);
    }),
    { numRuns: 30 },
  );
});

test('the moment is the sum of its terms', () => {
  const state = balanced({ aft: 0.03, thrusterHeight: -0.5, parts: [finPart()] });
  const { terms, moment } = loadsOn(pitchCraftOf(state), AHEAD, flightAt(2, 0.2, 0.1));
  expect(moment).toBeCloseTo(
    Object.values(terms).reduce((sum, each) => sum + each, 0),
    12,
  );
});
