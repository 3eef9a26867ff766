/** The useful loads that the plan may take aboard. */
import { type Craft, listed } from '../../craft/craft.ts';
import type { Load } from '../../craft/planningSchema.ts';
import { addLoad, removeLoads, setLoad } from '../../edit/edits/loads.ts';
import { formatQuantity } from '../../units/format.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { CountField } from '../fields/CountField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { TextField } from '../fields/TextField.tsx';
import { LoadPlaces } from './LoadPlaces.tsx';

export function LoadList() {
  const { craft, apply } = useEditor();
  const loads = listed(craft.loads);
  return (
    <>
      {loads.length === 0 && (
        <p className="aside">Loads that you could carry: the plan says which, and where.</p>
      )}
      {loads.map((load) => (
        <LoadEntry key={load.id} load={load} aboard={load.id in craft.parts.byId} />
      ))}
      <button type="button" onClick={() => apply(addLoad(newLoad(craft)))}>
        Add a load
      </button>
    </>
  );
}

function LoadEntry({ load, aboard }: { load: Load; aboard: boolean }) {
  const { units } = useEditor();
  const name = load.name || 'Load without a name';
  const facts = [
    formatQuantity(load.mass, 'mass', units),
    load.must ? 'must be carried' : `rank ${load.rank}`,
    aboard ? 'aboard' : 'ashore',
  ];
  return (
    <details className="load">
      <summary>
        <span className="load-name">{name}</span> <span className="aside">{facts.join(', ')}</span>
      </summary>
      <LoadFields load={load} />
      <LoadPlaces load={load} />
    </details>
  );
}

function LoadFields({ load }: { load: Load }) {
  const { units, apply } = useEditor();
  const commit = useCommit();
  return (
    <>
      <TextField
        label="Name"
        value={load.name}
        onCommit={(name) => commit(setLoad(load, 'name', { name }))}
      />
      <QuantityField
        label="Mass"
        value={load.mass}
        quantity="mass"
        units={units}
        onCommit={(mass, run) => commit(setLoad(load, 'mass', { mass }), run)}
      />
      <QuantityField
        label="± mass"
        value={load.massTolerance}
        quantity="mass"
        units={units}
        onCommit={(massTolerance, run) => commit(setLoad(load, '± mass', { massTolerance }), run)}
      />
      <CheckField
        label="Must be carried"
        value={load.must}
        onCommit={(must) => apply(setLoad(load, 'whether to carry', { must }))}
      />
      {!load.must && (
        <CountField
          label="Rank"
          value={load.rank}
          hint="1 is wanted most"
          onCommit={(rank) => commit(setLoad(load, 'rank', { rank }))}
        />
      )}
      <button type="button" onClick={() => apply(removeLoads([load.id], load.name || 'load'))}>
        Remove {load.name || 'this load'} from the list
      </button>
    </>
  );
}

/** May hang at the hardpoint where the lead is, so that the plan has something to choose at once. */
const newLoad = (craft: Craft): Omit<Load, 'id'> => ({
  name: 'New load',
  mass: 0.05,
  massTolerance: 0,
  must: false,
  rank: 1,
  options: [{ kind: 'hardpoint', hardpoint: craft.leadAt }],
});
