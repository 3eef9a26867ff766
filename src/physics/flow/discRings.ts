/**
 * A disc square to the hull axis, cut into arcs about that axis, since the flow depends on the distance ϱ from it only.
 *
 *   disc of radius R, its centre at a distance d from the axis: of the circle of radius ϱ the arc inside it is
 *   2ϱ arccos((ϱ² + d² − R²)/(2ϱd)); the whole circle for ϱ ≤ R − d, none of it for ϱ ≤ d − R or ϱ ≥ d + R
 *   area shared with the circle of radius a about the axis: ∫₀ᵃ arc dϱ, in closed form the lens of two circles
 *
 * Elementary geometry. Lengths in m.
 */
import { gaussLegendre } from '../../numeric/quadrature.ts';

export interface Disc {
  /** Distance of its centre from the hull axis, and its radius, m. */
  readonly offset: number;
  readonly radius: number;
}

/** Length of the circle of radius ϱ about the axis that lies in the disc, m. */
export function arcInside({ offset: d, radius: R }: Disc, rho: number): number {
  if (rho <= R - d) return 2 * Math.PI * rho;
  if (rho <= d - R || rho >= d + R) return 0;
  return 2 * rho * Math.acos(Math.max(-1, Math.min(1, (rho * rho + d * d - R * R) / (2 * rho * d))));
}

/** Area that the disc shares with the circle of radius a about the axis, m². */
export function sharedArea({ offset: d, radius: R }: Disc, a: number): number {
  const smaller = Math.min(a, R);
  if (d >= a + R || smaller <= 0) return 0;
  if (d <= Math.abs(a - R)) return Math.PI * smaller * smaller;
  const segment = (own: number, other: number): number => {
    const cos = Math.max(-1, Math.min(1, (d * d + own * own - other * other) / (2 * d * own)));
    return own * own * (Math.acos(cos) - cos * Math.sqrt(1 - cos * cos));
  };
  return segment(a, R) + segment(R, a);
}

const rule = gaussLegendre(12);

/**
 * Mean of f(ϱ) over the part of the disc outside the circle of radius `inner`; null when nothing is outside. `kinks`
 * are distances at which f bends. Between them ϱ runs as a cosine, which tames the ends of the arcs and of f.
 */
export function meanOverDisc(
  disc: Disc,
  inner: number,
  kinks: readonly number[],
  f: (rho: number) => number,
): number | null {
  const from = Math.max(inner, disc.offset - disc.radius, 0);
  const to = disc.offset + disc.radius;
  if (!(to > from)) return null;
  const cuts = [from, to, Math.abs(disc.radius - disc.offset), ...kinks]
    .filter((rho) => rho >= from && rho <= to)
    .sort((a, b) => a - b);
  let sum = 0;
  let area = 0;
  for (let i = 1; i < cuts.length; i += 1) {
    const half = (cuts[i]! - cuts[i - 1]!) / 2;
    if (half === 0) continue;
    rule.nodes.forEach((node, k) => {
      const angle = (Math.PI / 2) * (1 + node);
      const rho = cuts[i - 1]! + half * (1 - Math.cos(angle));
      const share = (Math.PI / 2) * rule.weights[k]! * half * Math.sin(angle) * arcInside(disc, rho);
      area += share;
      sum += share * f(rho);
    });
  }
  return area > 0 ? sum / area : null;
}
