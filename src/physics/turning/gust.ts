/**
 * The side gust that the thrusters can hold: the greatest W such that for every gust w ≤ W from either side they can keep
 * the craft from yawing.
 *
 *   N_V = N − X_V Y + Y_V X  about the virtual mass centre (yawMass.ts), with the craft through the air at (u, ∓w, 0)
 *
 * of everything in motion.ts: Munk's moment, fins, cross-flow, drag and thrust. It is held when N_V ≥ 0 with the
 * thrusters hardest to starboard and N_V ≤ 0 hardest to port: somewhere between they balance it. The gust is steady, as
 * wide as the craft, and strikes before the craft has drifted off with it; the speed ahead is kept.
 */
import { valueOrNull } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import { type Motion, motionOf } from './motion.ts';
import { LONGEST } from './sail.ts';
import { commandOf } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

/** No stronger gust is looked at, m/s: a craft that holds it answers with this. */
export const STRONGEST = 50;
const WEAKEST = 0.01;
const GROWTH = 1.1;

/** N·m about the virtual mass centre at (u, v, 0), + to starboard. */
function momentAt({ mass }: TurningCraft, { forces }: Motion, u: number, v: number): number {
  const sums = new Float64Array(3);
  forces(LONGEST, Float64Array.of(u, v, 0), sums);
  return sums[2]! - mass.centreAhead * sums[1]! + mass.centreSide * sums[0]!;
}

export interface GustMoments {
  /** Of the air alone, N·m, + to starboard. */
  readonly air: number;
  /** What the thrusters add at most to either side, N·m: to starboard, and to port (negative). */
  readonly starboard: number;
  readonly port: number;
}

/** Moments about the virtual mass centre against the speed to starboard through the air. */
export function gustMoments(craft: TurningCraft, throttle: number, u: number): (v: number) => GustMoments {
  const motionAt = (share: number, steer: -1 | 0 | 1) =>
    motionOf(craft, commandOf(craft, { throttle: share, steer, vector: null }));
  const [still, starboard, port] = [motionAt(0, 0), motionAt(throttle, 1), motionAt(throttle, -1)];
  return (v) => {
    const air = momentAt(craft, still, u, v);
    return {
      air,
      starboard: momentAt(craft, starboard, u, v) - air,
      port: momentAt(craft, port, u, v) - air,
    };
  };
}

/** m/s, at a speed ahead; up to STRONGEST. */
export function gustHeld(craft: TurningCraft, throttle: number, u: number): number {
  const moments = gustMoments(craft, throttle, u);
  const spare = (w: number) => Math.min(...[w, -w].map((v) => spareOf(moments(v))));
  if (spare(0) < 0) return 0;
  let held = 0;
  for (let w = WEAKEST; held < STRONGEST; w = Math.min(w * GROWTH, STRONGEST)) {
    if (spare(w) < 0) return edgeOf(spare, held, w);
    held = w;
  }
  return STRONGEST;
}

const spareOf = ({ air, starboard, port }: GustMoments): number => Math.min(air + starboard, -air - port);

/** Where the moment to spare is used up, between a gust that is held and one that is not. */
const edgeOf = (spare: (w: number) => number, held: number, lost: number): number =>
  spare(held) > 0 ? (valueOrNull(findRoot(spare, held, lost, 1e-9)) ?? held) : held;

export interface HardestGust {
  /** What the thrusters have against the air's moment, over that moment; at most EASY. */
  readonly ratio: number;
  /** The moment they have, N·m. */
  readonly available: number;
}

const EASY = 1e6;
const TRIED = 64;

/** Of all gusts up to `strongest` from either side, the one that is hardest to hold. */
export function hardestGust(
  craft: TurningCraft,
  throttle: number,
  u: number,
  strongest: number,
): HardestGust {
  const moments = gustMoments(craft, throttle, u);
  let hardest: HardestGust = { ratio: EASY, available: 0 };
  for (let i = 1; i <= TRIED; i += 1) {
    for (const v of [(strongest * i) / TRIED, (-strongest * i) / TRIED]) {
      const { air, starboard, port } = moments(v);
      const available = air > 0 ? -port : starboard;
      const ratio = air === 0 ? EASY : Math.min(available / Math.abs(air), EASY);
      if (ratio < hardest.ratio) hardest = { ratio, available };
    }
  }
  return hardest;
}
