/** Everything about how a craft turns at a throttle: what it has to turn with, how fast, how tight, and what is left without thrust. */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import type { CraftState } from '../craftState.ts';
import { commandsOf, cruiseSpeedOf, straightAt, type TurnAsked } from './asked.ts';
import { turnCautions } from './cautions.ts';
import { type Glide, glideOf } from './glide.ts';
import { gustHeld } from './gust.ts';
import { leverageOf, yaws } from './leverage.ts';
import { type Authority, needsOf } from './need.ts';
import { type QuarterTurn, quarterTurn, quarterTurnOf, type YawStop, yawStop } from './quarterTurn.ts';
import { type SteadyTurn, steadyTurn } from './steady.ts';
import { type SteadyPoint, steadyPoints } from './steadyCurve.ts';
import { type TurningCraft, turningCraftOf } from './turningCraft.ts';
import { type TurnedThere, turnThere } from './turnThere.ts';

export type { TurnAsked } from './asked.ts';
export type { Glide } from './glide.ts';
export type { Authority, Need, Needs } from './need.ts';
export type { QuarterTurn, YawStop } from './quarterTurn.ts';
export type { Track } from './sail.ts';
export type { SteadyTurn } from './steady.ts';
export type { SteadyPoint } from './steadyCurve.ts';

export interface Turn {
  readonly authority: Authority;
  readonly fromRest: Outcome<QuarterTurn>;
  /** From rest to 90° and stopped there. */
  readonly there: Outcome<TurnedThere>;
  readonly fromCruise: Outcome<QuarterTurn>;
  /** After `fromCruise`. */
  readonly stop: Outcome<YawStop>;
  readonly steady: Outcome<SteadyTurn>;
  /** Side gust held at rest, and at `cruiseSpeed`, m/s; 50 stands for that or more. */
  readonly gust: Outcome<number>;
  readonly gustCruise: Outcome<number>;
  readonly glide: Glide;
  /** From which `fromCruise` begins and in which the gust strikes, m/s. */
  readonly cruiseSpeed: number;
  /** One sentence each. */
  readonly cautions: readonly string[];
}

/** Infeasible only without a thruster that has figures, or without mass. */
export function turnOf(state: CraftState, asked: TurnAsked): Outcome<Turn> {
  const craft = turningCraftOf(state);
  return craft.status === 'solved' ? solved(turnOfCraft(craft.value, asked, state)) : craft;
}

/** The steady turn over vectoring angle, or over how far thrust is throttled apart; from a little up to what is asked. */
export function steadyCurve(state: CraftState, asked: TurnAsked): Outcome<readonly SteadyPoint[]> {
  const craft = turningCraftOf(state);
  return craft.status === 'solved' ? solved(steadyPoints(craft.value, asked)) : craft;
}

function turnOfCraft(craft: TurningCraft, asked: TurnAsked, { craft: { targets } }: CraftState): Turn {
  const { throttle } = asked;
  const { straight, turn } = commandsOf(craft, asked);
  const cruiseSpeed = cruiseSpeedOf(craft, asked);
  const fromRest = quarterTurn(craft, straightAt(0, straight), turn);
  const fromCruise = quarterTurn(craft, straightAt(cruiseSpeed, straight), turn);
  const steady = steadyTurn(craft, straight, turn, cruiseSpeed);
  return {
    authority: { ...leverageOf(craft, throttle), need: needsOf(craft, targets, throttle) },
    there: fromRest.status === 'solved' ? turnThere(craft, fromRest.value, throttle) : fromRest,
    fromRest: mapped(fromRest, (sailed) => quarterTurnOf(craft, sailed)),
    fromCruise: mapped(fromCruise, (sailed) => quarterTurnOf(craft, sailed)),
    stop: fromCruise.status === 'solved' ? yawStop(craft, fromCruise.value, throttle) : fromCruise,
    steady: mapped(steady, (settled) => settled.turn),
    gust: held(craft, throttle, 0),
    gustCruise: held(craft, throttle, cruiseSpeed),
    glide: glideOf(craft, fromCruise, cruiseSpeed),
    cruiseSpeed,
    cautions: turnCautions(craft, asked, turn, steady),
  };
}

const mapped = <A, B>(outcome: Outcome<A>, to: (value: A) => B): Outcome<B> =>
  outcome.status === 'solved' ? solved(to(outcome.value)) : outcome;

const held = (craft: TurningCraft, throttle: number, speed: number): Outcome<number> =>
  craft.thrusters.some(yaws)
    ? solved(gustHeld(craft, throttle, speed))
    : infeasible(
        'No thruster yaws the craft, so none holds it against a gust.',
        'Let a thruster turn in yaw, or throttle a pair apart.',
      );
