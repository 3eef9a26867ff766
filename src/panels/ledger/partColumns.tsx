/** The columns of the parts. */
import type { PlaceKind } from '../../craft/placeSchema.ts';
import type { Problem } from '../../craft/problem.ts';
import type { MassSource, Part, PartKind } from '../../craft/schema.ts';
import { stationOf, withStation } from '../../craft/station.ts';
import { type PartFields, setPart } from '../../edit/edits/parts.ts';
import { placeChosen } from '../../report/placeAs.ts';
import { formatQuantity } from '../../units/format.ts';
import { copiesText, readCopies } from '../csv/copiesText.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { TextField } from '../fields/TextField.tsx';
import {
  type Choice,
  PART_CHOICES,
  PART_WORDS,
  PLACE_CHOICES,
  PLACE_WORDS,
  SOURCE_CHOICES,
  SOURCE_WORDS,
} from '../words.ts';
import type { CellProps, GridColumn, GridItem } from './gridColumn.ts';

export interface PartRow extends GridItem {
  readonly part: Part;
  /** About the CB, kg·m, of all pieces; null while the hull cannot be formed. */
  readonly moment: number | null;
}

type Cell = CellProps<PartRow>;

const set = (
  { row, commit }: Cell,
  field: string,
  change: Partial<PartFields>,
  run?: string,
): Problem | null => commit(setPart(row.part, field, change), run);

const choiceCell =
  <T extends string>(
    label: string,
    choices: readonly Choice<T>[],
    value: (part: Part) => T,
    change: (value: T) => Partial<PartFields>,
  ) =>
  (cell: Cell) => (
    <ChoiceField
      bare
      autoFocus
      label={`${label} of ${cell.row.name}`}
      value={value(cell.row.part)}
      choices={choices}
      onCommit={(next) => set(cell, label.toLowerCase(), change(next))}
      onLeave={cell.onLeave}
    />
  );

const massCell = (label: string, key: 'mass' | 'massTolerance') => (cell: Cell) => (
  <QuantityField
    bare
    autoFocus
    label={`${label} of ${cell.row.name}`}
    value={cell.row.part[key]}
    quantity="mass"
    units={cell.units}
    startWith={cell.startWith}
    onCommit={(next, run) => set(cell, label.toLowerCase(), { [key]: next }, run)}
    onLeave={cell.onLeave}
  />
);

function NameCell(cell: Cell) {
  return (
    <TextField
      bare
      autoFocus
      label={`Name of ${cell.row.name}`}
      value={cell.row.part.name}
      startWith={cell.startWith}
      onCommit={(name) => set(cell, 'name', { name })}
      onLeave={cell.onLeave}
    />
  );
}

/** Another kind of place at the same point, or out on the skin. */
function PlaceCell(cell: Cell) {
  const { geometry } = useEditor().assessment;
  const { part } = cell.row;
  const choose = (kind: PlaceKind): Problem | null => {
    const piece = geometry.status === 'solved' && geometry.pieces.find((each) => each.part === part.id);
    return piece
      ? set(cell, 'kind of place', { place: placeChosen(kind, piece.middle, geometry.hull) })
      : { path: '', found: kind, allowed: 'a change of place once the hull can be formed' };
  };
  return (
    <ChoiceField
      bare
      autoFocus
      label={`Place of ${cell.row.name}`}
      value={part.place.kind}
      choices={PLACE_CHOICES}
      onCommit={choose}
      onLeave={cell.onLeave}
    />
  );
}

function StationCell(cell: Cell) {
  const { place } = cell.row.part;
  return (
    <QuantityField
      bare
      autoFocus
      label={`Station of ${cell.row.name}`}
      value={stationOf(place)}
      quantity="length"
      units={cell.units}
      startWith={cell.startWith}
      onCommit={(station, run) => set(cell, 'station', { place: withStation(place, station) }, run)}
      onLeave={cell.onLeave}
    />
  );
}

