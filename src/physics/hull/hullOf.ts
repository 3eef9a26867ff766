/** From the form named in the craft file to the hull with all its figures. */
import type { HullShape } from '../../craft/hullSchema.ts';
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { Hull } from './hull.ts';
import type { Meridian } from './meridian.ts';
import { revolve } from './revolve.ts';
import { spheroid, twoSpheroid } from './spheroid.ts';

/** The hull, or a sentence naming what is wrong with the form and what would be allowed. */
export function hullOf(shape: HullShape): Outcome<Hull> {
  const meridian = meridianOf(shape);
  return meridian.status === 'solved' ? solved(revolve(meridian.value)) : meridian;
}

function meridianOf(shape: HullShape): Outcome<Meridian> {
  switch (shape.kind) {
    case 'spheroid':
      return solved(spheroid(shape));
    case 'twoSpheroid':
      return solved(twoSpheroid(shape));
    default:
      return infeasible(`The form ${shape.kind} is not computed yet.`);
  }
}
