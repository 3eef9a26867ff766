import fc from 'fast-check';
import { afterAll, expect, test } from 'vitest';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { activityAt, costAt, type LinearProblem } from '../../../src/numeric/linearProgram/problem.ts';
import type { LinearResult, Optimal } from '../../../src/numeric/linearProgram/result.ts';
import { randomProblem } from './randomProblem.ts';
import { rivalObjective } from './rival.ts';

const solver = await loadHighs();
const live = solver.live();
afterAll(() => live.dispose());

const { POSITIVE_INFINITY: INF, NEGATIVE_INFINITY: NEG } = Number;

function optimal(result: LinearResult): Optimal {
  if (result.status !== 'optimal') throw new Error(`${result.status}: ${result.why}`);
  return result;
}

/** Largest amount by which a bound is broken. */
function violation({ columns, rows }: LinearProblem, x: readonly number[]): number {
  const beyond = ({ lower, upper }: { lower: number; upper: number }, value: number) =>
    Math.max(lower - value, value - upper, 0);
  return Math.max(
    0,
    ...columns.map((column, j) => beyond(column, x[j]!)),
    ...rows.map((row) => beyond(row, activityAt(row, x))),
  );
}

test('a problem worked by hand: x + 2y ≥ 5, least x + y with x ≤ 1', () => {
  const { values, objective, marginals } = optimal(
    solver.solve({
      columns: [
        { name: 'x', lower: 0, upper: 1, cost: 1, integer: false },
        { name: 'y', lower: 0, upper: INF, cost: 1, integer: false },
      ],
      rows: [
        {
          name: 'r',
          lower: 5,
          upper: INF,
          terms: [
            [0, 1],
            [1, 2],
          ],
        },
      ],
    }),
  );
  expect(values).toEqual([0, 2.5]);
  expect(objective).toBe(2.5);
  expect(marginals).toEqual({ rows: [0.5], columns: [0.5, 0] });
});

test('KKT on 400 random linear programs: feasible, stationary, complementary', () => {
  let solved = 0;
  fc.assert(
    fc.property(randomProblem(false), (problem) => {
      const result = live.solve(problem);
      if (result.status !== 'optimal') return;
      solved++;
      const { values, marginals } = result;
      expect(violation(problem, values)).toBeLessThan(1e-7);
      const { rows, columns } = marginals!;
      problem.columns.forEach((column, j) => {
        const pull = problem.rows.reduce(
          (sum, { terms }, i) => sum + rows[i]! * terms.reduce((a, [k, c]) => a + (k === j ? c : 0), 0),
          0,
        );
        expect(column.cost - pull).toBeCloseTo(columns[j]!, 7);
      });
      const checkSign = (lower: number, upper: number, at: number, marginal: number) => {
        if (marginal > 1e-7) expect(at).toBeCloseTo(lower, 6);
        if (marginal < -1e-7) expect(at).toBeCloseTo(upper, 6);
      };
      problem.columns.forEach(({ lower, upper }, j) => {
        checkSign(lower, upper, values[j]!, columns[j]!);
      });
      problem.rows.forEach((row, i) => {
        checkSign(row.lower, row.upper, activityAt(row, values), rows[i]!);
      });
    }),
    { numRuns: 400 },
  );
  expect(solved).toBeGreaterThan(200);
});

test.each([
  ['linear', false, 300],
  ['whole-number', true, 200],
] as const)('%s programs: yalps finds the same objective, or none either', (_, integers, numRuns) => {
  const seen = new Set<string>();
  fc.assert(
    fc.property(randomProblem(integers), (problem) => {
      const result = solver.solve(problem);
      seen.add(result.status);
      const rival = rivalObjective(problem);
      if (rival === null) expect(result.status).toBe('infeasible');
      else expect(optimal(result).objective).toBeCloseTo(rival, 6);
    }),
    { numRuns },
  );
  expect(seen).toEqual(new Set(['optimal', 'infeasible']));
});

/** Every way to choose whole numbers within the bounds. */
function* choices({ columns }: LinearProblem): Generator<number[]> {
  const [first, ...rest] = columns;
  if (!first) return yield [];
  for (let value = first.lower; value <= first.upper; value++) {
    for (const others of choices({ columns: rest, rows: [] })) yield [value, ...others];
  }
}

