/**
 * Hover: the heaviness of a craft at rest carried by its thrusters turned up, or its lightness held by turning them down.
 *
 *   thrust  Σ T = |H|, each thruster with the same share of what it can give at rest; S the mean of their places so weighted
 *   pitch   tan θ = (q_x)/(−q_z),  q = W G − L B − (W − L) S  as in balance/support.ts
 *   angle   ε = ±90° − θ: + when the thrust stands up with H > 0, − when it stands down; the other way round in reverse
 *
 * H weight less lift, N. The thrusters stand at that angle to the hull, so that the attitude nearest to level holds by the
 * pendulum even where a foot at S would tip over. Still air, thrust as at rest, heel and downwash on the hull left out.
 *
 * Thrusters that cannot be turned that far take no part. Where none can, but some come within 5° of it, s short, those
 * stand at their limit: Σ T = |H| / cos s, and |H| tan s is left that pushes the craft ahead or astern. The moment of that
 * force and of the drag it meets is left out. Derived from moments about S.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { STANDARD_GRAVITY } from '../../units/constants.ts';
import { say } from '../../units/sentence.ts';
import { heavinessOf, type Loading } from '../balance/loading.ts';
import type { CraftState } from '../craftState.ts';
import { momentAbout } from '../mass/body.ts';
import { heldWithin } from '../thrust/ahead.ts';
import { NO_THRUSTER } from '../thrust/speed.ts';
import { type Thruster, thrustersOf } from '../thrust/thrusters.ts';
import { FARTHEST } from './cruise.ts';

export interface Hover {
  /** rad, + nose-up */
  readonly pitch: number;
  /** Of every thruster that takes part, to the hull, rad, + thrust up. */
  readonly vector: number;
  /** Whether they push backwards. */
  readonly reversed: boolean;
  /** N, upward: above 0 carries a heavy craft, below it holds a light one. */
  readonly needed: number;
  /** N that the thrusters taking part give at rest, as they are used. */
  readonly available: number;
  /** Needed over available, 0 … 1. */
  readonly share: number;
  /** N, + ahead: left where the thrust does not stand quite upright; the craft drifts by it. */
  readonly sideways: number;
  /** Ids of the parts that take part, each once. */
  readonly parts: readonly string[];
  /** One sentence each. */
  readonly cautions: readonly string[];
}

/** Lighter or heavier than this by less needs no thrust, N. */
const NOTHING = 1e-6;

export function hoverOf(state: CraftState): Outcome<Hover> {
  const thrusters = thrustersOf(state).filter(({ staticThrust }) => staticThrust > 0);
  if (thrusters.length === 0) return NO_THRUSTER;
  const able = thrusters.filter(({ reverse }) => reverse > 0);
  const tries = [ROUNDING, NEARLY].flatMap((slack) => [
    hoverWith(state.loading, thrusters, false, slack),
    ...(able.length > 0 ? [hoverWith(state.loading, able, true, slack)] : []),
  ]);
  return tries.find(({ status }) => status === 'solved') ?? tries[0]!;
}

/**
 * Thrusters are left out one after the other, the one that reaches least far first, until the rest can be turned as
 * needed, or nearly so by `slack`, rad.
 */
function hoverWith(
  loading: Loading,
  thrusters: readonly Thruster[],
  reversed: boolean,
  slack: number,
): Outcome<Hover> {
  const needed = STANDARD_GRAVITY * heavinessOf(loading);
  const strengths = thrusters.map(({ staticThrust, reverse }) => (reversed ? reverse : 1) * staticThrust);
  const available = strengths.reduce((sum, each) => sum + each, 0);
  const pitch = levelPitch(loading, thrustCentre(thrusters, strengths, available));
  const upward = needed > 0 !== reversed;
  const upright = (upward ? Math.PI / 2 : -Math.PI / 2) - pitch;
  const idle = Math.abs(needed) <= NOTHING;
  const short = thrusters.map((thruster) => (idle ? 0 : shortOf(thruster, upright)));
  const worst = short.indexOf(Math.max(...short));
  if (short[worst]! > slack && thrusters.length > 1) {
    const rest = thrusters.filter((_, i) => i !== worst);
    return hoverWith(loading, rest, reversed, slack);
  }
  if (Math.abs(pitch) > FARTHEST) return tooSteep(pitch, needed);
  if (short[worst]! > slack) return outOfReach(thrusters[0]!, needed, upright);
  const vector = idle
    ? upright
    : thrusters.reduce((angle, { pitch: limits }) => heldWithin(limits, angle), upright);
  const thrust = Math.abs(needed) / Math.cos(vector - upright);
  if (thrust > available) return tooWeak(thrust, available);
  const sideways = (reversed ? -1 : 1) * thrust * Math.cos(vector + pitch);
  return solved({
    pitch,
    vector,
    reversed,
    needed,
    available,
    share: thrust / available,
    sideways,
    parts: [...new Set(thrusters.map(({ part }) => part))],
    cautions: Math.abs(vector - upright) > ROUNDING ? [drifts(upright, vector, sideways)] : [],
  });
}

