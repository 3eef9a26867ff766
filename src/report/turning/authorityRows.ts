/** What the thrusters can do to yaw the craft at rest. */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { cgOf } from '../../physics/balance/loading.ts';
import type { CraftState } from '../../physics/craftState.ts';
import { thrustersOf } from '../../physics/thrust/thrusters.ts';
import { type Leverage, leverageOf, yaws } from '../../physics/turning/leverage.ts';
import { turningCraftOf } from '../../physics/turning/turningCraft.ts';
import { spread } from '../floatRows.ts';
import type { Rows } from '../rows.ts';
import { cannotYaw, ifDriven } from './thrusterWords.ts';
import { rowsFrom } from './turnFigure.ts';

const leverageIn = (state: CraftState, throttle: number): Outcome<Leverage> =>
  ifDriven(state, (thrusters) => {
    const craft = turningCraftOf(state);
    if (craft.status === 'infeasible') return craft;
    const straight = cannotYaw(thrusters);
    return straight ? infeasible(straight) : solved(leverageOf(craft.value, throttle));
  });

export function authorityRows(state: CraftState, throttle: number): Rows {
  const apart = thrustersOf(state)
    .filter(yaws)
    .every(({ differ }) => differ !== 0);
  return rowsFrom(
    leverageIn(state, throttle),
    {
      'turn.arm': ({ arm }) => arm,
      'turn.yawMoment': ({ yawMoment }) => yawMoment,
      'turn.virtualArm': ({ virtualArm }) => virtualArm,
      'turn.virtualMoment': ({ virtualMoment }) => virtualMoment,
      'turn.shareVectoring': ({ shares }) => shares.vectoring,
      'turn.shareArm': ({ shares }) => shares.arm,
      'turn.shareThrust': ({ shares }) => shares.thrust,
    },
    {
      'turn.arm': {
        uncertainty: spread(state, (loading) => cgOf(loading)?.[apart ? 1 : 0] ?? null),
        why: apart ? 'To the side, of thrusters throttled apart.' : '+ thrust aft of the CG.',
      },
    },
  );
}
