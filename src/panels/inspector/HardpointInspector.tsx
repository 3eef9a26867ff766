/** Every field of one hardpoint. */
import type { Hardpoint } from '../../craft/schema.ts';
import { setHardpoint, setLeadAt } from '../../edit/edits/hardpoints.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { TextField } from '../fields/TextField.tsx';
import { HardpointPlanFields } from '../plan/HardpointPlanFields.tsx';
import { RowList } from '../RowList.tsx';
import { PlaceFields } from './PlaceFields.tsx';

const LEAD_ROWS = ['lead.mass', 'lead.massWithinTolerance', 'lead.degreesPerGram', 'lead.heavinessAfter'];

export function HardpointInspector({ hardpoint }: { hardpoint: Hardpoint }) {
  const { craft, assessment, units, apply } = useEditor();
  const commit = useCommit();
  const { geometry, rows } = assessment;
  const view =
    geometry.status === 'solved'
      ? geometry.hardpoints.find((each) => each.hardpoint === hardpoint.id)
      : undefined;
  const chosen = craft.leadAt === hardpoint.id;
  return (
    <section className="panel inspector" aria-label="Inspector">
      <TextField
        label="Name"
        value={hardpoint.name}
        onCommit={(name) => commit(setHardpoint(hardpoint, 'name', { name }))}
      />
      <PlaceFields
        place={hardpoint.place}
        at={view?.at ?? null}
        onPlace={(place, field, run) => commit(setHardpoint(hardpoint, field, { place }), run)}
      />
      <HardpointPlanFields hardpoint={hardpoint} />
      <button
        type="button"
        aria-pressed={chosen}
        disabled={chosen}
        onClick={() => apply(setLeadAt(hardpoint.id))}
      >
        {chosen ? 'The lead is worked out here' : 'Work out the lead here'}
      </button>
      {chosen && <RowList rows={LEAD_ROWS.map((key) => rows[key])} units={units} />}
    </section>
  );
}
