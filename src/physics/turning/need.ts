/**
 * What the craft's targets ask of its yaw moment, against what it has; and what thrust, vectoring angle or arm alone would
 * have to become, all else as it is (the masses too, where an arm would grow).
 *
 *   turn time   thrust is scaled until the first 90° from rest takes just so long; needed moment = scale × available
 *   side gust   the greatest ratio of the air's moment about the virtual mass centre to what the thrusters have against
 *               it, over all gusts up to the one asked for, at rest
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import { leastOf, withLongerArm, withThrust, withVectoring } from './alone.ts';
import { commandsOf, straightAt } from './asked.ts';
import { hardestGust } from './gust.ts';
import { type Leverage, leverageOf, longestArm, yaws } from './leverage.ts';
import { notTurned, QUARTER, quarterEvent } from './quarterTurn.ts';
import { COARSE, sail } from './sail.ts';
import { turnsInYaw } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

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
): Needs | null {
  if (turnTime === null && sideGust === null) return null;
  const { yawMoment, arm } = leverageOf(craft, throttle);
  const need = (asked: number, beyond: Beyond, available: number) =>
    needOf(craft, asked, beyond, available, Math.abs(arm));
  const gustOn = (each: TurningCraft, gust: number) => hardestGust(each, throttle, 0, gust);
  return {
    turnTime: turnTime === null ? null : need(turnTime, turnBeyond(throttle, turnTime), yawMoment),
    sideGust:
      sideGust === null
        ? null
        : need(sideGust, (each) => gustOn(each, sideGust).ratio - 1, gustOn(craft, sideGust).available),
  };
}

/** By how much the quarter turn beats the time, as a share of its own; where it does not, the share of 90° missing then (< 0). */
const turnBeyond =
  (throttle: number, asked: number): Beyond =>
  (craft) => {
    const { straight, turn } = commandsOf(craft, { throttle, vector: null, speed: null });
    if (notTurned(craft, turn)) return -1;
    const options = { until: asked, event: quarterEvent, coarseness: COARSE };
    const sailed = sail(craft, straightAt(0, straight), turn, options);
    if (sailed.status !== 'solved') return -1;
    const { stopped, end, last } = sailed.value.trajectory;
    return stopped ? asked / end - 1 : quarterEvent(end, last) / QUARTER;
  };

/** Thrust is sought between these shares of today's. */
const [LEAST_THRUST, MOST_THRUST] = [1e-3, 1e3];

function needOf(craft: TurningCraft, asked: number, beyond: Beyond, available: number, arm: number): Need {
  const thrust = mapped(
    leastOf(
      (log) => beyond(withThrust(craft, Math.exp(log))),
      { least: Math.log(LEAST_THRUST), today: 0, most: Math.log(MOST_THRUST) },
      `Even ${MOST_THRUST} times the thrust does not do it.`,
    ),
    Math.exp,
  );
  return {
    asked,
    needed: mapped(thrust, (times) => times * available),
    available,
    thrust,
    vector: vectorOf(craft, beyond),
    arm: armOf(craft, beyond, arm),
  };
}

function vectorOf(craft: TurningCraft, beyond: Beyond): Outcome<number> {
  const turning = craft.thrusters.filter(turnsInYaw);
  if (turning.length === 0) return infeasible('No thruster turns in yaw.');
  const limits = turning.map(({ yaw }) => Math.max(Math.abs(yaw.least), Math.abs(yaw.most)));
  return leastOf(
    (limit) => beyond(withVectoring(craft, limit)),
    { least: 0, today: Math.min(...limits, Math.PI / 2), most: Math.PI / 2 },
    'Even turned square to the hull the thrusters do not do it.',
  );
}

function armOf(craft: TurningCraft, beyond: Beyond, today: number): Outcome<number> {
  if (!craft.thrusters.some(yaws))
    return infeasible('No thruster yaws the craft, so there is no arm to lengthen.');
  const most = longestArm(craft, today);
  return leastOf(
    (arm) => beyond(withLongerArm(craft, arm - today)),
    { least: 0, today, most },
    `Even an arm of ${say(most, 'length')}, the longest there is room for, does not do it.`,
  );
}

const mapped = (outcome: Outcome<number>, to: (value: number) => number): Outcome<number> =>
  outcome.status === 'solved' ? solved(to(outcome.value)) : outcome;
