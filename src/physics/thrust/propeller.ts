/**
 * Propellers by momentum theory.
 *
 *   at rest      P = √(T³/(2ρA)) / FM,  so  T = (P · FM · √(2ρA))^(2/3);   A = π d²/4 for each propeller
 *   advancing    P = T (V + v) / FM,  v = −V/2 + √(V²/4 + T/(2ρA))
 *
 * P shaft power, W; T thrust, N; ρ air density, kg/m³; V speed of advance, m/s; FM figure of merit, 1 for the ideal.
 * Source: Rankine and Froude's momentum theory, as in any text on propellers.
 */

/** m² */
export const discArea = (diameter: number): number => (Math.PI * diameter * diameter) / 4;

/** N, of one propeller. */
export const staticThrustOf = (
  shaftPower: number,
  figureOfMerit: number,
  diameter: number,
  density: number,
): number => Math.cbrt((shaftPower * figureOfMerit) ** 2 * 2 * density * discArea(diameter));

/** W, of an ideal propeller (or several sharing thrust and area) that gives `thrust` ≥ 0 at an advance ≥ 0. */
export function idealPower(thrust: number, area: number, density: number, advance = 0): number {
  const half = advance / 2;
  return thrust * (half + Math.sqrt(half * half + thrust / (2 * density * area)));
}
