/**
 * The ballast plan: what hangs where, so that the craft keeps its targets with the least dead ballast, and as the builder
 * wishes beyond that. Method: sequential linear programs, mixed-integer where there is something to choose; see `limits.ts`
 * for the equations, `linear.ts` for the linearisation and `search.ts` for the rounds.
 */
import { type Craft, listed } from '../../craft/craft.ts';
import type { Place } from '../../craft/placeSchema.ts';
import type { LeadPiece } from '../../craft/planningSchema.ts';
import type { Stowage } from '../../craft/stowage.ts';
import type { LinearSolver } from '../../numeric/linearProgram/result.ts';
import type { UnitSystem } from '../../units/units.ts';
import { attitudeOf } from '../balance/attitude.ts';
import type { Better, Found, NotFound } from './attempt.ts';
import { type Binding, bindingOf } from './binding.ts';
import { type Exact, exactOf, isKept } from './exact.ts';
import { ballastOf, type Point, stowageOf } from './point.ts';
import { type Remedy, type RemedyOptions, remediesOf } from './relaxations.ts';
import { search } from './search.ts';
import { ballastMass, fixedBallast, type Setting, settingOf } from './setting.ts';
import type { Share } from './share.ts';

export interface PlanOptions {
  /** Whether it must hold for every mass within its tolerance. Default false. */
  readonly robust?: boolean;
  /** Seconds for the whole of it. Default 20. */
  readonly timeLimit?: number;
  /** On whose scale limits are moved when it is told what binds and what would help. Default 'metric'. */
  readonly units?: UnitSystem;
  /** Whether to tell what binds and what would help. Default true. */
  readonly explain?: boolean;
  readonly onProgress?: (progress: PlanProgress) => void;
  readonly shouldStop?: () => boolean;
}

export interface PlanProgress {
  readonly step: 'searching' | 'explaining';
  /** Dead ballast of the best plan so far, and what no plan goes below, kg; null while there is none. */
  readonly deadBallast: number | null;
  readonly bound: number | null;
  /** The plan so far, when there is a new one that keeps every limit: what is left when one stops. */
  readonly plan: PlanFound | null;
}

export type Plan = PlanFound | PlanNotFound;

export interface PlanFound {
  /** optimal: no plan has less dead ballast. stopped: it keeps every limit, but one with less, down to `bound`, may exist. */
  readonly status: 'optimal' | 'stopped';
  readonly robust: boolean;
  readonly stowage: Stowage;
  /** The craft with the plan carried out. */
  readonly craft: Craft;
  /** All dead ballast then and today, and that of it which no plan may touch, kg. */
  readonly deadBallast: number;
  readonly deadBallastToday: number;
  readonly deadBallastFixed: number;
  readonly weights: readonly PlannedWeight[];
  /** Slides that move. */
  readonly slides: readonly PlannedSlide[];
  /** Every load a plan may decide on. */
  readonly loads: readonly PlannedLoad[];
  /** No plan has less dead ballast than this, kg. */
  readonly bound: number;
  /** (dead ballast − bound) / dead ballast; 0 when proven. */
  readonly gap: number;
  /** Whether the wishes and ties, too, were carried to their proof, to 0.1 g, one part and 1 mm. */
  readonly wishesProven: boolean;
  /** What the program claims of the craft less what the statics say of it. */
  readonly disagreement: { readonly pitch: number; readonly heel: number; readonly mass: number };
  readonly binding: readonly Binding[];
  /** False when time ran out before every limit was tried. */
  readonly bindingComplete: boolean;
}

export interface PlannedWeight {
  readonly hardpoint: string;
  /** kg */
  readonly mass: number;
  /** Empty where ballast is cut to measure. */
  readonly pieces: readonly LeadPiece[];
}

export interface PlannedSlide {
  readonly part: string;
  /** Stations, m. */
  readonly from: number;
  readonly to: number;
}

export interface PlannedLoad {
  readonly load: string;
  /** Where it goes; null when it is left ashore. */
  readonly place: Place | null;
  /** The hardpoint at which it hangs, if it hangs at one. */
  readonly hardpoint: string | null;
  /** Where it is today; null when it is ashore. */
  readonly placeToday: Place | null;
}

export interface PlanNotFound {
  /** infeasible: nothing keeps every limit. none: it could not be told, and `why` says why. */
  readonly status: 'infeasible' | 'none';
  readonly robust: boolean;
  readonly why: string;
  /** Single relaxations that would do, each the smallest of its kind. */
  readonly remedies: readonly Remedy[];
  readonly remediesComplete: boolean;
}

