/**
 * From the helm to each thruster: what share of its thrust it gives and which way it is turned in yaw.
 *
 *   moment of a thruster about the CG, per newton:  cos ε (X sin δ − Y cos δ),  + to starboard
 *
 * X ahead and Y to starboard of the CG, m; δ in yaw (+ thrust to starboard), ε in pitch as it is set. Hardest to starboard
 * is the angle within its limits, and within ±90°, where this is greatest at rest, and for pieces throttled apart full
 * throttle where that helps and what they can do backwards where it does not. All pieces of a part turn alike.
 */
import { heldWithin, pitchAngle } from '../thrust/ahead.ts';
import type { Helm } from '../thrust/helm.ts';
import type { Thruster } from '../thrust/thrusters.ts';
import { leverOf, type TurningCraft } from './turningCraft.ts';

/** For each thruster in turn. */
export interface Command {
  /** Share of full throttle, −reverse … 1. */
  readonly shares: readonly number[];
  /** Angle in yaw it is turned to, rad. */
  readonly angles: readonly number[];
}

/** Whether it turns in yaw in flight; one that has limits but no slew rate stays as it is set. */
export const turnsInYaw = ({ yaw }: Thruster): boolean => yaw.most > yaw.least && yaw.slew > 0;

export const isStuck = ({ yaw }: Thruster): boolean => yaw.most > yaw.least && yaw.slew === 0;

export const straightAngle = (thruster: Thruster): number =>
  turnsInYaw(thruster) ? heldWithin(thruster.yaw, 0) : thruster.yaw.set;

/** N·m about the CG for each newton, turned to that angle in yaw. */
export function momentPerThrust(craft: TurningCraft, thruster: Thruster, angle: number): number {
  const [ahead, side] = leverOf(craft, thruster);
  return Math.cos(pitchAngle(thruster, null)) * (ahead * Math.sin(angle) - side * Math.cos(angle));
}

/** N·m about the CG at rest, + to starboard. */
export const momentOf = (craft: TurningCraft, { shares, angles }: Command): number =>
  craft.thrusters.reduce(
    (sum, each, i) => sum + shares[i]! * each.staticThrust * momentPerThrust(craft, each, angles[i]!),
    0,
  );

export function commandOf(craft: TurningCraft, { throttle, steer, vector }: Helm): Command {
  const way = steer < 0 ? -1 : 1;
  const hardest = craft.thrusters.map((each) => hardestShare(craft, each, throttle, way));
  return {
    shares: hardest.map((share) => throttle + Math.abs(steer) * (share - throttle)),
    angles: craft.thrusters.map((each) => {
      const straight = straightAngle(each);
      if (!turnsInYaw(each)) return straight;
      if (vector !== null) return heldWithin(each.yaw, vector);
      return straight + Math.abs(steer) * (hardestAngle(craft, each, hardest, way) - straight);
    }),
  };
}

/** Part of the way from straight ahead to another command. */
export const partOfTheWay = (straight: Command, hard: Command, share: number): Command => ({
  shares: straight.shares.map((each, i) => each + share * (hard.shares[i]! - each)),
  angles: straight.angles.map((each, i) => each + share * (hard.angles[i]! - each)),
});

function hardestShare(craft: TurningCraft, thruster: Thruster, throttle: number, way: 1 | -1): number {
  if (thruster.differ === 0) return throttle;
  const helps = way * momentPerThrust(craft, thruster, straightAngle(thruster)) > 0;
  return helps ? throttle : -thruster.reverse * throttle;
}

function hardestAngle(
  craft: TurningCraft,
  { part, yaw }: Thruster,
  shares: readonly number[],
  way: 1 | -1,
): number {
  const momentAt = (angle: number) =>
    craft.thrusters.reduce(
      (sum, each, i) =>
        each.part === part
          ? sum + way * shares[i]! * each.staticThrust * momentPerThrust(craft, each, angle)
          : sum,
      0,
    );
  const [least, most] = forwardRange(yaw.least, yaw.most);
  // The moment goes as a sine of the angle: its peak, if within the range, or else an end of it.
  const peak = Math.atan2(momentAt(Math.PI / 2), momentAt(0));
  const candidates = [heldWithin(yaw, 0), least, most, Math.min(Math.max(peak, least), most)];
  return candidates.reduce((best, each) => (momentAt(each) > momentAt(best) ? each : best));
}

/** The part of the limits where the thrust still has a forward share; all of them where it never has. */
function forwardRange(least: number, most: number): readonly [number, number] {
  const [from, to] = [Math.max(least, -Math.PI / 2), Math.min(most, Math.PI / 2)];
  return from <= to ? [from, to] : [least, most];
}
