/** The ground that gestures work on: always the latest scene, the overlay, and the view. */
import { useCallback, useRef, useState } from 'react';
import type { PlanePoint } from '../scene/view.ts';
import type { Ground, Scene } from './gestures/gesture.ts';
import { CLEAR, type Overlay } from './overlay.ts';
import type { CanvasProps } from './props.ts';
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
  { session, snap = true, several = false }: Pick<CanvasProps, 'session' | 'snap' | 'several'>,
  scene: Scene,
  { show }: OverlayState,
  { setView, fit }: ViewState,
): Ground {
  const latest = useRef(scene);
  latest.current = scene;
  const lastClick = useRef<PlanePoint | null>(null);
  return {
    session,
    habits: { snap, several },
    lastClick,
    scene: () => latest.current,
    show,
    setView: (change) => setView((view) => change({ ...latest.current.view, ...pickView(view) })),
    fit,
  };
}

/** Scale and pan are the shared view's; size, tilt and pivot are this canvas's own. */
const pickView = ({ scale, originX, originY }: Scene['view']) => ({ scale, originX, originY });
