/**
 * Roots of a few equations in as many unknowns by Newton's method:  x ← x − λ J⁻¹ f(x).
 *
 * J by central differences over a millionth of each unknown's size; λ halved from 1 until the norm of f falls; done when
 * the full step is small against the sizes.
 * Source: J. E. Dennis & R. B. Schnabel, Numerical Methods for Unconstrained Optimization and Nonlinear Equations, 1983,
 * ch. 5–6 (from memory).
 */
import { solveDense } from './dense.ts';
import { infeasible, type Outcome, solved } from './outcome.ts';

/** Writes f(x) into `into`. */
export type Residual = (x: Float64Array, into: Float64Array) => void;

export interface NewtonOptions {
  /** Size of each unknown, > 0. Default 1. */
  readonly sizes?: readonly number[];
  /** Last full step against the sizes. Default 1e-11. */
  readonly tolerance?: number;
  /** Default 50. */
  readonly mostSteps?: number;
}

const SHORTEST = 2 ** -12;
const DIFFERENCE = 1e-6;

/** The equations should be of like size where the unknowns are off by theirs: damping goes by the norm of them all. */
export function solveNewton(
  f: Residual,
  start: readonly number[],
  options: NewtonOptions = {},
): Outcome<number[]> {
  const { sizes = start.map(() => 1), tolerance = 1e-11, mostSteps = 50 } = options;
  let x = Float64Array.from(start);
  let value = evaluated(f, x);
  for (let pass = 0; pass < mostSteps; pass += 1) {
    const step = solveDense(jacobianOf(f, x, sizes), value);
    if (step.status !== 'solved') return step;
    const to = (share: number) => x.map((each, i) => each - share * sizes[i]! * step.value[i]!);
    if (step.value.every((each) => Math.abs(each) <= tolerance)) return solved([...to(1)]);
    let share = 1;
    let next = evaluated(f, to(share));
    while (!(normOf(next) < normOf(value))) {
      share /= 2;
      if (share < SHORTEST) return infeasible('Newton’s method is stuck: no shorter step brings it nearer.');
      next = evaluated(f, to(share));
    }
    x = to(share);
    value = next;
  }
  return infeasible(`No root within ${mostSteps} steps of Newton’s method.`);
}

/** ∂f/∂(x/size), by rows. */
export function jacobianOf(f: Residual, x: Float64Array, sizes: readonly number[]): number[][] {
  const columns = sizes.map((size, j) => {
    const shifted = (by: number) =>
      evaluated(
        f,
        x.map((each, i) => (i === j ? each + by * size : each)),
      );
    const [above, below] = [shifted(DIFFERENCE), shifted(-DIFFERENCE)];
    return Array.from(above, (each, i) => (each - below[i]!) / (2 * DIFFERENCE));
  });
  return sizes.map((_, i) => columns.map((column) => column[i]!));
}

function evaluated(f: Residual, x: Float64Array): Float64Array {
  const value = new Float64Array(x.length);
  f(x, value);
  return value;
}

const normOf = (value: Float64Array): number => Math.hypot(...value);
