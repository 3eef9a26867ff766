/** The hull forms a craft file may name. Each is described where it is computed, in physics/hull/. */
import { z } from 'zod';
import {
  angle,
  coordinate,
  count,
  distance,
  LIMITS,
  mass,
  massPerMetre,
  ratio,
  size,
  text,
} from './quantities.ts';

const length = size('Length from nose tip to tail tip', 0.05);
const diameter = size('Greatest diameter', 0.02);

const spheroid = z.strictObject({ kind: z.literal('spheroid'), length, diameter });

const twoSpheroid = z.strictObject({
  kind: z.literal('twoSpheroid'),
  foreLength: size('Length of the fore half-spheroid, nose tip to widest station', 0.02),
  aftLength: size('Length of the aft half-spheroid, widest station to tail tip', 0.02),
  diameter,
});

const naca4 = z.strictObject({
  kind: z.literal('naca4'),
  length,
  diameter,
  tail: z.enum(['open', 'closed']).meta({
    description: 'Last coefficient −0.1015 (open: a small blunt tail) or −0.1036 (closed to a point)',
  }),
});

const series58 = z.strictObject({
  kind: z.literal('series58'),
  length,
  diameter,
  widest: ratio('Station of the greatest diameter as a share of the length (m)', 0.1, 0.9),
  noseRadius: ratio('Nose radius of curvature r0 L/D²', 0, 2),
  tailRadius: ratio('Tail radius of curvature r1 L/D²', 0, 2),
  prismatic: ratio('Prismatic coefficient V/(D² L π/4)', 0.3, 0.9),
});

const myring = z.strictObject({
  kind: z.literal('myring'),
  noseLength: size('Length a of the full nose section'),
  middleLength: distance('Length b of the parallel middle'),
  tailLength: size('Length c of the full tail section'),
  diameter,
  nosePower: ratio('Exponent n of the nose', 0.5, 10),
  tailAngle: angle('Half the angle θ included at the tail tip'),
  noseOffset: distance('Length a_off cut from the nose section'),
  tailOffset: distance('Length c_off cut from the tail section'),
});

const endKind = z.enum(['ellipsoid', 'ogive', 'cone', 'flat']);

const cylinder = z.strictObject({
  kind: z.literal('cylinder'),
  diameter,
  noseEnd: endKind.meta({ description: 'Shape of the nose' }),
  noseLength: distance('Length of the nose; a flat end does not use it'),
  middleLength: distance('Length of the cylinder between the ends'),
  tailEnd: endKind.meta({ description: 'Shape of the tail' }),
  tailLength: distance('Length of the tail; a flat end does not use it'),
});

const offsets = z.strictObject({
  kind: z.literal('offsets'),
  along: z
    .enum(['station', 'tape'])
    .meta({ description: 'Whether `at` is the station or the tape distance from the nose tip' }),
  across: z.enum(['diameter', 'girth']).meta({ description: 'Whether `size` is the diameter or the girth' }),
  rows: z
    .array(z.strictObject({ at: distance('Station or tape distance'), size: distance('Diameter or girth') }))
    .min(3)
    .max(LIMITS.rows)
    .meta({
      description:
        'Measured on the inflated hull, nose to tail, the first at 0, each farther aft than the last; size 0 at a pointed or rounded end, close rows where it is round',
    }),
});

const patternRows = (width: string) =>
  z
    .array(
      z.strictObject({
        tape: distance('Along the flat centre line from its nose end, the first at 0'),
        width: distance(width),
      }),
    )
    .min(3)
    .max(LIMITS.rows);

const gores = z.strictObject({
  kind: z.literal('gores'),
  count: count('Number of equal gores', 3, 64),
  rows: patternRows('Full flat width of one gore, without the seam allowance'),
});

const twoSheet = z.strictObject({
  kind: z.literal('twoSheet'),
  rows: patternRows('Full flat width of one sheet between the seams'),
});

const roundTwoSheet = z.strictObject({
  kind: z.literal('roundTwoSheet'),
  flatDiameter: size('Diameter of the two flat discs, seam to seam', 0.05),
  stance: z
    .enum(['standing', 'lying'])
    .meta({ description: 'Standing on edge (seam in the plane of symmetry) or lying flat (seam level)' }),
});

export const shapeSchema = z.discriminatedUnion('kind', [
  spheroid,
  twoSpheroid,
  naca4,
  series58,
  myring,
  cylinder,
  offsets,
  gores,
  twoSheet,
  roundTwoSheet,
]);

export const hullSchema = z.strictObject({
  shape: shapeSchema,
  seams: z.strictObject({
    massPerMetre: massPerMetre('Mass of a seam along its length: tape, overlap, weld'),
    count: count(
      'Meridional seams from nose to tail; gores have as many as gores and two sheets have two, whatever stands here',
      0,
      64,
    ),
  }),
  patches: z
    .array(
      z.strictObject({
        name: text('What it is'),
        mass: mass('Mass'),
        station: coordinate('Station'),
        clock: angle('Clock angle'),
      }),
    )
    .max(200)
    .meta({ description: 'Reinforcements, valves and labels on the skin' }),
});

export type HullShape = z.infer<typeof shapeSchema>;
export type ShapeKind = HullShape['kind'];
export type HullSpec = z.infer<typeof hullSchema>;
export const SHAPE_KINDS = shapeSchema.options.map((option) => option.shape.kind.value);
