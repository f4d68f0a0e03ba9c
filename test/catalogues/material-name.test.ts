import { describe, expect, test } from 'vitest';
import { findMaterial, nearestNames, unknownMaterialReason } from '@/src/catalogues/material-name';
import { knownMaterials } from './reading';

describe('names of materials', () => {
  test.each([
    ['astrosil', 'astrosil'],
    [' AstroSil ', 'astrosil'],
    ['Astronomical silicate', 'astrosil'],
    ['ice', 'water_ice'],
    ['water ice', 'water_ice'],
    ['water-ice', 'water_ice'],
  ])('"%s" is %s', (name, slug) => expect(findMaterial(name, knownMaterials)).toBe(slug));

  test.each(['', 'kryptonite', '__proto__', 'constructor'])('"%s" is nothing known', (name) =>
    expect(findMaterial(name, knownMaterials)).toBeNull(),
  );

  test('the names most alike come first', () => {
    expect(nearestNames('astrosyl', knownMaterials)[0]).toBe('astrosil');
    expect(nearestNames('troilit', knownMaterials)[0]).toBe('troilite');
    expect(nearestNames('carbon', knownMaterials)[0]).toBe('carbon_be');
  });

  test('without a likeness the known ones are listed', () =>
    expect(unknownMaterialReason(knownMaterials, 'kryptonite')).toContain('known: astrosil, carbon_be'));
});
