/**
 * Linear programs solved by HiGHS (MIT, compiled to WebAssembly), behind the plain terms of `problem.ts`.
 *
 * Row duals and reduced costs come from the simplex basis. For a problem with whole numbers those are held at their
 * values and the linear program is solved once more, which also clears the small infeasibilities a search leaves.
 */
import loadModule, {
  type CallbackData,
  type Highs,
  type HighsCallbackMap,
  type InitOptions,
  type InterruptCallbackEvent,
} from 'highs';
import { HighsModel } from './highsModel.ts';
import {
  activityAt,
  costAt,
  emptyRange,
  faultOf,
  hasIntegers,
  type LinearProblem,
  withIntegersHeld,
} from './problem.ts';
import type {
  LinearResult,
  LinearSolver,
  LiveModel,
  NoSolution,
  Optimal,
  Progress,
  SolveOptions,
  Stopped,
} from './result.ts';

/** A gap below this share of the objective, or of 1, is the rounding of the arithmetic: proven. */
const NO_GAP = 1e-6;

/** The solver, loaded once; where its WebAssembly lies can be said in the options when it is not beside the program. */
export const loadHighs = async (options?: InitOptions): Promise<LinearSolver> =>
  highsSolver(await loadModule(options));

const highsSolver = (highs: Highs): LinearSolver => {
  const live = () => new HighsLiveModel(highs);
  return {
    live,
    solve: (problem, options) => {
      const model = live();
      try {
        return model.solve(problem, options);
      } finally {
        model.dispose();
      }
    },
  };
};

class HighsLiveModel implements LiveModel {
  readonly #highs: Highs;
  #inside: HighsModel | null = null;

  constructor(highs: Highs) {
    this.#highs = highs;
  }

  solve(problem: LinearProblem, options: SolveOptions = {}): LinearResult {
    const fault = faultOf(problem);
    if (fault) return { status: 'refused', why: fault };
    const empty = emptyRange(problem);
    if (empty !== null) return noRoom(empty);
    if (problem.columns.length === 0) return withoutColumns(problem);
    try {
      return this.#run(problem, options);
    } catch (error) {
      this.dispose();
      return { status: 'refused', why: `The solver gave up: ${(error as Error).message}.` };
    }
  }

  dispose(): void {
    this.#inside?.dispose();
    this.#inside = null;
  }

  #run(problem: LinearProblem, options: SolveOptions): LinearResult {
    const { modelStatus } = this.#highs.constants;
    const status = this.#status(problem, options);
    switch (status) {
      case modelStatus.optimal:
        return hasIntegers(problem) ? this.#polished(problem) : this.#optimal(problem);
      case modelStatus.infeasible:
        return { status: 'infeasible', why: 'No solution keeps every limit.' };
      case modelStatus.unbounded:
      case modelStatus.unboundedOrInfeasible:
        return this.#unboundedOrNot(problem, options);
      case modelStatus.timeLimit:
      case modelStatus.interrupted:
        return this.#stopped(problem, status === modelStatus.timeLimit);
      default:
        return { status: 'refused', why: `The solver could not decide (its status ${status}).` };
    }
  }

  #status(problem: LinearProblem, options: SolveOptions): number {
    this.#inside ??= new HighsModel(this.#highs);
    const { model } = this.#inside;
    this.#inside.hold(problem);
    const integers = hasIntegers(problem);
    const { timeLimit = 60, gap = 0, absoluteGap = 1e-6 } = options;
    this.#inside.set({ time_limit: timeLimit, mip_rel_gap: gap, mip_abs_gap: absoluteGap });
    model.zeroAllClocks();
    if (integers && options.start) model.setSolution({ colValue: options.start });
    return model.run(callbacksOf(this.#highs, options)).modelStatus;
  }

  #optimal(problem: LinearProblem): Optimal {
    const { colValue, colDual, rowDual } = this.#inside!.model.getSolution();
    const values = Array.from(colValue);
    const objective = costAt(problem, values);
    const marginals = { rows: Array.from(rowDual), columns: Array.from(colDual) };
    return { status: 'optimal', values, objective, bound: objective, gap: 0, marginals };
  }

  /** The solution with its whole numbers made whole, and the rest solved again round them. */
  #polished(problem: LinearProblem): Optimal {
    const { model } = this.#inside!;
    const found = Array.from(model.getSolution().colValue);
    const bound = model.info.get('mip_dual_bound') as number;
    const rounded = found.map((value, j) => (problem.columns[j]!.integer ? Math.round(value) : value));
    const again = solveOnce(this.#highs, withIntegersHeld(problem, rounded));
    const values = again?.values ?? rounded;
    const objective = costAt(problem, values);
    return {
      status: 'optimal',
      values,
      objective,
      bound: Math.min(bound, objective),
      gap: gapOf(objective, bound),
      marginals: again?.marginals ?? null,
    };
  }

  #stopped(problem: LinearProblem, late: boolean): Stopped {
    const { model } = this.#inside!;
    const { feasible } = this.#highs.constants.solutionStatus;
    const found = model.info.get('primal_solution_status') === feasible;
    const integers = hasIntegers(problem);
    const values = found && integers ? this.#polished(problem).values : null;
    const objective = values ? costAt(problem, values) : Number.POSITIVE_INFINITY;
    const bound = integers ? (model.info.get('mip_dual_bound') as number) : Number.NEGATIVE_INFINITY;
    const gap = values && Number.isFinite(bound) ? gapOf(objective, bound) : Number.POSITIVE_INFINITY;
    const why = late ? 'The time limit came before the proof.' : 'It was stopped before the proof.';
    return { status: 'stopped', values, objective, bound, gap, why };
  }

  /** Told apart by whether the same problem without costs has a solution. */
  #unboundedOrNot(problem: LinearProblem, options: SolveOptions): NoSolution {
    const columns = problem.columns.map((column) => ({ ...column, cost: 0 }));
    const status = this.#status({ ...problem, columns }, { timeLimit: options.timeLimit ?? 60 });
    return status === this.#highs.constants.modelStatus.optimal
      ? { status: 'unbounded', why: 'The objective can be made as small as one likes.' }
      : { status: 'infeasible', why: 'No solution keeps every limit.' };
  }
}

