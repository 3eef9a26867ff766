/** Adds things and selects them, so that what was added is what is typed into next. */
import { useCallback, useState } from 'react';
import type { Edit } from '../../edit/edit.ts';
import type { Selectable } from '../../edit/selection.ts';
import { useEditor } from '../editor.ts';

/** Runs an edit that adds things of that kind. The ids of what came; null when it was not done. */
export function useAdding(kind: Selectable['kind']): (edit: Edit) => readonly string[] | null {
  const { session, apply } = useEditor();
  return useCallback(
    (edit) => {
      const before = new Set(session.getState().craft[`${kind}s`].order);
      if (!apply(edit)) return null;
      const added = session.getState().craft[`${kind}s`].order.filter((id) => !before.has(id));
      session.select(added.map((id) => ({ kind, id })));
      return added;
    },
    [session, apply, kind],
  );
}

/** A thing just added whose name is to be typed next. */
export interface Fresh {
  readonly id: string | null;
  /** To be told once its name stands open. */
  readonly opened: () => void;
}

/** Adds a thing and opens its name for typing. */
export function useNaming(kind: Selectable['kind']): { fresh: Fresh; addAndName: (edit: Edit) => void } {
  const add = useAdding(kind);
  const [id, setId] = useState<string | null>(null);
  const opened = useCallback(() => setId(null), []);
  return { fresh: { id, opened }, addAndName: (edit) => setId(add(edit)?.[0] ?? null) };
}
