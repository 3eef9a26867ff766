/**
 * What is known of how the craft turns. The cheap figures follow every change at once. The simulated ones, some tens of
 * milliseconds, wait until the hand rests; those of before stand until then.
 */
import { useEffect, useMemo, useState } from 'react';
import type { Craft } from '../../craft/craft.ts';
import {
  type TurnFigures,
  type TurnReport,
  turnFigures,
  turnReport,
} from '../../report/turning/turnReport.ts';
import type { TurnAsked } from '../../report/turning/turns.ts';
import type { UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { askedOf } from './asked.ts';
import { useTurning } from './turning.ts';

interface Question {
  readonly craft: Craft;
  readonly asked: TurnAsked;
  readonly units: UnitSystem;
}

export interface ReportNow {
  readonly report: TurnReport;
  /** Whether it is of the craft as it is now. */
  readonly fresh: boolean;
  readonly figures: TurnFigures;
}

/** Milliseconds without a further change. */
const PAUSE = 120;

/** Null until the first report is there. */
export function useTurnReport(): ReportNow | null {
  const { craft, units } = useEditor();
  const turning = useTurning();
  const { throttle, vector, speed } = askedOf(craft, turning);
  const now: Question = useMemo(
    () => ({ craft, asked: { throttle, vector, speed }, units }),
    [craft, throttle, vector, speed, units],
  );
  const [answered, setAnswered] = useState<Question | null>(null);
  const first = answered === null;
  useEffect(() => {
    const timer = setTimeout(() => setAnswered(now), first ? 0 : PAUSE);
    return () => clearTimeout(timer);
  }, [now, first]);
  return (
    answered && {
      report: turnReport(answered.craft, answered.asked, answered.units),
      fresh: answered === now,
      figures: turnFigures(craft, now.asked, units),
    }
  );
}