test('all-whole problems against trying every choice; the gap is 0 and the values are whole', () => {
  fc.assert(
    fc.property(randomProblem(true, 5), (any) => {
      const problem = { ...any, columns: any.columns.map((column) => ({ ...column, integer: true })) };
      let best = INF;
      for (const x of choices(problem)) {
        if (violation(problem, x) <= 1e-9) best = Math.min(best, costAt(problem, x));
      }
      const result = solver.solve(problem);
      if (best === INF) {
        expect(result.status).toBe('infeasible');
        return;
      }
      const { objective, values, gap, bound } = optimal(result);
      expect(objective).toBeCloseTo(best, 9);
      expect(values.every(Number.isInteger)).toBe(true);
      expect(gap).toBe(0);
      expect(bound).toBeLessThanOrEqual(objective);
    }),
    { numRuns: 150 },
  );
});

test('marginals are the slope of the objective when a bound is moved either way', () => {
  let checked = 0;
  fc.assert(
    fc.property(randomProblem(false), fc.nat(5), (problem, which) => {
      const result = live.solve(problem);
      const row = problem.rows[which];
      if (result.status !== 'optimal' || !row) return;
      const step = 1e-4;
      const moved = (by: number) => {
        const rows = problem.rows.with(which, { ...row, lower: row.lower + by, upper: row.upper + by });
        const again = solver.solve({ ...problem, rows });
        return again.status === 'optimal' ? again.objective : null;
      };
      const [up, down] = [moved(step), moved(-step)];
      if (up === null || down === null) return;
      checked++;
      // At a corner of the objective either slope, and any between, is a marginal.
      const slopes = [(up - result.objective) / step, (result.objective - down) / step].sort((a, b) => a - b);
      const marginal = result.marginals!.rows[which]!;
      expect(marginal).toBeGreaterThan(slopes[0]! - 1e-4);
      expect(marginal).toBeLessThan(slopes[1]! + 1e-4);
    }),
    { numRuns: 200 },
  );
  expect(checked).toBeGreaterThan(50);
});

test('a live model that went through other problems answers as a fresh one', () => {
  fc.assert(
    fc.property(fc.array(randomProblem(true, 4), { minLength: 2, maxLength: 4 }), (problems) => {
      for (const problem of problems) {
        const [a, b] = [live.solve(problem), solver.solve(problem)];
        expect(a.status).toBe(b.status);
        if (a.status === 'optimal') expect(a.objective).toBeCloseTo(optimal(b).objective, 7);
      }
    }),
    { numRuns: 80 },
  );
});

test('a column that stands twice in a row counts with the sum', () => {
  const problem = (terms: readonly (readonly [number, number])[]): LinearProblem => ({
    columns: [{ name: 'x', lower: 0, upper: 100, cost: 1, integer: false }],
    rows: [{ name: 'r', lower: 12, upper: INF, terms }],
  });
  const single = problem([[0, 3]]);
  const double = problem([
    [0, 1],
    [0, 2],
  ]);
  expect(optimal(solver.solve(double)).objective).toBe(4);
  expect(optimal(live.solve(single)).objective).toBe(4);
  expect(optimal(live.solve(problem([[0, 1]]))).objective).toBe(12);
  expect(optimal(live.solve(double)).objective).toBe(4);
});

const column = (change: object) => ({ name: 'x', lower: 0, upper: 1, cost: 1, integer: false, ...change });

test('unbounded, infeasible and empty problems have a status and a sentence', () => {
  const free = { columns: [column({ lower: NEG, upper: INF })], rows: [] };
  expect(solver.solve(free)).toMatchObject({ status: 'unbounded', why: expect.stringMatching(/\.$/) });
  const against = { ...free, rows: [{ name: 'r', lower: 2, upper: 1, terms: [[0, 1]] as const }] };
  expect(solver.solve(against)).toEqual({
    status: 'infeasible',
    why: '“r” has a lower bound above its upper bound.',
  });
  expect(solver.solve({ columns: [], rows: [] })).toMatchObject({
    status: 'optimal',
    values: [],
    objective: 0,
  });
  expect(solver.solve({ columns: [], rows: [{ name: 'r', lower: 1, upper: 2, terms: [] }] }).status).toBe(
    'infeasible',
  );
});

