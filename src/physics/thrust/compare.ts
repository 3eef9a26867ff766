/**
 * One large propeller against several small ones: what the thrust of the craft would cost with other discs.
 *
 * Total thrust is kept, shared equally among n propellers of diameter d, total disc area n π d²/4, and the ideal power
 * worked out by propeller.ts: at rest for the static thrust at full throttle, and at top speed for the thrust that meets
 * drag there. Only the disc area counts; that a small propeller is besides a little worse for its size (its blades work at
 * a lower Reynolds number) is left out, and so are the mass and the room that a large one takes.
 */
import { type Outcome, solved } from '../../numeric/outcome.ts';
import type { CraftState } from '../craftState.ts';
import { discArea, idealPower } from './propeller.ts';
import { NO_THRUSTER, topSpeed } from './speed.ts';
import { type Thruster, thrustAt, thrustersOf } from './thrusters.ts';

/** Total thrust, N, at a forward speed, m/s. */
export interface Demand {
  readonly thrust: number;
  readonly speed: number;
}

export interface Discs {
  readonly count: number;
  /** m */
  readonly diameter: number;
  /** Of all discs, m². */
  readonly area: number;
  readonly atRest: PowerNeeded;
  /** Null when there is no top speed. */
  readonly atTop: PowerNeeded | null;
}

export interface PowerNeeded {
  /** Ideal, W. */
  readonly power: number;
  /** Over that of today's propellers. */
  readonly relative: number;
}

export interface Comparison {
  readonly atRest: Demand;
  readonly atTop: Demand | null;
  /** Today's propellers, ideal power, W. */
  readonly today: {
    readonly count: number;
    readonly area: number;
    readonly atRest: number;
    readonly atTop: number | null;
  };
  readonly choices: readonly Discs[];
}

/**
 * Choices: propellers of the largest diameter aboard, one, two and four of them; one, two and four that share today's disc
 * area; two and four of half the largest diameter; one half as large again and one twice as large. What is the same as
 * today, or as another, is left out.
 */
export function comparePropellers(state: CraftState): Outcome<Comparison> {
  const thrusters = thrustersOf(state).filter(({ staticThrust }) => staticThrust > 0);
  if (thrusters.length === 0) return NO_THRUSTER;
  const { density } = state.air;
  const area = thrusters.reduce((sum, { diameter }) => sum + discArea(diameter), 0);
  const rest = workAt(thrusters, 0, density);
  const top = topSpeed(state);
  const fast = top.status === 'solved' ? workAt(thrusters, top.value, density) : null;
  // Thrusters turned well off the axis can push a craft faster than they could pointing ahead.
  const atTop = fast && fast.power > 0 ? fast : null;
  const needed = ({ demand, power }: Work, discs: number): PowerNeeded => {
    const wanted = idealPower(demand.thrust, discs, density, demand.speed);
    return { power: wanted, relative: wanted / power };
  };
  const choices = choicesOf(thrusters, area).map(({ count, diameter }) => {
    const discs = count * discArea(diameter);
    return {
      count,
      diameter,
      area: discs,
      atRest: needed(rest, discs),
      atTop: atTop && needed(atTop, discs),
    };
  });
  return solved({
    atRest: rest.demand,
    atTop: atTop?.demand ?? null,
    today: { count: thrusters.length, area, atRest: rest.power, atTop: atTop?.power ?? null },
    choices,
  });
}

type Choice = Pick<Discs, 'count' | 'diameter'>;

function choicesOf(thrusters: readonly Thruster[], area: number): Choice[] {
  const diameter = Math.max(...thrusters.map((each) => each.diameter));
  const choices = [
    ...[1, 2, 4].map((count) => ({ count, diameter })),
    ...[1, 2, 4].map((count) => ({ count, diameter: Math.sqrt((4 * area) / (count * Math.PI)) })),
    ...[2, 4].map((count) => ({ count, diameter: diameter / 2 })),
    { count: 1, diameter: 1.5 * diameter },
    { count: 1, diameter: 2 * diameter },
  ];
  const alike = thrusters.every((each) => same(each.diameter, diameter));
  const today = alike ? [{ count: thrusters.length, diameter }] : [];
  return choices.filter(
    (choice, i) => ![...today, ...choices.slice(0, i)].some((other) => repeats(choice, other)),
  );
}

const repeats = (a: Choice, b: Choice): boolean => a.count === b.count && same(a.diameter, b.diameter);

const same = (a: number, b: number): boolean => Math.abs(a - b) < 1e-9;

interface Work {
  readonly demand: Demand;
  /** Today's ideal power, W. */
  readonly power: number;
}

/** Today's propellers at full throttle, each advancing at the craft's speed. */
function workAt(thrusters: readonly Thruster[], speed: number, density: number): Work {
  const thrusts = thrusters.map((each) => thrustAt(each, 1, speed));
  const powers = thrusters.map(({ diameter }, i) =>
    idealPower(thrusts[i]!, discArea(diameter), density, speed),
  );
  return { demand: { thrust: sum(thrusts), speed }, power: sum(powers) };
}

const sum = (terms: readonly number[]): number => terms.reduce((total, each) => total + each, 0);
