/** The sentence that ends every message about a header that was not understood. */
export const understoodNames =
  'Understood are: label, radius_um or diameter_um (also _nm, _mm, _cm, _m), mass_g (also _kg, _mg, _ug, _ng, _pg, _fg), ' +
  'density_g_cm3 or density_kg_m3, material, count, and any of the measured ones with _sigma for its one-sigma error.';
