/** Constants of nature and of convention, SI, each with its source. */

/** Standard acceleration of free fall, m/s². 3rd CGPM, 1901; exact by convention. */
export const STANDARD_GRAVITY = 9.80665;

/** Molar gas constant, J/(mol·K). CODATA 2018, exact since the SI of 2019. For the lifting gas. */
export const MOLAR_GAS_CONSTANT = 8.314462618;

/**
 * The same as CIPM-2007 fixes it, from CODATA 2006, J/(mol·K): Picard et al., Metrologia 45 (2008). For moist air
 * only, whose other constants were fitted with it; 1.1 parts in a million more. (The US Standard Atmosphere has a
 * third value, kept in its file for the same reason.)
 */
export const MOLAR_GAS_CONSTANT_CIPM_2007 = 8.314472;

/** Molar mass of helium, kg/mol. IUPAC standard atomic weight 4.002602. */
export const MOLAR_MASS_HELIUM = 4.002602e-3;

/** Molar mass of hydrogen, H₂, kg/mol. Twice the IUPAC atomic weight 1.00794 (from memory). */
export const MOLAR_MASS_HYDROGEN = 2.01588e-3;

/** Molar mass of dry air with 400 ppm of CO₂, kg/mol. CIPM-2007: Picard et al. 2008, table 1. */
export const MOLAR_MASS_DRY_AIR = 28.96546e-3;

/** Molar mass of water, kg/mol. CIPM-2007: Picard et al. 2008. */
export const MOLAR_MASS_WATER = 18.01528e-3;

/** 0 °C in K; exact. */
export const ICE_POINT = 273.15;

/** Standard atmosphere, Pa. 10th CGPM, 1954; exact. */
export const STANDARD_PRESSURE = 101325;
