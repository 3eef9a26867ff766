/**
 * The speed from which the Munk moment overcomes pendulum and fins, about level.
 *
 *   dM/dθ = −g W h + (k₃ − k₁) ρV U² − ½ρU² Σ S a sin²φ (x_fin − x_B) = 0,  with α = θ (level flight)
 *   U² = g W h / [(k₃ − k₁) ρV − ½ρ Σ S a sin²φ (x_fin − x_B)];  never where the bracket is not above 0
 *
 * U in m/s; g W h pendulum, N·m; S, a, φ area, slope and clock angle of each fin (fins.ts), forward of the CB counted
 * against. Beyond that speed nothing holds the nose near level: the least disturbance swings it up or down. A real hull has
 * less than Munk's moment, and its fins gain more from its nearness than they lose in its wake, so the true speed is higher.
 * From the linear terms of pitchMoments.ts.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import type { CraftState } from '../craftState.ts';
import { finSlope } from '../thrust/fins.ts';
import { type PitchCraft, pitchCraftOf } from './pitchCraft.ts';

export interface Critical {
  /** m/s; null: never, the fins hold the nose at any speed. */
  readonly speed: number | null;
  /** N·m/rad nose-down that the pendulum gives at level. */
  readonly pendulum: number;
  /** N·m/rad for each (m/s)²: nose-up of Munk, nose-down of the fins. */
  readonly munk: number;
  readonly fins: number;
}

export const criticalSpeed = (state: CraftState): Outcome<Critical> => criticalOf(pitchCraftOf(state));

export function criticalOf(craft: PitchCraft): Outcome<Critical> {
  const { pendulum, munkMass: munk } = craft;
  if (!(pendulum > 0)) {
    return infeasible(
      `The CG is not below the CB: the pendulum tips the nose with ${say(-pendulum, 'torque')} for each radian, even at rest.`,
      'Hang something lower.',
    );
  }
  const fins = finStiffness(craft);
  const speed = Math.sqrt(pendulum / Math.max(munk - fins, 0));
  return solved({ speed: speed < FASTEST ? speed : null, pendulum, munk, fins });
}

/** Speeds beyond this are those of a moment that is nil to rounding, m/s. */
const FASTEST = 340;

const finStiffness = ({ fins, cb, density }: PitchCraft): number =>
  fins.reduce(
    (sum, { area, aspectRatio, clock, at }) =>
      sum + 0.5 * density * area * finSlope(aspectRatio) * Math.sin(clock) ** 2 * (at[0] - cb[0]),
    0,
  );
