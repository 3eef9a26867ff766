/** Where a thing sits: the kind of place, and the fields of that kind. Changing the kind keeps the point in space, but for one inside the hull that goes onto the skin. */
import type { Place, PlaceKind } from '../../craft/placeSchema.ts';
import type { Problem } from '../../craft/problem.ts';
import type { Hull, Vec3 } from '../../report/assessment.ts';
import { placeChosen } from '../../report/placeAs.ts';
import type { Quantity } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { PLACE_CHOICES } from '../words.ts';

export interface PlaceFieldsProps {
  readonly place: Place;
  /** The point itself, as the report has it; null while the hull cannot be formed. */
  readonly at: Vec3 | null;
  /** Before every label, where several places stand on one page: "From ". */
  readonly prefix?: string | undefined;
  /** `field` names what was typed, for the undo list. */
  onPlace(place: Place, field: string, run?: string): Problem | null;
}

/** Clock angle of the keel. */
const KEEL = Math.PI;

export function PlaceFields({ place, at, prefix = '', onPlace }: PlaceFieldsProps) {
  const { assessment } = useEditor();
  const { geometry } = assessment;
  const hull = geometry.status === 'solved' ? geometry.hull : null;
  const choose = (kind: PlaceKind): Problem | null =>
    at && hull
      ? onPlace(placeChosen(kind, at, hull), 'kind of place')
      : { path: '', found: kind, allowed: 'a change of place once the hull can be formed' };
  return (
    <>
      <ChoiceField
        label={labelled(prefix, 'Place')}
        value={place.kind}
        choices={PLACE_CHOICES}
        onCommit={choose}
      />
      {FIELDS[place.kind].map((field) => (
        <CoordinateField key={field.key} {...{ place, field, prefix, onPlace }} />
      ))}
      {hull && (place.kind === 'skin' || place.kind === 'keel') && (
        <TapeField {...{ place, hull, prefix, onPlace }} />
      )}
    </>
  );
}

/** "From" and "Place" make "From place". */
const labelled = (prefix: string, label: string): string =>
  prefix ? `${prefix} ${label[0]!.toLowerCase()}${label.slice(1)}` : label;

interface Coordinate {
  readonly key: string;
  readonly label: string;
  readonly quantity: Quantity;
  readonly hint?: string;
}

const STATION: Coordinate = { key: 'station', label: 'Station', quantity: 'length' };

const FIELDS: Readonly<Record<PlaceKind, readonly Coordinate[]>> = {
  skin: [
    STATION,
    { key: 'clock', label: 'Clock angle', quantity: 'angle', hint: '0 top, 90 starboard, 180 keel' },
    { key: 'standoff', label: 'Stand-off', quantity: 'smallLength', hint: 'Outward from the skin' },
  ],
  keel: [STATION, { key: 'drop', label: 'Drop', quantity: 'smallLength', hint: 'Below the keel line' }],
  axis: [STATION],
  free: [
    { key: 'x', label: 'Station', quantity: 'length' },
    { key: 'y', label: 'Side', quantity: 'length', hint: '+ starboard' },
    { key: 'z', label: 'Height', quantity: 'length', hint: '+ above the axis' },
  ],
};

interface CoordinateFieldProps extends Pick<PlaceFieldsProps, 'place' | 'onPlace'> {
  readonly field: Coordinate;
  readonly prefix: string;
}

function CoordinateField({ place, field, prefix, onPlace }: CoordinateFieldProps) {
  const { units } = useEditor();
  const value = (place as Readonly<Record<string, number | string>>)[field.key] as number;
  return (
    <QuantityField
      label={labelled(prefix, field.label)}
      value={value}
      quantity={field.quantity}
      units={units}
      hint={field.hint}
      onCommit={(next, run) => onPlace({ ...place, [field.key]: next }, field.label.toLowerCase(), run)}
    />
  );
}

interface TapeFieldProps extends Pick<PlaceFieldsProps, 'onPlace'> {
  readonly place: Extract<Place, { kind: 'skin' | 'keel' }>;
  readonly hull: Hull;
  readonly prefix: string;
}

/** The same station as a tape measure on the inflated hull reads it. */
function TapeField({ place, hull, prefix, onPlace }: TapeFieldProps) {
  const { units } = useEditor();
  const clock = place.kind === 'skin' ? place.clock : KEEL;
  const commit = (tape: number, run?: string): Problem | null => {
    const most = hull.tapeAt(hull.length, clock);
    return tape < 0 || tape > most
      ? { path: '', found: String(tape), allowed: tape < 0 ? 'at least 0' : `at most ${most}` }
      : onPlace({ ...place, station: hull.stationAt(tape, clock) }, 'tape distance', run);
  };
  return (
    <QuantityField
      label={labelled(prefix, 'Tape distance')}
      value={hull.tapeAt(place.station, clock)}
      quantity="length"
      units={units}
      derived
      hint="Along the skin from the nose tip"
      onCommit={commit}
    />
  );
}
