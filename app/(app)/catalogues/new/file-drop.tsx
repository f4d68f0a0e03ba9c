'use client';

import { FileUp } from 'lucide-react';
import { useId, useState, type ClipboardEvent, type DragEvent } from 'react';
import { pastedFile } from './paste-table';
import { sizeWords } from './size-words';

type Props = { file: File | null; problem?: string; onChoose: (file: File) => void };

/** Drag and drop, choose, or paste a table. */
export function FileDrop({ file, problem, onChoose }: Props) {
  const id = useId();
  const [isOver, setIsOver] = useState(false);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(false);
    const [dropped] = event.dataTransfer.files;
    if (dropped) onChoose(dropped);
  };
  const paste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain');
    if (text.includes('\n')) onChoose(pastedFile(text));
  };
  const look = isOver ? 'border-chaff bg-caution-soft' : problem ? 'border-danger' : 'border-field';
  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setIsOver(true);
      }}
      onDragLeave={() => setIsOver(false)}
      onDrop={drop}
      onPaste={paste}
      tabIndex={0}
      role="group"
      aria-label="File of the catalogue: drop it here, choose it, or paste a table"
      aria-describedby={problem ? `${id}-problem` : undefined}
      className={`grid justify-items-center gap-3 rounded-lg border-2 border-dashed px-6 py-8 text-center ${look}`}
    >
      <FileUp className="text-chaff size-8" aria-hidden="true" />
      <p aria-live="polite">
        {file ? <FileName file={file} /> : 'Drop a CSV file here, or paste a table with its header.'}
      </p>
      <label className="bg-panel border-field hover:border-ink focus-within:outline-chaff inline-flex min-h-10 items-center rounded-md border px-4 font-medium focus-within:outline-2 focus-within:outline-offset-2">
        {file ? 'Choose another file' : 'Choose a file'}
        <input
          type="file"
          name="file"
          accept=".csv,.tsv,.txt,.dat,text/csv,text/plain"
          className="sr-only"
          onChange={({ target }) => {
            if (target.files?.[0]) onChoose(target.files[0]);
            // Otherwise the same file, corrected, could not be chosen again.
            target.value = '';
          }}
        />
      </label>
      {problem && (
        <p id={`${id}-problem`} className="text-danger text-sm">
          {problem}
        </p>
      )}
    </div>
  );
}

function FileName({ file }: { file: File }) {
  return (
    <>
      <span className="font-medium break-all">{file.name}</span>{' '}
      <span className="text-muted whitespace-nowrap">({sizeWords(file.size)})</span>
    </>
  );
}
