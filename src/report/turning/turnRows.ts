/** How the craft turns, and what is left when the throttle is cut. */
import { type Outcome, solved, valueOrNull } from '../../numeric/outcome.ts';
import type { Need, Turn } from '../../physics/turning/turn.ts';
import { say } from '../../units/sentence.ts';
import type { Rows } from '../rows.ts';
import { rowsFrom } from './turnFigure.ts';

/** Of one answer of the physics; `thrust`: what all thrusters give at rest at full throttle, N; `top`: top speed, m/s. */
export function turnRows(turn: Outcome<Turn>, thrust: number, top: number | null): Rows {
  const part = <T>(of: (turn: Turn) => Outcome<T>): Outcome<T> =>
    turn.status === 'solved' ? of(turn.value) : turn;
  return {
    ...rowsFrom(
      part(({ fromRest }) => fromRest),
      { 'turn.timeTo90': ({ time }) => time },
    ),
    ...rowsFrom(
      part(({ there }) => there),
      { 'turn.timeThere': ({ time }) => time },
    ),
    ...rowsFrom(
      part(({ fromCruise }) => fromCruise),
      { 'turn.timeTo90Cruise': ({ time }) => time },
    ),
    ...rowsFrom(
      part(({ stop }) => stop),
      { 'turn.stopTime': ({ time }) => time, 'turn.stopAngle': ({ angle }) => angle },
    ),
    ...rowsFrom(
      part(({ steady }) => steady),
      {
        'turn.radius': ({ radius }) => radius,
        'turn.radiusLengths': ({ lengths }) => lengths,
        'turn.drift': ({ drift }) => drift,
        'turn.yawRate': ({ yawRate }) => yawRate,
        'turn.speed': ({ speed }) => speed,
        'turn.vector': ({ vector }) => vector,
      },
    ),
    ...rowsFrom(
      part(({ gust }) => gust),
      { 'turn.gustHeld': (speed) => speed },
      { 'turn.gustHeld': { why: gustWhy(turn, top) } },
    ),
    ...rowsFrom(
      part(({ gustCruise }) => gustCruise),
      { 'turn.gustHeldCruise': (speed) => speed },
      { 'turn.gustHeldCruise': { why: cruiseWords(turn) } },
    ),
    ...needRows(turn, thrust),
    ...glideRows(turn),
  };
}

/** Against more than its top speed no heading keeps it where it is. */
function gustWhy(turn: Outcome<Turn>, top: number | null): string {
  const held = turn.status === 'solved' ? valueOrNull(turn.value.gust) : null;
  const drifts =
    held !== null && top !== null && held > top
      ? `it is above the top speed of ${say(top, 'speed')}, so it drifts whichever way it is steered.`
      : 'it drifts with it.';
  return `The strongest, steady and square from the side, at rest; ${drifts}`;
}

const cruiseWords = (turn: Outcome<Turn>): string =>
  turn.status === 'solved'
    ? `At ${say(turn.value.cruiseSpeed, 'speed')} ahead, with the Munk moment on top.`
    : '';

function needRows(turn: Outcome<Turn>, thrust: number): Rows {
  const need = turn.status === 'solved' ? turn.value.authority.need : null;
  const of = (each: Need, keys: readonly [TurnNeed, TurnNeed, TurnNeed, TurnNeed]): Rows => ({
    ...rowsFrom(each.needed, { [keys[0]]: (moment: number) => moment }),
    ...rowsFrom(each.thrust, { [keys[1]]: (times: number) => times * thrust }),
    ...rowsFrom(each.vector, { [keys[2]]: (angle: number) => angle }),
    ...rowsFrom(each.arm, { [keys[3]]: (arm: number) => arm }),
  });
  return {
    ...(need?.turnTime ? of(need.turnTime, NEEDED) : {}),
    ...(need?.sideGust ? of(need.sideGust, AGAINST_GUST) : {}),
  };
}

const NEEDED = ['turn.neededMoment', 'turn.neededThrust', 'turn.neededVector', 'turn.neededArm'] as const;
const AGAINST_GUST = ['turn.gustMoment', 'turn.gustThrust', 'turn.gustVector', 'turn.gustArm'] as const;
type TurnNeed = (typeof NEEDED)[number] | (typeof AGAINST_GUST)[number];

function glideRows(turn: Outcome<Turn>): Rows {
  const glide = turn.status === 'solved' ? solved(turn.value.glide) : turn;
  return {
    ...rowsFrom(glide.status === 'solved' ? glide.value.after : glide, {
      'glide.halving': ({ halving }) => halving,
      'glide.time': ({ time }) => time,
      'glide.angle': ({ angle }) => angle,
    }),
    ...rowsFrom(glide, {
      'glide.munk': ({ stability }) => stability.munk,
      'glide.fins': ({ stability }) => stability.fins,
    }),
  };
}
