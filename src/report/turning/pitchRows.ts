/** How the craft sits in cruise, how it climbs, and how fast it may fly. */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { type Critical, criticalSpeed } from '../../physics/cruise/critical.ts';
import { cruisePitch } from '../../physics/cruise/cruise.ts';
import { thrustersOf } from '../../physics/thrust/thrusters.ts';
import type { TurnAsked } from '../../physics/turning/asked.ts';
import type { Rows } from '../rows.ts';
import { withoutThrust } from './thrusterWords.ts';
import { rowsFrom } from './turnFigure.ts';

export function pitchRows(state: CraftState, { throttle, speed }: TurnAsked): Rows {
  const why = withoutThrust(state.craft, thrustersOf(state));
  const cruise = why ? infeasible(why) : cruisePitch(state, speed === null ? { throttle } : { speed });
  const caution = cruise.status === 'solved' ? cruise.value.cautions.join(' ') : null;
  return {
    ...rowsFrom(
      cruise,
      {
        'cruise.pitch': ({ pitch }) => pitch,
        'cruise.floating': ({ floating }) => floating,
        'cruise.thrustCouple': ({ terms }) => terms.thrust,
        'cruise.dragCouple': ({ terms }) => terms.podDrag + terms.finDrag,
        'cruise.munkCouple': ({ terms }) => terms.munk,
        'cruise.finCouple': ({ terms }) => terms.fins,
        'cruise.crossFlowCouple': ({ terms }) => terms.crossFlow,
        'cruise.pendulumCouple': ({ terms }) => terms.tailHeaviness + terms.depth,
        'cruise.rising': ({ rising }) => rising,
      },
      { 'cruise.pitch': { caution } },
    ),
    ...rowsFrom(loosening(criticalSpeed(state)), { 'cruise.criticalSpeed': (at) => at }),
  };
}

const loosening = (critical: Outcome<Critical>): Outcome<number> => {
  if (critical.status === 'infeasible') return critical;
  const { speed } = critical.value;
  return speed === null ? infeasible('There is none: the fins hold the nose at any speed.') : solved(speed);
};
