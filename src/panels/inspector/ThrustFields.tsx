/** What a thruster does: how hard it pushes, how fast its propeller moves on, which way it points. */
import { firstThruster } from '../../craft/firstFigures.ts';
import type { Part } from '../../craft/schema.ts';
import type { ThrusterData } from '../../craft/thrustSchema.ts';
import { giveThruster, setThruster, takeThruster } from '../../edit/edits/thrust.ts';
import { HAZARDS, isVectored } from '../../report/hazards.ts';
import { thrusterFacts } from '../../report/thrusterAs.ts';
import { formatQuantity } from '../../units/format.ts';
import { inUnits } from '../../units/sentence.ts';
import { Caution, PartCaution } from '../Caution.tsx';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { FactList } from './FactList.tsx';
import { FigureField, type SetFigures } from './FigureField.tsx';
import { InsideCaution } from './InsideCaution.tsx';
import { PitchSpeedFields } from './PitchSpeedFields.tsx';
import { StaticThrustFields } from './StaticThrustFields.tsx';
import { VectoringFields } from './VectoringFields.tsx';

export interface FieldsOfThruster {
  readonly data: ThrusterData;
  readonly set: SetFigures<ThrusterData>;
}

export function ThrustFields({ part }: { part: Part }) {
  const { apply } = useEditor();
  const { thruster } = part;
  return (
    <section className="panel-part" aria-label="Thrust">
      <h3>Thrust</h3>
      {thruster ? (
        <Figures part={part} data={thruster} />
      ) : (
        <>
          <p className="aside">Nothing is known of its thrust: to the figures it is a dead weight.</p>
          <button type="button" onClick={() => apply(giveThruster(part))}>
            Enter thrust figures
          </button>
        </>
      )}
    </section>
  );
}

function Figures({ part, data }: { part: Part; data: ThrusterData }) {
  const { assessment, apply } = useEditor();
  const commit = useCommit();
  const density = assessment.rows['air.density']?.value ?? null;
  const set: SetFigures<ThrusterData> = (field, change, run) => commit(setThruster(part, field, change), run);
  return (
    <>
      {part.kind !== 'thruster' && <PartCaution kind="thruster" />}
      <InsideCaution part={part} />
      {isGuess(part, data) && (
        <p className="aside">These are guesses from its size. Change them to what you measure.</p>
      )}
      <StaticThrustFields {...{ data, density, set }} />
      <FigureField
        label="Propeller diameter"
        figures={data}
        name="diameter"
        quantity="smallLength"
        set={set}
      />
      <PitchSpeedFields {...{ data, set }} />
      <FigureField
        label="Reverse"
        figures={data}
        name="reverse"
        quantity="fraction"
        hint="Thrust backwards as a share of that forwards"
        set={set}
      />
      {(['yaw', 'pitch'] as const).map((way) => (
        <VectoringFields
          key={way}
          way={way}
          vectoring={data[way]}
          onVectoring={(next, field, run) => set(field, { [way]: next }, run)}
        />
      ))}
      {isVectored(data) && <Caution>{HAZARDS.vectored}</Caution>}
      {part.copies.kind === 'pair' && (
        <CheckField
          label="Throttled apart to turn the craft"
          value={data.differential}
          onCommit={(differential) => apply(setThruster(part, 'throttling apart', { differential }))}
        />
      )}
      {density !== null && <Facts data={data} density={density} />}
      <button type="button" onClick={() => apply(takeThruster(part))}>
        Remove the thrust figures
      </button>
    </>
  );
}

const isGuess = ({ size }: Part, data: ThrusterData): boolean =>
  JSON.stringify(data) === JSON.stringify(firstThruster(size));

function Facts({ data, density }: { data: ThrusterData; density: number }) {
  const { units } = useEditor();
  const { staticThrust, idealPower, pitchSpeed, note } = thrusterFacts(data, density);
  return (
    <>
      <FactList
        facts={[
          { label: 'Thrust at rest', text: formatQuantity(staticThrust, 'force', units) },
          { label: 'Ideal power for it', text: formatQuantity(idealPower, 'power', units) },
          { label: 'Pitch speed', text: formatQuantity(pitchSpeed, 'speed', units) },
        ]}
      />
      {note && <p className="aside">{inUnits(note, units)}</p>}
    </>
  );
}
