/** How a field hands its edit in: it gets back what is wrong, to say so where it was typed. */
import { useCallback } from 'react';
import type { Problem } from '../craft/problem.ts';
import { type Edit, inRun } from '../edit/edit.ts';
import { useEditor } from './editor.ts';

/**
 * Runs an edit; null when it was done, else the first thing wrong with its result, the craft staying as it was.
 * `run`: the burst it belongs to, when it is one of many that are undone at once.
 */
export type Commit = (edit: Edit, run?: string) => Problem | null;

/** The same function as long as the session is the same, so that rows and panels can be memoised. */
export function useCommit(): Commit {
  const { session } = useEditor();
  return useCallback(
    (edit, run) => session.apply(run === undefined ? edit : inRun(edit, run))[0] ?? null,
    [session],
  );
}
