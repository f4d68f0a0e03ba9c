import * as constants from '@/src/physics/constants';
import { DataTable } from '@/src/ui/data-table';
import { exactText } from '@/src/ui/run-figures';

type Constant = { name: string; symbol: string; value: number; unit: string; source: string };

const shown: Constant[] = [
  { name: 'Speed of light', symbol: 'c', value: constants.C, unit: 'm/s', source: 'SI 2019, exact' },
  { name: 'Planck constant', symbol: 'h', value: constants.H, unit: 'J s', source: 'SI 2019, exact' },
  { name: 'Boltzmann constant', symbol: 'k', value: constants.K_B, unit: 'J/K', source: 'SI 2019, exact' },
  { name: 'Elementary charge', symbol: 'e', value: constants.E_CHARGE, unit: 'C', source: 'SI 2019, exact' },
  {
    name: 'Stefan-Boltzmann constant',
    symbol: 'σ',
    value: constants.SIGMA_SB,
    unit: 'W m⁻² K⁻⁴',
    source: '2π⁵k⁴/(15h³c²)',
  },
  { name: 'Vacuum permittivity', symbol: 'ε₀', value: constants.EPS0, unit: 'F/m', source: 'CODATA 2022' },
  {
    name: 'Gravity of the Sun',
    symbol: 'GM☉',
    value: constants.GM_SUN,
    unit: 'm³/s²',
    source: 'IAU 2015 Resolution B3, nominal',
  },
  {
    name: 'Luminosity of the Sun',
    symbol: 'L☉',
    value: constants.L_SUN,
    unit: 'W',
    source: 'IAU 2015 Resolution B3, nominal',
  },
  {
    name: 'Radius of the Sun',
    symbol: 'R☉',
    value: constants.R_SUN,
    unit: 'm',
    source: 'IAU 2015 Resolution B3, nominal',
  },
  {
    name: 'Effective temperature of the Sun',
    symbol: 'T☉',
    value: constants.TEFF_SUN_K,
    unit: 'K',
    source: 'IAU 2015 Resolution B3, nominal',
  },
  {
    name: 'Astronomical unit',
    symbol: 'au',
    value: constants.AU,
    unit: 'm',
    source: 'IAU 2012 Resolution B2, exact',
  },
  { name: 'Year', symbol: 'yr', value: constants.YEAR_S, unit: 's', source: 'IAU, Julian year of 365.25 d' },
];

/** As many as the longest of them has in its source: 149597870700. */
const figures = 12;

export function Constants() {
  return (
    <DataTable
      caption="Constants"
      minWidth="sm:min-w-[44rem]"
      rows={shown}
      rowKey={({ symbol }) => symbol}
      columns={[
        { header: 'Constant', show: ({ name }) => name },
        { header: 'Symbol', show: ({ symbol }) => <span className="font-serif text-base">{symbol}</span> },
        { header: 'Value', isNumber: true, show: ({ value }) => exactText(value, figures) },
        { header: 'Unit', show: ({ unit }) => unit },
        { header: 'Source', show: ({ source }) => source },
      ]}
    />
  );
}
