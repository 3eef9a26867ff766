/**
 * What can be carried where: for each station of a line, the most useful load that can hang there with all the rest planned
 * anew, and the dead ballast that this leaves. Loads that may but need not be carried stay ashore meanwhile.
 */
import { type Craft, keyed, listed } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import { withStation } from '../../craft/station.ts';
import type { LinearSolver, LiveModel } from '../../numeric/linearProgram/result.ts';
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { positionOf } from '../mass/position.ts';
import { isKept } from './exact.ts';
import { ballastOf, type Point, startOf } from './point.ts';
import { searchFrom } from './search.ts';
import { fixedBallast, type Setting, settingOf } from './setting.ts';

/** The keel, the axis, or the line on which a hardpoint lies. */
export type CarryLine =
  | { readonly kind: 'keel' }
  | { readonly kind: 'axis' }
  | { readonly kind: 'hardpoint'; readonly hardpoint: string };

export interface CarryOptions {
  readonly robust?: boolean;
  /** How many stations, the ends of the hull among them. Default 101. */
  readonly stations?: number;
  /** Seconds for the whole curve. Default 20. */
  readonly timeLimit?: number;
  readonly onProgress?: (share: number) => void;
  readonly shouldStop?: () => boolean;
}

export interface CarryCurve {
  readonly line: CarryLine;
  readonly points: readonly CarryPoint[];
  /** False when time ran out, or it was stopped, before the tail. */
  readonly complete: boolean;
}

export interface CarryPoint {
  /** m */
  readonly station: number;
  readonly place: Place;
  /** Most useful load there, kg; null when no plan keeps every limit whatever hangs there. */
  readonly mass: number | null;
  /** All dead ballast with that load, kg. */
  readonly deadBallast: number | null;
  /** Whether no more can hang there, to the proof. */
  readonly proven: boolean;
}

/** Infeasible only when the hull cannot be formed or the line's hardpoint is gone. */
export function carryCurve(
  craft: Craft,
  solver: LinearSolver,
  line: CarryLine,
  options: CarryOptions = {},
): Outcome<CarryCurve> {
  const setting = settingOf(withoutOptional(craft), options.robust ?? false);
  if (setting.status === 'infeasible') return setting;
  const base = basePlace(craft, line);
  if (!base) return infeasible('The hardpoint of that line is gone.', 'Choose another line.');
  const model = solver.live();
  try {
    return solved(curveAlong(setting.value, model, line, base, options));
  } finally {
    model.dispose();
  }
}

function curveAlong(
  setting: Setting,
  model: LiveModel,
  line: CarryLine,
  base: Place,
  { stations = 101, timeLimit = 20, onProgress, shouldStop }: CarryOptions,
): CarryCurve {
  const deadline = Date.now() + 1000 * timeLimit;
  const points: CarryPoint[] = [];
  const { hull } = setting.today;
  let begin = startOf(setting);
  for (let i = 0; i < stations; i++) {
    if (Date.now() >= deadline || shouldStop?.()) return { line, points, complete: false };
    const place = withStation(base, (hull.length * i) / Math.max(1, stations - 1));
    const trial = { ...setting, trial: positionOf(place, hull) };
    const { point, next } = carryAt(trial, model, place, begin, deadline);
    points.push(point);
    begin = next;
    onProgress?.((i + 1) / stations);
  }
  return { line, points, complete: true };
}

/** The most at one place, and where to begin at the next. */
function carryAt(
  setting: Setting,
  model: LiveModel,
  place: Place,
  begin: Point,
  deadline: number,
): { point: CarryPoint; next: Point } {
  const station = place.kind === 'free' ? place.x : place.station;
  const found = searchFrom({ setting, model, options: { deadline, aim: 'trial' } }, begin);
  if (found.status !== 'found' || !isKept(found.exact)) {
    const proven = found.status === 'infeasible';
    return { point: { station, place, mass: null, deadBallast: null, proven }, next: startOf(setting) };
  }
  const deadBallast = ballastOf(setting, found.point) + fixedBallast(setting.craft);
  const proven = found.ordered.first.status === 'optimal';
  return { point: { station, place, mass: found.point.trial, deadBallast, proven }, next: found.point };
}

const withoutOptional = (craft: Craft): Craft => ({
  ...craft,
  loads: keyed(listed(craft.loads).map((load) => (load.must ? load : { ...load, options: [] }))),
});

function basePlace(craft: Craft, line: CarryLine): Place | null {
  switch (line.kind) {
    case 'keel':
      return { kind: 'keel', station: 0, drop: 0 };
    case 'axis':
      return { kind: 'axis', station: 0 };
    case 'hardpoint':
      return craft.hardpoints.byId[line.hardpoint]?.place ?? null;
  }
}
