/** The window that the side view and the beam share: one scale, one pan. The page holds it and hands it to both. */
import { useCallback, useState } from 'react';
import type { View } from '../scene/view.ts';

export interface ViewState {
  readonly view: View;
  /** Whether it still follows the craft; false once a hand has moved it. */
  readonly fitted: boolean;
  /** Counts the times it was asked to fit. */
  readonly asked: number;
  /** Changes the view; `fitted` says whether it goes on following the craft, by default not. */
  setView(change: (view: View) => View, fitted?: boolean): void;
  /** Shows the whole craft again. */
  fit(): void;
}

const START: View = { scale: 200, originX: 0, originY: 0, width: 0, height: 0, tilt: 0, pivot: 0 };

export function useView(): ViewState {
  const [state, setState] = useState({ view: START, fitted: true, asked: 0 });
  const setView = useCallback((change: (view: View) => View, fitted = false) => {
    setState((old) => {
      const view = change(old.view);
      return view === old.view && fitted === old.fitted ? old : { ...old, view, fitted };
    });
  }, []);
  const fit = useCallback(() => setState((old) => ({ ...old, fitted: true, asked: old.asked + 1 })), []);
  return { ...state, setView, fit };
}
