import { expect, test } from 'vitest';
import { setName } from '../../../src/edit/edits/craft.ts';
import { Session } from '../../../src/edit/session.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { plannedSubject } from '../../../src/panels/turn/subject.ts';
import { planOf } from '../../../src/physics/ballast/plan.ts';
import { sampleCraft } from '../../samples/readSamples.ts';

const solver = await loadHighs();
const craft = sampleCraft('museum-atrium');
const plan = planOf(craft, solver, { explain: false });
const now = { craft, units: 'metric', dragging: false } as const;
const planned = { answer: { plan, craft }, robust: false, failure: null };

test('a plan of this very craft is carried out, and says what it hangs in the units asked for', () => {
  const subject = plannedSubject(now, planned);
  expect(subject).toMatchObject({ plan, waits: false });
  expect(subject.words).toMatch(/^With the ballast plan carried out, [\d.]+ g of dead ballast: slide /);
  expect(plannedSubject({ ...now, units: 'imperial' }, planned).words).toMatch(/ oz of dead ballast/);
});

test('it waits without an answer, for one of the craft before, for one of the other kind, and while something is dragged', () => {
  const session = new Session(craft);
  session.apply(setName('Another'));
  for (const [of, plans] of [
    [now, { ...planned, answer: null }],
    [{ ...now, craft: session.getState().craft }, planned],
    [now, { ...planned, robust: true }],
    [{ ...now, dragging: true }, planned],
  ] as const) {
    const subject = plannedSubject(of, plans);
    expect(subject).toMatchObject({ plan: null, waits: true });
    expect(subject.words).toContain('Until then the figures are those of before.');
  }
});

test('where there is no plan it says why, and the figures are of the craft as it is', () => {
  const hopeless = sampleCraft('cave-mapper');
  const none = {
    ...planned,
    answer: { plan: planOf(hopeless, solver, { explain: false }), craft: hopeless },
  };
  const subject = plannedSubject({ ...now, craft: hopeless }, none);
  expect(subject).toMatchObject({ plan: null, waits: false });
  expect(subject.words).toContain('figures of the craft as it is. No ballast, slide or place');
});

test('a solver that broke down is told, unless there is an answer for this craft all the same', () => {
  const failure = 'Stopped before there was a plan.';
  expect(plannedSubject(now, { ...planned, answer: null, failure })).toMatchObject({
    plan: null,
    waits: false,
    words: expect.stringContaining(failure),
  });
  expect(plannedSubject(now, { ...planned, failure })).toMatchObject({ plan });
});
