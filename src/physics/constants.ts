/** Speed of light in vacuum, m s-1. Exact (SI 2019). */
export const C = 299_792_458;
/** Planck constant, J s. Exact (SI 2019). */
export const H = 6.626_070_15e-34;
/** Boltzmann constant, J K-1. Exact (SI 2019). */
export const K_B = 1.380_649e-23;
/** Elementary charge, C. Exact (SI 2019). */
export const E_CHARGE = 1.602_176_634e-19;
/** Stefan-Boltzmann constant, W m-2 K-4: 2 pi^5 k^4 / (15 h^3 c^2), exact expression. */
export const SIGMA_SB = (2 * Math.PI ** 5 * K_B ** 4) / (15 * H ** 3 * C ** 2);
/** Vacuum permittivity, F m-1 (CODATA 2022, 14 in the last two digits). */
export const EPS0 = 8.854_187_8188e-12;
/** Newtonian constant, m3 kg-1 s-2 (CODATA 2022, 15 in the last two digits). Only to quote masses in kg, never in dynamics. */
export const G_NEWTON = 6.6743e-11;
/** Nominal solar mass parameter GM, m3 s-2 (IAU 2015 Resolution B3). */
export const GM_SUN = 1.327_124_4e20;
/** Nominal solar luminosity, W (IAU 2015 Resolution B3). */
export const L_SUN = 3.828e26;
/** Nominal solar radius, m (IAU 2015 Resolution B3). */
export const R_SUN = 6.957e8;
/** Nominal solar effective temperature, K (IAU 2015 Resolution B3). */
export const TEFF_SUN_K = 5772;
/** Astronomical unit, m. Exact (IAU 2012 Resolution B2). */
export const AU = 149_597_870_700;
/** Julian year, s (IAU). */
export const YEAR_S = 31_557_600;
/** Second radiation constant h c / k, m K (derived). */
export const C2 = (H * C) / K_B;
