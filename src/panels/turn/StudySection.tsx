/** Where a thruster had better sit: every station tried, the best of them in a list, the curves under the side view. */
import { listed } from '../../craft/craft.ts';
import { formatQuantity } from '../../units/format.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { vectorAsked } from './asked.ts';
import { StudyTable } from './StudyTable.tsx';
import { holdsFor } from './studyCraft.ts';
import { useStudying } from './studying.ts';
import { useTurning } from './turning.ts';

export function StudySection() {
  const { craft } = useEditor();
  const turning = useTurning();
  const studying = useStudying();
  const thrusters = listed(craft.parts).filter(({ thruster }) => thruster);
  const chosen = thrusters.find(({ id }) => id === turning.tried) ?? thrusters[0];
  if (!chosen)
    return <p className="aside">Enter the thrust of a thruster, and every station can be tried for it.</p>;
  const { throttle, speed } = turning;
  const start = () => studying.start(chosen.id, { throttle, vector: vectorAsked(craft, turning), speed });
  return (
    <>
      {thrusters.length > 1 && (
        <ChoiceField
          label="Thruster"
          value={chosen.id}
          choices={thrusters.map(({ id, name }) => ({ value: id, label: name || id }))}
          onCommit={(tried) => {
            turning.set({ tried });
            return null;
          }}
        />
      )}
      {studying.busy ? <Progress /> : <Buttons start={start} />}
      {studying.why && <p className={studying.points.length > 0 ? 'aside' : 'field-error'}>{studying.why}</p>}
      {studying.points.length > 0 && <Result />}
    </>
  );
}

function Progress() {
  const { share, stop } = useStudying();
  const { units } = useEditor();
  return (
    <div className="plan-status" role="status">
      <progress aria-label="Trying every station" value={share} />
      <span className="plan-words">{formatQuantity(share, 'fraction', units)} of the stations</span>
      <button type="button" onClick={stop}>
        Stop
      </button>
    </div>
  );
}

function Buttons({ start }: { start: () => void }) {
  const { part, close } = useStudying();
  return (
    <div className="plan-actions">
      <button type="button" className={part ? undefined : 'primary'} onClick={start}>
        {part ? 'Try every station again' : 'Try every station'}
      </button>
      {part && (
        <button type="button" onClick={close}>
          Close the study
        </button>
      )}
    </div>
  );
}

function Result() {
  const { craft } = useEditor();
  const studying = useStudying();
  const fresh = holdsFor(studying, craft);
  return (
    <>
      {!fresh && <p className="aside">Worked out before the last change: try every station again.</p>}
      <div className={fresh ? 'plan-answer' : 'plan-answer plan-old'}>
        <StudyTable fresh={fresh} />
      </div>
    </>
  );
}
