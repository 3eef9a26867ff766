/**
 * The published JSON Schema of the craft file, made from the same zod schema that the loading gate uses. It says what
 * a file's fields, types, ranges and units are; it cannot say that ids stand once and that what is named exists, which
 * `references.ts` checks.
 */
import { z } from 'zod';
import { craftFileSchema } from './schema.ts';

/** JSON Schema, draft 2020-12. Numbers carry `unit`, an annotation of our own. */
export const craftJsonSchema = (): Record<string, unknown> => ({ ...z.toJSONSchema(craftFileSchema) });

/** As it stands in `craft.schema.json`. */
export const craftJsonSchemaText = (): string => `${JSON.stringify(craftJsonSchema(), null, 2)}\n`;
