/**
 * What the thrusters can do to yaw the craft at rest, hardest to starboard.
 *
 *   moment  Σ T cos ε (X sin δ − Y cos δ) about a point from which the thruster lies X ahead and Y to starboard
 *   arm     Σ T |lever| ÷ Σ T over the thrusters that can yaw the craft: lever the distance aft of the point of one that turns in
 *           yaw, the side of one of a pair throttled apart; + when those that turn sit more aft than ahead
 *   shares  moment = vectoring · arm · thrust × (all thrust at full throttle) × (longest arm):
 *           vectoring  moment ÷ (Σ T |arm|), the sine of the angle for a single thruster
 *           arm        |arm| ÷ longest arm: from the CG to the farther end of the hull, or its own where that is longer
 *           thrust     Σ T ÷ all thrust at full throttle
 *
 * T = throttle · static thrust, N. What a thruster adds that the helm has no hold on (fixed and off the centreline) counts in
 * the moment and in no share. The sums are about the CG of the solid mass, and again about the virtual mass centre.
 */
import { pitchAngle } from '../thrust/ahead.ts';
import type { Thruster } from '../thrust/thrusters.ts';
import { type Command, commandOf, turnsInYaw } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export interface Leverage {
  /** About the CG: m, + aft; and N·m, + to starboard, the greatest there is at that throttle. */
  readonly arm: number;
  readonly yawMoment: number;
  /** The same about the virtual mass centre. */
  readonly virtualArm: number;
  readonly virtualMoment: number;
  readonly shares: Shares;
}

/** Each 0 … 1: what it leaves of the greatest conceivable. */
export interface Shares {
  readonly vectoring: number;
  readonly arm: number;
  readonly thrust: number;
}

/** Whether the helm can yaw the craft with it. */
export const yaws = (thruster: Thruster): boolean => turnsInYaw(thruster) || thruster.differ !== 0;

export function leverageOf(craft: TurningCraft, throttle: number): Leverage {
  const { cgAhead, cgSide, centreAhead, centreSide } = craft.mass;
  const command = commandOf(craft, { throttle, steer: 1, vector: null });
  const aboutCg = aboutPoint(craft, command, cgAhead, cgSide);
  const aboutCentre = aboutPoint(craft, command, centreAhead, centreSide);
  return {
    arm: aboutCg.arm,
    yawMoment: aboutCg.moment,
    virtualArm: aboutCentre.arm,
    virtualMoment: aboutCentre.moment,
    shares: sharesOf(craft, throttle, aboutCg),
  };
}

interface AboutPoint {
  readonly arm: number;
  /** Mean of the levers' sizes, m. */
  readonly armSize: number;
  /** Of all thrusters, and of those the helm yaws with, N·m. */
  readonly moment: number;
  readonly steered: number;
}

/** About a point so far ahead of the CB and to starboard of it. */
function aboutPoint(craft: TurningCraft, command: Command, x: number, y: number): AboutPoint {
  let [moment, steered, total, levers, sizes] = [0, 0, 0, 0, 0];
  for (const [i, thruster] of craft.thrusters.entries()) {
    const [ahead, side] = [craft.cb - thruster.at[0] - x, thruster.at[1] - y];
    const angle = command.angles[i]!;
    const [across, along] = [ahead * Math.sin(angle), side * Math.cos(angle)];
    const level = Math.cos(pitchAngle(thruster, null));
    const own = command.shares[i]! * thruster.staticThrust * level * (across - along);
    moment += own;
    if (!yaws(thruster)) continue;
    const byTurning = turnsInYaw(thruster) && (thruster.differ === 0 || Math.abs(across) > Math.abs(along));
    const lever = byTurning ? -ahead : Math.abs(side);
    steered += own;
    total += thruster.staticThrust;
    levers += thruster.staticThrust * lever;
    sizes += thruster.staticThrust * Math.abs(lever);
  }
  const armSize = total > 0 ? sizes / total : 0;
  return { arm: Math.sign(levers) * armSize, armSize, moment, steered };
}

function sharesOf(craft: TurningCraft, throttle: number, { armSize, steered }: AboutPoint): Shares {
  const sum = (thrusters: readonly Thruster[]) =>
    thrusters.reduce((thrust, { staticThrust }) => thrust + staticThrust, 0);
  const thrust = throttle * sum(craft.thrusters.filter(yaws));
  const all = sum(craft.thrusters);
  const greatest = thrust * armSize;
  return {
    vectoring: greatest > 0 ? steered / greatest : 0,
    arm: armSize / longestArm(craft, armSize),
    thrust: all > 0 ? thrust / all : 0,
  };
}

/** From the CG to the farther end of the hull, or the arm there is where a thruster stands beyond it, m. */
export function longestArm({ length, cb, mass }: TurningCraft, today: number): number {
  const cg = cb - mass.cgAhead;
  return Math.max(cg, length - cg, today);
}
