/** Pieces of cubic, y = c₀ + c₁u + c₂u² + c₃u³ with u = x − from, as a monotone cubic through rows is made of. */
import type { MonotoneCubic } from '../../numeric/pchip.ts';

export interface CubicPiece {
  readonly from: number;
  readonly to: number;
  readonly c: readonly [number, number, number, number];
}

export function piecesOf({ xs, ys, slopes }: Pick<MonotoneCubic, 'xs' | 'ys' | 'slopes'>): CubicPiece[] {
  return xs.slice(1).map((to, i) => {
    const h = to - xs[i]!;
    const secant = (ys[i + 1]! - ys[i]!) / h;
    const d0 = slopes[i]!;
    const d1 = slopes[i + 1]!;
    return {
      from: xs[i]!,
      to,
      c: [ys[i]!, d0, (3 * secant - 2 * d0 - d1) / h, (d0 + d1 - 2 * secant) / (h * h)],
    };
  });
}

export function heightAt({ from, c }: CubicPiece, x: number): number {
  const u = x - from;
  return c[0] + u * (c[1] + u * (c[2] + u * c[3]));
}

export function slopeAt({ from, c }: CubicPiece, x: number): number {
  const u = x - from;
  return c[1] + u * (2 * c[2] + u * 3 * c[3]);
}

/** The part of a piece between two places, with its own origin. */
export function part(piece: CubicPiece, from: number, to: number): CubicPiece {
  const u = from - piece.from;
  const [, , c2, c3] = piece.c;
  return { from, to, c: [heightAt(piece, from), slopeAt(piece, from), c2 + 3 * c3 * u, c3] };
}

/** The pieces read from the other end of a line of length `whole`. */
export function mirroredPieces(pieces: readonly CubicPiece[], whole: number): CubicPiece[] {
  return pieces
    .map((piece): CubicPiece => {
      const { c } = part(piece, piece.to, piece.to);
      return { from: whole - piece.to, to: whole - piece.from, c: [c[0], -c[1], c[2], -c[3]] };
    })
    .reverse();
}

/** Places strictly inside the piece where its slope is `slope`, ascending. */
export function placesOfSlope({ from, to, c }: CubicPiece, slope: number): number[] {
  return quadraticRoots(3 * c[3], 2 * c[2], c[1] - slope)
    .map((u) => from + u)
    .filter((x) => x > from && x < to)
    .sort((p, q) => p - q);
}

/** Real roots of au² + bu + c, without loss where a is small. */
function quadraticRoots(a: number, b: number, c: number): number[] {
  const discriminant = b * b - 4 * a * c;
  if (discriminant < 0) return [];
  const q = -(b + (b < 0 ? -1 : 1) * Math.sqrt(discriminant)) / 2;
  return [q / a, c / q].filter(Number.isFinite);
}
