/** What turning says to its two targets, a line each; loaded once one of them is set, so that the opening page stays light. */
import type { TurnVerdict } from '../../report/turning/turnVerdicts.ts';
import { useTurnReport } from './useTurnReport.ts';

export function TargetVerdicts() {
  const now = useTurnReport();
  return <VerdictLines verdicts={now?.report.verdicts ?? null} fresh={now?.fresh ?? false} />;
}

interface VerdictLinesProps {
  /** Null until they are worked out. */
  readonly verdicts: readonly TurnVerdict[] | null;
  /** Whether they are of the craft as it is now. */
  readonly fresh: boolean;
}

export function VerdictLines({ verdicts, fresh }: VerdictLinesProps) {
  if (!verdicts) return <p className="aside">Working out how it turns…</p>;
  return verdicts.map((verdict) => (
    <p key={verdict.key} className={verdict.state === 'missed' ? 'amiss' : 'aside'} aria-busy={!fresh}>
      {lineOf(verdict)}
    </p>
  ));
}

/** "Turns 90°, 4.7 s: quick enough." A target that is missed says what thrust it would take. */
function lineOf({ title, figure, word, state, need }: TurnVerdict): string {
  const help = state === 'missed' ? need.find((sentence) => sentence.startsWith('Thrust')) : undefined;
  return [`${title}, ${figure}: ${word}.`, help].filter(Boolean).join(' ');
}
