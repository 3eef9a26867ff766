/** How the builder asks to see the craft fly: throttle, steering and cruise. The page keeps it, not the craft file. */
import { createContext, useContext } from 'react';

/** limit: hardest to starboard. set: as the arrows of the thrusters are turned. */
export type Steering = 'limit' | 'set';

/** today: the craft as it is. planned: with its ballast plan carried out. */
export type Subject = 'today' | 'planned';

export interface TurningState {
  /** Of which craft the figures are. */
  readonly subject: Subject;
  /** Share of full throttle, 0 … 1. */
  readonly throttle: number;
  readonly steering: Steering;
  /** The thruster whose arrow was turned last; null for the first that turns in yaw. */
  readonly turned: string | null;
  /** Of the cruise it begins from, m/s; null for the steady speed at that throttle. */
  readonly speed: number | null;
  /** The thruster that every station is tried for; null for the first. */
  readonly tried: string | null;
  /** A station of the study that the list points at, m. */
  readonly marked: number | null;
}

export interface Turning extends TurningState {
  set(change: Partial<TurningState>): void;
}

export const FIRST_TURNING: TurningState = {
  subject: 'today',
  throttle: 1,
  steering: 'limit',
  turned: null,
  speed: null,
  tried: null,
  marked: null,
};

export const TurningContext = createContext<Turning | null>(null);

/** The choices around this component. Throws outside of one: that is a mistake in the page, not in a craft. */
export function useTurning(): Turning {
  const turning = useContext(TurningContext);
  if (!turning) throw new Error('useTurning needs a TurningContext around it');
  return turning;
}
