import { describe, expect, it } from 'vitest';
import {
  defaultsOf,
  densityProblem,
  emptyUpload,
  uploadForm,
  uploadProblems,
  withFile,
  type UploadDraft,
} from '@/app/(app)/catalogues/new/upload-draft';
import { previewCatalogue } from '@/src/catalogues/preview-catalogue';

const fileOf = (text: string, name = 'grains.csv') => new File([text], name);
const draftOf = (changed: Partial<UploadDraft>): UploadDraft => ({ ...emptyUpload, name: 'Grains', ...changed });
const previewOf = (text: string) =>
  previewCatalogue(new TextEncoder().encode(text), { isWholeFile: true, knownMaterials: new Map([['ice', 'ice']]) });

describe('choosing a file', () => {
  it('names the catalogue after the file without its ending, unless a name was written', () => {
    expect(withFile(emptyUpload, fileOf('', 'run 3.final.csv')).name).toBe('run 3.final');
    expect(withFile(draftOf({ name: 'Mine' }), fileOf('')).name).toBe('Mine');
  });

  it('forgets the mapping of the file before', () => {
    expect(withFile(draftOf({ mapping: { size: { field: 'radius' } } }), fileOf('')).mapping).toEqual({});
  });
});

describe('the default density', () => {
  it.each(['', ' ', '2.5', '25', '1e-3'])('"%s" can be used', (typed) => expect(densityProblem(typed)).toBeUndefined());
  it.each(['0', '-1', '25.1', '2,5', 'dense', '0x10', 'Infinity'])('"%s" is refused', (typed) =>
    expect(densityProblem(typed)).toMatch(/above 0 and at most 25/),
  );

  it('is left out when it is empty or refused', () => {
    expect(defaultsOf('', '')).toEqual({});
    expect(defaultsOf('99', 'ice')).toEqual({ material: 'ice' });
    expect(defaultsOf('0.92', 'ice')).toEqual({ densityGCm3: 0.92, material: 'ice' });
  });
});

describe('what keeps a catalogue from being uploaded', () => {
  const good = 'radius_um,density_g_cm3,material\n1,0.92,ice\n';

  it('no file, no name', () => {
    const problems = uploadProblems(draftOf({ name: ' ' }), null, 1000);
    expect(problems.file).toBe('Choose a file first.');
    expect(problems.name).toBe('Give the catalogue a name.');
  });

  it('a file above the limit, with both sizes said', () => {
    const file = fileOf('x'.repeat(2500));
    expect(uploadProblems(draftOf({ file }), null, 1000).file).toBe('The file has 2.5 kB; 1.0 kB is the most.');
    expect(uploadProblems(draftOf({ file }), null, 2500)).toEqual({});
  });

  it('a file that cannot be read as it is, but not single bad rows', () => {
    const file = fileOf(good);
    expect(uploadProblems(draftOf({ file }), previewOf('size,material\n1,ice\n'), 1000).file).toMatch(/cannot be read/);
    expect(uploadProblems(draftOf({ file }), previewOf(`${good}-1,0.92,ice\n`), 1000)).toEqual({});
  });
});

describe('the form that is sent', () => {
  it('carries the file and only the settings that were made', () => {
    const file = fileOf('a');
    const plain = uploadForm(draftOf({ file, name: '  Grains ' }), file);
    expect([...plain.keys()]).toEqual(['name', 'onInvalidRows', 'file']);
    expect(plain.get('name')).toBe('Grains');
    expect(plain.get('onInvalidRows')).toBe('refuse');
    const full = uploadForm(
      draftOf({
        file,
        mapping: { d: { field: 'diameter', unit: 'nm' } },
        densityGCm3: '2',
        material: 'ice',
        invalidRows: 'leaveOut',
      }),
      file,
    );
    expect(JSON.parse(String(full.get('mapping')))).toEqual({ d: { field: 'diameter', unit: 'nm' } });
    expect(JSON.parse(String(full.get('defaults')))).toEqual({ densityGCm3: 2, material: 'ice' });
    expect(full.get('onInvalidRows')).toBe('leaveOut');
  });

  it('puts the file last, so that the server knows the settings when the bytes arrive', () => {
    const file = fileOf('a');
    expect([...uploadForm(draftOf({ file }), file).keys()].at(-1)).toBe('file');
  });
});
