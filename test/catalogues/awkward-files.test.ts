import { readdirSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { awkwardCatalogues } from '@/fixtures/awkward-catalogues';
import { fixtureBytes, readAwkward } from './reading';

const sizes = async (name: string) => (await readAwkward(name)).grains.map(({ radiusM }) => radiusM);

describe('files that only look awkward', () => {
  test('the files are the ones that the script writes', () => {
    const folder = new URL('../../fixtures/catalogues/awkward/', import.meta.url);
    expect(
      readdirSync(folder)
        .filter((name) => name !== '.gitattributes')
        .sort(),
    ).toEqual(Object.keys(awkwardCatalogues).sort());
    for (const [name, content] of Object.entries(awkwardCatalogues))
      expect(Buffer.from(fixtureBytes(`awkward/${name}`)).equals(Buffer.from(content)), name).toBe(true);
  });

  test.each([
    'byte-order-mark.csv',
    'windows-lines.csv',
    'old-mac-lines.csv',
    'semicolons.csv',
    'tabs.csv',
    'vertical-bars.csv',
    'lined-up-with-blanks.csv',
  ])('%s reads like the plain file', async (name) => {
    const read = await readAwkward(name);
    expect(read.grains).toEqual([
      {
        line: 2,
        label: 'a',
        radiusM: 5e-7,
        radiusSigmaM: null,
        densityKgM3: 3300,
        densitySigmaKgM3: null,
        material: 'astrosil',
        count: 1,
      },
      {
        line: 3,
        label: 'b',
        radiusM: 1.25e-6,
        radiusSigmaM: null,
        densityKgM3: 1800,
        densitySigmaKgM3: null,
        material: 'carbon_be',
        count: 1,
      },
    ]);
    expect([read.rejected, read.blank]).toEqual([0, 0]);
  });

  test.each(['utf-16-little-endian.csv', 'utf-16-big-endian.csv'])('%s is read by its mark', async (name) => {
    expect((await readAwkward(name)).grains[0].label).toBe('\u00e9');
  });

  test('line ends of three kinds in one file still count as lines', async () => {
    const read = await readAwkward('mixed-lines.csv');
    expect(read.grains.map(({ line }) => line)).toEqual([2, 4]);
    expect(read.rejects.map(({ line }) => line)).toEqual([3]);
  });

  test('line breaks inside quotes count as lines of the file', async () => {
    const read = await readAwkward('quoted-line-breaks.csv');
    expect(read.grains.map(({ line }) => line)).toEqual([2, 4]);
    expect(read.rejects[0].line).toBe(7);
  });

  test('doubled quotes are quotation marks, and so is one in the middle of a cell', async () => {
    const labels = (await readAwkward('quoted-quotes.csv')).grains.map(({ label }) => label);
    expect(labels).toEqual(['the "large" one, broken', '5" sieve']);
  });

  test('a header full of commas does not hide the semicolons', async () => {
    const read = await readAwkward('semicolons-with-commas-in-header.csv');
    expect(read.delimiter).toBe(';');
    expect(read.accepted).toBe(1);
  });

  test('Fortran exponents are numbers', async () => expect(await sizes('fortran-exponents.csv')).toEqual([5e-7]));

  test('both micro signs and superscripts are units', async () => {
    const read = await readAwkward('micro-signs.csv');
    expect(read.columns.map(({ unit }) => unit?.symbol ?? null)).toEqual(['um', 'um', 'g_cm3', null]);
    expect(read.accepted).toBe(1);
  });

  test('a column called __proto__ is a column like any other', async () => {
    const read = await readAwkward('prototype-header.csv');
    expect(read.columns[0]).toMatchObject({ header: '__proto__', field: 'ignore' });
    expect(read.accepted).toBe(1);
    expect(read.warnings.map(({ code }) => code)).toEqual(['ignoredColumn', 'ignoredColumn']);
  });

  test('blank lines and comments are counted, and a comment that looks like a row is mentioned', async () => {
    const read = await readAwkward('commented-rows.csv');
    expect(read).toMatchObject({ accepted: 2, rejected: 0, blank: 5 });
    expect(read.grains.map(({ line }) => line)).toEqual([3, 8]);
    expect(read.warnings).toEqual([expect.objectContaining({ code: 'commentsLikeRows' })]);
  });

  test('unknown columns are ignored and named; one that looks like an error says how to use it', async () => {
    const read = await readAwkward('unknown-columns.csv');
    const messages = read.warnings.map(({ message }) => message).join('\n');
    expect(messages).toContain('"temperature"');
    expect(messages).toContain('_sigma');
    expect(messages).toContain('Column 6 has no name');
    expect(read.grains[0].radiusSigmaM).toBeNull();
  });
});
