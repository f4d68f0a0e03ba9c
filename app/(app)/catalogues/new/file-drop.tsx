'use client';

import { FileUp } from 'lucide-react';
import { useState, type ClipboardEvent, type DragEvent } from 'react';

type Props = { file: File | null; onChoose: (file: File) => void };

/** Drag and drop, choose, or paste a table. */
export function FileDrop({ file, onChoose }: Props) {
  const [isOver, setIsOver] = useState(false);
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(false);
    const [dropped] = event.dataTransfer.files;
    if (dropped) onChoose(dropped);
  };
  const paste = (event: ClipboardEvent) => {
    const text = event.clipboardData.getData('text/plain');
    if (text.includes('\n')) onChoose(new File([text], 'pasted-table.csv', { type: 'text/csv' }));
  };
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
      className={`grid justify-items-center gap-3 rounded-lg border-2 border-dashed px-6 py-8 text-center ${isOver ? 'border-chaff bg-caution-soft' : 'border-field'}`}
    >
      <FileUp className="text-chaff size-8" aria-hidden="true" />
      <p>{file ? <FileName file={file} /> : 'Drop a CSV file here, or paste a table with its header.'}</p>
      <label className="bg-panel border-field hover:border-ink focus-within:outline-chaff inline-flex min-h-10 items-center rounded-md border px-4 font-medium focus-within:outline-2 focus-within:outline-offset-2">
        {file ? 'Choose another file' : 'Choose a file'}
        <input
          type="file"
          name="file"
          accept=".csv,.tsv,.txt,.dat,text/csv,text/plain"
          className="sr-only"
          onChange={(event) => event.target.files?.[0] && onChoose(event.target.files[0])}
        />
      </label>
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

function sizeWords(bytes: number): string {
  if (bytes < 1000) return `${bytes} bytes`;
  return bytes < 1e6 ? `${(bytes / 1000).toFixed(1)} kB` : `${(bytes / 1e6).toFixed(1)} MB`;
}
