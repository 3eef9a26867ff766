/** What is asked about a turn, and the commands that come of it. */
import { speedOf } from '../thrust/speed.ts';
import type { Moment } from './sail.ts';
import { type Command, commandOf } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export interface TurnAsked {
  /** Share of full throttle, 0 … 1. */
  readonly throttle: number;
  /** Vectoring in yaw, rad; null for hardest to starboard. */
  readonly vector: number | null;
  /** Of the cruise it begins from and in which the gust strikes, m/s; null: the steady speed straight ahead at that throttle. */
  readonly speed: number | null;
}

export interface Commands {
  readonly straight: Command;
  /** The turn asked for, and the one against it. */
  readonly turn: Command;
  readonly counter: Command;
}

export function commandsOf(craft: TurningCraft, { throttle, vector }: TurnAsked): Commands {
  const way = (steer: -1 | 0 | 1) =>
    vector === null || steer === 0
      ? commandOf(craft, { throttle, steer, vector: null })
      : commandOf(craft, { throttle, steer: 0, vector: steer * vector });
  return { straight: way(0), turn: way(1), counter: way(-1) };
}

/** m/s; 0 where its thrust does not move it ahead. */
export function cruiseSpeedOf(craft: TurningCraft, { throttle, speed }: TurnAsked): number {
  if (speed !== null) return speed;
  const steady = speedOf(craft.thrusters, craft.drag, { throttle, vector: null });
  return steady.status === 'solved' ? steady.value : 0;
}

/** Straight ahead at that speed, at the origin. */
export const straightAt = (speed: number, { angles }: Command): Moment => ({
  state: [speed, 0, 0, 0, 0, 0],
  angles,
});
