/** What the turn panel is given of the study where a thruster had better sit, and the ways to ask for one. The page provides it. */
import { createContext, useContext } from 'react';
import type { Craft } from '../../craft/craft.ts';
import type { PlacedPoint, TurnAsked } from '../../report/turning/studies.ts';

export interface StudyState {
  /** The thruster that is moved; null while there is no study. */
  readonly part: string | null;
  /** The craft it is worked out for. */
  readonly craft: Craft | null;
  /** How it was to be flown. */
  readonly asked: TurnAsked | null;
  /** Nose first, as far as it is worked out. */
  readonly points: readonly PlacedPoint[];
  /** The thruster where it was in that craft. */
  readonly today: PlacedPoint | null;
  readonly busy: boolean;
  /** Share done, 0 … 1. */
  readonly share: number;
  /** Whether the last station was reached. */
  readonly complete: boolean;
  /** Why there is none, or only a part of it. */
  readonly why: string | null;
}

export interface Studying extends StudyState {
  start(part: string, asked: TurnAsked): void;
  /** Takes a stopped one up again: only what was not worked out yet. */
  goOn(): void;
  /** What was worked out so far stays. */
  stop(): void;
  /** Puts the study away. */
  close(): void;
}

export const NO_STUDY: StudyState = {
  part: null,
  craft: null,
  asked: null,
  points: [],
  today: null,
  busy: false,
  share: 0,
  complete: false,
  why: null,
};

export const StudyingContext = createContext<Studying | null>(null);

/** The study around this component. Throws outside of one: that is a mistake in the page, not in a craft. */
export function useStudying(): Studying {
  const studying = useContext(StudyingContext);
  if (!studying) throw new Error('useStudying needs a StudyingContext around it');
  return studying;
}
