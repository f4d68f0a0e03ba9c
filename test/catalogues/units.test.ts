import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { findUnit, fromSi, toSi, units, type Unit } from '@/src/catalogues/units';

const unit = (text: string, quantity: Unit['quantity']) => {
  const found = findUnit(text, quantity);
  if (!found) throw new Error(`no unit ${text}`);
  return found;
};

describe('units', () => {
  test.each([
    ['nm', 'length', 1e-9],
    ['um', 'length', 1e-6],
    ['mm', 'length', 1e-3],
    ['cm', 'length', 1e-2],
    ['m', 'length', 1],
    ['kg', 'mass', 1],
    ['g', 'mass', 1e-3],
    ['mg', 'mass', 1e-6],
    ['ug', 'mass', 1e-9],
    ['ng', 'mass', 1e-12],
    ['pg', 'mass', 1e-15],
    ['fg', 'mass', 1e-18],
    ['ag', 'mass', 1e-21],
    ['g_cm3', 'density', 1e3],
    ['kg_m3', 'density', 1],
  ] as const)('one %s of %s is %d in SI (prefixes of the SI brochure)', (symbol, quantity, si) => {
    expect(toSi(1, unit(symbol, quantity))).toBe(si);
  });

  test('a decimal number of micrometres becomes the nearest double to the decimal number of metres', () => {
    expect(toSi(0.3, unit('um', 'length'))).toBe(3e-7);
    expect(toSi(0.7, unit('um', 'length'))).toBe(7e-7);
    expect(toSi(123.456, unit('nm', 'length'))).toBe(123.456e-9);
  });

  test.each(['um', '\u00b5m', '\u03bcm', 'micron', 'Microns', 'micrometre', ' um '])(
    '%s is the micrometre',
    (spelling) => {
      expect(findUnit(spelling, 'length')?.symbol).toBe('um');
    },
  );

  test.each(['g/cm3', 'g cm-3', 'g cm^-3', 'g.cm**-3', 'g/cm\u00b3', 'g/cc', 'G_CM3', 'g cm\u207b\u00b3'])(
    '%s is g/cm3',
    (spelling) => {
      expect(findUnit(spelling, 'density')?.symbol).toBe('g_cm3');
    },
  );

  test('a unit of another quantity is not a unit of this one', () => {
    expect(findUnit('kg', 'length')).toBeNull();
    expect(findUnit('um', 'density')).toBeNull();
    expect(findUnit('constructor', 'length')).toBeNull();
  });

  test('to SI and back gives the number again within two roundings', () => {
    let worst = 0;
    fc.assert(
      fc.property(fc.constantFrom(...units), fc.double({ min: 1e-12, max: 1e12, noNaN: true }), (each, value) => {
        const error = Math.abs(fromSi(toSi(value, each), each) / value - 1);
        worst = Math.max(worst, error);
        return error <= 2 * Number.EPSILON;
      }),
    );
    console.log(`units round trip: worst relative error ${worst}`);
  });
});
