/** No plan: why, and the single changes that would let one be made, each ready to be carried out. */
import { applyRelaxation } from '../../edit/edits/plan.ts';
import type { PlanReport } from '../../report/planReport.ts';
import type { Plan } from '../../report/plans.ts';
import { useEditor } from '../editor.ts';

interface PlanNotFoundViewProps {
  readonly plan: Extract<Plan, { why: string }>;
  readonly report: PlanReport;
}

export function PlanNotFoundView({ plan, report }: PlanNotFoundViewProps) {
  const { apply } = useEditor();
  return (
    <>
      <p className="plan-headline">{report.headline}</p>
      {report.proof && <p>{report.proof}</p>}
      {report.remedies.length > 0 && (
        <ul className="plan-remedies" aria-label="What would help">
          {report.remedies.map(({ name, sentence, relaxation }) => (
            <li key={name}>
              <span id={remedyId(name)}>{sentence}</span>
              <button
                type="button"
                aria-describedby={remedyId(name)}
                onClick={() => apply(applyRelaxation(relaxation))}
              >
                Do this
              </button>
            </li>
          ))}
        </ul>
      )}
      {report.remedies.length > 0 && !plan.remediesComplete && (
        <p className="aside">Time ran out before every limit was tried: there may be more.</p>
      )}
    </>
  );
}

/** Ids hold no blanks. */
const remedyId = (name: string): string => `remedy-${name.replaceAll(' ', '-')}`;
