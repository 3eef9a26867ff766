/** The few figures of a turn that a comparison of many places asks for, at a small part of the cost of everything. */
import { valueOrNull } from '../../numeric/outcome.ts';
import type { CraftState } from '../craftState.ts';
import { commandsOf, cruiseSpeedOf, straightAt, type TurnAsked } from './asked.ts';
import { gustHeld } from './gust.ts';
import { leverageOf, yaws } from './leverage.ts';
import { quarterTurn } from './quarterTurn.ts';
import { steadyTurn } from './steady.ts';
import { turningCraftOf } from './turningCraft.ts';

/** As in `Turn`; null where there is none, all of them where nothing yaws the craft. */
export interface TurnFigures {
  /** m */
  readonly arm: number | null;
  /** From rest, s. */
  readonly timeTo90: number | null;
  /** m */
  readonly radius: number | null;
  /** At rest, m/s. */
  readonly gustHeld: number | null;
}

const NONE: TurnFigures = { arm: null, timeTo90: null, radius: null, gustHeld: null };

export function turnFigures(state: CraftState, asked: TurnAsked): TurnFigures {
  const craft = valueOrNull(turningCraftOf(state));
  if (!craft?.thrusters.some(yaws)) return NONE;
  const { straight, turn } = commandsOf(craft, asked);
  const speed = cruiseSpeedOf(craft, asked);
  const quarter = valueOrNull(quarterTurn(craft, straightAt(0, straight), turn));
  const steady = valueOrNull(steadyTurn(craft, straight, turn, speed));
  return {
    arm: leverageOf(craft, asked.throttle).arm,
    timeTo90: quarter?.trajectory.end ?? null,
    radius: steady?.turn.radius ?? null,
    gustHeld: gustHeld(craft, asked.throttle, 0),
  };
}
