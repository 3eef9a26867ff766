/**
 * The sums of a craft as linear functions of what a plan decides, about one point.
 *
 *   S ≈ rest + Σ w_h (1, p_h) + Σ [C_i + C_i′ (s_i − s_i⁰)] + Σ b_l [D_l + D_l′ (s_l − s_l⁰)]
 *
 * w_h ballast at a hardpoint; C_i(s) what a sliding part at station s adds with the wire runs that end at it; D_l(s) what
 * a load adds; b_l 1 when it is carried. Exact at the point itself. Away from it: exact for weights and for parts on the
 * axis or at free coordinates; curved where the hull is curved and where wire runs follow. Slopes by central differences
 * of the exact sums.
 */
import type { Part } from '../../craft/schema.ts';
import { withStation } from '../../craft/station.ts';
import { piecesOf } from '../mass/pieces.ts';
import type { Exact } from './exact.ts';
import type { Point } from './point.ts';
import { type Uncertain, uncertainOf } from './robust.ts';
import { type LoadChoice, partAt, type Setting } from './setting.ts';
import {
  NO_SHARE,
  type Planned,
  perKilogram,
  plus,
  type Share,
  shareOfPart,
  shareWithout,
  times,
  trialShare,
} from './share.ts';

export interface Linear {
  readonly rest: Share;
  /** For one kilogram at each hardpoint. */
  readonly weights: readonly Share[];
  readonly slides: readonly Line[];
  /** For each load, each option. */
  readonly loads: readonly (readonly Line[])[];
  /** Tolerances of what no plan moves. */
  readonly uncertain: readonly Uncertain[];
  /** Whether anything is curved, so that it holds only near the point. */
  readonly curved: boolean;
}

/** A share as a line in the station: value at `at`, and slope; the same for one kilogram of the part in each piece. */
export interface Line {
  readonly at: number;
  readonly value: Share;
  readonly slope: Share;
  readonly perKilogram: Share;
  readonly perKilogramSlope: Share;
}

export function linearAt(setting: Setting, point: Point, exact: Exact): Linear {
  const slides = setting.slides.map((slide, i) =>
    lineOf(exact, slide.part, slide.runs, point.slides[i]!, slide),
  );
  const loads = setting.loads.map((choice, l) => loadLines(setting, choice, point.stations[l]!, exact));
  const weights = setting.hardpoints.map(({ at: [x, y, z] }): Share => [1, x, y, z, 0]);
  const moving = new Set([
    ...setting.slides.map(({ part }) => part.id),
    ...setting.loads.map(({ load }) => load.id),
  ]);
  return {
    rest: plus(exact.share, decided(setting, point, { slides, loads, weights }), -1),
    weights,
    slides,
    loads,
    uncertain: setting.robust
      ? uncertainOf(exact.state).filter(({ part }) => part === null || !moving.has(part))
      : [],
    curved: isCurved(setting),
  };
}

const loadLines = (setting: Setting, choice: LoadChoice, stations: readonly number[], exact: Exact): Line[] =>
  choice.options.map((site, k) => {
    const at = stations[k]!;
    const part = partAt(setting, choice, site, at);
    const span = site.slide ?? { from: at, to: at };
    const line = lineOf(exact, part, choice.runs, at, span);
    if (!choice.aboard) return line;
    return { ...line, value: plus(line.value, shareWithout(exact, choice.aboard, choice.runs), -1) };
  });

/** What the decisions of the point add, by the linear functions. */
function decided(
  setting: Setting,
  { weights, counts, options, trial }: Point,
  linear: Pick<Linear, 'slides' | 'loads' | 'weights'>,
): Share {
  const hung = weights.map(
    (weight, h) => weight + counts[h]!.reduce((sum, count, k) => sum + count * setting.sizes[k]!.mass, 0),
  );
  return [
    times(trialShare(setting), trial),
    ...linear.weights.map((share, h) => times(share, hung[h]!)),
    ...linear.slides.map(({ value }) => value),
    ...options.flatMap((option, l) => (option === null ? [] : [linear.loads[l]![option]!.value])),
  ].reduce<Share>((sum, share) => plus(sum, share), NO_SHARE);
}

/** Step of the differences, m: far above the rounding of the hull's figures, far below any bend of it. */
const STEP = 1e-4;

function lineOf(
  planned: Planned,
  part: Part,
  runs: Parameters<typeof shareOfPart>[2],
  at: number,
  { from, to }: { from: number; to: number },
): Line {
  const [fore, aft] = [Math.max(at - STEP, Math.min(from, at)), Math.min(at + STEP, Math.max(to, at))];
  const placed = (station: number): Part => ({ ...part, place: withStation(part.place, station) });
  const share = (station: number) => shareOfPart(planned, placed(station), runs);
  const unit = (station: number) => perKilogram(piecesOf(placed(station), planned.state.hull));
  const slope = (of: (station: number) => Share): Share =>
    aft > fore ? times(plus(of(aft), of(fore), -1), 1 / (aft - fore)) : NO_SHARE;
  return {
    at,
    value: share(at),
    slope: slope(share),
    perKilogram: unit(at),
    perKilogramSlope: slope(unit),
  };
}

/** Straight are parts on the axis or at free coordinates to which no wire runs. */
const isCurved = ({ slides, loads }: Setting): boolean =>
  slides.some(({ part, runs }) => bends(part.place.kind) || runs.length > 0) ||
  loads.some(
    ({ options, runs }) =>
      runs.length > 0 || options.some(({ place, slide }) => slide !== null && bends(place.kind)),
  );

const bends = (kind: Part['place']['kind']): boolean => kind === 'skin' || kind === 'keel';
