/**
 * What is known of how the craft turns. The cheap figures follow every change at once. The simulated ones, some tens of
 * milliseconds, wait until the hand rests; those of before stand until then, as they do while a plan is worked out.
 */
import { useEffect, useMemo, useState } from 'react';
import type { Craft } from '../../craft/craft.ts';
import { type Stowage, stowed } from '../../craft/stowage.ts';
import {
  type TurnFigures,
  type TurnReport,
  turnFigures,
  turnReport,
} from '../../report/turning/turnReport.ts';
import type { TurnAsked } from '../../report/turning/turns.ts';
import type { UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { usePlanning } from '../plan/planning.ts';
import { askedOf } from './asked.ts';
import { AS_IT_IS, plannedSubject, type SubjectNow } from './subject.ts';
import { useTurning } from './turning.ts';

interface Question {
  readonly craft: Craft;
  readonly asked: TurnAsked;
  readonly units: UnitSystem;
}

export interface ReportNow {
  readonly report: TurnReport;
  /** Whether it is of the craft as it is now, or as it is planned now. */
  readonly fresh: boolean;
  readonly figures: TurnFigures;
  readonly subject: SubjectNow;
}

/** Milliseconds without a further change. */
const PAUSE = 120;

/** Null until the first report is there. */
export function useTurnReport(): ReportNow | null {
  const editor = useEditor();
  const { units } = editor;
  const turning = useTurning();
  const planning = usePlanning();
  const { throttle, vector, speed } = askedOf(editor.craft, turning);
  const subject = turning.subject === 'planned' ? plannedSubject(editor, planning) : AS_IT_IS;
  const asMeant = useStowed(editor.craft, subject.plan);
  const [answered, setAnswered] = useState<Question | null>(null);
  const craft = subject.waits && answered ? answered.craft : asMeant;
  const now: Question = useMemo(
    () => ({ craft, asked: { throttle, vector, speed }, units }),
    [craft, throttle, vector, speed, units],
  );
  const first = answered === null;
  useEffect(() => {
    const timer = setTimeout(() => setAnswered(now), first ? 0 : PAUSE);
    return () => clearTimeout(timer);
  }, [now, first]);
  return (
    answered && {
      report: turnReport(answered.craft, answered.asked, answered.units),
      fresh: answered === now && !subject.waits,
      figures: turnFigures(craft, now.asked, units),
      subject,
    }
  );
}

/** The same craft for as long as the stowage says the same: the planning thread tells one plan more than once. */
function useStowed(craft: Craft, plan: { readonly stowage: Stowage } | null): Craft {
  const stowage = plan && JSON.stringify(plan.stowage);
  return useMemo(() => (stowage ? stowed(craft, JSON.parse(stowage) as Stowage) : craft), [craft, stowage]);
}
