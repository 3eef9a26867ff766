/** The columns of the hardpoints. */
import type { Hardpoint } from '../../craft/schema.ts';
import { stationOf, withStation } from '../../craft/station.ts';
import { setHardpoint, setLeadAt } from '../../edit/edits/hardpoints.ts';
import { formatQuantity } from '../../units/format.ts';
import { QuantityField } from '../fields/QuantityField.tsx';
import { TextField } from '../fields/TextField.tsx';
import { HARDPOINT_PLAN_COLUMNS } from '../plan/hardpointPlanColumns.tsx';
import { PLACE_WORDS } from '../words.ts';
import type { GridColumn, GridItem } from './gridColumn.ts';

export interface HardpointRow extends GridItem {
  readonly hardpoint: Hardpoint;
  /** Whether the lead is worked out here. */
  readonly lead: boolean;
}

export const HARDPOINT_GRID: readonly GridColumn<HardpointRow>[] = [
  {
    key: 'name',
    title: 'Name',
    width: 17,
    sortBy: ({ hardpoint }) => hardpoint.name,
    text: ({ hardpoint }) => hardpoint.name,
    field: ({ row, commit, startWith, onLeave }) => (
      <TextField
        bare
        autoFocus
        label={`Name of ${row.name}`}
        value={row.hardpoint.name}
        startWith={startWith}
        onCommit={(name) => commit(setHardpoint(row.hardpoint, 'name', { name }))}
        onLeave={onLeave}
      />
    ),
  },
  {
    key: 'place',
    title: 'Place',
    width: 9.5,
    sortBy: ({ hardpoint }) => PLACE_WORDS[hardpoint.place.kind],
    text: ({ hardpoint }) => PLACE_WORDS[hardpoint.place.kind],
  },
  {
    key: 'station',
    title: 'Station',
    width: 7,
    numeric: true,
    sortBy: ({ hardpoint }) => stationOf(hardpoint.place),
    text: ({ hardpoint }, units) => formatQuantity(stationOf(hardpoint.place), 'length', units),
    field: ({ row, units, commit, startWith, onLeave }) => (
      <QuantityField
        bare
        autoFocus
        label={`Station of ${row.name}`}
        value={stationOf(row.hardpoint.place)}
        quantity="length"
        units={units}
        startWith={startWith}
        onCommit={(station, run) =>
          commit(
            setHardpoint(row.hardpoint, 'station', { place: withStation(row.hardpoint.place, station) }),
            run,
          )
        }
        onLeave={onLeave}
      />
    ),
  },
  ...HARDPOINT_PLAN_COLUMNS,
  {
    key: 'lead',
    title: 'Lead',
    width: 9,
    sortBy: ({ lead }) => (lead ? 0 : 1),
    text: () => 'Lead',
    press: {
      label: ({ name }) => `Lead at ${name}`,
      pressed: ({ lead }) => lead,
      run: ({ id }, commit) => {
        commit(setLeadAt(id));
      },
    },
  },
];
