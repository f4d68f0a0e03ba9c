import { isBelowSmallestNumber, looksLikeNumber } from './number';

const decimalComma = /^[+-]?\d+,\d+(?:[eEdD][+-]?\d+)?$/;
const missingMarks = new Set([
  '-',
  '--',
  '---',
  'n.a.',
  'n/a',
  'na',
  '#n/a',
  'null',
  'none',
  'nil',
  '?',
  '...',
  '*',
  'missing',
  'nd',
  'n.d.',
]);

export const isDecimalComma = (cell: string): boolean => decimalComma.test(cell.trim());

/** Why parseNumber gave up, as the end of a sentence that begins with the cell. */
export function whyNotANumber(cell: string): string {
  const text = cell.trim();
  const lower = text.toLowerCase();
  if (isDecimalComma(text)) return `has a decimal comma: write ${text.replace(',', '.')}`;
  if (lower === 'nan' || lower === '+nan' || lower === '-nan')
    return 'is NaN, which is not a measurement: leave the row out';
  if (/^[+-]?(inf|infinity|\u221e)$/.test(lower)) return 'is infinite, which is not a measurement: leave the row out';
  if (missingMarks.has(lower))
    return 'marks a missing value: leave the cell empty if the column is optional, or leave the row out';
  if (/^[<>\u2264\u2265~\u2248]/.test(text)) return 'is a limit or an estimate, not a measurement: leave the row out';
  if (/^\u2212/.test(text)) return 'begins with a typographic minus sign: write -';
  if (looksLikeNumber(text)) {
    return isBelowSmallestNumber(text) ? 'is too small to be told from zero' : 'is too large for a number';
  }
  if (/^[+-]?\d{1,3}([,' \u00a0\u2009\u202f]\d{3})+(\.\d+)?$/.test(text))
    return 'has thousands separators: write the digits without them';
  if (/\u00b1|\+\/-/.test(text))
    return 'holds a value and its error: put the error in a column of its own, named with _sigma';
  if (/^[+-]?[\d.]+\s*%$/.test(text)) return 'is a percentage: write the value in the unit of the column';
  if (/^[+-]?[\d.]+(?:[eE][+-]?\d+)?\s*[a-z\u00b5\u03bc]/i.test(text))
    return 'is followed by letters: put the unit in the header and only the number in the cell';
  return 'is not a number';
}
