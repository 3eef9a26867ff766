/** The ballast plan and what can be carried where, as views are handed them; each is missing when there is none to show. */
import type { Assessment } from '../report/assessment.ts';
import { type CurveToDraw, type PlanToDraw, type PlanView, planView } from '../report/planView.ts';
import { type Geometry, geometryOf } from './subject.ts';

export type { CurveToDraw, PlanToDraw };

export interface PlanSubject {
  /** Whether the plan is in front: where loads may go is drawn only then, by default false. */
  readonly planning?: boolean;
  readonly plan?: PlanToDraw | null;
  /** The craft with the plan carried out. */
  readonly planned?: Assessment | null;
}

export interface CarrySubject {
  readonly carry?: CurveToDraw | null;
  /** Asked to hang a load at a station, m. */
  readonly onCarryAt?: (station: number) => void;
}

/** A plan with where everything is once it is carried out. */
export interface Planned extends PlanView {
  readonly plan: PlanToDraw;
  readonly after: Geometry;
}

export function plannedOf({ plan, planned }: PlanSubject, today: Geometry): Planned | null {
  const after = planned ? geometryOf(planned) : null;
  return plan && after ? { plan, after, ...planView(plan, today, after) } : null;
}
