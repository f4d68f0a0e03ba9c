import { describe, expect, test } from 'vitest';
import { columnMapping } from '@/src/catalogues/mapping';
import { readAwkward, readText } from './reading';

describe('reading a catalogue', () => {
  test('a mapping names columns and units that the header does not', async () => {
    const mapping = columnMapping.parse({
      d: { field: 'diameter', unit: 'nm' },
      rho: { field: 'density', unit: 'kg/m3' },
      kind: { field: 'material' },
    });
    const read = await readText('d;rho;kind\n1000;917;ice\n', { mapping });
    expect(read.grains[0]).toMatchObject({ radiusM: 5e-7, densityKgM3: 917, material: 'water_ice' });
    expect(read.delimiter).toBe(';');
  });

  test('a mapping overrules the header and can leave a column out', async () => {
    const mapping = columnMapping.parse({ radius_um: { field: 'diameter' }, label: { field: 'ignore' } });
    const read = await readText('label,radius_um,density_g_cm3,material\nx,1,1,ice\n', { mapping });
    expect(read.grains[0]).toMatchObject({ radiusM: 5e-7, label: null });
  });

  test('a mapping of a column that is not there, or without a unit, or with a wrong one, is refused', async () => {
    const text = 'size,density_g_cm3,material\n1,1,ice\n';
    await expect(readText(text, { mapping: { sizes: { field: 'radius', unit: 'um' } } })).rejects.toMatchObject({
      code: 'mapping',
    });
    await expect(readText(text, { mapping: { size: { field: 'radius' } } })).rejects.toMatchObject({
      code: 'unitMissing',
    });
    await expect(readText(text, { mapping: { size: { field: 'radius', unit: 'kg' } } })).rejects.toMatchObject({
      code: 'unitUnknown',
    });
    expect((await readText(text, { mapping: { size: { field: 'radius', unit: 'um' } } })).accepted).toBe(1);
  });

  test('the schema of a mapping knows its fields only', () => {
    expect(columnMapping.safeParse({ a: { field: 'colour' } }).success).toBe(false);
    expect(columnMapping.safeParse({ a: { field: 'radius', units: 'um' } }).success).toBe(false);
  });

  test('defaults fill what the file does not say, cell by cell', async () => {
    const defaults = { densityGCm3: 2, material: 'ice' };
    const read = await readText('radius_um,density_g_cm3,material\n1,,\n1,3,troilite\n', { defaults });
    expect(read.grains.map(({ densityKgM3, material }) => [densityKgM3, material])).toEqual([
      [2000, 'water_ice'],
      [3000, 'troilite'],
    ]);
    expect((await readText('radius_um\n1\n', { defaults })).accepted).toBe(1);
  });

  test('without a density column and without a default the file is refused: no density is guessed', async () => {
    await expect(readAwkward('missing-density-column.csv')).rejects.toMatchObject({ code: 'densityMissing' });
  });

  test('a mass and a density make a size: 10.47197551 pg of 2.5 g/cm3 are 1 um', async () => {
    const read = await readText(
      'mass_pg,mass_pg_sigma,density_g_cm3,material\n10.471975511965978,3.141592653589793,2.5,ice\n',
    );
    expect(read.grains[0].radiusM).toBeCloseTo(1e-6, 18);
    expect(read.grains[0].radiusSigmaM).toBeCloseTo(1e-7, 18);
  });

  test('errors travel with their column and its unit', async () => {
    const read = await readText(
      'diameter_nm,diameter_nm_sigma,density_kg_m3,density_kg_m3_sigma,material\n1000,200,2500,250,ice\n',
    );
    expect(read.grains[0]).toMatchObject({
      radiusM: 5e-7,
      radiusSigmaM: 1e-7,
      densityKgM3: 2500,
      densitySigmaKgM3: 250,
    });
  });

  test('an error column without its value column is ignored with a word', async () => {
    const read = await readText('radius_um,diameter_um_sigma,density_g_cm3,material\n1,0.1,1,ice\n');
    expect(read.grains[0].radiusSigmaM).toBeNull();
    expect(read.warnings).toEqual([expect.objectContaining({ code: 'errorWithoutValue' })]);
  });

  test('grains that are possible but odd are accepted and counted in warnings', async () => {
    const read = await readText(
      'radius_um,radius_um_sigma,density_g_cm3,material\n0.001,,1,ice\n2000,,1,ice\n1,,0.01,ice\n1,,19,ice\n1,8,1,ice\n1,7,1,ice\n',
    );
    expect(read.accepted).toBe(6);
    expect(read.warnings.map(({ code, message }) => [code, message.split(' ')[0]])).toEqual([
      ['smallGrains', '1'],
      ['largeGrains', '1'],
      ['oddDensities', '2'],
      ['wildErrors', '1'],
    ]);
  });
});
