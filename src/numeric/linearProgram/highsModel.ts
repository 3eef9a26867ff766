/** One model kept inside HiGHS, changed entry by entry to match the problem at hand. */
import type { Highs, Model, ModelData } from 'highs';
import type { LinearProblem, Term } from './problem.ts';

/** Smallest amounts that count, in the problem's own units. */
const TOLERANCES = {
  primal_feasibility_tolerance: 1e-9,
  dual_feasibility_tolerance: 1e-9,
  mip_feasibility_tolerance: 1e-8,
} as const;

export class HighsModel {
  readonly model: Model;
  readonly #highs: Highs;
  readonly #set = new Map<string, number>();
  #held: LinearProblem | null = null;

  constructor(highs: Highs) {
    this.#highs = highs;
    this.model = highs.createModel();
    // The feasibility jump takes 8 ms of any search, however small, and finds nothing that the rest does not.
    this.model.options.set({
      output_flag: false,
      mip_heuristic_run_feasibility_jump: false,
      ...TOLERANCES,
    });
  }

  /** Sets options of HiGHS; those that stay cost nothing. */
  set(options: Readonly<Record<string, number>>): void {
    for (const [name, value] of Object.entries(options)) {
      if (this.#set.get(name) === value) continue;
      this.model.options.set(name, value);
      this.#set.set(name, value);
    }
  }

  /** Makes the model inside stand for this problem. */
  hold(problem: LinearProblem): void {
    const held = this.#held;
    const sameShape =
      held && held.columns.length === problem.columns.length && held.rows.length === problem.rows.length;
    if (sameShape) this.#change(held, problem);
    else this.model.passModel(modelData(problem, this.#highs));
    this.#held = problem;
  }

  dispose(): void {
    this.model.dispose();
  }

  #change(held: LinearProblem, next: LinearProblem): void {
    const { model } = this;
    next.columns.forEach((column, j) => {
      const old = held.columns[j]!;
      if (old === column) return;
      if (old.cost !== column.cost) model.changeColCost(j, column.cost);
      if (old.lower !== column.lower || old.upper !== column.upper) {
        model.changeColBounds(j, this.#bound(column.lower), this.#bound(column.upper));
      }
      if (old.integer !== column.integer) model.changeColIntegrality(j, column.integer ? 1 : 0);
    });
    next.rows.forEach((row, i) => {
      const old = held.rows[i]!;
      if (old === row) return;
      if (old.lower !== row.lower || old.upper !== row.upper) {
        model.changeRowBounds(i, this.#bound(row.lower), this.#bound(row.upper));
      }
      this.#changeTerms(i, old.terms, row.terms);
    });
  }

  #changeTerms(i: number, old: readonly Term[], next: readonly Term[]): void {
    if (old === next) return;
    const before = summed(old);
    const after = summed(next);
    for (const [j, value] of after) {
      if (before.get(j) !== value) this.model.changeCoefficient(i, j, value);
      before.delete(j);
    }
    for (const j of before.keys()) this.model.changeCoefficient(i, j, 0);
  }

  #bound(value: number): number {
    return Number.isFinite(value) ? value : Math.sign(value) * this.#highs.infinity;
  }
}

/** Coefficients by column, each column once. */
function summed(terms: readonly Term[]): Map<number, number> {
  const sums = new Map<number, number>();
  for (const [j, a] of terms) sums.set(j, (sums.get(j) ?? 0) + a);
  return sums;
}

function modelData({ columns, rows }: LinearProblem, { infinity }: Highs): ModelData {
  const bound = (value: number) => (Number.isFinite(value) ? value : Math.sign(value) * infinity);
  const starts = [0];
  const indices: number[] = [];
  const values: number[] = [];
  for (const { terms } of rows) {
    for (const [j, a] of summed(terms)) {
      indices.push(j);
      values.push(a);
    }
    starts.push(indices.length);
  }
  return {
    numCols: columns.length,
    numRows: rows.length,
    colCost: columns.map(({ cost }) => cost),
    colLower: columns.map(({ lower }) => bound(lower)),
    colUpper: columns.map(({ upper }) => bound(upper)),
    rowLower: rows.map(({ lower }) => bound(lower)),
    rowUpper: rows.map(({ upper }) => bound(upper)),
    matrix: { format: 'csr', numRows: rows.length, numCols: columns.length, starts, indices, values },
    integrality: columns.map(({ integer }) => (integer ? 1 : 0)),
  };
}
