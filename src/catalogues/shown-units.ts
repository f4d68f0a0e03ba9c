/** Shown with 15 digits: dividing by powers of ten would leave 0.09999999999999999 um where a file said 0.1. */
const tidy = (value: number): number => Number(value.toPrecision(15));

export const micrometres = (metres: number): number => tidy(metres * 1e6);
export const gramsPerCm3 = (kgPerM3: number): number => tidy(kgPerM3 / 1000);
