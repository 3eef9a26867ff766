/**
 * What a propeller's inflow does for its thrust per watt, by ideal momentum theory with advance.
 *
 *   P = T (V + v),  v = −V/2 + √(V²/4 + T/(2ρA))
 *
 * T thrust, N; V speed of the air coming to the disc, m/s; v what the disc adds in its own plane; A disc area, m²; ρ
 * density, kg/m³; P power, W. Source: W. J. M. Rankine 1865, R. E. Froude 1889; H. Glauert, Airplane Propellers, in
 * Durand, Aerodynamic Theory IV (1935; from memory).
 */

/** Least power for a thrust, W; thrust and inflow ≥ 0. */
export function idealPower(thrust: number, discArea: number, density: number, inflow: number): number {
  const half = inflow / 2;
  return thrust * (half + Math.sqrt(half * half + thrust / (2 * density * discArea)));
}

/** T/(ρA), m²/s², below which a disc is as good as unloaded: both powers are nil, their ratio is not. */
const LEAST_LOAD = 1e-9;

/**
 * Thrust per watt at an inflow of `ratio` times the speed U, over thrust per watt in free air at U, for the same
 * thrust: 1.08 means 8 % more thrust per watt. At rest it is 1. Air coming from behind counts as still.
 */
export function powerAgainstFree(
  thrust: number,
  discArea: number,
  density: number,
  speed: number,
  ratio: number,
): number {
  const load = Math.max(thrust, LEAST_LOAD * density * discArea);
  const free = idealPower(load, discArea, density, speed);
  return free / idealPower(load, discArea, density, Math.max(0, ratio) * speed);
}
