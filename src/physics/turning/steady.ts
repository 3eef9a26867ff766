/**
 * The steady turn under a command.
 *
 * The craft is followed from its cruise under the command until it comes within a hundredth of a root of steadyRoot.ts to
 * which it returns; that root is the answer. Where it comes to none in the time (it swings), the root is one found by
 * following the command from straight ahead in small steps, or from several starts, and is marked as not reached.
 *
 * Radius of the CB's path √(u² + v²)/|r|; drift angle atan2(−v, u) in a turn to starboard, atan2(v, u) to port: + nose
 * inside the turn, beyond 90° tail first.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import { straightAt } from './asked.ts';
import { notTurned } from './quarterTurn.ts';
import { COARSE, LONGEST, type Moment, sail, shownThruster } from './sail.ts';
import { settlesAt, sizesOf, steadyNear, type Velocity, velocityOf } from './steadyRoot.ts';
import { type Command, partOfTheWay } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export interface SteadyTurn {
  /** Of the CB's path, m, and in hull lengths. */
  readonly radius: number;
  readonly lengths: number;
  /** rad, + nose inside the turn */
  readonly drift: number;
  /** rad/s, + to starboard */
  readonly yawRate: number;
  /** Along the path, m/s. */
  readonly speed: number;
  /** Of the thruster whose angle stands for the craft's, rad, + thrust to starboard. */
  readonly vector: number;
}

export interface Settled {
  readonly turn: SteadyTurn;
  readonly velocity: Velocity;
  /** Whether the motion from cruise comes to it and stays. */
  readonly reached: boolean;
}

/** First stretch of time for which the motion is followed, s; each next is twice as long. */
const STRETCH = 4;
/** How near the motion must come to a root, against its sizes. */
const NEAR = 0.01;
/** A yaw rate below this share of speed ÷ length is none. */
const STRAIGHT = 1e-6;

export function steadyTurn(
  craft: TurningCraft,
  straight: Command,
  command: Command,
  cruiseSpeed: number,
): Outcome<Settled> {
  if (!craft.thrusters.some(({ staticThrust }, i) => staticThrust * command.shares[i]! !== 0)) {
    return infeasible('Without thrust there is no steady turn: the craft comes to rest.');
  }
  const still = notTurned(craft, command);
  if (still) return still;
  const sizes = sizesOf(craft, command, cruiseSpeed);
  let at: Moment = straightAt(cruiseSpeed, straight);
  let followed = 0;
  for (let stretch = STRETCH; followed < LONGEST; stretch *= 2) {
    const until = Math.min(stretch, LONGEST - followed);
    const sailed = sail(craft, at, command, { until, coarseness: COARSE });
    if (sailed.status !== 'solved') return sailed;
    at = sailed.value.end;
    followed += stretch;
    const end = velocityOf(at.state);
    const root = steadyNear(craft, command, end, sizes);
    if (root && isNear(root, end, sizes) && settlesAt(craft, command, root, sizes)) {
      return turnAt(craft, command, root, true);
    }
  }
  return unreached(craft, straight, command, at, sizes);
}

const isNear = (a: Velocity, b: Velocity, sizes: Velocity): boolean =>
  a.every((each, i) => Math.abs(each - b[i]!) <= NEAR * sizes[i]!);

/** Roots by following the command from straight ahead, and from several starts; the first that turns as the motion does. */
function unreached(
  craft: TurningCraft,
  straight: Command,
  command: Command,
  end: Moment,
  sizes: Velocity,
): Outcome<Settled> {
  const last = velocityOf(end.state);
  const way = Math.sign(last[2]) || 1;
  const [speed, , rate] = sizes;
  const starts: Velocity[] = [
    ...followedFromStraight(craft, straight, command, sizes),
    last,
    [0.5 * speed, -0.2 * way * speed, 0.5 * way * rate],
    [0.2 * speed, -0.1 * way * speed, way * rate],
    [0, 0, way * rate],
  ];
  const roots = starts
    .map((start) => steadyNear(craft, command, start, sizes))
    .filter((root): root is Velocity => root !== null);
  const root = roots.find((each) => each[2] * way > STRAIGHT * rate) ?? roots[0];
  if (!root) {
    return infeasible(
      `No steady turn was found: after ${say(LONGEST, 'time')} the craft still swings, and yaws ${say(last[2], 'yawRate')}.`,
      'Larger fins, or less vectoring, would steady it.',
    );
  }
  return turnAt(craft, command, root, false);
}

/** Roots on the way from straight ahead to the command, each sought from the one before; the last is the command's own. */
function followedFromStraight(
  craft: TurningCraft,
  straight: Command,
  command: Command,
  sizes: Velocity,
): Velocity[] {
  let root: Velocity = [sizes[0], 0, 0];
  for (let i = 1; i <= WAY_STEPS; i += 1) {
    const next = steadyNear(craft, partOfTheWay(straight, command, i / WAY_STEPS), root, sizes);
    if (!next) return [];
    root = next;
  }
  return [root];
}

const WAY_STEPS = 10;

/** The turn at a root, or infeasible where that does not turn. */
export function turnAt(
  craft: TurningCraft,
  command: Command,
  velocity: Velocity,
  reached: boolean,
): Outcome<Settled> {
  const [u, v, r] = velocity;
  const speed = Math.hypot(u, v);
  if (Math.abs(r) * craft.length <= STRAIGHT * speed) {
    return infeasible('The craft ends up going straight on: the air holds it against the thrusters.');
  }
  const radius = speed / Math.abs(r);
  const turn = {
    radius,
    lengths: radius / craft.length,
    drift: Math.atan2(-Math.sign(r) * v, u),
    yawRate: r,
    speed,
    vector: command.angles[shownThruster(craft)]!,
  };
  return solved({ turn, velocity, reached });
}
