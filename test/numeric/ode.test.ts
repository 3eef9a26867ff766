import fc from 'fast-check';
import { expect, test } from 'vitest';
import { ERROR, NODES, STAGES } from '../../src/numeric/dormandPrince.ts';
import { integrate, type OdeOptions, type Slope, type Trajectory } from '../../src/numeric/ode.ts';

function run(f: Slope, from: readonly number[], until: number, options?: OdeOptions): Trajectory {
  const outcome = integrate(f, 0, from, until, options);
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}

const swing: Slope = (_, [x, v], into) => {
  into[0] = v!;
  into[1] = -x!;
};

// Conditions for order 5 on quadrature and row sums: E. Hairer, S. P. Nørsett & G. Wanner, II.1–II.2.
test('the numbers of the pair meet their conditions', () => {
  const last = STAGES[6]!;
  for (let power = 0; power < 5; power += 1) {
    const moment = last.reduce((sum, b, i) => sum + b * NODES[i]! ** power, 0);
    expect(moment).toBeCloseTo(1 / (power + 1), 14);
    const lower = ERROR.reduce((sum, e, i) => sum + e * NODES[i]! ** power, 0);
    // The lower member is of order 4 only.
    if (power < 4) expect(lower).toBeCloseTo(0, 14);
    else expect(Math.abs(lower)).toBeGreaterThan(1e-5);
  }
  for (const [i, row] of STAGES.entries()) {
    expect(row.reduce((sum, a) => sum + a, 0)).toBeCloseTo(NODES[i]!, 14);
  }
});

test('a swing comes back after 2π, and lies on its curve between the steps', () => {
  const motion = run(swing, [1, 0], 2 * Math.PI, { relative: 1e-11, absolute: 1e-12 });
  expect(Math.abs(motion.last[0]! - 1)).toBeLessThan(1e-9);
  for (let t = 0; t < motion.end; t += 0.0137) {
    const [x, v] = motion.at(t);
    expect(Math.abs(x! - Math.cos(t))).toBeLessThan(1e-9);
    expect(Math.abs(v! + Math.sin(t))).toBeLessThan(1e-9);
  }
});

test('the error falls with the tolerance, in about the fifth root of it steps', () => {
  const at = (relative: number) => {
    const motion = run(swing, [1, 0], 20, { relative, absolute: relative });
    return { error: Math.abs(motion.last[0]! - Math.cos(20)), steps: motion.steps };
  };
  const [coarse, fine] = [at(1e-5), at(1e-10)];
  expect(coarse.error).toBeLessThan(1e-3);
  expect(fine.error).toBeLessThan(1e-8);
  expect(fine.steps / coarse.steps).toBeGreaterThan(7);
  expect(fine.steps / coarse.steps).toBeLessThan(13);
});

// Arenstorf's closed orbit of the restricted three-body problem: Hairer, Nørsett & Wanner, II.0 (from memory).
test('an orbit that bends sharply closes', () => {
  const mu = 0.012277471;
  const orbit: Slope = (_, [x, y, vx, vy], into) => {
    const a = ((x! + mu) ** 2 + y! ** 2) ** 1.5;
    const b = ((x! - 1 + mu) ** 2 + y! ** 2) ** 1.5;
    into[0] = vx!;
    into[1] = vy!;
    into[2] = x! + 2 * vy! - ((1 - mu) * (x! + mu)) / a - (mu * (x! - 1 + mu)) / b;
    into[3] = y! - 2 * vx! - ((1 - mu) * y!) / a - (mu * y!) / b;
  };
  const from = [0.994, 0, 0, -2.0015851063790824];
  const motion = run(orbit, from, 17.065216560157964, { relative: 1e-12, absolute: 1e-13 });
  expect(Math.abs(motion.last[0]! - 0.994)).toBeLessThan(1e-5);
  expect(Math.abs(motion.last[1]!)).toBeLessThan(1e-5);
});

test('it ends at the event, and only where that turns from below nil', () => {
  const event = (_: number, [x]: Float64Array) => x! - 0.5;
  const motion = run(swing, [1, 0], 100, { event, relative: 1e-11 });
  expect(motion.stopped).toBe(true);
  // Down through a half at π/3 it goes on; up through it at 2π − π/3 it ends.
  expect(motion.end).toBeCloseTo((5 * Math.PI) / 3, 8);
  expect(motion.last[0]).toBeCloseTo(0.5, 10);
  expect(run(swing, [1, 0], 1, { event }).stopped).toBe(false);
});

test('a bend at a known time costs no accuracy', () => {
  const slope = fc.double({ min: 0.1, max: 5, noNaN: true });
  fc.assert(
    fc.property(slope, fc.double({ min: 0.01, max: 2.99, noNaN: true }), (rate, bend) => {
      const ramp: Slope = (t, _, into) => {
        into[0] = Math.min(rate * t, rate * bend);
      };
      const { last } = run(ramp, [0], 3, { breaks: [bend, -1, 7], relative: 1e-12 });
      const exact = rate * bend * (3 - bend / 2);
      expect(Math.abs(last[0]! - exact)).toBeLessThan(1e-11 * exact);
    }),
  );
});

test('at rest it stays at rest to the bit, in few steps', () => {
  const motion = run(swing, [0, 0], 1e4);
  expect([...motion.last]).toEqual([0, 0]);
  expect(motion.steps).toBeLessThan(20);
});

test('where a motion has no end, or would take forever, it says so', () => {
  // y′ = y² from 1 is 1/(1 − t): without bound at t = 1.
  const blowUp: Slope = (_, [y], into) => {
    into[0] = y! * y!;
  };
  expect(integrate(blowUp, 0, [1], 2).status).toBe('infeasible');
  expect(integrate(swing, 0, [1, 0], 1e6, { mostSteps: 100 })).toMatchObject({
    status: 'infeasible',
    why: expect.stringContaining('more than 100 steps'),
  });
  const nowhere: Slope = (_, __, into) => into.fill(Number.NaN);
  expect(integrate(nowhere, 0, [1], 1).status).toBe('infeasible');
});
