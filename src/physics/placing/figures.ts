/** What a craft does with its thruster in one place: how it turns, what gust it holds, how it sits in cruise. */
import { valueOrNull } from '../../numeric/outcome.ts';
import type { CraftState } from '../craftState.ts';
import { cruisePitch } from '../cruise/cruise.ts';
import { steadySpeed } from '../thrust/speed.ts';
import { commandsOf, cruiseSpeedOf, straightAt, type TurnAsked } from '../turning/asked.ts';
import { gustHeld } from '../turning/gust.ts';
import { leverageOf, yaws } from '../turning/leverage.ts';
import { quarterTurn } from '../turning/quarterTurn.ts';
import { steadyTurn } from '../turning/steady.ts';
import { turningCraftOf } from '../turning/turningCraft.ts';
import { type InflowFigures, inflowAlong } from './inflowAlong.ts';

/** Each is null where there is none. */
export interface Figures extends InflowFigures {
  /** About the CG, of all thrust that can yaw the craft, + aft; for a pair throttled apart its lever to the side, m. */
  readonly arm: number | null;
  /** From rest, s. */
  readonly timeTo90: number | null;
  /** Of the steady turn, m. */
  readonly radius: number | null;
  /** From the side in cruise, m/s. */
  readonly gustHeld: number | null;
  /** + nose-up, rad */
  readonly cruisePitch: number | null;
}

export type FiguresAt = (state: CraftState) => Figures;

export function figuresAlong(today: CraftState, part: string, asked: TurnAsked): FiguresAt {
  const speed = asked.speed ?? valueOrNull(steadySpeed(today, asked.throttle));
  const inflow = inflowAlong(today, part, speed, asked.throttle);
  return (state) => ({
    ...inflow(state),
    ...turningFigures(state, asked),
    cruisePitch: pitchOf(state, asked),
  });
}

type TurningFigures = Pick<Figures, 'arm' | 'timeTo90' | 'radius' | 'gustHeld'>;

const NO_TURN: TurningFigures = { arm: null, timeTo90: null, radius: null, gustHeld: null };

function turningFigures(state: CraftState, asked: TurnAsked): TurningFigures {
  const craft = valueOrNull(turningCraftOf(state));
  if (!craft) return NO_TURN;
  const { straight, turn } = commandsOf(craft, asked);
  const cruise = cruiseSpeedOf(craft, asked);
  const able = craft.thrusters.some(yaws);
  const fromRest = valueOrNull(quarterTurn(craft, straightAt(0, straight), turn));
  const steady = valueOrNull(steadyTurn(craft, straight, turn, cruise));
  return {
    arm: able ? leverageOf(craft, asked.throttle).arm : null,
    timeTo90: fromRest?.trajectory.end ?? null,
    radius: steady?.turn.radius ?? null,
    gustHeld: able ? gustHeld(craft, asked.throttle, cruise) : null,
  };
}

function pitchOf(state: CraftState, { throttle, speed }: TurnAsked): number | null {
  const cruise = valueOrNull(cruisePitch(state, speed === null ? { throttle } : { speed }));
  return cruise?.pitch ?? null;
}
