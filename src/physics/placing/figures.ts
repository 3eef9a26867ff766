/** What a craft does with its thruster in one place: how it turns, what gust it holds, how it sits in cruise. */
import { valueOrNull } from '../../numeric/outcome.ts';
import type { CraftState } from '../craftState.ts';
import { cruisePitch } from '../cruise/cruise.ts';
import { steadySpeed } from '../thrust/speed.ts';
import type { TurnAsked } from '../turning/asked.ts';
import { type TurnFigures, turnFigures } from '../turning/turnFigures.ts';
import { type InflowFigures, inflowAlong } from './inflowAlong.ts';

/** Each is null where there is none. */
export interface Figures extends TurnFigures, InflowFigures {
  /** + nose-up, rad */
  readonly cruisePitch: number | null;
}

export type FiguresAt = (state: CraftState) => Figures;

export function figuresAlong(today: CraftState, part: string, asked: TurnAsked): FiguresAt {
  const speed = asked.speed ?? valueOrNull(steadySpeed(today, asked.throttle));
  const inflow = inflowAlong(today, part, speed, asked.throttle);
  return (state) => ({
    ...inflow(state),
    ...turnFigures(state, asked),
    cruisePitch: pitchOf(state, asked),
  });
}

function pitchOf(state: CraftState, { throttle, speed }: TurnAsked): number | null {
  const cruise = valueOrNull(cruisePitch(state, speed === null ? { throttle } : { speed }));
  return cruise?.pitch ?? null;
}
