/**
 * The motion of a craft in the horizontal plane, axes at the CB: X ahead, Y to starboard, yaw + to starboard.
 *
 *   M ν̇ = τ − C(ν)ν,   ν = (u, v, r): speed ahead and to starboard, m/s; yaw rate, rad/s
 *   C(ν)ν = (−r P_Y, r P_X, u P_Y − v P_X),  (P_X, P_Y) = ((m + k₁ρV) u − m Y_G r, (m + k₂ρV) v + m X_G r)
 *   ẋ = u cos ψ − v sin ψ,  ẏ = u sin ψ + v cos ψ,  ψ̇ = r;   x ahead at the start, y to starboard, m; ψ heading, rad
 *
 * M of yawMass.ts. The last line of C(ν)ν holds Munk's moment −(k₂ − k₁)ρV u v. τ, N and N·m:
 *   thrusters   T cos ε (cos δ, sin δ) at their place (X, Y); T of thrusters.ts at the advance along the thruster's own axis,
 *               cos ε [(u − r Y) cos δ + (v + r X) sin δ]; δ moves at its slew rate to what is commanded, T at once
 *   drag        −D(u) of drag.ts along the hull at the CB
 *   cross-flow  strips.ts
 *   fins        fins.ts; a fin at clock angle θ meets (v + r X) cos θ square to it and u − r Y along it, and pushes the craft
 *               sideways with the share cos θ of its force
 *
 * The craft stays level and does not heel in the turn; still air; side drag of what hangs outside, the side force of a
 * propeller in a cross-stream and the air a pushed-back propeller meets are left out.
 * Source: Kirchhoff's equations, H. Lamb, Hydrodynamics (1932), § 124, in the plane; M. Munk, NACA TR 184 (1924).
 */
import type { Slope } from '../../numeric/ode.ts';
import { pitchAngle } from '../thrust/ahead.ts';
import { finForce } from '../thrust/fins.ts';
import { thrustAt } from '../thrust/thrusters.ts';
import type { Command } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export interface Motion {
  readonly command: Command;
  /** Of (u, v, r, x, y, ψ). */
  readonly slope: Slope;
  /** Writes τ − C(ν)ν at a time with (u, v, r, …): N ahead, N to starboard, N·m to starboard. */
  forces(t: number, state: Float64Array, into: Float64Array): void;
  /** Angle in yaw of a thruster at a time, rad. */
  angleAt(thruster: number, t: number): number;
  /** When the thrusters come to rest at what is commanded, s. */
  readonly arrivals: readonly number[];
}

/** With the thrusters turned from `from`, rad each, towards what is commanded, beginning at time 0. */
export function motionOf(craft: TurningCraft, command: Command, from = command.angles): Motion {
  const { surge, sway, ahead, side, centreAhead, centreSide, centreYaw } = craft.mass;
  const addTau = tauOf(craft, command, angleAt);
  const sums = new Float64Array(3);

  function angleAt(i: number, t: number): number {
    const way = command.angles[i]! - from[i]!;
    if (way === 0) return command.angles[i]!;
    const turned = craft.thrusters[i]!.yaw.slew * t;
    return turned >= Math.abs(way) ? command.angles[i]! : from[i]! + Math.sign(way) * turned;
  }

  function forces(t: number, state: Float64Array, into: Float64Array): void {
    const [u, v, r] = [state[0]!, state[1]!, state[2]!];
    const alongMomentum = surge * u - side * r;
    const acrossMomentum = sway * v + ahead * r;
    into[0] = r * acrossMomentum;
    into[1] = -r * alongMomentum;
    into[2] = v * alongMomentum - u * acrossMomentum;
    addTau(t, u, v, r, into);
  }

  function slope(t: number, state: Float64Array, into: Float64Array): void {
    forces(t, state, sums);
    const [along, across, moment] = [sums[0]!, sums[1]!, sums[2]!];
    const spin = (moment - centreAhead * across + centreSide * along) / centreYaw;
    const [u, v, r, heading] = [state[0]!, state[1]!, state[2]!, state[5]!];
    const [cos, sin] = [Math.cos(heading), Math.sin(heading)];
    into[0] = (along + side * spin) / surge;
    into[1] = (across - ahead * spin) / sway;
    into[2] = spin;
    into[3] = u * cos - v * sin;
    into[4] = u * sin + v * cos;
    into[5] = r;
  }

  const arrivals = craft.thrusters.flatMap(({ yaw }, i) =>
    command.angles[i] === from[i] ? [] : [Math.abs(command.angles[i]! - from[i]!) / yaw.slew],
  );
  return { command, slope, forces, angleAt, arrivals };
}

/** N·m about the virtual mass centre at (u, v, 0) with the thrusters as commanded, + to starboard: what yaws the craft. */
export function momentUnder(craft: TurningCraft, command: Command): (u: number, v: number) => number {
  const { centreAhead, centreSide } = craft.mass;
  const { forces } = motionOf(craft, command);
  return (u, v) => {
    const sums = new Float64Array(3);
    forces(0, Float64Array.of(u, v, 0), sums);
    return sums[2]! - centreAhead * sums[1]! + centreSide * sums[0]!;
  };
}

/** A moment below this share of all thrust times hull length is rounding. */
const ROUNDING = 1e-9;

/** Whether a command yaws the craft at all, from rest. */
export function turnsUnder(craft: TurningCraft, command: Command): boolean {
  const thrust = craft.thrusters.reduce(
    (sum, { staticThrust }, i) => sum + Math.abs(command.shares[i]!) * staticThrust,
    0,
  );
  return Math.abs(momentUnder(craft, command)(0, 0)) > ROUNDING * thrust * craft.length;
}

type AddTau = (t: number, u: number, v: number, r: number, into: Float64Array) => void;

/** Adds thrust, drag, cross-flow and fins. */
function tauOf(craft: TurningCraft, { shares }: Command, angleAt: Motion['angleAt']): AddTau {
  const { thrusters, fins, drag, density, cb } = craft;
  const { ahead: stripAhead, drag: stripDrag } = craft.strips;
  const level = thrusters.map((each) => Math.cos(pitchAngle(each, null)));

  return (t, u, v, r, into) => {
    let along = -drag.at(u);
    let across = 0;
    let moment = 0;
    for (let i = 0; i < thrusters.length; i += 1) {
      const thruster = thrusters[i]!;
      const [ahead, side] = [cb - thruster.at[0], thruster.at[1]];
      const angle = angleAt(i, t);
      const [forward, sideways] = [level[i]! * Math.cos(angle), level[i]! * Math.sin(angle)];
      const advance = (u - r * side) * forward + (v + r * ahead) * sideways;
      const thrust = thrustAt(thruster, shares[i]!, advance);
      along += thrust * forward;
      across += thrust * sideways;
      moment += thrust * (ahead * sideways - side * forward);
    }
    for (let i = 0; i < stripAhead.length; i += 1) {
      const speed = v + r * stripAhead[i]!;
      const force = -density * stripDrag[i]! * speed * Math.abs(speed);
      across += force;
      moment += stripAhead[i]! * force;
    }
    for (let i = 0; i < fins.length; i += 1) {
      const fin = fins[i]!;
      const ahead = cb - fin.at[0];
      const share = Math.cos(fin.clock);
      const force = share * finForce(fin, density, u - r * fin.at[1], (v + r * ahead) * share);
      across += force;
      moment += ahead * force;
    }
    into[0]! += along;
    into[1]! += across;
    into[2]! += moment;
  };
}
