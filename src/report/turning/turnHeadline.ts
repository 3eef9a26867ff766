/** How the craft turns, in one sentence; and what the places of its thrusters cost. In SI, for `inUnits`. */
import { type Craft, listed } from '../../craft/craft.ts';
import type { Outcome } from '../../numeric/outcome.ts';
import type { Thruster } from '../../physics/thrust/thrusters.ts';
import { STRONGEST } from '../../physics/turning/gust.ts';
import { yaws } from '../../physics/turning/leverage.ts';
import type { SteadyTurn, Turn } from '../../physics/turning/turn.ts';
import { say } from '../../units/sentence.ts';
import { joined } from '../planWords.ts';
import { insignificant, type Rows } from '../rows.ts';
import type { PlaceCost } from './costs.ts';

/** "With the thruster at 4.29 m the arm is 2.28 m: turns 90° and stops in 5.7 s, radius 1.70 m at 1.00 m/s, keeps its heading at rest in a 2.40 m/s side gust (drifting with it)." What cannot be stopped is said before. */
export function turnHeadline(
  craft: Craft,
  thrusters: readonly Thruster[],
  turn: Outcome<Turn>,
  rows: Rows,
): string {
  const arm = rows['turn.arm']!;
  if (arm.value === null || turn.status === 'infeasible') return arm.why || why(turn);
  const { fromRest, steady, gust } = turn.value;
  const does = [
    ...quarterWords(turn.value),
    ...(steady.status === 'solved' ? [steadyWords(steady.value)] : []),
    ...(gust.status === 'solved' ? [gustWords(gust.value)] : []),
  ];
  const stands = `With ${placesOf(craft, thrusters)} the arm is ${say(Math.abs(arm.value), 'length')}${sideOf(thrusters, arm.value)}`;
  const slow = fromRest.status === 'infeasible' ? ` ${why(fromRest)}` : '';
  const first = runsAway(turn.value) ? `${RUNS_AWAY}. ` : '';
  return `${first}${stands}: ${does.join(', ')}.${slow}`;
}

const RUNS_AWAY = 'Once turning from cruise it cannot be stopped by steering';

const runsAway = ({ fromCruise, stop }: Turn): boolean =>
  fromCruise.status === 'solved' && stop.status === 'infeasible';

/** The same for the cautions, with what would help; or that it cannot be stopped from rest. None where the yaw can be stopped. */
export function runawayCautions(turn: Turn): string[] {
  if (runsAway(turn)) return [`${RUNS_AWAY}. ${why(turn.stop)}`];
  return turn.fromRest.status === 'solved' && turn.there.status === 'infeasible' ? [why(turn.there)] : [];
}

function quarterWords({ fromRest, there }: Turn): string[] {
  if (there.status === 'solved') return [`turns 90° and stops in ${say(there.value.time, 'time')}`];
  return fromRest.status === 'solved' ? [`passes 90° from rest in ${say(fromRest.value.time, 'time')}`] : [];
}

const why = (outcome: Outcome<unknown>): string =>
  outcome.status === 'solved' ? '' : [outcome.why, outcome.remedy].filter(Boolean).join(' ');

/** "Tail thruster at 4.29 m and Side thrusters at 1.50 m", of those that can yaw the craft; "the thruster at 4.29 m" of the only one. */
function placesOf(craft: Craft, thrusters: readonly Thruster[]): string {
  const only =
    listed(craft.parts).filter(({ kind, thruster }) => kind === 'thruster' || thruster).length === 1;
  const own = only && (thrusters.length > 1 ? 'the thrusters' : 'the thruster');
  const first = thrusters.filter((thruster) => yaws(thruster) && thruster.copy === 0);
  return joined(first.map(({ name, at }) => `${own || name} at ${say(at[0], 'length')}`));
}

/** Ahead of the CG the arm has another sign; a pair throttled apart has its lever to the side. */
function sideOf(thrusters: readonly Thruster[], arm: number): string {
  if (arm < 0) return ' ahead of the CG';
  return thrusters.filter(yaws).every(({ differ }) => differ !== 0) ? ' to the side' : '';
}

/** A radius below this share of the hull's length is told as none. */
const ON_THE_SPOT = 0.25;

const steadyWords = ({ lengths, radius, speed }: SteadyTurn): string =>
  lengths < ON_THE_SPOT
    ? 'almost on the spot'
    : `radius ${say(radius, 'pathLength')} at ${say(speed, 'speed')}`;

/** m/s, at rest. */
function gustWords(held: number): string {
  if (insignificant(held, 'speed')) return 'keeps its heading in no side gust';
  const speed = say(held, 'speed');
  const gusts = held >= STRONGEST ? `side gusts of ${speed} and more` : `a ${speed} side gust`;
  return `keeps its heading at rest in ${gusts} (drifting with it)`;
}

/** "The place of Tail thruster costs 96 g of lead and 8 g of wire, compared with the same thruster at the CB (2.000 m)." One sentence a thruster; none for a place that costs nothing. */
export function costWords(costs: readonly PlaceCost[]): string[] {
  return costs.flatMap(({ name, lead, wire, cb }) => {
    const calls = [massWords(lead, 'lead'), massWords(wire, 'wire')].filter(Boolean);
    const saves = [massWords(-lead, 'lead'), massWords(-wire, 'wire')].filter(Boolean);
    const words = [
      ...(calls.length > 0 ? [`costs ${joined(calls)}`] : []),
      ...(saves.length > 0 ? [`saves ${joined(saves)}`] : []),
    ];
    const central = `the same thruster at the CB (${say(cb, 'length')})`;
    return words.length > 0 ? [`The place of ${name} ${joined(words)}, compared with ${central}.`] : [];
  });
}

const massWords = (mass: number, of: string): string =>
  mass > 0 && !insignificant(mass, 'mass') ? `${say(mass, 'mass')} of ${of}` : '';
