/** Every field of what is selected. */
import { idsOf } from '../edit/selection.ts';
import { useEditor } from './editor.ts';
import { HardpointInspector } from './inspector/HardpointInspector.tsx';
import { PartInspector } from './inspector/PartInspector.tsx';
import { PartsInspector } from './inspector/PartsInspector.tsx';
import { WireInspector } from './inspector/WireInspector.tsx';

export function Inspector() {
  const { craft, selection } = useEditor();
  const parts = idsOf(selection, 'part').flatMap((id) => craft.parts.byId[id] ?? []);
  if (parts.length > 1) return <PartsInspector key={parts.map((part) => part.id).join(' ')} parts={parts} />;
  const last = selection.at(-1);
  if (!last) return <NothingSelected />;
  // The key gives each thing its own fields, so that a text half typed for one never lands in another.
  const key = `${last.kind} ${last.id}`;
  switch (last.kind) {
    case 'part':
      return <PartInspector key={key} part={craft.parts.byId[last.id]!} />;
    case 'wire':
      return <WireInspector key={key} wire={craft.wires.byId[last.id]!} />;
    case 'hardpoint':
      return <HardpointInspector key={key} hardpoint={craft.hardpoints.byId[last.id]!} />;
  }
}

function NothingSelected() {
  return (
    <section className="panel inspector" aria-label="Inspector">
      <p className="aside">
        Nothing is selected. Pick a part, a wire run or a hardpoint in the drawing or in the ledger to see all
        its fields.
      </p>
    </section>
  );
}
