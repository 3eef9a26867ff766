/** The plan with where everything is once it is carried out, worked out anew only when one of them changes. */
import { useMemo } from 'react';
import { type Planned, type PlanSubject, plannedOf } from '../scene/planned.ts';
import type { Geometry } from '../scene/subject.ts';

export function usePlanned({ plan, planned }: PlanSubject, today: Geometry): Planned | null {
  return useMemo(
    () => plannedOf({ plan: plan ?? null, planned: planned ?? null }, today),
    [plan, planned, today],
  );
}