/** So near to upright it is a hover that drifts, rad. */
const NEARLY = (5 * Math.PI) / 180;

const way = (sideways: number): string => (sideways > 0 ? 'ahead' : 'astern');

const drifts = (upright: number, vector: number, sideways: number): string =>
  `The thrust would have to stand at ${say(upright, 'angle')} to the hull; turned to its limit of ${say(vector, 'angle')} it holds the height and pushes the craft ${way(sideways)} with ${say(Math.abs(sideways), 'force')}: it drifts.`;

/** Angles as near as this are one, rad. */
const ROUNDING = 1e-9;

/** How far beyond its limits the angle lies, rad, ≥ 0. */
const shortOf = ({ pitch: { least, most } }: Thruster, angle: number): number =>
  Math.max(least - angle, angle - most, 0);

function thrustCentre(thrusters: readonly Thruster[], strengths: readonly number[], total: number): Vec3 {
  const mean = (i: 0 | 1 | 2) => thrusters.reduce((sum, { at }, k) => sum + strengths[k]! * at[i], 0) / total;
  return [mean(0), mean(1), mean(2)];
}

/** Of the two attitudes at which weight, lift and thrust balance the one nearer to level, rad. */
function levelPitch({ solid, cb, grossLift }: Loading, at: Vec3): number {
  const [wx, , wz] = momentAbout(solid, at);
  const [x, z] = [wx - grossLift * (cb[0] - at[0]), wz - grossLift * (cb[2] - at[2])];
  return z > 0 ? Math.atan2(-x, z) : Math.atan2(x, -z);
}

function outOfReach({ name, pitch: { least, most } }: Thruster, needed: number, vector: number) {
  const [force, mass] = [Math.abs(needed), Math.abs(needed) / STANDARD_GRAVITY];
  const task =
    needed > 0
      ? `It is heavy by ${say(force, 'force')}, which the thrust has to carry`
      : `It is light by ${say(force, 'force')} and has to be held down`;
  const limits =
    most > least
      ? `can turn from ${say(least, 'angle')} to ${say(most, 'angle')}`
      : `can only stand at ${say(least, 'angle')}`;
  return infeasible(
    `${task} at ${say(vector, 'angle')} to the hull; ${name} ${limits}.`,
    `Let a thruster turn further in pitch, or ${needed > 0 ? 'take off' : 'hang on'} ${say(mass, 'mass')}, so that it needs no thrust to stay.`,
  );
}

const tooWeak = (needed: number, available: number) =>
  infeasible(
    `Hovering takes ${say(Math.abs(needed), 'force')} of thrust; the thrusters that can be turned that far give ${say(available, 'force')}.`,
    'Bring weight nearer to lift, or fit more thrust.',
  );

const tooSteep = (pitch: number, needed: number) =>
  infeasible(
    `${needed > 0 ? 'It is heavy' : 'It is light'} by ${say(Math.abs(needed), 'force')}; ${needed > 0 ? 'carried' : 'held down'} by its thrusters it would stand at ${say(pitch, 'angle')}, more than ${say(FARTHEST, 'angle')} from level.`,
    'Bring the thrusters under the CB, hang weight lower, or bring weight nearer to lift.',
  );
