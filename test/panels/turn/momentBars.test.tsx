import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import { EditorContext } from '../../../src/panels/editor.ts';
import { MomentBars } from '../../../src/panels/turn/MomentBars.tsx';
import { FIRST_TURNING, type Steering, TurningContext } from '../../../src/panels/turn/turning.ts';
import { rowText } from '../../../src/report/rowText.ts';
import { turnReport } from '../../../src/report/turning/turnReport.ts';
import { sampleCraft } from '../../samples/readSamples.ts';
import { editorOn, seen } from '../render.tsx';

const reportOf = (craft: Craft) => turnReport(craft, { throttle: 1, vector: null, speed: null }, 'metric');

function bars(craft: Craft, steering: Steering = 'limit'): string {
  const { rows, need } = reportOf(craft);
  const value = { ...FIRST_TURNING, steering, set: () => {} };
  const shown = createElement(MomentBars, { rows, need });
  return seen(
    renderToStaticMarkup(
      createElement(
        EditorContext,
        { value: editorOn(craft, { units: 'metric' }) },
        createElement(TurningContext, { value }, shown),
      ),
    ),
  );
}

const museum = sampleCraft('museum-atrium');

test('what is there and what the harder of two targets needs, each about its own centre', () => {
  const { need } = reportOf(museum);
  expect(need!.target).toBe('sideGust');
  expect(bars(museum)).toContain(
    `Yaw moment in the side gust ${rowText(need!.there, 'metric')}, needed ${rowText(need!.needed, 'metric')}`,
  );
  const timed = { ...museum, targets: { ...museum.targets, sideGust: null } };
  const { rows } = reportOf(timed);
  expect(bars(timed)).toContain(
    `Yaw moment ${rowText(rows['turn.yawMoment']!, 'metric')}, needed for the turn time ${rowText(rows['turn.neededMoment']!, 'metric')}`,
  );
});

test('with the arrow as set it says that the moment is of the hardest steering', () => {
  expect(bars(museum, 'set')).toContain('Yaw moment in the side gust, steered hardest ');
  expect(bars(museum)).not.toContain('steered hardest');
});

test('a pair throttled apart has reverse where one that turns has vectoring', () => {
  expect(bars(museum)).toContain('Vectoring 70.7 %');
  const vault = bars(sampleCraft('vault-inspector'), 'set');
  expect(vault).toContain('Reverse ');
  expect(vault).not.toMatch(/Vectoring|steered hardest/);
  for (const text of [bars(museum), vault]) expect(text).toContain('Of the most all its thrust could do');
});
