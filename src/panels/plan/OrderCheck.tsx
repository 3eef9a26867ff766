/** Whether the wishes in another order would make another plan, tried when asked for. */
import { useMemo } from 'react';
import { setWishes } from '../../edit/edits/craft.ts';
import type { PlanFound } from '../../report/plans.ts';
import { isProven, type OrderTried, orderReport, otherOrders } from '../../report/wishOrders.ts';
import { useEditor } from '../editor.ts';
import { usePlanning } from './planning.ts';

/** Only beside a plan that was searched to its end: another could be told apart from no other. */
export function OrderCheck() {
  const { craft, dragging } = useEditor();
  const { answer, busy, orders, tryOrders, stopOrders } = usePlanning();
  const plan = answer?.craft === craft && !busy && !dragging && isProven(answer.plan) ? answer.plan : null;
  const count = otherOrders(craft.wishes).length;
  if (!plan || count === 0) return null;
  return (
    <>
      <div className="plan-status">
        {/* One button for both, so that the focus stays. */}
        <button type="button" onClick={orders.busy ? stopOrders : tryOrders}>
          {orders.busy ? 'Stop' : 'Would another order change it?'}
        </button>
        {orders.busy && (
          <progress aria-label="Trying the other orders" value={orders.tried.length} max={count} />
        )}
      </div>
      {orders.why && <p className="field-error">{orders.why}</p>}
      {orders.tried.length === count && !orders.busy && <Tried plan={plan} tried={orders.tried} />}
    </>
  );
}

function Tried({ plan, tried }: { plan: PlanFound; tried: readonly OrderTried[] }) {
  const { craft, units, apply } = useEditor();
  const { others, open } = useMemo(() => orderReport(craft, plan, tried, units), [craft, plan, tried, units]);
  const all = tried.length === 1 ? 'the other one was tried' : `the other ${tried.length} were tried`;
  return (
    <div role="status">
      {others.length > 0 && (
        <ul className="plan-remedies" aria-label="Orders that change the plan">
          {others.map(({ order, sentence }) => (
            <li key={order.join()}>
              {sentence}
              <button type="button" onClick={() => apply(setWishes(order))}>
                Take it
              </button>
            </li>
          ))}
        </ul>
      )}
      {others.length + open === 0 && <p>Another order would not change this plan: {all}.</p>}
      {open > 0 && (
        <p className="aside">
          {open} of {tried.length} other orders could not be searched to the end: what they would change is
          not known.
        </p>
      )}
    </div>
  );
}
