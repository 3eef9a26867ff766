import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Loading } from '../../../src/physics/balance/loading.ts';
import { supportedAttitude } from '../../../src/physics/balance/support.ts';

const coordinate = fc.double({ min: -1, max: 1, noNaN: true });
const point = fc.tuple(coordinate, coordinate, coordinate);

const loadingOf = (
  mass: number,
  [x, y, z]: readonly [number, number, number],
  grossLift: number,
): Loading => ({
  solid: { mass, moment: [mass * x, mass * y, mass * z] },
  cb: [0, 0, 0],
  grossLift,
});

/** Height of a point of the hull above the support when the craft lies at a pitch and heel. */
const heightAbove = (
  of: readonly number[],
  support: readonly number[],
  pitch: number,
  heel: number,
): number => {
  const down = [Math.sin(pitch), Math.cos(pitch) * Math.sin(heel), -Math.cos(pitch) * Math.cos(heel)];
  return -of.reduce((sum, each, i) => sum + (each - support[i]!) * down[i]!, 0);
};

test('at rest no attitude has less potential energy: W z_G − L z_B with the support still', () => {
  const mass = fc.double({ min: 0.1, max: 2, noNaN: true });
  fc.assert(
    fc.property(point, point, mass, mass, (cg, support, solid, lift) => {
      const answer = supportedAttitude(loadingOf(solid, cg, lift), support);
      if (answer.status === 'infeasible') return;
      const energy = (pitch: number, heel: number) =>
        solid * heightAbove(cg, support, pitch, heel) - lift * heightAbove([0, 0, 0], support, pitch, heel);
      const least = energy(answer.value.pitch, answer.value.heel);
      for (let pitch = -1.5; pitch <= 1.5; pitch += 0.25) {
        for (let heel = -3; heel <= 3; heel += 0.5)
          expect(energy(pitch, heel)).toBeGreaterThanOrEqual(least - 1e-9);
      }
    }),
  );
});

test('a heavy craft on a leg under its CG, aft of the CB, rests as its weight and lift say', () => {
  // W 2 kg at 0.5 m aft and 0.3 m down; L 1 kg at the CB; leg 1 m down at 0.5 m aft: q = W(G−S) − L(B−S).
  const answer = supportedAttitude(loadingOf(2, [0.5, 0, -0.3], 1), [0.5, 0, -1]);
  const [x, z] = [2 * 0 - 1 * -0.5, 2 * 0.7 - 1 * 1];
  expect(answer.status === 'solved' && answer.value.pitch).toBeCloseTo(Math.atan2(x, -z), 12);
});

test('a point where weight and lift balance about it: any attitude', () => {
  expect(supportedAttitude(loadingOf(2, [0, 0, 0], 1), [0, 0, 0]).status).toBe('infeasible');
});
