/** The columns of the wire runs. Their ends are chosen in the inspector or dragged in the drawing. */
import type { Problem } from '../../craft/problem.ts';
import type { WireRun } from '../../craft/schema.ts';
import { setWire, type WireFields } from '../../edit/edits/wires.ts';
import { formatQuantity } from '../../units/format.ts';
import type { Quantity, UnitSystem } from '../../units/units.ts';
import { CountField } from '../fields/CountField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { TextField } from '../fields/TextField.tsx';
import type { CellProps, GridColumn, GridItem } from './gridColumn.ts';

export interface WireRow extends GridItem {
  readonly wire: WireRun;
  /** What its ends are joined to. */
  readonly from: string;
  readonly to: string;
  /** m, kg and kg·m about the CB; null while the hull cannot be formed. */
  readonly length: number | null;
  readonly mass: number | null;
  readonly moment: number | null;
}

type Cell = CellProps<WireRow>;

const set = (
  { row, commit }: Cell,
  field: string,
  change: Partial<WireFields>,
  run?: string,
): Problem | null => commit(setWire(row.wire, field, change), run);

const quantityCell = (label: string, key: 'massPerMetre' | 'slack', quantity: Quantity) => (cell: Cell) => (
  <QuantityField
    bare
    autoFocus
    label={`${label} of ${cell.row.name}`}
    value={cell.row.wire[key]}
    quantity={quantity}
    units={cell.units}
    startWith={cell.startWith}
    onCommit={(next, run) => set(cell, label.toLowerCase(), { [key]: next }, run)}
    onLeave={cell.onLeave}
  />
);

const shown = (value: number | null, quantity: Quantity, units: UnitSystem): string =>
  value === null ? '–' : formatQuantity(value, quantity, units);

/** A figure that follows from the run; for reading. */
const figure = (
  key: 'length' | 'mass' | 'moment',
  title: string,
  quantity: Quantity,
): GridColumn<WireRow> => ({
  key,
  title,
  width: 6.8,
  numeric: true,
  sortBy: (row) => row[key] ?? 0,
  text: (row, units) => shown(row[key], quantity, units),
});

const words = (key: 'from' | 'to', title: string): GridColumn<WireRow> => ({
  key,
  title,
  width: 8.5,
  sortBy: (row) => row[key],
  text: (row) => row[key],
});

export const WIRE_GRID: readonly GridColumn<WireRow>[] = [
  {
    key: 'name',
    title: 'Name',
    width: 10,
    sortBy: ({ wire }) => wire.name,
    text: ({ wire }) => wire.name,
    field: (cell) => (
      <TextField
        bare
        autoFocus
        label={`Name of ${cell.row.name}`}
        value={cell.row.wire.name}
        startWith={cell.startWith}
        onCommit={(name) => set(cell, 'name', { name })}
        onLeave={cell.onLeave}
      />
    ),
  },
  words('from', 'From'),
  words('to', 'To'),
  {
    key: 'path',
    title: 'Path',
    width: 8.5,
    yields: 2,
    sortBy: ({ wire }) => wire.path.kind,
    text: ({ wire: { path } }, units) =>
      path.kind === 'straight' ? 'Straight' : `Skin, ${formatQuantity(path.clock, 'angle', units)}`,
  },
  {
    key: 'massPerMetre',
    title: 'Per length',
    width: 7.6,
    yields: 3,
    numeric: true,
    sortBy: ({ wire }) => wire.massPerMetre,
    text: ({ wire }, units) => formatQuantity(wire.massPerMetre, 'massPerMetre', units),
    field: quantityCell('Mass per length', 'massPerMetre', 'massPerMetre'),
  },
  {
    key: 'conductors',
    title: 'Conductors',
    width: 6.4,
    yields: 1,
    numeric: true,
    sortBy: ({ wire }) => wire.conductors,
    text: ({ wire }) => String(wire.conductors),
    field: (cell) => (
      <CountField
        bare
        autoFocus
        label={`Conductors of ${cell.row.name}`}
        value={cell.row.wire.conductors}
        startWith={cell.startWith}
        onCommit={(conductors) => set(cell, 'conductors', { conductors })}
        onLeave={cell.onLeave}
      />
    ),
  },
  {
    key: 'slack',
    title: 'Slack',
    width: 5,
    numeric: true,
    sortBy: ({ wire }) => wire.slack,
    text: ({ wire }, units) => formatQuantity(wire.slack, 'fraction', units),
    field: quantityCell('Slack', 'slack', 'fraction'),
  },
  figure('length', 'Length', 'length'),
  figure('mass', 'Mass', 'mass'),
  figure('moment', 'Moment', 'momentMass'),
];
