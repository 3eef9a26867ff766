/**
 * A curved piece of the meridian as polynomials of t in [−1, 1]: x(t), r(t) through SAMPLES points of the outline, and
 * NODES Gauss–Legendre places on it that carry the sources and where the skin must be tight. Between its nodes the
 * source strength is the polynomial through its values there.
 */
import { solveDense } from '../../numeric/dense.ts';
import { gaussLegendre } from '../../numeric/quadrature.ts';

/** Nodes that carry sources, a panel. */
export const NODES = 5;
/** Points of the outline a panel goes through, its ends among them. */
export const SAMPLES = 8;

/** Where the outline is sampled, −1 … 1 (Chebyshev–Lobatto). */
export const samplePlaces: readonly number[] = Array.from({ length: SAMPLES }, (_, i) =>
  i === SAMPLES - 1 - i ? 0 : -Math.cos((Math.PI * i) / (SAMPLES - 1)),
);

/** Values at the places → coefficients of 1, t, t², …; row after row. */
function toPowers(places: readonly number[]): Float64Array {
  const n = places.length;
  const table = new Float64Array(n * n);
  const rows = places.map((t) => places.map((_, k) => t ** k));
  places.forEach((_, j) => {
    const column = solveDense(
      rows,
      places.map((__, i) => (i === j ? 1 : 0)),
    );
    if (column.status === 'solved')
      column.value.forEach((value, k) => {
        table[k * n + j] = value;
      });
  });
  return table;
}

const outlinePowers = toPowers(samplePlaces);
const nodeRule = gaussLegendre(NODES);
/** Source strengths at the nodes of a panel → coefficients of its powers of t: entry [k × NODES + node]. */
export const nodePowers = toPowers(nodeRule.nodes);

export interface FlowPanel {
  /** Coefficients of x and r by powers of t, m. */
  readonly xs: Float64Array;
  readonly rs: Float64Array;
  /** The middle, and half the length of skin, m. */
  readonly x: number;
  readonly r: number;
  readonly reach: number;
  readonly nodes: readonly FlowNode[];
}

export interface FlowNode {
  /** Place on the panel, −1 … 1. */
  readonly t: number;
  readonly x: number;
  readonly r: number;
  /** Length of skin the node stands for, m: a weight, so that Σ f ds is the integral along the panel. */
  readonly ds: number;
  /** Along the skin toward the tail, and out of the hull: unit directions. */
  readonly tangent: Direction;
  readonly normal: Direction;
}

export interface Direction {
  readonly x: number;
  readonly r: number;
}

/** The panel through the points at `samplePlaces`. */
export function flowPanel(x: readonly number[], r: readonly number[]): FlowPanel {
  const [xs, rs] = [coefficients(x), coefficients(r)];
  const nodes = nodeRule.nodes.map((t, i) => nodeAt(xs, rs, t, nodeRule.weights[i]!));
  const reach = nodes.reduce((sum, { ds }) => sum + ds, 0) / 2;
  return { xs, rs, x: powerSum(xs, 0), r: powerSum(rs, 0), reach, nodes };
}

function coefficients(values: readonly number[]): Float64Array {
  return Float64Array.from(values, (_, k) =>
    values.reduce((sum, value, j) => sum + outlinePowers[k * SAMPLES + j]! * value, 0),
  );
}

function nodeAt(xs: Float64Array, rs: Float64Array, t: number, weight: number): FlowNode {
  const dx = powerSlope(xs, t);
  const dr = powerSlope(rs, t);
  const speed = Math.hypot(dx, dr);
  return {
    t,
    x: powerSum(xs, t),
    r: Math.max(0, powerSum(rs, t)),
    ds: weight * speed,
    tangent: { x: dx / speed, r: dr / speed },
    normal: { x: -dr / speed, r: dx / speed },
  };
}

/** Σ cₖ tᵏ. */
export function powerSum(c: Float64Array, t: number): number {
  let sum = 0;
  for (let k = c.length - 1; k >= 0; k -= 1) sum = sum * t + c[k]!;
  return sum;
}

/** Σ k cₖ tᵏ⁻¹. */
export function powerSlope(c: Float64Array, t: number): number {
  let sum = 0;
  for (let k = c.length - 1; k > 0; k -= 1) sum = sum * t + k * c[k]!;
  return sum;
}
