import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, test } from 'vitest';
import { fixtureBytes, readBytes, readText } from './reading';

const cellText = fc.string({
  unit: fc.constantFrom(...['a', '"', ',', '\n', '\r\n', ' x', '\u00e9', '\u{1f311}']),
  maxLength: 6,
});

describe('how the bytes arrive', () => {
  test('pieces of any size give the same grains, rejects and lines', async () => {
    const names = [
      'quoted-line-breaks.csv',
      'mixed-lines.csv',
      'utf-16-big-endian.csv',
      'commented-rows.csv',
      'micro-signs.csv',
    ];
    for (const name of names) {
      const bytes = fixtureBytes(`awkward/${name}`);
      const whole = await readBytes(bytes);
      for (const size of [1, 2, 3, 7, 16])
        expect(await readBytes(bytes, {}, size), `${name} by ${size}`).toEqual(whole);
    }
  });

  test('whatever is quoted in labels, every row keeps its label and its line', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(cellText, { minLength: 1, maxLength: 12 }),
        fc.integer({ min: 1, max: 40 }),
        async (labels, size) => {
          const quoted = labels.map((label) => `"x${label.replaceAll('"', '""')}",1,1,ice`);
          const text = `label,radius_um,density_g_cm3,material\n${quoted.join('\n')}`;
          const read = await readText(text, {}, size);
          expect(read.grains.map(({ label }) => label)).toEqual(
            labels.map((label) => `x${label.replaceAll('\r\n', '\n')}`.trim()),
          );
          let line = 2;
          for (const [index, label] of labels.entries()) {
            expect(read.grains[index].line).toBe(line);
            line += label.split('\n').length;
          }
        },
      ),
    );
  });

  test('rows come out as a parser that sees the whole file at once gives them', async () => {
    const rows = Array.from({ length: 9000 }, (_, index) => [
      index % 7 ? `g${index}` : `g "${index}", x`,
      '1.5',
      '2',
      'ice',
    ]);
    const text = Papa.unparse([['label', 'radius_um', 'density_g_cm3', 'material'], ...rows], { newline: '\n' });
    expect(text.length).toBeGreaterThan(2 * 64 * 1024);
    const read = await readText(text);
    expect(read.grains.map(({ label }) => label)).toEqual(rows.map(([label]) => label));
    expect(read.grains.at(-1)?.line).toBe(9001);
  });

  test('a promise of the sink is awaited before the next row is read', async () => {
    const { readCatalogue } = await import('@/src/catalogues/read-catalogue');
    const { knownMaterials, pieces } = await import('./reading');
    const bytes = new TextEncoder().encode(`radius_um,density_g_cm3,material\n${'1,1,ice\n'.repeat(20)}`);
    let open = 0;
    let mostOpen = 0;
    await readCatalogue(
      pieces(bytes),
      { knownMaterials, maxRows: 100 },
      {
        grain: async () => {
          mostOpen = Math.max(mostOpen, ++open);
          await new Promise((resolve) => setImmediate(resolve));
          open--;
        },
        reject: () => undefined,
      },
    );
    expect(mostOpen).toBe(1);
  });
});
