/**
 * The kinds of number a craft file holds. Each carries its unit in the schema, and the range within which the
 * loading gate takes it. SI throughout: metres, kilograms, radians, kelvins, pascals.
 */
import { z } from 'zod';

export const number = (unit: string, what: string, min: number, max: number) =>
  z
    .number()
    .min(min)
    .max(max)
    .meta({ description: `${what}, ${unit}`, unit });

/** Past these the program does not go: a hull under 5 cm or over 50 m is not a small blimp. */
export const LIMITS = {
  length: 50,
  mass: 1000,
  parts: 2000,
  wires: 1000,
  copies: 64,
  loads: 200,
  places: 20,
  leadSizes: 40,
  leadPieces: 1000,
  rows: 500,
  text: 20_000,
} as const;

export const size = (what: string, min = 0.01) => number('m', what, min, LIMITS.length);
export const distance = (what: string) => number('m', what, 0, LIMITS.length);
export const coordinate = (what: string) => number('m', what, -LIMITS.length, LIMITS.length);
export const mass = (what: string) => number('kg', what, 0, LIMITS.mass);
export const signedMass = (what: string) => number('kg', what, -LIMITS.mass, LIMITS.mass);
export const massPerMetre = (what: string) => number('kg/m', what, 0, 100);
export const arealDensity = (what: string) => number('kg/m²', what, 0, 10);
export const angle = (what: string) => number('rad', what, -2 * Math.PI, 2 * Math.PI);
export const tolerance = (what: string) => number('rad', what, 0, Math.PI / 2);
export const temperature = (what: string) => number('K', what, 200, 350);
export const pressure = (what: string) => number('Pa', what, 20_000, 120_000);
export const fraction = (what: string) => number('1', what, 0, 1);
export const ratio = (what: string, min: number, max: number) => number('1', what, min, max);

export const count = (what: string, min: number, max: number) =>
  z
    .int()
    .min(min)
    .max(max)
    .meta({ description: `${what}, a whole number`, unit: '1' });

export const text = (what: string, max = 200) => z.string().max(max).meta({ description: what });

/** Ids are short and plain so that they can be typed at a terminal and stand in a path. */
export const id = (what: string) =>
  z
    .string()
    .regex(/^[a-z][a-z0-9-]{0,47}$/)
    .meta({ description: `${what}: lower-case letters, digits and hyphens, starting with a letter` });
