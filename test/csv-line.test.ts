import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, test } from 'vitest';
import { csvLine } from '@/src/csv-line';
import { rejectsCsvHeader, rejectToCsvLine } from '@/src/catalogues/rejects-csv';

describe('lines of CSV that we write', () => {
  test.each(['=1+1', '+cmd|x', '-2+3+cmd|x', '-cmd', '@a', '\tx', '\r=1', '=1\nx', '\uff1d1+1'])(
    'text that a spreadsheet would run is disarmed: %j',
    (text) => expect(csvLine([text])).toMatch(/^"?'/),
  );

  test.each(['-1.5', '-1e-3', '+5', '-.5', 'plain', "it's"])(
    'text that is a number or harmless stays as it is: %s',
    (text) => expect(csvLine([text])).toBe(`${text}\r\n`),
  );

  test('numbers read back to the same bits', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ noNaN: true, noDefaultInfinity: true }), { minLength: 1, maxLength: 5 }),
        (values) => {
          const [row] = Papa.parse<string[]>(csvLine(values), { delimiter: ',' }).data;
          return values.every((value, index) => Number(row[index]) === value);
        },
      ),
    );
  });

  test('text that is no formula reads back as it was, whatever quotes, commas and line breaks it holds', () => {
    const harmless = fc.string({ unit: fc.constantFrom(...'ab",;\n\r 1='.split('')) }).map((text) => `a${text}`);
    fc.assert(
      fc.property(fc.array(harmless, { minLength: 1, maxLength: 4 }), (values) => {
        const [row] = Papa.parse<string[]>(csvLine(values), { delimiter: ',', newline: '\r\n' }).data;
        expect(row).toEqual(values);
      }),
    );
  });

  test('NaN and infinity are a broken promise, null is an empty cell', () => {
    expect(() => csvLine([NaN])).toThrow('null');
    expect(() => csvLine([Infinity])).toThrow('null');
    expect(csvLine([null, true, 1])).toBe(',true,1\r\n');
  });

  test('a reject names line, column, value, reason and the row', () => {
    expect(rejectsCsvHeader).toBe('line,column,value,reason,row\r\n');
    expect(
      rejectToCsvLine({ line: 7, column: 'radius_um', value: '=1+1', reason: 'is not a number', raw: 'a,=1+1' }),
    ).toBe('7,radius_um,\'=1+1,is not a number,"a,=1+1"\r\n');
  });
});
