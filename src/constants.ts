/** Constants of nature and of definition, each with its source. */

/** Molar gas constant, J mol⁻¹ K⁻¹, exact: N_A k. CODATA 2022; SI Brochure, 9th ed. (2019). */
export const gasConstant = 8.31446261815324;

/** 0 °C in kelvin, exact. SI Brochure, 9th ed. (2019), 2.3.1. */
export const celsiusZero = 273.15;

/** Standard atmosphere, Pa, exact. 10th CGPM (1954), Resolution 4. */
export const standardAtmosphere = 101325;

/** Standard acceleration of free fall, m s⁻², exact. 3rd CGPM (1901). */
export const standardGravity = 9.80665;
