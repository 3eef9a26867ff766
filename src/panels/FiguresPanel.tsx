/** Every figure of the report, with what stands behind those that need a word. */
import type { Row, RowStatus } from '../report/row.ts';
import type { UnitSystem } from '../units/units.ts';
import { useEditor } from './editor.ts';
import { figureGroups } from './figureGroups.ts';
import { rowText } from './rowText.ts';

const STATUS_WORDS: Readonly<Record<RowStatus, string>> = {
  solved: '',
  caution: 'Mind',
  infeasible: 'Not possible',
};

export function FiguresPanel() {
  const { assessment, units } = useEditor();
  return (
    <section className="panel" aria-label="Figures">
      {figureGroups(assessment.rows).map(({ title, rows }) => (
        <table className="figures" key={title}>
          <caption>{title}</caption>
          <thead className="spoken">
            <tr>
              <th scope="col">Figure</th>
              <th scope="col">Value</th>
              <th scope="col">Remark</th>
            </tr>
          </thead>
          <tbody>
            {rows.map(({ key, row }) => (
              <FigureRow key={key} name={key} row={row} units={units} />
            ))}
          </tbody>
        </table>
      ))}
    </section>
  );
}

function FigureRow({ name, row, units }: { name: string; row: Row; units: UnitSystem }) {
  const word = STATUS_WORDS[row.status];
  return (
    <tr data-figure={name} data-status={row.status}>
      <th scope="row">{row.label}</th>
      <td className="number">{rowText(row, units)}</td>
      <td className="remark">
        {word && <strong>{word}: </strong>}
        {row.why}
      </td>
    </tr>
  );
}
