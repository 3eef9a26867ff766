/** What each load of the list costs or saves in dead ballast, and the set that the exact plan takes. */
import type { Craft } from '../../craft/craft.ts';
import { stationOf } from '../../craft/station.ts';
import type { LoadRow } from '../../report/plans.ts';
import { formatQuantity } from '../../units/format.ts';
import type { UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { usePlanning } from './planning.ts';

export function CarryTableView() {
  const { craft } = useEditor();
  const { table, answer, workOutTable, stopTable } = usePlanning();
  if (craft.loads.order.length === 0) return null;
  const fresh = table.craft === craft;
  const best = answer && !('why' in answer.plan) && answer.craft === craft ? answer.plan : null;
  return (
    <>
      <button type="button" onClick={table.busy ? stopTable : workOutTable}>
        {table.busy ? 'Stop' : table.table ? 'Compare the loads again' : 'Compare the loads'}
      </button>
      {table.busy && <progress aria-label="Comparing the loads" />}
      {table.why && <p className="field-error">{table.why}</p>}
      {table.table && (
        <>
          <Table rows={table.table.rows} craft={craft} />
          {!fresh && <p className="aside">This is for the craft before the last change.</p>}
          {!table.table.complete && <p className="aside">It was stopped before the last load.</p>}
          {best && (
            <p>
              <strong>Best set by the exact plan:</strong> {setWords(craft, best.loads)}
            </p>
          )}
        </>
      )}
    </>
  );
}

function setWords(craft: Craft, loads: readonly { load: string; place: unknown }[]): string {
  const names = loads.filter(({ place }) => place !== null).map(({ load }) => nameOf(craft, load));
  return names.length > 0 ? `${names.join(', ')}.` : 'none of them.';
}

const nameOf = ({ loads }: Craft, id: string): string => loads.byId[id]?.name || 'Load without a name';

const HEADS = ['Load', 'Without', 'With', 'Saved', 'Station'];

function Table({ rows, craft }: { rows: readonly LoadRow[]; craft: Craft }) {
  const { units } = useEditor();
  return (
    <div className="plan-scroll">
      <table className="carry-table">
        <caption>Dead ballast with each load and without it</caption>
        <thead>
          <tr>
            {HEADS.map((head) => (
              <th scope="col" key={head}>
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((each) => (
            <tr key={each.load}>
              <th scope="row">{nameOf(craft, each.load)}</th>
              <td className="number">{massText(each.without, units)}</td>
              <td className="number">{massText(each.with, units)}</td>
              <td className="number">{each.saved === null ? '–' : massText(each.saved, units)}</td>
              <td className="number">
                {each.place ? formatQuantity(stationOf(each.place), 'length', units) : '–'}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const massText = (mass: number | null, units: UnitSystem): string =>
  mass === null ? 'no plan' : formatQuantity(mass, 'mass', units);
