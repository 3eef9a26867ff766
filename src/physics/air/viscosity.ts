/**
 * Viscosity of air by Sutherland's formula.
 *
 *   μ = β T^{3/2}/(T + S),  β = 1.458e-6 kg/(s·m·√K), S = 110.4 K;   ν = μ/ρ
 *
 * T in K, μ in Pa·s, ν in m²/s. Moisture is left out: it changes μ by less than 1 % on any day people fly.
 * Source: U.S. Standard Atmosphere, 1976, NOAA-S/T 76-1562, eq. 51.
 */

/** Dynamic viscosity, Pa·s, at a temperature, K. */
export const airViscosity = (temperature: number): number =>
  (1.458e-6 * temperature ** 1.5) / (temperature + 110.4);

/** Kinematic viscosity, m²/s, of air at a temperature, K, and a density, kg/m³. */
export const kinematicViscosity = ({
  temperature,
  density,
}: {
  temperature: number;
  density: number;
}): number => airViscosity(temperature) / density;
