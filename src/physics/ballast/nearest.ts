/** How near to its limits a craft can come: for finding a point that keeps them when the first one was no help. */
import type { LiveModel } from '../../numeric/linearProgram/result.ts';
import { exactOf, isKept } from './exact.ts';
import { linearAt } from './linear.ts';
import { type Point, startOf } from './point.ts';
import { pointOf, programOf } from './program.ts';
import type { Setting } from './setting.ts';

const MOST_ROUNDS = 12;
/** Less than this is nothing broken: degrees, centimetres, hundredths of the lift. */
const NOTHING = 1e-6;

/**
 * Breaks the limits as little as can be, linearising again where that ends. A point at which none is broken, to the
 * linearisation or in truth; null when the least is more than nothing.
 */
export function nearestPoint(setting: Setting, model: LiveModel, deadline: number): Point | null {
  let point = startOf(setting);
  let least = Number.POSITIVE_INFINITY;
  for (let round = 0; round < MOST_ROUNDS && Date.now() < deadline; round++) {
    const exact = exactOf(setting, point);
    if (isKept(exact)) return point;
    const program = programOf(setting, linearAt(setting, point, exact), exact, { elastic: true });
    const broken = new Set(program.columns.broken);
    const columns = program.problem.columns.map((column, j) => ({
      ...column,
      cost: broken.has(j) ? 1 : 0,
      integer: column.integer && !program.columns.moved.includes(j),
    }));
    const timeLimit = Math.max(0.01, (deadline - Date.now()) / 1000);
    const result = model.solve({ ...program.problem, columns }, { timeLimit });
    if (result.status !== 'optimal') return null;
    point = pointOf(program, result.values, point);
    if (result.objective < NOTHING) return point;
    if (round > 2 && result.objective > least * 0.99) return null;
    least = Math.min(least, result.objective);
  }
  return null;
}
