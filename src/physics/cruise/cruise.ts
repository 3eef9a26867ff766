/**
 * Attitude in cruise: the pitch θ at which all moments of pitchMoments.ts balance in level flight,
 *
 *   Σ M(θ) = 0,  at the speed or throttle at which thrust meets drag along the path (level.ts)
 *
 * From the attitude in which it floats the craft is followed to the side to which the moments turn it there; the first
 * balance met holds by itself, for before it the moments push towards it. No balance is looked for more than 30° from
 * level: fins have long stalled there, and these sums say little.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import { say } from '../../units/sentence.ts';
import type { CraftState } from '../craftState.ts';
import { NO_THRUSTER } from '../thrust/speed.ts';
import { criticalOf } from './critical.ts';
import { type CruiseAsked, type Level, levelAt } from './level.ts';
import { type PitchCraft, pitchCraftOf } from './pitchCraft.ts';
import { flightAt, type Loads, loadsOn, type PitchTerms } from './pitchMoments.ts';

export interface Cruise {
  /** rad, + nose-up */
  readonly pitch: number;
  /** rad, of the craft afloat at rest */
  readonly floating: number;
  /** m/s */
  readonly speed: number;
  /** Share of full throttle, 0 … 1. */
  readonly throttle: number;
  /** N along each thruster's axis, all together. */
  readonly thrust: number;
  /** N, + up: of thrust and air less heaviness. Level flight has to be held against it; left to itself the craft climbs (climb.ts). */
  readonly rising: number;
  /** N·m about the CB at that pitch, + nose-up; they add up to nil. */
  readonly terms: PitchTerms;
  /** One sentence each. */
  readonly cautions: readonly string[];
}

export const cruisePitch = (state: CraftState, asked: CruiseAsked): Outcome<Cruise> =>
  cruiseOf(pitchCraftOf(state), asked);

export function cruiseOf(craft: PitchCraft, asked: CruiseAsked): Outcome<Cruise> {
  if (craft.thrusters.length === 0) return NO_THRUSTER;
  const floating = floatingOf(craft);
  if (floating.status === 'infeasible') return floating;
  const loose = neverHeld(craft, asked, floating.value);
  if (loose) return loose;
  const pitch = balanceFrom(craft, asked, floating.value);
  if (pitch.status === 'infeasible') return pitch;
  const level = levelAt(craft, asked, pitch.value);
  if (level.status === 'infeasible') return level;
  return (
    notHeld(craft, level.value.speed) ??
    tooFast(craft, pitch.value, level.value) ??
    solved(found(craft, floating.value, pitch.value, level.value))
  );
}

/** Throttles as near as this are one. */
const ROUNDING = 1e-9;

function tooFast(craft: PitchCraft, pitch: number, { speed, throttle, loads }: Level) {
  if (throttle <= 1 + ROUNDING) return undefined;
  const full = loadsOn(craft, { throttle: 1, vector: null }, flightAt(speed, pitch, pitch));
  return infeasible(
    `Level flight at ${say(speed, 'speed')} takes ${say(thrustOf(loads), 'force')} of thrust; the thrusters give ${say(thrustOf(full), 'force')} there.`,
    'Fly slower, or fit more thrust or a higher pitch speed.',
  );
}

const thrustOf = ({ pushes }: Loads): number => pushes.reduce((sum, { thrust }) => sum + thrust, 0);

export const FARTHEST = Math.PI / 6;
const STEP = Math.PI / 180;

/** Pitch of the craft afloat, heel left out, rad. */
export function floatingOf({ tailHeavy, pendulum }: PitchCraft): Outcome<number> {
  const pitch = Math.atan2(tailHeavy, pendulum);
  if (tailHeavy === 0 && pendulum === 0)
    return infeasible(
      'CG and CB are one point, so the craft has no attitude of its own.',
      'Hang something lower.',
    );
  if (Math.abs(pitch) <= FARTHEST) return solved(pitch);
  return infeasible(
    `At rest the craft floats at ${say(pitch, 'angle')} from level, too steep to fly.`,
    'Balance it first.',
  );
}

