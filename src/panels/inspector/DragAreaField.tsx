/** What a part outside the hull drags: as given, or as it is reckoned. */
import type { Part } from '../../craft/schema.ts';
import { setDragArea } from '../../edit/edits/thrust.ts';
import { reckonedDragArea } from '../../report/dragAreas.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { entryText } from '../fields/entry.ts';
import { QuantityField } from '../fields/QuantityField.tsx';

export function DragAreaField({ part }: { part: Part }) {
  const { assessment, units } = useEditor();
  const commit = useCommit();
  const { geometry } = assessment;
  const reckoned = geometry.status === 'solved' ? reckonedDragArea(part, geometry) : Number.NaN;
  return (
    <QuantityField
      label="Drag area"
      value={part.dragArea}
      quantity="area"
      units={units}
      empty={part.fin ? 'by its outline' : entryText(reckoned, 'area', units)}
      hint="Of one piece; empty to have it reckoned"
      onCommit={(dragArea, run) => commit(setDragArea(part, dragArea), run)}
      onClear={() => commit(setDragArea(part, null))}
    />
  );
}
