/**
 * Density of moist air after CIPM-2007.
 *
 *   p_sv = 1 Pa · exp(A T² + B T + C + D/T)           saturation vapour pressure over water
 *   f    = α + β p + γ t²                             enhancement factor
 *   x_v  = h f p_sv / p                               mole fraction of vapour
 *   Z    = 1 − (p/T)[a₀ + a₁t + a₂t² + (b₀ + b₁t) x_v + (c₀ + c₁t) x_v²] + (p/T)²(d + e x_v²)
 *   ρ    = p M_a / (Z R T) · [1 − x_v (1 − M_v/M_a)]
 *
 * T in K, t = T − 273.15 in °C, p in Pa, h = relative humidity 0…1. Air with 400 ppm of CO₂.
 * Stated for 600–1100 hPa and 15–27 °C, with a relative uncertainty of 22 in a million. Beyond, from −40 to 50 °C and
 * 300 to 1100 hPa, it stays within 0.15 % of ideal-gas psychrometrics, most of that being the ideal gas's own error
 * (compared in the tests). Relative humidity is over water below freezing too, as the WMO has it.
 * Source: A. Picard, R. S. Davis, M. Gläser, K. Fujii, Revised formula for the density of moist air (CIPM-2007),
 * Metrologia 45 (2008) 149–155.
 */
import {
  ICE_POINT,
  MOLAR_GAS_CONSTANT_CIPM_2007,
  MOLAR_MASS_DRY_AIR,
  MOLAR_MASS_WATER,
} from '../../units/constants.ts';

const [A, B, C, D] = [1.2378847e-5, -1.9121316e-2, 33.93711047, -6.3431645e3];
const [ALPHA, BETA, GAMMA] = [1.00062, 3.14e-8, 5.6e-7];
const [A0, A1, A2] = [1.58123e-6, -2.9331e-8, 1.1043e-10];
const [B0, B1] = [5.707e-6, -2.051e-8];
const [C0, C1] = [1.9898e-4, -2.376e-6];
const [D0, E0] = [1.83e-11, -0.765e-8];

/** Density, kg/m³, from temperature (K), station pressure (Pa) and relative humidity (0…1). */
export function moistAirDensity(temperature: number, pressure: number, humidity: number): number {
  const vapour = vapourFraction(temperature, pressure, humidity);
  const dry =
    (pressure * MOLAR_MASS_DRY_AIR) /
    (compressibility(temperature, pressure, vapour) * MOLAR_GAS_CONSTANT_CIPM_2007 * temperature);
  return dry * (1 - vapour * (1 - MOLAR_MASS_WATER / MOLAR_MASS_DRY_AIR));
}

/** Saturation vapour pressure over water, Pa, at a temperature, K. */
export const saturationPressure = (temperature: number): number =>
  Math.exp(A * temperature ** 2 + B * temperature + C + D / temperature);

/** How much more vapour air holds than empty space does: a factor near 1.004. */
export const enhancementFactor = (temperature: number, pressure: number): number =>
  ALPHA + BETA * pressure + GAMMA * (temperature - ICE_POINT) ** 2;

/** Mole fraction of water vapour, 0…1: hot thin air cannot hold more vapour than there is pressure. */
export const vapourFraction = (temperature: number, pressure: number, humidity: number): number =>
  Math.min(
    1,
    (humidity * enhancementFactor(temperature, pressure) * saturationPressure(temperature)) / pressure,
  );

/** Z, near 1, from temperature (K), pressure (Pa) and mole fraction of vapour. */
export function compressibility(temperature: number, pressure: number, vapour: number): number {
  const t = temperature - ICE_POINT;
  const ratio = pressure / temperature;
  const first = A0 + A1 * t + A2 * t ** 2 + (B0 + B1 * t) * vapour + (C0 + C1 * t) * vapour ** 2;
  return 1 - ratio * first + ratio ** 2 * (D0 + E0 * vapour ** 2);
}

/** What to say when the day lies outside the range for which the formula is stated; none inside it. */
export function moistAirCautions(temperature: number, pressure: number): string[] {
  const cautions: string[] = [];
  const t = temperature - ICE_POINT;
  if (t < 15 || t > 27) {
    cautions.push(
      'The air formula is stated for 15 to 27 °C (59 to 81 °F); outside it the density is less sure.',
    );
  }
  if (pressure < 60_000 || pressure > 110_000) {
    cautions.push(
      'The air formula is stated for 600 to 1100 hPa (17.7 to 32.5 inHg); outside it the density is less sure.',
    );
  }
  return cautions;
}
