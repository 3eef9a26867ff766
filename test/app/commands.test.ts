import { expect, test } from 'vitest';
import { COMMANDS } from '../../src/app/commands.ts';
import { dropKind } from '../../src/app/drops.ts';
import { openKeep } from '../../src/app/openKeep.ts';
import { firstSentence } from '../../src/app/samples.ts';
import { DEFAULTS } from '../../src/app/settings.ts';
import { FIRST_VIEW, Store } from '../../src/app/store.ts';
import { isDark, propertyName } from '../../src/app/theme.ts';
import { blankCraft } from '../../src/craft/blank.ts';
import { setName } from '../../src/edit/edits/craft.ts';
import { addParts, type PartFields } from '../../src/edit/edits/parts.ts';

const part = (name: string): PartFields => ({
  kind: 'load',
  name,
  mass: 0.1,
  massTolerance: 0,
  massSource: 'estimated',
  place: { kind: 'axis', station: 1 },
  copies: { kind: 'together', count: 1 },
  size: { length: 0.1, width: 0.1, height: 0.1 },
  cgOffset: 0,
  locked: false,
  slide: null,
  thruster: null,
  fin: null,
  dragArea: null,
  notes: '',
});

async function withParts(): Promise<Store> {
  const craft = blankCraft('C', { kind: 'spheroid', length: 3, diameter: 1 }, 3);
  const store = new Store(await openKeep(), { id: 'x', craft, view: FIRST_VIEW, known: null }, DEFAULTS, {
    request: () => 0,
    cancel: () => {},
  });
  store.apply(addParts([part('One'), part('Two')]));
  return store;
}

const names = (store: Store): string[] => {
  const { parts } = store.session.getState().craft;
  return parts.order.map((id) => parts.byId[id]!.name);
};

test('all parts are selected, duplicated, and the copies are then selected', async () => {
  const store = await withParts();
  COMMANDS.selectAll(store);
  COMMANDS.duplicate(store);
  expect(names(store)).toEqual(['One', 'One copy', 'Two', 'Two copy']);
  expect(store.session.getState().selection.map(({ id }) => id)).toEqual(['one-copy', 'two-copy']);
});

test('removing parts and a hardpoint together is one step, and the last hardpoint stays', async () => {
  const store = await withParts();
  store.session.select([
    { kind: 'part', id: 'one' },
    { kind: 'hardpoint', id: 'nose' },
  ]);
  COMMANDS.remove(store);
  expect(names(store)).toEqual(['Two']);
  expect(store.session.getState().craft.hardpoints.order).toEqual(['nose']);
  COMMANDS.undo(store);
  expect(names(store)).toEqual(['One', 'Two']);
});

test('Escape ends a drag first and the selection next', async () => {
  const store = await withParts();
  COMMANDS.selectAll(store);
  store.session.beginDrag('Rename').move(setName('moved').recipe);
  COMMANDS.escape(store);
  expect(store.session.getState().craft.name).toBe('C');
  expect(store.session.getState().selection).toHaveLength(2);
  COMMANDS.escape(store);
  expect(store.session.getState().selection).toEqual([]);
});

test('commands on an empty selection change nothing', async () => {
  const store = await withParts();
  const { craft, undoLabel } = store.session.getState();
  for (const id of ['remove', 'duplicate', 'nudgeAft', 'leapUp'] as const) COMMANDS[id](store);
  expect(store.session.getState()).toMatchObject({ craft, undoLabel });
});

test('the tilt switches there and back', async () => {
  const store = await withParts();
  COMMANDS.tilt(store);
  expect(store.view.get().tilted).toBe(true);
  COMMANDS.tilt(store);
  expect(store.view.get().tilted).toBe(false);
});

test.each([
  ['a.json', '', 'craft'],
  ['noname', 'application/json', 'craft'],
  ['parts.CSV', '', 'table'],
  ['parts.tsv', '', 'table'],
  ['photo.png', 'image/png', 'other'],
])('%s of type %j is taken as %s', (name, type, kind) => {
  expect(dropKind({ name, type })).toBe(kind);
});

test('the theme follows the system only when asked to', () => {
  expect(isDark('system', true)).toBe(true);
  expect(isDark('system', false)).toBe(false);
  expect(isDark('light', true)).toBe(false);
  expect(isDark('dark', false)).toBe(true);
  expect(propertyName('inkSoft')).toBe('--ink-soft');
});

test.each([
  ['One. Two.', 'One.'],
  ['A hull of 1.5 m, held up! More', 'A hull of 1.5 m, held up!'],
  ['No end', 'No end'],
  ['', ''],
])('of the notes %j the samples list shows %j', (notes, sentence) => {
  expect(firstSentence(notes)).toBe(sentence);
});
