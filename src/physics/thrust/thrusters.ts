/**
 * The thrusters of a craft, one for each piece, with what each can do.
 *
 *   pitch speed  V_p = n · p:  n = ω/(2π · gear ratio) propeller turns a second at full throttle, p the pitch
 *   thrust  T = T₀ (s − √s V/V_p), between s T₀ (at rest, and when pushed backwards) and nil (from √s V_p on)
 *
 * T₀ static thrust at full throttle, N; s throttle: the share of T₀ it would give at rest, negative for backwards, when V
 * counts the other way; V the advance along the thruster's own axis, m/s. At full throttle a straight line from static
 * thrust to the pitch speed (common practice, no source); at part throttle the same propeller turning √s as fast, its
 * static thrust going with the square of its speed and its pitch speed with the speed. A propeller that the air drives
 * (beyond √s V_p) is taken to have no drag.
 */
import { listed } from '../../craft/craft.ts';
import type { PitchSpeed, Thrust, Vectoring } from '../../craft/thrustSchema.ts';
import type { Vec3 } from '../../numeric/vector.ts';
import type { CraftState } from '../craftState.ts';
import { staticThrustOf } from './propeller.ts';

export interface Thruster {
  readonly part: string;
  /** Which piece of the part, from 0. */
  readonly copy: number;
  readonly name: string;
  /** Middle of the disc: station, side, height, m. */
  readonly at: Vec3;
  /** N, at full throttle. */
  readonly staticThrust: number;
  /** m/s, at full throttle. */
  readonly pitchSpeed: number;
  /** m */
  readonly diameter: number;
  /** Ideal over shaft power at rest, where known. */
  readonly figureOfMerit: number | null;
  /** Greatest thrust backwards as a share of that forwards. */
  readonly reverse: number;
  readonly yaw: Vectoring;
  readonly pitch: Vectoring;
  /** Which way more thrust here than on its fellow yaws the craft: 1 on the port side (to starboard), −1 on the starboard side; 0 when they are not throttled apart. */
  readonly differ: -1 | 0 | 1;
}

export function thrustersOf({ craft, pieces, air }: CraftState): Thruster[] {
  return listed(craft.parts).flatMap((part) => {
    const { thruster } = part;
    if (!thruster) return [];
    const staticThrust = staticThrustOfData(thruster.thrust, thruster.diameter, air.density);
    return pieces[part.id]!.map(({ middle }, copy) => ({
      part: part.id,
      copy,
      name: part.name || part.kind,
      at: middle,
      staticThrust,
      pitchSpeed: pitchSpeedOf(thruster.pitchSpeed),
      diameter: thruster.diameter,
      figureOfMerit: thruster.thrust.kind === 'power' ? thruster.thrust.figureOfMerit : null,
      reverse: thruster.reverse,
      yaw: thruster.yaw,
      pitch: thruster.pitch,
      differ: thruster.differential && part.copies.kind === 'pair' ? sideOf(middle) : 0,
    }));
  });
}

const sideOf = ([, y]: Vec3): -1 | 0 | 1 => (y < 0 ? 1 : y > 0 ? -1 : 0);

/** N, at full throttle, in air of that density, kg/m³. */
export const staticThrustOfData = (thrust: Thrust, diameter: number, density: number): number =>
  thrust.kind === 'measured'
    ? thrust.staticThrust
    : staticThrustOf(thrust.shaftPower, thrust.figureOfMerit, diameter, density);

/** m/s */
export const pitchSpeedOf = (given: PitchSpeed): number =>
  given.kind === 'given' ? given.speed : (given.motorSpeed / (2 * Math.PI * given.gearRatio)) * given.pitch;

/** Thrust along the thruster's axis, N, + forward. `share` of full throttle, −reverse … 1; `advance` along its axis, m/s. */
export function thrustAt({ staticThrust, pitchSpeed }: Thruster, share: number, advance: number): number {
  const size = Math.abs(share);
  const along = Math.max(share < 0 ? -advance : advance, 0);
  const thrust = staticThrust * Math.max(size - Math.sqrt(size) * (along / pitchSpeed), 0);
  return share < 0 ? -thrust : thrust;
}
