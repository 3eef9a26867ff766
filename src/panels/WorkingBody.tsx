/** How a figure came about: formula, the figures that went in, source. */
import type { Row } from '../report/row.ts';
import { rowText } from '../report/rowText.ts';
import type { Working } from '../report/verdict.ts';
import { useEditor } from './editor.ts';
import { RowList } from './RowList.tsx';

interface WorkingBodyProps {
  readonly working: Working;
  /** Goes to the working of a figure that went in. Without it they are only shown. */
  readonly onJump?: (key: string) => void;
}

export function WorkingBody({ working: { formula, inputs, source }, onJump }: WorkingBodyProps) {
  const { units } = useEditor();
  return (
    <>
      <p className="formula">{formula}</p>
      {onJump ? <JumpList inputs={inputs} onJump={onJump} /> : <RowList rows={inputs} units={units} />}
      <p className="source">
        <strong>Source:</strong> {source}
      </p>
    </>
  );
}

function JumpList({ inputs, onJump }: { inputs: readonly Row[]; onJump: (key: string) => void }) {
  const { assessment, units } = useEditor();
  const keys = new Map(Object.entries(assessment.rows).map(([key, row]) => [row, key]));
  if (inputs.length === 0) return null;
  return (
    <ul className="figures">
      {inputs.map((row) => (
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
  );
}
