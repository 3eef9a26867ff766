/** The wire runs, and what can be done to them. */
import { catalogue } from '../../catalogue/catalogue.ts';
import { step } from '../../edit/edit.ts';
import { addWire, removeWires, type WireFields } from '../../edit/edits/wires.ts';
import { called, idsOf } from '../../edit/selection.ts';
import { blankWire, defaultPlace } from '../defaults.ts';
import { useEditor } from '../editor.ts';
import { useAdding, useNaming } from './adding.ts';
import { Grid } from './Grid.tsx';
import { wireRows } from './gridRows.ts';
import { WIRE_GRID } from './wireColumns.tsx';

export function WireTable() {
  const { craft, assessment, selection, apply } = useEditor();
  const add = useAdding('wire');
  const { fresh, addAndName } = useNaming('wire');
  const ids = idsOf(selection, 'wire');
  const what = called(craft, 'wire', ids);
  const addBlank = () =>
    addAndName(addWire(blankWire(defaultPlace(assessment), catalogue.conductors[0]?.massPerMetre ?? 0)));
  return (
    <>
      <div className="toolbar" role="toolbar" aria-label="Wire runs">
        <button type="button" onClick={addBlank}>
          Add wire run
        </button>
        <button
          type="button"
          disabled={ids.length === 0}
          onClick={() =>
            add(
              duplicateWires(
                ids.map((id) => craft.wires.byId[id]!),
                what,
              ),
            )
          }
        >
          Duplicate
        </button>
        <button type="button" disabled={ids.length === 0} onClick={() => apply(removeWires(ids, what))}>
          Remove
        </button>
      </div>
      <div className="grid-scroll">
        <Grid
          label="Wire runs"
          kind="wire"
          rows={wireRows(craft, assessment)}
          columns={WIRE_GRID}
          fresh={fresh}
          empty="No wire runs. Their mass counts too: add one and join its ends to two parts."
        />
      </div>
    </>
  );
}

/** All copies as one step of the history. */
const duplicateWires = (wires: readonly (WireFields & { id: string })[], what: string) =>
  step(`Duplicate ${what}`, (craft) => {
    for (const { id: _, ...fields } of wires) addWire(structuredClone(fields)).recipe(craft);
  });
