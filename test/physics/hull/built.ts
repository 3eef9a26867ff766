import type { HullShape } from '../../../src/craft/hullSchema.ts';
import type { Hull } from '../../../src/physics/hull/hull.ts';
import { hullOf } from '../../../src/physics/hull/hullOf.ts';

/** The hull of a form that must be possible. */
export function built(shape: HullShape): Hull {
  const outcome = hullOf(shape);
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return outcome.value;
}
