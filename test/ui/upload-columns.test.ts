import { describe, expect, it } from 'vitest';
import { choiceFor, unitsOf, withChoice } from '@/app/(app)/catalogues/new/choose-column';
import { asItStands, needsAnswer } from '@/app/(app)/catalogues/new/column-words';
import { exampleCatalogue } from '@/app/(app)/catalogues/new/example-catalogue';
import { shippedMaterials } from '@/fixtures/materials/library';
import { columnMapping, type ColumnMapping } from '@/src/catalogues/mapping';
import { previewCatalogue, type PreviewColumn } from '@/src/catalogues/preview-catalogue';

const bytes = (text: string) => new TextEncoder().encode(text);
const columnOf = (header: string): PreviewColumn =>
  previewCatalogue(bytes(`${header}\n1\n`), { isWholeFile: true, knownMaterials: new Map() }).columns[0];

describe('columns as they stand', () => {
  it.each([
    ['radius_um', 'radius', false],
    ['radius_um_sigma', 'one-sigma error of the radius', false],
    ['radius', 'radius, but in which unit?', true],
    ['density (stone/bushel)', 'density, in an unknown unit', true],
    ['size', 'radius or diameter?', true],
    ['remarks', 'not known: left out', false],
    ['radius_err', 'not known: left out', false],
  ])('%s: %s', (header, words, asks) => {
    expect(asItStands(columnOf(header))).toBe(words);
    expect(needsAnswer(columnOf(header))).toBe(asks);
  });
});

describe('choosing what a column holds', () => {
  it('guesses no unit', () => {
    expect(withChoice({}, columnOf('size'), 'diameter')).toEqual({ size: { field: 'diameter' } });
  });

  it('keeps the unit that the header says when it fits', () => {
    expect(withChoice({}, columnOf('radius_nm'), 'diameter')).toEqual({ radius_nm: { field: 'diameter', unit: 'nm' } });
    expect(withChoice({}, columnOf('radius_nm'), 'density')).toEqual({ radius_nm: { field: 'density' } });
  });

  it('takes a choice back without touching the others', () => {
    const before: ColumnMapping = { size: { field: 'radius', unit: 'um' }, rho: { field: 'density', unit: 'g_cm3' } };
    expect(withChoice(before, columnOf('size'), null)).toEqual({ rho: { field: 'density', unit: 'g_cm3' } });
  });

  it('is not confused by a column that is called like a part of every object', () => {
    expect(choiceFor({}, 'constructor')).toBeNull();
    expect(choiceFor({}, '__proto__')).toBeNull();
  });

  it('makes mappings that the server accepts, for every unit that is offered', () => {
    for (const field of ['radius', 'mass', 'density'] as const) {
      expect(unitsOf(field).length).toBeGreaterThan(1);
      for (const unit of unitsOf(field)) expect(columnMapping.safeParse({ x: { field, unit } }).success).toBe(true);
    }
    expect(unitsOf('label')).toEqual([]);
  });
});

const shippedSlugs = new Map(shippedMaterials().map(({ id }) => [id, id]));

it('the example to fill in is a catalogue without a single problem', () => {
  const preview = previewCatalogue(bytes(exampleCatalogue), { isWholeFile: true, knownMaterials: shippedSlugs });
  expect(preview).toMatchObject({ fault: null, problems: [], warnings: [] });
  expect(preview.accepted).toHaveLength(3);
  expect(preview.columns.every(({ problem }) => problem === null)).toBe(true);
});
