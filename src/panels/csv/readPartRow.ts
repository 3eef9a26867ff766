/** One row of a table of parts. */
import { finOfBox } from '../../craft/firstFigures.ts';
import { problemsOf } from '../../craft/parse.ts';
import { PLACE_KINDS, type Place } from '../../craft/placeSchema.ts';
import { foundText } from '../../craft/problem.ts';
import { MASS_SOURCES, PART_KINDS, partSchema } from '../../craft/schema.ts';
import { stationOf } from '../../craft/station.ts';
import type { PartFields } from '../../edit/edits/parts.ts';
import type { UnitSystem } from '../../units/units.ts';
import { blankPart } from '../defaults.ts';
import { allowedText, type Read } from '../fields/entry.ts';
import { PART_WORDS, PLACE_WORDS, SOURCE_WORDS } from '../words.ts';
import { type ColumnKey, columnOf } from './columns.ts';
import { readCopies } from './copiesText.ts';
import type { Head } from './heads.ts';
import { readCell } from './quantityCell.ts';
import { cellText } from './table.ts';

export interface Fault {
  readonly column: string;
  readonly found: string;
  readonly allowed: string;
}

export interface PartRowReading {
  /** Null when any cell is at fault. */
  readonly part: PartFields | null;
  readonly faults: readonly Fault[];
}

export function readPartRow(
  cells: readonly string[],
  heads: readonly (Head | null)[],
  units: UnitSystem,
  home: Place,
): PartRowReading {
  const row = new Row(cells, heads, units);
  const fields = fieldsOf(row, home);
  const faults = [...row.faults, ...surplusFaults(cells, heads)];
  const all = faults.length > 0 ? faults : gateFaults(row, fields, units);
  return { part: all.length > 0 ? null : fields, faults: all };
}

function fieldsOf(row: Row, home: Place): PartFields {
  const blank = blankPart(home);
  const kind = row.oneOf('kind', PART_KINDS, PART_WORDS) ?? blank.kind;
  const size = {
    length: row.quantity('sizeLength') ?? blank.size.length,
    width: row.quantity('sizeWidth') ?? blank.size.width,
    height: row.quantity('sizeHeight') ?? blank.size.height,
  };
  return {
    kind,
    name: cellText(row.text('name')),
    mass: row.needed('mass'),
    massTolerance: row.quantity('massTolerance') ?? blank.massTolerance,
    massSource: row.oneOf('massSource', MASS_SOURCES, SOURCE_WORDS) ?? blank.massSource,
    place: placeOf(row, home),
    copies: row.read('copies', readCopies) ?? blank.copies,
    size,
    cgOffset: row.quantity('cgOffset') ?? blank.cgOffset,
    locked: row.read('locked', readYes) ?? blank.locked,
    slide: blank.slide,
    thruster: blank.thruster,
    fin: kind === 'fin' ? finOfBox(size) : blank.fin,
    dragArea: blank.dragArea,
    notes: cellText(row.text('notes')),
  };
}

/** Where no kind of place is named, the coordinates tell: side or height means free, a clock angle the skin, else the keel. */
function placeOf(row: Row, home: Place): Place {
  const station = row.quantity('station') ?? stationOf(home);
  const side = row.quantity('side');
  const height = row.quantity('height');
  const clock = row.quantity('clock');
  const guess = side !== null || height !== null ? 'free' : clock !== null ? 'skin' : 'keel';
  switch (row.oneOf('place', PLACE_KINDS, PLACE_WORDS) ?? guess) {
    case 'free':
      return { kind: 'free', x: station, y: side ?? 0, z: height ?? 0 };
    case 'skin':
      return { kind: 'skin', station, clock: clock ?? Math.PI, standoff: row.quantity('standoff') ?? 0 };
    case 'keel':
      return { kind: 'keel', station, drop: row.quantity('drop') ?? 0 };
    case 'axis':
      return { kind: 'axis', station };
  }
}

/** Cells of one row by column, and what is wrong with them. */
class Row {
  readonly faults: Fault[] = [];
  readonly #cells = new Map<ColumnKey, { readonly text: string; readonly head: Head }>();
  readonly #units: UnitSystem;

