/** Every field of one part, and what follows from them. */
import type { Part } from '../../craft/schema.ts';
import { type PartFields, setPart } from '../../edit/edits/parts.ts';
import type { Geometry } from '../../report/assessment.ts';
import { formatQuantity } from '../../units/format.ts';
import type { Quantity } from '../../units/units.ts';
import { PartCaution } from '../Caution.tsx';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { NotesField } from '../fields/NotesField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { TextField } from '../fields/TextField.tsx';
import { PartSlideFields } from '../plan/PartSlideFields.tsx';
import { PART_CHOICES, SOURCE_CHOICES } from '../words.ts';
import { CopiesField } from './CopiesField.tsx';
import { DragAreaField } from './DragAreaField.tsx';
import { FactList } from './FactList.tsx';
import { FinFields } from './FinFields.tsx';
import { PlaceFields } from './PlaceFields.tsx';
import { ThrustFields } from './ThrustFields.tsx';
import './inspector.css';

export function PartInspector({ part }: { part: Part }) {
  const { assessment, units } = useEditor();
  const commit = useCommit();
  const geometry = assessment.geometry.status === 'solved' ? assessment.geometry : null;
  const piece = geometry?.pieces.find((each) => each.part === part.id) ?? null;
  const set = (field: string, change: Partial<PartFields>, run?: string) =>
    commit(setPart(part, field, change), run);
  const quantity = (
    label: string,
    key: 'mass' | 'massTolerance' | 'cgOffset',
    kind: Quantity,
    hint?: string,
  ) => (
    <QuantityField
      label={label}
      value={part[key]}
      quantity={kind}
      units={units}
      hint={hint}
      onCommit={(next, run) => set(label.toLowerCase(), { [key]: next }, run)}
    />
  );
  return (
    <section className="panel inspector" aria-label="Inspector">
      <PartCaution kind={part.kind} />
      <TextField label="Name" value={part.name} onCommit={(name) => set('name', { name })} />
      <ChoiceField
        label="Kind"
        value={part.kind}
        choices={PART_CHOICES}
        onCommit={(kind) => set('kind', { kind })}
      />
      {quantity('Mass', 'mass', 'mass', 'Of one piece')}
      {quantity('± mass', 'massTolerance', 'mass')}
      <ChoiceField
        label="Source of the mass"
        value={part.massSource}
        choices={SOURCE_CHOICES}
        onCommit={(massSource) => set('source of the mass', { massSource })}
      />
      <PlaceFields
        place={part.place}
        at={piece?.middle ?? null}
        onPlace={(place, field, run) => set(field, { place }, run)}
      />
      <CopiesField copies={part.copies} onCommit={(copies) => set('copies', { copies })} />
      <SizeFields part={part} />
      {(part.kind === 'thruster' || part.thruster) && <ThrustFields part={part} />}
      {(part.kind === 'fin' || part.fin) && <FinFields part={part} />}
      <DragAreaField part={part} />
      {quantity(
        'CG offset',
        'cgOffset',
        'smallLength',
        'Where its own CG is: aft of the middle of its length',
      )}
      <CheckField
        label="Locked in place"
        value={part.locked}
        onCommit={(locked) => set('lock', { locked })}
      />
      <PartSlideFields part={part} />
      <NotesField
        label="Part notes"
        rows={3}
        value={part.notes}
        onCommit={(notes, run) => set('notes', { notes }, run)}
      />
      {geometry && <PartFacts id={part.id} geometry={geometry} />}
    </section>
  );
}

const SIDES = [
  { key: 'length', label: 'Length' },
  { key: 'width', label: 'Width' },
  { key: 'height', label: 'Height' },
] as const;

function SizeFields({ part }: { part: Part }) {
  const { units } = useEditor();
  const commit = useCommit();
  return SIDES.map(({ key, label }) => (
    <QuantityField
      key={key}
      label={label}
      value={part.size[key]}
      quantity="smallLength"
      units={units}
      onCommit={(next, run) =>
        commit(setPart(part, label.toLowerCase(), { size: { ...part.size, [key]: next } }), run)
      }
    />
  ));
}

function PartFacts({ id, geometry }: { id: string; geometry: Geometry }) {
  const { units } = useEditor();
  const bar = geometry.beam.find((each) => each.kind === 'part' && each.id === id);
  const pieces = geometry.pieces.filter((piece) => piece.part === id);
  const place = (value: number) => formatQuantity(value, 'length', units);
  return (
    <FactList
      facts={[
        ...(bar
          ? [
              { label: 'Mass of all pieces', text: formatQuantity(bar.mass, 'mass', units) },
              { label: 'Moment about the CB', text: formatQuantity(bar.moment, 'momentMass', units) },
            ]
          : []),
        ...pieces.map(({ cg: [x, y, z], copy }) => ({
          label: pieces.length > 1 ? `CG of piece ${copy + 1}` : 'CG station, side, height',
          text: [x, y, z].map(place).join(', '),
        })),
      ]}
    />
  );
}
