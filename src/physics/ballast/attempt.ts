/** One round of a search: linearise about a point, solve, and see what the exact statics say of the solution. */
import type { LinearProblem } from '../../numeric/linearProgram/problem.ts';
import type { LiveModel, Progress } from '../../numeric/linearProgram/result.ts';
import { type Exact, exactOf } from './exact.ts';
import { type Ordered, type OrderOptions, solveInOrder } from './inOrder.ts';
import { HAIR } from './limits.ts';
import { type Linear, linearAt } from './linear.ts';
import type { Point } from './point.ts';
import { type Program, pointOf, programOf } from './program.ts';
import type { Setting } from './setting.ts';
import { plus, type Share } from './share.ts';
import { type Aim, stagesFor } from './stages.ts';

export interface SearchOptions {
  /** Date.now() at which to stop, ms. */
  readonly deadline: number;
  /** What it is to be best in. Default 'plan'. */
  readonly aim?: Aim;
  /** Any plan that keeps the limits will do. Default false. */
  readonly anyWillDo?: boolean;
  readonly onBetter?: (better: Better) => void;
  readonly shouldStop?: () => boolean;
}

/** How a search stands on the way to its proof. */
export interface Better extends Pick<Progress, 'objective' | 'bound' | 'gap'> {
  /** A new best point, if there is one just now. */
  readonly point: Point | null;
}

export interface Attempt {
  readonly setting: Setting;
  readonly model: LiveModel;
  readonly options: SearchOptions;
}

export interface Found {
  readonly status: 'found';
  readonly point: Point;
  /** What the statics say of the point. */
  readonly exact: Exact;
  /** What the program claims of it. */
  readonly claimed: Share;
  /** Whether the two are one, far within the hair kept from each limit. */
  readonly agrees: boolean;
  /** Whether pieces or places had to be chosen. */
  readonly choices: boolean;
  readonly program: Program;
  readonly linear: Linear;
  readonly values: readonly number[];
  readonly ordered: Ordered;
}

export interface NotFound {
  readonly status: 'infeasible' | 'none';
  readonly why: string;
  readonly curved: boolean;
}

/** `held`: pieces and places as found there. `reach`: see `programOf`. `start`: a solution to begin from. */
export function attempt(
  { setting, model, options }: Attempt,
  point: Point,
  held: Found | null,
  reach: number,
  start?: readonly number[],
): Found | NotFound {
  const exact = exactOf(setting, point);
  const linear = linearAt(setting, point, exact);
  const free = programOf(setting, linear, exact, { reach });
  const program = held ? { ...free, problem: withChoicesHeld(free, held.values) } : free;
  const stages = stagesFor(options.aim ?? 'plan', setting, linear, program);
  const ordered = solveInOrder(model, program.problem, program.columns.moved, stages, {
    ...orderOptions(options, program, point),
    ...(start ? { start } : {}),
  });
  if ('status' in ordered) {
    const status = ordered.status === 'infeasible' ? 'infeasible' : 'none';
    return { status, why: ordered.why, curved: linear.curved };
  }
  return foundAt(setting, point, program, linear, ordered);
}

function foundAt(setting: Setting, from: Point, program: Program, linear: Linear, ordered: Ordered): Found {
  const { values } = ordered;
  const point = pointOf(program, values, from);
  const exact = exactOf(setting, point);
  const claimed = program.effects.reduce<Share>(
    (sum, { column, share }) => plus(sum, share, values[column]!),
    program.rest,
  );
  return {
    status: 'found',
    point,
    exact,
    claimed,
    agrees: agree(claimed, exact),
    choices: choiceColumns(program).some((column) => program.problem.columns[column]!.integer),
    program,
    linear,
    values,
    ordered,
  };
}

/** Within a third of the hair. */
function agree(claimed: Share, { share, state }: Exact): boolean {
  const [mass, x, y, z] = plus(share, claimed, -1);
  const hang = Math.abs(share[3] - share[0] * state.loading.cb[2]);
  return Math.abs(mass) <= HAIR.mass / 3 && Math.hypot(x, y, z) <= (hang * HAIR.angle) / 3;
}

const choiceColumns = ({ columns }: Program): number[] => [
  ...columns.counts.flat(),
  ...columns.loads.flatMap(({ taken }) => taken),
];

function withChoicesHeld(program: Program, at: readonly number[]): LinearProblem {
  const held = new Set(choiceColumns(program));
  const { columns, rows } = program.problem;
  return {
    rows,
    columns: columns.map((column, j) => {
      if (!held.has(j)) return column;
      const value = Math.round(at[j]!);
      return { ...column, lower: value, upper: value, integer: false };
    }),
  };
}

function orderOptions(options: SearchOptions, program: Program, from: Point): OrderOptions {
  const { deadline, anyWillDo, onBetter, shouldStop } = options;
  return {
    deadline,
    ...(anyWillDo ? { gap: 1e9 } : {}),
    ...(shouldStop ? { shouldStop } : {}),
    ...(onBetter
      ? {
          onProgress: ({ values, objective, bound, gap }) =>
            onBetter({ objective, bound, gap, point: values && pointOf(program, values, from) }),
        }
      : {}),
  };
}
