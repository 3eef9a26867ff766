/** How a figure came about: formula, the figures that went in, source. */
import type { Row } from '../report/row.ts';
import { rowText } from '../report/rowText.ts';
import type { Working } from '../report/verdict.ts';
import { useEditor } from './editor.ts';
import { RowList } from './RowList.tsx';

interface WorkingBodyProps {
  readonly working: Working;
  /** The figures there are to go to, by key, and how. Without them those that went in are only shown. */
  readonly rows?: Readonly<Record<string, Row>>;
  readonly onJump?: (key: string) => void;
}

export function WorkingBody({ working: { formula, inputs, source }, rows = {}, onJump }: WorkingBodyProps) {
  const { units } = useEditor();
  return (
    <>
      <p className="formula">{formula}</p>
      {onJump ? (
        <JumpList inputs={inputs} rows={rows} onJump={onJump} />
      ) : (
        <RowList rows={inputs} units={units} />
      )}
      <p className="source">
        <strong>Source:</strong> {source}
      </p>
    </>
  );
}

interface JumpListProps {
  readonly inputs: readonly Row[];
  readonly rows: Readonly<Record<string, Row>>;
  onJump(key: string): void;
}

function JumpList({ inputs, rows, onJump }: JumpListProps) {
  const { units } = useEditor();
  const keys = new Map(Object.entries(rows).map(([key, row]) => [row, key]));
  const there = inputs.filter((row) => keys.has(row));
  const elsewhere = inputs.filter((row) => !keys.has(row));
  return (
    <>
      {elsewhere.length > 0 && <RowList rows={elsewhere} units={units} />}
      {there.length > 0 && (
        <ul className="figures">
          {there.map((row) => (
            <li key={row.label}>
              <button
                type="button"
                className="figure-face"
                title="Go to this figure"
                onClick={() => onJump(keys.get(row)!)}
              >
                <span className="figure-label">{row.label}</span>{' '}
                <span className="number">{rowText(row, units)}</span>
              </button>
            </li>
          ))}
        </ul>
      )}
    </>
  );
}
