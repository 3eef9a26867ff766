/** Where a thruster had better sit: every station tried, the best of them in a list, the curves under the side view. */
import { useMemo, useRef } from 'react';
import { listed } from '../../craft/craft.ts';
import { placeReport } from '../../report/turning/placeReport.ts';
import { toldPlace } from '../../report/turning/placeWords.ts';
import { formatQuantity } from '../../units/format.ts';
import { inUnits } from '../../units/sentence.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { askedOf } from './asked.ts';
import { StudyTable, TODAY } from './StudyTable.tsx';
import { holdsFor, isThere } from './studyCraft.ts';
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
      <Run start={start} />
      {studying.why && (
        <p className={studying.points.length > 0 ? 'aside' : 'field-error'}>{inUnits(studying.why, units)}</p>
      )}
      {studying.points.length > 0 && <Result />}
    </>
  );
}

/** The first button is one and the same all the while, so that whoever works by keys stays on it. */
function Run({ start }: { start: () => void }) {
  const { part, busy, share, complete, points, goOn, stop, close } = useStudying();
  const { units } = useEditor();
  const first = useRef<HTMLButtonElement>(null);
  const stopped = !busy && !complete && points.length > 0;
  const begin = () => {
    first.current?.focus();
    start();
  };
  const label = part ? 'Try every station again' : 'Try every station';
  return (
    <div className={busy ? 'plan-status' : 'plan-actions'}>
      {busy && <progress aria-label="Trying every station" value={share} />}
      {busy && (
        <span className="plan-words" role="status">
          {formatQuantity(share, 'fraction', units)} of the stations
        </span>
      )}
      <button
        key="first"
        ref={first}
        type="button"
        className={busy || (part && !stopped) ? undefined : 'primary'}
        onClick={busy ? stop : stopped ? goOn : start}
      >
        {busy ? 'Stop' : stopped ? 'Go on' : label}
      </button>
      {stopped && (
        <button type="button" onClick={begin}>
          {label}
        </button>
      )}
      {!busy && part && (
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
  const { craft: then, part, points, today, complete } = studying;
  const moved = !isThere(today, craft.parts.byId[part ?? '']);
  const told = useMemo(() => {
    if (!then || part === null || !today) return null;
    const study = { part, points, today, complete };
    const place = toldPlace(study, then.targets);
    const open = place === today ? TODAY : (place?.station ?? null);
    return { ...placeReport(then, study, units, moved), open };
  }, [then, part, points, today, complete, units, moved]);
  if (!told) return null;
  const several = listed(craft.parts).filter(({ thruster }) => thruster).length > 1;
  return (
    <>
      {!fresh && <p className="aside">Worked out before the last change: try every station again.</p>}
      <div className={fresh ? 'plan-answer' : 'plan-answer plan-old'}>
        <p className="study-headline">
          {!complete && 'So far: '}
          {several && <strong>{craft.parts.byId[part!]?.name || part}: </strong>}
          {told.headline}
        </p>
        <StudyTable fresh={fresh} told={told.open} moved={moved} />
        <Sentences title="What is in the way" sentences={told.obstacles} open={told.open === null} />
        <Sentences title="What the figures are of" sentences={told.notes} />
      </div>
    </>
  );
}

interface SentencesProps {
  readonly title: string;
  readonly sentences: readonly string[];
  /** Whether they stand open at first. */
  readonly open?: boolean;
}

function Sentences({ title, sentences, open = false }: SentencesProps) {
  if (sentences.length === 0) return null;
  return (
    <details className="load" open={open}>
      <summary>{title}</summary>
      <ul className="plan-limits">
        {sentences.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </details>
  );
}
