/**
 * Flight of a craft left to itself: the steady straight path it takes in the vertical plane at a throttle and a vectoring in
 * pitch. Unknown are forward and upward speed u, w, m/s, and pitch θ, rad, at which
 *
 *   F_a − H sin θ = 0,   F_h − H cos θ = 0,   Σ M = 0
 *
 * with forces and moments of pitchMoments.ts, H weight less lift, N.  Angle of attack α = atan2(−w, u), path γ = θ − α,
 * climb rate u sin θ + w cos θ; each + upward.
 *
 * By Newton (numeric/newton.ts) from the craft afloat, pushed along and across as if it did not pitch.
 *
 * Whether the craft keeps to that path through swings is a matter of masses and damping, and not looked at here: above
 * the speed of critical.ts a caution says so.
 */
import { type Residual, solveNewton } from '../../numeric/newton.ts';
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import type { CraftState } from '../craftState.ts';
import type { AheadHelm } from '../thrust/ahead.ts';
import { NO_THRUSTER } from '../thrust/speed.ts';
import { criticalOf } from './critical.ts';
import { FARTHEST, flightCautions, floatingOf } from './cruise.ts';
import { type PitchCraft, pitchCraftOf } from './pitchCraft.ts';
import { type Flight, loadsOn, type PitchTerms } from './pitchMoments.ts';

export interface Climb {
  /** rad, + nose-up */
  readonly pitch: number;
  /** rad, of the path, + climbing */
  readonly path: number;
  /** rad, + with the nose above the path */
  readonly attack: number;
  /** m/s, along the path and upward */
  readonly speed: number;
  readonly climbRate: number;
  /** N·m about the CB, + nose-up; they add up to nil. */
  readonly terms: PitchTerms;
  /** One sentence each. */
  readonly cautions: readonly string[];
}

export const steadyClimb = (state: CraftState, helm: AheadHelm): Outcome<Climb> =>
  climbOf(pitchCraftOf(state), helm);

export interface ClimbPoint {
  /** Vectoring in pitch, rad, + thrust up. */
  readonly vector: number;
  readonly climb: Outcome<Climb>;
}

/** Over all that the thrusters can be turned in pitch, at equal steps; one point where none turns. */
export function climbCurve(state: CraftState, throttle = 1, points = 37): ClimbPoint[] {
  const craft = pitchCraftOf(state);
  const least = Math.min(...craft.thrusters.map(({ pitch }) => pitch.least));
  const most = Math.max(...craft.thrusters.map(({ pitch }) => pitch.most));
  if (!(least <= most)) return [];
  const count = least === most ? 1 : points;
  return Array.from({ length: count }, (_, i) => {
    const vector = least + ((most - least) * i) / Math.max(count - 1, 1);
    return { vector, climb: climbOf(craft, { throttle, vector }) };
  });
}

function climbOf(craft: PitchCraft, helm: AheadHelm): Outcome<Climb> {
  if (craft.thrusters.length === 0) return NO_THRUSTER;
  const floating = floatingOf(craft);
  if (floating.status === 'infeasible') return floating;
  const flight = flightOf(craft, helm, floating.value);
  if (flight.status === 'infeasible') return flight;
  if (Math.abs(flight.value.pitch) > FARTHEST) return tooSteep(flight.value.pitch);
  const { u, w, pitch } = flight.value;
  const speed = Math.hypot(u, w);
  const attack = speed > 0 ? Math.atan2(-w, u) : 0;
  return solved({
    pitch,
    path: speed > 0 ? pitch - attack : 0,
    attack,
    speed,
    climbRate: u * Math.sin(pitch) + w * Math.cos(pitch),
    terms: loadsOn(craft, helm, flight.value).terms,
    cautions: [...flightCautions(craft, speed, attack), ...munkCautions(craft, speed)],
  });
}

const CALMER = 'Throttle back, bring the line of thrust nearer to the CB or hang weight lower.';

const tooSteep = (pitch: number): Outcome<never> =>
  infeasible(
    `Left to itself the craft would pitch to ${say(pitch, 'angle')}, beyond the ${say(FARTHEST, 'angle')} for which these sums are good.`,
    CALMER,
  );

/** A craft slower than this stands, m/s. */
const STILL = 1e-6;

/** Where it is not found at once, from the flight at a quarter of the throttle. */
function flightOf(craft: PitchCraft, helm: AheadHelm, floating: number, tries = 3): Outcome<Flight> {
  const guess = firstGuess(craft, helm, floating);
  if (Math.hypot(guess.u, guess.w) < STILL) return solved({ u: 0, w: 0, pitch: floating });
  const direct = flightFrom(craft, helm, guess);
  if (direct.status === 'solved' || tries === 0) return direct;
  const slower = flightOf(craft, { ...helm, throttle: helm.throttle / 4 }, floating, tries - 1);
  return slower.status === 'solved' ? flightFrom(craft, helm, slower.value) : direct;
}

/** Afloat, with forces along and across met each by its own drag. */
function firstGuess(craft: PitchCraft, helm: AheadHelm, pitch: number): Flight {
  const { forward, up } = loadsOn(craft, helm, { u: 0, w: 0, pitch });
  const along = forward - craft.heaviness * Math.sin(pitch);
  const across = up - craft.heaviness * Math.cos(pitch);
  const u = Math.sign(along) * (Math.abs(along) / craft.drag.at(1)) ** (6 / 11);
  const w = Math.sign(across) * Math.sqrt(Math.abs(across) / (craft.density * craft.crossFlow.area));
  return { u, w, pitch };
}

function flightFrom(craft: PitchCraft, helm: AheadHelm, start: Flight): Outcome<Flight> {
  const size = Math.hypot(start.u, start.w);
  const root = solveNewton(leftOver(craft, helm), [start.u, start.w, start.pitch], {
    sizes: [size, size, 1],
  });
  if (root.status === 'solved') {
    const [u, w, pitch] = root.value;
    return solved({ u: u!, w: w!, pitch: pitch! });
  }
  return infeasible(`No steady path was found at ${say(helm.throttle, 'fraction')} throttle.`, CALMER);
}

/** Forces and moment left over at (u, w, θ), against those of thrust, heaviness and pendulum. */
function leftOver(craft: PitchCraft, helm: AheadHelm): Residual {
  const { heaviness, pendulum, tailHeavy } = craft;
  const { pushes } = loadsOn(craft, helm, { u: 0, w: 0, pitch: 0 });
  const force = pushes.reduce((sum, { thrust }) => sum + Math.abs(thrust), Math.abs(heaviness));
  const moment = Math.hypot(pendulum, tailHeavy);
  return ([u, w, pitch], into) => {
    const loads = loadsOn(craft, helm, { u: u!, w: w!, pitch: pitch! });
    into[0] = (loads.forward - heaviness * Math.sin(pitch!)) / force;
    into[1] = (loads.up - heaviness * Math.cos(pitch!)) / force;
    into[2] = loads.moment / moment;
  };
}

function munkCautions(craft: PitchCraft, speed: number): string[] {
  const critical = criticalOf(craft);
  if (critical.status === 'infeasible' || critical.value.speed === null || speed < critical.value.speed)
    return [];
  return [
    `From ${say(critical.value.speed, 'speed')} on the Munk moment overcomes what holds the nose: this is an attitude that it may not keep.`,
  ];
}
