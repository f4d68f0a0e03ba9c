import type { ColumnMapping } from '@/src/catalogues/mapping';
import type { CataloguePreview } from '@/src/catalogues/preview-catalogue';
import { typedNumber } from '@/src/ui/run-number';
import type { InvalidRows } from './invalid-rows-choice';
import { sizeWords } from './size-words';
import type { PreviewDefaults } from './use-preview';

/** The upload form as it is filled in. */
export type UploadDraft = {
  file: File | null;
  name: string;
  mapping: ColumnMapping;
  densityGCm3: string;
  material: string;
  invalidRows: InvalidRows;
};

export type UploadProblems = { file?: string; name?: string; density?: string };

export const emptyUpload: UploadDraft = {
  file: null,
  name: '',
  mapping: {},
  densityGCm3: '',
  material: '',
  invalidRows: 'refuse',
};

const maxDensityGCm3 = 25;
const maxNameLength = 200;

/** Another file has other columns; a name that somebody wrote stays. */
export function withFile(draft: UploadDraft, file: File): UploadDraft {
  const name = draft.name || file.name.replace(/\.[^.]*$/, '').slice(0, maxNameLength);
  return { ...draft, file, name, mapping: {} };
}

export function densityProblem(typed: string): string | undefined {
  const value = typedNumber(typed);
  const isUsable = value === null || (value !== undefined && value > 0 && value <= maxDensityGCm3);
  return isUsable ? undefined : `Write a number above 0 and at most ${maxDensityGCm3}, such as 2.5.`;
}

export function defaultsOf(densityGCm3: string, material: string): PreviewDefaults {
  const density = densityProblem(densityGCm3) ? null : typedNumber(densityGCm3);
  return { ...(density ? { densityGCm3: density } : {}), ...(material ? { material } : {}) };
}

export function uploadProblems(
  draft: UploadDraft,
  preview: CataloguePreview | null,
  limitBytes: number,
): UploadProblems {
  const found = {
    file: fileProblem(draft.file, preview, limitBytes),
    name: draft.name.trim() === '' ? 'Give the catalogue a name.' : undefined,
    density: densityProblem(draft.densityGCm3),
  };
  return Object.fromEntries(Object.entries(found).filter(([, problem]) => problem !== undefined));
}

function fileProblem(file: File | null, preview: CataloguePreview | null, limitBytes: number): string | undefined {
  if (!file) return 'Choose a file first.';
  if (file.size > limitBytes) return `The file has ${sizeWords(file.size)}; ${sizeWords(limitBytes)} is the most.`;
  return preview?.fault ? 'The file cannot be read as it is.' : undefined;
}

export function uploadForm(draft: UploadDraft, file: File): FormData {
  const form = new FormData();
  const defaults = defaultsOf(draft.densityGCm3, draft.material);
  form.set('name', draft.name.trim());
  if (Object.keys(draft.mapping).length > 0) form.set('mapping', JSON.stringify(draft.mapping));
  if (Object.keys(defaults).length > 0) form.set('defaults', JSON.stringify(defaults));
  form.set('onInvalidRows', draft.invalidRows);
  form.set('file', file, file.name);
  return form;
}
