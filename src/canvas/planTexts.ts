/** Which words stand beside the marks of the plan and the rails, and what they keep clear of. Pixels. */
import type { Area } from '../scene/clearTexts.ts';
import { fromSide } from '../scene/flatten.ts';
import { type BalanceMarks, sideMarks } from '../scene/marks.ts';
import type { GhostMark, WeightMark } from '../scene/planMarks.ts';
import type { Planned } from '../scene/planned.ts';
import { stationWords } from '../scene/planWords.ts';
import type { Knob, Rail } from '../scene/rails.ts';
import { around, screenBox } from '../scene/rect.ts';
import { type PlanePoint, type ScreenPoint, toScreen } from '../scene/view.ts';
import { fontOf, textWidth } from './paint.ts';
import { KNOB_LABEL, KNOB_PX } from './RailMarks.tsx';
import type { MarkText } from './TextMarks.tsx';
import type { SideScene } from './useSideScene.ts';

export interface PlanShown {
  readonly ghosts: readonly GhostMark[];
  readonly ashore: Planned['ashore'];
  readonly weights: readonly WeightMark[];
  readonly bob: BalanceMarks | null;
}

export function planTexts(
  { view, palette }: SideScene,
  plan: PlanShown | null,
  rails: readonly Rail[],
): MarkText[] {
  const paper = { halo: palette.paper };
  const ghosts = plan?.ghosts.flatMap(({ figure, label }) =>
    label
      ? [{ key: `ghost ${figure.part}`, lines: [label], ink: palette.open, box: screenBox(figure, view) }]
      : [],
  );
  const weights = plan?.weights.map((mark, i) => ({
    key: `weight ${i}`,
    lines: mark.lines,
    ink: palette.lead,
    box: weightBox(mark),
  }));
  const ashore = plan?.ashore.map(({ load, at }) => ({
    key: `ashore ${load}`,
    lines: ['ashore'],
    ink: palette.open,
    box: around(toScreen(view, fromSide(at)), 11),
  }));
  const bob = plan?.bob?.bob
    ? [{ key: 'bob', lines: ['CG, plan'], ink: palette.bob, box: around(plan.bob.bob, 11) }]
    : [];
  const told = new Set(plan?.ghosts.filter(({ arrow }) => !arrow).map(({ figure }) => figure.part));
  const names = rails
    .filter(({ owner }) => owner.kind === 'load' && !told.has(owner.id))
    .map((rail, i) => ({
      key: `rail ${i}`,
      lines: [rail.name],
      ink: palette.good,
      box: around(toScreen(view, middleOf(rail.line)), 1),
    }));
  return [...bob, ...(weights ?? []), ...(ghosts ?? []), ...(ashore ?? []), ...names].map((text) => ({
    ...text,
    ...paper,
  }));
}

/** A straight rail has no point at its middle. */
function middleOf(line: readonly PlanePoint[]): PlanePoint {
  if (line.length > 2) return line[Math.floor(line.length / 2)]!;
  const [a, b] = [line[0]!, line.at(-1)!];
  return { u: (a.u + b.u) / 2, z: (a.z + b.z) / 2 };
}

export const WEIGHT_HALF = 10;
export const WEIGHT_HIGH = 16;

const weightBox = ({ at: { x, y }, drop }: WeightMark): Area => ({
  left: x - WEIGHT_HALF,
  right: x + WEIGHT_HALF,
  top: y + drop,
  bottom: y + drop + WEIGHT_HIGH,
});

/** Where the lean is written. */
function angleArea({ ring, lean, line }: BalanceMarks): Area {
  const y = ring.y + Math.min(0.6 * line, 70);
  const x = ring.x + (lean > 0 ? -30 : 30);
  return { left: x - 26, right: x + 26, top: y - 9, bottom: y + 9 };
}

/** The line from ring to bob. */
const alongLine = (from: ScreenPoint, to: ScreenPoint): Area[] =>
  Array.from({ length: 12 }, (_, i) =>
    around({ x: from.x + ((to.x - from.x) * i) / 12, y: from.y + ((to.y - from.y) * i) / 12 }, 5),
  );

/** So many parts are kept clear of. */
const MOST = 60;

/** Names of parts and the parts themselves, marks of balance, eyelets, weights, ghosts, knobs with their stations. */
export function planTaken(
  { view, geometry, hardpoints, figures, units, support }: SideScene,
  plan: PlanShown | null,
  knobs: readonly Knob[],
  labels: readonly { readonly text: string; readonly x: number; readonly y: number }[],
): Area[] {
  const marks = sideMarks(view, geometry);
  const { ring, bob } = marks;
  const foot = support && toScreen(view, support);
  return [
    ...labels.map(({ text, x, y }) => ({
      left: x,
      right: x + textWidth(text, fontOf(12)),
      top: y - 7,
      bottom: y + 7,
    })),
    { ...around(ring, 12), left: ring.x - 38, top: ring.y - 20 },
    ...(bob ? [{ ...around(bob, 16), left: bob.x - 36, right: bob.x + 36 }] : []),
    ...(bob ? [...alongLine(ring, bob), angleArea(marks)] : []),
    ...(foot ? [{ left: foot.x - 9, right: foot.x + 64, top: foot.y, bottom: foot.y + 18 }] : []),
    ...(plan?.bob?.bob ? [around(plan.bob.bob, 12), ...alongLine(ring, plan.bob.bob)] : []),
    ...hardpoints.map(({ at }) => around(toScreen(view, at), 11)),
    ...figures.slice(0, MOST).map((figure) => screenBox(figure, view)),
    ...(plan?.weights.map(weightBox) ?? []),
    ...(plan?.ghosts.map(({ figure }) => screenBox(figure, view)) ?? []),
    ...knobs.map((knob) => {
      const { x, y } = toScreen(view, knob.at);
      const width = textWidth(stationWords(knob.rail.slide[knob.end], units), KNOB_LABEL) + KNOB_PX + 6;
      const left = knob.end === 'from';
      return { left: x - (left ? width : 8), right: x + (left ? 8 : width), top: y - 8, bottom: y + 8 };
    }),
  ];
}
