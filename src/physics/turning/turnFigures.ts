/** The few figures of a turn that a comparison of many places asks for, at a small part of the cost of everything. */
import { type Outcome, solved } from '../../numeric/outcome.ts';
import type { CraftState } from '../craftState.ts';
import { commandsOf, cruiseSpeedOf, straightAt, type TurnAsked } from './asked.ts';
import { gustHeld } from './gust.ts';
import { leverageOf } from './leverage.ts';
import { quarterTurn } from './quarterTurn.ts';
import { steadyTurn } from './steady.ts';
import { turningCraftOf } from './turningCraft.ts';

/** As in `Turn`; null where there is none. */
export interface TurnFigures {
  readonly arm: number;
  /** From rest, s. */
  readonly timeTo90: number | null;
  /** m */
  readonly radius: number | null;
  /** At rest, m/s. */
  readonly gustHeld: number;
}

export function turnFigures(state: CraftState, asked: TurnAsked): Outcome<TurnFigures> {
  const reduced = turningCraftOf(state);
  if (reduced.status !== 'solved') return reduced;
  const craft = reduced.value;
  const { straight, turn } = commandsOf(craft, asked);
  const speed = cruiseSpeedOf(craft, asked);
  const quarter = quarterTurn(craft, straightAt(0, straight), turn);
  const steady = steadyTurn(craft, straight, turn, speed);
  return solved({
    arm: leverageOf(craft, asked.throttle).arm,
    timeTo90: quarter.status === 'solved' ? quarter.value.trajectory.end : null,
    radius: steady.status === 'solved' ? steady.value.turn.radius : null,
    gustHeld: gustHeld(craft, asked.throttle, 0),
  });
}
