/** The turn panel with the path player in it; loaded with the tab, so that the opening page stays light. */
import { TurnPathPlayer } from '../canvas/TurnPathPlayer.tsx';
import { useEditor } from '../panels/editor.ts';
import { TurnPanel } from '../panels/turn/TurnPanel.tsx';
import type { Palette } from '../scene/palette.ts';
import type { Store } from './store.ts';

export function TurnTab({ store, palette }: { store: Store; palette: Palette }) {
  const { assessment, units } = useEditor();
  const { geometry } = assessment;
  return (
    <TurnPanel
      player={(turn) =>
        geometry.status === 'solved' && <TurnPathPlayer {...{ turn, geometry, units, palette }} />
      }
      onTargets={() => store.view.set({ ...store.view.get(), tab: 'targets' })}
    />
  );
}