/** A linear program solved in a model of its own; null unless that works out. */
function solveOnce(highs: Highs, problem: LinearProblem): Optimal | null {
  const model = new HighsLiveModel(highs);
  try {
    const result = model.solve(problem);
    return result.status === 'optimal' ? result : null;
  } finally {
    model.dispose();
  }
}

/** Progress is told when a better solution is found and at most every so many seconds in between. */
const TELL_EVERY = 0.1;

function callbacksOf(highs: Highs, { onProgress, shouldStop }: SolveOptions): HighsCallbackMap | undefined {
  const { callbackType } = highs.constants;
  if (!onProgress && !shouldStop) return undefined;
  let told = 0;
  const interrupting = (event: InterruptCallbackEvent): undefined => {
    if (shouldStop?.()) event.interrupt();
    const progress = progressOf(event.data);
    if (!onProgress || event.type !== callbackType.mipInterrupt || progress.elapsed < told + TELL_EVERY)
      return;
    told = progress.elapsed;
    onProgress(progress);
  };
  return {
    [callbackType.simplexInterrupt]: interrupting,
    [callbackType.mipInterrupt]: interrupting,
    [callbackType.mipImprovingSolution]: ({ data }) => {
      onProgress?.(progressOf(data));
      return undefined;
    },
  };
}

function progressOf(data: CallbackData): Progress {
  const objective = data.mip_primal_bound ?? Number.POSITIVE_INFINITY;
  const bound = data.mip_dual_bound ?? Number.NEGATIVE_INFINITY;
  const values = data.mip_solution ? Array.from(data.mip_solution) : null;
  return { objective, bound, gap: gapOf(objective, bound), elapsed: data.running_time ?? 0, values };
}

function gapOf(objective: number, bound: number): number {
  const gap = objective - bound;
  if (!Number.isFinite(gap)) return Number.POSITIVE_INFINITY;
  if (gap <= NO_GAP * Math.max(1, Math.abs(objective))) return 0;
  return objective === 0 ? Number.POSITIVE_INFINITY : gap / Math.abs(objective);
}

const noRoom = (name: string): NoSolution => ({
  status: 'infeasible',
  why: `“${name}” has a lower bound above its upper bound.`,
});

function withoutColumns(problem: LinearProblem): LinearResult {
  const broken = problem.rows.find((row) => {
    const activity = activityAt(row, []);
    return activity < row.lower || activity > row.upper;
  });
  if (broken) return { status: 'infeasible', why: `“${broken.name}” holds nothing that could change it.` };
  const marginals = { rows: problem.rows.map(() => 0), columns: [] };
  return { status: 'optimal', values: [], objective: 0, bound: 0, gap: 0, marginals };
}
