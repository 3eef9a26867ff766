/**
 * What is left when the throttle is cut: fins and air alone.
 *
 *   yaw moment per angle of slip β, β = v/u small:   Munk  −(k₂ − k₁)ρV u²,   fins  −½ρ u² Σ S a X cos²θ
 *
 * about the CB, N·m/rad: the first turns the nose away from the way the craft goes (negative), fins aft bring it back
 * (positive). The craft keeps its heading while it glides straight when small departures in v and r die out; yaw damping of
 * fins helps, so that it may even where Munk's moment is the greater. Airships often do not: with fins of the usual size
 * somebody has to steer.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import { finSlope } from '../thrust/fins.ts';
import { motionOf } from './motion.ts';
import { LONGEST, type Moment, type Sailed, sail, type Track, trackOf } from './sail.ts';
import { type Command, commandOf } from './steer.ts';
import type { TurningCraft } from './turningCraft.ts';

export interface Glide {
  /** From the moment at which the turn from cruise has reached 90°, if it does. */
  readonly after: Outcome<GlideAfter>;
  readonly stability: Stability;
  /** One sentence each. */
  readonly notes: readonly string[];
}

export interface GlideAfter {
  /** Until the yaw rate is half of what it was, s. */
  readonly halving: number;
  /** Yawed on until the yaw rate is a tenth of what it was, rad, ≥ 0, and how long that takes, s. */
  readonly angle: number;
  readonly time: number;
  readonly track: Track;
}

export interface Stability {
  /** At which it is reckoned, m/s; what keeps its heading at one speed does at any. */
  readonly speed: number;
  /** N·m/rad of slip, + brings the nose back. */
  readonly munk: number;
  readonly fins: number;
  readonly keepsHeading: boolean;
}

const SPEED_WITHOUT_CRUISE = 1;

/** Without thrust and straight ahead, at any speed. */
export const keepsHeading = (craft: TurningCraft): boolean =>
  diesOut(craft, cutCommand(craft), SPEED_WITHOUT_CRUISE);

const cutCommand = (craft: TurningCraft): Command =>
  commandOf(craft, { throttle: 0, steer: 0, vector: null });

export function glideOf(craft: TurningCraft, quarter: Outcome<Sailed>, cruiseSpeed: number): Glide {
  const cut = cutCommand(craft);
  const stability = stabilityOf(craft, cut, cruiseSpeed || SPEED_WITHOUT_CRUISE);
  return {
    after: quarter.status === 'solved' ? glideFrom(craft, quarter.value.end, cut) : quarter,
    stability,
    notes: [
      'With the throttle cut the thrusters give no control: the craft glides as fins and air will have it.',
      stability.keepsHeading
        ? 'Gliding straight, it keeps its heading.'
        : 'Gliding straight, it does not keep its heading: the Munk moment turns it broadside. Larger fins, further aft, would help.',
    ],
  };
}

function glideFrom(craft: TurningCraft, { state, angles }: Moment, cut: Command): Outcome<GlideAfter> {
  const rate = Math.abs(state[2]!);
  const way = Math.sign(state[2]!);
  const until = (share: number) =>
    sail(craft, { state, angles }, { ...cut, angles }, { event: (_, now) => share * rate - way * now[2]! });
  const [half, tenth] = [until(0.5), until(0.1)];
  if (half.status !== 'solved') return half;
  if (tenth.status !== 'solved') return tenth;
  const { trajectory } = tenth.value;
  if (!trajectory.stopped) {
    return infeasible(
      `${say(LONGEST, 'time')} after the throttle is cut it still yaws ${say(Math.abs(trajectory.last[2]!), 'yawRate')}.`,
    );
  }
  return solved({
    halving: half.value.trajectory.end,
    angle: way * (trajectory.last[5]! - state[5]!),
    time: trajectory.end,
    track: trackOf(craft, tenth.value),
  });
}

function stabilityOf(craft: TurningCraft, cut: Command, speed: number): Stability {
  const { mass, density, cb, fins } = craft;
  const square = speed * speed;
  return {
    speed,
    munk: -(mass.sway - mass.surge) * square,
    fins: fins.reduce((sum, { at, clock, area, aspectRatio }) => {
      const share = Math.cos(clock) ** 2;
      return sum + 0.5 * density * square * area * finSlope(aspectRatio) * share * (at[0] - cb);
    }, 0),
    keepsHeading: diesOut(craft, cut, speed),
  };
}

/** Whether small side speed and yaw rate die out at that speed ahead: of their 2 × 2 equations trace < 0 and determinant > 0. */
function diesOut(craft: TurningCraft, cut: Command, speed: number): boolean {
  const { slope } = motionOf(craft, cut);
  // In side speed and in yaw rate times hull length, so that both are of a size.
  const perSpeed = (v: number, r: number) => {
    const small = 1e-6 * speed;
    const rates = [1, -1].map((way) => {
      const into = new Float64Array(6);
      slope(0, Float64Array.of(speed, way * small * v, (way * small * r) / craft.length, 0, 0, 0), into);
      return into;
    });
    return [1, 2].map((i) => (rates[0]![i]! - rates[1]![i]!) / (2 * small));
  };
  const [vv, rv] = perSpeed(1, 0) as [number, number];
  const [vr, rr] = perSpeed(0, 1) as [number, number];
  return vv + rr * craft.length < 0 && vv * rr > vr * rv;
}
