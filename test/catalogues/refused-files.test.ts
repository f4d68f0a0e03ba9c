import { describe, expect, test } from 'vitest';
import { CatalogueFault } from '@/src/catalogues/read-catalogue';
import { readAwkward, readBytes, readText, type Read } from './reading';

async function faultOf(reading: Promise<Read>): Promise<CatalogueFault> {
  const outcome = await reading.catch((fault: unknown) => fault);
  if (outcome instanceof CatalogueFault) return outcome;
  throw outcome instanceof Error ? outcome : new Error('the file was accepted');
}

describe('files that are refused as a whole', () => {
  test.each([
    ['empty.csv', 'empty', null, 'empty'],
    ['only-blanks.csv', 'empty', null, 'empty'],
    ['only-comments.csv', 'empty', null, 'no header'],
    ['header-only.csv', 'noRows', 1, 'no rows'],
    ['commented-header.csv', 'sizeMissing', 1, 'remove its #'],
    ['picture.bin', 'binary', null, 'PNG image'],
    ['archive.bin', 'binary', null, 'xlsx'],
    ['packed.bin', 'binary', null, 'gzip'],
    ['nul-bytes.csv', 'binary', null, 'NUL'],
    ['utf-16-without-mark.csv', 'binary', null, 'UTF-8'],
    ['latin-1.csv', 'encoding', 3, 'UTF-8'],
    ['cut-off-character.csv', 'encoding', null, 'cut off'],
    ['unclosed-quote.csv', 'unclosedQuote', 3, 'line 3'],
    ['stray-quote.csv', 'strayQuote', 3, 'line 3'],
    ['unknown-delimiter.csv', 'sizeMissing', 1, 'semicolons'],
    ['decimal-commas.csv', 'decimalComma', 2, 'decimal points'],
    ['missing-size-column.csv', 'sizeMissing', 1, 'radius_um'],
    ['missing-material-column.csv', 'materialMissing', 1, 'default material'],
    ['missing-density-column.csv', 'densityMissing', 1, 'default density'],
    ['duplicate-headers.csv', 'duplicateHeader', 1, 'Columns 1 and 5'],
    ['two-radii.csv', 'duplicateField', 1, 'Columns 1 ("radius_um") and 2 ("radius_nm")'],
    ['radius-without-unit.csv', 'unitMissing', 1, 'say the unit'],
    ['diameter-without-unit.csv', 'unitMissing', 1, 'say the unit'],
    ['size-of-unknown-kind.csv', 'radiusOrDiameter', 1, 'radius_um or diameter_um'],
    ['unknown-unit.csv', 'unitUnknown', 1, 'furlong'],
  ])('%s is refused as %s at line %s', async (name, code, line, words) => {
    const fault = await faultOf(readAwkward(name));
    expect([fault.code, fault.line]).toEqual([code, line]);
    expect(fault.message).toContain(words);
  });

  test('the first byte that is not UTF-8 is named: in Latin-1 the u with two dots is 0xFC, which begins no character', async () => {
    const before = 'label,radius_um,density_g_cm3,material\na,0.5,3.3,astrosil\nM'.length;
    expect((await faultOf(readAwkward('latin-1.csv'))).message).toContain(`byte ${before + 1} of the file, on line 3`);
  });

  test.each([1, 7, 64, 4096])(
    'the byte is named however far in it comes and however the bytes are cut (by %d)',
    async (size) => {
      const start = new TextEncoder().encode(
        `label,radius_um,density_g_cm3,material\n${'\u20ac\u{1f311},1,1,ice\n'.repeat(200)}`,
      );
      const bytes = new Uint8Array([...start, 0xe2, 0x82, 0x2c]);
      const fault = await faultOf(readBytes(bytes, {}, size));
      expect(fault.message).toContain(`byte ${start.length + 3} of the file, on line 202`);
    },
  );

  test('a million columns are refused', async () => {
    const names = Array.from({ length: 1e6 }, (_, index) => `c${index}`).join(',');
    expect(await faultOf(readText(`${names}\n1\n`))).toMatchObject({ code: 'longRecord', line: 1 });
    expect(await faultOf(readText(`${','.repeat(600_000)}radius_um\n1\n`))).toMatchObject({
      code: 'tooManyColumns',
      line: 1,
    });
    const fault = await faultOf(readText(`radius_um${',x'.repeat(512)}\n1\n`));
    expect(fault.message).toContain('513 columns');
  });

  test('a quote that opens and never closes costs no more than reading the file', async () => {
    const rows = 'a,1,1,ice\n'.repeat(300_000);
    const started = performance.now();
    const fault = await faultOf(readText(`label,radius_um,density_g_cm3,material\nb,1,1,ice\n"${rows}`));
    expect(fault).toMatchObject({ code: 'unclosedQuote', line: 3 });
    expect(performance.now() - started).toBeLessThan(10_000);
  });

  test('a field of more than 1 MiB is refused with its line, one below is a reject', async () => {
    const start = 'radius_um,density_g_cm3,material\n1,1,ice\n';
    expect(await faultOf(readText(`${start}${'9'.repeat(1_100_000)},1,ice\n`))).toMatchObject({
      code: 'longRecord',
      line: 3,
    });
    const read = await readText(`${start}${'9'.repeat(900_000)},1,ice\n`);
    expect(read.rejects).toEqual([expect.objectContaining({ line: 3, reason: 'is too large for a number' })]);
    expect(read.rejects[0].value).toHaveLength(200);
    expect(read.rejects[0].raw.length).toBeLessThanOrEqual(2000);
  });

  test('rows above the limit are refused, the limit itself is not', async () => {
    const text = `radius_um,density_g_cm3,material\n${'1,1,ice\n'.repeat(5)}`;
    expect((await readText(text, { maxRows: 5 })).accepted).toBe(5);
    expect(await faultOf(readText(text, { maxRows: 4 }))).toMatchObject({ code: 'tooManyRows', line: 6 });
  });

  test('defaults that cannot be are refused', async () => {
    const text = 'radius_um\n1\n';
    expect(await faultOf(readText(text, { defaults: { material: 'kryptonite', densityGCm3: 1 } }))).toMatchObject({
      code: 'defaults',
    });
    expect(await faultOf(readText(text, { defaults: { material: 'ice', densityGCm3: 0 } }))).toMatchObject({
      code: 'defaults',
    });
  });

  test('decimal commas in the first fifty rows refuse the file, in forty-nine of fifty they do not', async () => {
    const header = 'radius_um;density_g_cm3;material\n';
    const fifty = `${header}${'0,5;1;ice\n'.repeat(50)}`;
    expect(await faultOf(readText(`${fifty}0.5;1;ice\n`))).toMatchObject({ code: 'decimalComma' });
    const read = await readText(`${header}0.5;1;ice\n${'0,5;1;ice\n'.repeat(49)}`);
    expect([read.accepted, read.rejected]).toEqual([1, 49]);
  });
});
