/** The steady turn over the share of the command given, and so over vectoring angle or over how far thrust is throttled apart. */
import { type Outcome, solved } from '../../numeric/outcome.ts';
import { commandsOf, cruiseSpeedOf, type TurnAsked } from './asked.ts';
import { shownThruster } from './sail.ts';
import { type SteadyTurn, steadyTurn, turnAt } from './steady.ts';
import { settlesAt, sizesOf, steadyNear, type Velocity } from './steadyRoot.ts';
import { partOfTheWay } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export interface SteadyPoint {
  /** Part of the way from straight ahead to the command asked for, 0 … 1. */
  readonly share: number;
  /** Of the thruster whose angle stands for the craft's, rad. */
  readonly vector: number;
  readonly turn: Outcome<SteadyTurn>;
  /** Whether the craft settles in it. */
  readonly settles: boolean;
}

const POINTS = 24;

/** From little to all of the command: each turn is sought from that of the stronger command beside it, or else from cruise. */
export function steadyPoints(craft: TurningCraft, asked: TurnAsked): SteadyPoint[] {
  const { straight, turn } = commandsOf(craft, asked);
  const cruise = cruiseSpeedOf(craft, asked);
  const sizes = sizesOf(craft, turn, cruise);
  let beside: Velocity | null = null;
  const pointAt = (share: number): SteadyPoint => {
    const command = partOfTheWay(straight, turn, share);
    const near = beside && steadyNear(craft, command, beside, sizes);
    const found =
      near && settlesAt(craft, command, near, sizes)
        ? turnAt(craft, command, near, true)
        : steadyTurn(craft, straight, command, cruise);
    beside = found.status === 'solved' ? found.value.velocity : null;
    return {
      share,
      vector: command.angles[shownThruster(craft)]!,
      turn: found.status === 'solved' ? solved(found.value.turn) : found,
      settles: found.status === 'solved' && found.value.reached,
    };
  };
  return Array.from({ length: POINTS }, (_, i) => pointAt(1 - i / POINTS)).reverse();
}
