/** The column of panels, one in front at a time. */
import { lazy, type ReactNode, Suspense, useEffect } from 'react';
import { DayPanel } from '../panels/DayPanel.tsx';
import { FiguresPanel } from '../panels/FiguresPanel.tsx';
import { FilmPanel } from '../panels/FilmPanel.tsx';
import { GasPanel } from '../panels/GasPanel.tsx';
import { HullPanel } from '../panels/HullPanel.tsx';
import { Inspector } from '../panels/Inspector.tsx';
import { NotesPanel } from '../panels/NotesPanel.tsx';
import { PlanPanel } from '../panels/plan/PlanPanel.tsx';
import { type Tab, Tabs } from '../panels/Tabs.tsx';
import { TargetsPanel } from '../panels/TargetsPanel.tsx';
import type { Palette } from '../scene/palette.ts';
import { useCell } from './cell.ts';
import type { Store } from './store.ts';

type TabId = 'selected' | 'hull' | 'gas' | 'targets' | 'plan' | 'turn' | 'figures' | 'notes';

const TurnTab = lazy(async () => ({ default: (await import('./TurnTab.tsx')).TurnTab }));

const TABS: readonly Tab<TabId>[] = [
  { id: 'selected', title: 'Selected' },
  { id: 'hull', title: 'Hull' },
  { id: 'gas', title: 'Gas, day' },
  { id: 'targets', title: 'Targets' },
  { id: 'plan', title: 'Plan' },
  { id: 'turn', title: 'Turn' },
  { id: 'figures', title: 'Figures' },
  { id: 'notes', title: 'Notes' },
];

/** Panels that stay in front while things are picked. */
const READ: ReadonlySet<string> = new Set<TabId>(['figures', 'plan', 'turn']);

const PANELS: Readonly<Record<Exclude<TabId, 'turn'>, readonly ReactNode[]>> = {
  selected: [<Inspector key="inspector" />],
  hull: [<HullPanel key="hull" />, <FilmPanel key="film" />],
  gas: [<GasPanel key="gas" />, <DayPanel key="day" />],
  targets: [<TargetsPanel key="targets" />],
  plan: [<PlanPanel key="plan" />],
  figures: [<FiguresPanel key="figures" />],
  notes: [<NotesPanel key="notes" />],
};

interface SideColumnProps {
  readonly store: Store;
  readonly palette: Palette;
  readonly hidden: boolean;
}

export function SideColumn({ store, palette, hidden }: SideColumnProps) {
  const { tab } = useCell(store.view);
  const front = TABS.find(({ id }) => id === tab)?.id ?? 'hull';
  const show = (id: TabId) => store.view.set({ ...store.view.get(), tab: id });
  useSelectionInFront(store);
  return (
    <aside className="column" aria-label="Panels" hidden={hidden}>
      <Tabs<TabId> label="Panels" tabs={TABS} front={front} onFront={show} body="tab-panel" focusable>
        {front === 'turn' ? (
          <Suspense fallback={<p className="panel aside">Loading…</p>}>
            <TurnTab store={store} palette={palette} />
          </Suspense>
        ) : (
          PANELS[front]
        )}
      </Tabs>
    </aside>
  );
}

/** What is newly selected comes to the front, unless the builder is reading figures, the plan or the turn. */
function useSelectionInFront({ session, view }: Store): void {
  useEffect(() => {
    let before = session.getState().selection;
    return session.subscribe(() => {
      const { selection } = session.getState();
      const fresh = selection !== before && selection.length > 0;
      before = selection;
      if (fresh && !READ.has(view.get().tab)) view.set({ ...view.get(), tab: 'selected' });
    });
  }, [session, view]);
}
