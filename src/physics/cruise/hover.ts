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
 * Thrusters that cannot be turned that far take no part. Derived from moments about S.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { STANDARD_GRAVITY } from '../../units/constants.ts';
import { say } from '../../units/sentence.ts';
import { heavinessOf, type Loading } from '../balance/loading.ts';
import type { CraftState } from '../craftState.ts';
import { momentAbout } from '../mass/body.ts';
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
  /** Ids of the parts that take part, each once. */
  readonly parts: readonly string[];
}

/** Lighter or heavier than this by less needs no thrust, N. */
const NOTHING = 1e-6;

export function hoverOf(state: CraftState): Outcome<Hover> {
  const thrusters = thrustersOf(state).filter(({ staticThrust }) => staticThrust > 0);
  if (thrusters.length === 0) return NO_THRUSTER;
  const forward = hoverWith(state.loading, thrusters, false);
  if (forward.status === 'solved') return forward;
  const able = thrusters.filter(({ reverse }) => reverse > 0);
  const backward = able.length > 0 ? hoverWith(state.loading, able, true) : forward;
  return backward.status === 'solved' ? backward : forward;
}

/** Thrusters are left out one after the other, the one that reaches least far first, until the rest can be turned as needed. */
function hoverWith(loading: Loading, thrusters: readonly Thruster[], reversed: boolean): Outcome<Hover> {
  const needed = STANDARD_GRAVITY * heavinessOf(loading);
  const strengths = thrusters.map(({ staticThrust, reverse }) => (reversed ? reverse : 1) * staticThrust);
  const available = strengths.reduce((sum, each) => sum + each, 0);
  const pitch = levelPitch(loading, thrustCentre(thrusters, strengths, available));
  const upward = needed > 0 !== reversed;
  const vector = (upward ? Math.PI / 2 : -Math.PI / 2) - pitch;
  const short = thrusters.map((thruster) => shortOf(thruster, vector));
  const worst = short.indexOf(Math.max(...short));
  if (Math.abs(needed) > NOTHING && short[worst]! > ROUNDING) {
    if (thrusters.length > 1)
      return hoverWith(
        loading,
        thrusters.filter((_, i) => i !== worst),
        reversed,
      );
    return outOfReach(thrusters[0]!, needed, vector);
  }
  const share = Math.abs(needed) / available;
  if (share > 1) return tooWeak(needed, available);
  if (Math.abs(pitch) > FARTHEST) return tooSteep(pitch);
  const parts = [...new Set(thrusters.map(({ part }) => part))];
  return solved({ pitch, vector, reversed, needed, available, share, parts });
}

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
  const task = needed > 0 ? 'To carry the heaviness' : 'To hold the lightness';
  const limits =
    most > least
      ? `turns from ${say(least, 'angle')} to ${say(most, 'angle')}`
      : `is fixed at ${say(least, 'angle')}`;
  return infeasible(
    `${task} the thrust has to stand at ${say(vector, 'angle')} to the hull; ${name} ${limits}.`,
    'Let a thruster turn further in pitch, or trim the craft to no heaviness.',
  );
}

const tooWeak = (needed: number, available: number) =>
  infeasible(
    `Hovering takes ${say(Math.abs(needed), 'force')} of thrust; the thrusters that can be turned that far give ${say(available, 'force')}.`,
    'Trim the craft nearer to no heaviness, or fit more thrust.',
  );

const tooSteep = (pitch: number) =>
  infeasible(
    `Hovering on its thrusters the craft would stand at ${say(pitch, 'angle')}, more than ${say(FARTHEST, 'angle')} from level.`,
    'Bring the thrusters under the CB, or hang weight lower.',
  );
