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
  /** The turn asked for. */
  readonly turn: Command;
}

export const commandsOf = (craft: TurningCraft, { throttle, vector }: TurnAsked): Commands => ({
  straight: commandOf(craft, { throttle, steer: 0, vector: null }),
  turn: commandOf(craft, { throttle, steer: vector === null ? 1 : 0, vector }),
});

/** Hardest against a yaw to starboard (`way` > 0) or to port, whatever angle the turn is steered with. */
export const counterTo = (craft: TurningCraft, throttle: number, way: number): Command =>
  commandOf(craft, { throttle, steer: way > 0 ? -1 : 1, vector: null });

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
