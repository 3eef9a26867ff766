/**
 * What pushes and pitches a craft in steady straight flight in the vertical plane.
 *
 * Hull axes at the CB: a ahead, h above the CB, m; u forward, w upward speed of the CB, m/s; pitch θ, + nose-up. A force
 * (F_a, F_h) at (a, h) pitches the nose up with  M = a F_h − h F_a.  In N and N·m:
 *
 *   tail-heaviness  g W (x_G − x_B) cos θ                  weight and lift act along (−sin θ, −cos θ) and against it
 *   depth           −g W (z_B − z_G) sin θ
 *   thrust          T (a sin ε − h cos ε)                   below the CB it pitches the nose up
 *   drag of a part  h D(u)                                 below the CB it pitches the nose down
 *   Munk            −(k₃ − k₁) ρV u w = (k₃ − k₁) ρV ½U² sin 2α, with u = U cos α, w = −U sin α
 *   fins            a F_h,  F_h = −sin φ · F(u, −w sin φ): a fin at clock angle φ has its normal at (cos φ, −sin φ) of side
 *                   and height, moves at −w sin φ along it, and pushes with F of fins.ts
 *   cross-flow      of the hull, −½ρ · 1.2 · η S w|w| at the centroid of its outline from above (turning/strips.ts)
 *
 * The drag of the hull acts at the CB. Left out: downwash of the hull on the fins, the boundary layer they stand in, lift
 * of the hull beside the cross-flow's, cross-flow on what hangs outside, slipstream.
 *
 * Source: statics; M. Munk, NACA TR 184 (1924); strips and fins as named in their files.
 */
import { type AheadHelm, type Push, pushOf } from '../thrust/ahead.ts';
import { type Fin, finForce } from '../thrust/fins.ts';
import type { PitchCraft } from './pitchCraft.ts';

export interface Flight {
  /** m/s, along the hull axis, + forward, and square to it, + up. */
  readonly u: number;
  readonly w: number;
  /** rad, + nose-up */
  readonly pitch: number;
}

/** Flight at a speed and an angle of attack, the nose above the path when it is +. */
export const flightAt = (speed: number, attack: number, pitch: number): Flight => ({
  u: speed * Math.cos(attack),
  w: -speed * Math.sin(attack),
  pitch,
});

/** N·m about the CB, each + nose-up. */
export interface PitchTerms {
  readonly tailHeaviness: number;
  readonly depth: number;
  readonly thrust: number;
  /** Of what hangs outside, and of fins, at their heights. */
  readonly podDrag: number;
  readonly finDrag: number;
  readonly munk: number;
  readonly fins: number;
  readonly crossFlow: number;
}

export interface Loads {
  /** N of thrust and air together, weight and lift left out: along the hull axis and square to it, + up. */
  readonly forward: number;
  readonly up: number;
  readonly pushes: readonly Push[];
  readonly terms: PitchTerms;
  /** The sum of the terms. */
  readonly moment: number;
}

export function loadsOn(craft: PitchCraft, helm: AheadHelm, { u, w, pitch }: Flight): Loads {
  const { cb, fins, drag, density, crossFlow } = craft;
  const pushes = craft.thrusters.map((thruster) => pushOf(thruster, helm, u, w));
  const finLifts = fins.map((fin) => finLift(fin, density, u, w));
  const cross = -density * crossFlow.area * w * Math.abs(w);
  const podDrag = 0.5 * density * u * Math.abs(u);
  const terms: PitchTerms = {
    tailHeaviness: craft.tailHeavy * Math.cos(pitch),
    depth: -craft.pendulum * Math.sin(pitch),
    thrust: sum(pushes, ({ at, forward, up }) => (cb[0] - at[0]) * up - (at[2] - cb[2]) * forward),
    podDrag: sum(drag.podParts, ({ area, at }) => (at[2] - cb[2]) * area * podDrag),
    finDrag: sum(drag.finParts, ({ fin, drag: of }) => (fin.at[2] - cb[2]) * of(u)),
    munk: -craft.munkMass * u * w,
    fins: sum(fins, ({ at }, i) => (cb[0] - at[0]) * finLifts[i]!),
    crossFlow: crossFlow.ahead * cross,
  };
  return {
    forward: sum(pushes, ({ forward }) => forward) - drag.at(u),
    up: sum(pushes, ({ up }) => up) + sum(finLifts, (lift) => lift) + cross,
    pushes,
    terms,
    moment: sum(Object.values(terms), (term) => term),
  };
}

/** N, + up. */
function finLift(fin: Fin, density: number, u: number, w: number): number {
  const upward = -Math.sin(fin.clock);
  return upward * finForce(fin, density, u, w * upward);
}

function sum<T>(items: readonly T[], of: (item: T, i: number) => number): number {
  let total = 0;
  for (let i = 0; i < items.length; i += 1) total += of(items[i]!, i);
  return total;
}
