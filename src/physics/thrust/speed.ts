/**
 * Speed straight ahead: where thrust meets drag.
 *
 *   Σ T(V) cos ε cos δ = D(u)
 *
 * with the thrust of ahead.ts and the drag of drag.ts, N, at a forward speed u, m/s, the hull along its path. What flying
 * at an angle of attack costs, and what heaviness does on a slope, is in cruise/.
 *
 * Power by propeller.ts, W: ideal, and at the shaft where every thruster's figure of merit is known. At little thrust the
 * shaft takes more than that: the drag of the blades themselves is left out of it.
 */
import { listed } from '../../craft/craft.ts';
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { findRoot } from '../../numeric/roots.ts';
import { say } from '../../units/sentence.ts';
import type { CraftState } from '../craftState.ts';
import { type AheadHelm, forwardThrust, pushOf } from './ahead.ts';
import { type Drag, dragOf } from './drag.ts';
import { discArea, idealPower } from './propeller.ts';
import { pitchSpeedOf, type Thruster, thrustersOf } from './thrusters.ts';

export const NO_THRUSTER = infeasible(
  'No part has the figures of a thruster.',
  'Give one its static thrust and its pitch speed.',
);

/** m/s at that throttle, 0 … 1, with each thruster's pitch vectoring as it is set. */
export function steadySpeed(state: CraftState, throttle: number): Outcome<number> {
  const thrusters = thrustersOf(state);
  if (thrusters.length === 0) return NO_THRUSTER;
  return speedOf(thrusters, dragOf(state), { throttle, vector: null });
}

/** The steady speed at full throttle, or at another. */
export const topSpeed = (state: CraftState, throttle = 1): Outcome<number> => steadySpeed(state, throttle);

export function speedOf(thrusters: readonly Thruster[], drag: Drag, helm: AheadHelm): Outcome<number> {
  if (helm.throttle === 0) return solved(0);
  const left = (u: number) => forwardThrust(thrusters, helm, u) - drag.at(u);
  const atRest = left(0);
  if (!(atRest > 0)) {
    return infeasible(
      `The thrust along the hull is ${say(atRest, 'force')} at rest, so the craft does not move ahead.`,
      'Turn the thrusters forward.',
    );
  }
  let fast = 1;
  while (left(fast) > 0) fast *= 2;
  return findRoot(left, 0, fast);
}

export interface SpeedPoint {
  /** m/s */
  readonly speed: number;
  /** N */
  readonly thrust: number;
  readonly drag: number;
  readonly hull: number;
  readonly fins: number;
  readonly pods: number;
  /** W; null where a figure of merit is not known. */
  readonly idealPower: number;
  readonly shaftPower: number | null;
}

export interface CurveOptions {
  /** Default 1. */
  readonly throttle?: number;
  /** Where it ends, m/s. Default: a fifth beyond the steady speed, or 1 m/s where there is none. */
  readonly fastest?: number;
  /** Points, both ends included, ≥ 2. Default 41. */
  readonly points?: number;
}

/** Thrust, drag and power from rest upward, at equal steps of speed. */
export function speedCurve(state: CraftState, options: CurveOptions = {}): SpeedPoint[] {
  const { throttle = 1, points = 41 } = options;
  const helm: AheadHelm = { throttle, vector: null };
  const thrusters = thrustersOf(state);
  const drag = dragOf(state);
  const steady = speedOf(thrusters, drag, helm);
  const fastest = options.fastest ?? 1.2 * ((steady.status === 'solved' && steady.value) || 1);
  return Array.from({ length: points }, (_, i) => {
    const speed = (fastest * i) / (points - 1);
    return {
      speed,
      thrust: forwardThrust(thrusters, helm, speed),
      drag: drag.at(speed),
      hull: drag.hull(speed),
      fins: drag.fins(speed),
      pods: drag.pods(speed),
      ...powerAt(thrusters, helm, speed, state.air.density),
    };
  });
}

/** W of all thrusters at a forward speed, each at its own thrust and advance. */
export function powerAt(
  thrusters: readonly Thruster[],
  helm: AheadHelm,
  speed: number,
  density: number,
): Pick<SpeedPoint, 'idealPower' | 'shaftPower'> {
  let ideal = 0;
  let shaft: number | null = 0;
  for (const thruster of thrusters) {
    const { thrust, advance } = pushOf(thruster, helm, speed, 0);
    const power = idealPower(thrust, discArea(thruster.diameter), density, Math.max(advance, 0));
    ideal += power;
    shaft = shaft === null || thruster.figureOfMerit === null ? null : shaft + power / thruster.figureOfMerit;
  }
  return { idealPower: ideal, shaftPower: shaft };
}

/** Common practice, no source, m/s. */
export const LEAST_PITCH_SPEED_OUTDOORS = 5;

/** One sentence for each part whose pitch speed is low for flying outdoors. */
export const pitchSpeedCautions = ({ craft }: CraftState): string[] =>
  listed(craft.parts).flatMap(({ thruster, name, kind }) => {
    if (!thruster) return [];
    const speed = pitchSpeedOf(thruster.pitchSpeed);
    if (speed >= LEAST_PITCH_SPEED_OUTDOORS) return [];
    return [
      `${name || kind}: the pitch speed is ${say(speed, 'speed')}; to fly outdoors it should be about ${say(LEAST_PITCH_SPEED_OUTDOORS, 'speed')} or more, for a wind as fast as that carries the craft away.`,
    ];
  });
