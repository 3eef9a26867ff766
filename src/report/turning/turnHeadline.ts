/** How the craft turns, in one sentence; and what the places of its thrusters cost. In SI, for `inUnits`. */
import type { Outcome } from '../../numeric/outcome.ts';
import type { Thruster } from '../../physics/thrust/thrusters.ts';
import { STRONGEST } from '../../physics/turning/gust.ts';
import { yaws } from '../../physics/turning/leverage.ts';
import type { Turn } from '../../physics/turning/turn.ts';
import { say } from '../../units/sentence.ts';
import { joined } from '../planWords.ts';
import { insignificant, type Rows } from '../rows.ts';
import type { PlaceCost } from './costs.ts';

/** "With Tail thruster at 4.29 m the arm is 2.28 m: 90° from rest in 3.1 s, radius 0.70 m at 3.0 m/s, holds a gust of 0.4 m/s from the side in cruise, 2.4 m/s at rest." */
export function turnHeadline(thrusters: readonly Thruster[], turn: Outcome<Turn>, rows: Rows): string {
  const arm = rows['turn.arm']!;
  if (arm.value === null || turn.status === 'infeasible') return arm.why || why(turn);
  const { fromRest, steady, gust, gustAtRest } = turn.value;
  const does = [
    ...(fromRest.status === 'solved' ? [`90° from rest in ${say(fromRest.value.time, 'time')}`] : []),
    ...(steady.status === 'solved'
      ? [`radius ${say(steady.value.radius, 'pathLength')} at ${say(steady.value.speed, 'speed')}`]
      : []),
    ...(gust.status === 'solved' && gustAtRest.status === 'solved'
      ? [gustWords(gust.value, gustAtRest.value)]
      : []),
  ];
  const stands = `With ${placesOf(thrusters)} the arm is ${say(Math.abs(arm.value), 'length')}${sideOf(thrusters, arm.value)}`;
  const slow = fromRest.status === 'infeasible' ? ` ${why(fromRest)}` : '';
  return `${stands}: ${does.join(', ')}.${slow}`;
}

const why = (outcome: Outcome<unknown>): string =>
  outcome.status === 'solved' ? '' : [outcome.why, outcome.remedy].filter(Boolean).join(' ');

/** "Tail thruster at 4.29 m and Side thrusters at 1.50 m", of those that can yaw the craft. */
function placesOf(thrusters: readonly Thruster[]): string {
  const first = thrusters.filter((thruster) => yaws(thruster) && thruster.copy === 0);
  return joined(first.map(({ name, at }) => `${name} at ${say(at[0], 'length')}`));
}

/** Ahead of the CG the arm has another sign; a pair throttled apart has its lever to the side. */
function sideOf(thrusters: readonly Thruster[], arm: number): string {
  if (arm < 0) return ' ahead of the CG';
  return thrusters.filter(yaws).every(({ differ }) => differ !== 0) ? ' to the side' : '';
}

/** m/s, in cruise and at rest. */
function gustWords(cruise: number, rest: number): string {
  const none = (held: number) => insignificant(held, 'speed');
  const speed = (held: number) => `${say(held, 'speed')}${held >= STRONGEST ? ' and more' : ''}`;
  if (none(cruise) && none(rest)) return 'holds no gust from the side';
  if (none(cruise)) return `holds no gust from the side in cruise, one of ${speed(rest)} at rest`;
  return `holds a gust of ${speed(cruise)} from the side in cruise, ${none(rest) ? 'none' : speed(rest)} at rest`;
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
