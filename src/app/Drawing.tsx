/** Side view, beam and front view. Side view and beam share one scale of stations. */
import { useEffect, useRef } from 'react';
import { BeamView } from '../canvas/BeamView.tsx';
import { FrontView } from '../canvas/FrontView.tsx';
import { SideView } from '../canvas/SideView.tsx';
import { useView } from '../canvas/useView.ts';
import type { Editor } from '../panels/editor.ts';
import type { Palette } from '../scene/palette.ts';
import { useCell } from './cell.ts';
import { NoticeArea } from './NoticeArea.tsx';
import type { Store } from './store.ts';

interface DrawingProps {
  readonly store: Store;
  readonly editor: Editor;
  readonly palette: Palette;
}

export function Drawing({ store, editor, palette }: DrawingProps) {
  const { session, craft, selection, assessment, units } = editor;
  const { tilted } = useCell(store.view);
  const viewState = useView();
  useFitOnCommand(store, viewState.fit);
  const { snap, several } = useCell(store.hands);
  const shown = { session, craft, selection, assessment, units, palette, tilted, snap, several };
  return (
    <div className="drawing">
      <NoticeArea notices={store.notices} />
      <div className="side-view">
        <SideView {...shown} viewState={viewState} />
      </div>
      <div className="front-view">
        <FrontView {...shown} />
      </div>
      <div className="beam-view">
        <BeamView {...shown} viewState={viewState} />
      </div>
    </div>
  );
}

function useFitOnCommand({ fit: asked }: Store, fit: () => void): void {
  const latest = useRef(fit);
  latest.current = fit;
  useEffect(() => asked.subscribe(() => latest.current()), [asked]);
}
