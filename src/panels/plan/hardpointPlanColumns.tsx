/** The columns of the hardpoints that the plan reads: how much each holds, and how lead comes there. */
import type { Fill } from '../../craft/planningSchema.ts';
import { setHardpoint } from '../../edit/edits/hardpoints.ts';
import { formatQuantity } from '../../units/format.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import type { GridColumn } from '../ledger/gridColumn.ts';
import type { HardpointRow } from '../ledger/hardpointColumns.tsx';
import { FILL_CHOICES, FILL_WORDS } from './fillWords.ts';

export const HARDPOINT_PLAN_COLUMNS: readonly GridColumn<HardpointRow>[] = [
  {
    key: 'limit',
    title: 'Holds at most',
    width: 8,
    numeric: true,
    sortBy: ({ hardpoint }) => hardpoint.limit,
    text: ({ hardpoint }, units) => formatQuantity(hardpoint.limit, 'mass', units),
    field: ({ row, units, commit, startWith, onLeave }) => (
      <QuantityField
        bare
        autoFocus
        label={`Greatest mass at ${row.name}`}
        value={row.hardpoint.limit}
        quantity="mass"
        units={units}
        startWith={startWith}
        onCommit={(limit, run) => commit(setHardpoint(row.hardpoint, 'limit', { limit }), run)}
        onLeave={onLeave}
      />
    ),
  },
  {
    key: 'fill',
    title: 'Lead comes',
    width: 9.5,
    sortBy: ({ hardpoint }) => FILL_WORDS[hardpoint.fill],
    text: ({ hardpoint }) => FILL_WORDS[hardpoint.fill],
    field: ({ row, commit, onLeave }) => (
      <ChoiceField<Fill>
        bare
        autoFocus
        label={`How lead comes at ${row.name}`}
        value={row.hardpoint.fill}
        choices={FILL_CHOICES}
        onCommit={(fill) => commit(setHardpoint(row.hardpoint, 'fill', { fill }))}
        onLeave={onLeave}
      />
    ),
  },
];
