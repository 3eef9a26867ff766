/** What a plan and a carry curve are, for the layers that show them and do not see the physics. */
export type { CarryCurve, CarryLine, CarryPoint } from '../physics/ballast/carry.ts';
export type { CarryTable, LoadRow } from '../physics/ballast/carryTable.ts';
export type { Plan, PlanFound, PlanProgress } from '../physics/ballast/plan.ts';
