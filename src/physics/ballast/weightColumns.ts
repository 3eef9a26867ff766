/** Ballast in the linear program: cut to measure in grams, or a number of pieces of each size. */
import type { Term } from '../../numeric/linearProgram/problem.ts';
import { type Draft, GRAMS } from './draft.ts';
import type { Linear } from './linear.ts';
import { loadMass, type Setting } from './setting.ts';
import { times } from './share.ts';

export interface WeightColumns {
  /** Ballast cut to measure, one a hardpoint; null where pieces are used. */
  readonly weights: readonly (number | null)[];
  /** Number of each size; empty where ballast is cut to measure. */
  readonly counts: readonly (readonly number[])[];
}

export const weightColumns = (draft: Draft, setting: Setting, linear: Linear): WeightColumns => ({
  weights: setting.hardpoints.map(({ id, room, fill }, h) => {
    if (fill === 'pieces') return null;
    const column = draft.column(`ballast at ${id}`, 0, room * GRAMS);
    draft.adds(column, times(linear.weights[h]!, 1 / GRAMS));
    return column;
  }),
  counts: setting.hardpoints.map(({ id, room, fill }, h) =>
    fill === 'continuous'
      ? []
      : setting.sizes.map(({ mass, count }) => {
          // A piece that just fills the room fits, whatever the rounding.
          const most = Math.min(count, Math.floor(room / mass + 1e-9));
          const column = draft.column(`pieces of ${mass} kg at ${id}`, 0, most, true);
          draft.adds(column, times(linear.weights[h]!, mass));
          return column;
        }),
  ),
});

/** Ballast in grams as a sum of columns, at one hardpoint. */
export const ballastAt = ({ sizes }: Setting, { weights, counts }: WeightColumns, h: number): Term[] => [
  ...(weights[h] === null ? [] : [[weights[h]!, 1] as const]),
  ...counts[h]!.map((column, k): Term => [column, sizes[k]!.mass * GRAMS]),
];

/** What hangs at a hardpoint, ballast and loads, within its limit. */
export function holdRows(
  draft: Draft,
  setting: Setting,
  columns: WeightColumns,
  choices: readonly (readonly number[])[],
): void {
  setting.hardpoints.forEach(({ id, room }, h) => {
    const loads = setting.loads.flatMap((choice, l) =>
      choice.options.flatMap(({ hardpoint }, k): Term[] =>
        hardpoint === id ? [[choices[l]![k]!, loadMass(choice) * GRAMS]] : [],
      ),
    );
    draft.atMost(`limit of ${id}`, [...ballastAt(setting, columns, h), ...loads], room * GRAMS);
  });
}

/** No more pieces than there are. */
export function stockRows(draft: Draft, { sizes }: Setting, { counts }: WeightColumns): void {
  sizes.forEach(({ mass, count }, k) => {
    const terms = counts.flatMap((columns): Term[] => (columns.length > 0 ? [[columns[k]!, 1]] : []));
    if (terms.length > 0) draft.atMost(`pieces of ${mass} kg`, terms, count);
  });
}