function CopiesCell(cell: Cell) {
  const commit = (text: string): Problem | null => {
    const read = readCopies(text);
    return read.ok
      ? set(cell, 'copies', { copies: read.value })
      : { path: 'copies', found: text, allowed: 'a whole number, pair, or ring and a whole number' };
  };
  return (
    <TextField
      bare
      autoFocus
      label={`Copies of ${cell.row.name}`}
      value={copiesText(cell.row.part.copies)}
      startWith={cell.startWith}
      onCommit={commit}
      onLeave={cell.onLeave}
    />
  );
}

export const PART_GRID: readonly GridColumn<PartRow>[] = [
  {
    key: 'name',
    title: 'Name',
    width: 11.5,
    sortBy: ({ part }) => part.name,
    text: ({ part }) => part.name,
    field: (cell) => <NameCell {...cell} />,
  },
  {
    key: 'kind',
    title: 'Kind',
    width: 8.2,
    yields: 3,
    sortBy: ({ part }) => PART_WORDS[part.kind],
    text: ({ part }) => PART_WORDS[part.kind],
    field: choiceCell<PartKind>(
      'Kind',
      PART_CHOICES,
      (part) => part.kind,
      (kind) => ({ kind }),
    ),
  },
  {
    key: 'mass',
    title: 'Mass',
    width: 6,
    numeric: true,
    sortBy: ({ part }) => part.mass,
    text: ({ part }, units) => formatQuantity(part.mass, 'mass', units),
    field: massCell('Mass', 'mass'),
  },
  {
    key: 'tolerance',
    title: '±',
    width: 4.8,
    numeric: true,
    sortBy: ({ part }) => part.massTolerance,
    text: ({ part }, units) =>
      part.massTolerance > 0 ? formatQuantity(part.massTolerance, 'mass', units) : '',
    field: massCell('Mass tolerance', 'massTolerance'),
  },
  {
    key: 'source',
    title: 'Source',
    width: 7.6,
    yields: 1,
    sortBy: ({ part }) => SOURCE_WORDS[part.massSource],
    text: ({ part }) => SOURCE_WORDS[part.massSource],
    field: choiceCell<MassSource>(
      'Source',
      SOURCE_CHOICES,
      (part) => part.massSource,
      (massSource) => ({ massSource }),
    ),
  },
  {
    key: 'place',
    title: 'Place',
    width: 8.9,
    sortBy: ({ part }) => PLACE_WORDS[part.place.kind],
    text: ({ part }) => PLACE_WORDS[part.place.kind],
    field: (cell) => <PlaceCell {...cell} />,
  },
  {
    key: 'station',
    title: 'Station',
    width: 6.1,
    numeric: true,
    sortBy: ({ part }) => stationOf(part.place),
    text: ({ part }, units) => formatQuantity(stationOf(part.place), 'length', units),
    field: (cell) => <StationCell {...cell} />,
  },
  {
    key: 'copies',
    title: 'Copies',
    width: 5.4,
    yields: 2,
    sortBy: ({ part }) => copiesText(part.copies),
    text: ({ part }) => copiesText(part.copies),
    field: (cell) => <CopiesCell {...cell} />,
  },
  {
    key: 'moment',
    title: 'Moment',
    width: 8.8,
    numeric: true,
    sortBy: ({ moment }) => moment ?? 0,
    text: ({ moment }, units) => (moment === null ? '–' : formatQuantity(moment, 'momentMass', units)),
  },
  {
    key: 'locked',
    title: 'Lock',
    width: 5,
    sortBy: ({ part }) => (part.locked ? 0 : 1),
    text: () => 'Lock',
    press: {
      label: ({ name }) => `Lock ${name}`,
      pressed: ({ part }) => part.locked,
      run: ({ part }, commit) => {
        commit(setPart(part, 'lock', { locked: !part.locked }));
      },
    },
  },
];
