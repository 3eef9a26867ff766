/**
 * Ordinary differential equations y′ = f(t, y) by the Dormand–Prince pair of orders 5 and 4, its step chosen so that the
 * estimated error of each step stays within tolerance; between the steps a polynomial of order 4.
 *
 *   error of a step  E = √(mean of (eᵢ/(absolute + relative · max(|yᵢ|, |yᵢ next|)))²) ≤ 1
 *   next step        h · 0.9 E^(−1/5), at most 5 times and at least a fifth of this one
 *
 * Source: J. R. Dormand & P. J. Prince, J. Comput. Appl. Math. 6 (1980); step control, first step and dense output after
 * E. Hairer, S. P. Nørsett & G. Wanner, Solving Ordinary Differential Equations I, II.4–II.6 (DOPRI5; from memory).
 */
import { type DenseStep, denseAt, denseStep, ERROR, NODES, STAGES } from './dormandPrince.ts';
import { infeasible, type Outcome, solved } from './outcome.ts';
import { findRoot } from './roots.ts';

/** Writes y′ at (t, y) into `into`. */
export type Slope = (t: number, y: Float64Array, into: Float64Array) => void;

export interface OdeOptions {
  /** Error of a step allowed as a share of each unknown, and besides. Default 1e-8 and 1e-10. */
  readonly relative?: number;
  readonly absolute?: number;
  /** Times at which f bends: a step ends at each. Default none. */
  readonly breaks?: readonly number[];
  /** It ends where this turns from below nil to nil or more. Default: never. */
  readonly event?: (t: number, y: Float64Array) => number;
  /** Steps tried before it gives up. Default 100,000. */
  readonly mostSteps?: number;
}

export interface Trajectory {
  readonly start: number;
  /** Where it ended: at the event or at the time asked for. */
  readonly end: number;
  /** y there. */
  readonly last: Float64Array;
  /** Whether it was the event. */
  readonly stopped: boolean;
  /** Steps taken. */
  readonly steps: number;
  /** y at a time between start and end (held to them). */
  at(t: number): Float64Array;
}

/** From y at `start` until `until` > start, or until the event. */
export function integrate(
  f: Slope,
  start: number,
  from: ArrayLike<number>,
  until: number,
  options: OdeOptions = {},
): Outcome<Trajectory> {
  const { event, breaks = [], mostSteps = 100_000 } = options;
  const stepper = stepperOf(f, start, from, options);
  const stops = [...breaks.filter((t) => t > start && t < until).sort((a, b) => a - b), until];
  const done: DenseStep[] = [];
  let before = event ? event(start, stepper.y) : 0;
  let stop = 0;
  for (let tried = 0; tried < mostSteps; tried += 1) {
    const step = stepper.tryStep(stops[stop]!);
    if (step === 'too small') return infeasible(`The solution cannot be followed beyond ${stepper.t}.`);
    if (step === 'refused') continue;
    done.push(step);
    if (event) {
      const after = event(stepper.t, stepper.y);
      if (before < 0 && after >= 0) return solved(stoppedBy(event, done, start));
      before = after;
    }
    if (stepper.t === stops[stop]) stop += 1;
    if (stop === stops.length) return solved(trajectoryOf(done, start, until, false));
  }
  return infeasible(`The solution takes more than ${mostSteps} steps; it was followed to ${stepper.t}.`);
}

function stoppedBy(event: NonNullable<OdeOptions['event']>, done: readonly DenseStep[], start: number) {
  const step = done.at(-1)!;
  const root = findRoot((t) => event(t, denseAt(step, t)), step.t, step.t + step.h, 1e-13 * step.h);
  return trajectoryOf(done, start, root.status === 'solved' ? root.value : step.t + step.h, true);
}

function trajectoryOf(done: readonly DenseStep[], start: number, end: number, stopped: boolean): Trajectory {
  const at = (t: number) => {
    const held = Math.min(Math.max(t, start), end);
    return denseAt(stepAround(done, held), held);
  };
  return { start, end, last: at(end), stopped, steps: done.length, at };
}

