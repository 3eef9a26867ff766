/**
 * The side gust that the thrusters can hold: the greatest W such that for every gust w ≤ W from either side they can keep
 * the craft from yawing.
 *
 *   N_V = N − X_V Y + Y_V X  about the virtual mass centre (yawMass.ts), with the craft through the air at (u, ∓w, 0)
 *
 * of everything in motion.ts: Munk's moment, fins, cross-flow, drag and thrust. It is held when N_V ≥ 0 with the
 * thrusters hardest to starboard and N_V ≤ 0 hardest to port: somewhere between they balance it. The gust is steady, as
 * wide as the craft, and strikes before the craft has drifted off with it; the speed ahead is kept.
 *
 * At rest (u = 0) cross-flow and fins are all that yaws it. With way on Munk's moment comes on top, soon many times as
 * great: a real hull has less of it than flow without friction gives (from memory), so that the gust held in cruise errs low.
 */
import { valueOrNull } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import { momentUnder } from './motion.ts';
import { commandOf } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

/** No stronger gust is looked at, m/s: a craft that holds it answers with this. */
export const STRONGEST = 50;
const WEAKEST = 0.01;
const GROWTH = 1.1;

export interface GustMoments {
  /** Of the air alone, N·m, + to starboard. */
  readonly air: number;
  /** What the thrusters add at most to either side, N·m: to starboard, and to port (negative). */
  readonly starboard: number;
  readonly port: number;
}

/** Moments about the virtual mass centre against the speed to starboard through the air. */
export function gustMoments(craft: TurningCraft, throttle: number, u: number): (v: number) => GustMoments {
  const momentOf = (share: number, steer: -1 | 0 | 1) =>
    momentUnder(craft, commandOf(craft, { throttle: share, steer, vector: null }));
  const [still, hardStarboard, hardPort] = [momentOf(0, 0), momentOf(throttle, 1), momentOf(throttle, -1)];
  return (v) => {
    const air = still(u, v);
    const [one, other] = [hardStarboard(u, v) - air, hardPort(u, v) - air];
    // At speed the thrust that is hardest at rest may be spent.
    return { air, starboard: Math.max(one, other), port: Math.min(one, other) };
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
const TRIED = 8;

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
