/** A craft reduced to what decides how it pitches: moments about the CB, in the vertical plane. */
import { kept } from '../../numeric/kept.ts';
import { integrateFixed } from '../../numeric/quadrature.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { STANDARD_GRAVITY } from '../../units/constants.ts';
import { hangOf, heavinessOf } from '../balance/loading.ts';
import type { CraftState } from '../craftState.ts';
import { addedMassOf } from '../hull/addedMass.ts';
import type { Hull } from '../hull/hull.ts';
import { type Drag, dragOf } from '../thrust/drag.ts';
import { type Fin, finsOf } from '../thrust/fins.ts';
import { type Thruster, thrustersOf } from '../thrust/thrusters.ts';
import { finiteLength } from '../turning/strips.ts';

export interface PitchCraft {
  readonly cb: Vec3;
  /** g W (x_G − x_B), N·m, + tail-heavy; g W (z_B − z_G), N·m, + with the CG below the CB. */
  readonly tailHeavy: number;
  readonly pendulum: number;
  /** Weight less lift, N. */
  readonly heaviness: number;
  /** (k₃ − k₁) ρV, kg: what Munk's moment goes with. */
  readonly munkMass: number;
  /** kg/m³ */
  readonly density: number;
  readonly thrusters: readonly Thruster[];
  readonly fins: readonly Fin[];
  readonly drag: Drag;
  readonly crossFlow: CrossFlow;
}

export interface CrossFlow {
  /** ½ · 1.2 · η · outline area seen from above, m²: times ρ w|w| the drag of the hull moving square to its axis. */
  readonly area: number;
  /** How far ahead of the CB that drag acts, m. */
  readonly ahead: number;
}

export function pitchCraftOf(state: CraftState): PitchCraft {
  const { hull, air, loading } = state;
  const [x, , z] = hangOf(loading);
  const { heave, surge } = addedMassOf(hull);
  return {
    cb: loading.cb,
    tailHeavy: STANDARD_GRAVITY * x,
    pendulum: -STANDARD_GRAVITY * z,
    heaviness: STANDARD_GRAVITY * heavinessOf(loading),
    munkMass: (heave - surge) * air.density * hull.volume,
    density: air.density,
    thrusters: thrustersOf(state),
    fins: finsOf(state),
    drag: dragOf(state),
    crossFlow: crossFlowOf(hull),
  };
}

const ENDLESS = 1.2;

/** Strips as in turning/strips.ts, all at one speed across, so that only area and centroid of the outline count. */
const crossFlowOf = kept((hull: Hull): CrossFlow => {
  const { length, breadth, planformArea, cbStation } = hull;
  // x = ½ l (1 − cos φ), so that round ends are met.
  const moment = integrateFixed(
    (angle) => {
      const station = (length / 2) * (1 - Math.cos(angle));
      return 2 * hull.radius(station, Math.PI / 2) * (cbStation - station) * (length / 2) * Math.sin(angle);
    },
    0,
    Math.PI,
    16,
    8,
  );
  return {
    area: 0.5 * ENDLESS * finiteLength(length / breadth) * planformArea,
    ahead: moment / planformArea,
  };
});
