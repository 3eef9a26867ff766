/**
 * Whether another order of the wishes would change the plan: what each wish gets in the plans of the other orders, beside
 * what it gets now. Where that is the same, the plan of now is best in the other order too; where lead hangs or in which
 * of two equal ways a thing moves is no matter of wishes.
 */
import { type Craft, listed } from '../craft/craft.ts';
import type { Wish } from '../craft/planningSchema.ts';
import { looseLoads } from '../craft/stowage.ts';
import { valueOrNull } from '../numeric/outcome.ts';
import type { Plan, PlanFound } from '../physics/ballast/plan.ts';
import { massOf } from '../physics/ballast/setting.ts';
import { craftStateOf } from '../physics/craftState.ts';
import { inUnits, say } from '../units/sentence.ts';
import type { UnitSystem } from '../units/units.ts';
import { isSameSpot } from './planDifferences.ts';

export interface OrderTried {
  readonly order: readonly Wish[];
  readonly plan: Plan;
}

export interface OrderReport {
  /** Orders whose plans give the wishes something else, one for each such plan. */
  readonly others: readonly { readonly order: readonly Wish[]; readonly sentence: string }[];
  /** Of how many orders it is not known: their plans were not carried to a proof. */
  readonly open: number;
}

/** Every order of the wishes but the one they are in. */
export const otherOrders = (wishes: readonly Wish[]): Wish[][] => orders(wishes).slice(1);

const orders = (wishes: readonly Wish[]): Wish[][] =>
  wishes.length < 2
    ? [[...wishes]]
    : wishes.flatMap((wish, i) => orders(wishes.toSpliced(i, 1)).map((rest) => [wish, ...rest]));

/** Whether a plan was searched to its end in every wish. */
export const isProven = (plan: Plan): plan is PlanFound => plan.status === 'optimal' && plan.wishesProven;

/** `plan`: a proven one for the order of now. */
export function orderReport(
  craft: Craft,
  plan: PlanFound,
  tried: readonly OrderTried[],
  units: UnitSystem = 'metric',
): OrderReport {
  const now = gains(craft, plan);
  const others: { order: readonly Wish[]; gains: readonly Gain[] }[] = [];
  for (const { order, plan: then } of tried) {
    if (!isProven(then)) continue;
    const found = gains(craft, then);
    if (![now, ...others.map((each) => each.gains)].some((known) => isAlike(known, found))) {
      others.push({ order, gains: found });
    }
  }
  return {
    others: others.map((each) => ({
      order: each.order,
      sentence: inUnits(orderWords(each.order, now, each.gains), units),
    })),
    open: tried.filter((each) => !isProven(each.plan)).length,
  };
}

/** What a wish gets. */
interface Gain {
  /** kg, or a number of parts */
  readonly amount: number;
  readonly words: (amount: number, instead: number) => string;
}

/** Wishes are carried to a tenth of a gram, kg; whole parts differ by more. */
const LEAST = 1.1e-4;

const isAlike = (a: readonly Gain[], b: readonly Gain[]): boolean =>
  a.every(({ amount }, i) => Math.abs(amount - b[i]!.amount) < LEAST);

/** In the order in which the wishes stand in the craft, whichever was planned for. */
function gains(craft: Craft, { craft: then }: PlanFound): Gain[] {
  const by: Readonly<Record<Wish, () => Gain[]>> = {
    usefulLoad: () => loadGains(craft, then),
    fewestMoved: () => [{ amount: movedFromToday(craft, then), words: movedWords }],
    leastWire: () => [{ amount: wireMass(then), words: massWords('of wire') }],
  };
  return craft.wishes.flatMap((wish) => by[wish]());
}

function loadGains(craft: Craft, then: Craft): Gain[] {
  const free = looseLoads(craft).filter(({ must }) => !must);
  const ranks = [...new Set(free.map(({ rank }) => rank))].sort((a, b) => a - b);
  return ranks.map((rank) => ({
    amount: free
      .filter((load) => load.rank === rank)
      .reduce((sum, { id }) => sum + (then.parts.byId[id] ? massOf(then.parts.byId[id]) : 0), 0),
    words: massWords(ranks.length > 1 ? `of useful load of rank ${rank}` : 'of useful load'),
  }));
}

/** Parts of today that are then somewhere else, or ashore. */
const movedFromToday = (today: Craft, then: Craft): number =>
  listed(today.parts).filter((part) => {
    const after = then.parts.byId[part.id];
    return part.kind !== 'ballast' && !(after && isSameSpot(today, part, after));
  }).length;

function wireMass(craft: Craft): number {
  const branches = Object.values(valueOrNull(craftStateOf(craft))?.branches ?? {}).flat();
  return branches.reduce((sum, { mass }) => sum + mass, 0);
}

const massWords = (what: string) => (amount: number, instead: number) =>
  `${say(amount, 'mass')} ${what} instead of ${say(instead, 'mass')}`;

const movedWords = (count: number, instead: number): string =>
  `${count} part${count === 1 ? '' : 's'} moved instead of ${instead}`;

const SHORT: Readonly<Record<Wish, string>> = {
  usefulLoad: 'useful load',
  fewestMoved: 'parts moved',
  leastWire: 'wire',
};

/** "Parts moved, useful load, wire: 92.0 g of useful load instead of 174.0 g, 0 parts moved instead of 1." */
function orderWords(order: readonly Wish[], now: readonly Gain[], then: readonly Gain[]): string {
  const name = order.map((wish) => SHORT[wish]).join(', ');
  const differing = then.flatMap(({ amount, words }, i) =>
    Math.abs(amount - now[i]!.amount) < LEAST ? [] : [words(amount, now[i]!.amount)],
  );
  return `${name.charAt(0).toUpperCase()}${name.slice(1)}: ${differing.join(', ')}.`;
}
