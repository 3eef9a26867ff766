/** The hardpoints, and what can be done to them. */
import { step } from '../../edit/edit.ts';
import { addHardpoint, removeHardpoints } from '../../edit/edits/hardpoints.ts';
import { called, idsOf } from '../../edit/selection.ts';
import { defaultPlace } from '../defaults.ts';
import { useEditor } from '../editor.ts';
import { useAdding, useNaming } from './adding.ts';
import { Grid } from './Grid.tsx';
import { hardpointRows } from './gridRows.ts';
import { HARDPOINT_GRID } from './hardpointColumns.tsx';

export function HardpointTable() {
  const { craft, assessment, selection, apply } = useEditor();
  const add = useAdding('hardpoint');
  const { fresh, addAndName } = useNaming('hardpoint');
  const ids = idsOf(selection, 'hardpoint');
  const all = ids.length === craft.hardpoints.order.length;
  const what = called(craft, 'hardpoint', ids);
  const duplicate = step(`Duplicate ${what}`, (draft) => {
    for (const id of ids) {
      const { name, place } = craft.hardpoints.byId[id]!;
      addHardpoint(name, { ...place }).recipe(draft);
    }
  });
  return (
    <>
      <div className="toolbar" role="toolbar" aria-label="Hardpoints">
        <button
          type="button"
          onClick={() => addAndName(addHardpoint('New hardpoint', defaultPlace(assessment)))}
        >
          Add hardpoint
        </button>
        <button type="button" disabled={ids.length === 0} onClick={() => add(duplicate)}>
          Duplicate
        </button>
        <button
          type="button"
          disabled={ids.length === 0 || all}
          title={all ? 'A craft keeps one hardpoint at least' : undefined}
          onClick={() => apply(removeHardpoints(ids, what))}
        >
          Remove
        </button>
      </div>
      <div className="grid-scroll">
        <Grid
          label="Hardpoints"
          kind="hardpoint"
          rows={hardpointRows(craft)}
          columns={HARDPOINT_GRID}
          fresh={fresh}
          empty="No hardpoints."
        />
      </div>
    </>
  );
}
