/**
 * Which key means which command. One table: the page obeys it and the help dialog lists it. `Mod` is Ctrl, or Cmd
 * on a Mac. Keys that a browser needs for itself (tabs, windows, reload, zoom, find, the address line) are not used.
 */
import { say } from '../units/sentence.ts';
import type { CommandId } from './commands.ts';

export interface Shortcut {
  readonly command: CommandId;
  /** Modifiers in the order Mod, Shift, then the key as KeyboardEvent.key names it. */
  readonly keys: readonly string[];
  /** To be put through `inUnits`. */
  readonly does: string;
  /** Whether it also works while a text field has the focus. */
  readonly inText: boolean;
}

const shortcut = (command: CommandId, does: string, keys: readonly string[], inText = false): Shortcut => ({
  command,
  does,
  keys,
  inText,
});

const nudge = (way: string): string => `Nudge ${say(0.001, 'smallLength')} ${way}`;
const leap = (way: string): string => `Nudge ${say(0.01, 'smallLength')} ${way}`;

export const SHORTCUTS: readonly Shortcut[] = [
  shortcut('undo', 'Undo', ['Mod+z'], true),
  shortcut('redo', 'Redo', ['Mod+Shift+z', 'Mod+y'], true),
  shortcut('save', 'Save the craft to a file', ['Mod+s'], true),
  shortcut('open', 'Open a craft file', ['Mod+o'], true),
  shortcut('selectAll', 'Select all parts', ['Mod+a']),
  shortcut('duplicate', 'Duplicate the selected parts', ['Mod+d']),
  shortcut('remove', 'Remove what is selected', ['Delete', 'Backspace']),
  shortcut('nudgeFore', nudge('forward'), ['ArrowLeft']),
  shortcut('nudgeAft', nudge('aft'), ['ArrowRight']),
  shortcut('nudgeUp', nudge('up'), ['ArrowUp']),
  shortcut('nudgeDown', nudge('down'), ['ArrowDown']),
  shortcut('leapFore', leap('forward'), ['Shift+ArrowLeft']),
  shortcut('leapAft', leap('aft'), ['Shift+ArrowRight']),
  shortcut('leapUp', leap('up'), ['Shift+ArrowUp']),
  shortcut('leapDown', leap('down'), ['Shift+ArrowDown']),
  shortcut('tilt', 'Show as it floats, or level', ['t']),
  shortcut('fit', 'Fit the craft in the view', ['f']),
  shortcut('keys', 'Show this list', ['?']),
  shortcut('escape', 'Cancel a drag, else select nothing', ['Escape'], true),
];

/** The part of a keyboard event that decides. */
export interface KeyStroke {
  readonly key: string;
  readonly ctrlKey: boolean;
  readonly metaKey: boolean;
  readonly shiftKey: boolean;
  readonly altKey: boolean;
}

/** The name a key stroke has in the table. Shift is not written for signs that need it, like "?". */
export function strokeName({ key, ctrlKey, metaKey, shiftKey }: KeyStroke): string {
  const letter = /^[a-z]$/i.test(key);
  const shift = shiftKey && (letter || key.length > 1);
  return [ctrlKey || metaKey ? 'Mod' : '', shift ? 'Shift' : '', letter ? key.toLowerCase() : key]
    .filter(Boolean)
    .join('+');
}

/** The command a key stroke means, or null. With Alt, or for Mod+Shift letters not in the table, none. */
export function commandFor(stroke: KeyStroke, inText: boolean): CommandId | null {
  if (stroke.altKey) return null;
  const name = strokeName(stroke);
  const found = SHORTCUTS.find((each) => each.keys.includes(name) && (each.inText || !inText));
  return found?.command ?? null;
}

const KEY_WORDS: Readonly<Record<string, string>> = {
  ArrowLeft: '←',
  ArrowRight: '→',
  ArrowUp: '↑',
  ArrowDown: '↓',
  Escape: 'Esc',
};

/** "Ctrl + Shift + Z" as a person reads it. */
export const keysText = (keys: string, mac: boolean): string =>
  keys
    .split('+')
    .map((key) =>
      key === 'Mod'
        ? mac
          ? '⌘'
          : 'Ctrl'
        : (KEY_WORDS[key] ?? key.replace(/^[a-z]$/, (c) => c.toUpperCase())),
    )
    .join(' + ');
