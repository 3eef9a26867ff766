/**
 * Carlson's symmetric elliptic integral
 *
 *   R_D(x, y, z) = 3/2 ∫₀^∞ dt / ((t+z) √((t+x)(t+y)(t+z)))
 *
 * by duplication: each step replaces x by (x + λ)/4, λ = √x√y + √y√z + √z√x, until the three are nearly equal, then
 * a series to fifth order. Source: B. C. Carlson, Numerical computation of real or complex elliptic integrals,
 * Numer. Algorithms 10 (1995); DLMF 19.36.2.
 */

/** Largest departure from equality, to the sixth power, that the series leaves behind. */
const ROUNDING = Number.EPSILON / 8;

interface Triplet {
  x: number;
  y: number;
  z: number;
}

/** x, y ≥ 0, not both 0; z > 0; a RangeError otherwise. */
export function carlsonRD(x: number, y: number, z: number): number {
  const fits = Math.min(x, y) >= 0 && x + y > 0 && z > 0;
  if (!fits) throw new RangeError('R_D has no value here');
  const now = { x, y, z };
  const mean = (x + y + 3 * z) / 5;
  const reach = farthest(now, mean) / (ROUNDING / 4) ** (1 / 6);
  let scale = 1;
  let a = mean;
  let sum = 0;
  while (reach * scale > a) {
    const rootZ = Math.sqrt(now.z);
    const zBefore = now.z;
    const lambda = duplicate(now);
    sum += scale / (rootZ * (zBefore + lambda));
    a = (a + lambda) / 4;
    scale /= 4;
  }
  const dx = ((mean - x) * scale) / a;
  const dy = ((mean - y) * scale) / a;
  return (scale * seriesRD(dx, dy)) / (a * Math.sqrt(a)) + 3 * sum;
}

const farthest = ({ x, y, z }: Triplet, mean: number): number =>
  Math.max(Math.abs(mean - x), Math.abs(mean - y), Math.abs(mean - z));

/** One duplication in place; returns λ. */
function duplicate(now: Triplet): number {
  const [x, y, z] = [Math.sqrt(now.x), Math.sqrt(now.y), Math.sqrt(now.z)];
  const lambda = x * y + y * z + z * x;
  now.x = (now.x + lambda) / 4;
  now.y = (now.y + lambda) / 4;
  now.z = (now.z + lambda) / 4;
  return lambda;
}

function seriesRD(dx: number, dy: number): number {
  const dz = -(dx + dy) / 3;
  const xy = dx * dy;
  const zz = dz * dz;
  const e2 = xy - 6 * zz;
  const e3 = (3 * xy - 8 * zz) * dz;
  const e4 = 3 * (xy - zz) * zz;
  const e5 = xy * zz * dz;
  return 1 - (3 * e2) / 14 + e3 / 6 + (9 * e2 * e2) / 88 - (3 * e4) / 22 - (9 * e2 * e3) / 52 + (3 * e5) / 26;
}
