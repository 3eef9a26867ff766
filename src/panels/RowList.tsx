/** A few rows of the report: name, figure, and what to mind. */
import type { Row } from '../report/row.ts';
import { rowText } from '../report/rowText.ts';
import type { UnitSystem } from '../units/units.ts';

export function RowList({ rows, units }: { rows: readonly (Row | undefined)[]; units: UnitSystem }) {
  return (
    <dl className="rows">{rows.map((row) => row && <RowEntry key={row.label} row={row} units={units} />)}</dl>
  );
}

function RowEntry({ row, units }: { row: Row; units: UnitSystem }) {
  return (
    <div className="row" data-status={row.status}>
      <dt>{row.label}</dt>
      <dd className="number">{rowText(row, units)}</dd>
      {row.status !== 'solved' && row.why && <dd className="row-why">{row.why}</dd>}
    </div>
  );
}
