/** The row of buttons at the top: whole-craft commands, undo and redo, and how the craft is looked at. */
import { setName } from '../edit/edits/craft.ts';
import { useCommit } from '../panels/commit.ts';
import { useEditor } from '../panels/editor.ts';
import { TextField } from '../panels/fields/TextField.tsx';
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
  /** More than the name, for the pointer that rests and the screen reader. */
  readonly hint?: string;
  readonly disabled?: boolean;
  readonly pressed?: boolean;
}

function CommandButton({ store, command, words, name, hint, disabled, pressed }: CommandButtonProps) {
  return (
    <button
      type="button"
      className="command"
      title={hintOf(command, hint ?? name ?? words)}
      aria-label={name ?? words}
      aria-description={hint}
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
      <CraftName />
      <CraftCommands store={store} />
      <HistoryCommands store={store} />
      <HandCommands store={store} />
      <ViewCommands store={store} />
    </header>
  );
}

/** Which craft this is, and where its name is changed. */
function CraftName() {
  const { name } = useEditor().craft;
  const commit = useCommit();
  return (
    <div className="craft-name" title={name}>
      <TextField bare label="Name of the craft" value={name} onCommit={(next) => commit(setName(next))} />
    </div>
  );
}

const CraftCommands = ({ store }: { store: Store }) => (
  <fieldset className="group" aria-label="Craft">
    <CommandButton store={store} command="new" words="New" name="New craft" />
    <CommandButton store={store} command="crafts" words="Crafts" />
    <CommandButton store={store} command="open" words="Open" name="Open a craft file" />
    <CommandButton store={store} command="save" words="Save" name="Save to a file" />
  </fieldset>
);

/** "Undo: change mass of Camera". */
const doing = (word: string, label: string | null): string =>
  label ? `${word}: ${label[0]!.toLowerCase()}${label.slice(1)}` : word;

function HistoryCommands({ store }: { store: Store }) {
  const { undoLabel, redoLabel } = useCell(store.shown);
  return (
    <fieldset className="group" aria-label="History">
      <CommandButton
        store={store}
        command="undo"
        words="Undo"
        hint={doing('Undo', undoLabel)}
        disabled={undoLabel === null}
      />
      <CommandButton
        store={store}
        command="redo"
        words="Redo"
        hint={doing('Redo', redoLabel)}
        disabled={redoLabel === null}
      />
    </fieldset>
  );
}

/** How the hand works in the drawing and the ledger; for fingers, which have no Shift and no Alt. */
function HandCommands({ store }: { store: Store }) {
  const { several, snap } = useCell(store.hands);
  return (
    <fieldset className="group hands" aria-label="Hand">
      <CommandButton
        store={store}
        command="several"
        words="Pick several"
        hint="Pick several: a tap adds to what is selected"
        pressed={several}
      />
      <CommandButton
        store={store}
        command="snap"
        words="Snap"
        hint="Snap what is dragged to round numbers and other parts"
        pressed={snap}
      />
    </fieldset>
  );
}

const THEME_WORDS = { system: 'as the system', light: 'light', dark: 'dark' } as const;

function ViewCommands({ store }: { store: Store }) {
  const { tilted } = useCell(store.view);
  const { units, theme } = useCell(store.settings);
  return (
    <fieldset className="group" aria-label="View">
      <CommandButton store={store} command="tilt" words="As it floats" pressed={tilted} />
      <CommandButton store={store} command="fit" words="Fit" name="Fit the craft in the view" />
      <CommandButton store={store} command="units" words={`Units: ${units}`} />
      <CommandButton store={store} command="theme" words={`Colours: ${THEME_WORDS[theme]}`} />
      <CommandButton store={store} command="keys" words="Keys" name="Keys and gestures" />
    </fieldset>
  );
}
