/** The column of panels, one in front at a time. */
import { type KeyboardEvent, type ReactNode, useEffect } from 'react';
import { DayPanel } from '../panels/DayPanel.tsx';
import { FiguresPanel } from '../panels/FiguresPanel.tsx';
import { FilmPanel } from '../panels/FilmPanel.tsx';
import { GasPanel } from '../panels/GasPanel.tsx';
import { HullPanel } from '../panels/HullPanel.tsx';
import { Inspector } from '../panels/Inspector.tsx';
import { NotesPanel } from '../panels/NotesPanel.tsx';
import { TargetsPanel } from '../panels/TargetsPanel.tsx';
import { useCell } from './cell.ts';
import type { Store } from './store.ts';

interface Tab {
  readonly id: string;
  readonly title: string;
  readonly panel: ReactNode;
}

const TABS: readonly Tab[] = [
  { id: 'selected', title: 'Selected', panel: <Inspector /> },
  {
    id: 'hull',
    title: 'Hull',
    panel: (
      <>
        <HullPanel />
        <FilmPanel />
      </>
    ),
  },
  {
    id: 'gas',
    title: 'Gas, day',
    panel: (
      <>
        <GasPanel />
        <DayPanel />
      </>
    ),
  },
  { id: 'targets', title: 'Targets', panel: <TargetsPanel /> },
  { id: 'figures', title: 'Figures', panel: <FiguresPanel /> },
  { id: 'notes', title: 'Notes', panel: <NotesPanel /> },
];

export function SideColumn({ store, hidden }: { store: Store; hidden: boolean }) {
  const { tab } = useCell(store.view);
  const front = TABS.find(({ id }) => id === tab) ?? TABS[0]!;
  const show = (id: string) => store.view.set({ ...store.view.get(), tab: id });
  useSelectionInFront(store);
  return (
    <aside className="column" aria-label="Panels" hidden={hidden}>
      <TabList front={front.id} show={show} />
      <div
        className="tab-panel"
        role="tabpanel"
        id="tab-panel"
        aria-labelledby={`tab-${front.id}`}
        // biome-ignore lint/a11y/noNoninteractiveTabindex: it scrolls, so keys must reach it.
        tabIndex={0}
      >
        {front.panel}
      </div>
    </aside>
  );
}

/** What is newly selected comes to the front, unless the builder is reading figures. */
function useSelectionInFront({ session, view }: Store): void {
  useEffect(() => {
    let before = session.getState().selection;
    return session.subscribe(() => {
      const { selection } = session.getState();
      const fresh = selection !== before && selection.length > 0;
      before = selection;
      if (fresh && view.get().tab !== 'figures') view.set({ ...view.get(), tab: 'selected' });
    });
  }, [session, view]);
}

function TabList({ front, show }: { front: string; show: (id: string) => void }) {
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>) => {
    const next = neighbour(front, event.key);
    if (!next) return;
    event.preventDefault();
    show(next);
    document.getElementById(`tab-${next}`)?.focus();
  };
  return (
    <div className="tabs" role="tablist" aria-label="Panels" onKeyDown={onKeyDown}>
      {TABS.map(({ id, title }) => (
        <button
          key={id}
          type="button"
          role="tab"
          id={`tab-${id}`}
          aria-selected={id === front}
          aria-controls="tab-panel"
          tabIndex={id === front ? 0 : -1}
          onClick={() => show(id)}
        >
          {title}
        </button>
      ))}
    </div>
  );
}

/** The tab to which an arrow key leads, or Home and End; undefined for other keys. */
function neighbour(front: string, key: string): string | undefined {
  const at = TABS.findIndex(({ id }) => id === front);
  const steps: Readonly<Record<string, number>> = {
    ArrowLeft: at - 1,
    ArrowRight: at + 1,
    Home: 0,
    End: -1,
  };
  const to = steps[key];
  return to === undefined ? undefined : TABS.at(to % TABS.length)?.id;
}