function balanceFrom(craft: PitchCraft, asked: CruiseAsked, floating: number): Outcome<number> {
  let trouble: Outcome<Level> | null = null;
  const moment = (pitch: number): number => {
    const level = levelAt(craft, asked, pitch);
    if (level.status === 'solved') return level.value.loads.moment;
    trouble ??= level;
    return Number.NaN;
  };
  let pitch = floating;
  let here = moment(pitch);
  const way = Math.sign(here);
  while (here * way > 0 && Math.abs(pitch) < FARTHEST) {
    const next = Math.min(Math.max(pitch + way * STEP, -FARTHEST), FARTHEST);
    const there = moment(next);
    if (there * way <= 0) {
      const root = findRoot(moment, pitch, next);
      return trouble ?? root;
    }
    [pitch, here] = [next, there];
  }
  if (trouble) return trouble;
  return here === 0 ? solved(pitch) : noBalance(craft, asked, floating);
}

function noBalance(craft: PitchCraft, asked: CruiseAsked, floating: number): Outcome<never> {
  const level = levelAt(craft, asked, floating);
  if (level.status === 'infeasible') return level;
  const { speed, loads } = level.value;
  return (
    notHeld(craft, speed) ??
    infeasible(
      `At ${say(speed, 'speed')} a moment of ${say(loads.moment, 'torque')} (+ nose-up) is left in the attitude in which the craft floats, and no attitude within ${say(FARTHEST, 'angle')} of level balances it.`,
      'Bring the line of thrust nearer to the CB, fly slower or hang weight lower.',
    )
  );
}

/**
 * Why the nose is held at no attitude that would be searched, told before the search. Level flight is slower the further
 * the hull stands from the path, so it is slowest at one of the ends.
 */
function neverHeld(craft: PitchCraft, asked: CruiseAsked, floating: number) {
  const levels = [floating, FARTHEST, -FARTHEST].map((pitch) => levelAt(craft, asked, pitch));
  const speeds = levels.flatMap((level) => (level.status === 'solved' ? level.value.speed : []));
  if (speeds.length < levels.length || !notHeld(craft, Math.min(...speeds))) return undefined;
  return notHeld(craft, speeds[0]!);
}

/** Why the nose is not held at a speed, or nothing when it is. */
function notHeld(craft: PitchCraft, speed: number) {
  const critical = criticalOf(craft);
  if (critical.status === 'infeasible') return critical;
  const most = critical.value.speed;
  if (most === null || speed < most) return undefined;
  const holding = critical.value.fins > 0 ? 'pendulum and fins' : 'the pendulum';
  return infeasible(
    `At ${say(speed, 'speed')} the Munk moment overcomes ${holding} (from ${say(most, 'speed')} on), so no attitude near level is held.`,
    'Fly slower, hang weight lower, or fit larger fins further aft.',
  );
}

function found(
  craft: PitchCraft,
  floating: number,
  pitch: number,
  { speed, throttle, loads }: Level,
): Cruise {
  const { forward, up, terms } = loads;
  return {
    pitch,
    floating,
    speed,
    throttle: Math.min(throttle, 1),
    thrust: thrustOf(loads),
    rising: forward * Math.sin(pitch) + up * Math.cos(pitch) - craft.heaviness,
    terms,
    cautions: flightCautions(craft, speed, pitch),
  };
}

/** Beyond this fins begin to stall (common practice, no source). */
const STEEP = (15 * Math.PI) / 180;

export const flightCautions = (craft: PitchCraft, speed: number, attack: number): string[] => [
  ...craft.drag.cautions(speed),
  ...(speed > 0 && Math.abs(Math.sin(attack)) > Math.sin(STEEP)
    ? [
        `The air meets the hull at ${say(attack, 'angle')}: beyond about ${say(STEEP, 'angle')} fins stall, and these figures are a rough guess.`,
      ]
    : []),
];
