/**
 * The figures a part starts from until the builder gives better ones.
 *
 *   thruster  diameter the larger of width and height of its box; static thrust 35 N on each m² of disc; pitch speed 8 m/s
 *   fin       as large as its box seen from the side
 *
 * 35 N/m² and 8 m/s: the middle of what small electric propellers do; common practice, no source.
 */
import type { Part } from './schema.ts';
import type { FinData, ThrusterData, Vectoring } from './thrustSchema.ts';

type Box = Part['size'];

/** Points straight ahead and does not turn. */
export const STRAIGHT: Vectoring = { least: 0, most: 0, set: 0, slew: 0 };

const DISC_LOADING = 35;
const PITCH_SPEED = 8;
/** Of a part whose box says nothing, m. */
const DIAMETER = 0.1;

export function firstThruster({ width, height }: Pick<Box, 'width' | 'height'>): ThrusterData {
  const diameter = within(Math.max(width, height) || DIAMETER, 0.005, 10);
  const staticThrust = Math.min((DISC_LOADING * Math.PI * diameter * diameter) / 4, 1000);
  return fixedThruster({
    thrust: { kind: 'measured', staticThrust: Number(staticThrust.toPrecision(2)) },
    diameter,
    pitchSpeed: { kind: 'given', speed: PITCH_SPEED },
    reverse: 0,
  });
}

/** A thruster with those figures that points straight ahead. */
export const fixedThruster = (
  figures: Omit<ThrusterData, 'yaw' | 'pitch' | 'differential'>,
): ThrusterData => ({ ...figures, yaw: { ...STRAIGHT }, pitch: { ...STRAIGHT }, differential: false });

/** Null where the box has no side. */
export function finOfBox({ length, height }: Pick<Box, 'length' | 'height'>): FinData | null {
  if (!(length > 0) || !(height > 0)) return null;
  return {
    area: rounded(Math.min(length * height, 100)),
    aspectRatio: rounded(within(height / length, 0.05, 20)),
  };
}

/** Whether a fin is as large as its box. */
export function isBoxed({ area, aspectRatio }: FinData, box: Pick<Box, 'length' | 'height'>): boolean {
  const boxed = finOfBox(box);
  return boxed?.area === area && boxed.aspectRatio === aspectRatio;
}

const within = (value: number, low: number, high: number): number => Math.min(Math.max(value, low), high);
const rounded = (value: number): number => Math.round(value * 1e6) / 1e6;
