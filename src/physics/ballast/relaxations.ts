/**
 * When no plan keeps every limit: the smallest single relaxation of each that lets one be made. On the builder's scale, so
 * that what is read can be typed; more room never hurts, so by doubling and halving. Each is feasible because a plan for
 * the craft with that limit moved was found and put through the statics.
 */
import type { Craft } from '../../craft/craft.ts';
import { type Relaxation, relaxed } from '../../craft/relaxation.ts';
import type { LinearSolver } from '../../numeric/linearProgram/result.ts';
import type { UnitSystem } from '../../units/units.ts';
import type { Found } from './attempt.ts';
import { type Candidate, candidatesOf, digitsOf, valueAt } from './candidates.ts';
import { isKept } from './exact.ts';
import { ballastOf } from './point.ts';
import { search } from './search.ts';
import { fixedBallast, type Setting, settingOf } from './setting.ts';

export interface Remedy {
  readonly relaxation: Relaxation;
  /** Where the limit stands today. */
  readonly now: number;
  /** All dead ballast of the best plan then, kg. */
  readonly deadBallast: number;
}

export interface Remedies {
  readonly remedies: readonly Remedy[];
  /** False when time ran out before every limit was tried. */
  readonly complete: boolean;
}

export interface RemedyOptions {
  readonly deadline: number;
  /** On whose scale limits are moved. */
  readonly units: UnitSystem;
  readonly shouldStop?: () => boolean;
}

export function remediesOf(setting: Setting, solver: LinearSolver, options: RemedyOptions): Remedies {
  const remedies: Remedy[] = [];
  let complete = true;
  for (const candidate of candidatesOf(setting, options.units)) {
    if (Date.now() >= options.deadline || options.shouldStop?.()) {
      complete = false;
      break;
    }
    const remedy = remedyOf(setting, solver, candidate, options);
    if (remedy) remedies.push(remedy);
  }
  return { remedies, complete };
}

function remedyOf(
  setting: Setting,
  solver: LinearSolver,
  candidate: Candidate,
  options: RemedyOptions,
): Remedy | null {
  const craftAt = (digits: number): Craft => relaxed(setting.craft, candidate.at(valueAt(candidate, digits)));
  const works = (digits: number) => planFor(craftAt(digits), setting.robust, solver, true, options) !== null;
  const digits = fewest(digitsOf(candidate), works);
  if (digits === null) return null;
  const craft = craftAt(digits);
  const best = planFor(craft, setting.robust, solver, false, options);
  return (
    best && {
      relaxation: candidate.at(valueAt(candidate, digits)),
      now: candidate.now,
      deadBallast: ballastOf(best.setting, best.found.point) + fixedBallast(craft),
    }
  );
}

/** The least count in 1 … most that works; null when the most does not. */
function fewest(most: number, works: (count: number) => boolean): number | null {
  if (most < 1 || !works(most)) return null;
  let low = 0;
  let high = 1;
  while (high < most && !works(high)) {
    low = high;
    high = Math.min(2 * high, most);
  }
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (works(middle)) high = middle;
    else low = middle;
  }
  return high;
}

/** A plan that keeps every limit of a craft; the one with least ballast unless any will do. */
export function planFor(
  craft: Craft,
  robust: boolean,
  solver: LinearSolver,
  anyWillDo: boolean,
  { deadline, shouldStop }: Pick<RemedyOptions, 'deadline' | 'shouldStop'>,
): { setting: Setting; found: Found } | null {
  const setting = settingOf(craft, robust);
  if (setting.status === 'infeasible') return null;
  const found = search(setting.value, solver, {
    deadline,
    anyWillDo,
    aim: 'ballast',
    ...(shouldStop ? { shouldStop } : {}),
  });
  return found.status === 'found' && isKept(found.exact) ? { setting: setting.value, found } : null;
}
