/** The same thruster known another way, and what follows from its figures. */
import type { PitchSpeed, Thrust, ThrusterData } from '../craft/thrustSchema.ts';
import { discArea, idealPower } from '../physics/thrust/propeller.ts';
import { LEAST_PITCH_SPEED_OUTDOORS } from '../physics/thrust/speed.ts';
import { pitchSpeedOf, staticThrustOfData } from '../physics/thrust/thrusters.ts';
import { say } from '../units/sentence.ts';

/** Of a small propeller at rest, from memory. */
const FIGURE_OF_MERIT = 0.5;
/** Pitch of a propeller over its diameter, a first guess. */
const PITCH_SHARE = 0.6;

const tidy = (value: number): number => Number(value.toPrecision(6));
const within = (value: number, low: number, high: number): number => Math.min(Math.max(value, low), high);

/** Thrust at rest known that way, kept as it is. `density` of the air, kg/m³. */
export function thrustAs(kind: Thrust['kind'], { thrust, diameter }: ThrusterData, density: number): Thrust {
  if (kind === thrust.kind) return thrust;
  const staticThrust = staticThrustOfData(thrust, diameter, density);
  if (kind === 'measured') return { kind, staticThrust: within(tidy(staticThrust), 0, 1000) };
  const ideal = idealPower(staticThrust, discArea(diameter), density);
  return {
    kind,
    shaftPower: within(tidy(ideal / FIGURE_OF_MERIT), 0, 20_000),
    figureOfMerit: FIGURE_OF_MERIT,
  };
}

/** Pitch speed known that way, kept as it is. */
export function pitchSpeedAs(kind: PitchSpeed['kind'], { pitchSpeed, diameter }: ThrusterData): PitchSpeed {
  if (kind === pitchSpeed.kind) return pitchSpeed;
  const speed = pitchSpeedOf(pitchSpeed);
  if (kind === 'given') return { kind, speed: within(tidy(speed), 0.1, 200) };
  const pitch = within(tidy(PITCH_SHARE * diameter), 0.001, 5);
  const motorSpeed = within(tidy((2 * Math.PI * speed) / pitch), 1, 20_000);
  return { kind, motorSpeed, gearRatio: 1, pitch };
}

export interface ThrusterFacts {
  /** N, of one piece at full throttle. */
  readonly staticThrust: number;
  /** W: the least that any propeller of that diameter needs for it. */
  readonly idealPower: number;
  /** m/s */
  readonly pitchSpeed: number;
  /** What to mind; null for nothing. */
  readonly note: string | null;
}

/** `density` of the air, kg/m³. */
export function thrusterFacts(
  data: Pick<ThrusterData, 'thrust' | 'diameter' | 'pitchSpeed'>,
  density: number,
): ThrusterFacts {
  const staticThrust = staticThrustOfData(data.thrust, data.diameter, density);
  const pitchSpeed = pitchSpeedOf(data.pitchSpeed);
  return {
    staticThrust,
    idealPower: idealPower(staticThrust, discArea(data.diameter), density),
    pitchSpeed,
    note:
      pitchSpeed < LEAST_PITCH_SPEED_OUTDOORS
        ? `Below about ${say(LEAST_PITCH_SPEED_OUTDOORS, 'speed')} a pitch speed is low for outdoors: against wind too little thrust is left.`
        : null,
  };
}
