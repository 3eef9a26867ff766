/** What every panel is given: the craft being edited, its figures, and the ways to change it. The page provides it. */
import { createContext, useContext } from 'react';
import type { Craft } from '../craft/craft.ts';
import type { Edit } from '../edit/edit.ts';
import type { Selection } from '../edit/selection.ts';
import type { Session } from '../edit/session.ts';
import type { Assessment } from '../report/assessment.ts';
import type { UnitSystem } from '../units/units.ts';

export interface Editor {
  readonly session: Session;
  readonly craft: Craft;
  readonly selection: Selection;
  readonly dragging: boolean;
  readonly undoLabel: string | null;
  readonly redoLabel: string | null;
  readonly assessment: Assessment;
  readonly units: UnitSystem;
  /** Whether a pick adds to what is selected, as it does with Ctrl. */
  readonly several: boolean;
  /** Runs the edit; what is wrong with its result goes to the notice area. True when it was done. */
  apply(edit: Edit): boolean;
  select(selection: Selection): void;
  notify(message: string, tone?: 'info' | 'bad'): void;
}

export const EditorContext = createContext<Editor | null>(null);

/** The editor around this component. Throws outside of one: that is a mistake in the page, not in a craft. */
export function useEditor(): Editor {
  const editor = useContext(EditorContext);
  if (!editor) throw new Error('useEditor needs an EditorContext around it');
  return editor;
}
