/** From the form named in the craft file to the hull with all its figures. */
import type { HullShape } from '../../craft/hullSchema.ts';
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import { cylinder } from './cylinder.ts';
import { gores, twoSheet } from './flatPattern.ts';
import type { Hull } from './hull.ts';
import type { Meridian, ShapeOf } from './meridian.ts';
import { myring } from './myring.ts';
import { naca4 } from './naca4.ts';
import { offsets } from './offsets.ts';
import { revolve } from './revolve.ts';
import { roundTwoSheet } from './roundTwoSheet.ts';
import { series58 } from './series58.ts';
import { spheroid, twoSpheroid } from './spheroid.ts';

/** A hull smaller than this has no figures worth giving, m. */
const LEAST_SIZE = 1e-3;

/** The hull, or a sentence naming what is wrong with the form and what would be allowed. */
export function hullOf(shape: HullShape): Outcome<Hull> {
  if (shape.kind === 'roundTwoSheet') return solved(roundTwoSheet(shape));
  const meridian = meridianOf(shape);
  if (meridian.status !== 'solved') return meridian;
  const hull = revolve(meridian.value);
  return tooSmall(hull) ?? solved(hull);
}

/** A form that is a body of revolution about the hull axis. */
export type RevolvedShape = Exclude<HullShape, ShapeOf<'roundTwoSheet'>>;

export function meridianOf(shape: RevolvedShape): Outcome<Meridian> {
  switch (shape.kind) {
    case 'spheroid':
      return solved(spheroid(shape));
    case 'twoSpheroid':
      return solved(twoSpheroid(shape));
    case 'naca4':
      return solved(naca4(shape));
    case 'series58':
      return series58(shape);
    case 'myring':
      return myring(shape);
    case 'cylinder':
      return cylinder(shape);
    case 'offsets':
      return offsets(shape);
    case 'gores':
      return gores(shape);
    case 'twoSheet':
      return twoSheet(shape);
  }
}

function tooSmall({ length, height }: Hull) {
  if (length >= LEAST_SIZE && height >= LEAST_SIZE) return undefined;
  return infeasible(
    `The hull comes out ${say(length, 'smallLength')} long and ${say(height, 'smallLength')} across.`,
    'It must measure at least 1 mm each way.',
  );
}
