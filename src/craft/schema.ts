/**
 * The craft file: what Steelyard keeps of one craft. Versioned JSON, SI units, angles in radians.
 *
 * In the file, parts, wire runs and hardpoints are lists in the order the builder gave them; in memory they are keyed
 * by id with that order beside them (see `craft.ts`). `craft.schema.json` beside this file is emitted from here.
 */
import { z } from 'zod';
import { hullSchema } from './hullSchema.ts';
import { placeSchema } from './placeSchema.ts';
import { fillSchema, loadSchema, pieceSchema, slideSchema, WISHES } from './planningSchema.ts';
import * as q from './quantities.ts';
import { finSchema, thrusterSchema } from './thrustSchema.ts';

/** The version this program writes. Older ones step up in `versions.ts`. */
export const VERSION = 3;

export const PART_KINDS = [
  'thruster',
  'gondola',
  'battery',
  'fin',
  'controller',
  'servo',
  'camera',
  'sensor',
  'load',
  'ballast',
  'fitting',
] as const;

export const MASS_SOURCES = ['catalogue', 'estimated', 'weighed'] as const;

export const filmSchema = z.strictObject({
  name: q.text('Name of the film'),
  arealDensity: q.arealDensity('Areal density'),
  arealDensityTolerance: q.arealDensity('Half-width of the band in which the areal density lies'),
});

export const gasSchema = z.strictObject({
  lifting: z.enum(['helium', 'hydrogen']).meta({ description: 'The lifting gas' }),
  purity: q.fraction('Share of lifting gas by volume; the rest is air'),
  superheat: q.number('K', 'Gas warmer than the air', -50, 100),
  gaugePressure: q.number('Pa', 'Gas pressure above the air outside', 0, 20_000),
});

export const daySchema = z.discriminatedUnion('kind', [
  z
    .strictObject({
      kind: z.literal('measured'),
      temperature: q.temperature('Air temperature'),
      pressure: q.pressure('Station pressure'),
      humidity: q.fraction('Relative humidity'),
    })
    .meta({ description: 'A day given by a thermometer, barometer and hygrometer on the spot' }),
  z
    .strictObject({
      kind: z.literal('qnh'),
      temperature: q.temperature('Air temperature'),
      qnh: q.pressure('Pressure reduced to sea level, as an aerodrome gives it'),
      elevation: q.number('m', 'Elevation of the site above sea level', -500, 5000),
      humidity: q.fraction('Relative humidity'),
    })
    .meta({ description: 'A day given by QNH and elevation' }),
  z
    .strictObject({
      kind: z.literal('standard'),
      elevation: q.number('m', 'Elevation of the site above sea level', -500, 5000),
    })
    .meta({ description: 'The US Standard Atmosphere 1976 at an elevation' }),
]);

export const copiesSchema = z
  .discriminatedUnion('kind', [
    z.strictObject({
      kind: z.literal('together'),
      count: q.count('Pieces at the same place', 1, q.LIMITS.copies),
    }),
    z.strictObject({ kind: z.literal('pair') }),
    z.strictObject({ kind: z.literal('ring'), count: q.count('Pieces round the axis', 2, q.LIMITS.copies) }),
  ])
  .meta({
    description:
      'together: that many pieces at the place; pair: one there and one mirrored port–starboard; ring: evenly round the hull axis, the first at the place',
  });

export const partSchema = z.strictObject({
  id: q.id('Id of the part'),
  kind: z.enum(PART_KINDS).meta({ description: 'What the part is' }),
  name: q.text('Name of the part'),
  mass: q.mass('Mass of one piece'),
  massTolerance: q.mass('Half-width of the band in which the mass of one piece lies'),
  massSource: z.enum(MASS_SOURCES).meta({ description: 'Where the mass comes from' }),
  place: placeSchema,
  copies: copiesSchema,
  size: z
    .strictObject({
      length: q.distance('Along the hull axis'),
      width: q.distance('Athwart; for a part on the skin, along the girth'),
      height: q.distance('Upright; for a part on the skin, outward'),
    })
    .meta({ description: 'Outside dimensions of one piece' }),
  cgOffset: q.coordinate('CG of the piece aft of the middle of its length'),
  locked: z.boolean().meta({ description: 'Whether gestures and the ballast plan leave it where it is' }),
  slide: slideSchema.nullable().meta({
    description: 'The stretch along which the ballast plan may move it; null when it stays where it is',
  }),
  thruster: thrusterSchema.nullable().meta({
    description: 'What it does as a thruster, each piece; null when it is none or nothing is known of it',
  }),
  fin: finSchema.nullable().meta({ description: 'What it does as a fin, each piece; null when it is none' }),
  dragArea: q.number('m²', 'Drag of one piece over dynamic pressure', 0, 100).nullable().meta({
    description: 'Drag of one piece over dynamic pressure; null to have it reckoned from kind and size',
  }),
  notes: q.text('Notes', 4000),
});

