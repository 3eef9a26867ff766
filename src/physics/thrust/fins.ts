/**
 * Fins: the force square to a fin from the air that meets it.
 *
 *   F = −½ρ S (a · u w + 1.2 w|w|),  a = 2πA/(2 + √(4 + A²))
 *
 * u along the fin (forward), w square to it: with q = ½ρ(u² + w²) and the angle of attack β = atan(w/u) this is
 * q S (a sin β cos β + 1.2 sin²β), opposed to w. S outline area, m²; A aspect ratio. A fin at clock angle θ has its
 * normal in the direction (cos θ, −sin θ) of side and height.
 *
 * Source: slope after H. B. Helmbold (1942) for straight wings of any aspect ratio; the second term is the normal force
 * of a plate square to the stream, its coefficient the infinite cylinder's 1.2 as the design has it (a flat plate's lies
 * between 1.17 and 2). Backwards (u < 0) the same.
 */
import { listed } from '../../craft/craft.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { CraftState } from '../craftState.ts';

export interface Fin {
  readonly part: string;
  /** Middle of the fin: station, side, height, m. */
  readonly at: Vec3;
  /** rad, 0 top, π/2 starboard */
  readonly clock: number;
  /** m² */
  readonly area: number;
  readonly aspectRatio: number;
}

export const finsOf = ({ craft, pieces }: CraftState): Fin[] =>
  listed(craft.parts).flatMap((part) => {
    const { fin } = part;
    return fin
      ? pieces[part.id]!.map(({ middle, roll }) => ({ part: part.id, at: middle, clock: roll, ...fin }))
      : [];
  });

/** Normal-force slope at small angles, 1/rad. */
export const finSlope = (aspectRatio: number): number =>
  (2 * Math.PI * aspectRatio) / (2 + Math.sqrt(4 + aspectRatio * aspectRatio));

const CROSS_DRAG = 1.2;

/** N along the fin's normal; `along` forward speed and `across` speed along the normal, m/s, of the fin through the air. */
export const finForce = (
  { area, aspectRatio }: Fin,
  density: number,
  along: number,
  across: number,
): number =>
  -0.5 *
  density *
  area *
  (finSlope(aspectRatio) * Math.abs(along) * across + CROSS_DRAG * across * Math.abs(across));
