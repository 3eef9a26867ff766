/** What the plan panel and the drawing are given of the plan, made from the store. */
import { useEffect, useMemo, useState } from 'react';
import type { Planning } from '../panels/plan/planning.ts';
import type { Subject } from '../panels/turn/turning.ts';
import type { PlanClient } from '../worker/planClient.ts';
import { Carries } from './carries.ts';
import { useCell } from './cell.ts';
import { keptPlans, putKeptPlans } from './keptPlans.ts';
import { Orders } from './orders.ts';
import { Plans } from './plans.ts';
import type { Store } from './store.ts';

export function usePlanningOf(store: Store, client: PlanClient, subject: Subject): Planning {
  const [{ plans, carries, orders }] = useState(() => begin(store, client));
  const plansState = useCell(plans.state);
  const carriesState = useCell(carries.state);
  const ordersState = useCell(orders.state);
  const { tab } = useCell(store.view);
  const inFront = tab === 'plan';
  const looked = inFront || (tab === 'turn' && subject === 'planned');
  useEffect(() => plans.lookAt(looked), [plans, looked]);
  useEffect(() => carries.lookAt(inFront), [carries, inFront]);
  return useMemo(
    () => ({
      ...plansState,
      ...carriesState,
      orders: ordersState,
      setRobust: (robust) => {
        orders.forget();
        plans.setRobust(robust);
        carries.setRobust(robust);
      },
      again: plans.again,
      stop: plans.stop,
      keep: (plan) => {
        plans.keep(plan);
        putBy(store, plans);
      },
      show: plans.show,
      showBeside: plans.showBeside,
      drop: (kept) => {
        plans.drop(kept);
        putBy(store, plans);
      },
      setLine: carries.setLine,
      stopCarry: carries.stopCurve,
      setCarryLoad: carries.setLoad,
      workOutTable: carries.workOutTable,
      stopTable: carries.stopTable,
      tryOrders: () => plansState.answer && orders.start(plansState.answer),
      stopOrders: orders.stop,
    }),
    [plansState, carriesState, ordersState, plans, carries, orders, store],
  );
}

/** So that they are there on the next visit too. */
function putBy({ keep, craftId, notices }: Store, { state }: Plans): void {
  putKeptPlans(keep, craftId, state.get().kept).catch(() =>
    notices.add('This browser could not keep the plans put by: they last as long as this page.', 'bad'),
  );
}

async function bringBack(store: Store, plans: Plans): Promise<void> {
  const { craftId } = store;
  const kept = await keptPlans(store.keep, craftId);
  if (store.craftId === craftId) plans.bringBack(kept);
}

/** On another craft everything begins afresh, but for the plans put by for it. */
function begin(store: Store, client: PlanClient): { plans: Plans; carries: Carries; orders: Orders } {
  const plans = new Plans(store.shown, client);
  const carries = new Carries(store.shown, client);
  const orders = new Orders(store.shown, client);
  void bringBack(store, plans);
  let { craftId } = store;
  store.shown.subscribe(() => {
    if (store.craftId === craftId) return;
    craftId = store.craftId;
    plans.forget();
    carries.forget();
    orders.forget();
    void bringBack(store, plans);
  });
  return { plans, carries, orders };
}
