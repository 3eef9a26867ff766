/** What the plan panel is given: the plan as far as it is worked out, and the ways to ask for another. The page provides it. */
import { createContext, useContext } from 'react';
import type { Craft } from '../../craft/craft.ts';
import type { Stowage } from '../../craft/stowage.ts';
import type { CarryCurve, CarryLine, CarryTable, Plan, PlanFound, PlanProgress } from '../../report/plans.ts';
import type { OrderTried } from '../../report/wishOrders.ts';

/** The plan, and the plans put by. */
export interface PlansState {
  /** Whether the plan must hold for every mass within its tolerance. */
  readonly robust: boolean;
  /** The last answer, and the craft it was worked out for. */
  readonly answer: PlanAnswer | null;
  /** While the next is worked out: how far it is. */
  readonly progress: PlanProgress | null;
  readonly busy: boolean;
  /** A drag is on and there is something to choose: the plan waits for the release. */
  readonly waiting: boolean;
  /** Why there is no answer: the solver broke down, or was stopped before there was one. */
  readonly failure: string | null;
  readonly kept: readonly KeptPlan[];
  /** The kept plan that is looked at instead of the latest. */
  readonly shown: KeptPlan | null;
  /** The kept plan that it is compared with; null for today. */
  readonly beside: KeptPlan | null;
}

/** What can be carried where, as far as it was asked for. */
export interface CarriesState {
  readonly carry: CarryState;
  readonly table: TableState;
}

export interface PlanAnswer {
  readonly plan: Plan;
  readonly craft: Craft;
}

export interface KeptPlan {
  /** Counted from 1. */
  readonly number: number;
  readonly robust: boolean;
  readonly stowage: Stowage;
}

export interface CarryState {
  /** The line along which it is asked for; null while nobody asks. */
  readonly line: CarryLine | null;
  readonly curve: CarryCurve | null;
  readonly busy: boolean;
  /** Share done, 0 … 1. */
  readonly share: number;
  /** Why there is no curve. */
  readonly why: string | null;
  /** Which load a click on the curve hangs there; null for the first of the list. */
  readonly load: string | null;
}

export interface TableState {
  readonly table: CarryTable | null;
  /** The craft it was worked out for. */
  readonly craft: Craft | null;
  readonly busy: boolean;
  /** Why there is no table. */
  readonly why: string | null;
}

/** Plans for the other orders of the wishes, as far as they were asked for. */
export interface OrdersState {
  /** For what they are tried; null while nobody asked. */
  readonly asked: { readonly craft: Craft; readonly robust: boolean } | null;
  readonly tried: readonly OrderTried[];
  readonly busy: boolean;
  /** Why not all of them were tried. */
  readonly why: string | null;
}

export interface Planning extends PlansState, CarriesState {
  readonly orders: OrdersState;
  setRobust(robust: boolean): void;
  /** Works the plan out again, as after stopping. */
  again(): void;
  /** Takes the best that was found so far. */
  stop(): void;
  keep(plan: PlanFound): void;
  show(kept: KeptPlan | null): void;
  showBeside(kept: KeptPlan | null): void;
  drop(kept: KeptPlan): void;
  setLine(line: CarryLine | null): void;
  stopCarry(): void;
  setCarryLoad(load: string): void;
  workOutTable(): void;
  stopTable(): void;
  /** Plans for every other order of the wishes, beside the plan there is. */
  tryOrders(): void;
  stopOrders(): void;
}

/** As many plans as can be kept side by side. */
export const MOST_KEPT = 5;

export const NO_PLANS: PlansState = {
  robust: false,
  answer: null,
  progress: null,
  busy: false,
  waiting: false,
  failure: null,
  kept: [],
  shown: null,
  beside: null,
};

export const NO_CARRIES: CarriesState = {
  carry: { line: null, curve: null, busy: false, share: 0, why: null, load: null },
  table: { table: null, craft: null, busy: false, why: null },
};

export const NO_ORDERS: OrdersState = { asked: null, tried: [], busy: false, why: null };

export const PlanningContext = createContext<Planning | null>(null);

/** The planning around this component. Throws outside of one: that is a mistake in the page, not in a craft. */
export function usePlanning(): Planning {
  const planning = useContext(PlanningContext);
  if (!planning) throw new Error('usePlanning needs a PlanningContext around it');
  return planning;
}
