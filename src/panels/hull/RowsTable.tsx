/** The rows of a hull given by measured offsets or by a flat pattern. */
import { useId, useState } from 'react';
import type { Problem } from '../../craft/problem.ts';
import { setShape } from '../../edit/edits/craft.ts';
import { withRowAfter } from '../../edit/shapeAs.ts';
import { unitOf } from '../../units/units.ts';
import { useCommit } from '../commit.ts';
import { readNumberRows } from '../csv/numberRows.ts';
import { useEditor } from '../editor.ts';
import { QuantityField } from '../fields/QuantityField.tsx';
import { columnsOf, type HullRow, type RowShape } from './shapeFields.ts';

export function RowsTable({ shape }: { shape: RowShape }) {
  const { units } = useEditor();
  const commit = useCommit();
  const columns = columnsOf(shape);
  const unit = unitOf('length', units).symbol;
  const rows: readonly HullRow[] = shape.rows;
  const set = (next: readonly HullRow[], run?: string): Problem | null =>
    commit(setShape('rows', { ...shape, rows: next } as RowShape), run);
  return (
    <>
      <table className="rows-table">
        <caption>Rows, nose to tail</caption>
        <thead>
          <tr>
            <th scope="col">Row</th>
            {columns.map(({ key, label }) => (
              <th scope="col" key={key}>
                {label}, {unit}
              </th>
            ))}
            <th scope="col">
              <span className="spoken">Change the table</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row, index) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: a row has no name but its place in the table
            <tr key={index}>
              <th scope="row">{index + 1}</th>
              {columns.map(({ key, label }) => (
                <td key={key}>
                  <QuantityField
                    bare
                    label={`${label}, row ${index + 1}`}
                    value={row[key]!}
                    quantity="length"
                    units={units}
                    onCommit={(value, run) => set(rows.with(index, { ...row, [key]: value }), run)}
                  />
                </td>
              ))}
              <td className="row-actions">
                <button
                  type="button"
                  aria-label={`Add a row after row ${index + 1}`}
                  onClick={() => set(withRowAfter(rows, index))}
                >
                  +
                </button>
                <button
                  type="button"
                  aria-label={`Remove row ${index + 1}`}
                  disabled={rows.length <= 3}
                  onClick={() => set(rows.toSpliced(index, 1))}
                >
                  −
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <PasteRows columns={columns.map(({ key, label }) => ({ key, label }))} onRows={(next) => set(next)} />
    </>
  );
}

interface PasteRowsProps {
  readonly columns: readonly { readonly key: string; readonly label: string }[];
  onRows(rows: readonly HullRow[]): Problem | null;
}

/** Two columns pasted from a spreadsheet take the place of the table. */
function PasteRows({ columns, onRows }: PasteRowsProps) {
  const { units } = useEditor();
  const id = useId();
  const [text, setText] = useState('');
  const [messages, setMessages] = useState<readonly string[]>([]);
  const take = () => {
    const read = readNumberRows(text, columns, units);
    const refused = read.ok ? onRows(read.rows) : null;
    const problems = read.ok ? [] : read.messages;
    const all = refused ? [`The table: found ${refused.found}; allowed: ${refused.allowed}.`] : problems;
    setMessages(all);
    if (all.length === 0) setText('');
  };
  return (
    <details className="paste">
      <summary>Paste rows from a spreadsheet</summary>
      <label htmlFor={id}>
        {columns.map(({ label }) => label).join(' and ')}, one row a line; units in the heads if not the usual
        ones
      </label>
      <textarea id={id} rows={5} value={text} onChange={(event) => setText(event.currentTarget.value)} />
      <button type="button" disabled={text.trim() === ''} onClick={take}>
        Replace the rows
      </button>
      {messages.length > 0 && (
        <ul className="field-error" role="alert">
          {messages.map((message) => (
            <li key={message}>{message}</li>
          ))}
        </ul>
      )}
    </details>
  );
}
