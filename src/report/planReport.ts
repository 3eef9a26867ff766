/** A plan for reading: one sentence on top, what to do, how the craft then floats, what binds, what would help. */
import type { Craft } from '../craft/craft.ts';
import type { Relaxation } from '../craft/relaxation.ts';
import { valueOrNull } from '../numeric/outcome.ts';
import type { Binding } from '../physics/ballast/binding.ts';
import type { Plan, PlanFound, PlanNotFound } from '../physics/ballast/plan.ts';
import type { Remedy } from '../physics/ballast/relaxations.ts';
import { uncertainOf } from '../physics/ballast/robust.ts';
import { craftStateOf } from '../physics/craftState.ts';
import { inUnits, say } from '../units/sentence.ts';
import type { UnitSystem } from '../units/units.ts';
import { assess } from './assess.ts';
import { HAZARDS } from './hazards.ts';
import { limitName, limitStands, relaxationWords, stepSaves } from './limitWords.ts';
import { joined, planHeadline, planProof, planSteps } from './planWords.ts';
import type { Rows } from './rows.ts';

export interface PlanReport {
  /** The plan in one or two sentences, or that there is none. */
  readonly headline: string;
  /** Why it cannot be done with less; what is not proven. */
  readonly proof: string;
  /** What to do, one thing a sentence. */
  readonly steps: readonly string[];
  /** The limits that stand in the way, the one that saves most first. */
  readonly binding: readonly BindingWords[];
  /** Single changes that would let a plan be made. */
  readonly remedies: readonly RemedyWords[];
  /** The figures of the craft with the plan carried out; null without a plan. */
  readonly after: Rows | null;
  readonly cautions: readonly string[];
}

export interface BindingWords extends Binding {
  readonly name: string;
  readonly sentence: string;
}

export interface RemedyWords extends Remedy {
  readonly name: string;
  readonly sentence: string;
}

/** Sentences come in the units asked for; values are SI always. */
export function planReport(craft: Craft, plan: Plan, units: UnitSystem = 'metric'): PlanReport {
  const report = 'why' in plan ? notFoundReport(craft, plan) : foundReport(craft, plan, units);
  const read = (sentence: string) => inUnits(sentence, units);
  return {
    ...report,
    headline: read(report.headline),
    proof: read(report.proof),
    steps: report.steps.map(read),
    binding: report.binding.map((each) => ({ ...each, sentence: read(each.sentence) })),
    remedies: report.remedies.map((each) => ({ ...each, sentence: read(each.sentence) })),
  };
}

function foundReport(craft: Craft, plan: PlanFound, units: UnitSystem): PlanReport {
  const { rows, cautions } = assess(plan.craft, units);
  const lead = assess(craft, units).rows['lead.mass'];
  const leadToday = lead?.status === 'solved' ? lead.value : null;
  return {
    headline: planHeadline(craft, plan, leadToday),
    proof: planProof(craft, plan),
    steps: planSteps(craft, plan).map(sentence),
    binding: plan.binding.map((each) => ({
      ...each,
      name: limitName(each.limit),
      sentence: sentence(
        `${limitStands(craft, each.limit, each.now)}; ${stepSaves(each.limit, each.step, each.saving)}`,
      ),
    })),
    remedies: [],
    after: rows,
    cautions: [...(plan.weights.length > 0 ? [HAZARDS.ballast] : []), ...cautions],
  };
}

function notFoundReport(craft: Craft, plan: PlanNotFound): PlanReport {
  const remedies = plan.remedies.map((remedy) => remedyWords(craft, remedy));
  return {
    headline: plan.status === 'infeasible' ? noPlanWords(plan) : plan.why,
    proof: plan.status === 'infeasible' ? [remedyHeadline(plan), ...robustWords(craft, plan)].join(' ') : '',
    steps: [],
    binding: [],
    remedies,
    after: null,
    cautions: [],
  };
}

const noPlanWords = ({ why, robust }: PlanNotFound): string =>
  why.startsWith('No solution')
    ? `No ballast, slide or place of a load keeps every target at once${robust ? ' for every mass within its tolerance' : ''}.`
    : why;

/** When the masses together may be off by more than the band of heaviness is wide, no plan can hold for all of them. */
function robustWords(craft: Craft, { robust }: PlanNotFound): string[] {
  const state = robust ? valueOrNull(craftStateOf(craft)) : null;
  if (!state) return [];
  const { least, most } = craft.targets.heaviness;
  const shares = uncertainOf(state)
    .map(({ part, tolerance, perKilogram: [pieces] }) => ({
      name: part === null ? 'the film' : craft.parts.byId[part]!.name || part,
      mass: tolerance * pieces,
    }))
    .sort((a, b) => b.mass - a.mass);
  const all = shares.reduce((sum, { mass }) => sum + mass, 0);
  if (2 * all <= most - least) return [];
  const first = joined(shares.slice(0, 3).map(({ name, mass }) => `${name} (±${say(mass, 'mass')})`));
  return [
    `All masses together may be off by ±${say(all, 'mass')}, and the band of heaviness is only ${say(most - least, 'mass')} wide: widen it to ${say(2 * all, 'mass')} or more, or weigh what is least known first: ${first}.`,
  ];
}

function remedyHeadline({ remedies, remediesComplete }: PlanNotFound): string {
  if (remedies.length === 0 && !remediesComplete)
    return 'Time ran out before anything was found that would help.';
  if (remedies.length === 0) return 'No single change would do: two limits or more stand in the way.';
  return remedies.length === 1 ? 'This would do:' : 'Any one of these would do:';
}

function remedyWords(craft: Craft, remedy: Remedy): RemedyWords {
  const { relaxation, now, deadBallast } = remedy;
  const words = relaxationWords(craft, relaxation, now, volumePerMass(craft));
  const then = deadBallast > 0 ? `${say(deadBallast, 'mass')} of lead does it` : 'no lead is needed';
  return { ...remedy, name: limitName(relaxation), sentence: sentence(`${words}; then ${then}`) };
}

/** Hull that lifts one kilogram more, m³/kg; 0 when the gas does not lift. */
function volumePerMass(craft: Craft): number {
  const state = craftStateOf(craft);
  if (state.status === 'infeasible') return 0;
  const lift = state.value.air.density - state.value.gasDensity;
  return lift > 0 ? 1 / lift : 0;
}

const sentence = (words: string): string => words && `${words.charAt(0).toUpperCase()}${words.slice(1)}.`;

/** The SI unit of a marginal value: kilograms of ballast per unit of the limit. */
export function marginalUnit({ kind }: Relaxation): string {
  switch (kind) {
    case 'pitchTolerance':
    case 'heelTolerance':
      return 'kg/rad';
    case 'slide':
    case 'loadSlide':
    case 'pendulumDepth':
      return 'kg/m';
    case 'pieces':
      return 'kg/piece';
    case 'ashore':
      return 'kg';
    default:
      return 'kg/kg';
  }
}
