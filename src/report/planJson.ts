/** A plan as JSON: SI units throughout, sentences beside the figures. */
import type { Craft } from '../craft/craft.ts';
import type { Plan } from '../physics/ballast/plan.ts';
import type { UnitSystem } from '../units/units.ts';
import { marginalUnit, planReport } from './planReport.ts';

export function planJson(craft: Craft, plan: Plan, units: UnitSystem = 'metric'): Record<string, unknown> {
  const report = planReport(craft, plan, units);
  const { headline, proof } = report;
  const common = { status: plan.status, robust: plan.robust, headline, proof };
  if ('why' in plan) {
    return {
      plan: {
        ...common,
        why: plan.why,
        relaxations: report.remedies.map(({ name, relaxation, now, deadBallast, sentence }) => ({
          limit: name,
          now,
          to: 'to' in relaxation ? relaxation.to : null,
          deadBallast,
          sentence,
        })),
        relaxationsComplete: plan.remediesComplete,
      },
    };
  }
  return {
    plan: {
      ...common,
      deadBallast: plan.deadBallast,
      deadBallastToday: plan.deadBallastToday,
      deadBallastFixed: plan.deadBallastFixed,
      weights: plan.weights,
      slides: plan.slides,
      loads: plan.loads.map(({ load, place, hardpoint }) => ({ load, place, hardpoint })),
      after: report.after,
      binding: report.binding.map(({ name, marginal, limit, now, step, saving, sentence }) => ({
        limit: name,
        marginal,
        unit: marginalUnit(limit),
        now,
        step,
        saving,
        sentence,
      })),
      bindingComplete: plan.bindingComplete,
      // JSON has no infinity: without a bound there is no gap to tell.
      gap: Number.isFinite(plan.gap) ? plan.gap : null,
      bound: plan.bound,
      wishesProven: plan.wishesProven,
      disagreement: plan.disagreement,
    },
  };
}
