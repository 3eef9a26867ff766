/** Air that the hull carries along, and moments of inertia in yaw. */
import { infeasible, solved } from '../../numeric/outcome.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { hullFlowOf } from '../../physics/flow/hullFlow.ts';
import { addedMassOf } from '../../physics/hull/addedMass.ts';
import { yawMassOf } from '../../physics/turning/yawMass.ts';
import type { Rows } from '../rows.ts';
import { rowsFrom } from './turnFigure.ts';

export function addedRows(state: CraftState): Rows {
  const mass = state.loading.solid.mass > 0 ? solved(yawMassOf(state)) : infeasible('The craft has no mass.');
  return {
    ...rowsFrom(solved(addedMassOf(state.hull)), {
      'added.k1': ({ surge }) => surge,
      'added.k2': ({ sway }) => sway,
      'added.kPrime': ({ yaw }) => yaw,
    }),
    ...rowsFrom(mass, {
      'inertia.yaw': ({ solidYaw, gasYaw }) => solidYaw + gasYaw,
      'inertia.airYaw': ({ airYaw }) => airYaw,
    }),
  };
}

/** Takes the flow about the hull: some milliseconds for a new hull. */
export function hullAirRows({ hull }: CraftState): Rows {
  const flow = hullFlowOf(hull);
  return rowsFrom(flow.status === 'solved' ? flow.value.addedMass() : flow, {
    'added.hullK1': ({ surge }) => surge,
    'added.hullK2': ({ sway }) => sway,
    'added.hullKPrime': ({ yaw }) => yaw,
  });
}
