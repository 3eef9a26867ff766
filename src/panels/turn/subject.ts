/** Of which craft the figures are: as it hangs now, or with its ballast plan carried out; and what there is to say of that. */
import type { Craft } from '../../craft/craft.ts';
import { planReport } from '../../report/planReport.ts';
import type { PlanFound } from '../../report/plans.ts';
import { plannedWords } from '../../report/planWords.ts';
import { inUnits } from '../../units/sentence.ts';
import type { UnitSystem } from '../../units/units.ts';
import type { PlansState } from '../plan/planning.ts';

export interface SubjectNow {
  /** What is carried out; null for the craft as it is. */
  readonly plan: PlanFound | null;
  /** Whether the plan is still to come: what stands there is of before. */
  readonly waits: boolean;
  readonly words: string;
}

export const AS_IT_IS: SubjectNow = { plan: null, waits: false, words: '' };

type PlansNow = Pick<PlansState, 'answer' | 'robust' | 'failure'>;

/** With the plan asked for. During a drag it waits for the release: the figures would come and go with every frame. */
export function plannedSubject(
  { craft, units, dragging }: { craft: Craft; units: UnitSystem; dragging: boolean },
  { answer, robust, failure }: PlansNow,
): SubjectNow {
  if (dragging) return waiting('The ballast plan is worked out anew on release.');
  if (answer?.craft !== craft || answer.plan.robust !== robust) {
    return failure ? without(failure) : waiting('Working out the ballast plan…');
  }
  const { plan } = answer;
  if ('why' in plan) return without(planReport(craft, plan, units).headline);
  return { plan, waits: false, words: `${inUnits(plannedWords(craft, plan), units)} ${DRAWN}` };
}

const DRAWN = 'The drawing shows the craft as it is.';

const waiting = (what: string): SubjectNow => ({
  plan: null,
  waits: true,
  words: `${what} Until then the figures are those of before.`,
});

const without = (why: string): SubjectNow => ({
  plan: null,
  waits: false,
  words: `There is no ballast plan to carry out: these are the figures of the craft as it is. ${why}`,
});
