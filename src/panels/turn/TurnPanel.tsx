/** How the craft turns, climbs and flies, as it is or as its ballast plan would have it, and where a thruster had better sit. */
import type { ReactNode } from 'react';
import { HAZARDS } from '../../report/hazards.ts';
import { TETHER } from '../../report/turning/turnCautions.ts';
import type { TurnReport } from '../../report/turning/turnReport.ts';
import type { Turn } from '../../report/turning/turns.ts';
import { Caution } from '../Caution.tsx';
import { useEditor } from '../editor.ts';
import { useFigureSheet } from '../FigureSheet.tsx';
import { Foldable } from '../plan/Foldable.tsx';
import { MomentBars } from './MomentBars.tsx';
import { StudySection } from './StudySection.tsx';
import { TurnAnswer } from './TurnAnswer.tsx';
import { SubjectChoice, TurnControls } from './TurnControls.tsx';
import { TurnFigures } from './TurnFigures.tsx';
import { type ReportNow, useTurnReport } from './useTurnReport.ts';
import './turn.css';

interface TurnPanelProps {
  /** Plays the path of the turn; the page puts it in, since panels do not draw. */
  player(turn: Turn): ReactNode;
  /** Brings the targets to the front. */
  onTargets(): void;
}

export function TurnPanel(props: TurnPanelProps) {
  const now = useTurnReport();
  return now ? <TurnSheet now={now} {...props} /> : <p className="panel aside">Working out how it turns…</p>;
}

export function TurnSheet({ now, player, onTargets }: TurnPanelProps & { now: ReportNow }) {
  const { report, fresh, figures, subject } = now;
  const sheet = useFigureSheet();
  const old = fresh ? '' : 'plan-old';
  // What follows at once stands among what is of before the last change.
  const all = fresh ? report.rows : { ...report.rows, ...figures.rows };
  const rows = report.turn ? all : told(all);
  return (
    <>
      <section className="panel turn" aria-label="Turning" ref={sheet.frame}>
        <div className={`plan-answer ${old}`}>
          <TurnAnswer report={report} onTargets={onTargets} />
        </div>
        <div className={subject.waits ? 'plan-old' : ''}>
          <MomentBars rows={rows} need={report.need} />
        </div>
        <SubjectChoice words={subject.words} />
        {report.turn && <TurnControls />}
        {report.turn && (
          <Foldable title="Path of the turn" note="">
            <div className={old}>{player(report.turn)}</div>
          </Foldable>
        )}
        <Foldable title="Where should it sit?" note="" open>
          <StudySection />
        </Foldable>
        <div className={`turn-figures ${subject.waits ? 'plan-old' : ''}`}>
          <TurnFigures
            report={report}
            rows={rows}
            sheet={sheet}
            isOld={(key) => !fresh && !subject.waits && !(key in figures.rows)}
          />
        </div>
      </section>
      <Cautions report={report} />
    </>
  );
}

/** Of a craft without thrust only what can be said: the sentence on top says why there is no more. */
const told = (rows: TurnReport['rows']): TurnReport['rows'] =>
  Object.fromEntries(Object.entries(rows).filter(([, { value }]) => value !== null));

function Cautions({ report: { cautions } }: { report: TurnReport }) {
  const { craft } = useEditor();
  const thrusters = craft.parts.order.some((id) => craft.parts.byId[id]!.kind === 'thruster');
  return (
    <section className="panel turn" aria-label="What to mind">
      {cautions.map((caution) => (
        <Caution key={caution}>{caution}</Caution>
      ))}
      {thrusters && <Caution>{HAZARDS.thruster}</Caution>}
      <Caution>{HAZARDS.people}</Caution>
      <Caution>{TETHER}</Caution>
    </section>
  );
}
