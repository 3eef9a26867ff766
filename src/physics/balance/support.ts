/**
 * Attitude while something else carries the heaviness: resting on a leg when heavy, held by a line when light.
 *
 * Weight W at G, lift L at B, and W − L carried at the point S. The potential energy is g times the height of
 *   q = W G − L B − (W − L) S,
 * taken as a vector in hull axes, least when q points straight down. For S on a leg of a heavy craft and for S the tie
 * of a light one alike. Derived from moments about S; no friction, one point.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import { say } from '../../units/sentence.ts';
import { momentAbout } from '../mass/body.ts';
import { type Attitude, attitudeOf } from './attitude.ts';
import { heavinessOf, type Loading } from './loading.ts';

export function supportedAttitude(loading: Loading, at: Vec3): Outcome<Attitude> {
  const { solid, cb, grossLift } = loading;
  const [wx, wy, wz] = momentAbout(solid, at);
  const lifted = (i: 0 | 1 | 2) => grossLift * (cb[i] - at[i]);
  const attitude = attitudeOf([wx - lifted(0), wy - lifted(1), wz - lifted(2)]);
  return attitude
    ? solved(attitude)
    : infeasible(
        `Weight and lift balance about this point in any attitude (heaviness ${say(heavinessOf(loading), 'mass')}).`,
        'Choose another point.',
      );
}
