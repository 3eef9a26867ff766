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

/** "With the thruster at 4.29 m the arm is 2.28 m: 90° from rest in 3.1 s, radius 1.70 m at 1.00 m/s, holds a 2.40 m/s gust from the side." */
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
    ...(fromRest.status === 'solved' ? [`90° from rest in ${say(fromRest.value.time, 'time')}`] : []),
    ...(steady.status === 'solved' ? [steadyWords(steady.value)] : []),
    ...(gust.status === 'solved' ? [gustWords(gust.value)] : []),
  ];
  const stands = `With ${placesOf(craft, thrusters)} the arm is ${say(Math.abs(arm.value), 'length')}${sideOf(thrusters, arm.value)}`;
  const slow = fromRest.status === 'infeasible' ? ` ${why(fromRest)}` : '';
  return `${stands}: ${does.join(', ')}.${slow}`;
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
    ? 'turns almost on the spot'
    : `radius ${say(radius, 'pathLength')} at ${say(speed, 'speed')}`;

/** m/s, at rest. */
function gustWords(held: number): string {
  if (insignificant(held, 'speed')) return 'holds no gust from the side';
  const speed = say(held, 'speed');
  return held >= STRONGEST
    ? `holds gusts of ${speed} and more from the side`
    : `holds a ${speed} gust from the side`;
}

/** "It calls for 96 g of lead and 8 g of wire." One sentence a thruster; none for a place that costs nothing. */
export function costWords(costs: readonly PlaceCost[]): string[] {
  return costs.flatMap(({ name, lead, wire }) => {
    const calls = [massWords(lead, 'lead'), massWords(wire, 'wire')].filter(Boolean);
    const saves = [massWords(-lead, 'lead'), massWords(-wire, 'wire')].filter(Boolean);
    const words = [
      ...(calls.length > 0 ? [`calls for ${joined(calls)}`] : []),
      ...(saves.length > 0 ? [`saves ${joined(saves)}`] : []),
    ];
    return words.length > 0 ? [`The place of ${name} ${joined(words)}, against one at the CB.`] : [];
  });
}

const massWords = (mass: number, of: string): string =>
  mass > 0 && !insignificant(mass, 'mass') ? `${say(mass, 'mass')} of ${of}` : '';
