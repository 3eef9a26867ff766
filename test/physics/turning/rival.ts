/**
 * The motion of a craft worked out anew in another way, for a spheroid hull with thrusters and fins that do not move:
 * the impulse of craft and air in space, its moment about a fixed point, and the place; velocities follow from them.
 *
 *   Ṗ = F in space,  Ḣ = N + (x F_y − y F_x) in space;   (P, H) → ν by M⁻¹ at the craft's own heading
 *
 * Strips by the midpoint rule on the outline of the spheroid itself; added mass by Lamb's closed forms.
 */
import type { TurningCraft } from '../../../src/physics/turning/turningCraft.ts';

export interface RivalHull {
  readonly length: number;
  readonly diameter: number;
}

/** Lamb 1932, §§ 114, 373, as in the references: k₁, k₂, k′. */
export function lamb(f: number) {
  const e = Math.sqrt(1 - 1 / (f * f));
  const l = Math.log((1 + e) / (1 - e));
  const alpha = ((2 * (1 - e * e)) / e ** 3) * (l / 2 - e);
  const beta = 1 / (e * e) - ((1 - e * e) / (2 * e ** 3)) * l;
  const turn = (e ** 4 * (beta - alpha)) / ((2 - e * e) * (2 * e * e - (2 - e * e) * (beta - alpha)));
  return { k1: alpha / (2 - alpha), k2: beta / (2 - beta), turn };
}

export interface Bodies {
  /** Masses as points or with a moment of inertia about their own upright axis: ahead and to starboard of the CB. */
  readonly masses: readonly { mass: number; ahead: number; side: number; own: number }[];
  readonly gasDensity: number;
}

/** Slope of (P_x, P_y, H, x, y, ψ), and the start and the velocities for it. */
export function rivalOf(craft: TurningCraft, hull: RivalHull, bodies: Bodies, angle: number, eta: number) {
  const { length, diameter } = hull;
  const volume = (Math.PI / 6) * length * diameter ** 2;
  const air = craft.density * volume;
  const gas = bodies.gasDensity * volume;
  const own = ((length / 2) ** 2 + (diameter / 2) ** 2) / 5;
  const { k1, k2, turn } = lamb(length / diameter);
  let [m, mx, my, i] = [gas, 0, 0, gas * own + turn * air * own];
  for (const { mass, ahead, side, own: about } of bodies.masses) {
    m += mass;
    mx += mass * ahead;
    my += mass * side;
    i += about + mass * (ahead ** 2 + side ** 2);
  }
  const rows = [
    [m + k1 * air, 0, -my],
    [0, m + k2 * air, mx],
    [-my, mx, i],
  ];

  const momentum = (nu: readonly number[]) =>
    rows.map((row) => row.reduce((sum, a, k) => sum + a * nu[k]!, 0));

  /** ν from momentum in the craft's own axes, by Gauss–Jordan. */
  function velocity(p: readonly number[]): number[] {
    const a = rows.map((row, k) => [...row, p[k]!]);
    for (let k = 0; k < 3; k += 1) {
      const pivot = a[k]![k]!;
      a[k] = a[k]!.map((each) => each / pivot);
      for (let other = 0; other < 3; other += 1) {
        if (other === k) continue;
        const factor = a[other]![k]!;
        a[other] = a[other]!.map((each, c) => each - factor * a[k]![c]!);
      }
    }
    return a.map((row) => row[3]!);
  }

  function forces([u, v, r]: readonly number[]): [number, number, number] {
    let [x, y, n] = [-craft.drag.at(u!), 0, 0];
    const push = (ahead: number, side: number, fx: number, fy: number) => {
      x += fx;
      y += fy;
      n += ahead * fy - side * fx;
    };
    for (const { at, staticThrust, pitchSpeed } of craft.thrusters) {
      const [ahead, side] = [length / 2 - at[0], at[1]];
      const along = [Math.cos(angle), Math.sin(angle)] as const;
      const advance = (u! - r! * side) * along[0] + (v! + r! * ahead) * along[1];
      const thrust = staticThrust * Math.max(0, Math.min(1, 1 - advance / pitchSpeed));
      push(ahead, side, thrust * along[0], thrust * along[1]);
    }
    const strips = 4000;
    for (let k = 0; k < strips; k += 1) {
      const ahead = (-0.5 + (k + 0.5) / strips) * length;
      const height = diameter * Math.sqrt(1 - ((2 * ahead) / length) ** 2);
      const w = v! + r! * ahead;
      push(ahead, 0, 0, (-0.5 * craft.density * 1.2 * eta * height * w * Math.abs(w) * length) / strips);
    }
    for (const { at, clock, area, aspectRatio } of craft.fins) {
      const [ahead, side] = [length / 2 - at[0], at[1]];
      const w = (v! + r! * ahead) * Math.cos(clock);
      const forward = u! - r! * side;
      const slope = (2 * Math.PI * aspectRatio) / (2 + Math.sqrt(4 + aspectRatio ** 2));
      const force = -0.5 * craft.density * area * (slope * Math.abs(forward) * w + 1.2 * w * Math.abs(w));
      push(ahead, side, 0, force * Math.cos(clock));
    }
    return [x, y, n];
  }

  function velocityAt([px, py, h, x, y, heading]: readonly number[]): number[] {
    const [cos, sin] = [Math.cos(heading!), Math.sin(heading!)];
    return velocity([px! * cos + py! * sin, -px! * sin + py! * cos, h! - (x! * py! - y! * px!)]);
  }

  function slope(_: number, state: readonly number[]): number[] {
    const [, , , x, y, heading] = state;
    const nu = velocityAt(state);
    const [fx, fy, n] = forces(nu);
    const [cos, sin] = [Math.cos(heading!), Math.sin(heading!)];
    const [gx, gy] = [fx * cos - fy * sin, fx * sin + fy * cos];
    const [u, v, r] = nu as [number, number, number];
    return [gx, gy, n + x! * gy - y! * gx, u * cos - v * sin, u * sin + v * cos, r];
  }

  return { slope, velocityAt, start: (nu: readonly number[]) => [...momentum(nu), 0, 0, 0] };
}
