/** Writes `src/craft/craft.schema.json` anew after a change of the craft file's schema: `npm run schema`. */
import { writeFileSync } from 'node:fs';
import { craftJsonSchemaText } from '../craft/jsonSchema.ts';

writeFileSync(new URL('../craft/craft.schema.json', import.meta.url), craftJsonSchemaText());
