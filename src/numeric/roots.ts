/**
 * A root of f between two stations where its sign differs, by Brent's method: inverse quadratic or linear
 * interpolation guarded by bisection, so it never leaves the bracket and always ends.
 * Source: R. P. Brent, Algorithms for Minimization without Derivatives, 1973, ch. 4 (procedure zero).
 */
import { infeasible, type Outcome, solved } from './outcome.ts';

interface Bracket {
  /** Best estimate, and f there. */
  b: number;
  fb: number;
  /** The point on the other side of the root, and f there. */
  c: number;
  fc: number;
  /** The estimate before b, and f there. */
  a: number;
  fa: number;
}

const MOST_STEPS = 200;

/** Root of `f` in [lo, hi] to within `tolerance` (absolute, in x) plus rounding; f(lo), f(hi) must differ in sign. */
export function findRoot(
  f: (x: number) => number,
  lo: number,
  hi: number,
  tolerance = 1e-12,
): Outcome<number> {
  const fLo = f(lo);
  const fHi = f(hi);
  if (fLo === 0) return solved(lo);
  if (fHi === 0) return solved(hi);
  if (Math.sign(fLo) !== -Math.sign(fHi)) return noSignChange(lo, hi, fLo, fHi);
  return iterate(f, { a: lo, fa: fLo, b: hi, fb: fHi, c: lo, fc: fLo }, tolerance);
}

function noSignChange(lo: number, hi: number, fLo: number, fHi: number): Outcome<number> {
  return infeasible(
    `No sign change between ${lo} and ${hi}: the function is ${fLo} and ${fHi} there.`,
    'Widen the interval.',
  );
}

function iterate(f: (x: number) => number, s: Bracket, tolerance: number): Outcome<number> {
  let step = s.b - s.a;
  let previousStep = step;
  for (let pass = 0; pass < MOST_STEPS; pass += 1) {
    if (Math.abs(s.fc) < Math.abs(s.fb)) swapBest(s);
    const slack = 2 * Number.EPSILON * Math.abs(s.b) + tolerance / 2;
    const half = (s.c - s.b) / 2;
    if (Math.abs(half) <= slack || s.fb === 0) return solved(s.b);
    const tried = Math.abs(previousStep) < slack ? null : interpolatedStep(s, half, slack, previousStep);
    previousStep = tried === null ? half : step;
    step = tried ?? half;
    advance(f, s, Math.abs(step) > slack ? step : slack * Math.sign(half));
    if (Number.isNaN(s.fb)) return infeasible(`The function has no value at ${s.b}.`);
    if (s.fb > 0 === s.fc > 0) {
      s.c = s.a;
      s.fc = s.fa;
      step = s.b - s.a;
      previousStep = step;
    }
  }
  return infeasible(`No root to within ${tolerance} after ${MOST_STEPS} steps.`, 'Allow a wider tolerance.');
}

function swapBest(s: Bracket): void {
  s.a = s.b;
  s.fa = s.fb;
  s.b = s.c;
  s.fb = s.fc;
  s.c = s.a;
  s.fc = s.fa;
}

/** The interpolated step from b, or null where bisection is the safer choice. */
function interpolatedStep(s: Bracket, half: number, slack: number, previousStep: number): number | null {
  if (Math.abs(s.fa) <= Math.abs(s.fb)) return null;
  const ratio = s.fb / s.fa;
  let p = 2 * half * ratio;
  let q = 1 - ratio;
  if (s.a !== s.c) {
    const qa = s.fa / s.fc;
    const rb = s.fb / s.fc;
    p = ratio * (2 * half * qa * (qa - rb) - (s.b - s.a) * (rb - 1));
    q = (qa - 1) * (rb - 1) * (ratio - 1);
  }
  if (p > 0) q = -q;
  else p = -p;
  const within = 2 * p < 3 * half * q - Math.abs(slack * q) && p < Math.abs((previousStep * q) / 2);
  return within ? p / q : null;
}

function advance(f: (x: number) => number, s: Bracket, step: number): void {
  s.a = s.b;
  s.fa = s.fb;
  s.b += step;
  s.fb = f(s.b);
}
