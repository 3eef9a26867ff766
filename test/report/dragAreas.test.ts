import { expect, test } from 'vitest';
import { craftStateOf } from '../../src/physics/craftState.ts';
import { podAreas } from '../../src/physics/thrust/pods.ts';
import { assess } from '../../src/report/assess.ts';
import { reckonedDragArea } from '../../src/report/dragAreas.ts';
import { sampleCraft } from '../samples/readSamples.ts';

test('what a part is reckoned to drag is what the drag counts for it', () => {
  const craft = sampleCraft('museum-atrium');
  const state = craftStateOf(craft);
  const { geometry } = assess(craft);
  if (state.status !== 'solved' || geometry.status !== 'solved') throw new Error('no hull');
  const pods = podAreas(state.value);
  for (const [id, part] of Object.entries(craft.parts.byId)) {
    const counted = pods.find((pod) => pod.part === id)?.area ?? 0;
    const pieces = state.value.pieces[id]!.length;
    expect(reckonedDragArea(part, geometry) * pieces, id).toBeCloseTo(counted, 12);
  }
  expect(reckonedDragArea(craft.parts.byId.gondola!, geometry)).toBeCloseTo(0.8 * 0.14 * 0.11, 12);
  expect(reckonedDragArea(craft.parts.byId.battery!, geometry)).toBe(0);
});
