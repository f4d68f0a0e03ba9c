import * as constants from '@/src/physics/constants';
import { DataTable } from '@/src/ui/data-table';

type Constant = { symbol: string; value: number; unit: string; source: string };

const shown: Constant[] = [
  { symbol: 'c', value: constants.C, unit: 'm/s', source: 'SI 2019, exact' },
  { symbol: 'h', value: constants.H, unit: 'J s', source: 'SI 2019, exact' },
  { symbol: 'k', value: constants.K_B, unit: 'J/K', source: 'SI 2019, exact' },
  { symbol: 'e', value: constants.E_CHARGE, unit: 'C', source: 'SI 2019, exact' },
  { symbol: 'σ', value: constants.SIGMA_SB, unit: 'W m⁻² K⁻⁴', source: '2π⁵k⁴/(15h³c²)' },
  { symbol: 'ε₀', value: constants.EPS0, unit: 'F/m', source: 'CODATA 2022' },
  { symbol: 'GM☉', value: constants.GM_SUN, unit: 'm³/s²', source: 'IAU 2015 Resolution B3, nominal' },
  { symbol: 'L☉', value: constants.L_SUN, unit: 'W', source: 'IAU 2015 Resolution B3, nominal' },
  { symbol: 'R☉', value: constants.R_SUN, unit: 'm', source: 'IAU 2015 Resolution B3, nominal' },
  { symbol: 'T☉', value: constants.TEFF_SUN_K, unit: 'K', source: 'IAU 2015 Resolution B3, nominal' },
  { symbol: 'au', value: constants.AU, unit: 'm', source: 'IAU 2012 Resolution B2, exact' },
  { symbol: 'yr', value: constants.YEAR_S, unit: 's', source: 'IAU, Julian year of 365.25 d' },
];

export function Constants() {
  return (
    <DataTable
      caption="Constants"
      minWidth="min-w-[34rem]"
      rows={shown}
      rowKey={({ symbol }) => symbol}
      columns={[
        { header: 'Symbol', show: ({ symbol }) => symbol },
        { header: 'Value', isNumber: true, show: ({ value }) => String(value) },
        { header: 'Unit', show: ({ unit }) => unit },
        { header: 'Source', show: ({ source }) => source },
      ]}
    />
  );
}
