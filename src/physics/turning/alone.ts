/** The same craft with one thing about its thrusters other than it is: thrust, how far they turn, or their arm. */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import type { Thruster } from '../thrust/thrusters.ts';
import { turnsInYaw } from './steer.ts';
import { leverOf, type TurningCraft } from './turningCraft.ts';

const changed = (craft: TurningCraft, change: (thruster: Thruster) => Partial<Thruster>): TurningCraft => ({
  ...craft,
  thrusters: craft.thrusters.map((each) => ({ ...each, ...change(each) })),
});

export const withThrust = (craft: TurningCraft, times: number): TurningCraft =>
  changed(craft, ({ staticThrust }) => ({ staticThrust: times * staticThrust }));

/** Those that turn in yaw, as far to either side, rad. */
export const withVectoring = (craft: TurningCraft, limit: number): TurningCraft =>
  changed(craft, (each) => (turnsInYaw(each) ? { yaw: { ...each.yaw, least: -limit, most: limit } } : {}));

/** So much further from the CG, m: those that turn in yaw along the hull, those throttled apart to the side. */
export function withLongerArm(craft: TurningCraft, by: number): TurningCraft {
  const outward = (lever: number) => (lever < 0 ? -by : by);
  return changed(craft, (each) => {
    const [ahead, side] = leverOf(craft, each);
    const [x, y, z] = each.at;
    if (turnsInYaw(each)) return { at: [x + outward(-ahead), y, z] };
    return each.differ === 0 ? {} : { at: [x, y + outward(side), z] };
  });
}

/** From least to most, and where it stands today. */
export interface Range {
  readonly least: number;
  readonly today: number;
  readonly most: number;
}

const TRIED = 6;
const WITHIN = 1e-4;

/**
 * The x nearest to the least at which `beyond` turns from below nil, sought upward in even steps: up to today's where that is
 * enough, else from there on; `cannot` where none is.
 */
export function leastOf(
  beyond: (x: number) => number,
  { least, today, most }: Range,
  cannot: string,
): Outcome<number> {
  const at = remembered(beyond);
  const [from, to] = at(today) >= 0 ? [least, today] : [today, most];
  let below = from;
  for (let i = 0; i <= TRIED; i += 1) {
    const x = i === TRIED ? to : from + ((to - from) * i) / TRIED;
    if (at(x) >= 0) return i === 0 ? solved(x) : findRoot(at, below, x, WITHIN);
    below = x;
  }
  return infeasible(cannot);
}

/** Each x is worked out once: a motion has to be followed for it. */
function remembered(f: (x: number) => number): (x: number) => number {
  const known = new Map<number, number>();
  return (x) => {
    const value = known.get(x) ?? f(x);
    known.set(x, value);
    return value;
  };
}
