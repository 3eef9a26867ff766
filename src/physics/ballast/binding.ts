/**
 * Which limits stand in the way of less ballast, and what moving each would save.
 *
 * The saving is that of one of the builder's steps, the marginal value that of a small move, both with everything planned
 * anew. Both by solving again with the limit moved, so they count what
 * the duals of the linear program leave out: the hull's curve, the wires, the tolerances.
 */
import { type Relaxation, relaxed, type TargetKey } from '../../craft/relaxation.ts';
import type { LinearSolver } from '../../numeric/linearProgram/result.ts';
import type { Found } from './attempt.ts';
import { type Candidate, candidatesOf } from './candidates.ts';
import { isReached } from './exact.ts';
import type { LimitKey } from './limits.ts';
import { ballastOf, type Point } from './point.ts';
import { planFor, type RemedyOptions } from './relaxations.ts';
import { loadMass, type Setting } from './setting.ts';

export interface Binding {
  /** The limit, moved by one step. */
  readonly limit: Relaxation;
  /** Where it stands today. */
  readonly now: number;
  /** The step: rad, m, kg or pieces. */
  readonly step: number;
  /** Dead ballast that one step more would save, kg. */
  readonly saving: number;
  /** Saving per rad, m, kg or piece of a small move; where pieces or places are to be chosen, of the whole step. */
  readonly marginal: number;
}

export interface Bindings {
  readonly binding: readonly Binding[];
  /** False when time ran out before every limit was tried. */
  readonly complete: boolean;
}

/** Less than this is no saving, kg. */
const LEAST_SAVING = 1e-6;
/** A small move, as a share of a step. */
const SMALL = 0.02;

export function bindingOf(
  setting: Setting,
  found: Found,
  solver: LinearSolver,
  options: RemedyOptions,
): Bindings {
  const ballast = ballastOf(setting, found.point);
  const binding: Binding[] = [];
  let complete = true;
  if (ballast < LEAST_SAVING) return { binding, complete };
  for (const candidate of candidatesOf(setting, options.units)) {
    if (!mayBind(setting, found, candidate)) continue;
    if (Date.now() >= options.deadline || options.shouldStop?.()) {
      complete = false;
      break;
    }
    const each = bindingAt(setting, found, solver, candidate, ballast, options);
    if (each) binding.push(each);
  }
  return { binding: binding.sort((a, b) => b.saving - a.saving), complete };
}

function bindingAt(
  setting: Setting,
  found: Found,
  solver: LinearSolver,
  candidate: Candidate,
  ballast: number,
  options: RemedyOptions,
): Binding | null {
  const { now, furthest, step, whole, at } = candidate;
  const way = Math.sign(furthest - now);
  const to = (by: number) => (way > 0 ? Math.min(now + by, furthest) : Math.max(now - by, furthest));
  const savingAt = (value: number): number => {
    const plan = planFor(relaxed(setting.craft, at(value)), setting.robust, solver, false, options);
    return plan ? Math.max(0, ballast - ballastOf(plan.setting, plan.found.point)) : 0;
  };
  const limit = at(to(step));
  const saving = savingAt(to(step));
  if (saving < LEAST_SAVING) return null;
  const stepped = Math.abs(to(step) - now);
  if (whole || found.choices) return { limit, now, step: stepped, saving, marginal: saving / stepped };
  const near = to(SMALL * step);
  return { limit, now, step: stepped, saving, marginal: savingAt(near) / Math.abs(near - now) };
}

/** Where nothing is to be chosen only a limit that is reached can bind. */
function mayBind(setting: Setting, { choices, exact, point }: Found, { at, now }: Candidate): boolean {
  if (choices) return true;
  const limit = at(now);
  switch (limit.kind) {
    case 'hardpoint':
      return isFull(setting, point, limit.hardpoint);
    case 'slide':
      return isThere(point.slides[setting.slides.findIndex(({ part }) => part.id === limit.part)]!, now);
    case 'loadSlide': {
      const l = setting.loads.findIndex(({ load }) => load.id === limit.load);
      return isThere(point.stations[l]![limit.option]!, now);
    }
    case 'ashore':
    case 'pieces':
      return true;
    default:
      return ROWS[limit.kind].some((key) => isReached(exact, key));
  }
}

const ROWS: Record<TargetKey, readonly LimitKey[]> = {
  pitchTolerance: ['noseUp', 'noseDown'],
  heelTolerance: ['starboardDown', 'portDown'],
  heaviest: ['heaviest'],
  lightest: ['lightest'],
  pendulumDepth: ['depth'],
};

const isThere = (station: number, end: number): boolean => Math.abs(station - end) < 1e-6;

function isFull(setting: Setting, point: Point, id: string): boolean {
  const h = setting.hardpoints.findIndex((each) => each.id === id);
  const loads = setting.loads.map((choice, l) => {
    const option = point.options[l]!;
    return option !== null && choice.options[option]!.hardpoint === id ? loadMass(choice) : 0;
  });
  const hung = loads.reduce((sum, mass) => sum + mass, point.weights[h]!);
  return hung > setting.hardpoints[h]!.room - 1e-7;
}
