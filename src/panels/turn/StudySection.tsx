/** Where a thruster had better sit: every station tried, the best of them in a list, the curves under the side view. */
import { useMemo } from 'react';
import { listed } from '../../craft/craft.ts';
import { placeReport } from '../../report/turning/placeReport.ts';
import { toldPlace } from '../../report/turning/placeWords.ts';
import { formatQuantity } from '../../units/format.ts';
import { inUnits } from '../../units/sentence.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { askedOf } from './asked.ts';
import { StudyTable } from './StudyTable.tsx';
import { holdsFor } from './studyCraft.ts';
import { useStudying } from './studying.ts';
import { useTurning } from './turning.ts';

export function StudySection() {
  const { craft, units } = useEditor();
  const turning = useTurning();
  const studying = useStudying();
  const thrusters = listed(craft.parts).filter(({ thruster }) => thruster);
  const chosen = thrusters.find(({ id }) => id === turning.tried) ?? thrusters[0];
  if (!chosen)
    return <p className="aside">Enter the thrust of a thruster, and every station can be tried for it.</p>;
  const start = () => studying.start(chosen.id, askedOf(craft, turning));
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
      {studying.why && (
        <p className={studying.points.length > 0 ? 'aside' : 'field-error'}>{inUnits(studying.why, units)}</p>
      )}
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
  const { craft, units } = useEditor();
  const studying = useStudying();
  const fresh = holdsFor(studying, craft, useTurning());
  const { craft: then, part, points, today, complete, busy } = studying;
  const told = useMemo(() => {
    if (!then || part === null || !today) return null;
    const study = { part, points, today, complete };
    const station = toldPlace(study, then.targets)?.station ?? null;
    return { ...placeReport(then, study, units), station };
  }, [then, part, points, today, complete, units]);
  if (!told) return null;
  const several = listed(craft.parts).filter(({ thruster }) => thruster).length > 1;
  return (
    <>
      {!fresh && <p className="aside">Worked out before the last change: try every station again.</p>}
      <div className={fresh ? 'plan-answer' : 'plan-answer plan-old'}>
        <p className="study-headline">
          {busy && 'So far: '}
          {several && <strong>{craft.parts.byId[part!]?.name || part}: </strong>}
          {told.headline}
        </p>
        <StudyTable fresh={fresh} told={told.station} />
        <Sentences title="What is in the way" sentences={told.obstacles} />
        <Sentences title="What the figures are of" sentences={told.notes} />
      </div>
    </>
  );
}

function Sentences({ title, sentences }: { title: string; sentences: readonly string[] }) {
  if (sentences.length === 0) return null;
  return (
    <details className="load">
      <summary>{title}</summary>
      <ul className="plan-limits">
        {sentences.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </details>
  );
}
