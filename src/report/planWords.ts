/** A plan in words: what to slide, hang and leave, and why it cannot be done with less. In SI, for `inUnits`. */
import type { Craft } from '../craft/craft.ts';
import type { Place } from '../craft/placeSchema.ts';
import { stationOf } from '../craft/station.ts';
import { hungBallast } from '../craft/stowage.ts';
import type { PlanFound, PlannedLoad, PlannedSlide, PlannedWeight } from '../physics/ballast/plan.ts';
import { ballastMass } from '../physics/ballast/setting.ts';
import { say } from '../units/sentence.ts';
import { limitStands, loadName, partName, spotName, stepSaves } from './limitWords.ts';

/** Moves shorter than this are not worth telling, m. */
const LEAST_MOVE = 5e-4;

const COUNTS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten'];
const countWord = (count: number): string => COUNTS[count] ?? String(count);

/** "a, b and c" */
export const joined = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;

/** "slide Battery to 0.42 m" */
export const slideWords = (craft: Craft, { part, to }: PlannedSlide): string =>
  `slide ${partName(craft, part)} to ${say(to, 'length')}`;

export const toldSlides = ({ slides }: Pick<PlanFound, 'slides'>): PlannedSlide[] =>
  slides.filter(({ from, to }) => Math.abs(to - from) >= LEAST_MOVE);

/** "hang Camera at the chin instead of at 0.30 m", "leave Logger ashore"; null when it stays as it is. */
export function loadWords(craft: Craft, { load, place, hardpoint, placeToday }: PlannedLoad): string | null {
  const name = loadName(craft, load);
  if (!place) return placeToday ? `leave ${name} ashore` : null;
  if (placeToday && isSame(place, placeToday)) return null;
  const instead = placeToday ? ` instead of at ${say(stationOf(placeToday), 'length')}` : '';
  return `hang ${name} at ${hardpoint ? `the ${spotName(craft, hardpoint)}` : say(stationOf(place), 'length')}${instead}`;
}

const isSame = (a: Place, b: Place): boolean =>
  a.kind === b.kind && Math.abs(stationOf(a) - stationOf(b)) < LEAST_MOVE;

/** "two 5.0 g pieces and one 1.0 g piece at the nose", "11.2 g at the nose" */
export function weightWords(craft: Craft, { hardpoint, mass, pieces }: PlannedWeight): string {
  const at = `at the ${spotName(craft, hardpoint)}`;
  if (pieces.length === 0) return `${say(mass, 'mass')} ${at}`;
  const counted = pieces.map(
    (piece) => `${countWord(piece.count)} ${say(piece.mass, 'mass')} piece${piece.count === 1 ? '' : 's'}`,
  );
  return `${joined(counted)} ${at}`;
}

/** Differences of lead smaller than this are none, kg. */
export const LEAST_LEAD = 5e-5;

/** What to do at each hardpoint: hang, change or take off; nothing where the lead is right already. */
export function leadSteps(craft: Craft, { weights }: Pick<PlanFound, 'weights'>): string[] {
  const hung = hungBallast(craft);
  return craft.hardpoints.order.flatMap((hardpoint) => {
    const today = ballastMass(hung.get(hardpoint) ?? []);
    const planned = weights.find((each) => each.hardpoint === hardpoint);
    if (Math.abs((planned?.mass ?? 0) - today) < LEAST_LEAD) return [];
    if (!planned) return [`take the ${say(today, 'mass')} of lead off the ${spotName(craft, hardpoint)}`];
    const instead = today > 0 ? ` instead of the ${say(today, 'mass')} there` : '';
    return [`hang ${weightWords(craft, planned)}${instead}`];
  });
}

/** Everything there is to do, one thing each; empty when the craft is as planned already. */
export const planSteps = (craft: Craft, plan: Pick<PlanFound, 'slides' | 'loads' | 'weights'>): string[] => [
  ...toldSlides(plan).map((slide) => slideWords(craft, slide)),
  ...plan.loads.flatMap((load) => loadWords(craft, load) ?? []),
  ...leadSteps(craft, plan),
];

/** The plan as one or two sentences. `leadToday`: what levels the craft as it is, at the chosen hardpoint, where that can be done, kg. */
export function planHeadline(craft: Craft, plan: PlanFound, leadToday: number | null): string {
  const sameLead = Math.abs(plan.deadBallastToday - plan.deadBallast) < LEAST_LEAD;
  if (sameLead && planSteps(craft, plan).length === 0) {
    const lead = plan.deadBallast > 0 ? `${say(plan.deadBallast, 'mass')} of lead` : 'no lead';
    return `The craft is as planned already, with ${lead}: nothing to do.`;
  }
  const moves = [
    ...toldSlides(plan).map((slide) => slideWords(craft, slide)),
    ...plan.loads.flatMap((load) => loadWords(craft, load) ?? []),
  ];
  return [before(plan, leadToday), capital(outcome(craft, plan, moves))].filter(Boolean).join(' ');
}

function before({ deadBallast, deadBallastToday }: PlanFound, leadToday: number | null): string {
  const needed = Math.max(deadBallastToday, leadToday ?? 0);
  if (needed <= deadBallast + 1e-4) return '';
  return `You do not need ${say(needed, 'mass')} of lead.`;
}

function outcome(
  craft: Craft,
  { weights, deadBallast, deadBallastFixed, deadBallastToday }: PlanFound,
  moves: string[],
): string {
  const fixed =
    deadBallastFixed > 0 ? `, besides the ${say(deadBallastFixed, 'mass')} that stay where they are` : '';
  const planned = deadBallast - deadBallastFixed;
  const hung = joined(weights.map((weight) => weightWords(craft, weight)));
  if (planned <= 0) {
    const none = deadBallastToday > deadBallastFixed ? 'no lead is needed any more' : 'no lead is needed';
    return moves.length > 0 ? `${joined(moves)}: then ${none}${fixed}.` : `${none}${fixed}.`;
  }
  const many = weights.length > 1 || (weights[0]?.pieces.length ?? 0) > 0;
  const does = many ? `${say(planned, 'mass')} of lead does it: ${hung}` : `${hung} does it`;
  return moves.length > 0 ? `${joined(moves)}, and ${does}${fixed}.` : `${does}${fixed}.`;
}

/** Of which craft figures are that were worked out with the plan carried out. */
export function plannedWords(craft: Craft, plan: PlanFound): string {
  const steps = planSteps(craft, plan);
  const lead = `${say(plan.deadBallast, 'mass')} of dead ballast`;
  if (steps.length === 0) return `The ballast plan changes nothing: ${lead}.`;
  const unproven = plan.status === 'stopped' ? ' The search was stopped: one with less may exist.' : '';
  return `With the ballast plan carried out, ${lead}: ${joined(steps)}.${unproven}`;
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** Why there is no plan with less, or what is left open. */
export function planProof(craft: Craft, plan: PlanFound): string {
  const every = plan.robust ? ' It holds for every mass within its tolerance.' : '';
  return proofOf(craft, plan) + every;
}

function proofOf(craft: Craft, plan: PlanFound): string {
  if (plan.status === 'stopped') {
    return `It keeps every target, but the search was stopped: one with as little as ${say(plan.bound, 'mass')} may exist.`;
  }
  const [first] = plan.binding;
  if (plan.deadBallast <= plan.deadBallastFixed) return 'Less than none there cannot be.';
  if (!first) return 'It cannot be done with less.';
  const { limit, now, step, saving } = first;
  return `It cannot be done with less: ${limitStands(craft, limit, now)}, and ${stepSaves(limit, step, saving)}.`;
}
