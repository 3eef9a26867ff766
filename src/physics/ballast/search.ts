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

export function search(setting: Setting, solver: LinearSolver, options: SearchOptions): Found | NotFound {
  const model = solver.live();
  try {
    return searchFrom({ setting, model, options }, startOf(setting));
  } finally {
    model.dispose();
  }
}

/** The same with a model that lives on, from any point. */
export function searchFrom(trying: Attempt, begin: Point): Found | NotFound {
  const found = settled(trying, begin);
  if (found.status !== 'infeasible' || !found.curved) return found;
  const near = nearestPoint(trying.setting, trying.model, trying.options.deadline);
  return near ? settled(trying, near) : found;
}

const MOST_ROUNDS = 24;
/** Rounds in which slides may go anywhere; from then on nearer and nearer to the point. */
const FREE_ROUNDS = 5;
/** Ballast that is worth another round, kg. */
const WORTH = 1e-7;

function settled(trying: Attempt, begin: Point): Found | NotFound {
  let point = begin;
  let held: Found | null = null;
  let best: Found | null = null;
  let unsettled = 0;
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const found: Found | NotFound = attempt(trying, point, held, 0.5 ** Math.max(0, unsettled - FREE_ROUNDS));
    if (found.status !== 'found') {
      if (!held || isLate(trying)) return best ?? found;
      held = null;
      continue;
    }
    if (held && found.agrees && isKept(found.exact)) {
      const confirmed = confirm(trying, found);
      if (!confirmed) return found;
      held = confirmed.agrees ? null : confirmed;
      best = better(trying, best, found);
      point = confirmed.point;
      continue;
    }
    best = better(trying, best, found);
    if (found.agrees || isLate(trying) || (trying.options.anyWillDo && best)) return best ?? unsettledSlides;
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
function confirm(trying: Attempt, found: Found): Found | null {
  if (trying.options.anyWillDo || isLate(trying)) return null;
  const free = attempt(trying, found.point, null, 1, found.values);
  if (free.status !== 'found') return null;
  return costOf(trying, found.point) - costOf(trying, free.point) > WORTH ? free : null;
}

/** The better one of those that keep every limit. */
function better(trying: Attempt, best: Found | null, found: Found): Found | null {
  if (!isKept(found.exact)) return best;
  if (!best) return found;
  return costOf(trying, found.point) <= costOf(trying, best.point) + WORTH ? found : best;
}

/** What comes first in what is aimed at, kg. */
const costOf = ({ setting, options }: Attempt, point: Point): number =>
  options.aim === 'trial' ? -point.trial : ballastOf(setting, point);
