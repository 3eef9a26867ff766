/**
 * Speed and throttle of level flight at a pitch: the angle of attack is the pitch, and along the path
 *
 *   F_a cos θ − F_h sin θ = 0
 *
 * with thrust and air of pitchMoments.ts. Height is held: what is left of forces up and down, weight and lift counted, is
 * taken to act at the CB and straight down, so that it has no part in this and none in the moment.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import { say } from '../../units/sentence.ts';
import type { AheadHelm } from '../thrust/ahead.ts';
import type { PitchCraft } from './pitchCraft.ts';
import { flightAt, type Loads, loadsOn } from './pitchMoments.ts';

/** Throttle of the thrusters, 0 … 1, or the speed to be flown, m/s. */
export type CruiseAsked = { readonly throttle: number } | { readonly speed: number };

export interface Level {
  /** m/s */
  readonly speed: number;
  /** Above 1 where full throttle is not enough for the speed asked for. */
  readonly throttle: number;
  readonly loads: Loads;
}

export function levelAt(craft: PitchCraft, asked: CruiseAsked, pitch: number): Outcome<Level> {
  const along = (speed: number, throttle: number): number => {
    const { forward, up } = loadsOn(craft, helmAt(throttle), flightAt(speed, pitch, pitch));
    return forward * Math.cos(pitch) - up * Math.sin(pitch);
  };
  if ('speed' in asked) {
    const throttle = throttleFor((share) => along(asked.speed, share), asked.speed);
    return throttle.status === 'solved' ? solved(levelOf(asked.speed, throttle.value)) : throttle;
  }
  const speed = speedFor((fast) => along(fast, asked.throttle), asked.throttle);
  return speed.status === 'solved' ? solved(levelOf(speed.value, asked.throttle)) : speed;

  function levelOf(speed: number, throttle: number): Level {
    return { speed, throttle, loads: loadsOn(craft, helmAt(throttle), flightAt(speed, pitch, pitch)) };
  }
}

const helmAt = (throttle: number): AheadHelm => ({ throttle, vector: null });

/** Of a thruster that is not pointed backwards this much is enough, however fast. */
const MOST_THROTTLE = 1e6;

function throttleFor(along: (throttle: number) => number, speed: number): Outcome<number> {
  if (speed === 0) return solved(0);
  let most = 1;
  while (along(most) < 0 && most < MOST_THROTTLE) most *= 4;
  return along(most) < 0 ? notAhead(along(1)) : findRoot(along, 0, most);
}

const notAhead = (thrust: number) =>
  infeasible(
    `Along a level path thrust less drag is ${say(thrust, 'force')}, so the craft does not move ahead.`,
    'Turn the thrusters forward.',
  );

function speedFor(along: (speed: number) => number, throttle: number): Outcome<number> {
  if (throttle === 0) return solved(0);
  const atRest = along(0);
  if (!(atRest > 0)) return notAhead(atRest);
  let fast = 1;
  while (along(fast) > 0) fast *= 2;
  return findRoot(along, 0, fast, 1e-10);
}
