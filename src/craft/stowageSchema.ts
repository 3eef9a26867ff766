/** A stowage that was put by, read again. It stands in no craft file, so that a program of another day may have written it. */
import { z } from 'zod';
import { placeSchema } from './placeSchema.ts';
import { pieceSchema, slideSchema } from './planningSchema.ts';
import type { Stowage } from './stowage.ts';

const stowageSchema: z.ZodType<Stowage> = z.strictObject({
  weights: z.array(z.strictObject({ hardpoint: z.string(), pieces: z.array(pieceSchema) })),
  slides: z.array(z.strictObject({ part: z.string(), to: slideSchema.shape.to })),
  loads: z.array(z.strictObject({ load: z.string(), place: placeSchema, slide: slideSchema.nullable() })),
});

/** Null for anything else. */
export const stowageFrom = (value: unknown): Stowage | null => stowageSchema.safeParse(value).data ?? null;
