/** How the plan is asked for and how far it is. */
import type { PlanProgress } from '../../report/plans.ts';
import { formatQuantity } from '../../units/format.ts';
import type { UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { usePlanning } from './planning.ts';

export function PlanStatus() {
  const { robust, setRobust, busy, failure, answer, shown, stop, again } = usePlanning();
  const stopped = answer?.plan.status === 'stopped';
  return (
    <>
      <CheckField label="Hold for every mass within its tolerance" value={robust} onCommit={setRobust} />
      {/* Always as high as a button, so that nothing below it jumps while plans come and go. */}
      <div className="plan-status" data-busy={busy}>
        <StatusWords />
        {busy && (
          <button type="button" onClick={stop}>
            Stop
          </button>
        )}
        {!busy && (stopped || failure) && (
          <button type="button" onClick={again}>
            Work it out again
          </button>
        )}
      </div>
      {shown && <p className="aside">The drawing shows kept plan {shown.number}.</p>}
    </>
  );
}

function StatusWords() {
  const { craft, units } = useEditor();
  const { busy, progress, waiting, failure, answer } = usePlanning();
  if (failure) return <p className="field-error">{failure}</p>;
  if (busy) {
    return (
      <>
        <progress aria-label="Working out the plan" />
        <span className="plan-words">{progressWords(progress, units)}</span>
      </>
    );
  }
  const words = waiting
    ? 'Below is the plan from before this drag; with something to choose, the new one comes on release.'
    : answer?.craft === craft
      ? 'Up to date.'
      : '';
  return (
    <span className="aside plan-words" role="status">
      {words}
    </span>
  );
}

function progressWords(progress: PlanProgress | null, units: UnitSystem): string {
  if (!progress) return 'Working out the plan…';
  if (progress.step === 'explaining') return 'Finding out what stands in the way of less…';
  const mass = (value: number) => formatQuantity(value, 'mass', units);
  const best = progress.deadBallast === null ? 'no plan yet' : `best so far ${mass(progress.deadBallast)}`;
  return progress.bound === null
    ? `Searching: ${best}.`
    : `Searching: ${best}, none below ${mass(progress.bound)}.`;
}
