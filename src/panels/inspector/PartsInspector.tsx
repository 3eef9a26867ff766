/** Several parts at once: the fields they share. Where they differ, the field says so and a choice sets them all. */
import { PART_KINDS, type Part } from '../../craft/schema.ts';
import { type PartFields, setParts } from '../../edit/edits/parts.ts';
import { PartCaution } from '../Caution.tsx';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { PART_CHOICES, SOURCE_CHOICES } from '../words.ts';

/** The value that all of them have, or null. */
function shared<T>(parts: readonly Part[], of: (part: Part) => T): T | null {
  const first = of(parts[0]!);
  return parts.every((part) => of(part) === first) ? first : null;
}

export function PartsInspector({ parts }: { parts: readonly Part[] }) {
  const { units } = useEditor();
  const commit = useCommit();
  const ids = parts.map((part) => part.id);
  const set = (what: string, change: Partial<PartFields>, run?: string) =>
    commit(setParts(ids, `${what} of ${parts.length} parts`, change), run);
  const kinds = PART_KINDS.filter((kind) => parts.some((part) => part.kind === kind));
  return (
    <section className="panel inspector" aria-label="Inspector">
      <h3>{parts.length} parts</h3>
      {kinds.map((kind) => (
        <PartCaution key={kind} kind={kind} />
      ))}
      <ChoiceField
        label="Kind"
        value={shared(parts, (part) => part.kind)}
        choices={PART_CHOICES}
        none="They differ"
        onCommit={(kind) => set('Change kind', { kind })}
      />
      <QuantityField
        label="Mass"
        value={shared(parts, (part) => part.mass)}
        quantity="mass"
        units={units}
        hint="Of one piece; empty where they differ"
        onCommit={(mass, run) => set('Change mass', { mass }, run)}
      />
      <QuantityField
        label="± mass"
        value={shared(parts, (part) => part.massTolerance)}
        quantity="mass"
        units={units}
        onCommit={(massTolerance, run) => set('Change mass tolerance', { massTolerance }, run)}
      />
      <ChoiceField
        label="Source of the mass"
        value={shared(parts, (part) => part.massSource)}
        choices={SOURCE_CHOICES}
        none="They differ"
        onCommit={(massSource) => set('Change source of the mass', { massSource })}
      />
      <CheckField
        label="Locked in place"
        value={shared(parts, (part) => part.locked)}
        onCommit={(locked) => set('Change lock', { locked })}
      />
    </section>
  );
}
