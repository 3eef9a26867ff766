/** Every field of one wire run. */
import { catalogue } from '../../catalogue/catalogue.ts';
import { listed } from '../../craft/craft.ts';
import type { WireEnd, WireRun } from '../../craft/schema.ts';
import { setWire, type WireFields } from '../../edit/edits/wires.ts';
import type { Vec3 } from '../../report/assessment.ts';
import { formatQuantity } from '../../units/format.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { CountField } from '../fields/CountField.tsx';
import { NotesField } from '../fields/NotesField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { TextField } from '../fields/TextField.tsx';
import { PART_WORDS } from '../words.ts';
import { FactList } from './FactList.tsx';
import { PlaceFields } from './PlaceFields.tsx';

const PATH_CHOICES = [
  { value: 'skin', label: 'Along the skin' },
  { value: 'straight', label: 'Straight' },
] as const;
const CONDUCTOR_CHOICES = catalogue.conductors.map(({ id, name }) => ({ value: id, label: name }));
/** Where a run along the skin lies until somebody says: the keel. */
const KEEL = Math.PI;

export function WireInspector({ wire }: { wire: WireRun }) {
  const { units } = useEditor();
  const commit = useCommit();
  const set = (field: string, change: Partial<WireFields>, run?: string) =>
    commit(setWire(wire, field, change), run);
  const { path } = wire;
  return (
    <section className="panel inspector" aria-label="Inspector">
      <TextField label="Name" value={wire.name} onCommit={(name) => set('name', { name })} />
      <EndFields wire={wire} side="from" />
      <EndFields wire={wire} side="to" />
      <ChoiceField
        label="Path"
        value={path.kind}
        choices={PATH_CHOICES}
        onCommit={(kind) => set('path', { path: kind === 'skin' ? { kind, clock: KEEL } : { kind } })}
      />
      {path.kind === 'skin' && (
        <QuantityField
          label="Clock angle"
          value={path.clock}
          quantity="angle"
          units={units}
          hint="0 top, 90 starboard, 180 keel"
          onCommit={(clock, run) => set('clock angle', { path: { kind: 'skin', clock } }, run)}
        />
      )}
      <ConductorFields wire={wire} />
      <NotesField
        label="Wire notes"
        rows={3}
        value={wire.notes}
        onCommit={(notes, run) => set('notes', { notes }, run)}
      />
      <WireFacts id={wire.id} />
    </section>
  );
}

function ConductorFields({ wire }: { wire: WireRun }) {
  const { units } = useEditor();
  const commit = useCommit();
  const set = (field: string, change: Partial<WireFields>, run?: string) =>
    commit(setWire(wire, field, change), run);
  const known = catalogue.conductors.find(({ massPerMetre }) => massPerMetre === wire.massPerMetre);
  const choose = (id: string) =>
    set('conductor', { massPerMetre: catalogue.conductors.find((each) => each.id === id)!.massPerMetre });
  return (
    <>
      <ChoiceField
        label="Conductor"
        value={known?.id ?? null}
        choices={CONDUCTOR_CHOICES}
        none="Own conductor"
        onCommit={choose}
      />
      <QuantityField
        label="Mass per length"
        value={wire.massPerMetre}
        quantity="massPerMetre"
        units={units}
        hint="Of one conductor"
        onCommit={(massPerMetre, run) => set('mass per length', { massPerMetre }, run)}
      />
      <CountField
        label="Conductors"
        value={wire.conductors}
        hint="Side by side: two for a pair"
        onCommit={(conductors) => set('conductors', { conductors })}
      />
      <QuantityField
        label="Slack"
        value={wire.slack}
        quantity="fraction"
        units={units}
        hint="Extra length as a share of the path"
        onCommit={(slack, run) => set('slack', { slack }, run)}
      />
    </>
  );
}

const SIDE_WORDS = { from: 'From', to: 'To' } as const;
const LOOSE = 'loose';

/** One end: joined to a part, or loose at a place. */
function EndFields({ wire, side }: { wire: WireRun; side: 'from' | 'to' }) {
  const { craft } = useEditor();
  const commit = useCommit();
  const at = useEndPoint(wire.id, side);
  const end = wire[side];
  const word = SIDE_WORDS[side];
  const set = (next: WireEnd, field: string, run?: string) =>
    commit(setWire(wire, `${side} ${field}`, { [side]: next }), run);
  // A part's id has no colon, so that "loose" can stand beside them.
  const choices = [
    { value: LOOSE, label: 'Loose, at a place' },
    ...listed(craft.parts).map(({ id, name, kind }) => ({
      value: `part:${id}`,
      label: name || PART_WORDS[kind],
    })),
  ];
  const choose = (value: string) =>
    value === LOOSE
      ? set({ kind: 'loose', place: endPlace(craft, end) }, 'end')
      : set({ kind: 'part', part: value.slice('part:'.length) }, 'end');
  return (
    <>
      <ChoiceField
        label={word}
        value={end.kind === 'loose' ? LOOSE : `part:${end.part}`}
        choices={choices}
        onCommit={choose}
      />
      {end.kind === 'loose' && (
        <PlaceFields
          prefix={word}
          place={end.place}
          at={at}
          onPlace={(place, field, run) => set({ kind: 'loose', place }, field, run)}
        />
      )}
    </>
  );
}

const endPlace = (craft: ReturnType<typeof useEditor>['craft'], end: WireEnd) =>
  end.kind === 'loose' ? end.place : craft.parts.byId[end.part]!.place;

/** Where that end of the first branch is. */
function useEndPoint(id: string, side: 'from' | 'to'): Vec3 | null {
  const { geometry } = useEditor().assessment;
  if (geometry.status !== 'solved') return null;
  const branch = geometry.wires.find((each) => each.wire === id)?.branches[0];
  return branch?.at(side === 'from' ? 0 : -1) ?? null;
}

function WireFacts({ id }: { id: string }) {
  const { assessment, units } = useEditor();
  if (assessment.geometry.status !== 'solved') return null;
  const view = assessment.geometry.wires.find((each) => each.wire === id);
  const bar = assessment.geometry.beam.find((each) => each.kind === 'wire' && each.id === id);
  if (!view || !bar) return null;
  return (
    <FactList
      facts={[
        { label: 'Length', text: formatQuantity(view.length, 'length', units) },
        { label: 'Mass', text: formatQuantity(view.mass, 'mass', units) },
        { label: 'CG station', text: formatQuantity(bar.station, 'length', units) },
        { label: 'Moment about the CB', text: formatQuantity(bar.moment, 'momentMass', units) },
      ]}
    />
  );
}
