/**
 * The NACA 4-digit thickness form turned about its chord, t/c = D/L.
 *
 *   r = 5 D (0.2969 √X − 0.1260 X − 0.3516 X² + 0.2843 X³ + a₄ X⁴), X = x/L
 *   a₄ = −0.1015 (open: a face of radius 0.0105 D at the tail) or −0.1036 (closed to a point)
 *
 * Source: E. N. Jacobs, K. E. Ward & R. M. Pinkerton, NACA Report 460 (1933); the closed coefficient is common
 * practice, no source. The form is thickest at 30 % of the length, where it measures 1.0003 D. With X = t² it is a
 * polynomial in t.
 */
import { findRoot } from '../../numeric/roots.ts';
import { type Meridian, type ShapeOf, type Stretch, straight } from './meridian.ts';

const [A0, A1, A2, A3] = [0.2969, -0.126, -0.3516, 0.2843] as const;
const TAIL = { open: -0.1015, closed: -0.1036 } as const;

export function naca4({ length, diameter, tail }: ShapeOf<'naca4'>): Meridian {
  const body: Stretch = {
    at: (t) => ({
      r: diameter * thickness(t, TAIL[tail]),
      dx: 2 * length * t,
      dr: diameter * thicknessSlope(t, TAIL[tail]),
    }),
  };
  const tailRadius = diameter * thickness(1, TAIL[tail]);
  return {
    stretches: tail === 'open' ? [body, straight(tailRadius, 0, 0)] : [body],
    maxRadius: diameter * thickness(widest(TAIL[tail]), TAIL[tail]),
  };
}

/** r/D at t = √X; never under 0, where rounding would take the closed tip. */
const thickness = (t: number, a4: number): number =>
  Math.max(0, 5 * t * (A0 + t * (A1 + t * t * (A2 + t * t * (A3 + t * t * a4)))));

/** d(r/D)/dt. */
const thicknessSlope = (t: number, a4: number): number =>
  5 * (A0 + t * (2 * A1 + t * t * (4 * A2 + t * t * (6 * A3 + t * t * 8 * a4))));

/** t where the form is thickest, near X = 0.3. */
function widest(a4: number): number {
  const root = findRoot((t) => thicknessSlope(t, a4), 0.5, 0.6, 1e-15);
  return root.status === 'solved' ? root.value : Math.sqrt(0.3);
}
