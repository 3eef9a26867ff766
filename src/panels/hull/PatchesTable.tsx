/** Reinforcements, valves and labels on the skin. */
import type { HullSpec } from '../../craft/hullSchema.ts';
import type { Problem } from '../../craft/problem.ts';
import { stationOf } from '../../craft/station.ts';
import { setHull } from '../../edit/edits/craft.ts';
import { type Quantity, unitOf } from '../../units/units.ts';
import { useCommit } from '../commit.ts';
import { defaultPlace } from '../defaults.ts';
import { useEditor } from '../editor.ts';
import { QuantityField } from '../fields/QuantityField.tsx';
import { TextField } from '../fields/TextField.tsx';

type Patch = HullSpec['patches'][number];

const NUMBERS: readonly { key: 'mass' | 'station' | 'clock'; label: string; quantity: Quantity }[] = [
  { key: 'mass', label: 'Mass', quantity: 'mass' },
  { key: 'station', label: 'Station', quantity: 'length' },
  { key: 'clock', label: 'Clock angle', quantity: 'angle' },
];

export function PatchesTable({ patches }: { patches: readonly Patch[] }) {
  const { assessment, units } = useEditor();
  const commit = useCommit();
  const set = (field: string, next: readonly Patch[], run?: string): Problem | null =>
    commit(setHull(field, { patches: [...next] }), run);
  const add = () => {
    const station = stationOf(defaultPlace(assessment));
    set('patches', [...patches, { name: 'Patch', mass: 0, station, clock: Math.PI }]);
  };
  return (
    <>
      {patches.length > 0 && (
        <table className="rows-table patches">
          <caption>Patches</caption>
          <thead>
            <tr>
              <th scope="col">Patch</th>
              {NUMBERS.map(({ key, label, quantity }) => (
                <th scope="col" key={key}>
                  {label}, {unitOf(quantity, units).symbol}
                </th>
              ))}
              <th scope="col">
                <span className="spoken">Remove</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {patches.map((patch, index) => (
              <PatchRow
                // biome-ignore lint/suspicious/noArrayIndexKey: a patch has no name of its own but its place in the table
                key={index}
                patch={patch}
                number={index + 1}
                onPatch={(field, next, run) =>
                  set(`${field} of patch ${index + 1}`, patches.with(index, next), run)
                }
                onRemove={() => set('patches', patches.toSpliced(index, 1))}
              />
            ))}
          </tbody>
        </table>
      )}
      <button type="button" onClick={add}>
        Add a patch
      </button>
    </>
  );
}

interface PatchRowProps {
  readonly patch: Patch;
  readonly number: number;
  onPatch(field: string, patch: Patch, run?: string): Problem | null;
  onRemove(): void;
}

function PatchRow({ patch, number, onPatch, onRemove }: PatchRowProps) {
  const { units } = useEditor();
  return (
    <tr>
      <td>
        <TextField
          bare
          label={`Name of patch ${number}`}
          value={patch.name}
          onCommit={(name) => onPatch('name', { ...patch, name })}
        />
      </td>
      {NUMBERS.map(({ key, label, quantity }) => (
        <td key={key}>
          <QuantityField
            bare
            label={`${label} of patch ${number}`}
            value={patch[key]}
            quantity={quantity}
            units={units}
            onCommit={(value, run) => onPatch(label.toLowerCase(), { ...patch, [key]: value }, run)}
          />
        </td>
      ))}
      <td className="row-actions">
        <button type="button" aria-label={`Remove patch ${number}`} onClick={onRemove}>
          −
        </button>
      </td>
    </tr>
  );
}
