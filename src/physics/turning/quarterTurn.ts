/** Time to the first 90° of yaw, either way, and to stop the yaw again by countering as hard as the thrusters can. */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import { counterTo } from './asked.ts';
import { yaws } from './leverage.ts';
import { turnsUnder } from './motion.ts';
import { LONGEST, type Moment, type Sailed, type SailOptions, sail, type Track, trackOf } from './sail.ts';
import { type Command, momentOf } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export interface QuarterTurn {
  /** s */
  readonly time: number;
  readonly track: Track;
}

export interface YawStop {
  /** s, from the hardest steering the other way until the craft no longer yaws. */
  readonly time: number;
  /** Yawed on meanwhile, rad, ≥ 0. */
  readonly angle: number;
  /** Goes on where the quarter turn ended; its time begins anew. */
  readonly track: Track;
}

export const QUARTER = Math.PI / 2;

/** Turns from below nil where the heading is first 90° off, either way. */
export const quarterEvent = (_: number, state: Float64Array): number => Math.abs(state[5]!) - QUARTER;

const REMEDY = 'Let a thruster turn in yaw, or throttle a pair apart.';
const NO_HELM = infeasible(
  'Nothing turns the craft: no thruster turns in yaw, and none is throttled apart.',
  REMEDY,
);
const NO_MOMENT = infeasible(
  'Nothing turns the craft: at this setting the thrust gives no yaw moment.',
  REMEDY,
);

/** Why a command turns nothing, or null. A craft that veers by itself, as Munk's moment makes of the least unevenness, is not turned. */
export function notTurned(craft: TurningCraft, command: Command): Outcome<never> | null {
  if (!craft.thrusters.some(yaws)) return NO_HELM;
  return turnsUnder(craft, command) ? null : NO_MOMENT;
}

/** Until the heading is 90° off, or infeasible with how far it got. */
export function quarterTurn(
  craft: TurningCraft,
  from: Moment,
  command: Command,
  options: SailOptions = {},
): Outcome<Sailed> {
  const still = notTurned(craft, command);
  if (still) return still;
  const sailed = sail(craft, from, command, { ...options, event: quarterEvent });
  if (sailed.status !== 'solved' || sailed.value.trajectory.stopped) return sailed;
  const { end, last } = sailed.value.trajectory;
  return infeasible(
    `In ${say(end, 'time')} it yaws only ${say(Math.abs(last[5]!), 'angle')}: the yaw moment of the thrusters is ${say(momentOf(craft, command), 'torque')}.`,
    'More thrust, a longer arm or a wider vectoring angle would help.',
  );
}

export const quarterTurnOf = (craft: TurningCraft, { trajectory, ...rest }: Sailed): QuarterTurn => ({
  time: trajectory.end,
  track: trackOf(craft, { trajectory, ...rest }),
});

/** From the end of a quarter turn, steered hardest the other way until the yaw rate is nil. */
export function yawStop(craft: TurningCraft, { end }: Sailed, throttle: number): Outcome<YawStop> {
  const way = Math.sign(end.state[5]!);
  const event = (_: number, state: Float64Array) => -way * state[2]!;
  const sailed = sail(craft, end, counterTo(craft, throttle, way), { event });
  if (sailed.status !== 'solved') return sailed;
  const { trajectory } = sailed.value;
  const angle = way * (trajectory.last[5]! - end.state[5]!);
  if (!trajectory.stopped) {
    return infeasible(
      `Countering does not stop the yaw: steered hardest the other way for ${LONGEST / 60} minutes, the craft still turns on against it, at ${say(way * trajectory.last[2]!, 'yawRate')}.`,
      'Larger fins, a longer arm or a wider vectoring angle to the other side would help.',
    );
  }
  return solved({ time: trajectory.end, angle, track: trackOf(craft, sailed.value) });
}
