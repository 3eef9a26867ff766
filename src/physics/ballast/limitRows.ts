/** The limits on the sums as rows, with the worst that the tolerances can do when the plan is to be robust. */
import type { Term } from '../../numeric/linearProgram/problem.ts';
import { type Draft, GRAMS } from './draft.ts';
import type { Exact } from './exact.ts';
import { along, type Limit } from './limits.ts';
import type { Line, Linear } from './linear.ts';
import type { LoadColumns } from './placeColumns.ts';
import { worstOf } from './robust.ts';
import type { Setting } from './setting.ts';

export interface Places {
  readonly slides: readonly number[];
  readonly loads: readonly LoadColumns[];
}

/** One row a limit. With `elastic`, the columns by which limits may be broken, in degrees, centimetres and shares of the lift. */
export function limitRows(
  draft: Draft,
  setting: Setting,
  linear: Linear,
  exact: Exact,
  places: Places,
  elastic: boolean,
): number[] {
  return exact.limits.flatMap((limit) => {
    const spread = setting.robust ? spreadTerms(draft, setting, linear, limit, places) : NO_SPREAD;
    const broken = elastic ? [draft.column(`${limit.key} broken`, 0, Number.POSITIVE_INFINITY)] : [];
    const terms = [
      ...draft.effects.map(({ column, share }): Term => [column, along(limit, share) * GRAMS]),
      ...spread.terms,
      ...broken.map((column): Term => [column, -scaleOf(limit, exact) * GRAMS]),
    ];
    const room = limit.bound - along(limit, draft.rest) - spread.constant;
    draft.atMost(limit.key, terms, room * GRAMS);
    return broken;
  });
}

/** What of a limit one degree of attitude, one centimetre of depth or a hundredth of the lift amounts to. */
function scaleOf({ key }: Limit, { share, state }: Exact): number {
  const { cb, grossLift } = state.loading;
  if (key === 'heaviest' || key === 'lightest') return Math.max(Math.abs(grossLift) / 100, 1e-6);
  if (key === 'depth') return Math.max(share[0] / 100, 1e-6);
  return Math.max((Math.abs(share[3] - share[0] * cb[2]) * Math.PI) / 180, 1e-6);
}

interface Spread {
  readonly terms: readonly Term[];
  readonly constant: number;
}

const NO_SPREAD: Spread = { terms: [], constant: 0 };

/** Σ a |g · v|: constants for what stays, absolute values as columns of their own for what moves. */
function spreadTerms(
  draft: Draft,
  setting: Setting,
  linear: Linear,
  limit: Limit,
  { slides, loads }: Places,
): Spread {
  const terms: Term[] = [];
  let constant = worstOf(limit, linear.uncertain);
  setting.slides.forEach(({ part }, i) => {
    const [value, slope] = worstLine(limit, linear.slides[i]!, part.massTolerance);
    if (slope === 0) constant += Math.abs(value);
    else terms.push([draft.sizeOf(`${limit.key} ${part.id}`, [[slides[i]!, slope]], value), 1]);
  });
  setting.loads.forEach(({ load, aboard }, l) => {
    const { taken, stations } = loads[l]!;
    taken.forEach((column, k) => {
      const tolerance = (aboard ?? load).massTolerance;
      const [value, slope] = worstLine(limit, linear.loads[l]![k]!, tolerance);
      const station = stations[k]!;
      if (slope === 0 || station === null)
        terms.push([column, Math.abs(value + slope * linear.loads[l]![k]!.at) * GRAMS]);
      else
        terms.push([
          draft.sizeOf(
            `${limit.key} ${load.id} ${k}`,
            [
              [station, slope],
              [column, value],
            ],
            0,
          ),
          1,
        ]);
    });
  });
  return { terms, constant };
}

/** a g · v as value + slope × station. */
function worstLine(limit: Limit, line: Line, tolerance: number): [number, number] {
  const slope = tolerance * along(limit, line.perKilogramSlope);
  return [tolerance * along(limit, line.perKilogram) - slope * line.at, slope];
}
