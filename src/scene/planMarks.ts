/** Where the marks of the plan stand in the side view: ghosts of what it moves, weights hung at hardpoints, how full those are. */
import type { Craft } from '../craft/craft.ts';
import { type HardpointFill, hardpointFills } from '../report/planView.ts';
import { formatQuantity } from '../units/format.ts';
import { type Figure, sideFigure } from './figure.ts';
import { fromSide } from './flatten.ts';
import { sideMarks } from './marks.ts';
import type { Planned } from './planned.ts';
import { fillWords, piecesWords, stationWords } from './planWords.ts';
import type { Geometry, UnitSystem } from './subject.ts';
import { type PlanePoint, type ScreenPoint, toScreen, type View } from './view.ts';

export interface GhostMark {
  readonly figure: Figure;
  /** From today's middle to the planned one; null when it comes aboard. */
  readonly arrow: { readonly from: PlanePoint; readonly to: PlanePoint } | null;
  /** "1.020 m" at the first piece of a part; with its name when it is not aboard today. */
  readonly label: string | null;
}

/** `px`: size of a pixel, m. */
export function ghostMarks(planned: Planned, { hull }: Geometry, px: number, units: UnitSystem): GhostMark[] {
  return planned.ghosts.flatMap(({ piece, from }) => {
    const part = planned.plan.craft.parts.byId[piece.part];
    if (!part) return [];
    const station = stationWords(piece.middle[0], units);
    const label = piece.copy > 0 ? null : from ? station : `${part.name || part.kind} ${station}`;
    const arrow = from && { from: fromSide(from), to: fromSide(piece.middle) };
    return [{ figure: sideFigure(part, piece, hull, px), arrow, label }];
  });
}

export interface WeightMark {
  readonly at: ScreenPoint;
  /** Where the ghost of the weight begins, px below the hardpoint: lower than one it would cover. */
  readonly drop: number;
  /** The mass, and the pieces that make it. */
  readonly lines: readonly string[];
}

const DROP = 22;
/** Weights nearer to each other than this would cover one another, px. */
const WIDE = 24;
const TALL = 26;

export function weightMarks({ weights }: Planned, view: View, units: UnitSystem): WeightMark[] {
  const marks: WeightMark[] = [];
  for (const { at, mass, pieces } of weights) {
    const spot = toScreen(view, fromSide(at));
    let drop = DROP;
    const covers = (other: WeightMark) =>
      Math.abs(spot.x - other.at.x) < WIDE && Math.abs(spot.y + drop - other.at.y - other.drop) < TALL;
    while (marks.some(covers)) drop += TALL;
    marks.push({ at: spot, drop, lines: linesOf(mass, pieces, units) });
  }
  return marks;
}

const linesOf = (mass: number, pieces: Planned['weights'][number]['pieces'], units: UnitSystem): string[] => {
  const whole = formatQuantity(mass, 'mass', units);
  return pieces.length > 0 ? [whole, piecesWords(pieces, units)] : [whole];
};

export interface Gauge {
  readonly id: string;
  readonly at: ScreenPoint;
  /** Share of the limit, 0 … 1. */
  readonly share: number;
  readonly pieces: boolean;
  readonly words: string;
}

/** How full each hardpoint is: as the plan makes it, without one as it is today. */
export function gaugesOf(
  craft: Craft,
  planned: Planned | null,
  hardpoints: readonly { readonly id: string; readonly at: PlanePoint }[],
  view: View,
  units: UnitSystem,
): Gauge[] {
  const fills = hardpointFills(planned?.plan.craft ?? craft);
  return hardpoints.flatMap(({ id, at }) => {
    const fill = fills.find(({ hardpoint }) => hardpoint === id);
    return fill ? [{ id, at: toScreen(view, at), ...gaugeOf(fill, units) }] : [];
  });
}

const gaugeOf = (fill: HardpointFill, units: UnitSystem): Omit<Gauge, 'id' | 'at'> => ({
  share: fill.limit > 0 ? Math.min(1, fill.mass / fill.limit) : fill.mass > 0 ? 1 : 0,
  pieces: fill.fill === 'pieces',
  words: fillWords(fill, units),
});

/** Nearer than this to today's the bob of the plan only doubles it, px. */
const SEEN_APART = 3;

/** Ring and bob once the plan is carried out; null when they are where they are today. */
export function plannedBob({ after }: Planned, today: Geometry, view: View) {
  const marks = sideMarks(view, after);
  const now = sideMarks(view, today).bob;
  const { bob } = marks;
  return bob && now && Math.hypot(bob.x - now.x, bob.y - now.y) < SEEN_APART ? null : marks;
}
