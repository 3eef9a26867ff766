/**
 * From the helm to each thruster: what share of its thrust it gives and which way it is turned in yaw.
 *
 *   moment of a thruster about the CG, per newton:  cos ε (X sin δ − Y cos δ),  + to starboard
 *
 * X ahead and Y to starboard of the CG, m; δ in yaw (+ thrust to starboard), ε in pitch as it is set. Hardest to starboard
 * is the angle within its limits, and within ±90°, where this is greatest at rest; of a pair throttled apart
 * one piece gives then what it can backwards, where that adds to the moment. All pieces of a part turn alike.
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
  const hardest = hardestOf(craft, throttle, way);
  return {
    shares: hardest.map(({ share }) => throttle + Math.abs(steer) * (share - throttle)),
    angles: craft.thrusters.map((each, i) => {
      const straight = straightAngle(each);
      if (vector !== null && turnsInYaw(each)) return heldWithin(each.yaw, vector);
      return straight + Math.abs(steer) * (hardest[i]!.angle - straight);
    }),
  };
}

/** Part of the way from straight ahead to another command. */
export const partOfTheWay = (straight: Command, hard: Command, share: number): Command => ({
  shares: straight.shares.map((each, i) => each + share * (hard.shares[i]! - each)),
  angles: straight.angles.map((each, i) => each + share * (hard.angles[i]! - each)),
});

interface Setting {
  readonly share: number;
  readonly angle: number;
}

/** For each thruster. The pieces of a part are set together, and throttled apart only where that gives more. */
function hardestOf(craft: TurningCraft, throttle: number, way: 1 | -1): Setting[] {
  const byPart = new Map<string, readonly Setting[]>();
  return craft.thrusters.map(({ part, copy }) => {
    const known = byPart.get(part) ?? hardestOfPart(craft, part, throttle, way);
    byPart.set(part, known);
    return known[copy]!;
  });
}

function hardestOfPart(craft: TurningCraft, part: string, throttle: number, way: 1 | -1): Setting[] {
  const pieces = craft.thrusters.filter((each) => each.part === part);
  const choices = sharesOf(pieces, throttle).map((shares) => {
    const momentAt = (angle: number) =>
      pieces.reduce((sum, each, i) => {
        const moment = each.staticThrust * momentPerThrust(craft, each, angle);
        return sum + way * shares[i]! * moment;
      }, 0);
    const angle = hardestAngle(pieces[0]!, momentAt);
    return { moment: momentAt(angle), settings: shares.map((share) => ({ share, angle })) };
  });
  return choices.reduce((best, each) => (each.moment > best.moment ? each : best)).settings;
}

/** What the pieces of a part may give: all alike, or one of a pair backwards. */
function sharesOf(pieces: readonly Thruster[], throttle: number): number[][] {
  const alike = pieces.map(() => throttle);
  const backwards = pieces.flatMap(({ differ, reverse }, i) =>
    differ === 0 ? [] : [alike.map((share, k) => (k === i ? -reverse * throttle : share))],
  );
  return [alike, ...backwards];
}

/** Where the moment, which goes as a sine of the angle, is greatest: its peak, if within the range, or else an end of it. */
function hardestAngle(thruster: Thruster, momentAt: (angle: number) => number): number {
  const straight = straightAngle(thruster);
  if (!turnsInYaw(thruster)) return straight;
  const [least, most] = forwardRange(thruster.yaw);
  const peak = Math.atan2(momentAt(Math.PI / 2), momentAt(0));
  const candidates = [straight, least, most, Math.min(Math.max(peak, least), most)];
  return candidates.reduce((best, each) => (momentAt(each) > momentAt(best) ? each : best));
}

/** The part of the limits where the thrust still has a forward share; all of them where it never has. */
function forwardRange({ least, most }: Thruster['yaw']): readonly [number, number] {
  const [from, to] = [Math.max(least, -Math.PI / 2), Math.min(most, Math.PI / 2)];
  return from <= to ? [from, to] : [least, most];
}
