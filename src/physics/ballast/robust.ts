/**
 * The worst that the tolerances can do to a limit g · S ≤ bound.
 *
 * A part whose mass lies within ± a in each of its pieces changes S by at most ± a v, v = Σ (1, p) over the pieces, so
 * over all masses within their tolerances g · S grows by Σ a |g · v|, and reaches that at a corner. The film counts as
 * one part, with the half-width of its areal density times its area.
 */
import { listed } from '../../craft/craft.ts';
import type { CraftState } from '../craftState.ts';
import { along, type Limit } from './limits.ts';
import { perKilogram, type Share } from './share.ts';

export interface Uncertain {
  /** Id of the part; null for the film. */
  readonly part: string | null;
  /** Half-width, kg in each piece. */
  readonly tolerance: number;
  readonly perKilogram: Share;
}

/** Everything with a tolerance, where the craft has it. */
export function uncertainOf({ craft, hull, film, pieces }: CraftState): Uncertain[] {
  const [x, y, z] = film.cg;
  const skin = craft.film.arealDensityTolerance * hull.filmArea;
  return [
    { part: null, tolerance: skin, perKilogram: [1, x, y, z, 0] as const },
    ...listed(craft.parts).map(({ id, massTolerance }) => ({
      part: id,
      tolerance: massTolerance,
      perKilogram: perKilogram(pieces[id]!),
    })),
  ].filter(({ tolerance }) => tolerance > 0);
}

/** Σ a |g · v| */
export const worstOf = (limit: Limit, uncertain: readonly Uncertain[]): number =>
  uncertain.reduce((sum, each) => sum + each.tolerance * Math.abs(along(limit, each.perKilogram)), 0);
