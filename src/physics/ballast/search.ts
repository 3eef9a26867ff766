/**
 * From a setting to the best point, by sequential linearisation: linearise about a point, solve, put the solution through
 * the exact statics, and linearise again there until what the program claims and what the statics say are one.
 *
 * Where nothing is curved that is one round. Where slides follow the skin or wires follow slides, rounds after the first
 * hold pieces and choices as found; once they settle, one more round with everything free has to confirm them. If rounds
 * do not settle, slides are held to a stretch about the point that is halved each round.
 */
import type { LinearSolver } from '../../numeric/linearProgram/result.ts';
import { type Attempt, attempt, type Found, type NotFound, type SearchOptions } from './attempt.ts';
import { isKept } from './exact.ts';
import { nearestPoint } from './nearest.ts';
import { ballastOf, type Point, startOf } from './point.ts';
import type { Setting } from './setting.ts';

/** One search with its solver, which keeps what it knows between rounds. */
export function search(setting: Setting, solver: LinearSolver, options: SearchOptions): Found | NotFound {
  const model = solver.live();
  const trial: Attempt = { setting, model, options };
  try {
    const found = settled(trial, startOf(setting));
    if (found.status !== 'infeasible' || !found.curved) return found;
    const near = nearestPoint(setting, model, options.deadline);
    return near ? settled(trial, near) : found;
  } finally {
    model.dispose();
  }
}

const MOST_ROUNDS = 24;
/** Rounds in which slides may go anywhere; from then on nearer and nearer to the point. */
const FREE_ROUNDS = 5;
/** Ballast that is worth another round, kg. */
const WORTH = 1e-7;

function settled(trial: Attempt, begin: Point): Found | NotFound {
  let point = begin;
  let held: Found | null = null;
  let best: Found | null = null;
  let unsettled = 0;
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const found: Found | NotFound = attempt(trial, point, held, 0.5 ** Math.max(0, unsettled - FREE_ROUNDS));
    if (found.status !== 'found') {
      if (!held || isLate(trial)) return best ?? found;
      held = null;
      continue;
    }
    if (held && found.agrees && isKept(found.exact)) {
      const confirmed = confirm(trial, found);
      if (!confirmed) return found;
      held = confirmed.agrees ? null : confirmed;
      best = better(trial.setting, best, found);
      point = confirmed.point;
      continue;
    }
    best = better(trial.setting, best, found);
    if (found.agrees || isLate(trial) || (trial.options.anyWillDo && best)) return best ?? unsettledSlides;
    unsettled++;
    held = found.choices ? found : null;
    point = found.point;
  }
  return best ?? unsettledSlides;
}

const unsettledSlides: NotFound = {
  status: 'none',
  why: 'The slides did not settle: the hull bends too sharply along them.',
  curved: true,
};

const isLate = ({ options }: Attempt): boolean => Date.now() >= options.deadline || !!options.shouldStop?.();

/** A better plan with everything free, linearised where these choices settled; null when there is none. */
function confirm(trial: Attempt, found: Found): Found | null {
  if (trial.options.anyWillDo || isLate(trial)) return null;
  const free = attempt(trial, found.point, null, 1, found.values);
  if (free.status !== 'found') return null;
  const saved = ballastOf(trial.setting, found.point) - ballastOf(trial.setting, free.point);
  return saved > WORTH ? free : null;
}

/** The one with less ballast of those that keep every limit. */
function better(setting: Setting, best: Found | null, found: Found): Found | null {
  if (!isKept(found.exact)) return best;
  if (!best) return found;
  return ballastOf(setting, found.point) <= ballastOf(setting, best.point) + WORTH ? found : best;
}
