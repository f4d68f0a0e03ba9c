import { describe, expect, test } from 'vitest';
import { previewCatalogue } from '@/src/catalogues/preview-catalogue';
import { fixtureBytes, knownMaterials } from './reading';

const preview = (bytes: Uint8Array, isWholeFile = true) => previewCatalogue(bytes, { knownMaterials, isWholeFile });

describe('a look at the beginning of a file', () => {
  test('shows columns as they are understood, and the first rows', () => {
    const seen = preview(fixtureBytes('collected-grains.csv').subarray(0, 4096), false);
    expect(seen.fault).toBeNull();
    expect(seen.columns.map(({ field, unit }) => [field, unit])).toEqual([
      ['label', null],
      ['diameter', 'um'],
      ['diameterSigma', 'um'],
      ['density', 'g_cm3'],
      ['densitySigma', 'g_cm3'],
      ['material', null],
    ]);
    expect(seen.rows).toHaveLength(20);
    expect(seen.rows[0][0]).toBe('HF-0001');
    expect(seen.problems).toEqual([]);
  });

  test('wherever the beginning ends, the row cut in half is no problem', () => {
    const bytes = fixtureBytes('awkward/quoted-line-breaks.csv');
    for (let length = 60; length < bytes.length; length++)
      expect(preview(bytes.subarray(0, length), false).fault ?? '', `${length} bytes`).not.toMatch(/quot/i);
  });

  test('a file without a unit shows its columns, what is the matter and the sentence', () => {
    const seen = preview(fixtureBytes('awkward/radius-without-unit.csv'));
    expect(seen.fault).toContain('say the unit');
    expect(seen.columns[1]).toMatchObject({ header: 'radius', field: 'radius', unit: null, problem: 'unitMissing' });
    expect(seen.rows).toEqual([['a', '0.5', '3.3', 'astrosil']]);
  });

  test('problems of rows are those of the full reading', () => {
    const seen = preview(fixtureBytes('awkward/not-positive.csv'));
    expect(seen.problems.map(({ line }) => line)).toEqual([2, 3, 4, 5]);
    expect(seen.accepted).toHaveLength(1);
  });

  test('what is not a table is said to be none', () => {
    expect(preview(fixtureBytes('awkward/picture.bin')).fault).toContain('PNG');
    expect(preview(new Uint8Array(0)).fault).toContain('empty');
  });
});
