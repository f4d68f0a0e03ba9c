import { describe, expect, test } from 'vitest';
import { readAwkward, readText } from './reading';

const reasons = async (name: string) =>
  (await readAwkward(name)).rejects.map(({ line, column, value, reason }) => [line, column, value, reason] as const);

describe('rows that are refused', () => {
  test('sizes and densities that are not positive', async () => {
    expect(await reasons('not-positive.csv')).toEqual([
      [2, 'radius_um', '-0.5', 'must be greater than zero'],
      [3, 'radius_um', '0', 'must be greater than zero'],
      [4, 'density_g_cm3', '0', 'must be greater than zero'],
      [5, 'density_g_cm3', '-1', 'must be greater than zero'],
    ]);
  });

  test('radii above 1 m, densities above 25 g/cm3, numbers beyond the range of doubles', async () => {
    const found = await reasons('too-much.csv');
    expect(found.map(([line]) => line)).toEqual([2, 3, 4, 5]);
    expect(found.map(([, , , reason]) => reason)).toEqual([
      expect.stringContaining('above 1 m'),
      expect.stringContaining('above 25 g/cm3'),
      expect.stringContaining('too large'),
      expect.stringContaining('too small'),
    ]);
  });

  test('cells that are not numbers, each with its reason', async () => {
    const found = await reasons('not-numbers.csv');
    expect(found).toHaveLength(12);
    expect(new Set(found.map(([, column]) => column))).toEqual(new Set(['radius_um']));
    expect(found.map(([line]) => line)).toEqual([2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13]);
    expect(new Set(found.map(([, , , reason]) => reason)).size).toBeGreaterThanOrEqual(10);
  });

  test('a decimal comma in one row of a file that is otherwise right', async () => {
    const read = await readAwkward('one-decimal-comma.csv');
    expect(read.accepted).toBe(1);
    expect(read.rejects).toEqual([
      expect.objectContaining({ line: 2, value: '0,5', reason: 'has a decimal comma: write 0.5' }),
    ]);
  });

  test('decimal commas between commas are a row of the wrong length', async () => {
    const read = await readAwkward('decimal-commas-between-commas.csv');
    expect(read.accepted).toBe(1);
    expect(read.rejects[0]).toMatchObject({
      line: 2,
      reason: expect.stringMatching(/5 cells where the header has 3.*0\.5 instead of 0,5/),
    });
  });

  test('rows with too few or too many cells', async () => {
    const read = await readAwkward('ragged.csv');
    expect(read.rejects.map(({ line, reason }) => [line, reason.slice(0, 45)])).toEqual([
      [2, 'the row has 3 cells where the header has 4'],
      [3, 'the row has 5 cells where the header has 4: i'],
    ]);
    expect(read.rejects[0].raw).toBe('a,0.5,3.3');
    expect(read.accepted).toBe(1);
  });

  test('errors below zero; an error of zero is none', async () => {
    const read = await readAwkward('negative-errors.csv');
    expect(read.rejects.map(({ line, column }) => [line, column])).toEqual([
      [2, 'radius_um_sigma'],
      [3, 'density_g_cm3_sigma'],
    ]);
    expect(read.grains[0]).toMatchObject({ radiusSigmaM: 0, densitySigmaKgM3: 0 });
  });

  test('counts must be positive and at most 1e15; an empty one is 1', async () => {
    const read = await readAwkward('counts.csv');
    expect(read.rejects.map(({ line }) => line)).toEqual([2, 3, 4]);
    expect(read.grains.map(({ count }) => count)).toEqual([2.5, 1]);
  });

  test('cells that are missing', async () => {
    const found = await reasons('missing-cells.csv');
    expect(found.map(([line, column]) => [line, column])).toEqual([
      [2, 'radius_um'],
      [3, 'density_g_cm3'],
      [4, 'material'],
    ]);
  });

  test('unknown materials, with the nearest known names', async () => {
    const found = await reasons('unknown-material.csv');
    expect(found[0].slice(0, 3)).toEqual([2, 'material', 'astrosyl']);
    expect(found[0][3]).toContain('nearest: astrosil');
    expect(found[1][3]).toContain('known: astrosil');
  });

  test('a row with three problems has three rejects and counts once', async () => {
    const read = await readText('radius_um,density_g_cm3,material\n-1,x,slime\n1,1,ice\n');
    expect(read.rejects.map(({ column }) => column)).toEqual(['radius_um', 'density_g_cm3', 'material']);
    expect([read.accepted, read.rejected]).toEqual([1, 1]);
  });
});
