/**
 * What a plan has to keep, as limits that are linear in the sums S = (Σm, Σm x, Σm y, Σm z):  g · S ≤ bound.
 *
 *   hang vector q = Σ m (p − B);  upright means q_z < 0.
 *   pitch:  |q_x| ≤ tan τ_p (−q_z)   heel:  |q_y| ≤ tan τ_h (−q_z)
 *   heaviness:  least ≤ Σm − L ≤ most   pendulum depth h = −q_z / Σm ≥ floor:  q_z + floor Σm ≤ 0
 *
 * L gross lift, kg; B centre of buoyancy, m; τ tolerances, rad. Pitch and heel as in `balance/attitude.ts`, where
 * tan pitch = q_x / √(q_y² + q_z²): to take −q_z for the root is never too lenient, and too strict by 1/cos(heel) − 1,
 * 0.06 % of the tolerance at 2°. A hair is kept from each edge, so that a plan on the edge is inside in the rounding
 * of any later sum.
 */
import type { Targets } from '../../craft/schema.ts';
import type { CraftState } from '../craftState.ts';
import type { Share } from './share.ts';

export const LIMIT_KEYS = [
  'noseUp',
  'noseDown',
  'starboardDown',
  'portDown',
  'depth',
  'heaviest',
  'lightest',
] as const;
export type LimitKey = (typeof LIMIT_KEYS)[number];

export interface Limit {
  readonly key: LimitKey;
  /** g: for Σm, Σm x, Σm y, Σm z. */
  readonly gradient: readonly [number, number, number, number];
  readonly bound: number;
}

/** rad, kg, m */
export const HAIR = { angle: 1e-6, mass: 1e-7, depth: 1e-7 } as const;

/** A tolerance past this is as good as none, rad. */
const WIDEST = (89 * Math.PI) / 180;
/** A pendulum shallower than this is none, whatever the craft's targets allow, m. */
export const LEAST_DEPTH = 1e-4;

const tangent = (tolerance: number): number =>
  Math.tan(Math.min(tolerance - Math.min(HAIR.angle, tolerance / 2), WIDEST));

export function limitsOf({ craft, loading: { cb, grossLift } }: CraftState): Limit[] {
  const { heaviness, pitchTolerance, heelTolerance, leastPendulumDepth }: Targets = craft.targets;
  const [bx, by, bz] = cb;
  const [tp, th] = [tangent(pitchTolerance), tangent(heelTolerance)];
  const floor = Math.max(leastPendulumDepth, LEAST_DEPTH) + HAIR.depth;
  const inside = Math.min(HAIR.mass, (heaviness.most - heaviness.least) / 4);
  return [
    { key: 'noseUp', gradient: [-bx - tp * bz, 1, 0, tp], bound: 0 },
    { key: 'noseDown', gradient: [bx - tp * bz, -1, 0, tp], bound: 0 },
    { key: 'starboardDown', gradient: [-by - th * bz, 0, 1, th], bound: 0 },
    { key: 'portDown', gradient: [by - th * bz, 0, -1, th], bound: 0 },
    { key: 'depth', gradient: [floor - bz, 0, 0, 1], bound: 0 },
    { key: 'heaviest', gradient: [1, 0, 0, 0], bound: grossLift + heaviness.most - inside },
    { key: 'lightest', gradient: [-1, 0, 0, 0], bound: -(grossLift + heaviness.least + inside) },
  ];
}

export const along = ({ gradient: [m, x, y, z] }: Limit, share: Share): number =>
  m * share[0] + x * share[1] + y * share[2] + z * share[3];

/**
 * How far beyond its limit something is, in what the limit is about: rad for attitude, m for depth, kg for heaviness.
 * Negative inside.
 */
export function excessOf(limit: Limit, share: Share, spread: number, cbHeight: number): number {
  const over = along(limit, share) + spread - limit.bound;
  switch (limit.key) {
    case 'heaviest':
    case 'lightest':
      return over;
    case 'depth':
      return over / Math.max(share[0], 1e-9);
    default:
      return over / Math.max(Math.abs(share[3] - share[0] * cbHeight), 1e-9);
  }
}

/** What of an excess is only the hair kept from the edge. */
export const hairOf = ({ key }: Limit): number =>
  key === 'depth' ? HAIR.depth : key === 'heaviest' || key === 'lightest' ? HAIR.mass : HAIR.angle;
