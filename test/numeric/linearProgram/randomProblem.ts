/** Random problems for tests, some with whole numbers, most of them feasible. */
import fc from 'fast-check';
import type { LinearProblem } from '../../../src/numeric/linearProgram/problem.ts';

const number = fc.integer({ min: -40, max: 40 }).map((n) => n / 4);

/** Every column is bounded, so nothing is unbounded. Rows hold at a point inside, unless `loose` says otherwise. */
export const randomProblem = (integers: boolean, most = 6): fc.Arbitrary<LinearProblem> =>
  fc
    .record({ n: fc.integer({ min: 1, max: most }), m: fc.integer({ min: 0, max: most }) })
    .chain(({ n, m }) =>
      fc.record({
        costs: fc.array(number, { minLength: n, maxLength: n }),
        spans: fc.array(fc.integer({ min: 0, max: 4 }), { minLength: n, maxLength: n }),
        whole: fc.array(fc.boolean(), { minLength: n, maxLength: n }),
        rows: fc.array(
          fc.record({
            terms: fc.array(number, { minLength: n, maxLength: n }),
            slack: fc.integer({ min: -2, max: 20 }),
            above: fc.boolean(),
          }),
          { minLength: m, maxLength: m },
        ),
      }),
    )
    .map(({ costs, spans, whole, rows }) => ({
      columns: costs.map((cost, j) => ({
        name: `x${j}`,
        lower: -1,
        upper: -1 + spans[j]!,
        cost,
        integer: integers && whole[j]!,
      })),
      rows: rows.map(({ terms, slack, above }, i) => ({
        name: `r${i}`,
        lower: above ? -slack : Number.NEGATIVE_INFINITY,
        upper: above ? Number.POSITIVE_INFINITY : slack,
        terms: terms.map((a, j) => [j, a] as const),
      })),
    }));
