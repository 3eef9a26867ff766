/** What the scale says of a part: it takes the place of the planned mass. */
import { useState } from 'react';
import { markWeighed } from '../edit/edits/parts.ts';
import { DialogFrame } from './DialogFrame.tsx';
import { useEditor } from './editor.ts';
import { QuantityField } from './fields/QuantityField.tsx';
import { PART_WORDS } from './words.ts';

export interface WeighDialogProps {
  /** The part. */
  readonly id: string;
  onClose(): void;
}

export function WeighDialog({ id, onClose }: WeighDialogProps) {
  const { craft, units, apply } = useEditor();
  const part = craft.parts.byId[id];
  const [mass, setMass] = useState<number | null>(null);
  const [tolerance, setTolerance] = useState(part?.massSource === 'weighed' ? part.massTolerance : 0);
  if (!part) return null;
  return (
    <DialogFrame title={`Weigh ${part.name || PART_WORDS[part.kind]}`} onClose={onClose}>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          if (mass !== null && apply(markWeighed(part, mass, tolerance))) onClose();
        }}
      >
        <QuantityField
          label="Mass on the scale"
          value={mass}
          quantity="mass"
          units={units}
          hint="Of one piece"
          onCommit={(next) => keep(next, setMass)}
        />
        <QuantityField
          label="± of the scale"
          value={tolerance}
          quantity="mass"
          units={units}
          hint="Half its smallest step, or what its maker says"
          onCommit={(next) => keep(next, setTolerance)}
        />
        <div className="dialog-actions">
          <button type="submit" className="primary" disabled={mass === null}>
            Mark weighed
          </button>
        </div>
      </form>
    </DialogFrame>
  );
}

/** A dialog keeps a value until its button is pressed; a scale reads nothing below zero. */
function keep(value: number, set: (value: number) => void) {
  if (value < 0) return { path: 'mass', found: String(value), allowed: 'at least 0' };
  set(value);
  return null;
}
