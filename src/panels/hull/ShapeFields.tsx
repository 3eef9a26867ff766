/** The fields of the hull's form. */
import type { HullShape } from '../../craft/hullSchema.ts';
import { setShape } from '../../edit/edits/craft.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { CountField } from '../fields/CountField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { fieldsOf, fieldValue, type ShapeField } from './shapeFields.ts';

export function ShapeFields({ shape }: { shape: HullShape }) {
  // The key makes fields of another form start afresh.
  return fieldsOf(shape.kind).map((field) => (
    <OneField key={`${shape.kind} ${field.key}`} shape={shape} field={field} />
  ));
}

function OneField({ shape, field }: { shape: HullShape; field: ShapeField }) {
  const { units } = useEditor();
  const commit = useCommit();
  const { input, label, hint } = field;
  const value = fieldValue(shape, field);
  const set = (next: number | string, run?: string) =>
    commit(setShape(label.toLowerCase(), { ...shape, [field.key]: next } as HullShape), run);
  if (typeof input !== 'string') {
    return (
      <ChoiceField
        label={label}
        value={String(value)}
        choices={input}
        hint={hint}
        onCommit={(next) => set(next)}
      />
    );
  }
  if (input === 'whole') return <CountField label={label} value={Number(value)} hint={hint} onCommit={set} />;
  return (
    <QuantityField
      label={label}
      value={Number(value)}
      quantity={input}
      units={units}
      hint={hint}
      onCommit={set}
    />
  );
}
