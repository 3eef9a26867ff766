/** A craft as the text of a craft file: fields in the schema's order, lists in the builder's order. */
import { type Craft, listed } from './craft.ts';
import { type CraftFile, craftFileSchema, VERSION } from './schema.ts';

/** The file a craft stands for. */
export const fileOf = (craft: Craft): CraftFile => ({
  ...craft,
  steelyard: VERSION,
  parts: listed(craft.parts),
  wires: listed(craft.wires),
  hardpoints: listed(craft.hardpoints),
  loads: listed(craft.loads),
});

/** The same craft always gives the same bytes, whatever was edited and undone before. */
export const serialize = (craft: Craft): string =>
  `${JSON.stringify(craftFileSchema.parse(fileOf(craft)), null, 2)}\n`;
