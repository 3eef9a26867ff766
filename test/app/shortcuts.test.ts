import { expect, test } from 'vitest';
import { COMMANDS } from '../../src/app/commands.ts';
import { commandFor, type KeyStroke, keysText, SHORTCUTS } from '../../src/app/shortcuts.ts';

const stroke = (key: string, held: Partial<KeyStroke> = {}): KeyStroke => ({
  key,
  ctrlKey: false,
  metaKey: false,
  shiftKey: false,
  altKey: false,
  ...held,
});

test('each key stands for one command, and each command exists', () => {
  const keys = SHORTCUTS.flatMap((shortcut) => shortcut.keys);
  expect(new Set(keys).size).toBe(keys.length);
  for (const { command } of SHORTCUTS) expect(COMMANDS[command]).toBeTypeOf('function');
});

test.each([
  ['undo', stroke('z', { ctrlKey: true })],
  ['undo', stroke('z', { metaKey: true })],
  ['redo', stroke('Z', { ctrlKey: true, shiftKey: true })],
  ['redo', stroke('y', { ctrlKey: true })],
  ['save', stroke('s', { ctrlKey: true })],
  ['open', stroke('o', { metaKey: true })],
  ['duplicate', stroke('d', { ctrlKey: true })],
  ['selectAll', stroke('a', { ctrlKey: true })],
  ['remove', stroke('Delete')],
  ['nudgeAft', stroke('ArrowRight')],
  ['leapAft', stroke('ArrowRight', { shiftKey: true })],
  ['keys', stroke('?', { shiftKey: true })],
  ['tilt', stroke('t')],
  ['escape', stroke('Escape')],
])('%s', (command, key) => {
  expect(commandFor(key, false)).toBe(command);
});

test('with CapsLock on, a letter still means its command', () => {
  expect(commandFor(stroke('F'), false)).toBe('fit');
});

test('in a text field, typing and moving in the text are the field’s own', () => {
  for (const key of ['t', 'f', '?', 'Delete', 'Backspace', 'ArrowLeft']) {
    expect(commandFor(stroke(key), true)).toBeNull();
  }
  expect(commandFor(stroke('a', { ctrlKey: true }), true)).toBeNull();
  expect(commandFor(stroke('z', { ctrlKey: true }), true)).toBe('undo');
});

test('keys with Alt are left to the browser and the system', () => {
  expect(commandFor(stroke('z', { ctrlKey: true, altKey: true }), false)).toBeNull();
});

// Tab, window, reload, address line, find, print and zoom keys common to Chromium, Firefox and Safari: common
// practice, no source.
test.each(['t', 'w', 'n', 'r', 'l', 'f', 'g', 'p', 'h', 'j', '+', '-', '0', 'Tab'])(
  'Mod+%s stays with the browser',
  (key) => {
    expect(commandFor(stroke(key, { ctrlKey: true }), false)).toBeNull();
    expect(commandFor(stroke(key, { ctrlKey: true, shiftKey: true }), false)).toBeNull();
  },
);

test('keys read as they stand on a keyboard', () => {
  expect(keysText('Mod+Shift+z', false)).toBe('Ctrl + Shift + Z');
  expect(keysText('Mod+z', true)).toBe('⌘ + Z');
  expect(keysText('Shift+ArrowLeft', false)).toBe('Shift + ←');
  expect(keysText('?', false)).toBe('?');
});
