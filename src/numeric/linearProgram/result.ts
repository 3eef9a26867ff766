/** What a solver of linear programs answers: never a throw, never a number that means nothing. */
import type { LinearProblem } from './problem.ts';

export type LinearResult = Optimal | Stopped | NoSolution;

export interface Optimal {
  readonly status: 'optimal';
  /** One value a column, in order; whole numbers are whole. */
  readonly values: readonly number[];
  readonly objective: number;
  /** No solution costs less than this; below the objective by at most the gap asked for. */
  readonly bound: number;
  /** (objective − bound) / |objective|; 0 when proven to the tolerance of the arithmetic. */
  readonly gap: number;
  readonly marginals: Marginals | null;
}

/**
 * How the objective changes with the bound that holds a row or column: dobjective / dbound, + when raising the bound
 * costs. With whole numbers, of the linear program with those held at their values. Null when it cannot be told.
 */
export interface Marginals {
  readonly rows: readonly number[];
  readonly columns: readonly number[];
}

/** Stopped at the time limit or when asked to. */
export interface Stopped {
  readonly status: 'stopped';
  /** The best solution so far; null when there was none yet. */
  readonly values: readonly number[] | null;
  readonly objective: number;
  readonly bound: number;
  /** Infinity when there is no solution or no bound yet. */
  readonly gap: number;
  readonly why: string;
}

export interface NoSolution {
  /** refused: the problem is not one to begin on, or the solver gave up; `why` says so. */
  readonly status: 'infeasible' | 'unbounded' | 'refused';
  readonly why: string;
}

export interface SolveOptions {
  /** Seconds after which to stop with the best so far. Default 60. */
  readonly timeLimit?: number;
  /** Relative gap at which a solution with whole numbers counts as the best. Default 0: proven. */
  readonly gap?: number;
  /** The same as a difference, in the objective's own unit. Default 1e-6. */
  readonly absoluteGap?: number;
  /** Told now and then while whole numbers are searched for. */
  readonly onProgress?: (progress: Progress) => void;
  /** Asked now and then; true stops with the best so far. */
  readonly shouldStop?: () => boolean;
  /** A solution to begin from, one value a column. */
  readonly start?: readonly number[];
}

export interface Progress {
  /** Best so far, and what it cannot go below; ±Infinity while there is none. */
  readonly objective: number;
  readonly bound: number;
  readonly gap: number;
  /** s */
  readonly elapsed: number;
  /** The solution, when it has just been bettered. */
  readonly values: readonly number[] | null;
}

/** Solves linear programs. */
export interface LinearSolver {
  solve(problem: LinearProblem, options?: SolveOptions): LinearResult;
  /** A model that keeps its solution between solves. Must be disposed of. */
  live(): LiveModel;
}

/** Solves one problem after another, each from the solution of the one before; fast when little changes. */
export interface LiveModel {
  solve(problem: LinearProblem, options?: SolveOptions): LinearResult;
  dispose(): void;
}
