/**
 * What the craft's motion in the horizontal plane has to speed up, axes at the CB: X ahead, Y to starboard, yaw + to starboard.
 *
 *       ⎡ m + k₁ρV      0       −m Y_G ⎤      m    solid mass and gas, kg; the gas moves and turns with the hull
 *   M = ⎢    0       m + k₂ρV    m X_G ⎥      X_G  CG of them both ahead of the CB, Y_G to starboard, m
 *       ⎣ −m Y_G      m X_G        I   ⎦      I  = I_z + I_gas + k′ I_air about the upright axis through the CB, kg·m²
 *
 * k₁, k₂, k′ of the ellipsoid of equal length, breadth and height (hull/addedMass.ts); I_air of the displaced air. The gas
 * has its own CG at the CB, so that m X_G comes from the solid mass alone.
 *
 * Virtual mass centre: the point at which a side force gives no yaw, m X_G/(m + k₂ρV) ahead of the CB, and a force
 * along the hull none at m Y_G/(m + k₁ρV) to starboard of it. About it the moment of inertia is I less what the two take.
 *
 * Source: rigid body and added mass in the plane, H. Lamb, Hydrodynamics (1932), §§ 121–126; the letters are those of SNAME,
 * Technical and Research Bulletin 1-5 (1950) (from memory).
 */
import type { CraftState } from '../craftState.ts';
import { addedMassOf } from '../hull/addedMass.ts';
import { yawInertia } from '../mass/body.ts';

export interface YawMass {
  /** Solid, kg, and its CG from the CB, ahead and to starboard, m. */
  readonly solid: number;
  readonly cgAhead: number;
  readonly cgSide: number;
  /** M: kg, kg, kg·m², and the couplings m X_G and m Y_G, kg·m. */
  readonly surge: number;
  readonly sway: number;
  readonly yaw: number;
  readonly ahead: number;
  readonly side: number;
  /** Virtual mass centre from the CB, m, and the moment of inertia about it, kg·m². */
  readonly centreAhead: number;
  readonly centreSide: number;
  readonly centreYaw: number;
  /** Parts of `yaw`, kg·m²: solid mass, gas, and air carried along. */
  readonly solidYaw: number;
  readonly gasYaw: number;
  readonly airYaw: number;
}

/** The craft must have solid mass. */
export function yawMassOf({ hull, air, gasDensity, bodies, loading }: CraftState): YawMass {
  const { mass: solid, moment } = loading.solid;
  const added = addedMassOf(hull);
  const moving = solid + gasDensity * hull.volume;
  const displaced = air.density * hull.volume;
  const solidYaw = yawInertia(bodies, loading.cb);
  const gasYaw = gasDensity * hull.volumeInertia[2];
  const airYaw = added.yaw * air.density * hull.volumeInertia[2];
  const [cgAhead, cgSide] = [loading.cb[0] - moment[0] / solid, moment[1] / solid];
  const [ahead, side] = [solid * cgAhead, solid * cgSide];
  const [surge, sway] = [moving + added.surge * displaced, moving + added.sway * displaced];
  const yaw = solidYaw + gasYaw + airYaw;
  const [centreAhead, centreSide] = [ahead / sway, side / surge];
  return {
    solid,
    cgAhead,
    cgSide,
    surge,
    sway,
    yaw,
    ahead,
    side,
    centreAhead,
    centreSide,
    centreYaw: yaw - ahead * centreAhead - side * centreSide,
    solidYaw,
    gasYaw,
    airYaw,
  };
}
