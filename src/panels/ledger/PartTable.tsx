/** The parts, and what can be done to them. */
import { useRef } from 'react';
import { listed } from '../../craft/craft.ts';
import type { Edit } from '../../edit/edit.ts';
import {
  addPart,
  duplicateParts,
  hasRoom,
  removeParts,
  setParts,
  sortParts,
} from '../../edit/edits/parts.ts';
import { called, idsOf } from '../../edit/selection.ts';
import { partsCsv } from '../csv/writeParts.ts';
import { blankPart, defaultPlace, hullLengthOf } from '../defaults.ts';
import { useEditor } from '../editor.ts';
import { useAdding, useNaming } from './adding.ts';
import { download, fileName } from './download.ts';
import { Grid } from './Grid.tsx';
import { partRows } from './gridRows.ts';
import { PART_GRID } from './partColumns.tsx';

export type LedgerDialog =
  | { readonly kind: 'catalogue' }
  | { readonly kind: 'paste'; readonly text: string }
  | { readonly kind: 'weigh'; readonly id: string };

interface PartTableProps {
  onDialog(dialog: LedgerDialog): void;
}

export function PartTable({ onDialog }: PartTableProps) {
  const { craft, assessment, apply } = useEditor();
  const { fresh, addAndName } = useNaming('part');
  return (
    <>
      <div className="toolbar" role="toolbar" aria-label="Parts">
        <AddButtons onDialog={onDialog} onAdd={addAndName} />
        <SelectedButtons onDialog={onDialog} />
        <CsvButtons onDialog={onDialog} />
      </div>
      <div className="grid-scroll">
        <Grid
          label="Parts"
          kind="part"
          rows={partRows(craft, assessment)}
          columns={PART_GRID}
          fresh={fresh}
          empty="No parts yet. Add the first one: its name, its mass and where it sits are enough."
          onKeepOrder={(ids) => apply(sortParts(ids))}
        />
      </div>
    </>
  );
}

function AddButtons({ onDialog, onAdd }: PartTableProps & { onAdd: (edit: Edit) => void }) {
  const { craft, assessment } = useEditor();
  const full = !hasRoom(craft, 1);
  return (
    <>
      <button
        type="button"
        disabled={full}
        onClick={() => onAdd(addPart(blankPart(defaultPlace(assessment))))}
      >
        Add part
      </button>
      <button type="button" disabled={full} onClick={() => onDialog({ kind: 'catalogue' })}>
        Catalogue…
      </button>
    </>
  );
}

/** What can be done to the parts that are selected. */
function SelectedButtons({ onDialog }: PartTableProps) {
  const { craft, assessment, selection, apply } = useEditor();
  const add = useAdding('part');
  const ids = idsOf(selection, 'part');
  const what = called(craft, 'part', ids);
  const none = ids.length === 0;
  const locked = !none && ids.every((id) => craft.parts.byId[id]?.locked);
  return (
    <>
      <button
        type="button"
        disabled={none || !hasRoom(craft, ids.length)}
        onClick={() => add(duplicateParts(ids, what, hullLengthOf(assessment)))}
      >
        Duplicate
      </button>
      <button type="button" disabled={none} onClick={() => apply(removeParts(ids, what))}>
        Remove
      </button>
      <button
        type="button"
        disabled={none}
        onClick={() => apply(setParts(ids, `${locked ? 'Unlock' : 'Lock'} ${what}`, { locked: !locked }))}
      >
        {locked ? 'Unlock' : 'Lock'}
      </button>
      <button
        type="button"
        disabled={ids.length !== 1}
        onClick={() => onDialog({ kind: 'weigh', id: ids[0]! })}
      >
        Weigh…
      </button>
    </>
  );
}

function CsvButtons({ onDialog }: PartTableProps) {
  const { craft, units, notify } = useEditor();
  const chooser = useRef<HTMLInputElement>(null);
  const read = async (file: File | undefined) => {
    if (!file) return;
    try {
      onDialog({ kind: 'paste', text: await file.text() });
    } catch (error) {
      notify(`${file.name} could not be read: ${(error as Error).message}`, 'bad');
    }
  };
  return (
    <>
      <button type="button" onClick={() => onDialog({ kind: 'paste', text: '' })}>
        Paste…
      </button>
      <button
        type="button"
        onClick={() =>
          download(fileName(craft.name, 'csv'), 'text/csv', partsCsv(listed(craft.parts), units))
        }
      >
        CSV out
      </button>
      <button type="button" onClick={() => chooser.current?.click()}>
        CSV in…
      </button>
      <input
        ref={chooser}
        type="file"
        accept=".csv,.tsv,.txt,text/csv"
        aria-label="Table of parts to read in"
        hidden
        onChange={(event) => {
          void read(event.currentTarget.files?.[0]);
          event.currentTarget.value = '';
        }}
      />
    </>
  );
}
