/**
 * Velocities (u, v, r) that do not change under a command,  τ − C(ν)ν = 0, by Newton's method; and whether the craft comes
 * back to one of them:
 *
 *   small departures  δν̇ = A δν,  det(λ − A) = λ³ + a λ² + b λ + c;  they die out when a, c > 0 and a b > c
 *
 * Source: motion.ts; E. J. Routh and A. Hurwitz, as in any text on vibrations.
 */
import { jacobianOf, solveNewton } from '../../numeric/newton.ts';
import { valueOrNull } from '../../numeric/outcome.ts';
import { motionOf } from './motion.ts';
import { LONGEST } from './sail.ts';
import type { Command } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export type Velocity = readonly [u: number, v: number, r: number];

/** The root that Newton's method finds from there, or null. */
export function steadyNear(
  craft: TurningCraft,
  command: Command,
  from: Velocity,
  sizes: Velocity,
): Velocity | null {
  const { forces } = motionOf(craft, command);
  const { mass } = craft;
  const scale = [1 / (mass.surge * sizes[0]), 1 / (mass.sway * sizes[1]), 1 / (mass.centreYaw * sizes[2])];
  const root = valueOrNull(
    solveNewton(
      (x, into) => {
        forces(LONGEST, x, into);
        for (let i = 0; i < 3; i += 1) into[i]! *= scale[i]!;
      },
      from,
      { sizes },
    ),
  );
  return root && velocityOf(root);
}

export const velocityOf = (state: ArrayLike<number>): Velocity => [state[0]!, state[1]!, state[2]!];

/** What speeds and yaw rates are like: for judging what is small. */
export function sizesOf(craft: TurningCraft, { shares }: Command, cruiseSpeed: number): Velocity {
  const thrust = craft.thrusters.reduce((sum, each, i) => sum + Math.abs(shares[i]!) * each.staticThrust, 0);
  // The speed at which dynamic pressure on a square of the hull's length is a hundredth of the thrust.
  const byThrust = Math.sqrt((0.02 * thrust) / (craft.density * craft.length ** 2));
  const speed = Math.max(cruiseSpeed, byThrust, 1e-3);
  return [speed, speed, speed / craft.length];
}

/** Whether small departures from a root die out. */
export function settlesAt(craft: TurningCraft, command: Command, root: Velocity, sizes: Velocity): boolean {
  const { slope } = motionOf(craft, command);
  const state = new Float64Array(6);
  const rates = new Float64Array(6);
  const a = jacobianOf(
    (x, into) => {
      state.set(x);
      slope(LONGEST, state, rates);
      for (let i = 0; i < 3; i += 1) into[i] = rates[i]! / sizes[i]!;
    },
    Float64Array.from(root),
    sizes,
  );
  const minor = (i: number, j: number) => a[i]![i]! * a[j]![j]! - a[i]![j]! * a[j]![i]!;
  const first = -(a[0]![0]! + a[1]![1]! + a[2]![2]!);
  const second = minor(0, 1) + minor(0, 2) + minor(1, 2);
  const third = -(
    a[0]![0]! * minor(1, 2) -
    a[0]![1]! * (a[1]![0]! * a[2]![2]! - a[1]![2]! * a[2]![0]!) +
    a[0]![2]! * (a[1]![0]! * a[2]![1]! - a[1]![1]! * a[2]![0]!)
  );
  return first > 0 && third > 0 && first * second > third;
}
