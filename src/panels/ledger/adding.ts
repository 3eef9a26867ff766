/** Adds things and selects them, so that what was added is what is typed into next. */
import { useCallback } from 'react';
import type { Edit } from '../../edit/edit.ts';
import type { Selectable } from '../../edit/selection.ts';
import { useEditor } from '../editor.ts';

/** Runs an edit that adds things of that kind. True when it was done. */
export function useAdding(kind: Selectable['kind']): (edit: Edit) => boolean {
  const { session, apply } = useEditor();
  return useCallback(
    (edit) => {
      const before = new Set(session.getState().craft[`${kind}s`].order);
      if (!apply(edit)) return false;
      const added = session.getState().craft[`${kind}s`].order.filter((id) => !before.has(id));
      session.select(added.map((id) => ({ kind, id })));
      return true;
    },
    [session, apply, kind],
  );
}
