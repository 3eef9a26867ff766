/**
 * Adaptive quadrature: the piece with the greatest error is halved until the errors together are small enough. On
 * each piece the 15-point Kronrod rule gives the integral, and its difference from the 7-point Gauss rule within it
 * a (pessimistic) error.
 * Source: Kronrod 1965; strategy of Piessens, de Doncker-Kapenga, Überhuber & Kahaner, QUADPACK, 1983 (QAG). Nodes
 * and weights from there, from memory; the tests hold them to exactness at degree 22.
 */
import { infeasible, type Outcome, solved } from '../../src/numeric/outcome.ts';
import { gaussLegendre } from '../../src/numeric/quadrature.ts';

export interface Integral {
  readonly value: number;
  /** Estimate of the absolute error; usually far above the true one. */
  readonly error: number;
}

export interface Tolerance {
  /** Error wanted, as a share of ∫f. Default 1e-10. */
  readonly relative?: number;
  /** Error wanted, absolute, for integrals near zero. Default 1e-300. */
  readonly absolute?: number;
}

interface Piece extends Integral {
  readonly from: number;
  readonly to: number;
}

/** Half of the symmetric 15-point rule, from the middle outward; every other node is one of the 7-point rule. */
const KRONROD: readonly (readonly [node: number, weight: number])[] = [
  [0, 0.20948214108472782],
  [0.20778495500789848, 0.20443294007529889],
  [0.4058451513773972, 0.19035057806478542],
  [0.58608723546769115, 0.16900472663926791],
  [0.74153118559939446, 0.14065325971552592],
  [0.8648644233597691, 0.10479001032225019],
  [0.94910791234275849, 0.06309209262997856],
  [0.99145537112081261, 0.022935322010529224],
];

const MOST_PIECES = 500;

/** ∫ₐᵇ f dx to the tolerance, whichever of the two is wider; infeasible when f is too rough or has no value. */
export function integrate(
  f: (x: number) => number,
  a: number,
  b: number,
  { relative = 1e-10, absolute = 1e-300 }: Tolerance = {},
): Outcome<Integral> {
  const pieces = [pieceOf(f, a, b)];
  while (pieces.length < MOST_PIECES) {
    const total = sum(pieces);
    if (!Number.isFinite(total.value))
      return infeasible(`The integrand has no value somewhere in ${a} … ${b}.`);
    if (total.error <= Math.max(absolute, relative * Math.abs(total.value))) return solved(total);
    halveWorst(f, pieces);
  }
  const { value, error } = sum(pieces);
  return infeasible(
    `The integral over ${a} … ${b} is near ${value}, but known only to ${error}.`,
    'Allow a wider tolerance, or split the range where the integrand is rough.',
  );
}

function sum(pieces: readonly Piece[]): Integral {
  let value = 0;
  let error = 0;
  for (const piece of pieces) {
    value += piece.value;
    error += piece.error;
  }
  return { value, error };
}

function halveWorst(f: (x: number) => number, pieces: Piece[]): void {
  let worst = 0;
  for (let i = 1; i < pieces.length; i += 1) if (pieces[i]!.error > pieces[worst]!.error) worst = i;
  const { from, to } = pieces[worst]!;
  const middle = (from + to) / 2;
  pieces.splice(worst, 1, pieceOf(f, from, middle), pieceOf(f, middle, to));
}

function pieceOf(f: (x: number) => number, from: number, to: number): Piece {
  const middle = (from + to) / 2;
  const half = (to - from) / 2;
  const { weights } = gaussLegendre(7);
  let kronrod = 0;
  let gauss = 0;
  KRONROD.forEach(([node, weight], i) => {
    const values = i === 0 ? f(middle) : f(middle - half * node) + f(middle + half * node);
    kronrod += weight * values;
    if (i % 2 === 0) gauss += weights[3 + i / 2]! * values;
  });
  return { from, to, value: half * kronrod, error: Math.abs(half * (kronrod - gauss)) };
}
