/** The starter catalogue: pick parts to put on the craft. */
import { useState } from 'react';
import { catalogue } from '../catalogue/catalogue.ts';
import type { PartEntry } from '../catalogue/schema.ts';
import { PART_KINDS, type PartKind } from '../craft/schema.ts';
import { addPart, hasRoom } from '../edit/edits/parts.ts';
import { firstPlace } from '../report/firstPlace.ts';
import { thrusterFacts } from '../report/thrusterAs.ts';
import { formatQuantity } from '../units/format.ts';
import type { UnitSystem } from '../units/units.ts';
import { PartCaution } from './Caution.tsx';
import { DialogFrame } from './DialogFrame.tsx';
import { defaultPlace, partFrom } from './defaults.ts';
import { useEditor } from './editor.ts';
import { ChoiceField } from './fields/ChoiceField.tsx';
import { foundParts } from './foundParts.ts';
import { useAdding } from './ledger/adding.ts';
import { PART_WORDS } from './words.ts';

/** The head of the dialog says it for all of these. */
const GENERIC = /^generic\b/;

type Filter = PartKind | 'all';

const FILTERS = [
  { value: 'all' as Filter, label: 'All kinds' },
  ...PART_KINDS.filter((kind) => catalogue.parts.some((entry) => entry.kind === kind)).map((kind) => ({
    value: kind as Filter,
    label: PART_WORDS[kind],
  })),
];

export function CatalogueDialog({ onClose }: { onClose: () => void }) {
  const { units } = useEditor();
  const [search, setSearch] = useState('');
  const [kind, setKind] = useState<Filter>('all');
  const [added, setAdded] = useState('');
  const entries = foundParts(catalogue.parts, search, kind === 'all' ? null : kind);
  return (
    <DialogFrame title="Add from the catalogue" onClose={onClose}>
      <p className="aside">
        Invented, generic parts to start from. Weigh your own and mark them weighed. Each goes where such a
        part often sits, aft of what is there already; drag it where it belongs.
      </p>
      <div className="toolbar">
        <input
          type="search"
          aria-label="Search the catalogue"
          placeholder="Search"
          value={search}
          onChange={(event) => setSearch(event.currentTarget.value)}
        />
        <ChoiceField
          bare
          label="Kind of part"
          value={kind}
          choices={FILTERS}
          onCommit={(next) => {
            setKind(next);
            return null;
          }}
        />
      </div>
      <p role="status">{added || countWords(entries.length)}</p>
      {kind !== 'all' && <PartCaution kind={kind} />}
      <ul className="catalogue catalogue-parts">
        {entries.map((entry) => (
          <Entry key={entry.id} entry={entry} units={units} onAdded={setAdded} />
        ))}
      </ul>
    </DialogFrame>
  );
}

function countWords(found: number): string {
  if (found === 1) return '1 part';
  if (found > 0) return `${found} parts`;
  return 'Nothing here matches. Try fewer words or a kind, as “battery”, or add a part of your own with “Add part”.';
}

/** Of the air where the craft has none, kg/m³. */
const USUAL_DENSITY = 1.2;

/** What a part does in the air, to two digits: "1.0 N, ⌀ 100 mm". */
function doingWords({ thruster, fin }: PartEntry, density: number, units: UnitSystem): string {
  if (fin) return `outline ${formatQuantity(fin.area, 'area', units, { uncertainty: fin.area })}`;
  if (!thruster) return '';
  const { staticThrust } = thrusterFacts(thruster, density);
  const thrust = formatQuantity(staticThrust, 'force', units, { uncertainty: staticThrust });
  return `${thrust}, ⌀ ${formatQuantity(thruster.diameter, 'smallLength', units)}`;
}

interface EntryProps {
  readonly entry: PartEntry;
  readonly units: UnitSystem;
  onAdded(message: string): void;
}

function Entry({ entry, units, onAdded }: EntryProps) {
  const { craft, assessment } = useEditor();
  const add = useAdding('part');
  const { name, kind, mass, massTolerance, size, fin = null, note, source } = entry;
  const doing = doingWords(entry, assessment.rows['air.density']?.value ?? USUAL_DENSITY, units);
  const placeOf = () => {
    const { geometry } = assessment;
    return geometry.status === 'solved'
      ? firstPlace({ kind, size, fin }, craft, geometry.hull)
      : defaultPlace(assessment);
  };
  return (
    <li>
      <div>
        <strong>{name}</strong> {PART_WORDS[kind]}, {formatQuantity(mass, 'mass', units)}
        {massTolerance > 0 && ` ± ${formatQuantity(massTolerance, 'mass', units)}`}
        {doing && `, ${doing}`}
        <p className="aside">
          {note} {GENERIC.test(source) || <cite>{source}</cite>}
        </p>
      </div>
      <button
        type="button"
        aria-label={`Add ${name}`}
        disabled={!hasRoom(craft, 1)}
        onClick={() => {
          if (add(addPart(partFrom(entry, placeOf())))) onAdded(`Added ${name}.`);
        }}
      >
        Add
      </button>
    </li>
  );
}
