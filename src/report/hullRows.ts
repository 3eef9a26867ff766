/** Figures of hull, air, gas and mass. */

import { heavinessOf } from '../physics/balance/loading.ts';
import { spreadOf } from '../physics/balance/spread.ts';
import type { CraftState } from '../physics/craftState.ts';
import { type Rows, row } from './rows.ts';

export function hullRows({ hull, skin }: CraftState): Rows {
  return {
    'hull.length': row({ label: 'Length', quantity: 'length', value: hull.length }),
    'hull.diameter': row({ label: 'Greatest height', quantity: 'length', value: hull.height }),
    'hull.fineness': row({ label: 'Fineness', quantity: 'ratio', value: hull.length / hull.height }),
    'hull.volume': row({ label: 'Gas volume', quantity: 'volume', value: hull.volume }),
    'hull.area': row({ label: 'Wetted area', quantity: 'area', value: hull.area }),
    'hull.filmArea': row({ label: 'Film area', quantity: 'area', value: hull.filmArea }),
    'hull.cbStation': row({ label: 'CB station', quantity: 'length', value: hull.cbStation }),
    'hull.skinStation': row({ label: 'Skin CG station', quantity: 'length', value: hull.skinStation }),
    'hull.filmMass': row({
      label: 'Film mass',
      quantity: 'mass',
      value: skin.film.mass,
      uncertainty: skin.film.uncertainty,
    }),
    'hull.seamMass': row({ label: 'Seam mass', quantity: 'mass', value: skin.seams.mass }),
  };
}

export function massRows(state: CraftState): Rows {
  const { air, gasDensity, hull, loading, patches, skin } = state;
  const patchMass = patches.reduce((sum, { mass }) => sum + mass, 0);
  const heaviness = heavinessOf(loading);
  const uncertainty = spreadOf(({ mass }) => mass, loading.solid, state.covariance);
  return {
    'hull.skinMass': row({
      label: 'Skin mass',
      quantity: 'mass',
      value: skin.film.mass + skin.seams.mass + patchMass,
      uncertainty: skin.film.uncertainty,
      why: 'Film, seams and patches.',
    }),
    'air.density': row({
      label: 'Air density',
      quantity: 'density',
      value: air.density,
      caution: air.cautions.join(' '),
    }),
    'air.pressure': row({ label: 'Air pressure on site', quantity: 'pressure', value: air.pressure }),
    'gas.density': row({ label: 'Gas density', quantity: 'density', value: gasDensity }),
    'gas.mass': row({ label: 'Gas mass', quantity: 'mass', value: gasDensity * hull.volume }),
    'lift.gross': row({
      label: 'Gross lift',
      quantity: 'mass',
      value: loading.grossLift,
      caution: loading.grossLift > 0 ? null : 'The gas is no lighter than the air.',
    }),
    'mass.solid': row({ label: 'Solid mass', quantity: 'mass', value: loading.solid.mass, uncertainty }),
    heaviness: row({
      label: 'Static heaviness',
      quantity: 'mass',
      value: heaviness,
      uncertainty,
      why: '+ heavy, − light.',
    }),
    'lift.left': row({ label: 'Lift left', quantity: 'mass', value: -heaviness, uncertainty }),
  };
}
