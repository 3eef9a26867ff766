/**
 * Ellipsoids of revolution about the hull axis, and two halves of different length joined at the widest station.
 *
 *   r = (D/2) sin θ, x = ℓ (1 − cos θ), ℓ the length of the half from its tip to the widest station
 *   (for a spheroid of length L: V = πLD²/6, A = 2πb²[1 + a/(b e) asin e]; tests compare these closed forms)
 */
import { type Meridian, quarterEllipse, type ShapeOf } from './meridian.ts';

export const spheroid = ({ length, diameter }: ShapeOf<'spheroid'>): Meridian =>
  halves(length / 2, length / 2, diameter);

export const twoSpheroid = ({ foreLength, aftLength, diameter }: ShapeOf<'twoSpheroid'>): Meridian =>
  halves(foreLength, aftLength, diameter);

function halves(fore: number, aft: number, diameter: number): Meridian {
  const maxRadius = diameter / 2;
  return {
    stretches: [quarterEllipse(fore, maxRadius, 'fore'), quarterEllipse(aft, maxRadius, 'aft')],
    maxRadius,
  };
}
