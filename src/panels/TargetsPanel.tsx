/** What the craft is to meet, where the lead hangs, and what carries the heaviness. */
import { lazy, Suspense } from 'react';
import { listed } from '../craft/craft.ts';
import type { Targets } from '../craft/schema.ts';
import { setTargets } from '../edit/edits/craft.ts';
import { setLeadAt, setSupport } from '../edit/edits/hardpoints.ts';
import { useCommit } from './commit.ts';
import { defaultPlace } from './defaults.ts';
import { useEditor } from './editor.ts';
import { CheckField } from './fields/CheckField.tsx';
import { ChoiceField } from './fields/ChoiceField.tsx';
import { QuantityField } from './fields/QuantityField.tsx';
import { PlaceFields } from './inspector/PlaceFields.tsx';
import { FlightCaution } from './NotesPanel.tsx';
import { RowList } from './RowList.tsx';

const TargetVerdicts = lazy(async () => ({
  default: (await import('./turn/TargetVerdicts.tsx')).TargetVerdicts,
}));

export function TargetsPanel() {
  const { craft } = useEditor();
  const commit = useCommit();
  const choices = listed(craft.hardpoints).map(({ id, name }) => ({ value: id, label: name || id }));
  return (
    <section className="panel" aria-label="Targets">
      <TargetFields />
      <ChoiceField
        label="Lead at hardpoint"
        value={craft.leadAt}
        choices={choices}
        onCommit={(id) => commit(setLeadAt(id))}
      />
      <SupportFields />
      <FlightCaution />
    </section>
  );
}

function TargetFields() {
  const { craft, units } = useEditor();
  const commit = useCommit();
  const { heaviness, pitchTolerance, heelTolerance, leastPendulumDepth, turnTime, sideGust } = craft.targets;
  const set = (field: string, change: Partial<Targets>, run?: string) =>
    commit(setTargets(field, change), run);
  return (
    <>
      <QuantityField
        label="Least heaviness"
        value={heaviness.least}
        quantity="mass"
        units={units}
        hint="Negative is light"
        onCommit={(least, run) => set('least heaviness', { heaviness: { ...heaviness, least } }, run)}
      />
      <QuantityField
        label="Greatest heaviness"
        value={heaviness.most}
        quantity="mass"
        units={units}
        // The gate would name the least as the one at fault.
        onCommit={(most, run) =>
          most < heaviness.least
            ? { path: '', found: String(most), allowed: `at least ${heaviness.least}` }
            : set('greatest heaviness', { heaviness: { ...heaviness, most } }, run)
        }
      />
      <QuantityField
        label="Pitch tolerance"
        value={pitchTolerance}
        quantity="angle"
        units={units}
        hint="Either way, still level"
        onCommit={(next, run) => set('pitch tolerance', { pitchTolerance: next }, run)}
      />
      <QuantityField
        label="Heel tolerance"
        value={heelTolerance}
        quantity="angle"
        units={units}
        hint="Either way, still even"
        onCommit={(next, run) => set('heel tolerance', { heelTolerance: next }, run)}
      />
      <QuantityField
        label="Least pendulum depth"
        value={leastPendulumDepth}
        quantity="smallLength"
        units={units}
        hint="CB above CG"
        onCommit={(next, run) => set('least pendulum depth', { leastPendulumDepth: next }, run)}
      />
      <QuantityField
        label="First 90° within"
        value={turnTime}
        quantity="time"
        units={units}
        empty="not asked for"
        hint="Of yaw, from rest"
        onCommit={(next, run) => set('time for the first 90°', { turnTime: next }, run)}
        onClear={() => set('time for the first 90°', { turnTime: null })}
      />
      <QuantityField
        label="Side gust to hold"
        value={sideGust}
        quantity="speed"
        units={units}
        empty="not asked for"
        hint="At rest"
        onCommit={(next, run) => set('side gust', { sideGust: next }, run)}
        onClear={() => set('side gust', { sideGust: null })}
      />
      {(turnTime !== null || sideGust !== null) && (
        <Suspense fallback={<p className="aside">Loading…</p>}>
          <TargetVerdicts />
        </Suspense>
      )}
    </>
  );
}

const SUPPORT_ROWS = ['support.load', 'support.pitch', 'support.heel'];

/** The foot of a leg or the tie of a line, if one is asked for. */
function SupportFields() {
  const { craft, assessment, units, apply } = useEditor();
  const commit = useCommit();
  const { support } = craft;
  const { geometry } = assessment;
  const at = geometry.status === 'solved' ? geometry.support : null;
  return (
    <>
      <CheckField
        label="A support point carries the heaviness"
        value={support !== null}
        onCommit={(wanted) => apply(setSupport(wanted ? defaultPlace(assessment) : null))}
      />
      {support && (
        <PlaceFields
          prefix="Support"
          place={support}
          at={at}
          onPlace={(place, _, run) => commit(setSupport(place), run)}
        />
      )}
      {support && <RowList rows={SUPPORT_ROWS.map((key) => assessment.rows[key])} units={units} />}
    </>
  );
}
