/**
 * What moves and steadies a craft: thrusters, fins, and the drag of what hangs outside.
 *
 * Thrust points forward along the hull axis, turned by vectoring: in yaw + to starboard, in pitch + up. A thruster of
 * several pieces has these figures for each piece; the pieces of a pair turn alike.
 */
import { z } from 'zod';
import * as q from './quantities.ts';

export const vectoringSchema = z
  .strictObject({
    least: q.number('rad', 'Smallest angle it can be turned to', -Math.PI, Math.PI),
    most: q.number('rad', 'Greatest angle it can be turned to', -Math.PI, Math.PI),
    set: q.number('rad', 'Angle it is turned to now, within the two', -Math.PI, Math.PI),
    slew: q.number('rad/s', 'How fast it turns', 0, 100),
  })
  .meta({
    description: 'Thrust turned off the axis; it does not turn when smallest and greatest angle are one',
  });

export const thrustSchema = z.discriminatedUnion('kind', [
  z
    .strictObject({
      kind: z.literal('measured'),
      staticThrust: q.number('N', 'Thrust at rest at full throttle, measured at the bench', 0, 1000),
    })
    .meta({ description: 'Measured at the bench' }),
  z
    .strictObject({
      kind: z.literal('power'),
      shaftPower: q.number('W', 'Power at the propeller shaft at full throttle', 0, 20_000),
      figureOfMerit: q.ratio('Ideal power over shaft power at rest', 0.05, 1),
    })
    .meta({ description: 'From shaft power and propeller diameter by momentum theory' }),
]);

export const pitchSpeedSchema = z.discriminatedUnion('kind', [
  z
    .strictObject({
      kind: z.literal('given'),
      speed: q.number('m/s', 'Speed of advance at which thrust is nil at full throttle', 0.1, 200),
    })
    .meta({ description: 'Given' }),
  z
    .strictObject({
      kind: z.literal('turning'),
      motorSpeed: q.number('rad/s', 'Motor speed at full throttle', 1, 20_000),
      gearRatio: q.ratio('Motor turns for one turn of the propeller', 0.05, 50),
      pitch: q.number('m', 'Pitch of the propeller: advance in one turn', 0.001, 5),
    })
    .meta({ description: 'From motor speed, gear ratio and propeller pitch' }),
]);

export const thrusterSchema = z.strictObject({
  thrust: thrustSchema,
  diameter: q.number('m', 'Diameter of the propeller', 0.005, 10),
  pitchSpeed: pitchSpeedSchema,
  reverse: q.fraction('Thrust backwards at most, as a share of that forwards'),
  yaw: vectoringSchema,
  pitch: vectoringSchema,
  differential: z
    .boolean()
    .meta({ description: 'Whether the pieces of a pair are throttled apart to turn the craft' }),
});

export const finSchema = z.strictObject({
  area: q.number('m²', 'Outline area of one fin, outside the hull', 0, 100),
  aspectRatio: q.ratio('Span squared over area', 0.05, 20),
});

export type Vectoring = z.infer<typeof vectoringSchema>;
export type Thrust = z.infer<typeof thrustSchema>;
export type PitchSpeed = z.infer<typeof pitchSpeedSchema>;
export type ThrusterData = z.infer<typeof thrusterSchema>;
export type FinData = z.infer<typeof finSchema>;
