/**
 * A craft reduced to what decides how it floats.
 *
 *   gross lift  L = (ρ_air − ρ_gas) V, kg;   heaviness = W − L;   hang vector q = W (G − B), kg·m.
 *
 * The gas is counted in L, so G is the CG of solid mass alone. The buoyancy of the solid parts themselves is left out:
 * about 1 part in 800 for a dense part, more for foam.
 */
import type { Vec3 } from '../../numeric/vector.ts';
import { addSums, type MassSums, momentAbout } from '../mass/body.ts';

export interface Loading {
  readonly solid: MassSums;
  readonly cb: Vec3;
  /** kg */
  readonly grossLift: number;
}

export const heavinessOf = ({ solid, grossLift }: Loading): number => solid.mass - grossLift;

/** W (G − B), kg·m: points down when the craft is at rest. */
export const hangOf = ({ solid, cb }: Loading): Vec3 => momentAbout(solid, cb);

/** The CG of all solid mass, m; null without any. */
export const cgOf = ({ solid: { mass, moment } }: Loading): Vec3 | null =>
  mass > 0 ? [moment[0] / mass, moment[1] / mass, moment[2] / mass] : null;

/** The same craft with one more weight. */
export const withWeight = (loading: Loading, mass: number, [x, y, z]: Vec3): Loading => ({
  ...loading,
  solid: addSums(loading.solid, { mass, moment: [mass * x, mass * y, mass * z] }),
});

/** CB height − CG height, m; null without any mass. */
export function pendulumDepthOf(loading: Loading): number | null {
  const cg = cgOf(loading);
  return cg && loading.cb[2] - cg[2];
}
