/** Undo and redo as lists of patches, without limit within a session. Pure: every function returns a new history. */
import { applyPatches, enablePatches, type Patch, produceWithPatches } from 'immer';
import type { Craft } from '../craft/craft.ts';
import type { Edit, HistoryRule, Recipe } from './edit.ts';

enablePatches();

export interface Entry {
  readonly label: string;
  readonly history: HistoryRule;
  readonly patches: readonly Patch[];
  readonly inverse: readonly Patch[];
}

export interface History {
  readonly past: readonly Entry[];
  readonly future: readonly Entry[];
}

export const EMPTY_HISTORY: History = { past: [], future: [] };

/** Runs a recipe; `patches` is empty when it changed nothing. */
export function run(craft: Craft, recipe: Recipe): { craft: Craft; patches: Patch[]; inverse: Patch[] } {
  const [next, patches, inverse] = produceWithPatches(craft, (draft) => {
    recipe(draft);
  });
  return patches.length ? { craft: next, patches, inverse } : { craft, patches, inverse };
}

/** The history after an edit; a new edit forgets what was undone. */
export function record(
  history: History,
  { label, history: rule }: Edit,
  patches: Patch[],
  inverse: Patch[],
): History {
  const last = history.past.at(-1);
  const joins = last && history.future.length === 0 && rule !== 'step' && sameRun(last.history, rule);
  const entry = joins
    ? { label, history: rule, patches: [...last.patches, ...patches], inverse: [...inverse, ...last.inverse] }
    : { label, history: rule, patches, inverse };
  return { past: [...(joins ? history.past.slice(0, -1) : history.past), entry], future: [] };
}

const sameRun = (a: HistoryRule, b: HistoryRule): boolean => a !== 'step' && b !== 'step' && a.run === b.run;

/** The last entry no longer takes in further edits of its run. */
export function closeRun(history: History): History {
  const last = history.past.at(-1);
  if (!last || last.history === 'step') return history;
  return { ...history, past: [...history.past.slice(0, -1), { ...last, history: 'step' }] };
}

/** The craft and history one entry back, or null at the start. */
export function undo(craft: Craft, { past, future }: History): { craft: Craft; history: History } | null {
  const last = past.at(-1);
  if (!last) return null;
  return {
    craft: applyPatches(craft, last.inverse),
    history: closeRun({ past: past.slice(0, -1), future: [last, ...future] }),
  };
}

/** The craft and history one entry on, or null at the end. */
export function redo(craft: Craft, { past, future }: History): { craft: Craft; history: History } | null {
  const [next, ...rest] = future;
  if (!next) return null;
  return {
    craft: applyPatches(craft, next.patches),
    history: closeRun({ past: [...past, next], future: rest }),
  };
}