test.each([
  ['a cost that is no number', { columns: [column({ cost: Number.NaN })], rows: [] }],
  ['an infinite cost', { columns: [column({ cost: INF })], rows: [] }],
  ['a bound that is no number', { columns: [column({ lower: Number.NaN })], rows: [] }],
  ['a lower bound of +∞', { columns: [column({ lower: INF, upper: INF })], rows: [] }],
  [
    'a huge coefficient',
    { columns: [column({})], rows: [{ name: 'r', lower: 0, upper: 1, terms: [[0, 1e30]] }] },
  ],
  [
    'a column that is not there',
    { columns: [column({})], rows: [{ name: 'r', lower: 0, upper: 1, terms: [[3, 1]] }] },
  ],
  ['too many columns', { columns: Array(30_000).fill(column({})), rows: [] }],
] as [string, LinearProblem][])('%s is refused with a sentence', (_, problem) => {
  const result = solver.solve(problem);
  expect(result).toMatchObject({ status: 'refused', why: expect.stringMatching(/\.$/) });
});

test('any numbers at all: a status every time, and what is given keeps the limits', () => {
  const wild = fc.oneof(
    fc.double(),
    fc.constantFrom(0, 1e-300, 1e11, -1e11, 1e-9, 5e-324, INF, NEG, Number.NaN),
    fc.integer({ min: -5, max: 5 }),
  );
  const seen = new Map<string, number>();
  fc.assert(
    fc.property(
      fc.array(fc.record({ lower: wild, upper: wild, cost: wild, integer: fc.boolean() }), { maxLength: 4 }),
      fc.array(fc.record({ lower: wild, upper: wild, a: fc.array(wild, { maxLength: 4 }) }), {
        maxLength: 3,
      }),
      (columns, rows) => {
        const problem = {
          columns: columns.map((each) => ({ name: 'c', ...each })),
          rows: rows.map(({ lower, upper, a }) => ({
            name: 'r',
            lower,
            upper,
            terms: a.slice(0, columns.length).map((value, j) => [j, value] as const),
          })),
        };
        const result = live.solve(problem, { timeLimit: 1 });
        seen.set(result.status, (seen.get(result.status) ?? 0) + 1);
        if (result.status === 'optimal') expect(result.values.every(Number.isFinite)).toBe(true);
        else expect(result.why).toMatch(/\.$/);
      },
    ),
    { numRuns: 1500 },
  );
  expect(seen.get('refused')).toBeGreaterThan(100);
});

/** A knapsack whose weights are all odd multiples near each other: hard for branch and bound. */
const hard = (n: number): LinearProblem => ({
  columns: Array.from({ length: n }, (_, j) => ({
    name: `x${j}`,
    lower: 0,
    upper: 1,
    cost: -(1000 + ((j * 7919) % 997)),
    integer: true,
  })),
  rows: [0, 1, 2, 3, 4].map((i) => ({
    name: `r${i}`,
    lower: NEG,
    upper: 250 * n + 0.5,
    terms: Array.from({ length: n }, (_, j) => [j, 1000 + ((j * 6007 + i * 3571) % 991)] as const),
  })),
});

test('at the time limit: the best so far, the bound and the gap', () => {
  const result = solver.solve(hard(60), { timeLimit: 0.3 });
  expect(result.status).toBe('stopped');
  if (result.status !== 'stopped') return;
  expect(result.values).not.toBeNull();
  expect(violation(hard(60), result.values!)).toBeLessThan(1e-6);
  expect(result.objective).toBe(costAt(hard(60), result.values!));
  expect(result.bound).toBeLessThan(result.objective);
  expect(result.gap).toBeCloseTo((result.objective - result.bound) / -result.objective, 9);
});

test('progress is told, and asking to stop stops it', () => {
  const told: number[] = [];
  const result = solver.solve(hard(60), {
    timeLimit: 20,
    onProgress: ({ objective }) => told.push(objective),
    shouldStop: () => told.some(Number.isFinite),
  });
  expect(result).toMatchObject({ status: 'stopped', why: 'It was stopped before the proof.' });
  expect(told.length).toBeGreaterThan(0);
});
