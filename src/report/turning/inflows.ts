/** The air that reaches each propeller in cruise, and what it does for the thrust per watt. */
import { kept } from '../../numeric/kept.ts';
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { kinematicViscosity } from '../../physics/air/viscosity.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { boundaryLayerOf } from '../../physics/flow/boundaryLayer.ts';
import { type HullFlow, hullFlowOf } from '../../physics/flow/hullFlow.ts';
import { powerAgainstFree } from '../../physics/flow/idealPower.ts';
import { type Inflow, inflowAt } from '../../physics/flow/inflow.ts';
import { discArea } from '../../physics/thrust/propeller.ts';
import { type Thruster, thrustAt } from '../../physics/thrust/thrusters.ts';
import type { Rows } from '../rows.ts';
import { ifDriven } from './thrusterWords.ts';
import { rowsFrom } from './turnFigure.ts';

/** Of one piece of a thruster. */
export interface PropellerAir extends Inflow {
  readonly part: string;
  readonly copy: number;
  readonly name: string;
  /** Thrust per watt over that in free air. */
  readonly perWatt: number;
}

export interface Inflows {
  readonly each: readonly PropellerAir[];
  readonly cautions: readonly string[];
}

/** At a speed ahead, m/s, > 0. */
export const inflowsAt = (state: CraftState, speed: number, throttle: number): Outcome<Inflows> =>
  ifDriven(state, (thrusters) => {
    const flow = hullFlowOf(state.hull);
    if (flow.status === 'infeasible') return flow;
    const layer = layerOf(flow.value, speed, kinematicViscosity(state.air));
    if (layer.status === 'infeasible') return layer;
    const each = thrusters.map((thruster): PropellerAir => {
      const inflow = inflowAt(flow.value, layer.value, thruster);
      const { part, copy, name, diameter } = thruster;
      const thrust = thrustAt(thruster, throttle, speed);
      const perWatt = powerAgainstFree(thrust, discArea(diameter), state.air.density, speed, inflow.ratio);
      return { part, copy, name, ...inflow, perWatt };
    });
    return solved({ each, cautions: [...flow.value.cautions, ...layer.value.cautions] });
  });

/** While masses move, hull and speed stay as they are. */
const layerOf = kept((flow: HullFlow, speed: number, viscosity: number) =>
  boundaryLayerOf(flow, speed, viscosity),
);

/** Of all propellers together, each by the area of its disc. */
export function inflowRows(inflows: Outcome<Inflows>, thrusters: readonly Thruster[]): Rows {
  const areas = thrusters.map(({ diameter }) => discArea(diameter));
  const whole = areas.reduce((sum, area) => sum + area, 0);
  const mean = (of: (air: PropellerAir) => number) => (value: Inflows) =>
    value.each.reduce((sum, air, i) => sum + (areas[i]! / whole) * of(air), 0);
  const caution = inflows.status === 'solved' ? inflows.value.cautions.join(' ') : null;
  return {
    ...rowsFrom(
      withAir(inflows),
      {
        'inflow.ratio': mean(({ ratio }) => ratio),
        'inflow.perWatt': mean((air) => air.perWatt),
        'inflow.wakeShare': mean(({ wakeShare }) => wakeShare),
      },
      { 'inflow.ratio': { caution } },
    ),
    ...rowsFrom(inflows, { 'inflow.insideShare': mean(({ insideShare }) => insideShare) }),
  };
}

function withAir(inflows: Outcome<Inflows>): Outcome<Inflows> {
  if (inflows.status === 'infeasible') return inflows;
  const buried = inflows.value.each.find(({ insideShare }) => insideShare >= 1);
  return buried
    ? infeasible(`${buried.name} turns inside the hull, where no air reaches it.`, 'Move it out of the hull.')
    : inflows;
}
