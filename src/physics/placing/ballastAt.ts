/**
 * The exact ballast plan of one station after another. Each search begins where the one before ended, on one model that is
 * kept; the optimum is the same from anywhere.
 */
import type { Craft } from '../../craft/craft.ts';
import type { Stowage } from '../../craft/stowage.ts';
import type { LinearSolver, LiveModel } from '../../numeric/linearProgram/result.ts';
import { isKept } from '../ballast/exact.ts';
import { ballastOf, startOf, stowageOf } from '../ballast/point.ts';
import { searchFrom } from '../ballast/search.ts';
import { fixedBallast, hasChoices, settingOf } from '../ballast/setting.ts';
import type { CraftState } from '../craftState.ts';

export interface Ballast {
  /** All dead ballast, kg. */
  readonly mass: number;
  /** Whether no plan has less, to the proof. */
  readonly proven: boolean;
  readonly stowage: Stowage;
  /** The craft with the plan carried out. */
  readonly state: CraftState;
}

const NO_PLAN = 'No ballast, slide or place of a load keeps every target at once.';

/** Seconds for one station: where pieces or places are chosen, a proof can take long. */
const STATION_LIMIT = 20;

export class BallastAlong {
  readonly #model: LiveModel;

  constructor(solver: LinearSolver) {
    this.#model = solver.live();
  }

  /** The plan of a craft, or why there is none. */
  at(craft: Craft, shouldStop?: () => boolean): Ballast | { readonly why: string } {
    const made = settingOf(craft, false);
    if (made.status === 'infeasible') return made;
    const setting = made.value;
    // With nothing to choose, ties go to what moves least without a search for it.
    const aim = hasChoices(setting) ? 'plan' : 'follow';
    const deadline = Date.now() + 1000 * STATION_LIMIT;
    const options = { deadline, aim, ...(shouldStop ? { shouldStop } : {}) } as const;
    const found = searchFrom({ setting, model: this.#model, options }, startOf(setting));
    if (found.status === 'infeasible') return { why: NO_PLAN };
    if (found.status !== 'found') return found;
    if (!isKept(found.exact)) return { why: 'The search for a plan did not come to an end.' };
    return {
      mass: ballastOf(setting, found.point) + fixedBallast(craft),
      proven: found.ordered.first.status === 'optimal',
      stowage: stowageOf(setting, found.point),
      state: found.exact.state,
    };
  }

  dispose(): void {
    this.#model.dispose();
  }
}
