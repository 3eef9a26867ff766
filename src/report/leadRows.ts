/** The least lead at the chosen hardpoint, and the one weight that both levels and neutralises. */
import { leadHardpoint } from '../craft/craft.ts';
import { type Outcome, solved, valueOrNull } from '../numeric/outcome.ts';
import type { Vec3 } from '../numeric/vector.ts';
import { levellingWeight, levellingWithin } from '../physics/balance/counterweight.ts';
import { pitchPerMass } from '../physics/balance/float.ts';
import { heavinessOf, type Loading, pendulumDepthOf, withWeight } from '../physics/balance/loading.ts';
import { type OneWeight, oneWeight } from '../physics/balance/oneWeight.ts';
import type { CraftState } from '../physics/craftState.ts';
import { positionOf } from '../physics/mass/position.ts';
import { say } from '../units/sentence.ts';
import { spread } from './floatRows.ts';
import type { Row } from './row.ts';
import { type Rows, row, rowOf } from './rows.ts';

export const leadPosition = ({ craft, hull }: CraftState): Vec3 =>
  positionOf(leadHardpoint(craft).place, hull);

export function leadRows(state: CraftState): Rows {
  const { craft, loading } = state;
  const at = leadPosition(state);
  const exact = levellingWeight(loading, at);
  const within = levellingWithin(loading, at, craft.targets.pitchTolerance);
  // Level within the tolerance, and only weight on the other side would better it: then none is needed.
  const none = exact.status === 'infeasible' && within.status === 'solved' && within.value === 0;
  const lead = none ? within : exact;
  const after = lead.status === 'solved' ? solved(withWeight(loading, lead.value, at)) : lead;
  const leadOf = (each: Loading) => valueOrNull(levellingWeight(each, at));
  const uncertainty = lead.status === 'solved' && lead.value > 0 ? spread(state, leadOf) : null;
  return {
    'lead.mass': rowOf(lead, 'Lead to level exactly', 'mass', {
      uncertainty,
      caution: leadCaution(state, lead, after),
      why: none ? `None is needed within the tolerance. ${exact.why}` : '',
    }),
    'lead.massWithinTolerance': rowOf(within, 'Least lead within the pitch tolerance', 'mass'),
    'lead.station': row({ label: 'Lead station', quantity: 'length', value: at[0] }),
    'lead.degreesPerGram': rowOf(pitchPerMass(loading, at), 'Turn per mass there', 'anglePerMass', {
      why: '+ nose-up; for the first of the lead, as the craft is now.',
    }),
    'lead.heavinessAfter': afterRow(after, 'Heaviness with the lead', 'mass', heavinessOf),
    'lead.pendulumDepthAfter': afterRow(
      after,
      'Pendulum depth with the lead',
      'smallLength',
      (each) => pendulumDepthOf(each) ?? Number.NaN,
    ),
  };
}

const afterRow = (
  after: Outcome<Loading>,
  label: string,
  quantity: 'mass' | 'smallLength',
  figure: (loading: Loading) => number,
): Row => rowOf(after.status === 'solved' ? solved(figure(after.value)) : after, label, quantity);

/** What is wrong with the craft that has its lead, or null. */
function leadCaution(
  { air, craft, gasDensity }: CraftState,
  lead: Outcome<number>,
  after: Outcome<Loading>,
): string | null {
  if (lead.status === 'infeasible' || lead.value === 0 || after.status === 'infeasible') return null;
  const depth = pendulumDepthOf(after.value);
  if (depth !== null && depth <= 0) {
    return `With it the CG still stands ${say(-depth, 'smallLength')} above the CB, so the craft turns over. Hang the heavy parts lower.`;
  }
  const { limit, name } = leadHardpoint(craft);
  if (lead.value > limit) {
    return `The ${name.toLowerCase() || 'hardpoint'} holds no more than ${say(limit, 'mass')}: see what a plan can do.`;
  }
  const excess = heavinessOf(after.value);
  if (excess <= 0) return null;
  const litres = excess / (air.density - gasDensity);
  const more = litres > 0 ? ` or add ${say(litres, 'volume')} of hull` : '';
  return `No lift is left for it: with it the craft is ${say(excess, 'mass')} heavy. Save that much elsewhere${more}, or move a heavy part towards the lead instead.`;
}

export function oneWeightRows(state: CraftState): Rows {
  const { air, gasDensity, hull } = state;
  const solve = (loading: Loading) => oneWeight(loading, hull.length, air.density - gasDensity);
  const weight = solve(state.loading);
  const part = (key: keyof OneWeight, label: string, quantity: 'mass' | 'length') =>
    rowOf(weight.status === 'solved' ? solved(weight.value[key]) : weight, label, quantity, {
      uncertainty:
        weight.status === 'solved' ? spread(state, (each) => valueOrNull(solve(each))?.[key] ?? null) : null,
      why: 'All the lift left, hung where it also levels.',
    });
  return {
    'oneWeight.mass': part('mass', 'One weight for both', 'mass'),
    'oneWeight.station': part('station', 'Station of the one weight', 'length'),
  };
}
