/** What the drawing is given of the plan while the plan is in front. */
import { useMemo } from 'react';
import { withStation } from '../craft/station.ts';
import { hangLoad } from '../edit/edits/carry.ts';
import type { Editor } from '../panels/editor.ts';
import { type Planning, usePlanning } from '../panels/plan/planning.ts';
import type { Assessment } from '../report/assessment.ts';
import type { CarryCurve } from '../report/plans.ts';
import { type PlanToDraw, stowageToDraw } from '../report/planView.ts';
import { assessed } from './assessed.ts';

export interface PlanDrawn {
  /** Whether the plan is in front: where loads may go is drawn only then. */
  readonly planning: boolean;
  readonly plan: PlanToDraw | null;
  /** The craft with the plan carried out. */
  readonly planned: Assessment | null;
  readonly carry: CarryCurve | null;
  readonly onCarryAt: (station: number) => void;
}

export function usePlanDrawn(editor: Editor, inFront: boolean): PlanDrawn {
  const planning = usePlanning();
  const { units } = editor;
  const plan = useMemo(() => (inFront ? planToDraw(planning, editor) : null), [inFront, planning, editor]);
  return {
    planning: inFront,
    plan,
    planned: plan && assessed(plan.craft, units),
    carry: inFront ? planning.carry.curve : null,
    onCarryAt: (station) => hangAt(editor, planning, station),
  };
}

/** The kept plan that is looked at, else the latest; on the craft as it is now. */
function planToDraw({ shown, answer }: Planning, { craft }: Editor): PlanToDraw | null {
  if (shown) return stowageToDraw(craft, shown.stowage);
  if (!answer || 'why' in answer.plan) return null;
  return answer.craft === craft ? answer.plan : stowageToDraw(craft, answer.plan.stowage);
}

/** Hangs the chosen load on the line of the curve; else the one that is selected, else the first. */
function hangAt({ craft, selection, apply, notify }: Editor, { carry }: Planning, station: number): void {
  const on = carry.curve?.points[0]?.place;
  const selected = selection.find(({ kind, id }) => kind === 'part' && id in craft.loads.byId)?.id;
  const load = craft.loads.byId[carry.load ?? selected ?? craft.loads.order[0] ?? ''];
  if (!on) return;
  if (load) apply(hangLoad(load, withStation(on, station)));
  else notify('There is no useful load to hang there: add one in the Plan panel.');
}
