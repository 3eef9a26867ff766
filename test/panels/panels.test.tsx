import { expect, test } from 'vitest';
import type { Craft } from '../../src/craft/craft.ts';
import { SHAPE_KINDS } from '../../src/craft/hullSchema.ts';
import { chooseShape, setGas } from '../../src/edit/edits/craft.ts';
import { addHardpoint, setSupport } from '../../src/edit/edits/hardpoints.ts';
import { addPart } from '../../src/edit/edits/parts.ts';
import { addWire } from '../../src/edit/edits/wires.ts';
import { run } from '../../src/edit/history.ts';
import type { Selectable, Selection } from '../../src/edit/selection.ts';
import { shapeAs } from '../../src/edit/shapeAs.ts';
import { CatalogueDialog } from '../../src/panels/CatalogueDialog.tsx';
import { CraftsDialog } from '../../src/panels/CraftsDialog.tsx';
import { DayPanel } from '../../src/panels/DayPanel.tsx';
import { blankPart, blankWire } from '../../src/panels/defaults.ts';
import { FiguresPanel } from '../../src/panels/FiguresPanel.tsx';
import { FilmPanel } from '../../src/panels/FilmPanel.tsx';
import { GasPanel } from '../../src/panels/GasPanel.tsx';
import { HullPanel } from '../../src/panels/HullPanel.tsx';
import { Inspector } from '../../src/panels/Inspector.tsx';
import { Ledger } from '../../src/panels/Ledger.tsx';
import { NewCraftDialog } from '../../src/panels/NewCraftDialog.tsx';
import { NotesPanel } from '../../src/panels/NotesPanel.tsx';
import { PasteRowsDialog } from '../../src/panels/PasteRowsDialog.tsx';
import { ProblemsList } from '../../src/panels/ProblemsList.tsx';
import { TargetsPanel } from '../../src/panels/TargetsPanel.tsx';
import { Verdicts } from '../../src/panels/Verdicts.tsx';
import { WeighDialog } from '../../src/panels/WeighDialog.tsx';
import { craftFrom, samples, sampleText } from '../samples/readSamples.ts';
import { danglingIds, editorOn, render, seen, unnamed } from './render.tsx';

const worked = craftFrom(sampleText('worked-example'));
const place = { kind: 'skin', station: 1, clock: 1, standoff: 0.01 } as const;
/** Something of every kind, so that every field is on the page. */
const full = [
  addWire(blankWire(place, 0.003)),
  addHardpoint('Tail', { kind: 'free', x: 2, y: 0, z: 0.1 }),
  setSupport({ kind: 'keel', station: 1.4, drop: 0.2 }),
].reduce<Craft>((craft, edit) => run(craft, edit.recipe).craft, worked);
const only = (kind: Selectable['kind'], id: string): Selection => [{ kind, id }];
const all: Selection = full.parts.order.map((id) => ({ kind: 'part', id }));
const nothing = () => {};

const PAGES: Readonly<Record<string, string>> = {
  verdicts: render(Verdicts, {}, full),
  figures: render(FiguresPanel, {}, full),
  film: render(FilmPanel, {}, full),
  gas: render(GasPanel, {}, full),
  day: render(DayPanel, {}, full),
  targets: render(TargetsPanel, {}, full),
  notes: render(NotesPanel, {}, full),
  ledger: render(Ledger, {}, full, { selection: all }),
  part: render(Inspector, {}, full, { selection: only('part', full.parts.order[0]!) }),
  parts: render(Inspector, {}, full, { selection: all }),
  wire: render(Inspector, {}, full, { selection: only('wire', full.wires.order[0]!) }),
  hardpoint: render(Inspector, {}, full, { selection: only('hardpoint', 'tail') }),
  none: render(Inspector, {}, full),
  catalogue: render(CatalogueDialog, { onClose: nothing }, full),
  weigh: render(WeighDialog, { id: full.parts.order[0]!, onClose: nothing }, full),
  paste: render(PasteRowsDialog, { text: 'A,heavy', onClose: nothing }, full),
  newCraft: render(NewCraftDialog, { onCreate: nothing, onClose: nothing }, full),
  crafts: render(
    CraftsDialog,
    {
      crafts: [
        { id: 'a', name: 'First', changedAt: 0, current: false, versions: [{ name: 'Old', changedAt: 0 }] },
      ],
      samples: [{ id: 's', name: 'Sample', note: 'One to start from.' }],
      onOpen: nothing,
      onOpenVersion: nothing,
      onRename: nothing,
      onDuplicate: nothing,
      onDelete: nothing,
      onSample: nothing,
      onNew: nothing,
      onClose: nothing,
    },
    full,
  ),
  ...Object.fromEntries(
    SHAPE_KINDS.map((kind) => {
      const shaped = run(full, chooseShape(shapeAs(kind, full.hull.shape)).recipe).craft;
      return [`hull ${kind}`, render(HullPanel, {}, shaped)];
    }),
  ),
};

test.each(Object.entries(PAGES))(
  'every field of %s has a name, and every id it names exists',
  (_, markup) => {
    expect(markup.length).toBeGreaterThan(100);
    expect(unnamed(markup)).toEqual([]);
    expect(danglingIds(markup)).toEqual([]);
  },
);

