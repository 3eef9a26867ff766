/**
 * From rest to 90° of yaw and stopped there: steered as asked for a time s, then hardest the other way until r = 0.
 *
 *   s is the root of  |ψ(s)| = 90°,  ψ the heading at which the yaw has stopped;  time = s + time of countering
 *
 * r yaw rate, rad/s. Where thrusters turn slowly their way across counts. The heading is what is met: the craft may drift
 * on, and somebody has to steer it straight from there on.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import { say } from '../../units/sentence.ts';
import { counterTo } from './asked.ts';
import { QUARTER } from './quarterTurn.ts';
import { type Moment, type Sailed, sail } from './sail.ts';
import type { TurningCraft } from './turningCraft.ts';

export interface TurnedThere {
  /** s, from rest until it has turned 90° and no longer yaws. */
  readonly time: number;
  /** s, when the countering begins. */
  readonly switching: number;
}

interface Stopped {
  /** s, of countering. */
  readonly time: number;
  /** rad, beyond 90°. */
  readonly beyond: number;
}

/** Of the switching time, as a share of the time to 90°. */
const WITHIN = 1e-8;
/** Of the heading, rad: a jump in it is no root. */
const NEAR = 1e-3;

/** `quarter`: the first 90° from rest, steered as asked. */
export function turnThere(craft: TurningCraft, quarter: Sailed, throttle: number): Outcome<TurnedThere> {
  const passes = quarter.trajectory.end;
  const beyond = (s: number) => stoppedAfter(craft, quarter, throttle, s).beyond;
  const switching = findRoot(beyond, 0, passes, WITHIN * passes);
  if (switching.status === 'infeasible') return switching;
  const stopped = stoppedAfter(craft, quarter, throttle, switching.value);
  if (Math.abs(stopped.beyond) > NEAR) {
    return neverStopped(Math.abs(quarter.trajectory.at(switching.value)[5]!));
  }
  return solved({ time: switching.value + stopped.time, switching: switching.value });
}

/** Below this it is as good as from the start, rad. */
const AT_ONCE = 0.01;

/** `heading`: from which on countering comes too late, rad. */
const neverStopped = (heading: number): Outcome<never> =>
  infeasible(
    `${
      heading > AT_ONCE
        ? `Once it has yawed ${say(heading, 'angle')} from rest, steering hardest the other way`
        : 'Steering hardest the other way'
    } does not stop it before 180°: it cannot be stopped at 90°.`,
    'Larger fins, a longer arm or a wider vectoring angle to the other side would help.',
  );

/** Countered from s on. What is not stopped before 180° is beyond all question and not followed further. */
function stoppedAfter(craft: TurningCraft, quarter: Sailed, throttle: number, s: number): Stopped {
  const from = momentOf(craft, quarter, s);
  const way = Math.sign(quarter.end.state[5]!);
  const beyondAt = (state: ArrayLike<number>) => way * state[5]! - QUARTER;
  if (way * from.state[2]! <= 0) return { time: 0, beyond: beyondAt(from.state) };
  const event = (_: number, state: Float64Array) => Math.max(-way * state[2]!, beyondAt(state) - QUARTER);
  const sailed = sail(craft, from, counterTo(craft, throttle, way), { event });
  if (sailed.status === 'infeasible') return { time: 0, beyond: QUARTER };
  const { end, last } = sailed.value.trajectory;
  return { time: end, beyond: beyondAt(last) };
}

const momentOf = (craft: TurningCraft, { motion, trajectory }: Sailed, t: number): Moment => ({
  state: trajectory.at(t),
  angles: craft.thrusters.map((_, i) => motion.angleAt(i, t)),
});
