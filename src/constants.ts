/** Constants of nature and of definition, each with its source. */

/** Molar gas constant, J mol⁻¹ K⁻¹, exact: N_A k. CODATA 2022; SI Brochure, 9th ed. (2019). */
export const gasConstant = 8.31446261815324;

/** 0 °C in kelvin, exact. SI Brochure, 9th ed. (2019), 2.3.1. */
export const celsiusZero = 273.15;

/** Standard atmosphere, Pa, exact. 10th CGPM (1954), Resolution 4. */
export const standardAtmosphere = 101325;

/** Standard acceleration of free fall, m s⁻², exact. 3rd CGPM (1901). */
export const standardGravity = 9.80665;

/** Avogadro constant, mol⁻¹, exact. CODATA 2022. */
export const avogadroConstant = 6.02214076e23;

/** Boltzmann constant, J/K, exact. CODATA 2022. */
export const boltzmannConstant = 1.380649e-23;

/** Planck constant, J s, exact. CODATA 2022. */
export const planckConstant = 6.62607015e-34;

/** Elementary charge, C, exact. CODATA 2022. */
export const elementaryCharge = 1.602176634e-19;

/** Vacuum electric permittivity, F/m. CODATA 2022: 8.854 187 8188(14) × 10⁻¹². */
export const vacuumPermittivity = 8.8541878188e-12;
