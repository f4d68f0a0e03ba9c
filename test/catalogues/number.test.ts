import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { isDecimalComma, whyNotANumber } from '@/src/catalogues/not-a-number';
import { parseNumber } from '@/src/catalogues/number';

describe('numbers in cells', () => {
  test('every finite double reads back to the same bits', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => parseNumber(String(value)) === value),
    );
  });

  test('every finite double written with a Fortran D exponent reads back to the same bits', () => {
    fc.assert(
      fc.property(
        fc.double({ noNaN: true, noDefaultInfinity: true }),
        (value) => parseNumber(value.toExponential().replace('e', 'D')) === value,
      ),
    );
  });

  test.each([
    ['1.2D-3', 0.0012],
    ['.5', 0.5],
    ['5.', 5],
    ['+2e3', 2000],
    [' 7 ', 7],
  ])('%s is %d', (cell, value) => expect(parseNumber(cell)).toBe(value));

  test.each([
    '',
    ' ',
    '0x10',
    '1e',
    '1e400',
    '1e-400',
    '1_000',
    '1,5',
    'NaN',
    'Infinity',
    '1 2',
    '--1',
    '1.2.3',
    'true',
    '\u0661',
  ])('"%s" is not a number', (cell) => expect(parseNumber(cell)).toBeNaN());

  test('whatever is read as a number is one for the language too', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom(...'0123456789.+-eEdD,x '.split('')), maxLength: 8 }), (cell) => {
        const value = parseNumber(cell);
        return Number.isNaN(value) || value === Number(cell.replace(/d/i, 'e'));
      }),
    );
  });

  test.each([
    ['0,5', 'decimal comma: write 0.5'],
    ['NaN', 'is NaN'],
    ['-inf', 'is infinite'],
    ['-', 'missing value'],
    ['n.a.', 'missing value'],
    ['<0.5', 'is a limit'],
    ['1 000', 'thousands separators'],
    ['1,234.5', 'thousands separators'],
    ['0.5 um', 'put the unit in the header'],
    ['5 %', 'percentage'],
    ['0.5\u00b10.1', 'value and its error'],
    ['\u22125', 'typographic minus'],
    ['1e400', 'too large'],
    ['1e-400', 'too small'],
    ['abc', 'is not a number'],
  ])('%s is refused with a reason of its own', (cell, reason) => expect(whyNotANumber(cell)).toContain(reason));

  test('only digits, one comma and digits are a decimal comma', () => {
    expect(['0,5', ' 12,75 ', '-1,5e3'].every(isDecimalComma)).toBe(true);
    expect(['0.5', 'a,b', '1,2,3', ',5', ''].some(isDecimalComma)).toBe(false);
  });
});
