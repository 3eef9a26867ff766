import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import type { Craft } from '../../../src/craft/craft.ts';
import type { Place } from '../../../src/craft/placeSchema.ts';
import { loadHighs } from '../../../src/numeric/linearProgram/highsSolver.ts';
import { EditorContext } from '../../../src/panels/editor.ts';
import { askedOf, steeringPart } from '../../../src/panels/turn/asked.ts';
import { NO_STUDY, type Studying, StudyingContext } from '../../../src/panels/turn/studying.ts';
import { AS_IT_IS, type SubjectNow } from '../../../src/panels/turn/subject.ts';
import { TurnSheet } from '../../../src/panels/turn/TurnPanel.tsx';
import { turnGroups } from '../../../src/panels/turn/turnGroups.ts';
import { FIRST_TURNING, TurningContext, type TurningState } from '../../../src/panels/turn/turning.ts';
import { placementStudy } from '../../../src/physics/placing/study.ts';
import { HAZARDS } from '../../../src/report/hazards.ts';
import { noneOnce } from '../../../src/report/turning/noneOnce.ts';
import { placeReport } from '../../../src/report/turning/placeReport.ts';
import { bestOfRuns } from '../../../src/report/turning/placeRuns.ts';
import { stowageSteps } from '../../../src/report/turning/placeSteps.ts';
import { toldPlace } from '../../../src/report/turning/placeWords.ts';
import { turnFigures, turnReport } from '../../../src/report/turning/turnReport.ts';
import { formatQuantity } from '../../../src/units/format.ts';
import type { UnitSystem } from '../../../src/units/units.ts';
import { sampleCraft } from '../../samples/readSamples.ts';
import { danglingIds, editorOn, seen, unnamed } from '../render.tsx';

interface Look {
  readonly units?: UnitSystem;
  readonly studying?: Partial<Studying>;
  readonly turning?: Partial<TurningState>;
  readonly fresh?: boolean;
  readonly subject?: SubjectNow;
}

const nothing = () => {};

function panel(
  craft: Craft,
  { units = 'metric', studying, turning, fresh = true, subject = AS_IT_IS }: Look = {},
): string {
  const choices = { ...FIRST_TURNING, ...turning };
  const asked = askedOf(craft, choices);
  const now = {
    report: turnReport(craft, asked, units),
    figures: turnFigures(craft, asked, units),
    fresh,
    subject,
  };
  const sheet = createElement(TurnSheet, { now, player: () => 'the path', onTargets: nothing });
  const study = { ...NO_STUDY, start: nothing, goOn: nothing, stop: nothing, close: nothing, ...studying };
  return renderToStaticMarkup(
    createElement(
      EditorContext,
      { value: editorOn(craft, { units }) },
      createElement(
        StudyingContext,
        { value: study },
        createElement(TurningContext, { value: { ...choices, set: nothing } }, sheet),
      ),
    ),
  );
}

const museum = sampleCraft('museum-atrium');
const [thruster] = museum.parts.order.filter((id) => museum.parts.byId[id]!.thruster);
const asked = askedOf(museum, FIRST_TURNING);
const report = turnReport(museum, asked, 'metric');
const solver = await loadHighs();
function studyOf(craft: Craft) {
  const outcome = placementStudy(craft, thruster!, solver, { stations: 9, asked });
  if (outcome.status !== 'solved') throw new Error(outcome.why);
  return { ...NO_STUDY, ...outcome.value, craft, asked, share: 1 };
}
const studying = studyOf(museum);
const studied = panel(museum, { studying });
/** The same with its thruster below the keel, where it turns slowly: another place is told of. */
const slow = withThrusterAt({ kind: 'keel', station: 2.6, drop: 0.3 });
const slowStudying = studyOf(slow);
const slowStudied = panel(slow, { studying: slowStudying });
function withThrusterAt(place: Place): Craft {
  const moved = { ...museum.parts.byId[thruster!]!, place };
  return { ...museum, parts: { ...museum.parts, byId: { ...museum.parts.byId, [moved.id]: moved } } };
}
const unthrust = sampleCraft('two-sheet-advert');

