/** A craft reduced to what decides how it turns: plain numbers, so that a motion can be followed in little time. */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { CraftState } from '../craftState.ts';
import { type Drag, dragOf } from '../thrust/drag.ts';
import { type Fin, finsOf } from '../thrust/fins.ts';
import { NO_THRUSTER } from '../thrust/speed.ts';
import { type Thruster, thrustersOf } from '../thrust/thrusters.ts';
import { type Strips, stripsOf } from './strips.ts';
import { type YawMass, yawMassOf } from './yawMass.ts';

export interface TurningCraft {
  /** Of the hull, m. */
  readonly length: number;
  /** Station of the CB, m. */
  readonly cb: number;
  /** Of the air, kg/m³. */
  readonly density: number;
  readonly mass: YawMass;
  readonly thrusters: readonly Thruster[];
  readonly fins: readonly Fin[];
  readonly strips: Strips;
  readonly drag: Drag;
}

export function turningCraftOf(state: CraftState): Outcome<TurningCraft> {
  const thrusters = thrustersOf(state);
  if (thrusters.length === 0) return NO_THRUSTER;
  if (!(state.loading.solid.mass > 0)) return infeasible('There is no mass to turn.');
  return solved({
    length: state.hull.length,
    cb: state.loading.cb[0],
    density: state.air.density,
    mass: yawMassOf(state),
    thrusters,
    fins: finsOf(state),
    strips: stripsOf(state.hull),
    drag: dragOf(state),
  });
}

/** Distance of a thruster from the CG of the solid mass, m: ahead, and to starboard. */
export const leverOf = (craft: TurningCraft, { at }: Thruster): readonly [ahead: number, side: number] => [
  craft.cb - at[0] - craft.mass.cgAhead,
  at[1] - craft.mass.cgSide,
];
