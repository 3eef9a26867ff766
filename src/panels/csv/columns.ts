/** The columns of a table of parts: how each is headed, and which quantity stands in it. */
import type { Part } from '../../craft/schema.ts';
import { stationOf } from '../../craft/station.ts';
import type { Quantity, UnitSystem } from '../../units/units.ts';
import { copiesText } from './copiesText.ts';
import { writeAngle, writeCell } from './quantityCell.ts';
import { textCell } from './table.ts';

export interface PartColumn {
  readonly key: ColumnKey;
  /** As Steelyard writes it, without the unit. */
  readonly head: string;
  /** What else people call it. */
  readonly also: readonly string[];
  /** That of the same column or field on screen, so that a bare number means the same here and there. Absent for words. */
  readonly quantity?: Quantity;
  write(part: Part, units: UnitSystem): string;
}

export type ColumnKey =
  | 'name'
  | 'kind'
  | 'mass'
  | 'massTolerance'
  | 'massSource'
  | 'place'
  | 'station'
  | 'clock'
  | 'standoff'
  | 'drop'
  | 'side'
  | 'height'
  | 'copies'
  | 'sizeLength'
  | 'sizeWidth'
  | 'sizeHeight'
  | 'cgOffset'
  | 'locked'
  | 'notes';

const words = (
  key: ColumnKey,
  head: string,
  also: readonly string[],
  text: (part: Part) => string,
): PartColumn => ({ key, head, also, write: (part) => textCell(text(part)) });

const figure = (
  key: ColumnKey,
  head: string,
  also: readonly string[],
  quantity: Quantity,
  value: (part: Part) => number | null,
): PartColumn => ({
  key,
  head,
  also,
  quantity,
  write: (part, units) => {
    const si = value(part);
    if (si === null) return '';
    return quantity === 'angle' ? writeAngle(si, units) : writeCell(si, quantity, units);
  },
});

export const PART_COLUMNS: readonly PartColumn[] = [
  words('name', 'name', ['part', 'part name', 'item', 'component', 'description'], ({ name }) => name),
  words('kind', 'kind', ['type'], ({ kind }) => kind),
  figure('mass', 'mass', ['weight'], 'mass', ({ mass }) => mass),
  figure(
    'massTolerance',
    '±',
    ['+/-', '+-', 'tolerance', 'mass tolerance'],
    'mass',
    (part) => part.massTolerance,
  ),
  words('massSource', 'source', [], ({ massSource }) => massSource),
  words('place', 'place', [], ({ place }) => place.kind),
  figure('station', 'station', ['position', 'x'], 'length', ({ place }) => stationOf(place)),
  figure('clock', 'clock angle', ['clock'], 'angle', ({ place }) =>
    place.kind === 'skin' ? place.clock : null,
  ),
  figure('standoff', 'stand-off', ['standoff'], 'smallLength', ({ place }) =>
    place.kind === 'skin' ? place.standoff : null,
  ),
  figure('drop', 'drop', [], 'smallLength', ({ place }) => (place.kind === 'keel' ? place.drop : null)),
  figure('side', 'side', ['y'], 'length', ({ place }) => (place.kind === 'free' ? place.y : null)),
  figure('height', 'height', ['z'], 'length', ({ place }) => (place.kind === 'free' ? place.z : null)),
  words('copies', 'copies', ['count', 'pieces', 'quantity', 'qty'], ({ copies }) => copiesText(copies)),
  figure('sizeLength', 'size length', ['length'], 'smallLength', ({ size }) => size.length),
  figure('sizeWidth', 'size width', ['width'], 'smallLength', ({ size }) => size.width),
  figure('sizeHeight', 'size height', [], 'smallLength', ({ size }) => size.height),
  figure('cgOffset', 'cg offset', [], 'smallLength', ({ cgOffset }) => cgOffset),
  words('locked', 'locked', ['lock'], ({ locked }) => (locked ? 'yes' : 'no')),
  words('notes', 'notes', ['note', 'remark', 'remarks'], ({ notes }) => notes),
];

export const columnOf = (key: ColumnKey): PartColumn => PART_COLUMNS.find((column) => column.key === key)!;
