/**
 * One objective after another: each is made as small as it can be without letting go of those before it. Every objective
 * has a row of its own, open at first, that is closed at the value reached.
 */
import type { Column, LinearProblem } from '../../numeric/linearProgram/problem.ts';
import type {
  LinearResult,
  LiveModel,
  Optimal,
  SolveOptions,
  Stopped,
} from '../../numeric/linearProgram/result.ts';
import type { Stage, StageKey } from './stages.ts';

export interface Ordered {
  /** The first objective's answer: what is proven of it. */
  readonly first: Optimal | Stopped;
  readonly values: readonly number[];
  /** Whether every objective was carried to its proof; wishes to the tenth of a gram. */
  readonly proven: boolean;
}

/** What closing a row leaves open, in the objective's unit: grams, parts or metres. */
const SLACK = 1e-6;

export interface OrderOptions extends Pick<SolveOptions, 'onProgress' | 'shouldStop' | 'gap'> {
  /** Date.now() at which to stop, ms. */
  readonly deadline: number;
  readonly start?: readonly number[];
}

/** Columns that need be whole only once the number of moved parts is asked for. */
export function solveInOrder(
  model: LiveModel,
  problem: LinearProblem,
  moved: readonly number[],
  stages: readonly Stage[],
  options: OrderOptions,
): Ordered | Exclude<LinearResult, Optimal> {
  let caps = stages.map(() => Number.POSITIVE_INFINITY);
  let first: Optimal | Stopped | null = null;
  let values: readonly number[] = options.start ?? [];
  let proven = true;
  for (const [k, stage] of stages.entries()) {
    const asked = stages.slice(0, k + 1).some(({ key }) => key === 'fewestMoved');
    const posed = posedFor(problem, stages, caps, stage, asked ? [] : moved);
    if (
      first &&
      worth(stage, values) <= leastOf(posed.columns, stage) + SLACK &&
      !needsWhole(asked, moved, values)
    ) {
      caps = caps.with(k, worth(stage, values) + SLACK);
      continue;
    }
    const result = model.solve(posed, stageOptions(options, stage.key, k, values));
    if (!first && (result.status === 'optimal' || (result.status === 'stopped' && result.values)))
      first = result;
    else if (!first) return result as Exclude<LinearResult, Optimal>;
    proven &&= result.status === 'optimal';
    if ((result.status === 'optimal' || result.status === 'stopped') && result.values) values = result.values;
    caps = caps.with(k, worth(stage, values) + SLACK);
  }
  return { first: first!, values, proven };
}

const needsWhole = (asked: boolean, moved: readonly number[], x: readonly number[]): boolean =>
  asked && moved.some((column) => x[column]! > 1e-9 && x[column]! < 1 - 1e-9);

/** Wishes are carried to this, in grams, parts or metres: to prove a sum of loads to the microgram can take all day. */
const WISH_GAP: Record<StageKey, number> = {
  trial: 1e-3,
  ballast: 1e-6,
  usefulLoad: 0.1,
  fewestMoved: 1e-6,
  leastWire: 0.1,
  distance: 1e-3,
};

/** Only the first objective stops at a gap that is asked for, and tells of its progress. */
function stageOptions(
  { deadline, start: _, ...options }: OrderOptions,
  key: StageKey,
  k: number,
  values: readonly number[],
): SolveOptions {
  // Rounded up, so that a solver that is asked every frame is not told anew each time.
  const timeLimit = Math.max(0.01, Math.ceil((deadline - Date.now()) / 100) / 10);
  const { shouldStop } = options;
  const rest = k === 0 ? options : shouldStop ? { shouldStop } : {};
  return { ...rest, timeLimit, absoluteGap: WISH_GAP[key], ...(values.length > 0 ? { start: values } : {}) };
}

function posedFor(
  { columns, rows }: LinearProblem,
  stages: readonly Stage[],
  caps: readonly number[],
  { terms }: Stage,
  relaxed: readonly number[],
): LinearProblem {
  const costs = new Map<number, number>();
  for (const [column, a] of terms) costs.set(column, (costs.get(column) ?? 0) + a);
  const open = new Set(relaxed);
  const priced = columns.map(
    (column, j): Column => ({
      ...column,
      cost: costs.get(j) ?? 0,
      integer: column.integer && !open.has(j),
    }),
  );
  const closed = stages.map((stage, k) => ({
    name: `objective ${stage.key}`,
    lower: Number.NEGATIVE_INFINITY,
    upper: caps[k]!,
    terms: stage.terms,
  }));
  return { columns: priced, rows: [...rows, ...closed] };
}

const worth = ({ terms }: Stage, x: readonly number[]): number =>
  terms.reduce((sum, [column, a]) => sum + a * x[column]!, 0);

/** What an objective cannot go below, whatever the rows say. */
const leastOf = (columns: readonly Column[], { terms }: Stage): number =>
  terms.reduce((sum, [column, a]) => {
    const { lower, upper } = columns[column]!;
    return sum + Math.min(a * lower, a * upper);
  }, 0);
