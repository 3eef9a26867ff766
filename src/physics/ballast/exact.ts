/** A point put through the full statics of the craft it makes. */
import type { Craft } from '../../craft/craft.ts';
import { stowed } from '../../craft/stowage.ts';
import { type CraftState, craftStateOf } from '../craftState.ts';
import { excessOf, hairOf, type Limit, type LimitKey, limitsOf } from './limits.ts';
import { type Point, stowageOf } from './point.ts';
import { uncertainOf, worstOf } from './robust.ts';
import type { Setting } from './setting.ts';
import { type Planned, plus, type Share, shareOfCraft, trialShare } from './share.ts';

export interface Exact extends Planned {
  readonly craft: Craft;
  readonly state: CraftState;
  readonly share: Share;
  readonly limits: readonly Limit[];
  /** How far beyond each limit, in hairs: up to 1 is inside the craft's own target, for every mass it may have. */
  readonly excess: readonly number[];
}

export function exactOf(setting: Setting, point: Point): Exact {
  const craft = stowed(setting.craft, stowageOf(setting, point));
  const state = stateOf(craft);
  const share = plus(shareOfCraft(state), trialShare(setting), point.trial);
  const limits = limitsOf(state);
  const uncertain = setting.robust ? uncertainOf(state) : [];
  const excess = limits.map(
    (limit) => excessOf(limit, share, worstOf(limit, uncertain), state.loading.cb[2]) / hairOf(limit),
  );
  return { given: setting.craft, craft, state, share, limits, excess };
}

/** A plan changes nothing of the hull, so the hull of its craft can be formed as that of the craft given. */
function stateOf(craft: Craft): CraftState {
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') throw new Error(state.why);
  return state.value;
}

/** Whether every limit is kept. */
export const isKept = ({ excess }: Exact): boolean => excess.every((each) => each <= 1);

/** Whether a limit is reached. */
export const isReached = ({ excess, limits }: Exact, key: LimitKey): boolean =>
  excess[limits.findIndex((limit) => limit.key === key)]! > -4;
