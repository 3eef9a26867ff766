/** Parts as comma-separated text, units in the heads. */
import type { Part } from '../../craft/schema.ts';
import { type UnitSystem, unitOf } from '../../units/units.ts';
import { PART_COLUMNS, type PartColumn } from './columns.ts';
import { csvText } from './table.ts';

/** Numbers are written in full, angles to 1e-6°, so that `readParts` gives the same parts again. */
export const partsCsv = (parts: readonly Part[], units: UnitSystem): string =>
  csvText([
    PART_COLUMNS.map((column) => headOf(column, units)),
    ...parts.map((part) => PART_COLUMNS.map((column) => column.write(part, units))),
  ]);

const headOf = ({ head, quantity }: PartColumn, units: UnitSystem): string =>
  quantity ? `${head} ${unitOf(quantity, units).symbol}` : head;
