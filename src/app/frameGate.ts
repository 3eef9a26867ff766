/**
 * A session's state as the page shows it. During a drag at most one new state comes per animation frame, however
 * many pointer moves there are; everything else comes at once.
 */
import type { Session, SessionState } from '../edit/session.ts';
import { Cell } from './cell.ts';

export interface Frames {
  request(callback: () => void): number;
  cancel(handle: number): void;
}

export const browserFrames: Frames = {
  request: (callback) => requestAnimationFrame(callback),
  cancel: (handle) => cancelAnimationFrame(handle),
};

/** Watches the session for as long as the page lives. */
export function shownState(session: Session, frames: Frames = browserFrames): Cell<SessionState> {
  const shown = new Cell(session.getState());
  let waiting: number | null = null;
  const show = () => {
    if (waiting !== null) frames.cancel(waiting);
    waiting = null;
    shown.set(session.getState());
  };
  session.subscribe(() => {
    if (!session.getState().dragging) show();
    else waiting ??= frames.request(show);
  });
  return shown;
}