export const wireEndSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('part'), part: q.id('Id of the part it is joined to') }),
  z.strictObject({ kind: z.literal('loose'), place: placeSchema }),
]);

export const wireSchema = z.strictObject({
  id: q.id('Id of the wire run'),
  name: q.text('Name of the wire run'),
  from: wireEndSchema,
  to: wireEndSchema,
  path: z
    .discriminatedUnion('kind', [
      z.strictObject({ kind: z.literal('skin'), clock: q.angle('Clock angle of the meridian it follows') }),
      z.strictObject({ kind: z.literal('straight') }),
    ])
    .meta({ description: 'Along the skin, or straight from end to end' }),
  massPerMetre: q.massPerMetre('Mass of one conductor along its length'),
  conductors: q.count('Conductors lying side by side', 1, q.LIMITS.copies),
  slack: q.ratio('Extra length as a share of the path', 0, 2),
  notes: q.text('Notes', 4000),
});

export const hardpointSchema = z.strictObject({
  id: q.id('Id of the hardpoint'),
  name: q.text('Name of the hardpoint'),
  place: placeSchema,
  limit: q.mass('Greatest mass that may hang there, ballast and loads together'),
  fill: fillSchema,
});

export const targetsSchema = z.strictObject({
  heaviness: z
    .strictObject({
      least: q.signedMass('Least static heaviness; negative is light'),
      most: q.signedMass('Greatest static heaviness; negative is light'),
    })
    .meta({
      description: 'Band of static heaviness (solid mass less gross lift) in which the craft is to fly',
    }),
  pitchTolerance: q.tolerance('Pitch either way that still counts as level'),
  heelTolerance: q.tolerance('Heel either way that still counts as even'),
  leastPendulumDepth: q.distance('Least height of CB above CG'),
  turnTime: q.number('s', 'Longest time for the first 90° of yaw from rest', 0.01, 3600).nullable().meta({
    description: 'Longest time for the first 90° of yaw from rest; null when none is asked for',
  }),
  sideGust: q.number('m/s', 'Side gust to be held', 0, 50).nullable().meta({
    description: 'Side gust that the thrusters have to hold at rest; null when none is asked for',
  }),
});

const listed = <T extends z.ZodType>(item: T, most: number, what: string) =>
  z.array(item).max(most).meta({ description: what });

export const craftFileSchema = z
  .strictObject({
    steelyard: z.literal(VERSION).meta({ description: 'Version of the craft file' }),
    name: q.text('Name of the craft'),
    notes: q.text('Notes', q.LIMITS.text),
    hull: hullSchema,
    film: filmSchema,
    gas: gasSchema,
    day: daySchema,
    parts: listed(partSchema, q.LIMITS.parts, 'Parts, in the builder’s order'),
    wires: listed(wireSchema, q.LIMITS.wires, 'Wire runs'),
    hardpoints: listed(hardpointSchema, 100, 'Places where ballast can be hung').min(1),
    pieces: listed(pieceSchema, q.LIMITS.leadSizes, 'Pieces of lead at hand, each mass once'),
    loads: listed(
      loadSchema,
      q.LIMITS.loads,
      'Useful loads that the ballast plan may take aboard; a load is aboard when a part has its id',
    ),
    leadAt: q.id('Id of the hardpoint on which the least lead is worked out'),
    support: placeSchema.nullable().meta({
      description:
        'The point that carries the static heaviness: the foot of a leg when heavy, the tie of a line when light; null when none is asked for',
    }),
    targets: targetsSchema,
    wishes: listed(
      z.enum(WISHES),
      WISHES.length,
      'What the ballast plan looks for after least dead ballast, first wish first, each at most once',
    ),
  })
  .meta({ title: 'Steelyard craft file', description: 'One craft; SI units, angles in radians' });

export type CraftFile = z.infer<typeof craftFileSchema>;
export type Film = z.infer<typeof filmSchema>;
export type Gas = z.infer<typeof gasSchema>;
export type Day = z.infer<typeof daySchema>;
export type Copies = z.infer<typeof copiesSchema>;
export type Part = z.infer<typeof partSchema>;
export type PartKind = Part['kind'];
export type MassSource = Part['massSource'];
export type WireEnd = z.infer<typeof wireEndSchema>;
export type WireRun = z.infer<typeof wireSchema>;
export type Hardpoint = z.infer<typeof hardpointSchema>;
export type Targets = z.infer<typeof targetsSchema>;
