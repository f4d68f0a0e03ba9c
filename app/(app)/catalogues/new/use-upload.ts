'use client';

import { useRouter } from 'next/navigation';
import { useEffect, useRef, useState } from 'react';
import { ApiProblem, sayProblem, type ApiFieldProblem } from '@/src/ui/run-api';
import { sendUpload, type Upload } from './send-upload';

export type UploadState =
  | { phase: 'idle' | 'cancelled' | 'stored' }
  | { phase: 'sending'; share: number }
  | { phase: 'refused'; message: string; fields: ApiFieldProblem[] };

/** Sends a catalogue, goes to its page when it is stored, and breaks off when the person leaves. */
export function useUpload() {
  const router = useRouter();
  const [state, setState] = useState<UploadState>({ phase: 'idle' });
  const upload = useRef<Upload | null>(null);
  const isSending = state.phase === 'sending';

  useEffect(() => () => upload.current?.cancel(), []);
  useEffect(() => {
    if (!isSending) return;
    const askFirst = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', askFirst);
    return () => window.removeEventListener('beforeunload', askFirst);
  }, [isSending]);

  const send = async (form: FormData) => {
    setState({ phase: 'sending', share: 0 });
    upload.current = sendUpload(form, (share) => setState({ phase: 'sending', share }));
    try {
      const { id } = await upload.current.done;
      setState({ phase: 'stored' });
      router.push(`/catalogues/${id}`);
    } catch (error) {
      setState(endOf(error));
    }
  };
  return { state, send, cancel: () => upload.current?.cancel() };
}

function endOf(error: unknown): UploadState {
  if (error instanceof DOMException && error.name === 'AbortError') return { phase: 'cancelled' };
  return { phase: 'refused', message: sayProblem(error), fields: error instanceof ApiProblem ? error.fields : [] };
}