/** Never throws for a craft that passed the loading gate. */
export function planOf(craft: Craft, solver: LinearSolver, options: PlanOptions = {}): Plan {
  const { robust = false, timeLimit = 20, units = 'metric', explain = true, shouldStop } = options;
  const setting = settingOf(craft, robust);
  if (setting.status === 'infeasible') return noPlan('none', setting.why, robust);
  const deadline = Date.now() + 1000 * timeLimit;
  const asked: RemedyOptions = { deadline, units, ...(shouldStop ? { shouldStop } : {}) };
  const found = search(setting.value, solver, { ...asked, ...telling(setting.value, options) });
  if (found.status !== 'found') return notFound(setting.value, solver, found, explain, asked);
  const plan = planFrom(setting.value, found);
  if (!explain) return plan;
  const { deadBallast, bound } = plan;
  options.onProgress?.({ step: 'explaining', deadBallast, bound, plan });
  const { binding, complete } = bindingOf(setting.value, found, solver, asked);
  return { ...plan, binding, bindingComplete: complete };
}

export const noPlan = (status: PlanNotFound['status'], why: string, robust: boolean): PlanNotFound => ({
  status,
  robust,
  why,
  remedies: [],
  remediesComplete: true,
});

function notFound(
  setting: Setting,
  solver: LinearSolver,
  { status, why }: NotFound,
  explain: boolean,
  asked: RemedyOptions,
): PlanNotFound {
  const homeless = setting.loads.find(({ load, options }) => load.must && options.length === 0);
  const plan = noPlan(
    status,
    homeless ? `${homeless.load.name || 'A load'} has to be carried and has nowhere to go.` : why,
    setting.robust,
  );
  if (status !== 'infeasible' || !explain) return plan;
  const { remedies, complete } = remediesOf(setting, solver, asked);
  return { ...plan, remedies, remediesComplete: complete };
}

function telling(setting: Setting, { onProgress }: PlanOptions): { onBetter?: (better: Better) => void } {
  if (!onProgress) return {};
  const fixed = fixedBallast(setting.craft);
  const inKilograms = (grams: number) => (Number.isFinite(grams) ? grams / 1000 + fixed : null);
  return {
    onBetter: (better) =>
      onProgress({
        step: 'searching',
        deadBallast: inKilograms(better.objective),
        bound: inKilograms(better.bound),
        plan: planSoFar(setting, better),
      }),
  };
}

function planSoFar(setting: Setting, { point, bound, gap }: Better): PlanFound | null {
  const exact = point && exactOf(setting, point);
  if (!exact || !isKept(exact)) return null;
  return planAt(setting, point, exact, exact.share, { status: 'stopped', bound, gap, proven: false });
}

export const planFrom = (setting: Setting, { point, exact, claimed, ordered }: Found): PlanFound =>
  planAt(setting, point, exact, claimed, { ...ordered.first, proven: ordered.proven });

interface Proof {
  readonly status: PlanFound['status'];
  /** g */
  readonly bound: number;
  readonly gap: number;
  readonly proven: boolean;
}

function planAt(setting: Setting, point: Point, exact: Exact, claimed: Share, proof: Proof): PlanFound {
  const { craft, robust } = setting;
  const fixed = fixedBallast(craft);
  const planned = ballastOf(setting, point);
  const { status, bound, gap, proven } = proof;
  return {
    status,
    robust,
    stowage: stowageOf(setting, point),
    craft: exact.craft,
    deadBallast: planned + fixed,
    deadBallastToday: ballastMass(listed(craft.parts)),
    deadBallastFixed: fixed,
    weights: weightsOf(setting, point),
    slides: setting.slides
      .map(({ part, now }, i) => ({ part: part.id, from: now, to: point.slides[i]! }))
      .filter(({ from, to }) => from !== to),
    loads: loadsOf(setting, point),
    bound: Math.min(Math.max(bound / 1000, 0), planned) + fixed,
    gap,
    wishesProven: proven,
    disagreement: disagreementOf(claimed, exact.share, exact.state.loading.cb),
    binding: [],
    bindingComplete: false,
  };
}

const weightsOf = (setting: Setting, point: Point): PlannedWeight[] =>
  stowageOf(setting, point).weights.map(({ hardpoint, pieces }) => ({
    hardpoint,
    mass: pieces.reduce((sum, { mass, count }) => sum + mass * count, 0),
    pieces: setting.craft.hardpoints.byId[hardpoint]!.fill === 'pieces' ? pieces : [],
  }));

function loadsOf(setting: Setting, point: Point): PlannedLoad[] {
  const { loads } = stowageOf(setting, point);
  return setting.loads.map(({ load, options, aboard }, l) => {
    const option = point.options[l]!;
    return {
      load: load.id,
      place: loads.find((each) => each.load === load.id)?.place ?? null,
      hardpoint: option === null ? null : options[option]!.hardpoint,
      placeToday: aboard?.place ?? null,
    };
  });
}

function disagreementOf(claimed: Share, exact: Share, cb: readonly [number, number, number]) {
  const [a, b] = [claimed, exact].map(([mass, x, y, z]) =>
    attitudeOf([x - mass * cb[0], y - mass * cb[1], z - mass * cb[2]]),
  );
  return {
    pitch: (a?.pitch ?? 0) - (b?.pitch ?? 0),
    heel: (a?.heel ?? 0) - (b?.heel ?? 0),
    mass: claimed[0] - exact[0],
  };
}
