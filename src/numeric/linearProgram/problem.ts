/**
 * A linear program, possibly with whole numbers in it, in plain terms:
 *
 *   minimise Σ cost_j x_j  with  lower_j ≤ x_j ≤ upper_j,  lower_i ≤ Σ a_ij x_j ≤ upper_i,  some x_j whole.
 *
 * Bounds may be ±Infinity. It knows nothing of what the numbers stand for; `name` is for sentences.
 */

export interface Column {
  readonly name: string;
  readonly lower: number;
  readonly upper: number;
  readonly cost: number;
  /** Whether only whole numbers will do. */
  readonly integer: boolean;
}

/** Column index and coefficient. A column that stands twice counts with the sum. */
export type Term = readonly [column: number, coefficient: number];

export interface LinearRow {
  readonly name: string;
  readonly lower: number;
  readonly upper: number;
  readonly terms: readonly Term[];
}

export interface LinearProblem {
  readonly columns: readonly Column[];
  readonly rows: readonly LinearRow[];
}

/** Larger problems are refused rather than begun. */
export const SIZE_LIMITS = { columns: 20_000, rows: 20_000, terms: 500_000 } as const;
/** Coefficients, costs and finite bounds beyond this are refused: nothing could be told from the answer. */
export const LARGEST = 1e11;

/** One sentence on what is wrong with a problem, or null. */
export function faultOf(problem: LinearProblem): string | null {
  return sizeFault(problem) ?? columnFault(problem.columns) ?? rowFault(problem);
}

function sizeFault({ columns, rows }: LinearProblem): string | null {
  const terms = rows.reduce((sum, row) => sum + row.terms.length, 0);
  const sizes = { columns: columns.length, rows: rows.length, terms };
  for (const what of ['columns', 'rows', 'terms'] as const) {
    if (sizes[what] > SIZE_LIMITS[what]) {
      return `The problem has ${sizes[what]} ${what}; at most ${SIZE_LIMITS[what]} are taken on.`;
    }
  }
  return null;
}

function columnFault(columns: readonly Column[]): string | null {
  for (const { name, lower, upper, cost } of columns) {
    const fault = boundFault(lower, upper) ?? (isFit(cost) ? null : `cost ${cost}`);
    if (fault) return faultText(name, fault);
  }
  return null;
}

function rowFault({ columns, rows }: LinearProblem): string | null {
  for (const { name, lower, upper, terms } of rows) {
    const fault = boundFault(lower, upper) ?? termFault(terms, columns.length);
    if (fault) return faultText(name, fault);
  }
  return null;
}

const faultText = (name: string, fault: string): string =>
  `“${name}” has the ${fault}; numbers up to ±${LARGEST} are taken on.`;

const isFit = (value: number): boolean => Math.abs(value) <= LARGEST;

function boundFault(lower: number, upper: number): string | null {
  if (!(isFit(lower) || lower === Number.NEGATIVE_INFINITY)) return `lower bound ${lower}`;
  if (!(isFit(upper) || upper === Number.POSITIVE_INFINITY)) return `upper bound ${upper}`;
  return null;
}

function termFault(terms: readonly Term[], columns: number): string | null {
  for (const [column, coefficient] of terms) {
    if (!Number.isInteger(column) || column < 0 || column >= columns) return `column index ${column}`;
    if (!isFit(coefficient)) return `coefficient ${coefficient}`;
  }
  return null;
}

/** The name of a column or row that no number can satisfy, or null. */
export const emptyRange = ({ columns, rows }: LinearProblem): string | null =>
  [...columns, ...rows].find(({ lower, upper }) => lower > upper)?.name ?? null;

export const hasIntegers = ({ columns }: LinearProblem): boolean => columns.some(({ integer }) => integer);

/** The linear program that is left when every whole number is held at its value. */
export const withIntegersHeld = ({ columns, rows }: LinearProblem, at: ArrayLike<number>): LinearProblem => ({
  columns: columns.map((column, j) => {
    if (!column.integer) return column;
    const value = Math.round(at[j]!);
    return { ...column, integer: false, lower: value, upper: value };
  }),
  rows,
});

/** Σ cost x. */
export const costAt = ({ columns }: LinearProblem, x: ArrayLike<number>): number =>
  columns.reduce((sum, { cost }, j) => sum + cost * x[j]!, 0);

/** Σ a x of a row. */
export const activityAt = ({ terms }: LinearRow, x: ArrayLike<number>): number =>
  terms.reduce((sum, [j, a]) => sum + a * x[j]!, 0);
