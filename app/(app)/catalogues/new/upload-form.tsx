'use client';

import { useRouter } from 'next/navigation';
import { useMemo, useRef, useState, type FormEvent } from 'react';
import type { ColumnMapping } from '@/src/catalogues/mapping';
import type { MaterialItem } from '@/src/materials/schema';
import { Button } from '@/src/ui/button';
import { Notice } from '@/src/ui/notice';
import { ProgressBar } from '@/src/ui/progress-bar';
import { sayProblem } from '@/src/ui/run-api';
import { RunSelectField } from '@/src/ui/run-select-field';
import { RunTextField } from '@/src/ui/run-text-field';
import { typedNumber } from '@/src/ui/run-number';
import { ColumnChoices } from './column-choices';
import { FileDrop } from './file-drop';
import { InvalidRowsChoice, type InvalidRows } from './invalid-rows-choice';
import { PreviewReport } from './preview-report';
import { sendUpload, type Upload } from './send-upload';
import { usePreview } from './use-preview';

export function UploadForm({ materials }: { materials: readonly MaterialItem[] }) {
  const router = useRouter();
  const [file, setFile] = useState<File | null>(null);
  const [name, setName] = useState('');
  const [mapping, setMapping] = useState<ColumnMapping>({});
  const [density, setDensity] = useState('');
  const [material, setMaterial] = useState('');
  const [invalidRows, setInvalidRows] = useState<InvalidRows>('refuse');
  const [share, setShare] = useState<number | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const upload = useRef<Upload | null>(null);

  const densityGCm3 = typedNumber(density);
  const densityProblem =
    densityGCm3 === undefined || (densityGCm3 !== null && !(densityGCm3 > 0 && densityGCm3 <= 25))
      ? 'Write a number above 0 and at most 25, such as 2.5.'
      : undefined;
  const defaults = useMemo(
    () => ({ ...(densityGCm3 && !densityProblem ? { densityGCm3 } : {}), ...(material ? { material } : {}) }),
    [densityGCm3, densityProblem, material],
  );
  const preview = usePreview(file, mapping, defaults, materials);

  const choose = (chosen: File) => {
    setFile(chosen);
    setMapping({});
    setProblem(null);
    if (name === '') setName(chosen.name.replace(/\.[^.]*$/, '').slice(0, 200));
  };

  const send = async (event: FormEvent) => {
    event.preventDefault();
    if (!file) return setProblem('Choose a file first.');
    if (name.trim() === '') return setProblem('Give the catalogue a name.');
    if (densityProblem) return setProblem('The default density is not a number.');
    const form = new FormData();
    form.set('name', name.trim());
    if (Object.keys(mapping).length > 0) form.set('mapping', JSON.stringify(mapping));
    if (Object.keys(defaults).length > 0) form.set('defaults', JSON.stringify(defaults));
    form.set('onInvalidRows', invalidRows);
    form.set('file', file, file.name);
    setProblem(null);
    setShare(0);
    upload.current = sendUpload(form, setShare);
    try {
      const { id } = await upload.current.done;
      router.push(`/catalogues/${id}`);
    } catch (error) {
      setShare(null);
      if (!(error instanceof DOMException)) setProblem(sayProblem(error));
    }
  };

  return (
    <form onSubmit={send} className="grid max-w-4xl gap-8" aria-label="New catalogue">
      <FileDrop file={file} onChoose={choose} />
      {preview && <PreviewReport preview={preview} />}
      {preview && preview.columns.length > 0 && preview.columns.length <= 60 && (
        <section className="grid gap-3">
          <h2 className="text-xl">Columns</h2>
          <ColumnChoices columns={preview.columns} mapping={mapping} onChange={setMapping} />
        </section>
      )}
      <section className="grid gap-4 sm:grid-cols-3">
        <RunTextField label="Name of the catalogue" value={name} onChange={setName} isNumber={false} />
        <RunTextField
          label="Density of rows without one"
          unit="g/cm³"
          value={density}
          onChange={setDensity}
          problem={densityProblem}
          hint="Only used where the file says nothing."
        />
        <RunSelectField
          label="Material of rows without one"
          value={material}
          onChange={setMaterial}
          empty="none"
          choices={materials.map(({ slug, name: words }) => ({ value: slug, label: words }))}
        />
      </section>
      <InvalidRowsChoice value={invalidRows} onChange={setInvalidRows} />
      <div aria-live="polite" className="grid gap-3">
        {problem && <Notice kind="danger">{problem}</Notice>}
        {share !== null && (
          <div className="grid gap-2">
            <p>{share < 1 ? `Uploading: ${Math.round(share * 100)} %` : 'Uploaded; storing it ...'}</p>
            <ProgressBar value={share} label="Upload" />
          </div>
        )}
      </div>
      <div className="flex flex-wrap gap-3">
        <Button type="submit" variant="primary" disabled={share !== null}>
          Upload and check
        </Button>
        {share !== null && <Button onClick={() => upload.current?.cancel()}>Cancel the upload</Button>}
      </div>
    </form>
  );
}
