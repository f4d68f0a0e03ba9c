'use client';

import type { ApiFieldProblem } from '@/src/ui/run-api';
import { Notice } from '@/src/ui/notice';
import { ProgressBar } from '@/src/ui/progress-bar';
import type { UploadState } from './use-upload';

/** How the upload goes. The per cent change too often to be read aloud; the rest is. */
export function UploadReport({ state }: { state: UploadState }) {
  const share = state.phase === 'sending' ? state.share : null;
  return (
    <div className="grid gap-3">
      <div aria-live="polite">
        {share !== null && <p>{share < 1 ? 'Uploading ...' : 'All of it is there; storing it ...'}</p>}
        {state.phase === 'stored' && <p>Stored. Opening the catalogue ...</p>}
        {state.phase === 'cancelled' && <Notice kind="info">The upload was cancelled. Nothing was stored.</Notice>}
        {state.phase === 'refused' && (
          <Notice kind="danger" title={state.message}>
            <Places fields={state.fields} />
          </Notice>
        )}
      </div>
      {share !== null && (
        <div className="flex items-center gap-3">
          <ProgressBar value={share} label="Upload" />
          <span className="w-14 text-right font-mono text-sm tabular-nums">{Math.round(share * 100)} %</span>
        </div>
      )}
    </div>
  );
}

function Places({ fields }: { fields: readonly ApiFieldProblem[] }) {
  if (fields.length === 0) return null;
  return (
    <ul className="list-disc pl-5 text-sm">
      {fields.map(({ pointer, row, column, detail }, index) => (
        <li key={index}>
          {row !== undefined && `Row ${row}: `}
          {column !== undefined && `column ${column}: `}
          {pointer !== undefined && pointer !== '/' && `${pointer.slice(1).replaceAll('/', ', ')} `}
          {detail}
        </li>
      ))}
    </ul>
  );
}
