/** What the panels are given, made from the store. */
import { useMemo } from 'react';
import type { Editor } from '../panels/editor.ts';
import { assessed } from './assessed.ts';
import { useCell } from './cell.ts';
import type { Store } from './store.ts';

export function useEditorOf(store: Store): Editor {
  const { craft, selection, dragging, undoLabel, redoLabel } = useCell(store.shown);
  const { units } = useCell(store.settings);
  const { several } = useCell(store.hands);
  return useMemo(
    () => ({
      session: store.session,
      craft,
      selection,
      dragging,
      undoLabel,
      redoLabel,
      assessment: assessed(craft, units),
      units,
      several,
      apply: store.apply,
      select: (next) => store.session.select(next),
      notify: store.notices.add,
    }),
    [store, craft, selection, dragging, undoLabel, redoLabel, units, several],
  );
}
