import { expect, test } from 'vitest';
import { setPart } from '../../src/edit/edits/parts.ts';
import { run } from '../../src/edit/history.ts';
import { type AdviceKind, adviceEdit, adviceOf, headlineAdvice } from '../../src/panels/advice.ts';
import { FiguresPanel } from '../../src/panels/FiguresPanel.tsx';
import { Verdicts } from '../../src/panels/Verdicts.tsx';
import { assess } from '../../src/report/assess.ts';
import type { VerdictKey } from '../../src/report/verdict.ts';
import { craftFrom, sampleText } from '../samples/readSamples.ts';
import { render, seen } from './render.tsx';

const worked = craftFrom(sampleText('worked-example'));

function carriedOut(kind: AdviceKind) {
  const advice = adviceOf(assess(worked), kind);
  if (!advice) throw new Error(`no ${kind} is advised`);
  return run(worked, adviceEdit(advice).recipe).craft;
}
const stateOf = (craft: typeof worked, key: VerdictKey) =>
  assess(craft).verdicts.find((each) => each.key === key)!.state;

test('hanging the lead adds it as ballast at the hardpoint, and the craft is level', () => {
  const craft = carriedOut('lead');
  const lead = craft.parts.byId[craft.parts.order.at(-1)!]!;
  expect(lead).toMatchObject({ kind: 'ballast', name: 'Lead at Nose' });
  // Worked out by hand in test/samples/workedExample.test.ts.
  expect(lead.mass).toBeCloseTo(0.157117, 6);
  expect(assess(craft).rows['float.pitch']!.value).toBeCloseTo(0, 6);
  expect(stateOf(craft, 'level')).toBe('met');
});

test('the load takes the lift left where it levels, so that both verdicts are met', () => {
  const craft = carriedOut('load');
  expect(stateOf(craft, 'floats')).toBe('met');
  expect(stateOf(craft, 'level')).toBe('met');
});

test('buttons stand where the advice is said: lead and slide on top, the load at its figure', () => {
  const onTop = headlineAdvice(assess(worked), worked);
  expect(onTop).toContain('lead');
  expect(onTop).not.toContain('load');
  expect(seen(render(Verdicts, {}, worked))).toContain('Hang this lead');
  expect(seen(render(FiguresPanel, {}, worked))).toContain('Add a load there');
});

test('once the lead hangs, only the load is left to add', () => {
  const craft = carriedOut('lead');
  expect(headlineAdvice(assess(craft), craft)).toEqual(['load']);
});

test('while it is too heavy the sentence speaks of neither, and nor do the buttons', () => {
  const craft = run(worked, setPart(worked.parts.byId.gondola!, 'mass', { mass: 3 }).recipe).craft;
  expect(assess(craft).headline).toMatch(/^Too heavy/);
  expect(headlineAdvice(assess(craft), craft)).toEqual([]);
});
