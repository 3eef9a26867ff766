/** The line on which a slide lies: the kind of place, and what holds it off the hull. Its station is where the slide begins. */
import { PLACE_KINDS, type Place, type PlaceKind } from '../../craft/placeSchema.ts';
import type { Problem } from '../../craft/problem.ts';
import { placeChosen } from '../../report/placeAs.ts';
import { pointOf } from '../../report/pointOf.ts';
import type { Quantity } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { choicesOf } from '../words.ts';

const LINE_CHOICES = choicesOf(PLACE_KINDS, {
  skin: 'Along the skin',
  keel: 'Below the keel',
  axis: 'On the axis',
  free: 'Straight, free',
} satisfies Record<PlaceKind, string>);

interface Offset {
  readonly key: string;
  readonly label: string;
  readonly quantity: Quantity;
  readonly hint: string;
}

const OFFSETS: Readonly<Record<PlaceKind, readonly Offset[]>> = {
  skin: [
    { key: 'clock', label: 'clock angle', quantity: 'angle', hint: '0 top, 90 starboard, 180 keel' },
    { key: 'standoff', label: 'stand-off', quantity: 'smallLength', hint: 'Outward from the skin' },
  ],
  keel: [{ key: 'drop', label: 'drop', quantity: 'smallLength', hint: 'Below the keel line' }],
  axis: [],
  free: [
    { key: 'y', label: 'side', quantity: 'length', hint: '+ starboard' },
    { key: 'z', label: 'height', quantity: 'length', hint: '+ above the axis' },
  ],
};

interface LineFieldsProps {
  readonly prefix: string;
  readonly place: Place;
  onPlace(place: Place, run?: string): Problem | null;
}

export function LineFields({ prefix, place, onPlace }: LineFieldsProps) {
  const { assessment, units } = useEditor();
  const choose = (kind: PlaceKind): Problem | null => {
    const at = pointOf(place, assessment);
    const { geometry } = assessment;
    return at && geometry.status === 'solved'
      ? onPlace(placeChosen(kind, at, geometry.hull))
      : { path: '', found: kind, allowed: 'a change of line once the hull can be formed' };
  };
  return (
    <>
      <ChoiceField label={`${prefix} runs`} value={place.kind} choices={LINE_CHOICES} onCommit={choose} />
      {OFFSETS[place.kind].map(({ key, label, quantity, hint }) => (
        <QuantityField
          key={key}
          label={`${prefix} ${label}`}
          value={(place as Readonly<Record<string, number | string>>)[key] as number}
          quantity={quantity}
          units={units}
          hint={hint}
          onCommit={(next, run) => onPlace({ ...place, [key]: next }, run)}
        />
      ))}
    </>
  );
}
