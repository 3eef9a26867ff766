/** The same problem put to yalps (MIT), a simplex and branch-and-bound written by others. It takes variables ≥ 0 only. */
import { solve } from 'yalps';
import type { LinearProblem } from '../../../src/numeric/linearProgram/problem.ts';

/** The least objective, or null where there is no solution. */
export function rivalObjective({ columns, rows }: LinearProblem): number | null {
  const shift = columns.reduce((sum, { cost, lower }) => sum + cost * lower, 0);
  const constraints: Record<string, { min?: number; max?: number }> = {};
  const variables: Record<string, Record<string, number>> = {};
  columns.forEach(({ cost, lower, upper }, j) => {
    variables[`x${j}`] = { cost, [`up${j}`]: 1 };
    constraints[`up${j}`] = { max: upper - lower };
  });
  rows.forEach(({ lower, upper, terms }, i) => {
    const base = terms.reduce((sum, [j, a]) => sum + a * columns[j]!.lower, 0);
    constraints[`r${i}`] = {
      ...(Number.isFinite(lower) ? { min: lower - base } : {}),
      ...(Number.isFinite(upper) ? { max: upper - base } : {}),
    };
    for (const [j, a] of terms) {
      const variable = variables[`x${j}`]!;
      variable[`r${i}`] = (variable[`r${i}`] ?? 0) + a;
    }
  });
  const integers = columns.flatMap(({ integer }, j) => (integer ? [`x${j}`] : []));
  const { status, result } = solve(
    { direction: 'minimize', objective: 'cost', constraints, variables, integers },
    { tolerance: 0, precision: 1e-9, maxIterations: 1e6, timeout: 1e5 },
  );
  return status === 'optimal' ? result + shift : null;
}
