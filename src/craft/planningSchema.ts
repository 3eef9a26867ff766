/** What the ballast plan chooses from: slides, pieces of lead, useful loads and where each may go, and what is wished for. */
import { z } from 'zod';
import { placeSchema } from './placeSchema.ts';
import * as q from './quantities.ts';

export const slideSchema = z.strictObject({
  from: q.coordinate('Foremost station'),
  to: q.coordinate('Aftmost station, not before the foremost'),
});

export const fillSchema = z.enum(['continuous', 'pieces']).meta({
  description: 'Whether ballast there may be cut to any mass, or comes in the pieces at hand',
});

export const pieceSchema = z.strictObject({
  mass: q.number('kg', 'Mass of one piece', 1e-5, q.LIMITS.mass),
  count: q.count('How many there are', 0, q.LIMITS.leadPieces),
});

export const loadOptionSchema = z.discriminatedUnion('kind', [
  z
    .strictObject({ kind: z.literal('hardpoint'), hardpoint: q.id('Id of the hardpoint it may hang at') })
    .meta({ description: 'At a hardpoint' }),
  z
    .strictObject({
      kind: z.literal('slide'),
      place: placeSchema.meta({ description: 'Kind of place; its station is where the load first goes' }),
      ...slideSchema.shape,
    })
    .meta({ description: 'Anywhere on a stretch along that kind of place' }),
]);

export const loadSchema = z.strictObject({
  id: q.id('Id of the load; the part that stands for it aboard has the same'),
  name: q.text('Name of the load'),
  mass: q.mass('Mass'),
  massTolerance: q.mass('Half-width of the band in which the mass lies'),
  must: z.boolean().meta({ description: 'Whether it has to be carried' }),
  rank: q.count('Rank among the loads that may be carried; 1 is wanted most', 1, 99),
  options: z
    .array(loadOptionSchema)
    .max(q.LIMITS.places)
    .meta({ description: 'Where it may go; nowhere yet when empty' }),
});

export const WISHES = ['usefulLoad', 'fewestMoved', 'leastWire'] as const;

export type Slide = z.infer<typeof slideSchema>;
export type Fill = z.infer<typeof fillSchema>;
export type LeadPiece = z.infer<typeof pieceSchema>;
export type LoadOption = z.infer<typeof loadOptionSchema>;
export type Load = z.infer<typeof loadSchema>;
export type Wish = (typeof WISHES)[number];
