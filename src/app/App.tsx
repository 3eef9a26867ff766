/** The page: the drawing is the middle of it, the ledger under it, one panel beside it. */
import { useEffect, useState } from 'react';
import { EditorContext } from '../panels/editor.ts';
import { PlanningContext } from '../panels/plan/planning.ts';
import { StudyingContext } from '../panels/turn/studying.ts';
import { TurningContext } from '../panels/turn/turning.ts';
import { PlanClient } from '../worker/planClient.ts';
import { CommandBar } from './CommandBar.tsx';
import { useCell } from './cell.ts';
import { openFile } from './commands.ts';
import { Dialogs } from './Dialogs.tsx';
import { dropKind, takeDrops } from './drops.ts';
import { takePastes } from './pastes.ts';
import type { Store } from './store.ts';
import { usePalette } from './theme.ts';
import { useEditorOf } from './useEditorOf.ts';
import { usePlanningOf } from './usePlanningOf.ts';
import { useStudyingOf } from './useStudyingOf.ts';
import { useTurningOf } from './useTurningOf.ts';
import { Workspace } from './Workspace.tsx';

export function App({ store }: { store: Store }) {
  const editor = useEditorOf(store);
  // One thread for plans, curves and studies; it begins with the first request.
  const [client] = useState(() => new PlanClient());
  const studying = useStudyingOf(store, client);
  const turning = useTurningOf(store);
  const planning = usePlanningOf(store, client, turning.subject);
  const palette = usePalette(useCell(store.settings).theme);
  const over = useDrops(store);
  useEffect(() => takePastes(store.table.set), [store]);
  const { name } = editor.craft;
  useEffect(() => {
    document.title = `${name || 'Craft without a name'} – Steelyard`;
  }, [name]);
  return (
    <EditorContext value={editor}>
      <CommandBar store={store} />
      <PlanningContext value={planning}>
        <StudyingContext value={studying}>
          <TurningContext value={turning}>
            <Workspace store={store} editor={editor} palette={palette} />
          </TurningContext>
        </StudyingContext>
      </PlanningContext>
      <Dialogs store={store} />
      {over && (
        <div className="drop-veil">Drop a craft file to open it, or a table of parts to add them.</div>
      )}
    </EditorContext>
  );
}

/** Whether a file hangs above the page, and what becomes of it when it is let go. */
function useDrops(store: Store): boolean {
  const [over, setOver] = useState(false);
  useEffect(() => takeDrops((file) => void takeFile(store, file), setOver), [store]);
  return over;
}

async function takeFile(store: Store, file: File): Promise<void> {
  switch (dropKind(file)) {
    case 'table':
      return store.table.set(await file.text());
    case 'craft':
      return openFile(store, file);
    case 'other':
      store.notices.add(`${file.name} is neither a craft file (.json) nor a table of parts (.csv).`, 'bad');
  }
}
