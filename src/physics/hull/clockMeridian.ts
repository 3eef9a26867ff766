/**
 * Points of the two-sheet round balloon seen from the hull axis, which crosses its axis of symmetry at the centre.
 *
 * A half plane through the hull axis at some clock angle has the direction (A, B): A along the axis of symmetry,
 * B across it, A² + B² = 1. Its point at angle ψ about the centre (0 toward the nose, π/2 broadside) has
 * cos γ = A sin ψ to the axis of symmetry; D(γ) is the distance to the profile (balloonProfile.ts), so
 *
 *   x = R − D cos ψ,  r = D sin ψ,  D′(γ) = (ζζ′ + ϱϱ′)/D · dφ/dγ,  dφ/dγ = −D/(ζ′ sin γ − ϱ′ cos γ)
 */
import { profileAngle, unitHeight, unitRise } from './balloonProfile.ts';
import { mirrored, type Stretch } from './meridian.ts';

export interface Direction {
  readonly along: number;
  readonly across: number;
}

/** Nose to tail along the skin at one clock angle, for a balloon of inflated radius `radius`. */
export function clockMeridian(radius: number, direction: Direction): Stretch[] {
  const fore: Stretch = {
    at: (t) => {
      const { r, dx, dr } = unitPoint((Math.PI / 2) * t, direction);
      const scale = (Math.PI / 2) * radius;
      return { r: radius * r, dx: scale * dx, dr: scale * dr };
    },
  };
  return [fore, mirrored(fore)];
}

function unitPoint(psi: number, { along, across }: Direction) {
  const sin = Math.sin(psi);
  const cos = Math.cos(psi);
  const cosGamma = along * sin;
  const sinGamma = Math.hypot(cos, across * sin);
  const phi = profileAngle(sinGamma, cosGamma);
  const zeta = unitHeight(phi);
  const rho = Math.cos(phi);
  const rise = unitRise(phi);
  const distance = Math.hypot(zeta, rho);
  const phiPerGamma = -distance / (rise * sinGamma + Math.sin(phi) * cosGamma);
  const perGamma = ((zeta * rise - rho * Math.sin(phi)) / distance) * phiPerGamma;
  const perPsi = (-perGamma * along * cos) / sinGamma;
  return {
    r: distance * sin,
    dx: distance * sin - perPsi * cos,
    dr: distance * cos + perPsi * sin,
  };
}

/**
 * Distance from the hull axis to the skin at `xi` from the centre, R = 1: where
 * B²ζ² + A²(ξ² − ϱ²) = 0, which rises with φ from the rim to ϱ = |ξ|. Newton, bisecting where it strays.
 */
export function unitRadius(xi: number, { along, across }: Direction): number {
  const inner = xi * xi;
  if (inner >= 1) return 0;
  let lo = 0;
  let hi = Math.acos(Math.abs(xi));
  let phi = hi;
  for (let pass = 0; pass < 60; pass += 1) {
    const zeta = across * unitHeight(phi);
    const excess = zeta * zeta + along * along * (inner - Math.cos(phi) ** 2);
    if (excess > 0) hi = phi;
    else lo = phi;
    const slope = 2 * zeta * across * unitRise(phi) + along * along * Math.sin(2 * phi);
    const newton = phi - excess / slope;
    const next = newton >= lo && newton <= hi ? newton : (lo + hi) / 2;
    if (Math.abs(next - phi) <= 4e-16) break;
    phi = next;
  }
  if (along >= across) return unitHeight(phi) / along;
  return Math.sqrt(Math.max(0, (Math.cos(phi) - Math.abs(xi)) * (Math.cos(phi) + Math.abs(xi)))) / across;
}
