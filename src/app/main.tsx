/** Opens the keep, puts the last craft on the page, and starts listening. */
import { createRoot } from 'react-dom/client';
import { App } from './App.tsx';
import { ErrorBoundary } from './ErrorBoundary.tsx';
import { listenForKeys } from './keyboard.ts';
import { firstOpening } from './openings.ts';
import { openKeep } from './openKeep.ts';
import { settingsFrom } from './settings.ts';
import { Store } from './store.ts';
import './base.css';
import './layout.css';
import './overlays.css';
import './panels.css';

const keep = await openKeep();
const [{ opening, refusal }, settings] = await Promise.all([
  firstOpening(keep),
  keep.setting('page').then(settingsFrom, () => settingsFrom(null)),
]);
const store = new Store(keep, opening, settings);
store.refusal.set(refusal);
if (!keep.lasting) {
  store.notices.add(
    'This browser window does not keep work. Save the craft to a file before closing it.',
    'bad',
  );
}
listenForKeys(store);
keepOnLeaving(store);
if (import.meta.env.PROD) void keepPageOffline();

createRoot(document.getElementById('root')!).render(
  <ErrorBoundary store={store}>
    <App store={store} />
  </ErrorBoundary>,
);

/** A page that goes takes in what is still being typed; where nothing lasts, leaving is asked about. */
function keepOnLeaving({ session, keepNow }: Store): void {
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'hidden') keepNow();
  });
  addEventListener('pagehide', () => {
    if (document.activeElement instanceof HTMLElement) document.activeElement.blur();
  });
  addEventListener('beforeunload', (event) => {
    if (!keep.lasting && session.getState().undoLabel) event.preventDefault();
  });
}

/** Where the browser allows it, the page itself opens again without a network. */
async function keepPageOffline(): Promise<void> {
  await navigator.serviceWorker?.register('./sw.js').catch(() => null);
}
