/**
 * What the craft's targets ask of its yaw moment, against what it has; and what thrust, vectoring angle or arm alone would
 * have to become, all else as it is (the masses too, where an arm would grow).
 *
 *   turn time   thrust is scaled until the first 90° from rest takes just so long; needed moment = scale × available
 *   side gust   the greatest ratio of the air's moment about the virtual mass centre to what the thrusters have against
 *               it, over all gusts up to the one asked for, in cruise at today's speed
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import { say } from '../../units/sentence.ts';
import type { Thruster } from '../thrust/thrusters.ts';
import { commandsOf, straightAt } from './asked.ts';
import { hardestGust } from './gust.ts';
import { type Leverage, leverageOf, longestArm, yaws } from './leverage.ts';
import { QUARTER, quarterEvent } from './quarterTurn.ts';
import { sail } from './sail.ts';
import { turnsInYaw } from './steer.ts';
import { leverOf, type TurningCraft } from './turningCraft.ts';

export interface Need {
  /** s or m/s */
  readonly asked: number;
  /** N·m of yaw moment, and what there is; about the CG at rest for a turn, about the virtual mass centre in a gust. */
  readonly needed: Outcome<number>;
  readonly available: number;
  /** What each alone would have to become: thrust as a multiple of today's; the limit of vectoring, rad; arm, m. */
  readonly thrust: Outcome<number>;
  readonly vector: Outcome<number>;
  readonly arm: Outcome<number>;
}

export interface Needs {
  readonly turnTime: Need | null;
  readonly sideGust: Need | null;
}

export interface Authority extends Leverage {
  /** Null when no target asks for anything. */
  readonly need: Needs | null;
}

/** How far a craft goes beyond what is asked of it: 0 when it just does it. */
type Beyond = (craft: TurningCraft) => number;

export interface Targets {
  /** s */
  readonly turnTime: number | null;
  /** m/s */
  readonly sideGust: number | null;
}

export function needsOf(
  craft: TurningCraft,
  { turnTime, sideGust }: Targets,
  throttle: number,
  cruiseSpeed: number,
): Needs | null {
  if (turnTime === null && sideGust === null) return null;
  const leverage = leverageOf(craft, throttle);
  const arm = Math.abs(leverage.arm);
  return {
    turnTime:
      turnTime === null
        ? null
        : needOf(craft, turnTime, turnBeyond(throttle, turnTime), leverage.yawMoment, arm),
    sideGust:
      sideGust === null
        ? null
        : needOf(
            craft,
            sideGust,
            (each) => hardestGust(each, throttle, cruiseSpeed, sideGust).ratio - 1,
            hardestGust(craft, throttle, cruiseSpeed, sideGust).available,
            arm,
          ),
  };
}

/** By how much the quarter turn beats the time, as a share of its own; where it does not, the share of 90° missing then (< 0). */
const turnBeyond =
  (throttle: number, asked: number): Beyond =>
  (craft) => {
    const { straight, turn } = commandsOf(craft, { throttle, vector: null, speed: null });
    const options = { until: asked, event: quarterEvent, coarseness: 100 };
    const sailed = sail(craft, straightAt(0, straight), turn, options);
    if (sailed.status !== 'solved') return -1;
    const { stopped, end, last } = sailed.value.trajectory;
    return stopped ? asked / end - 1 : quarterEvent(end, last) / QUARTER;
  };

/** Thrust is sought between these shares of today's. */
const [LEAST_THRUST, MOST_THRUST] = [1e-3, 1e3];

function needOf(craft: TurningCraft, asked: number, beyond: Beyond, available: number, arm: number): Need {
  const logThrust = least(
    (log) => beyond(withThrust(craft, Math.exp(log))),
    Math.log(LEAST_THRUST),
    Math.log(MOST_THRUST),
    `Even ${MOST_THRUST} times the thrust does not do it.`,
  );
  const thrust = mapped(logThrust, Math.exp);
  const longest = longestArm(craft);
  return {
    asked,
    needed: mapped(thrust, (times) => times * available),
    available,
    thrust,
    vector: craft.thrusters.some(turnsInYaw)
      ? least(
          (limit) => beyond(withVectoring(craft, limit)),
          0,
          Math.PI / 2,
          'Even turned square to the hull the thrusters do not do it.',
        )
      : infeasible('No thruster turns in yaw.'),
    arm: craft.thrusters.some(yaws)
      ? least(
          (to) => beyond(withArm(craft, to - arm)),
          0,
          longest,
          `Even an arm of ${say(longest, 'length')}, to the end of the hull, does not do it.`,
        )
      : infeasible('No thruster yaws the craft, so there is no arm to lengthen.'),
  };
}

const TRIED = 16;

/** The least x for which `beyond` is not below nil, sought upward in even steps; `cannot` where it is so for none. */
function least(beyond: (x: number) => number, lo: number, hi: number, cannot: string): Outcome<number> {
  let below = lo;
  for (let i = 0; i <= TRIED; i += 1) {
    const x = lo + ((hi - lo) * i) / TRIED;
    if (beyond(x) >= 0) return i === 0 ? solved(lo) : findRoot(beyond, below, x, 1e-4);
    below = x;
  }
  return infeasible(cannot);
}

const mapped = (outcome: Outcome<number>, to: (value: number) => number): Outcome<number> =>
  outcome.status === 'solved' ? solved(to(outcome.value)) : outcome;

const changed = (craft: TurningCraft, change: (thruster: Thruster) => Partial<Thruster>): TurningCraft => ({
  ...craft,
  thrusters: craft.thrusters.map((each) => ({ ...each, ...change(each) })),
});

const withThrust = (craft: TurningCraft, times: number): TurningCraft =>
  changed(craft, ({ staticThrust }) => ({ staticThrust: times * staticThrust }));

const withVectoring = (craft: TurningCraft, limit: number): TurningCraft =>
  changed(craft, (each) => (turnsInYaw(each) ? { yaw: { ...each.yaw, least: -limit, most: limit } } : {}));

/** Further from the CG by so much: those that turn in yaw along the hull, those throttled apart to the side. */
function withArm(craft: TurningCraft, by: number): TurningCraft {
  const outward = (lever: number) => (lever < 0 ? -by : by);
  return changed(craft, (each) => {
    const [ahead, side] = leverOf(craft, each);
    const [x, y, z] = each.at;
    if (turnsInYaw(each)) return { at: [x + outward(-ahead), y, z] };
    return each.differ === 0 ? {} : { at: [x, y + outward(side), z] };
  });
}
