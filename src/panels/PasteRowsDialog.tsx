/** Rows of a spreadsheet or a CSV file, looked at before anything is added. */
import { useId, useMemo, useState } from 'react';
import { LIMITS } from '../craft/quantities.ts';
import { addPart, addParts, hasRoom } from '../edit/edits/parts.ts';
import { unitOf } from '../units/units.ts';
import { type CellProblem, type PartsReading, readParts } from './csv/readParts.ts';
import { DialogFrame } from './DialogFrame.tsx';
import { defaultPlace } from './defaults.ts';
import { useEditor } from './editor.ts';
import { useAdding } from './ledger/adding.ts';
import { PastePreview } from './PastePreview.tsx';

export interface PasteRowsDialogProps {
  /** What to begin with: the text of a file, or nothing. */
  readonly text: string;
  onClose(): void;
}

export function PasteRowsDialog({ text: first, onClose }: PasteRowsDialogProps) {
  const { assessment, units } = useEditor();
  const [text, setText] = useState(first);
  const id = useId();
  const home = defaultPlace(assessment);
  // biome-ignore lint/correctness/useExhaustiveDependencies: the place is made afresh every time; its text says whether it moved
  const reading = useMemo(() => readParts(text, units, home), [text, units, JSON.stringify(home)]);
  return (
    <DialogFrame title="Add rows of parts" onClose={onClose}>
      <label htmlFor={id}>
        Rows from a spreadsheet. With heads (name, mass {unitOf('mass', units).symbol}, station{' '}
        {unitOf('length', units).symbol}, kind and the others of “CSV out”), or without: name, mass, station,
        kind. A head without a unit has the one the ledger shows.
      </label>
      <textarea
        id={id}
        className="table-text"
        rows={6}
        value={text}
        spellCheck={false}
        onChange={(event) => setText(event.currentTarget.value)}
      />
      <ReadingReport reading={reading} />
      <AddRowsButtons reading={reading} onClose={onClose} />
    </DialogFrame>
  );
}

function ReadingReport({ reading: { good, rows, problems, ignored, assumed } }: { reading: PartsReading }) {
  return (
    <div role="status">
      <p>
        {rows} {rows === 1 ? 'row' : 'rows'} read, {good.length} good, {problems.length}{' '}
        {problems.length === 1 ? 'problem' : 'problems'}.
      </p>
      {ignored.length > 0 && <p className="aside">Not used: {ignored.join(', ')}.</p>}
      {problems.length > 0 && <ProblemTable problems={problems.slice(0, 100)} />}
      {good.length > 0 && <PastePreview parts={good} assumed={assumed} />}
    </div>
  );
}

function ProblemTable({ problems }: { problems: readonly CellProblem[] }) {
  return (
    <table className="problem-table">
      <caption>Problems</caption>
      <thead>
        <tr>
          <th scope="col">Row</th>
          <th scope="col">Column</th>
          <th scope="col">Found</th>
          <th scope="col">Allowed</th>
        </tr>
      </thead>
      <tbody>
        {problems.map(({ row, column, found, allowed }) => (
          <tr key={`${row} ${column}`}>
            <td>{row}</td>
            <td>{column}</td>
            <td>{found}</td>
            <td>{allowed}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function AddRowsButtons({
  reading: { good, problems },
  onClose,
}: {
  reading: PartsReading;
  onClose: () => void;
}) {
  const { craft } = useEditor();
  const add = useAdding('part');
  const room = hasRoom(craft, good.length);
  const addGood = () => {
    const [first] = good;
    if (first && add(good.length === 1 ? addPart(first) : addParts(good))) onClose();
  };
  return (
    <div className="dialog-actions">
      {!room && (
        <p className="field-error" role="alert">
          Found {good.length} rows; allowed: {LIMITS.parts} parts in a craft, of which it has{' '}
          {craft.parts.order.length}.
        </p>
      )}
      <button type="button" className="primary" disabled={good.length === 0 || !room} onClick={addGood}>
        {addWords(good.length, problems.length > 0)}
      </button>
    </div>
  );
}

/** With bad rows about, only the good ones can be added, and the button says so. */
function addWords(good: number, some: boolean): string {
  if (good === 0) return 'Nothing to add yet';
  if (some) return good === 1 ? 'Add the good one' : `Add the ${good} good ones`;
  return good === 1 ? 'Add the part' : `Add all ${good} parts`;
}
