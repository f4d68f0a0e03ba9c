'use client';

import { useId, useState } from 'react';
import { Button } from '@/src/ui/button';

export const pastedFile = (text: string): File => new File([text], 'Pasted table.csv', { type: 'text/csv' });

/** For tables that are not in a file, also where there is no keyboard to paste with. */
export function PasteTable({ onChoose }: { onChoose: (file: File) => void }) {
  const id = useId();
  const [text, setText] = useState('');
  return (
    <details className="text-sm">
      <summary className="w-fit py-1 underline decoration-chaff underline-offset-4">Paste a table instead</summary>
      <div className="mt-2 grid justify-items-start gap-2">
        <label htmlFor={id} className="font-medium">
          Table with its header in the first line
        </label>
        <textarea
          id={id}
          value={text}
          onChange={({ target }) => setText(target.value)}
          rows={6}
          spellCheck={false}
          className="border-field bg-panel w-full rounded-md border p-3 font-mono"
        />
        <Button size="small" disabled={text.trim() === ''} onClick={() => onChoose(pastedFile(text))}>
          Use this table
        </Button>
      </div>
    </details>
  );
}
