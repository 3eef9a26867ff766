/**
 * Side view, beam and front view; under the front view the view from above, while the turn is in front. Side view and beam
 * share one scale of stations; a placement study takes the place of the beam.
 */
import { lazy, Suspense, useEffect, useRef } from 'react';
import { BeamView } from '../canvas/BeamView.tsx';
import { FrontView } from '../canvas/FrontView.tsx';
import { SideView } from '../canvas/SideView.tsx';
import { useView } from '../canvas/useView.ts';
import type { Editor } from '../panels/editor.ts';
import type { Palette } from '../scene/palette.ts';
import { useCell } from './cell.ts';
import { NoticeArea } from './NoticeArea.tsx';
import { usePlanDrawn } from './planDrawn.ts';
import type { Store } from './store.ts';
import { useStudyDrawn } from './studyDrawn.ts';

const AboveView = lazy(async () => ({ default: (await import('../canvas/AboveView.tsx')).AboveView }));
const PlacePlot = lazy(async () => ({ default: (await import('../canvas/PlacePlot.tsx')).PlacePlot }));

interface DrawingProps {
  readonly store: Store;
  readonly editor: Editor;
  readonly palette: Palette;
}

export function Drawing({ store, editor, palette }: DrawingProps) {
  const { session, craft, selection, assessment, units } = editor;
  const { tilted, tab } = useCell(store.view);
  const planDrawn = usePlanDrawn(editor, tab === 'plan');
  const studyDrawn = useStudyDrawn(editor, tab === 'turn');
  const viewState = useView();
  useFitOnCommand(store, viewState.fit);
  const { snap, several } = useCell(store.hands);
  const turning = tab === 'turn';
  const shown = { session, craft, selection, assessment, units, palette, tilted, snap, several, turning };
  return (
    <div className={studyDrawn ? 'drawing studied' : 'drawing'}>
      <NoticeArea notices={store.notices} />
      <div className="side-view">
        <SideView {...shown} {...planDrawn} viewState={viewState} />
      </div>
      <div className="front-view">
        <div className="from-astern">
          <FrontView {...shown} {...planDrawn} />
        </div>
        {turning && (
          <div className="from-above">
            <Suspense fallback={null}>
              <AboveView {...shown} />
            </Suspense>
          </div>
        )}
      </div>
      <div className="beam-view">
        {studyDrawn ? (
          <Suspense fallback={null}>
            <PlacePlot {...studyDrawn} {...{ viewState, palette, units }} />
          </Suspense>
        ) : (
          <BeamView {...shown} {...planDrawn} viewState={viewState} />
        )}
      </div>
    </div>
  );
}

function useFitOnCommand({ fit: asked }: Store, fit: () => void): void {
  const latest = useRef(fit);
  latest.current = fit;
  useEffect(() => asked.subscribe(() => latest.current()), [asked]);
}
