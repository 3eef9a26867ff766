/** A plan that was found: in a sentence, step by step, why not with less, and what to do with it. */
import { applyPlan } from '../../edit/edits/plan.ts';
import type { PlanReport } from '../../report/planReport.ts';
import type { PlanFound } from '../../report/plans.ts';
import { Caution } from '../Caution.tsx';
import { useEditor } from '../editor.ts';
import { MOST_KEPT, usePlanning } from './planning.ts';

interface PlanFoundViewProps {
  readonly plan: PlanFound;
  readonly report: PlanReport;
  /** Whether it is for the craft as it is now. */
  readonly fresh: boolean;
}

export function PlanFoundView({ plan, report, fresh }: PlanFoundViewProps) {
  const { apply, dragging } = useEditor();
  const { kept, keep } = usePlanning();
  // Not `disabled`, which would lose the focus each time that the plan is worked out anew.
  const ready = fresh && !dragging && report.steps.length > 0;
  return (
    <>
      <p className="plan-headline">{report.headline}</p>
      <p className="aside">{report.proof}</p>
      {report.steps.length > 0 && (
        <ol className="plan-steps" aria-label="Steps of the plan">
          {report.steps.map((each) => (
            <li key={each}>{each}</li>
          ))}
        </ol>
      )}
      <div className="plan-actions">
        <button
          type="button"
          className="primary"
          aria-disabled={!ready}
          onClick={() => ready && apply(applyPlan(plan.stowage))}
        >
          Apply the plan
        </button>
        <button
          type="button"
          disabled={kept.length >= MOST_KEPT}
          title={kept.length >= MOST_KEPT ? `${MOST_KEPT} plans are kept; drop one first` : undefined}
          onClick={() => keep(plan)}
        >
          Keep this plan
        </button>
        {kept.length > 0 && <span className="aside">{kept.length} kept below</span>}
      </div>
      <Binding plan={plan} binding={report.binding} />
      {report.cautions.map((caution) => (
        <Caution key={caution}>{caution}</Caution>
      ))}
    </>
  );
}

function Binding({ plan, binding }: { plan: PlanFound; binding: PlanReport['binding'] }) {
  const { dragging } = useEditor();
  const { busy } = usePlanning();
  if (binding.length === 0) return null;
  return (
    <>
      <h3>What stands in the way of less</h3>
      <ul className="plan-limits">
        {binding.map(({ name, sentence }) => (
          <li key={name}>{sentence}</li>
        ))}
      </ul>
      {!plan.bindingComplete && !dragging && !busy && (
        <p className="aside">Time ran out before every limit was tried.</p>
      )}
    </>
  );
}
