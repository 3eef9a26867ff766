import { expect, test } from 'vitest';
import { shownState } from '../../src/app/frameGate.ts';
import { blankCraft } from '../../src/craft/blank.ts';
import { setName } from '../../src/edit/edits/craft.ts';
import { Session } from '../../src/edit/session.ts';

function gated() {
  const session = new Session(blankCraft('Start', { kind: 'spheroid', length: 3, diameter: 1 }, 3));
  const waiting = new Map<number, () => void>();
  let last = 0;
  const shown = shownState(session, {
    request: (callback) => {
      waiting.set(++last, callback);
      return last;
    },
    cancel: (handle) => waiting.delete(handle),
  });
  const seen: string[] = [];
  shown.subscribe(() => seen.push(shown.get().craft.name));
  const frame = () => {
    const callbacks = [...waiting.values()];
    waiting.clear();
    for (const callback of callbacks) callback();
  };
  return { session, seen, waiting, frame };
}

test('an edit shows at once', () => {
  const { session, seen } = gated();
  session.apply(setName('Typed'));
  expect(seen).toEqual(['Typed']);
});

test('many moves of a drag show once a frame, the last of them', () => {
  const { session, seen, waiting, frame } = gated();
  const drag = session.beginDrag('Rename');
  for (const name of ['a', 'b', 'c']) drag.move(setName(name).recipe);
  expect(seen).toEqual([]);
  expect(waiting.size).toBe(1);
  frame();
  expect(seen).toEqual(['c']);
});

test('letting go shows at once, and no late frame comes after it', () => {
  const { session, seen, frame } = gated();
  const drag = session.beginDrag('Rename');
  drag.move(setName('moved').recipe);
  drag.commit();
  const then = seen.length;
  expect(seen.at(-1)).toBe('moved');
  frame();
  expect(seen).toHaveLength(then);
});

test('a cancelled drag shows the craft as it was', () => {
  const { session, seen, frame } = gated();
  const drag = session.beginDrag('Rename');
  drag.move(setName('moved').recipe);
  frame();
  drag.cancel();
  expect(seen.at(-1)).toBe('Start');
});
