/** A new craft: a name, a length, a diameter and a shape, and if wanted the first part. */
import { type FormEvent, useState } from 'react';
import type { Craft } from '../craft/craft.ts';
import type { ShapeKind } from '../craft/hullSchema.ts';
import type { PlaceKind } from '../craft/placeSchema.ts';
import type { Problem } from '../craft/problem.ts';
import type { PartKind } from '../craft/schema.ts';
import { DialogFrame } from './DialogFrame.tsx';
import { useEditor } from './editor.ts';
import { ChoiceField } from './fields/ChoiceField.tsx';
import { QuantityField } from './fields/QuantityField.tsx';
import { TextField } from './fields/TextField.tsx';
import { type FirstPart, newCraft } from './newCraft.ts';
import { ProblemsList } from './ProblemsList.tsx';
import { PART_CHOICES, PLACE_CHOICES, SHAPE_CHOICES } from './words.ts';

export interface NewCraftDialogProps {
  onCreate(craft: Craft): void;
  onClose(): void;
}

const FIRST_PART: FirstPart = { name: '', mass: null, kind: 'gondola', place: 'keel', station: null };

export function NewCraftDialog({ onCreate, onClose }: NewCraftDialogProps) {
  const [name, setName] = useState('New craft');
  const [length, setLength] = useState(3);
  const [diameter, setDiameter] = useState(1);
  const [shape, setShape] = useState<ShapeKind>('spheroid');
  const [part, setPart] = useState<FirstPart>(FIRST_PART);
  const [problems, setProblems] = useState<readonly Problem[]>([]);
  const { units } = useEditor();
  const create = (event: FormEvent) => {
    event.preventDefault();
    const made = newCraft({ name, length, diameter, shape, part });
    if (made.ok) onCreate(made.craft);
    else setProblems(made.problems);
  };
  return (
    <DialogFrame title="New craft" onClose={onClose}>
      <form onSubmit={create}>
        <TextField label="Craft name" value={name} onCommit={kept(setName)} />
        <QuantityField
          label="Length"
          value={length}
          quantity="length"
          units={units}
          onCommit={kept(setLength)}
        />
        <QuantityField
          label="Greatest diameter"
          value={diameter}
          quantity="length"
          units={units}
          onCommit={kept(setDiameter)}
        />
        <ChoiceField<ShapeKind>
          label="Shape"
          value={shape}
          choices={SHAPE_CHOICES}
          onCommit={kept(setShape)}
        />
        <FirstPartFields part={part} onPart={setPart} />
        {problems.length > 0 && <ProblemsList title="This craft cannot be made" problems={problems} />}
        <p className="aside">
          Film, gas, day and targets begin as a usual indoor craft has them; change them later.
        </p>
        <div className="dialog-actions">
          <button type="submit" className="primary">
            Make the craft
          </button>
        </div>
      </form>
    </DialogFrame>
  );
}

/** A dialog keeps what is typed until its button is pressed. */
const kept =
  <T,>(set: (value: T) => void) =>
  (value: T): null => {
    set(value);
    return null;
  };

interface FirstPartFieldsProps {
  readonly part: FirstPart;
  onPart(part: FirstPart): void;
}

function FirstPartFields({ part, onPart }: FirstPartFieldsProps) {
  const { units } = useEditor();
  const set = <K extends keyof FirstPart>(key: K) =>
    kept((value: FirstPart[K]) => onPart({ ...part, [key]: value }));
  return (
    <fieldset>
      <legend>First part (leave its mass empty to skip it)</legend>
      <TextField label="Part name" value={part.name} onCommit={set('name')} />
      <ChoiceField<PartKind>
        label="Part kind"
        value={part.kind}
        choices={PART_CHOICES}
        onCommit={set('kind')}
      />
      <QuantityField
        label="Part mass"
        value={part.mass}
        quantity="mass"
        units={units}
        onCommit={set('mass')}
      />
      <ChoiceField<PlaceKind>
        label="Part place"
        value={part.place}
        choices={PLACE_CHOICES}
        onCommit={set('place')}
      />
      <QuantityField
        label="Part station"
        value={part.station}
        quantity="length"
        units={units}
        hint="From the nose tip; empty: at half the length"
        onCommit={set('station')}
      />
    </fieldset>
  );
}
