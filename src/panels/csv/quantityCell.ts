/** Quantities in cells: the unit stands in the head of the column or in the cell itself. */
import { parseQuantity } from '../../units/entry.ts';
import { type Quantity, type UnitSystem, unitOf } from '../../units/units.ts';
import { type Read, readEntry } from '../fields/entry.ts';

/** Whether the text names a unit of the quantity. */
export const isUnit = (text: string, quantity: Quantity): boolean =>
  text !== '' && parseQuantity(`1 ${text}`, quantity, 'metric').ok;

/** The SI value; `unit` is that of the column, '' for the builder's own. */
export function readCell(text: string, unit: string, quantity: Quantity, units: UnitSystem): Read<number> {
  const withUnit = unit === '' ? null : readEntry(`${text} ${unit}`, quantity, units);
  return withUnit?.ok ? withUnit : readEntry(text, quantity, units);
}

/** The shortest number that reads back as the same SI value. */
export function writeCell(si: number, quantity: Quantity, units: UnitSystem): string {
  const shown = unitOf(quantity, units).toDisplay(si);
  const texts = [10, 12, 14, 15, 16, 17].map((digits) => String(Number(shown.toPrecision(digits))));
  return texts.find((text) => sameAs(si, readEntry(text, quantity, units))) ?? texts.at(-1)!;
}

/** To a millionth of a degree, which no hand can tell: 60 and not 60.00000000000001. */
export const writeAngle = (si: number, units: UnitSystem): string =>
  String(Number(unitOf('angle', units).toDisplay(si).toFixed(6)));

const sameAs = (si: number, read: Read<number>): boolean => read.ok && read.value === si;
