import { expect, test } from 'vitest';
import { criticalSpeed } from '../../../src/physics/cruise/critical.ts';
import { pitchCraftOf } from '../../../src/physics/cruise/pitchCraft.ts';
import { flightAt, loadsOn } from '../../../src/physics/cruise/pitchMoments.ts';
import { STANDARD_GRAVITY } from '../../../src/units/constants.ts';
import { finPart, solvedValue } from '../thrust/thrustFixture.ts';
import { balanced } from './cruiseFixture.ts';

test('bare hull by hand: U² = W g h/[(k₂ − k₁) ρV] with k₂ 0.860, k₁ 0.082 of Lamb’s table at fineness 4', () => {
  const state = balanced({ depth: 0.1 });
  const { density } = state.air;
  // The craft floats neutrally: its mass is its lift. V = π 4 · 1²/6.
  const mass = state.loading.grossLift;
  const byHand = Math.sqrt(
    (mass * STANDARD_GRAVITY * 0.1) / ((0.86 - 0.082) * density * ((Math.PI * 4) / 6)),
  );
  const { speed } = solvedValue(criticalSpeed(state));
  // The table is good to ±0.0025 in each, 0.3 % of their difference.
  expect(Math.abs(speed! / byHand - 1)).toBeLessThan(0.003);
});

test('with fins by hand: four of 0.05 m², A = 1, their middles 1.5 m behind the CB; two of them level', () => {
  const fins = finPart({
    place: { kind: 'free', x: 3.5, y: 0, z: 0.5 },
    fin: { area: 0.05, aspectRatio: 1 },
  });
  const state = balanced({ depth: 0.1, parts: [fins] });
  const { speed, pendulum, munk, fins: held } = solvedValue(criticalSpeed(state));
  // ½ρ · 2 · 0.05 · 2π/(2 + √5) · 1.5
  expect(held).toBeCloseTo(0.5 * 1.225 * 2 * 0.05 * 1.4833 * 1.5, 4);
  expect(speed).toBeCloseTo(Math.sqrt(pendulum / (munk - held)), 12);
  expect(speed!).toBeGreaterThan(solvedValue(criticalSpeed(balanced({ depth: 0.1 }))).speed!);
});

test('at that speed weight, Munk and fins together neither right nor tip a craft near level', () => {
  const state = balanced({ depth: 0.08, parts: [finPart({ fin: { area: 0.1, aspectRatio: 1 } })] });
  const { speed } = solvedValue(criticalSpeed(state));
  const slope = (fast: number) => {
    const at = (pitch: number) => {
      const { terms } = loadsOn(
        pitchCraftOf(state),
        { throttle: 0, vector: null },
        flightAt(fast, pitch, pitch),
      );
      return terms.tailHeaviness + terms.depth + terms.munk + terms.fins;
    };
    return (at(1e-6) - at(-1e-6)) / 2e-6;
  };
  expect(slope(speed!)).toBeCloseTo(0, 5);
  expect(slope(0.99 * speed!)).toBeLessThan(0);
  expect(slope(1.01 * speed!)).toBeGreaterThan(0);
});

test('it goes with the root of the pendulum; large fins hold the nose at any speed', () => {
  const of = (depth: number) => solvedValue(criticalSpeed(balanced({ depth }))).speed!;
  expect(of(0.2) / of(0.05)).toBeCloseTo(2, 9);
  const finned = balanced({ parts: [finPart({ fin: { area: 0.8, aspectRatio: 1.2 } })] });
  expect(solvedValue(criticalSpeed(finned)).speed).toBeNull();
});

test('a CG above the CB is told with what it tips by', () => {
  expect(criticalSpeed(balanced({ depth: -0.05 }))).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining('torque}'),
  });
});
