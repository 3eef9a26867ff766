/** The ballast plan of the craft as it is, and everything it may choose from. */
import { useMemo } from 'react';
import { planReport } from '../../report/planReport.ts';
import { useEditor } from '../editor.ts';
import { CarrySection } from './CarrySection.tsx';
import { Compared } from './Compared.tsx';
import { Foldable } from './Foldable.tsx';
import { Freedoms } from './Freedoms.tsx';
import { KeptPlans } from './KeptPlans.tsx';
import { LeadPieces } from './LeadPieces.tsx';
import { LoadList } from './LoadList.tsx';
import { PlanFoundView } from './PlanFoundView.tsx';
import { PlanNotFoundView } from './PlanNotFoundView.tsx';
import { PlanStatus } from './PlanStatus.tsx';
import { type PlanAnswer, usePlanning } from './planning.ts';
import { WishList } from './WishList.tsx';
import './plan.css';

export function PlanPanel() {
  const { craft } = useEditor();
  const { answer } = usePlanning();
  return (
    <>
      <section className="panel plan" aria-label="Ballast plan">
        <PlanStatus />
        {answer && <Answer answer={answer} />}
      </section>
      <section className="panel plan" aria-label="What the plan may choose from">
        <KeptPlans />
        <Foldable title="Wishes" note={`${craft.wishes.length} in order`}>
          <WishList />
        </Foldable>
        <Foldable title="Hardpoints and slides" note="">
          <Freedoms />
        </Foldable>
        <Foldable title="Useful loads" note={counted(craft.loads.order.length)}>
          <LoadList />
        </Foldable>
        <Foldable
          title="Pieces of lead"
          note={craft.pieces.length === 0 ? 'none' : counted(craft.pieces.length)}
        >
          <LeadPieces />
        </Foldable>
        <Foldable title="What can I carry where" note="">
          <CarrySection />
        </Foldable>
      </section>
    </>
  );
}

const counted = (count: number): string => (count === 0 ? 'none' : String(count));

function Answer({ answer: { plan, craft } }: { answer: PlanAnswer }) {
  const { craft: now, units } = useEditor();
  const { waiting } = usePlanning();
  const report = useMemo(() => planReport(craft, plan, units), [craft, plan, units]);
  if ('why' in plan) return <PlanNotFoundView plan={plan} report={report} />;
  return (
    <div className={waiting ? 'plan-answer plan-old' : 'plan-answer'}>
      <PlanFoundView plan={plan} report={report} fresh={craft === now} />
      <Compared
        title="Today and with the plan"
        sides={[
          { head: 'Today', craft },
          { head: 'Plan', craft: plan.craft },
        ]}
      />
    </div>
  );
}