test.each(Object.entries(PAGES))(
  '%s shows no NaN, no undefined and no braces of an unread sentence',
  (_, markup) => {
    expect(seen(markup)).not.toMatch(/NaN|undefined|\[object|\{/);
  },
);

test.each(samples.map(({ name, text }) => [name, text] as const))(
  'verdicts, figures and ledger of %s can be shown in both unit systems',
  (_, text) => {
    const craft = craftFrom(text);
    for (const units of ['metric', 'imperial'] as const) {
      for (const component of [Verdicts, FiguresPanel, Ledger, HullPanel]) {
        expect(seen(render(component, {}, craft, { units }))).not.toMatch(/NaN|undefined|\[object|\{/);
      }
    }
  },
);

test('the worked example shows its figures as worked out by hand', () => {
  const figures = seen(render(FiguresPanel, {}, worked));
  // From the worked example: 1589.907 g gross lift, CG at 1.763207 m, and 53.929° nose-up.
  expect(figures).toContain('Gross lift 1589.9 g');
  expect(figures).toContain('CG station 1.763 m');
  expect(seen(render(Verdicts, {}, worked))).toContain('53.9°');
});

test('each verdict is a word, a number and a margin, and its state is said in words', () => {
  const { verdicts } = editorOn(worked).assessment;
  const text = seen(render(Verdicts, {}, worked));
  for (const { title, word, state } of verdicts) {
    expect(text).toContain(title);
    expect(text).toContain(word);
    expect(text).toContain({ met: 'meets', missed: 'misses', open: 'is advice' }[state]);
  }
  expect(text).toMatch(/(to spare|off by)/);
});

test('every figure of the report stands in the figures panel once', () => {
  const keys = Object.keys(editorOn(full).assessment.rows);
  const shown = [...PAGES.figures!.matchAll(/data-figure="([^"]+)"/g)].map(([, key]) => key);
  expect(shown.toSorted()).toEqual(keys.toSorted());
});

test('cautions stand where the hazard is', () => {
  const hydrogen = run(worked, setGas('gas', { lifting: 'hydrogen' }).recipe).craft;
  expect(seen(render(GasPanel, {}, worked))).toMatch(/Helium displaces the air/);
  expect(seen(render(GasPanel, {}, hydrogen))).toMatch(/Hydrogen burns/);
  expect(seen(render(GasPanel, {}, worked))).toMatch(/in the sun/);
  expect(seen(PAGES.targets!)).toMatch(/near people.*aviation authority/);
  const cautionOf = (kind: 'battery' | 'thruster' | 'camera') => {
    const craft = run(worked, addPart({ ...blankPart(place), kind, name: 'Newcomer' }).recipe).craft;
    return seen(render(Inspector, {}, craft, { selection: only('part', 'newcomer') }));
  };
  expect(cautionOf('battery')).toMatch(/Caution: Lithium/);
  expect(cautionOf('thruster')).toMatch(/Caution: A turning propeller/);
  expect(cautionOf('camera')).not.toMatch(/Caution/);
});

test('the tape distance of a part on the skin is the one the hull gives', () => {
  const craft = run(
    worked,
    addPart({ ...blankPart({ ...place, station: 1.5 }), name: 'Label' }).recipe,
  ).craft;
  const markup = render(Inspector, {}, craft, { selection: only('part', 'label') });
  // A quarter of the circumference of the ellipse 3.000 × 1.000 m, by Ramanujan's second formula: 1.67061 m.
  expect(markup).toMatch(/Tape distance.*?value="1\.671"/);
});

test('a hull that cannot be formed leaves panels that say why', () => {
  const rows = [0, 1, 0.5].map((at) => ({ at, size: 0.4 }));
  const shape = { kind: 'offsets', along: 'station', across: 'diameter', rows } as const;
  const broken = run(worked, chooseShape(shape).recipe).craft;
  expect(editorOn(broken).assessment.geometry.status).toBe('infeasible');
  expect(render(HullPanel, {}, broken)).toContain('role="alert"');
  for (const component of [Verdicts, FiguresPanel, Ledger, TargetsPanel]) {
    expect(seen(render(component, {}, broken))).not.toMatch(/NaN|undefined/);
  }
});

test('rows to be pasted are shown as the ledger would show them, with the units that were assumed', () => {
  const text = 'name,mass,station\nCamera,34,0.7\nLamp,12,2.1\nBad,heavy,1';
  const shown = seen(render(PasteRowsDialog, { text, onClose: nothing }, worked));
  expect(shown).toContain('mass in g, station in m');
  expect(shown).toContain('Camera Useful load 34.0 g Below the keel 0.700 m 1');
  expect(shown).toContain('Add the 2 good ones');
  expect(shown).not.toContain('Add all');
  expect(shown).not.toContain('Mind the stations');
  const wrong = seen(
    render(PasteRowsDialog, { text: text.replace('station', 'station mm'), onClose: nothing }, worked),
  );
  expect(wrong).toMatch(/Mind the stations: All of them sit within a hundredth.*3\.000 m/);
});

test('a problem of the loading gate is shown with its field, what was found and what is allowed', () => {
  const problems = [{ path: 'parts[2].mass', found: '-1', allowed: 'at least 0' }];
  expect(seen(render(ProblemsList, { title: 'Not opened', problems }, worked))).toContain(
    'parts[2].mass : found -1; allowed: at least 0.',
  );
});
