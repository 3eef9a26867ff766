/**
 * The lifting gas: an ideal mixture of helium or hydrogen with dry air.
 *
 *   M = y M_lift + (1 − y) M_air        y: purity, the share of lifting gas by volume (for ideal gases, by mole)
 *   ρ = (p + p_g) M / (R (T + ΔT))      p, T of the air outside; p_g gauge pressure, Pa; ΔT superheat, K
 *
 * Ideal: at blimp pressures helium departs from it by 0.05 %, which changes the lift by 0.01 %.
 * Source: ideal-gas law and Dalton's law; constants in units/constants.ts.
 */
import type { Gas } from '../../craft/schema.ts';
import {
  MOLAR_GAS_CONSTANT,
  MOLAR_MASS_DRY_AIR,
  MOLAR_MASS_HELIUM,
  MOLAR_MASS_HYDROGEN,
} from '../../units/constants.ts';

const LIFTING_MOLAR_MASS = { helium: MOLAR_MASS_HELIUM, hydrogen: MOLAR_MASS_HYDROGEN } as const;

/** Mean molar mass of the gas, kg/mol. */
export const gasMolarMass = ({ lifting, purity }: Pick<Gas, 'lifting' | 'purity'>): number =>
  purity * LIFTING_MOLAR_MASS[lifting] + (1 - purity) * MOLAR_MASS_DRY_AIR;

/** Density of the gas, kg/m³, in a hull surrounded by air of the given temperature (K) and pressure (Pa). */
export const gasDensity = (
  gas: Gas,
  air: { readonly temperature: number; readonly pressure: number },
): number =>
  ((air.pressure + gas.gaugePressure) * gasMolarMass(gas)) /
  (MOLAR_GAS_CONSTANT * (air.temperature + gas.superheat));
