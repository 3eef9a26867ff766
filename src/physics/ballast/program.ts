/**
 * The plan as a linear program, linearised about a point: ballast at each hardpoint, the station of each slide, 1 or 0
 * for each place of a load, and the limits as rows. What each column means is told by where its number stands here.
 */
import type { Column, LinearProblem } from '../../numeric/linearProgram/problem.ts';
import { Draft, GRAMS } from './draft.ts';
import type { Exact } from './exact.ts';
import { limitRows } from './limitRows.ts';
import type { Linear } from './linear.ts';
import { type MoveColumns, moveColumns } from './moveColumns.ts';
import { type LoadColumns, loadColumns, slideColumns } from './placeColumns.ts';
import type { Point } from './point.ts';
import type { Setting } from './setting.ts';
import { type Share, times, trialShare } from './share.ts';
import { holdRows, stockRows, type WeightColumns, weightColumns } from './weightColumns.ts';

export interface Program {
  readonly problem: LinearProblem;
  /** The sums it claims: what is there whatever is decided, and what one unit of a column adds. */
  readonly rest: Share;
  readonly effects: Draft['effects'];
  readonly columns: ProgramColumns;
}

export interface ProgramColumns extends WeightColumns, MoveColumns {
  readonly slides: readonly number[];
  readonly loads: readonly LoadColumns[];
  /** The load that is tried, g; null when none is. */
  readonly trial: number | null;
  /** How far each limit may be broken; none unless asked for. */
  readonly broken: readonly number[];
}

export interface ProgramOptions {
  /** Share of each stretch, either way of the point, within which slides are to stay. Default 1: the whole. */
  readonly reach?: number;
  /** Lets limits be broken, for finding how near to feasible one can come. Default false. */
  readonly elastic?: boolean;
}

export function programOf(
  setting: Setting,
  linear: Linear,
  exact: Exact,
  { reach = 1, elastic = false }: ProgramOptions = {},
): Program {
  const draft = new Draft();
  draft.addsAlways(linear.rest);
  const weights = weightColumns(draft, setting, linear);
  const slides = slideColumns(draft, setting, linear, reach);
  const loads = loadColumns(draft, setting, linear, reach);
  holdRows(
    draft,
    setting,
    weights,
    loads.map(({ taken }) => taken),
  );
  stockRows(draft, setting, weights);
  const trial = trialColumn(draft, setting);
  const moves = moveColumns(draft, setting, slides, loads);
  const broken = limitRows(draft, setting, linear, exact, { slides, loads }, elastic);
  const { rest, effects } = draft;
  return {
    problem: draft.problem(),
    rest,
    effects,
    columns: { ...weights, slides, loads, ...moves, trial, broken },
  };
}

/** Up to all that the craft lifts. */
function trialColumn(draft: Draft, setting: Setting): number | null {
  if (!setting.trial) return null;
  const most = Math.abs(setting.today.loading.grossLift) + setting.today.loading.solid.mass;
  const column = draft.column('load that is tried', 0, most * GRAMS);
  draft.adds(column, times(trialShare(setting), 1 / GRAMS));
  return column;
}

/** Ballast of less than some micrograms is what closing objectives left open, g. */
const NOTHING = 5e-6;

/** A station so near an end of its stretch is there, m. */
const AT_END = 5e-8;

const snapped = (station: number, { lower, upper }: Column): number =>
  station < lower + AT_END ? lower : station > upper - AT_END ? upper : station;

/** The point that a solution stands for; stations that play no part stay as in `before`. */
export const pointOf = ({ problem, columns }: Program, x: readonly number[], before: Point): Point => ({
  weights: columns.weights.map((column) =>
    column !== null && x[column]! > NOTHING ? x[column]! / GRAMS : 0,
  ),
  counts: columns.counts.map((each, h) =>
    each.length > 0 ? each.map((column) => Math.round(x[column]!)) : before.counts[h]!.map(() => 0),
  ),
  slides: columns.slides.map((column) => snapped(x[column]!, problem.columns[column]!)),
  options: columns.loads.map(({ taken }) => {
    const at = taken.findIndex((column) => x[column]! > 0.5);
    return at < 0 ? null : at;
  }),
  stations: columns.loads.map(({ taken, stations }, l) =>
    stations.map((column, k) =>
      column !== null && x[taken[k]!]! > 0.5 ? x[column]! : before.stations[l]![k]!,
    ),
  ),
  trial: columns.trial === null ? 0 : Math.max(0, x[columns.trial]! / GRAMS),
});
