/** A motion followed in time, and the path that is kept of it for drawing. */
import { integrate, type Trajectory } from '../../numeric/ode.ts';
import { type Outcome, solved } from '../../numeric/outcome.ts';
import { type Motion, motionOf } from './motion.ts';
import { type Command, turnsInYaw } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

/** Nothing is followed for longer than this, s. */
export const LONGEST = 600;

/** Error of a step as a share of each unknown, and besides (m/s, rad/s, m, rad). */
const RELATIVE = 1e-8;
const ABSOLUTE = 1e-10;
/** Times to a yaw angle or rate are right to this share; held against finer steps in the tests. */
export const TIME_ERROR = 1e-6;

/** A coarseness at which times are still right to 1e-4. */
export const COARSE = 1000;

/** (u, v, r, x, y, ψ) and the angle of each thruster. */
export interface Moment {
  readonly state: ArrayLike<number>;
  readonly angles: readonly number[];
}

export interface Sailed {
  readonly motion: Motion;
  readonly trajectory: Trajectory;
  readonly end: Moment;
}

export interface SailOptions {
  /** s. Default LONGEST. */
  readonly until?: number;
  /** It ends where this turns from below nil to nil or more. */
  readonly event?: (t: number, state: Float64Array) => number;
  /** Finer (below 1) or coarser than the steps need be. Default 1. */
  readonly coarseness?: number;
}

/** From a moment on under a command. */
export function sail(
  craft: TurningCraft,
  from: Moment,
  command: Command,
  { until = LONGEST, event, coarseness = 1 }: SailOptions = {},
): Outcome<Sailed> {
  const motion = motionOf(craft, command, from.angles);
  const outcome = integrate(motion.slope, 0, from.state, until, {
    relative: RELATIVE * coarseness,
    absolute: ABSOLUTE * coarseness,
    breaks: motion.arrivals,
    ...(event && { event }),
  });
  if (outcome.status !== 'solved') return outcome;
  const trajectory = outcome.value;
  const angles = craft.thrusters.map((_, i) => motion.angleAt(i, trajectory.end));
  return solved({ motion, trajectory, end: { state: trajectory.last, angles } });
}

export interface Track {
  /** s, in equal steps from 0. */
  readonly time: readonly number[];
  /** CB ahead at the start, and to starboard, m. */
  readonly x: readonly number[];
  readonly y: readonly number[];
  /** rad, + to starboard */
  readonly heading: readonly number[];
  /** Ahead and to starboard along the craft's own axes, m/s; yaw rate, rad/s. */
  readonly u: readonly number[];
  readonly v: readonly number[];
  readonly r: readonly number[];
  /** Angle in yaw of the first thruster that turns in yaw (of the first, if none does), rad. */
  readonly vector: readonly number[];
  /** Of each thruster, in their order. */
  readonly thrusters: readonly TrackedThruster[];
}

export interface TrackedThruster {
  /** Of full throttle, −reverse … 1; the same throughout. */
  readonly share: number;
  /** In yaw, rad, at each of the times. */
  readonly angles: readonly number[];
}

const POINTS = 241;

export function trackOf(craft: TurningCraft, { motion, trajectory }: Sailed): Track {
  const time = Array.from({ length: POINTS }, (_, i) => (trajectory.end * i) / (POINTS - 1));
  const states = time.map((t) => trajectory.at(t));
  const shown = shownThruster(craft);
  const each = (i: number) => states.map((state) => state[i]!);
  return {
    time,
    x: each(3),
    y: each(4),
    heading: each(5),
    u: each(0),
    v: each(1),
    r: each(2),
    vector: time.map((t) => motion.angleAt(shown, t)),
    thrusters: motion.command.shares.map((share, i) => ({
      share,
      angles: time.map((t) => motion.angleAt(i, t)),
    })),
  };
}

/** Index of the thruster whose angle stands for the craft's. */
export const shownThruster = ({ thrusters }: TurningCraft): number =>
  Math.max(thrusters.findIndex(turnsInYaw), 0);
