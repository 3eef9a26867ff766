/** A verdict: a word, a number and a margin, opening into its working. */
import type { Row } from './row.ts';

export const VERDICT_KEYS = ['floats', 'level', 'upright', 'even', 'lead'] as const;
export type VerdictKey = (typeof VERDICT_KEYS)[number];

export interface Verdict {
  readonly key: VerdictKey;
  /** What it is about: "Floats", "Level", "Upright", "Even", "Lead on the nose". */
  readonly title: string;
  /** met: inside its target. missed: outside it. open: there is something to do, or it cannot be told. */
  readonly state: 'met' | 'missed' | 'open';
  /** One or two words: "tail-heavy", "level". */
  readonly word: string;
  /** The figure it rests on. */
  readonly row: Row;
  /** That figure without its sign, "15.8°", and the word that stands for the sign, "nose-up"; none for as good as zero. */
  readonly figure: string;
  readonly side: string;
  /** The target in words: "within ±2.0°". */
  readonly target: string;
  /** How far inside (+) or outside (−) the target, in the row's quantity; null where there is no such number. */
  readonly margin: number | null;
  /** The margin in words: "256 mm to spare", "off by 13.8°"; empty where there is none. */
  readonly marginWords: string;
  readonly working: Working;
}

/** How a figure came about. */
export interface Working {
  /** In the symbols of the trade. */
  readonly formula: string;
  /** The rows that went in, in order. */
  readonly inputs: readonly Row[];
  /** Standard, handbook or derivation it rests on. */
  readonly source: string;
}
