/** Figures of CG, attitude and pendulum. */
import { infeasible, type Outcome } from '../numeric/outcome.ts';
import type { Vec3 } from '../numeric/vector.ts';
import type { Attitude } from '../physics/balance/attitude.ts';
import { floatOf, rightingMoment } from '../physics/balance/float.ts';
import { cgOf, heavinessOf, type Loading, pendulumDepthOf } from '../physics/balance/loading.ts';
import { spreadOf } from '../physics/balance/spread.ts';
import { supportedAttitude } from '../physics/balance/support.ts';
import { swingPeriod } from '../physics/balance/swing.ts';
import type { CraftState } from '../physics/craftState.ts';
import { addedMassOf } from '../physics/hull/addedMass.ts';
import { pitchInertia } from '../physics/mass/body.ts';
import { positionOf } from '../physics/mass/position.ts';
import type { Quantity } from '../units/units.ts';
import type { Row } from './row.ts';
import { noRow, type Rows, row, rowOf } from './rows.ts';

/** Standard uncertainty of a figure that depends on the solid masses. */
export const spread = (state: CraftState, figure: (loading: Loading) => number | null): number | null =>
  spreadOf((solid) => figure({ ...state.loading, solid }), state.loading.solid, state.covariance);

export function floatRows(state: CraftState): Rows {
  const { loading } = state;
  const attitude = floatOf(loading);
  const depth = pendulumDepthOf(loading);
  return {
    'cg.station': cgRow(state, 'CG station', 0),
    'cg.side': cgRow(state, 'CG side', 1),
    'cg.height': cgRow(state, 'CG height', 2),
    'float.pitch': attitudeRow(
      attitude,
      'pitch',
      'Floats at pitch',
      '+ nose-up.',
      spread(state, angleOf('pitch')),
    ),
    'float.heel': attitudeRow(
      attitude,
      'heel',
      'Floats at heel',
      '+ starboard down.',
      spread(state, angleOf('heel')),
    ),
    'float.pendulumDepth':
      depth === null
        ? noMass('Pendulum depth', 'smallLength')
        : row({
            label: 'Pendulum depth',
            quantity: 'smallLength',
            value: depth,
            uncertainty: spread(state, pendulumDepthOf),
            caution: depth > 0 ? null : 'The CG is not below the CB: the craft turns over.',
            why: 'CB height less CG height.',
          }),
    'float.rightingMoment': row({
      label: 'Righting moment',
      quantity: 'momentPerAngle',
      value: rightingMoment(loading),
      why: 'For small turns about level.',
    }),
    'float.swingPeriod': swingRow(state),
  };
}

const angleOf = (which: keyof Attitude) => (loading: Loading) => {
  const attitude = floatOf(loading);
  return attitude.status === 'solved' ? attitude.value[which] : null;
};

const noMass = (label: string, quantity: Quantity): Row => noRow(label, quantity, 'The craft has no mass.');

function cgRow(state: CraftState, label: string, axis: 0 | 1 | 2): Row {
  const cg = cgOf(state.loading);
  if (!cg) return noMass(label, 'length');
  const uncertainty = spread(state, (loading) => cgOf(loading)?.[axis] ?? null);
  return row({ label, quantity: 'length', value: cg[axis], uncertainty });
}

const attitudeRow = (
  attitude: Outcome<Attitude>,
  which: keyof Attitude,
  label: string,
  why: string,
  uncertainty: number | null = null,
): Row =>
  attitude.status === 'solved'
    ? row({ label, quantity: 'angle', value: attitude.value[which], uncertainty, why })
    : rowOf(attitude, label, 'angle');

function swingRow(state: CraftState): Row {
  const { air, bodies, gasDensity, hull, loading } = state;
  const added = addedMassOf(hull);
  const period = swingPeriod({
    solidMass: loading.solid.mass,
    pendulumDepth: pendulumDepthOf(loading) ?? 0,
    solidInertia: pitchInertia(bodies, loading.cb),
    gasInertia: gasDensity * hull.volumeInertia[1],
    airInertia: air.density * hull.volumeInertia[1],
    gasMass: gasDensity * hull.volume,
    airMass: air.density * hull.volume,
    surge: added.surge,
    pitch: added.pitch,
  });
  return rowOf(period, 'Swing period', 'time', {
    why: 'Small swings in pitch about level, free in still air, with the hull’s added mass taken as that of the ellipsoid of equal length, breadth and height.',
  });
}

/** What carries the heaviness, when the craft names a support point. */
export function supportRows(state: CraftState): Rows {
  const { support } = state.craft;
  if (!support) return {};
  const at: Vec3 = positionOf(support, state.hull);
  const load = heavinessOf(state.loading);
  const attitude =
    load === 0
      ? infeasible('The craft is neutral: nothing rests on the support.')
      : supportedAttitude(state.loading, at);
  const how = load > 0 ? 'Resting on it.' : 'Held down by it.';
  return {
    'support.load': row({
      label: 'Load on the support',
      quantity: 'mass',
      value: load,
      why: '+ rests on it, − pulls up on it.',
    }),
    'support.pitch': attitudeRow(attitude, 'pitch', 'Pitch on the support', how),
    'support.heel': attitudeRow(attitude, 'heel', 'Heel on the support', how),
  };
}
