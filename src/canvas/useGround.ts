/** The ground that gestures work on: always the latest scene, the overlay, and the view. */
import { useCallback, useRef, useState } from 'react';
import type { Session } from '../edit/session.ts';
import type { Ground, Scene } from './gestures/gesture.ts';
import { CLEAR, type Overlay } from './overlay.ts';
import type { ViewState } from './useView.ts';

export interface OverlayState {
  readonly overlay: Overlay;
  show(change: Partial<Overlay>): void;
}

export function useOverlay(): OverlayState {
  const [overlay, setOverlay] = useState(CLEAR);
  const show = useCallback((change: Partial<Overlay>) => setOverlay((old) => ({ ...old, ...change })), []);
  return { overlay, show };
}

export function useGround(
  session: Session,
  scene: Scene,
  { show }: OverlayState,
  { setView, fit }: ViewState,
): Ground {
  const latest = useRef(scene);
  latest.current = scene;
  return {
    session,
    scene: () => latest.current,
    show,
    setView: (change) => setView((view) => change({ ...latest.current.view, ...pickView(view) })),
    fit,
  };
}

/** Scale and pan are the shared view's; size, tilt and pivot are this canvas's own. */
const pickView = ({ scale, originX, originY }: Scene['view']) => ({ scale, originX, originY });