test.each([
  ['at first', panel(museum)],
  ['with a study', studied],
  ['while it is worked out', panel(museum, { studying: { ...studying, busy: true, share: 0.4 } })],
  ['without thrust', panel(unthrust)],
])('%s: every field has a name, and every description is there', (_, markup) => {
  expect(unnamed(markup)).toEqual([]);
  expect(danglingIds(markup)).toEqual([]);
});

/** The figures of the panel: one that is missing for the reason of one above it is left out. */
const shown = (rows: typeof report.rows) => turnGroups(rows).flatMap((group) => noneOnce(group.rows));

test('it is told in the words of the report, in the builder’s units, with every figure, and each reason for none once', () => {
  for (const units of ['metric', 'imperial'] as const) {
    const { headline, costWords, cautions, rows } = turnReport(museum, asked, units);
    const text = seen(panel(museum, { units }));
    const labels = shown(rows).map(({ row }) => row.label);
    for (const each of [headline, ...costWords, ...cautions, ...labels]) expect(text).toContain(each);
  }
});

test('every figure stands in one group, and none without a heading of its own', () => {
  const groups = turnGroups(report.rows);
  expect(groups.flatMap(({ rows }) => rows.map(({ key }) => key)).toSorted()).toEqual(
    Object.keys(report.rows).toSorted(),
  );
  expect(groups.filter(({ id }) => id === 'more')).toEqual([]);
  for (const { beside, rows } of groups) {
    if (beside) expect(rows.map(({ key }) => key)).toContain(beside.key);
  }
});

test('cautions stand there: propellers, people, and the tether', () => {
  const text = seen(panel(museum));
  for (const each of [HAZARDS.thruster, HAZARDS.people, 'on a tether']) expect(text).toContain(each);
});

test('a craft without thrust is told what is missing, once', () => {
  const text = seen(panel(unthrust));
  const { headline } = turnReport(unthrust, asked, 'metric');
  expect(text.split(headline)).toHaveLength(2);
  expect(text).not.toContain('Throttle');
});

const old = (markup: string) =>
  [...markup.matchAll(/data-figure="([\w.]+)" data-status="\w+" class="plan-old"/g)].map(([, key]) => key);

test('figures that wait for a simulation are shown as old, those that follow at once are not', () => {
  expect(old(panel(museum))).toEqual([]);
  const waiting = old(panel(museum, { fresh: false }));
  expect(waiting).toContain('turn.timeTo90');
  expect(waiting.filter((key) => key! in turnFigures(museum, asked, 'metric').rows)).toEqual([]);
});

test('while a plan is worked out every figure is shown as old, and a line says so', () => {
  const words = 'Working out the ballast plan…';
  const markup = panel(museum, { fresh: false, subject: { plan: null, waits: true, words } });
  expect(seen(markup)).toContain(words);
  const [before, figures] = markup.split('<div class="turn-figures plan-old">');
  expect(before).not.toContain('data-figure');
  expect(figures!.split('data-figure="')).toHaveLength(shown(report.rows).length + 1);
  // None fades twice.
  expect(old(markup)).toEqual([]);
  expect(before!.match(/plan-old/g)).toHaveLength(3);
  expect(seen(panel(museum))).toContain('Of the craft As it is With the ballast plan');
});

const rowsOf = (markup: string) => [...markup.matchAll(/data-station="([\w.-]+)"/g)].map(([, row]) => row);

test('a study is told in the words of the report; today has its row, and each best of a run', () => {
  for (const [craft, study, markup] of [
    [museum, studying, studied],
    [slow, slowStudying, slowStudied],
  ] as const) {
    const text = seen(markup);
    expect(text).toContain(placeReport(craft, study, 'metric').headline);
    const told = toldPlace(study, craft.targets)!.station;
    const best = bestOfRuns(study, told).map(({ station }) => String(station));
    expect(rowsOf(markup)).toEqual(['today', ...best]);
    expect(text).toContain('Close the study');
    expect(text).not.toContain('so far');
  }
  expect(rowsOf(slowStudied).length).toBeGreaterThan(1);
});