  constructor(cells: readonly string[], heads: readonly (Head | null)[], units: UnitSystem) {
    this.#units = units;
    heads.forEach((head, i) => {
      if (head) this.#cells.set(head.column.key, { text: cells[i] ?? '', head });
    });
  }

  /** The cell as it stands; '' when there is none. */
  text(key: ColumnKey): string {
    return this.#cells.get(key)?.text ?? '';
  }

  head(key: ColumnKey): string {
    return this.#cells.get(key)?.head.text ?? columnOf(key).head;
  }

  /** What the cell says; null when it is empty or at fault. */
  read<T>(key: ColumnKey, reader: (text: string) => Read<T>): T | null {
    const text = this.text(key);
    if (text === '') return null;
    const read = reader(text);
    if (read.ok) return read.value;
    this.faults.push({ column: this.head(key), found: `“${text}”`, allowed: allowedIn(read.message) });
    return null;
  }

  quantity(key: ColumnKey): number | null {
    const { quantity } = columnOf(key);
    const unit = this.#cells.get(key)?.head.unit ?? '';
    return this.read(key, (text) => readCell(text, unit, quantity!, this.#units));
  }

  needed(key: ColumnKey): number {
    if (this.text(key) === '') {
      this.faults.push({ column: this.head(key), found: 'nothing', allowed: `a ${columnOf(key).head}` });
    }
    return this.quantity(key) ?? 0;
  }

  /** One of the keys, or the word for it, in any case. */
  oneOf<T extends string>(key: ColumnKey, keys: readonly T[], words: Readonly<Record<T, string>>): T | null {
    return this.read(key, (text) => {
      const plain = text.toLowerCase();
      const value = keys.find((each) => each === plain || words[each].toLowerCase() === plain);
      return value ? { ok: true, value } : { ok: false, message: `Allowed: one of ${keys.join(', ')}.` };
    });
  }
}

/** The part of a message that says what is allowed; a table shows what was found in a column of its own. */
const allowedIn = (message: string): string =>
  message.replace(/^.*?(?:[Aa]llowed: |Enter )/, '').replace(/\.$/, '');

function readYes(text: string): Read<boolean> {
  const plain = text.toLowerCase();
  if (['yes', 'y', 'true', '1', 'x'].includes(plain)) return { ok: true, value: true };
  if (['no', 'n', 'false', '0'].includes(plain)) return { ok: true, value: false };
  return { ok: false, message: 'Allowed: yes or no.' };
}

const surplusFaults = (cells: readonly string[], heads: readonly (Head | null)[]): Fault[] =>
  cells.slice(heads.length).flatMap((cell, i) =>
    cell === ''
      ? []
      : [
          {
            column: `column ${heads.length + i + 1}`,
            found: foundText(cell),
            allowed: 'nothing past the last head',
          },
        ],
  );

/** Path in a part → column of the table. */
const COLUMN_BY_PATH: Readonly<Record<string, ColumnKey>> = {
  'place.station': 'station',
  'place.x': 'station',
  'place.y': 'side',
  'place.z': 'height',
  'place.clock': 'clock',
  'place.standoff': 'standoff',
  'place.drop': 'drop',
  'copies.count': 'copies',
  'size.length': 'sizeLength',
  'size.width': 'sizeWidth',
  'size.height': 'sizeHeight',
};

/** What the loading gate would not take: a mass below nothing, a station beyond its range. */
function gateFaults(row: Row, fields: PartFields, units: UnitSystem): Fault[] {
  const part = { id: 'part', ...fields };
  const checked = partSchema.safeParse(part);
  if (checked.success) return [];
  return checked.error.issues
    .flatMap((issue) => problemsOf(issue, part))
    .map(({ path, found, allowed }) => {
      const key = COLUMN_BY_PATH[path] ?? (path as ColumnKey);
      const text = row.text(key);
      const quantity = columnOf(key).quantity ?? null;
      return {
        column: row.head(key),
        found: text ? `“${text.slice(0, 40)}”` : found,
        allowed: allowedText(allowed, quantity, units),
      };
    });
}
