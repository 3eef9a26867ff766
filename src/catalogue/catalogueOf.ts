/** The gate of the catalogue: seed data becomes a catalogue, or a list of problems. Never throws. */
import { z } from 'zod';
import { problemsOf } from '../craft/parse.ts';
import type { Problem } from '../craft/problem.ts';
import { repeats } from '../craft/references.ts';
import {
  type ConductorEntry,
  conductorEntrySchema,
  type FilmEntry,
  filmEntrySchema,
  type GasEntry,
  gasEntrySchema,
  type PartEntry,
  partEntrySchema,
} from './schema.ts';

export interface Catalogue {
  readonly films: readonly FilmEntry[];
  readonly gases: readonly GasEntry[];
  readonly conductors: readonly ConductorEntry[];
  readonly parts: readonly PartEntry[];
}

export type CatalogueOutcome =
  | { readonly ok: true; readonly catalogue: Catalogue }
  | { readonly ok: false; readonly problems: readonly Problem[] };

const catalogueSchema = z.strictObject({
  films: z.array(filmEntrySchema),
  gases: z.array(gasEntrySchema),
  conductors: z.array(conductorEntrySchema),
  parts: z.array(partEntrySchema),
});

/** A catalogue from the lists of the four seed files, as JSON.parse gives them. */
export function catalogueOf(data: unknown): CatalogueOutcome {
  const checked = catalogueSchema.safeParse(data);
  if (!checked.success) {
    return { ok: false, problems: checked.error.issues.flatMap((issue) => problemsOf(issue, data)) };
  }
  const catalogue = checked.data;
  const problems = LISTS.flatMap((list) => repeats(list, catalogue[list]));
  return problems.length > 0 ? { ok: false, problems } : { ok: true, catalogue };
}

const LISTS = ['films', 'gases', 'conductors', 'parts'] as const;
