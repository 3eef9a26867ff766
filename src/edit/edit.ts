/**
 * A named edit: an Immer recipe on the craft, and how it enters history. Both are required, so that no caller can
 * forget to say.
 */
import type { Draft } from 'immer';
import type { Craft } from '../craft/craft.ts';

export type Recipe = (craft: Draft<Craft>) => void;

/**
 * `step`: one entry of its own. `{ run }`: joins the entry before it when that has the same run, so that a burst of
 * nudges or keystrokes in one field is undone at once.
 */
export type HistoryRule = 'step' | { readonly run: string };

export interface Edit {
  /** What the undo button says: "Move battery". */
  readonly label: string;
  readonly history: HistoryRule;
  readonly recipe: Recipe;
}

export const step = (label: string, recipe: Recipe): Edit => ({ label, history: 'step', recipe });

export const runOf = (run: string, label: string, recipe: Recipe): Edit => inRun(step(label, recipe), run);

/** The same edit as one of a burst: keystrokes in notes, arrow keys in a field. */
export const inRun = (edit: Edit, run: string): Edit => ({ ...edit, history: { run } });
