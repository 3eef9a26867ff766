/** What each useful load costs or saves in dead ballast: planned without it and with it, all the rest anew both times. */
import { type Craft, listed } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { Load } from '../../craft/planningSchema.ts';
import type { LinearSolver } from '../../numeric/linearProgram/result.ts';
import { ballastOf, stowageOf } from './point.ts';
import { planFor } from './relaxations.ts';
import { fixedBallast } from './setting.ts';

export interface LoadRow {
  readonly load: string;
  /** All dead ballast, kg; null when no plan keeps every limit. */
  readonly without: number | null;
  readonly with: number | null;
  /** What it saves, kg; negative when it costs; null unless both are known. */
  readonly saved: number | null;
  /** Where it then goes. */
  readonly place: Place | null;
}

export interface CarryTable {
  readonly rows: readonly LoadRow[];
  /** False when time ran out, or it was stopped, before the last load. */
  readonly complete: boolean;
}

export interface TableOptions {
  readonly robust?: boolean;
  /** Seconds for the whole table. Default 20. */
  readonly timeLimit?: number;
  readonly shouldStop?: () => boolean;
}

export function carryTable(craft: Craft, solver: LinearSolver, options: TableOptions = {}): CarryTable {
  const { robust = false, timeLimit = 20, shouldStop } = options;
  const asked = { deadline: Date.now() + 1000 * timeLimit, ...(shouldStop ? { shouldStop } : {}) };
  const rows: LoadRow[] = [];
  for (const load of listed(craft.loads)) {
    if (Date.now() >= asked.deadline || shouldStop?.()) return { rows, complete: false };
    const ashore = planFor(changed(craft, load, { must: false, options: [] }), robust, solver, false, asked);
    const aboard = planFor(changed(craft, load, { must: true }), robust, solver, false, asked);
    const fixed = fixedBallast(craft);
    const without = ashore && ballastOf(ashore.setting, ashore.found.point) + fixed;
    const withIt = aboard && ballastOf(aboard.setting, aboard.found.point) + fixed;
    const stowed = aboard && stowageOf(aboard.setting, aboard.found.point);
    rows.push({
      load: load.id,
      without,
      with: withIt,
      saved: without === null || withIt === null ? null : without - withIt,
      place: stowed?.loads.find((each) => each.load === load.id)?.place ?? null,
    });
  }
  return { rows, complete: true };
}

const changed = (craft: Craft, load: Load, change: Partial<Load>): Craft => ({
  ...craft,
  loads: { ...craft.loads, byId: { ...craft.loads.byId, [load.id]: { ...load, ...change } } },
});