test('where it is the best already its own row is open, and there is nothing to move', () => {
  expect(seen(studied)).toContain('It is there now.');
  expect(studied).not.toContain('Move it there');
});

test('before the ballast is hung it stands there what would change', () => {
  const { stowage } = toldPlace(slowStudying, slow.targets)!;
  const steps = stowageSteps(slow, stowage!, 'metric');
  expect(steps.length).toBeGreaterThan(0);
  for (const step of steps) expect(seen(slowStudied)).toContain(step);
});

test('once the thruster has been moved, the place of today is that of before', () => {
  const text = seen(
    panel(withThrusterAt({ kind: 'keel', station: 2.4, drop: 0.3 }), { studying: slowStudying }),
  );
  expect(text).toContain('where it was');
  expect(text).not.toContain('where it is now');
  expect(text).toContain('before');
});

test('a stopped study is of the stations so far, and can go on', () => {
  const text = seen(panel(slow, { studying: { ...slowStudying, complete: false } }));
  for (const each of ['So far:', 'Nothing beats these so far', 'Go on', 'Try every station again']) {
    expect(text).toContain(each);
  }
  expect(seen(slowStudied)).not.toContain('Go on');
});

test('a study of another craft or throttle says so, and moves nothing', () => {
  for (const look of [
    { studying: { ...slowStudying, craft: { ...slow, name: 'Before' } } },
    { studying: slowStudying, turning: { throttle: 0.5 } },
  ]) {
    const markup = panel(slow, look);
    expect(seen(markup)).toContain('Worked out before the last change: try every station again.');
    expect(markup).toMatch(/aria-disabled="true"[^>]*>Move it there/);
  }
  expect(slowStudied).toMatch(/aria-disabled="false"[^>]*>Move it there/);
});

test('of several thrusters one is chosen to be tried, and the study names the one it is of', () => {
  const second = { ...museum.parts.byId[thruster!]!, id: 'second', name: 'Chin thruster' };
  const { order, byId } = museum.parts;
  const two = { ...museum, parts: { order: [...order, 'second'], byId: { ...byId, second } } };
  const text = seen(panel(two, { studying: { ...studying, craft: two } }));
  expect(text).toMatch(/Thruster Tail thruster Chin thruster/);
  expect(text).toContain('Tail thruster: In the');
  expect(seen(studied)).not.toContain('Chin thruster');
});

test('the arrow that was turned last is the one to steer by; without one it is hardest to starboard', () => {
  expect(steeringPart(museum, FIRST_TURNING)?.id).toBe(thruster);
  expect(steeringPart(unthrust, FIRST_TURNING)).toBeNull();
  expect(askedOf(unthrust, { ...FIRST_TURNING, steering: 'set' }).vector).toBeNull();
  const { set } = museum.parts.byId[thruster!]!.thruster!.yaw;
  expect(askedOf(museum, { ...FIRST_TURNING, steering: 'set', turned: 'gone' }).vector).toBe(set);
});

test('the curve of radii reaches to the widest circle that holds, and the choice of steering is short', () => {
  const craft = sampleCraft('worked-example');
  const { steadyCurve, rows } = turnReport(craft, askedOf(craft, FIRST_TURNING), 'metric');
  const radii = steadyCurve.flatMap(({ turn, settles }) =>
    turn.status === 'solved' && settles ? [turn.value.radius] : [],
  );
  const widest = Math.max(...radii);
  expect(widest).toBeGreaterThanOrEqual(rows['turn.radius']!.value!);
  const markup = panel(craft);
  expect(markup).toContain(`The radius falls from ${formatQuantity(widest, 'pathLength', 'metric')} to`);
  expect(markup).toMatch(/Arrow: 0°/);
});
