/**
 * The seed files: what the starter catalogue offers. SI throughout. Each entry says where its figures come from in
 * `source`: a standard, a maker, "computed" from what, "from memory", "common practice, no source", or invented.
 */
import { z } from 'zod';
import {
  arealDensity,
  distance,
  fraction,
  id,
  mass,
  massPerMetre,
  number,
  text,
} from '../craft/quantities.ts';
import { gasSchema, partSchema } from '../craft/schema.ts';
import { finSchema, thrusterSchema } from '../craft/thrustSchema.ts';

const source = z.string().min(1).max(600).meta({ description: 'Where the figures come from' });
const note = text('What to mind when choosing it', 600);
const name = z.string().min(1).max(200).meta({ description: 'What it is, without a maker' });
const thickness = number('m', 'Thickness', 1e-7, 0.01);

/** One layer of a film; a plain film has one. */
const layerSchema = z.strictObject({
  material: z.string().min(1).max(100).meta({ description: 'Material of the layer' }),
  thickness,
  density: number('kg/m³', 'Density of the layer', 10, 20_000),
});

/** Areal density is the sum of thickness × density over the layers; the seed file carries it for reading. */
export const filmEntrySchema = z.strictObject({
  id: id('Id of the film'),
  name,
  layers: z.array(layerSchema).min(1).max(10).meta({ description: 'Layers, outside in' }),
  thickness,
  arealDensity: arealDensity('Areal density'),
  arealDensityTolerance: arealDensity('Half-width of the band in which the areal density lies'),
  strength: number('N/m', 'Pull per width at which it breaks', 0, 1e6).optional(),
  note,
  source,
});

export const gasEntrySchema = z.strictObject({
  id: id('Id of the gas'),
  name,
  lifting: gasSchema.shape.lifting,
  purity: fraction('Share of lifting gas by volume; the rest is air'),
  note,
  source,
});

export const conductorEntrySchema = z.strictObject({
  id: id('Id of the conductor'),
  name,
  material: z.enum(['copper', 'copper-clad aluminium', 'aluminium']).meta({ description: 'Metal' }),
  covering: z.enum(['bare', 'enamelled', 'insulated']).meta({ description: 'What is round the metal' }),
  gauge: z.int().min(0).max(50).meta({ description: 'AWG number', unit: '1' }),
  diameter: distance('Diameter of the metal, or of a solid wire of the same section'),
  overallDiameter: distance('Diameter over the covering'),
  massPerMetre: massPerMetre('Mass of one conductor along its length, covering included'),
  resistancePerMetre: number('Ω/m', 'Resistance of one conductor at 20 °C', 0, 1000),
  note,
  source,
});

/** Which way it points is for the craft to say. */
const thrusterFiguresSchema = thrusterSchema
  .omit({ yaw: true, pitch: true, differential: true })
  .meta({ description: 'What it does as a thruster' });

export const partEntrySchema = z.strictObject({
  id: id('Id of the entry'),
  name,
  kind: partSchema.shape.kind,
  mass: mass('Mass of one piece'),
  massTolerance: mass('Half-width of the band in which the mass of one piece lies'),
  size: partSchema.shape.size,
  thruster: thrusterFiguresSchema.optional(),
  fin: finSchema.optional(),
  note,
  source,
});

export type FilmEntry = z.infer<typeof filmEntrySchema>;
export type GasEntry = z.infer<typeof gasEntrySchema>;
export type ConductorEntry = z.infer<typeof conductorEntrySchema>;
export type PartEntry = z.infer<typeof partEntrySchema>;
