import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import { askedOf } from '../../../src/panels/turn/asked.ts';
import { VerdictLines } from '../../../src/panels/turn/TargetVerdicts.tsx';
import { FIRST_TURNING } from '../../../src/panels/turn/turning.ts';
import { turnReport } from '../../../src/report/turning/turnReport.ts';
import { sampleCraft } from '../../samples/readSamples.ts';
import { seen } from '../render.tsx';

const museum = sampleCraft('museum-atrium');
const linesFor = (turnTime: number | null, sideGust: number | null) => {
  const craft = { ...museum, targets: { ...museum.targets, turnTime, sideGust } };
  const { verdicts } = turnReport(craft, askedOf(craft, FIRST_TURNING), 'metric');
  return seen(renderToStaticMarkup(createElement(VerdictLines, { verdicts, fresh: true })));
};

test('each turning target has its figure and verdict in a line; one that is missed says what thrust it takes', () => {
  expect(linesFor(60, null)).toMatch(/90°, [\d.]+ s: quick enough\. *$/);
  expect(linesFor(1, null)).toMatch(/90°, [\d.]+ s: too slow\. Thrust alone: [\d.]+ N would do/);
  expect(linesFor(null, 0.1)).toMatch(/Side gust, [\d.]+ m\/s: /);
  expect(linesFor(null, null)).toBe('');
});
