/** The one way every edit is tested: result, patches, replay, reverse, save → load. */
import { applyPatches } from 'immer';
import { expect } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { parse } from '../../src/craft/parse.ts';
import { serialize } from '../../src/craft/serialize.ts';
import type { Edit } from '../../src/edit/edit.ts';
import { run } from '../../src/edit/history.ts';

/** Runs the edit on the craft, checks all that holds for every edit, and gives the result. */
export function testEdit(craft: Craft, edit: Edit): Craft {
  const before = serialize(craft);
  const result = run(craft, edit.recipe);
  expect(serialize(craft), 'the craft before is left alone').toBe(before);
  expect(applyPatches(craft, result.patches), 'patches replay').toEqual(result.craft);
  const reversed = applyPatches(result.craft, result.inverse);
  expect(serialize(reversed), 'inverse patches bring the same bytes back').toBe(before);
  const loaded = parse(serialize(result.craft));
  expect(loaded.ok ? loaded.craft : loaded.problems, 'the result passes the loading gate').toEqual(
    result.craft,
  );
  if (result.patches.length === 0) expect(result.craft).toBe(craft);
  return result.craft;
}
