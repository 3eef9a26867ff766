/** Where a thing sits on the hull. The kind says what it keeps when it is dragged or when the hull changes. */
import { z } from 'zod';
import { angle, coordinate, distance } from './quantities.ts';

const station = coordinate('Station, aft of the nose tip along the hull axis');

export const skinPlace = z
  .strictObject({
    kind: z.literal('skin'),
    station,
    clock: angle('Clock angle; 0 top, π/2 starboard, π keel'),
    standoff: coordinate('Outward from the skin, square to the axis; negative is inside'),
  })
  .meta({ description: 'On the skin at a station and a clock angle' });

export const keelPlace = z
  .strictObject({
    kind: z.literal('keel'),
    station,
    drop: distance('Below the keel line at that station'),
  })
  .meta({ description: 'Hanging below the keel' });

export const axisPlace = z
  .strictObject({ kind: z.literal('axis'), station })
  .meta({ description: 'On the hull axis' });

export const freePlace = z
  .strictObject({
    kind: z.literal('free'),
    x: coordinate('Station, aft of the nose tip'),
    y: coordinate('Side, + to starboard'),
    z: coordinate('Height above the hull axis'),
  })
  .meta({ description: 'Anywhere, by coordinates' });

export const placeSchema = z.discriminatedUnion('kind', [skinPlace, keelPlace, axisPlace, freePlace]);

export type Place = z.infer<typeof placeSchema>;
export type PlaceKind = Place['kind'];
export const PLACE_KINDS = ['skin', 'keel', 'axis', 'free'] as const satisfies readonly PlaceKind[];
