/** Every figure of the report, with what stands behind those that need a word. */
import type { Row, RowStatus } from '../report/row.ts';
import { rowText } from '../report/rowText.ts';
import type { UnitSystem } from '../units/units.ts';
import { useEditor } from './editor.ts';
import { figureGroups } from './figureGroups.ts';

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
        <section key={title} aria-label={title}>
          <h3>{title}</h3>
          <dl className="rows">
            {rows.map(({ key, row }) => (
              <Figure key={key} name={key} row={row} units={units} />
            ))}
          </dl>
        </section>
      ))}
    </section>
  );
}

function Figure({ name, row, units }: { name: string; row: Row; units: UnitSystem }) {
  const word = STATUS_WORDS[row.status];
  return (
    <div className="row" data-figure={name} data-status={row.status}>
      <dt>{row.label}</dt>
      <dd className="number">{rowText(row, units)}</dd>
      {(word || row.why) && (
        <dd className="row-why">
          {word && <strong>{word}: </strong>}
          {row.why}
        </dd>
      )}
    </div>
  );
}
