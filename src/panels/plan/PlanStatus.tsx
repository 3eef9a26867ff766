/** How the plan is asked for and how far it is. */
import type { PlanProgress } from '../../report/plans.ts';
import { formatQuantity } from '../../units/format.ts';
import type { UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { usePlanning } from './planning.ts';

export function PlanStatus() {
  const { units } = useEditor();
  const { robust, setRobust, busy, progress, waiting, failure, answer, stop, again } = usePlanning();
  const stopped = answer !== null && answer.plan.status === 'stopped';
  return (
    <>
      <CheckField label="Hold for every mass within its tolerance" value={robust} onCommit={setRobust} />
      <div className="plan-status" role="status">
        {failure && <p className="field-error">{failure}</p>}
        {busy && (
          <>
            <progress aria-label="Working out the plan" />
            <span>{progressWords(progress, units)}</span>
          </>
        )}
        {waiting && !busy && (
          <span className="aside">There is something to choose: the plan follows on release.</span>
        )}
      </div>
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
    </>
  );
}

function progressWords(progress: PlanProgress | null, units: UnitSystem): string {
  if (!progress) return 'Working out the plan…';
  if (progress.step === 'explaining') return 'Finding out what stands in the way of less…';
  const grams = (mass: number) => formatQuantity(mass, 'mass', units);
  const best = progress.deadBallast === null ? 'no plan yet' : `best so far ${grams(progress.deadBallast)}`;
  return progress.bound === null
    ? `Searching: ${best}.`
    : `Searching: ${best}, none below ${grams(progress.bound)}.`;
}