/** The last step that begins at t or before, by bisection. */
function stepAround(done: readonly DenseStep[], t: number): DenseStep {
  let low = 0;
  let high = done.length;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (done[middle]!.t <= t) low = middle;
    else high = middle;
  }
  return done[low]!;
}

/** Advances (t, y) by one accepted step at a time. */
function stepperOf(f: Slope, start: number, from: ArrayLike<number>, options: OdeOptions) {
  const { relative = 1e-8, absolute = 1e-10 } = options;
  const n = from.length;
  const k = STAGES.map(() => new Float64Array(n));
  const next = new Float64Array(n);
  const self = { t: start, y: Float64Array.from(from), tryStep };
  f(start, self.y, k[0]!);
  let h = firstStep(f, self.y, start, k[0]!, relative, absolute);
  let grown = 5;

  function tryStep(stop: number): DenseStep | 'refused' | 'too small' {
    const { t, y } = self;
    const ends = t + 1.01 * h >= stop;
    const taken = ends ? stop - t : h;
    if (!(taken > 1e-14 * Math.abs(t)) && !ends) return 'too small';
    stages(f, t, y, taken, k, next);
    const error = errorOf(y, next, k, taken, relative, absolute);
    const factor = error > 0 ? Math.min(grown, Math.max(0.2, 0.9 * error ** -0.2)) : grown;
    if (!(error <= 1)) {
      h = taken * (Number.isFinite(error) ? factor : 0.1);
      grown = 1;
      return h > 1e-300 ? 'refused' : 'too small';
    }
    const step = denseStep(t, taken, y, next, k);
    // A step cut short by a stop says little about how long the next may be.
    h = ends ? Math.max(h, taken * factor) : taken * factor;
    grown = 5;
    self.t = ends ? stop : t + taken;
    y.set(next);
    k[0]!.set(k[6]!);
    return step;
  }
  return self;
}

/** The seven slopes of a step, and y at its end. */
function stages(
  f: Slope,
  t: number,
  y: Float64Array,
  h: number,
  k: readonly Float64Array[],
  next: Float64Array,
): void {
  for (let s = 1; s < STAGES.length; s += 1) {
    const row = STAGES[s]!;
    for (let i = 0; i < y.length; i += 1) {
      let sum = 0;
      for (let j = 0; j < s; j += 1) sum += row[j]! * k[j]![i]!;
      next[i] = y[i]! + h * sum;
    }
    f(t + NODES[s]! * h, next, k[s]!);
  }
}

function errorOf(
  y: Float64Array,
  next: Float64Array,
  k: readonly Float64Array[],
  h: number,
  relative: number,
  absolute: number,
): number {
  let squares = 0;
  for (let i = 0; i < y.length; i += 1) {
    let sum = 0;
    for (let j = 0; j < ERROR.length; j += 1) sum += ERROR[j]! * k[j]![i]!;
    const allowed = absolute + relative * Math.max(Math.abs(y[i]!), Math.abs(next[i]!));
    squares += ((h * sum) / allowed) ** 2;
  }
  return Math.sqrt(squares / y.length);
}

/** A step whose error, guessed from y, y′ and the change of y′ over a short step, is a hundredth of what is allowed. */
function firstStep(
  f: Slope,
  y: Float64Array,
  t: number,
  slope: Float64Array,
  relative: number,
  absolute: number,
): number {
  const size = (of: (i: number) => number) => {
    let squares = 0;
    for (let i = 0; i < y.length; i += 1) squares += (of(i) / (absolute + relative * Math.abs(y[i]!))) ** 2;
    return Math.sqrt(squares / y.length);
  };
  const [ySize, slopeSize] = [size((i) => y[i]!), size((i) => slope[i]!)];
  const short = ySize < 1e-5 || slopeSize < 1e-5 ? 1e-6 : (0.01 * ySize) / slopeSize;
  const later = new Float64Array(y.length);
  f(
    t + short,
    y.map((each, i) => each + short * slope[i]!),
    later,
  );
  const bend = size((i) => later[i]! - slope[i]!) / short;
  const most = Math.max(slopeSize, bend);
  return Math.min(100 * short, most > 1e-15 ? (0.01 / most) ** 0.2 : Math.max(1e-6, 1e-3 * short));
}
