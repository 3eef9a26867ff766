/** The row of buttons at the top: whole-craft commands, undo and redo, and how the craft is looked at. */

import { useCell } from './cell.ts';
import type { CommandId } from './commands.ts';
import { COMMANDS } from './commands.ts';
import { Icon, type IconName } from './Icon.tsx';
import { keysText, SHORTCUTS } from './shortcuts.ts';
import type { Store } from './store.ts';

export const isMac = (): boolean => /Mac|iP(ad|hone)/.test(navigator.platform);

/** "Undo (Ctrl + Z)": what a command's button says when one rests on it. */
function hintOf(command: CommandId, words: string): string {
  const keys = SHORTCUTS.find((shortcut) => shortcut.command === command)?.keys[0];
  return keys ? `${words} (${keysText(keys, isMac())})` : words;
}

interface CommandButtonProps {
  readonly store: Store;
  readonly command: CommandId & IconName;
  readonly words: string;
  /** The accessible name, when the words alone do not say enough. */
  readonly name?: string;
  readonly disabled?: boolean;
  readonly pressed?: boolean;
  /** Whether the words give way to the sign on a narrow page. */
  readonly terse?: boolean;
}

function CommandButton({ store, command, words, name, disabled, pressed, terse }: CommandButtonProps) {
  return (
    <button
      type="button"
      className={terse ? 'command terse' : 'command'}
      title={hintOf(command, name ?? words)}
      aria-label={name ?? words}
      aria-pressed={pressed}
      disabled={disabled}
      onClick={() => COMMANDS[command](store)}
    >
      <Icon name={command} />
      <span>{words}</span>
    </button>
  );
}

export function CommandBar({ store }: { store: Store }) {
  return (
    <header className="bar">
      <h1 className="wordmark">Steelyard</h1>
      <CraftCommands store={store} />
      <HistoryCommands store={store} />
      <ViewCommands store={store} />
    </header>
  );
}

const CraftCommands = ({ store }: { store: Store }) => (
  <fieldset className="group" aria-label="Craft">
    <CommandButton store={store} command="new" words="New" name="New craft" terse />
    <CommandButton store={store} command="crafts" words="Crafts" />
    <CommandButton store={store} command="open" words="Open" name="Open a craft file" terse />
    <CommandButton store={store} command="save" words="Save" name="Save to a file" />
  </fieldset>
);

function HistoryCommands({ store }: { store: Store }) {
  const { undoLabel, redoLabel } = useCell(store.shown);
  return (
    <fieldset className="group history" aria-label="History">
      <CommandButton
        store={store}
        command="undo"
        words={undoLabel ? `Undo: ${undoLabel}` : 'Undo'}
        name={undoLabel ? `Undo: ${undoLabel}` : 'Undo'}
        disabled={undoLabel === null}
      />
      <CommandButton
        store={store}
        command="redo"
        words="Redo"
        name={redoLabel ? `Redo: ${redoLabel}` : 'Redo'}
        disabled={redoLabel === null}
        terse
      />
    </fieldset>
  );
}

const THEME_WORDS = { system: 'As the system', light: 'Light', dark: 'Dark' } as const;

function ViewCommands({ store }: { store: Store }) {
  const { tilted } = useCell(store.view);
  const { units, theme } = useCell(store.settings);
  return (
    <fieldset className="group view" aria-label="View">
      <CommandButton store={store} command="tilt" words="As it floats" pressed={tilted} />
      <CommandButton store={store} command="fit" words="Fit" name="Fit the craft in the view" terse />
      <CommandButton
        store={store}
        command="units"
        words={units === 'metric' ? 'Metric' : 'Imperial'}
        name={`Units: ${units}`}
      />
      <CommandButton
        store={store}
        command="theme"
        words={THEME_WORDS[theme]}
        name={`Colours: ${THEME_WORDS[theme].toLowerCase()}`}
        terse
      />
      <CommandButton store={store} command="keys" words="Keys" name="Keys and gestures" terse />
    </fieldset>
  );
}
