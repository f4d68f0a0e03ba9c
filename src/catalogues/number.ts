const strictNumber = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eEdD][+-]?\d+)?$/;
const nonZeroMantissa = /^[+-]?[0.]*[1-9]/;

/** The number a cell holds, Fortran D exponents included; NaN when it is not exactly one finite number. */
export function parseNumber(cell: string): number {
  const text = cell.trim();
  if (!strictNumber.test(text)) return NaN;
  let value = Number(text);
  if (Number.isNaN(value)) value = Number(text.replace(/[dD]/, 'e'));
  if (value === 0 && nonZeroMantissa.test(text)) return NaN;
  return Number.isFinite(value) ? value : NaN;
}

export const looksLikeNumber = (text: string): boolean => strictNumber.test(text);
export const isBelowSmallestNumber = (text: string): boolean =>
  nonZeroMantissa.test(text) && Number(text.replace(/[dD]/, 'e')) === 0;
