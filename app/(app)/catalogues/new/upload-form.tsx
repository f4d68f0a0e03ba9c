'use client';

import { useMemo, useState, type FormEvent } from 'react';
import type { MaterialItem } from '@/src/materials/schema';
import { Button } from '@/src/ui/button';
import { ColumnChoices } from './column-choices';
import { ColumnHelp } from './column-help';
import { FileDrop } from './file-drop';
import { InvalidRowsChoice } from './invalid-rows-choice';
import { PasteTable } from './paste-table';
import { PreviewReport } from './preview-report';
import { NameAndDefaults } from './name-and-defaults';
import { defaultsOf, emptyUpload, uploadForm, uploadProblems, withFile, type UploadDraft } from './upload-draft';
import { UploadReport } from './upload-report';
import { usePreview } from './use-preview';
import { useUpload } from './use-upload';

type Props = { materials: readonly MaterialItem[]; limitBytes: number };

const mostColumnsShown = 60;

export function UploadForm({ materials, limitBytes }: Props) {
  const [draft, setDraft] = useState<UploadDraft>(emptyUpload);
  const [wasTried, setWasTried] = useState(false);
  const { state, send, cancel } = useUpload();
  const defaults = useMemo(() => defaultsOf(draft.densityGCm3, draft.material), [draft.densityGCm3, draft.material]);
  const preview = usePreview(draft.file, draft.mapping, defaults, materials);
  const problems = uploadProblems(draft, preview, limitBytes);
  const change = (changed: Partial<UploadDraft>) => setDraft({ ...draft, ...changed });
  const choose = (file: File) => setDraft(withFile(draft, file));
  const isBusy = state.phase === 'sending' || state.phase === 'stored';

  const submit = (event: FormEvent) => {
    event.preventDefault();
    setWasTried(true);
    if (draft.file && Object.keys(problems).length === 0) void send(uploadForm(draft, draft.file));
  };

  return (
    <form onSubmit={submit} noValidate className="grid max-w-4xl gap-8" aria-label="New catalogue">
      <div className="grid gap-3">
        <FileDrop
          file={draft.file}
          problem={(wasTried || draft.file) && !preview?.fault ? problems.file : undefined}
          onChoose={choose}
        />
        <PasteTable onChoose={choose} />
        <ColumnHelp />
        <div role="status" className="not-empty:mt-3">
          {preview && <PreviewReport preview={preview} />}
        </div>
      </div>
      {preview && preview.columns.length > 0 && preview.columns.length <= mostColumnsShown && (
        <section className="grid gap-3" aria-labelledby="columns">
          <h2 id="columns" className="text-xl">
            Mapping of the columns
          </h2>
          <ColumnChoices preview={preview} mapping={draft.mapping} onChange={(mapping) => change({ mapping })} />
        </section>
      )}
      <NameAndDefaults draft={draft} problems={problems} wasTried={wasTried} materials={materials} onChange={change} />
      <InvalidRowsChoice value={draft.invalidRows} onChange={(invalidRows) => change({ invalidRows })} />
      <div className="flex flex-wrap items-center gap-3">
        <Button type="submit" variant="primary" disabled={isBusy}>
          Upload and check
        </Button>
        {state.phase === 'sending' && <Button onClick={cancel}>Cancel the upload</Button>}
        <p role="alert" className="text-danger text-sm">
          {wasTried && Object.values(problems)[0]}
        </p>
      </div>
      <UploadReport state={state} />
    </form>
  );
}
