/**
 * One weight for both: all the lift left over, hung at the one station where it also levels the craft.
 *
 *   m = L − W,   x = x_B − q_x / m.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import { hangOf, heavinessOf, type Loading } from './loading.ts';

export interface OneWeight {
  /** kg */
  readonly mass: number;
  /** m */
  readonly station: number;
}

/** Less than this is neutral, kg. */
const NEUTRAL = 5e-5;

/** `hullLength` bounds the station; `liftPerVolume` is ρ_air − ρ_gas, kg/m³, for saying what would help. */
export function oneWeight(loading: Loading, hullLength: number, liftPerVolume: number): Outcome<OneWeight> {
  const mass = -heavinessOf(loading);
  if (Math.abs(mass) < NEUTRAL)
    return infeasible('The craft is neutral already: no lift is left to hang anything on.');
  if (mass <= 0) return noLiftLeft(-mass, liftPerVolume);
  const station = loading.cb[0] - hangOf(loading)[0] / mass;
  if (station < 0 || station > hullLength) return beyondHull(mass, station, hullLength);
  return solved({ mass, station });
}

function noLiftLeft(excess: number, liftPerVolume: number): Outcome<OneWeight> {
  const more = liftPerVolume > 0 ? ` or add ${say(excess / liftPerVolume, 'volume')} of hull` : '';
  return infeasible(
    `There is no lift left: the craft is ${say(excess, 'mass')} heavy already.`,
    `Take at least ${say(excess, 'mass')} out${more}.`,
  );
}

function beyondHull(mass: number, station: number, length: number): Outcome<OneWeight> {
  const ahead = station < 0;
  const by = say(ahead ? -station : station - length, 'smallLength');
  const end = ahead ? 'ahead of the nose' : 'behind the tail';
  const move = ahead ? 'forward' : 'aft';
  return infeasible(
    `All the lift left, ${say(mass, 'mass')}, would have to hang ${by} ${end}.`,
    `Move a heavy part ${move}, or split the weight in two.`,
  );
}
