/** Listens for keys on the whole page and runs their commands. */
import { COMMANDS } from './commands.ts';
import { commandFor } from './shortcuts.ts';
import type { Store } from './store.ts';

const TYPED_IN =
  'input:not([type=checkbox]):not([type=radio]):not([type=button]):not([type=file]), textarea, [contenteditable]';
/** Elements to which a key without Ctrl or Cmd belongs: a letter goes to its entry in a list. */
const KEYED = 'input, select, textarea, [contenteditable], [role=menu], [role=listbox]';
/** Elements that use the arrow keys themselves. */
const ARROWED = '[role=tab], [role=separator], [role=slider]';

const closest = (target: EventTarget | null, selector: string): boolean =>
  target instanceof Element && target.closest(selector) !== null;

/** Whether keys and pasted text go into a field there. */
export const inText = (target: EventTarget | null): boolean => closest(target, TYPED_IN);

/** Starts listening; returns how to stop. */
export function listenForKeys(store: Store): () => void {
  /** The field whose text was changed and not yet committed: undo and redo there are the browser's own. */
  let drafted: EventTarget | null = null;
  const onInput = ({ target }: Event) => {
    drafted = closest(target, TYPED_IN) ? target : null;
  };
  const onFocusOut = () => {
    drafted = null;
  };
  // Fields keep these keys to themselves, so they are seen on their way down.
  const onSettle = ({ key }: KeyboardEvent) => {
    if (key === 'Enter' || key === 'Escape') drafted = null;
  };
  const onKey = (event: KeyboardEvent) => {
    if (event.defaultPrevented || event.isComposing) return;
    const own = event.ctrlKey || event.metaKey ? TYPED_IN : KEYED;
    const command = commandFor(event, closest(event.target, own));
    if (!command || !allowed(command, event, drafted)) return;
    event.preventDefault();
    COMMANDS[command](store);
  };
  const stop = new AbortController();
  const { signal } = stop;
  document.addEventListener('input', onInput, { signal });
  document.addEventListener('focusout', onFocusOut, { signal });
  document.addEventListener('keydown', onSettle, { signal, capture: true });
  document.addEventListener('keydown', onKey, { signal });
  return () => stop.abort();
}

function allowed(command: string, { target, key }: KeyboardEvent, drafted: EventTarget | null): boolean {
  if (document.querySelector('dialog[open]')) return false;
  if (command === 'undo' || command === 'redo') return drafted === null || drafted !== target;
  return !(key.startsWith('Arrow') && closest(target, ARROWED));
}
