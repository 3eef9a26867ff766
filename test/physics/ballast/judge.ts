/** Whether a craft keeps its targets, told from the figures of the report alone, and its dead ballast. */
import { type Craft, listed } from '../../../src/craft/craft.ts';
import { hangOf, heavinessOf, pendulumDepthOf } from '../../../src/physics/balance/loading.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { assess } from '../../../src/report/assess.ts';

/** By how much the craft misses its targets: rad, kg or m, whichever is the largest number; ≤ 0 when it keeps them. */
export function missedBy(craft: Craft): number {
  const { rows } = assess(craft);
  const { heaviness, pitchTolerance, heelTolerance, leastPendulumDepth } = craft.targets;
  const value = (key: string) => rows[key]?.value ?? Number.POSITIVE_INFINITY;
  return Math.max(
    Math.abs(value('float.pitch')) - pitchTolerance,
    Math.abs(value('float.heel')) - heelTolerance,
    leastPendulumDepth - value('float.pendulumDepth'),
    value('heaviness') - heaviness.most,
    heaviness.least - value('heaviness'),
  );
}

/**
 * The same from the loading alone, which is quicker, and with pitch as the plan's limits reckon it,
 * tan pitch = (x_G − x_B)/(z_B − z_G): stricter when it heels.
 */
export function missedStrictly(craft: Craft): number {
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') throw new Error(state.why);
  const { loading } = state.value;
  const { heaviness, pitchTolerance, heelTolerance, leastPendulumDepth } = craft.targets;
  const [x, y, z] = hangOf(loading);
  return Math.max(
    Math.abs(Math.atan2(x, -z)) - pitchTolerance,
    Math.abs(Math.atan2(y, -z)) - heelTolerance,
    leastPendulumDepth - pendulumDepthOf(loading)!,
    heavinessOf(loading) - heaviness.most,
    heaviness.least - heavinessOf(loading),
  );
}

/** kg */
export const deadBallast = (craft: Craft): number =>
  listed(craft.parts)
    .filter(({ kind }) => kind === 'ballast')
    .reduce((sum, { mass, copies }) => sum + mass * (copies.kind === 'pair' ? 2 : copies.count), 0);
